package bending

import (
	"errors"
	"math"
	"strings"
	"testing"

	"soffit/calc/section"
)

func TestNoSteelPulls(t *testing.T) {
	s := rectangle(t, 300, 600)
	law := horizontal(t, 200e3, fyd)
	for name, layers := range map[string][]Layer{
		"no layer":             nil,
		"no area":              {{Area: 0, Depth: 550, Cap: inf, Law: law}},
		"nothing anchored":     {{Area: 1000, Depth: 550, Cap: 0, Law: law}, {Area: 500, Depth: 500, Cap: 0, Law: law}},
		"at the top fibre":     {{Area: 1000, Depth: 0, Cap: inf, Law: law}},
		"next to none":         {{Area: 1e-12, Depth: 550, Cap: inf, Law: law}},
		"precompressed at top": {{Area: 1000, Depth: 0, Prestrain: -1e-3, Cap: inf, Law: law}},
	} {
		a, err := s.NeutralAxis(block20, layers)
		if r := refused(t, name, err, NoTension); r.Layer != -1 || a != (Axis{}) {
			t.Errorf("%s: %+v, %+v", name, r, a)
		}
		_, err = s.Fibres(parabola20, layers)
		refused(t, name+", fibres", err, NoTension)
	}
}

func TestWhollyCompressed(t *testing.T) {
	s := rectangle(t, 100, 600)
	law := horizontal(t, 195e3, fpd)
	layers := []Layer{{Area: 1000, Depth: 550, Prestrain: 9e-3, Cap: inf, Law: law}}
	_, err := s.NeutralAxis(block20, layers)
	r := refused(t, "block", err, WhollyCompressed)
	within(t, "concrete's force", r.Limit, 20*100*600, 1e-12)
	if r.Have <= r.Limit {
		t.Errorf("tension %g does not outweigh %g", r.Have, r.Limit)
	}
	_, err = s.Fibres(parabola20, layers)
	refused(t, "fibres", err, WhollyCompressed)

	// Just enough concrete: the block reaches past the section's foot, λ·x close under h.
	layers[0].Area = 0.99 * 20 * 100 * 600 / fpd
	a := ok[Axis](t)(s.NeutralAxis(block20, layers))
	within(t, "λ·x", 0.8*a.X, 0.99*600, 1e-9)
	if a.X <= s.Height() {
		t.Errorf("x = %g mm within the section", a.X)
	}
	// The fibres turn about the core, where the strain is ε_c2.
	f := ok[Axis](t)(s.Fibres(parabola20, layers))
	core := (1 - 2.0/3.5) * 600
	within(t, "strain of the core", f.Curvature*(f.X-core), 2e-3, 1e-12)
	if f.Pivot != PivotCore || f.TopStrain >= 3.5e-3 || f.X <= 600 {
		t.Errorf("fibres: %+v", f)
	}
	within(t, "force by fibres", f.Concrete, layers[0].Area*fpd, 1e-9)
}

func TestLimitSpent(t *testing.T) {
	s := rectangle(t, 300, 600)
	law := ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
	good := Layer{Area: 500, Depth: 550, Prestrain: 5e-3, Cap: inf, Law: law}
	for _, e := range []float64{0.02, 0.021, 1} {
		bad := good
		bad.Prestrain = e
		_, err := s.NeutralAxis(block20, []Layer{good, bad})
		if r := refused(t, "block", err, LimitSpent); r.Layer != 1 || r.Have != e || r.Limit != 0.02 {
			t.Errorf("%+v", r)
		}
		_, err = s.Fibres(parabola20, []Layer{bad, good})
		if r := refused(t, "fibres", err, LimitSpent); r.Layer != 0 {
			t.Errorf("%+v", r)
		}
	}
}

