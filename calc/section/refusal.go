package section

import "fmt"

// Reason says why lines make no outline. A Reason is an error; errors.Is finds it in a Refusal.
type Reason int

const (
	// Empty: there is neither an outer ring nor round concrete.
	Empty Reason = iota + 1
	// NotFinite: a coordinate or measure is no number, or infinite. Corner tells which one of a ring.
	NotFinite
	// FewCorners: a ring has fewer than three corners apart from each other. Have is their number.
	FewCorners
	// NoArea: the corners of a ring lie on one line, or a round has no width or depth. Have is that measure.
	NoArea
	// SelfCrossing: two edges of one ring cross.
	SelfCrossing
	// SelfTouching: two edges of one ring touch, or an edge runs back along the one before it.
	SelfTouching
	// Crossing: the lines of two parts cross.
	Crossing
	// Touching: the lines of two parts touch, so that one part would hang on the other by a point, or two
	// should be one.
	Touching
	// HoleOutside: a hole or void lies outside the concrete, wholly or in part.
	HoleOutside
	// Nested: a part lies inside another of its kind: concrete in concrete or in a hole, a hole in a hole.
	Nested
	// Parted: between two levels there is no concrete. Have and Limit are the levels above the soffit.
	Parted
)

func (r Reason) Error() string {
	switch r {
	case Empty:
		return "no outer ring"
	case NotFinite:
		return "not a finite number"
	case FewCorners:
		return "fewer than 3 corners"
	case NoArea:
		return "no area"
	case SelfCrossing:
		return "crosses itself"
	case SelfTouching:
		return "touches itself"
	case Crossing:
		return "crosses"
	case Touching:
		return "touches"
	case HoleOutside:
		return "is not within the concrete"
	case Nested:
		return "lies inside"
	case Parted:
		return "no concrete between two levels"
	}
	return fmt.Sprintf("reason %d", int(r))
}

// Kind is a kind of part of an outline.
type Kind int

const (
	NoPart Kind = iota
	Outer
	Hole
	Void
	Disc
)

func (k Kind) String() string {
	return [...]string{"section", "outer ring", "hole", "void", "round"}[k]
}

// Part names one part of a Contour: the field and the index in it, from 0.
type Part struct {
	Kind  Kind
	Index int
}

func (p Part) String() string {
	if p.Kind == NoPart {
		return p.Kind.String()
	}
	return fmt.Sprintf("%v %d", p.Kind, p.Index+1)
}

// Refusal is the error of NewOutline: a reason with the parts and the place.
type Refusal struct {
	Reason      Reason
	Part, Other Part  // Other where two parts are at fault
	Corner      int   // of Part, from 0: the corner, or the one at which its edge begins; −1 for none
	OtherCorner int   // the same of the second edge, of Part itself or of Other; −1 for none
	At          Point // mm, in the coordinates given; (0, 0) where the reason has no place
	Have, Limit float64
}

func (r *Refusal) Error() string {
	text := r.Part.String()
	switch r.Reason {
	case NotFinite:
		if r.Corner >= 0 {
			text += fmt.Sprintf(", corner %d", r.Corner+1)
		}
		return text + ": " + r.Reason.Error()
	case Empty, NoArea:
		return text + ": " + r.Reason.Error()
	case FewCorners:
		return fmt.Sprintf("%s: %v: %g", text, r.Reason, r.Have)
	case Parted:
		return fmt.Sprintf("%s: %v, %g mm and %g mm above the soffit", text, r.Reason, r.Have, r.Limit)
	}
	text += " " + r.Reason.Error()
	if r.Other.Kind != NoPart {
		text += " " + r.Other.String()
	}
	return fmt.Sprintf("%s near (%.6g, %.6g) mm%s", text, r.At.X, r.At.Y, r.edges())
}

// edges names the edges at fault.
func (r *Refusal) edges() string {
	switch {
	case r.Corner >= 0 && r.OtherCorner >= 0:
		return fmt.Sprintf(", edges from corners %d and %d", r.Corner+1, r.OtherCorner+1)
	case r.Corner >= 0:
		return fmt.Sprintf(", edge from corner %d", r.Corner+1)
	}
	return ""
}

// Unwrap gives the Reason.
func (r *Refusal) Unwrap() error { return r.Reason }
