package text

import (
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/report/draw"
	"soffit/report/mathset"
)

// lowered are the small figures below the line, ψ₀, which stand for a subscript.
const lowered = "₀₁₂₃₄₅₆₇₈₉"

// Words is plain text of a face as a paragraph: `symbols`, words with a subscript, as f_ctm and f_p0,1k, and letters
// with small figures, as ψ₀, stand as mathematics.
func Words(face draw.Face, s string) Paragraph { return wordsTo(face, "", s) }

// wordsTo is Words leading to an anchor.
func wordsTo(face draw.Face, anchor, s string) Paragraph {
	var out Paragraph
	plain := func(s string) {
		if s != "" {
			out = append(out, Run{Face: face, Text: s, Anchor: anchor})
		}
	}
	if !strings.ContainsAny(s, "_`"+lowered) {
		plain(s)
		return out
	}
	set := func(s string) bool {
		s, ok := readable(s)
		if ok {
			out = append(out, Math(func(size draw.Pt) mathset.Row {
				r, err := mathset.Inline(size, s)
				if err != nil {
					panic("text: a symbol that was read is read no more: " + s)
				}
				return r
			}))
		}
		return ok
	}
	for i, part := range strings.Split(s, "`") {
		if i%2 == 1 && set(part) {
			continue
		}
		part = levelled(part)
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

// readable is the notation in which a symbol can be read: as it is, or with braces about a subscript in parts,
// f_p0,1k.
func readable(s string) (string, bool) {
	if _, err := mathset.Inline(10, s); err == nil {
		return s, true
	}
	base, sub, ok := strings.Cut(s, "_")
	if !ok || !strings.Contains(sub, ",") || strings.ContainsAny(sub, "{}_·/+() ") {
		return s, false
	}
	s = base + "_{" + sub + "}"
	_, err := mathset.Inline(10, s)
	return s, err == nil
}

// levelled writes ψ₀ as ψ_0: small figures after a single letter. Other small figures stay.
func levelled(s string) string {
	if !strings.ContainsAny(s, lowered) {
		return s
	}
	var b strings.Builder
	letters, low := 0, false // letters side by side before; within a subscript
	for _, r := range s {
		i := strings.IndexRune(lowered, r)
		switch {
		case i >= 0 && (letters == 1 || low):
			if !low {
				b.WriteByte('_')
			}
			low, letters = true, 0
			b.WriteByte(byte('0' + i/len("₀")))
			continue
		case unicode.IsLetter(r):
			letters++
		default:
			letters = 0
		}
		low = false
		b.WriteRune(r)
	}
	return b.String()
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
	if end <= at { // nothing stands below the line
		_, n := utf8.DecodeRuneInString(s[at:])
		return at, at + n
	}
	return start, end
}
