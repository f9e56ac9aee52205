package sheet

import (
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/report/draw"
	"soffit/report/mathset"
	"soffit/report/text"
)

// phrase is words of the record as a paragraph: `symbols` and words with a subscript, as f_ctm, stand as
// mathematics.
func phrase(face draw.Face, s string) text.Paragraph {
	var out text.Paragraph
	plain := func(s string) {
		if s != "" {
			out = append(out, text.Run{Face: face, Text: s})
		}
	}
	set := func(s string) bool {
		if _, err := mathset.Inline(textSize, s); err != nil {
			return false
		}
		out = append(out, text.Math(func(size draw.Pt) mathset.Row {
			r, err := mathset.Inline(size, s)
			if err != nil {
				panic("sheet: a symbol that was read is read no more: " + s)
			}
			return r
		}))
		return true
	}
	if !strings.ContainsAny(s, "_`") {
		plain(s)
		return out
	}
	for i, part := range strings.Split(s, "`") {
		if i%2 == 1 && set(part) {
			continue
		}
		for part != "" {
			start, end := subscripted(part)
			plain(part[:start])
			if start < end && !set(part[start:end]) {
				plain(part[start:end])
			}
			part = part[end:]
		}
	}
	return out
}

// subscripted finds the first word with a subscript; both ends are the length of s where there is none.
func subscripted(s string) (start, end int) {
	at := strings.IndexByte(s, '_')
	if at < 0 {
		return len(s), len(s)
	}
	start = strings.LastIndexFunc(s[:at], func(r rune) bool { return unicode.IsSpace(r) || r == '(' }) + 1
	end = len(s)
	if i := strings.IndexFunc(s[at:], unicode.IsSpace); i >= 0 {
		end = at + i
	}
	end = start + len(strings.TrimRight(s[start:end], ",.;:"))
	if !strings.Contains(s[start:end], "(") {
		end = start + len(strings.TrimRight(s[start:end], ")"))
	}
	return start, end
}

// capital begins words with a capital, but not where they begin with a symbol.
func capital(s string) string {
	first, n := utf8.DecodeRuneInString(s)
	if second, _ := utf8.DecodeRuneInString(s[n:]); n == 0 || !unicode.IsLower(second) {
		return s
	}
	return string(unicode.ToUpper(first)) + s[n:]
}

// joined keeps a short name together on one line.
func joined(name string) string {
	if utf8.RuneCountInString(name) > 8 {
		return name
	}
	return strings.ReplaceAll(name, " ", "\u2009")
}

// wrap breaks words at blanks into lines no wider than w. A single word that is wider is broken within.
func wrap(f draw.Face, size, w draw.Pt, text string) []string {
	var lines []string
	line := ""
	for _, word := range strings.FieldsFunc(text, breakable) {
		if line != "" && draw.Width(f, size, line+" "+word) <= w {
			line += " " + word
			continue
		}
		if line != "" {
			lines = append(lines, line)
		}
		for draw.Width(f, size, word) > w {
			cut := cutAt(f, size, w, word)
			if cut == 0 {
				break
			}
			lines = append(lines, word[:cut])
			word = word[cut:]
		}
		line = word
	}
	if line != "" {
		lines = append(lines, line)
	}
	return lines
}

// breakable tells whether a line may end at a blank.
func breakable(r rune) bool { return unicode.IsSpace(r) && r != '\u2009' && r != '\u00a0' }

// cutAt is where a word must be broken to fit: behind the last sign that allows it, or behind the last rune that
// fits. It is 0 where nothing fits.
func cutAt(f draw.Face, size, w draw.Pt, word string) int {
	fit, after := 0, 0
	for i, r := range word {
		end := i + len(string(r))
		if draw.Width(f, size, word[:end]) > w {
			break
		}
		fit = end
		if strings.ContainsRune("-–/,.;:_)]}", r) {
			after = end
		}
	}
	if after > 0 {
		return after
	}
	return fit
}
