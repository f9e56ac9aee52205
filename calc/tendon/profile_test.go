package tendon_test

import (
	"errors"
	"math"
	"testing"

	"gonum.org/v1/gonum/integrate/quad"
	"pgregory.net/rapid"

	"soffit/calc/tendon"
)

func profile(t testing.TB, points ...tendon.Point) tendon.Profile {
	t.Helper()
	p, err := tendon.New(points...)
	if err != nil {
		t.Fatal(err)
	}
	return p
}

func near(t testing.TB, what string, got, want, tolerance float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tolerance) {
		t.Errorf("%s: %.12g, want %.12g within %g", what, got, want, tolerance)
	}
}

// TestParabola holds a parabola of sag f over L against its closed forms (own derivation): y = y_end − 4·f·x·(L − x)/L²,
// slope 4·f/L at the ends, angle 8·f·x/L², radius L²/(8·f).
func TestParabola(t *testing.T) {
	const l, f, end = 20000.0, 900.0, 1000.0
	p := profile(t, tendon.Point{X: 0, Height: end}, tendon.Point{X: l / 2, Height: end - f, By: tendon.LevelHere},
		tendon.Point{X: l, Height: end, By: tendon.LevelBefore})
	for _, x := range []float64{0, 1, 3333, 10000, 12345.6, 20000} {
		near(t, "height", p.Height(x), end-4*f*x*(l-x)/(l*l), 1e-9)
		near(t, "slope", p.Slope(x), -4*f*(l-2*x)/(l*l), 1e-12)
		near(t, "angle from A", p.Angle(x, false), 8*f*x/(l*l), 1e-12)
		near(t, "angle from B", p.Angle(x, true), 8*f*(l-x)/(l*l), 1e-12)
	}
	near(t, "radius", p.LeastRadius(), l*l/(8*f), 1e-6)
	near(t, "steepest", p.Steepest(), 4*f/l, 1e-15)
	least, greatest := p.Extremes()
	near(t, "least height", least, end-f, 1e-9)
	near(t, "greatest height", greatest, end, 1e-9)
}

// TestDeflected: angles only at the two places where the tendon is held down, each counted at its place from both ends.
func TestDeflected(t *testing.T) {
	p, err := tendon.Deflected(18000, 80, 400, 6000)
	if err != nil {
		t.Fatal(err)
	}
	const kink = 400.0 / 6000
	for _, c := range []struct{ x, height, a, b float64 }{{0, 480, 0, 2 * kink}, {3000, 280, 0, 2 * kink}, {6000, 80, kink, 2 * kink},
		{9000, 80, kink, kink}, {12000, 80, 2 * kink, kink}, {15000, 280, 2 * kink, 0}, {18000, 480, 2 * kink, 0}} {
		near(t, "height", p.Height(c.x), c.height, 1e-9)
		near(t, "angle from A", p.Angle(c.x, false), c.a, 1e-15)
		near(t, "angle from B", p.Angle(c.x, true), c.b, 1e-15)
	}
	if !math.IsInf(p.LeastRadius(), 1) {
		t.Errorf("straight lines have radius %g", p.LeastRadius())
	}
	one, err := tendon.Deflected(18000, 80, 400, 9000)
	if err != nil || len(one.Segments) != 2 {
		t.Fatalf("held down in the middle: %d segments, %v", len(one.Segments), err)
	}
	near(t, "kink in the middle", one.Angle(9000, false), 2*400.0/9000, 1e-15)
}

// TestChain: a parabola that goes on keeps the direction, and its vertex inside gives the extreme.
func TestChain(t *testing.T) {
	p := profile(t, tendon.Point{X: 0, Height: 500}, tendon.Point{X: 4000, Height: 300}, tendon.Point{X: 10000, Height: 400, By: tendon.Onward},
		tendon.Point{X: 12000, Height: 600, By: tendon.Onward})
	for i := 1; i < len(p.Segments); i++ {
		near(t, "kink", p.Kink(i), 0, 1e-15)
	}
	// y = 300 − 0.05·u + c·u² with 400 at u = 6000: c = 400/6000²; level at u = 0.025/c = 2250, where y = 243.75.
	least, greatest := p.Segments[1].Extremes()
	near(t, "vertex", least, 243.75, 1e-9)
	near(t, "greatest", greatest, 400, 1e-9)
	u, ok := p.Segments[1].Vertex()
	if near(t, "place of the vertex", u, 2250, 1e-9); !ok {
		t.Error("no vertex found")
	}
}

