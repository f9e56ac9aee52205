package design

import (
	"soffit/calc/mechanics"
	"soffit/calc/statics"
	"soffit/calc/trace"
)

// secondChapter finds the main results again by other routes.
func (j *job) secondChapter(c *trace.Chapter) {
	j.secondSection(c)
	j.secondStatics(c)
	for _, q := range j.asked {
		j.secondBending(c, q)
	}
	j.validation(c)
}

// secondStatics weighs the loads with the influence lines of each station, which need no reaction.
func (j *job) secondStatics(c *trace.Chapter) {
	b := c.Block("statics", "Moments from influence lines", j.stations, trace.Take(j.span, j.actionData, j.reactions, j.effects)...)
	b.Row = j.midSpan()
	b.Found("influence lines drawn from the movement of the beam as a mechanism", 6, func(r *trace.Row) ([]float64, error) {
		q, f, from, to := r.Column("q_i"), r.Column("F_i"), r.Column("a_i"), r.Column("b_i")
		loads := make([]statics.Load, len(q))
		for i := range loads {
			loads[i] = statics.Load{Force: f[i], Intensity: q[i], From: from[i], To: to[i]}
		}
		s, err := statics.Beam{Length: r.Value("L"), A: r.Value("x_A"), B: r.Value("x_B")}.Load(loads...)
		if err != nil {
			return nil, err
		}
		m, _ := s.ByInfluence(r.Value("x_m"), pieces)
		return []float64{m}, nil
	}, def("moment", "M_2", "Moment of all loads together, unfactored, from influence lines", "kN·m"))
	b.Steps(mechanics.SumOfMoments, mechanics.MomentDifference)
}

// pieces is in how many pieces an influence line is cut.
const pieces = 500
