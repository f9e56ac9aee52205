package section

import (
	"errors"
	"math"
	"strings"
	"testing"

	"pgregory.net/rapid"
)

func box(x, y, w, h float64) Ring { return Ring{{x, y}, {x + w, y}, {x + w, y + h}, {x, y + h}} }

// Each fault of a contour by its reason, its parts and its corner.
func TestContoursRefused(t *testing.T) {
	nan, inf := math.NaN(), math.Inf(1)
	outer := []Ring{box(0, 0, 1000, 600)}
	void := func(r ...Round) Contour { return Contour{Outer: outer, Voids: r} }
	hole := func(r ...Ring) Contour { return Contour{Outer: outer, Holes: r} }
	for _, c := range []struct {
		name        string
		contour     Contour
		reason      Reason
		part, other Part
		corner      int
	}{
		{"nothing", Contour{}, Empty, Part{}, Part{}, -1},
		{"a hole alone", Contour{Holes: outer}, Empty, Part{}, Part{}, -1},
		{"NaN", Polygon(Point{0, 0}, Point{nan, 0}, Point{1, 1}), NotFinite, Part{Outer, 0}, Part{}, 1},
		{"infinite", Polygon(Point{0, 0}, Point{1, 0}, Point{1, -inf}), NotFinite, Part{Outer, 0}, Part{}, 2},
		{"too large", Polygon(Point{-1e308, 0}, Point{1e308, 0}, Point{1, 1e308}), NotFinite, Part{}, Part{}, -1},
		{"void NaN", void(Round{500, nan, 10, 10}), NotFinite, Part{Void, 0}, Part{}, -1},
		{"no corner", Contour{Outer: []Ring{{}}}, FewCorners, Part{Outer, 0}, Part{}, -1},
		{"one corner", Polygon(Point{1, 1}), FewCorners, Part{Outer, 0}, Part{}, -1},
		{"two corners, the first again", Polygon(Point{0, 0}, Point{1, 0}, Point{0, 0}), FewCorners, Part{Outer, 0}, Part{}, -1},
		{"one place four times", hole(Ring{{100, 100}, {100, 100}, {100, 100}, {100, 100}}), FewCorners, Part{Hole, 0}, Part{}, -1},
		{"on a line", Polygon(Point{0, 0}, Point{1, 1}, Point{2, 2}, Point{3, 3}), NoArea, Part{Outer, 0}, Part{}, -1},
		{"void without width", void(Circle(500, 300, 10), Round{500, 300, 0, 10}), NoArea, Part{Void, 1}, Part{}, -1},
		{"void of negative depth", void(Round{500, 300, 10, -10}), NoArea, Part{Void, 0}, Part{}, -1},
		{"bow tie", Polygon(Point{0, 0}, Point{1, 1}, Point{1, 0}, Point{0, 1}), SelfCrossing, Part{Outer, 0}, Part{}, 0},
		{"five-pointed star", Polygon(Point{0, 3}, Point{2, -3}, Point{-3, 1}, Point{3, 1}, Point{-2, -3}), SelfCrossing, Part{Outer, 0}, Part{}, 0},
		{"spike", Polygon(Point{0, 0}, Point{2, 0}, Point{1, 0}, Point{1, 1}), SelfTouching, Part{Outer, 0}, Part{}, 0},
		{"pinched", Polygon(Point{0, 0}, Point{4, 0}, Point{4, 3}, Point{2, 0}, Point{0, 3}), SelfTouching, Part{Outer, 0}, Part{}, 0},
		{"eight", Polygon(Point{0, 0}, Point{2, 0}, Point{1, 1}, Point{2, 2}, Point{0, 2}, Point{1, 1}), SelfTouching, Part{Outer, 0}, Part{}, 1},
		{"rings cross", Contour{Outer: []Ring{box(0, 0, 10, 10), box(5, 5, 10, 10)}}, Crossing, Part{Outer, 0}, Part{Outer, 1}, 1},
		{"rings share an edge", Contour{Outer: []Ring{box(0, 0, 10, 10), box(10, 0, 10, 10)}}, Touching, Part{Outer, 0}, Part{Outer, 1}, 0},
		{"rings meet at a corner", Contour{Outer: []Ring{box(0, 0, 10, 10), box(10, 10, 10, 10)}}, Touching, Part{Outer, 0}, Part{Outer, 1}, 1},
		{"hole crosses", hole(box(-10, 10, 100, 100)), Crossing, Part{Outer, 0}, Part{Hole, 0}, 3},
		{"hole at the edge", hole(box(0, 10, 100, 100)), Touching, Part{Outer, 0}, Part{Hole, 0}, 3},
		{"hole outside", hole(box(2000, 10, 100, 100)), HoleOutside, Part{Hole, 0}, Part{}, -1},
		{"holes touch", hole(box(10, 10, 10, 10), box(20, 10, 10, 10)), Touching, Part{Hole, 0}, Part{Hole, 1}, 0},
		{"hole in a hole", hole(box(10, 10, 100, 100), box(20, 20, 10, 10)), Nested, Part{Hole, 1}, Part{Hole, 0}, -1},
		{"island", Contour{Outer: append([]Ring{box(40, 40, 10, 10)}, outer...), Holes: []Ring{box(10, 10, 100, 100)}}, Nested, Part{Outer, 0}, Part{Outer, 1}, -1},
		{"concrete in concrete", Contour{Outer: append([]Ring{}, outer[0], box(10, 10, 5, 5))}, Nested, Part{Outer, 1}, Part{Outer, 0}, -1},
		{"void outside", void(Circle(500, 300, 50), Circle(500, 700, 50)), HoleOutside, Part{Void, 1}, Part{}, -1},
		{"void through the top", void(Circle(500, 590, 50)), Crossing, Part{Outer, 0}, Part{Void, 0}, 2},
		{"void centred on the top", void(Circle(500, 600, 50)), Crossing, Part{Outer, 0}, Part{Void, 0}, 2},
		{"void about everything", void(Circle(500, 300, 5000)), Nested, Part{Outer, 0}, Part{Void, 0}, -1},
		{"void at the soffit", void(Round{500, 100, 300, 200}), Touching, Part{Outer, 0}, Part{Void, 0}, 0},
		{"voids touch", void(Round{300, 300, 100, 200}, Round{400, 300, 100, 300}), Touching, Part{Void, 0}, Part{Void, 1}, -1},
		{"voids cross", void(Round{300, 300, 100, 200}, Round{350, 420, 300, 100}), Crossing, Part{Void, 0}, Part{Void, 1}, -1},
		{"void in a void", void(Circle(500, 300, 100), Circle(510, 300, 20)), Nested, Part{Void, 1}, Part{Void, 0}, -1},
		{"void twice", void(Circle(500, 300, 100), Circle(500, 300, 100)), Touching, Part{Void, 0}, Part{Void, 1}, -1},
		{"void in a hole", Contour{Outer: outer, Holes: []Ring{box(100, 100, 200, 200)}, Voids: []Round{Circle(200, 200, 20)}}, Nested, Part{Void, 0}, Part{Hole, 0}, -1},
		{"hole in a void", Contour{Outer: outer, Holes: []Ring{box(190, 190, 20, 20)}, Voids: []Round{Circle(200, 200, 50)}}, Nested, Part{Hole, 0}, Part{Void, 0}, -1},
		{"round over a ring", Contour{Outer: outer, Discs: []Round{Circle(0, 0, 100)}}, Crossing, Part{Outer, 0}, Part{Disc, 0}, 0},
		{"bore wider than the round", Contour{Discs: []Round{Circle(0, 0, 100)}, Voids: []Round{Circle(0, 0, 150)}}, HoleOutside, Part{Void, 0}, Part{}, -1},
		{"bore at the surface", Contour{Discs: []Round{Circle(0, 0, 100)}, Voids: []Round{Circle(50, 0, 50)}}, Touching, Part{Void, 0}, Part{Disc, 0}, -1},
		{"gap", Contour{Outer: []Ring{box(0, 0, 10, 10), box(0, 11, 10, 10)}}, Parted, Part{}, Part{}, -1},
		{"gap between rounds", Contour{Discs: []Round{Circle(0, 0, 10), Circle(0, 21, 10)}}, Parted, Part{}, Part{}, -1},
	} {
		_, err := NewOutline(c.contour)
		var r *Refusal
		if !errors.Is(err, c.reason) || !errors.As(err, &r) {
			t.Errorf("%s: %v, want %v", c.name, err, c.reason)
			continue
		}
		if r.Part != c.part || r.Other != c.other || r.Corner != c.corner {
			t.Errorf("%s: %v; %v, %v, corner %d; want %v, %v, corner %d", c.name, r, r.Part, r.Other, r.Corner, c.part, c.other, c.corner)
		}
		if text := r.Error(); strings.Contains(text, "reason ") || strings.Contains(text, "corner 0") {
			t.Errorf("%s: %q", c.name, text)
		}
	}
	for want, r := range map[string]*Refusal{
		"outer ring 1 crosses hole 2 near (3, 4.5) mm, edges from corners 1 and 3":  {Reason: Crossing, Part: Part{Outer, 0}, Other: Part{Hole, 1}, Corner: 0, OtherCorner: 2, At: Point{3, 4.5}},
		"void 1 touches void 2 near (0, 0) mm":                                      {Reason: Touching, Part: Part{Void, 0}, Other: Part{Void, 1}, Corner: -1, OtherCorner: -1},
		"outer ring 1: fewer than 3 corners: 2":                                     {Reason: FewCorners, Part: Part{Outer, 0}, Corner: -1, Have: 2},
		"hole 1, corner 2: not a finite number":                                     {Reason: NotFinite, Part: Part{Hole, 0}, Corner: 1},
		"section: no concrete between two levels, 10 mm and 11 mm above the soffit": {Reason: Parted, Corner: -1, Have: 10, Limit: 11},
		"section: no outer ring":                                                    {Reason: Empty, Corner: -1},
		"hole 1 is not within the concrete near (1, 2) mm":                          {Reason: HoleOutside, Part: Part{Hole, 0}, Corner: -1, OtherCorner: -1, At: Point{1, 2}},
	} {
		if got := r.Error(); got != want {
			t.Errorf("%q, want %q", got, want)
		}
	}
}

