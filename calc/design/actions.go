package design

import (
	"math"
	"strings"

	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/templates"
)

// base reads a recorded value, in base units; 0 where the record has stopped on an error.
func (j *job) base(key string, at trace.Place) float64 {
	l := trace.LineOf(j.n.Entry(key))
	if l == nil {
		return 0
	}
	i := trace.Flat(l.Axes, at)
	if i < 0 {
		return 0
	}
	return l.Values[i]
}

// hogs says that the loads may bend the member upward by more than its short ends do: an overhang, or a load that acts
// upward.
func (j *job) hogs() bool {
	a, b := j.overhangs()
	return a || b || j.anyLoad(func(_ *member.Action, l *member.Load) bool { return l.Uniform.Base() < 0 || l.Point.Base() < 0 })
}

// actionsChapter gives moments and shear forces of each load at each station, and their combinations.
func (j *job) actionsChapter(c *trace.Chapter) {
	list := j.stationList()
	names, x := make([]string, len(list)), make([]quantity.Literal, len(list))
	for i, s := range list {
		names[i], x[i] = s.name, number(s.x, "m", places(s.x)+3)
	}
	j.stations = j.n.Axis("station", "station along the member", "", names)

	b := c.Block("loads", "Loads and reactions", nil, append(j.toppingTake(), trace.Take(j.gross, j.span, j.spanLength, j.actionData)...)...)
	j.reactions = b
	b.Text("loads", j.loadsText())
	if j.hasTopping() {
		b.Steps(mechanics.ToppingWeight, mechanics.LoadWithTopping)
	} else {
		b.Step(mechanics.Load)
	}
	b.Steps(mechanics.ReactionB, mechanics.ReactionA)

	b = c.Block("effects", "Effects of each load along the member", j.stations, trace.Take(j.span, j.actionData, j.reactions)...)
	j.effects = b
	b.GivenRows(def("position", "x_m", "Distance of the station from end A", "m"), j.stations, x, j.stationSource())
	b.Row = j.midSpan()
	before := b.Active()
	if _, overB := j.overhangs(); overB || j.ducted() {
		var beyond trace.Rows
		beyond, before = b.Choose(mechanics.BeyondB)
		b.On(beyond, func() { b.Steps(mechanics.LoadMomentBeyond, mechanics.ShearLeftBeyond, mechanics.ShearRightBeyond) })
	}
	b.On(before, func() { b.Steps(mechanics.LoadMoment, mechanics.ShearLeft, mechanics.ShearRight) })
	if j.hasTopping() {
		b.Step(mechanics.BareMoment)
	}

	j.ultimate = j.ultimateCombinations(c)
	j.characteristic = j.combination(c, "characteristic", "Characteristic combination", leading, ec2.CharacteristicFactor, j.both(ec2.CharacteristicMoment, ec2.CharacteristicEnvelope, ec2.CharacteristicMomentMin, ec2.CharacteristicEnvelopeMin)...)
	j.combination(c, "frequent", "Frequent combination", leading, ec2.FrequentFactor, j.both(ec2.FrequentMoment, ec2.FrequentEnvelope, ec2.FrequentMomentMin, ec2.FrequentEnvelopeMin)...)
	b = c.Block("quasi-permanent", "Quasi-permanent combination", j.stations, trace.Take(j.actionData, j.effects)...)
	b.Row = j.midSpan()
	b.Step(ec2.QuasiPermanentMoment)
	columns := []string{"actions.effects/position", "actions.characteristic/characteristic", "actions.frequent/frequent", "quasi-permanent"}
	if j.hogs() {
		b.Step(ec2.QuasiPermanentMomentMin)
		columns = append(columns, "actions.characteristic/characteristic-least", "actions.frequent/frequent-least", "quasi-permanent-least")
	}
	b.Table("service", pick(j.hogs(), "Largest and least moments in service along the member", "Largest moments in service along the member"), j.stations, columns...)
	j.effectsFigure(j.ultimate, "Moments and shear forces at the ultimate limit state.", "")
	if j.building() {
		j.constructionCombinations(c)
	}
	j.bearings(c)
}

// both are the formulas of the largest moments, and of a member that hogs those of the least.
func (j *job) both(moment, largest, momentLeast, least *clause.Formula) []*clause.Formula {
	if j.hogs() {
		return []*clause.Formula{moment, largest, momentLeast, least}
	}
	return []*clause.Formula{moment, largest}
}

// toppingTake is what the load of the topping follows from.
func (j *job) toppingTake() []trace.Source {
	if !j.hasTopping() {
		return nil
	}
	return trace.Take(j.topping)
}

// loadKey is the entry that gives the loads per length.
func (j *job) loadKey() string {
	return "actions.loads/" + pick(j.hasTopping(), mechanics.LoadWithTopping, mechanics.Load).ID
}

// loadsText says how the loads are taken, as far as it concerns this member.
func (j *job) loadsText() string {
	out := []string{"loads"}
	if a, b := j.overhangs(); a || b {
		out = append(out, "overhangs")
	}
	if j.hasAxial() {
		out = append(out, "axial")
	}
	switch {
	case j.propped():
		out = append(out, "propped")
	case j.hasTopping():
		out = append(out, "unpropped")
	}
	return texts(out...)
}

// texts are templates, one below another.
func texts(names ...string) string {
	out := make([]string, len(names))
	for i, n := range names {
		out[i] = templates.Text(n)
	}
	return strings.Join(out, "\n\n")
}

// midSpan is the station nearest to the middle of the span: a load may stand there and give it its name.
func (j *job) midSpan() int {
	x := trace.LineOf(j.n.Entry("actions.effects/position"))
	if x == nil {
		return 0
	}
	middle := (j.base("given.span/bearing-a", nil) + j.base("given.span/bearing-b", nil)) / 2
	best := 0
	for i, v := range x.Values {
		if math.Abs(v-middle) < math.Abs(x.Values[best]-middle) {
			best = i
		}
	}
	return best
}
