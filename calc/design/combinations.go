package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// combination is one combination of actions: which action leads (−1: none), and whether ξ reduces the permanent
// ones.
type combination struct {
	name    string
	leads   int
	reduced bool
}

// leading has each variable action lead in turn; where there is none, the permanent loads stand alone.
func leading(j *job) []combination {
	var out []combination
	for k := range j.m.Actions {
		if a := &j.m.Actions[k]; a.Kind.Text == "variable" {
			out = append(out, combination{name: a.Name.Text + " leads", leads: k})
		}
	}
	if out == nil {
		return noneLeads(j)
	}
	return out
}

func noneLeads(*job) []combination { return []combination{{name: "no leading action", leads: -1}} }

// reducing says that 6.10a and 6.10b stand in place of 6.10.
func (j *job) reducing() bool { return j.m.Basis.Combination.Text == "6.10a/b" }

// consequence is K_FI by class, EN 1990 Table B3; the relief of CC1 is not taken.
var consequence = map[string]string{"CC1": "1.0", "CC2": "1.0", "CC3": "1.1"}

// ultimateList is 6.10 with each leading action, or 6.10a and 6.10b with each.
func (j *job) ultimateList() []combination {
	list := leading(j)
	if !j.reducing() {
		for i := range list {
			list[i].name = "6.10 " + list[i].name
		}
		return list
	}
	out := []combination{{name: "6.10a", leads: -1}}
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
	class := j.m.Basis.ConsequenceClass
	b.Given(def("consequence-factor", "K_FI", "Factor on the actions by consequence class: "+class.Text, "", ref(ec2.Actions, "Table B3")), plain(consequence[class.Text], ""), origin(class.Origin))
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
	b.Row = j.midSpan()
	b.Table("along", "Moments and shear forces at the ultimate limit state along the member", j.stations, "actions.effects/position",
		"moment", "moment-least", "shear-left", "shear-left-least", "shear-right", "shear-right-least")
	return b
}

// combination records a service combination: its factors, its moments and their largest.
func (j *job) combination(c *trace.Chapter, slug, title string, list func(*job) []combination, factor, moment, largest *clause.Formula) {
	combinations := list(j)
	axis := j.n.Axis(slug+" combination", "combination, "+slug, "n", names(combinations))
	b := c.Block(slug, title, j.stations, trace.Take(j.actionData, j.effects)...)
	j.marks(b, axis, combinations)
	b.Steps(factor, moment, largest)
	b.Row = j.midSpan()
}

// effectsFigure draws the ultimate moments and shear forces.
func (j *job) effectsFigure() {
	j.ultimate.Figure("diagram", "effects", "Moments and shear forces at the ultimate limit state.", "",
		trace.Plot{Role: "x", Key: "actions.effects/position"}, trace.Plot{Role: "support-A", Key: "given.span/bearing-a"}, trace.Plot{Role: "support-B", Key: "given.span/bearing-b"}, trace.Plot{Role: "M-max", Key: "moment"}, trace.Plot{Role: "M-min", Key: "moment-least"},
		trace.Plot{Role: "V-left-max", Key: "shear-left"}, trace.Plot{Role: "V-left-min", Key: "shear-left-least"},
		trace.Plot{Role: "V-right-max", Key: "shear-right"}, trace.Plot{Role: "V-right-min", Key: "shear-right-least"})
}
