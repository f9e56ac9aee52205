package design

import (
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// sectionChapter gives the properties of the gross concrete section and the places of the steel in it.
func (j *job) sectionChapter(c *trace.Chapter) {
	b := c.Block("gross", "Gross concrete section", nil, trace.Take(j.concrete, j.section)...)
	j.gross = b
	b.Steps(mechanics.PartArea, mechanics.PartCentroid, mechanics.PartInertia)
	b.Steps(mechanics.Area, mechanics.Centroid, mechanics.Inertia, mechanics.LowerModulus, mechanics.UpperModulus)
	b.Step(mechanics.SelfWeight)

	takes := trace.Take(j.section, j.gross, j.tendons)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData)...)
	}
	b = c.Block("positions", "Places of the steel", nil, takes...)
	j.positions = b
	b.Steps(mechanics.Eccentricity, mechanics.TendonDepth)
	if j.hasBars() {
		b.Step(mechanics.BarDepth)
	}

	b = c.Block("flange", pick(j.m.Shape.Kind.Text == "rectangle", "Span", "Span and effective flange"), nil, trace.Take(j.section, j.span)...)
	j.spanLength = b
	b.Step(mechanics.Span)
	if j.m.Shape.Kind.Text != "rectangle" {
		b.Steps(mechanics.FlangeOverhang, ec2.EffectiveFlange)
		_, no := b.Choose(ec2.WholeFlange)
		b.On(no, func() { b.Check(ec2.FlangeEffective) })
	}
}
