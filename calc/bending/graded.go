package bending

import "math"

// Graded is a rectangular block whose factors follow the strain of the top fibre: where it stays below ε_cu, since
// steel reaches its limit first, λ and η shrink with the depth and the size of the resultant of the
// parabola–rectangle at that strain, each related to its value at the ultimate strain. At ε_cu it is the block
// itself; Parabola.EpsCu2 and BlockLaw.EpsCu are the same there.
type Graded struct {
	BlockLaw
	Parabola
}

// At is the block for a strain of the top fibre, above 0.
func (g Graded) At(topStrain float64) BlockLaw {
	mean, depth := g.resultant(topStrain / g.EpsC2)
	fullMean, fullDepth := g.resultant(g.EpsCu2 / g.EpsC2)
	return BlockLaw{Lambda: g.Lambda * depth / fullDepth, EtaFcd: g.EtaFcd * mean / fullMean * fullDepth / depth, EpsCu: g.EpsCu}
}

// resultant is the mean stress of the parabola–rectangle over the compressed depth, as part of f_cd, and the depth of
// its resultant, as part of that depth, for a top strain of r·ε_c2.
func (g Graded) resultant(r float64) (mean, depth float64) {
	n := g.N
	if r < slight {
		return g.slightly(r)
	}
	q := math.Pow(math.Max(0, 1-r), n+1)
	mean = 1 - (1-q)/((n+1)*r)
	depth = 1 - (0.5-(1-q*(1+(n+1)*r))/((n+1)*(n+2)*r*r))/mean
	return mean, depth
}

// slight is the part of ε_c2 below which resultant sums its series, where the closed form takes differences of
// what is nearly alike.
const slight = 1e-2

// slightly is resultant by the series of 1 − (1 − w)^n: of the stress over the depth, and of its moment about the
// neutral axis.
func (g Graded) slightly(r float64) (mean, depth float64) {
	moment, term := 0.0, -1.0
	for k := 1.0; k <= 8; k++ {
		term *= -(g.N - k + 1) / k * r
		mean += term / (k + 1)
		moment += term / (k + 2)
	}
	return mean, 1 - moment/mean
}

// GradedAxis finds the neutral axis with a graded block. It is sought in (0, h], and if the concrete does not
// balance the steel there, down to h/λ; all else as NeutralAxis.
func (s *Section) GradedAxis(g Graded, layers []Layer) (Axis, error) {
	return s.GradedAxisUnder(Conditions{}, g, layers)
}

// GradedAxisUnder is GradedAxis under conditions.
func (s *Section) GradedAxisUnder(c Conditions, g Graded, layers []Layer) (Axis, error) {
	if err := g.BlockLaw.check(); err != nil {
		return Axis{}, err
	}
	if err := g.Parabola.check(); err != nil {
		return Axis{}, err
	}
	p := problem{section: s, layers: layers, graded: true, block: g.BlockLaw, parabola: g.Parabola, epsCu: g.EpsCu, Conditions: c}
	return p.narrowing(s.height / g.Lambda)
}
