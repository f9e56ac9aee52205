package node

import (
	"fmt"
	"strings"
	"unicode/utf8"

	"gopkg.in/yaml.v3"

	"soffit/calc/diag"
)

const (
	maxFound = 1000   // findings of a file
	maxDepth = 12     // of mappings and lists in one another
	maxNodes = 50_000 // scalars, mappings and lists of a file
)

// walker turns YAML nodes into ours.
type walker struct {
	file  *File
	skip  int // lines of the file ahead of what was decoded
	nodes int
	found diag.List
}

func (w *walker) find(at diag.Pos, width int, msg, hint string) {
	if len(w.found) == maxFound {
		return
	}
	w.found.Add(w.file.Finding(at, width, msg, hint))
}

// documents takes the one document of a file; a second one is found.
func (w *walker) documents(docs []*yaml.Node) *Node {
	if len(docs) > 1 {
		w.second(w.place(docs[1]))
	}
	if len(docs) == 0 || len(docs[0].Content) == 0 {
		return nil
	}
	n := w.node(docs[0].Content[0], 0)
	if n.Empty() {
		return nil
	}
	return n
}

func (w *walker) second(at diag.Pos) {
	w.find(at, 1, "a second document begins here, want one to a file", "remove the line --- above, or write the second document into a file of its own")
}

func (w *walker) place(y *yaml.Node) diag.Pos { return diag.Pos{Line: y.Line + w.skip, Col: y.Column} }

func (w *walker) node(y *yaml.Node, depth int) *Node {
	n := &Node{Pos: w.place(y), Width: 1}
	if w.nodes++; w.nodes > maxNodes {
		if w.nodes == maxNodes+1 {
			w.find(n.Pos, 1, fmt.Sprintf("file of more than %d entries", maxNodes), "")
		}
		n.Kind = Broken
		return n
	}
	if w.refused(y, n) {
		n.Kind = Broken
		return n
	}
	if depth > maxDepth && y.Kind != yaml.ScalarNode {
		w.find(n.Pos, 1, fmt.Sprintf("nested more than %d deep", maxDepth), "")
		n.Kind = Broken
		return n
	}
	switch y.Kind {
	case yaml.ScalarNode:
		n.Text = strings.TrimSpace(y.Value)
		n.Quoted = y.Style&(yaml.SingleQuotedStyle|yaml.DoubleQuotedStyle|yaml.LiteralStyle|yaml.FoldedStyle) != 0
		n.Width = w.width(y, n)
	case yaml.SequenceNode:
		n.Kind = List
		for _, c := range y.Content {
			if w.nodes > maxNodes {
				break
			}
			n.Items = append(n.Items, w.node(c, depth+1))
		}
		if y.Style&yaml.FlowStyle != 0 {
			w.listCommas(n)
		}
	case yaml.MappingNode:
		n.Kind = Mapping
		for i := 0; i+1 < len(y.Content) && w.nodes <= maxNodes; i += 2 {
			w.entry(n, y.Content[i], y.Content[i+1], depth)
		}
		if y.Style&yaml.FlowStyle != 0 {
			w.commas(n)
		}
	default:
		n.Kind = Broken
	}
	return n
}

func (w *walker) entry(n *Node, key, value *yaml.Node, depth int) {
	at := w.place(key)
	switch {
	case key.Kind == yaml.ScalarNode && key.Tag == "!!merge":
		w.find(at, 2, "have merge key <<, want the keys themselves", "write the keys out")
		return
	case key.Kind != yaml.ScalarNode && key.Kind != yaml.AliasNode:
		w.find(at, 1, "have a "+word(key)+" as a key, want a word", "")
		return
	}
	k, v := w.node(key, depth+1), w.node(value, depth+1)
	if k.Kind == Scalar {
		n.Entries = append(n.Entries, Entry{k, v})
	}
}

// refused finds what a member file does not use of YAML.
func (w *walker) refused(y *yaml.Node, n *Node) bool {
	width := func(s string) int { return 1 + utf8.RuneCountInString(s) }
	switch {
	case y.Kind == yaml.AliasNode:
		w.find(n.Pos, width(y.Value), "have alias *"+clip(y.Value)+", want the value itself", "write the value out; text that begins with * goes in quotes")
	case y.Anchor != "":
		w.find(n.Pos, width(y.Anchor), "have anchor &"+clip(y.Anchor)+", want the value alone", "remove &"+clip(y.Anchor)+"; text that begins with & goes in quotes")
	case y.Style&yaml.TaggedStyle != 0:
		w.find(n.Pos, max(width(y.Tag)-1, 1), "have tag "+clip(y.Tag)+", want the value alone", "remove "+clip(y.Tag)+"; text that begins with ! goes in quotes")
	default:
		return false
	}
	return true
}

func word(y *yaml.Node) string {
	if y.Kind == yaml.MappingNode {
		return "mapping"
	}
	return "list"
}

// width counts the characters of a scalar on its first line; for one in quotes, the quotes too, as far as
// the line goes.
func (w *walker) width(y *yaml.Node, n *Node) int {
	line := w.file.line(n.Pos.Line)
	rest := max(utf8.RuneCountInString(line)-n.Pos.Col+1, 1)
	first, _, _ := strings.Cut(n.Text, "\n")
	count := utf8.RuneCountInString(first)
	switch {
	case y.Style&(yaml.LiteralStyle|yaml.FoldedStyle) != 0:
		count = 1
	case n.Quoted:
		count += 2
	}
	return min(max(count, 1), rest)
}
