// Package solve finds roots and integrals of plain numeric functions. It knows no engineering and
// carries no units: a root has the unit of the bracket, an integral that of f times that of x.
package solve

import (
	"fmt"
	"math"
)

// maxEvals bounds the work of Bracket. Halving alone runs out of doubles after about 1,100 steps at
// the very worst (a bracket from the smallest double upwards); in ordinary use a root takes 8 to 20.
const maxEvals = 2500

// NoSignChange says that f has the same sign at both ends of a bracket.
type NoSignChange struct {
	Lo, Hi   float64 // the ends
	FLo, FHi float64 // the values there
}

func (e *NoSignChange) Error() string {
	return fmt.Sprintf("no sign change: f(%g) = %g and f(%g) = %g", e.Lo, e.FLo, e.Hi, e.FHi)
}

// NotFinite says that f gave no number at X.
type NotFinite struct{ X, F float64 }

func (e *NotFinite) Error() string { return fmt.Sprintf("f(%g) = %g is not a finite number", e.X, e.F) }

// Unsettled says that the work ran out before the bracket closed.
type Unsettled struct{ Lo, Hi float64 }

func (e *Unsettled) Error() string {
	return fmt.Sprintf("root between %g and %g not settled after %d evaluations", e.Lo, e.Hi, maxEvals)
}

// Bracket finds a root of f between lo and hi by Brent's method: inverse quadratic interpolation or
// secant where they make progress, halving where they do not. The root returned is the end of the
// last bracket with the smaller |f|; f changes sign within tol of it, or f is zero there. tol is
// absolute; below the spacing of doubles, zero included, the spacing is used. evals counts the calls
// of f.
//
// Domain: lo < hi, both finite, tol ≥ 0; Bracket panics otherwise. f must be finite on the bracket.
// Errors: *NoSignChange, *NotFinite, *Unsettled. Where f jumps across zero the place of the jump is
// returned: a caller who needs f = 0 looks at f there. Nothing is allocated unless it fails.
func Bracket(f func(float64) float64, lo, hi, tol float64) (root float64, evals int, err error) {
	if !(lo < hi) || math.IsInf(lo, 0) || math.IsInf(hi, 0) || !(tol >= 0) {
		panic(fmt.Sprintf("solve.Bracket: lo = %g, hi = %g, tol = %g", lo, hi, tol))
	}
	a, b := lo, hi
	fa, fb := f(a), f(b)
	evals = 2
	switch {
	case !finite(fa):
		return 0, evals, &NotFinite{a, fa}
	case !finite(fb):
		return 0, evals, &NotFinite{b, fb}
	case fa == 0:
		return a, evals, nil
	case fb == 0:
		return b, evals, nil
	case (fa > 0) == (fb > 0):
		return 0, evals, &NoSignChange{lo, hi, fa, fb}
	}
	// b is the best estimate, c the end opposite in sign, a the estimate before.
	c, fc := a, fa
	step := b - a
	last := step // the step before
	for ; evals < maxEvals; evals++ {
		if math.Abs(fc) < math.Abs(fb) {
			a, b, c = b, c, b
			fa, fb, fc = fb, fc, fb
		}
		half := (c - b) / 2
		reach := 2*epsilon*math.Abs(b) + tol/2
		if math.Abs(half) <= reach || fb == 0 {
			return b, evals, nil
		}
		step, last = stride(a, b, c, fa, fb, fc, half, reach, step, last)
		a, fa = b, fb
		if math.Abs(step) > reach {
			b += step
		} else {
			b += math.Copysign(reach, half)
		}
		fb = f(b)
		if !finite(fb) {
			return 0, evals + 1, &NotFinite{b, fb}
		}
		if (fb > 0) == (fc > 0) {
			c, fc = a, fa
			step = b - a
			last = step
		}
	}
	return 0, evals, &Unsettled{math.Min(b, c), math.Max(b, c)}
}

// stride gives the next step of Brent's method from b and the one to be remembered: interpolation if
// it stays within three quarters of the bracket and shrinks faster than halving, else half the bracket.
func stride(a, b, c, fa, fb, fc, half, reach, step, last float64) (next, before float64) {
	if math.Abs(last) < reach || math.Abs(fa) <= math.Abs(fb) {
		return half, half
	}
	var p, q float64
	s := fb / fa
	if a == c { // two points: secant
		p, q = 2*half*s, 1-s
	} else { // three points: inverse quadratic
		u, v := fa/fc, fb/fc
		p = s * (2*half*u*(u-v) - (b-a)*(v-1))
		q = (u - 1) * (v - 1) * (s - 1)
	}
	if p > 0 {
		q = -q
	} else {
		p = -p
	}
	if 2*p < math.Min(3*half*q-math.Abs(reach*q), math.Abs(last*q)) {
		return p / q, step
	}
	return half, half
}

// epsilon is half the spacing of doubles at 1.
const epsilon = 0x1p-53

func finite(v float64) bool { return v-v == 0 }
