package losses

import "fmt"

// Reason says why a section cannot be followed. A Reason is an error; errors.Is finds it in a Refusal.
type Reason int

const (
	// BadTimes: the times are none, do not rise, or are no numbers. Index is the time at fault.
	BadTimes Reason = iota + 1
	// OffTime: an event, or the start of a concrete, is at no time of the time line. Have is its time.
	OffTime
	// BadLaw: a compliance is not above 0, or it or a shrinkage is no number. Have is the value, Index the time.
	BadLaw
	// BadConcrete: area or second moment not above 0, no ageing or one of another time line, a top not above its bottom.
	BadConcrete
	// BadSteel: area negative, modulus not above 0, a relaxation before the start that is negative, a value that is no number.
	BadSteel
	// BadEvent: an event before the one before it, the first not at the first time, an action that is no number.
	BadEvent
	// Unknown: an event names a part that there is not, or that has joined already, or that leaves without being there. Have is its
	// index.
	Unknown
	// Early: a concrete joins before the start of its ageing. Have is the time, Limit the start.
	Early
	// Loose: the parts that have joined hold no plane. Index is the event.
	Loose
	// Unsettled: the stresses of a step do not settle to numbers. Index is the time.
	Unsettled
	// BadTransfer: the concrete of a transfer is none, or an action is no number.
	BadTransfer
)

func (r Reason) Error() string {
	switch r {
	case BadTimes:
		return "not times that rise"
	case OffTime:
		return "not a time of the time line"
	case BadLaw:
		return "not a law of concrete"
	case BadConcrete:
		return "not a concrete"
	case BadSteel:
		return "not a layer of steel"
	case BadEvent:
		return "not an event, or out of order"
	case Unknown:
		return "names no part that can join or leave"
	case Early:
		return "joins before it ages"
	case Loose:
		return "nothing there holds a plane"
	case Unsettled:
		return "the stresses do not settle"
	case BadTransfer:
		return "not a transfer of prestress"
	}
	return fmt.Sprintf("reason %d", int(r))
}

// Refusal is why a section cannot be followed: a reason, the index of what is at fault, from 0, and numbers whose meaning
// stands beside the reason.
type Refusal struct {
	Reason      Reason
	Index       int
	Have, Limit float64
}

func (r *Refusal) Error() string {
	return fmt.Sprintf("section through time: number %d: %v (%g, limit %g)", r.Index+1, r.Reason, r.Have, r.Limit)
}

// Unwrap gives the reason to errors.Is.
func (r *Refusal) Unwrap() error { return r.Reason }

func finite(v ...float64) bool {
	for _, x := range v {
		if x-x != 0 {
			return false
		}
	}
	return true
}
