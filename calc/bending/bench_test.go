package bending

import (
	"testing"

	"soffit/calc/section"
)

// beam is an invented pretensioned I-beam: three rows of strand, bars at the bottom and at the top.
func beam(t tester, rising bool) (*Section, []Layer) {
	s := NewSection(ok[section.Shape](t)(section.I(1100, section.Flange{Width: 600, Depth: 130, Haunch: 70}, 160, section.Flange{Width: 500, Depth: 180, Haunch: 100})))
	strand, bar := horizontal(t, 195e3, fpd), horizontal(t, 200e3, fyd)
	if rising {
		strand = ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
		bar = ok[SteelLaw](t)(Inclined(200e3, fyd, 1.08*fyd, 0.05, 0.045))
	}
	return s, []Layer{
		{Area: 8 * 140, Depth: 1050, Prestrain: 5.6e-3, Cap: inf, Law: strand},
		{Area: 6 * 140, Depth: 1000, Prestrain: 5.7e-3, Cap: inf, Law: strand},
		{Area: 2 * 140, Depth: 60, Prestrain: 6.1e-3, Cap: 900, Law: strand},
		{Area: 402, Depth: 1055, Cap: inf, Law: bar},
		{Area: 226, Depth: 45, Cap: inf, Law: bar},
	}
}

func BenchmarkNeutralAxis(b *testing.B) {
	for _, rising := range []bool{false, true} {
		s, layers := beam(b, rising)
		b.Run(map[bool]string{false: "horizontal", true: "inclined"}[rising], func(b *testing.B) {
			b.ReportAllocs()
			evals := 0
			for b.Loop() {
				a, err := s.NeutralAxis(block20, layers)
				if err != nil {
					b.Fatal(err)
				}
				evals = a.Evals
			}
			b.ReportMetric(float64(evals), "evals/op")
		})
	}
}

func BenchmarkFibres(b *testing.B) {
	high := Parabola{N: 1.6, EpsC2: 2.3e-3, EpsCu2: 2.9e-3, Fcd: 40}
	for name, law := range map[string]Parabola{"C50": parabola20, "C60": high} {
		for _, rising := range []bool{false, true} {
			s, layers := beam(b, rising)
			b.Run(name+map[bool]string{false: "/horizontal", true: "/inclined"}[rising], func(b *testing.B) {
				b.ReportAllocs()
				evals := 0
				for b.Loop() {
					a, err := s.Fibres(law, layers)
					if err != nil {
						b.Fatal(err)
					}
					evals = a.Evals
				}
				b.ReportMetric(float64(evals), "evals/op")
			})
		}
	}
}

func TestSolversDoNotAllocate(t *testing.T) {
	for _, rising := range []bool{false, true} {
		s, layers := beam(t, rising)
		if n := testing.AllocsPerRun(50, func() {
			if _, err := s.NeutralAxis(block20, layers); err != nil {
				t.Fatal(err)
			}
			if _, err := s.Fibres(parabola20, layers); err != nil {
				t.Fatal(err)
			}
			if _, err := s.GradedAxis(Graded{block20, parabola20}, layers); err != nil {
				t.Fatal(err)
			}
		}); n != 0 {
			t.Errorf("rising %v: %v allocations", rising, n)
		}
	}
	ring := NewSection(set(t, section.RoundBeam{Diameter: 600, Bore: 400}).Shape)
	c := Conditions{Axial: ring.AtCentroid(500e3)}
	if n := testing.AllocsPerRun(50, func() {
		if _, err := ring.FibresUnder(c, parabola20, nil); err != nil {
			t.Fatal(err)
		}
	}); n != 0 {
		t.Errorf("ring: %v allocations", n)
	}
}

