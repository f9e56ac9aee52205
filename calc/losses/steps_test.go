package losses_test

import (
	"errors"
	"math"
	"testing"

	"gonum.org/v1/gonum/mat"
	"pgregory.net/rapid"

	"soffit/calc/losses"
)

// TestRateOfCreep: concentric bonded steel in concrete of the rate-of-creep law has a closed form (own derivation): with r = n·ρ,
// σ_s′·(1 + r) = −r·ψ′·σ_s − E_s·ε_cs′, so where the shrinkage runs with ψ, σ_s = (σ_0 + c)·exp(−ψ·r/(1 + r)) − c, c = E_s·ε_∞/(ψ_∞·r).
// The steps converge to it with the square of their length.
func TestRateOfCreep(t *testing.T) {
	law := rateOfCreep{modulus: 32e3, final: 2.6, half: 150, shrinkage: 4e-4}
	const es, area = 195e3, 2000.0
	concrete := 400.0 * 400
	r := es / law.modulus * area / concrete
	off := func(n int) float64 {
		var times []float64
		for i := range n + 1 {
			psi := 2.5 * float64(i) / float64(n) // equal steps of ψ
			times = append(times, psi*law.half/(law.final-psi))
		}
		l := line(t, times...)
		s := losses.Section{
			Concretes: []losses.Concrete{rectangle(400, 0, 400, ageing(t, l, law, 0))},
			Steel:     []losses.Steel{{Area: area, Height: 200, Modulus: es, Stress: 1300}},
		}
		worst := 0.0
		for _, st := range follow(t, l, s, losses.Event{Time: 0, Concretes: []int{0}, Steel: []int{0}}) {
			c := es * law.shrinkage / (law.final * r)
			want := (1300/(1+r)+c)*math.Exp(-law.psi(st.Time)*r/(1+r)) - c
			worst = math.Max(worst, math.Abs(st.Stress[0]-want))
		}
		return worst
	}
	coarse, fine := off(20), off(40)
	if !(fine < 0.05 && coarse/fine > 3.5 && coarse/fine < 4.5) {
		t.Errorf("off by %g MPa, with half the steps by %g MPa", coarse, fine)
	}
}

// TestHalvedSteps: in a member with all there is, halving the steps changes no stress of steel by more than 0.1 MPa at 12 steps
// between events and 0.04 MPa at 24, nor one of concrete by more than 0.02 and 0.008 MPa: each halving brings it to about half
// or less, with laws whose creep starts as the power 0.3 of time.
func TestHalvedSteps(t *testing.T) {
	run := func(n int) losses.State {
		l, s, events := composite(t, n)
		return last(follow(t, l, s, events...))
	}
	a, b, c := run(12), run(24), run(48)
	differ := func(x, y losses.State) (steel, concrete float64) {
		for i := range x.Stress {
			steel = math.Max(steel, math.Abs(x.Stress[i]-y.Stress[i]))
		}
		for i := range x.Edges {
			concrete = math.Max(concrete, math.Max(math.Abs(x.Edges[i].Bottom-y.Edges[i].Bottom), math.Abs(x.Edges[i].Top-y.Edges[i].Top)))
		}
		return steel, concrete
	}
	s1, c1 := differ(a, b)
	s2, c2 := differ(b, c)
	t.Logf("12 to 24 steps: %.3g MPa, %.2g MPa; 24 to 48: %.3g MPa, %.2g MPa", s1, c1, s2, c2)
	if !(s1 < 0.1 && s2 < 0.04 && c1 < 0.02 && c2 < 0.008 && s2 < s1/2 && c2 < c1/2) {
		t.Errorf("12 to 24 steps: %g MPa, %g MPa; 24 to 48: %g MPa, %g MPa", s1, c1, s2, c2)
	}
}

