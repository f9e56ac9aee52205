package section

import (
	"math"
	"testing"

	"gonum.org/v1/gonum/integrate/quad"
	"pgregory.net/rapid"
)

func near(t testing.TB, name string, got, want, tol float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tol) {
		t.Errorf("%s: %.10g, want %.10g ± %g", name, got, want, tol)
	}
}

func must(t testing.TB, s Shape, err error) Shape {
	t.Helper()
	if err != nil {
		t.Fatal(err)
	}
	return s
}

// Published properties of standard bridge girders, in inches (the formulas carry no unit).
// Source: PCI Journal, May–June 2021, appendix (Brice, Pickings). Grade: properties opened; dimensions of
// the strips recalled. Tolerance: half a unit of the last printed digit.
func TestGirdersOfTheAppendix(t *testing.T) {
	cases := []struct {
		name                     string
		strips                   []Strip
		area, yTop, yBottom      float64
		inertia, lateral         float64
		iTolerance, latTolerance float64
	}{
		{"type I", []Strip{{5, 16, 16}, {5, 16, 6}, {11, 6, 6}, {3, 6, 12}, {4, 12, 12}},
			276, 15.41, 12.59, 22744, 3352, 0.5, 0.5},
		{"type II", []Strip{{6, 18, 18}, {6, 18, 6}, {15, 6, 6}, {3, 6, 12}, {6, 12, 12}},
			369, 20.17, 15.83, 50979, 5333, 0.5, 0.5},
	}
	for _, c := range cases {
		s, err := New(c.strips...)
		s = must(t, s, err)
		near(t, c.name+" A", s.Area(), c.area, 0.5)
		near(t, c.name+" y_t", s.Height()-s.Centroid(), c.yTop, 0.005)
		near(t, c.name+" y_b", s.Centroid(), c.yBottom, 0.005)
		near(t, c.name+" I_x", s.Inertia(), c.inertia, c.iTolerance)
		near(t, c.name+" I_y", s.LateralInertia(), c.lateral, c.latTolerance)
		p := s.ByStrips(300)
		near(t, c.name+" A by strips", p.Area, c.area, 0.5)
		near(t, c.name+" y_b by strips", p.Centroid, c.yBottom, 0.005)
		near(t, c.name+" I_x by strips", p.Inertia, c.inertia, c.iTolerance)
		near(t, c.name+" I_y by strips", p.LateralInertia, c.lateral, c.latTolerance+0.01) // II: exactly 5332.5
	}
}

// Parts of the stress of a rectangular beam 20 in × 30 in under P = 360 kip at e = 6 in and 216 kip·ft.
// Source: Lin, Burns, Design of Prestressed Concrete Structures, 3rd ed. 1981, example 1-1.
// Grade: recalled. Published 600, 720 and 864 psi.
func TestRectangularBeamOfTheTextbook(t *testing.T) {
	s, err := Rectangle(20, 30)
	s = must(t, s, err)
	near(t, "P/A", 360e3/s.Area(), 600, 0.5)
	near(t, "P·e/W", 360e3*6/s.BottomModulus(), 720, 0.5)
	near(t, "M/W", 3e3*24*24/8*12/s.TopModulus(), 864, 0.5)
}

