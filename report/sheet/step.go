package sheet

import (
	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// step sets one formula: words, symbol = formula = formula with numbers, and the result.
func (c *composer) step(b *trace.Block, s *trace.Step) {
	w, ok := workedLine(b, &s.Line)
	if !ok {
		return // on no row was this branch taken
	}
	e := columnsFor(&s.Head, c.document, c.index.from(s.Uses, w.place))
	c.title(e, b, s.Name, s.Axes, w)
	o := &operands{note: c.note, uses: s.Uses, w: w}
	symbols := o.symbols()
	row := symbols.Symbol(s.Symbol).Related("=", symbols.Expr(s.Formula.Expr))
	if len(s.Uses) > 0 {
		row = row.Next("=", o.numbers().Expr(s.Formula.Expr))
	}
	e.formula(row)
	c.inUnits(e, s.Formula.Expr)
	c.result(e, &s.Line, w)
	e.to = c.index.destinations(s.Key)
	c.add(e.element(false))
}

// inUnits says in which unit symbols stand that the formula takes as plain numbers.
func (c *composer) inUnits(e *columns, n formula.Node) {
	written := mathset.InUnits(n)
	if len(written) == 0 {
		return
	}
	set := mathset.Setting{Size: smallSize}
	r := set.Words(draw.Serif, "with")
	seen := map[string]bool{}
	for _, u := range written {
		key := u.Symbol.Name + " " + u.Unit
		if seen[key] {
			continue
		}
		gap := 0.25
		if len(seen) > 0 {
			r = r.Then(0, set.Words(draw.Serif, ","))
		}
		seen[key] = true
		r = r.Then(gap, set.Symbol(u.Symbol)).Then(0.25, set.Words(draw.Serif, "in")).Then(0.25, set.Words(draw.Serif, u.Unit))
	}
	e.work.small(func() { e.work.row(r, smallSize, smallLead, 2, indent) })
}