// points draws a profile at random.
func points(t *rapid.T) []tendon.Point {
	n := rapid.IntRange(2, 7).Draw(t, "points")
	out := []tendon.Point{{Height: rapid.Float64Range(50, 1500).Draw(t, "height")}}
	for i := 1; i < n; i++ {
		q := tendon.Point{X: out[i-1].X + rapid.Float64Range(500, 15000).Draw(t, "step"), Height: rapid.Float64Range(50, 1500).Draw(t, "height")}
		if q.By = rapid.SampledFrom([]tendon.Line{tendon.Straight, tendon.LevelHere, tendon.LevelBefore, tendon.Onward}).Draw(t, "line"); i == 1 && q.By == tendon.Onward {
			q.By = tendon.Straight
		}
		out = append(out, q)
	}
	return out
}

func random(t *rapid.T) (tendon.Profile, []tendon.Point) {
	q := points(t)
	p, err := tendon.New(q...)
	if err != nil {
		t.Fatal(err)
	}
	return p, q
}

// TestAngleByQuadrature: the angle is the integral of |y″|, found with differences of the heights alone, and the kinks.
func TestAngleByQuadrature(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, _ := random(rt)
		x := rapid.Float64Range(p.From(), p.To()).Draw(rt, "x")
		want, previous := 0.0, 0.0
		for i, s := range p.Segments {
			if x < s.Start {
				break
			}
			d := s.Length / 4
			slope := func(u float64) float64 { return (s.HeightAt(u+d) - s.HeightAt(u-d)) / (2 * d) } // exact for a parabola
			if i > 0 {
				want += math.Abs(slope(0) - previous)
			}
			previous = slope(s.Length)
			bent := func(u float64) float64 {
				return math.Abs(s.HeightAt(u+d)-2*s.HeightAt(u)+s.HeightAt(u-d)) / (d * d)
			}
			want += quad.Fixed(bent, 0, math.Min(x-s.Start, s.Length), 20, nil, 0)
		}
		if got := p.Angle(x, false); math.Abs(got-want) > 1e-9*(1+want) {
			rt.Fatalf("angle %.12g, by quadrature %.12g", got, want)
		}
	})
}

// TestMirrored: the mirrored profile has the same heights, and from its other end the same angles.
func TestMirrored(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, _ := random(rt)
		var m tendon.Profile
		for i := len(p.Segments) - 1; i >= 0; i-- {
			s := p.Segments[i]
			m.Segments = append(m.Segments, tendon.Segment{Start: p.To() - s.End(), Length: s.Length, Height: s.HeightAt(s.Length), Slope: -s.SlopeAt(s.Length), Half: s.Half})
		}
		x := rapid.Float64Range(p.From(), p.To()).Draw(rt, "x")
		a, b := p.Angle(x, false), m.Angle(p.To()-x, true)
		if math.Abs(a-b) > 1e-9*(1+a) || math.Abs(p.Height(x)-m.Height(p.To()-x)) > 1e-6 {
			rt.Fatalf("angles %.12g and %.12g, heights %.12g and %.12g", a, b, p.Height(x), m.Height(p.To()-x))
		}
	})
}

