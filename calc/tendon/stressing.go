package tendon

import (
	"math"

	"soffit/calc/solve"
)

// End is an end of a tendon.
type End int

const (
	// A is the end with the lesser x.
	A End = iota
	// B is the other.
	B
)

// Change is what a pull or a draw-in at one end does.
type Change struct {
	End           End
	Before, After float64 // stress at that end, MPa
	Length        float64 // mm from that end over which the stress changes; of a draw-in, the influence length
	Whole         bool    // it changes up to the other end, and there too
	Movement      float64 // mm of the tendon at that end, outward positive
}

// Pull pulls at an end with a jack to a stress in MPa while the other end is held. From the jack on the stress is
// stress·exp(−μ·(θ + k·x)) as far as that is more than is there; beyond, nothing moves. Pulled at one end and then at the
// other, the diagram is the same as with both jacks at once; then the change's Length says where the two meet, and Extension
// up to there and from there is what each jack draws out.
//
// An error is a *Refusal: BadPull, IdlePull.
func (d Diagram) Pull(end End, stress float64) (Diagram, Change, error) {
	s := d.seenFrom(end)
	before := s.pieces[0].stress
	switch {
	case !(stress > 0) || !finite(stress):
		return Diagram{}, Change{}, &Refusal{Reason: BadPull, Have: stress}
	case !(stress > before):
		return Diagram{}, Change{}, &Refusal{Reason: IdlePull, Have: stress, Limit: before}
	}
	next := make([]piece, 0, len(s.pieces)+1)
	to, area := overlay(s.pieces, stress, -1, &next)
	return Diagram{d.modulus, next}.seenFrom(end), Change{end, before, stress, math.Abs(to - s.From()), to == s.To(), area / d.modulus}, nil
}

// Slip lets the tendon slip into an end by drawIn, mm, 0 or more, while the other end is held. The friction turns round: from
// that end on the stress rises by exp(+μ·(θ + k·x)) as far as that is less than is there. The stress at the anchorage, and with
// it the influence length, follow from ∫Δσ·dx = drawIn·E, whether that length ends within the tendon, at a kink, or nowhere: then
// the other end loses stress too. Where two draw-ins reach each other their order matters a little; that of the calls counts.
//
// An error is a *Refusal: BadSlip, SlackSlip.
func (d Diagram) Slip(end End, drawIn float64) (Diagram, Change, error) {
	if !(drawIn >= 0) || !finite(drawIn) {
		return Diagram{}, Change{}, &Refusal{Reason: BadSlip, Have: drawIn}
	}
	s := d.seenFrom(end)
	before := s.pieces[0].stress
	if drawIn == 0 {
		return d, Change{End: end, Before: before, After: before}, nil
	}
	want := drawIn * d.modulus
	if all := d.Extension(d.From(), d.To()); !(drawIn < all) {
		return Diagram{}, Change{}, &Refusal{Reason: SlackSlip, Have: drawIn, Limit: all}
	}
	stress, _, err := solve.Bracket(func(stress float64) float64 {
		_, area := overlay(s.pieces, stress, +1, nil)
		return area - want
	}, 0, before, 0)
	if err != nil { // no sign change: the draw-in is all there is but for rounding
		return Diagram{}, Change{}, &Refusal{Reason: SlackSlip, Have: drawIn, Limit: d.Extension(d.From(), d.To())}
	}
	next := make([]piece, 0, len(s.pieces)+1)
	to, _ := overlay(s.pieces, stress, +1, &next)
	return Diagram{d.modulus, next}.seenFrom(end), Change{end, before, stress, math.Abs(to - s.From()), to == s.To(), -drawIn}, nil
}

// overlay lays a branch over pieces from their start: with sign −1 one that falls by all the friction there is, as far as it
// is above them, with sign +1 one that rises so, as far as it is below. No diagram is steeper than the friction allows, so the
// two cross once at most. It gives how far the branch goes, the area between, MPa·mm, and, if asked, the new pieces.
func overlay(pieces []piece, stress, sign float64, next *[]piece) (to, area float64) {
	keep := func(p ...piece) {
		if next != nil {
			*next = append(*next, p...)
		}
	}
	to = pieces[0].from
	for i, p := range pieces {
		if i > 0 {
			stress *= math.Exp(sign * p.kink)
		}
		if !(sign*(p.stress-stress) > 0) {
			keep(pieces[i:]...)
			break
		}
		rate, length, crossed := sign*p.grip, p.length(), false
		if apart := rate - p.rate; p.stress > 0 && apart != 0 {
			if u := math.Log(p.stress/stress) / apart; u > 0 && u < length {
				length, crossed = u, true
			}
		}
		area += sign * (part(p.stress, p.rate, length) - part(stress, rate, length))
		if to = p.to; crossed {
			to = p.from + math.Copysign(length, p.to-p.from)
			if to == p.from { // nothing to cut off
				keep(pieces[i:]...)
				break
			}
			crossed = to != p.to
		}
		keep(piece{p.from, to, stress, rate, p.grip, p.kink})
		if crossed {
			keep(piece{to, p.to, p.at(length), p.rate, p.grip, 0})
			keep(pieces[i+1:]...)
			break
		}
		stress *= math.Exp(rate * length)
	}
	return to, area
}

// seenFrom is the diagram turned so that it starts at an end; turned twice it is itself.
func (d Diagram) seenFrom(end End) Diagram {
	if end == A {
		return d
	}
	n := len(d.pieces)
	out := Diagram{d.modulus, make([]piece, n)}
	kink := 0.0 // at the end of the piece
	for i := n - 1; i >= 0; i-- {
		p := d.pieces[i]
		out.pieces[n-1-i] = piece{p.to, p.from, p.at(p.length()), -p.rate, p.grip, kink}
		kink = p.kink
	}
	return out
}
