package bending

import "math"

// Axial is a force along the member that acts together with the moment.
type Axial struct {
	Force float64 // N, compression positive
	Depth float64 // mm below the top fibre, where it acts: the moment is about this depth
}

// AtCentroid is an axial force, N, at the centroid of the gross section.
func (s *Section) AtCentroid(force float64) Axial { return Axial{force, s.centroid} }

// CompressionFlange is a flange at the top whose mean strain is limited: where it is wholly compressed the
// strain in the middle of its depth is at most Strain, ε_c2, or ε_c3 with the bilinear law
// (EN 1992-1-1, 6.1(5)). Depth 0 is none. The strain is the plane's: of what is locked into the flange the mean
// is to be taken off Strain. Where 2·Strain is less than the plane may have at the edge, ε_cu, the curvature jumps as
// the flange comes to be wholly compressed, and forces that would balance in the jump alone are Unbalanced.
type CompressionFlange struct {
	Depth  float64 // mm
	Strain float64
}

// Conditions are what a section is under besides the moment. The zero value is nothing.
type Conditions struct {
	Axial  Axial
	Flange CompressionFlange
	// Narrowing is the factor on η·f_cd of a block, also a graded one, where the compressed zone narrows toward the
	// compressed edge: 0.9 by EN 1992-1-1, 3.1.7(3), note; 0 for none. The zone is the one without the factor; it
	// narrows where its neutral axis lies deeper than FirstGrowth. Laws of stress and strain take no notice.
	Narrowing float64
}

// check refuses conditions that are none, for a section of depth h.
func (c *Conditions) check(h float64) error {
	bad := func(v float64) error { return &Refusal{BadConditions, -1, v, h} }
	switch {
	case math.IsNaN(c.Axial.Force) || math.IsInf(c.Axial.Force, 0):
		return bad(c.Axial.Force)
	case math.IsNaN(c.Axial.Depth) || math.IsInf(c.Axial.Depth, 0):
		return bad(c.Axial.Depth)
	case !(c.Flange.Depth >= 0 && c.Flange.Depth <= h):
		return bad(c.Flange.Depth)
	case !(c.Narrowing >= 0 && c.Narrowing <= 1):
		return bad(c.Narrowing)
	case c.Flange.Depth > 0 && (!(c.Flange.Strain > 0) || math.IsInf(c.Flange.Strain, 0)):
		return bad(c.Flange.Strain)
	}
	return nil
}

// moment is that of the force about the top fibre.
func (n *Axial) moment() float64 {
	if n.Force == 0 {
		return 0
	}
	return n.Force * n.Depth
}

// untied is the refusal where, with the neutral axis at the very top, the steel pulls too little.
func (n *Axial) untied(steel float64) error {
	if n.Force < 0 {
		return &Refusal{NotHeld, -1, steel, -n.Force}
	}
	return &Refusal{NoTension, -1, steel, 0}
}

// curvature is the greatest, 1/mm, that the flange allows with the neutral axis at depth x; +Inf where it is
// not wholly compressed.
func (f *CompressionFlange) curvature(x float64) float64 {
	if f.Depth == 0 || !(x > f.Depth) {
		return math.Inf(1)
	}
	return f.Strain / (x - f.Depth/2)
}

// lets says that steel lies above the middle of the flange, where the strain falls as the neutral axis goes
// down.
func (f *CompressionFlange) lets(layers []Layer) bool {
	for i := range layers {
		if f.Depth > 0 && layers[i].Depth < f.Depth/2 && !layers[i].idle() {
			return true
		}
	}
	return false
}
