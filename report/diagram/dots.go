package diagram

import (
	"math"

	"soffit/report/draw"
)

// dots are rows of tendons or bars as they are seen in the section, lengths in mm.
type dots struct {
	count, spacing, level, diameter, debonded, duct, strands, end column
	height                                                        []float64   // of the axes above the soffit
	x                                                             [][]float64 // of each of a row
	bars                                                          bool
}

// dots reads the rows whose roles begin with a prefix, with their heights in the role level (its depths where depth is
// true): count, diameter; either spacing, the row in the middle of the section, or position-x with position-row, the
// number of the row from 0, over the tendons or bars one by one.
func (d *data) dots(prefix, level string, middle float64) dots {
	r := dots{level: d.rows(prefix + level), bars: prefix != ""}
	r.height = r.level.values()
	r.count = d.beside(prefix+"count", r.level)
	r.diameter = d.beside(prefix+"diameter", r.level)
	optional := func(role string) column {
		if d.has(role) {
			return d.beside(role, r.level)
		}
		return column{}
	}
	one := d.has(prefix + "position-x")
	if r.spacing = optional(prefix + "spacing"); !one && r.spacing.len() == 0 {
		d.fail("no entry in role %q or %q", prefix+"spacing", prefix+"position-x")
	}
	if prefix == "" {
		r.debonded, r.duct, r.strands, r.end = optional("debonded"), optional("duct-diameter"), optional("strands"), optional("end-level")
	}
	if d.err != nil {
		return dots{}
	}
	r.x = make([][]float64, r.level.len())
	if !one {
		for i := range r.x {
			for k := range r.number(i) {
				r.x[i] = append(r.x[i], middle+(float64(k)-float64(r.number(i)-1)/2)*r.spacing.cells[i].value)
			}
		}
		return r
	}
	x := d.rows(prefix + "position-x")
	row := d.beside(prefix+"position-row", x)
	for k, v := range x.cells {
		i := int(math.Round(row.cells[k].value))
		if i < 0 || i >= len(r.x) {
			d.fail("role %q: there is no row %d", prefix+"position-row", i)
			return dots{}
		}
		r.x[i] = append(r.x[i], v.value)
	}
	for i := range r.x {
		if d.err == nil && len(r.x[i]) != r.number(i) {
			d.fail("row %s has %d places for %d", r.level.axis.Rows[i], len(r.x[i]), r.number(i))
		}
	}
	return r
}

// number is how many there are in a row.
func (r dots) number(i int) int { return int(math.Round(r.count.cells[i].value)) }

// last is the place of the outermost of a row on the right, mm.
func (r dots) last(i int) float64 {
	x := math.Inf(-1)
	for _, v := range r.x[i] {
		x = max(x, v)
	}
	return x
}

// bare tells whether the tendons of a row are debonded at the ends.
func (r dots) bare(i int) bool { return r.debonded.len() > 0 && r.debonded.cells[i].value > 0 }

// ducted tells whether the tendons of a row lie in ducts.
func (r dots) ducted(i int) bool { return r.duct.len() > 0 && r.duct.cells[i].value > 0 }

// leaves tells whether the tendons of a row lie at another height at the ends.
func (r dots) leaves(i int) bool {
	return r.end.len() > 0 && r.end.cells[i].taken() && math.Abs(r.end.cells[i].value-r.height[i]) > near
}

// radius is that of a tendon, duct or bar of a row on paper, no smaller than can be seen.
func (r dots) radius(f frame, i int) draw.Pt {
	per := min(f.sx, f.sy)
	least, d := draw.Pt(0.8), r.diameter.cells[i].value
	switch {
	case r.bars:
		least = 1.1
	case r.ducted(i):
		least, d = 2, r.duct.cells[i].value
	}
	return max(draw.Pt(d)*per/2, least)
}

// dot draws one tendon or bar: tendons black, in a sheath where they are debonded at the ends and in a ring where they
// lie in ducts, bars as rings.
func (r dots) dot(c draw.Canvas, i int, x, y, radius draw.Pt) {
	switch {
	case r.bars: // the outer edge of the ring is that of the bar
		c.Circle(x, y, max(radius-medium/2, 0.6), draw.Style{Stroke: medium, Fill: draw.White})
	case r.ducted(i):
		c.Circle(x, y, radius-hair/2, draw.Style{Stroke: hair, Fill: draw.White})
		c.Circle(x, y, max(radius/3, 0.8), draw.Style{Fill: draw.Black})
	default:
		c.Circle(x, y, radius, draw.Style{Fill: draw.Black})
		if r.bare(i) {
			c.Circle(x, y, radius+1, draw.Style{Stroke: hair})
		}
	}
}

// ghost draws a tendon where it lies at the ends.
func (r dots) ghost(c draw.Canvas, x, y, radius draw.Pt) {
	c.Circle(x, y, max(radius-hair/2, 0.9), draw.Style{Stroke: hair, Pen: faint, Fill: draw.White})
}

// each calls visit for all that is drawn of the rows, those at the ends first.
func (r dots) each(f frame, visit func(i int, at draw.Point, radius draw.Pt, ghost bool)) {
	for _, ghost := range []bool{true, false} {
		for i, y := range r.height {
			if ghost {
				if !r.leaves(i) {
					continue
				}
				y = r.end.cells[i].value
			}
			radius := r.radius(f, i)
			for _, x := range r.x[i] {
				visit(i, f.at(x, y), radius, ghost)
			}
		}
	}
}

// ink draws all rows.
func (r dots) ink(c draw.Canvas, f frame) {
	r.each(f, func(i int, p draw.Point, radius draw.Pt, ghost bool) {
		if ghost {
			r.ghost(c, p.X, p.Y, radius)
			return
		}
		r.dot(c, i, p.X, p.Y, radius)
	})
}
