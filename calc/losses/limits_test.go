package losses_test

import (
	"math"
	"testing"

	"soffit/calc/losses"
)

// TestNothingChanges: without creep, shrinkage and relaxation the section stays as the transformed section has it.
func TestNothingChanges(t *testing.T) {
	l := line(t, 1, 10, 100, 1000, 30000)
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(300, 0, 600, ageing(t, l, lasting(30e3), 1))},
		Steel:     []losses.Steel{{Area: 900, Height: 70, Modulus: 195e3, Stress: 1300}, {Area: 300, Height: 560, Modulus: 200e3}},
	}
	states := follow(t, l, s, losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0, 1}, Moment: 90e6, Force: -20e3, Height: 200})
	stress, plane, err := losses.Transfer{Area: 180e3, Centroid: 300, Inertia: 300 * 600 * 600 * 600 / 12.0, Modulus: 30e3, Moment: 90e6, Force: -20e3, Height: 200, Steel: s.Steel}.Transformed()
	if err != nil {
		t.Fatal(err)
	}
	for _, st := range states {
		near(t, "strands", st.Stress[0], stress[0], 1e-10*1300)
		near(t, "bars", st.Stress[1], stress[1], 1e-10*1300)
		near(t, "curvature", st.Plane.Curvature, plane.Curvature, 1e-12*math.Abs(plane.Curvature))
		near(t, "soffit", st.Plane.At(0), plane.At(0), 1e-15)
		near(t, "bottom", st.Edges[0].Bottom, 30e3*plane.At(0), 1e-10)
		near(t, "top", st.Edges[0].Top, 30e3*plane.At(600), 1e-10)
	}
	if len(states) != 5 || states[0].Event != 0 || states[1].Event != -1 {
		t.Errorf("%d states", len(states))
	}
}

// TestCreepAlone: under a constant action the strain of plain concrete is J·σ less the shrinkage, at any number of steps, and the
// stress does not change.
func TestCreepAlone(t *testing.T) {
	for _, n := range []int{1, 4} {
		l := line(t, losses.Graded([]float64{3, 90, 20000}, 0.1, n)...)
		s := losses.Section{Concretes: []losses.Concrete{rectangle(200, 0, 400, ageing(t, l, beam, 3))}}
		states := follow(t, l, s, losses.Event{Time: 3, Concretes: []int{0}, Force: -800e3, Height: 200, Moment: 20e6}, losses.Event{Time: 90, Moment: 10e6})
		end := last(states)
		j3, j90 := beam.Compliance(20000, 3), beam.Compliance(20000, 90)
		inertia := 200 * 400 * 400 * 400 / 12.0
		near(t, "curvature", end.Plane.Curvature, (20e6*j3+10e6*j90)/inertia, 1e-18)
		near(t, "strain", end.Plane.At(200), -10*j3-(beam.Shrinkage(20000)-beam.Shrinkage(3)), 1e-15)
		near(t, "bottom", end.Edges[0].Bottom, -10+30e6/inertia*200, 1e-10)
		near(t, "top", end.Edges[0].Top, -10-30e6/inertia*200, 1e-10)
	}
}

// TestRelaxationAlone: in concrete that is as good as rigid a tendon relaxes as in the test, at any number of steps, and goes on
// from what it had lost.
func TestRelaxationAlone(t *testing.T) {
	l := line(t, losses.Graded([]float64{1, 20000}, 0.1, 7)...)
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(200, 0, 400, ageing(t, l, lasting(1e18), 1))},
		Steel: []losses.Steel{
			{Area: 100, Height: 100, Modulus: 195e3, Stress: 1350, Relaxation: strands},
			{Area: 100, Height: 100, Modulus: 195e3, Stress: 1350 - strands.Loss(1350, 30), Relaxed: strands.Loss(1350, 30), Relaxation: strands},
		},
	}
	for _, st := range follow(t, l, s, losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0, 1}}) {
		near(t, "new", st.Relaxed[0], strands.Loss(1350, st.Time-1), 1e-9)
		near(t, "stress", st.Stress[0], 1350-strands.Loss(1350, st.Time-1), 1e-7)
		near(t, "30 days old", st.Relaxed[1], strands.Loss(1350, st.Time-1+30), 1e-9)
	}
}

