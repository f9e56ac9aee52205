package bending

import (
	"math"
	"testing"

	"soffit/calc/section"
)

// TestGradedBlockCoefficients holds the coefficients of the parabola–rectangle against their closed forms for n = 2:
// r − r²/3 and (4 − r)/(12 − 4r) up to ε_c2 (own derivation), 17/21 and 99/238 at 3.5 ‰ (handbook coefficients,
// recalled).
func TestGradedBlockCoefficients(t *testing.T) {
	g := Graded{BlockLaw{0.8, 30, 0.0035}, Parabola{2, 0.002, 0.0035, 30}}
	for _, r := range []float64{1e-12, 1e-6, 1e-3, 0.00999, 0.01001, 0.05, 0.3, 0.5, 1} {
		mean, depth := g.resultant(r)
		if math.Abs(mean-(r-r*r/3)) > 1e-12*r+1e-15 || math.Abs(depth-(4-r)/(12-4*r)) > 1e-10 {
			t.Errorf("r = %g: %g, %g", r, mean, depth)
		}
	}
	mean, depth := g.resultant(1.75)
	if math.Abs(mean-17.0/21) > 1e-12 || math.Abs(depth-99.0/238) > 1e-12 {
		t.Errorf("full: %g, %g", mean, depth)
	}
	if at := g.At(0.0035); math.Abs(at.Lambda-0.8) > 1e-12 || math.Abs(at.EtaFcd-30) > 1e-12 {
		t.Errorf("at the ultimate strain: %+v", at)
	}
}

// TestGradedAgainstFibres: in a rectangle with steel at its limit the graded block exceeds the fibres by 0.2 % at most (its
// resultant lies at 0.40 x where the parabola has 0.416 x, as at the ultimate strain), and comes
// within 1.5 % of them; with the concrete at its limit it is the block.
func TestGradedAgainstFibres(t *testing.T) {
	shape, err := section.Rectangle(400, 600)
	if err != nil {
		t.Fatal(err)
	}
	s := NewSection(shape)
	law, err := Inclined(195000, 1426, 1617, 0.035, 0.0315)
	if err != nil {
		t.Fatal(err)
	}
	g := Graded{BlockLaw{0.8, 30, 0.0035}, Parabola{2, 0.002, 0.0035, 30}}
	limited := 0
	for area := 50.0; area < 3000; area *= 1.3 {
		layers := []Layer{{Area: area, Depth: 540, Prestrain: 0.0058, Cap: math.Inf(1), Law: law}}
		a, err := s.GradedAxis(g, layers)
		if err != nil {
			t.Fatal(err)
		}
		f, err := s.Fibres(g.Parabola, layers)
		if err != nil {
			t.Fatal(err)
		}
		if a.Pivot == PivotSteel {
			limited++
			if r := a.Moment / f.Moment; r > 1.002 || r < 0.985 {
				t.Errorf("area %g: graded %g of fibres", area, r)
			}
			continue
		}
		b, err := s.NeutralAxis(g.BlockLaw, layers)
		if err != nil || math.Abs(a.X-b.X) > 1e-6 {
			t.Errorf("area %g: x = %g, the block has %g: %v", area, a.X, b.X, err)
		}
	}
	if limited < 5 {
		t.Errorf("only %d cases with steel at its limit", limited)
	}
}
