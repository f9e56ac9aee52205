package statics

import (
	"fmt"
	"math"
	"slices"
	"sort"
)

// Curvature is that of a beam along its length, 1/mm, sagging positive, whatever it comes from: moments, prestress, creep,
// shrinkage, cracks. At gives it at x, mm from end A. Cuts are the places, in any order, where it or one of its derivatives
// jumps; At is not asked there.
type Curvature struct {
	At   func(x float64) float64
	Cuts []float64
}

// Along is the curvature given at places along the beam, with straight lines between them; a place may stand twice, for a jump.
// Outside the places it is 0. It refuses fewer than two places, places that fall, tables of unequal length, and values that
// are not finite.
func Along(places, curvature []float64) (Curvature, error) {
	if len(places) < 2 || len(places) != len(curvature) {
		return Curvature{}, fmt.Errorf("curvature: %d places and %d values, want as many and 2 at least", len(places), len(curvature))
	}
	for i, x := range places {
		if math.IsNaN(x+curvature[i]) || math.IsInf(x+curvature[i], 0) || i > 0 && x < places[i-1] {
			return Curvature{}, fmt.Errorf("curvature: place %d at %g mm with %g 1/mm, want finite values and places that rise", i+1, x, curvature[i])
		}
	}
	xs, ks := slices.Clone(places), slices.Clone(curvature)
	return Curvature{func(x float64) float64 {
		i := sort.SearchFloat64s(xs, x) // the first place not before x
		switch {
		case i == len(xs) || i == 0 && x < xs[0]:
			return 0
		case i == 0:
			return ks[0]
		}
		return ks[i-1] + (ks[i]-ks[i-1])*(x-xs[i-1])/(xs[i]-xs[i-1])
	}, xs}, nil
}

// Plus is the sum of two curvatures.
func (c Curvature) Plus(d Curvature) Curvature {
	return Curvature{func(x float64) float64 { return c.At(x) + d.At(x) }, slices.Concat(c.Cuts, d.Cuts)}
}

// Times is the curvature times a factor, of any sign: 1/EI for one that is a moment, a creep coefficient.
func (c Curvature) Times(factor float64) Curvature {
	return Curvature{func(x float64) float64 { return factor * c.At(x) }, c.Cuts}
}
