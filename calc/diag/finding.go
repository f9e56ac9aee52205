// Package diag holds findings: what is wrong in a file, where, and what to write instead.
package diag

import (
	"fmt"
	"strings"
	"unicode"
)

// Pos is a place in a text file. Line and Col count from 1, Col in characters; the zero Pos is no place.
type Pos struct{ Line, Col int }

// Before reports whether p comes ahead of q in the file.
func (p Pos) Before(q Pos) bool {
	return p.Line < q.Line || p.Line == q.Line && p.Col < q.Col
}

// Finding is one mistake in a file.
type Finding struct {
	File string
	Pos
	Msg     string // lower case, without a full stop: "e_mid: have 350 kN, want a length"
	Snippet string // the line as written; "" where there is none to show
	Width   int    // characters at Col that the finding is about, at least 1 where there is a snippet
	Hint    string // what to write instead, "write 350 mm"; "" where there is nothing to propose
}

// String is the finding with its line, a caret under the place and the hint:
//
//	beam.yaml:14:10: e_mid: have 350 kN, want a length
//	   14 |   e_mid: 350 kN
//	      |          ^
//	hint: write 350 mm
//
// What cannot be printed is replaced, a long line is cut around the place.
func (f Finding) String() string {
	var b strings.Builder
	b.WriteString(f.File)
	if f.Line > 0 {
		fmt.Fprintf(&b, ":%d:%d", f.Line, f.Col)
	}
	fmt.Fprintf(&b, ": %s\n", printable(f.Msg))
	if f.Snippet != "" {
		line, before := f.excerpt()
		fmt.Fprintf(&b, "%5d | %s\n      | %s^\n", f.Line, line, before)
	}
	if f.Hint != "" {
		fmt.Fprintf(&b, "hint: %s\n", printable(f.Hint))
	}
	return strings.TrimSuffix(b.String(), "\n")
}

const (
	longest = 100 // characters of a line shown
	lead    = 40  // of them ahead of the place, where the line is cut
)

// excerpt gives the line as shown and the blanks that bring the caret under the place: tabs under tabs.
func (f Finding) excerpt() (line, before string) {
	text := []rune(printable(f.Snippet))
	at := min(max(f.Col-1, 0), len(text))
	head := text[:at]
	if len(text) > longest && at+max(f.Width, 1) > longest {
		cut := max(at-lead, 0)
		text = append([]rune("… "), text[cut:]...)
		head = text[:at-cut+2]
	}
	line = string(text)
	if len(text) > longest {
		line = string(text[:longest]) + " …"
	}
	blank := func(r rune) rune {
		if r == '\t' {
			return r
		}
		return ' '
	}
	return line, strings.Map(blank, string(head))
}

// printable replaces what has no glyph, control characters and broken UTF-8 among them, by U+FFFD; tabs and
// any blank stay.
func printable(s string) string {
	return strings.Map(func(r rune) rune {
		if r == '\t' || unicode.IsPrint(r) || unicode.Is(unicode.Zs, r) {
			return r
		}
		return unicode.ReplacementChar
	}, s)
}
