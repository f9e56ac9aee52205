package bending

import "math"

// Fibre is a piece of concrete that has one strain: that of the plane at its depth, and what is locked in.
type Fibre struct {
	Area   float64 // mm², 0 allowed
	Depth  float64 // mm from the compressed edge of the whole section
	Law    int     // index into the laws of the model
	Strain float64 // locked in, compression positive; it adds to the plane's
}

// FibreModel is a section as a list of fibres, of one concrete or several. The force of the concrete is the sum
// Σ A·σ_c(κ·(x − z) + ε_li) over the fibres and nothing else; how finely to cut is the caller's.
type FibreModel struct {
	Fibres []Fibre
	Laws   []Parabola // with N = 1, ε_c3 and ε_cu3 the bilinear law
	Depth  float64    // mm, of the whole section
	Limits
}

// Concrete gives the force of the fibres, N, and its moment about the compressed edge, N·mm, with the neutral
// axis of the plane at depth x, mm, and the curvature κ, 1/mm.
func (m *FibreModel) Concrete(x, curvature float64) (force, moment float64) {
	for i := range m.Fibres {
		f := &m.Fibres[i]
		n := f.Area * m.Laws[f.Law].Stress(curvature*(x-f.Depth)+f.Strain)
		force += n
		moment += n * f.Depth
	}
	return force, moment
}

// Axis finds the neutral axis of the plane and M_Rd. x is sought in (0, 10·Depth]. The curvature is the least
// of what Limits, the compression flange of the conditions and the strain limits of the layers allow; the
// prestrain of a layer is less the strain locked into the concrete beside it, compression positive. TopStrain
// is the plane's alone.
//
// Where the strain locked in compresses concrete that the plane does not, and steel is at its limit, little steel is
// balanced with the axis of the plane above the section: then X is negative, down to −10·Depth.
//
// An edge within the section that governs lets what lies above it go as the neutral axis goes down, so that more
// states than one may balance; they are told apart as NeutralAxis does it. All else as Fibres, with *Refusal for
// errors and nothing allocated unless it fails.
func (m *FibreModel) Axis(c Conditions, layers []Layer) (Axis, error) {
	if err := m.check(); err != nil {
		return Axis{}, err
	}
	p := problem{fibres: m, limits: &m.Limits, depth: m.Depth, layers: layers, curved: true, Conditions: c}
	for i := range m.Fibres {
		p.locked = p.locked || m.Fibres[i].Strain != 0
	}
	for _, l := range m.Laws {
		p.uneven = p.uneven || l != m.Laws[0] || l.EpsC2 > c.Flange.Strain
	}
	return p.solve(deepest * m.Depth)
}

// check refuses a model that is none.
func (m *FibreModel) check() error {
	if !(m.Depth > 0) || math.IsInf(m.Depth, 0) {
		return &Refusal{BadFibre, -1, m.Depth, math.Inf(1)}
	}
	for i := range m.Laws {
		if err := m.Laws[i].check(); err != nil {
			return err
		}
	}
	for i, f := range m.Fibres {
		bad := func(v float64) error { return &Refusal{BadFibre, i, v, m.Depth} }
		switch {
		case !(f.Area >= 0) || math.IsInf(f.Area, 0):
			return bad(f.Area)
		case !(f.Depth >= 0 && f.Depth <= m.Depth):
			return bad(f.Depth)
		case f.Law < 0 || f.Law >= len(m.Laws):
			return bad(float64(f.Law))
		case math.IsNaN(f.Strain) || math.IsInf(f.Strain, 0):
			return bad(f.Strain)
		}
	}
	if len(m.Fibres) == 0 {
		return &Refusal{BadFibre, -1, 0, m.Depth}
	}
	return m.Limits.check(m.Depth)
}
