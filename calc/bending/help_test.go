package bending

import (
	"errors"
	"flag"
	"fmt"
	"math"
	"os"
	"testing"

	"pgregory.net/rapid"

	"soffit/calc/section"
)

// TestMain asks for more random sections than rapid's own default, unless the command line says how many.
func TestMain(m *testing.M) {
	flag.Parse()
	given := false
	flag.Visit(func(f *flag.Flag) { given = given || f.Name == "rapid.checks" })
	if !given {
		if err := flag.Set("rapid.checks", "2500"); err != nil {
			panic(err)
		}
	}
	os.Exit(m.Run())
}

// often checks four times as many random sections as rapid.Check: 10,000 by TestMain's number.
func often(t *testing.T, check func(*rapid.T)) {
	for i := range 4 {
		t.Run(fmt.Sprintf("part %d", i+1), func(t *testing.T) { rapid.Check(t, check) })
	}
}

var inf = math.Inf(1)

// tester is what testing.T and rapid.T share.
type tester interface {
	Helper()
	Errorf(string, ...any)
	Fatalf(string, ...any)
}

// within checks a value to a relative tolerance.
func within(t tester, name string, got, want, tol float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tol*math.Abs(want)) {
		t.Errorf("%s: %.12g, want %.12g within %g (off by %.3g)", name, got, want, tol, got/want-1)
	}
}

// near checks a value to an absolute tolerance.
func near(t tester, name string, got, want, tol float64) {
	t.Helper()
	if !(math.Abs(got-want) <= tol) {
		t.Errorf("%s: %.10g, want %.10g ± %g", name, got, want, tol)
	}
}

func ok[V any](t tester) func(V, error) V {
	return func(v V, err error) V {
		t.Helper()
		if err != nil {
			t.Fatalf("%v", err)
		}
		return v
	}
}

func rectangle(t tester, width, depth float64) *Section {
	return NewSection(ok[section.Shape](t)(section.Rectangle(width, depth)))
}

func horizontal(t tester, e, fd float64) SteelLaw { return ok[SteelLaw](t)(Horizontal(e, fd)) }

// refused checks the reason of an error and gives the refusal.
func refused(t tester, name string, err error, want Reason) *Refusal {
	t.Helper()
	var r *Refusal
	if !errors.Is(err, want) || !errors.As(err, &r) {
		t.Fatalf("%s: error %v, want %v", name, err, want)
	}
	return r
}

// Concrete of EN 1992-1-1, Table 3.1, up to C50/60 with f_cd = 20 MPa unless a test says otherwise.
var (
	block20    = BlockLaw{Lambda: 0.8, EtaFcd: 20, EpsCu: 3.5e-3}
	parabola20 = Parabola{N: 2, EpsC2: 2e-3, EpsCu2: 3.5e-3, Fcd: 20}
)

// Design strengths of B500 and of a strand with f_p0.1k = 1640 MPa, f_pk = 1860 MPa, γ_S = 1.15.
const (
	fyd = 500 / 1.15
	fpd = 1640 / 1.15
	fud = 1860 / 1.15
)
