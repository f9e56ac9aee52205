package member

import (
	"slices"

	"soffit/calc/section"
)

// Outline sets the shape out: axis of symmetry at x = 0 and soffit at y = 0, a polygon as written. Errors are
// *section.Measure or *section.Refusal, in the words of calc/section.
func (s *Shape) Outline() (section.Outline, error) { return s.form().Outline() }

// form is the shape with its measures in mm.
func (s *Shape) form() section.Form {
	flange := func(f *Flange) section.Flange {
		return section.Flange{Width: f.Width.Base(), Depth: f.Depth.Base(), Haunch: f.HaunchDepth.Base()}
	}
	depth, width, web, chamfer := s.Depth.Base(), s.Width.Base(), s.WebWidth.Base(), s.Chamfer.Base()
	switch s.Kind.Text {
	case "rectangle":
		return section.RectangularBeam{Width: width, Depth: depth, Chamfer: chamfer, TopChamfer: s.TopChamfer.Base()}
	case "trapezoid":
		return section.Trapezoid{Bottom: s.BottomWidth.Base(), Top: s.TopWidth.Base(), Depth: depth, Chamfer: chamfer, TopChamfer: s.TopChamfer.Base()}
	case "T":
		return section.TBeam{Depth: depth, Flange: section.Flange{Width: s.FlangeWidth.Base(), Depth: s.FlangeDepth.Base(), Haunch: s.HaunchDepth.Base()}, Web: web, Chamfer: chamfer}
	case "I":
		return section.IBeam{Depth: depth, Top: flange(&s.TopFlange), Web: web, Bottom: flange(&s.BottomFlange), Chamfer: chamfer}
	case "inverted T":
		return section.InvertedT{Depth: depth, Ledge: flange(&s.Ledge), Web: web, Chamfer: chamfer}
	case "U":
		return section.UBeam{Bottom: s.BottomWidth.Base(), Top: s.TopWidth.Base(), Depth: depth, Web: s.WebThickness.Base(), Floor: s.FloorThickness.Base(), Haunch: s.Haunch.Base(), Chamfer: chamfer}
	case "box":
		return section.BoxBeam{Width: width, Depth: depth, TopWidth: s.TopSlab.Width.Base(), Top: s.TopSlab.Depth.Base(), Web: s.WebThickness.Base(), Bottom: s.BottomSlab.Depth.Base(),
			TopHaunch: s.TopSlab.Haunch.Base(), BottomHaunch: s.BottomSlab.Haunch.Base(), Chamfer: chamfer}
	case "double T":
		return section.DoubleT{Width: width, Depth: depth, Flange: s.FlangeDepth.Base(), Spacing: s.StemSpacing.Base(), StemBottom: s.StemWidthSoffit.Base(), StemTop: s.StemWidthFlange.Base(), Haunch: s.Haunch.Base(), Chamfer: chamfer}
	case "hollow unit":
		v, j := &s.Voids, &s.Joint
		return section.HollowUnit{Width: width, Depth: depth, VoidWidth: v.Width.Base(), VoidDepth: v.Depth.Base(), Count: v.Count.N, Spacing: v.Spacing.Base(), Level: v.Height.Base(), Chamfer: chamfer,
			Joint: section.Joint{Inset: j.Inset.Base(), Recess: j.Recess.Base(), From: j.Low.Base(), To: j.High.Base(), Flank: j.Flank.Base()}}
	}
	return s.polygon()
}

// polygon is the contour of a shape given by its corners.
func (s *Shape) polygon() section.Contour {
	ring := func(corners []Corner) section.Ring {
		var r section.Ring
		for _, c := range corners {
			r = append(r, section.Point{X: c.X.Base(), Y: c.Y.Base()})
		}
		return r
	}
	c := section.Polygon(ring(s.Corners)...)
	for _, h := range s.Holes {
		c.Holes = append(c.Holes, ring(h.Corners))
	}
	for _, v := range s.RoundVoids {
		c.Voids = append(c.Voids, section.Round{X: v.X.Base(), Y: v.Y.Base(), Width: v.Width.Base(), Depth: v.Depth.Base()})
	}
	return c
}

// ShapeKinds are the kinds of cross-section by their words in the member file.
func ShapeKinds() []string { return slices.Clone(planOf(shapeType).find("kind").words) }
