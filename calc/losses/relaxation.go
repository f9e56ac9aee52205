package losses

import "math"

// Relaxation is the intrinsic relaxation of a tendon: its loss at constant strain.
//
// Where the strain is not constant, the method of equivalent time is used (EN 1992-1-1, Annex D). In each step the stress that
// the tendon would have without any relaxation, as a mean over the step, is the initial stress of a test; the equivalent time is
// that after which such a test has lost what the tendon has lost by relaxation so far, and the step goes on from there. So a
// tendon that gets shorter relaxes less, and one of constant length as in the test. What is lost never comes back.
type Relaxation interface {
	// Loss is the stress lost after days ≥ 0 at constant strain from an initial stress, MPa, 0 or more and rising with days.
	Loss(initial, days float64) float64
	// Days is the time after which a test from that initial stress has lost loss, days: the inverse of Loss.
	Days(initial, loss float64) float64
}

// PowerLaw is the relaxation of EN 1992-1-1, 3.3.2(7): the loss is
//
//	initial · Factor·Rho·exp(Growth·μ)·(hours/1000)^(0.75·(1 − μ))·10⁻⁵,  μ = initial/Strength,
//
// with Rho in per cent and Factor and Growth of the class: (3.28) to (3.30). Tests from μ ≥ 1 have none: a NaN.
type PowerLaw struct {
	Strength       float64 // f_pk, MPa
	Rho            float64 // ρ_1000, per cent
	Factor, Growth float64
	Final          float64 // days after which a test loses no more, 500 000 h by 3.3.2(8); 0 for no such time
}

// Loss is the loss of a test, MPa; none where the initial stress is not tension.
func (r PowerLaw) Loss(initial, days float64) float64 {
	if r.Final > 0 {
		days = math.Min(days, r.Final)
	}
	scale, power := r.law(initial)
	if scale == 0 {
		return 0
	}
	return scale * math.Pow(days*24/1000, power)
}

// Days is the inverse of Loss, without regard to Final.
func (r PowerLaw) Days(initial, loss float64) float64 {
	scale, power := r.law(initial)
	if scale == 0 || loss <= 0 {
		return 0
	}
	return math.Pow(loss/scale, 1/power) * 1000 / 24
}

// law is the loss in 1000 h, MPa, and the power of time.
func (r PowerLaw) law(initial float64) (scale, power float64) {
	mu := initial / r.Strength
	switch {
	case !(initial > 0):
		return 0, 1
	case !(mu < 1):
		return math.NaN(), math.NaN()
	}
	return initial * r.Factor * r.Rho * math.Exp(r.Growth*mu) * 1e-5, 0.75 * (1 - mu)
}
