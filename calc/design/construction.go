package design

import (
	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/trace"
	"soffit/templates"
)

// building says that the bare member is justified while it is built: it carries a fresh topping, or construction loads. Where
// props carry it until the topping is hard, its situation on the props is not justified.
func (j *job) building() bool {
	return !j.propped() && (j.hasTopping() || j.anyLoad(func(a *member.Action, _ *member.Load) bool { return a.Kind.Text == "construction" && j.onBare(a) }))
}

// leadingInConstruction has each construction load on the bare member lead in turn, and each variable action said to act
// on it.
func leadingInConstruction(j *job) []combination {
	return j.leads(func(a *member.Action) bool { return a.Kind.Text != "permanent" && j.onBare(a) })
}

// constructionCombinations gives moments and shear forces on the bare member while it is built, by 6.10.
func (j *job) constructionCombinations(c *trace.Chapter) {
	list := leadingInConstruction(j)
	axis := j.n.Axis("construction combination", "combination while the member is built", "n", names(list))
	b := c.Block("construction", "Combinations while the member is built", j.stations, append(j.toppingTake(), trace.Take(j.parameters, j.actionData, j.effects)...)...)
	j.construction = b
	b.Text("construction", templates.Text("construction"))
	j.marks(b, axis, list)
	j.consequence(b)
	b.Step(ec2.ConstructionFactor)
	b.Step(pick(j.hasTopping(), ec2.ConstructionUpperFactorWithTopping, ec2.ConstructionUpperFactor))
	b.Step(ec2.ConstructionLowerFactor)
	b.Steps(ec2.ConstructionMoment, ec2.ConstructionMomentMin, ec2.ConstructionShearLeft, ec2.ConstructionShearRight, ec2.ConstructionShearLeftMin, ec2.ConstructionShearRightMin)
	b.Steps(ec2.ConstructionMomentEnvelope, ec2.ConstructionMomentEnvelopeMin, ec2.ConstructionShearLeftEnvelope, ec2.ConstructionShearRightEnvelope, ec2.ConstructionShearLeftEnvelopeMin, ec2.ConstructionShearRightEnvelopeMin)
	if j.axialWhileBuilt() {
		b.Steps(ec2.ConstructionAxial, ec2.ConstructionAxialMin, ec2.ConstructionAxialEnvelope, ec2.ConstructionAxialEnvelopeMin)
	}
	b.Row = j.midSpan()
	b.Table("along", "Moments and shear forces on the bare member along its length", j.stations, "actions.effects/position",
		"construction-moment", "construction-moment-least", "construction-shear-left", "construction-shear-left-least", "construction-shear-right", "construction-shear-right-least")
	j.effectsFigure(b, "Moments and shear forces on the bare member while it is built, at the ultimate limit state.", "construction-")
}
