package section

import (
	"errors"
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"
)

// The forms that New has too give its strips, one by one.
func TestFormsAreTheStacks(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		mm := func(name string, lo, hi int) float64 { return float64(rapid.IntRange(lo, hi).Draw(t, name)) }
		flange := func(name string) Flange {
			return Flange{mm(name+" width", 301, 2000), mm(name+" depth", 50, 300), mm(name+" haunch", 0, 100)}
		}
		h, web, top, bottom := mm("depth", 900, 2500), mm("web", 80, 300), flange("top"), flange("bottom")
		for name, c := range map[string]struct {
			form  Form
			shape func() (Shape, error)
		}{
			"rectangle": {RectangularBeam{Width: web, Depth: h}, func() (Shape, error) { return Rectangle(web, h) }},
			"T":         {TBeam{Depth: h, Flange: top, Web: web}, func() (Shape, error) { return T(h, top, web) }},
			"I":         {IBeam{Depth: h, Top: top, Web: web, Bottom: bottom}, func() (Shape, error) { return I(h, top, web, bottom) }},
			"inverted T": {InvertedT{Depth: h, Ledge: bottom, Web: web}, func() (Shape, error) {
				s, err := T(h, bottom, web)
				return s.Flipped(), err
			}},
			"trapezoid": {Trapezoid{Bottom: web, Top: top.Width, Depth: h}, func() (Shape, error) { return New(Strip{h, web, top.Width}) }},
		} {
			o, err := c.form.Outline()
			s, fault := c.shape()
			if err != nil || fault != nil {
				t.Fatal(err, fault)
			}
			if !slices.Equal(o.Strips(), s.Strips()) {
				t.Errorf("%s: strips %v, want %v", name, o.Strips(), s.Strips())
			}
			relative(t, name+" I", o.Inertia(), s.Inertia(), 1e-12)
			relative(t, name+" lateral I", o.LateralInertia(), s.LateralInertia(), 1e-12)
			relative(t, name+" u", o.Perimeter(), s.Perimeter(), 1e-12)
			relative(t, name+" S", o.StaticMoment(h/3), s.StaticMoment(h/3), 1e-10)
			if !o.Symmetrical() || math.Abs(o.Product()) > 1e-12*o.Inertia() || math.Abs(o.CentroidX()) > 1e-9 {
				t.Errorf("%s: x = %g, product %g", name, o.CentroidX(), o.Product())
			}
		}
	})
}

