package tendon

import "math"

// From and To are the ends of the profile.
func (p Profile) From() float64 { return p.Segments[0].Start }

// To is where the profile ends.
func (p Profile) To() float64 { return p.Segments[len(p.Segments)-1].End() }

// at is the segment over x, the one that ends there where two meet, and how far x is into it; places beyond an end count
// as that end.
func (p Profile) at(x float64) (s Segment, u float64) {
	for _, s = range p.Segments {
		if x <= s.End() {
			break
		}
	}
	return s, math.Min(math.Max(x-s.Start, 0), s.Length)
}

// Height is the height at x; beyond an end, that of the end.
func (p Profile) Height(x float64) float64 { s, u := p.at(x); return s.HeightAt(u) }

// Slope is the slope at x; at a kink, that on the side of end A.
func (p Profile) Slope(x float64) float64 { s, u := p.at(x); return s.SlopeAt(u) }

// Kink is the change of slope at the start of a segment, never negative; 0 at that of the first.
func (p Profile) Kink(i int) float64 {
	if i == 0 {
		return 0
	}
	before := p.Segments[i-1]
	return math.Abs(p.Segments[i].Slope - before.SlopeAt(before.Length))
}

// Angle is the sum of all changes of direction between the end that the tendon is followed from (A, or B) and x, without
// regard to their sign: |Δslope| along parabolas and at kinks, one at x itself counted.
//
// The slope stands for the angle, as is usual for flat profiles. d(tan α) = (1 + tan² α)·dα, so for the true sum of
// angles Θ and the steepest slope s of the part passed, Θ ≤ Angle ≤ (1 + s²)·Θ: the sum is never too small, and
// by at most 1 % too large where no slope is above 1 in 10. Turned is Θ.
func (p Profile) Angle(x float64, fromB bool) float64 {
	return p.sum(x, fromB, func(a, b float64) float64 { return math.Abs(b - a) })
}

// Turned is Angle with true angles, the differences of arctan of the slopes.
func (p Profile) Turned(x float64, fromB bool) float64 {
	return p.sum(x, fromB, func(a, b float64) float64 { return math.Abs(math.Atan(b) - math.Atan(a)) })
}

// sum adds up what turn gives for each pair of slopes between which the direction changes.
func (p Profile) sum(x float64, fromB bool, turn func(a, b float64) float64) float64 {
	total := 0.0
	for i, s := range p.Segments {
		if i > 0 && (!fromB && x >= s.Start || fromB && x <= s.Start) {
			before := p.Segments[i-1]
			total += turn(before.SlopeAt(before.Length), s.Slope)
		}
		u := math.Min(math.Max(x-s.Start, 0), s.Length)
		from, to := 0.0, u
		if fromB {
			from, to = u, s.Length
		}
		total += turn(s.SlopeAt(from), s.SlopeAt(to))
	}
	return total
}

// Steepest is the greatest slope anywhere, without sign.
func (p Profile) Steepest() float64 {
	steepest := 0.0
	for _, s := range p.Segments {
		steepest = math.Max(steepest, math.Max(math.Abs(s.Slope), math.Abs(s.SlopeAt(s.Length))))
	}
	return steepest
}

// LeastRadius is the least radius of curvature, mm, taken as 1/y″ at the vertex of the sharpest parabola, where the true
// radius is least and equal to it; +Inf where every line is straight. Kinks have no radius.
func (p Profile) LeastRadius() float64 {
	sharpest := 0.0
	for _, s := range p.Segments {
		sharpest = math.Max(sharpest, math.Abs(2*s.Half))
	}
	return 1 / sharpest
}

// Extremes are the least and the greatest height anywhere.
func (p Profile) Extremes() (least, greatest float64) {
	least, greatest = math.Inf(1), math.Inf(-1)
	for _, s := range p.Segments {
		a, b := s.Extremes()
		least, greatest = math.Min(least, a), math.Max(greatest, b)
	}
	return least, greatest
}
