package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// combination is one combination of actions: which action leads, and whether ξ reduces the permanent
// ones.
type combination struct {
	name    string
	leads   int // place in the member file, or noAction
	reduced bool
}

// noAction leads a combination of permanent loads alone.
const noAction = -1

// leading has each variable action lead in turn; where there is none, the permanent loads stand alone. Construction loads
// take no part: they are gone when the member is in use.
func leading(j *job) []combination {
	return j.leads(func(a *member.Action) bool { return a.Kind.Text == "variable" })
}

// leadingAtUltimate has construction loads on the member with its topping lead too, beside the variable actions: that is on
// the safe side.
func leadingAtUltimate(j *job) []combination {
	return j.leads(func(a *member.Action) bool {
		return a.Kind.Text == "variable" || a.Kind.Text == "construction" && !j.onBare(a)
	})
}

// leads has each action of a kind lead in turn, or none where there is none.
func (j *job) leads(is func(*member.Action) bool) []combination {
	var out []combination
	for k := range j.m.Actions {
		if a := &j.m.Actions[k]; is(a) {
			out = append(out, combination{name: a.Name.Text + " leads", leads: k})
		}
	}
	if out == nil {
		out = []combination{{name: "no leading action", leads: noAction}}
	}
	return out
}

// reducing says that 6.10a and 6.10b stand in place of 6.10.
func (j *job) reducing() bool { return j.m.Basis.Combination.Text == "6.10a/b" }

// consequences are K_FI by class, EN 1990 Table B3; the relief of CC1 is not taken.
var consequences = map[string]string{"CC1": "1.0", "CC2": "1.0", "CC3": "1.1"}

// ultimateList is 6.10 with each leading action, or 6.10a and 6.10b with each.
func (j *job) ultimateList() []combination {
	list := leadingAtUltimate(j)
	if !j.reducing() {
		for i := range list {
			list[i].name = "6.10 " + list[i].name
		}
		return list
	}
	out := []combination{{name: "6.10a", leads: noAction}}
	for _, c := range list {
		c.name, c.reduced = "6.10b "+c.name, true
		out = append(out, c)
	}
	return out
}

// marks records which load leads in which combination.
func (j *job) marks(b *trace.Block, axis *trace.Axis, list []combination) {
	loads := j.loadRows()
	var marks []quantity.Literal
	for _, l := range loads {
		for _, c := range list {
			marks = append(marks, flag(c.leads >= 0 && l.action == c.leads))
		}
	}
	b.GivenOver(def("leads", "l_{i,n}", "1 where the action of the load leads the combination", ""), []*trace.Axis{j.loads, axis}, marks, "kind of combination")
}

// consequence records K_FI.
func (j *job) consequence(b *trace.Block) {
	class := j.m.Basis.ConsequenceClass
	b.Given(def("consequence-factor", "K_FI", "Factor on the actions by consequence class: "+class.Text, "", ref(ec2.Actions, "Table B3")), plain(consequences[class.Text], ""), origin(class.Origin))
}

func names(list []combination) []string {
	out := make([]string, len(list))
	for i, c := range list {
		out[i] = c.name
	}
	return out
}

func (j *job) ultimateCombinations(c *trace.Chapter) *trace.Block {
	list := j.ultimateList()
	axis := j.n.Axis("ultimate combination", "combination at the ultimate limit state", "n", names(list))
	b := c.Block("ultimate", "Combinations at the ultimate limit state", j.stations, trace.Take(j.parameters, j.actionData, j.effects)...)
	j.marks(b, axis, list)
	reduced := make([]quantity.Literal, len(list))
	for i, k := range list {
		reduced[i] = flag(k.reduced)
	}
	j.consequence(b)
	b.Step(ec2.CombinationFactor)
	if j.reducing() {
		b.GivenRows(def("reduced", "k_{r,n}", "1 where ξ reduces the permanent actions (6.10b)", ""), axis, reduced, "kind of combination")
		b.Steps(ec2.PermanentReduction, ec2.UpperFactorReduced)
	} else {
		b.Step(ec2.UpperFactor)
	}
	b.Step(ec2.LowerFactor)
	b.Steps(ec2.UltimateMoment, ec2.UltimateMomentMin, ec2.UltimateShearLeft, ec2.UltimateShearRight, ec2.UltimateShearLeftMin, ec2.UltimateShearRightMin)
	b.Steps(ec2.MomentEnvelope, ec2.MomentEnvelopeMin, ec2.ShearLeftEnvelope, ec2.ShearRightEnvelope, ec2.ShearLeftEnvelopeMin, ec2.ShearRightEnvelopeMin)
	if j.hasAxial() {
		b.Steps(ec2.UltimateAxial, ec2.UltimateAxialMin, ec2.AxialEnvelope, ec2.AxialEnvelopeMin)
	}
	b.Row = j.midSpan()
	b.Table("along", "Moments and shear forces at the ultimate limit state along the member", j.stations, "actions.effects/position",
		"moment", "moment-least", "shear-left", "shear-left-least", "shear-right", "shear-right-least")
	return b
}

// combination records a service combination: its factors, its moments and their largest.
func (j *job) combination(c *trace.Chapter, slug, title string, list func(*job) []combination, factor *clause.Formula, moments ...*clause.Formula) *trace.Block {
	combinations := list(j)
	axis := j.n.Axis(slug+" combination", "combination, "+slug, "n", names(combinations))
	b := c.Block(slug, title, j.stations, trace.Take(j.actionData, j.effects)...)
	j.marks(b, axis, combinations)
	b.Step(factor)
	b.Steps(moments...)
	b.Row = j.midSpan()
	return b
}

// effectsFigure draws the moments and shear forces of a block; prefix stands before the IDs of its columns.
func (j *job) effectsFigure(b *trace.Block, caption, prefix string) {
	b.Figure("diagram", "effects", caption, "",
		trace.Plot{Role: "x", Key: "actions.effects/position"}, trace.Plot{Role: "support-A", Key: "given.span/bearing-a"}, trace.Plot{Role: "support-B", Key: "given.span/bearing-b"}, trace.Plot{Role: "M-max", Key: prefix + "moment"}, trace.Plot{Role: "M-min", Key: prefix + "moment-least"},
		trace.Plot{Role: "V-left-max", Key: prefix + "shear-left"}, trace.Plot{Role: "V-left-min", Key: prefix + "shear-left-least"},
		trace.Plot{Role: "V-right-max", Key: prefix + "shear-right"}, trace.Plot{Role: "V-right-min", Key: prefix + "shear-right-least"})
}
