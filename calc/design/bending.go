package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/trace"
	"soffit/templates"
)

// bending is the resistance of one section, 6.1, at every station at once.
func (j *job) bending(b *trace.Block) {
	b.Steps(ec2.PrestressForce, ec2.PrestressMoment, ec2.ConcreteStressAtTendon, ec2.Prestrain)
	b.Step(ec2.TendonCounts)
	if j.hasBars() {
		b.Step(ec2.BarCounts)
	}
	b.Step(pick(j.hasBars(), ec2.TensionSteelForceWithBars, ec2.TensionSteelForce))
	there, none := b.Choose(ec2.TensionSteelThere)
	b.On(there, func() { b.Step(pick(j.hasBars(), ec2.TensionDepthWithBars, ec2.TensionDepth)) })
	b.On(none, func() { b.Step(ec2.DepthWithoutTensionSteel) })
	b.Step(pick(j.hasBars(), ec2.LimitForceWithBars, ec2.LimitForce))
	anchored, bare := b.Choose(ec2.SteelAnchored)
	b.On(anchored, func() {
		b.On(j.trial(b), func() {
			b.Root(pick(j.hasBars(), ec2.AxisRootWithBars, ec2.AxisRoot), j.neutralAxis())
		})
		partly, wholly := b.Choose(ec2.PartlyCompressed)
		b.On(wholly, func() { b.Step(ec2.NoResistanceCompressed) })
		b.On(partly, func() {
			j.compatible(b)
			j.kindOfFailure(b, there)
		})
	})
	b.On(bare, func() { b.Step(ec2.NoResistance) })
	b.Check(ec2.BendingSufficient)
	if b.Has(ec2.ConcreteForce.ID) {
		j.bendingFigures(b)
	}
}

// trial takes every row of steel at its limit and finds where the block would lie. It returns the stations on
// which the trial does not stand, so that strains decide. The inclined branch has no limit to try.
func (j *job) trial(b *trace.Block) trace.Rows {
	if j.limited() {
		return b.Active()
	}
	b.Step(ec2.FlangeTrial)
	rectangle := j.m.Shape.Kind.Text == "rectangle"
	inFlange, below := b.Choose(pick(rectangle, ec2.BlockInRectangle, ec2.BlockInFlange))
	rest := j.stands(b, inFlange, ec2.TrialInFlange)
	if rectangle {
		return rest.Or(below)
	}
	inWeb := below
	b.On(below, func() {
		if !j.haunched() {
			return
		}
		var inHaunch trace.Rows
		inHaunch, inWeb = b.Choose(ec2.BlockInHaunch)
		b.On(inHaunch, func() { b.Steps(ec2.HaunchRest, ec2.HaunchDepth, ec2.HaunchTrial) })
		rest = rest.Or(j.stands(b, inHaunch, ec2.TrialInHaunch))
	})
	b.On(inWeb, func() {
		b.Step(ec2.WebTrial)
		above, deeper := b.Choose(ec2.BlockInWeb)
		rest = rest.Or(j.stands(b, above, ec2.TrialInWeb)).Or(deeper)
	})
	return rest
}

func (j *job) haunched() bool {
	return j.form.haunch.Quantity().Value > 0 && j.form.flange.Quantity().Value > j.form.web.Quantity().Value
}

// stands asks on some stations whether every row reaches its limit with the neutral axis of a trial, which then
// is the neutral axis. It returns the stations where one does not.
func (j *job) stands(b *trace.Block, rows trace.Rows, t ec2.Trial) trace.Rows {
	rest := rows.None()
	b.On(rows, func() {
		b.Step(t.Strain)
		yes, no := b.Choose(t.RowsYield)
		rest = no
		if j.hasBars() {
			b.On(yes, func() {
				b.Step(t.BarStrain)
				bars, not := b.Choose(t.BarsYield)
				yes, rest = bars, rest.Or(not)
			})
		}
		b.On(yes, func() { b.Step(t.Axis) })
	})
	return rest
}

// limited says that steel has a strain limit, so that the top fibre may stay below its ultimate strain.
func (j *job) limited() bool { return j.inclined() || (j.hasBars() && j.barInclined()) }

// curvature is the formula of κ for the steel diagrams chosen.
func (j *job) curvature() *clause.Formula {
	switch {
	case j.inclined() && j.hasBars() && j.barInclined():
		return ec2.CurvatureWithBothLimits
	case j.inclined():
		return ec2.CurvatureWithLimit
	case j.limited():
		return ec2.CurvatureWithBarLimit
	}
	return ec2.Curvature
}

// compatible gives strains, stresses and forces from the neutral axis, their balance, and the resistance.
func (j *job) compatible(b *trace.Block) {
	b.Steps(j.curvature(), ec2.TopStrain, ec2.TendonStrain)
	b.Step(pick(j.inclined(), ec2.TendonStressOnIncline, ec2.TendonStress))
	b.Step(ec2.TendonForce)
	if j.hasBars() {
		b.Step(ec2.BarStrain)
		b.Step(pick(j.barInclined(), ec2.BarStressOnIncline, ec2.BarStress))
		b.Step(ec2.BarForce)
	}
	if j.limited() {
		b.Text("graded", templates.Text("graded"))
		b.Steps(ec2.StrainRatio, ec2.ParabolaRest, ec2.Fullness, ec2.ParabolaMoment, ec2.ResultantDepth, ec2.FullFullness, ec2.FullResultantDepth)
		b.Steps(ec2.ReducedDepthFactor, ec2.ReducedStressFactor, ec2.ReducedBlockDepth, ec2.ReducedBlockStress)
	} else {
		b.Steps(ec2.BlockDepth, ec2.BlockStress)
	}
	b.Steps(ec2.BlockPartDepth, ec2.BlockPartWidth, ec2.BlockPartArea, ec2.BlockPartDepthOfCentroid)
	b.Steps(ec2.ConcreteForce, ec2.ConcreteForceDepth)
	b.Step(pick(j.hasBars(), ec2.ResidualWithBars, ec2.Residual))
	b.Prove(pick(j.hasBars(), ec2.AxisRootWithBars, ec2.AxisRoot))
	b.Step(ec2.TendonLever)
	if j.hasBars() {
		b.Step(ec2.BarLever)
	}
	b.Step(pick(j.hasBars(), ec2.ResistanceWithBars, ec2.Resistance))
}

