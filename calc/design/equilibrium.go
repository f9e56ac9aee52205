package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/templates"
)

// bearings gives the design reactions, at the ultimate limit state and in the characteristic combination, says whether the
// member bears down on both bearings, and justifies static equilibrium where a bearing can lift: with an overhang, or with
// a load that lifts one.
func (j *job) bearings(c *trace.Chapter) {
	b := c.Block("reactions", "Design reactions at the ultimate limit state", nil, trace.Take(j.reactions, j.ultimate)...)
	for _, r := range ec2.UltimateReactions {
		b.Steps(r.Each, r.EachLeast, r.Largest, r.Least)
	}
	b.Decide(ec2.BearingAHeld)
	b.Decide(ec2.BearingBHeld)
	lifted, _ := b.Choose(ec2.Lifting)
	b = c.Block("service-reactions", "Reactions in the characteristic combination", nil, trace.Take(j.actionData, j.reactions, j.characteristic)...)
	for _, r := range ec2.CharacteristicReactions {
		b.Steps(r.Each, r.EachLeast, r.Largest, r.Least)
	}
	if overA, overB := j.overhangs(); overA || overB || lifted.Any() {
		j.staticEquilibrium(c)
	}
}

// staticEquilibrium cuts the loads at the bearings and weighs what lifts each bearing against what holds it down, EN 1990
// 6.4.2: for the member in use, and while it is built.
func (j *job) staticEquilibrium(c *trace.Chapter) {
	portions := c.Block("portions", "Loads in the portions of the member", nil, trace.Take(j.span, j.spanLength, j.actionData, j.reactions)...)
	axis := j.n.Axis("portion", "portion of the member", "n", []string{"left of bearing A", "between the bearings", "right of bearing B"})
	for k, g := range []struct{ id, symbol, name string }{
		{"left", "k_{L,n}", "1 for the portion left of bearing A"}, {"middle", "k_{C,n}", "1 for the portion between the bearings"}, {"right", "k_{R,n}", "1 for the portion right of bearing B"},
	} {
		row := make([]quantity.Literal, len(axis.Rows))
		for i := range row {
			row[i] = flag(i == k)
		}
		portions.GivenRows(def(g.id, g.symbol, g.name, ""), axis, row, "the portions are cut at the bearings")
	}
	portions.Steps(mechanics.PortionFrom, mechanics.PortionTo, mechanics.LoadFrom, mechanics.LoadTo, mechanics.SpreadForce, mechanics.PointForce, mechanics.PortionReactionA, mechanics.PortionReactionB)

	b := c.Block("equilibrium", "Static equilibrium", nil, trace.Take(j.parameters, portions)...)
	b.Text("equilibrium", templates.Text("equilibrium"))
	j.balance(b, ec2.Equilibrium, func(l load) bool { return l.permanent }, func(l load) bool { return !l.construction || !l.bare }, func(l load) bool { return !l.permanent })
	if !j.building() {
		return
	}
	b = c.Block("construction-equilibrium", "Static equilibrium while the member is built", nil, trace.Take(j.parameters, portions)...)
	b.Text("equilibrium", templates.Text("construction-equilibrium"))
	j.balance(b, ec2.EquilibriumWhileBuilt, func(l load) bool { return l.action == ownWeight }, func(l load) bool { return l.bare }, func(l load) bool { return !l.permanent || l.action == toppingWeight })
}

// balance checks each bearing: which loads hold it down, which lift it, and which of these are variable.
func (j *job) balance(b *trace.Block, checks [2]*clause.Check, holds, lifts, variable func(load) bool) {
	loads := j.loadRows()
	column := func(id, symbol, name string, is func(load) bool) {
		b.GivenRows(def(id, symbol, name, ""), j.loads, each(loads, func(l load) quantity.Literal { return flag(is(l)) }), "kind of load")
	}
	column("holds", "k_{stb,i}", "1 for a load that counts where it holds the member down", holds)
	column("lifts", "k_{dst,i}", "1 for a load that counts where it lifts the member", lifts)
	column("variable", "k_{v,i}", "1 for a load with the factor of variable actions", variable)
	j.consequence(b)
	b.Steps(ec2.DestabilisingFactor, ec2.DestabilisingA, ec2.StabilisingA, ec2.DestabilisingB, ec2.StabilisingB)
	b.Check(checks[0])
	b.Check(checks[1])
}
