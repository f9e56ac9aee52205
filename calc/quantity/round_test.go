package quantity

import (
	"math"
	"math/big"
	"math/rand"
	"strings"
	"testing"
)

func TestFormat(t *testing.T) {
	for _, c := range []struct {
		v        float64
		decimals int
		want, up string
	}{
		{1843.1874, 1, "1843.2", "1843.2"}, {0, 2, "0.00", "0.00"}, {math.Copysign(0, -1), 1, "0.0", "0.0"},
		{1.005, 2, "1.01", "1.01"}, {2.675, 2, "2.68", "2.68"}, {-2.675, 2, "-2.68", "-2.68"}, {0.5, 0, "1", "1"}, {1.5, 0, "2", "2"}, {2.5, 0, "3", "3"},
		{-0.004, 2, "0.00", "-0.01"}, {0.05, 1, "0.1", "0.1"}, {0.049999, 1, "0.0", "0.1"}, {0.0049, 1, "0.0", "0.1"},
		{99999.7, 0, "100000", "100000"}, {9.99996, 4, "10.0000", "10.0000"}, {999.95, 1, "1000.0", "1000.0"},
		{654321, -1, "654320", "654330"}, {654321, -5, "700000", "700000"}, {654321, -6, "1000000", "1000000"}, {454321, -6, "0", "1000000"},
		{54321, -6, "0", "1000000"}, {5, -1, "10", "10"}, {4, -1, "0", "10"}, {-4, -1, "0", "-10"},
		{1.0000000000000002, 2, "1.00", "1.00"}, {0.1 + 0.2, 1, "0.3", "0.3"}, {1.00000000000001, 2, "1.00", "1.01"}, {0.9999, 2, "1.00", "1.00"},
		{1.001, 2, "1.00", "1.01"}, {1e20, 2, "100000000000000000000.00", "100000000000000000000.00"}, {1e-20, 3, "0.000", "0.001"},
		{1.23456789012345e-8, 22, "0.0000000123456789012345", "0.0000000123456789012345"}, {123456789.123456789, 9, "123456789.123457000", "123456789.123457000"},
		{5e-324, 324, "0." + strings.Repeat("0", 323) + "5", "0." + strings.Repeat("0", 323) + "5"},
		{math.NaN(), 2, "NaN", "NaN"}, {math.Inf(1), 2, "+Inf", "+Inf"},
	} {
		if got := Format(c.v, c.decimals); got != c.want {
			t.Errorf("%v with %d decimals: have %s, want %s", c.v, c.decimals, got, c.want)
		}
		if got := FormatUp(c.v, c.decimals); got != c.up {
			t.Errorf("%v with %d decimals up: have %s, want %s", c.v, c.decimals, got, c.up)
		}
	}
	if n := len(Format(1, math.MaxInt)); n > 500 {
		t.Errorf("unbounded decimals: %d bytes", n)
	}
	if got := Format(1, math.MinInt); got != "0" {
		t.Errorf("unbounded tens: %s", got)
	}
}

func TestDecimals(t *testing.T) {
	for _, c := range []struct {
		v      float64
		digits int
		want   int
	}{
		{1843.19, 5, 1}, {654321, 5, -1}, {0, 5, 0}, {-0.000123456, 5, 8}, {1, 5, 4}, {9.99994, 5, 4}, {9.99995, 5, 3}, {9.99994999999999, 5, 4}, {9.999949999999999, 5, 3},
		{99999.7, 5, -1}, {100000, 5, -1}, {0.95, 1, 0}, {0.94, 1, 1}, {5, 0, 0}, {1e300, 5, -296}, {math.NaN(), 5, 0}, {math.Inf(-1), 5, 0},
		{0.1 + 0.2, 15, 15}, {999999999999999, 15, 0},
	} {
		if got := Decimals(c.v, c.digits); got != c.want {
			t.Errorf("%v in %d digits: have %d, want %d", c.v, c.digits, got, c.want)
		}
	}
}

func TestValue(t *testing.T) {
	for in, want := range map[string]float64{
		"1843.2": 1843.2, "-0.004": -0.004, "−0.5": -0.5, "12 500": 12500, "12\u2009500.25": 12500.25, "700000": 7e5, "1e-6": 1e-6, "0.00": 0,
	} {
		if got, err := Value(in); err != nil || got != want {
			t.Errorf("%q: have %v (%v), want %v", in, got, err, want)
		}
	}
	for _, in := range []string{"", "NaN", "+Inf", "1 kN", "1,5", "1.2.3", "x", "1e999", "--1"} {
		if got, err := Value(in); err == nil {
			t.Errorf("%q is read as %v", in, got)
		}
	}
}

// exactRound is the second way: v as an exact fraction, to 15 digits and then to the place in whole numbers
// of math/big.
func exactRound(v float64, decimals int, away bool) string {
	x := new(big.Rat).SetFloat64(math.Abs(v))
	if x.Sign() != 0 {
		exp := int(math.Floor(math.Log10(math.Abs(v))))
		for x.Cmp(tenTo(exp)) < 0 {
			exp--
		}
		for x.Cmp(tenTo(exp+1)) >= 0 {
			exp++
		}
		n := nearest(new(big.Rat).Quo(x, tenTo(exp-14)), true)
		x = new(big.Rat).Mul(new(big.Rat).SetInt(n), tenTo(exp-14))
	}
	x.Mul(x, tenTo(decimals))
	n := nearest(x, false)
	if away {
		n = new(big.Int).Neg(new(big.Int).Div(new(big.Int).Neg(x.Num()), x.Denom()))
	}
	shown := new(big.Rat).Quo(new(big.Rat).SetInt(n), tenTo(decimals))
	s := shown.FloatString(max(decimals, 0))
	if v < 0 && n.Sign() != 0 {
		s = "-" + s
	}
	return s
}

