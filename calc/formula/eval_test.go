package formula

import (
	"errors"
	"math"
	"testing"
)

// columns is a frame for tests: a value per row of the symbol's indices, row-major. It does not know its
// current rows to others.
type columns struct {
	program *Program
	values  map[string][]float64
	rows    map[string]int
	at      map[string]int
}

func (f *columns) Value(slot int) float64 {
	s := f.program.Symbols[slot]
	v, row := f.values[s.Name], 0
	for _, i := range s.Index {
		row = row*f.rows[i] + f.at[i]
	}
	if row >= len(v) {
		return math.NaN()
	}
	return v[row]
}
func (f *columns) Len(index string) int      { return f.rows[index] }
func (f *columns) Set(index string, row int) { f.at[index] = row }

// places is a frame that tells its rows.
type places struct{ *columns }

func (f places) Row(index string) int { return f.at[index] }

func sample(p *Program) *columns {
	return &columns{p, map[string][]float64{
		"a": {3}, "b": {5}, "c": {5}, "z": {0}, "A_i": {1, 2, 3}, "d_i": {10, 20, 30}, "m_{i,j}": {1, 2, 3, 4, 5, 6}, "y_n": {9}, "nan": {math.NaN()},
		"inf": {math.Inf(1)}, "f_ck": {40}, "big": {1e200}, "x_{k,n}": {}, "one": {1}, "third": {1. / 3},
	}, map[string]int{"i": 3, "j": 2, "n": 0}, map[string]int{}}
}

func program(t *testing.T, src string) *Program {
	t.Helper()
	n, err := ParseExpr(src)
	if err != nil {
		t.Fatal(err)
	}
	return Compile(n)
}

func TestEval(t *testing.T) {
	for src, want := range map[string]float64{
		"a + b·c": 28, "a − b − c": -7, "a/b/c": 0.12, "a/(b·c)": 0.12, "−a^2": -9, "(−a)^2": 9, "(−a)^3": -27, "a^−2": 1. / 9, "2^a": 8,
		"a^0.5": math.Sqrt(3), "a^(1/3)": math.Cbrt(3), "(−a)^(−1)": -1. / 3, "z^0": 1, "(−a)^b": -243,
		"sqrt(a·3)": 3, "exp(ln(a))": 3, "abs(a − b)": 2, "sin(a)^2 + cos(a)^2": 1, "tan(a)·cot(a)": 1, "arccos(−1)": math.Pi, "arcsin(1/2)": math.Pi / 6, "cos(arccos(a/10))": 0.3, "Σ_m(q_{k,m})": 0, "min(a; b; −c)": -5, "max(a; b; z)": 5,
		"2·[kN]": 2000, "[MPa]": 1, "0.30·(f_ck/[MPa])^(2/3)·[MPa]": 0.3 * math.Pow(40, 2./3), "2·π": 2 * math.Pi,
		"Σ_i(A_i)": 6, "Σ_i(A_i·d_i)": 140, "min_i(d_i − A_i)": 9, "max_i(d_i/A_i)": 10, "Σ_i(Σ_j(m_{i,j}))": 21, "Σ_j(max_i(m_{i,j}))": 11, "Σ_i(a)": 9,
		"Σ_n(x_{k,n})": 0, "Σ_i(A_i)/Σ_i(d_i)": 0.1,
		"cases(a < b: 1; otherwise: 2)": 1, "cases(a > b: 1/z; b = c: 7; otherwise: 1/z)": 7, "cases(a < z: 1; otherwise: 2)": 2,
		"cases(a < b < c: 1; a < b ≤ c: 2; otherwise: 3)": 2, "cases(a > b or b ≥ c and a ≥ 3: 1; otherwise: 2)": 1, "cases(a > b and 1/z > 1: 1; otherwise: 2)": 2,
		"cases(0.6·35 ≥ 21: 1; otherwise: 2)": 1, "cases(0.6·35 < 21: 1; otherwise: 2)": 2, "cases(0.1 + 0.2 = 0.3: 1; otherwise: 2)": 1,
		"21 − 0.6·35": 0, "0.6·35 − 21": 0, "0.1 + 0.2 − 0.3": 0, "0 − a": -3, "third·3 − one": 0,
	} {
		p := program(t, src)
		got, err := p.Eval(sample(p))
		if err != nil {
			t.Errorf("%s: %v", src, err)
		} else if math.Abs(got-want) > 4e-16*math.Abs(want) {
			t.Errorf("%s: have %v, want %v", src, got, want)
		}
	}
}

