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
