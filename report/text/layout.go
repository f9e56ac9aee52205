package text

import (
	"strconv"
	"strings"

	"soffit/report/draw"
)

// Lines sets the narrative in a column.
func (n Narrative) Lines(width draw.Pt, style Style) []Line {
	return stacked(n.blocks, width, style.filled(), false)
}

// Empty tells whether there is nothing in the narrative.
func (n Narrative) Empty() bool { return len(n.blocks) == 0 }

// stacked sets blocks under each other with a gap between them.
func stacked(blocks []block, width draw.Pt, s Style, tight bool) []Line {
	var out []Line
	for i, b := range blocks {
		lines := b.lines(width, s)
		if len(lines) == 0 {
			continue
		}
		if i > 0 {
			lines[0].Before = max(lines[0].Before, s.between(tight))
		}
		out = append(out, lines...)
	}
	return out
}

// between is the distance between blocks, from depth to height of letters.
func (s Style) between(tight bool) draw.Pt {
	d := s.Leading - (ascent+descent)*s.Size
	if !tight {
		d += s.Gap
	}
	return d
}

func (p prose) lines(width draw.Pt, s Style) []Line { return p.Paragraph.Lines(width, s) }

func (h *heading) lines(width draw.Pt, s Style) []Line {
	scale := []draw.Pt{1.35, 1.15, 1}[min(max(h.level-1, 0), 2)]
	big := s
	big.Size, big.Leading = s.Size*scale, s.Leading*scale
	out := h.text.Lines(width, big)
	for i := range out {
		out[i].Keep = true
	}
	if len(out) > 0 {
		out[0].Before = s.between(false) + 0.5*s.Leading
	}
	return out
}

// moved shifts lines to the right.
func moved(lines []Line, by draw.Pt) []Line {
	for i := range lines {
		inner := lines[i].draw
		lines[i].Width += by
		if inner != nil {
			lines[i].draw = func(c draw.Canvas, x, y draw.Pt) { inner(c, x+by, y) }
		}
	}
	return lines
}

func (l *list) lines(width draw.Pt, s Style) []Line {
	widest := "•"
	if l.ordered {
		widest = strconv.Itoa(l.start+len(l.items)-1) + "."
	}
	indent := draw.Width(draw.Serif, s.Size, widest) + 0.55*s.Size
	var out []Line
	for i, item := range l.items {
		lines := moved(stacked(item, width-indent, s, l.tight), indent)
		if len(lines) == 0 {
			lines = []Line{newLine(nil, s, nil)}
		}
		mark := "•"
		if l.ordered {
			mark = strconv.Itoa(l.start+i) + "."
		}
		end := indent - 0.55*s.Size
		inner := lines[0].draw
		lines[0].draw = func(c draw.Canvas, x, y draw.Pt) {
			draw.TextRight(c, x+end, y, draw.Serif, s.Size, mark)
			inner(c, x, y)
		}
		if i > 0 {
			lines[0].Before = max(lines[0].Before, s.between(l.tight))
		}
		out = append(out, lines...)
	}
	return out
}

func (q *quote) lines(width draw.Pt, s Style) []Line {
	by := 1.5 * s.Size
	return moved(stacked(q.blocks, width-2*by, s, false), by)
}

func (l *listing) lines(width draw.Pt, s Style) []Line {
	return Listing(l.text, width, Style{Size: 0.8 * s.Size, Leading: 0.96 * s.Leading})
}

func (line) lines(width draw.Pt, s Style) []Line {
	return []Line{{Height: 0.25 * s.Size, Depth: 0.25 * s.Size, Width: width, draw: func(c draw.Canvas, x, y draw.Pt) {
		c.Line(x, y, x+width, y, 0.4)
	}}}
}

// Listing sets text as it is in the typewriter face. A line that is too long goes on in the next, after
// an arrow.
func Listing(text []string, width draw.Pt, style Style) []Line {
	style = style.filled()
	const on = "↪ "
	var out []Line
	put := func(s string) {
		l := newLine([]item{{text: s, face: draw.Marks, size: style.Size, width: draw.Width(draw.Marks, style.Size, s),
			up: ascent * style.Size, down: descent * style.Size}}, style, last(out))
		if s == "" {
			l.draw = nil
		}
		out = append(out, l)
	}
	for _, s := range text {
		s = expanded(strings.ToValidUTF8(s, "\uFFFD"))
		for first := true; ; first = false {
			lead := ""
			if !first {
				lead = on
			}
			if draw.Width(draw.Marks, style.Size, lead+s) <= width {
				put(lead + s)
				break
			}
			n := fitting(draw.Marks, style.Size, s, width-draw.Width(draw.Marks, style.Size, lead))
			if n == 0 {
				put(lead + s)
				break
			}
			if i := strings.LastIndexByte(s[:n], ' ') + 1; i > n*2/3 { // behind a blank near the end
				n = i
			}
			put(lead + s[:n])
			s = s[n:]
		}
	}
	return out
}

// expanded has blanks instead of tabs.
func expanded(s string) string {
	var b []rune
	for _, r := range s {
		if r != '\t' {
			b = append(b, r)
			continue
		}
		for b = append(b, ' '); len(b)%4 != 0; {
			b = append(b, ' ')
		}
	}
	return string(b)
}
