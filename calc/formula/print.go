package formula

import (
	"strconv"
	"strings"

	"soffit/calc/quantity"
)

// Print writes an expression in the notation; read again it gives the same tree. Brackets stand where the
// tree needs them, and around a minus that does not begin an expression.
func Print(n Node) string {
	var p printer
	p.node(n, asSum, true)
	return p.String()
}

// PrintCond writes a condition; where "and" and "or" meet, brackets say which goes first.
func PrintCond(c Cond) string {
	var p printer
	p.cond(c)
	return p.String()
}

// String writes the formula, "f_cd = α_cc·f_ck/γ_C".
func (f *Formula) String() string { return f.Symbol.Name + " = " + Print(f.Expr) }

// String gives the canonical name.
func (s *Symbol) String() string { return s.Name }

// The place of an expression: what it may be there without brackets.
const (
	asSum = iota
	asProduct
	asPower
	asAtom
)

type printer struct{ strings.Builder }

// node writes n in its place; first says that the place begins an expression.
func (p *printer) node(n Node, place int, first bool) {
	switch n := n.(type) {
	case *Number:
		if n.Text == "" {
			p.WriteString(strconv.FormatFloat(n.Value, 'g', -1, 64))
			return
		}
		p.WriteString(n.Text)
	case *UnitLit:
		p.WriteString(printUnit(n.Unit))
	case *Symbol:
		p.WriteString(n.Name)
	case *Negate:
		p.bracket(!first, func(bool) {
			p.WriteString("−")
			p.node(n.X, asPower, false)
		}, first)
	case *Binary:
		tight, sign := asProduct, string(n.Op)
		if n.Op == '+' || n.Op == '−' {
			tight, sign = asSum, " "+sign+" "
		}
		p.bracket(place > tight, func(first bool) {
			p.node(n.L, tight, first)
			p.WriteString(sign)
			p.node(n.R, tight+1, false)
		}, first)
	case *Power:
		p.bracket(place == asAtom, func(bool) {
			p.node(n.Base, asAtom, false)
			p.WriteString("^")
			p.node(n.Exp, asAtom, false)
		}, first)
	case *Call:
		p.WriteString(n.Fn + "(" + join(n.Args, "; ", Print) + ")")
	case *Rows:
		p.WriteString(n.Op + "_" + n.Index + "(" + Print(n.X) + ")")
	case *Cases:
		p.WriteString("cases(")
		for _, a := range n.Arms {
			p.cond(a.If)
			p.WriteString(": " + Print(a.Then) + "; ")
		}
		p.WriteString("otherwise: " + Print(n.Otherwise) + ")")
	default:
		p.WriteString("?")
	}
}

func (p *printer) bracket(needed bool, inner func(first bool), first bool) {
	if needed {
		p.WriteString("(")
		inner(true)
		p.WriteString(")")
		return
	}
	inner(first)
}

func (p *printer) cond(c Cond) {
	switch c := c.(type) {
	case *Compare:
		for i, x := range c.X {
			if i > 0 {
				p.WriteString(" " + c.Rel[i-1] + " ")
			}
			p.node(x, asSum, true)
		}
	case *Logic:
		p.operand(c.L, c.Op, false)
		p.WriteString(" " + c.Op + " ")
		p.operand(c.R, c.Op, true)
	default:
		p.WriteString("?")
	}
}

func (p *printer) operand(c Cond, op string, right bool) {
	l, ok := c.(*Logic)
	p.bracket(ok && (right || l.Op != op), func(bool) { p.cond(c) }, true)
}

func printUnit(u quantity.Unit) string {
	if u.String() == "" {
		return "[1]"
	}
	return "[" + u.String() + "]"
}

// join writes operands with a separator.
func join[T any](items []T, separator string, write func(T) string) string {
	parts := make([]string, len(items))
	for i, x := range items {
		parts[i] = write(x)
	}
	return strings.Join(parts, separator)
}
