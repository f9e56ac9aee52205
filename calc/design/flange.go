package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// noFlange says of shapes why no effective width is asked for.
var noFlange = map[string]string{
	"inverted T":  "No flange is compressed where the moment sags: the ledge lies at the soffit, and its effective width is not checked.",
	"U":           "The top edges are those of the webs: there is no compressed flange beyond them.",
	"hollow unit": "A hollow unit is taken over its whole width: its webs stand close together.",
	"polygon":     "A polygon is taken over its whole width: no effective width is checked.",
}

// flangeSection gives the span and holds compressed flange and topping against their effective widths, 5.3.2.1.
func (j *job) flangeSection(c *trace.Chapter) {
	kind := j.m.Shape.Kind.Text
	wide := kind == "T" || kind == "I" || kind == "double T" || kind == "box"
	takes := trace.Take(j.section, j.fromTop, j.span)
	if j.hasTopping() {
		takes = append(takes, trace.Take(j.topping)...)
	}
	b := c.Block("flange", pick(wide || j.hasTopping(), "Span and effective flange", "Span"), nil, takes...)
	j.spanLength = b
	b.Step(mechanics.Span)
	if wide || j.hasTopping() {
		b.Text("flanges", "Flanges in tension and flanges that hogging compresses are not checked for their effective width.")
		switch overA, overB := j.overhangs(); {
		case overA && overB:
			b.Step(ec2.ZeroMomentsBetweenTwo)
		case overA || overB:
			b.Step(ec2.ZeroMomentsBetweenOverhangs)
		default:
			b.Step(ec2.ZeroMoments)
		}
	}
	b.Text("no-flange", noFlange[kind])
	switch kind {
	case "T", "I":
		b.Steps(mechanics.FlangeOverhang, ec2.EffectiveFlange)
	case "double T", "box":
		j.stems(b)
		b.Steps(mechanics.StemOverhang, mechanics.BetweenStems, ec2.EffectiveFlangeOnStems)
	}
	if wide {
		effective(b, ec2.WholeFlange, ec2.FlangeEffective)
	}
	if j.hasTopping() {
		if kind == "U" {
			j.stems(b)
			b.Steps(mechanics.ToppingOverhangOnStems, mechanics.BetweenStems, ec2.EffectiveToppingOnStems)
		} else {
			b.Steps(mechanics.ToppingOverhang, ec2.EffectiveTopping)
		}
		effective(b, ec2.WholeTopping, ec2.ToppingEffective)
	}
}

// effective holds a width against its effective part where it is more.
func effective(b *trace.Block, whole *clause.Condition, check *clause.Check) {
	_, no := b.Choose(whole)
	b.On(no, func() { b.Check(check) })
}

// stems records the two webs under a slab: stems of a double T, webs of a box or a trough.
func (j *job) stems(b *trace.Block) {
	s := &j.m.Shape
	spacing, width := s.StemSpacing.Literal, s.StemWidthFlange.Literal
	from, of := given(s.StemSpacing), given(s.StemWidthFlange)
	switch s.Kind.Text {
	case "U":
		spacing, from = mm(s.TopWidth.Base()-s.WebThickness.Base()), "top width less web thickness, "+lines(s.TopWidth.Origin, s.WebThickness.Origin)
		width, of = s.WebThickness.Literal, given(s.WebThickness)
	case "box":
		spacing, from = mm(s.Width.Base()-s.WebThickness.Base()), "width less web thickness, "+lines(s.Width.Origin, s.WebThickness.Origin)
		width, of = s.WebThickness.Literal, given(s.WebThickness)
	}
	b.Given(def("stem-spacing", "s_w", "Distance between the axes of the webs", "mm"), spacing, from)
	b.Given(def("stem-width", "b_w", "Width of one web under the flange", "mm"), width, of)
}
