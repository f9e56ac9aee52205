package formula

import "fmt"

// Formulas are read by recursive descent:
//
//	formula  = symbol "=" sum
//	logic    = all ("or" all)*              all = compare ("and" compare)*
//	compare  = sum (relation sum)*
//	sum      = product (("+"|"−") product)*
//	product  = unary (("·"|"/") unary)*
//	unary    = "−" unary | power
//	power    = atom ("^" "−"? atom)?
//	atom     = number | "[" unit "]" | symbol | function "(" sum (";" sum)* ")"
//	         | rows "(" sum ")" | cases | "(" logic ")"
//	cases    = "cases(" (logic ":" sum ";")+ "otherwise:" sum ")"
//
// Since "(" begins a value as well as a condition, everything from logic to atom gives either.
type value struct {
	node Node
	cond Cond
}

func (p *parser) logic() value {
	l := p.all()
	for pos := p.peek().pos; p.word("or"); pos = p.peek().pos {
		l = value{cond: &Logic{Pos: pos, Op: "or", L: p.cond(l), R: p.cond(p.all())}}
	}
	return l
}

func (p *parser) all() value {
	l := p.compare()
	for pos := p.peek().pos; p.word("and"); pos = p.peek().pos {
		l = value{cond: &Logic{Pos: pos, Op: "and", L: p.cond(l), R: p.cond(p.compare())}}
	}
	return l
}

func (p *parser) compare() value {
	l := p.sum()
	if p.peek().kind != relation {
		return l
	}
	c := &Compare{Pos: p.peek().pos, X: []Node{p.value(l)}}
	for p.peek().kind == relation {
		c.Rel = append(c.Rel, p.take().text)
		c.X = append(c.X, p.value(p.sum()))
	}
	return value{cond: c}
}

func (p *parser) sum() value {
	l := p.product()
	for p.peek().kind == '+' || p.peek().kind == '−' {
		t := p.take()
		l = value{node: &Binary{Pos: t.pos, Op: rune(t.kind), L: p.value(l), R: p.value(p.product())}}
	}
	return l
}

func (p *parser) product() value {
	l := p.unary()
	for p.peek().kind == '·' || p.peek().kind == '/' {
		t := p.take()
		l = value{node: &Binary{Pos: t.pos, Op: rune(t.kind), L: p.value(l), R: p.value(p.unary())}}
	}
	return l
}

func (p *parser) unary() value {
	t := p.peek()
	if t.kind != '−' {
		return p.power()
	}
	p.take()
	p.deeper(t.pos)
	x := p.value(p.unary())
	p.depth--
	return value{node: &Negate{Pos: t.pos, X: x}}
}

func (p *parser) power() value {
	base := p.atom()
	if p.peek().kind != '^' {
		return base
	}
	t := p.take()
	x := &Power{Pos: t.pos, Base: p.value(base)}
	if m := p.peek(); p.accept('−') {
		x.Exp = &Negate{Pos: m.pos, X: p.value(p.atom())}
	} else {
		x.Exp = p.value(p.atom())
	}
	if p.peek().kind == '^' {
		p.fail(p.peek().pos, "power of a power without brackets: write (a^b)^c or a^(b^c)")
	}
	return value{node: x}
}

func (p *parser) atom() value {
	t := p.take()
	v := value{}
	switch t.kind {
	case number:
		v.node = &Number{Pos: t.pos, Text: t.text, Value: t.value}
	case unitLit:
		v.node = &UnitLit{Pos: t.pos, Unit: t.unit}
	case symbol:
		v.node = t.symbol
	case function:
		v.node = p.call(t)
	case rows:
		v.node = p.rows(t)
	case '(':
		p.deeper(t.pos)
		v = p.logic()
		p.expect(')')
		p.depth--
	default:
		if t.kind != word || t.text != "cases" {
			p.unexpected(t, "a value")
		}
		v.node = p.cases(t)
	}
	if n := p.peek(); n.startsValue() {
		if v.node == nil {
			p.fail(n.pos, "have %s behind a condition, want and, or, or the end", clip(n.text))
		}
		next := n.text
		switch n.kind {
		case '(':
			next = "(…)"
		case rows:
			next += "_" + n.index + "(…)"
		case function, word:
			next += "(…)"
		}
		left := Print(v.node)
		if _, ok := v.node.(*Binary); ok {
			left = "(" + left + ")"
		}
		p.fail(n.pos, "no operator between two values: write %s·%s", clip(left), clip(next))
	}
	return v
}

// open begins a bracket behind a word; shut ends it.
func (p *parser) open(t *token, form string) {
	if n := p.peek(); n.kind != '(' {
		p.fail(n.pos, "%s lacks its brackets: write %s", t.text, form)
	}
	p.take()
	p.deeper(t.pos)
}

func (p *parser) shut() {
	p.expect(')')
	p.depth--
}

func (p *parser) call(t *token) Node {
	c := &Call{Pos: t.pos, Fn: t.text}
	p.open(t, t.text+"(…)")
	separator := ""
	for {
		c.Args = append(c.Args, p.value(p.logic()))
		s := p.peek()
		if !p.accept(';') {
			break
		}
		if separator != "" && s.text != separator {
			p.fail(s.pos, "both , and ; between arguments: write ; for all, and a decimal with a point")
		}
		separator = s.text
	}
	p.shut()
	if n := functions[t.text]; len(c.Args) < n[0] || len(c.Args) > n[1] {
		want := "one"
		if n[1] > 1 {
			want = fmt.Sprintf("%d to %d", n[0], n[1])
		}
		p.fail(t.pos, "%s with %d of its arguments: want %s", t.text, len(c.Args), want)
	}
	return c
}

func (p *parser) rows(t *token) Node {
	for _, b := range p.bound {
		if b == t.index {
			p.fail(t.pos, "%s_%s inside rows that run over %s already", t.text, t.index, t.index)
		}
	}
	p.bound = append(p.bound, t.index)
	p.open(t, t.text+"_"+t.index+"(…)")
	r := &Rows{Pos: t.pos, Op: t.text, Index: t.index, X: p.value(p.logic())}
	p.shut()
	p.bound = p.bound[:len(p.bound)-1]
	return r
}

func (p *parser) cases(t *token) Node {
	c := &Cases{Pos: t.pos}
	p.open(t, "cases(condition: value; otherwise: value)")
	for !p.word("otherwise") {
		a := Arm{If: p.cond(p.logic())}
		p.expect(':')
		a.Then = p.value(p.logic())
		c.Arms = append(c.Arms, a)
		if s := p.peek(); s.kind == ')' {
			p.fail(s.pos, "cases lacks its last arm: write ; otherwise: value")
		}
		p.expect(';')
	}
	if len(c.Arms) == 0 {
		p.fail(t.pos, "cases has no condition: write the value alone")
	}
	p.expect(':')
	c.Otherwise = p.value(p.logic())
	p.shut()
	return c
}
