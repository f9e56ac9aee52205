package diagram

import (
	"cmp"
	"slices"

	"soffit/report/draw"
)

// fibre is a strip of the concrete: its height above the soffit and the stress in it, compression positive.
type fibre struct {
	level  float64 // mm
	stress cell
}

// curve reads the stress over the depth of the section, from the soffit up. A fibre without a stress has none.
func (d *data) curve(s *shape) []fibre {
	level := d.rows("fibre-level")
	if d.err != nil {
		return nil
	}
	stress := d.over("fibre-stress", level.axis, d.place())
	var out []fibre
	for i, v := range level.cells {
		if v.value < 0 || v.value > s.total() {
			d.fail("fibre %s lies at %s outside the section", level.axis.Rows[i], v.shown)
			return nil
		}
		out = append(out, fibre{v.value, stress.cells[i]})
	}
	slices.SortStableFunc(out, func(a, b fibre) int { return cmp.Compare(a.level, b.level) })
	if len(out) < 2 {
		d.fail("role \"fibre-level\": needs two fibres at least")
		return nil
	}
	return out
}

// greatest is the stress that the picture of stress is as wide as.
func (u *equilibrium) greatest() cell {
	if u.stress.taken() {
		return u.stress
	}
	best := u.curve[0].stress
	for _, k := range u.curve {
		if k.stress.value > best.value {
			best = k.stress
		}
	}
	return best
}

// stresses draws the stress in the concrete: the block with its depth, or the curve. It returns where the picture ends.
func (u *equilibrium) stresses(c draw.Canvas, f frame, x draw.Pt, in layout) draw.Pt {
	y0 := u.depthAt(f, 0)
	if u.curve != nil {
		u.drawCurve(c, f, x)
		c.Line(x, 0, x, f.y, medium)
		return x + blockRun
	}
	low := u.depthAt(f, min(u.block.value, u.h.value))
	c.Rect(x, min(y0, low), blockRun, max(y0, low)-min(y0, low), draw.Style{Stroke: medium, Fill: compressed})
	c.Line(x, 0, x, f.y, medium)
	at := x + blockRun + 6
	extendLeft(c, y0, x+blockRun, at)
	extendLeft(c, low, x+blockRun, at)
	c.Line(at, min(y0, low)-beyond, at, max(y0, low)+beyond, hair)
	ticks(c, at, y0)
	ticks(c, at, low)
	l := short(u.block, in == narrow)
	base := low + 5 + l.height
	free := base+l.depth < f.y-2
	if u.hogging {
		base = low - 5 - l.depth
		free = base-l.height > 2
	}
	if in != narrow && free {
		l.draw(c, x+4, base)
		return max(x+4+l.width, at+beyond)
	}
	l.draw(c, at+4, (y0+low)/2+middle)
	return at + 4 + l.width
}

// drawCurve draws the stress in the fibres as an area, with a step where the topping lies on the member, for there the
// concrete changes.
func (u *equilibrium) drawCurve(c draw.Canvas, f frame, x draw.Pt) {
	most := u.greatest().value
	if !(most > 0) {
		return
	}
	for _, part := range [2][2]float64{{0, u.shape.height}, {u.shape.height, u.shape.total()}} {
		var in []fibre
		for _, k := range u.curve {
			if k.level >= part[0] && k.level < part[1] || k.level == part[1] && part[1] == u.shape.total() {
				in = append(in, k)
			}
		}
		if len(in) == 0 {
			continue
		}
		at := func(level, stress float64) draw.Point {
			return draw.Point{X: x + blockRun*draw.Pt(min(max(stress, 0)/most, 1)), Y: f.at(0, level).Y}
		}
		onward := func(a, b fibre, level float64) draw.Point { // the line through two fibres at a level beyond b
			v := b.stress.value
			if b.level != a.level && b.stress.value > 0 {
				v += (b.stress.value - a.stress.value) * (level - b.level) / (b.level - a.level)
			}
			return at(level, v)
		}
		n := len(in) - 1
		pts := []draw.Point{{X: x, Y: f.at(0, part[0]).Y}, onward(in[min(1, n)], in[0], part[0])}
		for _, k := range in {
			pts = append(pts, at(k.level, k.stress.value))
		}
		pts = append(pts, onward(in[max(n-1, 0)], in[n], part[1]), draw.Point{X: x, Y: f.at(0, part[1]).Y})
		style := draw.Style{Fill: compressed}
		if part[0] > 0 {
			style.Fill = squeezed
		}
		c.Polygon(pts, style)
		// The line of the curve where there is stress.
		first, last := -1, -1
		for i, p := range pts {
			if p.X > x+0.01 {
				if first < 0 {
					first = i
				}
				last = i
			}
		}
		if first >= 0 {
			c.Polyline(pts[max(first-1, 0):min(last+2, len(pts))], draw.Style{Stroke: medium})
		}
	}
}