func tenTo(n int) *big.Rat {
	p := new(big.Int).Exp(big.NewInt(10), big.NewInt(int64(max(n, -n))), nil)
	if n < 0 {
		return new(big.Rat).SetFrac(big.NewInt(1), p)
	}
	return new(big.Rat).SetInt(p)
}

// nearest rounds a positive fraction to a whole number; halves to the even one or up.
func nearest(x *big.Rat, even bool) *big.Int {
	twice := new(big.Rat).Mul(x, big.NewRat(2, 1))
	twice.Add(twice, big.NewRat(1, 1))
	n := new(big.Int).Div(twice.Num(), new(big.Int).Mul(twice.Denom(), big.NewInt(2)))
	half := new(big.Rat).Sub(new(big.Rat).SetInt(n), x).Cmp(big.NewRat(1, 2)) == 0
	if half && even && n.Bit(0) == 1 {
		n.Sub(n, big.NewInt(1))
	}
	return n
}

func checkRounding(t *testing.T, v float64, decimals int) {
	t.Helper()
	if got, want := Format(v, decimals), exactRound(v, decimals, false); got != want {
		t.Fatalf("%v with %d decimals: have %s, want %s", v, decimals, got, want)
	}
	if got, want := FormatUp(v, decimals), exactRound(v, decimals, true); got != want {
		t.Fatalf("%v with %d decimals up: have %s, want %s", v, decimals, got, want)
	}
	back, err := Value(Format(v, decimals))
	if err != nil {
		t.Fatalf("%v with %d decimals: %v", v, decimals, err)
	}
	if Format(back, decimals) != Format(v, decimals) {
		t.Fatalf("%v with %d decimals: %s carried prints %s", v, decimals, Format(v, decimals), Format(back, decimals))
	}
}

func TestFormatAgainstBig(t *testing.T) {
	random := rand.New(rand.NewSource(1))
	for range 20000 {
		v := (random.Float64() - 0.5) * math.Pow(10, float64(random.Intn(40)-20))
		if random.Intn(2) == 0 { // ties and near-ties of the place
			v = (float64(random.Intn(2000000)) + 0.5) / math.Pow(10, float64(random.Intn(8)))
			v = math.Float64frombits(math.Float64bits(v) + uint64(random.Intn(7)) - 3)
		}
		checkRounding(t, v, random.Intn(30)-12)
	}
}

// A shown number goes to base units and back without a change of its digits.
func TestShownThroughUnits(t *testing.T) {
	random := rand.New(rand.NewSource(2))
	for _, s := range []string{"kN", "kN·m", "kN/m", "kN/m²", "kN/m³", "GPa", "kPa", "‰", "%", "kg/m³", "kg/m", "1/m", "h", "y", "°", "10⁶ mm⁴", "10⁻⁶/K"} {
		u := MustUnit(s)
		for range 2000 {
			v := random.Float64() * math.Pow(10, float64(random.Intn(10)-4))
			decimals := Decimals(v, 5)
			shown := Format(v, decimals)
			carried, err := Value(shown)
			if err != nil {
				t.Fatal(err)
			}
			if again := Format(u.From(u.To(carried)), decimals); again != shown {
				t.Fatalf("%s %s comes back as %s", shown, s, again)
			}
		}
	}
}

func FuzzFormat(f *testing.F) {
	for _, v := range []float64{0, 1.005, -0.5, 99999.5, 1e300, 5e-324, 0.15, 123456789012345.5} {
		f.Add(v, 2)
		f.Add(v, -3)
	}
	f.Fuzz(func(t *testing.T, v float64, decimals int) {
		if math.IsNaN(v) || math.IsInf(v, 0) {
			if _, err := Value(Format(v, decimals)); err == nil {
				t.Fatalf("%v is read back", v)
			}
			return
		}
		decimals %= 340
		checkRounding(t, v, decimals)
		if d := Decimals(v, 5); v != 0 && d < 300 {
			digits := strings.TrimLeft(strings.ReplaceAll(Format(v, d), ".", ""), "-0")
			if len(digits)-max(-d, 0) != 5 {
				t.Fatalf("%v in five digits is %s", v, Format(v, d))
			}
		}
	})
}

func FuzzParse(f *testing.F) {
	for _, s := range []string{"1200 kN", "−0.5 ‰", "5·10⁶ mm⁴", "1e-5 1/K", "0,5 m", "1 200 kN·m", "3 1/(MPa·d)", "7 mm^(1/2)", "1,200.5 kN", "10 10⁻⁶/K", "2 Kn", "NaN"} {
		f.Add(s)
	}
	f.Fuzz(func(t *testing.T, s string) {
		l, err := Parse(s)
		if err != nil {
			if _, ok := err.(*Error); !ok || len(err.Error()) > 500 {
				t.Fatalf("%q: %T of %d bytes", s, err, len(err.Error()))
			}
			return
		}
		q := l.Quantity()
		if math.IsNaN(q.Value) || math.IsInf(q.Value, 0) || !q.Dim.Valid() {
			t.Fatalf("%q is %v", s, q)
		}
		again, err := Parse(l.String())
		if err != nil || again != l {
			t.Fatalf("%q printed %q is read as %q (%v)", s, l, again, err)
		}
	})
}

func BenchmarkFormat(b *testing.B) {
	for b.Loop() {
		Format(1843.1874, 1)
	}
}

func BenchmarkParse(b *testing.B) {
	for b.Loop() {
		Parse("1843.2 kN·m")
	}
}
