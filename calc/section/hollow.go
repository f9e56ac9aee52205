package section

import (
	"fmt"
	"math"
)

// UBeam is a trough: a floor between two webs, open at the top. The webs may lean outward, inner face
// parallel to outer.
type UBeam struct {
	Bottom, Top float64 // widths over all at the soffit and at the top
	Depth       float64
	Web         float64 // thickness of a web, measured level
	Floor       float64 // thickness
	Haunch      float64 // leg of the haunch between floor and web, on the floor, as high as long
	Chamfer     float64 // at the soffit
}

// Outline sets it out.
func (b UBeam) Outline() (Outline, error) {
	var m measured
	m.above0("width at the soffit", b.Bottom)
	m.above0("width at the top", b.Top)
	m.above0("depth", b.Depth)
	m.above0("web thickness", b.Web)
	m.above0("floor thickness", b.Floor)
	m.from0("haunch", b.Haunch)
	m.below("floor thickness with haunch", b.Floor+b.Haunch, b.Depth, "the depth")
	side := func(y float64) float64 { return (b.Bottom + (b.Top-b.Bottom)*y/b.Depth) / 2 }
	m.below("web thickness", 2*b.Web, math.Min(b.Top, 2*side(b.Floor)), "the width over all, for both")
	m.within("haunch", b.Haunch, side(b.Floor)-b.Web, "half the floor between the webs")
	m.chamfer(b.Chamfer, b.Bottom, b.Floor)
	return m.outline(func() Contour {
		return rung(
			Point{b.Bottom/2 - b.Chamfer, 0}, Point{side(b.Chamfer), b.Chamfer}, Point{b.Top / 2, b.Depth},
			Point{b.Top/2 - b.Web, b.Depth}, Point{side(b.Floor+b.Haunch) - b.Web, b.Floor + b.Haunch},
			Point{side(b.Floor) - b.Web - b.Haunch, b.Floor})
	})
}

// BoxBeam is a closed box, its top slab as wide as the box or wider.
type BoxBeam struct {
	Width, Depth            float64 // of the box
	TopWidth                float64 // of the top slab, 0 for that of the box
	Top, Web, Bottom        float64 // thicknesses of top slab, each web, bottom slab
	TopHaunch, BottomHaunch float64 // legs of the haunches in the inner corners, 45°
	Chamfer                 float64 // at the soffit
}

// Outline sets it out.
func (b BoxBeam) Outline() (Outline, error) {
	var m measured
	wide := b.TopWidth
	if wide == 0 {
		wide = b.Width
	}
	m.above0("width", b.Width)
	m.above0("depth", b.Depth)
	m.above0("thickness of the top slab", b.Top)
	m.above0("web thickness", b.Web)
	m.above0("thickness of the bottom slab", b.Bottom)
	m.from0("haunch at the top", b.TopHaunch)
	m.from0("haunch at the bottom", b.BottomHaunch)
	if !(wide >= b.Width) || math.IsInf(wide, 0) {
		m.refuse("width of the top slab", wide, fmt.Sprintf("at least %g mm, the width of the box", b.Width))
	}
	m.below("web thickness", 2*b.Web, b.Width, "the width, for both")
	m.below("slab thicknesses", b.Top+b.Bottom, b.Depth, "the depth")
	m.within("haunch", 2*math.Max(b.TopHaunch, b.BottomHaunch), b.Width-2*b.Web, "the width between the webs, for both")
	m.within("haunches", b.TopHaunch+b.BottomHaunch, b.Depth-b.Top-b.Bottom, "the height between the slabs")
	m.chamfer(b.Chamfer, b.Width, b.Depth-b.Top)
	return m.outline(func() Contour {
		c := rung(
			Point{b.Width/2 - b.Chamfer, 0}, Point{b.Width / 2, b.Chamfer}, Point{b.Width / 2, b.Depth - b.Top},
			Point{wide / 2, b.Depth - b.Top}, Point{wide / 2, b.Depth})
		x, low, high := b.Width/2-b.Web, b.Bottom, b.Depth-b.Top
		c.Holes = []Ring{mirrored(
			Point{x - b.BottomHaunch, low}, Point{x, low + b.BottomHaunch},
			Point{x, high - b.TopHaunch}, Point{x - b.TopHaunch, high})}
		return c
	})
}

// DoubleT is a slab on two stems.
type DoubleT struct {
	Width, Depth        float64
	Flange              float64 // thickness of the slab
	Spacing             float64 // of the stems, axis to axis
	StemBottom, StemTop float64 // widths of a stem at the soffit and under the slab
	Haunch              float64 // leg of the haunch between stem and slab, on the slab, as high as long
	Chamfer             float64 // of the stems at the soffit
}

