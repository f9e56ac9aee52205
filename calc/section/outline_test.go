package section

import (
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"
)

func set[F Form](t testing.TB, f F) Outline {
	t.Helper()
	o, err := f.Outline()
	if err != nil {
		t.Fatalf("%#v: %v", f, err)
	}
	return o
}

// stacked is the ring round a stack of strips about x = 0.
func stacked(strips ...Strip) Ring {
	var half []Point
	y := 0.0
	for _, s := range strips {
		half = append(half, Point{s.Bottom / 2, y}, Point{s.Top / 2, y + s.Height})
		y += s.Height
	}
	return mirrored(half...)
}

// The girders of TestGirdersOfTheAppendix as polygons: the published properties, and to the last digits those
// of the strips. Same source, same grade.
func TestGirdersAsPolygons(t *testing.T) {
	for _, c := range []struct {
		name                                  string
		strips                                []Strip
		area, yTop, yBottom, inertia, lateral float64
		exact                                 Properties // worked in fractions; own derivation
	}{
		{"type I", []Strip{{5, 16, 16}, {5, 16, 6}, {11, 6, 6}, {3, 6, 12}, {4, 12, 12}}, 276, 15.41, 12.59, 22744, 3352,
			Properties{Area: 276, Centroid: 2606.0 / 207, Inertia: 14124104.0 / 621, LateralInertia: 10057.0 / 3}},
		{"type II", []Strip{{6, 18, 18}, {6, 18, 6}, {15, 6, 6}, {3, 6, 12}, {6, 12, 12}}, 369, 20.17, 15.83, 50979, 5333,
			Properties{Area: 369, Centroid: 649.0 / 41, Inertia: 4180257.0 / 82, LateralInertia: 10665.0 / 2}},
	} {
		o := set(t, Contour{Outer: []Ring{stacked(c.strips...)}})
		s, err := New(c.strips...)
		s = must(t, s, err)
		near(t, c.name+" A", o.Area(), c.area, 0.5)
		near(t, c.name+" y_t", o.Height()-o.Centroid(), c.yTop, 0.005)
		near(t, c.name+" y_b", o.Centroid(), c.yBottom, 0.005)
		near(t, c.name+" I_x", o.Inertia(), c.inertia, 0.5)
		near(t, c.name+" I_y", o.LateralInertia(), c.lateral, 0.5)
		for what, p := range map[string]Properties{"strips": seen(o), "polygons": o.ByPolygons()} {
			near(t, c.name+" A exactly, "+what, p.Area, c.exact.Area, 1e-11)
			near(t, c.name+" y_b exactly, "+what, p.Centroid, c.exact.Centroid, 1e-12)
			near(t, c.name+" I_x exactly, "+what, p.Inertia, c.exact.Inertia, 1e-9)
			near(t, c.name+" I_y exactly, "+what, p.LateralInertia, c.exact.LateralInertia, 1e-10)
		}
		near(t, c.name+" u", o.Perimeter(), s.Perimeter(), 1e-10)
		near(t, c.name+" x", o.CentroidX(), 0, 1e-12)
		if got, want := o.Strips(), s.Strips(); !slices.Equal(got, want) {
			t.Errorf("%s: strips %v, want %v", c.name, got, want)
		}
		if !o.Symmetrical() {
			t.Errorf("%s: not symmetrical", c.name)
		}
	}
}

// star is a ring round a centre, its corners between half the radius and the radius away: simple, and clear of
// a circle of a quarter of the radius.
func star(t *rapid.T, name string, c Point, radius float64) Ring {
	n := rapid.IntRange(5, 12).Draw(t, name+" corners")
	r := make(Ring, n)
	for i := range r {
		a := 2 * math.Pi * (float64(i) + rapid.Float64Range(0, 0.6).Draw(t, "turn")) / float64(n)
		d := radius * rapid.Float64Range(0.5, 1).Draw(t, "reach")
		r[i] = Point{c.X + d*math.Cos(a), c.Y + d*math.Sin(a)}
	}
	return r
}

