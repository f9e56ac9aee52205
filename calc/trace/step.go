package trace

import (
	"fmt"
	"math"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Step evaluates a formula on every active row and records it.
func (b *Block) Step(f *clause.Formula) {
	if b.stopped() {
		return
	}
	if err := b.step(f); err != nil {
		if f.Origin != "" {
			err = fmt.Errorf("%s: %w", f.Origin, err)
		}
		b.fail("%s: %w", f.ID, err)
	}
}

// Steps evaluates several formulas one after another.
func (b *Block) Steps(fs ...*clause.Formula) {
	for _, f := range fs {
		b.Step(f)
	}
}

func (b *Block) step(f *clause.Formula) error {
	tree, err := f.Parsed()
	if err != nil {
		return err
	}
	prog := f.Program()
	fr, err := b.bind(prog.Symbols)
	if err != nil {
		return err
	}
	unit := f.DisplayUnit()
	dim, err := formula.Check(tree.Expr, fr.dim(prog.Symbols))
	if err != nil {
		return err
	}
	if dim != unit.Dim() {
		return fmt.Errorf("%s is a %s, its unit %q a %s", tree.Symbol.Name, dim, unit, unit.Dim())
	}
	axes, err := b.axesOf(fr, tree.Symbol)
	if err != nil {
		return err
	}
	if err := b.holds(f, axes); err != nil {
		return err
	}
	e := &Step{Line: Line{Head: b.head(f.ID, f.Name, f.Ref), Symbol: tree.Symbol}, Formula: tree, Uses: fr.uses(prog.Symbols)}
	n := size(axes)
	e.Series = Series{Axes: axes, Unit: unit, Shown: make([]string, n), Values: make([]float64, n), Shadow: make([]float64, n)}
	largest := 0.0
	err = b.each(fr, axes, func(i int) error {
		for _, fr.shadow = range []bool{false, true} {
			v, err := prog.Eval(fr)
			if err == nil {
				err = fr.miss
			}
			if err != nil {
				return fmt.Errorf("%w%s", err, at(axes, i))
			}
			if fr.shadow {
				e.Shadow[i] = v
			} else {
				e.Values[i] = unit.From(v)
			}
		}
		largest = math.Max(largest, math.Abs(e.Values[i]))
		return nil
	})
	if err != nil {
		return err
	}
	e.Decimals = quantity.Decimals(largest, f.SignificantDigits())
	if d, ok := totalled(tree.Expr, fr, prog.Symbols, unit); ok {
		e.Decimals = max(e.Decimals, d)
	}
	fr.shadow = false
	err = b.each(fr, axes, func(i int) error {
		return e.set(i, quantity.Format(e.Values[i], e.Decimals), e.Shadow[i])
	})
	if err != nil {
		return err
	}
	b.record(e)
	return nil
}

// totalled gives the decimals of a column that is added up as it stands: the total keeps its last place.
func totalled(n formula.Node, fr *frame, symbols []*formula.Symbol, unit quantity.Unit) (int, bool) {
	r, ok := n.(*formula.Rows)
	if !ok || r.Op != "Σ" {
		return 0, false
	}
	s, ok := r.X.(*formula.Symbol)
	if !ok {
		return 0, false
	}
	for i, t := range symbols {
		if t.Name == s.Name && fr.slots[i][0].line.Unit == unit {
			return fr.slots[i][0].line.Decimals, true
		}
	}
	return 0, false
}

// axesOf are the axes a result runs over: the implicit one where an operand does or where a branch has
// narrowed the rows, then the index letters of the symbol in their order.
func (b *Block) axesOf(fr *frame, s *formula.Symbol) ([]*Axis, error) {
	var axes []*Axis
	if b.Over != nil && (!b.build.all || fr.runs(implicit)) {
		axes = append(axes, b.Over)
	}
	for _, ix := range s.Index {
		a := fr.axes[letter(ix)]
		if a == nil {
			return nil, fmt.Errorf("no operand of %s runs over index %s", s.Name, ix)
		}
		axes = append(axes, a)
	}
	return axes, nil
}

// each visits every active row of axes with the frame set to it.
func (b *Block) each(fr *frame, axes []*Axis, visit func(i int) error) error {
	n := size(axes)
	over := len(axes) > 0 && axes[0].Index == ""
	for i := 0; i < n; i++ {
		rest := i
		for k := len(axes) - 1; k >= 0; k-- {
			rows := len(axes[k].Rows)
			fr.at[letter(axes[k].Index)] = rest % rows
			rest /= rows
		}
		if over && !b.build.mask[fr.at[implicit]] {
			continue
		}
		if err := visit(i); err != nil {
			return err
		}
	}
	return nil
}

// holds refuses operands outside the domain of a formula.
func (b *Block) holds(f *clause.Formula, axes []*Axis) error {
	p := f.DomainProgram()
	if p == nil {
		return nil
	}
	fr, err := b.bind(p.Symbols)
	if err != nil {
		return fmt.Errorf("domain: %w", err)
	}
	return b.each(fr, axes, func(i int) error {
		ok, err := p.Holds(fr)
		if err == nil {
			err = fr.miss
		}
		if err != nil {
			return fmt.Errorf("domain: %w", err)
		}
		if !ok {
			return fmt.Errorf("outside its domain %s%s: %s", f.Domain, at(axes, i), fr.values(p.Symbols))
		}
		return nil
	})
}

func at(axes []*Axis, i int) string {
	if len(axes) == 0 {
		return ""
	}
	return " at " + RowName(axes, i)
}