// TestAgainstOneSystem: all steps as one system of linear equations, with each concrete as two fibres at its radius of gyration,
// which have its area and second moment, and the trapezoidal rule written out; without relaxation, which is not linear.
func TestAgainstOneSystem(t *testing.T) {
	l, s, events := composite(t, 5)
	for i := range s.Steel {
		s.Steel[i].Relaxation = nil
	}
	states := follow(t, l, s, events...)

	type moment struct {
		time   float64
		sudden bool
	}
	var at []moment // one for each state
	for _, st := range states {
		at = append(at, moment{st.Time, st.Event >= 0})
	}
	type fibre struct {
		area, y float64
		law     usual
		from    int // index of the state with which it joins
	}
	var fibres []fibre
	for i, c := range s.Concretes {
		law, from := beam, 0
		if i == 1 {
			law, from = usual{cast: 40, modulus: 32e3, creep: 5.5, late: 600, shrinkage: 5e-4}, indexOf(states, 2)
		}
		r := math.Sqrt(c.Inertia / c.Area)
		fibres = append(fibres, fibre{c.Area / 2, c.Centroid - r, law, from}, fibre{c.Area / 2, c.Centroid + r, law, from})
	}
	steelFrom := []int{0, 0, 0, indexOf(states, 2)}

	m, f := len(at), len(fibres)
	width := f + 2 // unknowns of a state: increments of stress of the fibres, strain at the soffit, curvature
	a, rhs := mat.NewDense(m*width, m*width, nil), mat.NewVecDense(m*width, nil)
	strain := func(row, k int, y, factor float64) { // factor·ε(y) of state k
		if k < 0 {
			return
		}
		a.Set(row, k*width+f, a.At(row, k*width+f)+factor)
		a.Set(row, k*width+f+1, a.At(row, k*width+f+1)-factor*y)
	}
	force, turn, next := 0.0, 0.0, 0
	for k, now := range at {
		for i, c := range fibres {
			row := k*width + i
			if k < c.from {
				a.Set(row, k*width+i, 1)
				continue
			}
			// ε_k − ε at joining = Σ J·Δσ − (shrinkage since)
			strain(row, k, c.y, 1)
			strain(row, c.from-1, c.y, -1)
			for j := c.from; j <= k; j++ {
				flexible := c.law.Compliance(now.time, at[j].time)
				if !at[j].sudden {
					flexible = (flexible + c.law.Compliance(now.time, at[j-1].time)) / 2
				}
				a.Set(row, j*width+i, -flexible)
			}
			rhs.SetVec(row, -(c.law.Shrinkage(now.time) - c.law.Shrinkage(at[c.from].time)))
		}
		if now.sudden {
			force += events[next].Force
			turn += events[next].Moment - events[next].Force*events[next].Height
			next++
		}
		n, mm := k*width+f, k*width+f+1
		rhs.SetVec(n, force)
		rhs.SetVec(mm, turn)
		for i, c := range fibres {
			for j := c.from; j <= k; j++ {
				a.Set(n, j*width+i, c.area)
				a.Set(mm, j*width+i, -c.area*c.y)
			}
		}
		for i, p := range s.Steel {
			if k < steelFrom[i] {
				continue
			}
			rhs.SetVec(n, rhs.AtVec(n)-p.Area*p.Stress)
			rhs.SetVec(mm, rhs.AtVec(mm)+p.Area*p.Stress*p.Height)
			strain(n, k, p.Height, p.Area*p.Modulus)
			strain(n, steelFrom[i]-1, p.Height, -p.Area*p.Modulus)
			strain(mm, k, p.Height, -p.Area*p.Modulus*p.Height)
			strain(mm, steelFrom[i]-1, p.Height, p.Area*p.Modulus*p.Height)
		}
	}
	// Rows of one size, for the sake of the solution.
	for i := range m * width {
		size := mat.Norm(a.RowView(i), math.Inf(1))
		for j := range m * width {
			a.Set(i, j, a.At(i, j)/size)
		}
		rhs.SetVec(i, rhs.AtVec(i)/size)
	}
	x := mat.NewVecDense(m*width, nil)
	if err := x.SolveVec(a, rhs); err != nil {
		if _, bad := err.(mat.Condition); !bad {
			t.Fatal(err)
		}
	}
	for k, st := range states {
		near(t, "strain at the soffit", st.Plane.Strain, x.AtVec(k*width+f), 1e-10)
		near(t, "curvature", st.Plane.Curvature, x.AtVec(k*width+f+1), 1e-13)
		for i, c := range fibres {
			stress := 0.0
			for j := range k + 1 {
				stress += x.AtVec(j*width + i)
			}
			part := s.Concretes[i/2]
			e := st.Edges[i/2]
			near(t, "concrete", e.Bottom+(e.Top-e.Bottom)*(c.y-part.Bottom)/(part.Top-part.Bottom), stress, 1e-6)
		}
	}
}