// anyContour is a star with, or without, a hole and a round void; and its centre.
func anyContour(t *rapid.T) (Contour, Point) {
	size := math.Pow(10, rapid.Float64Range(1, 4).Draw(t, "log size"))
	c := Point{rapid.Float64Range(-2, 2).Draw(t, "x") * size, rapid.Float64Range(-2, 2).Draw(t, "y") * size}
	k := Contour{Outer: []Ring{star(t, "outer", c, size)}}
	if rapid.Bool().Draw(t, "with hole") {
		k.Holes = []Ring{star(t, "hole", Point{c.X - 0.13*size, c.Y}, 0.11*size)}
	}
	if rapid.Bool().Draw(t, "with void") {
		k.Voids = []Round{{c.X + 0.13*size, c.Y,
			0.2 * size * rapid.Float64Range(0.1, 1).Draw(t, "void width"), 0.2 * size * rapid.Float64Range(0.1, 1).Draw(t, "void depth")}}
		if rapid.Bool().Draw(t, "circle") {
			k.Voids[0].Depth = k.Voids[0].Width
		}
	}
	return k, c
}

// alike compares the properties of two figures, centroids after a shift.
func alike(t *rapid.T, name string, got, want Properties, shift Point) {
	t.Helper()
	size := math.Sqrt(want.Area)
	relative(t, name+": A", got.Area, want.Area, 1e-9)
	relative(t, name+": I", got.Inertia, want.Inertia, 1e-9)
	relative(t, name+": lateral I", got.LateralInertia, want.LateralInertia, 1e-9)
	for what, d := range map[string]float64{
		"x": (got.CentroidX - want.CentroidX - shift.X) / size, "y": (got.Centroid - want.Centroid - shift.Y) / size,
		"product": (got.Product - want.Product) / (want.Inertia + want.LateralInertia),
	} {
		if !(math.Abs(d) <= 1e-9) {
			t.Errorf("%s: %s off by %g of the size", name, what, d)
		}
	}
}

// seen are the properties an Outline's own methods give.
func seen(o Outline) Properties {
	return Properties{Area: o.Area(), Centroid: o.Centroid(), Inertia: o.Inertia(), LateralInertia: o.LateralInertia(), CentroidX: o.CentroidX(), Product: o.Product()}
}

// What must not change the properties: way round, first corner, place, mirror, a cut, a turn.
func TestPropertiesOfAnyOutline(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		k, _ := anyContour(t)
		o, err := k.Outline()
		if err != nil {
			t.Fatal(err)
		}
		p := seen(o)
		alike(t, "polygons", o.ByPolygons(), p, Point{})

		moved := func(point func(Point) Point, round func(Round) Round) Properties {
			o, err := k.changed(point, round).Outline()
			if err != nil {
				t.Fatal(err)
			}
			return seen(o)
		}
		whole := func(r Round) Round { return r }
		back := k.changed(func(p Point) Point { return p }, whole)
		for _, rings := range [][]Ring{back.Outer, back.Holes} {
			for i, r := range rings {
				reverse(r)
				n := rapid.IntRange(0, len(r)-1).Draw(t, "first corner")
				rings[i] = append(append(append(Ring{}, r[n:]...), r[:n]...), r[n]) // and the first again
			}
		}
		b, err := back.Outline()
		if err != nil {
			t.Fatal(err)
		}
		alike(t, "the other way round", seen(b), p, Point{})

		far := Point{rapid.Float64Range(-20, 20).Draw(t, "dx") * o.Height(), rapid.Float64Range(-20, 20).Draw(t, "dy") * o.Height()}
		alike(t, "elsewhere", moved(
			func(p Point) Point { return Point{p.X + far.X, p.Y + far.Y} },
			func(r Round) Round { r.X += far.X; r.Y += far.Y; return r }), p, Point{far.X, 0})

		m := moved(func(p Point) Point { return Point{-p.X, p.Y} }, func(r Round) Round { r.X = -r.X; return r })
		m.CentroidX, m.Product = -m.CentroidX, -m.Product
		alike(t, "mirrored", m, p, Point{})

		f := moved(func(p Point) Point { return Point{p.X, -p.Y} }, func(r Round) Round { r.Y = -r.Y; return r })
		alike(t, "upside down", seen(o.Flipped()), f, Point{})
		alike(t, "upside down, polygons", o.Flipped().ByPolygons(), f, Point{})
		f.Centroid, f.Product = o.Height()-f.Centroid, -f.Product
		alike(t, "mirrored about the level axis", f, p, Point{})

		q := moved(func(p Point) Point { return Point{p.Y, p.X} }, func(r Round) Round { return Round{r.Y, r.X, r.Depth, r.Width} })
		q.CentroidX, q.Centroid = 0, 0
		alike(t, "axes exchanged", q, Properties{Area: p.Area, Inertia: p.LateralInertia, LateralInertia: p.Inertia, Product: p.Product}, Point{})

		if len(k.Voids) == 0 || k.Voids[0].Width == k.Voids[0].Depth {
			a := rapid.Float64Range(0, 7).Draw(t, "turned by")
			sin, cos := math.Sincos(a)
			turned := moved(
				func(p Point) Point { return Point{p.X*cos - p.Y*sin, p.X*sin + p.Y*cos} },
				func(r Round) Round { return Round{r.X*cos - r.Y*sin, r.X*sin + r.Y*cos, r.Width, r.Depth} })
			turned.CentroidX, turned.Centroid = 0, 0
			alike(t, "turned", turned, Properties{ // Mohr's circle
				Area: p.Area, Inertia: p.Inertia*cos*cos + p.LateralInertia*sin*sin + 2*p.Product*sin*cos,
				LateralInertia: p.LateralInertia*cos*cos + p.Inertia*sin*sin - 2*p.Product*sin*cos,
				Product:        (p.LateralInertia-p.Inertia)*sin*cos + p.Product*(cos*cos-sin*sin),
			}, Point{})
		}
	})
}

