// Package bending finds the resistance of a section to a sagging moment by strain compatibility: plane
// sections, concrete without tension, steel in layers, each at its own prestrain. Depths are in mm from the
// top fibre, which is the compressed one; forces in N, stresses in MPa, moments in N·mm, strains
// dimensionless. Concrete is positive in compression, steel in tension, the moment in sagging.
//
// The strain of a layer is its prestrain plus κ·(d − x): the prestrain is the strain of the steel when the
// concrete beside it has none. The area of a bar is not taken out of the concrete that it displaces.
package bending

import "soffit/calc/section"

// Section is a shape seen from the top, prepared for bending; NewSection makes one. A hogging moment is a
// sagging one on the shape upside down: NewSection(shape.Flipped()) with layers after Hogging.
type Section struct {
	height   float64
	centroid float64 // depth
	growth   float64 // depth where the width first grows
	slabs    []slab
	rounds   []round
}

// slab is one trapezoid seen from the top.
type slab struct {
	top, foot    float64 // depths
	width, slope float64 // width at its top, gain of width per mm downward
	area, moment float64 // of all slabs above its top: mm², and about the top fibre, mm³
}

// NewSection prepares a shape. It allocates; a section serves any number of solutions, also at once.
func NewSection(shape section.Shape) *Section {
	strips := shape.Strips()
	s := &Section{slabs: make([]slab, 0, len(strips))}
	var area, moment float64
	for i := len(strips) - 1; i >= 0; i-- {
		t := strips[i]
		b := slab{
			top: s.height, foot: s.height + t.Height,
			width: t.Top, slope: (t.Bottom - t.Top) / t.Height,
			area: area, moment: moment,
		}
		area, moment = b.upTo(b.foot)
		s.height = b.foot
		s.slabs = append(s.slabs, b)
	}
	s.centroid = shape.Height() - shape.Centroid()
	for _, c := range shape.Flipped().Curves() { // their levels are depths now
		s.rounds = append(s.rounds, newRound(c))
	}
	s.growth = s.firstGrowth()
	return s
}

// Hogging gives the layers as a section of the given height sees them when it is turned upside down.
func Hogging(layers []Layer, height float64) []Layer {
	turned := make([]Layer, len(layers))
	for i, l := range layers {
		l.Depth = height - l.Depth
		turned[i] = l
	}
	return turned
}

// Height is the overall depth, mm.
func (s *Section) Height() float64 { return s.height }

// Above gives the area above the depth z, mm², net of holes and voids, and its first moment about the top
// fibre, mm³. z is taken into [0, Height].
func (s *Section) Above(z float64) (area, moment float64) {
	if !(z > 0) {
		return 0, 0
	}
	last := &s.slabs[len(s.slabs)-1]
	area, moment = last.upTo(s.height)
	for i := range s.slabs {
		if b := &s.slabs[i]; z <= b.foot {
			area, moment = b.upTo(z)
			break
		}
	}
	for i := range s.rounds {
		a, m := s.rounds[i].above(z)
		area += a
		moment += m
	}
	return area, moment
}

// upTo gives area and moment of all slabs above the depth z, which lies within the slab.
func (b *slab) upTo(z float64) (area, moment float64) {
	t := z - b.top
	return b.area + t*(b.width+b.slope*t/2),
		b.moment + t*(b.width*(b.top+t/2)+b.slope*t*(b.top/2+t/3))
}
