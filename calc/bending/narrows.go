package bending

import "math"

// flat is the part of a width below which a change of it is taken for rounding.
const flat = 1e-9

// Narrows reports whether the section, net of holes and voids, is somewhere narrower than farther down,
// within the depth z: whether the zone above z narrows toward the compressed fibre, so that η·f_cd is to be
// cut by 10 % (EN 1992-1-1, 3.1.7(3), note). So does every section from the centre of a round void down.
func (s *Section) Narrows(z float64) bool {
	var above *slab
	eps := flat * s.height
	for i := range s.slabs {
		b := &s.slabs[i]
		if b.top >= z-eps {
			break // what rounding leaves beyond an edge is not within z
		}
		if b.foot-b.top < 2*eps {
			continue // nor is a sliver of it between two edges a slope
		}
		if above != nil && s.widens(above, b) {
			return true
		}
		above = b
		for from := b.top; from < math.Min(z, b.foot); { // piece by piece between tips and centres of round parts
			to := s.cut(from, math.Min(z, b.foot))
			if s.grows(b, from, to) {
				return true
			}
			from = to
		}
	}
	return false
}

// widens says that the width jumps up from the slab a to the slab b below it. Half circles may end and begin
// there; whole ones have no width where they do.
func (s *Section) widens(a, b *slab) bool {
	before, after := a.width+a.slope*(a.foot-a.top), b.width
	for k := range s.rounds {
		r := &s.rounds[k]
		switch eps := 3 * flat * s.height; {
		case math.Abs(r.top-b.top) <= eps:
			after += r.WidthAt(r.top)
		case math.Abs(r.foot-b.top) <= eps:
			before += r.WidthAt(r.foot)
		case r.top < b.top && b.top < r.foot:
			w := r.WidthAt(b.top)
			before, after = before+w, after+w
		}
	}
	return after > before+flat*math.Abs(before)
}

// cut is the first depth after from at which a round part begins, ends or is widest, at most to.
func (s *Section) cut(from, to float64) float64 {
	for k := range s.rounds {
		r := &s.rounds[k]
		for _, z := range [3]float64{r.top, r.Level, r.foot} {
			if from < z && z < to {
				to = z
			}
		}
	}
	return to
}

// grows says that the width gains downward somewhere between two depths of a slab, with no tip or centre of a
// round part between them. Beside voids the gain per depth itself rises downward, so that its value at the
// lower end tells. Round concrete gains without bound under its tip, where the search comes by first.
func (s *Section) grows(b *slab, from, to float64) bool {
	gain, width := b.slope, b.width+b.slope*(to-b.top)
	for k := range s.rounds {
		r := &s.rounds[k]
		if r.foot <= from || r.top >= to {
			continue
		}
		t := math.Min(to-r.Level, r.Radius)
		half := math.Sqrt((r.Radius - t) * (r.Radius + t))
		if r.Solid || half == 0 {
			return true
		}
		gain -= 2 * r.times * t / half
		width += r.WidthAt(to)
	}
	return gain*(to-from) > flat*math.Abs(width)
}
