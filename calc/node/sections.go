package node

import (
	"strings"
	"unicode/utf8"

	"soffit/calc/diag"
)

const (
	maxSections = 200 // read of a broken file
	maxBroken   = 20  // of them broken themselves
)

// sections reads a file of broken YAML: what stands at the margin begins a section, each section is read by
// itself, and those that cannot be read become Broken.
func (w *walker) sections() *Node {
	root := &Node{Kind: Mapping, Pos: diag.Pos{Line: 1, Col: 1}, Width: 1}
	lines := w.file.lines
	read, broken := 0, 0
	for from := 0; from < len(lines) && read < maxSections && broken < maxBroken; read++ {
		to := from + 1
		for to < len(lines) && !atMargin(lines[to]) {
			to++
		}
		if marker(lines[from]) {
			if len(root.Entries) > 0 {
				w.second(diag.Pos{Line: from + 1, Col: 1})
				return root
			}
		} else if !w.section(root, lines[from:to], from) {
			broken++
		}
		from = to
	}
	return root
}

// section reads the lines from line skip+1 on and adds their keys to root; false where they are broken.
func (w *walker) section(root *Node, lines []string, skip int) bool {
	docs, bad := decode(lines, skip)
	if bad != nil {
		w.syntax(bad, lines, skip)
		if key, _, ok := strings.Cut(lines[0], ":"); ok {
			at := diag.Pos{Line: skip + 1, Col: 1}
			root.Entries = append(root.Entries, Entry{
				&Node{Pos: at, Width: max(utf8.RuneCountInString(key), 1), Text: strings.TrimSpace(key)},
				&Node{Kind: Broken, Pos: at, Width: 1},
			})
		}
		return false
	}
	w.skip = skip
	n := w.documents(docs)
	w.skip = 0
	switch {
	case n == nil:
	case n.Kind == Mapping:
		root.Entries = append(root.Entries, n.Entries...)
	default:
		w.find(n.Pos, n.Width, "have text without a key", "write key: value")
	}
	return true
}

func atMargin(line string) bool {
	return line != "" && !strings.ContainsAny(line[:1], " \t#-]}") || marker(line)
}

func marker(line string) bool {
	return strings.HasPrefix(line, "---") || strings.HasPrefix(line, "...")
}
