// Package statics finds the reactions, moments and shears of a beam on two bearings, overhanging ends
// included, and from the curvature along it its deflections. Lengths are in mm from end A of the concrete,
// forces in N and positive downward as loads, upward as reactions; sagging moments, N·mm, are positive, and
// so is a shear, N, that pushes the part left of the section up.
package statics

import (
	"fmt"
	"math"
)

// Beam is a beam of one span on two bearings taken as points, mm from end A.
type Beam struct{ Length, A, B float64 }

// Load is a force at a place or an intensity over a length. Point and Uniform make one.
type Load struct {
	Force     float64 // N, at From = To
	Intensity float64 // N/mm, from From to To
	From, To  float64 // mm from end A
}

// Point is a force in N, downward positive, at a place in mm from end A.
func Point(force, at float64) Load { return Load{Force: force, From: at, To: at} }

// Uniform is an intensity in N/mm, downward positive, between two places in mm from end A.
func Uniform(intensity, from, to float64) Load {
	return Load{Intensity: intensity, From: from, To: to}
}

// Factored is the load times a factor, of any sign.
func (l Load) Factored(factor float64) Load {
	l.Force *= factor
	l.Intensity *= factor
	return l
}

// Loaded is a beam with its loads and the reactions to them.
type Loaded struct {
	Beam  Beam
	Loads []Load
	A, B  float64 // reactions, N, upward positive; negative is uplift
}

// Load puts loads on the beam and finds the reactions. It keeps the slice. It refuses a beam without
// 0 ≤ A < B ≤ Length, loads outside [0, Length] or with From > To, and values that are not finite.
func (b Beam) Load(loads ...Load) (Loaded, error) {
	if !(0 <= b.A && b.A < b.B && b.B <= b.Length) || math.IsInf(b.Length, 0) {
		return Loaded{}, fmt.Errorf("bearings at %g mm and %g mm of a beam of %g mm: want 0 ≤ A < B ≤ length", b.A, b.B, b.Length)
	}
	s := Loaded{Beam: b, Loads: loads}
	span := b.B - b.A
	for i, l := range loads {
		switch {
		case !(0 <= l.From && l.From <= l.To && l.To <= b.Length):
			return Loaded{}, fmt.Errorf("load %d from %g mm to %g mm lies outside the beam of %g mm", i+1, l.From, l.To, b.Length)
		case math.IsNaN(l.total()) || math.IsInf(l.total(), 0):
			return Loaded{}, fmt.Errorf("load %d is not finite", i+1)
		}
		m := l.middle()
		s.A += l.total() * ((b.B - m) / span)
		s.B += l.total() * ((m - b.A) / span)
	}
	return s, nil
}

// Total is the sum of the loads, N, downward positive.
func (s Loaded) Total() float64 {
	var t float64
	for _, l := range s.Loads {
		t += l.total()
	}
	return t
}

// Moment is the bending moment at x, N·mm, sagging positive; 0 outside the beam. It is summed from the
// nearer end, so that it is exactly 0 at both ends.
func (s Loaded) Moment(x float64) float64 {
	if !(x > 0 && x < s.Beam.Length) {
		return 0
	}
	if x > s.Beam.Length/2 {
		s, x = s.turned(), s.Beam.Length-x
		var m float64
		for _, l := range s.Loads {
			m -= l.turned(s.Beam.Length).momentLeft(x)
		}
		return m + s.reactionsLeft(x)
	}
	var m float64
	for _, l := range s.Loads {
		m -= l.momentLeft(x)
	}
	return m + s.reactionsLeft(x)
}

// Shear gives the shear forces just left and just right of x, N: they differ by a point load or a
// reaction at x. Left of end A and right of end B they are 0.
func (s Loaded) Shear(x float64) (left, right float64) {
	b := s.Beam
	if math.IsNaN(x) || x < 0 || x > b.Length {
		return 0, 0
	}
	if x > b.Length/2 { // summed from end B: the sum of what is right of x, loads down less reactions up
		for _, l := range s.Loads {
			part := l.Intensity * math.Max(0, l.To-math.Max(x, l.From))
			left += part
			right += part
			if l.From >= x {
				left += l.Force
			}
			if l.From > x {
				right += l.Force
			}
		}
		for _, r := range [2][2]float64{{b.A, s.A}, {b.B, s.B}} {
			if r[0] >= x {
				left -= r[1]
			}
			if r[0] > x {
				right -= r[1]
			}
		}
		return left, right
	}
	for _, l := range s.Loads {
		part := l.Intensity * math.Max(0, math.Min(x, l.To)-l.From)
		left -= part
		right -= part
		if l.From < x {
			left -= l.Force
		}
		if l.From <= x {
			right -= l.Force
		}
	}
	for _, r := range [2][2]float64{{b.A, s.A}, {b.B, s.B}} {
		if r[0] < x {
			left += r[1]
		}
		if r[0] <= x {
			right += r[1]
		}
	}
	return left, right
}

func (l Load) total() float64  { return l.Force + l.Intensity*(l.To-l.From) }
func (l Load) middle() float64 { return l.From + (l.To-l.From)/2 }

// momentLeft is the moment about x of the part of the load left of x, N·mm, positive for a downward load.
func (l Load) momentLeft(x float64) float64 {
	if x <= l.From {
		return 0
	}
	end := math.Min(x, l.To)
	return l.Force*(x-l.From) + l.Intensity*(end-l.From)*(x-(l.From+end)/2)
}

// turned sees the load from the other end of a beam of the given length.
func (l Load) turned(length float64) Load {
	l.From, l.To = length-l.To, length-l.From
	return l
}

// turned sees the beam and its reactions from the other end; the loads stay as they are.
func (s Loaded) turned() Loaded {
	b := s.Beam
	s.Beam = Beam{b.Length, b.Length - b.B, b.Length - b.A}
	s.A, s.B = s.B, s.A
	return s
}

func (s Loaded) reactionsLeft(x float64) float64 {
	return s.A*math.Max(0, x-s.Beam.A) + s.B*math.Max(0, x-s.Beam.B)
}
