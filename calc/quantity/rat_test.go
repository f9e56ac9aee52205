package quantity

import (
	"math"
	"math/big"
	"testing"
)

func TestRatLowestTerms(t *testing.T) {
	if (Rat{}) != NewRat(0, 7) || NewRat(0, -3).String() != "0" {
		t.Error("zero value is not 0")
	}
	for _, c := range []struct {
		n, d int
		want string
	}{
		{2, 3, "2/3"}, {4, -6, "-2/3"}, {-10, -5, "2"}, {1, 1, "1"}, {7, 0, "out of range"},
		{math.MaxInt, 1, "out of range"}, {math.MinInt, math.MinInt, "1"}, {math.MinInt, 1 << 62, "-2"},
		{1<<30 - 1, 1, "1073741823"}, {1 << 30, 1, "out of range"}, {1, 1 << 30, "out of range"},
	} {
		if got := NewRat(c.n, c.d).String(); got != c.want {
			t.Errorf("%d/%d: have %s, want %s", c.n, c.d, got, c.want)
		}
	}
}

// The arithmetic of math/big is the second way to the same result.
func TestRatAgainstBig(t *testing.T) {
	list := []Rat{}
	for _, n := range []int{0, 1, -1, 2, 3, -7, 999, 1<<30 - 1, -(1<<30 - 1), 123456789} {
		for _, d := range []int{1, 2, 3, 7, 1000, 1<<30 - 1, 99999989} {
			list = append(list, NewRat(n, d))
		}
	}
	same := func(op string, a, b, got Rat, want *big.Rat) {
		limit := big.NewInt(ratLimit)
		fits := want.Num().CmpAbs(limit) <= 0 && want.Denom().CmpAbs(limit) <= 0
		if got.Valid() != fits {
			t.Fatalf("%v %s %v: valid is %v", a, op, b, got.Valid())
		}
		if fits && got.String() != want.RatString() {
			t.Fatalf("%v %s %v: have %v, want %s", a, op, b, got, want.RatString())
		}
	}
	for _, a := range list {
		for _, b := range list {
			x, y := big.NewRat(int64(a.Num()), int64(a.Den())), big.NewRat(int64(b.Num()), int64(b.Den()))
			same("+", a, b, a.Add(b), new(big.Rat).Add(x, y))
			same("·", a, b, a.Mul(b), new(big.Rat).Mul(x, y))
			same("−", a, b, a.Add(b.Neg()), new(big.Rat).Sub(x, y))
		}
	}
}

func TestRatOutOfRangeStays(t *testing.T) {
	bad := NewRat(1, 0)
	for _, r := range []Rat{bad.Add(one), one.Add(bad), bad.Mul(Rat{}), Rat{}.Mul(bad), bad.Neg(), bad.Mul(bad)} {
		if r.Valid() || r == (Rat{}) || r == one {
			t.Errorf("%#v has become a number", r)
		}
	}
	if !math.IsNaN(Rat{0, -1}.Float()) {
		t.Error("an exponent out of range has a value")
	}
	d := Length
	for range 5 {
		d = d.Pow(NewRat(99999, 7))
	}
	if d.Valid() || d.String() != "dimension out of range" || d == None {
		t.Errorf("power beyond the range: %v", d)
	}
}
