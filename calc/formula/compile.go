package formula

import (
	"fmt"
	"math"
	"slices"

	"soffit/calc/quantity"
)

// Program is an expression or a condition ready to be evaluated many times, by closures on numbered slots.
// It may be used from several goroutines at once, each with its own Frame.
type Program struct {
	Symbols []*Symbol // those that need a value, distinct by name, in order of first use: the slots

	value  code
	holds  test
	resets []string // indices that run over rows and stand free as well
}

// Compile makes the program of an expression. Dimensions are not looked at, see Check.
func Compile(n Node) *Program {
	var l lister
	l.node(n)
	c := newCompiler(&l)
	p := &Program{Symbols: l.symbols, resets: c.resets}
	p.value = c.node(n)
	return p
}

// CompileCond makes the program of a condition.
func CompileCond(n Cond) *Program {
	var l lister
	l.cond(n)
	c := newCompiler(&l)
	p := &Program{Symbols: l.symbols, resets: c.resets}
	p.holds = c.cond(n)
	return p
}

type code func(*machine) float64
type test func(*machine) bool

type compiler struct {
	slots  map[string]int
	resets []string
}

func newCompiler(l *lister) *compiler {
	c := &compiler{slots: make(map[string]int, len(l.symbols)), resets: append(slices.Clone(l.free), l.nested...)}
	for i, s := range l.symbols {
		c.slots[s.Name] = i
	}
	return c
}

// trouble is what a failing operation says: what is wrong, in which node, by the values of which part. It is
// put into words only when the operation fails.
type trouble struct {
	slots map[string]int
	text  string
	in    Node // nil: the text says all
	by    Node // nil: no values
	pos   Pos  // where in is nil
}

func (c *compiler) trouble(n Node, text string, part Node) *trouble {
	return &trouble{slots: c.slots, text: text, in: n, by: part}
}

func (t *trouble) err(f Frame) *Error {
	if t.in == nil {
		return &Error{Pos: t.pos, Msg: t.text}
	}
	e := &Error{Pos: t.in.At(), Msg: t.text + " in " + clip(Print(t.in))}
	if t.by == nil {
		return e
	}
	var l lister
	l.node(t.by)
	for _, s := range l.outer {
		e.Values = append(e.Values, SymbolValue{s, f.Value(t.slots[s.Name])})
	}
	return e
}

func constant(v float64) code { return func(*machine) float64 { return v } }

func (c *compiler) node(n Node) code {
	switch n := n.(type) {
	case *Number:
		return constant(n.Value)
	case *UnitLit:
		return constant(n.Unit.Factor())
	case *Symbol:
		return c.symbol(n)
	case *Negate:
		x := c.node(n.X)
		return func(m *machine) float64 { return 0 - x(m) } // 0 − 0 has no sign
	case *Binary:
		return c.binary(n)
	case *Power:
		return c.power(n)
	case *Call:
		return c.call(n)
	case *Rows:
		return c.rows(n)
	case *Cases:
		return c.cases(n)
	}
	t := &trouble{text: "unknown kind of node in the formula"}
	return func(m *machine) float64 { return m.fail(t) }
}

func (c *compiler) symbol(n *Symbol) code {
	if v, ok := n.Constant(); ok {
		return constant(v)
	}
	slot := c.slots[n.Name]
	t := &trouble{pos: n.Pos, text: n.Name + " has no value"}
	return func(m *machine) float64 {
		v := m.frame.Value(slot)
		if v-v != 0 {
			return m.fail(t)
		}
		return v
	}
}

func (c *compiler) binary(n *Binary) code {
	l, r := c.node(n.L), c.node(n.R)
	large := c.trouble(n, "result out of range", n)
	switch n.Op {
	case '+':
		return func(m *machine) float64 { return m.sum(l(m), r(m), large) }
	case '−':
		return func(m *machine) float64 { return m.sum(l(m), -r(m), large) }
	case '·':
		return func(m *machine) float64 { return m.finite(l(m)*r(m), large) }
	case '/':
		zero := c.trouble(n, "division by zero", n.R)
		return func(m *machine) float64 {
			a, b := l(m), r(m)
			if b == 0 {
				return m.fail(zero)
			}
			return m.finite(a/b, large)
		}
	}
	t := &trouble{pos: n.Pos, text: fmt.Sprintf("unknown operator %c", n.Op)}
	return func(m *machine) float64 { return m.fail(t) }
}

