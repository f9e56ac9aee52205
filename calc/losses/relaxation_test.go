package losses_test

import (
	"math"
	"testing"

	"soffit/calc/losses"
)

// TestRelaxationWithCreep: relaxation, creep of the rate-of-creep law and shrinkage together, concentric, against differential
// equations taken with the classical rule of Runge and Kutta (own derivation): the rate of relaxation is that of the test at the
// equivalent time, and σ_s′·(1/E_s + ρ/E) = −R′/E_s − ρ·σ_s·ψ′/E − ε_cs′.
func TestRelaxationWithCreep(t *testing.T) {
	law := rateOfCreep{modulus: 32e3, final: 2.6, half: 150, shrinkage: 4e-4}
	const es, area, end = 195e3, 2000.0, 10000.0
	rho := area / (400 * 400)
	begun := strands.Loss(1350, 2)

	l := line(t, losses.Graded([]float64{0, end}, 1, 400)...)
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(400, 0, 400, ageing(t, l, law, 0))},
		Steel:     []losses.Steel{{Area: area, Height: 200, Modulus: es, Stress: 1350 - begun, Relaxed: begun, Relaxation: strands}},
	}
	got := last(follow(t, l, s, losses.Event{Time: 0, Concretes: []int{0}, Steel: []int{0}}))

	// Over z = ln(1 + t), so that the steps are short at first.
	rates := func(z, stress, relaxed float64) (float64, float64) {
		days, dt := math.Expm1(z), math.Exp(z)
		initial := stress + relaxed
		equivalent := strands.Days(initial, relaxed)
		r := strands.Loss(initial, equivalent) * 0.75 * (1 - initial/strands.Strength) / equivalent
		psi := law.final * law.half / ((days + law.half) * (days + law.half))
		return dt * (-r/es - rho*stress*psi/law.modulus - law.shrinkage*psi/law.final) / (1/es + rho/law.modulus), dt * r
	}
	stress, relaxed := (1350-begun)/(1+es/law.modulus*rho), begun
	const n = 4000
	h := math.Log1p(end) / n
	for i := range n {
		z := h * float64(i)
		a, ra := rates(z, stress, relaxed)
		b, rb := rates(z+h/2, stress+h/2*a, relaxed+h/2*ra)
		c, rc := rates(z+h/2, stress+h/2*b, relaxed+h/2*rb)
		d, rd := rates(z+h, stress+h*c, relaxed+h*rc)
		stress += h / 6 * (a + 2*b + 2*c + d)
		relaxed += h / 6 * (ra + 2*rb + 2*rc + rd)
	}
	near(t, "stress", got.Stress[0], stress, 2e-3)
	near(t, "relaxed", got.Relaxed[0], relaxed, 2e-3)
	if !(relaxed < strands.Loss(1350, end)-5) {
		t.Errorf("relaxed %g MPa: no trial of the reduction", relaxed)
	}
}

// TestNothingComesBack: what a tendon has lost stays lost where it gets so short that a test would never have lost as much.
func TestNothingComesBack(t *testing.T) {
	capped := strands
	capped.Final = 10
	l := line(t, 0, 20, 1000, 2000)
	law := rateOfCreep{modulus: 32e3, final: 0.1, half: 1e4, shrinkage: 3e-3}
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(400, 0, 400, ageing(t, l, law, 0))},
		Steel:     []losses.Steel{{Area: 10, Height: 200, Modulus: 195e3, Stress: 1350, Relaxation: capped}},
	}
	states := follow(t, l, s, losses.Event{Time: 0, Concretes: []int{0}, Steel: []int{0}})
	for _, st := range states[2:] {
		near(t, "relaxed", st.Relaxed[0], states[1].Relaxed[0], 0)
	}
	if !(states[1].Relaxed[0] > 1) {
		t.Errorf("relaxed %g MPa", states[1].Relaxed[0])
	}
}
