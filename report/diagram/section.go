package diagram

import (
	"cmp"
	"math"
	"slices"

	"soffit/report/draw"
)

// section draws a cross-section to scale with its dimensions and the rows of tendons and bars.
//
// Roles: height, lower, upper (parts from the soffit up, trapezoids; mm); count, spacing, level (of the
// axes above the soffit; mm), diameter (mm) over the rows of tendons; optional bar-count, bar-spacing,
// bar-level, bar-diameter over the rows of bars, debonded (length from each end) over the rows of tendons,
// depth (the whole depth as the record has it) and centroid (above the soffit).
func section(d *data, width draw.Pt) *tape {
	s := crossSection{parts: d.parts(), tendons: d.dots("", "debonded"), centroid: -1}
	if d.has("bar-count") {
		s.bars = d.dots("bar-", "")
	}
	if d.has("centroid") {
		s.axis = d.one("centroid")
		s.centroid = s.axis.value
	}
	if d.has("depth") {
		s.whole = d.one("depth")
	}
	if d.err != nil {
		return nil
	}
	beside, t := s.fitted(width, true)
	if below, u := s.fitted(width, false); beside > below && draw.Pt(s.parts.depth())*beside.per() < 110 {
		return u
	}
	return t
}

// fitted draws the section at the largest scale that fits, its rows listed beside or below it.
func (s *crossSection) fitted(width draw.Pt, beside bool) (scale, *tape) {
	const tallest draw.Pt = 250
	s.beside = beside
	at := max(fit(s.parts.depth(), tallest), fit(s.parts.widest(), width))
	for {
		t := &tape{}
		s.draw(t, at)
		next, more := at.smaller()
		if t.ink.Width() <= width || !more {
			return at, t
		}
		at = next
	}
}

// dots are rows of tendons or bars as they are seen in the section. Height is that of the axes above the
// soffit, mm.
type dots struct {
	count, spacing, level, diameter, debonded column
	height                                    []float64
	bars                                      bool
}

// dots reads the rows whose roles begin with a prefix.
func (d *data) dots(prefix, debonded string) dots {
	r := dots{level: d.rows(prefix + "level"), bars: prefix != ""}
	r.height = r.level.values()
	r.count = d.beside(prefix+"count", r.level)
	r.spacing = d.beside(prefix+"spacing", r.level)
	r.diameter = d.beside(prefix+"diameter", r.level)
	if debonded != "" && d.has(debonded) {
		r.debonded = d.beside(debonded, r.level)
	}
	return r
}

// number is how many there are in a row.
func (r dots) number(i int) int { return int(math.Round(r.count.cells[i].value)) }

// x is the place of one of a row, mm from the axis of symmetry.
func (r dots) x(i, k int) float64 {
	return (float64(k) - float64(r.number(i)-1)/2) * r.spacing.cells[i].value
}

// last is the place of the last of a row, mm.
func (r dots) last(i int) float64 { return r.x(i, r.number(i)-1) }

// dot draws one tendon or bar: tendons black, in a sheath where they are debonded at the ends, bars as rings.
func (r dots) dot(c draw.Canvas, i int, x, y, radius draw.Pt) {
	if r.bars {
		// The outer edge of the ring is that of the bar.
		c.Circle(x, y, max(radius-medium/2, 0.6), draw.Style{Stroke: medium, Fill: draw.White})
		return
	}
	c.Circle(x, y, radius, draw.Style{Fill: draw.Black})
	if r.bare(i) {
		c.Circle(x, y, radius+1, draw.Style{Stroke: hair})
	}
}

// bare tells whether the tendons of a row are debonded at the ends.
func (r dots) bare(i int) bool { return r.debonded.len() > 0 && r.debonded.cells[i].value > 0 }

// ink draws all rows.
func (r dots) ink(c draw.Canvas, f frame) {
	least := draw.Pt(0.8)
	if r.bars {
		least = 1.1
	}
	for i := range r.height {
		radius := max(draw.Pt(r.diameter.cells[i].value)*min(f.sx, f.sy)/2, least)
		for k := range r.number(i) {
			p := f.at(r.x(i, k), r.height[i])
			r.dot(c, i, p.X, p.Y, radius)
		}
	}
}

// crossSection is what the drawing of a section shows.
type crossSection struct {
	parts         parts
	tendons, bars dots
	axis, whole   cell
	centroid      float64 // above the soffit, −1 if not shown
	beside        bool    // the listing of the rows, else it stands below
}

