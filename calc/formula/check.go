package formula

import "soffit/calc/quantity"

// Check finds the dimension of an expression from those of its symbols; dim is asked for every symbol but π,
// at each place where it stands. An error is an *Error that names the dimensions and the operands.
//
// The literal 0 alone takes the dimension of what it stands beside in sums, comparisons, min, max and the
// arms of cases. The exponent of a base with a dimension is a rational number in digits.
func Check(n Node, dim func(*Symbol) (quantity.Dim, error)) (quantity.Dim, error) {
	return checker{dim}.node(n)
}

// CheckCond checks the dimensions of a condition.
func CheckCond(c Cond, dim func(*Symbol) (quantity.Dim, error)) error { return checker{dim}.cond(c) }

type checker struct {
	dim func(*Symbol) (quantity.Dim, error)
}

func (c checker) node(n Node) (quantity.Dim, error) {
	switch n := n.(type) {
	case *Number:
		return quantity.None, nil
	case *UnitLit:
		return n.Unit.Dim(), nil
	case *Symbol:
		return c.symbol(n)
	case *Negate:
		return c.node(n.X)
	case *Binary:
		return c.binary(n)
	case *Power:
		return c.power(n)
	case *Call:
		return c.call(n)
	case *Rows:
		return c.node(n.X)
	case *Cases:
		then := make([]Node, 0, len(n.Arms)+1)
		for _, a := range n.Arms {
			if err := c.cond(a.If); err != nil {
				return quantity.None, err
			}
			then = append(then, a.Then)
		}
		return c.same(append(then, n.Otherwise), "the arms of cases are %s and %s")
	}
	return quantity.None, errorAt(0, "unknown kind of node in the formula")
}

func (c checker) symbol(s *Symbol) (quantity.Dim, error) {
	if _, ok := s.Constant(); ok {
		return quantity.None, nil
	}
	d, err := c.dim(s)
	if err == nil {
		return d, nil
	}
	if e, ok := err.(*Error); ok {
		return d, e
	}
	return d, errorAt(s.Pos, "%v", err)
}

func (c checker) cond(n Cond) error {
	switch n := n.(type) {
	case *Compare:
		_, err := c.same(n.X, "cannot compare %s with %s")
		return err
	case *Logic:
		if err := c.cond(n.L); err != nil {
			return err
		}
		return c.cond(n.R)
	}
	return errorAt(0, "unknown kind of condition in the formula")
}

func (c checker) binary(n *Binary) (quantity.Dim, error) {
	switch n.Op {
	case '+':
		return c.same([]Node{n.L, n.R}, "cannot add %[2]s to %[1]s")
	case '−':
		return c.same([]Node{n.L, n.R}, "cannot subtract %[2]s from %[1]s")
	}
	l, err := c.node(n.L)
	if err != nil {
		return l, err
	}
	r, err := c.node(n.R)
	if err != nil {
		return r, err
	}
	switch n.Op {
	case '·':
		l = l.Mul(r)
	case '/':
		l = l.Div(r)
	default:
		return l, errorAt(n.Pos, "unknown operator %c", n.Op)
	}
	return valid(l, n)
}

// same checks that expressions have one dimension. The text is a format of two strings, the two dimensions
// that differ with their operands.
func (c checker) same(list []Node, text string) (quantity.Dim, error) {
	var first Node
	var d quantity.Dim
	for _, n := range list {
		e, err := c.node(n)
		switch {
		case err != nil:
			return e, err
		case isZero(n):
		case first == nil:
			first, d = n, e
		case d != e:
			return d, errorAt(start(n), text, operand(d, first), operand(e, n))
		}
	}
	return d, nil
}

func operand(d quantity.Dim, n Node) string { return d.Indefinite() + " (" + clip(Print(n)) + ")" }

// isZero reports whether n is the literal 0 alone.
func isZero(n Node) bool {
	z, ok := n.(*Number)
	return ok && z.Value == 0
}

func (c checker) power(n *Power) (quantity.Dim, error) {
	base, err := c.node(n.Base)
	if err != nil {
		return base, err
	}
	exp, err := c.node(n.Exp)
	if err != nil {
		return exp, err
	}
	if !exp.IsNone() {
		return exp, errorAt(start(n.Exp), "the exponent of %s is %s", operand(base, n.Base), operand(exp, n.Exp))
	}
	if base.IsNone() {
		return base, nil
	}
	r, ok := rational(n.Exp)
	if !ok {
		return base, errorAt(start(n.Exp), "%s needs a rational number in digits as its exponent, as 2 or (2/3), not %s", operand(base, n.Base), clip(Print(n.Exp)))
	}
	return valid(base.Pow(r), n)
}

func (c checker) call(n *Call) (quantity.Dim, error) {
	if n.Fn == "min" || n.Fn == "max" {
		return c.same(n.Args, n.Fn+" of %s and %s")
	}
	if _, ok := functions[n.Fn]; !ok || len(n.Args) != 1 {
		return quantity.None, errorAt(n.Pos, "unknown function %s of %d arguments", n.Fn, len(n.Args))
	}
	d, err := c.node(n.Args[0])
	if err != nil {
		return d, err
	}
	switch n.Fn {
	case "abs":
		return d, nil
	case "sqrt":
		return valid(d.Pow(quantity.NewRat(1, 2)), n)
	}
	if !d.IsNone() {
		return d, errorAt(start(n.Args[0]), "%s of %s: want a plain number", n.Fn, operand(d, n.Args[0]))
	}
	return d, nil
}

func valid(d quantity.Dim, n Node) (quantity.Dim, error) {
	if !d.Valid() {
		return d, errorAt(n.At(), "power of a dimension out of range in %s", clip(Print(n)))
	}
	return d, nil
}

// rational reads an exponent in digits: 2, 0.5, −1, 2/3.
func rational(n Node) (quantity.Rat, bool) {
	switch n := n.(type) {
	case *Number:
		return decimal(n.Text)
	case *Negate:
		r, ok := rational(n.X)
		return r.Neg(), ok
	case *Binary:
		l, ok := rational(n.L)
		r, too := rational(n.R)
		if !ok || !too || n.Op != '/' || r.Sign() == 0 {
			return quantity.Rat{}, false
		}
		q := l.Mul(quantity.NewRat(r.Den(), r.Num()))
		return q, q.Valid()
	}
	return quantity.Rat{}, false
}

// decimal reads a short decimal without exponent as a rational number.
func decimal(text string) (quantity.Rat, bool) {
	n, d, point := 0, 1, false
	for _, r := range text {
		switch {
		case r == '.' && !point:
			point = true
		case digit(r) && n < 1e8 && d < 1e8:
			n = n*10 + int(r-'0')
			if point {
				d *= 10
			}
		default:
			return quantity.Rat{}, false
		}
	}
	r := quantity.NewRat(n, d)
	return r, text != "" && r.Valid()
}
