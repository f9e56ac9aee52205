package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/trace"
)

// prestressed is the prestress that sagging or hogging is asked with, and the blocks that a way of asking takes for the strain of
// the steel before bending: of the bare member, and in the plane of the topping.
type prestressed struct {
	force        *trace.Block
	bare, topped []*trace.Block
}

// prestrain gives the prestress at each station, and the strain of the steel at zero strain of the concrete beside it; with a
// topping also the strain that the member has when the topping is hard. Where the member hogs, below, the prestress on the
// compressed side is the greatest.
func (j *job) prestrain(c *trace.Chapter, below bool) prestressed {
	takes := trace.Take(j.parameters, j.strengths, j.gross, j.tendons, j.tendonStrengths, j.along, j.actionData, j.effects)
	slug, title := "prestress", "Prestress and prestrain along the member"
	if below {
		b := c.Block("hogging-stress", "Stress of the tendons where the moment hogs", j.stations, trace.Take(j.fromBelow, j.positionsBelow, j.along)...)
		b.Row = j.midSpan()
		b.Step(ec2.HoggingStress)
		takes = append(takes, trace.Take(b)...)
		slug, title = "hogging-prestress", "Prestress and prestrain where the moment hogs"
	}
	b := c.Block(slug, title, j.stations, append(takes, trace.Take(j.positions)...)...)
	b.Row = j.midSpan()
	b.Steps(pick(below, ec2.HoggingForce, ec2.PrestressForce), pick(below, ec2.HoggingPrestressMoment, ec2.PrestressMoment))
	if j.ducted() {
		b.Steps(ec2.SelfWeightMoment, ec2.ConcreteStressWhenGrouted)
	} else {
		b.Step(ec2.ConcreteStressAtTendon)
	}
	if !j.hasTopping() {
		b.Step(pick(below, ec2.HoggingPrestrain, ec2.Prestrain))
		return prestressed{force: b, bare: []*trace.Block{b}}
	}
	b.Step(pick(below, ec2.HoggingMemberPrestrain, ec2.MemberPrestrain))
	return j.lockedIn(c, b, below)
}

// lockedIn gives the strains that the member has when the topping is hard, and the strain of the steel in the plane of the
// bare member and of the topping.
func (j *job) lockedIn(c *trace.Chapter, force *trace.Block, below bool) prestressed {
	prefix, where := pick(below, "hogging-", ""), pick(below, ", where the moment hogs", "")
	takes := trace.Take(j.strengths, j.section, j.gross, force, j.positions, j.effects, j.fibres)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData)...)
	}
	locked := c.Block(prefix+"locked-in", "Strains of the member when the topping is hard"+where, j.stations, takes...)
	locked.Row = j.midSpan()
	locked.Steps(ec2.LockedAxial, ec2.LockedCurvature, ec2.LockedAtTendons, ec2.LockedAtFibres)
	if j.hasBars() {
		locked.Step(ec2.LockedAtBars)
	}
	prestrain := func(slug, title string, steps ...*clause.Formula) *trace.Block {
		b := c.Block(prefix+slug, title+where, j.stations, trace.Take(j.section, j.gross, force, locked)...)
		b.Row = j.midSpan()
		b.Steps(steps...)
		return b
	}
	return prestressed{force: force,
		bare:   []*trace.Block{prestrain("bare-prestrain", "Prestrain of the bare member", ec2.BarePrestrain), force},
		topped: []*trace.Block{prestrain("topped-prestrain", "Prestrain with the topping", ec2.ToppedPrestrain, pick(below, ec2.LockedAtSoffit, ec2.LockedAtTop)), locked},
	}
}
