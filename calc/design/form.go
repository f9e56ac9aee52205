package design

import (
	"math"

	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/section"
)

// form is the section as the record has it: straight-sided parts from the soffit up, and round parts taken out of them. All
// are exact decimals of millimetres.
type form struct {
	outline section.Outline
	depth   quantity.Literal
	parts   parts
	rounds  []roundPart
}

// parts are trapezoids from the soffit up with the total width of the concrete, round voids not taken out.
type parts struct {
	names                       []string
	level, height, lower, upper []quantity.Literal
}

// roundPart is a number of equal circles at one level, or of halves of them, taken out of the concrete. from and to say
// where the circle counts, upward from its lowest point.
type roundPart struct {
	name                    string
	count                   int
	radius, level, from, to quantity.Literal
}

// mm is a length in millimetres as an exact decimal, six places at most.
func mm(v float64) quantity.Literal { return number(v, "mm", places(v)) }

// places is how many decimals of a millimetre a measure has, at most 6.
func places(mm float64) int {
	for d := 0; d < 6; d++ {
		v, err := quantity.Value(quantity.Format(mm, d))
		if err == nil && quantity.Format(v, 6) == quantity.Format(mm, 6) {
			return d
		}
	}
	return 6
}

// formOf sets the shape out.
func formOf(s *member.Shape) (form, error) {
	o, err := s.Outline()
	if err != nil {
		return form{}, err
	}
	f := form{outline: o, depth: s.Depth.Literal, parts: partsOf(o, zonesOf(s, o.Height())), rounds: roundsOf(o)}
	if !s.Depth.Present() {
		f.depth = mm(o.Height())
	}
	return f, nil
}

// partsOf reads the strips of an outline; each part bears the name of the zone that it lies in.
func partsOf(o section.Outline, zones []zone) parts {
	var p parts
	y, foot := 0.0, mm(0)
	middle := []float64{}
	for _, t := range o.Strips() {
		y += t.Height
		top := mm(y)
		height := top.Quantity().Value - foot.Quantity().Value
		if !(height > 0) {
			continue // less than the sixth decimal of a millimetre
		}
		middle = append(middle, y-t.Height/2)
		p.level, p.height = append(p.level, foot), append(p.height, mm(height))
		p.lower, p.upper = append(p.lower, mm(t.Bottom)), append(p.upper, mm(t.Top))
		foot = top
	}
	p.names = namesOf(zones, middle, func(i int) string {
		top := p.level[i].Quantity().Value + p.height[i].Quantity().Value
		return p.level[i].Number + " to " + mm(top).Number + " mm"
	})
	return p
}

// roundPlaces is how many decimals of a millimetre the measures of round parts keep, so that a radius and its double
// print alike in eight digits.
const roundPlaces = 4

// roundsOf reads the round parts of an outline.
func roundsOf(o section.Outline) []roundPart {
	short := func(v float64) quantity.Literal {
		v, _ = quantity.Value(quantity.Format(v, roundPlaces))
		return mm(v)
	}
	var out []roundPart
	var names []string
	for _, c := range o.Curves() {
		r := roundPart{count: c.Count, radius: short(c.Radius), level: short(c.Level)}
		whole := r.radius.Quantity().Value
		switch c.Half {
		case section.Lower:
			r.name, r.from, r.to = "lower halves", mm(0), mm(whole)
		case section.Upper:
			r.name, r.from, r.to = "upper halves", mm(whole), mm(2*whole)
		default:
			r.name, r.from, r.to = "circles", mm(0), mm(2*whole)
		}
		out, names = append(out, r), append(names, r.name)
	}
	for i, n := range numbered(names) {
		out[i].name = n
	}
	return out
}

// edge is the outermost part seen from one edge: the width there, and the depth over which it is a rectangle without a
// round part in it, 0 where it is none.
func (f *form) edge(top bool) (width, depth quantity.Literal) {
	i, near, far := 0, f.parts.lower, f.parts.upper
	if top {
		i, near, far = len(f.parts.names)-1, f.parts.upper, f.parts.lower
	}
	low := f.parts.level[i].Quantity().Value
	high := low + f.parts.height[i].Quantity().Value
	if near[i].Quantity() != far[i].Quantity() {
		return near[i], mm(0)
	}
	for _, c := range f.outline.Curves() {
		if c.Foot() < high && low < c.Top() {
			return near[i], mm(0)
		}
	}
	return near[i], f.parts.height[i]
}

// extent is how far the concrete reaches to the left and to the right, mm.
func (f *form) extent() (left, right float64) {
	left, right = math.Inf(1), math.Inf(-1)
	for _, r := range f.outline.Contour().Outer {
		for _, p := range r {
			left, right = math.Min(left, p.X), math.Max(right, p.X)
		}
	}
	return left, right
}
