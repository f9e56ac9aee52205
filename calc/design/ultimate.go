package design

import (
	"soffit/calc/bending"
	"soffit/calc/ec2"
	"soffit/calc/trace"
	"soffit/templates"
)

// ultimateChapter justifies the member in bending, 6.1, 9.2.1.1 and 5.10.1(5)P.
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
	if j.inclined() || (j.hasBars() && j.barInclined()) {
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

// compatible gives strains, stresses and forces from the neutral axis, their balance, and the resistance.
func (j *job) compatible(b *trace.Block) {
	switch {
	case j.inclined() && j.hasBars() && j.barInclined():
		b.Step(ec2.CurvatureWithBothLimits)
	case j.inclined():
		b.Step(ec2.CurvatureWithLimit)
	case j.hasBars() && j.barInclined():
		b.Step(ec2.CurvatureWithBarLimit)
	default:
		b.Step(ec2.Curvature)
	}
	b.Steps(ec2.TopStrain, ec2.TendonStrain)
	b.Step(pick(j.inclined(), ec2.TendonStressOnIncline, ec2.TendonStress))
	b.Step(ec2.TendonForce)
	if j.hasBars() {
		b.Step(ec2.BarStrain)
		b.Step(pick(j.barInclined(), ec2.BarStressOnIncline, ec2.BarStress))
		b.Step(ec2.BarForce)
	}
	b.Steps(ec2.BlockDepth, ec2.BlockPartDepth, ec2.BlockPartWidth, ec2.BlockPartArea, ec2.BlockPartDepthOfCentroid, ec2.ConcreteForce, ec2.ConcreteForceDepth)
	b.Step(pick(j.hasBars(), ec2.ResidualWithBars, ec2.Residual))
	b.Prove(pick(j.hasBars(), ec2.AxisRootWithBars, ec2.AxisRoot))
	b.Step(ec2.TendonLever)
	if j.hasBars() {
		b.Step(ec2.BarLever)
	}
	b.Step(pick(j.hasBars(), ec2.ResistanceWithBars, ec2.Resistance))
	b.Step(pick(j.hasBars(), ec2.EffectiveDepthWithBars, ec2.EffectiveDepth))
	b.Step(ec2.AxisRatio)
	b.Choose(ec2.OutermostYields)
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
		axis, err := beam.NeutralAxis(bending.BlockLaw{Lambda: r.Value("λ"), EtaFcd: r.Value("η") * r.Value("f_cd"), EpsCu: r.Value("ε_cu3")}, layers)
		return trace.Proposal{X: axis.X, Lo: axis.Lo, Hi: axis.Hi}, err
	}
}

