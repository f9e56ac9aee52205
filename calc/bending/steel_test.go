package bending

import (
	"math"
	"testing"

	"pgregory.net/rapid"
)

// Points of the laws read off their definition (own derivation).
func TestSteelLaws(t *testing.T) {
	h := horizontal(t, 200e3, fyd)
	inclined := ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
	three := ok[SteelLaw](t)(MultiLinear(Point{0.005, 1000}, Point{0.010, 1400}, Point{0.030, 1500}))
	for _, c := range []struct {
		name         string
		law          SteelLaw
		strain, want float64
	}{
		{"horizontal", h, 0, 0},
		{"horizontal", h, 1e-3, 200},
		{"horizontal", h, fyd / 200e3, fyd},
		{"horizontal", h, 1, fyd},
		{"horizontal", h, -1e-3, -200},
		{"horizontal", h, -1, -fyd},
		{"inclined", inclined, 5e-3, 975},
		{"inclined", inclined, fpd / 195e3, fpd},
		{"inclined", inclined, (0.035 + fpd/195e3) / 2, (fpd + fud) / 2},
		{"inclined", inclined, 0.035, fud},
		{"inclined", inclined, 0.050, fud},
		{"inclined", inclined, -0.035, -fud},
		{"three lines", three, 0.0025, 500},
		{"three lines", three, 0.0075, 1200},
		{"three lines", three, 0.020, 1450},
		{"three lines", three, 0.040, 1500},
		{"three lines", three, -0.0075, -1200},
	} {
		near(t, c.name, c.law.Stress(c.strain), c.want, 1e-9)
	}
	near(t, "modulus", inclined.Modulus(), 195e3, 1e-6)
	near(t, "yield strain", inclined.Yield().Strain, fpd/195e3, 1e-15)
	near(t, "yield stress", inclined.Yield().Stress, fpd, 0)
	near(t, "limit", inclined.Limit(), 0.02, 0)
	if !math.IsInf(h.Limit(), 1) || !math.IsNaN(h.Stress(math.NaN())) || !math.IsNaN(SteelLaw{}.Stress(1)) {
		t.Error("horizontal law limited, or a number made of none")
	}
	if h != horizontal(t, 200e3, fyd) || h == inclined {
		t.Error("laws do not compare")
	}
}

func TestSteelLawsRefused(t *testing.T) {
	nan := math.NaN()
	for name, make := range map[string]func() (SteelLaw, error){
		"no modulus":            func() (SteelLaw, error) { return Horizontal(0, 400) },
		"modulus NaN":           func() (SteelLaw, error) { return Horizontal(nan, 400) },
		"no strength":           func() (SteelLaw, error) { return Horizontal(200e3, 0) },
		"negative strength":     func() (SteelLaw, error) { return Horizontal(200e3, -1) },
		"strength infinite":     func() (SteelLaw, error) { return Horizontal(200e3, inf) },
		"falling branch":        func() (SteelLaw, error) { return Inclined(200e3, 435, 430, 0.05, 0.045) },
		"limit past the branch": func() (SteelLaw, error) { return Inclined(200e3, 435, 460, 0.05, 0.051) },
		"limit before yield":    func() (SteelLaw, error) { return Inclined(200e3, 435, 460, 0.05, 0.002) },
		"branch before yield":   func() (SteelLaw, error) { return Inclined(200e3, 435, 460, 0.002, 0.002) },
		"inclined, no modulus":  func() (SteelLaw, error) { return Inclined(0, 435, 460, 0.05, 0.045) },
		"limit NaN":             func() (SteelLaw, error) { return Inclined(200e3, 435, 460, 0.05, nan) },
		"no points":             func() (SteelLaw, error) { return MultiLinear() },
		"seven points":          func() (SteelLaw, error) { return MultiLinear(make7()...) },
		"strains stand":         func() (SteelLaw, error) { return MultiLinear(Point{.001, 100}, Point{.001, 200}) },
		"stresses fall":         func() (SteelLaw, error) { return MultiLinear(Point{.001, 100}, Point{.002, 99}) },
		"stress NaN":            func() (SteelLaw, error) { return MultiLinear(Point{.001, nan}) },
		"limit of the zero law": func() (SteelLaw, error) { return SteelLaw{}.WithLimit(-1) },
		"horizontal, limit low": func() (SteelLaw, error) { return horizontal(t, 200e3, 400).WithLimit(0.001) },
		"horizontal, limit at yield": func() (SteelLaw, error) {
			return ok[SteelLaw](t)(MultiLinear(Point{.002, 400})).WithLimit(.002)
		},
		"horizontal, limit none": func() (SteelLaw, error) { return horizontal(t, 200e3, 400).WithLimit(nan) },
	} {
		if l, err := make(); err == nil {
			t.Errorf("%s: no error, %+v", name, l)
		}
	}
	if _, err := MultiLinear(make7()[:6]...); err != nil {
		t.Errorf("six points: %v", err)
	}
	if _, err := MultiLinear(Point{.002, 400}, Point{.01, 400}); err != nil {
		t.Errorf("level line: %v", err)
	}
}