func (s *crossSection) draw(c draw.Canvas, at scale) {
	f := frame{sx: at.per(), sy: at.per()}
	c.Polygon(s.parts.outline(f, 0, s.parts.depth()), draw.Style{Stroke: outline, Fill: concrete})
	edge := draw.Pt(s.parts.widest()) / 2 * f.sx
	if s.centroid >= 0 {
		y := f.at(0, s.centroid).Y
		c.Line(-edge-4, y, edge+6, y, hair, chain...)
	}
	s.tendons.ink(c, f)
	s.bars.ink(c, f)
	s.heights(c, f, -edge-8)
	bottom := s.widths(c, f)
	y := bottom + size + 6
	words("section "+at.String()+", lengths in mm").centre(c, 0, y)
	l := s.rows(f)
	if s.beside {
		l.draw(c, edge+7)
		return
	}
	l.names().draw(c, edge+7)
	l.below(c, -edge-8, y+16)
}

// heights draws the depths of the parts left of the section, and the whole depth left of them.
func (s *crossSection) heights(c draw.Canvas, f frame, x draw.Pt) {
	levels := s.parts.levels()
	n := len(levels) - 1
	single := n == 1 && !s.whole.taken()
	if n > 1 || single {
		y, ls := make([]draw.Pt, n+1), make([]label, n)
		for i, v := range levels {
			y[n-i] = f.at(0, v).Y
			w := s.parts.width(v)
			if i > 0 { // the wider of the two parts that meet
				w = max(w, s.parts.upper.cells[i-1].value)
			}
			extendLeft(c, y[n-i], f.at(-w/2, v).X, x)
		}
		for i, h := range s.parts.height.cells {
			ls[n-1-i] = label{}.length(h)
		}
		left, inside := stack(c, x, y, ls)
		if single || !s.whole.taken() {
			return
		}
		x = left - 6
		if !inside { // the figures between reach past the ends
			top, bottom := f.at(0, s.parts.depth()).Y, f.y
			c.Line(x-beyond, top, x+4, top, hair)
			c.Line(x-beyond, bottom, x+4, bottom, hair)
			stack(c, x, []draw.Pt{top, bottom}, []label{label{}.length(s.whole)})
			return
		}
	}
	top, bottom := f.at(0, s.parts.depth()).Y, f.y
	extendLeft(c, top, f.at(-s.parts.width(s.parts.depth())/2, 0).X, x)
	extendLeft(c, bottom, f.at(-s.parts.width(0)/2, 0).X, x)
	stack(c, x, []draw.Pt{top, bottom}, []label{label{}.length(s.whole)})
}

// widths draws the width at the top above the section, that at the soffit below it, those of corners that
// are seen from above or below outside of them, and others where they are. It returns the lowest ink.
func (s *crossSection) widths(c draw.Canvas, f frame) draw.Pt {
	n := s.parts.height.len()
	levels := s.parts.levels()
	type width struct {
		cell
		level float64
	}
	top, bottom := width{s.parts.upper.cells[n-1], levels[n]}, width{s.parts.lower.cells[0], 0}
	over, under := []width{top}, []width{bottom}
	if n == 1 && bottom.value == top.value {
		under = nil
	}
	done := map[float64]bool{top.value: true, bottom.value: true}
	for i := range n {
		lower, upper := s.parts.lower.cells[i], s.parts.upper.cells[i]
		if lower.value == upper.value && !done[lower.value] {
			done[lower.value] = true
			s.within(c, f, lower, levels[i], levels[i+1])
		}
	}
	for i := range n { // widths that a slope ends in
		for k, w := range []width{{s.parts.lower.cells[i], levels[i]}, {s.parts.upper.cells[i], levels[i+1]}} {
			switch {
			case done[w.value]:
				continue
			case s.widestIn(0, i+k) <= w.value:
				under = append(under, w)
			case s.widestIn(i+k, n) <= w.value:
				over = append(over, w)
			default:
				s.within(c, f, w.cell, w.level, w.level)
			}
			done[w.value] = true
		}
	}
	nested := func(ws []width, y, dy draw.Pt) draw.Pt {
		slices.SortFunc(ws, func(a, b width) int { return cmp.Compare(a.value, b.value) })
		for i, w := range ws {
			x := draw.Pt(w.value) / 2 * f.sx
			for _, v := range []draw.Pt{-x, x} {
				extendDown(c, v, f.at(0, w.level).Y, y)
			}
			past := x
			if i+1 < len(ws) {
				past = draw.Pt(ws[len(ws)-1].value) / 2 * f.sx
			}
			acrossPast(c, -x, x, y, label{}.length(w.cell), 1, past)
			y += dy
		}
		return y - dy
	}
	nested(over, f.at(0, levels[n]).Y-10, -14)
	if len(under) == 0 {
		return f.y
	}
	return nested(under, f.y+18, 14) + beyond
}