// What is unusual, and is no fault.
func TestContoursTaken(t *testing.T) {
	for name, c := range map[string]struct {
		contour Contour
		area    float64
	}{
		"two webs":              {Contour{Outer: []Ring{box(0, 0, 100, 500), box(400, 0, 100, 600)}}, 110e3},
		"corners on an edge":    {Polygon(Point{0, 0}, Point{50, 0}, Point{100, 0}, Point{100, 50}, Point{100, 100}, Point{0, 100}), 10e3},
		"a corner twice":        {Polygon(Point{0, 0}, Point{100, 0}, Point{100, 0}, Point{100, 100}, Point{0, 100}, Point{0, 0}), 10e3},
		"void close to voids":   {Contour{Outer: []Ring{box(0, 0, 1000, 500)}, Voids: []Round{Circle(200, 200, 99.9), Circle(400, 200, 99.9)}}, 500e3 - 2*math.Pi*99.9*99.9},
		"bore off centre":       {Contour{Discs: []Round{Circle(0, 0, 100)}, Voids: []Round{Circle(30, 0, 50)}}, math.Pi * 7500},
		"square bore":           {Contour{Discs: []Round{Circle(0, 0, 100)}, Holes: []Ring{box(-50, -50, 100, 100)}}, math.Pi*1e4 - 1e4},
		"oblong pile with bore": {Contour{Discs: []Round{{0, 0, 400, 200}}, Voids: []Round{{0, 0, 250, 50}}}, 200*200 + math.Pi*1e4 - 200*50 - math.Pi*625},
		"upright with bore":     {Contour{Discs: []Round{{0, 0, 200, 400}}, Voids: []Round{Circle(0, 50, 50)}}, 200*200 + math.Pi*1e4 - math.Pi*2500},
		"round beside a web":    {Contour{Outer: []Ring{box(0, 0, 100, 300)}, Discs: []Round{Circle(300, 100, 100)}}, 30e3 + math.Pi*1e4},
		"tiny":                  {Contour{Outer: []Ring{box(0, 0, 1e-6, 1e-6)}}, 1e-12},
		"far away":              {Contour{Outer: []Ring{box(1e6, -1e6, 1000, 500)}}, 500e3},
	} {
		o, err := NewOutline(c.contour)
		if err != nil {
			t.Errorf("%s: %v", name, err)
			continue
		}
		near(t, name+" A", o.Area(), c.area, 1e-9*c.area)
		p := o.ByPolygons()
		near(t, name+" A by polygons", p.Area, c.area, 1e-9*c.area)
		near(t, name+" y", o.Centroid(), p.Centroid, 1e-9*o.Height())
		near(t, name+" I", o.Inertia(), p.Inertia, 1e-9*p.Inertia)
		near(t, name+" I by slices", o.BySlices(2000).Inertia, p.Inertia, 1e-4*p.Inertia)
		f := o.Flipped()
		near(t, name+" I flipped", f.Inertia(), p.Inertia, 1e-9*p.Inertia)
		for k := range 50 {
			y := o.Height() * (float64(k) + 0.4) / 50
			width := 0.0
			for _, c := range o.Chords(y) {
				width += c.To - c.From
			}
			near(t, name+" b", o.WidthAt(y), width, 1e-9*o.Perimeter())
		}
	}
}