// TestPowerLaw: (3.29) as reference values have it, recomputed, not published: class 2, ρ 2.5 %, per cent of the initial stress.
func TestPowerLaw(t *testing.T) {
	for mu, want := range map[float64][2]float64{.70: {0.964, 3.901}, .75: {1.519, 4.871}, .80: {2.394, 6.081}} {
		for i, hours := range []float64{1000, 500000} {
			near(t, "class 2", 100*strands.Loss(mu*1860, hours/24)/(mu*1860), want[i], 5e-4)
		}
		near(t, "inverse", strands.Days(mu*1860, strands.Loss(mu*1860, 77)), 77, 1e-9)
	}
	one, three := losses.PowerLaw{Strength: 1000, Rho: 8, Factor: 5.39, Growth: 6.7}, losses.PowerLaw{Strength: 1000, Rho: 4, Factor: 1.98, Growth: 8}
	for mu, want := range map[float64][2]float64{.60: {2.402, 0.962}, .70: {4.694, 2.142}, .80: {9.173, 4.767}} {
		near(t, "class 1", 100*one.Loss(mu*1000, 1000/24.0)/(mu*1000), want[0], 5e-4)
		near(t, "class 3", 100*three.Loss(mu*1000, 1000/24.0)/(mu*1000), want[1], 5e-4)
	}
	capped := strands
	capped.Final = 1000
	near(t, "final", capped.Loss(1300, 5000), strands.Loss(1300, 1000), 0)
	near(t, "no tension", strands.Loss(-5, 100)+strands.Days(-5, 1), 0, 0)
	if v := strands.Loss(1900, 10); !math.IsNaN(v) {
		t.Errorf("from above the strength: %g", v)
	}
}

// TestShorteningRelaxesLess: a tendon that gets shorter relaxes less than in the test, one in concrete that swells more.
func TestShorteningRelaxesLess(t *testing.T) {
	relaxed := func(shrinkage float64) (relaxed, stress float64) {
		law := beam
		law.shrinkage, law.creep = shrinkage, 0
		l := line(t, losses.Graded([]float64{1, 20000}, 0.1, 40)...)
		s := losses.Section{
			Concretes: []losses.Concrete{rectangle(400, 0, 400, ageing(t, l, law, 1))},
			Steel:     []losses.Steel{{Area: 1, Height: 200, Modulus: 195e3, Stress: 1350, Relaxation: strands}},
		}
		end := last(follow(t, l, s, losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0}}))
		return end.Relaxed[0], end.Stress[0]
	}
	free := strands.Loss(1350, 19999)
	less, _ := relaxed(4e-4)
	least, _ := relaxed(8e-4)
	more, _ := relaxed(-2e-4)
	if !(least < less && less < free && free < more) {
		t.Errorf("relaxed %g, %g, in the test %g, lengthened %g", least, less, free, more)
	}
	// About in proportion to what the stress is on the way: between the test's from the first and from the last stress.
	if low := strands.Loss(1350-195e3*4e-4, 19999); !(less > low) {
		t.Errorf("relaxed %g, at the last stress %g", less, low)
	}
}

// TestCastTogether: two concretes of one law and age that join at once are one.
func TestCastTogether(t *testing.T) {
	l := line(t, losses.Graded([]float64{1, 60, 20000}, 0.1, 12)...)
	a := ageing(t, l, beam, 1)
	steel := []losses.Steel{{Area: 900, Height: 60, Modulus: 195e3, Stress: 1300, Relaxation: strands}, {Area: 400, Height: 650, Modulus: 200e3}}
	one := losses.Section{Concretes: []losses.Concrete{rectangle(300, 0, 700, a)}, Steel: steel}
	two := losses.Section{Concretes: []losses.Concrete{rectangle(300, 0, 480, a), rectangle(300, 480, 700, a)}, Steel: steel}
	first := follow(t, l, one, losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0, 1}, Moment: 80e6}, losses.Event{Time: 60, Moment: 40e6})
	second := follow(t, l, two, losses.Event{Time: 1, Concretes: []int{0, 1}, Steel: []int{0, 1}, Moment: 80e6}, losses.Event{Time: 60, Moment: 40e6})
	for i := range first {
		a, b := first[i], second[i]
		near(t, "strands", b.Stress[0], a.Stress[0], 1e-8)
		near(t, "bottom", b.Edges[0].Bottom, a.Edges[0].Bottom, 1e-9)
		near(t, "top", b.Edges[1].Top, a.Edges[0].Top, 1e-9)
		near(t, "joint", b.Edges[0].Top, b.Edges[1].Bottom, 1e-9)
		near(t, "curvature", b.Plane.Curvature, a.Plane.Curvature, 1e-17)
	}
}

