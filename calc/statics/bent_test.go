package statics_test

import (
	"math"
	"testing"

	"gonum.org/v1/gonum/mat"
	"pgregory.net/rapid"

	"soffit/calc/statics"
	"soffit/calc/tendon"
)

func bend(t testing.TB, b statics.Beam, c statics.Curvature) statics.Bent {
	t.Helper()
	s, err := b.Bend(c)
	if err != nil {
		t.Fatal(err)
	}
	return s
}

func within(t testing.TB, what string, got, want, tolerance float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tolerance) {
		t.Errorf("%s: %.12g, want %.12g within %g", what, got, want, tolerance)
	}
}

// prestressed is the curvature of a tendon with the force over EI, 1/mm², about an axis at the height y.
func prestressed(p tendon.Profile, forceOverEI, y float64) statics.Curvature {
	c := statics.Curvature{At: func(x float64) float64 { return -forceOverEI * (y - p.Height(x)) }}
	for _, q := range p.Points {
		c.Cuts = append(c.Cuts, q.X)
	}
	return c
}

func profile(t testing.TB, points ...tendon.Point) tendon.Profile {
	t.Helper()
	p, err := tendon.New(points...)
	if err != nil {
		t.Fatal(err)
	}
	return p
}

// TestCamberClosedForms: eccentricity e in the middle and 0 at the ends but for the straight tendon: M·L²/8EI,
// 5/48·M·L²/EI, 23/216·M·L²/EI and, for any place a where the tendon is held down, P·e·(3·L² − 4·a²)/24EI (own derivation,
// closed forms of any table). End rotations by the first area theorem.
func TestCamberClosedForms(t *testing.T) {
	const l, e, y, k = 18000.0, 400.0, 600.0, 2e-12 // P/EI, 1/mm²
	beam := statics.Beam{Length: l, A: 0, B: l}
	for _, c := range []struct {
		name         string
		points       []tendon.Point
		camber, ends float64
	}{
		{"straight", []tendon.Point{{Height: y - e}, {X: l, Height: y - e}}, k * e * l * l / 8, k * e * l / 2},
		{"parabola", []tendon.Point{{Height: y}, {X: l / 2, Height: y - e, By: tendon.LevelHere}, {X: l, Height: y, By: tendon.LevelBefore}}, k * e * l * l * 5 / 48, k * e * l / 3},
		{"third points", []tendon.Point{{Height: y}, {X: l / 3, Height: y - e}, {X: 2 * l / 3, Height: y - e}, {X: l, Height: y}}, k * e * l * l * 23 / 216, k * e * l / 3},
		{"at 4 m", []tendon.Point{{Height: y}, {X: 4000, Height: y - e}, {X: l - 4000, Height: y - e}, {X: l, Height: y}}, k * e * (3*l*l - 4*4000*4000) / 24, k * e * (l - 4000) / 2},
		{"one place", []tendon.Point{{Height: y}, {X: l / 2, Height: y - e}, {X: l, Height: y}}, k * e * l * l / 12, k * e * l / 4},
	} {
		s := bend(t, beam, prestressed(profile(t, c.points...), k, y))
		within(t, c.name, s.Deflection(l/2), -c.camber, 1e-11*c.camber)
		within(t, c.name+", end A", s.Rotation(0), -c.ends, 1e-14)
		within(t, c.name+", end B", s.Rotation(l), c.ends, 1e-14)
		least, greatest, at, _ := s.Extremes()
		within(t, c.name+", highest", least, -c.camber, 1e-11*c.camber)
		within(t, c.name+", highest at", at, l/2, 1e-4)
		within(t, c.name+", deepest", greatest, 0, 0)
		for _, x := range []float64{0, 1000, 6000, 9000, 17000} {
			within(t, c.name+", unit load", s.ByUnitLoad(x), s.Deflection(x), 1e-11)
		}
	}
}

