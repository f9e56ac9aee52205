package formula

import (
	"math"

	"soffit/calc/quantity"
)

// Frame supplies the values for an evaluation. If it has the method Row(index string) int as well, the
// current row, a formula may run over an index that also stands free in it (x_i/Σ_i(x_i)): the row is put
// back behind the Σ. Without it such a formula is an error.
type Frame interface {
	Value(slot int) float64 // of Symbols[slot], in base units, at the current rows; NaN if there is none
	Len(index string) int   // number of rows of an index
	Set(index string, row int)
}

// Eval gives the value of the expression in base units. An error is an *Error with the values of the symbols
// involved; without one the value is finite.
//
// A difference of two numbers that agree, see quantity.Agree, is 0: on paper nothing is left of it.
func (p *Program) Eval(f Frame) (float64, error) {
	if p.value == nil {
		return 0, errorAt(0, "a condition has no value")
	}
	m := &machine{frame: f}
	v := p.value(m)
	if m.err != nil {
		return 0, m.err
	}
	if v-v != 0 {
		return 0, errorAt(0, "result out of range")
	}
	return v, nil
}

// Holds says whether the condition holds. Numbers that agree, see quantity.Agree, compare as equal.
// Comparisons behind the one that decides are not evaluated.
func (p *Program) Holds(f Frame) (bool, error) {
	if p.holds == nil {
		return false, errorAt(0, "a value is no condition")
	}
	m := &machine{frame: f}
	holds := p.holds(m)
	if m.err != nil {
		return false, m.err
	}
	return holds, nil
}

// machine is one evaluation. The first error stays; what is computed behind it is thrown away.
type machine struct {
	frame Frame
	err   *Error
}

func (m *machine) fail(t *trouble) float64 {
	if m.err == nil {
		m.err = t.err(m.frame)
	}
	return 0
}

func (m *machine) finite(v float64, t *trouble) float64 {
	if v-v != 0 {
		return m.fail(t)
	}
	return v
}

func (m *machine) sum(a, b float64, t *trouble) float64 {
	v := a + b
	if math.Abs(v) < 1e-14*math.Abs(a) && quantity.Agree(a, -b) {
		return 0
	}
	return m.finite(v, t)
}

func (c *compiler) cond(n Cond) test {
	switch n := n.(type) {
	case *Compare:
		return c.compare(n)
	case *Logic:
		l, r := c.cond(n.L), c.cond(n.R)
		switch n.Op {
		case "and":
			return func(m *machine) bool { return l(m) && m.err == nil && r(m) }
		case "or":
			return func(m *machine) bool { return l(m) || m.err == nil && r(m) }
		}
	}
	t := &trouble{text: "unknown kind of condition in the formula"}
	return func(m *machine) bool { m.fail(t); return false }
}

func (c *compiler) compare(n *Compare) test {
	if len(n.X) != len(n.Rel)+1 || len(n.Rel) == 0 {
		t := &trouble{pos: n.Pos, text: "comparison without its operands"}
		return func(m *machine) bool { m.fail(t); return false }
	}
	operands := make([]code, len(n.X))
	for i, x := range n.X {
		operands[i] = c.node(x)
	}
	relations := n.Rel
	return func(m *machine) bool {
		a := operands[0](m)
		for i, rel := range relations {
			b := operands[i+1](m)
			if m.err != nil || !stands(a, rel, b) {
				return false
			}
			a = b
		}
		return true
	}
}

// stands says whether a rel b. An unknown relation never stands; the parser makes none.
func stands(a float64, rel string, b float64) bool {
	same := quantity.Agree(a, b)
	switch rel {
	case "≤":
		return same || a < b
	case "<":
		return !same && a < b
	case "≥":
		return same || a > b
	case ">":
		return !same && a > b
	}
	return rel == "=" && same
}