// TestPassesItsPoints: heights at the points as asked for, level where level, and a direction kept where it goes on.
func TestPassesItsPoints(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, q := random(rt)
		size := 0.0 // of heights on the way: a parabola that goes on may swing far
		for _, s := range p.Segments {
			size = math.Max(size, math.Abs(s.Slope*s.Length)+math.Abs(s.Half*s.Length*s.Length))
		}
		for i, s := range p.Segments {
			if got := s.HeightAt(s.Length); math.Abs(got-q[i+1].Height) > 1e-12*(size+1e4) {
				rt.Fatalf("point %d: height %.12g, want %.12g", i+1, got, q[i+1].Height)
			}
			steep := math.Abs(s.Slope) + 2*math.Abs(s.Half)*s.Length
			switch q[i+1].By {
			case tendon.LevelHere:
				if g := s.SlopeAt(s.Length); math.Abs(g) > 1e-12*(1+steep) {
					rt.Fatalf("point %d: slope %g where it is to be level", i+1, g)
				}
			case tendon.LevelBefore:
				if s.Slope != 0 {
					rt.Fatalf("point %d: slope %g where it is to be level before", i+1, s.Slope)
				}
			case tendon.Onward:
				if p.Kink(i) != 0 {
					rt.Fatalf("point %d: kink %g where the direction is kept", i, p.Kink(i))
				}
			}
		}
	})
}

// TestSlopeForAngle holds the bound that stands at Angle: Θ ≤ Angle ≤ (1 + s²)·Θ.
func TestSlopeForAngle(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, _ := random(rt)
		x := rapid.Float64Range(p.From(), p.To()).Draw(rt, "x")
		for _, fromB := range []bool{false, true} {
			angle, turned, s := p.Angle(x, fromB), p.Turned(x, fromB), p.Steepest()
			if angle < turned*(1-1e-12)-1e-15 || angle > (1+s*s)*turned*(1+1e-12)+1e-15 {
				rt.Fatalf("slopes %.12g, angles %.12g, steepest %g", angle, turned, s)
			}
		}
	})
	p, err := tendon.Deflected(20000, 0, 1000, 10000) // 1 in 10
	if err != nil {
		t.Fatal(err)
	}
	if excess := p.Angle(20000, false)/p.Turned(20000, false) - 1; !(excess > 0 && excess < 0.01) {
		t.Errorf("with slopes of 1 in 10 the angle is %g too large", excess)
	}
}

// TestExtremes against many heights on the way.
func TestExtremes(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, _ := random(rt)
		least, greatest := p.Extremes()
		low, high := math.Inf(1), math.Inf(-1)
		for i := range 2001 {
			h := p.Height(p.From() + (p.To()-p.From())*float64(i)/2000)
			low, high = math.Min(low, h), math.Max(high, h)
		}
		if tol := p.Steepest()*(p.To()-p.From())/2000 + 1e-9; low < least-1e-9*(1+math.Abs(least)) || high > greatest+1e-9*(1+math.Abs(greatest)) || low > least+tol || high < greatest-tol {
			rt.Fatalf("extremes %g and %g, found %g and %g", least, greatest, low, high)
		}
	})
}

func TestFaults(t *testing.T) {
	nan := math.NaN()
	for _, c := range []struct {
		points []tendon.Point
		want   tendon.Reason
		at     int
		words  string
	}{
		{nil, tendon.FewPoints, 0, "have 0 points of a profile, want at least 2"},
		{[]tendon.Point{{X: 1}}, tendon.FewPoints, 1, "have 1 points of a profile, want at least 2"},
		{[]tendon.Point{{X: nan}, {X: 1}}, tendon.NotFinite, 0, "point 1 of the profile: not a finite number"},
		{[]tendon.Point{{}, {X: 1, Height: math.Inf(1)}}, tendon.NotFinite, 1, "point 2 of the profile: not a finite number"},
		{[]tendon.Point{{}, {X: 5}, {X: 5}}, tendon.NotAhead, 2, "point 3 of the profile at 5 mm is not beyond the one before it at 5 mm"},
		{[]tendon.Point{{}, {X: 5, By: tendon.Onward}}, tendon.NoDirection, 1, "point 2 of the profile: no direction to go on in at the first point"},
		{[]tendon.Point{{}, {X: 5, By: 9}}, tendon.UnknownLine, 1, "point 2 of the profile: unknown kind of line"},
	} {
		_, err := tendon.New(c.points...)
		var f *tendon.Fault
		if !errors.As(err, &f) || !errors.Is(err, c.want) || f.Point != c.at || err.Error() != c.words {
			t.Errorf("%v: %v, want %q", c.points, err, c.words)
		}
	}
	if _, err := tendon.Level(0, 50); !errors.Is(err, tendon.NotAhead) {
		t.Errorf("a tendon without length: %v", err)
	}
}
