package sheet

import (
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/report/draw"
)

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
