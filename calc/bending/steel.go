package bending

import (
	"fmt"
	"math"
)

// maxKinks is the most points a steel law can have; a fixed number keeps laws comparable and the solver
// free of allocation.
const maxKinks = 6

// SteelLaw is a stress–strain law of straight lines from the origin through its points, level after the
// last, and the same in compression with signs turned. Stresses are in MPa, strains dimensionless.
// The zero value is no law; Horizontal, Inclined and MultiLinear make one. Laws are comparable by ==.
type SteelLaw struct {
	points int
	strain [maxKinks]float64
	stress [maxKinks]float64
	slope  [maxKinks]float64 // of the line that ends at the point
	limit  float64           // strain limit in tension, +Inf for none
}

// Point is a point of a steel law: strain, dimensionless, and stress, MPa.
type Point struct{ Strain, Stress float64 }

// Horizontal is a law with a level upper branch and no strain limit: modulus E up to the strength fd,
// both MPa (EN 1992-1-1, 3.2.7(2)b and 3.3.6(7)). Errors as MultiLinear.
func Horizontal(e, fd float64) (SteelLaw, error) {
	if !(e > 0) {
		return SteelLaw{}, fmt.Errorf("steel law: modulus %g MPa, want a stress above 0", e)
	}
	return MultiLinear(Point{fd / e, fd})
}

// Inclined is a law with a rising upper branch (EN 1992-1-1, 3.2.7(2)a and 3.3.6(7)): modulus E up to fd,
// then straight to the stress fu at the strain epsU (ε_uk), of which only the part up to the strain limit
// epsUd (ε_ud ≤ ε_uk) is used. Stresses in MPa, strains dimensionless. Errors as MultiLinear and WithLimit,
// and where ε_ud lies past ε_uk.
func Inclined(e, fd, fu, epsU, epsUd float64) (SteelLaw, error) {
	if !(e > 0) {
		return SteelLaw{}, fmt.Errorf("steel law: modulus %g MPa, want a stress above 0", e)
	}
	if !(epsUd <= epsU) {
		return SteelLaw{}, fmt.Errorf("steel law: strain limit %g past the end of the branch at %g", epsUd, epsU)
	}
	l, err := MultiLinear(Point{fd / e, fd}, Point{epsU, fu})
	if err != nil {
		return SteelLaw{}, err
	}
	return l.WithLimit(epsUd)
}

// MultiLinear is a law of straight lines from the origin through one to six points, level after the last,
// without a strain limit. Strains must rise from point to point and from 0, stresses must not fall and the
// first be above 0; else an error.
func MultiLinear(points ...Point) (SteelLaw, error) {
	if len(points) == 0 || len(points) > maxKinks {
		return SteelLaw{}, fmt.Errorf("steel law: %d points, want 1 to %d", len(points), maxKinks)
	}
	l := SteelLaw{points: len(points), limit: math.Inf(1)}
	var before Point
	for i, p := range points {
		if !(p.Strain > before.Strain) || math.IsInf(p.Strain, 0) {
			return SteelLaw{}, fmt.Errorf("steel law: strain %g at point %d after %g, want strains that rise", p.Strain, i+1, before.Strain)
		}
		if !(p.Stress >= before.Stress && p.Stress > 0) || math.IsInf(p.Stress, 0) {
			return SteelLaw{}, fmt.Errorf("steel law: stress %g MPa at point %d after %g MPa, want stresses that do not fall", p.Stress, i+1, before.Stress)
		}
		l.strain[i], l.stress[i] = p.Strain, p.Stress
		l.slope[i] = (p.Stress - before.Stress) / (p.Strain - before.Strain)
		before = p
	}
	return l, nil
}

// WithLimit is the law with a strain limit in tension, ε_ud; +Inf takes the limit away. The limit must lie
// past the first point, where the steel yields; else an error.
func (l SteelLaw) WithLimit(epsUd float64) (SteelLaw, error) {
	if l.points == 0 || !(epsUd > l.strain[0]) {
		return SteelLaw{}, fmt.Errorf("steel law: strain limit %g, want one past the yield strain %g", epsUd, l.strain[0])
	}
	l.limit = epsUd
	return l, nil
}

// Limit is the strain limit in tension, +Inf for none.
func (l SteelLaw) Limit() float64 { return l.limit }

// Modulus is the slope of the first line, MPa.
func (l SteelLaw) Modulus() float64 { return l.slope[0] }

// Yield is the first point: where the steel leaves its first line.
func (l SteelLaw) Yield() Point { return Point{l.strain[0], l.stress[0]} }

// Stress is the stress in MPa at a strain, tension positive in both. It knows nothing of the strain limit:
// past it the last line and the level after it go on. A NaN, or the zero law, gives a NaN.
func (l SteelLaw) Stress(strain float64) float64 { return l.at(strain) }

func (l *SteelLaw) at(strain float64) float64 {
	e := math.Abs(strain)
	for i := range l.points {
		if e < l.strain[i] {
			if i == 0 {
				return l.slope[0] * strain
			}
			return math.Copysign(l.stress[i]-l.slope[i]*(l.strain[i]-e), strain)
		}
	}
	if l.points == 0 || math.IsNaN(strain) {
		return math.NaN()
	}
	return math.Copysign(l.stress[l.points-1], strain)
}
