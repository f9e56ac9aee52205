package bending

import "math"

// EdgeLimit is the edge of a concrete that is compressed most, and the strain that it may have there: together
// with what is locked in, the strain is at most EpsCu wherever the neutral axis lies deeper than the edge.
type EdgeLimit struct {
	Depth  float64 // mm from the compressed edge of the whole section
	Strain float64 // locked in there, compression positive, below EpsCu
	EpsCu  float64 // ε_cu2, or ε_cu3 with the bilinear law
}

// Core is the point about which the plane of strain turns where the section is wholly compressed: at the depth
// (1 − EpsC2/EpsCu)·h the strain of the plane is at most EpsC2 (EN 1992-1-1, 6.1(6) and figure 6.1). Of two
// concretes those values are the outermost one's, and stand for the whole depth h. Where strain is locked in at
// the outermost edge both are taken less that strain: then the limits join where the neutral axis leaves the section.
type Core struct{ EpsC2, EpsCu float64 }

// Limits are those of the concretes of a section of one or more. One edge must be at depth 0.
type Limits struct {
	Edges []EdgeLimit
	Core  Core
}

// LimitsOf gives the limits of bodies: the upper edge of each, and the core of the outermost one.
func LimitsOf(bodies []Body) Limits {
	var l Limits
	top := math.Inf(1)
	for i := range bodies {
		b := &bodies[i]
		l.Edges = append(l.Edges, EdgeLimit{Depth: b.Offset, Strain: b.Strain, EpsCu: b.Law.EpsCu2})
		if b.Offset < top {
			top = b.Offset
			l.Core = Core{b.Law.EpsC2 - b.Strain, b.Law.EpsCu2 - b.Strain}
		}
	}
	return l
}

// check refuses limits that are none, for a section of depth h.
func (l *Limits) check(h float64) error {
	outermost := false
	for i, e := range l.Edges {
		switch {
		case !(e.Depth >= 0 && e.Depth < h):
			return &Refusal{BadEdge, i, e.Depth, h}
		case !(e.EpsCu > 0) || math.IsInf(e.EpsCu, 0):
			return &Refusal{BadEdge, i, e.EpsCu, h}
		case math.IsNaN(e.Strain) || math.IsInf(e.Strain, 0):
			return &Refusal{BadEdge, i, e.Strain, h}
		case !(e.Strain < e.EpsCu):
			return &Refusal{EdgeSpent, i, e.Strain, e.EpsCu}
		}
		outermost = outermost || e.Depth == 0
	}
	switch c := l.Core; {
	case !outermost:
		return &Refusal{BadEdge, -1, math.NaN(), h}
	case !(c.EpsCu > 0) || math.IsInf(c.EpsCu, 0):
		return &Refusal{BadConcrete, -1, c.EpsCu, math.Inf(1)}
	case !(c.EpsC2 > 0 && c.EpsC2 <= c.EpsCu):
		return &Refusal{BadConcrete, -1, c.EpsC2, c.EpsCu}
	}
	return nil
}

// curvature is the greatest, 1/mm, that the concretes allow with the neutral axis at depth x, in a section of depth
// h, +Inf above it: the least (ε_cu − ε_li)/(x − z) of the edges above x, and below the section also
// ε_c2/(x − (1 − ε_c2/ε_cu)·h). edge is the one that governs, −1 for the core.
func (l *Limits) curvature(x, h float64) (curvature float64, pivot Pivot, edge int) {
	curvature = math.Inf(1)
	for i := range l.Edges {
		e := &l.Edges[i]
		if !(x > e.Depth) {
			continue
		}
		if k := (e.EpsCu - e.Strain) / (x - e.Depth); k < curvature {
			curvature, pivot, edge = k, PivotTop, i
			if e.Depth > 0 {
				pivot = PivotEdge
			}
		}
	}
	if c := l.Core; x > h {
		if k := c.EpsC2 / (x - (1-c.EpsC2/c.EpsCu)*h); k <= curvature {
			return k, PivotCore, -1
		}
	}
	return curvature, pivot, edge
}

// most is the greatest strain that an edge has left.
func (l *Limits) most() (strain float64) {
	for i := range l.Edges {
		strain = math.Max(strain, l.Edges[i].EpsCu-l.Edges[i].Strain)
	}
	return strain
}

// inner says that an edge lies within the section.
func (l *Limits) inner() bool {
	for i := range l.Edges {
		if l.Edges[i].Depth > 0 {
			return true
		}
	}
	return false
}
