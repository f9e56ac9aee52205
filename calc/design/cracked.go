package design

import (
	"strings"

	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/trace"
	"soffit/templates"
)

// demand is what a section must carry: the block with M_Ed and the shear forces, and the entry with M_Ed.
type demand struct {
	block         *trace.Block
	key           string
	suffix, words string // "while built"
}

// crackedWhileBuilt goes through the stations with the moments of construction: on the bare member, or on the whole where there
// is no topping.
func (j *job) crackedWhileBuilt(c *trace.Chapter) {
	if j.construction == nil {
		return
	}
	b := c.Block("while-built", "Moments and shear forces while the member is built", j.stations, trace.Take(j.construction)...)
	b.Row = j.midSpan()
	b.Steps(ec2.BuiltMoment, ec2.BuiltShearLeft, ec2.BuiltShearLeftMin, ec2.BuiltShearRight, ec2.BuiltShearRightMin)
	d := demand{block: b, key: b.Path() + "/" + ec2.BuiltMoment.ID, suffix: "-while-built", words: ", while the member is built"}
	for _, q := range j.asked {
		if q.bare || !j.hasTopping() && !q.below {
			j.cracked(c, q, d)
		}
	}
}

// cracked goes through the stations that crack in bending at the ultimate limit state: there the tendons must carry the
// tension that shear adds (8.10.2.3(1), 6.2.3(7)), and failure must announce itself when the load grows (5.10.1(5)P).
func (j *job) cracked(c *trace.Chapter, q *asked, d demand) {
	slug := func(what string) string { return strings.Replace(q.block.Slug, "bending", what, 1) + d.suffix }
	largest, key, from := ec2.LargestMoment, d.key, d.block
	takes := trace.Take(j.parameters, j.strengths, j.section, j.gross, j.tendonStrengths, j.positions, d.block, j.along, j.span, j.effects, q.force, j.transformed, q.block)
	if q.below {
		largest, key, from = ec2.LargestHoggingMoment, j.hoggingKey(q), q.hogging
		takes = append(takes, trace.Take(q.hogging)...)
	}
	at := j.largest(key)
	most := c.Block(slug("largest-moment"), pick(q.below, "Largest hogging moment at the stations", "Largest moment at the stations")+d.words+": "+at, nil, trace.At(from, at))
	most.Step(largest)
	takes = append(takes, trace.Take(most)...)
	if q.topped {
		takes = append(takes, trace.Take(j.topping, j.composite, j.toppingStrengths)...)
	}
	if q.axial != nil {
		takes = append(takes, trace.Take(q.axial)...)
	}
	if j.shearBuiltToo(q, d) {
		takes = append(takes, trace.Take(j.construction)...)
	}
	b := c.Block(slug("cracked"), pick(q.below, "Where the section cracks at the top at the ultimate limit state", "Where the section cracks at the ultimate limit state")+d.words, j.stations, takes...)
	if d.suffix == "" {
		q.cracked = b
	}
	b.Row = q.block.Row
	b.Text("cracked", templates.Text(pick(j.ducted(), "cracked-post-tensioned", "cracked")))
	where := b.Active()
	if q.below {
		where = j.rowsOf(q.block.Path() + "/" + j.sums(q).resistance.ID)
	}
	b.On(where, func() {
		b.Require(pick(q.below, ec2.NoLargerHoggingMoment, ec2.NoLargerMoment))
		b.Steps(j.edgeStresses(q)...)
		cracked, _ := b.Choose(j.cracks(q))
		sheared := cracked
		if j.ducted() { // anchored at its ends: the added tension is there also where nothing cracks
			sheared = b.Active()
			if !q.below {
				sheared, _ = b.Choose(ec2.BetweenBearings)
			}
		}
		b.On(sheared.Or(cracked), func() {
			resisting, _ := b.Choose(ec2.Resists)
			b.On(resisting, func() {
				b.On(sheared, func() { j.withShear(b, q, d) })
				b.On(cracked, func() { j.withWarning(b, q, d) })
			})
		})
	})
	columns := []string{"actions.effects/position", j.edgeStresses(q)[0].ID}
	for _, id := range []string{"added-moment", "moment-with-shear", "hogging-moment-with-shear", "bending-with-shear", "hogging-with-shear", j.crackingMoment(q).ID, "failure-with-warning"} {
		if b.Has(id) {
			columns = append(columns, id)
		}
	}
	b.Table("along", "Stations along the member: cracks, tension added by shear, warning", j.stations, columns...)
}

