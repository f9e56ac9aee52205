package tendon

import "math"

// Friction is what holds a tendon back in its duct (EN 1992-1-1, 5.10.5.2): Mu the coefficient of friction, per radian, K the
// unintended angle for each length, rad/mm. Both are 0 or more. Over a length Δx with the changes of direction Δθ the stress
// falls, seen from the jack, in the ratio exp(−Mu·(Δθ + K·Δx)).
type Friction struct{ Mu, K float64 }

// Diagram is the stress of a tendon along a profile, tension positive, MPa: exact, in pieces over each of which it grows or
// falls as an exponential, with a jump where the profile has a kink. A Diagram is a value: Pull and Slip give the next one.
//
// Slopes stand for angles and lengths along the member for lengths along the tendon, as with Profile.Angle: the friction is
// never too small by the first; a tendon is longer than its part of the member by at most half the square of the steepest
// slope, 0.5 % at 1 in 10.
type Diagram struct {
	modulus float64
	pieces  []piece
}

// piece is a part of the diagram: stress·exp(rate·u) at u from its start. Where the diagram is followed from end B, from is
// beyond to.
type piece struct {
	from, to float64
	stress   float64 // at the start
	rate     float64 // 1/mm
	grip     float64 // 1/mm, the most that the friction allows the rate to be, either way
	kink     float64 // the exponent that it allows for the kink at the start
}

// Unstressed is the diagram of the tendon before it is stressed; modulus is that of the tendon, MPa. An error is a *Refusal:
// BadFriction, BadModulus.
func (p Profile) Unstressed(f Friction, modulus float64) (Diagram, error) {
	for _, v := range [2]float64{f.Mu, f.K} {
		if !(v >= 0) || !finite(v) {
			return Diagram{}, &Refusal{Reason: BadFriction, Have: v}
		}
	}
	if !(modulus > 0) || !finite(modulus) {
		return Diagram{}, &Refusal{Reason: BadModulus, Have: modulus}
	}
	d := Diagram{modulus: modulus}
	for i, s := range p.Segments {
		to := s.End()
		if i+1 < len(p.Segments) {
			to = p.Segments[i+1].Start // the same but for rounding
		}
		d.pieces = append(d.pieces, piece{from: s.Start, to: to, grip: f.Mu * (s.Turn(1) + f.K), kink: f.Mu * p.Kink(i)})
	}
	return d, nil
}

// From and To are the ends of the diagram, mm.
func (d Diagram) From() float64 { return d.pieces[0].from }

// To is where the diagram ends.
func (d Diagram) To() float64 { return d.pieces[len(d.pieces)-1].to }

// Sides are the stresses just left and just right of x, MPa; they differ at a kink. Beyond an end they are 0.
func (d Diagram) Sides(x float64) (left, right float64) {
	for _, p := range d.pieces {
		if x > p.from && x <= p.to {
			left = p.at(x - p.from)
		}
		if x >= p.from && x < p.to {
			right = p.at(x - p.from)
		}
	}
	return left, right
}

// Stress is the stress at x, MPa: at a kink the lesser of the two sides, at an anchorage that of the tendon beside it, beyond
// an end 0.
func (d Diagram) Stress(x float64) float64 {
	left, right := d.Sides(x)
	switch x {
	case d.From():
		return right
	case d.To():
		return left
	}
	return math.Min(left, right)
}

// Places are the ends and, in order, all places between where the diagram has a corner or a jump, mm: between two of them it
// is one exponential.
func (d Diagram) Places() []float64 {
	out := []float64{d.From()}
	for _, p := range d.pieces {
		out = append(out, p.to)
	}
	return out
}

// Extension is ∫σ/E·dx from a to b, mm: how much longer the part between them is than unstressed. Parts beyond the ends do
// not count; a > b changes the sign.
func (d Diagram) Extension(a, b float64) float64 {
	if a > b {
		return -d.Extension(b, a)
	}
	sum := 0.0
	for _, p := range d.pieces {
		u, v := math.Max(a-p.from, 0), math.Min(b-p.from, p.length())
		if u < v {
			sum += part(p.at(u), p.rate, v-u)
		}
	}
	return sum / d.modulus
}

// Mean is the mean stress over the whole length, MPa.
func (d Diagram) Mean() float64 {
	return d.Extension(d.From(), d.To()) * d.modulus / (d.To() - d.From())
}

func (p piece) length() float64      { return math.Abs(p.to - p.from) }
func (p piece) at(u float64) float64 { return p.stress * math.Exp(p.rate*u) }

// part is the integral of stress·exp(rate·u) for u from 0 to length.
func part(stress, rate, length float64) float64 {
	if z := rate * length; z != 0 {
		return stress * length * (math.Expm1(z) / z)
	}
	return stress * length
}
