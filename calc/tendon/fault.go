package tendon

import "fmt"

// Reason says why points make no profile. A Reason is an error; errors.Is finds it in a Fault.
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
