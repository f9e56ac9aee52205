package bending

import (
	"math"
	"testing"

	"soffit/calc/section"
)

// The tests of this file compare with closed forms; own derivations.

func TestSinglyReinforcedRectangle(t *testing.T) {
	const b, h, d = 300.0, 600.0, 550.0
	s := rectangle(t, b, h)
	law := horizontal(t, 200e3, fyd)
	for _, area := range []float64{1, 100, 800, 2000, 3500} {
		layers := []Layer{{Area: area, Depth: d, Cap: inf, Law: law}}
		a := ok[Axis](t)(s.NeutralAxis(block20, layers))
		x := area * fyd / (0.8 * 20 * b)
		within(t, "x", a.X, x, 1e-12)
		within(t, "M", a.Moment, area*fyd*(d-0.4*x), 1e-12)
		within(t, "κ", a.Curvature, 3.5e-3/x, 1e-12)
		within(t, "z_c", a.ConcreteDepth, 0.4*x, 1e-12)
		if f := layers[0].At(a.X, a.Curvature); !f.Yields || f.Capped || a.Pivot != PivotTop || a.Layer != -1 {
			t.Errorf("area %g: %+v, pivot %v, layer %d", area, f, a.Pivot, a.Layer)
		}

		f := ok[Axis](t)(s.Fibres(parabola20, layers))
		x = area * fyd / (17.0 / 21 * 20 * b)
		within(t, "x by fibres", f.X, x, 1e-12)
		within(t, "M by fibres", f.Moment, area*fyd*(d-99.0/238*x), 1e-12)
	}
}

// Steel below yield: λ·b·η·f_cd·x² + A·E·ε_cu·x − A·E·ε_cu·d = 0.
func TestOverReinforcedRectangle(t *testing.T) {
	const b, h, d = 300.0, 600.0, 550.0
	s := rectangle(t, b, h)
	for _, area := range []float64{5000, 8000, 20000} {
		layers := []Layer{{Area: area, Depth: d, Cap: inf, Law: horizontal(t, 200e3, fyd)}}
		a := ok[Axis](t)(s.NeutralAxis(block20, layers))
		p, q := 0.8*b*20, area*200e3*3.5e-3
		x := (-q + math.Sqrt(q*q+4*p*q*d)) / (2 * p)
		within(t, "x", a.X, x, 1e-12)
		within(t, "M", a.Moment, p*x*(d-0.4*x), 1e-12)
		if layers[0].At(a.X, a.Curvature).Yields {
			t.Errorf("area %g yields", area)
		}
	}
}

func TestDoublyReinforcedRectangle(t *testing.T) {
	const b, h, d, dTop = 300.0, 600.0, 550.0, 50.0
	s := rectangle(t, b, h)
	law := horizontal(t, 200e3, fyd)
	layers := []Layer{
		{Area: 3000, Depth: d, Cap: inf, Law: law},
		{Area: 800, Depth: dTop, Cap: inf, Law: law},
	}
	a := ok[Axis](t)(s.NeutralAxis(block20, layers))
	x := (3000 - 800) * fyd / (0.8 * 20 * b) // both yield
	within(t, "x", a.X, x, 1e-12)
	within(t, "M", a.Moment, 2200*fyd*(d-0.4*x)+800*fyd*(d-dTop), 1e-12)
	top := layers[1].At(a.X, a.Curvature)
	within(t, "σ of the compressed bars", top.Stress, -fyd, 1e-12)
	if !top.Yields || top.Strain >= 0 {
		t.Errorf("compressed bars: %+v", top)
	}

	// A cap below the yield stress cuts tension and compression alike.
	layers[1].Cap = 300
	a = ok[Axis](t)(s.NeutralAxis(block20, layers))
	x = (3000*fyd - 800*300) / (0.8 * 20 * b)
	within(t, "x with capped compression", a.X, x, 1e-12)
	top = layers[1].At(a.X, a.Curvature)
	within(t, "capped compression", top.Stress, -300, 0)
	if !top.Capped {
		t.Error("not said to be capped")
	}
	layers[0].Cap = 300
	a = ok[Axis](t)(s.NeutralAxis(block20, layers))
	x = 2200 * 300 / (0.8 * 20 * b)
	within(t, "x with all capped", a.X, x, 1e-12)
	within(t, "M with all capped", a.Moment, 2200*300*(d-0.4*x)+800*300*(d-dTop), 1e-12)
}