// Outline sets it out.
func (b DoubleT) Outline() (Outline, error) {
	var m measured
	m.above0("width", b.Width)
	m.above0("depth", b.Depth)
	m.above0("flange thickness", b.Flange)
	m.above0("stem spacing", b.Spacing)
	m.above0("stem width at the soffit", b.StemBottom)
	m.above0("stem width under the flange", b.StemTop)
	m.from0("haunch", b.Haunch)
	stem := b.Depth - b.Flange
	m.below("flange thickness with haunch", b.Flange+b.Haunch, b.Depth, "the depth")
	m.below("stem width", math.Max(b.StemBottom, b.StemTop+2*b.Haunch), b.Spacing, "the spacing of the stems")
	m.within("stems", b.Spacing+math.Max(b.StemBottom, b.StemTop+2*b.Haunch), b.Width, "the width")
	m.chamfer(b.Chamfer, b.StemBottom, stem-b.Haunch)
	half := func(y float64) float64 { return (b.StemBottom + (b.StemTop-b.StemBottom)*y/stem) / 2 }
	return m.outline(func() Contour {
		a := b.Spacing / 2
		up, low := stem-b.Haunch, b.Chamfer
		return rung(
			Point{a - b.StemTop/2 - b.Haunch, stem}, Point{a - half(up), up}, Point{a - half(low), low}, Point{a - b.StemBottom/2 + low, 0},
			Point{a + b.StemBottom/2 - low, 0}, Point{a + half(low), low}, Point{a + half(up), up}, Point{a + b.StemTop/2 + b.Haunch, stem},
			Point{b.Width / 2, stem}, Point{b.Width / 2, b.Depth})
	})
}

// Joint is the side of a hollow unit, where it stands beside the next: a groove for the shear key, between
// the levels From and To, and a top set back. The zero value is a plain side.
type Joint struct {
	Inset    float64 // by which the top edge stands back behind the soffit's
	Recess   float64 // by which the bottom of the groove stands back, 0 for no groove
	From, To float64 // levels of the mouth of the groove
	Flank    float64 // height of each sloping flank of the groove, 0 for square ones
}

// HollowUnit is a slab with equal voids in a row: round ones where VoidWidth = VoidDepth, else oblong,
// upright or level.
type HollowUnit struct {
	Width, Depth         float64 // width at the soffit
	VoidWidth, VoidDepth float64
	Count                int
	Spacing              float64 // of the axes of the voids; of no meaning for one
	Level                float64 // of the centres above the soffit
	Joint                Joint
	Chamfer              float64 // at the soffit
}

// Outline sets it out.
func (b HollowUnit) Outline() (Outline, error) {
	var m measured
	m.above0("width", b.Width)
	m.above0("depth", b.Depth)
	if b.Count < 0 || b.Count > 1000 {
		m.refuse("count of voids", float64(b.Count), "0 to 1000")
	}
	if b.Count > 0 {
		m.above0("void width", b.VoidWidth)
		m.above0("void depth", b.VoidDepth)
		m.above0("level of the voids", b.Level)
		m.below("void depth", b.VoidDepth, b.Depth, "the depth")
	}
	if b.Count > 1 {
		m.above0("spacing of the voids", b.Spacing)
	}
	m.joint(b.Joint, b.Width, b.Depth)
	side := b.Depth
	if b.Joint.Recess > 0 {
		side = b.Joint.From
	}
	m.chamfer(b.Chamfer, b.Width, side)
	return m.outline(func() Contour {
		c := rung(b.side()...)
		for i := range b.Count {
			x := (float64(i) - float64(b.Count-1)/2) * b.Spacing
			if b.Count == 1 {
				x = 0
			}
			c.Voids = append(c.Voids, Round{x, b.Level, b.VoidWidth, b.VoidDepth})
		}
		return c
	})
}

// joint checks the side of a unit.
func (m *measured) joint(j Joint, width, depth float64) {
	m.from0("inset of the top edge", j.Inset)
	m.from0("recess of the joint", j.Recess)
	m.below("inset of the top edge", 2*j.Inset, width, "the width, for both")
	if j.Recess > 0 {
		m.below("recess of the joint", 2*j.Recess, width, "the width, for both")
		m.within("inset of the top edge", j.Inset, j.Recess, "the recess of the joint")
		m.from0("lower level of the joint", j.From)
		m.below("upper level of the joint", j.To, depth, "the depth")
		m.from0("flank of the joint", j.Flank)
		m.below("lower level of the joint with its flanks", j.From+2*j.Flank, j.To, "the upper level")
	}
}

// side is the right-hand side from the soffit up.
func (b HollowUnit) side() []Point {
	j, x := b.Joint, b.Width/2
	top := x - j.Inset
	if j.Recess == 0 {
		at := x - j.Inset*b.Chamfer/b.Depth
		return []Point{{x - b.Chamfer, 0}, {at, b.Chamfer}, {top, b.Depth}}
	}
	return []Point{
		{x - b.Chamfer, 0}, {x, b.Chamfer}, {x, j.From}, {x - j.Recess, j.From + j.Flank},
		{x - j.Recess, j.To - j.Flank}, {top, j.To}, {top, b.Depth},
	}
}

// RoundBeam is a circle, or with a bore a ring: a pile or a spun pole.
type RoundBeam struct{ Diameter, Bore float64 }

// Outline sets it out.
func (b RoundBeam) Outline() (Outline, error) {
	var m measured
	m.above0("diameter", b.Diameter)
	m.from0("bore", b.Bore)
	m.below("bore", b.Bore, b.Diameter, "the diameter")
	return m.outline(func() Contour {
		c := Contour{Discs: []Round{Circle(0, b.Diameter/2, b.Diameter/2)}}
		if b.Bore > 0 {
			c.Voids = []Round{Circle(0, b.Diameter/2, b.Bore/2)}
		}
		return c
	})
}
