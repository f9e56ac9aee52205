package bending

import (
	"math"

	"soffit/calc/section"
	"soffit/calc/solve"
)

// round is a curve of a shape seen from the top: Level is the depth of its centre.
type round struct {
	section.Curve
	top, foot    float64 // depths
	area, moment float64 // of the whole, negative for voids
	times        float64 // number of circles, negative for voids
}

func newRound(c section.Curve) round {
	r := round{Curve: c, top: c.Foot(), foot: c.Top(), times: float64(c.Count)}
	if !c.Solid {
		r.times = -r.times
	}
	r.area, r.moment = c.Below(r.foot)
	return r
}

// above gives what the round part adds above the depth z to the area and its moment about the top fibre.
func (r *round) above(z float64) (area, moment float64) {
	switch {
	case z <= r.top:
		return 0, 0
	case z >= r.foot:
		return r.area, r.moment
	}
	return r.Below(z)
}

// compressed integrates σ_c/f_cd over what the round part has between the depths from and to, within itself
// and the strains between ε_c2 and 0: area and moment about the top fibre.
//
// The place is taken as z = c − r·cos θ, which makes chord times dz smooth to the tips: 2·r²·sin²θ·dθ. Where n
// is not whole, v^n is rough at ε_c2, which may lie at the upper end of the range or just above it; there
// θ = θ_1 + (θ_2 − θ_1)·u² brings the points together.
func (r *round) compressed(law Parabola, x, l, from, to float64) (area, first float64) {
	rad := r.Radius
	tip := r.Level - rad
	t1, t2 := halfAngle(from-tip, rad), halfAngle(to-tip, rad) // θ/2
	span := t2 - t1
	rough := law.N != 2 && law.N != 1
	for _, p := range solve.Legendre16 {
		u := (1 + p.Place) / 2
		weight := p.Weight * span // of dθ: twice that of dθ/2, over a range of u of half the rule's
		if rough {
			weight *= 2 * u
			u *= u
		}
		sin, cos := math.Sincos(t1 + span*u)
		z := tip + 2*rad*sin*sin
		chord := 2 * rad * sin * cos // r·sin θ: half of it
		a := weight * 2 * chord * chord * law.share((x-z)/l)
		area += a
		first += a * z
	}
	return r.times * area, r.times * first
}

// halfAngle is half the angle from the tip of a circle to the level s beyond it: cos θ = 1 − s/r.
func halfAngle(s, rad float64) float64 {
	return math.Asin(math.Sqrt(math.Max(0, math.Min(1, s/(2*rad)))))
}

// share is the stress as part of f_cd where the strain is w·ε_c2, w in [0, 1].
func (p Parabola) share(w float64) float64 {
	switch {
	case !(w > 0):
		return 0
	case w >= 1:
		return 1
	case p.N == 2:
		return w * (2 - w)
	case w > 0.5:
		return 1 - power(1-w, p.N)
	}
	return rise(p.N, w)
}
