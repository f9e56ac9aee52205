package design

import (
	"math"

	"soffit/calc/bending"
	"soffit/calc/clause"
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
	j.narrative(b, "ultimate")
	b.Text("bending", templates.Text("bending"))
	j.bending(b)
	j.cracked(c)
	j.steelLimits(c)
	j.hogging(c)
}

// bending is the resistance of one section, 6.1, at every station at once.
func (j *job) bending(b *trace.Block) {
	b.Steps(ec2.PrestressForce, ec2.PrestressMoment, ec2.ConcreteStressAtTendon, ec2.Prestrain)
	b.Step(pick(j.hasBars(), ec2.LimitForceWithBars, ec2.LimitForce))
	anchored, bare := b.Choose(ec2.SteelAnchored)
	b.On(anchored, func() {
		b.On(j.trial(b), func() {
			b.Root(pick(j.hasBars(), ec2.AxisRootWithBars, ec2.AxisRoot), j.neutralAxis())
		})
		j.compatible(b)
		j.kindOfFailure(b)
	})
	b.On(bare, func() { b.Step(ec2.NoResistance) })
	b.Check(ec2.BendingSufficient)
	if anchored.Any() {
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
	inFlange, below := b.Choose(ec2.BlockInFlange)
	rest := j.stands(b, inFlange, ec2.TrialInFlange)
	if j.m.Shape.Kind.Text == "rectangle" {
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
	return j.form.haunch.Quantity().Value > 0
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
		b.Steps(ec2.StrainRatio, ec2.Fullness, ec2.ResultantDepth, ec2.FullFullness, ec2.FullResultantDepth)
		b.Steps(ec2.ReducedDepthFactor, ec2.ReducedStressFactor, ec2.ReducedBlockDepth)
	} else {
		b.Step(ec2.BlockDepth)
	}
	b.Steps(ec2.BlockPartDepth, ec2.BlockPartWidth, ec2.BlockPartArea, ec2.BlockPartDepthOfCentroid)
	b.Step(pick(j.limited(), ec2.ReducedConcreteForce, ec2.ConcreteForce))
	b.Step(ec2.ConcreteForceDepth)
	b.Step(pick(j.hasBars(), ec2.ResidualWithBars, ec2.Residual))
	b.Prove(pick(j.hasBars(), ec2.AxisRootWithBars, ec2.AxisRoot))
	b.Step(ec2.TendonLever)
	if j.hasBars() {
		b.Step(ec2.BarLever)
	}
	b.Step(pick(j.hasBars(), ec2.ResistanceWithBars, ec2.Resistance))
}

// kindOfFailure says what ends the resistance: anchorage, steel or concrete.
func (j *job) kindOfFailure(b *trace.Block) {
	b.Step(ec2.TendonCounts)
	if j.hasBars() {
		b.Step(ec2.BarCounts)
	}
	b.Step(pick(j.hasBars(), ec2.TensionSteelForceWithBars, ec2.TensionSteelForce))
	there, _ := b.Choose(ec2.TensionSteelThere)
	b.On(there, func() {
		b.Step(pick(j.hasBars(), ec2.TensionDepthWithBars, ec2.TensionDepth))
		b.Step(ec2.AxisRatio)
	})
	b.Steps(ec2.OutermostBonded, ec2.OutermostAnchorage, ec2.OutermostStrain)
	anchored, _ := b.Choose(ec2.OutermostAnchored)
	b.On(anchored, func() { b.Decide(ec2.OutermostYields) })
	if j.limited() {
		b.Decide(ec2.ConcreteCrushes)
	}
}

// pick is a where yes, else b.
func pick[T any](yes bool, a, b T) T {
	if yes {
		return a
	}
	return b
}

// neutralAxis proposes x from compatible strains, by the kernel.
func (j *job) neutralAxis() func(*trace.Row) (trace.Proposal, error) {
	beam := bending.NewSection(j.shape)
	return func(r *trace.Row) (trace.Proposal, error) {
		layers, err := j.layers(r)
		if err != nil {
			return trace.Proposal{}, err
		}
		block := bending.BlockLaw{Lambda: r.Value("λ"), EtaFcd: r.Value("η") * r.Value("f_cd"), EpsCu: r.Value("ε_cu3")}
		var axis bending.Axis
		if j.limited() {
			axis, err = beam.GradedAxis(bending.Graded{BlockLaw: block, Parabola: parabola(r)}, layers)
		} else {
			axis, err = beam.NeutralAxis(block, layers)
		}
		return trace.Proposal{X: axis.X, Lo: axis.Lo, Hi: axis.Hi}, err
	}
}

// parabola is the parabola–rectangle law at a station.
func parabola(r *trace.Row) bending.Parabola {
	return bending.Parabola{N: r.Value("n"), EpsC2: r.Value("ε_c2"), EpsCu2: r.Value("ε_cu2"), Fcd: r.Value("f_cd")}
}

// layers are the rows of steel at a station for the kernels.
func (j *job) layers(r *trace.Row) ([]bending.Layer, error) {
	area, depth, prestrain, limit := r.Column("A_{p,i}"), r.Column("d_{p,i}"), r.Column("ε_{p0,i}"), r.Column("σ_{av,i}")
	modulus, design := r.Column("E_{p,i}"), r.Column("f_{pd,i}")
	var out []bending.Layer
	for i := range area {
		law, err := bending.Horizontal(modulus[i], design[i])
		if j.inclined() {
			law, err = bending.Inclined(modulus[i], design[i], r.Column("f_{pk,i}")[i]/r.Value("γ_S"), r.Column("ε_{puk,i}")[i], r.Column("ε_{pud,i}")[i])
		}
		if err == nil && limit[i] < design[i] { // slips before it yields: no strain limit
			law, err = law.WithLimit(math.Inf(1))
		}
		if err != nil {
			return nil, err
		}
		out = append(out, bending.Layer{Area: area[i], Depth: depth[i], Prestrain: prestrain[i], Cap: limit[i], Law: law})
	}
	if !j.hasBars() {
		return out, nil
	}
	area, depth, limit, design = r.Column("A_{s,j}"), r.Column("d_{s,j}"), r.Column("σ_{sa,j}"), r.Column("f_{yd,j}")
	for i := range area {
		law, err := bending.Horizontal(r.Value("E_s"), design[i])
		if j.barInclined() {
			law, err = bending.Inclined(r.Value("E_s"), design[i], design[i]*r.Column("k_{s,j}")[i], r.Column("ε_{suk,j}")[i], r.Column("ε_{sud,j}")[i])
		}
		if err == nil && limit[i] < design[i] {
			law, err = law.WithLimit(math.Inf(1))
		}
		if err != nil {
			return nil, err
		}
		out = append(out, bending.Layer{Area: area[i], Depth: depth[i], Cap: limit[i], Law: law})
	}
	return out, nil
}

func (j *job) bendingFigures(b *trace.Block) {
	at := j.stations.Rows[b.Row]
	plots := []trace.Plot{{Role: "height", Key: "given.section/part-height"}, {Role: "lower", Key: "given.section/part-lower"}, {Role: "upper", Key: "given.section/part-upper"},
		{Role: "h", Key: "given.section/depth"}, {Role: "neutral-axis", Key: j.axisKey(b)}, {Role: "block-depth", Key: pick(j.limited(), ec2.ReducedBlockDepth, ec2.BlockDepth).ID},
		{Role: "block-stress", Key: "materials.concrete/design-strength"}, {Role: "block-force", Key: j.concreteForceID()}, {Role: "block-centroid", Key: "concrete-force-depth"},
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
	b.Table("strains", "Strains and stresses of the rows along the span", j.stations, "actions.effects/position", "prestrain", "prestress.along/available-stress", j.curvature().ID, "tendon-strain", "tendon-stress"+pick(j.inclined(), "-inclined", ""))
	b.Table("along", "Bending along the span", j.stations, "actions.effects/position", pick(j.limited(), ec2.ReducedBlockDepth, ec2.BlockDepth).ID, j.concreteForceID(), "concrete-force-depth", "actions.ultimate/moment", resistance, "bending-sufficient")
}

// concreteForceID is the ID of the formula that gives F_c.
func (j *job) concreteForceID() string {
	return pick(j.limited(), ec2.ReducedConcreteForce, ec2.ConcreteForce).ID
}

// resistanceID is the ID of the formula that gives M_Rd.
func (j *job) resistanceID() string {
	return pick(j.hasBars(), ec2.ResistanceWithBars, ec2.Resistance).ID
}

// axisKey is the entry that gives the neutral axis on the row worked in full.
func (j *job) axisKey(b *trace.Block) string {
	for _, id := range []string{"axis-flange", "axis-haunch", "axis-web", "axis-root"} {
		if l := trace.LineOf(j.n.Entry(b.Path() + "/" + id)); l != nil && l.Taken(b.Row) {
			return id
		}
	}
	return "axis-root"
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

// linkAngle is the flattest strut that 6.2.3(2) allows, cot θ = 2.5: it adds the most tension.
const linkAngle = "21.8"

// cracked goes through the stations that crack in bending at the ultimate limit state: there the tendons must carry the
// tension that shear adds (8.10.2.3(1), 6.2.3(7)), and the failure must announce itself (5.10.1(5)P).
func (j *job) cracked(c *trace.Chapter) {
	at := j.largest("actions.ultimate/moment")
	most := c.Block("largest-moment", "Largest moment of the span, "+at, nil, trace.At(j.ultimate, at))
	most.Step(ec2.LargestMoment)

	takes := trace.Take(j.parameters, j.strengths, j.gross, j.tendonStrengths, j.positions, j.ultimate, j.frequent, j.along, j.resistance, most)
	b := c.Block("cracked", "Where the section cracks at the ultimate limit state", j.stations, takes...)
	b.Row = j.resistance.Row
	b.Text("cracked", templates.Text("cracked"))
	b.Given(def("strut-angle", "θ", "Angle of the struts: the flattest allowed, shear not being justified here", "°", ref(ec2.Code, "6.2.3(2)")), plain(linkAngle, "°"), "assumption on the safe side")
	b.Decide(ec2.NoLargerMoment)
	b.Step(ec2.BottomStress)
	cracked, _ := b.Choose(ec2.CrackedAtUltimate)
	b.On(cracked, func() {
		b.Steps(ec2.LargestShear, ec2.LeverArm, ec2.AddedMoment, ec2.MomentWithShear)
		b.Check(ec2.BendingWithShear)
		b.Text("warning", templates.Text("warning"))
		b.Steps(ec2.InitialForce, ec2.InitialMoment, ec2.CrackingMoment)
		b.Check(ec2.FailureWithWarning)
		b.Step(ec2.RemainingShare)
		cracks, _ := b.Choose(ec2.CracksWhenTendonsFail)
		b.On(cracks, func() {
			b.Step(ec2.RemainingResistance)
			b.Check(ec2.WarningWhenTendonsFail)
		})
	})
}

// steelLimits checks minimum steel at every station where steel is bonded in the tension zone, and maximum steel.
func (j *job) steelLimits(c *trace.Chapter) {
	takes := trace.Take(j.parameters, j.strengths, j.section, j.gross, j.positions, j.tendons, j.tendonStrengths, j.stress, j.along, j.resistance)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barStrengths)...)
	}
	b := c.Block("steel-limits", "Minimum and maximum steel", j.stations, takes...)
	b.Row = j.resistance.Row
	strength, source := plain("500", "MPa"), "no bars: a usual strength to express the minimum in; it cancels but in 0.0013·b_t·d"
	if j.hasBars() {
		r := j.m.Bars.Rows[0]
		strength, source = r.Fyk.Literal, given(r.Fyk)
	}
	b.Given(def("reference-strength", "f_yk", "Yield strength that the minimum is expressed in", "MPa"), strength, source)
	b.Steps(ec2.TensionPartDepth, ec2.TensionPartArea, ec2.TensionWidth)
	there, none := b.Choose(ec2.TensionSteelThere)
	minimum, _ := j.formula(ec2.MinimumSteel)
	b.On(there, func() { b.Step(minimum) })
	b.On(none, func() { b.Step(ec2.MinimumSteelOfDepth) })
	b.Step(pick(j.hasBars(), ec2.TensionSteelWithBars, ec2.TensionSteel))
	b.Check(ec2.MinimumSteelProvided)
	maximum, _ := j.formula(ec2.MaximumSteel)
	b.Step(maximum)
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
