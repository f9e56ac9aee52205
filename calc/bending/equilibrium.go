package bending

import (
	"math"

	"soffit/calc/solve"
)

// least is the part of the depth at which the search begins: neutral axes above it are taken for none.
const least = 1e-9

// balanced is the residual allowed, as part of the concrete's force or the axial one, whichever is greater.
const balanced = 1e-6

// unseen is the part of the concrete's force, with the neutral axis at the foot of the section, below which a
// difference is rounding: steel that pulls next to nothing is not measurable.
const unseen = 1e-15

// sliver is more of that force than the concrete above least can have by the plane of strain alone.
const sliver = 1e-7

// rounding is the part of the forces of the layers, one by one, that is allowed besides: where pulling and pushing
// steel nearly outweigh each other the concrete's own force may be next to none.
const rounding = 1e-13

// deepest is the depth at which the search by fibres ends, in section depths; highest how far above the section it
// goes where strain locked in compresses concrete although the plane does not.
const deepest, highest = 10, 10

// scan is the number of steps in which first looks for changes of sign; deeper is that of single below the section.
const scan, deeper = 16, 64

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

	// Fibres or bodies instead of a section.
	fibres *FibreModel
	parts  []part
	limits *Limits
	depth  float64
	locked bool // strain is locked in
	uneven bool // the concretes differ, or bear more above the strain that the flange is limited to
}

// height is the depth of the whole section.
func (p *problem) height() float64 {
	if p.section != nil {
		return p.section.height
	}
	return p.depth
}

// curvature gives κ at x and what governs it, with the index of the edge or the layer, −1 where there is none.
func (p *problem) curvature(x float64) (k float64, pivot Pivot, at int) {
	h := p.height()
	switch {
	case p.limits != nil:
		k, pivot, at = p.limits.curvature(x, h)
	case p.curved && x > h:
		k, pivot, at = p.parabola.EpsC2/(x-(1-p.parabola.EpsC2/p.epsCu)*h), PivotCore, -1
	default:
		k = p.epsCu / x
	}
	if kf := p.Flange.curvature(x); kf < k {
		k, pivot, at = kf, PivotFlange, -1
	}
	if ks, i := Curvature(x, p.layers); ks < k {
		return ks, PivotSteel, i
	}
	return k, pivot, at
}

// concrete gives force and moment about the top fibre.
func (p *problem) concrete(x, k float64) (force, moment float64) {
	switch {
	case p.fibres != nil:
		return p.fibres.Concrete(x, k)
	case p.parts != nil:
		for i := range p.parts {
			f, m := p.parts[i].compression(x, k)
			force += f
			moment += m
		}
		return force, moment
	case p.curved:
		return p.section.Compression(p.parabola, x, k)
	case p.graded:
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

// whole is the force of the concrete with the neutral axis at the foot of the section.
func (p *problem) whole() float64 {
	h := p.height()
	k, _, _ := p.curvature(h)
	force, _ := p.concrete(h, k)
	return force
}

// gross is the sum of the forces of the layers, none against another.
func (p *problem) gross(x, k float64) (force float64) {
	for i := range p.layers {
		l := &p.layers[i]
		force += l.Area * math.Abs(l.stress(x, k))
	}
	return force
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
	h := p.height()
	if err := p.Conditions.check(h); err != nil {
		return Axis{}, err
	}
	for i := range p.layers {
		if err := p.layers[i].check(i, h); err != nil {
			return Axis{}, err
		}
	}
	lo := least * h
	if p.balance(lo) >= 0 {
		k, _, _ := p.curvature(lo)
		t, _ := p.steel(lo, k)
		c, _ := p.concrete(lo, k)
		if !(p.locked && t+p.Axial.Force > 0 && c > sliver*p.whole()) {
			return Axis{}, p.Axial.untied(t)
		}
		if k, _ := Curvature(-highest*h, p.layers); k > 0 && !math.IsInf(k, 1) && p.balance(-highest*h) < 0 {
			return p.within(-highest*h, lo)
		}
		return Axis{}, &Refusal{LockedIn, -1, c, t + p.Axial.Force}
	}
	if reach := math.Min(p.several(), h); reach > lo {
		return p.first(lo, reach, hi)
	}
	return p.single(lo, hi)
}

// single finds the state that balances between lo, where the steel prevails, and hi; up to the depth h of the
// section the balance must rise. A neutral axis within the section is preferred to one below it, where bars
// near the top, let go as the strain evens out, can make the concrete prevail in between only: that is looked
// for in 64 steps, and at the peaks between them.
func (p *problem) single(lo, hi float64) (Axis, error) {
	h := p.height()
	if (p.curved || p.graded) && p.balance(h) >= 0 {
		return p.within(lo, h)
	}
	if p.balance(hi) >= 0 {
		return p.within(lo, hi)
	}
	if !p.curved && !p.graded {
		return Axis{}, p.compressed(hi)
	}
	var x, f [3]float64
	for i := range deeper + 1 {
		share := float64(i) / deeper
		x = [3]float64{x[1], x[2], h + (hi-h)*share*share}
		f = [3]float64{f[1], f[2], p.balance(x[2])}
		if f[2] >= 0 {
			return p.within(lo, x[2])
		}
		if i >= 2 && f[1] >= f[0] && f[1] > f[2] {
			if peak, _ := p.climb(x[0], x[2]); p.balance(peak) >= 0 {
				return p.within(lo, peak)
			}
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
	at := 0
	a.Curvature, a.Pivot, at = p.curvature(x)
	a.Layer, a.Edge = -1, at
	if a.Pivot == PivotSteel {
		a.Layer, a.Edge = at, -1
	}
	a.TopStrain = a.Curvature * x
	c, first := p.concrete(x, a.Curvature)
	t, moment := p.steel(x, a.Curvature)
	if a.Concrete = c; c != 0 {
		a.ConcreteDepth = first / c
	}
	a.Steel, a.Axial, a.Residual = t, p.Axial.Force, c-t-p.Axial.Force
	a.Moment = moment - first + p.Axial.moment()
	if most := balanced*math.Max(c, math.Abs(a.Axial)) + rounding*p.gross(x, a.Curvature); !(math.Abs(a.Residual) <= most) {
		if math.Abs(a.Residual) <= unseen*p.whole() {
			return Axis{}, &Refusal{NoTension, -1, t, 0}
		}
		return Axis{}, &Refusal{Unbalanced, -1, a.Residual, most}
	}
	return a, nil
}
