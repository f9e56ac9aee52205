package statics

import (
	"math"
	"testing"

	"pgregory.net/rapid"
)

// tester is what testing.T and rapid.T share.
type tester interface {
	Helper()
	Errorf(string, ...any)
}

func near(t tester, name string, got, want, tol float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tol) {
		t.Errorf("%s: %.12g, want %.12g ± %g", name, got, want, tol)
	}
}

func load(t testing.TB, b Beam, loads ...Load) Loaded {
	t.Helper()
	s, err := b.Load(loads...)
	if err != nil {
		t.Fatal(err)
	}
	return s
}

// Own derivations: the cases of any table of beams.
func TestClosedForms(t *testing.T) {
	const l, q, p = 10e3, 12.0, 50e3
	simple := Beam{l, 0, l}
	s := load(t, simple, Uniform(q, 0, l))
	near(t, "uniform A", s.A, q*l/2, 1e-9)
	near(t, "uniform B", s.B, q*l/2, 1e-9)
	for _, x := range []float64{0, 1e3, 2500, 5e3, 7777, l} {
		near(t, "uniform M", s.Moment(x), q*x*(l-x)/2, 1e-5)
		left, right := s.Shear(x)
		wantLeft, wantRight := q*(l/2-x), q*(l/2-x)
		if x == 0 {
			wantLeft = 0
		}
		if x == l {
			wantRight = 0
		}
		near(t, "uniform V left", left, wantLeft, 1e-8)
		near(t, "uniform V right", right, wantRight, 1e-8)
	}

	const a = 3e3
	s = load(t, simple, Point(p, a))
	near(t, "point A", s.A, p*(l-a)/l, 1e-9)
	near(t, "point M", s.Moment(a), p*a*(l-a)/l, 1e-5)
	left, right := s.Shear(a)
	near(t, "point V left", left, p*(l-a)/l, 1e-8)
	near(t, "point V right", right, -p*a/l, 1e-8)

	s = load(t, simple, Point(p, 7e3)) // beyond the middle, summed from the other end
	left, right = s.Shear(7e3)
	near(t, "far point V left", left, p*0.3, 1e-8)
	near(t, "far point V right", right, -p*0.7, 1e-8)

	s = load(t, simple, Uniform(q, 2e3, 5e3)) // partial
	near(t, "partial A", s.A, q*3e3*6.5e3/l, 1e-8)
	near(t, "partial M", s.Moment(4e3), s.A*4e3-q*2e3*1e3, 1e-4)
	near(t, "partial M past it", s.Moment(8e3), s.B*2e3, 1e-4)
}

func TestOverhangs(t *testing.T) {
	const l, a, b, q, p = 12e3, 1e3, 10e3, 8.0, 20e3
	beam := Beam{l, a, b}
	s := load(t, beam, Uniform(q, 0, l), Point(p, l))
	near(t, "sum of reactions", s.A+s.B, q*l+p, 1e-8)
	near(t, "B", s.B, (q*l*(l/2-a)+p*(l-a))/(b-a), 1e-8)
	near(t, "M over A", s.Moment(a), -q*a*a/2, 1e-6)
	near(t, "M over B", s.Moment(b), -q*2e3*2e3/2-p*2e3, 1e-4)
	near(t, "M at end A", s.Moment(0), 0, 0)
	near(t, "M at end B", s.Moment(l), 0, 0)
	left, right := s.Shear(a)
	near(t, "V left of A", left, -q*a, 1e-9)
	near(t, "V right of A", right, s.A-q*a, 1e-8)
	left, right = s.Shear(b)
	near(t, "V left of B", left, p+q*2e3-s.B, 1e-8)
	near(t, "V right of B", right, p+q*2e3, 1e-8)
	left, right = s.Shear(l)
	near(t, "V left of the end load", left, p, 0)
	near(t, "V right of the end load", right, 0, 0)

	s = load(t, beam, Point(p, l)) // a load on the overhang lifts the beam off A
	near(t, "uplift at A", s.A, -p*2e3/9e3, 1e-8)

	// Without load on them the overhangs are idle, exactly.
	s = load(t, beam, Uniform(q, a, b))
	for _, x := range []float64{0, 300, a, b, b + 500, l} {
		near(t, "M on an idle overhang", s.Moment(x), 0, 0)
	}
	if left, _ := s.Shear(b + 500); left != 0 {
		t.Errorf("V on an idle overhang %g", left)
	}
}

