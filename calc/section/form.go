package section

import (
	"fmt"
	"math"
)

// Form is a shape of the trade, given by its measures in mm. Outline checks them and sets it out: the axis of
// symmetry at x = 0, the soffit at y = 0. Errors are *Measure, and *Refusal where the lines do not fit.
type Form interface {
	Outline() (Outline, error)
}

// Measure is the error of a form: a measure that cannot be. Name is in trade words, Want says what would do.
type Measure struct {
	Name string
	Have float64 // mm, or a number of pieces
	Want string
}

func (m *Measure) Error() string { return fmt.Sprintf("%s: have %g, want %s", m.Name, m.Have, m.Want) }

// measured keeps the first measure that cannot be.
type measured struct{ err *Measure }

func (m *measured) refuse(name string, have float64, want string) {
	if m.err == nil {
		m.err = &Measure{name, have, want}
	}
}

// above0 wants a length above 0.
func (m *measured) above0(name string, v float64) {
	if !(v > 0) || math.IsInf(v, 0) {
		m.refuse(name, v, "a length above 0 mm")
	}
}

// from0 wants a length from 0.
func (m *measured) from0(name string, v float64) {
	if !(v >= 0) || math.IsInf(v, 0) {
		m.refuse(name, v, "a length from 0 mm")
	}
}

// below wants a length that leaves something of a limit.
func (m *measured) below(name string, v, limit float64, of string) {
	if !(v < limit*(1-thin)) {
		m.refuse(name, v, fmt.Sprintf("less than %g mm, %s", limit, of))
	}
}

// within wants a length that does not pass a limit but for rounding.
func (m *measured) within(name string, v, limit float64, of string) {
	if !(v <= limit*(1+thin)) {
		m.refuse(name, v, fmt.Sprintf("at most %g mm, %s", limit, of))
	}
}

// flange checks the measures of a flange or ledge.
func (m *measured) flange(name string, f Flange) {
	m.above0(name+" width", f.Width)
	m.above0(name+" depth", f.Depth)
	m.from0(name+" haunch depth", f.Haunch)
}

// outline sets out the contour unless a measure was refused.
func (m *measured) outline(contour func() Contour) (Outline, error) {
	if m.err != nil {
		return Outline{}, m.err
	}
	return NewOutline(contour())
}

// mirrored is the ring through the points and, back from the last, through their mirror images about x = 0.
func mirrored(half ...Point) Ring {
	ring := Ring(half)
	for i := len(half) - 1; i >= 0; i-- {
		ring = append(ring, Point{-half[i].X, half[i].Y})
	}
	return ring
}

// rung is the ring through the points as a contour.
func rung(half ...Point) Contour { return Contour{Outer: []Ring{mirrored(half...)}} }

// Outline is the contour as it stands: a polygon of any form.
func (c Contour) Outline() (Outline, error) { return NewOutline(c) }

// Polygon is a section with one ring of corners.
func Polygon(corners ...Point) Contour { return Contour{Outer: []Ring{corners}} }
