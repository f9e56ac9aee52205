package solve

import (
	"errors"
	"math"
	"testing"

	"pgregory.net/rapid"
)

func TestBracketKnownRoots(t *testing.T) {
	cases := []struct {
		name   string
		f      func(float64) float64
		lo, hi float64
		want   float64
	}{
		{"line", func(x float64) float64 { return 3*x - 1 }, 0, 1, 1.0 / 3},
		{"square root of 2", func(x float64) float64 { return x*x - 2 }, 0, 2, math.Sqrt2},
		{"square root of 2, falling", func(x float64) float64 { return 2 - x*x }, 0, 2, math.Sqrt2},
		{"logarithm", func(x float64) float64 { return math.Exp(x) - 10 }, -50, 50, math.Ln10},
		{"π", math.Sin, 2, 4, math.Pi},
		{"ninth power, flat at the root", func(x float64) float64 { return math.Pow(x-1, 9) }, 0, 3, 1},
		{"kink", func(x float64) float64 { return math.Min(x-0.25, 1e-3*(x-0.25)) }, -1, 1, 0.25},
		{"hyperbola, steep at one end", func(x float64) float64 { return 1 - 1e-6/x }, 1e-9, 1, 1e-6},
		{"root at the lower end", func(x float64) float64 { return x }, 0, 1, 0},
		{"root at the upper end", func(x float64) float64 { return x - 1 }, 0, 1, 1},
	}
	for _, c := range cases {
		x, evals, err := Bracket(c.f, c.lo, c.hi, 0)
		if err != nil {
			t.Errorf("%s: %v", c.name, err)
			continue
		}
		tol := 4e-16 * math.Abs(c.want)
		if c.want == 1 && c.hi == 3 {
			tol = 1e-15 // doubles near 1
		}
		if math.Abs(x-c.want) > tol {
			t.Errorf("%s: root %.17g, want %.17g", c.name, x, c.want)
		}
		if evals > 200 {
			t.Errorf("%s: %d evaluations", c.name, evals)
		}
	}
}

func TestBracketCountsAndHonoursTolerance(t *testing.T) {
	calls := 0
	f := func(x float64) float64 { calls++; return x*x*x - 2*x - 5 }
	x, evals, err := Bracket(f, 2, 3, 1e-3)
	if err != nil || evals != calls {
		t.Fatalf("evals %d, calls %d, err %v", evals, calls, err)
	}
	if want := 2.0945514815423265914823865405793; math.Abs(x-want) > 1e-3 {
		t.Errorf("root %v", x)
	}
	for _, tol := range []float64{0.5, 0.1, 1e-2, 1e-4, 1e-8} {
		g := func(x float64) float64 { return math.Pow(x-1.2345, 3) }
		x, _, err := Bracket(g, 0, 3, tol)
		if err != nil || g(x) != 0 && g(x-tol) < 0 == (g(x+tol) < 0) {
			t.Errorf("tolerance %g: root %g, error %v", tol, x, err)
		}
	}
	coarse := evals
	if _, evals, _ = Bracket(f, 2, 3, 0); evals <= coarse {
		t.Errorf("full precision took %d evaluations, tolerance 1e-3 took %d", evals, coarse)
	}
}

func TestBracketRefuses(t *testing.T) {
	var same *NoSignChange
	if _, _, err := Bracket(func(x float64) float64 { return x*x + 1 }, -1, 2, 0); !errors.As(err, &same) {
		t.Errorf("no root: %v", err)
	} else if same.Lo != -1 || same.Hi != 2 || same.FLo != 2 || same.FHi != 5 {
		t.Errorf("no root: %+v", *same)
	}
	var bad *NotFinite
	for _, f := range []func(float64) float64{
		func(x float64) float64 { return math.Sqrt(x) - 1 }, // lower end
		func(x float64) float64 { return math.Log(2 - x) },  // upper end, −Inf
		func(x float64) float64 { // inside
			if math.Abs(x) < 0.9 {
				return math.NaN()
			}
			return x
		},
	} {
		calls := 0
		x, evals, err := Bracket(func(x float64) float64 { calls++; return f(x) }, -1, 2, 0)
		if !errors.As(err, &bad) || evals != calls {
			t.Errorf("root %v, err %v after %d evaluations, said %d; want NotFinite", x, err, calls, evals)
		}
	}
	for _, c := range [][3]float64{{1, 1, 0}, {2, 1, 0}, {0, 1, -1}, {0, 1, math.NaN()}, {math.NaN(), 1, 0}, {0, math.Inf(1), 0}} {
		func() {
			defer func() {
				if recover() == nil {
					t.Errorf("%v: no panic", c)
				}
			}()
			_, _, _ = Bracket(func(x float64) float64 { return x - 0.5 }, c[0], c[1], c[2])
		}()
	}
}