// Two rows of strand with different prestrain, both at yield, and bars.
func TestLayersAtYield(t *testing.T) {
	const b, h = 400.0, 900.0
	s := rectangle(t, b, h)
	strand, bar := horizontal(t, 195e3, fpd), horizontal(t, 200e3, fyd)
	layers := []Layer{
		{Area: 980, Depth: 850, Prestrain: 5.6e-3, Cap: inf, Law: strand},
		{Area: 560, Depth: 800, Prestrain: 5.9e-3, Cap: inf, Law: strand},
		{Area: 628, Depth: 855, Cap: inf, Law: bar},
	}
	a := ok[Axis](t)(s.NeutralAxis(block20, layers))
	var force, moment float64
	for i, fd := range []float64{fpd, fpd, fyd} {
		force += layers[i].Area * fd
		moment += layers[i].Area * fd * layers[i].Depth
	}
	x := force / (0.8 * 20 * b)
	within(t, "x", a.X, x, 1e-12)
	within(t, "M", a.Moment, moment-force*0.4*x, 1e-12)
	within(t, "ΣF", a.Steel, force, 1e-12)
	within(t, "strain", layers[1].At(a.X, a.Curvature).Strain, 5.9e-3+3.5e-3*(800-x)/x, 1e-11)
}

// A strain limit reached before the concrete crushes: κ = (ε_ud − ε_p0)/(d − x).
func TestSteelPivot(t *testing.T) {
	const b, h, d = 600.0, 500.0, 450.0
	s := rectangle(t, b, h)
	law := ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
	layers := []Layer{{Area: 200, Depth: d, Prestrain: 6e-3, Cap: inf, Law: law}}
	stress := fpd + (fud-fpd)*(0.02-fpd/195e3)/(0.035-fpd/195e3)
	a := ok[Axis](t)(s.NeutralAxis(block20, layers))
	x := 200 * stress / (0.8 * 20 * b)
	within(t, "x", a.X, x, 1e-12)
	within(t, "M", a.Moment, 200*stress*(d-0.4*x), 1e-12)
	within(t, "κ", a.Curvature, 0.014/(d-x), 1e-12)
	within(t, "strain", layers[0].At(a.X, a.Curvature).Strain, 0.02, 1e-12)
	if a.Pivot != PivotSteel || a.Layer != 0 || a.TopStrain >= 3.5e-3 {
		t.Errorf("pivot at the %v, layer %d, top strain %g", a.Pivot, a.Layer, a.TopStrain)
	}
	f := ok[Axis](t)(s.Fibres(parabola20, layers))
	within(t, "strain by fibres", layers[0].At(f.X, f.Curvature).Strain, 0.02, 1e-12)
	within(t, "M by fibres", f.Moment, 200*stress*(d-f.ConcreteDepth), 1e-12)
	if f.Pivot != PivotSteel || f.TopStrain >= 3.5e-3 || f.X <= a.X {
		t.Errorf("by fibres: %+v", f)
	}

	// A layer that carries nothing is no pivot, an unlimited law none either.
	idle := Layer{Area: 0, Depth: 480, Prestrain: 0.0199, Cap: inf, Law: law}
	capped := Layer{Area: 100, Depth: 480, Prestrain: 0.0199, Cap: 0, Law: law}
	b2 := ok[Axis](t)(s.NeutralAxis(block20, append([]Layer{idle, capped}, layers...)))
	within(t, "x with idle layers", b2.X, a.X, 1e-12)
	if b2.Layer != 2 {
		t.Errorf("governed by layer %d, want 2", b2.Layer)
	}
	layers[0].Law = ok[SteelLaw](t)(law.WithLimit(inf))
	if a = ok[Axis](t)(s.NeutralAxis(block20, layers)); a.Pivot != PivotTop {
		t.Errorf("without a limit: pivot at the %v", a.Pivot)
	}
}

// A T whose block lies in the flange, or reaches into the web; with all steel at yield.
func TestTee(t *testing.T) {
	const bf, hf, bw, h, d = 1200.0, 150.0, 300.0, 800.0, 740.0
	s := NewSection(ok[section.Shape](t)(section.T(h, section.Flange{Width: bf, Depth: hf}, bw)))
	law := horizontal(t, 200e3, fyd)
	form := func(area float64) (x, m float64) {
		force := area * fyd
		if c := force / (20 * bf); c <= hf {
			return c / 0.8, force * (d - c/2)
		}
		c := hf + (force-20*bf*hf)/(20*bw)
		return c / 0.8, 20*bf*hf*(d-hf/2) + 20*bw*(c-hf)*(d-(c+hf)/2)
	}
	at := hf * bf * 20 / fyd // the area with which λ·x = h_f
	for _, area := range []float64{0.1 * at, 0.5 * at, 0.999 * at, at, 1.001 * at, 1.2 * at, 1.35 * at} {
		a := ok[Axis](t)(s.NeutralAxis(block20, []Layer{{Area: area, Depth: d, Cap: inf, Law: law}}))
		x, m := form(area)
		within(t, "x", a.X, x, 1e-11)
		within(t, "M", a.Moment, m, 1e-12)
	}

	// Continuous where λ·x crosses the underside of the flange: x, M and their block forces do not jump.
	state := func(area float64) Axis {
		return ok[Axis](t)(s.NeutralAxis(block20, []Layer{{Area: area, Depth: d, Cap: inf, Law: law}}))
	}
	for _, part := range []float64{1e-3, 1e-6, 1e-9} {
		below, above := state(at*(1-part)), state(at*(1+part))
		if !(below.X*0.8 < hf && above.X*0.8 > hf) {
			t.Errorf("±%g: λ·x = %.12g and %.12g do not straddle h_f", part, below.X*0.8, above.X*0.8)
		}
		// dM/dA = f_yd·(d − h_f) on both sides, dx/dA at most f_yd/(λ·η·f_cd·b_w).
		near(t, "jump of M", above.Moment-below.Moment, 2*part*at*fyd*(d-hf), 1e-3*2*part*at*fyd*d+1e-12*above.Moment)
		near(t, "jump of x", above.X-below.X, 0, 2*part*at*fyd/(0.8*20*bw)+1e-12*above.X)
	}
}

