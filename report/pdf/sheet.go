package pdf

import (
	"fmt"
	"math"

	"soffit/fonts"
	"soffit/report/draw"
)

// Sheet is one sheet of a Document; it is a draw.Canvas.
type Sheet struct {
	number  int
	body    []byte
	used    [fonts.Count]runeSet
	links   []draw.LinkArea
	anchors []draw.AnchorPoint
	errs    []error
	owner   string

	face  int // the font in force, −1 for none: stored + 1 so that the zero Sheet has none
	size  draw.Pt
	width draw.Pt // of lines
	dash  bool
	fill  float64 // tones in force; black at the start
	pen   float64
}

var _ draw.Canvas = (*Sheet)(nil)

// Number of the sheet, from 1.
func (s *Sheet) Number() int { return s.number }

// Owner labels the following ink in errors.
func (s *Sheet) Owner(label string) { s.owner = label }

// Text sets text.
func (s *Sheet) Text(x, y draw.Pt, f draw.Face, size draw.Pt, text string) {
	s.text(x, y, f, size, text, false)
}

// TextUp sets text that reads upwards.
func (s *Sheet) TextUp(x, y draw.Pt, f draw.Face, size draw.Pt, text string) {
	s.text(x, y, f, size, text, true)
}

// text writes one text object: strings of one face each, shown with the kerning of the face.
func (s *Sheet) text(x, y draw.Pt, f draw.Face, size draw.Pt, text string, up bool) {
	if text == "" {
		return
	}
	s.tone(&s.fill, 0, 'g')
	s.body = append(s.body, "BT "...)
	if up {
		s.body = append(s.body, "0 1 -1 0 "...)
		s.point(x, y)
		s.body = append(s.body, "Tm "...)
	} else {
		s.point(x, y)
		s.body = append(s.body, "Td "...)
	}
	open, kerned := false, false
	var end float64 // where the last glyph's advance ends, at size 1
	start := 0      // of the string being shown
	draw.Glyphs(f, text, func(r rune, face draw.Face, at float64, g *fonts.Glyph) {
		if !g.Has {
			s.missing(r, text)
			return
		}
		if s.face != int(face)+1 || s.size != size {
			if open {
				s.show(start, kerned)
			}
			open, kerned = false, false
			s.font(face, size)
		}
		if !open {
			start = len(s.body)
			s.body = append(s.body, '(')
			open = true
		} else if k := math.Round((end - at) * 1000); k != 0 {
			s.body = append(s.body, ')')
			s.body = appendInt(s.body, int64(k))
			s.body = append(s.body, '(')
			kerned = true
		}
		s.body = appendRune(s.body, r)
		s.used[face].set(r)
		end = at + g.Advance
	})
	if open {
		s.show(start, kerned)
	}
	s.body = append(s.body, "ET\n"...)
}

// show ends the string which starts at start; with kerning in it, it becomes an array.
func (s *Sheet) show(start int, kerned bool) {
	if !kerned {
		s.body = append(s.body, ")Tj "...)
		return
	}
	s.body = append(s.body, 0)
	copy(s.body[start+1:], s.body[start:])
	s.body[start] = '['
	s.body = append(s.body, ")]TJ "...)
}

func (s *Sheet) font(face draw.Face, size draw.Pt) {
	s.body = append(s.body, "/F"...)
	s.body = append(s.body, '0'+byte(face), ' ')
	s.body = appendFixed(s.body, float64(size))
	s.body = append(s.body, " Tf "...)
	s.face, s.size = int(face)+1, size
}

func (s *Sheet) missing(r rune, text string) {
	where := ""
	if s.owner != "" {
		where = " of " + s.owner
	}
	s.errs = append(s.errs, fmt.Errorf("pdf: sheet %d: no glyph for %q (U+%04X) in text %q%s", s.number, r, r, text, where))
}

// Hidden sets invisible text.
func (s *Sheet) Hidden(x, y, size draw.Pt, text string) {
	s.body = append(s.body, "3 Tr\n"...)
	s.text(x, y, draw.Serif, size, text, false)
	s.body = append(s.body, "0 Tr\n"...)
}

// Line draws a line.
func (s *Sheet) Line(x1, y1, x2, y2, width draw.Pt, dash ...draw.Pt) {
	s.strokeState(draw.Style{Stroke: width, Dash: dash})
	s.point(x1, y1)
	s.body = append(s.body, "m "...)
	s.point(x2, y2)
	s.body = append(s.body, "l S\n"...)
}

// Rect draws a rectangle.
func (s *Sheet) Rect(x, y, w, h draw.Pt, style draw.Style) {
	if !s.state(style) {
		return
	}
	s.point(x, y+h)
	s.body = appendFixed(s.body, float64(w))
	s.body = append(s.body, ' ')
	s.body = appendFixed(s.body, float64(h))
	s.body = append(s.body, " re "...)
	s.paint(style, true)
}

