package sheet

import (
	"fmt"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// check sets demand against limit at the governing row, with ratio and verdict.
func (c *composer) check(b *trace.Block, k *trace.Check) {
	w := governing(b, k)
	e := columnsFor(&k.Head, c.document, c.index.from([]trace.Use{k.Demand, k.Limit}, w.place))
	c.title(e, b, k.Name, nil, w)
	demand, di, err1 := c.note.Resolve(k.Demand, w.place)
	limit, li, err2 := c.note.Resolve(k.Limit, w.place)
	if err1 != nil || err2 != nil {
		c.fail("check %s: its demand or limit cannot be found", k.Key)
		return
	}
	set := mathset.Setting{Size: textSize, Index: rowNumbers(w.indices())}
	side := func(l *trace.Line, i int) mathset.Row {
		s := set
		s.Anchor = nil
		return s.Symbol(l.Symbol).Related("=", s.Value(l.Shown[i], l.Unit.String()))
	}
	relation := "≤"
	if demand.Values[di] > limit.Values[li] {
		relation = ">"
	}
	e.formula(side(demand, di).Related(relation, side(limit, li)))
	e.work.small(func() {
		if n := asked(k); n > 1 {
			e.work.words(draw.Serif, smallSize, smallLead, 2, fmt.Sprintf("at %s, the worst of %d", trace.RowName(k.Axes, k.Worst), n))
		}
		if k.Fails[k.Worst] && relation == "≤" {
			e.work.words(draw.Serif, smallSize, smallLead, 2, "With the printed values the demand is not above the limit; with unrounded ones it is.")
		}
	})
	e.box = k.Failed()
	room := e.result.w
	if e.box {
		room -= framePad + strongRule
	}
	e.result.row(verdictRow(k), textSize, textLead, 0, 0)
	e.result.right(0, room)
	c.add(e.element(false))
}

// governing is the row on which a check comes out worst.
func governing(b *trace.Block, k *trace.Check) worked {
	p := trace.Place{}
	if b != nil && b.Over != nil {
		p = p.With(b.Over, b.Row)
	}
	for _, q := range trace.PlaceAt(k.Axes, k.Worst) {
		p = p.With(q.Axis, q.Row)
	}
	return worked{p, k.Worst}
}

// asked is on how many rows a check was made.
func asked(k *trace.Check) int {
	n := 0
	for i := range k.Ratio {
		if k.Ratio[i] != "" || k.Margin[i] != "" {
			n++
		}
	}
	return n
}

// verdictRow is ratio and verdict, or the margin where the limit is not positive.
func verdictRow(k *trace.Check) mathset.Row {
	set := mathset.Setting{Size: textSize}
	words := set.Words(draw.Serif, "passes")
	if k.Fails[k.Worst] {
		words = set.Words(draw.Bold, "fails")
	}
	if k.Ratio[k.Worst] != "" {
		return set.Result(k.Ratio[k.Worst], "").Then(0.5, words)
	}
	return set.Words(draw.Serif, "margin").Then(0.25, set.Result(k.Margin[k.Worst], k.Unit.String())).Then(0.4, words)
}