// TestCamberPublished: Handbook of Civil Engineering Calculations, 2nd ed., p. 2.66-2.67, case (a), grade A: L 36 ft,
// I 40 000 in⁴, E 3 644 000 psi, w 340 lb/ft, F 430 kip at 8.8 in: prestress 0.61 in up, self weight 0.09 in down, together
// 0.52 in; recomputed 0.6056, 0.0881.
func TestCamberPublished(t *testing.T) {
	const l, ei = 36 * 12.0, 3644e3 * 40000.0
	beam := statics.Beam{Length: l, A: 0, B: l}
	own, err := beam.Load(statics.Uniform(340.0/12, 0, l))
	if err != nil {
		t.Fatal(err)
	}
	straight := statics.Curvature{At: func(float64) float64 { return -430e3 * 8.8 }}.Times(1 / ei)
	weight := statics.Curvature{At: own.Moment}.Times(1 / ei)
	p, w, both := bend(t, beam, straight), bend(t, beam, weight), bend(t, beam, straight.Plus(weight))
	within(t, "prestress", p.Deflection(l/2), -0.61, 0.005)
	within(t, "prestress, recomputed", p.Deflection(l/2), -0.6056, 5e-5)
	within(t, "self weight", w.Deflection(l/2), 0.09, 0.005)
	within(t, "self weight, recomputed", w.Deflection(l/2), 0.0881, 1e-4)
	within(t, "together", both.Deflection(l/2), -0.52, 0.005)
	within(t, "sum", both.Deflection(l/2), p.Deflection(l/2)+w.Deflection(l/2), 1e-15)
}

// TestBeamTables: uniform load 5·q·L⁴/384EI, ends q·L³/24EI; overhangs of a beam (own derivation): a free end of length c under
// q alone sinks by q·c⁴/8EI + q·c³·s/6EI, s the span, both ends loaded.
func TestBeamTables(t *testing.T) {
	const l, q, ei = 10000.0, 20.0, 1e14
	beam := statics.Beam{Length: l, A: 0, B: l}
	loaded, err := beam.Load(statics.Uniform(q, 0, l))
	if err != nil {
		t.Fatal(err)
	}
	s := bend(t, beam, statics.Curvature{At: loaded.Moment}.Times(1/ei))
	within(t, "middle", s.Deflection(l/2), 5*q*l*l*l*l/384/ei, 1e-12)
	within(t, "end A", s.Rotation(0), q*l*l*l/24/ei, 1e-15)
	within(t, "end B", s.Rotation(l), -q*l*l*l/24/ei, 1e-15)

	const c = 2000.0
	long := statics.Beam{Length: l + 2*c, A: c, B: l + c}
	loaded, err = long.Load(statics.Uniform(q, 0, c), statics.Uniform(q, l+c, l+2*c))
	if err != nil {
		t.Fatal(err)
	}
	s = bend(t, long, statics.Curvature{At: loaded.Moment, Cuts: []float64{c, l + c}}.Times(1/ei))
	// The span under the end moments q·c²/2 turns by M·s/2EI at the bearings.
	tip := q*c*c*c*c/8/ei + q*c*c/2*l/2/ei*c
	within(t, "free end A", s.Deflection(0), tip, 1e-12)
	within(t, "free end B", s.Deflection(l+2*c), tip, 1e-12)
	within(t, "middle goes up", s.Deflection(l/2+c), -q*c*c/2*l*l/8/ei, 1e-12)
	within(t, "bearing", s.Deflection(c), 0, 0)
	least, greatest, _, at := s.Extremes()
	within(t, "deepest", greatest, tip, 1e-12)
	within(t, "highest", least, -q*c*c/2*l*l/8/ei, 1e-12)
	if at != 0 && at != l+2*c {
		t.Errorf("deepest at %g", at)
	}
	within(t, "beyond the end", s.Deflection(-1000), tip-1000*s.Rotation(0), 1e-12)
	within(t, "beyond end B", s.Deflection(l+2*c+1000), tip+1000*s.Rotation(l+2*c), 1e-12)
}

