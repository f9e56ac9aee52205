package design

import (
	"errors"
	"math"

	"soffit/calc/bending"
	"soffit/calc/trace"
)

// neutralAxis proposes x from compatible strains, by the kernel.
func (j *job) neutralAxis(q *asked) func(*trace.Row) (trace.Proposal, error) {
	beam := q.beam(j.shape)
	return func(r *trace.Row) (trace.Proposal, error) {
		layers, err := j.layers(r, q)
		if err != nil {
			return trace.Proposal{}, err
		}
		var axis bending.Axis
		switch c := j.conditions(r, q); {
		case q.fibred:
			m := j.fibreModel(r, q)
			axis, err = m.Axis(c, layers)
		case j.limited() || c.Flange.Depth > 0:
			axis, err = beam.GradedAxisUnder(c, bending.Graded{BlockLaw: block(r), Parabola: parabola(r)}, layers)
		default:
			axis, err = beam.NeutralAxisUnder(c, block(r), layers)
		}
		if err == nil && axis.X <= 0 {
			err = errors.New("with the strain locked in, the steel reaches its strain limit before the plane of strain has a neutral axis in the section: write more steel, or the horizontal branch")
		}
		return trace.Proposal{X: axis.X, Lo: axis.Lo, Hi: axis.Hi}, j.inWords(err, r, q)
	}
}

// conditions are what the section is under besides the moment.
func (j *job) conditions(r *trace.Row, q *asked) bending.Conditions {
	var c bending.Conditions
	if q.axial != nil {
		c.Axial = bending.Axial{Force: r.Value("N_Ed"), Depth: r.Value("z_ax")}
	}
	if j.flanged(q) {
		c.Flange = bending.CompressionFlange{Depth: r.Value("z_fl"), Strain: j.flangeStrain(r, q)}
	}
	if !q.fibred && j.narrowing(q) {
		c.Narrowing = 0.9
	}
	return c
}

// flangeStrain is the greatest mean strain of a compression flange.
func (j *job) flangeStrain(r *trace.Row, q *asked) float64 {
	switch {
	case q.topped && q.below:
		return r.Value("ε_cy") - r.Value("ε_le")
	case q.topped:
		return r.Value("ε_{cy,t}")
	case q.fibred:
		return r.Value("ε_cy")
	}
	return r.Value("ε_c3")
}

// block is the rectangular block at a station.
func block(r *trace.Row) bending.BlockLaw {
	return bending.BlockLaw{Lambda: r.Value("λ"), EtaFcd: r.Value("η") * r.Value("f_cd"), EpsCu: r.Value("ε_cu3")}
}

// parabola is the parabola–rectangle law at a station.
func parabola(r *trace.Row) bending.Parabola {
	return bending.Parabola{N: r.Value("n"), EpsC2: r.Value("ε_c2"), EpsCu2: r.Value("ε_cu2"), Fcd: r.Value("f_cd")}
}

// laws are those of the fibres: of the member, and of the topping.
func (j *job) laws(r *trace.Row, q *asked) []bending.Parabola {
	out := []bending.Parabola{{N: r.Value("n_σ"), EpsC2: r.Value("ε_cy"), EpsCu2: r.Value("ε_cu"), Fcd: r.Value("f_cd")}}
	if q.topped {
		out = append(out, bending.Parabola{N: r.Value("n_{σ,t}"), EpsC2: r.Value("ε_{cy,t}"), EpsCu2: r.Value("ε_{cu,t}"), Fcd: r.Value("f_{cd,t}")})
	}
	return out
}

