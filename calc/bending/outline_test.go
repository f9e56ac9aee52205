package bending

import (
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"

	"soffit/calc/section"
)

func set(t tester, f section.Form) section.Outline { return ok[section.Outline](t)(f.Outline()) }

// The concrete's force and moment through voids, bores and corners of any kind, tiny compressed zones included. The
// quadrature itself is good to some 1e-8 where a zone ends just short of the tip of a circle.
func TestAnyOutlineAgainstQuadrature(t *testing.T) {
	worst := map[string]float64{}
	note := func(what string, got, want float64) { worst[what] = math.Max(worst[what], math.Abs(got/want-1)) }
	rapid.Check(t, func(t *rapid.T) {
		o, _ := anyOutline(t)
		f, s, h := figureOf(o), NewSection(o.Shape), o.Height()
		block, law := anyConcrete(t)
		x := h * math.Pow(10, rapid.Float64Range(-2, 0.5).Draw(t, "log x/h"))
		k := law.EpsCu2 / x * math.Pow(10, rapid.Float64Range(-4, 0).Draw(t, "log κx/ε_cu"))
		force, moment := s.Compression(law, x, k)
		wantForce, wantMoment := f.parabola(law, x, k)
		within(t, "force", force, wantForce, 1e-7)
		within(t, "moment", moment, wantMoment, 1e-7)
		note("fibres, force", force, wantForce)
		note("fibres, moment", moment, wantMoment)
		force, moment = s.Block(block, x)
		wantForce, wantMoment = f.block(block, x)
		within(t, "force of the block", force, wantForce, 1e-7)
		within(t, "moment of the block", moment, wantMoment, 1e-7)
		note("block, force", force, wantForce)
		note("block, moment", moment, wantMoment)
	})
	t.Logf("worst: %v", worst)
}

// A void that the compressed zone crosses, and the ring section, step by step; for every class of concrete.
func TestVoidsAndRingsAgainstQuadrature(t *testing.T) {
	for name, form := range map[string]section.Form{
		"round voids":   section.HollowUnit{Width: 1196, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 190, Level: 140},
		"upright voids": section.HollowUnit{Width: 1196, Depth: 400, VoidWidth: 160, VoidDepth: 280, Count: 5, Spacing: 220, Level: 200},
		"level voids":   section.HollowUnit{Width: 1196, Depth: 265, VoidWidth: 220, VoidDepth: 140, Count: 4, Spacing: 270, Level: 140},
		"ring":          section.RoundBeam{Diameter: 800, Bore: 560},
		"round":         section.RoundBeam{Diameter: 800},
	} {
		o := set(t, form)
		f, s := figureOf(o), NewSection(o.Shape)
		for _, c := range classes {
			law := Parabola{c.n, c.c2 / 1e3, c.cu2 / 1e3, 30}
			for part := 0.02; part < 3; part *= 1.13 {
				x := part * o.Height()
				force, moment := s.Compression(law, x, law.EpsCu2/x)
				wantForce, wantMoment := f.parabola(law, x, law.EpsCu2/x)
				within(t, name+", force", force, wantForce, 1e-9)
				within(t, name+", moment", moment, wantMoment, 1e-9)
				area, first := s.Above(x)
				wantArea, wantFirst := f.block(BlockLaw{1, 1, 1}, x)
				within(t, name+", area", area, wantArea, 1e-10)
				within(t, name+", first moment", first, wantFirst, 1e-10)
			}
		}
	}
}

// The circle with its neutral axis on a diameter, in closed form: the block on half of it, and the parabola of
// n = 2 with the strain ε_c2 at the top: σ_c/f_cd = 1 − v², v = z/r from the top of the upper half. Own
// derivation: ∫ 2·sqrt(r² − t²)·(1 − (1 + t/r)²) dt over −r ≤ t ≤ 0.
func TestCircleInClosedForm(t *testing.T) {
	const r = 300.0
	s := NewSection(set(t, section.RoundBeam{Diameter: 2 * r}).Shape)
	force, moment := s.Block(BlockLaw{Lambda: 1, EtaFcd: 20, EpsCu: 3.5e-3}, r)
	within(t, "block", force, 20*math.Pi*r*r/2, 1e-13)
	within(t, "its moment", moment, 20*(math.Pi*r*r*r/2-2*r*r*r/3), 1e-13)
	// With t = −r·cos θ: −2u − u² for u = t/r; ∫ 2·sqrt(1 − u²)·(−2u − u²) du from −1 to 0 = 4/3 − π/8.
	force, _ = s.Compression(parabola20, r, 2e-3/r)
	within(t, "parabola", force, 20*r*r*(4.0/3-math.Pi/8), 1e-12)
	// In the lower half of it, from θ = π/2 on: a strain of ε_c2 at the centre, none at the foot; ∫ 2·sqrt(1 − u²)·(1 − u²) du
	// from 0 to 1 = 3π/8, and the upper half in full.
	force, _ = s.Compression(parabola20, 2*r, 2e-3/r)
	within(t, "parabola in the lower half", force, 20*r*r*(math.Pi/2+3*math.Pi/8), 1e-12)
}

