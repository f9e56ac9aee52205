// Package tendon is the geometry of tendons along a member: profiles put together of straight lines and parabolas, their
// heights, slopes and changes of direction. Lengths are in mm, x counts from end A, heights count upward from the soffit,
// slopes are rises per length.
package tendon

import (
	"math"
	"slices"
)

// Line is the kind of line by which a profile comes to a point.
type Line int

const (
	// Straight is a straight line from the point before.
	Straight Line = iota
	// LevelHere is a parabola whose vertex is this point.
	LevelHere
	// LevelBefore is a parabola whose vertex is the point before.
	LevelBefore
	// Onward is a parabola that leaves the point before in the direction reached there.
	Onward
)

// Point is a place that a profile passes through. By says how it comes there; that of the first point means nothing.
type Point struct {
	X, Height float64
	By        Line
}

// Segment is a straight line or a parabola: at u from its start the height is Height + Slope·u + Half·u².
type Segment struct {
	Start, Length float64
	Height        float64 // at the start
	Slope         float64 // at the start, rising positive
	Half          float64 // half the curvature, 1/mm; 0 for a straight line
}

// End is where the segment ends.
func (s Segment) End() float64 { return s.Start + s.Length }

// HeightAt is the height at u from the start.
func (s Segment) HeightAt(u float64) float64 { return s.Height + (s.Slope+s.Half*u)*u }

// SlopeAt is the slope at u from the start.
func (s Segment) SlopeAt(u float64) float64 { return s.Slope + 2*s.Half*u }

// Turn is the change of direction over the first u of the segment, taken as change of slope: see Profile.Angle.
func (s Segment) Turn(u float64) float64 { return math.Abs(2 * s.Half * u) }

// Vertex is where the segment is level within itself, ends left out; ok is false where it is level nowhere there.
func (s Segment) Vertex() (u float64, ok bool) {
	if s.Half == 0 {
		return 0, false
	}
	u = -s.Slope / (2 * s.Half)
	return u, u > 0 && u < s.Length
}

// Extremes are the least and the greatest height of the segment, at its ends or at a vertex inside.
func (s Segment) Extremes() (least, greatest float64) {
	from, to := s.Height, s.HeightAt(s.Length)
	least, greatest = math.Min(from, to), math.Max(from, to)
	if u, ok := s.Vertex(); ok {
		h := s.HeightAt(u)
		least, greatest = math.Min(least, h), math.Max(greatest, h)
	}
	return least, greatest
}

// Profile is a tendon's axis along the member: segments end to end, without a jump of height. A change of slope from one
// to the next is a kink. Points are those it was put through, one more than there are segments.
type Profile struct {
	Points   []Point
	Segments []Segment
}

// New puts a profile through points. An error is a *Fault.
func New(points ...Point) (Profile, error) {
	if len(points) < 2 {
		return Profile{}, &Fault{Reason: FewPoints, Point: len(points)}
	}
	p := Profile{Points: slices.Clone(points)}
	for i, q := range points {
		if !finite(q.X) || !finite(q.Height) {
			return Profile{}, &Fault{Reason: NotFinite, Point: i}
		}
		if i == 0 {
			continue
		}
		from := points[i-1]
		if !(q.X > from.X) {
			return Profile{}, &Fault{Reason: NotAhead, Point: i, Have: q.X, Limit: from.X}
		}
		s := Segment{Start: from.X, Length: q.X - from.X, Height: from.Height}
		rise := q.Height - from.Height
		switch q.By {
		case Straight:
			s.Slope = rise / s.Length
		case LevelHere:
			s.Slope, s.Half = 2*rise/s.Length, -rise/(s.Length*s.Length)
		case LevelBefore:
			s.Half = rise / (s.Length * s.Length)
		case Onward:
			if i == 1 {
				return Profile{}, &Fault{Reason: NoDirection, Point: i}
			}
			before := p.Segments[i-2]
			s.Slope = before.SlopeAt(before.Length)
			s.Half = (rise/s.Length - s.Slope) / s.Length
		default:
			return Profile{}, &Fault{Reason: UnknownLine, Point: i}
		}
		p.Segments = append(p.Segments, s)
	}
	return p, nil
}

// Level is the profile of a straight tendon at one height.
func Level(length, height float64) (Profile, error) {
	return New(Point{X: 0, Height: height}, Point{X: length, Height: height})
}

// Deflected is the profile of a tendon that comes down straight from both ends, by rise, to where it is held down at a
// distance from each end, and lies level at height between. Where the distance is half the length there is one such place.
func Deflected(length, height, rise, fromEnd float64) (Profile, error) {
	points := []Point{{X: 0, Height: height + rise}, {X: fromEnd, Height: height}}
	if length-fromEnd > fromEnd {
		points = append(points, Point{X: length - fromEnd, Height: height})
	}
	return New(append(points, Point{X: length, Height: height + rise})...)
}

func finite(v float64) bool { return v-v == 0 }
