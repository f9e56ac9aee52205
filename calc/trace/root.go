package trace

import (
	"fmt"
	"math"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Row reads operands for a solver at one row, from the carried or from the unrounded chain.
type Row struct {
	block  *Block
	row    int
	shadow bool
	err    error
}

// Value is the value of a symbol in base units.
func (r *Row) Value(symbol string) float64 {
	v := r.read(symbol, "")
	if len(v) == 0 {
		return 0
	}
	return v[0]
}

// Column is the values of an indexed symbol over the rows of its index, in base units.
func (r *Row) Column(symbol string) []float64 {
	s, err := formula.ParseSymbol(symbol)
	if err != nil || len(s.Index) != 1 {
		r.err = fmt.Errorf("%s is no column", symbol)
		return nil
	}
	return r.read(symbol, s.Index[0])
}

func (r *Row) read(symbol, index string) []float64 {
	if r.err != nil {
		return nil
	}
	s, err := formula.ParseSymbol(symbol)
	if err != nil {
		r.err = err
		return nil
	}
	fr, err := r.block.bind([]*formula.Symbol{s})
	if err != nil {
		r.err = err
		return nil
	}
	fr.shadow = r.shadow
	fr.at[implicit] = r.row
	n := 1
	if index != "" {
		n = fr.Len(index)
	}
	out := make([]float64, n)
	for i := range out {
		if index != "" {
			fr.Set(index, i)
		}
		out[i] = fr.Value(0)
	}
	r.err = fr.miss
	return out
}

// Found records what a second method finds on every active row. Such a value stands apart from the steps: it is
// recorded like an input, with the way it was found as its source, and only differences are formed from it.
func (b *Block) Found(g *clause.Given, digits int, source string, find func(*Row) (float64, error)) {
	if b.stopped() {
		return
	}
	r := &clause.Root{ID: g.ID, Name: g.Name, Ref: g.Ref, Unknown: g.Symbol, Unit: g.Unit, Digits: digits}
	l, err := b.solve(r, func(row *Row, i int) (float64, error) { return find(row) })
	if err != nil {
		b.fail("%s: %w", g.ID, err)
		return
	}
	b.record(&Given{Line: *l, Source: source})
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
	l, err := b.solve(d, func(r *Row, i int) (float64, error) {
		p, err := propose(r)
		if !r.shadow {
			lo[i], hi[i] = p.Lo, p.Hi
		}
		return p.X, err
	})
	if err != nil {
		return err
	}
	b.record(&Root{Line: *l, Equation: d.Equation, Tolerance: d.Tolerance, Residual: b.build.path + "/" + d.Residual.ID, Lo: lo, Hi: hi})
	return nil
}

// solve asks for a value on every active row, in the carried and in the unrounded chain, and rounds the column.
func (b *Block) solve(d *clause.Root, find func(r *Row, i int) (float64, error)) (*Line, error) {
	sym, err := formula.ParseSymbol(d.Unknown)
	if err != nil {
		return nil, err
	}
	unit, err := quantity.ParseUnit(d.Unit)
	if err != nil {
		return nil, err
	}
	var axes []*Axis
	if b.Over != nil {
		axes = []*Axis{b.Over}
	}
	n := size(axes)
	l := &Line{Head: b.head(d.ID, d.Name, d.Ref), Symbol: sym}
	l.Series = Series{Axes: axes, Unit: unit, Shown: make([]string, n), Values: make([]float64, n), Shadow: make([]float64, n)}
	digits := d.Digits
	if digits == 0 {
		digits = 5
	}
	largest := 0.0
	for i := range n {
		if !b.build.mask[i] {
			continue
		}
		for _, shadow := range []bool{false, true} {
			row := &Row{block: b, row: i, shadow: shadow}
			v, err := find(row, i)
			if row.err != nil {
				err = row.err
			}
			if err == nil && (math.IsNaN(v) || math.IsInf(v, 0)) {
				err = fmt.Errorf("no finite solution")
			}
			if err != nil {
				return nil, fmt.Errorf("%s%s: %w", d.Unknown, at(axes, i), err)
			}
			if shadow {
				l.Shadow[i] = v
			} else {
				l.Values[i] = unit.From(v)
			}
		}
		largest = math.Max(largest, math.Abs(l.Values[i]))
	}
	l.Decimals = quantity.Decimals(largest, digits)
	for i := range n {
		if b.build.mask[i] {
			if err := l.set(i, quantity.Format(l.Values[i], l.Decimals), l.Shadow[i]); err != nil {
				return nil, err
			}
		}
	}
	return l, nil
}

func (b *Block) prove(e *Root, d *clause.Root) error {
	residual := LineOf(b.build.note.entries[e.Residual])
	scale := b.build.symbols[d.Scale]
	if residual == nil || len(scale) == 0 {
		return fmt.Errorf("no residual or no %s to prove %s by", d.Scale, d.Unknown)
	}
	e.Scale = scale[len(scale)-1].Key
	for i := range e.Shown {
		if !e.Taken(i) {
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