// indexOf is the state that an event led to.
func indexOf(states []losses.State, event int) int {
	for i, st := range states {
		if st.Event == event {
			return i
		}
	}
	return -1
}

// TestAgeAdjusted: one release with creep, shrinkage and relaxation together against the age-adjusted modulus with χ = 0.8 and
// the relaxation reduced to 0.8, which is the form of (5.46). The loss agrees within 4 % for releases at 3 to 28 days.
func TestAgeAdjusted(t *testing.T) {
	for _, age := range []float64{3, 7, 28} {
		for _, share := range []float64{0.3, 1} {
			law := beam
			law.steadfast, law.withoutOne = true, true
			l := line(t, losses.Graded([]float64{age, 20000}, 0.02, 60)...)
			concrete := rectangle(400, 0, 800, ageing(t, l, law, age))
			p := losses.Steel{Area: 1500 * share, Height: 100, Modulus: 195e3, Stress: 1300, Relaxation: strands}
			states := follow(t, l, losses.Section{Concretes: []losses.Concrete{concrete}, Steel: []losses.Steel{p}}, losses.Event{Time: age, Concretes: []int{0}, Steel: []int{0}, Moment: 100e6})
			loss := states[0].Stress[0] - last(states).Stress[0]

			z := concrete.Centroid - p.Height
			at := func(st losses.State) float64 {
				e := st.Edges[0]
				return e.Bottom + (e.Top-e.Bottom)*p.Height/concrete.Top
			}
			phi := law.Compliance(20000, age)*law.modulus - 1
			relaxed := strands.Loss(states[0].Stress[0], 20000-age)
			about := p.Modulus*(law.Shrinkage(20000)-law.Shrinkage(age)) + 0.8*relaxed - p.Modulus/law.modulus*phi*at(states[0])
			about /= 1 + p.Modulus/law.modulus*p.Area/concrete.Area*(1+concrete.Area/concrete.Inertia*z*z)*(1+0.8*phi)
			t.Logf("at %g days, %g mm²: %.1f MPa, age-adjusted %.1f MPa", age, p.Area, loss, about)
			near(t, "loss", about, loss, 0.04*loss)
		}
	}
}

// TestSplitEvents: actions that come one by one at one time are one action; layers of half the area are one layer.
func TestSplitEvents(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		l, s, events := composite(t, 4)
		k := rapid.IntRange(0, len(events)-1).Draw(rt, "event")
		share := rapid.Float64Range(0, 1).Draw(rt, "share")
		split := append([]losses.Event{}, events[:k+1]...)
		split[k].Moment *= share
		split[k].Force *= share
		split = append(split, losses.Event{Time: events[k].Time, Moment: events[k].Moment * (1 - share), Force: events[k].Force * (1 - share), Height: events[k].Height})
		split = append(split, events[k+1:]...)
		two := losses.Section{Concretes: s.Concretes, Steel: append([]losses.Steel{}, s.Steel...)}
		two.Steel[0].Area *= share
		rest := s.Steel[0]
		rest.Area *= 1 - share
		two.Steel = append(two.Steel, rest)
		split[0].Steel = []int{0, 1, 2, 4}
		x, err := l.Follow(s, events)
		if err != nil {
			rt.Fatal(err)
		}
		y, err := l.Follow(two, split)
		if err != nil {
			rt.Fatal(err)
		}
		a, b := last(x), last(y)
		for i := range a.Stress {
			if math.Abs(a.Stress[i]-b.Stress[i]) > 1e-7 {
				rt.Fatalf("layer %d: %.12g, %.12g", i, a.Stress[i], b.Stress[i])
			}
		}
		if math.Abs(b.Stress[0]-b.Stress[4]) > 1e-9 || math.Abs(a.Plane.Curvature-b.Plane.Curvature) > 1e-15 {
			rt.Fatalf("%g, %g", b.Stress[0], b.Stress[4])
		}
	})
}

