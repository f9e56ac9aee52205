package node

import (
	"bytes"
	"fmt"
	"strings"
	"unicode/utf8"

	"soffit/calc/diag"
)

// MaxBytes is the size of the largest file read.
const MaxBytes = 1_000_000

// maxFaults is how many lines that are no text are told; beyond, the file is taken as no text at all.
const maxFaults = 10

// text makes lines of src. What is no text is found and replaced, so that the rest can be read; ok is false
// where reading on makes no sense.
func (f *File) text(src []byte) (found diag.List, ok bool) {
	stop := func(msg, hint string) (diag.List, bool) {
		return diag.List{f.Finding(diag.Pos{Line: 1, Col: 1}, 1, msg, hint)}, false
	}
	switch {
	case len(src) > MaxBytes:
		return stop(fmt.Sprintf("file of %d bytes, want at most %d", len(src), MaxBytes), "")
	case bytes.HasPrefix(src, []byte{0xFF, 0xFE}), bytes.HasPrefix(src, []byte{0xFE, 0xFF}):
		return stop("file is in UTF-16, want UTF-8", "save the file as UTF-8")
	}
	src = bytes.TrimPrefix(src, []byte("\uFEFF"))
	f.lines = strings.Split(string(src), "\n")
	for i, line := range f.lines {
		line = strings.TrimSuffix(line, "\r")
		clean, col, fault := cleaned(line)
		f.lines[i] = clean
		if fault == "" {
			continue
		}
		if len(found) == maxFaults {
			found.Add(f.Finding(diag.Pos{Line: i + 1, Col: col}, 1, "and more of the kind: not a text file", ""))
			return found, false
		}
		found.Add(f.Finding(diag.Pos{Line: i + 1, Col: col}, 1, fault, "remove it, and save the file as UTF-8"))
	}
	return found, true
}

// cleaned replaces what is no text by U+FFFD, and tells the first of it with its column.
func cleaned(line string) (clean string, col int, fault string) {
	if isPlain(line) {
		return line, 0, ""
	}
	var b strings.Builder
	for n := 1; line != ""; n++ {
		r, size := utf8.DecodeRuneInString(line)
		what := ""
		switch {
		case r == utf8.RuneError && size == 1:
			what = fmt.Sprintf("byte 0x%02X is no text in UTF-8", line[0])
		case r < ' ' && r != '\t', r >= 0x7F && r < 0xA0, r == 0x2028, r == 0x2029, r == 0xFEFF, r == 0xFFFE, r == 0xFFFF:
			what = fmt.Sprintf("control character U+%04X in the text", r)
		}
		if what != "" {
			r = utf8.RuneError
			if fault == "" {
				col, fault = n, what
			}
		}
		b.WriteRune(r)
		line = line[size:]
	}
	return b.String(), col, fault
}

func isPlain(s string) bool {
	for i := 0; i < len(s); i++ {
		if c := s[i]; c < ' ' && c != '\t' || c >= 0x7F {
			return false
		}
	}
	return true
}