// widestIn is the greatest width of the parts from one to before another, 0 for none.
func (s *crossSection) widestIn(from, to int) float64 {
	var w float64
	for i := from; i < to; i++ {
		w = max(w, s.parts.lower.cells[i].value, s.parts.upper.cells[i].value)
	}
	return w
}

// within dimensions the width of a part inside the section, where tendons, bars and the centroid leave most
// room between the heights y0 and y1. Where that is too little the figures stand left of the part, clear of
// the centroid alone.
func (s *crossSection) within(c draw.Canvas, f frame, w cell, y0, y1 float64) {
	var axes, rows []float64
	if s.centroid >= 0 {
		axes = append(axes, s.centroid)
	}
	for _, r := range []dots{s.tendons, s.bars} {
		rows = append(rows, r.height...)
	}
	up := float64((size/2 + clearance) / f.sy) // from the line to the middle of its figures
	freest := func(of ...float64) (best, room float64) {
		best, room = (y0+y1)/2, -1
		const tries = 24
		for i := 1; i < tries; i++ {
			y := y0 + (y1-y0)*float64(i)/tries
			r := min(y+up-y0, y1-y-up)
			for _, t := range of {
				r = min(r, math.Abs(t-y-up))
			}
			if r > room+1e-9 {
				best, room = y, r
			}
		}
		return best, room
	}
	const least = size/2 + 3 // from the middle of the figures to an axis of tendons
	x := draw.Pt(w.value) / 2 * f.sx
	y, room := freest(append(rows, axes...)...)
	if draw.Pt(room)*f.sy < least {
		y, _ = freest(axes...)
		acrossOutside(c, -x, x, f.at(0, y).Y, label{}.length(w), -1, x)
		return
	}
	across(c, -x, x, f.at(0, y).Y, label{}.length(w), -1)
}

// rows lists the rows of tendons and bars, and names the centroid.
func (s *crossSection) rows(f frame) listing {
	l := listing{floor: f.y + 6, heads: []label{words("row"), words("number × Ø"), words("spacing"), words("height")}}
	loose := false
	for _, r := range []dots{s.tendons, s.bars} {
		for i := range r.level.cells {
			loose = loose || r.bare(i)
		}
	}
	if loose {
		l.heads = append(l.heads, words("debonded"))
	}
	for _, r := range []dots{s.tendons, s.bars} {
		for i, v := range r.level.cells {
			p := f.at(r.last(i), v.value)
			radius := max(draw.Pt(r.diameter.cells[i].value)*f.sx/2, 0.8)
			times := label{}.number(r.count.cells[i]).say(draw.Serif, " × Ø").length(r.diameter.cells[i])
			e := listed{from: p.X + radius + clearance, y: p.Y, name: r.level.axis.Rows[i], columns: []entry{
				{times, label{}.number(r.count.cells[i]).width}, dash(r.number(i) > 1, r.spacing.cells[i]), lengths(v)}}
			e.mark = func(c draw.Canvas, x, y draw.Pt) { r.dot(c, i, x, y, 1.5) }
			if r.bare(i) {
				e.columns = append(e.columns, entry{label{}.value(r.debonded.cells[i]), beforePoint(r.debonded.cells[i])})
			}
			l.lines = append(l.lines, e)
		}
	}
	if s.centroid >= 0 {
		note := words("centroid ").equals(s.axis)
		l.lines = append(l.lines, listed{from: f.at(s.parts.widest()/2, 0).X + 6, y: f.at(0, s.centroid).Y, remark: &note})
	}
	return l
}

// lengths is a length in its column.
func lengths(c cell) entry { return entry{label{}.length(c), beforePoint(c)} }

// dash is a length or, where there is none to show, nothing.
func dash(ok bool, c cell) entry {
	if ok {
		return lengths(c)
	}
	return text("")
}
