package design

import (
	"cmp"
	"fmt"
	"math"
	"slices"

	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/templates"
)

// spanParts is in how many equal parts the span is cut for stations.
const spanParts = 40

// station is a place along the member at which everything is worked.
type station struct {
	name string
	x    float64 // mm from end A
}

// stationList is the fortieths of the span, each load, and where the force of a row of tendons starts, has been handed
// over and can be anchored in full. Bearings and loads stand where they are, to the last digit, for the shear force
// jumps there; the others are rounded to 1 mm. One place has one station.
func (j *job) stationList() []station {
	length := j.m.Span.Length.Base()
	a, b := j.m.Span.BearingA.FromEnd.Base(), length-j.m.Span.BearingB.FromEnd.Base()
	var all []station
	add := func(name string, x float64) {
		if x < a || x > b {
			return
		}
		for _, s := range all {
			if s.x == x {
				return
			}
		}
		for slices.ContainsFunc(all, func(s station) bool { return s.name == name }) {
			name += "′"
		}
		all = append(all, station{name, x})
	}
	round := func(name string, x float64) { add(name, math.Round(x)) }
	add("bearing A", a)
	add("bearing B", b)
	for _, l := range j.loadRows()[1:] {
		from, to := l.from.Quantity().Value, l.to.Quantity().Value
		if from == to {
			add("load "+l.name, from)
			continue
		}
		add("load "+l.name+" from", from)
		add("load "+l.name+" to", to)
	}
	round("mid-span", (a+b)/2)
	for k := 1; k < spanParts; k++ {
		round(fmt.Sprintf("%g l", float64(k)/spanParts), a+(b-a)*float64(k)/spanParts)
	}
	for i, r := range j.rows.Rows {
		row := trace.Place{{Axis: j.rows, Row: i}}
		debonded := j.base("given.tendons/debonded-length", row)
		for _, p := range []struct {
			name string
			x    float64
		}{{"start", debonded}, {"l_pt2", debonded + j.base("prestress.transmission/upper-transmission-length", row)},
			{"l_bpd", debonded + j.base("prestress.transmission/anchorage-length", row)}} {
			x := math.Ceil(p.x) // never on the short side
			add(p.name+" "+r+" A", x)
			add(p.name+" "+r+" B", length-x)
		}
	}
	slices.SortFunc(all, func(s, t station) int { return cmp.Compare(s.x, t.x) })
	return all
}

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

// actionsChapter gives moments and shear forces of each load at each station, and their combinations.
func (j *job) actionsChapter(c *trace.Chapter) {
	list := j.stationList()
	names, x := make([]string, len(list)), make([]quantity.Literal, len(list))
	for i, s := range list {
		names[i], x[i] = s.name, number(s.x, "m", places(s.x)+3)
	}
	j.stations = j.n.Axis("station", "station along the member", "", names)

	b := c.Block("loads", "Loads and reactions", nil, trace.Take(j.gross, j.span, j.spanLength, j.actionData)...)
	j.reactions = b
	b.Text("loads", templates.Text("loads"))
	b.Steps(mechanics.Load, mechanics.ReactionB, mechanics.ReactionA)

	b = c.Block("effects", "Effects of each load along the member", j.stations, trace.Take(j.span, j.actionData, j.reactions)...)
	j.effects = b
	b.GivenRows(def("position", "x_m", "Distance of the station from end A", "m"), j.stations, x, fmt.Sprintf("the span in %d parts, loads, ends of debonding, of l_pt2 and of l_bpd", spanParts))
	b.Row = j.midSpan()
	b.Steps(mechanics.LoadMoment, mechanics.ShearLeft, mechanics.ShearRight)

	j.ultimate = j.ultimateCombinations(c)
	j.combination(c, "characteristic", "Characteristic combination", leading, ec2.CharacteristicFactor, ec2.CharacteristicMoment, ec2.CharacteristicEnvelope)
	j.combination(c, "frequent", "Frequent combination", leading, ec2.FrequentFactor, ec2.FrequentMoment, ec2.FrequentEnvelope)
	b = c.Block("quasi-permanent", "Quasi-permanent combination", j.stations, trace.Take(j.actionData, j.effects)...)
	b.Row = j.midSpan()
	b.Step(ec2.QuasiPermanentMoment)
	b.Table("service", "Largest moments in service along the member", j.stations, "actions.effects/position", "actions.characteristic/characteristic", "actions.frequent/frequent", "quasi-permanent")
	j.effectsFigure()
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