// Numbers without exact doubles: summed from the nearer end all the same.
func TestEndsAreExactlyFree(t *testing.T) {
	beam := Beam{18.3e3, 151.7, 18153.1}
	s := load(t, beam, Uniform(9.13, 151.7, 18153.1), Uniform(6.37, 2013.7, 9011.3), Point(45.1e3, 9147.3))
	for _, x := range []float64{0, 33.3, 77.7, 151.7, 18153.1, 18171.7, 18200.3, 18222.9, 18261.1, 18.3e3} {
		near(t, "M", s.Moment(x), 0, 0)
	}
	for _, x := range []float64{77.7, 18200.3} {
		if left, right := s.Shear(x); left != 0 || right != 0 {
			t.Errorf("V(%g) = %g, %g", x, left, right)
		}
	}
}

func TestOutside(t *testing.T) {
	s := load(t, Beam{1000, 0, 1000}, Uniform(1, 0, 1000))
	for _, x := range []float64{-1, 1001, math.NaN()} {
		if m := s.Moment(x); m != 0 {
			t.Errorf("M(%g) = %g", x, m)
		}
		if l, r := s.Shear(x); l != 0 || r != 0 {
			t.Errorf("V(%g) = %g, %g", x, l, r)
		}
	}
}

func TestRefused(t *testing.T) {
	nan, inf := math.NaN(), math.Inf(1)
	for _, b := range []Beam{{}, {1000, 500, 500}, {1000, 600, 500}, {1000, -1, 500}, {1000, 0, 1001}, {nan, 0, 1}, {inf, 0, 1}, {1000, nan, 500}} {
		if _, err := b.Load(); err == nil {
			t.Errorf("%+v: no error", b)
		}
	}
	for _, l := range []Load{Point(1, -1), Point(1, 1001), Point(nan, 5), Point(inf, 5), Point(1, nan), Uniform(1, 5, 4), Uniform(1, 0, 1001), Uniform(nan, 0, 5), Uniform(inf, 0, 5)} {
		if _, err := (Beam{1000, 0, 1000}).Load(l); err == nil {
			t.Errorf("%+v: no error", l)
		}
	}
	if _, err := (Beam{1000, 0, 1000}).Load(); err != nil {
		t.Errorf("no load: %v", err)
	}
}

// anyLoaded draws a beam with up to six loads, up- and downward, on any part of it.
func anyLoaded(t *rapid.T) Loaded {
	l := rapid.Float64Range(1e3, 40e3).Draw(t, "length")
	a := l * rapid.SampledFrom([]float64{0, 0.01, 0.2}).Draw(t, "A")
	b := l * (1 - rapid.SampledFrom([]float64{0, 0.02, 0.3, 0.6}).Draw(t, "B"))
	loads := rapid.SliceOfN(rapid.Custom(func(t *rapid.T) Load {
		if rapid.Bool().Draw(t, "point") {
			return Point(rapid.Float64Range(-1e5, 1e6).Draw(t, "force"), l*rapid.Float64Range(0, 1).Draw(t, "at"))
		}
		from := rapid.Float64Range(0, 1).Draw(t, "from")
		to := rapid.Float64Range(from, 1).Draw(t, "to")
		return Uniform(rapid.Float64Range(-10, 100).Draw(t, "intensity"), l*from, l*to)
	}), 0, 6).Draw(t, "loads")
	s, err := Beam{l, a, b}.Load(loads...)
	if err != nil {
		t.Fatal(err)
	}
	return s
}

// measure is what the moments of the loads are of the order of.
func (s Loaded) measure() (force, moment float64) {
	for _, l := range s.Loads {
		force += math.Abs(l.total())
	}
	return force, force * s.Beam.Length
}