// TestLeaving: a tendon that is cut as soon as it has been released leaves nothing behind in elastic concrete.
func TestLeaving(t *testing.T) {
	l := line(t, 1, 2)
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(300, 0, 600, ageing(t, l, lasting(30e3), 1))},
		Steel:     []losses.Steel{{Area: 900, Height: 70, Modulus: 195e3, Stress: 1300}, {Area: 300, Height: 560, Modulus: 200e3, Stress: 1000}},
	}
	with := follow(t, l, s, losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0, 1}}, losses.Event{Time: 2, Leaving: []int{1}})
	without := follow(t, l, s, losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0}})
	near(t, "stress", last(with).Stress[0], last(without).Stress[0], 1e-9)
	near(t, "gone", last(with).Stress[1], 0, 0)
	near(t, "curvature", last(with).Plane.Curvature, last(without).Plane.Curvature, 1e-18)
}

// TestJacked: the jacks hold what they are set to, whatever the section does under them; from then on the tendon goes with it.
func TestJacked(t *testing.T) {
	l := line(t, 7, 8)
	s := losses.Section{
		Concretes: []losses.Concrete{rectangle(300, 0, 600, ageing(t, l, lasting(30e3), 7))},
		Steel:     []losses.Steel{{Area: 900, Height: 70, Modulus: 195e3, Stress: 1300}},
	}
	states := follow(t, l, s, losses.Event{Time: 7, Concretes: []int{0}}, losses.Event{Time: 7, Steel: []int{0}, Jacked: true, Moment: 30e6}, losses.Event{Time: 8, Moment: 50e6})
	near(t, "held", states[1].Stress[0], 1300, 1e-12)
	p, inertia := 900*1300.0, 300*600*600*600/12.0
	near(t, "soffit", states[1].Edges[0].Bottom, -p/180e3-(p*230-30e6)/inertia*300, 1e-10)
	end := last(states)
	gain := 195e3 * (end.Plane.At(70) - states[1].Plane.At(70))
	near(t, "goes with the section", end.Stress[0], 1300+gain, 1e-9)
	if !(gain > 0) {
		t.Errorf("gain %g MPa", gain)
	}
}

