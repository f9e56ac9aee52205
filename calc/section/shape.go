// Package section holds the geometry of a concrete section and its properties. Lengths are in mm, y is
// measured upward from the soffit, x to the right.
//
// A Shape is what bending about the level axis sees of a section: its width at each level, as a stack of
// straight-sided strips and the round parts beside them. New makes one from strips; an Outline, which has
// corners, holes and voids in their places, carries its Shape.
package section

import (
	"fmt"
	"math"
)

// Strip is one horizontal layer of a section: a trapezoid, mm. New takes it to be symmetrical about the
// vertical axis.
type Strip struct {
	Height      float64 // > 0
	Bottom, Top float64 // widths, ≥ 0 and not both 0
}

// Shape is a stack of strips from the soffit up, less round voids. The zero value is no section; New makes
// one, and an Outline has one.
type Shape struct {
	strips   []Strip
	levels   []float64 // of the foot of each strip and of the top
	curves   []Curve
	stacked  bool // by New: symmetrical and without gaps
	height   float64
	area     float64
	centroid float64 // above the soffit
	inertia  float64 // about the horizontal axis through the centroid
	lateral  float64 // about the vertical axis through the centroid
	around   float64 // perimeter outside
	inside   float64 // perimeter of holes and voids
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
	var kept []Strip
	levels := []float64{0}
	for _, t := range strips {
		if t.Height >= thin*whole {
			kept = append(kept, t)
			levels = append(levels, levels[len(levels)-1]+t.Height)
		}
	}
	s := assemble(kept, levels, nil)
	s.stacked = true
	for _, t := range kept {
		s.lateral += t.lateral()
	}
	s.around = perimeter(kept)
	return s, nil
}

// assemble finds the properties of strips at their levels with the round parts. Widths may be 0, and below
// 0 where a round part of concrete more than makes up for it.
func assemble(strips []Strip, levels []float64, curves []Curve) Shape {
	s := Shape{strips: strips, levels: levels, curves: curves, height: levels[len(strips)]}
	var moment float64 // of the area about the soffit
	for i, t := range strips {
		s.area += t.area()
		moment += t.moment(levels[i])
	}
	for _, c := range curves {
		a, m := c.whole()
		s.area += a
		moment += m
	}
	s.centroid = moment / s.area
	for i, t := range strips {
		s.inertia += t.inertia(levels[i] - s.centroid)
	}
	for _, c := range curves {
		s.inertia += c.inertia(s.centroid)
	}
	return s
}

// Height is the overall depth, mm.
func (s Shape) Height() float64 { return s.height }

// Area is the area, mm².
func (s Shape) Area() float64 { return s.area }

// Centroid is the height of the centroid above the soffit, mm.
func (s Shape) Centroid() float64 { return s.centroid }

// Inertia is the second moment of area about the horizontal axis through the centroid, mm⁴.
func (s Shape) Inertia() float64 { return s.inertia }

// LateralInertia is the second moment of area about the vertical axis through the centroid, mm⁴.
func (s Shape) LateralInertia() float64 { return s.lateral }

// TopModulus is Inertia over the distance of the top fibre from the centroid, mm³, positive.
func (s Shape) TopModulus() float64 { return s.inertia / (s.height - s.centroid) }

// BottomModulus is Inertia over the distance of the soffit from the centroid, mm³, positive.
func (s Shape) BottomModulus() float64 { return s.inertia / s.centroid }

// Perimeter is the length of the outline, mm: sides along their slope, ledges, soffit and top. Holes and
// voids do not count: see InsidePerimeter.
func (s Shape) Perimeter() float64 { return s.around }

// InsidePerimeter is the length around the holes and voids, mm.
func (s Shape) InsidePerimeter() float64 { return s.inside }

// Strips returns a copy of the strips from the soffit up. Where there are Curves too, a strip's widths are
// those of the straight-sided parts alone: what the curves take away, or add, is not in them.
func (s Shape) Strips() []Strip { return append([]Strip(nil), s.strips...) }

// Curves returns a copy of the round parts.
func (s Shape) Curves() []Curve { return append([]Curve(nil), s.curves...) }

// Below gives the area under height y, mm², and its first moment about the soffit, mm³. y is taken into
// [0, Height].
func (s Shape) Below(y float64) (area, moment float64) {
	for i, t := range s.strips {
		foot := s.levels[i]
		if y <= foot {
			break
		}
		if y < s.levels[i+1] {
			t = Strip{Height: y - foot, Bottom: t.Bottom, Top: t.widthAt(y - foot)}
		}
		area += t.area()
		moment += t.moment(foot)
	}
	for _, c := range s.curves {
		a, m := c.Below(y)
		area += a
		moment += m
	}
	return area, moment
}

// StaticMoment is the first moment about the centroidal axis of the area above height y, mm³, never
// negative: the S of the longitudinal shear at y. It equals, with the other sign, that of the area below.
func (s Shape) StaticMoment(y float64) float64 {
	area, moment := s.Below(y)
	return math.Max(0, area*s.centroid-moment)
}

// Flipped is the shape upside down: hogging of the one is sagging of the other.
func (s Shape) Flipped() Shape {
	n := len(s.strips)
	strips, levels := make([]Strip, n), make([]float64, n+1)
	for i, t := range s.strips {
		strips[n-1-i] = Strip{Height: t.Height, Bottom: t.Top, Top: t.Bottom}
	}
	for i, y := range s.levels {
		levels[n-i] = s.height - y
	}
	var curves []Curve
	for _, c := range s.curves {
		curves = append(curves, c.flipped(s.height))
	}
	f := assemble(strips, levels, curves)
	f.stacked, f.lateral, f.around, f.inside = s.stacked, s.lateral, s.around, s.inside
	return f
}

func (t Strip) area() float64 { return t.Height * (t.Bottom + t.Top) / 2 }

// moment is the first moment about a level that lies foot under the strip.
func (t Strip) moment(foot float64) float64 {
	return t.area()*(foot+t.Height/2) + (t.Top-t.Bottom)*t.Height*t.Height/12
}

// inertia is about a level that lies foot under the strip, the strip's own included.
func (t Strip) inertia(foot float64) float64 {
	e, h := foot+t.Height/2, t.Height
	return t.area()*(e*e+h*h/12) + (t.Top-t.Bottom)*e*h*h/6
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
