package losses_test

import (
	"math"
	"testing"

	"soffit/calc/losses"
)

// usual is a law of the form of EN 1992-1-1, Annex B and 3.1.4, with invented coefficients: modulus that grows with age, power of
// 0.3 in the time under load, drying that starts a day after casting.
type usual struct {
	cast       float64 // days
	modulus    float64 // at 28 days, MPa
	creep      float64 // φ_0 without the age
	late       float64 // β_H
	shrinkage  float64
	steadfast  bool // the modulus does not grow
	unageing   bool // creep does not depend on age
	withoutOne bool // creep counts from the modulus at 28 days, not 1.05 times it
}

func (u usual) stiffness(t float64) float64 {
	if u.steadfast {
		return u.modulus
	}
	return u.modulus * math.Pow(math.Exp(0.2*(1-math.Sqrt(28/(t-u.cast)))), 0.3)
}

func (u usual) coefficient(t, loaded float64) float64 {
	age := loaded - u.cast
	if u.unageing {
		age = 28
	}
	return u.creep / (0.1 + math.Pow(age, 0.2)) * math.Pow((t-loaded)/(u.late+t-loaded), 0.3)
}

func (u usual) Compliance(t, loaded float64) float64 {
	base := 1.05 * u.modulus
	if u.withoutOne {
		base = u.modulus
	}
	return 1/u.stiffness(loaded) + u.coefficient(t, loaded)/base
}

func (u usual) Shrinkage(t float64) float64 {
	dry := t - u.cast - 1
	if dry <= 0 {
		return 0
	}
	return u.shrinkage * dry / (dry + 100)
}

// beam is an invented concrete: C40 or so, loaded at a day.
var beam = usual{modulus: 35e3, creep: 5, late: 700, shrinkage: 4e-4}

// rateOfCreep is the law J = (1 + ψ(t) − ψ(t′))/E, whose creep from any time on runs in parallel: with it there are closed forms.
type rateOfCreep struct{ modulus, final, half, shrinkage float64 }

func (r rateOfCreep) psi(t float64) float64 { return r.final * t / (t + r.half) }
func (r rateOfCreep) Compliance(t, loaded float64) float64 {
	return (1 + r.psi(t) - r.psi(loaded)) / r.modulus
}
func (r rateOfCreep) Shrinkage(t float64) float64 { return r.shrinkage * r.psi(t) / r.final }

// lasting is elastic and does not change.
type lasting float64

func (e lasting) Compliance(float64, float64) float64 { return 1 / float64(e) }
func (lasting) Shrinkage(float64) float64             { return 0 }

// strands are of relaxation class 2: 0.66, 9.1 and 2.5 % of (3.29), recalled.
var strands = losses.PowerLaw{Strength: 1860, Rho: 2.5, Factor: 0.66, Growth: 9.1}

func near(t testing.TB, what string, got, want, tolerance float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tolerance) {
		t.Errorf("%s: %.12g, want %.12g within %g", what, got, want, tolerance)
	}
}

func line(t testing.TB, times ...float64) *losses.Timeline {
	t.Helper()
	l, err := losses.NewTimeline(times...)
	if err != nil {
		t.Fatal(err)
	}
	return l
}

func ageing(t testing.TB, l *losses.Timeline, law losses.Law, from float64) *losses.Ageing {
	t.Helper()
	a, err := l.Ageing(law, from)
	if err != nil {
		t.Fatal(err)
	}
	return a
}

func follow(t testing.TB, l *losses.Timeline, s losses.Section, events ...losses.Event) []losses.State {
	t.Helper()
	states, err := l.Follow(s, events)
	if err != nil {
		t.Fatal(err)
	}
	return states
}

func last(states []losses.State) losses.State { return states[len(states)-1] }

// rectangle is a concrete of a width between two heights.
func rectangle(width, bottom, top float64, a *losses.Ageing) losses.Concrete {
	h := top - bottom
	return losses.Concrete{Area: width * h, Centroid: (bottom + top) / 2, Inertia: width * h * h * h / 12, Bottom: bottom, Top: top, Ageing: a}
}

// composite is an invented member with all there is: two layers of strands, bars, loads, a topping at 40 days, more load.
func composite(t testing.TB, n int) (*losses.Timeline, losses.Section, []losses.Event) {
	l := line(t, losses.Graded([]float64{1, 28, 40, 42, 60, 20000}, 0.05, n)...)
	slab := usual{cast: 40, modulus: 32e3, creep: 5.5, late: 600, shrinkage: 5e-4}
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(400, 0, 800, ageing(t, l, beam, 1)), rectangle(1500, 800, 950, ageing(t, l, slab, 42))},
		Steel: []losses.Steel{
			{Area: 1200, Height: 60, Modulus: 195e3, Stress: 1330, Relaxed: 20, Relaxation: strands},
			{Area: 400, Height: 740, Modulus: 195e3, Stress: 1180, Relaxed: 10, Relaxation: strands},
			{Area: 600, Height: 40, Modulus: 200e3},
			{Area: 500, Height: 900, Modulus: 200e3},
		},
	}
	return l, s, []losses.Event{
		{Time: 1, Concretes: []int{0}, Steel: []int{0, 1, 2}, Moment: 250e6},
		{Time: 40, Moment: 180e6},
		{Time: 42, Concretes: []int{1}, Steel: []int{3}},
		{Time: 60, Moment: 150e6, Force: -50e3, Height: 500},
	}
}
