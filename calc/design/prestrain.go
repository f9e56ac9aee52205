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
// topping also the strain that the member has when the topping is hard. Prestress near the compressed edge is the greatest.
func (j *job) prestrain(c *trace.Chapter, below bool) prestressed {
	prefix, where := pick(below, "hogging-", ""), pick(below, " where the moment hogs", "")
	view, places := pick(j.hasTopping(), j.toppedFromTop, j.fromTop), pick(j.hasTopping(), j.toppedPositions, j.positions)
	if below {
		view, places = pick(j.hasTopping(), j.toppedFromBelow, j.fromBelow), j.positionsBelow
	}
	counted := c.Block(prefix+"stress", "Stress of the tendons that is counted"+where, j.stations, trace.Take(view, places, j.along)...)
	counted.Row = j.midSpan()
	counted.Step(ec2.CountedStress)

	b := c.Block(prefix+"prestress", "Prestress and prestrain along the member"+where, j.stations,
		trace.Take(j.parameters, j.strengths, j.gross, j.tendons, j.tendonStrengths, j.actionData, j.effects, counted, j.positions)...)
	b.Row = j.midSpan()
	b.Steps(ec2.PrestressForce, ec2.PrestressMoment)
	if j.ducted() {
		b.Steps(ec2.SelfWeightMoment, ec2.ConcreteStressWhenGrouted)
	} else {
		b.Step(ec2.ConcreteStressAtTendon)
	}
	if !j.hasTopping() {
		b.Step(ec2.Prestrain)
		return prestressed{force: b, bare: []*trace.Block{b}}
	}
	b.Step(ec2.MemberPrestrain)
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
