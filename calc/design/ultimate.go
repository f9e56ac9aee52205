package design

import (
	"strings"

	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/trace"
	"soffit/templates"
)

// ultimateChapter justifies the member in bending, 6.1, with what anchorage, shear and failure with warning ask of it.
func (j *job) ultimateChapter(c *trace.Chapter) {
	sags, hogs := j.prestrain(c, false), prestressed{}
	if j.hogs() {
		hogs = j.prestrain(c, true)
	}
	j.axialBlocks(c)
	j.hoggingMoments(c)
	for _, q := range j.questions(sags, hogs) {
		var rows trace.Rows
		if q.below {
			if rows = j.rowsWhere(q.hogging.Path() + "/" + ec2.Hogging.ID); !rows.Any() {
				continue
			}
		}
		j.resist(c, q, rows)
		j.asked = append(j.asked, q)
		if !q.bare {
			j.cracked(c, q, demand{block: j.ultimate, key: "actions.ultimate/moment"})
		}
	}
	j.resistance = j.asked[0].block
	j.constructionOnMember(c)
	j.crackedWhileBuilt(c)
	seen := map[bool]bool{}
	for _, q := range j.asked {
		if !q.bare && !seen[q.below] {
			j.minimumSteel(c, q)
			seen[q.below] = true
		}
	}
	j.maximumSteel(c)
}

// questions are the ways in which the section is asked, in the order of the note.
func (j *job) questions(p, hogs prestressed) []*asked {
	var out []*asked
	add := func(q asked) {
		q.fibred = j.fibred() && q.topped == j.hasTopping() // the fibres are those of the finished section
		out = append(out, &q)
	}
	for _, n := range j.axialForces {
		with := n.with()
		add(asked{words: with, slug: "bending" + n.slug, title: "Resistance along the span, sagging" + with, texts: pick(n.first, j.lawTexts(), nil), check: ec2.BendingSufficient,
			view: pick(j.hasTopping(), j.toppedFromTop, j.fromTop), places: pick(j.hasTopping(), j.toppedPositions, j.positions), prestrain: pick(j.hasTopping(), p.topped, p.bare), force: p.force,
			demand: trace.Take(j.ultimate), axial: n.block, topped: j.hasTopping()})
	}
	if j.hasTopping() && j.construction != nil {
		for _, n := range j.bareAxialForces {
			add(asked{words: n.with(), slug: "bare-bending" + n.slug, title: "Resistance of the bare member during construction, sagging" + n.with(), texts: pick(n.first, []string{"bare"}, nil), check: ec2.BareSufficient,
				view: j.fromTop, places: j.positions, prestrain: p.bare, force: p.force, demand: trace.Take(j.construction), axial: n.block, bare: true})
		}
	}
	if !j.hogs() {
		return out
	}
	for _, n := range j.axialForces {
		with := n.with()
		add(asked{words: with, slug: "hogging-bending" + n.slug, title: "Resistance where the moment hogs" + with, texts: pick(n.first, []string{"hogging"}, nil), check: ec2.HoggingSufficient,
			view: pick(j.hasTopping(), j.toppedFromBelow, j.fromBelow), places: j.positionsBelow, prestrain: pick(j.hasTopping(), hogs.topped, hogs.bare), force: hogs.force,
			demand: trace.Take(j.hogging), axial: n.block, below: true, topped: j.hasTopping(), hogging: j.hogging})
	}
	if j.bareHogging != nil {
		for _, n := range j.bareAxialForces {
			add(asked{words: n.with(), slug: "bare-hogging-bending" + n.slug, title: "Resistance of the bare member during construction where the moment hogs" + n.with(), check: ec2.BareHoggingSufficient,
				view: j.fromBelow, places: j.positionsBelow, prestrain: hogs.bare, force: hogs.force, demand: trace.Take(j.bareHogging), axial: n.block, below: true, bare: true, hogging: j.bareHogging})
		}
	}
	return out
}

// lawTexts are the templates that say how concrete and steel are taken.
func (j *job) lawTexts() []string {
	switch {
	case j.hasTopping():
		return []string{"fibres", "locked-in", "rows"}
	case j.fibred():
		return []string{"fibres", "rows"}
	}
	return []string{"bending", "rows"}
}