// Areas and centroids of the other forms, added up by hand from rectangles, triangles and circles.
func TestFormsByHand(t *testing.T) {
	type bit struct{ area, y float64 }
	rect := func(b, h, y float64) bit { return bit{b * h, y + h/2} }
	// Triangles of width b and height h above y, point up or down.
	up := func(b, h, y float64) bit { return bit{b * h / 2, y + h/3} }
	down := func(b, h, y float64) bit { return bit{b * h / 2, y + 2*h/3} }
	less := func(b bit) bit { return bit{-b.area, b.y} }
	for _, c := range []struct {
		name string
		form Form
		bits []bit
		u    float64
	}{
		{"chamfered rectangle", RectangularBeam{300, 600, 20, 10},
			[]bit{rect(300, 600, 0), less(up(20, 20, 0)), less(up(20, 20, 0)), less(down(20, 10, 590))}, 1800 - 60*2 + 60*math.Sqrt2},
		{"I with haunches and chamfer", IBeam{1000, Flange{600, 120, 80}, 160, Flange{500, 150, 100}, 15},
			[]bit{rect(500, 150, 0), rect(160, 100, 150), up(340, 100, 150), rect(160, 550, 250), rect(160, 80, 800), down(440, 80, 800), rect(600, 120, 880), less(up(30, 15, 0))}, 0},
		{"U", UBeam{800, 1000, 900, 120, 150, 60, 15},
			[]bit{rect(800, 900, 0), down(200, 900, 0), less(rect(560+200*150./900, 750, 150)), less(down(200*750./900, 750, 150)), up(120, 60, 150), less(up(30, 15, 0))}, 0},
		{"box", BoxBeam{1200, 900, 2000, 150, 130, 140, 100, 50, 20},
			[]bit{rect(1200, 900, 0), rect(800, 150, 750), less(rect(940, 610, 140)), down(200, 100, 650), up(100, 50, 140), less(up(40, 20, 0))},
			2*2000 + 2*900 - 80 + 40*math.Sqrt2},
		{"double T", DoubleT{2400, 600, 60, 1200, 120, 160, 40, 10},
			[]bit{rect(2400, 60, 540), rect(240, 540, 0), down(80, 540, 0), down(160, 40, 500), less(up(40, 10, 0))}, 0},
		{"hollow unit", HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 180, Count: 6, Spacing: 185, Level: 130},
			[]bit{rect(1200, 265, 0), less(rect(900, 30, 115)), {-6 * math.Pi * 75 * 75, 130}}, 2930},
		{"hollow unit with joint", HollowUnit{1200, 200, 100, 100, 7, 160, 95, Joint{15, 30, 50, 170, 15}, 0},
			[]bit{rect(1200, 200, 0), {-7 * math.Pi * 50 * 50, 95}, less(rect(60, 90, 65)), less(down(60, 15, 50)), less(up(30, 15, 155)), less(rect(30, 45, 155))}, 0},
		{"hollow unit with one level void and leaning sides", HollowUnit{Width: 600, Depth: 200, VoidWidth: 300, VoidDepth: 100, Count: 1, Level: 90, Joint: Joint{Inset: 20}},
			[]bit{rect(560, 200, 0), up(40, 200, 0), less(rect(200, 100, 40)), {-math.Pi * 2500, 90}}, 600 + 560 + 2*math.Hypot(200, 20)},
		{"ring", RoundBeam{600, 400}, []bit{{math.Pi * 9e4, 300}, {-math.Pi * 4e4, 300}}, 600 * math.Pi},
	} {
		o := set(t, c.form)
		var area, moment float64
		for _, b := range c.bits {
			area += b.area
			moment += b.area * b.y
		}
		near(t, c.name+": A", o.Area(), area, 1e-8)
		near(t, c.name+": y", o.Centroid(), moment/area, 1e-9)
		if c.u > 0 {
			near(t, c.name+": u", o.Perimeter(), c.u, 1e-9)
		}
		p := o.ByPolygons()
		near(t, c.name+": A by polygons", p.Area/o.Area(), 1, 1e-12)
		near(t, c.name+": y by polygons", p.Centroid/o.Centroid(), 1, 1e-12)
		near(t, c.name+": I by polygons", p.Inertia/o.Inertia(), 1, 1e-11)
		s := o.BySlices(400)
		near(t, c.name+": I by slices", s.Inertia/o.Inertia(), 1, 5e-4)
		near(t, c.name+": lateral I by slices", s.LateralInertia/o.LateralInertia(), 1, 2e-4)
		if !o.Symmetrical() {
			t.Errorf("%s: not symmetrical", c.name)
		}
		if f := o.Flipped(); math.Abs(f.Inertia()/o.Inertia()-1) > 1e-12 || math.Abs(f.Centroid()+o.Centroid()-o.Height()) > 1e-9 ||
			f.Perimeter() != o.Perimeter() || f.InsidePerimeter() != o.InsidePerimeter() || !f.Symmetrical() {
			t.Errorf("%s: upside down it has other properties", c.name)
		}
	}
}

