package solve

import (
	"math"
	"testing"

	"gonum.org/v1/gonum/integrate/quad"
)

func TestGaussIsExactToTheNinthDegree(t *testing.T) {
	for n := 0; n <= 10; n++ {
		got := Gauss(func(x float64) float64 { return math.Pow(x, float64(n)) }, -1, 2)
		want := (math.Pow(2, float64(n+1)) - math.Pow(-1, float64(n+1))) / float64(n+1)
		off := math.Abs(got/want - 1)
		if n <= 9 && off > 1e-14 {
			t.Errorf("degree %d: off by %g", n, off)
		}
		if n == 10 && off < 1e-6 {
			t.Errorf("degree 10 exact to %g: not the five-point rule", off)
		}
	}
}

func TestGaussAgainstAnotherQuadrature(t *testing.T) {
	f := func(x float64) float64 { return math.Exp(-x) * math.Cos(x) }
	got, want := Gauss(f, 0.2, 1.1), quad.Fixed(f, 0.2, 1.1, 40, quad.Legendre{}, 0)
	if math.Abs(got-want) > 1e-10 {
		t.Errorf("%v, want %v", got, want)
	}
	if back := Gauss(f, 1.1, 0.2); math.Abs(back+got) > 1e-15 {
		t.Errorf("turned range: %v, want %v", back, -got)
	}
}

func TestSixteenPoints(t *testing.T) {
	place, weight := make([]float64, 16), make([]float64, 16)
	quad.Legendre{}.FixedLocations(place, weight, -1, 1)
	for i, p := range Legendre16 {
		if math.Abs(p.Place-place[15-i]) > 1e-15 || math.Abs(p.Weight-weight[i]) > 1e-15 {
			t.Errorf("point %d: %v, want %v, %v", i, p, place[15-i], weight[i])
		}
	}
	for n := 0; n <= 32; n += 2 {
		sum := 0.0
		for _, p := range Legendre16 {
			sum += p.Weight * math.Pow(p.Place, float64(n))
		}
		off := math.Abs(sum*float64(n+1)/2 - 1)
		if n <= 30 && off > 1e-13 || n == 32 && off < 1e-11 {
			t.Errorf("degree %d: off by %g", n, off)
		}
	}
}