// What differs in the fourteenth digit is no noise.
func TestSmallDifferenceStays(t *testing.T) {
	for _, src := range []string{"1 − 0.99999999999999", "99999.999999999 − 99999.999999998", "1.0000000000001 − 1"} {
		p := program(t, src)
		if v, err := p.Eval(sample(p)); err != nil || v <= 0 {
			t.Errorf("%s gives %v (%v)", src, v, err)
		}
	}
}

func TestEvalErrors(t *testing.T) {
	for src, want := range map[string]string{
		"2·a/(b − c)":                     "column 4: division by zero in 2·a/(b − c) (b = 5, c = 5 in base units)",
		"a/0":                             "column 2: division by zero in a/0",
		"z^(−a)":                          "column 2: division by zero in z^(−a) (z = 0, a = 3 in base units)",
		"(a − b)^0.5":                     "column 8: power of a negative number in (a − b)^0.5 (a = 3, b = 5 in base units)",
		"1 + sqrt(a − b)":                 "column 5: root of a negative number in sqrt(a − b) (a = 3, b = 5 in base units)",
		"ln(z)":                           "column 1: logarithm of a number not above zero in ln(z) (z = 0 in base units)",
		"ln(−a)":                          "column 1: logarithm of a number not above zero in ln(−a) (a = 3 in base units)",
		"arccos(a)":                       "column 1: argument outside −1 to 1 in arccos(a) (a = 3 in base units)",
		"cot(z)":                          "column 1: division by zero in cot(z) (z = 0 in base units)",
		"exp(1000·a)":                     "column 1: result out of range in exp(1000·a) (a = 3 in base units)",
		"big·big":                         "column 4: result out of range in big·big (big = 1e+200 in base units)",
		"big^2":                           "column 4: result out of range in big^2 (big = 1e+200 in base units)",
		"big^a":                           "column 4: result out of range in big^a (big = 1e+200, a = 3 in base units)",
		"1/exp(1000)":                     "column 3: result out of range in exp(1000)",
		"nan·z":                           "column 1: nan has no value",
		"z/inf":                           "column 3: inf has no value",
		"max(nan; a)":                     "column 5: nan has no value",
		"min_n(x_{k,n})":                  "column 1: min_n has no rows in min_n(x_{k,n})",
		"max_n(x_{k,n}) + a":              "column 1: max_n has no rows in max_n(x_{k,n})",
		"Σ_i(a/(A_i − 2))":                "column 6: division by zero in a/(A_i − 2), row 2 of i (A_i = 2 in base units)",
		"Σ_i(Σ_j(1/(m_{i,j} − 4)))":       "column 10: division by zero in 1/(m_{i,j} − 4), row 2 of j, row 2 of i (m_{i,j} = 4 in base units)",
		"1/(Σ_i(A_i) − 2·a)":              "column 2: division by zero in 1/(Σ_i(A_i) − 2·a) (a = 3 in base units)",
		"A_i/Σ_i(A_i)":                    "column 5: Σ_i takes the index i that stands free in the formula as well",
		"cases(1/z > 1: 1; otherwise: 2)": "column 8: division by zero in 1/z (z = 0 in base units)",
		"cases(a < b and ln(z) > 1: 1; otherwise: 2)": "column 17: logarithm of a number not above zero in ln(z) (z = 0 in base units)",
	} {
		p := program(t, src)
		v, err := p.Eval(sample(p))
		if err == nil {
			t.Errorf("%s gives %v", src, v)
		} else if err.Error() != want {
			t.Errorf("%s\nhave %v\nwant %s", src, err, want)
		}
	}
	var e *Error
	p := program(t, "a/(b − c)")
	if _, err := p.Eval(sample(p)); !errors.As(err, &e) || len(e.Values) != 2 || e.Values[1].Symbol.Name != "c" || e.Values[1].Value != 5 {
		t.Errorf("values of the symbols involved: %+v", e)
	}
	for _, p := range []*Program{Compile(nil), CompileCond(nil), Compile(&Binary{Op: '?', L: &Number{}, R: &Number{}}), Compile(&Call{Fn: "sgn", Args: []Node{&Number{}}}), Compile(&Call{Fn: "max"}),
		Compile(&Rows{Op: "Π", Index: "i", X: &Number{Value: 2}}), CompileCond(&Compare{})} {
		_, err := p.Eval(sample(p))
		_, too := p.Holds(sample(p))
		if err == nil || too == nil {
			t.Error("what is no formula is evaluated")
		}
	}
}