func TestBadInput(t *testing.T) {
	s := rectangle(t, 300, 600)
	nan := math.NaN()
	good := Layer{Area: 500, Depth: 550, Cap: inf, Law: horizontal(t, 200e3, fyd)}
	for name, spoil := range map[string]func(*Layer){
		"area negative":      func(l *Layer) { l.Area = -1 },
		"area NaN":           func(l *Layer) { l.Area = nan },
		"area infinite":      func(l *Layer) { l.Area = inf },
		"above the section":  func(l *Layer) { l.Depth = -1 },
		"below the section":  func(l *Layer) { l.Depth = 601 },
		"depth NaN":          func(l *Layer) { l.Depth = nan },
		"prestrain NaN":      func(l *Layer) { l.Prestrain = nan },
		"prestrain infinite": func(l *Layer) { l.Prestrain = -inf },
		"cap negative":       func(l *Layer) { l.Cap = -1 },
		"cap NaN":            func(l *Layer) { l.Cap = nan },
		"no law":             func(l *Layer) { l.Law = SteelLaw{} },
	} {
		bad := good
		spoil(&bad)
		_, err := s.NeutralAxis(block20, []Layer{good, bad})
		if r := refused(t, name, err, BadLayer); r.Layer != 1 {
			t.Errorf("%s: layer %d, want 1", name, r.Layer)
		}
		_, err = s.Fibres(parabola20, []Layer{good, bad})
		refused(t, name, err, BadLayer)
	}
	for _, law := range []BlockLaw{{}, {0, 20, .0035}, {1.1, 20, .0035}, {nan, 20, .0035}, {.8, 0, .0035}, {.8, inf, .0035}, {.8, nan, .0035}, {.8, 20, 0}, {.8, 20, nan}, {.8, 20, inf}} {
		_, err := s.NeutralAxis(law, []Layer{good})
		refused(t, "block", err, BadConcrete)
	}
	for _, law := range []Parabola{{}, {0.9, .002, .0035, 20}, {nan, .002, .0035, 20}, {inf, .002, .0035, 20}, {2, 0, .0035, 20}, {2, .004, .0035, 20}, {2, nan, .0035, 20}, {2, .002, nan, 20}, {2, .002, inf, 20}, {2, .002, .0035, 0}, {2, .002, .0035, nan}, {2, .002, .0035, inf}} {
		_, err := s.Fibres(law, []Layer{good})
		refused(t, "parabola", err, BadConcrete)
	}
}

// The ends of the domain are in it: a block over the whole of x, a concrete that is linear up to ε_c2 = ε_cu2.
func TestEndsOfTheDomain(t *testing.T) {
	s := rectangle(t, 300, 600)
	layers := []Layer{{Area: 500, Depth: 550, Cap: inf, Law: horizontal(t, 200e3, fyd)}}
	a := ok[Axis](t)(s.NeutralAxis(BlockLaw{Lambda: 1, EtaFcd: 20, EpsCu: 3.5e-3}, layers))
	within(t, "x", a.X, 500*fyd/(20*300), 1e-12)
	layers[0].Depth = 600
	within(t, "x with steel in the soffit", ok[Axis](t)(s.NeutralAxis(block20, layers)).X, a.X/0.8, 1e-12)
	layers[0].Depth = 550
	f := ok[Axis](t)(s.Fibres(Parabola{N: 1, EpsC2: 3e-3, EpsCu2: 3e-3, Fcd: 20}, layers))
	within(t, "x of the triangle", f.X, 500*fyd/(20*300)*2, 1e-12)
	within(t, "M of the triangle", f.Moment, 500*fyd*(550-f.X/3), 1e-12)
}

func TestRefusalSpeaks(t *testing.T) {
	r := &Refusal{LimitSpent, 1, 0.021, 0.02}
	if got, want := r.Error(), "no neutral axis: layer 2: the prestrain leaves nothing below the strain limit (0.021, limit 0.02)"; got != want {
		t.Errorf("%q, want %q", got, want)
	}
	r.Layer = 0
	if got := r.Error(); !strings.Contains(got, "layer 1:") {
		t.Errorf("%q names no layer 1", got)
	}
	seen := map[string]bool{}
	for _, reason := range []Reason{NoTension, WhollyCompressed, LimitSpent, BadLayer, BadConcrete, Unbalanced} {
		text := (&Refusal{reason, -1, 1, 2}).Error()
		if reason == 0 || seen[text] || strings.Contains(text, "layer 0") || strings.Contains(text, "reason ") {
			t.Errorf("%d: %q", reason, text)
		}
		seen[text] = true
		if !errors.Is(&Refusal{Reason: reason}, reason) || errors.Is(&Refusal{Reason: reason}, reason+1) {
			t.Errorf("errors.Is fails for %d", reason)
		}
	}
}

// Up to three states balance here: the upper bar, close to its strain limit, lets the lower strands stretch
// more the deeper the neutral axis lies. The state of smallest curvature is reached first (own derivation,
// values invented).
func TestFirstOfSeveralStates(t *testing.T) {
	s := rectangle(t, 100, 1000)
	brittle := ok[SteelLaw](t)(horizontal(t, 200e3, 200).WithLimit(2e-3))
	strand := horizontal(t, 200e3, 1600)
	stiff := Parabola{N: 2, EpsC2: 2e-4, EpsCu2: 3.5e-3, Fcd: 20} // full stress early, as the block has it
	most := map[string]int{}
	for area := 300.0; area < 500; area += 2.5 {
		layers := []Layer{
			{Area: 1, Depth: 300, Prestrain: 1.5e-3, Cap: inf, Law: brittle},
			{Area: area, Depth: 950, Cap: inf, Law: strand},
		}
		for name, p := range map[string]problem{
			"block":  {section: s, layers: layers, block: block20, epsCu: 3.5e-3},
			"fibres": {section: s, layers: layers, curved: true, parabola: stiff, epsCu: 3.5e-3},
		} {
			var a Axis
			if p.curved {
				a = ok[Axis](t)(s.Fibres(stiff, layers))
			} else {
				a = ok[Axis](t)(s.NeutralAxis(block20, layers))
			}
			roots, first, least := 0, 0.0, inf
			for x := 0.5; x < 1000; x += 0.5 {
				if p.balance(x) < 0 == (p.balance(x+0.5) < 0) {
					continue
				}
				roots++
				if k, _, _ := p.curvature(x + 0.25); k < least {
					first, least = x, k
				}
			}
			if a.X < first || a.X > first+0.5 || a.Evals <= scan {
				t.Errorf("%s, %g mm²: x = %g mm after %d evaluations, want the state near %g mm", name, area, a.X, a.Evals, first)
			}
			most[name] = max(most[name], roots)
		}
	}
	if most["block"] != 3 || most["fibres"] != 3 {
		t.Errorf("at most %v states, want a case with three", most)
	}
}