// Own derivations, from the formulas of any table of plane figures.
func TestClosedForms(t *testing.T) {
	rect, err := Rectangle(300, 600)
	rect = must(t, rect, err)
	near(t, "rectangle A", rect.Area(), 180e3, 1e-9)
	near(t, "rectangle y", rect.Centroid(), 300, 1e-12)
	near(t, "rectangle I", rect.Inertia(), 300*600.*600*600/12, 1e-3)
	near(t, "rectangle I lateral", rect.LateralInertia(), 600*300.*300*300/12, 1e-3)
	near(t, "rectangle u", rect.Perimeter(), 1800, 1e-12)
	near(t, "rectangle S at the centroid", rect.StaticMoment(300), 300*600.*600/8, 1e-6)

	up, err := New(Strip{300, 200, 0}) // triangle, apex up
	up = must(t, up, err)
	near(t, "triangle A", up.Area(), 30e3, 1e-9)
	near(t, "triangle y", up.Centroid(), 100, 1e-12)
	near(t, "triangle I", up.Inertia(), 200*300.*300*300/36, 1e-6)
	near(t, "triangle I lateral", up.LateralInertia(), 300*200.*200*200/48, 1e-6)
	near(t, "triangle u", up.Perimeter(), 200+2*math.Hypot(300, 100), 1e-12)
	down, err := New(Strip{300, 0, 200})
	down = must(t, down, err)
	near(t, "triangle turned y", down.Centroid(), 200, 1e-12)

	tee, err := T(800, Flange{Width: 1200, Depth: 150}, 300)
	tee = must(t, tee, err)
	a1, a2 := 1200*150., 300*650.
	y := (a1*725 + a2*325) / (a1 + a2)
	near(t, "T A", tee.Area(), a1+a2, 1e-9)
	near(t, "T y", tee.Centroid(), y, 1e-10)
	near(t, "T I", tee.Inertia(), 1200*150.*150*150/12+a1*(725-y)*(725-y)+300*650.*650*650/12+a2*(325-y)*(325-y), 1)
	near(t, "T u", tee.Perimeter(), 2*1200+2*800, 1e-9)
	near(t, "T S under the flange", tee.StaticMoment(650), a1*(725-y), 1e-3)
	near(t, "T W top", tee.TopModulus(), tee.Inertia()/(800-y), 1e-3)
	near(t, "T W bottom", tee.BottomModulus(), tee.Inertia()/y, 1e-3)
}

func TestWidths(t *testing.T) {
	s, err := I(1000, Flange{600, 120, 80}, 160, Flange{500, 150, 100})
	s = must(t, s, err)
	cases := []struct{ y, want float64 }{
		{-1, 0}, {0, 500}, {150, 500}, {200, 330}, {250, 160}, {500, 160}, {800, 160}, {840, 380}, {880, 600}, {1000, 600}, {1000.1, 0},
	}
	for _, c := range cases {
		near(t, "width", s.WidthAt(c.y), c.want, 1e-9)
	}
	near(t, "web", s.LeastWidth(0, 1000), 160, 1e-9)
	near(t, "least width in the top flange", s.LeastWidth(880, 1000), 600, 1e-9)
	near(t, "least width across a haunch", s.LeastWidth(840, 900), 380, 1e-9)
	near(t, "least width outside", s.LeastWidth(900, 1100), 0, 0)
	near(t, "least width outside", s.LeastWidth(-1, 100), 0, 0)

	tee, err := T(500, Flange{Width: 800, Depth: 100}, 200)
	tee = must(t, tee, err)
	near(t, "T at the ledge", tee.WidthAt(400), 200, 0)
	near(t, "T above the ledge", tee.WidthAt(math.Nextafter(400, 500)), 800, 0)
	if n := len(tee.Strips()); n != 2 {
		t.Errorf("T without haunch has %d strips, want 2", n)
	}
	if math.IsNaN(tee.WidthAt(math.NaN())) || tee.WidthAt(math.NaN()) != 0 {
		t.Error("width at NaN")
	}
}