// A section drawn upside down from its measures, with the layers turned, resists hogging as the first resists
// sagging.
func TestMirroredSection(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		o, _ := anyOutline(t)
		h := o.Height()
		layers := anyLayers(t, o.Shape)
		block, parabola := anyConcrete(t)
		c := o.Contour()
		for _, rings := range [2][]section.Ring{c.Outer, c.Holes} {
			for _, r := range rings {
				for i := range r {
					r[i].Y = 5000 - r[i].Y
				}
			}
		}
		for _, rounds := range [2][]section.Round{c.Voids, c.Discs} {
			for i := range rounds {
				rounds[i].Y = 5000 - rounds[i].Y
			}
		}
		drawn := set(t, c)
		straight := NewSection(o.Shape)
		n := Conditions{Axial: straight.AtCentroid(o.Area() * rapid.Float64Range(-1, 8).Draw(t, "N/A"))}
		for name, turned := range map[string]section.Shape{"turned as a shape": drawn.Shape.Flipped(), "turned as an outline": drawn.Flipped().Shape} {
			s := NewSection(turned)
			m := Conditions{Axial: s.AtCentroid(n.Axial.Force)}
			for what, f := range map[string]func(s *Section, c Conditions, l []Layer) (Axis, error){
				"block": func(s *Section, c Conditions, l []Layer) (Axis, error) { return s.NeutralAxisUnder(c, block, l) },
				"graded": func(s *Section, c Conditions, l []Layer) (Axis, error) {
					return s.GradedAxisUnder(c, Graded{block, parabola}, l)
				},
				"fibres": func(s *Section, c Conditions, l []Layer) (Axis, error) { return s.FibresUnder(c, parabola, l) },
			} {
				a, errA := f(straight, n, layers)
				b, errB := f(s, m, Hogging(Hogging(layers, h), h))
				if reasonOf(errA) != reasonOf(errB) {
					t.Errorf("%s, %s: %v, want %v", name, what, errB, errA)
				}
				if errA != nil || errB != nil {
					continue
				}
				size := (a.Concrete + math.Abs(a.Axial)) * h
				near(t, name+" M, "+what, b.Moment, a.Moment, 1e-8*size)
				near(t, name+" x, "+what, b.X, a.X, 1e-7*a.X+1e-9*h)
			}
		}
	})
}

// Hogging of a beam drawn once: compression at the soffit, against a solution in the beam's own coordinates.
func TestHogging(t *testing.T) {
	o := set(t, section.TBeam{Depth: 800, Flange: section.Flange{Width: 1200, Depth: 150}, Web: 300})
	law := horizontal(t, 200e3, fyd)
	layers := []Layer{{Area: 2000, Depth: 60, Cap: inf, Law: law}, {Area: 600, Depth: 740, Cap: inf, Law: law}} // from the top
	a := ok[Axis](t)(NewSection(o.Shape.Flipped()).NeutralAxis(block20, Hogging(layers, 800)))
	// Bars at the top yield; those at the soffit, 60 mm above it, are compressed in the web and do not.
	lo, hi := 1.0, 800.0
	for range 100 {
		x := (lo + hi) / 2
		if 20*300*0.8*x+600*200e3*3.5e-3*(x-60)/x < 2000*fyd {
			lo = x
		} else {
			hi = x
		}
	}
	within(t, "x", a.X, lo, 1e-9)
	within(t, "M", a.Moment, 2000*fyd*740-20*300*0.8*lo*0.4*lo-600*200e3*3.5e-3*(lo-60)/lo*60, 1e-9)
	if layers[0].Depth != 60 {
		t.Error("the caller's layers changed")
	}
}