// A ring cut in two along two of its radii: the halves give what the whole gives, holes and voids taken out
// one by one.
func TestOutlineInParts(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		k, c := anyContour(t)
		o, err := k.Outline()
		if err != nil {
			t.Fatal(err)
		}
		r := k.Outer[0]
		n := rapid.IntRange(2, len(r)-2).Draw(t, "cut at")
		one := append(append(Ring{}, r[:n+1]...), c)
		two := append(append(Ring{}, r[n:]...), r[0], c)
		var sum Properties
		add := func(k Contour, times float64) {
			o, err := k.Outline()
			if err != nil {
				t.Fatal(err)
			}
			p := seen(o)
			p.Centroid += o.Soffit()
			sum = sum.Plus(p.Times(times))
		}
		add(Polygon(one...), 1)
		add(Polygon(two...), 1)
		for _, h := range k.Holes {
			add(Polygon(h...), -1)
		}
		for _, v := range k.Voids {
			add(Contour{Discs: []Round{v}}, -1)
		}
		sum.Centroid -= o.Soffit()
		alike(t, "in parts", sum, seen(o), Point{})
	})
}

// The sections that follow level by level what lies across: widths, areas, static moments.
func TestLevelsOfAnyOutline(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		k, _ := anyContour(t)
		o, err := k.Outline()
		if err != nil {
			t.Fatal(err)
		}
		h, size := o.Height(), math.Sqrt(o.Area())
		for range 5 {
			y := h * rapid.Float64Range(0.001, 0.999).Draw(t, "y/h")
			width := 0.0
			for _, c := range o.Chords(y) {
				if c.To < c.From {
					t.Errorf("chord from %g to %g", c.From, c.To)
				}
				width += c.To - c.From
			}
			if d := o.WidthAt(y) - width; math.Abs(d) > 1e-7*size {
				t.Errorf("width at %g: %g, chords %g", y, o.WidthAt(y), width)
			}
			area, moment := o.Below(y)
			above, first := o.Flipped().Below(h - y)
			relative(t, "A of both parts", area+above, o.Area(), 1e-10)
			relative(t, "S of both parts", moment+above*h-first, o.Area()*o.Centroid(), 1e-10)
			if d := o.StaticMoment(y) - o.Flipped().StaticMoment(h-y); math.Abs(d) > 1e-9*o.Area()*h {
				t.Errorf("static moments of the two sides of %g differ by %g", y, d)
			}
			to := y + (h-y)*rapid.Float64Range(0.01, 0.99).Draw(t, "to")
			least := o.LeastWidth(y, to)
			seen := math.Inf(1)
			look := func(z float64) {
				if y < z && z < to {
					seen = math.Min(seen, o.WidthAt(z))
				}
			}
			for k := range 501 {
				look(y + (to-y)*float64(k)/500)
			}
			for _, z := range append(o.levels, y, to) {
				look(z * (1 - 1e-12))
				look(z * (1 + 1e-12))
			}
			if least > seen*(1+1e-9)+1e-9*size || seen-least > 1e-3*size {
				t.Errorf("least width from %g to %g: %g, seen %g", y, to, least, seen)
			}
		}
		s := o.BySlices(200)
		relative(t, "A by slices", s.Area, o.Area(), 5e-4)
		relative(t, "I by slices", s.Inertia, o.Inertia(), 5e-4)
		relative(t, "lateral I by slices", s.LateralInertia, o.LateralInertia(), 5e-4)
		if math.Abs(s.CentroidX-o.CentroidX()) > 5e-4*size || math.Abs(s.Centroid-o.Centroid()) > 5e-4*size ||
			math.Abs(s.Product-o.Product()) > 5e-4*(o.Inertia()+o.LateralInertia()) {
			t.Errorf("by slices: %+v, want %+v", s, seen(o))
		}
		b := o.ByStrips(1000)
		relative(t, "A by strips", b.Area, o.Area(), 5e-5)
		relative(t, "I by strips", b.Inertia, o.Inertia(), 5e-5)
	})
}

