package bending

import (
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"

	"soffit/calc/section"
)

// Where the width first grows, from the measures.
func TestFirstGrowth(t *testing.T) {
	// A void of radius 50 at 200 mm in a section that narrows downward by 0.4 mm a mm: 2·t/sqrt(r² − t²) = 0.4.
	below := 200 + 50*0.2/math.Sqrt(1+0.2*0.2)
	tapered := section.Contour{
		Outer: []section.Ring{{{X: -140, Y: 0}, {X: 140, Y: 0}, {X: 220, Y: 400}, {X: -220, Y: 400}}},
		Voids: []section.Round{section.Circle(0, 200, 50)},
	}
	for name, c := range map[string]struct {
		form section.Form
		want float64
	}{
		"rectangle":               {section.RectangularBeam{Width: 300, Depth: 600, Chamfer: 20}, 600},
		"chamfers at the top":     {section.RectangularBeam{Width: 300, Depth: 600, TopChamfer: 20}, 0},
		"triangle":                {section.Trapezoid{Bottom: 300, Depth: 600}, 0},
		"round":                   {section.RoundBeam{Diameter: 600}, 0},
		"inverted T":              {section.InvertedT{Depth: 900, Ledge: section.Flange{Width: 900, Depth: 250}, Web: 400}, 650},
		"inverted T with haunch":  {section.InvertedT{Depth: 900, Ledge: section.Flange{Width: 900, Depth: 250, Haunch: 20}, Web: 400}, 630},
		"T":                       {section.TBeam{Depth: 900, Flange: section.Flange{Width: 900, Depth: 150}, Web: 300}, 900},
		"round voids":             {section.HollowUnit{Width: 1196, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 190, Level: 140}, 125},
		"upright voids":           {section.HollowUnit{Width: 1196, Depth: 400, VoidWidth: 160, VoidDepth: 280, Count: 5, Spacing: 220, Level: 200}, 260},
		"void in tapered sides":   {tapered, below},
		"stems wider at the foot": {section.DoubleT{Width: 2400, Depth: 600, Flange: 60, Spacing: 1200, StemBottom: 160, StemTop: 120}, 60},
	} {
		s := NewSection(set(t, c.form).Shape)
		near(t, name, s.FirstGrowth(), c.want, 1e-8*s.Height())
		if s.Narrows(c.want-0.01) || c.want < s.Height() && !s.Narrows(c.want+0.01) {
			t.Errorf("%s: narrows within %g: %v, %v", name, c.want, s.Narrows(c.want-0.01), s.Narrows(c.want+0.01))
		}
	}
}

// Above FirstGrowth the width never grows, just below it does; Narrows says the same.
func TestFirstGrowthOfAnyOutline(t *testing.T) {
	seen := map[bool]int{}
	rapid.Check(t, func(t *rapid.T) {
		o, kind := anyOutline(t)
		f, s, h := figureOf(o), NewSection(o.Shape), o.Height()
		for i := 1; i < len(f.cuts); i++ {
			if d := f.cuts[i] - f.cuts[i-1]; d > 1e-13*h && d < 1e-6*h {
				t.Skip("a sliver: a slope or a ledge?")
			}
		}
		g := s.FirstGrowth()
		seen[g < h]++
		mean := o.Area() / h
		var places []float64
		for k := range 300 {
			places = append(places, h*(float64(k)+0.5)/300)
		}
		for _, c := range append(f.cuts, g) {
			for e := 1e-10 * h; e < 1e-2*h; e *= 4 {
				places = append(places, c-e, c+e)
			}
		}
		slices.Sort(places)
		least, gained := math.Inf(1), false
		for _, at := range places {
			if at <= 0 || at >= h {
				continue
			}
			w := f.width(at)
			switch {
			case at < g-1e-9*h && w > least+1e-7*mean:
				t.Fatalf("%s: grows by %g above %g, at %g of %g", kind, w-least, g, at, h)
			case at > g && at < g+0.011*h && w > least: // the slope of a chamfer, or less: any gain
				gained = true
			}
			least = math.Min(least, w)
		}
		if g < s.Height() && !gained {
			t.Errorf("%s: no gain below %g of %g", kind, g, h)
		}
		z := h * rapid.Float64Range(0, 1.2).Draw(t, "z/h")
		if got, want := s.Narrows(z), math.Min(z, h) > g; got != want && math.Abs(math.Min(z, h)-g) > 2e-9*h {
			t.Errorf("%s: narrows within %g: %v, first growth at %g", kind, z, got, g)
		}
	})
	if seen[true] < 100 || seen[false] < 100 {
		t.Errorf("%v", seen)
	}
}