// axialBlocks give the axial forces beside which the section is asked: the least, which takes most from the resistance where
// it does not crush the concrete, and the greatest. Those on the bare member stand by themselves where there is a topping.
func (j *job) axialBlocks(c *trace.Chapter) {
	j.axialForces, j.bareAxialForces = []axialForce{{first: true}}, []axialForce{{first: true}}
	if !j.hasAxial() {
		return
	}
	axial := func(slug, title, words string, f *clause.Formula, first bool, from ...*trace.Block) axialForce {
		b := c.Block("axial"+slug, title+", "+words, nil, trace.Take(from...)...)
		b.Step(f)
		return axialForce{slug: strings.TrimPrefix(slug, "-bare"), words: words, block: b, first: first}
	}
	both := func(slug, title string, least, greatest *clause.Formula, from ...*trace.Block) []axialForce {
		return []axialForce{axial(slug+"-least", title, "least axial force", least, true, from...), axial(slug+"-greatest", title, "greatest axial force", greatest, false, from...)}
	}
	switch {
	case j.construction == nil:
		j.axialForces = both("", "Axial force", ec2.LeastAxial, ec2.GreatestAxial, j.ultimate)
	case !j.hasTopping():
		j.axialForces = both("", "Axial force", ec2.LeastAxialBuilt, ec2.GreatestAxialBuilt, j.ultimate, j.construction)
	default:
		j.axialForces = both("", "Axial force", ec2.LeastAxial, ec2.GreatestAxial, j.ultimate)
		if j.axialWhileBuilt() {
			j.bareAxialForces = both("-bare", "Axial force on the bare member", ec2.LeastAxialBare, ec2.GreatestAxialBare, j.construction)
		}
	}
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

// hoggingMoments give the hogging moments as positive numbers and say where there are any. A member that hogs by more than its
// short ends do must carry them with steel; the others are checked as plain concrete there.
func (j *job) hoggingMoments(c *trace.Chapter) {
	built := j.construction != nil && !j.hasTopping()
	takes := trace.Take(j.parameters, j.strengths, j.gross, j.ultimate)
	if built {
		takes = append(takes, trace.Take(j.construction)...)
	}
	b := c.Block("hogging", "Hogging moments of the loads", j.stations, takes...)
	j.hogging = b
	b.Step(pick(built, ec2.HoggingMomentBuilt, ec2.HoggingMoment))
	yes, _ := b.Choose(ec2.Hogging)
	if !j.hogs() {
		b.On(yes, func() {
			b.Steps(ec2.HoggingTension, ec2.PlainTensileStrength)
			b.Check(ec2.HoggingResisted)
		})
		return
	}
	if j.construction != nil && j.hasTopping() {
		j.bareHogging = c.Block("bare-hogging", "Hogging moments on the bare member", j.stations, trace.Take(j.construction)...)
		j.bareHogging.Step(ec2.BareHoggingMoment)
		j.bareHogging.Decide(ec2.Hogging)
	}
}

// rowsWhere are the stations at which a recorded condition holds.
func (j *job) rowsWhere(key string) trace.Rows {
	out := make(trace.Rows, len(j.stations.Rows))
	e, ok := j.n.Entry(key).(*trace.Choice)
	for i := range out {
		out[i] = ok && i < len(e.Outcomes) && e.Outcomes[i] == trace.Yes
	}
	return out
}

// hoggingMomentID is the ID of the formula that gives M_Ed,h.
func (j *job) hoggingMomentID() string {
	return pick(j.construction != nil && !j.hasTopping(), ec2.HoggingMomentBuilt, ec2.HoggingMoment).ID
}

// rowsOf are the stations at which an entry was computed.
func (j *job) rowsOf(key string) trace.Rows {
	out := make(trace.Rows, len(j.stations.Rows))
	l := trace.LineOf(j.n.Entry(key))
	for i := range out {
		out[i] = l != nil && takenAt(l, i)
	}
	return out
}

// constructionOnMember holds the moments during construction against the resistance of a member without topping, beside each
// axial force.
func (j *job) constructionOnMember(c *trace.Chapter) {
	if j.hasTopping() || j.construction == nil {
		return
	}
	for _, q := range j.asked {
		if q.below {
			continue
		}
		b := c.Block(strings.Replace(q.block.Slug, "bending", "construction", 1), "Bending during construction, sagging"+q.words, j.stations, trace.Take(j.construction, q.block)...)
		if q.block == j.resistance {
			b.Text("construction", templates.Text("built"))
		}
		b.Check(named(ec2.ConstructionSufficient, q.words))
	}
}

// minimumSteel checks minimum steel at every station where steel is bonded in the tension zone.
func (j *job) minimumSteel(c *trace.Chapter, q *asked) {
	view := pick(q.below, j.fromBelow, j.fromTop)
	concrete := trace.Take(j.concrete, j.strengths)
	if q.topped && q.below {
		t := c.Block("topping-stretched", "Concrete of the stretched topping", nil, trace.Take(j.topping, j.toppingStrengths)...)
		t.Steps(ec2.StretchedStrength, ec2.StretchedMeanTension, ec2.StretchedLowerTension)
		concrete = trace.Take(t)
	}
	takes := trace.Take(j.parameters, j.section, j.gross, view, q.places, j.tendons, j.tendonStrengths, j.stress, j.along, j.effects, j.span, j.ultimate, q.cracked, q.block)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barStrengths)...)
	}
	takes = append(takes, concrete...)
	if q.topped && q.below {
		takes = append(takes, trace.Take(j.topping)...)
	}
	b := c.Block(pick(q.below, "hogging-", "")+"minimum-steel", pick(q.below, "Minimum steel at the top", "Minimum steel"), j.stations, takes...)
	b.Row = q.block.Row
	b.Text("minimum", templates.Text("minimum"))
	where := b.Active()
	if overA, overB := j.overhangs(); q.below {
		where = j.rowsOf(q.block.Path() + "/" + j.sums(q).resistance.ID)
	} else if overA || overB || j.ducted() {
		where, _ = b.Choose(ec2.MinimumAtBottom)
	}
	b.On(where, func() {
		var not trace.Rows
		where, not = b.Choose(pick(j.hasBars(), ec2.AnchoredInFullWithBars, ec2.AnchoredInFull))
		if !j.ducted() {
			b.On(not, func() { b.Check(ec2.UncrackedEnd) })
		}
	})
	b.On(where, func() {
		strength, source := plain("500", "MPa"), "no bars: a usual strength to express the minimum in; it cancels but in 0.0013·b_t·d"
		if j.hasBars() {
			r := j.m.Bars.Rows[0]
			strength, source = r.Fyk.Literal, given(r.Fyk)
		}
		b.Given(def("reference-strength", "f_yk", "Yield strength that the minimum is expressed in", "MPa"), strength, source)
		switch {
		case q.topped && q.below:
			b.Step(ec2.ToppingTensionWidth)
		case j.hasVoids():
			b.Steps(ec2.TensionPartDepth, ec2.TensionPartArea, ec2.TensionVoidReach, ec2.TensionVoidArea, ec2.TensionWidthWithVoids)
		default:
			b.Steps(ec2.TensionPartDepth, ec2.TensionPartArea, ec2.TensionWidth)
		}
		minimum, _ := j.formula(ec2.MinimumSteel)
		b.Step(minimum)
		if minimum != ec2.MinimumSteel {
			b.Require(ec2.MinimumSteelPositive)
		}
		switch {
		case j.ducted() && j.hasBars():
			b.Step(ec2.PostTensionSteelWithBars)
		case j.ducted():
			b.Step(ec2.PostTensionSteel)
		default:
			b.Step(pick(j.hasBars(), ec2.TensionSteelWithBars, ec2.TensionSteel))
		}
		b.Check(pick(q.below, ec2.TopSteelProvided, ec2.MinimumSteelProvided))
		if j.ducted() && j.hasBars() {
			b.Steps(ec2.BarsAlone, ec2.BarsDepth, ec2.BarsNeeded)
			b.Decide(ec2.BarsReach)
		}
	})
}

// maximumSteel checks the whole steel of the section.
func (j *job) maximumSteel(c *trace.Chapter) {
	takes := trace.Take(j.parameters, j.gross, j.tendonStrengths)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barStrengths)...)
	}
	b := c.Block("maximum-steel", "Maximum steel", nil, takes...)
	maximum, _ := j.formula(ec2.MaximumSteel)
	b.Step(maximum)
	if maximum != ec2.MaximumSteel {
		b.Require(ec2.MaximumSteelPositive)
	}
	b.Step(pick(j.hasBars(), ec2.TotalSteelWithBars, ec2.TotalSteel))
	b.Check(ec2.MaximumSteelKept)
}

// axialForce is an axial force beside which the section is asked for its resistance.
type axialForce struct {
	slug, words string
	block       *trace.Block // gives N_Ed; nil for none
	first       bool
}

// with says beside which axial force, "" where there is none.
func (n axialForce) with() string {
	if n.block == nil {
		return ""
	}
	return ", " + n.words
}