// A rectangle with everything in it, against sums worked by hand.
func TestOutlineByHand(t *testing.T) {
	o := set(t, Contour{
		Outer: []Ring{{{100, 50}, {1100, 50}, {1100, 450}, {100, 450}, {100, 50}}},
		Holes: []Ring{{{150, 100}, {250, 100}, {250, 200}, {150, 200}}},
		Voids: []Round{Circle(400, 250, 60), {600, 250, 100, 300}, {900, 150, 300, 100}},
	})
	half := math.Pi * 50 * 50 / 2
	circle, upright, level := math.Pi*3600, 100*200+2*half, 200*100+2*half
	area := 400e3 - 10e3 - circle - upright - level
	y := (400e3*200 - 10e3*100 - circle*200 - upright*200 - level*100) / area
	// An upright void: two half circles, each with its centroid 4r/3π beyond its diameter.
	own := (math.Pi/8 - 8/(9*math.Pi)) * 50 * 50 * 50 * 50
	e := 100 + 4*50/(3*math.Pi)
	iUpright := 100*200.*200*200/12 + 2*(own+half*e*e)
	iLevel := 200*100.*100*100/12 + math.Pi*50*50*50*50/4
	inertia := 1000*400.*400*400/12 + 400e3*(200-y)*(200-y) - (100*100.*100*100/12 + 10e3*(100-y)*(100-y)) -
		(math.Pi/4*60*60*60*60 + circle*(200-y)*(200-y)) - (iUpright + upright*(200-y)*(200-y)) - (iLevel + level*(100-y)*(100-y))
	near(t, "A", o.Area(), area, 1e-9)
	near(t, "y", o.Centroid(), y, 1e-11)
	near(t, "I", o.Inertia(), inertia, 1e-4)
	near(t, "x", o.CentroidX(), (400e3*600-10e3*200-circle*400-upright*600-level*900)/area, 1e-10)
	near(t, "u outside", o.Perimeter(), 2800, 1e-12)
	near(t, "u inside", o.InsidePerimeter(), 400+2*math.Pi*60+2*(2*math.Pi*50+400), 1e-9)
	near(t, "soffit", o.Soffit(), 50, 0)
	for _, c := range []struct{ y, want float64 }{
		{10, 1000}, {49, 1000}, {50, 900 - 200}, {75, 900 - 2*math.Sqrt(50*50-25*25) - 200 - 2*math.Sqrt(50*50-25*25)},
		{100, 900 - 100 - 300}, {200, 1000 - 120 - 100}, {300, 1000 - 100}, {350, 1000}, {400, 1000},
	} {
		near(t, "width", o.WidthAt(c.y), c.want, 1e-9)
	}
	near(t, "width of the web beside the circle", o.Chords(200)[1].From, 460, 1e-9)
	near(t, "least width above", o.LeastWidth(310, 400), 1000-2*math.Sqrt(50*50-10*10), 1e-9)
	near(t, "least width across", o.LeastWidth(150, 310), 1000-120-100, 1e-9)
	if len(o.Curves()) != 4 || o.Symmetrical() {
		t.Errorf("curves %v, symmetrical %v", o.Curves(), o.Symmetrical())
	}
	for _, c := range []struct{ x, y, want float64 }{
		{110, 100, 10}, {600, 200, -50}, {600, 370, 20}, {400, 200, -60}, {200, 100, -50}, {1050, 300, 50}, {500, 160, math.Hypot(100, 40) - 60}, {1200, 100, -100},
	} {
		near(t, "clearance", o.Clearance(c.x, c.y), c.want, 1e-9)
	}
}
