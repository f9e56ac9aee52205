// Package formula holds formulas in the notation of the standard as trees: read from text, printed back,
// checked for dimensions and evaluated, all from the same tree.
package formula

// parser goes over the tokens of one text. It leaves its recursion with fail.
type parser struct {
	tokens []token
	depth  int
	bound  []string // indices of the rows around
}

// The bounds of a formula hold for it as printed. The parser itself goes deeper, by more than the bracket and
// the minus there can be at each level, so that what was read once is read again after printing.
const (
	maxNesting = 60   // brackets in each other
	maxPrinted = 8000 // runes
	maxDepth   = 4 * maxNesting
)

// Parse reads a formula, "f_cd = α_cc·f_ck/γ_C".
func Parse(src string) (*Formula, error) {
	p, err := newParser(src)
	if err != nil {
		return nil, err
	}
	return guard(func() *Formula {
		f := &Formula{Symbol: p.symbol()}
		if t := p.take(); t.kind != relation || t.text != "=" {
			p.unexpected(t, "=")
		}
		f.Expr = p.value(p.sum())
		p.finish()
		p.limit(f.String())
		return f
	})
}

// ParseExpr reads an expression.
func ParseExpr(src string) (Node, error) {
	p, err := newParser(src)
	if err != nil {
		return nil, err
	}
	return guard(func() Node {
		n := p.value(p.logic())
		p.finish()
		p.limit(Print(n))
		return n
	})
}

// ParseCond reads a condition, "λ·x ≤ h_f".
func ParseCond(src string) (Cond, error) {
	p, err := newParser(src)
	if err != nil {
		return nil, err
	}
	return guard(func() Cond {
		c := p.cond(p.logic())
		p.finish()
		p.limit(PrintCond(c))
		return c
	})
}

// ParseSymbol reads a symbol alone.
func ParseSymbol(src string) (*Symbol, error) {
	p, err := newParser(src)
	if err != nil {
		return nil, err
	}
	return guard(func() *Symbol {
		s := p.symbol()
		p.finish()
		p.limit(s.Name)
		return s
	})
}

func newParser(src string) (*parser, error) {
	tokens, err := scan(src)
	return &parser{tokens: tokens}, err
}

// guard turns the *Error with which the parser leaves its recursion into a result.
func guard[T any](read func() T) (result T, err error) {
	defer func() {
		switch r := recover().(type) {
		case nil:
		case *Error:
			var none T
			result, err = none, r
		default:
			panic(r)
		}
	}()
	return read(), nil
}

func (p *parser) fail(pos Pos, format string, args ...any) { panic(errorAt(pos, format, args...)) }

func (p *parser) peek() *token { return &p.tokens[0] }

func (p *parser) take() *token {
	t := &p.tokens[0]
	if t.kind != end {
		p.tokens = p.tokens[1:]
	}
	return t
}

func (p *parser) accept(k kind) bool {
	if p.peek().kind == k {
		p.take()
		return true
	}
	return false
}

func (p *parser) expect(k kind) {
	if t := p.take(); t.kind != k {
		p.unexpected(t, string(rune(k)))
	}
}

func (p *parser) unexpected(t *token, want string) {
	p.fail(t.pos, "have %s, want %s", clip(t.text), want)
}

// finish makes sure that nothing is left over.
func (p *parser) finish() {
	switch t := p.peek(); t.kind {
	case end:
	case ')':
		p.fail(t.pos, ") without (")
	case ';':
		p.fail(t.pos, "%s outside the brackets of a function: a decimal takes a point, a subscript with a comma stands in braces, as A_{p,i}", t.text)
	case relation:
		p.fail(t.pos, "a condition stands where a value is wanted: %s", t.text)
	default:
		p.fail(t.pos, "have %s, want an operator or the end", clip(t.text))
	}
}

// limit holds the formula, as printed, to the bounds.
func (p *parser) limit(printed string) {
	depth, deepest, runes := 0, 0, 0
	for _, r := range printed {
		runes++
		switch r {
		case '(':
			depth++
			deepest = max(deepest, depth)
		case ')':
			depth--
		}
	}
	if deepest > maxNesting {
		p.fail(0, "formula has more than %d brackets in each other", maxNesting)
	}
	if runes > maxPrinted {
		p.fail(0, "formula is longer than %d characters", maxPrinted)
	}
}

func (p *parser) deeper(pos Pos) {
	if p.depth++; p.depth > maxDepth {
		p.fail(pos, "formula has too many brackets in each other")
	}
}

func (p *parser) symbol() *Symbol {
	t := p.take()
	switch t.kind {
	case symbol:
		return t.symbol
	case function, rows, word:
		p.fail(t.pos, "%s is a word of the notation, not a symbol", t.text)
	}
	p.unexpected(t, "a symbol")
	return nil
}

func (p *parser) value(v value) Node {
	if v.node == nil {
		p.fail(v.cond.At(), "a condition stands where a value is wanted")
	}
	return v.node
}

func (p *parser) cond(v value) Cond {
	if v.cond == nil {
		p.fail(v.node.At(), "a value stands where a condition is wanted: write a relation, as x ≤ h")
	}
	return v.cond
}

func (p *parser) word(w string) bool {
	if t := p.peek(); t.kind == word && t.text == w {
		p.take()
		return true
	}
	return false
}
