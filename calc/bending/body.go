package bending

import (
	"math"

	"soffit/calc/section"
)

// Body is one concrete of a section made of several: a member, or the topping cast on it. Its strain is that of
// the plane κ·(x − z) and what is locked in, which is plane too: Strain at its upper edge, and Slope more per mm
// downward, compression positive.
type Body struct {
	Section *Section
	Offset  float64 // mm, depth of its upper edge in the whole section
	Law     Parabola
	Strain  float64 // locked in at the upper edge
	Slope   float64 // 1/mm
}

// CompositeFibres finds the neutral axis of the plane and M_Rd of bodies that share it, integrated over each as
// Section.Compression does it: the second method beside FibreModel, whose Axis it follows in everything else.
// The depth of the whole is that of the lowest body; bodies that overlap both count. One body at depth 0 without
// locked-in strain under LimitsOf gives what Fibres gives.
func CompositeFibres(bodies []Body, limits Limits, c Conditions, layers []Layer) (Axis, error) {
	p := problem{limits: &limits, layers: layers, curved: true, Conditions: c}
	parts := make([]part, len(bodies))
	for i := range bodies {
		b := &bodies[i]
		if err := b.check(i); err != nil {
			return Axis{}, err
		}
		parts[i] = part{Body: *b}
		if b.Slope > 0 {
			parts[i].turned = b.Section.turned()
		}
		p.depth = math.Max(p.depth, b.Offset+b.Section.height)
		p.locked = p.locked || b.Strain != 0 || b.Slope != 0
		p.uneven = p.uneven || b.Law != bodies[0].Law || b.Law.EpsC2 > c.Flange.Strain
	}
	if len(bodies) == 0 {
		return Axis{}, &Refusal{BadBody, -1, 0, 1}
	}
	if err := limits.check(p.depth); err != nil {
		return Axis{}, err
	}
	p.parts = parts
	return p.solve(deepest * p.depth)
}

// check refuses a body that is none.
func (b *Body) check(i int) error {
	switch {
	case b.Section == nil:
		return &Refusal{BadBody, i, math.NaN(), 0}
	case !(b.Offset >= 0) || math.IsInf(b.Offset, 0):
		return &Refusal{BadBody, i, b.Offset, 0}
	case math.IsNaN(b.Strain) || math.IsInf(b.Strain, 0):
		return &Refusal{BadBody, i, b.Strain, 0}
	case math.IsNaN(b.Slope) || math.IsInf(b.Slope, 0):
		return &Refusal{BadBody, i, b.Slope, 0}
	}
	return b.Law.check()
}

// part is a body ready for the search.
type part struct {
	Body
	turned *Section // upside down, where the locked-in strain can outgrow the plane's fall
}

// even is the part of ε_c2 within which the strain over a body is taken for the same everywhere.
const even = 1e-14

// compression gives the force of the body and its moment about the edge of the whole section. Within the body
// the strain is first at its upper edge and falls by fall per mm: κ·(x − z) + ε + s·(z − z_b) =
// (κ − s)·(x_b − (z − z_b)).
func (b *part) compression(x, k float64) (force, moment float64) {
	x -= b.Offset
	fall, first := k-b.Slope, k*x+b.Strain
	h := b.Section.height
	switch {
	case math.Abs(fall)*h <= even*b.Law.EpsC2:
		area, about := b.Section.Above(h)
		stress := b.Law.Stress(first)
		force, moment = stress*area, stress*about
	case fall > 0:
		force, moment = b.Section.Compression(b.Law, x+(b.Strain+b.Slope*x)/fall, fall)
	default:
		force, moment = b.turned.Compression(b.Law, h-first/fall, -fall)
		moment = h*force - moment
	}
	return force, moment + b.Offset*force
}

// turned is the section upside down.
func (s *Section) turned() *Section {
	t := &Section{height: s.height, centroid: s.height - s.centroid}
	var area, moment float64
	for i := len(s.slabs) - 1; i >= 0; i-- {
		a := &s.slabs[i]
		b := slab{
			top: s.height - a.foot, foot: s.height - a.top,
			width: a.width + a.slope*(a.foot-a.top), slope: -a.slope,
			area: area, moment: moment,
		}
		area, moment = b.upTo(b.foot)
		t.slabs = append(t.slabs, b)
	}
	for _, r := range s.rounds {
		c := r.Curve
		c.Level = s.height - c.Level
		switch c.Half {
		case section.Lower:
			c.Half = section.Upper
		case section.Upper:
			c.Half = section.Lower
		}
		t.rounds = append(t.rounds, newRound(c))
	}
	t.growth = t.firstGrowth()
	return t
}
