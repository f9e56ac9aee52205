package diagram

import (
	"slices"

	"soffit/report/draw"
)

// strains draws the strain due to bending from the line of zero, compression to the left, and writes the
// strain of the rows beside it where there is room. It returns where that line is, where the picture ends, and
// whether any strain is written.
func (u *equilibrium) strains(c draw.Canvas, f frame, x, run draw.Pt) (zero, end draw.Pt, written bool) {
	at := func(depth float64) float64 { return u.strain.value * (depth - u.x.value) / u.x.value }
	deepest := u.h.value
	if len(u.rows) > 0 {
		deepest = 0
		for _, r := range u.rows {
			deepest = max(deepest, r.depth.value)
		}
	}
	tension := max(at(deepest), 0)
	per := run / draw.Pt(u.strain.value+tension)
	zero = x + draw.Pt(u.strain.value)*per
	place := func(depth float64) draw.Point {
		return draw.Point{X: zero + draw.Pt(at(depth))*per, Y: u.depthAt(f, depth)}
	}
	bottom, edge := place(deepest), draw.Point{X: zero, Y: u.depthAt(f, 0)}
	if at(deepest) > 0 {
		axis := draw.Point{X: zero, Y: u.axis(f)}
		c.Polygon([]draw.Point{edge, place(0), axis}, draw.Style{Fill: compressed})
	} else {
		c.Polygon([]draw.Point{edge, place(0), bottom, {X: zero, Y: bottom.Y}}, draw.Style{Fill: compressed})
	}
	for _, r := range u.rows {
		p := place(r.depth.value)
		c.Line(zero, p.Y, p.X, p.Y, hair)
	}
	written = u.strainsWritten(c, zero, func(depth float64) draw.Point { return place(depth) })
	c.Polyline([]draw.Point{edge, place(0), bottom}, draw.Style{Stroke: medium})
	c.Line(zero, edge.Y, zero, bottom.Y, medium)
	return zero, x + run, written
}

// strainsWritten writes the strain of bending of each row within the picture of strains, on the side of its line towards the
// compressed edge or, for the deepest, on the other: where no line is in the way. It tells whether it wrote any.
func (u *equilibrium) strainsWritten(c draw.Canvas, zero draw.Pt, place func(depth float64) draw.Point) bool {
	var taken []draw.Box
	var lines placer
	deepest := 0
	for i, r := range u.rows {
		p := place(r.depth.value)
		lines.line([]draw.Point{{X: zero, Y: p.Y}, p})
		if r.depth.value > u.rows[deepest].depth.value {
			deepest = i
		}
	}
	if len(u.rows) == 0 {
		return false
	}
	lines.line([]draw.Point{place(0), place(u.rows[deepest].depth.value)})
	lines.line([]draw.Point{{X: zero, Y: u.axisOf(place)}, {X: zero, Y: place(u.rows[deepest].depth.value).Y}})
	lines.line([]draw.Point{{X: zero - 100, Y: u.axisOf(place)}, {X: zero + 100, Y: u.axisOf(place)}})
	wrote := false
	for i, r := range u.rows {
		p, l := place(r.depth.value), label{}.value(r.bending)
		sides := []draw.Pt{p.Y - 1.5 - l.depth, p.Y + 2 + l.height}
		if u.hogging {
			slices.Reverse(sides)
		}
		for k, base := range sides {
			if k > 0 && i != deepest || p.X <= zero {
				continue
			}
			x := zero + 3
			if k > 0 {
				x = p.X - l.width
			}
			b := l.at(x, base)
			free := b.X1 <= p.X+0.01 && lines.clash(b.Grow(0.8), 1) == 0
			for _, t := range taken {
				free = free && !b.Grow(1).Overlaps(t)
			}
			if free {
				l.draw(c, x, base)
				taken, wrote = append(taken, b), true
				break
			}
		}
	}
	return wrote
}

// axisOf is the height of the neutral axis in the picture of strains.
func (u *equilibrium) axisOf(place func(depth float64) draw.Point) draw.Pt { return place(u.x.value).Y }
