package member

import (
	"fmt"
	"slices"
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/calc/node"
)

// The lengths of free texts, in characters.
const (
	mostName = 40
	mostLine = 300
)

// word reads one of the words of the key, or a free line of text.
func (r *reader) word(n *node.Node, f *field, to *Word) {
	s, ok := r.text(n, f, wordType)
	if !ok {
		return
	}
	fail := func(want, hint string) { r.find(placeOf(n), f.key+": have "+have(n)+", want "+want, hint) }
	switch {
	case f.words != nil:
		if !slices.Contains(f.words, s) {
			fail(either(f.words), instead(s, f.words))
			return
		}
	case strings.ContainsRune(s, '\n'):
		fail("one line of text", "write it on one line")
		return
	case f.name && !fitName(s):
		fail(fmt.Sprintf("a name of at most %d letters, digits, blanks and . _ - +", mostName), "write "+fittedName(s))
		return
	case utf8.RuneCountInString(s) > mostLine:
		fail(fmt.Sprintf("at most %d characters", mostLine), "shorten it")
		return
	}
	*to = Word{s, Origin{Pos: n.Pos, Given: true}}
}

func inName(r rune) bool {
	return unicode.IsLetter(r) || unicode.IsDigit(r) || strings.ContainsRune(" ._-+", r)
}

// fitName reports whether s can name a row in keys, form fields and spreadsheet names.
func fitName(s string) bool {
	return utf8.RuneCountInString(s) <= mostName && strings.IndexFunc(s, func(r rune) bool { return !inName(r) }) < 0
}

func fittedName(s string) string {
	r := []rune(strings.TrimSpace(strings.Map(func(r rune) rune {
		if !inName(r) {
			return '-'
		}
		return r
	}, s)))
	return strings.TrimSpace(string(r[:min(len(r), mostName)]))
}
