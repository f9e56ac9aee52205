// Package bending finds the resistance of a section to a sagging moment by strain compatibility: plane
// sections, concrete without tension, steel in layers, each at its own prestrain. Depths are in mm from the
// top fibre, which is the compressed one; forces in N, stresses in MPa, moments in N·mm, strains
// dimensionless. Concrete is positive in compression, steel in tension, the moment in sagging.
//
// The strain of a layer is its prestrain plus κ·(d − x): the prestrain is the strain of the steel when the
// concrete beside it has none. The area of a bar is not taken out of the concrete that it displaces.
package bending

import "soffit/calc/section"

// Section is a shape seen from the top, prepared for bending; NewSection makes one.
type Section struct {
	height float64
	slabs  []slab
}

// slab is one trapezoid seen from the top.
type slab struct {
	top, foot    float64 // depths
	width, slope float64 // width at its top, gain of width per mm downward
	area, moment float64 // of all above its top: mm², and about the top fibre, mm³
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
	return s
}

// Height is the overall depth, mm.
func (s *Section) Height() float64 { return s.height }

// Above gives the area above the depth z, mm², and its first moment about the top fibre, mm³. z is taken
// into [0, Height].
func (s *Section) Above(z float64) (area, moment float64) {
	if !(z > 0) {
		return 0, 0
	}
	for i := range s.slabs {
		if b := &s.slabs[i]; z <= b.foot {
			return b.upTo(z)
		}
	}
	return s.slabs[len(s.slabs)-1].upTo(s.height)
}

// Narrows reports whether the section is somewhere narrower than farther down, within the depth z: whether
// the zone above z narrows toward the compressed fibre, so that η·f_cd is to be cut by 10 %
// (EN 1992-1-1, 3.1.7(3), note).
func (s *Section) Narrows(z float64) bool {
	least := 0.0
	for i := range s.slabs {
		b := &s.slabs[i]
		if b.top >= z {
			break
		}
		if i > 0 && b.width > least || b.slope > 0 {
			return true
		}
		least = b.width + b.slope*(b.foot-b.top)
	}
	return false
}

// upTo gives area and moment of all above the depth z, which lies within the slab.
func (b *slab) upTo(z float64) (area, moment float64) {
	t := z - b.top
	return b.area + t*(b.width+b.slope*t/2),
		b.moment + t*(b.width*(b.top+t/2)+b.slope*t*(b.top/2+t/3))
}