// hoggingKey is the entry with the hogging moment that a section is asked to carry.
func (j *job) hoggingKey(q *asked) string {
	return q.hogging.Path() + "/" + pick(q.bare, ec2.BareHoggingMoment.ID, j.hoggingMomentID())
}

// shearBuiltToo says that the hogging moments are those in use and while the member is built together.
func (j *job) shearBuiltToo(q *asked, d demand) bool {
	return q.below && d.suffix == "" && j.construction != nil && !j.hasTopping()
}

// named is a check whose name says beside which axial force, or when.
func named(k *clause.Check, more string) *clause.Check {
	if more == "" {
		return k
	}
	return &clause.Check{ID: k.ID, Name: k.Name + more, Ref: k.Ref, Demand: k.Demand, Limit: k.Limit}
}

// cracks is the question whether the section cracks.
func (j *job) cracks(q *asked) *clause.Condition {
	switch {
	case q.topped && q.below:
		return ec2.CrackedTopping
	case j.ducted():
		return ec2.CrackedOfPostTensioned
	}
	return ec2.CrackedAtUltimate
}

// edgeStresses are the tensions at the edge that the moment stretches; of a stretched topping also at the top of the member.
func (j *job) edgeStresses(q *asked) []*clause.Formula {
	switch {
	case q.topped && q.below:
		return []*clause.Formula{ec2.ToppedTopStress, ec2.ToppedMemberStress}
	case q.topped:
		return []*clause.Formula{pick(q.axial != nil, ec2.AxialToppedBottomStress, ec2.ToppedBottomStress)}
	case q.below:
		return []*clause.Formula{pick(q.axial != nil, ec2.AxialTopStress, ec2.TopStress)}
	}
	return []*clause.Formula{pick(q.axial != nil, ec2.AxialBottomStress, ec2.BottomStress)}
}

// crackingMoment is the greatest moment at which that edge cracks.
func (j *job) crackingMoment(q *asked) *clause.Formula {
	switch {
	case q.topped && q.below:
		return ec2.ToppedHoggingCrackingMoment
	case q.topped:
		return pick(q.axial != nil, ec2.AxialToppedCrackingMoment, ec2.ToppedCrackingMoment)
	case q.below:
		return pick(q.axial != nil, ec2.AxialHoggingCracking, ec2.HoggingCracking)
	}
	return pick(q.axial != nil, ec2.AxialCrackingMoment, ec2.CrackingMoment)
}

// withShear adds the tension of the shear force.
func (j *job) withShear(b *trace.Block, q *asked, d demand) {
	b.Step(pick(j.shearBuiltToo(q, d), ec2.LargestShearBuilt, ec2.LargestShear))
	b.Steps(ec2.LeverArm, ec2.AddedMoment, pick(q.below, ec2.HoggingMomentWithShear, ec2.MomentWithShear))
	b.Check(named(pick(q.below, ec2.HoggingWithShear, ec2.BendingWithShear), q.words+d.words))
}

// withWarning asks for cracks before failure when the load grows.
func (j *job) withWarning(b *trace.Block, q *asked, d demand) {
	b.Text("warning", templates.Text(pick(j.ducted(), "warning-post-tensioned", "warning")))
	if !(q.topped && q.below) {
		b.Steps(ec2.InitialForce, ec2.InitialMoment, ec2.FinalForce, ec2.FinalMoment)
	}
	b.Step(j.crackingMoment(q))
	b.Check(named(ec2.FailureWithWarning, pick(q.below, ", hogging", "")+q.words+d.words))
}
