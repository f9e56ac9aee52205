package mathset

import (
	"strings"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// class is what a node looks like when set, for deciding on brackets.
type class uint8

const (
	atomic     class = iota // a symbol or number
	product                 // factors with dots, numbers with powers of ten
	quotient                // with a solidus
	fractional              // stacked
	quantified              // a number with unit
	raisedTo                // a power
	called                  // a function and its argument
	summed                  // + or −
	negative                // a minus at the front
	over                    // Σ and its terms
	armed                   // cases
)

func (m *setter) class(c ctx, n formula.Node) class {
	switch n := n.(type) {
	case *formula.Number:
		if strings.ContainsAny(n.Text, "eE") {
			return product
		}
		return atomic
	case *formula.Symbol:
		if o, ok := m.operand(c, n); ok {
			switch {
			case strings.HasPrefix(o.Number, "-"):
				return negative
			case o.Unit != "":
				return quantified
			case strings.ContainsAny(o.Number, "eE"):
				return product
			}
			return atomic
		}
		if n.Arg != "" {
			return called
		}
		return atomic
	case *formula.Negate:
		return negative
	case *formula.Binary:
		return m.binaryClass(c, n)
	case *formula.Power:
		return raisedTo
	case *formula.Call:
		return called
	case *formula.Rows:
		if n.Op != "Σ" {
			return called
		}
		if !m.written(n) {
			return over
		}
		switch m.Len(n.Index) {
		case 0:
			return atomic
		case 1:
			return m.class(at(c, n.Index, 0), n.X)
		}
		return summed
	case *formula.Cases:
		if arm := m.taken(c, n); arm != nil {
			return m.class(c, arm)
		}
		return armed
	}
	return atomic
}

func (m *setter) binaryClass(c ctx, n *formula.Binary) class {
	switch n.Op {
	case '+', '−':
		return summed
	case '·':
		if _, ok := n.R.(*formula.UnitLit); ok {
			if _, plain := n.L.(*formula.Number); plain || m.Operand != nil {
				return quantified
			}
			return m.class(c, n.L)
		}
		return product
	}
	if u, ok := n.R.(*formula.UnitLit); ok {
		if number, cancelled := m.cancelled(c, n.L, u); cancelled {
			if strings.HasPrefix(number.Number, "-") {
				return negative
			}
			return atomic
		}
		if m.Operand == nil {
			return m.class(c, n.L)
		}
	}
	if c.linear || c.part {
		return quotient
	}
	return fractional
}

func (m *setter) operand(c ctx, s *formula.Symbol) (Operand, bool) {
	if m.Operand == nil {
		return Operand{}, false
	}
	return m.Operand(s, c.at)
}

// cancelled is the number that is left of a symbol divided by its own unit, f_ck/[MPa].
func (m *setter) cancelled(c ctx, n formula.Node, u *formula.UnitLit) (Operand, bool) {
	s, ok := n.(*formula.Symbol)
	if !ok {
		return Operand{}, false
	}
	o, ok := m.operand(c, s)
	if !ok || o.Unit != u.Unit.String() {
		return Operand{}, false
	}
	o.Unit = ""
	return o, true
}

// one is an atom that is not broken.
func one(b Box) []atom { return []atom{{box: b, cost: never}} }

// box sets a node unbroken.
func (m *setter) box(size draw.Pt, n formula.Node) Box {
	return joined(m.expr(ctx{size: size, linear: true, lead: true, at: m.At}, n))
}

// expr sets a node.
func (m *setter) expr(c ctx, n formula.Node) []atom {
	switch n := n.(type) {
	case *formula.Number:
		return one(number(draw.Serif, c.size, n.Text))
	case *formula.UnitLit:
		return one(unit(draw.Serif, c.size, n.Unit.String()))
	case *formula.Symbol:
		if o, ok := m.operand(c, n); ok {
			return one(m.value(c, o))
		}
		return one(m.linkedSymbol(c, n, Box{}))
	case *formula.Negate:
		return m.negate(c, n)
	case *formula.Binary:
		return m.binary(c, n)
	case *formula.Power:
		return one(m.power(c, n))
	case *formula.Call:
		return m.call(c, n)
	case *formula.Rows:
		return m.rows(c, n)
	case *formula.Cases:
		return m.cases(c, n)
	}
	panic("mathset: a node of no known kind") // the set of nodes is closed
}

func (m *setter) value(c ctx, o Operand) Box {
	return linked(quantity(number(draw.Serif, c.size, o.Number), draw.Serif, c.size, o.Unit), o.Anchor)
}

func (m *setter) linkedSymbol(c ctx, s *formula.Symbol, exp Box) Box {
	var b Box
	if len(exp.items) == 0 && len(m.Index) == 0 {
		b = m.known(c.size, s)
	} else {
		b = m.symbol(c.size, s, exp)
	}
	if m.Anchor != nil {
		return linked(b, m.Anchor(s, c.at))
	}
	return b
}

// joinedBy is two operands with a sign between them, which stays on the line of the first.
func joinedBy(c ctx, l []atom, sign string, gap float64, r []atom) []atom {
	b := text(draw.Serif, c.size, sign)
	out := append(make([]atom, 0, len(l)+len(r)), l...)
	last := &out[len(out)-1]
	marks := last.box.marks
	last.box = row(last.box, Box{Width: draw.Pt(gap) * c.size}, b)
	last.box.marks = marks
	n := len(out)
	out = append(out, r...)
	out[n].gap, out[n].cost, out[n].relation = draw.Pt(gap)*c.size, atDot, 0
	return out
}

func (m *setter) negate(c ctx, n *formula.Negate) []atom {
	inner := c
	inner.lead = false
	k := m.class(inner, n.X)
	atoms := m.bracketed(inner, n.X, k == summed || k == negative || k == armed)
	return prefixed(c, "−", 0, atoms, 0, never)
}

// prefixed glues a sign to the front of atoms, with a gap in em after it; before the whole goes gap.
func prefixed(c ctx, sign string, after float64, atoms []atom, gap float64, cost int) []atom {
	b := text(draw.Serif, c.size, sign)
	b.space(draw.Pt(after) * c.size)
	out := append([]atom(nil), atoms...)
	out[0].box = row(b, out[0].box)
	out[0].gap, out[0].cost, out[0].relation = draw.Pt(gap)*c.size, cost, 0
	return out
}

func (m *setter) binary(c ctx, n *formula.Binary) []atom {
	left, right := c, c
	right.lead = false
	switch n.Op {
	case '+', '−':
		k := m.class(right, n.R)
		l := m.bracketed(left, n.L, m.class(left, n.L) == armed || m.minus(left, n.L))
		r := m.bracketed(right, n.R, k == summed || k == armed || m.minus(right, n.R))
		return append(l, prefixed(c, string(n.Op), medium, r, medium, atSign)...)
	case '·':
		if u, ok := n.R.(*formula.UnitLit); ok {
			return m.inUnit(c, n.L, u)
		}
		k, q := m.class(left, n.L), m.class(right, n.R)
		l := m.bracketed(left, n.L, k == summed || k == over || k == armed || m.minus(left, n.L))
		r := m.bracketed(right, n.R, q == summed || q == product || q == quotient || q == armed || m.minus(right, n.R))
		gap := thin
		if m.Operand != nil {
			gap = medium
		}
		return joinedBy(c, l, "·", gap, r)
	case '/':
		return m.divide(c, n)
	}
	panic("mathset: no operation " + string(n.Op))
}

// minus tells whether a node brings a minus sign where something stands to its left.
func (m *setter) minus(c ctx, n formula.Node) bool {
	return !c.lead && m.class(c, n) == negative
}

// inUnit sets n·[MPa]. A plain number takes the unit as its own. In symbols the unit of an expression is
// left out, as the standard prints it; in numbers it follows.
func (m *setter) inUnit(c ctx, n formula.Node, u *formula.UnitLit) []atom {
	_, plain := n.(*formula.Number)
	if m.Operand == nil && !plain {
		return m.expr(c, n)
	}
	k := m.class(c, n)
	atoms := m.bracketed(c, n, k == summed || k == over || k == armed)
	out := append([]atom(nil), atoms...)
	last := &out[len(out)-1]
	last.box = quantity(last.box, draw.Serif, c.size, u.Unit.String())
	return out
}

func (m *setter) divide(c ctx, n *formula.Binary) []atom {
	if u, ok := n.R.(*formula.UnitLit); ok {
		if o, cancelled := m.cancelled(c, n.L, u); cancelled {
			return one(m.value(c, o))
		}
		if m.Operand == nil {
			return m.expr(c, n.L)
		}
	}
	if !c.linear && !c.part { // fractions within fractions are set in line
		part := c
		part.lead, part.level = true, 0
		part.part = true
		num, den := joined(m.expr(part, n.L)), joined(m.expr(part, n.R))
		b := fraction(c.size, part.size, num, den)
		if m.widest == 0 || b.Width <= m.widest {
			return one(b)
		}
	}
	c.linear = true
	part := c
	part.lead = false
	k, q := m.class(c, n.L), m.class(part, n.R)
	l := m.bracketed(c, n.L, k == summed || k == over || k == armed || m.minus(c, n.L))
	r := m.bracketed(part, n.R, q != atomic && q != quantified && q != raisedTo && q != called)
	return joinedBy(c, l, "/", 0.03, r)
}

func (m *setter) power(c ctx, n *formula.Power) Box {
	in := c
	in.size, in.linear, in.lead = m.script(c.size), true, true
	exp := joined(m.expr(in, n.Exp))
	base := c
	base.lead = true
	node := n.Base
	if d, ok := node.(*formula.Binary); ok && m.Operand == nil {
		if _, unit := d.R.(*formula.UnitLit); unit && d.Op == '/' {
			node = d.L
		}
	}
	k := m.class(base, node)
	if s, ok := node.(*formula.Symbol); ok && k == atomic {
		if _, number := m.operand(c, s); !number {
			return m.linkedSymbol(c, s, exp)
		}
	}
	b := joined(m.bracketed(base, node, k != atomic))
	return scripts(nucleus{box: b}, c.size, exp, Box{})
}
