package node

import (
	"regexp"
	"strings"
	"unicode/utf8"

	"soffit/calc/diag"
)

// remedy is a way in which YAML breaks, by the words of its decoder, in words for who writes the file.
type remedy struct {
	words, msg, hint string
	column           func(line string) int // from 0; nil: where the line begins
}

const (
	inQuotes  = "put the text in quotes"
	furtherIn = "a line further in than the one above"
)

var remedies = []remedy{
	{"did not find expected '-' indicator", "a list goes on without -", "begin each row of a list with - in the same column", nil},
	{"block sequence entries are not allowed", "a list begins where a value should stand", "write the list on the lines below its key, and a negative number without a blank behind the minus", valueStart},
	{"did not find expected ',' or ']'", "a list in [ ] does not end, or lacks a comma", "write [one, two]", valueStart},
	{"did not find expected ',' or '}'", "a mapping in { } does not end, or lacks a comma", "write {key: value, key: value}", valueStart},
	{"found unexpected end of stream", "text in quotes does not end", "close the quotes", lastQuote},
	{"did not find expected node content", "a value is missing", "write key: value", valueStart},
	{"cannot start any token", "a value begins with a sign that needs quotes", inQuotes, valueStart},
	{"unknown escape character", "a backslash in double quotes", "write the text in single quotes", valueStart},
	{"did not find expected hexdecimal number", "a backslash in double quotes", "write the text in single quotes", valueStart},
	{"did not find expected alphabetic or numeric character", "a value begins with a lone * or &", inQuotes, valueStart},
	{"did not find expected comment or line break", "text after the sign of a block", "begin the text on the next line, further in", valueStart},
	{"mapping keys are not allowed", "a value begins with ?", inQuotes, valueStart},
	{"exceeded max depth", "nested too deep", "", nil},
	{"tag", "a value begins with !", inQuotes, valueStart},
	{"directive", "a line begins with %", inQuotes, nil},
	{"could not find expected ':'", "a key without a colon", "write key: value", nil},
}

// remedyFor finds the words for what the decoder says of line.
func remedyFor(said, line string) remedy {
	switch {
	case strings.Contains(said, "mapping values are not allowed"):
		if secondColon(line) > 0 {
			return remedy{"", "a second colon in the line", inQuotes, secondColon}
		}
		return remedy{"", furtherIn, "bring keys of one group to one column", nil}
	case strings.Contains(said, "did not find expected key"), strings.Contains(said, "did not find expected <document start>"):
		if enclosed(line[valueByte(line):]) {
			return remedy{"", "text goes on after a closing quote or bracket", "put the whole text in quotes", valueStart}
		}
		return remedy{"", "a line that does not fit the ones above", "bring keys of one group to one column", nil}
	}
	for _, r := range remedies {
		if strings.Contains(said, r.words) {
			return r
		}
	}
	return remedy{"", "cannot be read as YAML: " + clip(said), "", nil}
}

func margin(line string) int { return len(line) - len(strings.TrimLeft(line, " \t")) }

// valueByte is the offset of the value in a line "- key: value", of the key where there is no value.
func valueByte(line string) int {
	at := margin(line)
	for strings.HasPrefix(line[at:], "- ") {
		at += 2 + margin(line[at+2:])
	}
	if enclosed(line[at:]) {
		return at
	}
	if before, after, ok := strings.Cut(line[at:], ": "); ok {
		at += len(before) + 2 + margin(after)
	}
	return at
}

// enclosed reports whether text begins with a quote or a bracket.
func enclosed(s string) bool { return s != "" && strings.ContainsAny(s[:1], `'"[{`) }

func valueStart(line string) int { return utf8.RuneCountInString(line[:valueByte(line)]) }

// lastQuote is where the last quote of a line stands.
func lastQuote(line string) int {
	return utf8.RuneCountInString(line[:max(strings.LastIndexAny(line, `'"`), 0)])
}

// secondColon is where a second colon with a blank behind it stands, 0 where there is none.
func secondColon(line string) int {
	at := valueByte(line)
	i := strings.Index(line[at:]+" ", ": ")
	if i < 0 || at == margin(line) || enclosed(line[at:]) {
		return 0
	}
	return utf8.RuneCountInString(line[:at+i])
}

// tightColon is a line that is a key, a colon and a value without a blank between: to YAML it is text.
var tightColon = regexp.MustCompile(`^\s*(?:- )?([\pL_][\pL\pN_ ]*):[^\s/]`)

var anchorName = regexp.MustCompile(`unknown anchor '(.*)' referenced`)

// syntax finds why a section cannot be read: tabs at the beginning of lines if there are any, else what the
// decoder says.
func (w *walker) syntax(bad *syntax, lines []string, skip int) {
	if w.tabs(lines, skip) {
		return
	}
	if m := anchorName.FindStringSubmatch(bad.msg); m != nil {
		for i, line := range lines {
			if before, _, ok := strings.Cut(line, "*"+m[1]); ok {
				at := diag.Pos{Line: skip + i + 1, Col: utf8.RuneCountInString(before) + 1}
				w.find(at, 1+utf8.RuneCountInString(m[1]), "have alias *"+clip(m[1])+", want the value itself", "write the value out; text that begins with * goes in quotes")
				return
			}
		}
	}
	at := diag.Pos{Line: w.brokenLine(bad, lines, skip)}
	for _, n := range []int{at.Line, at.Line - 1} { // the decoder stumbles over the line after it
		if n <= skip {
			continue
		}
		if m := tightColon.FindStringSubmatchIndex(w.file.line(n)); m != nil {
			line := w.file.line(n)
			key := clip(line[m[2]:m[3]])
			value, _, _ := strings.Cut(line[m[3]+1:], " #")
			w.find(diag.Pos{Line: n, Col: utf8.RuneCountInString(line[:m[3]]) + 1}, 1, "no blank after the colon of "+key, "write "+key+": "+clip(strings.TrimSpace(value)))
			return
		}
	}
	line := w.file.line(at.Line)
	r := remedyFor(bad.msg, line)
	if above := w.file.line(at.Line - 1); r.msg == furtherIn && at.Line > skip+1 && !strings.Contains(above, ":") && margin(above) < len(above) {
		at.Line, line = at.Line-1, above
		r = remedy{"", "a key without a colon", "write key: value", nil}
	}
	column := utf8.RuneCountInString(line[:margin(line)])
	if r.column != nil {
		column = r.column(line)
	}
	at.Col = column + 1
	w.find(at, 1, r.msg, r.hint)
}

func (w *walker) tabs(lines []string, skip int) (any bool) {
	for i, line := range lines {
		if at := strings.IndexByte(line[:margin(line)], '\t'); at >= 0 {
			any = true
			w.find(diag.Pos{Line: skip + i + 1, Col: at + 1}, 1, "a tab at the beginning of the line, want blanks", "write two blanks for each step to the right")
		}
	}
	return any
}

// longestSearched is how many lines a section may have for its broken line to be searched for.
const longestSearched = 400

// brokenLine is the line behind the longest part of the section that can be read; the decoder itself often
// names the line where the group began.
func (w *walker) brokenLine(bad *syntax, lines []string, skip int) int {
	if len(lines) > longestSearched {
		return min(max(bad.line, skip+1), skip+len(lines))
	}
	k := len(lines) - 1
	for ; k > 0; k-- {
		if _, bad := decode(lines[:k], 0); bad == nil {
			break
		}
	}
	return skip + k + 1
}

// clip bounds text taken over into a message.
func clip(s string) string {
	const most = 40
	if utf8.RuneCountInString(s) <= most {
		return s
	}
	return string([]rune(s)[:most]) + "…"
}
