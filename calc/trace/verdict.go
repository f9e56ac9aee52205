package trace

import (
	"errors"
	"math"
	"slices"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Check compares demand with limit on every active row. It fails where demand > limit in the carried or in the
// unrounded chain. The ratio is rounded up; where the limit is not positive the margin is recorded instead.
// The worst row of the worst check of a block becomes the row the sheet works in full.
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
	var worst rank
	err = b.each(fr, axes, func(i int) error {
		fr.shadow = false
		d, l := fr.Value(0), fr.Value(1)
		fr.shadow = true
		ds, ls := fr.Value(0), fr.Value(1)
		if fr.miss != nil {
			return fr.miss
		}
		e.Fails[i] = exceeds(d, l) || exceeds(ds, ls)
		of, _ := fr.taken(0)
		against, _ := fr.taken(1)
		e.judge(i, d, l, max(of.Decimals, against.Decimals))
		if l > 0 && ls > 0 {
			e.Effect = math.Max(e.Effect, math.Abs(math.Max(d, 0)/l-math.Max(ds, 0)/ls)) // of the ratio
		}
		r := rankOf(e.Fails[i], d, l)
		if e.Worst < 0 || r.above(worst) {
			e.Worst, worst = i, r
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
	if r := e.rank(); len(axes) > 0 && axes[0] == b.Over && (b.build.worst == nil || r.above(*b.build.worst)) {
		b.Row, b.build.worst = PlaceAt(axes, e.Worst).Of(b.Over), &r
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

// rank orders rows and checks by how bad they are: failing against a limit that is not positive, by what is missing;
// failing, by ratio; passing, by ratio; passing a limit that is not positive, by what is left.
type rank struct {
	class int
	size  float64
}

func rankOf(fails bool, demand, limit float64) rank {
	switch {
	case fails && limit <= 0:
		return rank{3, demand - limit}
	case fails:
		return rank{2, demand / limit}
	case limit > 0:
		return rank{1, demand / limit}
	}
	return rank{0, demand - limit}
}

func (r rank) above(s rank) bool { return r.class > s.class || r.class == s.class && r.size > s.size }

// rank is that of the governing row, by the ratio as printed: a record read back ranks its checks alike.
func (c *Check) rank() rank {
	ratio, _ := quantity.Value(c.Ratio[c.Worst])
	switch {
	case c.Ratio[c.Worst] == "" && c.Failed():
		return rank{class: 3}
	case c.Failed():
		return rank{2, ratio}
	case c.Ratio[c.Worst] != "":
		return rank{1, ratio}
	}
	return rank{}
}

// Ranked is all checks, the worst first: failing before passing, by ratio; those that have a margin in place of a
// ratio come first where they fail and last where they pass.
func (n *Note) Ranked() []*Check {
	checks := n.Checks()
	slices.SortStableFunc(checks, func(a, b *Check) int {
		switch ra, rb := a.rank(), b.rank(); {
		case ra.above(rb):
			return -1
		case rb.above(ra):
			return 1
		}
		return 0
	})
	return checks
}
