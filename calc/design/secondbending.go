package design

import (
	"soffit/calc/bending"
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/section"
	"soffit/calc/trace"
)

// secondBending finds the resistance at each station again: the block by the parabola–rectangle law, integrated over the
// outline; fibres by the same law, integrated without cutting the section into fibres.
func (j *job) secondBending(c *trace.Chapter, q *asked) {
	takes := trace.Take(j.parameters, j.strengths, j.section, j.gross, j.tendons, j.tendonStrengths, j.along, q.view, q.places, q.block)
	takes = append(takes, trace.Take(q.prestrain...)...)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barsOf(q))...)
	}
	if q.topped {
		takes = append(takes, trace.Take(j.topping, j.composite, j.toppingStrengths)...)
	}
	if q.axial != nil {
		takes = append(takes, trace.Take(q.axial)...)
	}
	b := c.Block(q.block.Slug, pick(q.fibred, "Bending without fibres", "Bending after the parabola–rectangle law")+": "+lowered(q.title), j.stations, takes...)
	b.Row = q.block.Row
	b.On(j.rowsOf(q.block.Path()+"/"+j.sums(q).resistance.ID), func() {
		resisting, _ := b.Choose(ec2.Resists)
		b.On(resisting, func() {
			b.Found(pick(q.fibred, "the law of the concrete, 3.1.7, integrated over the outline of each concrete", "the parabola–rectangle law, 3.1.7(1), integrated over the outline")+", balanced by a bracketed search", 6,
				j.integrated(q), def("axis", "x_2", "Depth of the neutral axis", "mm"), def("resistance", "M_{Rd,2}", "Moment resistance", "kN·m"))
			b.Step(mechanics.ResistanceDifference)
			b.Table("along", "Moment resistance by both methods", j.stations, "actions.effects/position", q.block.Path()+"/"+j.sums(q).resistance.ID, "resistance", "resistance-difference")
		})
	})
}

// integrated finds axis and resistance with the concrete integrated over its outline.
func (j *job) integrated(q *asked) func(*trace.Row) ([]float64, error) {
	beam := q.beam(j.shape)
	return func(r *trace.Row) ([]float64, error) {
		layers, err := j.layers(r, q)
		if err != nil {
			return nil, err
		}
		c := j.conditions(r, q)
		c.Narrowing = 0
		var axis bending.Axis
		switch {
		case q.topped:
			axis, err = bending.CompositeFibres(j.bodies(r, q, beam), j.limits(r, q), c, layers)
		case q.fibred:
			axis, err = beam.FibresUnder(c, j.laws(r, q)[0], layers)
		default:
			if c.Flange.Depth > 0 {
				c.Flange.Strain = r.Value("ε_c2")
			}
			axis, err = beam.FibresUnder(c, parabola(r), layers)
		}
		return []float64{axis.X, axis.Moment}, j.inWords(err, r, q)
	}
}

// bodies are member and topping, from the compressed edge, with the strain locked in.
func (j *job) bodies(r *trace.Row, q *asked, beam *bending.Section) []bending.Body {
	laws := j.laws(r, q)
	slab, err := section.Rectangle(r.Value("b_top"), r.Value("h_top"))
	if err != nil {
		return nil
	}
	topping := bending.Body{Section: bending.NewSection(slab), Law: laws[1]}
	member := bending.Body{Section: beam, Law: laws[0], Strain: r.Value("ε_le")}
	if q.below {
		topping.Offset = r.Value("h")
		member.Slope = r.Value("κ_0") // the strain grows upward where the curvature sags
	} else {
		member.Offset = r.Value("h_top")
		member.Slope = -r.Value("κ_0")
	}
	return []bending.Body{topping, member}
}
