package trace

import (
	"errors"
	"fmt"
	"slices"

	"soffit/calc/clause"
	"soffit/calc/formula"
)

// Rows is a set of rows of a block's implicit axis; a single one where the block has none.
type Rows []bool

// Or joins two sets of rows.
func (r Rows) Or(s Rows) Rows {
	out := make(Rows, len(r))
	for i := range r {
		out[i] = r[i] || s[i]
	}
	return out
}

// None is the empty set of the same rows.
func (r Rows) None() Rows { return make(Rows, len(r)) }

// Active is the rows at work now: all of them, or those of the branch.
func (b *Block) Active() Rows { return slices.Clone(Rows(b.build.mask)) }

// Any says whether the set holds a row.
func (r Rows) Any() bool { return slices.Contains(r, true) }

// Choose records a branch and splits the active rows into those where the condition holds and the others.
func (b *Block) Choose(c *clause.Condition) (yes, no Rows) {
	yes, no = make(Rows, len(b.build.mask)), make(Rows, len(b.build.mask))
	if b.stopped() {
		return yes, no
	}
	e, err := b.decide(c)
	if err == nil && (len(e.Axes) > 1 || (len(e.Axes) == 1 && e.Axes[0] != b.Over)) {
		err = errors.New("a branch may run over the rows of the block only")
	}
	if err != nil {
		b.fail("%s: %w", c.ID, err)
		return yes, no
	}
	for i, active := range b.build.mask {
		o := e.Outcomes[0]
		if len(e.Axes) > 0 {
			o = e.Outcomes[i]
		}
		yes[i], no[i] = active && o == Yes, active && o == No
	}
	return yes, no
}

// On runs f on those of these rows that are at work now, and not at all if there are none.
func (b *Block) On(rows Rows, f func()) {
	before, all := b.build.mask, b.build.all
	rows = slices.Clone(rows)
	for i := range rows {
		rows[i] = rows[i] && before[i]
	}
	if b.stopped() || !rows.Any() {
		return
	}
	b.build.mask, b.build.all = rows, !slices.Contains(rows, false)
	f()
	b.build.mask, b.build.all = before, all
}

// Decide records a condition with its outcome on every row, and branches nothing.
func (b *Block) Decide(c *clause.Condition) {
	if b.stopped() {
		return
	}
	if _, err := b.decide(c); err != nil {
		b.fail("%s: %w", c.ID, err)
	}
}

// Require records a condition that must hold on every row, or the note ends in an error.
func (b *Block) Require(c *clause.Condition) {
	b.Decide(c)
	if b.stopped() {
		return
	}
	e := b.build.note.entries[b.build.path+"/"+c.ID].(*Choice)
	if i := slices.Index(e.Outcomes, No); i >= 0 {
		b.fail("%s: %s%s", c.Name, c.No, at(e.Axes, i))
	}
}

func (b *Block) decide(c *clause.Condition) (*Choice, error) {
	cond, err := c.Parsed()
	if err != nil {
		return nil, err
	}
	prog := c.Program()
	fr, err := b.bind(prog.Symbols)
	if err != nil {
		return nil, err
	}
	if err := formula.CheckCond(cond, fr.dim(prog.Symbols)); err != nil {
		return nil, err
	}
	axes, err := b.axesOf(fr, &formula.Symbol{Index: formula.FreeCondIndices(cond)})
	if err != nil {
		return nil, err
	}
	e := &Choice{Head: b.head(c.ID, c.Name, c.Ref), Axes: axes, Cond: cond, Yes: c.Yes, No: c.No,
		Outcomes: make([]Outcome, size(axes)), Uses: fr.uses(prog.Symbols)}
	err = b.each(fr, axes, func(i int) error {
		ok, err := prog.Holds(fr)
		if err == nil {
			err = fr.miss
		}
		if err != nil {
			return fmt.Errorf("%w%s", err, at(axes, i))
		}
		e.Outcomes[i] = No
		if ok {
			e.Outcomes[i] = Yes
		}
		return nil
	})
	if err != nil {
		return nil, err
	}
	b.record(e)
	return e, b.build.note.err
}
