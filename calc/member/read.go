package member

import (
	"fmt"
	"reflect"
	"slices"
	"strings"
	"unicode/utf8"

	"soffit/calc/diag"
	"soffit/calc/node"
	"soffit/calc/quantity"
)

// mostFindings is how many findings are told of one file.
const mostFindings = 300

// Read reads a member file. All that is wrong in it is found at once, sorted by place; where anything is,
// there is no member.
func Read(file string, src []byte, opt Options) (*Member, diag.List) {
	f, found := node.Read(file, src)
	r := &reader{file: f, opt: opt, found: found}
	m := &Member{File: file, Source: src}
	switch {
	case f.Root == nil && len(found) == 0:
		r.find(place{diag.Pos{Line: 1, Col: 1}, 1}, "the file is empty", "begin with a line format: soffit/1")
	case f.Root != nil && r.format(f.Root):
		r.mapping(f.Root, reflect.ValueOf(m).Elem(), "the file", placeOf(f.Root))
		r.checkGroups(&m.Strands)
		m.Strands.share()
		m.complete()
		r.check(m)
	}
	r.found.Sort()
	if n := len(r.found); n > mostFindings {
		rest := diag.Finding{File: file, Msg: fmt.Sprintf("and %d findings more", n-mostFindings)}
		r.found = append(r.found[:mostFindings:mostFindings], rest)
	}
	if len(r.found) > 0 {
		return nil, r.found
	}
	return m, nil
}

// reader is one file under way.
type reader struct {
	file  *node.File
	opt   Options
	found diag.List
}

// place is a part of a line.
type place struct {
	at    diag.Pos
	width int
}

func placeOf(n *node.Node) place { return place{n.Pos, n.Width} }

func (r *reader) find(p place, msg, hint string) {
	r.found.Add(r.file.Finding(p.at, p.width, msg, hint))
}

// format reports whether the file is of the form that is read here; if not, nothing else in it says anything.
func (r *reader) format(root *node.Node) bool {
	if root.Kind != node.Mapping {
		if root.Kind != node.Broken {
			r.find(placeOf(root), "have "+have(root)+", want the keys of a member file", "begin with a line format: soffit/1")
		}
		return false
	}
	for i, e := range root.Entries {
		if e.Key.Text != "format" || e.Value.Kind != node.Scalar {
			continue
		}
		if name, version, ok := strings.Cut(e.Value.Text, "/"); ok && name == "soffit" && version != "1" {
			r.find(placeOf(e.Value), "format: have "+have(e.Value)+", want soffit/1", "this program reads format soffit/1 alone")
			return false
		}
		if i > 0 {
			r.find(placeOf(e.Key), "format: want it as the first key of the file", "move the line to the top")
		}
	}
	return true
}

// have says what stands in the file, for a finding.
func have(n *node.Node) string {
	switch n.Kind {
	case node.List:
		return "a list"
	case node.Mapping:
		return "a group of keys"
	}
	if n.Text == "" {
		return "nothing"
	}
	first, _, more := strings.Cut(n.Text, "\n")
	if more {
		first += " …"
	}
	return clip(first)
}

func clip(s string) string {
	const most = 40
	if utf8.RuneCountInString(s) <= most {
		return s
	}
	return string([]rune(s)[:most]) + "…"
}

// either joins words: "S, N or R". Of many, the first are named.
func either(words []string) string {
	const most = 14
	switch n := len(words); {
	case n == 0:
		return ""
	case n > most:
		return strings.Join(words[:most], ", ") + " …"
	case n > 1:
		return strings.Join(words[:n-1], ", ") + " or " + words[n-1]
	}
	return words[0]
}

// mostMeant is how many words a beginning may stand for and still be told apart by whoever reads them.
const mostMeant = 4

// instead proposes the word that was likely meant, or all of them. A word that one alone begins with means that one, one
// that a few begin with any of them, and the first of several words likewise.
func instead(word string, known []string) string {
	begins := func(with string) []string {
		return slices.DeleteFunc(slices.Clone(known), func(k string) bool { return len(with) < 3 || !strings.HasPrefix(k, with) })
	}
	near, ok := quantity.Nearest(word, known)
	first, _, several := strings.Cut(word, " ")
	switch begun := begins(word); {
	case len(begun) > 0 && len(begun) <= mostMeant:
		return "write " + either(begun)
	case ok:
		return "write " + near
	case several && len(begins(first+" ")) == 1:
		return "write " + begins(first + " ")[0]
	case len(known) == 0:
		return ""
	}
	return "write " + either(known)
}
