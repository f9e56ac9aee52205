// Package section holds the geometry of a concrete section and its properties. Lengths are in mm, y is
// measured upward from the soffit. A section is symmetrical about its vertical axis.
package section

import (
	"fmt"
	"math"
)

// Strip is one horizontal layer of a section: a trapezoid symmetrical about the vertical axis, mm.
type Strip struct {
	Height      float64 // > 0
	Bottom, Top float64 // widths, ≥ 0 and not both 0
}

// Shape is a stack of strips from the soffit up. The zero value is no section; New makes one.
type Shape struct {
	strips   []Strip
	height   float64
	area     float64
	centroid float64 // above the soffit
	inertia  float64 // about the horizontal axis through the centroid
	lateral  float64 // about the vertical axis
	around   float64 // perimeter
}

// thin is the part of the depth below which a strip is taken for a remainder of rounding.
const thin = 1e-9

// New stacks strips from the soffit up, lengths in mm. It refuses an empty stack and strips whose height
// is not above zero, whose widths are negative or both zero, or that are not finite. Strips thinner than
// 1e-9 of the whole are left out: they are what rounding leaves where two edges should meet.
func New(strips ...Strip) (Shape, error) {
	if len(strips) == 0 {
		return Shape{}, fmt.Errorf("section without strips")
	}
	for i, t := range strips {
		switch {
		case !(t.Height > 0) || math.IsInf(t.Height, 0):
			return Shape{}, fmt.Errorf("strip %d from the soffit: height %g mm, want a length above 0", i+1, t.Height)
		case !(t.Bottom >= 0) || !(t.Top >= 0) || math.IsInf(t.Bottom+t.Top, 0):
			return Shape{}, fmt.Errorf("strip %d from the soffit: widths %g mm and %g mm, want lengths from 0", i+1, t.Bottom, t.Top)
		case t.Bottom+t.Top == 0:
			return Shape{}, fmt.Errorf("strip %d from the soffit has no width", i+1)
		}
	}
	var whole float64
	for _, t := range strips {
		whole += t.Height
	}
	var s Shape
	for _, t := range strips {
		if t.Height >= thin*whole {
			s.strips = append(s.strips, t)
		}
	}
	var moment float64 // of the area about the soffit
	for _, t := range s.strips {
		moment += t.area() * (s.height + t.centroid())
		s.area += t.area()
		s.lateral += t.lateral()
		s.height += t.Height
	}
	s.centroid = moment / s.area
	y := 0.0
	for _, t := range s.strips {
		e := y + t.centroid() - s.centroid
		s.inertia += t.inertia() + t.area()*e*e
		y += t.Height
	}
	s.around = perimeter(s.strips)
	return s, nil
}

// Height is the overall depth, mm.
func (s Shape) Height() float64 { return s.height }

// Area is the area, mm².
func (s Shape) Area() float64 { return s.area }

// Centroid is the height of the centroid above the soffit, mm.
func (s Shape) Centroid() float64 { return s.centroid }

// Inertia is the second moment of area about the horizontal axis through the centroid, mm⁴.
func (s Shape) Inertia() float64 { return s.inertia }

// LateralInertia is the second moment of area about the vertical axis of symmetry, mm⁴.
func (s Shape) LateralInertia() float64 { return s.lateral }

// TopModulus is Inertia over the distance of the top fibre from the centroid, mm³, positive.
func (s Shape) TopModulus() float64 { return s.inertia / (s.height - s.centroid) }

// BottomModulus is Inertia over the distance of the soffit from the centroid, mm³, positive.
func (s Shape) BottomModulus() float64 { return s.inertia / s.centroid }

// Perimeter is the length of the outline, mm: sides along their slope, ledges, soffit and top.
func (s Shape) Perimeter() float64 { return s.around }

// Strips returns a copy of the strips from the soffit up.
func (s Shape) Strips() []Strip { return append([]Strip(nil), s.strips...) }

// WidthAt is the width at height y above the soffit, mm. At a ledge it is the smaller of the two widths
// that meet there. Outside the section, y < 0 or y > Height, it is 0.
func (s Shape) WidthAt(y float64) float64 {
	if !(y >= 0 && y <= s.height) {
		return 0
	}
	foot, width := 0.0, math.Inf(1)
	for _, t := range s.strips {
		if head := foot + t.Height; y <= head {
			width = math.Min(width, t.widthAt(y-foot))
			if y < head {
				return width
			}
		}
		foot += t.Height
	}
	return width
}

// LeastWidth is the smallest width between the heights from and to, mm: the b_w of a web. At the ends
// themselves a ledge does not count: the range is open. It is 0 where the range lies outside the section.
func (s Shape) LeastWidth(from, to float64) float64 {
	foot, width := 0.0, math.Inf(1)
	for _, t := range s.strips {
		lo, hi := math.Max(from, foot), math.Min(to, foot+t.Height)
		if lo < hi {
			width = math.Min(width, math.Min(t.widthAt(lo-foot), t.widthAt(hi-foot)))
		}
		foot += t.Height
	}
	if math.IsInf(width, 1) || from < 0 || to > s.height {
		return 0
	}
	return width
}

// Below gives the area under height y, mm², and its first moment about the soffit, mm³. y is taken into
// [0, Height].
func (s Shape) Below(y float64) (area, moment float64) {
	foot := 0.0
	for _, t := range s.strips {
		if y <= foot {
			break
		}
		if y < foot+t.Height {
			t = Strip{Height: y - foot, Bottom: t.Bottom, Top: t.widthAt(y - foot)}
		}
		area += t.area()
		moment += t.area() * (foot + t.centroid())
		foot += t.Height
	}
	return area, moment
}

// StaticMoment is the first moment about the centroidal axis of the area above height y, mm³, never
// negative: the S of the longitudinal shear at y. It equals, with the other sign, that of the area below.
func (s Shape) StaticMoment(y float64) float64 {
	area, moment := s.Below(y)
	return math.Max(0, area*s.centroid-moment)
}

func (t Strip) area() float64 { return t.Height * (t.Bottom + t.Top) / 2 }

// centroid is the height of the strip's centroid above its foot.
func (t Strip) centroid() float64 {
	return t.Height * (t.Bottom + 2*t.Top) / (3 * (t.Bottom + t.Top))
}

// inertia is about the horizontal axis through the strip's own centroid.
func (t Strip) inertia() float64 {
	a, b := t.Bottom, t.Top
	return t.Height * t.Height * t.Height * (a*a + 4*a*b + b*b) / (36 * (a + b))
}

// lateral is about the vertical axis of symmetry: the integral of width³/12.
func (t Strip) lateral() float64 {
	a, b := t.Bottom, t.Top
	return t.Height * (a + b) * (a*a + b*b) / 48
}

func (t Strip) widthAt(y float64) float64 { return t.Bottom + (t.Top-t.Bottom)*(y/t.Height) }

func perimeter(strips []Strip) float64 {
	u, before := 0.0, 0.0 // the width that the next strip meets
	for _, t := range strips {
		u += math.Abs(t.Bottom-before) + 2*math.Hypot(t.Height, (t.Top-t.Bottom)/2)
		before = t.Top
	}
	return u + before
}