func TestShapesRefused(t *testing.T) {
	nan := math.NaN()
	for name, make := range map[string]func() (Shape, error){
		"no strip":              func() (Shape, error) { return New() },
		"no height":             func() (Shape, error) { return New(Strip{0, 1, 1}) },
		"height NaN":            func() (Shape, error) { return New(Strip{nan, 1, 1}) },
		"height infinite":       func() (Shape, error) { return New(Strip{math.Inf(1), 1, 1}) },
		"negative width":        func() (Shape, error) { return New(Strip{1, -1, 1}) },
		"width NaN":             func() (Shape, error) { return New(Strip{1, 1, nan}) },
		"width infinite":        func() (Shape, error) { return New(Strip{1, math.Inf(1), 1}) },
		"no width":              func() (Shape, error) { return New(Strip{1, 1, 1}, Strip{1, 0, 0}) },
		"rectangle, no depth":   func() (Shape, error) { return Rectangle(300, 0) },
		"T, flange too deep":    func() (Shape, error) { return T(500, Flange{Width: 800, Depth: 500}, 200) },
		"T, haunch too deep":    func() (Shape, error) { return T(500, Flange{800, 300, 250}, 200) },
		"T, no flange depth":    func() (Shape, error) { return T(500, Flange{Width: 800}, 200) },
		"T, negative haunch":    func() (Shape, error) { return T(500, Flange{800, 100, -1}, 200) },
		"I, flanges too deep":   func() (Shape, error) { return I(500, Flange{800, 250, 0}, 200, Flange{600, 251, 0}) },
		"I, no bottom flange":   func() (Shape, error) { return I(500, Flange{800, 250, 0}, 200, Flange{}) },
		"I, negative haunch":    func() (Shape, error) { return I(500, Flange{800, 100, 0}, 200, Flange{600, 100, -1}) },
		"T, web without width":  func() (Shape, error) { return T(500, Flange{Width: 800, Depth: 100}, 0) },
		"I, depth not a number": func() (Shape, error) { return I(nan, Flange{800, 250, 0}, 200, Flange{600, 251, 0}) },
	} {
		if s, err := make(); err == nil {
			t.Errorf("%s: no error, area %g", name, s.Area())
		}
	}
	if _, err := I(500, Flange{800, 250, 0}, 200, Flange{600, 250, 0}); err != nil {
		t.Errorf("flanges that meet: %v", err)
	}
}

// anyShape draws one to six strips of any widths.
func anyShape(t *rapid.T) []Strip {
	return rapid.SliceOfN(rapid.Custom(func(t *rapid.T) Strip {
		return Strip{
			Height: rapid.Float64Range(5, 800).Draw(t, "height"),
			Bottom: rapid.Float64Range(10, 2000).Draw(t, "bottom"),
			Top:    rapid.Float64Range(10, 2000).Draw(t, "top"),
		}
	}), 1, 6).Draw(t, "strips")
}

func relative(t *rapid.T, name string, got, want, tol float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tol*math.Abs(want)) {
		t.Errorf("%s: %.12g, want %.12g within %g", name, got, want, tol)
	}
}