// Rings with any corners at all: what passes the checks has an area that points strewn at random agree with,
// and no two of its edges meet, found pair by pair.
func TestAnyRing(t *testing.T) {
	taken := 0
	rapid.Check(t, func(t *rapid.T) {
		r := rapid.SliceOfN(rapid.Custom(func(t *rapid.T) Point {
			return Point{float64(rapid.IntRange(0, 12).Draw(t, "x")), float64(rapid.IntRange(0, 12).Draw(t, "y"))}
		}), 0, 7).Draw(t, "ring")
		o, err := NewOutline(Polygon(r...))
		simple := meetsNowhere(r)
		if (err == nil) != simple {
			t.Fatalf("%v: error %v, simple %v", r, err, simple)
		}
		if err != nil {
			return
		}
		taken++
		// Pick's theorem: area from lattice points within and on the ring.
		in, on := 0, 0
		for x := 0.0; x <= 12; x++ {
			for y := 0.0; y <= 12; y++ {
				switch c := o.Clearance(x, y-o.Soffit()); {
				case math.Abs(c) < 1e-9:
					on++
				case c > 0:
					in++
				}
			}
		}
		relative(t, "A by lattice points", o.Area(), float64(in)+float64(on)/2-1, 1e-9)
		relative(t, "A by polygon", o.ByPolygons().Area, o.Area(), 1e-9)
	})
	if taken == 0 {
		t.Error("no ring was taken")
	}
}

