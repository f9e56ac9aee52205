package sheet

import (
	"strings"

	"soffit/report/draw"
	"soffit/report/mathset"
	"soffit/report/text"
)

// ink is a line of words or mathematics, or part of one, at a place in a column: x from its left edge, y of the
// baseline below the top.
type ink struct {
	x, y draw.Pt
	face draw.Face
	size draw.Pt
	text string
	box  *mathset.Box // in place of text
	line *text.Line   // in place of text
	link string       // anchor it leads to, "" for none
}

// width of the ink.
func (k *ink) width() draw.Pt {
	switch {
	case k.box != nil:
		return k.box.Width
	case k.line != nil:
		return k.line.Width
	}
	return draw.Width(k.face, k.size, k.text)
}

// up and down are how far the ink reaches above its baseline and below.
func (k *ink) up() draw.Pt {
	switch {
	case k.box != nil:
		return k.box.Height
	case k.line != nil:
		return k.line.Height
	}
	return k.size * ascent
}

func (k *ink) down() draw.Pt {
	switch {
	case k.box != nil:
		return k.box.Depth
	case k.line != nil:
		return k.line.Depth
	}
	return k.size * descent
}

func (k *ink) paint(c draw.Canvas, x, y draw.Pt) {
	x, y = x+k.x, y+k.y
	switch {
	case k.box != nil:
		k.box.Draw(c, x, y)
	case k.line != nil:
		k.line.Draw(c, x, y)
	default:
		c.Text(x, y, k.face, k.size, k.text)
	}
	if k.link != "" {
		c.Link(x, y-k.up(), k.width(), k.up()+k.down(), k.link)
	}
}

// A stack is lines under each other in a column of some width.
type stack struct {
	w        draw.Pt
	inks     []ink
	bottom   draw.Pt // of the last line
	baseline draw.Pt // of the last line
}

func (s *stack) paint(c draw.Canvas, x, y draw.Pt) {
	for i := range s.inks {
		s.inks[i].paint(c, x, y)
	}
}

// put adds an ink of a height and depth as a line of its own, its baseline at least so far below the last one.
func (s *stack) put(k ink, up, down, gap, lead draw.Pt) {
	y := s.bottom + up
	if len(s.inks) > 0 {
		y = max(y+gap, s.baseline+lead)
	}
	k.y = y
	s.inks = append(s.inks, k)
	s.baseline, s.bottom = y, y+down
}

// row adds a row of mathematics, broken to the column, set in by some length.
func (s *stack) row(r mathset.Row, size, lead, gap, in draw.Pt) {
	s.lines(r.Lines(s.w-in), size, lead, gap, in)
}

func (s *stack) lines(b mathset.Block, size, lead, gap, in draw.Pt) {
	for i := range b.Lines {
		l := &b.Lines[i]
		if i > 0 {
			gap = 0
			high, deep := l.Box.Height > size*(ascent+0.1), b.Lines[i-1].Box.Depth > size*(descent+0.1)
			switch { // fractions above each other keep apart
			case high && deep:
				gap = 0.38*size + 3
			case high || deep:
				gap = 0.38 * size
			}
		}
		least := lead
		if i == 0 {
			least = 0
		}
		s.put(ink{x: in + l.X, size: size, box: &l.Box}, max(l.Box.Height, size*ascent), max(l.Box.Depth, size*descent), gap, least)
	}
}

// words adds words of the record, broken at blanks.
func (s *stack) words(f draw.Face, size, lead, gap draw.Pt, words string) {
	if strings.ContainsAny(words, "_`⁰¹²³⁴⁵⁶⁷⁸⁹⁻₀₁₂₃₄₅₆₇₈₉") {
		s.paragraph(text.Words(f, words), size, lead, gap)
		return
	}
	for i, line := range wrap(f, size, s.w, words) {
		if i > 0 {
			gap = 0
		}
		s.put(ink{face: f, size: size, text: line}, size*ascent, size*descent, gap, lead)
	}
}

// paragraph adds a paragraph.
func (s *stack) paragraph(p text.Paragraph, size, lead, gap draw.Pt) {
	for i, l := range p.Lines(s.w, text.Style{Size: size, Leading: lead}) {
		if i > 0 {
			gap = 0
		}
		s.put(ink{size: size, line: &l}, max(l.Height, size*ascent), max(l.Depth, size*descent), gap, lead)
	}
}

// right moves the lines from the n-th on to end at a place.
func (s *stack) right(n int, end draw.Pt) {
	for i := n; i < len(s.inks); i++ {
		s.inks[i].x = end - s.inks[i].width()
	}
}

// small keeps the baseline of the last line where it was, for small print below the line a result stands on.
func (s *stack) small(add func()) {
	keep := s.baseline
	if n := len(s.inks); n > 0 && s.bottom-s.baseline > s.inks[n-1].size*(descent+0.1) {
		s.bottom += 2 // clear of a fraction
	}
	add()
	s.baseline = keep
}

// bit is a word of a list of mentions.
type bit struct {
	text, link string
	w          draw.Pt
}

// mentions adds numbers of entries that lead there, after a word, separated by commas.
func (s *stack) mentions(word string, ms []mention, gap draw.Pt) {
	if len(ms) > 0 {
		s.bits(listed(word, ms, false), gap, false)
	}
}

// oneLine adds as many of the numbers as fit on one line, four at most, flush right; dots stand for the others.
func (s *stack) oneLine(word string, ms []mention, gap draw.Pt) {
	if len(ms) == 0 {
		return
	}
	const most = 4
	for n := min(most, len(ms)); n > 0; n-- {
		bits := listed(word, ms[:n], n < len(ms))
		w := draw.Pt(0)
		for i, b := range bits {
			if i > 0 {
				w += blank
			}
			w += b.w
		}
		if w <= s.w || n == 1 {
			s.bits(bits, gap, true)
			return
		}
	}
}

var blank = draw.Width(draw.Serif, tinySize, " ")

func listed(word string, ms []mention, more bool) []bit {
	bits := []bit{{text: word}}
	for i, m := range ms {
		t := m.number
		if i < len(ms)-1 {
			t += ","
		}
		bits = append(bits, bit{text: t, link: m.key})
	}
	if more {
		bits = append(bits, bit{text: "…"})
	}
	for i := range bits {
		bits[i].resize(bits[i].text)
	}
	return bits
}

func (b *bit) resize(text string) { b.text, b.w = text, draw.Width(draw.Serif, tinySize, text) }

func (s *stack) bits(bits []bit, gap draw.Pt, flushRight bool) {
	for start := 0; start < len(bits); {
		end, w := start+1, bits[start].w
		for end < len(bits) && w+blank+bits[end].w <= s.w {
			w += blank + bits[end].w
			end++
		}
		x := draw.Pt(0)
		if flushRight {
			x = s.w - w
		}
		for i, b := range bits[start:end] {
			k := ink{x: x, face: draw.Serif, size: tinySize, text: b.text, link: b.link}
			if i == 0 {
				s.put(k, tinySize*ascent, tinySize*descent, gap, tinyLead)
			} else {
				k.y = s.baseline
				s.inks = append(s.inks, k)
			}
			x += b.w + blank
		}
		gap = 0
		start = end
	}
}