// Below the depth that several gives, no layer with another below it governs; just above it, one does.
func TestDepthWithinWhichSeveralMayBalance(t *testing.T) {
	s := rectangle(t, 300, 1000)
	law := ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
	layers := []Layer{
		{Area: 500, Depth: 900, Prestrain: 5e-3, Cap: inf, Law: law},
		{Area: 500, Depth: 850, Prestrain: 6e-3, Cap: inf, Law: law},
		{Area: 500, Depth: 500, Prestrain: 6e-3, Cap: inf, Law: law},
	}
	p := problem{section: s, layers: layers, block: block20, epsCu: 3.5e-3}
	near(t, "reach", p.several(), 850*3.5/(3.5+14), 1e-9)
	layers[1].Cap = 0
	near(t, "reach with an idle layer", p.several(), 500*3.5/(3.5+14), 1e-9)
	layers[2].Law = ok[SteelLaw](t)(law.WithLimit(inf))
	near(t, "reach with the lowest limited only", p.several(), 0, 0)
	layers[0].Cap, layers[1].Cap = 0, inf
	near(t, "reach with the lowest idle", p.several(), 0, 0)
}

// climb finds a peak that stays below zero, and stops early on one that does not.
func TestClimb(t *testing.T) {
	s := rectangle(t, 100, 1000)
	brittle := ok[SteelLaw](t)(horizontal(t, 200e3, 200).WithLimit(2e-3))
	for _, area := range []float64{430.0, 452.5, 454, 460, 475} {
		p := problem{section: s, block: block20, epsCu: 3.5e-3, layers: []Layer{
			{Area: 1, Depth: 300, Prestrain: 1.5e-3, Cap: inf, Law: brittle},
			{Area: area, Depth: 950, Cap: inf, Law: horizontal(t, 200e3, 1600)},
		}}
		top, at := -inf, 0.0
		for x := 50.0; x < 260; x += 0.01 {
			if f := p.balance(x); f > top {
				top, at = f, x
			}
		}
		x, evals := p.climb(50, 260)
		if top >= 0 && (p.balance(x) < 0 || evals > 20) || evals < 2 || evals > 40 {
			t.Errorf("%g mm²: %g at %g mm after %d evaluations, top %g at %g mm", area, p.balance(x), x, evals, top, at)
		}
		if top < 0 {
			near(t, "peak", x, at, 0.05)
		}
	}
}

// Steel that the section can hold only with the neutral axis just below it: at x = h and at x = 10·h the steel
// prevails, in between the concrete, for bars near the top let go as the strain evens out.
func TestBalanceBelowTheSectionOnly(t *testing.T) {
	s := rectangle(t, 300, 600)
	layers := []Layer{
		{Area: 1.554 * 20 * 300 * 600 / fpd, Depth: 150, Prestrain: 0.012, Cap: inf, Law: horizontal(t, 195e3, fpd)},
		{Area: 4000, Depth: 30, Cap: inf, Law: horizontal(t, 200e3, 1000)},
	}
	p := problem{section: s, layers: layers, curved: true, parabola: parabola20, epsCu: 3.5e-3}
	if p.balance(600) >= 0 || p.balance(700) <= 0 || p.balance(6000) >= 0 {
		t.Fatalf("balances %g, %g, %g", p.balance(600), p.balance(700), p.balance(6000))
	}
	if a := ok[Axis](t)(s.Fibres(parabola20, layers)); a.X <= 600 || a.X >= 700 || a.Pivot != PivotCore {
		t.Errorf("%+v", a)
	}
}

// Steel that pulls above the force of the concrete gives no resistance to sagging: said by M ≤ 0.
func TestNoResistanceToSagging(t *testing.T) {
	s := NewSection(ok[section.Shape](t)(section.Rectangle(300, 600)))
	layers := []Layer{{Area: 900, Depth: 40, Prestrain: 6e-3, Cap: inf, Law: horizontal(t, 195e3, fpd)}}
	a := ok[Axis](t)(s.NeutralAxis(block20, layers))
	if a.Moment >= 0 || a.ConcreteDepth <= 40 {
		t.Errorf("M = %g, force of the concrete at %g mm", a.Moment, a.ConcreteDepth)
	}
}
