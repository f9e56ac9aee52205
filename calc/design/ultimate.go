package design

import (
	"soffit/calc/ec2"
	"soffit/calc/trace"
	"soffit/templates"
)

// ultimateChapter justifies the member in bending, 6.1, with what anchorage, shear and failure with warning ask of it.
func (j *job) ultimateChapter(c *trace.Chapter) {
	j.steel = trace.Take(j.parameters, j.strengths, j.section, j.gross, j.positions, j.tendons, j.tendonStrengths, j.ultimate, j.along)
	if j.hasBars() {
		j.steel = append(j.steel, trace.Take(j.barData, j.barStrengths)...)
	}
	b := c.Block("bending", "Resistance along the span, sagging", j.stations, j.steel...)
	j.resistance = b
	b.Text("bending", templates.Text("bending"))
	j.bending(b)
	j.cracked(c)
	j.steelLimits(c)
	j.hogging(c)
}

// largest is the station with the largest value of a recorded column.
func (j *job) largest(key string) string {
	l := trace.LineOf(j.n.Entry(key))
	if l == nil {
		return j.stations.Rows[0]
	}
	best := 0
	for i, v := range l.Values {
		if v > l.Values[best] {
			best = i
		}
	}
	return j.stations.Rows[best]
}

// cracked goes through the stations that crack in bending at the ultimate limit state: there the tendons must carry the
// tension that shear adds (8.10.2.3(1), 6.2.3(7)), and failure must announce itself when the load grows (5.10.1(5)P).
func (j *job) cracked(c *trace.Chapter) {
	at := j.largest("actions.ultimate/moment")
	most := c.Block("largest-moment", "Largest moment of the span, "+at, nil, trace.At(j.ultimate, at))
	most.Step(ec2.LargestMoment)

	takes := trace.Take(j.parameters, j.strengths, j.section, j.gross, j.tendonStrengths, j.positions, j.ultimate, j.along, j.resistance, most)
	b := c.Block("cracked", "Where the section cracks at the ultimate limit state", j.stations, takes...)
	b.Row = j.resistance.Row
	b.Text("cracked", templates.Text("cracked"))
	b.Require(ec2.NoLargerMoment)
	b.Step(ec2.BottomStress)
	cracked, _ := b.Choose(ec2.CrackedAtUltimate)
	b.On(cracked, func() {
		resisting, _ := b.Choose(ec2.Resists)
		b.On(resisting, func() { j.withShear(b) })
	})
	if !b.Has("failure-with-warning") {
		return
	}
	b.Table("along", "Stations along the span: cracks, tension added by shear, warning", j.stations, "actions.effects/position", "bottom-stress", "added-moment", "moment-with-shear", "bending-with-shear", "cracking-moment", "failure-with-warning")
}

// withShear adds the tension of the shear force where the section cracks, and asks for cracks before failure.
func (j *job) withShear(b *trace.Block) {
	b.Step(ec2.LargestShear)
	b.Steps(ec2.LeverArm, ec2.AddedMoment, ec2.MomentWithShear)
	b.Check(ec2.BendingWithShear)
	b.Text("warning", templates.Text("warning"))
	b.Steps(ec2.InitialForce, ec2.InitialMoment, ec2.CrackingMoment)
	b.Check(ec2.FailureWithWarning)
}

// steelLimits checks minimum steel at every station where steel is bonded in the tension zone, and maximum steel.
func (j *job) steelLimits(c *trace.Chapter) {
	takes := trace.Take(j.parameters, j.concrete, j.strengths, j.section, j.gross, j.positions, j.tendons, j.tendonStrengths, j.stress, j.along, j.resistance)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barStrengths)...)
	}
	b := c.Block("steel-limits", "Minimum and maximum steel", j.stations, takes...)
	b.Row = j.resistance.Row
	b.Text("minimum", templates.Text("minimum"))
	strength, source := plain("500", "MPa"), "no bars: a usual strength to express the minimum in; it cancels but in 0.0013·b_t·d"
	if j.hasBars() {
		r := j.m.Bars.Rows[0]
		strength, source = r.Fyk.Literal, given(r.Fyk)
	}
	b.Given(def("reference-strength", "f_yk", "Yield strength that the minimum is expressed in", "MPa"), strength, source)
	b.Steps(ec2.TensionPartDepth, ec2.TensionPartArea, ec2.TensionWidth)
	minimum, _ := j.formula(ec2.MinimumSteel)
	b.Step(minimum)
	if minimum != ec2.MinimumSteel {
		b.Require(ec2.MinimumSteelPositive)
	}
	b.Step(pick(j.hasBars(), ec2.TensionSteelWithBars, ec2.TensionSteel))
	b.Check(ec2.MinimumSteelProvided)
	maximum, _ := j.formula(ec2.MaximumSteel)
	b.Step(maximum)
	if maximum != ec2.MaximumSteel {
		b.Require(ec2.MaximumSteelPositive)
	}
	b.Step(pick(j.hasBars(), ec2.TotalSteelWithBars, ec2.TotalSteel))
	b.Check(ec2.MaximumSteelKept)
}

// hogging checks the stations where the least moment is negative: the ends beyond the bearings.
func (j *job) hogging(c *trace.Chapter) {
	b := c.Block("hogging", "Hogging moments of the loads", j.stations, trace.Take(j.parameters, j.strengths, j.gross, j.ultimate)...)
	yes, _ := b.Choose(ec2.Hogging)
	b.On(yes, func() {
		b.Steps(ec2.OverhangStress, ec2.PlainTensileStrength)
		b.Check(ec2.HoggingResisted)
	})
}
