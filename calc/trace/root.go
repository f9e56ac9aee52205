package trace

import (
	"cmp"
	"errors"
	"fmt"
	"math"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Row reads operands for a solver at one row, from the carried or from the unrounded chain.
type Row struct {
	block  *Block
	frames map[string]*frame // one per symbol, bound once for all rows
	row    int
	shadow bool
	err    error
}

// Value is the value of a symbol in base units.
func (r *Row) Value(symbol string) float64 {
	f := r.bound(symbol)
	if f == nil {
		return 0
	}
	v := f.Value(0)
	r.err = f.miss
	return v
}

// Column is the values of an indexed symbol over the rows of its index, in base units.
func (r *Row) Column(symbol string) []float64 {
	f := r.bound(symbol)
	if f == nil {
		return nil
	}
	index := ""
	for _, l := range []string{"i", "j", "n", "m"} {
		if f.slots[0][0].stride[letter(l)] != 0 {
			index = l
		}
	}
	if index == "" {
		r.err = fmt.Errorf("%s is no column", symbol)
		return nil
	}
	out := make([]float64, f.Len(index))
	for i := range out {
		f.Set(index, i)
		out[i] = f.Value(0)
	}
	r.err = f.miss
	return out
}

// bound is the frame of one symbol, set to the row.
func (r *Row) bound(symbol string) *frame {
	if r.err != nil {
		return nil
	}
	f := r.frames[symbol]
	if f == nil {
		s, err := formula.ParseSymbol(symbol)
		if err == nil {
			f, err = r.block.bind([]*formula.Symbol{s})
		}
		if err != nil {
			r.err = err
			return nil
		}
		r.frames[symbol] = f
	}
	f.shadow, f.at[implicit] = r.shadow, r.row
	return f
}

// Found records what a second method finds on every active row from the carried values. Such values stand apart from
// the steps: they are recorded like an input, with the way they were found as their source, and only differences
// are formed from them.
func (b *Block) Found(source string, digits int, find func(*Row) ([]float64, error), gs ...*clause.Given) {
	if b.stopped() {
		return
	}
	roots := make([]*clause.Root, len(gs))
	for i, g := range gs {
		roots[i] = &clause.Root{ID: g.ID, Name: g.Name, Ref: g.Ref, Unknown: g.Symbol, Unit: g.Unit, Digits: digits}
	}
	lines, err := b.solve(roots, []bool{false}, func(r *Row, _ int) ([]float64, error) { return find(r) })
	if err != nil {
		b.fail("%w", err)
		return
	}
	for _, l := range lines {
		copy(l.Shadow, l.Values)
		b.record(&Given{Line: *l, Source: source})
	}
}

// Proposal is what a solver found: the unknown and the bracket it was found in, in base units.
type Proposal struct{ X, Lo, Hi float64 }

// Root asks a solver for the unknown on every active row and records what it proposes. The steps that follow
// from the unknown come next, the residual among them; Prove then holds the proposal against it.
func (b *Block) Root(d *clause.Root, propose func(*Row) (Proposal, error)) {
	if b.stopped() {
		return
	}
	if err := b.root(d, propose); err != nil {
		b.fail("%s: %w", d.ID, err)
	}
}

// Prove demands |residual| ≤ tolerance·|scale| of a root from the printed values, or the note ends in an error.
// A root that no row asked for needs no proof.
func (b *Block) Prove(d *clause.Root) {
	if b.stopped() {
		return
	}
	e, ok := b.build.note.entries[b.build.path+"/"+d.ID].(*Root)
	if !ok {
		return
	}
	if err := b.prove(e, d); err != nil {
		b.fail("%s: %w", d.ID, err)
	}
}

func (b *Block) root(d *clause.Root, propose func(*Row) (Proposal, error)) error {
	rows := len(b.build.mask)
	lo, hi := make([]float64, rows), make([]float64, rows)
	l, err := b.solve([]*clause.Root{d}, []bool{false, true}, func(r *Row, i int) ([]float64, error) {
		p, err := propose(r)
		if !r.shadow {
			lo[i], hi[i] = p.Lo, p.Hi
		}
		return []float64{p.X}, err
	})
	if err != nil {
		return err
	}
	b.record(&Root{Line: *l[0], Equation: d.Equation, Tolerance: d.Tolerance, Residual: b.build.path + "/" + d.Residual.ID, Lo: lo, Hi: hi})
	return nil
}

// solve asks for values on every active row, in each of the chains asked for, and rounds the columns.
func (b *Block) solve(ds []*clause.Root, chains []bool, find func(r *Row, i int) ([]float64, error)) ([]*Line, error) {
	var axes []*Axis
	if b.Over != nil {
		axes = []*Axis{b.Over}
	}
	lines := make([]*Line, len(ds))
	for k, d := range ds {
		var err error
		if lines[k], err = b.line(d, axes); err != nil {
			return nil, err
		}
	}
	frames := map[string]*frame{}
	for i, active := range b.build.mask {
		if !active {
			continue
		}
		for _, shadow := range chains {
			row := &Row{block: b, frames: frames, row: i, shadow: shadow}
			v, err := find(row, i)
			if row.err != nil {
				err = row.err
			}
			for k := range v {
				if err == nil && (math.IsNaN(v[k]) || math.IsInf(v[k], 0)) {
					err = errors.New("no finite solution")
				}
			}
			if err != nil {
				return nil, fmt.Errorf("%s%s: %w", ds[0].Unknown, at(axes, i), err)
			}
			for k, l := range lines {
				if shadow {
					l.Shadow[i] = v[k]
				} else {
					l.Values[i] = v[k]
				}
			}
		}
	}
	for k, l := range lines {
		if err := l.round(b.build.mask, cmp.Or(ds[k].Digits, 5)); err != nil {
			return nil, err
		}
	}
	return lines, nil
}

// line is an empty column for an unknown.
func (b *Block) line(d *clause.Root, axes []*Axis) (*Line, error) {
	sym, err := formula.ParseSymbol(d.Unknown)
	if err != nil {
		return nil, err
	}
	unit, err := quantity.ParseUnit(d.Unit)
	if err != nil {
		return nil, err
	}
	n := size(axes)
	return &Line{Head: b.head(d.ID, d.Name, d.Ref), Symbol: sym,
		Series: Series{Axes: axes, Unit: unit, Shown: make([]string, n), Values: make([]float64, n), Shadow: make([]float64, n)}}, nil
}

// round gives the active rows of a column the decimals that show so many digits of its largest value.
func (l *Line) round(active []bool, digits int) error {
	largest := 0.0
	for i, v := range l.Values {
		if active[i] {
			largest = math.Max(largest, math.Abs(l.Unit.From(v)))
		}
	}
	l.Decimals = quantity.Decimals(largest, digits)
	for i, v := range l.Values {
		if active[i] {
			if err := l.set(i, quantity.Format(l.Unit.From(v), l.Decimals), l.Shadow[i]); err != nil {
				return err
			}
		}
	}
	return nil
}

func (b *Block) prove(e *Root, d *clause.Root) error {
	residual := LineOf(b.build.note.entries[e.Residual])
	scale := b.build.symbols[d.Scale]
	if residual == nil || len(scale) == 0 {
		return fmt.Errorf("no residual or no %s to prove %s by", d.Scale, d.Unknown)
	}
	e.Scale = scale[len(scale)-1].Key
	for i := range e.Shown {
		if !e.Taken(i) || !residual.Taken(i) { // a later branch may set a root aside: nothing then rests on it
			continue
		}
		r, s := residual.Values[i], scale[len(scale)-1].Values[i]
		if math.Abs(r) > d.Tolerance*math.Abs(s) {
			return fmt.Errorf("%s = %s %s%s is no solution: residual %g of %g", d.Unknown, e.Shown[i], e.Unit,
				at(e.Axes, i), r, s)
		}
	}
	return nil
}