// The same across the foot of a flange with a haunch and across the web, in small steps: no jump anywhere.
func TestResistanceIsContinuousInTheSteel(t *testing.T) {
	shape := ok[section.Shape](t)(section.I(1000, section.Flange{Width: 700, Depth: 120, Haunch: 80}, 150, section.Flange{Width: 550, Depth: 180, Haunch: 120}))
	s := NewSection(shape)
	law := ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
	for name, solve := range map[string]func([]Layer) (Axis, error){
		"block":  func(l []Layer) (Axis, error) { return s.NeutralAxis(block20, l) },
		"fibres": func(l []Layer) (Axis, error) { return s.Fibres(parabola20, l) },
	} {
		var before Axis
		for i := range 4000 {
			area := 200 + 1.2*float64(i)
			a := ok[Axis](t)(solve([]Layer{{Area: area, Depth: 920, Prestrain: 5.5e-3, Cap: inf, Law: law}, {Area: 0.2 * area, Depth: 60, Prestrain: 6e-3, Cap: inf, Law: law}}))
			if i > 0 {
				if dx := a.X - before.X; dx < 0 || dx > 6 {
					t.Fatalf("%s: x from %g to %g mm at %g mm²", name, before.X, a.X, area)
				}
				if dm := math.Abs(a.Moment - before.Moment); dm > 1.2*1.2*fud*1000 {
					t.Fatalf("%s: M from %g to %g at %g mm²", name, before.Moment, a.Moment, area)
				}
			}
			before = a
		}
		if before.X < 500 {
			t.Errorf("%s: x reached %g mm only", name, before.X)
		}
	}
}

func TestSectionFromTheTop(t *testing.T) {
	shape := ok[section.Shape](t)(section.I(1000, section.Flange{Width: 700, Depth: 120, Haunch: 80}, 150, section.Flange{Width: 550, Depth: 180, Haunch: 120}))
	s := NewSection(shape)
	near(t, "h", s.Height(), 1000, 1e-12)
	for _, z := range []float64{0, 50, 120, 150, 200, 500, 700, 750, 820, 900, 1000, 1200} {
		area, moment := s.Above(z)
		below, first := shape.Below(1000 - z)
		near(t, "area above", area, shape.Area()-below, 1e-9*shape.Area())
		want := (shape.Area()*(1000-shape.Centroid()) - (below*1000 - first))
		near(t, "first moment above", moment, want, 1e-9*shape.Area()*1000)
	}
	if area, moment := s.Above(-5); area != 0 || moment != 0 {
		t.Errorf("above the top: %g, %g", area, moment)
	}
	for _, c := range []struct {
		z    float64
		want bool
	}{{100, false}, {500, false}, {700, false}, {701, true}, {1000, true}} {
		if got := s.Narrows(c.z); got != c.want {
			t.Errorf("narrows toward the top within %g mm: %v", c.z, got)
		}
	}
	ledge := NewSection(ok[section.Shape](t)(section.New(section.Strip{Height: 100, Bottom: 500, Top: 500}, section.Strip{Height: 300, Bottom: 200, Top: 200})))
	if ledge.Narrows(300) || !ledge.Narrows(301) {
		t.Error("ledge below the web not seen where it is")
	}
	taper := NewSection(ok[section.Shape](t)(section.New(section.Strip{Height: 100, Bottom: 400, Top: 400}, section.Strip{Height: 100, Bottom: 300, Top: 500})))
	if taper.Narrows(100) || !taper.Narrows(101) {
		t.Error("taper above a wider foot not seen where it is")
	}
}

// The bilinear law of 3.1.7(2), ε_c3 = 1.75 ‰ and ε_cu3 = 3.5 ‰: full stress over half of x, then falling in a
// straight line; the mean is 3/4, the resultant at 7/18 of x.
func TestBilinearLaw(t *testing.T) {
	const b, h, d = 300.0, 600.0, 550.0
	s := rectangle(t, b, h)
	law := Parabola{N: 1, EpsC2: 1.75e-3, EpsCu2: 3.5e-3, Fcd: 20}
	for _, area := range []float64{100, 800, 2000} {
		a := ok[Axis](t)(s.Fibres(law, []Layer{{Area: area, Depth: d, Cap: inf, Law: horizontal(t, 200e3, fyd)}}))
		x := area * fyd / (0.75 * 20 * b)
		within(t, "x", a.X, x, 1e-12)
		within(t, "M", a.Moment, area*fyd*(d-7.0/18*x), 1e-12)
	}
}