// The row of a free index comes back behind a sum over the same index.
func TestFreeAndBoundIndex(t *testing.T) {
	p := program(t, "A_i/Σ_i(A_i) + A_i")
	f := places{sample(p)}
	for row, want := range []float64{1./6 + 1, 2./6 + 2, 3./6 + 3} {
		f.Set("i", row)
		got, err := p.Eval(f)
		if err != nil || math.Abs(got-want) > 1e-15 || f.Row("i") != row {
			t.Errorf("row %d: have %v (%v), want %v; then at row %d", row, got, err, want, f.Row("i"))
		}
	}
}

func TestHolds(t *testing.T) {
	for src, want := range map[string]bool{
		"a < b": true, "a ≥ b": false, "b ≤ c": true, "b < c": false, "b = c": true, "a = b": false, "b > c or a < c": true, "a < b and b < c": false,
		"0.6·35 ≥ 21 and 0.6·35 ≤ 21": true, "z ≤ a < b = c ≥ a": true, "z = 0": true, "a > b and 1/z = 1": false, "a < b or 1/z = 1": true, "a > b > 1/z": false,
	} {
		c, err := ParseCond(src)
		if err != nil {
			t.Fatal(err)
		}
		p := CompileCond(c)
		if got, err := p.Holds(sample(p)); err != nil || got != want {
			t.Errorf("%s: have %v (%v), want %v", src, got, err, want)
		}
	}
	c, _ := ParseCond("a < b and 1/z = 1")
	p := CompileCond(c)
	if got, err := p.Holds(sample(p)); err == nil || got {
		t.Errorf("division by zero in a condition: %v, %v", got, err)
	}
	if _, err := p.Eval(sample(p)); err == nil {
		t.Error("a condition has a value")
	}
}

func TestSlots(t *testing.T) {
	p := program(t, "b·a + Σ_i(A_i·b/x_j) + π + cases(c > a: d; otherwise: A_i)")
	var got []string
	for _, s := range p.Symbols {
		got = append(got, s.Name)
	}
	want := []string{"b", "a", "A_i", "x_j", "c", "d"}
	if len(got) != len(want) {
		t.Fatalf("slots %v, want %v", got, want)
	}
	for i := range want {
		if got[i] != want[i] {
			t.Fatalf("slots %v, want %v", got, want)
		}
	}
	n, _ := ParseCond("Σ_i(A_i·b/x_j) + y_n + max_j(d_j) > 0")
	if free := FreeCondIndices(n); len(free) != 1 || free[0] != "j" {
		t.Errorf("free indices %v, want j", free)
	}
	c, _ := ParseCond("d_i < x_{k,n} and Σ_i(d_i) > 0")
	if free := FreeCondIndices(c); len(free) != 2 || free[0] != "i" || free[1] != "n" {
		t.Errorf("free indices %v, want i and n", free)
	}
}