// fibreModel is the section as the fibres that the record sums.
func (j *job) fibreModel(r *trace.Row, q *asked) *bending.FibreModel {
	area, depth := r.Column("A_{f,m}"), r.Column("z_{f,m}")
	m := &bending.FibreModel{Fibres: make([]bending.Fibre, len(area)), Laws: j.laws(r, q), Depth: r.Value("h_v"), Limits: j.limits(r, q)}
	for i := range area {
		m.Fibres[i] = bending.Fibre{Area: area[i], Depth: depth[i]}
	}
	if q.topped {
		topping, locked := r.Column("k_{t,m}"), r.Column("ε_{lf,m}")
		for i := range area {
			m.Fibres[i].Law, m.Fibres[i].Strain = int(topping[i]), locked[i]
		}
	}
	return m
}

// limits are the strains that the concretes may have at their compressed edges.
func (j *job) limits(r *trace.Row, q *asked) bending.Limits {
	l := j.laws(r, q)
	edge := func(law bending.Parabola, depth, locked float64) bending.EdgeLimit {
		return bending.EdgeLimit{Depth: depth, Strain: locked, EpsCu: law.EpsCu2}
	}
	switch {
	case !q.topped:
		return bending.Limits{Edges: []bending.EdgeLimit{edge(l[0], 0, 0)}, Core: bending.Core{EpsC2: l[0].EpsC2, EpsCu: l[0].EpsCu2}}
	case q.below:
		locked := r.Value("ε_le")
		return bending.Limits{Edges: []bending.EdgeLimit{edge(l[0], 0, locked), edge(l[1], r.Value("h_v")-r.Value("h_top"), 0)},
			Core: bending.Core{EpsC2: l[0].EpsC2 - locked, EpsCu: l[0].EpsCu2 - locked}}
	}
	return bending.Limits{Edges: []bending.EdgeLimit{edge(l[1], 0, 0), edge(l[0], r.Value("h_top"), r.Value("ε_le"))}, Core: bending.Core{EpsC2: l[1].EpsC2, EpsCu: l[1].EpsCu2}}
}

// layers are the rows of steel at a station for the kernels.
func (j *job) layers(r *trace.Row, q *asked) ([]bending.Layer, error) {
	area, depth, prestrain, limit := r.Column("A_{p,i}"), r.Column("d_{p,i}"), r.Column("ε_{p0,i}"), r.Column("σ_{av,i}")
	modulus, design := r.Column("E_{p,i}"), r.Column("f_{pd,i}")
	var out []bending.Layer
	for i := range area {
		law, err := bending.Horizontal(modulus[i], design[i])
		if j.inclined() {
			law, err = bending.Inclined(modulus[i], design[i], r.Column("f_{pk,i}")[i]/r.Value("γ_S"), r.Column("ε_{puk,i}")[i], r.Column("ε_{pud,i}")[i])
		}
		if err == nil && limit[i] < design[i] { // slips before it yields: no strain limit
			law, err = law.WithLimit(math.Inf(1))
		}
		if err != nil {
			return nil, err
		}
		out = append(out, bending.Layer{Area: area[i], Depth: depth[i], Prestrain: prestrain[i], Cap: limit[i], Law: law})
	}
	if !j.hasBars() {
		return out, nil
	}
	area, depth, limit, design = r.Column("A_{s,j}"), r.Column("d_{s,j}"), r.Column("σ_{sa,j}"), r.Column("f_{yd,j}")
	locked := make([]float64, len(area))
	if q.topped {
		locked = r.Column("ε_{s0,j}")
	}
	for i := range area {
		if area[i] == 0 { // in a topping that is not there yet
			continue
		}
		law, err := bending.Horizontal(r.Value("E_s"), design[i])
		if j.barInclined() {
			law, err = bending.Inclined(r.Value("E_s"), design[i], design[i]*r.Column("k_{s,j}")[i], r.Column("ε_{suk,j}")[i], r.Column("ε_{sud,j}")[i])
		}
		if err == nil && limit[i] < design[i] {
			law, err = law.WithLimit(math.Inf(1))
		}
		if err != nil {
			return nil, err
		}
		out = append(out, bending.Layer{Area: area[i], Depth: depth[i], Prestrain: locked[i], Cap: limit[i], Law: law})
	}
	return out, nil
}
