package trace

import (
	"fmt"
	"math"
	"strings"

	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Closure recomputes every step, choice and check from its own formula and the printed operands alone, and
// compares what comes out with what is printed; the fingerprint that a file states is held against the record too. It needs nothing but the record, as read back from its JSON:
// no unrounded value takes part. It returns how many values it proved and every difference.
func Closure(n *Note) (proved int, differences []error) {
	say := func(key string, err error) {
		differences = append(differences, fmt.Errorf("%s: %w", key, err))
	}
	if n.stated != "" && n.stated != n.Fingerprint() {
		say("the record", fmt.Errorf("its fingerprint is %s, it states %s", n.Fingerprint(), n.stated))
	}
	n.Each(func(_ *Chapter, b *Block, e Entry) {
		var count int
		var err error
		switch e := e.(type) {
		case *Step:
			count, err = n.proveStep(b, e)
		case *Choice:
			count, err = n.proveChoice(b, e)
		case *Check:
			count, err = n.proveCheck(e)
		case *Root:
			count, err = n.proveRoot(e)
		}
		proved += count
		if err != nil {
			say(e.Common().Key, err)
		}
	})
	return proved, differences
}

// operands rebuilds the frame of a formula from the keys it names.
func (n *Note) operands(b *Block, symbols []*formula.Symbol, uses []Use) (*frame, error) {
	if len(symbols) != len(uses) {
		return nil, fmt.Errorf("%d symbols, %d uses", len(symbols), len(uses))
	}
	fr := &frame{slots: make([][]supplier, len(symbols))}
	fr.axes[implicit] = b.Over
	for i, s := range symbols {
		if uses[i].Symbol != s.Name {
			return nil, fmt.Errorf("use %d is of %s, the formula has %s", i, uses[i].Symbol, s.Name)
		}
		for _, from := range uses[i].From {
			key, row, picked := strings.Cut(from, "@")
			l := LineOf(n.Entry(key))
			if l == nil {
				return nil, fmt.Errorf("no value under key %s", key)
			}
			if l.Symbol.Name != s.Name {
				return nil, fmt.Errorf("%s is taken from %s, which gives %s", s.Name, key, l.Symbol.Name)
			}
			at := -1
			if picked {
				for _, a := range l.Axes {
					if a.Index == "" {
						if at = a.Row(row); at < 0 {
							return nil, fmt.Errorf("%s: no such row", from)
						}
					}
				}
			}
			if err := fr.add(i, l, from, at); err != nil {
				return nil, err
			}
		}
		if len(fr.slots[i]) == 0 {
			return nil, fmt.Errorf("%s comes from nowhere", s.Name)
		}
	}
	return fr, nil
}

// visit sets the frame to every place of axes.
func (fr *frame) visit(axes []*Axis, f func(i int) error) error {
	for i := range size(axes) {
		for _, q := range PlaceAt(axes, i) {
			fr.at[letter(q.Axis.Index)] = q.Row
		}
		if err := f(i); err != nil {
			return err
		}
	}
	return nil
}

func (n *Note) proveStep(b *Block, e *Step) (int, error) {
	tree, err := formula.Parse(e.Formula.String())
	if err != nil {
		return 0, err
	}
	if tree.Symbol.Name != e.Symbol.Name {
		return 0, fmt.Errorf("the formula gives %s, the entry %s", tree.Symbol.Name, e.Symbol.Name)
	}
	prog := formula.Compile(tree.Expr)
	fr, err := n.operands(b, prog.Symbols, e.Uses)
	if err != nil {
		return 0, err
	}
	dim, err := formula.Check(tree.Expr, fr.dim(prog.Symbols))
	if err != nil {
		return 0, err
	}
	if dim != e.Unit.Dim() {
		return 0, fmt.Errorf("a %s is printed in %q", dim, e.Unit)
	}
	count := 0
	err = fr.visit(e.Axes, func(i int) error {
		if !e.Taken(i) {
			return nil
		}
		v, err := prog.Eval(fr)
		if err == nil {
			err = fr.miss
		}
		if err != nil {
			return err
		}
		if got := quantity.Format(e.Unit.From(v), e.Decimals); got != e.Shown[i] {
			return fmt.Errorf("%s: recomputed %s, printed %s", RowName(e.Axes, i), got, e.Shown[i])
		}
		count++
		return nil
	})
	return count, err
}

func (n *Note) proveChoice(b *Block, e *Choice) (int, error) {
	cond, err := formula.ParseCond(formula.PrintCond(e.Cond))
	if err != nil {
		return 0, err
	}
	prog := formula.CompileCond(cond)
	fr, err := n.operands(b, prog.Symbols, e.Uses)
	if err != nil {
		return 0, err
	}
	count := 0
	err = fr.visit(e.Axes, func(i int) error {
		if e.Outcomes[i] == NotAsked {
			return nil
		}
		ok, err := prog.Holds(fr)
		if err == nil {
			err = fr.miss
		}
		if err != nil {
			return err
		}
		if ok != (e.Outcomes[i] == Yes) {
			return fmt.Errorf("%s: recomputed %v", RowName(e.Axes, i), ok)
		}
		count++
		return nil
	})
	return count, err
}

func (n *Note) proveCheck(e *Check) (int, error) {
	count := 0
	for i := range e.Fails {
		if e.Ratio[i] == "" && e.Margin[i] == "" {
			continue
		}
		place := PlaceAt(e.Axes, i)
		dl, di, err := n.Resolve(e.Demand, place)
		if err != nil {
			return count, err
		}
		ll, li, err := n.Resolve(e.Limit, place)
		if err != nil {
			return count, err
		}
		d, l := dl.Values[di], ll.Values[li]
		again := &Check{Unit: e.Unit, Ratio: make([]string, 1), Margin: make([]string, 1), Fails: e.Fails[i : i+1],
			Value: make([]float64, 1)}
		again.judge(0, d, l, max(dl.Decimals, ll.Decimals))
		if again.Ratio[0] != e.Ratio[i] || again.Margin[0] != e.Margin[i] {
			return count, fmt.Errorf("%s: recomputed ratio %s, printed %s", RowName(e.Axes, i), again.Ratio[0], e.Ratio[i])
		}
		if exceeds(d, l) && !e.Fails[i] {
			return count, fmt.Errorf("%s: %s > %s and no failure recorded", RowName(e.Axes, i), dl.Shown[di], ll.Shown[li])
		}
		count++
	}
	return count, nil
}

// proveRoot holds the printed unknown against the residual that the steps after it give.
func (n *Note) proveRoot(e *Root) (int, error) {
	residual, scale := LineOf(n.Entry(e.Residual)), LineOf(n.Entry(e.Scale))
	if residual == nil || scale == nil {
		return 0, fmt.Errorf("no residual or no scale")
	}
	count := 0
	if len(scale.Values) != len(e.Shown) || len(residual.Values) != len(e.Shown) {
		return count, fmt.Errorf("residual and scale run over other rows")
	}
	for i := range e.Shown {
		if !e.Taken(i) || !residual.Taken(i) {
			continue
		}
		if r, s := residual.Values[i], scale.Values[i]; math.Abs(r) > e.Tolerance*math.Abs(s) {
			return count, fmt.Errorf("%s: residual %g of %g", RowName(e.Axes, i), r, s)
		}
		count++
	}
	return count, nil
}