func TestMeasuresRefused(t *testing.T) {
	nan, inf := math.NaN(), math.Inf(1)
	flange := Flange{600, 120, 80}
	for want, forms := range map[string][]Form{
		"width at the soffit": {RectangularBeam{-1, 600, 0, 0}, RectangularBeam{nan, 600, 0, 0}, Trapezoid{Bottom: inf, Top: 1, Depth: 1}, UBeam{0, 1000, 900, 120, 150, 0, 0}},
		"width at the top":    {Trapezoid{Bottom: 100, Top: -1, Depth: 100}, UBeam{800, nan, 900, 120, 150, 0, 0}},
		"width":               {RectangularBeam{0, 600, 0, 0}, BoxBeam{}, DoubleT{}, HollowUnit{}},
		"depth": {RectangularBeam{300, 0, 0, 0}, RectangularBeam{300, inf, 0, 0}, TBeam{Flange: flange, Web: 200}, InvertedT{}, IBeam{Depth: -1},
			UBeam{Bottom: 1, Top: 1}, BoxBeam{Width: 1}, DoubleT{Width: 1}, HollowUnit{Width: 1}},
		"chamfer": {RectangularBeam{300, 600, 151, 0}, RectangularBeam{300, 600, -1, 0}, TBeam{800, flange, 200, 101}, InvertedT{900, flange, 200, 121},
			IBeam{1000, flange, 200, flange, nan}, DoubleT{2400, 600, 60, 1200, 120, 160, 40, 61}, HollowUnit{Width: 1200, Depth: 265, Chamfer: -1}},
		"chamfers":                                 {RectangularBeam{300, 20, 10, 10}},
		"flange width":                             {TBeam{800, Flange{0, 100, 0}, 200, 0}},
		"flange depth":                             {TBeam{800, Flange{900, 0, 0}, 200, 0}},
		"flange haunch depth":                      {TBeam{800, Flange{900, 100, -1}, 200, 0}},
		"flange depth with haunch":                 {TBeam{800, Flange{900, 700, 100}, 200, 0}},
		"web width":                                {TBeam{800, flange, 0, 0}, InvertedT{800, flange, inf, 0}, IBeam{1000, flange, -1, flange, 0}},
		"ledge depth":                              {InvertedT{800, Flange{900, -1, 0}, 200, 0}},
		"ledge depth with haunch":                  {InvertedT{200, flange, 200, 0}},
		"top flange width":                         {IBeam{Depth: 1000, Web: 200, Bottom: flange}},
		"bottom flange width":                      {IBeam{Depth: 1000, Web: 200, Top: flange}},
		"flange depths with haunches":              {IBeam{399, flange, 200, flange, 0}},
		"web thickness":                            {UBeam{800, 1000, 900, 0, 150, 0, 0}, UBeam{800, 1000, 900, 450, 150, 0, 0}, BoxBeam{1200, 900, 0, 150, 600, 150, 0, 0, 0}},
		"floor thickness":                          {UBeam{800, 1000, 900, 120, 0, 0, 0}},
		"floor thickness with haunch":              {UBeam{800, 1000, 900, 120, 900, 0, 0}},
		"haunch":                                   {UBeam{800, 1000, 900, 120, 150, 400, 0}, UBeam{800, 1000, 900, 120, 150, -1, 0}, BoxBeam{1200, 900, 0, 150, 130, 140, 471, 0, 0}, DoubleT{2400, 600, 60, 1200, 120, 160, -1, 0}},
		"haunches":                                 {BoxBeam{1200, 900, 0, 150, 130, 140, 311, 300, 0}},
		"width of the top slab":                    {BoxBeam{1200, 900, 1199, 150, 130, 140, 0, 0, 0}, BoxBeam{1200, 900, inf, 150, 130, 140, 0, 0, 0}},
		"slab thicknesses":                         {BoxBeam{1200, 900, 0, 450, 130, 450, 0, 0, 0}},
		"thickness of the top slab":                {BoxBeam{Width: 1200, Depth: 900}},
		"thickness of the bottom slab":             {BoxBeam{1200, 900, 0, 150, 130, 0, 0, 0, 0}},
		"haunch at the top":                        {BoxBeam{1200, 900, 0, 150, 130, 140, -1, 0, 0}},
		"haunch at the bottom":                     {BoxBeam{1200, 900, 0, 150, 130, 140, 0, nan, 0}},
		"stems":                                    {DoubleT{1300, 600, 60, 1200, 120, 160, 40, 0}},
		"stem width":                               {DoubleT{2400, 600, 60, 240, 120, 160, 40, 0}},
		"stem spacing":                             {DoubleT{2400, 600, 60, 0, 120, 160, 40, 0}},
		"flange thickness":                         {DoubleT{2400, 600, 0, 1200, 120, 160, 40, 0}},
		"flange thickness with haunch":             {DoubleT{2400, 600, 560, 1200, 120, 160, 40, 0}},
		"stem width at the soffit":                 {DoubleT{2400, 600, 60, 1200, 0, 160, 40, 0}},
		"stem width under the flange":              {DoubleT{2400, 600, 60, 1200, 120, -1, 40, 0}},
		"count of voids":                           {HollowUnit{Width: 1200, Depth: 265, Count: -1}, HollowUnit{Width: 1200, Depth: 265, Count: 1e6}},
		"void width":                               {HollowUnit{Width: 1200, Depth: 265, Count: 1}},
		"void depth":                               {HollowUnit{Width: 1200, Depth: 265, Count: 1, VoidWidth: 1, VoidDepth: 265, Level: 1}, HollowUnit{Width: 1200, Depth: 265, Count: 1, VoidWidth: 1}},
		"level of the voids":                       {HollowUnit{Width: 1200, Depth: 265, Count: 1, VoidWidth: 1, VoidDepth: 1}},
		"spacing of the voids":                     {HollowUnit{Width: 1200, Depth: 265, Count: 2, VoidWidth: 1, VoidDepth: 1, Level: 100}},
		"inset of the top edge":                    {HollowUnit{Width: 100, Depth: 100, Joint: Joint{Inset: 50}}, HollowUnit{Width: 100, Depth: 100, Joint: Joint{Inset: -1}}, HollowUnit{Width: 100, Depth: 100, Joint: Joint{11, 10, 20, 80, 0}}},
		"recess of the joint":                      {HollowUnit{Width: 100, Depth: 100, Joint: Joint{0, 50, 20, 80, 0}}, HollowUnit{Width: 100, Depth: 100, Joint: Joint{0, -1, 20, 80, 0}}},
		"lower level of the joint":                 {HollowUnit{Width: 100, Depth: 100, Joint: Joint{0, 10, -20, 80, 0}}},
		"upper level of the joint":                 {HollowUnit{Width: 100, Depth: 100, Joint: Joint{0, 10, 20, 100, 0}}},
		"flank of the joint":                       {HollowUnit{Width: 100, Depth: 100, Joint: Joint{0, 10, 20, 80, -1}}},
		"lower level of the joint with its flanks": {HollowUnit{Width: 100, Depth: 100, Joint: Joint{0, 10, 20, 80, 30}}},
		"diameter":                                 {RoundBeam{0, 0}, RoundBeam{nan, 0}},
		"bore":                                     {RoundBeam{100, 100}, RoundBeam{100, -1}},
	} {
		for _, f := range forms {
			_, err := f.Outline()
			var m *Measure
			if !errors.As(err, &m) || m.Name != want || m.Want == "" {
				t.Errorf("%#v: %v, want %s refused", f, err, want)
			}
		}
	}
	m := &Measure{"web width", -5, "a length above 0 mm"}
	if got := m.Error(); got != "web width: have -5, want a length above 0 mm" {
		t.Error(got)
	}
	// What is the lines' fault is found by the lines.
	for _, c := range []struct {
		form Form
		want Reason
	}{
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 150, Level: 130}, Touching},
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 149, Level: 130}, Crossing},
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 210, Level: 130}, Touching},
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 220, Level: 130}, Crossing},
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 185, Level: 75}, Touching},
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 185, Level: 500}, HoleOutside},
		{HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: nan, Level: 130}, 0},
	} {
		_, err := c.form.Outline()
		if err == nil || c.want != 0 && !errors.Is(err, c.want) {
			t.Errorf("%#v: %v, want %v", c.form, err, c.want)
		}
	}
}