// TestProppedIsMonolithic: with equal moduli and neither creep nor shrinkage, a member that gets its topping while it is without
// load is the whole section from the first.
func TestProppedIsMonolithic(t *testing.T) {
	l := line(t, 1, 28, 60, 1000)
	law := lasting(34e3)
	a, b := ageing(t, l, law, 1), ageing(t, l, law, 28)
	staged := losses.Section{Concretes: []losses.Concrete{rectangle(300, 0, 500, a), rectangle(900, 500, 600, b)}}
	whole := losses.Section{Concretes: []losses.Concrete{rectangle(300, 0, 500, a), rectangle(900, 500, 600, a)}}
	x := last(follow(t, l, staged, losses.Event{Time: 1, Concretes: []int{0}}, losses.Event{Time: 28, Concretes: []int{1}}, losses.Event{Time: 60, Moment: 200e6}))
	y := last(follow(t, l, whole, losses.Event{Time: 1, Concretes: []int{0, 1}, Moment: 200e6}))
	for i := range x.Edges {
		near(t, "bottom", x.Edges[i].Bottom, y.Edges[i].Bottom, 1e-12*math.Abs(y.Edges[i].Bottom)+1e-12)
		near(t, "top", x.Edges[i].Top, y.Edges[i].Top, 1e-12*math.Abs(y.Edges[i].Top)+1e-12)
	}
}

// TestOwnForces: stresses that have arisen by themselves, after each step and event, balance the actions to rounding; summed here
// from the edges.
func TestOwnForces(t *testing.T) {
	l, s, events := composite(t, 15)
	force, moment := 0.0, 0.0
	for _, st := range follow(t, l, s, events...) {
		if st.Event >= 0 {
			e := events[st.Event]
			force += e.Force
			moment += e.Moment - e.Force*e.Height
		}
		n, m, gross := 0.0, 0.0, 0.0
		for i, c := range s.Concretes {
			mean, slope := (st.Edges[i].Bottom+st.Edges[i].Top)/2, (st.Edges[i].Bottom-st.Edges[i].Top)/(c.Top-c.Bottom)
			n += c.Area * mean
			m += c.Inertia*slope - c.Area*mean*c.Centroid
			gross += math.Abs(c.Area * mean)
		}
		for i, p := range s.Steel {
			n += p.Area * st.Stress[i]
			m -= p.Area * st.Stress[i] * p.Height
			gross += math.Abs(p.Area * st.Stress[i])
		}
		near(t, "N", n, force, 1e-12*gross)
		near(t, "M", m, moment, 1e-12*gross*1000)
		near(t, "N by itself", st.Force, 0, 1e-12*gross)
		near(t, "M by itself", st.Moment, 0, 1e-12*gross*1000)
	}
}

// TestTopping: shrinkage of the topping alone pulls it and makes the member sag, with tension at the soffit and compression under the topping.
func TestTopping(t *testing.T) {
	l := line(t, losses.Graded([]float64{1, 30, 20000}, 0.1, 20)...)
	still := usual{modulus: 35e3, late: 1}
	slab := usual{cast: 28, modulus: 30e3, late: 1, shrinkage: 5e-4}
	s := losses.Section{Concretes: []losses.Concrete{rectangle(300, 0, 500, ageing(t, l, still, 1)), rectangle(900, 500, 600, ageing(t, l, slab, 30))}}
	end := last(follow(t, l, s, losses.Event{Time: 1, Concretes: []int{0}}, losses.Event{Time: 30, Concretes: []int{1}}))
	if !(end.Plane.Curvature > 0 && end.Edges[1].Top > 0 && end.Edges[1].Bottom > 0 && end.Edges[0].Top < 0 && end.Edges[0].Bottom > 0) {
		t.Errorf("%+v %+v", end.Plane, end.Edges)
	}
}

// TestLosesWithTimeAndYouth: under constant actions the loss grows with time, and falls with the age at release.
func TestLosesWithTimeAndYouth(t *testing.T) {
	final := func(age float64) float64 {
		l := line(t, losses.Graded([]float64{age, age + 20000}, 0.1, 40)...)
		s := losses.Section{
			Concretes: []losses.Concrete{rectangle(300, 0, 600, ageing(t, l, beam, age))},
			Steel:     []losses.Steel{{Area: 1000, Height: 100, Modulus: 195e3, Stress: 1300, Relaxation: strands}},
		}
		before := 1300.0
		for _, st := range follow(t, l, s, losses.Event{Time: age, Concretes: []int{0}, Steel: []int{0}, Moment: 60e6}) {
			if !(st.Stress[0] < before) {
				t.Fatalf("at %g days %g MPa after %g MPa", st.Time, st.Stress[0], before)
			}
			before = st.Stress[0]
		}
		return before
	}
	if a, b, c := final(1), final(7), final(90); !(a < b && b < c) {
		t.Errorf("released at 1, 7, 90 days: %g, %g, %g MPa left", a, b, c)
	}
}
