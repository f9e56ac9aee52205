package design

import (
	"soffit/calc/bending"
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/section"
	"soffit/calc/trace"
)

// asked is one way in which the section is asked for its resistance: which edge is compressed, with the topping or without
// it, beside which axial force, and against which moment.
type asked struct {
	slug, title string
	words       string // ", least axial force"
	check       *clause.Check
	texts       []string       // templates that open the block
	view        *trace.Block   // section seen from the compressed edge
	places      *trace.Block   // depths of the steel from it
	prestrain   []*trace.Block // ε_p0, and with a topping the strains locked in
	force       *trace.Block   // prestress
	demand      []trace.Source
	axial       *trace.Block // N_Ed; nil for none
	below       bool         // the soffit is compressed
	topped      bool         // with the topping
	bare        bool         // the bare member while it is built
	hogging     *trace.Block // where it hogs; of one asked from below
	fibred      bool         // with fibres of concrete in place of the block

	block   *trace.Block // where it was asked; nil where it was not
	cracked *trace.Block // where its section cracks
}

// law is the stress-strain diagram of the concrete: as the member file says, or the block, or with a topping, whose strain
// differs from that of the member, the parabola–rectangle.
func (j *job) law() string {
	switch {
	case j.m.Concrete.Diagram.Text != "":
		return j.m.Concrete.Diagram.Text
	case j.hasTopping():
		return "parabola-rectangle"
	}
	return "block"
}

// fibred says that fibres of concrete stand in place of the block.
func (j *job) fibred() bool { return j.law() != "block" }

// beam is the section for the kernels, seen from the compressed edge.
func (q *asked) beam(shape section.Shape) *bending.Section {
	if q.below {
		shape = shape.Flipped()
	}
	return bending.NewSection(shape)
}

// flanged says that the compressed edge has a flange whose mean strain may govern.
func (j *job) flanged(q *asked) bool { return j.base(q.view.Path()+"/flange-depth", nil) > 0 }

// narrowing says that the section widens somewhere away from the compressed edge.
func (j *job) narrowing(q *asked) bool {
	return j.base(q.view.Path()+"/narrowing-depth", nil) < j.base("given.section/depth", nil)
}

// curvature is the way of taking the concrete.
func (j *job) curvature(q *asked) ec2.Curvature {
	switch {
	case q.topped && q.below:
		return ec2.ToppedBelowCurvature
	case q.topped:
		return ec2.ToppedCurvature
	case q.fibred && j.flanged(q):
		return ec2.FlangedFibreCurvature
	case q.fibred:
		return ec2.FibreCurvature
	case j.flanged(q):
		return ec2.FlangedBlockCurvature
	}
	return ec2.BlockCurvature
}

// limited says that steel has a strain limit, so that the compressed edge may stay below its ultimate strain.
func (j *job) limited() bool { return j.inclined() || (j.hasBars() && j.barInclined()) }

// curvatures are the formulas of κ for the steel diagrams chosen.
func (j *job) curvatures(q *asked) []*clause.Formula {
	c := j.curvature(q)
	locked := q.topped && j.hasBars() && j.barInclined()
	bare := j.hasTopping() && !q.topped && j.hasBars() && j.barInclined() // bars of the topping are not there yet
	switch {
	case !j.limited():
		return []*clause.Formula{c.Alone}
	case j.inclined() && locked:
		return []*clause.Formula{c.Concrete, ec2.LockedCurvatureWithBothLimits}
	case locked:
		return []*clause.Formula{c.Concrete, ec2.LockedCurvatureWithBarLimit}
	case j.inclined() && bare:
		return []*clause.Formula{c.Concrete, ec2.BareCurvatureWithBothLimits}
	case bare:
		return []*clause.Formula{c.Concrete, ec2.BareCurvatureWithBarLimit}
	case j.inclined() && j.hasBars() && j.barInclined():
		return []*clause.Formula{c.Concrete, ec2.CurvatureWithBothLimits}
	case j.inclined():
		return []*clause.Formula{c.Concrete, ec2.CurvatureWithLimit}
	}
	return []*clause.Formula{c.Concrete, ec2.CurvatureWithBarLimit}
}

// sums are the formulas that add the steel up, for the steel and the axial force there are.
type sums struct {
	root                 *clause.Root
	residual, resistance *clause.Formula
}

func (j *job) sums(q *asked) sums {
	switch {
	case q.axial != nil && j.hasBars():
		return sums{ec2.AxialAxisRootWithBars, ec2.AxialResidualWithBars, ec2.AxialResistanceWithBars}
	case q.axial != nil:
		return sums{ec2.AxialAxisRoot, ec2.AxialResidual, ec2.AxialResistance}
	case j.hasBars():
		return sums{ec2.AxisRootWithBars, ec2.ResidualWithBars, ec2.ResistanceWithBars}
	}
	return sums{ec2.AxisRoot, ec2.Residual, ec2.Resistance}
}

// barsOf is the block with the bars that the section has.
func (j *job) barsOf(q *asked) *trace.Block {
	return pick(j.hasTopping() && !q.topped, j.bareBars, j.barStrengths)
}
