package section

// RectangularBeam is a rectangle, its edges cut at 45° where there are chamfers: legs in mm.
type RectangularBeam struct {
	Width, Depth        float64
	Chamfer, TopChamfer float64 // at the soffit, at the top; 0 for none
}

// Outline sets it out.
func (b RectangularBeam) Outline() (Outline, error) {
	return Trapezoid{b.Width, b.Width, b.Depth, b.Chamfer, b.TopChamfer}.Outline()
}

// Trapezoid is wider, or narrower, at the top than at the soffit, with straight sides.
type Trapezoid struct {
	Bottom, Top, Depth  float64 // widths at the soffit and the top; one may be 0: a triangle
	Chamfer, TopChamfer float64 // legs on the level edge, at the soffit and at the top, each as high as long
}

// Outline sets it out.
func (b Trapezoid) Outline() (Outline, error) {
	var m measured
	m.from0("width at the soffit", b.Bottom)
	m.from0("width at the top", b.Top)
	m.above0("width", b.Bottom+b.Top)
	m.above0("depth", b.Depth)
	m.from0("chamfer", b.Chamfer)
	m.from0("chamfer at the top", b.TopChamfer)
	m.within("chamfer", 2*b.Chamfer, b.Bottom, "the width at the soffit, for both")
	m.within("chamfer at the top", 2*b.TopChamfer, b.Top, "the width at the top, for both")
	m.below("chamfers", b.Chamfer+b.TopChamfer, b.Depth, "the depth")
	side := func(y float64) float64 { return (b.Bottom + (b.Top-b.Bottom)*y/b.Depth) / 2 }
	return m.outline(func() Contour {
		return rung(
			Point{b.Bottom/2 - b.Chamfer, 0}, Point{side(b.Chamfer), b.Chamfer},
			Point{side(b.Depth - b.TopChamfer), b.Depth - b.TopChamfer}, Point{b.Top/2 - b.TopChamfer, b.Depth})
	})
}

// TBeam is a web with a flange on top. The flange may be narrower than the web.
type TBeam struct {
	Depth   float64
	Flange  Flange
	Web     float64 // width
	Chamfer float64 // of the web at the soffit
}

// Outline sets it out.
func (b TBeam) Outline() (Outline, error) {
	var m measured
	m.above0("depth", b.Depth)
	m.flange("flange", b.Flange)
	m.above0("web width", b.Web)
	m.below("flange depth with haunch", b.Flange.Depth+b.Flange.Haunch, b.Depth, "the depth")
	m.chamfer(b.Chamfer, b.Web, b.Depth-b.Flange.Depth-b.Flange.Haunch)
	return m.outline(func() Contour {
		under := b.Depth - b.Flange.Depth
		return rung(
			Point{b.Web/2 - b.Chamfer, 0}, Point{b.Web / 2, b.Chamfer}, Point{b.Web / 2, under - b.Flange.Haunch},
			Point{b.Flange.Width / 2, under}, Point{b.Flange.Width / 2, b.Depth})
	})
}

// chamfer checks one at both edges of a face of some width, under a height of side.
func (m *measured) chamfer(leg, width, side float64) {
	m.from0("chamfer", leg)
	m.within("chamfer", 2*leg, width, "the width of the face, for both")
	m.within("chamfer", leg, side, "the height of the side")
}

// InvertedT is a web on a ledge, which carries slabs on both sides; the haunch is the slope of the ledge's
// top.
type InvertedT struct {
	Depth   float64
	Ledge   Flange
	Web     float64
	Chamfer float64 // of the ledge at the soffit
}

// Outline sets it out.
func (b InvertedT) Outline() (Outline, error) {
	var m measured
	m.above0("depth", b.Depth)
	m.flange("ledge", b.Ledge)
	m.above0("web width", b.Web)
	m.below("ledge depth with haunch", b.Ledge.Depth+b.Ledge.Haunch, b.Depth, "the depth")
	m.chamfer(b.Chamfer, b.Ledge.Width, b.Ledge.Depth)
	return m.outline(func() Contour {
		return rung(
			Point{b.Ledge.Width/2 - b.Chamfer, 0}, Point{b.Ledge.Width / 2, b.Chamfer}, Point{b.Ledge.Width / 2, b.Ledge.Depth},
			Point{b.Web / 2, b.Ledge.Depth + b.Ledge.Haunch}, Point{b.Web / 2, b.Depth})
	})
}

// IBeam is a web between two flanges, which may meet.
type IBeam struct {
	Depth   float64
	Top     Flange
	Web     float64
	Bottom  Flange
	Chamfer float64 // of the bottom flange at the soffit
}

// Outline sets it out.
func (b IBeam) Outline() (Outline, error) {
	var m measured
	m.above0("depth", b.Depth)
	m.flange("top flange", b.Top)
	m.above0("web width", b.Web)
	m.flange("bottom flange", b.Bottom)
	m.within("flange depths with haunches", b.Top.Depth+b.Top.Haunch+b.Bottom.Depth+b.Bottom.Haunch, b.Depth, "the depth")
	m.chamfer(b.Chamfer, b.Bottom.Width, b.Bottom.Depth)
	return m.outline(func() Contour {
		under := b.Depth - b.Top.Depth
		return rung(
			Point{b.Bottom.Width/2 - b.Chamfer, 0}, Point{b.Bottom.Width / 2, b.Chamfer}, Point{b.Bottom.Width / 2, b.Bottom.Depth},
			Point{b.Web / 2, b.Bottom.Depth + b.Bottom.Haunch}, Point{b.Web / 2, under - b.Top.Haunch},
			Point{b.Top.Width / 2, under}, Point{b.Top.Width / 2, b.Depth})
	})
}
