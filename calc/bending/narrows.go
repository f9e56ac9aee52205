package bending

import "math"

// flat is the part of a width below which a change of it is taken for rounding.
const flat = 1e-9

// FirstGrowth is the depth, mm, at which the section, net of holes and voids, first grows wider going away from
// the compressed edge: at a ledge its level, on a slope where it begins, beside a round void where its chord
// shrinks faster than the rest of the section does. Height if it never grows. A zone compressed farther than that
// narrows toward the edge (EN 1992-1-1, 3.1.7(3), note).
func (s *Section) FirstGrowth() float64 { return s.growth }

// Narrows reports whether the zone above the depth z narrows toward the compressed edge: whether FirstGrowth
// lies above z, by more than rounding. So does every section from the centre of a round void down.
func (s *Section) Narrows(z float64) bool { return s.growth < math.Min(z, s.height)-flat*s.height }

// firstGrowth finds what FirstGrowth gives.
func (s *Section) firstGrowth() float64 {
	var above *slab
	eps := flat * s.height
	for i := range s.slabs {
		b := &s.slabs[i]
		if b.foot-b.top < 2*eps {
			continue // a sliver that rounding leaves between two edges is no slope
		}
		if above != nil && s.widens(above, b) {
			return b.top
		}
		above = b
		for from := b.top; from < b.foot; { // piece by piece between tips and centres of round parts
			to := s.cut(from, b.foot)
			if s.grows(b, from, to) {
				return s.start(b, from, to)
			}
			from = to
		}
	}
	return s.height
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

// gain is the width gained per mm downward at the depth z of a slab, between from and to, with no tip or centre
// of a round part between them; and the width there. Beside voids the gain itself rises downward. Round concrete
// gains without bound under its tip, where the search comes by first: +Inf all along.
func (s *Section) gain(b *slab, from, to, z float64) (gain, width float64) {
	gain, width = b.slope, b.width+b.slope*(z-b.top)
	for k := range s.rounds {
		r := &s.rounds[k]
		if r.foot <= from || r.top >= to {
			continue
		}
		t := math.Max(-r.Radius, math.Min(z-r.Level, r.Radius))
		half := math.Sqrt((r.Radius - t) * (r.Radius + t))
		switch {
		case r.Solid || half == 0 && t > 0:
			return math.Inf(1), width
		case half == 0:
			return math.Inf(-1), width
		}
		gain -= 2 * r.times * t / half
		width += r.WidthAt(z)
	}
	return gain, width
}

// grows says that the width gains somewhere between two depths of a slab: the gain at the lower one tells.
func (s *Section) grows(b *slab, from, to float64) bool {
	gain, width := s.gain(b, from, to, to)
	return gain*(to-from) > flat*math.Abs(width)
}

// start is where, between two depths of a slab, the width begins to gain, which at the lower one it does.
func (s *Section) start(b *slab, from, to float64) float64 {
	if gain, _ := s.gain(b, from, to, from); gain >= 0 {
		return from
	}
	for to-from > 1e-3*flat*s.height {
		middle := (from + to) / 2
		if !(from < middle && middle < to) {
			break
		}
		if gain, _ := s.gain(b, from, to, middle); gain >= 0 {
			to = middle
		} else {
			from = middle
		}
	}
	return to
}
