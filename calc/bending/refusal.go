package bending

import "fmt"

// Reason says why there is no neutral axis. A Reason is an error; errors.Is finds it in a Refusal.
type Reason int

const (
	// NoTension: with the neutral axis at the very top, or where it would have to be, no steel pulls, or not
	// measurably: nothing balances the concrete. Have is the sum of the steel forces there, N, tension positive.
	NoTension Reason = iota + 1
	// WhollyCompressed: with the section wholly compressed the concrete still does not balance the steel and
	// the axial force. Have is the tension with that force, N, Limit the concrete's force, N.
	WhollyCompressed
	// LimitSpent: the prestrain of a layer is not below its strain limit. Have is the prestrain, Limit ε_ud.
	LimitSpent
	// BadLayer: a layer is not a layer: area or cap negative, depth outside the section, a value that is no
	// number, or no steel law. Have is the offending value, Limit the depth of the section, mm.
	BadLayer
	// BadConcrete: the concrete law is none. Have is the offending value.
	BadConcrete
	// Unbalanced: a place was found where the forces change sign, but they do not balance there. Have is the
	// difference, N, Limit the greatest allowed; Have is NaN if the forces were no numbers somewhere.
	Unbalanced
	// NotHeld: with the neutral axis at the very top the steel does not hold the axial tension. Have is the sum
	// of the steel forces there, N, Limit the tension.
	NotHeld
	// BadConditions: the conditions are none: a force or depth that is no number, a flange deeper than the
	// section or with a strain not above 0, a factor outside 0 to 1. Have is the offending value.
	BadConditions
	// BadFibre: a fibre is none: area negative, depth outside the section, no such law, a value that is no number; or
	// there is none at all, or no depth. Have is the offending value, Limit the depth of the section, mm.
	BadFibre
	// BadEdge: an edge of a concrete is none: depth outside the section, a strain that is no number, an ultimate
	// strain not above 0; or none is at depth 0. Have is the offending value, Limit the depth of the section, mm.
	BadEdge
	// BadBody: a body is none: no section, offset negative, a value that is no number; or there is none at all.
	// Have is the offending value.
	BadBody
	// EdgeSpent: the strain locked in at the edge of a concrete is not below its limit. Have is that strain, Limit ε_cu.
	EdgeSpent
	// LockedIn: with the neutral axis of the plane at the very top, and ten section depths above it, the concrete, by the
	// strain locked into it, outweighs the steel and the axial force. Have is its force at the top, N, Limit theirs, N.
	LockedIn
)

func (r Reason) Error() string {
	switch r {
	case NoTension:
		return "no layer of steel pulls"
	case WhollyCompressed:
		return "the wholly compressed section cannot balance the forces"
	case LimitSpent:
		return "the prestrain leaves nothing below the strain limit"
	case BadLayer:
		return "not a layer of steel"
	case BadConcrete:
		return "not a law of concrete"
	case Unbalanced:
		return "the forces do not balance"
	case NotHeld:
		return "the steel does not hold the axial tension"
	case BadConditions:
		return "not an axial force, a flange or a factor"
	case BadFibre:
		return "not a fibre"
	case BadEdge:
		return "not an edge of concrete"
	case BadBody:
		return "not a body of concrete"
	case EdgeSpent:
		return "the strain locked in leaves nothing below the limit of the concrete"
	case LockedIn:
		return "the strain locked into the concrete outweighs the steel"
	}
	return fmt.Sprintf("reason %d", int(r))
}

// Refusal is the error of NeutralAxis and Fibres: a reason with its numbers, whose meaning stands beside
// the reason.
type Refusal struct {
	Reason      Reason
	Layer       int // index of the layer at fault, or with a reason that names one of the fibre, edge or body; −1 if it is none
	Have, Limit float64
}

func (r *Refusal) Error() string {
	if r.Layer >= 0 {
		return fmt.Sprintf("no neutral axis: %s %d: %v (%g, limit %g)", r.Reason.thing(), r.Layer+1, r.Reason, r.Have, r.Limit)
	}
	return fmt.Sprintf("no neutral axis: %v (%g, limit %g)", r.Reason, r.Have, r.Limit)
}

// thing is what an index counts.
func (r Reason) thing() string {
	switch r {
	case BadFibre:
		return "fibre"
	case BadEdge, EdgeSpent:
		return "edge"
	case BadBody:
		return "body"
	}
	return "layer"
}

// Unwrap gives the Reason.
func (r *Refusal) Unwrap() error { return r.Reason }