func TestPropertiesOfAnyShape(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		strips := anyShape(t)
		s, err := New(strips...)
		if err != nil {
			t.Fatal(err)
		}
		// Independent quadrature of the width, strip by strip.
		moment := func(power int) (sum float64) {
			foot := 0.0
			for _, p := range strips {
				sum += quad.Fixed(func(y float64) float64 {
					return (p.Bottom + (p.Top-p.Bottom)*(y-foot)/p.Height) * math.Pow(y-s.Centroid(), float64(power))
				}, foot, foot+p.Height, 8, quad.Legendre{}, 0)
				foot += p.Height
			}
			return sum
		}
		relative(t, "A", s.Area(), moment(0), 1e-12)
		if m := moment(1); math.Abs(m) > 1e-11*s.Area()*s.Height() {
			t.Errorf("first moment about the centroid %g", m)
		}
		relative(t, "I", s.Inertia(), moment(2), 1e-10)

		p := s.ByStrips(1000)
		relative(t, "A by strips", p.Area, s.Area(), 1e-12)
		relative(t, "y by strips", p.Centroid, s.Centroid(), 1e-6)
		relative(t, "I by strips", p.Inertia, s.Inertia(), 1e-5)
		relative(t, "lateral I by strips", p.LateralInertia, s.LateralInertia(), 1e-5)

		// Turned upside down.
		turned := make([]Strip, len(strips))
		for i, p := range strips {
			turned[len(strips)-1-i] = Strip{p.Height, p.Top, p.Bottom}
		}
		u, err := New(turned...)
		if err != nil {
			t.Fatal(err)
		}
		relative(t, "turned I", u.Inertia(), s.Inertia(), 1e-12)
		relative(t, "turned y", s.Height()-u.Centroid(), s.Centroid(), 1e-9)
		relative(t, "turned u", u.Perimeter(), s.Perimeter(), 1e-12)
		y := s.Height() * rapid.Float64Range(0, 1).Draw(t, "y")
		if d := math.Abs(s.StaticMoment(y) - u.StaticMoment(s.Height()-y)); d > 1e-9*s.Area()*s.Height() {
			t.Errorf("static moments of the two sides of %g differ by %g", y, d)
		}
		if w := s.WidthAt(y); w < s.LeastWidth(0, s.Height())*(1-1e-12) {
			t.Errorf("width %g at %g below the least width", w, y)
		}

		// A cut changes nothing.
		area, first := s.Below(y)
		above, _ := u.Below(s.Height() - y)
		relative(t, "A of both parts", area+above, s.Area(), 1e-10)
		if first < 0 || first > area*y*(1+1e-12) {
			t.Errorf("first moment %g of the part below %g", first, y)
		}
		all, _ := s.Below(2 * s.Height())
		relative(t, "A below the sky", all, s.Area(), 1e-12)

		// Twice as wide.
		wide := make([]Strip, len(strips))
		for i, p := range strips {
			wide[i] = Strip{p.Height, 2 * p.Bottom, 2 * p.Top}
		}
		w, err := New(wide...)
		if err != nil {
			t.Fatal(err)
		}
		relative(t, "A twice as wide", w.Area(), 2*s.Area(), 1e-13)
		relative(t, "I twice as wide", w.Inertia(), 2*s.Inertia(), 1e-13)
		relative(t, "lateral I twice as wide", w.LateralInertia(), 8*s.LateralInertia(), 1e-13)
	})
}

// What rounding leaves where two edges should meet is no strip, and no fault.
func TestThinStrips(t *testing.T) {
	want, err := I(0.3, Flange{0.4, 0.1, 0}, 0.1, Flange{0.4, 0.2, 0})
	want = must(t, want, err) // 0.3 − 0.1 − 0.2 is not 0 in doubles
	if n := len(want.Strips()); n != 2 {
		t.Errorf("%d strips, want 2", n)
	}
	for _, h := range []float64{5e-324, 1e-300, 1e-14, 1e-8} {
		s, err := New(Strip{h, 10, 500}, Strip{100, 400, 400}, Strip{h, 400, 200}, Strip{200, 200, 200}, Strip{h, 200, 900})
		s = must(t, s, err)
		if n := len(s.Strips()); n != 2 {
			t.Errorf("%d strips, want 2", n)
		}
		near(t, "A", s.Area(), 80e3, 1e-9)
		near(t, "u", s.Perimeter(), 1400, 1e-9)
	}
}

func TestByStripsConverges(t *testing.T) {
	s, err := New(Strip{300, 200, 0}, Strip{200, 100, 400})
	s = must(t, s, err)
	off := func(n int) float64 { return math.Abs(s.ByStrips(n).Inertia/s.Inertia() - 1) }
	if a, b := off(50), off(100); !(b < a/3.5 && b > a/4.5) {
		t.Errorf("off by %g with 50 slices, by %g with 100: want a quarter", a, b)
	}
	r, err := Rectangle(300, 600)
	r = must(t, r, err)
	near(t, "a rectangle as one slice", r.ByStrips(1).Inertia, 5.4e9, 1e-3)
	defer func() {
		if recover() == nil {
			t.Error("no panic at 0 slices")
		}
	}()
	s.ByStrips(0)
}

func TestStripsAreACopy(t *testing.T) {
	mine := []Strip{{100, 200, 200}}
	s, err := New(mine...)
	s = must(t, s, err)
	mine[0].Top = 1
	s.Strips()[0].Height = 1
	near(t, "area", s.Area(), 20e3, 1e-9)
	near(t, "width", s.WidthAt(100), 200, 0)
}