func TestAnyBeam(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		s := anyLoaded(t)
		force, moment := s.measure()
		near(t, "vertical balance", s.A+s.B, s.Total(), 1e-11*force)

		x := s.Beam.Length * rapid.Float64Range(0, 1).Draw(t, "x")
		// Second method.
		m, v := s.ByInfluence(x, 2000)
		near(t, "M by influence lines", s.Moment(x), m, 1e-6*moment+1e-9)
		left, right := s.Shear(x)
		near(t, "V by influence lines", (left+right)/2, v, 1e-3*force+1e-9)

		// dM = V·dx between two places without a force between them.
		dx := 1e-4 * s.Beam.Length
		apart := func(at float64) bool { return at < x-dx || at > x+dx }
		free := x > dx && x < s.Beam.Length-dx && apart(s.Beam.A) && apart(s.Beam.B) && apart(s.Beam.Length/2)
		for _, l := range s.Loads {
			free = free && apart(l.From) && apart(l.To)
		}
		if free {
			near(t, "dM/dx", (s.Moment(x+dx)-s.Moment(x-dx))/(2*dx), left, 1e-7*force+1e-9)
			near(t, "V without a force at x", right, left, 1e-11*force+1e-9)
		}

		// The sums from either end agree.
		turned := s.turned()
		turned.Loads = nil
		for _, l := range s.Loads {
			turned.Loads = append(turned.Loads, l.turned(s.Beam.Length))
		}
		near(t, "M from the other end", turned.Moment(s.Beam.Length-x), s.Moment(x), 1e-10*moment+1e-9)

		// Superposition and factors.
		var sum float64
		for _, l := range s.Loads {
			one, err := s.Beam.Load(l.Factored(1.5))
			if err != nil {
				t.Fatal(err)
			}
			sum += one.Moment(x)
		}
		near(t, "M by superposition", sum, 1.5*s.Moment(x), 1e-10*moment+1e-9)
	})
}

// The moment does not jump where the sum changes ends, nor at a bearing or a load.
func TestMomentIsContinuous(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		s := anyLoaded(t)
		force, moment := s.measure()
		places := []float64{s.Beam.A, s.Beam.B, s.Beam.Length / 2}
		for _, l := range s.Loads {
			places = append(places, l.From, l.To)
		}
		for _, x := range places {
			if x <= 0 || x >= s.Beam.Length {
				continue
			}
			d := 1e-9 * s.Beam.Length
			near(t, "jump of M", s.Moment(x+d), s.Moment(x-d), 2*d*(force+math.Abs(s.A)+math.Abs(s.B))+1e-10*moment)
		}
	})
}

func TestInfluenceLines(t *testing.T) {
	s := load(t, Beam{10e3, 0, 10e3}, Uniform(12, 0, 10e3))
	m, v := s.ByInfluence(2500, 1000)
	near(t, "M", m, 12*2500*7500/2, 1)
	near(t, "V", v, 12*2500, 30)
	s = load(t, Beam{12e3, 1e3, 10e3}, Point(1, 12e3), Point(2, 0), Point(4, 5e3))
	for _, x := range []float64{0, 500, 1e3, 3e3, 5e3, 9e3, 10e3, 11e3, 12e3} {
		m, v := s.ByInfluence(x, 1)
		left, right := s.Shear(x)
		near(t, "M of points", m, s.Moment(x), 1e-9)
		near(t, "V of points", v, (left+right)/2, 1e-12)
	}
	defer func() {
		if recover() == nil {
			t.Error("no panic at 0 slices")
		}
	}()
	s.ByInfluence(0, 0)
}

func BenchmarkMoment(b *testing.B) {
	s := load(b, Beam{18.3e3, 150, 18150}, Uniform(9, 0, 18.3e3), Uniform(6, 0, 18.3e3), Uniform(4, 2e3, 9e3), Point(45e3, 9150))
	b.ReportAllocs()
	for b.Loop() {
		_ = s.Moment(7e3)
	}
}