// anyBent draws a beam on any bearings, with a curvature of polynomials up to the eighth degree between cuts, and the pieces.
func anyBent(t *rapid.T) (statics.Bent, []float64) {
	l := rapid.Float64Range(2e3, 40e3).Draw(t, "length")
	b := statics.Beam{Length: l}
	b.A = l * rapid.SampledFrom([]float64{0, 0.01, 0.3}).Draw(t, "A")
	b.B = l * rapid.SampledFrom([]float64{1, 0.98, 0.6}).Draw(t, "B")
	cuts := []float64{0}
	for range rapid.IntRange(0, 4).Draw(t, "cuts") {
		cuts = append(cuts, cuts[len(cuts)-1]+(l-cuts[len(cuts)-1])*rapid.Float64Range(0.1, 0.9).Draw(t, "cut"))
	}
	cuts = append(cuts, l)
	poly := make([][]float64, len(cuts)-1)
	for i := range poly {
		poly[i] = rapid.SliceOfN(rapid.Float64Range(-1e-6, 1e-6), 1, 9).Draw(t, "polynomial")
	}
	at := func(x float64) float64 {
		i := 0
		for i < len(poly)-1 && x > cuts[i+1] {
			i++
		}
		u, k := (x-cuts[i])/(cuts[i+1]-cuts[i]), 0.0
		for j := len(poly[i]) - 1; j >= 0; j-- {
			k = k*u + poly[i][j]
		}
		return k
	}
	s, err := b.Bend(statics.Curvature{At: at, Cuts: cuts})
	if err != nil {
		t.Fatal(err)
	}
	return s, cuts
}

// TestAnyBent: second method, slopes by differences, change of bearings a movement without bending.
func TestAnyBent(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		s, cuts := anyBent(rt)
		l := s.Beam.Length
		x := l * rapid.Float64Range(0, 1).Draw(rt, "x")
		tol := 1e-12 * (1 + 9e-6*l*l)
		if got, want := s.Deflection(x), s.ByUnitLoad(x); math.Abs(got-want) > tol {
			rt.Fatalf("deflection %.12g, by a unit load %.12g", got, want)
		}
		d := 1e-4 * l
		if slope := (s.Deflection(x+d) - s.Deflection(x-d)) / (2 * d); math.Abs(slope-s.Rotation(x)) > 1e-5*d+1e-10 {
			rt.Fatalf("slope %g, rotation %g", slope, s.Rotation(x))
		}
		moved, err := s.On(l*0.2, l*0.7)
		if err != nil {
			rt.Fatal(err)
		}
		fresh, err := statics.Beam{Length: l, A: l * 0.2, B: l * 0.7}.Bend(s.Curvature)
		if err != nil {
			rt.Fatal(err)
		}
		if math.Abs(moved.Deflection(x)-fresh.Deflection(x)) > tol {
			rt.Fatalf("moved %.12g, fresh %.12g", moved.Deflection(x), fresh.Deflection(x))
		}
		chord := s.Deflection(l*0.2) + (x-l*0.2)/(l*0.5)*(s.Deflection(l*0.7)-s.Deflection(l*0.2))
		if math.Abs(moved.Deflection(x)-(s.Deflection(x)-chord)) > 10*tol {
			rt.Fatalf("moved %.12g, from the chord %.12g", moved.Deflection(x), s.Deflection(x)-chord)
		}
		back, err := moved.On(s.Beam.A, s.Beam.B)
		if err != nil || math.Abs(back.Deflection(x)-s.Deflection(x)) > tol {
			rt.Fatalf("moved back: %.12g, %v", back.Deflection(x), err)
		}
		least, greatest, at, to := s.Extremes()
		if s.Deflection(at) != least || s.Deflection(to) != greatest {
			rt.Fatalf("extremes %g at %g, %g at %g", least, at, greatest, to)
		}
		for _, c := range cuts {
			if v := s.Deflection(c); v < least-tol || v > greatest+tol {
				rt.Fatalf("%g outside %g to %g", v, least, greatest)
			}
		}
	})
}

