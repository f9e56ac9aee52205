package statics

import (
	"fmt"
	"math"
	"slices"
	"sort"

	"soffit/calc/solve"
)

// Bent is a beam with a curvature along it: its shape, held at the bearings. Deflections are in mm, downward positive, so
// camber is negative; rotations are slopes of the deflection, positive where the beam goes down towards end B.
type Bent struct {
	Beam      Beam
	Curvature Curvature
	nodes     []float64 // ends, bearings and cuts
	turn      []float64 // ∫κ·ds from end A to the node
	sag       []float64 // ∫(x − s)·κ·ds from end A to the node x
	lift      float64   // deflection and rotation at end A
	tilt      float64
}

// Bend integrates a curvature twice along the beam, from cut to cut by the rule of Gauss and Legendre with five points: exact
// where it is a polynomial up to the eighth degree between the cuts. It refuses beams as Load does, and a curvature that
// is not finite somewhere.
func (b Beam) Bend(c Curvature) (Bent, error) {
	if _, err := b.Load(); err != nil {
		return Bent{}, err
	}
	s := Bent{Beam: b, Curvature: c, nodes: []float64{0, b.Length, b.A, b.B}}
	for _, x := range c.Cuts {
		if x > 0 && x < b.Length {
			s.nodes = append(s.nodes, x)
		}
	}
	sort.Float64s(s.nodes)
	s.nodes = slices.Compact(s.nodes)
	s.turn, s.sag = make([]float64, len(s.nodes)), make([]float64, len(s.nodes))
	for i := 1; i < len(s.nodes); i++ {
		from, to := s.nodes[i-1], s.nodes[i]
		turn, sag := c.over(from, to)
		s.turn[i] = s.turn[i-1] + turn
		s.sag[i] = s.sag[i-1] + s.turn[i-1]*(to-from) + sag
		if v := s.turn[i] + s.sag[i]; math.IsNaN(v) || math.IsInf(v, 0) {
			return Bent{}, fmt.Errorf("curvature between %g mm and %g mm is not finite", from, to)
		}
	}
	s.hold()
	return s, nil
}

// On is the same beam, bent as it is, on bearings at other places. A beam that bends further after a change of bearings is
// that with the whole of its curvature on the bearings of the day.
func (s Bent) On(a, b float64) (Bent, error) {
	s.Beam.A, s.Beam.B = a, b
	if _, err := s.Beam.Load(); err != nil {
		return Bent{}, err
	}
	s.hold()
	return s, nil
}

// hold puts the bearings where there is no deflection.
func (s *Bent) hold() {
	_, a := s.along(s.Beam.A)
	_, b := s.along(s.Beam.B)
	s.tilt = (b - a) / (s.Beam.B - s.Beam.A)
	s.lift = a - s.tilt*s.Beam.A
}

// Deflection is the deflection at x, mm, downward positive, 0 at the bearings; beyond an end it goes on straight.
func (s Bent) Deflection(x float64) float64 {
	if x == s.Beam.A || x == s.Beam.B {
		return 0
	}
	_, sag := s.along(x)
	return s.lift + s.tilt*x - sag
}

// Rotation is the slope of the deflection at x, radians, positive where the beam goes down towards end B; beyond an end that of
// the end.
func (s Bent) Rotation(x float64) float64 {
	turn, _ := s.along(x)
	return s.tilt - turn
}

// along is ∫κ·ds and ∫(x − s)·κ·ds from end A to x.
func (s Bent) along(x float64) (turn, sag float64) {
	if x <= 0 {
		return 0, 0
	}
	i := min(sort.SearchFloat64s(s.nodes, x), len(s.nodes)-1)
	if x == s.nodes[i] {
		return s.turn[i], s.sag[i]
	}
	if x > s.nodes[i] { // beyond the end
		return s.turn[i], s.sag[i] + s.turn[i]*(x-s.nodes[i])
	}
	turn, sag = s.Curvature.over(s.nodes[i-1], x)
	return s.turn[i-1] + turn, s.sag[i-1] + s.turn[i-1]*(x-s.nodes[i-1]) + sag
}

// over is ∫κ·ds and ∫(to − s)·κ·ds between two places without a cut between them.
func (c Curvature) over(from, to float64) (turn, sag float64) {
	middle, half := (from+to)/2, (to-from)/2
	for _, p := range solve.Legendre {
		k := p.Weight * half * c.At(middle+half*p.Place)
		turn += k
		sag += k * half * (1 - p.Place)
	}
	return turn, sag
}

// sought is in how many parts between two cuts an extreme is looked for.
const sought = 8

// Extremes are the least and the greatest deflection, mm, and where they are. They are found exactly where the rotation
// changes its sign once at most in each eighth between two cuts, bearings or ends.
func (s Bent) Extremes() (least, greatest, leastAt, greatestAt float64) {
	least, greatest = math.Inf(1), math.Inf(-1)
	take := func(x float64) {
		v := s.Deflection(x)
		if v < least {
			least, leastAt = v, x
		}
		if v > greatest {
			greatest, greatestAt = v, x
		}
	}
	take(0)
	before := s.Rotation(0)
	for i := 1; i < len(s.nodes); i++ {
		from, to := s.nodes[i-1], s.nodes[i]
		for k := range sought {
			a, b := from+(to-from)*float64(k)/sought, from+(to-from)*float64(k+1)/sought
			if k == sought-1 {
				b = to
			}
			rotation := s.Rotation(b)
			if before*rotation < 0 {
				if x, _, err := solve.Bracket(s.Rotation, a, b, 1e-9*s.Beam.Length); err == nil {
					take(x)
				}
			}
			take(b)
			before = rotation
		}
	}
	return least, greatest, leastAt, greatestAt
}

// ByUnitLoad finds the deflection at x, mm, a second way: the work of the curvature on the moments of a unit load at x,
// ∫M₁·κ·ds, without integrating twice.
func (s Bent) ByUnitLoad(x float64) float64 {
	places := append(slices.Clone(s.nodes), x, s.Beam.A, s.Beam.B)
	sort.Float64s(places)
	sum := 0.0
	for i := 1; i < len(places); i++ {
		if from, to := places[i-1], places[i]; from >= 0 && to <= s.Beam.Length && from < to {
			sum += solve.Gauss(func(at float64) float64 { return s.Beam.momentLine(at, x) * s.Curvature.At(at) }, from, to)
		}
	}
	return sum
}
