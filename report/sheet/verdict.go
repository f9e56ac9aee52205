package sheet

import (
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// Columns of the verdict table, from the left of the sheet: left edge and width.
type slot struct{ x, w draw.Pt }

func (s slot) right() draw.Pt { return s.x + s.w }

var verdictSlots = func() (s struct{ step, check, where, demand, limit, ratio, bar slot }) {
	x := left
	for _, p := range []struct {
		slot *slot
		w    draw.Pt
	}{{&s.step, 30}, {&s.check, 138}, {&s.where, 64}, {&s.demand, 60}, {&s.limit, 60}, {&s.ratio, 30}, {&s.bar, 0}} {
		*p.slot = slot{x, p.w}
		x += p.w + 7
	}
	s.bar.w = right - s.bar.x - 1
	return s
}()

// verdict sets the verdict in words and the table of every check.
func (c *composer) verdict() {
	j := judge(c.note)
	words := j.words()
	c.add(&element{owner: "verdict", above: 10, height: 22, keep: true, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full verdict")
		cv.Text(left, y+13, draw.Bold, 13, words+".")
		if j.fail > 0 {
			draw.TextRight(cv, right, y+13, draw.Bold, 11, "NOT FOR CONSTRUCTION")
		}
	}})
	if len(j.checks) == 0 {
		return
	}
	head := &element{owner: "verdict", above: 4, height: 17, keep: true, paint: func(cv draw.Canvas, y draw.Pt) {
		s := verdictSlots
		cv.Owner("full verdict head")
		cv.Line(left, y, right, y, strongRule)
		base := y + 10.5
		put := func(x draw.Pt, t string) { cv.Text(x, base, draw.Bold, tableSize, t) }
		put(s.step.x, "step")
		put(s.check.x, "check")
		put(s.where.x, "where")
		draw.TextRight(cv, s.demand.right(), base, draw.Bold, tableSize, "demand")
		draw.TextRight(cv, s.limit.right(), base, draw.Bold, tableSize, "limit")
		draw.TextRight(cv, s.ratio.right(), base, draw.Bold, tableSize, "ratio")
		draw.TextCentre(cv, unity(s.bar), base, draw.Serif, smallSize, "1.00")
		cv.Line(left, y+14.5, right, y+14.5, tableRule)
	}}
	head.head = head
	rows := []*element{head}
	for i, k := range j.checks {
		rows = append(rows, c.verdictLine(k, head, i == len(j.checks)-1))
	}
	keepEnds(rows[1:])
	c.add(rows...)
	note := stack{w: fullColumn.w}
	note.words(draw.Serif, smallSize, smallLead, 0, "Ratio is demand over limit, rounded up; the upright line marks 1.00, a black bar fails. Where the limit is zero or less, the margin is given in place of a ratio. Each check stands for its governing place.")
	c.add(&element{owner: "verdict", above: 5, height: note.bottom, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full verdict note")
		note.paint(cv, left, y)
	}})
}

// unity is where the line of 1.00 stands in the slot of the bars.
func unity(s slot) draw.Pt { return s.x + s.w*0.8 }

// verdictLine is one check.
func (c *composer) verdictLine(k *trace.Check, head *element, last bool) *element {
	s := verdictSlots
	w := governing(nil, k)
	name := stack{w: s.check.w}
	name.words(draw.Serif, tableSize, tableLead-1, 0, k.Name)
	where := stack{w: s.where.w}
	if len(k.Axes) > 0 {
		where.words(draw.Serif, tableSize, tableLead-1, 0, trace.RowName(k.Axes, k.Worst))
	}
	value := func(u trace.Use) mathset.Box {
		l, i, err := c.note.Resolve(u, w.place)
		if err != nil {
			c.fail("check %s: %s cannot be found", k.Key, u.Symbol)
			return mathset.Box{}
		}
		return mathset.Setting{Size: tableSize}.Value(l.Shown[i], l.Unit.String()).Box()
	}
	demand, limit := value(k.Demand), value(k.Limit)
	fails := k.Failed()
	var margin mathset.Box
	if m := k.Margin[k.Worst]; m != "" {
		set := mathset.Setting{Size: tableSize}
		number := set.Value(m, k.Unit.String())
		if fails {
			number = set.Result(m, k.Unit.String())
		}
		margin = set.Words(draw.Serif, "margin").Then(0.25, number).Box()
	}
	h := max(name.bottom, where.bottom) + 4.5
	return &element{owner: "verdict", height: h, head: head, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full verdict " + k.Number)
		base := y + 2 + tableSize*ascent
		cv.Text(s.step.x, base, draw.Serif, tableSize, k.Number)
		cv.Link(s.step.x, y, s.step.w, tableLead, k.Key)
		name.paint(cv, s.check.x, y+2)
		where.paint(cv, s.where.x, y+2)
		demand.Draw(cv, s.demand.right()-demand.Width, base)
		limit.Draw(cv, s.limit.right()-limit.Width, base)
		face := draw.Serif
		if fails {
			face = draw.Bold
		}
		if r := k.Ratio[k.Worst]; r != "" {
			draw.TextRight(cv, s.ratio.right(), base, face, tableSize, r)
			bar(cv, s.bar, base, printedRatio(k), fails)
		} else {
			margin.Draw(cv, s.ratio.x+4, base)
		}
		if last {
			cv.Line(left, y+h-0.5, right, y+h-0.5, strongRule)
		} else {
			cv.Line(left, y+h-0.5, right, y+h-0.5, 0.25)
		}
	}}
}

// bar shows a ratio: grey where the check passes, black where it fails, pointed where it goes beyond the slot.
func bar(c draw.Canvas, s slot, base draw.Pt, ratio float64, fails bool) {
	const h = 5.5
	one := unity(s) - s.x
	w := one * draw.Pt(ratio)
	style := draw.Style{Fill: draw.Grey(0.72), Stroke: 0.4}
	if fails {
		style = draw.Style{Fill: draw.Black, Stroke: 0.4}
	}
	y := base - h - 0.3
	switch {
	case w > s.w:
		c.Polygon([]draw.Point{{X: s.x, Y: y}, {X: s.x + s.w - h/2, Y: y}, {X: s.x + s.w, Y: y + h/2},
			{X: s.x + s.w - h/2, Y: y + h}, {X: s.x, Y: y + h}}, style)
	case w > 0:
		c.Rect(s.x, y, w, h, style)
	}
	c.Line(s.x+one, y-2.2, s.x+one, y, 0.7)
	c.Line(s.x+one, y+h, s.x+one, y+h+2.2, 0.7)
	if w <= one {
		c.Line(s.x+one, y, s.x+one, y+h, 0.7)
	} else { // white within the bar, to be seen on black
		c.Rect(s.x+one-0.5, y+0.2, 1, h-0.4, draw.Style{Fill: draw.White})
	}
}
