package design

import (
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
	"soffit/templates"
)

// resist opens the block of a way of asking and gives the resistance of the section, 6.1, at every station at once, or at
// the rows given.
func (j *job) resist(c *trace.Chapter, q *asked, rows trace.Rows) {
	takes := trace.Take(j.parameters, j.strengths, j.section, j.gross, j.tendons, j.tendonStrengths, j.along, q.view, q.places)
	takes = append(takes, trace.Take(q.prestrain...)...)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barsOf(q))...)
	}
	if q.fibred {
		takes = append(takes, trace.Take(j.fibres)...)
	}
	if q.topped {
		takes = append(takes, trace.Take(j.topping, j.composite, j.toppingStrengths)...)
	}
	if q.axial != nil {
		takes = append(takes, trace.Take(q.axial)...)
	}
	b := c.Block(q.slug, q.title, j.stations, append(takes, q.demand...)...)
	q.block = b
	if len(q.texts) > 0 {
		b.Text("bending", texts(q.texts...))
	}
	if rows == nil {
		rows = b.Active()
	}
	b.On(rows, func() { j.resistAt(b, q) })
}

func (j *job) resistAt(b *trace.Block, q *asked) {
	b.Step(pick(j.ducted(), ec2.PostTendonCounts, ec2.TendonCounts))
	if j.hasBars() {
		b.Step(pick(j.hasTopping() && !q.topped, ec2.BareBarCounts, ec2.BarCounts))
		b.Step(ec2.TendonsInTension)
	}
	b.Step(pick(j.hasBars(), ec2.TensionSteelForceWithBars, ec2.TensionSteelForce))
	there, none := b.Choose(ec2.TensionSteelThere)
	b.On(there, func() { b.Step(pick(j.hasBars(), ec2.TensionDepthWithBars, ec2.TensionDepth)) })
	b.On(none, func() {
		b.Step(pick(q.topped, ec2.ToppedDepthWithoutTensionSteel, ec2.DepthWithoutTensionSteel))
	})
	b.Step(pick(j.hasBars(), ec2.LimitForceWithBars, ec2.LimitForce))
	if q.axial != nil {
		b.Step(pick(q.below, mechanics.AxialDepthBelow, pick(q.topped, mechanics.AxialDepthTopped, mechanics.AxialDepth)))
	}
	anchored, bare := b.Choose(pick(q.axial != nil, ec2.SteelAnchoredAxially, ec2.SteelAnchored))
	b.On(anchored, func() {
		sums := j.sums(q)
		b.On(j.trial(b, q), func() { b.Root(sums.root, j.neutralAxis(q)) })
		partly := b.Active()
		if !q.fibred {
			var wholly trace.Rows
			partly, wholly = b.Choose(ec2.PartlyCompressed)
			b.On(wholly, func() { b.Step(ec2.NoResistanceCompressed) })
		}
		b.On(partly, func() {
			j.compatible(b, q)
			j.kindOfFailure(b, q, there)
			if !q.below && !q.topped {
				b.Decide(ec2.AboveZeroCurvature)
			}
		})
	})
	b.On(bare, func() { b.Step(ec2.NoResistance) })
	b.Check(named(q.check, q.words))
	j.bendingFigures(b, q)
}