func (c *compiler) power(n *Power) code {
	base := c.node(n.Base)
	large := c.trouble(n, "result out of range", n)
	zero := c.trouble(n, "division by zero", n)
	root := c.trouble(n, "power of a negative number", n)
	raise := func(m *machine, x, y float64) float64 {
		switch {
		case x == 0 && y < 0:
			return m.fail(zero)
		case x < 0 && y != math.Trunc(y):
			return m.fail(root)
		}
		return m.finite(math.Pow(x, y), large)
	}
	if r, ok := rational(n.Exp); ok {
		switch r {
		case quantity.NewRat(2, 1):
			return func(m *machine) float64 { x := base(m); return m.finite(x*x, large) }
		case quantity.NewRat(3, 1):
			return func(m *machine) float64 { x := base(m); return m.finite(x*x*x, large) }
		}
		y := r.Float()
		return func(m *machine) float64 { return raise(m, base(m), y) }
	}
	exp := c.node(n.Exp)
	return func(m *machine) float64 { return raise(m, base(m), exp(m)) }
}

func (c *compiler) call(n *Call) code {
	args := make([]code, len(n.Args))
	for i, x := range n.Args {
		args[i] = c.node(x)
	}
	if bounds, ok := functions[n.Fn]; !ok || len(args) < bounds[0] {
		t := &trouble{pos: n.Pos, text: fmt.Sprintf("unknown function %s of %d arguments", n.Fn, len(args))}
		return func(m *machine) float64 { return m.fail(t) }
	}
	x := args[0]
	large := c.trouble(n, "result out of range", n)
	switch n.Fn {
	case "abs":
		return func(m *machine) float64 { return math.Abs(x(m)) }
	case "exp":
		return func(m *machine) float64 { return m.finite(math.Exp(x(m)), large) }
	case "sin":
		return func(m *machine) float64 { return math.Sin(x(m)) }
	case "cos":
		return func(m *machine) float64 { return math.Cos(x(m)) }
	case "tan":
		return func(m *machine) float64 { return m.finite(math.Tan(x(m)), large) }
	case "sqrt":
		negative := c.trouble(n, "root of a negative number", n)
		return func(m *machine) float64 {
			v := x(m)
			if v < 0 {
				return m.fail(negative)
			}
			return math.Sqrt(v)
		}
	case "ln":
		low := c.trouble(n, "logarithm of a number not above zero", n)
		return func(m *machine) float64 {
			v := x(m)
			if v <= 0 {
				return m.fail(low)
			}
			return math.Log(v)
		}
	case "arcsin", "arccos":
		outside := c.trouble(n, "argument outside −1 to 1", n)
		inverse := math.Asin
		if n.Fn == "arccos" {
			inverse = math.Acos
		}
		return func(m *machine) float64 {
			v := x(m)
			if !(v >= -1 && v <= 1) {
				return m.fail(outside)
			}
			return inverse(v)
		}
	case "cot":
		zero := c.trouble(n, "division by zero", n)
		return func(m *machine) float64 {
			t := math.Tan(x(m))
			if t == 0 {
				return m.fail(zero)
			}
			return m.finite(1/t, large)
		}
	}
	return extreme(args, n.Fn == "max")
}

// extreme is the largest or the smallest of its arguments.
func extreme(args []code, largest bool) code {
	return func(m *machine) float64 {
		best := args[0](m)
		for _, x := range args[1:] {
			if v := x(m); (v > best) == largest && v != best {
				best = v
			}
		}
		return best
	}
}

func (c *compiler) rows(n *Rows) code {
	x := c.node(n.X)
	index, op := n.Index, n.Op
	large := c.trouble(n, "result out of range", n)
	empty := c.trouble(n, op+"_"+index+" has no rows", nil)
	reset := slices.Contains(c.resets, index)
	clash := &trouble{pos: n.Pos, text: op + "_" + index + " takes the index " + index + " that stands free in the formula as well"}
	unknown := &trouble{pos: n.Pos, text: "unknown reduction " + op}
	return func(m *machine) float64 {
		if reset {
			at, ok := m.frame.(interface{ Row(index string) int })
			if !ok {
				return m.fail(clash)
			}
			defer m.frame.Set(index, at.Row(index))
		}
		count := m.frame.Len(index)
		if count <= 0 && op != "Σ" {
			return m.fail(empty)
		}
		total := 0.0
		for row := 0; row < count && m.err == nil; row++ {
			m.frame.Set(index, row)
			v := x(m)
			switch {
			case m.err != nil:
				m.err.Msg += fmt.Sprintf(", row %d of %s", row+1, index)
			case op == "Σ":
				total = m.sum(total, v, large)
			case op != "min" && op != "max":
				return m.fail(unknown)
			case row == 0 || op == "min" && v < total || op == "max" && v > total:
				total = v
			}
		}
		return total
	}
}

func (c *compiler) cases(n *Cases) code {
	when, then := make([]test, len(n.Arms)), make([]code, len(n.Arms))
	for i, a := range n.Arms {
		when[i], then[i] = c.cond(a.If), c.node(a.Then)
	}
	otherwise := c.node(n.Otherwise)
	return func(m *machine) float64 {
		for i, holds := range when {
			if holds(m) {
				return then[i](m)
			}
			if m.err != nil {
				return 0
			}
		}
		return otherwise(m)
	}
}
