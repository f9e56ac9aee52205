package formula

import (
	"math"
	"testing"

	"soffit/calc/quantity"
)

// still is a frame of constants, for benchmarks and fuzzing.
type still []float64

func (f still) Value(slot int) float64 { return f[slot%len(f)] }
func (f still) Len(string) int         { return 4 }
func (f still) Set(string, int)        {}
func (f still) Row(string) int         { return 0 }

func FuzzPrintParse(f *testing.F) {
	for _, w := range written {
		f.Add(w[0])
	}
	f.Fuzz(func(t *testing.T, src string) {
		a, err := Parse(src)
		if err != nil {
			if _, ok := err.(*Error); !ok {
				t.Fatalf("%q: error is a %T", src, err)
			}
			return
		}
		b, err := Parse(a.String())
		if err != nil {
			t.Fatalf("%q printed %q: %v", src, a, err)
		}
		if !Equal(a.Expr, b.Expr) || !Equal(a.Symbol, b.Symbol) || a.String() != b.String() {
			t.Fatalf("%q printed %q is read as %q", src, a, b)
		}
	})
}

func FuzzParse(f *testing.F) {
	for _, w := range written {
		_, expr, _ := cut(w[0])
		f.Add(expr, 3.0, 0.0)
	}
	for _, s := range []string{"a < b and (c ≥ d or e = 0)", "0 < Σ_i(x_i) ≤ 1/a", "(a) < (b)"} {
		f.Add(s, -1.0, 1e200)
	}
	f.Fuzz(func(t *testing.T, src string, x, y float64) {
		frame := still{x, y, 1, 28}
		dim := func(s *Symbol) (quantity.Dim, error) {
			return []quantity.Dim{quantity.None, quantity.Length, quantity.Stress}[len(s.Name)%3], nil
		}
		if n, err := ParseExpr(src); err == nil {
			if d, err := Check(n, dim); err == nil && !d.Valid() {
				t.Fatalf("%q has %v", src, d)
			}
			v, err := Compile(n).Eval(frame)
			if math.IsNaN(v) || math.IsInf(v, 0) {
				t.Fatalf("%q gives %v (%v)", src, v, err)
			}
		}
		c, err := ParseCond(src)
		if err != nil {
			return
		}
		again, err := ParseCond(PrintCond(c))
		if err != nil || !EqualCond(c, again) {
			t.Fatalf("%q printed %q: %v", src, PrintCond(c), err)
		}
		CheckCond(c, dim)
		CompileCond(c).Holds(frame)
	})
}

func cut(formula string) (left, right string, ok bool) {
	for i, r := range formula {
		if r == '=' {
			return formula[:i], formula[i+1:], true
		}
	}
	return formula, "", false
}
