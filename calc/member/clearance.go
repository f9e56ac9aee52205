package member

import (
	"math"

	"soffit/calc/section"
)

// band is what of a section can come within a distance of one height: enough to tell quickly, for many places at that
// height, whether a circle there lies in the concrete.
type band struct {
	y, radius float64
	chords    []chord
	lines     []line
}

// line is part of the surface of the concrete: a straight edge, or what lies at half a width from the axis of a round void.
type line struct {
	a, b section.Point
	half float64
}

// bandAt is the band for circles of a radius at a height above the soffit, mm.
func bandAt(o section.Outline, y, radius float64) band {
	b := band{y: y, radius: radius, chords: o.Chords(y)}
	add := func(l line) {
		if min(l.a.Y, l.b.Y)-l.half <= y+radius && max(l.a.Y, l.b.Y)+l.half >= y-radius {
			b.lines = append(b.lines, l)
		}
	}
	c := o.Contour()
	for _, rings := range [2][]section.Ring{c.Outer, c.Holes} {
		for _, r := range rings {
			for i, p := range r {
				add(line{a: p, b: r[(i+1)%len(r)]})
			}
		}
	}
	for _, v := range c.Voids {
		half := min(v.Width, v.Depth) / 2
		dx, dy := v.Width/2-half, v.Depth/2-half
		add(line{a: section.Point{X: v.X - dx, Y: v.Y - dy}, b: section.Point{X: v.X + dx, Y: v.Y + dy}, half: half})
	}
	return b
}

// holds reports whether a circle at x lies in the concrete.
func (b *band) holds(x float64) bool {
	in := false
	for _, c := range b.chords {
		in = in || c.From < x && x < c.To
	}
	if !in {
		return false
	}
	for _, l := range b.lines {
		if exceeds(b.radius, l.distance(x, b.y)) {
			return false
		}
	}
	return true
}

// distance is that of a point from the line.
func (l line) distance(x, y float64) float64 {
	dx, dy := l.b.X-l.a.X, l.b.Y-l.a.Y
	t := 0.0
	if n := dx*dx + dy*dy; n > 0 {
		t = max(0, min(1, ((x-l.a.X)*dx+(y-l.a.Y)*dy)/n))
	}
	return math.Hypot(x-l.a.X-t*dx, y-l.a.Y-t*dy) - l.half
}
