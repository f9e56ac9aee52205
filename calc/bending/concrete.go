package bending

import (
	"math"

	"soffit/calc/solve"
)

// BlockLaw is the rectangular stress block (EN 1992-1-1, 3.1.7(3)): the stress EtaFcd (η·f_cd, MPa) over
// the depth Lambda·x below the top fibre, whose strain is EpsCu (ε_cu3) unless steel reaches its limit
// first. Any code's block serves.
type BlockLaw struct{ Lambda, EtaFcd, EpsCu float64 }

// Parabola is the parabola–rectangle law (EN 1992-1-1, 3.1.7(1), 3.17 and 3.18): the stress
// Fcd·(1 − (1 − ε/EpsC2)^N), Fcd (MPa) from EpsC2 on, up to EpsCu2 (ε_c2, ε_cu2).
type Parabola struct{ N, EpsC2, EpsCu2, Fcd float64 }

// check refuses a block that is none.
func (l BlockLaw) check() error {
	switch {
	case !(l.Lambda > 0 && l.Lambda <= 1):
		return &Refusal{BadConcrete, -1, l.Lambda, 1}
	case !(l.EtaFcd > 0) || math.IsInf(l.EtaFcd, 0):
		return &Refusal{BadConcrete, -1, l.EtaFcd, math.Inf(1)}
	case !(l.EpsCu > 0) || math.IsInf(l.EpsCu, 0):
		return &Refusal{BadConcrete, -1, l.EpsCu, math.Inf(1)}
	}
	return nil
}

// check refuses a parabola that is none.
func (p Parabola) check() error {
	switch {
	case !(p.N >= 1) || math.IsInf(p.N, 0):
		return &Refusal{BadConcrete, -1, p.N, math.Inf(1)}
	case !(p.EpsCu2 > 0) || math.IsInf(p.EpsCu2, 0):
		return &Refusal{BadConcrete, -1, p.EpsCu2, math.Inf(1)}
	case !(p.EpsC2 > 0 && p.EpsC2 <= p.EpsCu2):
		return &Refusal{BadConcrete, -1, p.EpsC2, p.EpsCu2}
	case !(p.Fcd > 0) || math.IsInf(p.Fcd, 0):
		return &Refusal{BadConcrete, -1, p.Fcd, math.Inf(1)}
	}
	return nil
}

// Stress is the stress in MPa at a strain, compression positive in both; 0 at strains below 0.
func (p Parabola) Stress(strain float64) float64 {
	w := strain / p.EpsC2
	switch {
	case !(w > 0):
		return 0
	case w >= 1:
		return p.Fcd
	}
	return p.Fcd * rise(p.N, w)
}

// rise is 1 − (1 − w)^n for w in [0, 1), true also for small w.
func rise(n, w float64) float64 {
	switch n {
	case 1:
		return w
	case 2:
		return w * (2 - w)
	}
	return -math.Expm1(n * math.Log1p(-w))
}

// Block gives the force, N, and its moment about the top fibre, N·mm, of the stress block with the neutral
// axis at depth x, mm. The depth λ·x is taken into [0, Height].
func (s *Section) Block(law BlockLaw, x float64) (force, moment float64) {
	area, first := s.Above(law.Lambda * x)
	return law.EtaFcd * area, law.EtaFcd * first
}

// Compression gives the force, N, and its moment about the top fibre, N·mm, of concrete by the
// parabola–rectangle law, with the neutral axis at depth x, mm, and the curvature κ, 1/mm, both above 0: the
// strain at depth z is κ·(x − z). The integrals are exact but for rounding, slab by slab; those of round parts
// where the stress varies are by quadrature, to 1e-10 of each part for n up to 2.
func (s *Section) Compression(law Parabola, x, curvature float64) (force, moment float64) {
	l := law.EpsC2 / curvature // depth over which the strain falls by ε_c2
	z0 := x - l                // where the strain is ε_c2
	start, end := math.Max(0, z0), math.Min(x, s.height)
	area, first := s.Above(start)
	for i := range s.slabs {
		b := &s.slabs[i]
		from, to := math.Max(start, b.top), math.Min(end, b.foot)
		if to <= from {
			continue
		}
		var a, f float64
		if to-from < gentle*(to-z0) {
			a, f = b.byPoints(law, x, l, from, to)
		} else {
			a, f = b.closed(law, z0, l, from, to)
		}
		area += a
		first += f
	}
	for i := range s.rounds {
		c := &s.rounds[i]
		if from, to := math.Max(start, c.top), math.Min(end, c.foot); from < to {
			a, f := c.compressed(law, x, l, from, to)
			area += a
			first += f
		}
	}
	return law.Fcd * area, law.Fcd * first
}

// gentle is the part of its distance from z0 below which a piece is integrated by points: there the law is
// so smooth that five points are exact to rounding, and the closed form would take the difference of powers
// that are nearly alike.
const gentle = 0.2

// closed integrates σ_c/f_cd = 1 − v^n, v = (z − z0)/l, times the width, and times width and depth, over the
// depths from to to of the slab, by antiderivatives.
func (b *slab) closed(law Parabola, z0, l, from, to float64) (area, first float64) {
	v1, v2 := (from-z0)/l, (to-z0)/l
	p1, p2 := v1*power(v1, law.N), v2*power(v2, law.N)
	i0 := (p2 - p1) / (law.N + 1) // of v^n
	p1, p2 = p1*v1, p2*v2
	i1 := (p2 - p1) / (law.N + 2) // of v^(n+1)
	p1, p2 = p1*v1, p2*v2
	i2 := (p2 - p1) / (law.N + 3) // of v^(n+2)
	// The width is β0 + β1·v, the depth z0 + l·v.
	beta1 := b.slope * l
	beta0 := b.width + b.slope*(z0-b.top)
	a1, f1 := b.upTo(from)
	a2, f2 := b.upTo(to)
	return a2 - a1 - l*(beta0*i0+beta1*i1),
		f2 - f1 - l*(z0*(beta0*i0+beta1*i1)+l*(beta0*i1+beta1*i2))
}

// byPoints integrates as closed does, by quadrature.
func (b *slab) byPoints(law Parabola, x, l, from, to float64) (area, first float64) {
	middle, half := (from+to)/2, (to-from)/2
	for _, p := range solve.Legendre {
		z := middle + half*p.Place
		a := p.Weight * half * (b.width + b.slope*(z-b.top)) * rise(law.N, (x-z)/l)
		area += a
		first += a * z
	}
	return area, first
}

// power is v^n for v ≥ 0.
func power(v, n float64) float64 {
	switch n {
	case 1:
		return v
	case 2:
		return v * v
	}
	return math.Exp(n * math.Log(v)) // a third of the time of math.Pow
}
