package bending

import (
	"math"

	"soffit/calc/solve"
)

// least is the part of the depth at which the search begins: neutral axes above it are taken for none.
const least = 1e-9

// balanced is the residual allowed, as part of the concrete's force or the axial one, whichever is greater.
const balanced = 1e-6

// deepest is the depth at which the search by fibres ends, in section depths.
const deepest = 10

// scan is the number of steps in which first and single look for changes of sign.
const scan = 16

// problem is one solution under way.
type problem struct {
	section  *Section
	layers   []Layer
	curved   bool // by the parabola
	graded   bool // by the block that follows the parabola, else by the block
	block    BlockLaw
	parabola Parabola
	epsCu    float64
	Conditions
}

// curvature gives κ at x and what governs it.
func (p *problem) curvature(x float64) (k float64, pivot Pivot, layer int) {
	k = p.epsCu / x
	if h := p.section.height; p.curved && x > h {
		k, pivot = p.parabola.EpsC2/(x-(1-p.parabola.EpsC2/p.epsCu)*h), PivotCore
	}
	if kf := p.Flange.curvature(x); kf < k {
		k, pivot = kf, PivotFlange
	}
	if ks, i := Curvature(x, p.layers); ks < k {
		return ks, PivotSteel, i
	}
	return k, pivot, -1
}

// concrete gives force and moment about the top fibre.
func (p *problem) concrete(x, k float64) (force, moment float64) {
	if p.curved {
		return p.section.Compression(p.parabola, x, k)
	}
	if p.graded {
		return p.section.Block(Graded{p.block, p.parabola}.At(k*x), x)
	}
	return p.section.Block(p.block, x)
}

// steel gives the sum of the forces and their moment about the top fibre.
func (p *problem) steel(x, k float64) (force, moment float64) {
	for i := range p.layers {
		l := &p.layers[i]
		f := l.Area * l.stress(x, k)
		force += f
		moment += f * l.Depth
	}
	return force, moment
}

// stress is At's, without the rest.
func (l *Layer) stress(x, k float64) float64 {
	f := l.Law.at(l.Prestrain + k*(l.Depth-x))
	return math.Max(-l.Cap, math.Min(l.Cap, f))
}

// balance is the force of the concrete less that of the steel and the axial one, N.
func (p *problem) balance(x float64) float64 {
	k, _, _ := p.curvature(x)
	c, _ := p.concrete(x, k)
	t, _ := p.steel(x, k)
	return c - t - p.Axial.Force
}

// solve seeks the neutral axis in (0, hi].
func (p *problem) solve(hi float64) (Axis, error) {
	if err := p.Conditions.check(p.section.height); err != nil {
		return Axis{}, err
	}
	for i := range p.layers {
		if err := p.layers[i].check(i, p.section.height); err != nil {
			return Axis{}, err
		}
	}
	lo := least * p.section.height
	if p.balance(lo) >= 0 {
		k, _, _ := p.curvature(lo)
		t, _ := p.steel(lo, k)
		return Axis{}, p.Axial.untied(t)
	}
	if reach := math.Min(p.several(), p.section.height); reach > lo {
		return p.first(lo, reach, hi)
	}
	return p.single(lo, hi)
}

// single finds the state that balances between lo, where the steel prevails, and hi; up to the depth h of the
// section the balance must rise. A neutral axis within the section is preferred to one below it, where bars
// near the top, let go as the strain evens out, can make the concrete prevail in between only: that is looked
// for at 15 places.
func (p *problem) single(lo, hi float64) (Axis, error) {
	h := p.section.height
	if (p.curved || p.graded) && p.balance(h) >= 0 {
		return p.within(lo, h)
	}
	if p.balance(hi) >= 0 {
		return p.within(lo, hi)
	}
	for i := 1; p.curved && i < scan; i++ {
		part := float64(i) / scan
		if x := h + (hi-h)*part*part; p.balance(x) >= 0 {
			return p.within(lo, x)
		}
	}
	return Axis{}, p.compressed(hi)
}

// compressed is the refusal of a section in which the steel at hi still outweighs the concrete.
func (p *problem) compressed(hi float64) error {
	k, _, _ := p.curvature(hi)
	c, _ := p.concrete(hi, k)
	t, _ := p.steel(hi, k)
	return &Refusal{WhollyCompressed, -1, t + p.Axial.Force, c}
}

// within finds the state that balances in a bracket with a change of sign.
func (p *problem) within(lo, hi float64) (Axis, error) {
	x, evals, err := solve.Bracket(p.balance, lo, hi, 0)
	if err != nil {
		return Axis{}, &Refusal{Unbalanced, -1, math.NaN(), 0}
	}
	a := Axis{X: x, Lo: lo, Hi: hi, Evals: evals}
	a.Curvature, a.Pivot, a.Layer = p.curvature(x)
	a.TopStrain = a.Curvature * x
	c, first := p.concrete(x, a.Curvature)
	t, moment := p.steel(x, a.Curvature)
	a.Concrete, a.ConcreteDepth = c, first/c
	a.Steel, a.Axial, a.Residual = t, p.Axial.Force, c-t-p.Axial.Force
	a.Moment = moment - first + p.Axial.moment()
	if most := balanced * math.Max(c, math.Abs(a.Axial)); !(math.Abs(a.Residual) <= most) {
		return Axis{}, &Refusal{Unbalanced, -1, a.Residual, most}
	}
	return a, nil
}
