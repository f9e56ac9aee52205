package tendon

import "fmt"

// Reason says why points make no profile, or why a tendon cannot be stressed so. A Reason is an error; errors.Is finds it in
// a Fault or a Refusal.
type Reason int

const (
	// FewPoints: there are fewer than two points. Point is their number.
	FewPoints Reason = iota + 1
	// NotFinite: a place or height is no number, or infinite.
	NotFinite
	// NotAhead: a point does not lie beyond the one before it. Have and Limit are the two places.
	NotAhead
	// NoDirection: the first line is to go on in a direction, and none is reached yet.
	NoDirection
	// UnknownLine: the kind of line is none of those there are.
	UnknownLine
	// BadFriction: a coefficient of friction or an unintended angle is negative or no number. Have is the value.
	BadFriction
	// BadModulus: the modulus of elasticity is not above 0. Have is the value, MPa.
	BadModulus
	// BadPull: the stress at the jack is not above 0, or no number. Have is the value, MPa.
	BadPull
	// IdlePull: the jack does not lift the tendon off: it pulls with no more than is there. Have is its stress, Limit the stress
	// there, MPa.
	IdlePull
	// BadSlip: the draw-in is negative or no number. Have is the value, mm.
	BadSlip
	// SlackSlip: the draw-in takes all the stress out of the tendon. Have is the draw-in, Limit the extension of the tendon, mm.
	SlackSlip
)

func (r Reason) Error() string {
	switch r {
	case FewPoints:
		return "fewer than 2 points"
	case NotFinite:
		return "not a finite number"
	case NotAhead:
		return "not beyond the point before"
	case NoDirection:
		return "no direction to go on in at the first point"
	case UnknownLine:
		return "unknown kind of line"
	case BadFriction:
		return "not a coefficient of friction or an unintended angle"
	case BadModulus:
		return "not a modulus of elasticity"
	case BadPull:
		return "not a stress at the jack"
	case IdlePull:
		return "the jack does not lift the tendon off its anchorage"
	case BadSlip:
		return "not a draw-in"
	case SlackSlip:
		return "the draw-in takes all the stress out of the tendon"
	}
	return fmt.Sprintf("reason %d", int(r))
}

// Fault is why points make no profile, and at which of them, counted from 0.
type Fault struct {
	Reason      Reason
	Point       int
	Have, Limit float64 // see the reasons
}

func (f *Fault) Error() string {
	switch f.Reason {
	case FewPoints:
		return fmt.Sprintf("have %d points of a profile, want at least 2", f.Point)
	case NotAhead:
		return fmt.Sprintf("point %d of the profile at %g mm is not beyond the one before it at %g mm", f.Point+1, f.Have, f.Limit)
	}
	return fmt.Sprintf("point %d of the profile: %v", f.Point+1, f.Reason)
}

// Unwrap gives the reason to errors.Is.
func (f *Fault) Unwrap() error { return f.Reason }

// Refusal is why a tendon cannot be stressed so: a reason with its numbers, whose meaning stands beside the reason.
type Refusal struct {
	Reason      Reason
	Have, Limit float64
}

func (r *Refusal) Error() string {
	return fmt.Sprintf("tendon: %v (%g, limit %g)", r.Reason, r.Have, r.Limit)
}

// Unwrap gives the reason to errors.Is.
func (r *Refusal) Unwrap() error { return r.Reason }
