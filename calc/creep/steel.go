package creep

import (
	"fmt"
	"math"
)

// Steel is the relaxation of a prestressing steel: its class 1 to 3 and ρ_1000, a part of one (0.025 for 2.5 %).
type Steel struct {
	Class   int
	Rho1000 float64
}

// LongTerm is the time in hours at which relaxation is taken as final.
const LongTerm = 500_000.0

// Check names what is outside the range of the law.
func (s Steel) Check() error {
	if s.Class < 1 || s.Class > 3 {
		return fmt.Errorf("relaxation class %d is none of 1, 2, 3", s.Class)
	}
	if !(s.Rho1000 >= 0 && s.Rho1000 < 1) {
		return fmt.Errorf("relaxation at 1000 h is %g of the stress, outside 0 to 1", s.Rho1000)
	}
	return nil
}

// base is the relaxation at 1000 h by 3.28, 3.29, 3.30, for an initial stress mu·f_pk.
func (s Steel) base(mu float64) float64 {
	factor, exponent := 5.39, 6.7
	switch s.Class {
	case 2:
		factor, exponent = 0.66, 9.1
	case 3:
		factor, exponent = 1.98, 8
	}
	return factor * s.Rho1000 * math.Exp(exponent*mu) * 1e-3 // 10⁻⁵ with ρ_1000 in %
}

// Relaxation is the part of the initial stress mu·f_pk lost after so many hours at constant length, 0 ≤ mu < 1.
func (s Steel) Relaxation(mu, hours float64) float64 {
	if hours <= 0 {
		return 0
	}
	return s.base(mu) * math.Pow(hours/1000, 0.75*(1-mu))
}

// Hours is the time after which Relaxation has come to the part lost, the inverse of it: with it a loss goes on from where it
// stands under a stress that has changed. 0 for no loss; infinite where the steel never relaxes.
func (s Steel) Hours(mu, lost float64) float64 {
	if lost <= 0 {
		return 0
	}
	return 1000 * math.Pow(lost/s.base(mu), 1/(0.75*(1-mu)))
}