func TestRefusals(t *testing.T) {
	refused := func(what string, err error, want losses.Reason) {
		t.Helper()
		var r *losses.Refusal
		if !errors.As(err, &r) || !errors.Is(err, want) || r.Error() == "" {
			t.Errorf("%s: %v, want %v", what, err, want)
		}
	}
	for _, times := range [][]float64{{}, {1, 1}, {2, 1}, {math.NaN()}, {1, math.Inf(1)}} {
		_, err := losses.NewTimeline(times...)
		refused("times", err, losses.BadTimes)
	}
	l := line(t, 1, 10, 100)
	_, err := l.Ageing(lasting(3e4), 2)
	refused("start", err, losses.OffTime)
	_, err = l.Ageing(lasting(-3e4), 1)
	refused("modulus", err, losses.BadLaw)
	_, err = l.Ageing(usual{modulus: 3e4, late: 1, shrinkage: math.NaN()}, 10)
	refused("shrinkage", err, losses.BadLaw)

	a, late := ageing(t, l, lasting(3e4), 1), ageing(t, l, lasting(3e4), 100)
	other := ageing(t, line(t, 1), lasting(3e4), 1)
	good := losses.Section{Concretes: []losses.Concrete{rectangle(300, 0, 600, a), rectangle(300, 600, 700, late)}, Steel: []losses.Steel{{Area: 900, Height: 70, Modulus: 195e3, Stress: 1300}}}
	first := losses.Event{Time: 1, Concretes: []int{0}, Steel: []int{0}}
	for _, c := range []struct {
		what   string
		events []losses.Event
		want   losses.Reason
	}{
		{"none", nil, losses.BadEvent},
		{"late first", []losses.Event{{Time: 10, Concretes: []int{0}}}, losses.BadEvent},
		{"order", []losses.Event{first, {Time: 100}, {Time: 10}}, losses.BadEvent},
		{"number", []losses.Event{{Time: 1, Moment: math.NaN()}}, losses.BadEvent},
		{"time", []losses.Event{first, {Time: 11}}, losses.OffTime},
		{"no such concrete", []losses.Event{{Time: 1, Concretes: []int{2}}}, losses.Unknown},
		{"twice", []losses.Event{first, {Time: 10, Concretes: []int{0}}}, losses.Unknown},
		{"steel twice", []losses.Event{first, {Time: 10, Steel: []int{0}}}, losses.Unknown},
		{"leaves unasked", []losses.Event{{Time: 1, Concretes: []int{0}}, {Time: 10, Leaving: []int{0}}}, losses.Unknown},
		{"no such steel", []losses.Event{{Time: 1, Steel: []int{-1}}}, losses.Unknown},
		{"early", []losses.Event{first, {Time: 10, Concretes: []int{1}}}, losses.Early},
		{"loose", []losses.Event{{Time: 1, Steel: []int{0}}}, losses.Loose},
	} {
		_, err := l.Follow(good, c.events)
		refused(c.what, err, c.want)
	}
	change := func(f func(*losses.Section)) losses.Section {
		s := losses.Section{Concretes: append([]losses.Concrete{}, good.Concretes...), Steel: append([]losses.Steel{}, good.Steel...)}
		f(&s)
		return s
	}
	for what, f := range map[string]func(*losses.Section){
		"area": func(s *losses.Section) { s.Concretes[0].Area = 0 }, "edges": func(s *losses.Section) { s.Concretes[0].Top = 0 },
		"no ageing": func(s *losses.Section) { s.Concretes[0].Ageing = nil }, "other line": func(s *losses.Section) { s.Concretes[0].Ageing = other },
	} {
		_, err := l.Follow(change(f), []losses.Event{first})
		refused(what, err, losses.BadConcrete)
	}
	_, err = l.Follow(change(func(s *losses.Section) { s.Steel[0].Modulus = 0 }), []losses.Event{first})
	refused("steel", err, losses.BadSteel)
	_, err = l.Follow(change(func(s *losses.Section) { s.Steel[0].Stress, s.Steel[0].Relaxation = 2500, strands }), []losses.Event{first})
	refused("above the strength", err, losses.Unsettled)
	for _, f := range []func(){func() { losses.Graded([]float64{1, 2}, 0, 1) }, func() { losses.Graded([]float64{1, 2}, 1, 0) }} {
		func() {
			defer func() {
				if recover() == nil {
					t.Error("no panic")
				}
			}()
			f()
		}()
	}
}

// TestGraded: twice the steps keep the times of before, and the events are exact.
func TestGraded(t *testing.T) {
	a, b := losses.Graded([]float64{1, 28, 20000}, 0.1, 5), losses.Graded([]float64{1, 28, 20000}, 0.1, 10)
	if len(a) != 11 || len(b) != 21 || a[5] != 28 || b[20] != 20000 {
		t.Fatalf("%v %v", a, b)
	}
	for i := range a {
		near(t, "kept", b[2*i], a[i], 1e-12*a[i])
	}
	if got := line(t, a...).Times(); len(got) != len(a) {
		t.Error(got)
	}
}

// A beam at one place, 100 steps, all there is; the laws are tabled once for all places.
func BenchmarkFollow(b *testing.B) {
	l, s, events := composite(b, 20)
	b.ReportAllocs()
	for b.Loop() {
		if _, err := l.Follow(s, events); err != nil {
			b.Fatal(err)
		}
	}
}

func BenchmarkAgeing(b *testing.B) {
	l, _, _ := composite(b, 20)
	b.ReportAllocs()
	for b.Loop() {
		if _, err := l.Ageing(beam, 1); err != nil {
			b.Fatal(err)
		}
	}
}
