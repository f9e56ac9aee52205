package diagram

import (
	"math"
	"slices"

	"soffit/report/draw"
)

// forces draws the forces on the part left of a cut: compression towards it, tension away from it, lengths
// in proportion; the lever arms on one line from the force in the block; and the listing.
func (u *equilibrium) forces(c draw.Canvas, f frame, x, run draw.Pt, in layout) {
	greatest := math.Abs(u.force.value)
	for _, r := range u.rows {
		greatest = max(greatest, math.Abs(r.force.value))
	}
	length := func(v float64) draw.Pt { return max(run*draw.Pt(math.Abs(v)/greatest), 2) }
	c.Line(x, 0, x, f.y, medium)
	line := x + run + 8
	origin := u.depthAt(f, u.centroid.value)
	first, last := origin, origin
	force := func(y, l draw.Pt, compression bool) {
		if compression {
			arrow(c, x+l, y, x, y, outline, 5)
		} else {
			arrow(c, x, y, x+l, y, outline, 5)
		}
		if x+l+clearance < line {
			c.Line(x+l+clearance, y, line, y, hair)
		}
	}
	force(origin, length(u.force.value), true)
	at := u.separated(f, origin)
	for i, r := range u.rows {
		force(at[i], length(r.force.value), r.force.value < 0)
		first, last = min(first, at[i]), max(last, at[i])
	}
	c.Line(line, first, line, last, hair)
	for i := range u.rows {
		ticks(c, line, at[i])
	}
	if len(u.rows) > 0 { // the symbol where the line is free for longest
		ends := []draw.Pt{origin}
		for _, y := range at {
			if (y-origin)*u.down() > 0 {
				ends = append(ends, y)
			}
		}
		slices.Sort(ends)
		var free, mid draw.Pt
		for i := 1; i < len(ends); i++ {
			if d := ends[i] - ends[i-1]; d > free {
				free, mid = d, (ends[i]+ends[i-1])/2
			}
		}
		if free > 20 {
			label{}.symbol(u.rows[0].lever.line.Symbol).right(c, line-3, mid+middle)
		}
	}
	c.Circle(line, origin, 1.6, draw.Style{Stroke: hair, Fill: draw.White})
	l := u.listing(f, line)
	for i := range u.rows {
		l.lines[i].y = at[i]
	}
	thrust := label{}.symbol(u.force.line.Symbol)
	if in == narrow {
		l = l.names()
	} else {
		thrust = label{}.equals(u.force).say(draw.Serif, " at ").equals(u.centroid)
		moment := label{}.equals(u.resistance)
		l.lines = append(l.lines, listed{free: true, y: max(f.y, slices.Max(append(at, 0))) + 6, remark: &moment})
	}
	l.lines = append(l.lines, listed{from: line + 2, y: origin, remark: &thrust})
	l.draw(c, line+5)
}

// separated are the heights of the forces of the rows, moved apart where their arrows would lie on each other or on
// that of the block.
func (u *equilibrium) separated(f frame, origin draw.Pt) []draw.Pt {
	out := make([]draw.Pt, len(u.rows))
	for _, over := range []bool{true, false} {
		var at, room []draw.Pt
		var of []int
		for i, r := range u.rows {
			if y := u.depthAt(f, r.depth.value); (y < origin) == over {
				at, room, of = append(at, y), append(room, forcesApart), append(of, i)
			}
		}
		to := spread(at, room, origin+forcesApart/2, f.y+2)
		if over {
			to = spread(at, room, -8, origin-forcesApart/2)
		}
		for k, i := range of {
			out[i] = to[k]
		}
	}
	return out
}
