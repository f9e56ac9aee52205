package clause

import (
	"fmt"
	"math"
	"strings"

	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// operands is a frame filled from the text of an example. Columns of one index run over that index only; those
// of two indices are written row by row.
type operands struct {
	program *formula.Program
	values  map[string][]float64
	dims    map[string]quantity.Dim
	index   map[string]int
	rows    map[string]int
}

// Value is formula.Frame.
func (o *operands) Value(slot int) float64 {
	s := o.program.Symbols[slot]
	i := 0
	for _, ix := range s.Index {
		i = i*max(o.rows[ix], 1) + o.index[ix]
	}
	return o.values[s.Name][i]
}

// Len is formula.Frame.
func (o *operands) Len(index string) int { return o.rows[index] }

// Set is formula.Frame.
func (o *operands) Set(index string, row int) { o.index[index] = row }

// Try works an example: it reads the operands, checks dimensions and domain, evaluates, and compares. It
// returns the results in the display unit, one per row of the free index.
func (f *Formula) Try(e Example) ([]float64, error) {
	tree, err := f.Parsed()
	if err != nil {
		return nil, err
	}
	o := &operands{program: f.Program(), values: map[string][]float64{}, dims: map[string]quantity.Dim{},
		index: map[string]int{}, rows: map[string]int{}}
	for _, g := range e.Given {
		if err := o.read(g); err != nil {
			return nil, err
		}
	}
	o.second()
	dim, err := formula.Check(tree.Expr, func(s *formula.Symbol) (quantity.Dim, error) {
		d, ok := o.dims[s.Name]
		if !ok {
			return d, fmt.Errorf("the example gives no %s", s.Name)
		}
		return d, nil
	})
	if err != nil {
		return nil, err
	}
	if unit := f.DisplayUnit(); dim != unit.Dim() {
		return nil, fmt.Errorf("%s is a %s, its unit %q a %s", tree.Symbol.Name, dim, unit, unit.Dim())
	}
	want, err := literals(e.Want)
	if err != nil {
		return nil, err
	}
	got := make([]float64, len(want))
	for i := range got {
		if len(tree.Symbol.Index) > 0 {
			o.Set(tree.Symbol.Index[0], i)
		}
		v, err := o.program.Eval(o)
		if err != nil {
			return nil, err
		}
		got[i] = f.DisplayUnit().From(v)
	}
	return got, compare(got, want, f.DisplayUnit(), e.Tolerance)
}

func compare(got []float64, want []quantity.Literal, unit quantity.Unit, tolerance float64) error {
	for i, w := range want {
		if w.Unit != unit {
			return fmt.Errorf("want is in %q, the formula prints %q", w.Unit, unit)
		}
		tol := tolerance
		if tol == 0 {
			_, frac, _ := strings.Cut(w.Number, ".")
			tol = 0.5000001 * math.Pow(10, -float64(len(frac)))
		}
		v, err := quantity.Value(w.Number)
		if err != nil {
			return err
		}
		if !(math.Abs(got[i]-v) <= tol) {
			return fmt.Errorf("got %.7g, want %s ± %g", got[i], w, tol)
		}
	}
	return nil
}

func (o *operands) read(text string) error {
	name, values, ok := strings.Cut(text, "=")
	if !ok {
		return fmt.Errorf("%q is no operand", text)
	}
	s, err := formula.ParseSymbol(strings.TrimSpace(name))
	if err != nil {
		return err
	}
	ls, err := literals(values)
	if err != nil {
		return err
	}
	for _, l := range ls {
		o.values[s.Name] = append(o.values[s.Name], l.Quantity().Value)
		o.dims[s.Name] = l.Unit.Dim()
	}
	switch {
	case len(s.Index) == 1:
		o.rows[s.Index[0]] = len(ls)
	case len(s.Index) == 2 && o.rows[s.Index[0]] > 0 && o.rows[s.Index[1]] == 0: // its rows are those of a column before it
		o.rows[s.Index[1]] = len(ls) / o.rows[s.Index[0]]
	}
	return nil
}

// second gives the second of two indices its rows where no column runs over it alone.
func (o *operands) second() {
	for _, s := range o.program.Symbols {
		if len(s.Index) == 2 && o.rows[s.Index[1]] == 0 {
			o.rows[s.Index[1]] = len(o.values[s.Name]) / max(o.rows[s.Index[0]], 1)
		}
	}
}

func literals(list string) ([]quantity.Literal, error) {
	var out []quantity.Literal
	for _, t := range strings.Split(list, ",") {
		l, err := quantity.Parse(strings.TrimSpace(t))
		if err != nil {
			return nil, err
		}
		out = append(out, l)
	}
	return out, nil
}