// trial takes every row of steel at its limit and finds where the block would lie. It returns the stations on
// which the trial does not stand, so that strains decide. The inclined branch has no limit to try, fibres and an axial force
// have no block to try, and an edge that is no rectangle no width.
func (j *job) trial(b *trace.Block, q *asked) trace.Rows {
	ghosts := j.hasTopping() && !q.topped && j.hasBars() // bars of the topping, which are not there yet
	if j.limited() || q.fibred || q.axial != nil || ghosts || j.base(q.view.Path()+"/edge-depth", nil) == 0 {
		return b.Active()
	}
	b.Step(ec2.FlangeTrial)
	whole := j.base(q.view.Path()+"/edge-depth", nil) == j.base("given.section/depth", nil)
	within, beyond := b.Choose(pick(whole, ec2.BlockInRectangle, ec2.BlockInFlange))
	return j.stands(b, within, ec2.TrialInFlange).Or(beyond)
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
func (j *job) compatible(b *trace.Block, q *asked) {
	b.Steps(j.curvatures(q)...)
	b.Steps(ec2.TopStrain, ec2.BendingStrain, ec2.TendonStrain)
	b.Step(pick(j.inclined(), ec2.TendonStressOnIncline, ec2.TendonStress))
	b.Step(ec2.TendonForce)
	if j.hasBars() {
		if q.topped {
			b.Steps(ec2.BarBendingStrain, ec2.LockedBarStrain)
		} else {
			b.Step(ec2.BarStrain)
		}
		b.Step(pick(j.barInclined(), ec2.BarStressOnIncline, ec2.BarStress))
		b.Step(ec2.BarForce)
	}
	switch {
	case q.topped:
		b.Steps(ec2.ToppedFibreStrain, ec2.ToppedFibreStress, ec2.FibreForce, ec2.FibreForceDepth)
	case q.fibred:
		b.Steps(ec2.FibreStrain, ec2.FibreStress, ec2.FibreForce, ec2.FibreForceDepth)
	default:
		j.block(b, q)
	}
	sums := j.sums(q)
	b.Step(sums.residual)
	b.Prove(sums.root)
	b.Step(ec2.TendonLever)
	if j.hasBars() {
		b.Step(ec2.BarLever)
	}
	b.Step(sums.resistance)
}

// block is the concrete as a rectangular block, 3.1.7(3), reduced where the compressed edge stays below its ultimate strain
// or the compressed zone narrows toward its edge.
func (j *job) block(b *trace.Block, q *asked) {
	if j.narrowing(q) {
		narrow, not := b.Choose(ec2.Narrows)
		b.On(narrow, func() { b.Step(ec2.Narrowing) })
		b.On(not, func() { b.Step(ec2.NoNarrowing) })
	}
	graded, full := b.Active(), b.Active().None()
	if !j.limited() {
		graded, full = full, graded
		if j.flanged(q) {
			graded, full = b.Choose(ec2.FlangeWhollyCompressed)
		}
	}
	b.On(graded, func() {
		b.Text("graded", templates.Text("graded"))
		b.Steps(ec2.StrainRatio, ec2.ParabolaRest, ec2.Fullness, ec2.ParabolaMoment, ec2.ResultantDepth, ec2.FullFullness, ec2.FullResultantDepth)
		b.Steps(ec2.ReducedDepthFactor, ec2.ReducedStressFactor, ec2.ReducedBlockDepth)
		b.Step(pick(j.narrowing(q), ec2.NarrowingReducedStress, ec2.ReducedBlockStress))
	})
	b.On(full, func() {
		b.Step(ec2.BlockDepth)
		b.Step(pick(j.narrowing(q), ec2.NarrowingStress, ec2.BlockStress))
	})
	b.Steps(ec2.BlockPartDepth, ec2.BlockPartWidth, ec2.BlockPartArea, ec2.BlockPartDepthOfCentroid)
	if j.hasVoids() {
		b.Steps(ec2.BlockVoidDepth, ec2.BlockVoidArea, ec2.BlockVoidMoment, ec2.ConcreteForceWithVoids, ec2.ConcreteForceDepthWithVoids)
		return
	}
	b.Steps(ec2.ConcreteForce, ec2.ConcreteForceDepth)
}

// kindOfFailure says what ends the resistance: anchorage, steel or concrete. there is where steel in the tension zone is
// bonded.
func (j *job) kindOfFailure(b *trace.Block, q *asked, there trace.Rows) {
	b.On(there, func() {
		b.Steps(ec2.AxisRatio, pick(j.hasBars(), ec2.LeastAnchorageWithBars, ec2.LeastAnchorage))
		anchored, _ := b.Choose(ec2.EveryRowAnchored)
		b.On(anchored, func() {
			b.Steps(pick(j.hasBars(), ec2.OutermostSteelWithBars, ec2.OutermostSteel), pick(j.hasBars(), ec2.OutermostStrainWithBars, ec2.OutermostStrain))
			b.Decide(ec2.OutermostYields)
			if j.limited() && !q.fibred {
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