func TestLayerAtItsEdges(t *testing.T) {
	l := Layer{Area: 100, Depth: 500, Prestrain: .002, Cap: 400, Law: ok[SteelLaw](t)(MultiLinear(Point{.002, 400}))}
	f := l.At(200, 0)
	if !f.Yields || f.Capped || f.Force != 40e3 {
		t.Errorf("at yield and at the cap: %+v", f)
	}
	l.Cap = 399
	if f = l.At(200, 0); !f.Capped || f.Stress != 399 {
		t.Errorf("past the cap: %+v", f)
	}
	l.Prestrain = -.0019
	if f = l.At(200, 0); f.Yields || f.Capped || f.Stress >= 0 {
		t.Errorf("in compression: %+v", f)
	}
}

func make7() (p []Point) {
	for i := range 7 {
		p = append(p, Point{float64(i+1) * 1e-3, float64(i+1) * 100})
	}
	return p
}

// Any law is odd, does not fall, does not jump, and meets its points.
func TestAnySteelLaw(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		law := anyLaw(t)
		a := rapid.Float64Range(-0.06, 0.06).Draw(t, "a")
		b := rapid.Float64Range(-0.06, 0.06).Draw(t, "b")
		if law.Stress(-a) != -law.Stress(a) {
			t.Errorf("not symmetric at %g: %g and %g", a, law.Stress(a), law.Stress(-a))
		}
		if (b-a)*(law.Stress(b)-law.Stress(a)) < -1e-9 {
			t.Errorf("falls from %g to %g", a, b)
		}
		for i := range law.points {
			e := law.strain[i]
			within(t, "σ at a point", law.Stress(e), law.stress[i], 1e-12)
			within(t, "σ just before a point", law.Stress(e*(1-1e-12)), law.stress[i], 1e-9)
			within(t, "σ just past a point", law.Stress(e*(1+1e-12)), law.stress[i], 1e-9)
		}
	})
}

// anyLaw draws bars, strand, wire or a law of up to six lines, with or without a limit.
func anyLaw(t *rapid.T) SteelLaw {
	kind := rapid.SampledFrom([]string{"bars", "bars rising", "strand", "strand rising", "lines"}).Draw(t, "law")
	var l SteelLaw
	var err error
	switch kind {
	case "bars":
		l, err = Horizontal(200e3, rapid.Float64Range(200, 600).Draw(t, "fd"))
	case "bars rising":
		fd := rapid.Float64Range(200, 600).Draw(t, "fd")
		l, err = Inclined(200e3, fd, 1.08*fd, 0.05, 0.045)
	case "strand":
		l, err = Horizontal(195e3, rapid.Float64Range(1000, 1700).Draw(t, "fd"))
	case "strand rising":
		fd := rapid.Float64Range(1000, 1700).Draw(t, "fd")
		l, err = Inclined(195e3, fd, fd/0.9, 0.035, rapid.Float64Range(0.015, 0.035).Draw(t, "ε_ud"))
	default:
		var points []Point
		var p Point
		for range rapid.IntRange(1, 6).Draw(t, "points") {
			p.Strain += rapid.Float64Range(1e-3, 8e-3).Draw(t, "Δε")
			p.Stress += rapid.Float64Range(50, 500).Draw(t, "Δσ")
			points = append(points, p)
		}
		if l, err = MultiLinear(points...); err == nil && rapid.Bool().Draw(t, "limited") {
			l, err = l.WithLimit(p.Strain * rapid.Float64Range(1, 1.5).Draw(t, "ε_ud/ε") * (1 + 1e-9))
		}
	}
	if err != nil {
		t.Fatalf("%v", err)
	}
	return l
}
