package design

import (
	"soffit/calc/bending"
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/statics"
	"soffit/calc/trace"
	"soffit/templates"
)

// strips is in how many pieces the section is cut by the second method for its properties.
const strips = 4000

// secondChapter finds the main results again by other routes.
func (j *job) secondChapter(c *trace.Chapter) {
	b := c.Block("section", "Section by strips", nil, trace.Take(j.gross)...)
	b.Text("second", templates.Text("second"))
	p := j.shape.ByStrips(strips)
	const how = "the section cut into 4000 strips of equal height"
	b.Given(def("area", "A_{c,2}", "Area by strips", "mm²"), number(p.Area, "mm²", 0), how)
	b.Given(def("centroid", "y_{cg,2}", "Centroid by strips", "mm"), number(p.Centroid, "mm", 3), how)
	b.Given(def("inertia", "I_{c,2}", "Second moment of area by strips", "10⁶ mm⁴"), number(p.Inertia, "10⁶ mm⁴", 1), how)
	b.Steps(mechanics.AreaDifference, mechanics.CentroidDifference, mechanics.InertiaDifference)
	j.secondStatics(c)
	j.secondBending(c)
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

// secondBending finds the resistance at each station with fibres of concrete after the parabola–rectangle law.
func (j *job) secondBending(c *trace.Chapter) {
	b := c.Block("bending", "Bending with fibres after the parabola–rectangle law", j.stations, append(j.steel, trace.Take(j.resistance)...)...)
	b.Row = j.resistance.Row
	resisting, _ := b.Choose(ec2.Resists)
	b.On(resisting, func() {
		beam := bending.NewSection(j.shape)
		b.Found("fibres of concrete after the parabola–rectangle law, 3.1.7(1), balanced by a bracketed search", 6, func(r *trace.Row) ([]float64, error) {
			layers, err := j.layers(r)
			if err != nil {
				return nil, err
			}
			a, err := beam.Fibres(parabola(r), layers)
			return []float64{a.X, a.Moment}, err
		}, def("axis", "x_2", "Depth of the neutral axis with fibres", "mm"), def("resistance", "M_{Rd,2}", "Moment resistance with fibres", "kN·m"))
		b.Step(mechanics.ResistanceDifference)
		b.Table("along", "Moment resistance by both methods", j.stations, "actions.effects/position", "ultimate.bending/"+j.resistanceID(), "resistance", "resistance-difference")
	})
}
