package design

import (
	"fmt"
	"slices"

	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// load is one load of an action, or a part of it. The weights of the member and of its topping come first; their
// sizes are computed.
type load struct {
	name         string
	origin       member.Origin
	action       int // ownWeight, toppingWeight, or the place in the member file
	category     string
	q, f, n      quantity.Literal // per length, at a point, axial
	from, to     quantity.Literal
	permanent    bool
	construction bool // there while the member is built only
	bare         bool // on the bare member, before its topping is hard; without a topping, there while the member is built
}

// Loads that belong to no action of the member file.
const (
	ownWeight     = -1
	toppingWeight = -2
)

// spread says that the load is given per length.
func (l *load) spread() bool { return l.q.Quantity().Value != 0 }

// loadRows are the loads in the order of the member file, those of variable actions split at bearings with an overhang
// beyond; each has a name of its own.
func (j *job) loadRows() []load {
	length := j.m.Span.Length.Literal
	none, zero, force := plain("0", "kN/m"), plain("0", "m"), plain("0", "kN")
	out := []load{{name: "self-weight", action: ownWeight, q: none, f: force, n: force, from: zero, to: length, permanent: true, bare: !j.propped()}}
	if j.hasTopping() {
		out = append(out, load{name: "topping", action: toppingWeight, q: none, f: force, n: force, from: zero, to: length, permanent: true, bare: !j.propped()})
	}
	for k := range j.m.Actions {
		a := &j.m.Actions[k]
		for i := range a.Loads {
			l := &a.Loads[i]
			n := load{name: a.Name.Text, origin: member.Origin{Pos: l.Pos, Given: true}, action: k, category: a.Category.Text,
				q: none, f: force, n: force, from: zero, to: length,
				permanent: a.Kind.Text == "permanent", construction: a.Kind.Text == "construction", bare: j.onBare(a)}
			if len(a.Loads) > 1 {
				n.name = fmt.Sprintf("%s (%d)", a.Name.Text, i+1)
			}
			switch {
			case l.Axial.Present():
				n.n = l.Axial.Literal
			case l.Point.Present():
				n.f, n.from, n.to = l.Point.Literal, l.At.Literal, l.At.Literal
			default:
				n.q = l.Uniform.Literal
				if l.From.Present() {
					n.from = l.From.Literal
				}
				if l.To.Present() {
					n.to = l.To.Literal
				}
			}
			out = append(out, j.split(n)...)
		}
	}
	for i := range out {
		out[i].name = unused(out[i].name, func(s string) bool {
			return slices.ContainsFunc(out[:i], func(l load) bool { return l.name == s })
		})
	}
	return out
}

// onBare says that an action acts on the bare member. Without a topping there is no other section: then it says that the
// action may be there while the member is built.
func (j *job) onBare(a *member.Action) bool {
	switch a.ActsOn.Text {
	case "bare member":
		return true
	case "composite member":
		return false
	}
	return a.Kind.Text == "construction" || !j.hasTopping() && a.Kind.Text == "permanent"
}

// split cuts a spread load that may be left out in part at the bearings with an overhang beyond, so that each part counts
// only where it is unfavourable.
func (j *job) split(l load) []load {
	a, b := j.overhangs()
	if l.permanent || !l.spread() || !a && !b {
		return []load{l}
	}
	left, right := j.m.Span.BearingA.FromEnd.Literal, j.bearingB()
	var out []load
	cut := func(name string, from, to quantity.Literal) {
		part := l
		part.name = l.name + " " + name
		if from.Quantity().Value > l.from.Quantity().Value {
			part.from = from
		}
		if to.Quantity().Value < l.to.Quantity().Value {
			part.to = to
		}
		if part.from.Quantity().Value < part.to.Quantity().Value {
			out = append(out, part)
		}
	}
	zero, length := plain("0", "m"), j.m.Span.Length.Literal
	if a {
		cut("overhang A", zero, left)
	}
	cut("span", pick(a, left, zero), pick(b, right, length))
	if b {
		cut("overhang B", right, length)
	}
	if len(out) == 1 {
		return []load{l}
	}
	return out
}

// bearingB is the middle of bearing B from end A.
func (j *job) bearingB() quantity.Literal {
	x := j.m.Span.Length.Base() - j.m.Span.BearingB.FromEnd.Base()
	return number(x, "m", places(x)+3)
}

// hasAxial says that an action has an axial force.
func (j *job) hasAxial() bool {
	return j.anyLoad(func(_ *member.Action, l *member.Load) bool { return l.Axial.Present() })
}

// axialWhileBuilt says that an axial force counts while the member is built. Without a topping one in use does too: that it may
// not be there yet.
func (j *job) axialWhileBuilt() bool {
	return j.hasAxial() && (!j.hasTopping() || j.anyLoad(func(a *member.Action, l *member.Load) bool { return l.Axial.Present() && j.onBare(a) }))
}

// anyLoad says that one of the loads in the member file is of a kind.
func (j *job) anyLoad(is func(*member.Action, *member.Load) bool) bool {
	for k := range j.m.Actions {
		a := &j.m.Actions[k]
		for i := range a.Loads {
			if is(a, &a.Loads[i]) {
				return true
			}
		}
	}
	return false
}

func (j *job) givenActions(c *trace.Chapter) {
	b := c.Block("actions", "Actions", nil, trace.Take(j.parameters)...)
	j.actionData = b
	loads := j.loadRows()
	names := make([]string, len(loads))
	for i, l := range loads {
		names[i] = l.name
	}
	j.loads = j.n.Axis("load", "load", "i", names)
	var from []member.Origin
	for _, l := range loads {
		from = append(from, l.origin)
	}
	line := pick(len(j.m.Actions) == 0, "no action but the self-weight", lines(from...))
	column := func(id, symbol, name, unit string, f func(load) quantity.Literal) {
		b.GivenRows(def(id, symbol, name, unit), j.loads, each(loads, f), line)
	}
	column("imposed", "q_{0,i}", pick(j.hasTopping(), "Load per length, downward, without the weights of member and topping", "Load per length, downward, without the self-weight"), "kN/m", func(l load) quantity.Literal { return l.q })
	column("weight-share", "w_i", "1 for the self-weight, 0 for the other loads", "", func(l load) quantity.Literal { return flag(l.action == ownWeight) })
	if j.hasTopping() {
		column("topping-share", "w_{t,i}", "1 for the weight of the topping, 0 for the other loads", "", func(l load) quantity.Literal { return flag(l.action == toppingWeight) })
	}
	column("point", "F_i", "Point load, downward (negative: upward)", "kN", func(l load) quantity.Literal { return l.f })
	column("from", "a_i", "Start of the load, or place of a point load, from end A", "m", func(l load) quantity.Literal { return l.from })
	column("to", "b_i", "End of the load, from end A", "m", func(l load) quantity.Literal { return l.to })
	if j.hasAxial() {
		column("axial", "N_i", "Axial force from end to end, compression positive", "kN", func(l load) quantity.Literal { return l.n })
	}
	column("permanent", "k_{G,i}", "1 for a permanent load, 0 for a variable one", "", func(l load) quantity.Literal { return flag(l.permanent) })
	if j.hasTopping() || j.building() {
		column("on-bare", "k_{b,i}", pick(j.hasTopping(), "1 for a load on the bare member, 0 for one on the member with its topping", "1 for a load that may be there while the member is built"), "", func(l load) quantity.Literal { return flag(l.bare) })
	}
	if j.building() {
		column("construction", "k_{c,i}", "1 for a construction load", "", func(l load) quantity.Literal { return flag(l.construction) })
	}
	for k, symbol := range []string{"ψ_{0,i}", "ψ_{1,i}", "ψ_{2,i}"} {
		b.GivenRows(def(fmt.Sprintf("psi-%d", k), symbol, [...]string{"Combination factor", "Frequent factor", "Quasi-permanent factor"}[k], "", ref(ec2.Actions, "Table A1.1")), j.loads,
			each(loads, func(l load) quantity.Literal { return j.psi(l.category, k) }), "category, from the national parameters")
	}
}

func flag(yes bool) quantity.Literal {
	if yes {
		return plain("1", "")
	}
	return plain("0", "")
}

// psi is ψ_k of a category; 0 for a permanent load, which does not use it, and for a construction load, which takes no
// part beside other loads when the member is in use.
func (j *job) psi(category string, k int) quantity.Literal {
	for i := range ec2.Parameters {
		p := &ec2.Parameters[i]
		for r, name := range p.Rows {
			if name != category {
				continue
			}
			if own := j.own(p); own != nil {
				return own.Table[r].Values[k].Literal
			}
			return plain(p.Table[r][k], "")
		}
	}
	return plain("0", "")
}