// layers are the rows of steel at a station for the kernels.
func (j *job) layers(r *trace.Row) ([]bending.Layer, error) {
	area, depth, prestrain, limit := r.Column("A_{p,i}"), r.Column("d_i"), r.Column("ε_{p0,i}"), r.Column("σ_{av,i}")
	modulus, design := r.Column("E_{p,i}"), r.Column("f_{pd,i}")
	var out []bending.Layer
	for i := range area {
		law, err := bending.Horizontal(modulus[i], design[i])
		if j.inclined() {
			law, err = bending.Inclined(modulus[i], design[i], r.Column("f_{pk,i}")[i]/r.Value("γ_S"), r.Column("ε_{uk,i}")[i], r.Column("ε_{ud,i}")[i])
		}
		if err != nil {
			return nil, err
		}
		out = append(out, bending.Layer{Area: area[i], Depth: depth[i], Prestrain: prestrain[i], Cap: limit[i], Law: law})
	}
	if !j.hasBars() {
		return out, nil
	}
	area, depth, limit, design = r.Column("A_{s,j}"), r.Column("d_j"), r.Column("σ_{sa,j}"), r.Column("f_{yd,j}")
	for i := range area {
		law, err := bending.Horizontal(r.Value("E_s"), design[i])
		if j.barInclined() {
			law, err = bending.Inclined(r.Value("E_s"), design[i], design[i]*r.Column("k_j")[i], r.Column("ε_{uk,j}")[i], r.Column("ε_{ud,j}")[i])
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
		{Role: "h", Key: "given.section/depth"}, {Role: "neutral-axis", Key: j.axisKey(b)}, {Role: "block-depth", Key: "block-depth"},
		{Role: "block-stress", Key: "materials.concrete/design-strength"}, {Role: "block-force", Key: "concrete-force"}, {Role: "block-centroid", Key: "concrete-force-depth"},
		{Role: "strain-top", Key: "top-strain"}, {Role: "depth", Key: "section.positions/tendon-depth"}, {Role: "prestrain", Key: "prestrain"},
		{Role: "strain", Key: "tendon-strain"}, {Role: "force", Key: "tendon-force"}, {Role: "lever", Key: "tendon-lever"},
		{Role: "resistance", Key: j.resistanceID()}}
	if j.hasBars() {
		plots = append(plots, trace.Plot{Role: "bar-depth", Key: "section.positions/bar-depth"}, trace.Plot{Role: "bar-strain", Key: "bar-strain"},
			trace.Plot{Role: "bar-force", Key: "bar-force"}, trace.Plot{Role: "bar-lever", Key: "bar-lever"})
	}
	b.Figure("section-diagram", "ultimate", "Strain, stress and forces at the ultimate limit state, "+at+".", at, plots...)
	resistance := j.resistanceID()
	b.Figure("envelope", "resistance", "Design moment and moment resistance along the span.", "",
		trace.Plot{Role: "x", Key: "actions.effects/position"}, trace.Plot{Role: "demand", Key: "actions.ultimate/moment"}, trace.Plot{Role: "resistance", Key: resistance},
		trace.Plot{Role: "support-A", Key: "given.span/bearing-a"}, trace.Plot{Role: "support-B", Key: "given.span/bearing-b"})
	b.Table("along", "Bending along the span", j.stations, "actions.effects/position", "limit-force"+pick(j.hasBars(), "-with-bars", ""), "concrete-force", "block-depth", "actions.ultimate/moment", resistance, "bending-sufficient")
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

// steelLimits checks minimum and maximum steel and the failure with warning at the station where bending governs.
func (j *job) steelLimits(c *trace.Chapter) {
	at := j.stations.Rows[j.resistance.Row]
	takes := trace.Take(j.parameters, j.strengths, j.section, j.gross, j.positions, j.tendons, j.tendonStrengths, j.stress)
	takes = append(takes, trace.At(j.resistance, at))
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barStrengths)...)
	}
	b := c.Block("steel-limits", "Minimum and maximum steel, failure with warning, "+at, nil, takes...)
	strength, source := plain("500", "MPa"), "no bars: usual strength taken to compare with"
	if j.hasBars() {
		r := j.m.Bars.Rows[0]
		strength, source = r.Fyk.Literal, given(r.Fyk)
	}
	b.Given(def("reference-strength", "f_yk", "Yield strength that the minimum is expressed in", "MPa"), strength, source)
	b.Steps(ec2.TensionPartDepth, ec2.TensionPartArea, ec2.TensionWidth)
	minimum, _ := j.formula(ec2.MinimumSteel)
	b.Step(minimum)
	b.Step(pick(j.hasBars(), ec2.TensionSteelWithBars, ec2.TensionSteel))
	b.Check(ec2.MinimumSteelProvided)
	maximum, _ := j.formula(ec2.MaximumSteel)
	b.Step(maximum)
	b.Step(pick(j.hasBars(), ec2.TotalSteelWithBars, ec2.TotalSteel))
	b.Check(ec2.MaximumSteelKept)
	b.Text("warning", templates.Text("warning"))
	b.Step(ec2.CrackingMoment)
	b.Check(ec2.FailureWithWarning)
}

// hogging checks the stations where the least moment is negative: the ends beyond the bearings.
func (j *job) hogging(c *trace.Chapter) {
	b := c.Block("hogging", "Hogging moments", j.stations, trace.Take(j.parameters, j.strengths, j.gross, j.ultimate)...)
	yes, _ := b.Choose(ec2.Hogging)
	b.On(yes, func() {
		b.Steps(ec2.OverhangStress, ec2.PlainTensileStrength)
		b.Check(ec2.HoggingResisted)
	})
}
