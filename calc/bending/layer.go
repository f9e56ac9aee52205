package bending

import "math"

// Layer is steel at one depth.
type Layer struct {
	Area      float64 // mm², 0 allowed
	Depth     float64 // mm from the top fibre, within the section
	Prestrain float64 // strain of the steel when the concrete beside it has none
	Cap       float64 // MPa, the most stress available here in tension and compression; +Inf for none, 0 for nothing
	Law       SteelLaw
}

// Force is what a layer does in a state of strain.
type Force struct {
	Strain float64 // with the prestrain, tension positive
	Stress float64 // MPa, within ±Cap
	Force  float64 // N
	Yields bool    // the strain, either way, is at or past the law's first point
	Capped bool    // the stress is cut by the cap
}

// Curvature is the greatest curvature, 1/mm, that the strain limits of the layers allow with the neutral
// axis at depth x, mm: the least (ε_ud − ε_p0)/(d − x) of the layers below x, and the index of that layer;
// +Inf and −1 if none has a limit. A layer without area, or with a cap of 0, is none.
func Curvature(x float64, layers []Layer) (curvature float64, layer int) {
	curvature, layer = math.Inf(1), -1
	for i := range layers {
		l := &layers[i]
		if l.Depth <= x || l.idle() || math.IsInf(l.Law.limit, 1) {
			continue
		}
		if k := (l.Law.limit - l.Prestrain) / (l.Depth - x); k < curvature {
			curvature, layer = k, i
		}
	}
	return curvature, layer
}

// At gives what the layer does with the neutral axis at depth x, mm, and the curvature κ, 1/mm.
func (l *Layer) At(x, curvature float64) Force {
	f := Force{Strain: l.Prestrain + curvature*(l.Depth-x)}
	f.Stress = l.Law.at(f.Strain)
	f.Yields = math.Abs(f.Strain) >= l.Law.strain[0]
	if math.Abs(f.Stress) > l.Cap {
		f.Stress, f.Capped = math.Copysign(l.Cap, f.Stress), true
	}
	f.Force = l.Area * f.Stress
	return f
}

// idle says that the layer can carry nothing.
func (l *Layer) idle() bool { return l.Area == 0 || l.Cap == 0 }

// check refuses a layer that is none, of a section of depth h.
func (l *Layer) check(i int, h float64) error {
	bad := func(v float64) error { return &Refusal{BadLayer, i, v, h} }
	switch {
	case !(l.Area >= 0) || math.IsInf(l.Area, 0):
		return bad(l.Area)
	case !(l.Depth >= 0 && l.Depth <= h):
		return bad(l.Depth)
	case math.IsNaN(l.Prestrain) || math.IsInf(l.Prestrain, 0):
		return bad(l.Prestrain)
	case !(l.Cap >= 0):
		return bad(l.Cap)
	case l.Law.points == 0:
		return bad(0)
	case !l.idle() && !(l.Prestrain < l.Law.limit):
		return &Refusal{LimitSpent, i, l.Prestrain, l.Law.limit}
	}
	return nil
}