// meetsNowhere checks a ring of whole numbers without rounding.
func meetsNowhere(given []Point) bool {
	var r []Point
	for _, p := range given {
		if len(r) == 0 || r[len(r)-1] != p {
			r = append(r, p)
		}
	}
	for len(r) > 1 && r[0] == r[len(r)-1] {
		r = r[:len(r)-1]
	}
	n := len(r)
	if n < 3 {
		return false
	}
	between := func(a, b, p Point) bool { // p on the edge from a to b
		return turn(a, b, p) == 0 && math.Min(a.X, b.X) <= p.X && p.X <= math.Max(a.X, b.X) && math.Min(a.Y, b.Y) <= p.Y && p.Y <= math.Max(a.Y, b.Y)
	}
	for i := range n {
		for j := i + 1; j < n; j++ {
			a, b, c, d := r[i], r[(i+1)%n], r[j], r[(j+1)%n]
			switch {
			case j == i+1 && n > 2 && (between(a, b, d) || between(c, d, a)), j == n-1 && i == 0 && (between(a, b, c) || between(c, d, b)):
				return false
			case j == i+1 || i == 0 && j == n-1:
			case between(a, b, c) || between(a, b, d) || between(c, d, a) || between(c, d, b),
				turn(a, b, c)*turn(a, b, d) < 0 && turn(c, d, a)*turn(c, d, b) < 0:
				return false
			}
		}
	}
	return true
}