// topped is the beam under a topping, with strain locked in.
func topped(t tester, rising bool) (*composed, []Layer) {
	m := &composed{}
	m.add(set(t, section.RectangularBeam{Width: 1500, Depth: 80}), parabola20)
	m.add(set(t, section.IBeam{Depth: 1100, Top: section.Flange{Width: 600, Depth: 130, Haunch: 70}, Web: 160, Bottom: section.Flange{Width: 500, Depth: 180, Haunch: 100}}), Parabola{N: 2, EpsC2: 2e-3, EpsCu2: 3.5e-3, Fcd: 30})
	m.bodies[1].Strain, m.bodies[1].Slope = 5e-5, 4e-7
	m.limits = LimitsOf(m.bodies)
	_, layers := beam(t, rising)
	for i := range layers {
		layers[i].Depth += 80
		layers[i].Prestrain -= 5e-5 + 4e-7*(layers[i].Depth-80)
	}
	return m, layers
}

func BenchmarkComposite(b *testing.B) {
	for _, rising := range []bool{false, true} {
		m, layers := topped(b, rising)
		model := modelled(m.bodies, m.limits, thin, share, m.ledges())
		for name, solve := range map[string]func() (Axis, error){
			"bodies": func() (Axis, error) { return CompositeFibres(m.bodies, m.limits, Conditions{}, layers) },
			"fibres": func() (Axis, error) { return model.Axis(Conditions{}, layers) },
		} {
			b.Run(name+map[bool]string{false: "/horizontal", true: "/inclined"}[rising], func(b *testing.B) {
				b.ReportAllocs()
				evals := 0
				for b.Loop() {
					a, err := solve()
					if err != nil {
						b.Fatal(err)
					}
					evals = a.Evals
				}
				b.ReportMetric(float64(evals), "evals/op")
			})
		}
	}
}

func BenchmarkFibreModel(b *testing.B) {
	for name, law := range map[string]Parabola{"C50": parabola20, "C60": {N: 1.6, EpsC2: 2.3e-3, EpsCu2: 2.9e-3, Fcd: 40}, "bilinear": {N: 1, EpsC2: 1.75e-3, EpsCu2: 3.5e-3, Fcd: 20}} {
		s, layers := beam(b, true)
		bodies := alone(s, law)
		model := modelled(bodies, LimitsOf(bodies), thin, share, [][]float64{{130, 200, 820, 920}})
		b.Run(name, func(b *testing.B) {
			b.ReportAllocs()
			for b.Loop() {
				if _, err := model.Axis(Conditions{}, layers); err != nil {
					b.Fatal(err)
				}
			}
			b.ReportMetric(float64(len(model.Fibres)), "fibres")
		})
	}
}

func BenchmarkGradedAndNarrowing(b *testing.B) {
	s, layers := beam(b, true)
	ring := NewSection(set(b, section.RoundBeam{Diameter: 600, Bore: 400}).Shape)
	for name, solve := range map[string]func() (Axis, error){
		"graded": func() (Axis, error) { return s.GradedAxis(Graded{block20, parabola20}, layers) },
		"graded, flange": func() (Axis, error) {
			return s.GradedAxisUnder(Conditions{Flange: CompressionFlange{130, 2e-3}}, Graded{block20, parabola20}, layers)
		},
		"narrowing, ring": func() (Axis, error) {
			return ring.NeutralAxisUnder(Conditions{Axial: ring.AtCentroid(500e3), Narrowing: 0.9}, block20, nil)
		},
	} {
		b.Run(name, func(b *testing.B) {
			b.ReportAllocs()
			for b.Loop() {
				if _, err := solve(); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}

func BenchmarkNewSection(b *testing.B) {
	for _, c := range trade {
		o := set(b, c.form)
		b.Run(c.name, func(b *testing.B) {
			b.ReportAllocs()
			for b.Loop() {
				NewSection(o.Shape)
			}
		})
	}
}

func TestFibreModelDoesNotAllocate(t *testing.T) {
	m, layers := topped(t, true)
	model := modelled(m.bodies, m.limits, thin, share, m.ledges())
	if n := testing.AllocsPerRun(20, func() {
		if _, err := model.Axis(Conditions{Flange: CompressionFlange{80, 2e-3}}, layers); err != nil {
			t.Fatal(err)
		}
	}); n != 0 {
		t.Errorf("%v allocations", n)
	}
}