// Smooth functions take few evaluations: interpolation does its part.
func TestBracketIsQuick(t *testing.T) {
	for _, c := range []struct {
		name   string
		f      func(float64) float64
		lo, hi float64
		most   int
	}{
		{"line", func(x float64) float64 { return 3*x - 1 }, 0, 1, 4},
		{"square", func(x float64) float64 { return x*x - 2 }, 0, 2, 11},
		{"cubic", func(x float64) float64 { return x*x*x - 2*x - 5 }, 2, 3, 10},
		{"cosine", func(x float64) float64 { return math.Cos(x) - x }, 0, 1, 9},
		{"exponential", func(x float64) float64 { return math.Exp(x) - 10 }, 0, 5, 13},
		{"hyperbola", func(x float64) float64 { return 1 - 0.3/x }, 0.01, 1, 14},
	} {
		if _, evals, err := Bracket(c.f, c.lo, c.hi, 0); err != nil || evals > c.most {
			t.Errorf("%s: %d evaluations, want at most %d; error %v", c.name, evals, c.most, err)
		}
	}
}

// A jump across zero is closed in to neighbouring doubles.
func TestBracketJump(t *testing.T) {
	x, _, err := Bracket(func(x float64) float64 { return math.Copysign(1, x-math.E) }, 0, 10, 0)
	if err != nil || math.Abs(x-math.E) > 2e-15 {
		t.Errorf("%v, %v", x, err)
	}
}

// Broken lines of any slopes, rising or falling: f changes sign within the spacing of doubles at the root.
func TestBracketBrokenLines(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		n := rapid.IntRange(1, 8).Draw(t, "pieces")
		xs, ys := []float64{0}, []float64{0}
		for range n {
			dx := math.Pow(10, rapid.Float64Range(-4, 2).Draw(t, "log dx"))
			dy := math.Pow(10, rapid.Float64Range(-6, 6).Draw(t, "log dy"))
			xs = append(xs, xs[len(xs)-1]+dx)
			ys = append(ys, ys[len(ys)-1]+dy)
		}
		target := ys[n] * rapid.Float64Range(0.001, 0.999).Draw(t, "target")
		sign := float64(rapid.SampledFrom([]int{-1, 1}).Draw(t, "sign"))
		f := func(x float64) float64 {
			i := 1
			for i < n && x > xs[i] {
				i++
			}
			return sign * (ys[i-1] - target + (ys[i]-ys[i-1])*(x-xs[i-1])/(xs[i]-xs[i-1]))
		}
		x, evals, err := Bracket(f, 0, xs[n], 0)
		if err != nil {
			t.Fatal(err)
		}
		w := 4 * epsilon * x
		if f(x) != 0 && (f(x-w) > 0) == (f(x+w) > 0) {
			t.Fatalf("f(%g) = %g without a change of sign about it", x, f(x))
		}
		if evals > 400 {
			t.Fatalf("%d evaluations", evals)
		}
	})
}

func TestBracketDoesNotAllocate(t *testing.T) {
	k := 2.0
	if n := testing.AllocsPerRun(100, func() {
		if _, _, err := Bracket(func(x float64) float64 { return x*x - k }, 0, 2, 0); err != nil {
			t.Fatal(err)
		}
	}); n != 0 {
		t.Errorf("%v allocations", n)
	}
}

func BenchmarkBracket(b *testing.B) {
	b.ReportAllocs()
	for b.Loop() {
		if _, _, err := Bracket(func(x float64) float64 { return x*x*x - 2*x - 5 }, 2, 3, 0); err != nil {
			b.Fatal(err)
		}
	}
}
