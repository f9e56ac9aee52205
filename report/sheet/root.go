package sheet

import (
	"math"
	"strconv"

	"soffit/calc/formula"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// root sets an unknown: the equation, between what it was solved, and the residual that proves it.
func (c *composer) root(b *trace.Block, r *trace.Root) {
	w, ok := workedLine(b, &r.Line)
	if !ok {
		return
	}
	e := columnsFor(&r.Head, c.document, nil)
	c.title(e, b, r.Name, r.Axes, w)
	set := mathset.Setting{Size: textSize}
	equation := set.Words(draw.Serif, r.Equation)
	if cond, err := formula.ParseCond(r.Equation); err == nil {
		equation = set.Cond(cond)
	}
	e.formula(equation)
	small := mathset.Setting{Size: smallSize}
	words := func(s string) mathset.Row { return small.Words(draw.Serif, s) }
	unit := r.Unit.String()
	bound := func(base float64) mathset.Row {
		return small.Value(formatBound(r.Unit.From(base)), unit)
	}
	proof := words("solved between").Then(0.25, bound(r.Lo[w.flat])).Then(0.25, words("and")).Then(0.25, bound(r.Hi[w.flat]))
	if l := trace.LineOf(c.note.Entry(r.Residual)); l != nil {
		if i := trace.Flat(l.Axes, w.place); i >= 0 && l.Taken(i) {
			proof = proof.Then(0, words("; residual")).Then(0.25, small.Symbol(l.Symbol).Related("=", small.Value(l.Shown[i], l.Unit.String()))).
				Then(0.25, words("by "+l.Number))
		}
	}
	e.work.small(func() { e.work.row(proof, smallSize, smallLead, 2, indent) })
	c.result(e, &r.Line, w)
	e.to = c.index.destinations(r.Key)
	c.add(e.element(false))
}

// formatBound prints an end of a bracket to four digits.
func formatBound(v float64) string {
	if v != 0 && math.Abs(v) < 1e-3 {
		return strconv.FormatFloat(v, 'g', 2, 64)
	}
	return quantity.Format(v, max(0, quantity.Decimals(v, 4)))
}
