package member

import (
	"fmt"
	"math"

	"soffit/calc/quantity"
	"soffit/calc/section"
)

// layer is a row of strands or bars as circles in the section, lengths in mm; x counts from the axis of
// symmetry.
type layer struct {
	name            string
	count           Count
	spacing, height Value
	n               int
	gap, d, y       float64 // between axes, diameter, above the soffit
	spread          bool    // the spacing is known, and possible
}

// layers are the rows of which enough is known.
func (r *reader) layers(m *Member) []layer {
	var out []layer
	add := func(name Word, count Count, spacing, height, diameter Value) {
		if count.N == 0 || !known(height, diameter) {
			return
		}
		out = append(out, layer{name: name.Text, count: count, spacing: spacing, height: height,
			n: count.N, gap: spacing.Base(), d: diameter.Base(), y: height.Base(), spread: spacing.Present()})
	}
	for i := range m.Strands.Rows {
		s := &m.Strands.Rows[i]
		if d, _, ok := r.product(m, s.Product.Text); ok && d > 0 {
			add(s.Name, s.Count, s.Spacing, s.Height, millimetres(d))
		}
	}
	for i := range m.Bars.Rows {
		s := &m.Bars.Rows[i]
		add(s.Name, s.Count, s.Spacing, s.Height, s.Diameter)
	}
	return out
}

func millimetres(d float64) Value {
	return Value{Literal: quantity.Literal{Number: quantity.Format(d, 2), Unit: quantity.MustUnit("mm")}}
}

// checkFit looks for strands and bars that lie outside the concrete or in one another.
func (r *reader) checkFit(m *Member) {
	shape, ok := m.Shape.outline()
	list := r.layers(m)
	for i := range list {
		a := &list[i]
		apart := a.apart(r)
		if ok && a.inDepth(r, shape) && apart {
			a.inWidth(r, shape)
		}
		for k := range i {
			list[k].clear(r, a)
		}
	}
}

// apart finds strands of one row that lie in one another.
func (a *layer) apart(r *reader) bool {
	if a.n == 1 || !a.spread || !exceeds(a.d, a.gap) {
		return true
	}
	a.spread = false
	r.at(a.spacing.Origin, "spacing: have "+a.spacing.String()+", want at least "+shown(a.d, a.spacing)+", the diameter", "write the distance between the axes")
	return false
}

// inDepth finds a height at which the row sticks out of the soffit or the top.
func (a *layer) inDepth(r *reader, shape section.Shape) bool {
	low, high := a.d/2, shape.Height()-a.d/2
	switch {
	case exceeds(low, a.y):
		r.at(a.height.Origin, "height: have "+a.height.String()+", want at least "+shown(low, a.height)+", half the diameter", "write the height of the axes above the soffit")
	case exceeds(a.y, high):
		r.at(a.height.Origin, "height: have "+a.height.String()+", want at most "+shown(high, a.height)+" in a section "+shown(shape.Height(), a.height)+" deep", "write the height of the axes above the soffit")
	default:
		return true
	}
	return false
}

// inWidth finds a row wider than the concrete at its height. Bars without a spacing are taken side by side.
func (a *layer) inWidth(r *reader, shape section.Shape) {
	gap, o := a.gap, a.spacing.Origin
	if !a.spread {
		gap = a.d
	}
	if !a.spacing.Given {
		o = a.count.Origin
	}
	taken, width := float64(a.n-1)*gap+a.d, shape.LeastWidth(a.y-a.d/2, a.y+a.d/2)
	if width > 0 && exceeds(taken, width) {
		r.at(o, fmt.Sprintf("spacing: %d in a row take %s, at height %s the concrete is %s wide", a.n, shown(taken, a.height), a.height, shown(width, a.height)), "write fewer in the row, a smaller spacing, or the height of a wider part")
	}
}

// clear finds a row b of which a strand lies in one of row a.
func (a *layer) clear(r *reader, b *layer) {
	least := (a.d + b.d) / 2
	dy := b.y - a.y
	if !a.spread || !b.spread || math.Abs(dy) >= least {
		return
	}
	if apart := math.Hypot(a.nearest(b), dy); exceeds(least, apart) {
		r.at(b.height.Origin, fmt.Sprintf("height: %s and %s come within %s, axis to axis, want at least %s", a.name, b.name, shown(apart, b.height), shown(least, b.height)), "write another height or spacing for one of the rows")
	}
}

// nearest is the smallest horizontal distance between an axis of a and one of b, both rows symmetrical.
func (a *layer) nearest(b *layer) float64 {
	x := func(l *layer, i int) float64 { return (float64(i) - float64(l.n-1)/2) * l.gap }
	best := math.Inf(1)
	for i, k := 0, 0; i < a.n && k < b.n; {
		d := x(a, i) - x(b, k)
		best = min(best, math.Abs(d))
		if d < 0 {
			i++
		} else {
			k++
		}
	}
	return best
}