// The cut of 3.1.7(3): in closed form, and against a solution with a weaker block.
func TestNarrowing(t *testing.T) {
	// An inverted T without steel: a web of 400 over a ledge from 650 mm down; η·f_cd = 20.
	s := NewSection(set(t, section.InvertedT{Depth: 900, Ledge: section.Flange{Width: 900, Depth: 250}, Web: 400}).Shape)
	law := horizontal(t, 200e3, fyd)
	c := Conditions{Narrowing: 0.9, Axial: Axial{Depth: 450}}
	for _, k := range []struct {
		x       float64 // of the block in full
		reduced bool
	}{{300, false}, {649, false}, {651, true}, {690, true}} {
		c.Axial.Force = 0.8 * k.x * 400 * 20
		a := ok[Axis](t)(s.NeutralAxisUnder(c, block20, nil))
		x := k.x
		if k.reduced {
			x /= 0.9 // up to 766 mm, the block up to 613 mm: within the web
		}
		within(t, "x", a.X, x, 1e-9)
		if a.Reduced != k.reduced {
			t.Errorf("x = %g: reduced %v", k.x, a.Reduced)
		}
	}
	// The triangle on its base always narrows: the block on it has the area b·(λ·x)²/(2·h).
	tri := NewSection(set(t, section.Trapezoid{Bottom: 600, Depth: 600}).Shape)
	layers := []Layer{{Area: 800, Depth: 540, Cap: inf, Law: law}}
	a := ok[Axis](t)(tri.NeutralAxisUnder(Conditions{Narrowing: 0.9}, block20, layers))
	depth := math.Sqrt(2 * 800 * fyd / (0.9 * 20))
	within(t, "x in the triangle", a.X, depth/0.8, 1e-9)
	within(t, "M of the triangle", a.Moment, 800*fyd*(540-depth*2/3), 1e-9)
	if !a.Reduced {
		t.Error("not reduced")
	}
	for _, v := range []float64{-0.1, 1.1, math.NaN()} {
		_, err := tri.NeutralAxisUnder(Conditions{Narrowing: v}, block20, layers)
		refused(t, "factor", err, BadConditions)
	}
}

// For any section: the factor works where the axis without it lies below FirstGrowth, then the state is that of
// the weaker block, and the axis no higher; a law of stress and strain takes no notice.
func TestNarrowingOfAnyOutline(t *testing.T) {
	seen := map[bool]int{}
	rapid.Check(t, func(t *rapid.T) {
		o, kind := anyOutline(t)
		s, layers := NewSection(o.Shape), anyLayers(t, o.Shape)
		block, law := anyConcrete(t)
		block.EpsCu = law.EpsCu2
		c := anyConditions(t, s, block.EtaFcd*o.Area(), law.EpsC2)
		with, weaker := c, block
		with.Narrowing = 0.9
		weaker.EtaFcd *= 0.9
		for name, f := range map[string]func(Conditions, BlockLaw) (Axis, error){
			"block":  func(c Conditions, b BlockLaw) (Axis, error) { return s.NeutralAxisUnder(c, b, layers) },
			"graded": func(c Conditions, b BlockLaw) (Axis, error) { return s.GradedAxisUnder(c, Graded{b, law}, layers) },
		} {
			want, err := f(c, block)
			got, errGot := f(with, block)
			deep := math.Min(want.X, s.Height())
			reduced := err == nil && deep > s.FirstGrowth()+2e-9*o.Height()
			if err == nil && !reduced && deep > s.FirstGrowth() {
				continue // at the very depth
			}
			if reduced {
				before := want
				want, err = f(c, weaker)
				if err == nil {
					want.Reduced, want.Evals = true, want.Evals+before.Evals
				}
				if err == nil && want.X < before.X && (name == "block" && c.Flange.Depth == 0 && want.Pivot == PivotTop) {
					t.Errorf("%s, %s: x = %g with the weaker block, %g before", kind, name, want.X, before.X)
				}
			}
			if got != want || reasonOf(errGot) != reasonOf(err) {
				t.Errorf("%s, %s: %+v, %v; want %+v, %v", kind, name, got, errGot, want, err)
			}
			if err == nil {
				seen[reduced]++
			}
		}
		a, errA := s.FibresUnder(c, law, layers)
		b, errB := s.FibresUnder(with, law, layers)
		if a != b || reasonOf(errA) != reasonOf(errB) {
			t.Errorf("fibres take notice: %+v, %+v", a, b)
		}
	})
	if seen[true] < 500 || seen[false] < 500 {
		t.Errorf("%v", seen)
	}
}
