package trace

import (
	"errors"
	"math"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Check compares demand with limit on every active row. It fails where demand > limit in the carried or in the
// unrounded chain. The ratio is rounded up; where the limit is not positive the margin is recorded instead.
// The worst row becomes the row the sheet works in full.
func (b *Block) Check(c *clause.Check) {
	if b.stopped() {
		return
	}
	symbols := make([]*formula.Symbol, 2)
	for i, s := range []string{c.Demand, c.Limit} {
		var err error
		if symbols[i], err = formula.ParseSymbol(s); err != nil {
			b.fail("%s: %w", c.ID, err)
			return
		}
	}
	fr, err := b.bind(symbols)
	if err != nil {
		b.fail("%s: %w", c.ID, err)
		return
	}
	demand, limit := fr.slots[0][0].line, fr.slots[1][0].line
	if demand.Unit.Dim() != limit.Unit.Dim() {
		b.fail("%s: %s is a %s, %s a %s", c.ID, c.Demand, demand.Unit.Dim(), c.Limit, limit.Unit.Dim())
		return
	}
	index := symbols[0].Index
	if len(symbols[1].Index) > len(index) {
		index = symbols[1].Index
	}
	axes, err := b.axesOf(fr, &formula.Symbol{Name: c.ID, Index: index})
	if err != nil {
		b.fail("%s: %w", c.ID, err)
		return
	}
	n := size(axes)
	uses := fr.uses(symbols)
	e := &Check{Head: b.head(c.ID, c.Name, c.Ref), Axes: axes, Demand: uses[0], Limit: uses[1], Ratio: make([]string, n),
		Margin: make([]string, n), Fails: make([]bool, n), Value: make([]float64, n), Unit: limit.Unit, Worst: -1}
	err = b.each(fr, axes, func(i int) error {
		fr.shadow = false
		d, l := fr.Value(0), fr.Value(1)
		fr.shadow = true
		ds, ls := fr.Value(0), fr.Value(1)
		if fr.miss != nil {
			return fr.miss
		}
		e.Fails[i] = exceeds(d, l) || exceeds(ds, ls)
		e.judge(i, d, l, max(demand.Decimals, limit.Decimals))
		if l > 0 && ls > 0 {
			e.Effect = math.Max(e.Effect, math.Abs(d/l-ds/ls))
		}
		if e.Worst < 0 || e.worse(i, e.Worst) {
			e.Worst = i
		}
		return nil
	})
	if err == nil && e.Worst < 0 {
		err = errors.New("no row to check")
	}
	if err != nil {
		b.fail("%s: %w", c.ID, err)
		return
	}
	if len(axes) > 0 && axes[0] == b.Over {
		b.Row = PlaceAt(axes, e.Worst).Of(b.Over)
	}
	b.record(e)
}

// exceeds is demand > limit; numbers that a checker would write down alike are equal.
func exceeds(d, l float64) bool { return d > l && !quantity.Agree(d, l) }

// judge writes the ratio, or the margin where the limit is not positive.
func (c *Check) judge(i int, d, l float64, decimals int) {
	if l > 0 {
		c.Value[i] = math.Max(d, 0) / l
		c.Ratio[i] = quantity.FormatUp(c.Value[i], 3)
		if c.Fails[i] && c.Value[i] <= 1 {
			c.Ratio[i] = "1.001" // only the unrounded chain fails: never print 1.000 over a failure
		}
		return
	}
	c.Margin[i] = quantity.Format(c.Unit.From(l-d), decimals)
}

// worse orders rows: failing before passing, then by ratio, then the one without room left.
func (c *Check) worse(i, j int) bool {
	if c.Fails[i] != c.Fails[j] {
		return c.Fails[i]
	}
	return c.Value[i] > c.Value[j]
}