// Polygon draws a closed shape.
func (s *Sheet) Polygon(pts []draw.Point, style draw.Style) {
	if len(pts) == 0 || !s.state(style) {
		return
	}
	s.points(pts)
	s.body = append(s.body, "h "...)
	s.paint(style, true)
}

// Polyline draws an open line.
func (s *Sheet) Polyline(pts []draw.Point, style draw.Style) {
	if len(pts) == 0 || !s.state(style) {
		return
	}
	s.points(pts)
	s.paint(style, false)
}

func (s *Sheet) points(pts []draw.Point) {
	for i, p := range pts {
		s.point(p.X, p.Y)
		if i == 0 {
			s.body = append(s.body, "m "...)
		} else {
			s.body = append(s.body, "l "...)
		}
	}
}

// Circle draws a circle as four Bézier curves.
func (s *Sheet) Circle(x, y, r draw.Pt, style draw.Style) {
	const k = 0.5522847498
	c := k * r
	s.Path(draw.Path{}.MoveTo(x+r, y).
		CurveTo(x+r, y+c, x+c, y+r, x, y+r).
		CurveTo(x-c, y+r, x-r, y+c, x-r, y).
		CurveTo(x-r, y-c, x-c, y-r, x, y-r).
		CurveTo(x+c, y-r, x+r, y-c, x+r, y).Close(), style)
}

// Path draws an outline.
func (s *Sheet) Path(p draw.Path, style draw.Style) {
	if len(p) == 0 || !s.state(style) {
		return
	}
	for _, g := range p {
		switch g.Kind {
		case draw.Move:
			s.point(g.P.X, g.P.Y)
			s.body = append(s.body, "m "...)
		case draw.LineTo:
			s.point(g.P.X, g.P.Y)
			s.body = append(s.body, "l "...)
		case draw.CurveTo:
			s.point(g.A.X, g.A.Y)
			s.point(g.B.X, g.B.Y)
			s.point(g.P.X, g.P.Y)
			s.body = append(s.body, "c "...)
		case draw.Close:
			s.body = append(s.body, "h "...)
		}
	}
	s.paint(style, false)
}

// Link makes an area lead to an anchor.
func (s *Sheet) Link(x, y, w, h draw.Pt, anchor string) {
	s.links = append(s.links, draw.LinkArea{Box: draw.BoxAt(x, y, w, h), Anchor: anchor, Owner: s.owner})
}

// Anchor names a place.
func (s *Sheet) Anchor(name string, x, y draw.Pt) {
	s.anchors = append(s.anchors, draw.AnchorPoint{Name: name, At: draw.Point{X: x, Y: y}})
}

// state sets tones, width and dash for a style; false if it draws nothing.
func (s *Sheet) state(style draw.Style) bool {
	level, filled := style.Fill.Level()
	if filled {
		s.tone(&s.fill, level, 'g')
	}
	if style.Stroke > 0 {
		s.strokeState(style)
	}
	return filled || style.Stroke > 0
}

func (s *Sheet) strokeState(style draw.Style) {
	level, _ := style.Pen.Level()
	s.tone(&s.pen, level, 'G')
	if s.width != style.Stroke {
		s.width = style.Stroke
		s.body = appendFixed(s.body, float64(style.Stroke))
		s.body = append(s.body, " w\n"...)
	}
	if len(style.Dash) == 0 && !s.dash {
		return
	}
	s.dash = len(style.Dash) > 0
	s.body = append(s.body, '[')
	for i, d := range style.Dash {
		if i > 0 {
			s.body = append(s.body, ' ')
		}
		s.body = appendFixed(s.body, float64(d))
	}
	s.body = append(s.body, "] 0 d\n"...)
}

func (s *Sheet) tone(now *float64, level float64, op byte) {
	if *now == level {
		return
	}
	*now = level
	s.body = appendFixed(s.body, level)
	s.body = append(s.body, ' ', op, '\n')
}

func (s *Sheet) paint(style draw.Style, closed bool) {
	_, filled := style.Fill.Level()
	switch {
	case filled && style.Stroke > 0:
		s.body = append(s.body, "B\n"...)
	case filled:
		s.body = append(s.body, "f\n"...)
	case closed:
		s.body = append(s.body, "s\n"...)
	default:
		s.body = append(s.body, "S\n"...)
	}
}

// point writes a place, y turned to run up from the sheet's foot as PDF has it.
func (s *Sheet) point(x, y draw.Pt) {
	s.body = appendFixed(s.body, float64(x))
	s.body = append(s.body, ' ')
	s.body = appendFixed(s.body, float64(draw.SheetHeight-y))
	s.body = append(s.body, ' ')
}