// kindOfFailure says what ends the resistance: anchorage, steel or concrete. there is where steel in the tension zone is
// bonded.
func (j *job) kindOfFailure(b *trace.Block, there trace.Rows) {
	b.On(there, func() {
		b.Steps(ec2.AxisRatio, ec2.LeastAnchorage)
		anchored, _ := b.Choose(ec2.EveryRowAnchored)
		b.On(anchored, func() {
			b.Steps(ec2.OutermostBonded, ec2.OutermostStrain)
			b.Decide(ec2.OutermostYields)
			if j.limited() {
				b.Decide(ec2.ConcreteCrushes)
			}
		})
	})
}

// pick is a where yes, else b.
func pick[T any](yes bool, a, b T) T {
	if yes {
		return a
	}
	return b
}

func (j *job) bendingFigures(b *trace.Block) {
	at := j.stations.Rows[b.Row]
	if !trace.LineOf(j.n.Entry(b.Path() + "/" + ec2.ConcreteForce.ID)).Taken(b.Row) {
		at = j.largest(b.Path() + "/" + j.resistanceID()) // nothing resists where it is worst
	}
	plots := []trace.Plot{{Role: "height", Key: "given.section/part-height"}, {Role: "lower", Key: "given.section/part-lower"}, {Role: "upper", Key: "given.section/part-upper"},
		{Role: "h", Key: "given.section/depth"}, {Role: "neutral-axis", Key: j.axisKey(b, at)}, {Role: "block-depth", Key: pick(j.limited(), ec2.ReducedBlockDepth, ec2.BlockDepth).ID},
		{Role: "block-stress", Key: pick(j.limited(), ec2.ReducedBlockStress, ec2.BlockStress).ID}, {Role: "block-force", Key: "concrete-force"}, {Role: "block-centroid", Key: "concrete-force-depth"},
		{Role: "strain-top", Key: "top-strain"}, {Role: "depth", Key: "section.positions/tendon-depth"}, {Role: "prestrain", Key: "prestrain"},
		{Role: "count", Key: "given.tendons/count"}, {Role: "spacing", Key: "given.tendons/spacing"}, {Role: "diameter", Key: "given.tendons/diameter"},
		{Role: "strain", Key: "tendon-strain"}, {Role: "force", Key: "tendon-force"}, {Role: "lever", Key: "tendon-lever"},
		{Role: "resistance", Key: j.resistanceID()}}
	if j.hasBars() {
		plots = append(plots, trace.Plot{Role: "bar-count", Key: "given.bars/count"}, trace.Plot{Role: "bar-spacing", Key: "given.bars/spacing"}, trace.Plot{Role: "bar-diameter", Key: "given.bars/diameter"},
			trace.Plot{Role: "bar-depth", Key: "section.positions/bar-depth"}, trace.Plot{Role: "bar-strain", Key: "bar-strain"},
			trace.Plot{Role: "bar-force", Key: "bar-force"}, trace.Plot{Role: "bar-lever", Key: "bar-lever"})
	}
	b.Figure("section-diagram", "ultimate", "Strain, stress and forces at the ultimate limit state, "+at+".", at, plots...)
	resistance := j.resistanceID()
	b.Figure("envelope", "resistance", "Design moment and moment resistance along the span.", "",
		trace.Plot{Role: "x", Key: "actions.effects/position"}, trace.Plot{Role: "demand", Key: "actions.ultimate/moment"}, trace.Plot{Role: "resistance", Key: resistance},
		trace.Plot{Role: "support-A", Key: "given.span/bearing-a"}, trace.Plot{Role: "support-B", Key: "given.span/bearing-b"})
	b.Table("strains", "Strains and stresses of the rows along the span", j.stations, "actions.effects/position", j.curvature().ID, "tendon-strain", "tendon-stress"+pick(j.inclined(), "-inclined", ""))
	b.Table("along", "Bending along the span", j.stations, "actions.effects/position", pick(j.limited(), ec2.ReducedBlockDepth, ec2.BlockDepth).ID, "concrete-force", "concrete-force-depth", "actions.ultimate/moment", resistance, "bending-sufficient")
}

// resistanceID is the ID of the formula that gives M_Rd.
func (j *job) resistanceID() string {
	return pick(j.hasBars(), ec2.ResistanceWithBars, ec2.Resistance).ID
}

// axisKey is the entry that gives the neutral axis at a station.
func (j *job) axisKey(b *trace.Block, at string) string {
	for _, id := range []string{"axis-flange", "axis-haunch", "axis-web", "axis-root"} {
		if l := trace.LineOf(j.n.Entry(b.Path() + "/" + id)); l != nil && l.Taken(j.stations.Row(at)) {
			return id
		}
	}
	return "axis-root"
}
