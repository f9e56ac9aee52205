package section

import (
	"math"
	"sort"
)

// level is the part of the depth within which levels are one.
const level = 1e-11

// band is the straight-sided part of a round: a rectangle between two levels.
type band struct{ from, to, width float64 }

// split takes a round apart: the rectangle between its half circles, of width 0 if it is a circle, and its
// half circles. Those of a level one make up the width of one circle.
func (r Round) split(snap func(float64) float64) (band, []Curve) {
	rad := r.radius()
	if r.Depth > r.Width {
		c := r.core()
		from, to := snap(c.a.Y), snap(c.b.Y)
		return band{from, to, r.Width}, []Curve{{Radius: rad, Level: from, Half: Lower, Count: 1}, {Radius: rad, Level: to, Half: Upper, Count: 1}}
	}
	return band{snap(r.Y - rad), snap(r.Y + rad), r.Width - r.Depth}, []Curve{{Radius: rad, Level: r.Y, Count: 1}}
}

// decompose cuts a contour at the level of each corner, each end of a round and each end of its straight
// sides, into strips of the total width between, and lists the round parts. x is measured from middle.
func decompose(c Contour, middle, height, width float64) (Shape, error) {
	levels := c.levels(height)
	snap := func(y float64) float64 {
		i := sort.SearchFloat64s(levels, y)
		if i == len(levels) || i > 0 && y-levels[i-1] < levels[i]-y {
			i--
		}
		return levels[i]
	}
	var bands []band // negative for voids
	var curves []Curve
	for _, k := range []struct {
		rounds []Round
		solid  bool
	}{{c.Voids, false}, {c.Discs, true}} {
		for _, r := range k.rounds {
			b, half := r.split(snap)
			if !k.solid {
				b.width = -b.width
			}
			bands = append(bands, b)
			for _, h := range half {
				h.Solid = k.solid
				curves = counted(curves, h)
			}
		}
	}
	var sides []side
	for _, rings := range [2][]Ring{c.Outer, c.Holes} {
		for _, r := range rings {
			for _, e := range r.edges() {
				e.a.Y, e.b.Y = snap(e.a.Y), snap(e.b.Y)
				if e.a.Y != e.b.Y {
					sides = append(sides, sideOf(e, middle))
				}
			}
		}
	}
	strips := make([]Strip, len(levels)-1)
	for i := range strips {
		from, to := levels[i], levels[i+1]
		t := Strip{Height: to - from}
		for _, s := range sides {
			if s.from <= from && s.to >= to {
				t.Bottom += s.sign * s.at(from)
				t.Top += s.sign * s.at(to)
			}
		}
		for _, b := range bands {
			if b.from <= from && b.to >= to {
				t.Bottom += b.width
				t.Top += b.width
			}
		}
		t.Bottom, t.Top = tidy(t.Bottom, width), tidy(t.Top, width)
		strips[i] = t
	}
	s := assemble(strips, levels, curves)
	for i := range strips {
		if y := (levels[i] + levels[i+1]) / 2; !(s.width(i, y, true) > 0) {
			return Shape{}, &Refusal{Reason: Parted, Corner: -1, OtherCorner: -1, Have: levels[i], Limit: levels[i+1]}
		}
	}
	return s, nil
}

// levels are all at which the straight width may have a corner or jump, upward from 0 to the height; those
// that differ by rounding are one.
func (c Contour) levels(height float64) []float64 {
	all := []float64{0, height}
	for _, rings := range [2][]Ring{c.Outer, c.Holes} {
		for _, r := range rings {
			for _, p := range r {
				all = append(all, p.Y)
			}
		}
	}
	for _, r := range c.Voids {
		switch core := r.core(); {
		case r.Depth > r.Width:
			all = append(all, core.a.Y, core.b.Y)
		case r.Width > r.Depth:
			all = append(all, r.Y-r.Depth/2, r.Y+r.Depth/2)
		}
	}
	for _, r := range c.Discs {
		all = append(all, r.Y-r.Depth/2, r.Y+r.Depth/2)
		if core := r.core(); r.Depth > r.Width {
			all = append(all, core.a.Y, core.b.Y)
		}
	}
	levels := []float64{0}
	for _, y := range sorted(all) {
		if last := len(levels) - 1; y-levels[last] > level*height {
			levels = append(levels, y)
		}
	}
	return levels
}

// side is an edge of a ring as a side of strips: concrete to its left where it runs up an outer ring. sign is
// +1 for the right-hand side of concrete, −1 for the left-hand one.
type side struct{ from, to, x1, x2, sign float64 }

func sideOf(e edge, middle float64) side {
	if e.a.Y < e.b.Y {
		return side{e.a.Y, e.b.Y, e.a.X - middle, e.b.X - middle, 1}
	}
	return side{e.b.Y, e.a.Y, e.b.X - middle, e.a.X - middle, -1}
}

func (s side) at(y float64) float64 {
	switch y {
	case s.from:
		return s.x1
	case s.to:
		return s.x2
	}
	return s.x1 + (s.x2-s.x1)*((y-s.from)/(s.to-s.from))
}

// counted adds a curve to the list: to the count of its equal, if there is one.
func counted(list []Curve, c Curve) []Curve {
	for i, k := range list {
		if k.Radius == c.Radius && k.Level == c.Level && k.Half == c.Half && k.Solid == c.Solid {
			list[i].Count++
			return list
		}
	}
	return append(list, c)
}

// tidy takes what rounding leaves of a width for 0.
func tidy(w, whole float64) float64 {
	if math.Abs(w) < 1e-12*whole {
		return 0
	}
	return w
}