// TestDifferences: the equations of finite differences, v″ = −κ, solved as a system, converge with the square of the step.
func TestDifferences(t *testing.T) {
	const l = 12000.0
	b := statics.Beam{Length: l, A: 1500, B: 10500}
	kappa := func(x float64) float64 { return 1e-7 * (2 + math.Sin(x/1900)) * (1 + x/l) }
	s := bend(t, b, statics.Curvature{At: kappa, Cuts: []float64{3000, 6000, 9000}})
	off := func(n int) float64 { // n steps of l/n; both bearings on the grid
		h := l / float64(n)
		a, rhs, v := mat.NewDense(n+1, n+1, nil), mat.NewVecDense(n+1, nil), mat.NewVecDense(n+1, nil)
		for i := 1; i < n; i++ {
			a.Set(i, i-1, 1)
			a.Set(i, i, -2)
			a.Set(i, i+1, 1)
			rhs.SetVec(i, -h*h*kappa(float64(i)*h))
		}
		a.Set(0, n/8, 1)
		a.Set(n, n*7/8, 1)
		if err := v.SolveVec(a, rhs); err != nil {
			t.Fatal(err)
		}
		worst := 0.0
		for i := range n + 1 {
			worst = math.Max(worst, math.Abs(v.AtVec(i)-s.Deflection(float64(i)*h)))
		}
		return worst
	}
	coarse, fine := off(80), off(160)
	if !(fine < 2e-3 && coarse/fine > 3.8 && coarse/fine < 4.2) {
		t.Errorf("off by %g, with half the steps by %g", fine, coarse)
	}
}

// TestAlong: straight lines between the places, a jump, and nothing outside.
func TestAlong(t *testing.T) {
	c, err := statics.Along([]float64{1000, 3000, 3000, 5000}, []float64{1, 3, -2, 0})
	if err != nil {
		t.Fatal(err)
	}
	for x, want := range map[float64]float64{0: 0, 999: 0, 1000: 1, 2000: 2, 2999: 2.999, 3001: -1.999, 4000: -1, 5000: 0, 6000: 0} {
		within(t, "curvature", c.At(x), want, 1e-12)
	}
	s := bend(t, statics.Beam{Length: 6000, A: 0, B: 6000}, c.Times(1e-9))
	// ∫κ·ds = (4 − 2)·1e-6: the slopes at the two ends differ by that.
	within(t, "turn", s.Rotation(0)-s.Rotation(6000), (4000-2000)*1e-9, 1e-18)
	for _, bad := range [][2][]float64{{{0}, {1}}, {{0, 1}, {1}}, {{1, 0}, {0, 0}}, {{0, math.NaN()}, {0, 0}}, {{0, 1}, {0, math.Inf(1)}}} {
		if _, err := statics.Along(bad[0], bad[1]); err == nil {
			t.Errorf("%v: no error", bad)
		}
	}
}

func TestBendRefuses(t *testing.T) {
	flat := statics.Curvature{At: func(float64) float64 { return 0 }}
	if _, err := (statics.Beam{Length: 10, A: 5, B: 5}).Bend(flat); err == nil {
		t.Error("no span: no error")
	}
	b := statics.Beam{Length: 10, A: 0, B: 10}
	if _, err := b.Bend(statics.Curvature{At: func(x float64) float64 { return math.Log(x - 5) }}); err == nil {
		t.Error("no number: no error")
	}
	s := bend(t, b, flat)
	if _, err := s.On(8, 2); err == nil {
		t.Error("bearings the wrong way round: no error")
	}
	if least, greatest, _, _ := s.Extremes(); least != 0 || greatest != 0 {
		t.Errorf("straight: %g, %g", least, greatest)
	}
}

func BenchmarkBend(b *testing.B) {
	places, kappa := make([]float64, 61), make([]float64, 61)
	for i := range places {
		places[i], kappa[i] = 300*float64(i), 1e-7*math.Sin(float64(i)/20)
	}
	b.ReportAllocs()
	for b.Loop() {
		c, err := statics.Along(places, kappa)
		if err != nil {
			b.Fatal(err)
		}
		s, err := statics.Beam{Length: 18000, A: 150, B: 17850}.Bend(c)
		if err != nil {
			b.Fatal(err)
		}
		for _, x := range places {
			_ = s.Deflection(x)
		}
	}
}