// Narrows against the widths themselves, depth by depth.
func TestNarrowsOfAnyOutline(t *testing.T) {
	seen := map[bool]int{}
	rapid.Check(t, func(t *rapid.T) {
		o, kind := anyOutline(t)
		f, s, h := figureOf(o), NewSection(o.Shape), o.Height()
		z := h * rapid.Float64Range(0.02, 1).Draw(t, "z/h")
		got := s.Narrows(z)
		for i := 1; i < len(f.cuts); i++ {
			if d := f.cuts[i] - f.cuts[i-1]; d > 1e-13*h && d < 1e-6*h {
				t.Skip("a sliver: a slope or a ledge?")
			}
		}
		seen[got]++
		least, gain := math.Inf(1), 0.0 // how much wider anywhere than somewhere above
		var places []float64
		for k := range 500 {
			places = append(places, z*(float64(k)+0.5)/500)
		}
		for _, c := range f.cuts {
			for e := 1e-10 * h; e < 1e-2*h; e *= 3 {
				places = append(places, c-e, c+e)
			}
		}
		slices.Sort(places)
		for _, at := range places {
			if at <= 0 || at >= z {
				continue
			}
			w := f.width(at)
			gain = math.Max(gain, w-least)
			least = math.Min(least, w)
		}
		if !got && gain > 1e-6*o.Area()/h || got && gain == 0 && s.Narrows(z*(1-1e-2)) {
			t.Errorf("%s: narrows within %g of %g: %v; wider farther down by %g", kind, z, h, got, gain)
		}
	})
	if seen[true] < 100 || seen[false] < 100 {
		t.Errorf("%v", seen)
	}
	for _, c := range []struct {
		form section.Form
		z    float64 // where narrowing begins
	}{
		{section.HollowUnit{Width: 1196, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 190, Level: 140}, 125},
		{section.HollowUnit{Width: 1196, Depth: 400, VoidWidth: 160, VoidDepth: 280, Count: 5, Spacing: 220, Level: 200}, 260},
		{section.HollowUnit{Width: 1196, Depth: 265, VoidWidth: 220, VoidDepth: 140, Count: 4, Spacing: 270, Level: 140}, 125},
		{section.InvertedT{Depth: 900, Ledge: section.Flange{Width: 900, Depth: 250, Haunch: 20}, Web: 400}, 630},
		{section.BoxBeam{Width: 1200, Depth: 900, Top: 150, Web: 130, Bottom: 140, BottomHaunch: 50}, 710},
		{section.UBeam{Bottom: 800, Top: 1000, Depth: 900, Web: 120, Floor: 150}, 750},
		{section.DoubleT{Width: 2400, Depth: 600, Flange: 60, Spacing: 1200, StemBottom: 120, StemTop: 160}, inf},
		{section.DoubleT{Width: 2400, Depth: 600, Flange: 60, Spacing: 1200, StemBottom: 160, StemTop: 120}, 60},
		{section.Contour{ // a ledge level with the top of the straight sides of a void, 260 mm down
			Outer: []section.Ring{{{X: -400, Y: 0}, {X: 400, Y: 0}, {X: 400, Y: 340}, {X: 350, Y: 340}, {X: 350, Y: 600}, {X: -350, Y: 600}, {X: -350, Y: 340}, {X: -400, Y: 340}}},
			Voids: []section.Round{{Y: 240, Width: 100, Depth: 300}},
		}, 260},
		{section.RoundBeam{Diameter: 600, Bore: 400}, 0},
		{section.RoundBeam{Diameter: 600}, 0},
		{section.RectangularBeam{Width: 300, Depth: 600, Chamfer: 20}, inf},
		{section.RectangularBeam{Width: 300, Depth: 600, TopChamfer: 20}, 0},
		{section.Trapezoid{Bottom: 300, Depth: 600}, 0},
		{section.Trapezoid{Top: 300, Depth: 600}, inf},
	} {
		s := NewSection(set(t, c.form).Shape)
		for _, z := range []float64{0.5, 59, 61, 124, 126, 259, 261, 629, 631, 709, 711, 749, 751} {
			if z < s.Height() && s.Narrows(z) != (z > c.z) {
				t.Errorf("%#v: narrows within %g: %v", c.form, z, s.Narrows(z))
			}
		}
	}
}
