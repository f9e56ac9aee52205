package bending

import (
	"math"

	"soffit/calc/solve"
)

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
	q := math.Pow(math.Max(0, 1-r), n+1)
	mean = 1 - (1-q)/((n+1)*r)
	depth = 1 - (0.5-(1-q*(1+(n+1)*r))/((n+1)*(n+2)*r*r))/mean
	return mean, depth
}

// GradedAxis finds the neutral axis with a graded block. It is sought in (0, h]; all else as NeutralAxis, but for a
// single state: the first change of sign of the bracketed balance is taken.
func (s *Section) GradedAxis(g Graded, layers []Layer) (Axis, error) {
	for i := range layers {
		if err := layers[i].check(i, s.height); err != nil {
			return Axis{}, err
		}
	}
	state := func(x float64) (Axis, float64) {
		a := Axis{X: x, Layer: -1, Curvature: g.EpsCu / x}
		if k, layer := Curvature(x, layers); k < a.Curvature {
			a.Curvature, a.Pivot, a.Layer = k, PivotSteel, layer
		}
		a.TopStrain = a.Curvature * x
		var first float64
		a.Concrete, first = s.Block(g.At(a.TopStrain), x)
		a.ConcreteDepth = first / a.Concrete
		a.Moment = -first
		for i := range layers {
			f := layers[i].At(x, a.Curvature)
			a.Steel += f.Force
			a.Moment += f.Force * layers[i].Depth
		}
		a.Residual = a.Concrete - a.Steel
		return a, a.Residual
	}
	lo, hi := s.height*least, s.height
	if _, r := state(lo); r >= 0 {
		a, _ := state(lo)
		return Axis{}, &Refusal{Reason: NoTension, Layer: -1, Have: a.Steel}
	}
	if a, r := state(hi); r < 0 {
		return Axis{}, &Refusal{Reason: WhollyCompressed, Layer: -1, Have: a.Steel, Limit: a.Concrete}
	}
	x, evals, err := solve.Bracket(func(x float64) float64 { _, r := state(x); return r }, lo, hi, 0)
	if err != nil {
		return Axis{}, err
	}
	a, _ := state(x)
	a.Lo, a.Hi, a.Evals = lo, hi, evals
	if math.Abs(a.Residual) > balanced*a.Concrete {
		return Axis{}, &Refusal{Reason: Unbalanced, Layer: -1, Have: a.Residual, Limit: balanced * a.Concrete}
	}
	return a, nil
}
