package pdf

import (
	"math"
	"math/bits"
	"strconv"
	"unicode/utf8"
)

// appendFixed writes a number with up to two decimals, a hundredth of a point being 0.004 mm.
func appendFixed(b []byte, v float64) []byte {
	n := int64(math.Round(v * 100))
	if n < 0 {
		b = append(b, '-')
		n = -n
	}
	b = strconv.AppendInt(b, n/100, 10)
	if c := n % 100; c != 0 {
		b = append(b, '.', '0'+byte(c/10))
		if c%10 != 0 {
			b = append(b, '0'+byte(c%10))
		}
	}
	return b
}

func appendInt(b []byte, v int64) []byte { return strconv.AppendInt(b, v, 10) }

// appendRune writes a rune of a string in the two-byte encoding of the faces.
func appendRune(b []byte, r rune) []byte {
	return appendStringByte(appendStringByte(b, byte(r>>8)), byte(r))
}

func appendStringByte(b []byte, c byte) []byte {
	switch c {
	case '\\', '(', ')':
		return append(b, '\\', c)
	case '\r':
		return append(b, '\\', 'r')
	}
	return append(b, c)
}

// runeSet is a set of runes up to U+FFFF.
type runeSet struct {
	pages [256]*[4]uint64
}

func (s *runeSet) set(r rune) {
	p := s.pages[byte(r>>8)]
	if p == nil {
		p = new([4]uint64)
		s.pages[byte(r>>8)] = p
	}
	p[byte(r)>>6] |= 1 << (r & 63)
}

func (s *runeSet) add(o *runeSet) {
	for i, p := range o.pages {
		if p == nil {
			continue
		}
		if s.pages[i] == nil {
			s.pages[i] = new([4]uint64)
		}
		for j, w := range p {
			s.pages[i][j] |= w
		}
	}
}

func (s *runeSet) empty() bool {
	for _, p := range s.pages {
		if p != nil {
			return false
		}
	}
	return true
}

// String is the runes in order.
func (s *runeSet) String() string {
	var out []byte
	for i, p := range s.pages {
		if p == nil {
			continue
		}
		for j, w := range p {
			for ; w != 0; w &= w - 1 {
				out = utf8.AppendRune(out, rune(i<<8|j<<6|bits.TrailingZeros64(w)))
			}
		}
	}
	return string(out)
}
