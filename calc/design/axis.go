package design

import (
	"errors"
	"fmt"
	"math"

	"soffit/calc/bending"
	"soffit/calc/trace"
)

// neutralAxis proposes x from compatible strains, by the kernel.
func (j *job) neutralAxis() func(*trace.Row) (trace.Proposal, error) {
	beam := bending.NewSection(j.shape)
	return func(r *trace.Row) (trace.Proposal, error) {
		layers, err := j.layers(r)
		if err != nil {
			return trace.Proposal{}, err
		}
		block := bending.BlockLaw{Lambda: r.Value("λ"), EtaFcd: r.Value("η") * r.Value("f_cd"), EpsCu: r.Value("ε_cu3")}
		var axis bending.Axis
		if j.limited() {
			axis, err = beam.GradedAxis(bending.Graded{BlockLaw: block, Parabola: parabola(r)}, layers)
		} else {
			axis, err = beam.NeutralAxis(block, layers)
		}
		return trace.Proposal{X: axis.X, Lo: axis.Lo, Hi: axis.Hi}, inWords(err)
	}
}

// inWords says of a section without a neutral axis what an engineer can do about it.
func inWords(err error) error {
	var r *bending.Refusal
	if errors.As(err, &r) && r.Reason == bending.WhollyCompressed {
		return fmt.Errorf("the steel pulls with %.0f kN where the whole section in compression gives %.0f kN at most: take out tendons, or enlarge the section", r.Have/1e3, r.Limit/1e3)
	}
	return err
}

// parabola is the parabola–rectangle law at a station.
func parabola(r *trace.Row) bending.Parabola {
	return bending.Parabola{N: r.Value("n"), EpsC2: r.Value("ε_c2"), EpsCu2: r.Value("ε_cu2"), Fcd: r.Value("f_cd")}
}

// layers are the rows of steel at a station for the kernels.
func (j *job) layers(r *trace.Row) ([]bending.Layer, error) {
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
	for i := range area {
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
		out = append(out, bending.Layer{Area: area[i], Depth: depth[i], Cap: limit[i], Law: law})
	}
	return out, nil
}
