package formula

import (
	"math/rand"
	"strings"
	"testing"
)

// grower makes trees out of chance, every kind of node in every place.
type grower struct{ *rand.Rand }

func (g grower) pick(list ...string) string { return list[g.Intn(len(list))] }

func (g grower) node(depth int, bound string) Node {
	if depth == 0 {
		switch g.Intn(5) {
		case 0:
			n, _ := ParseExpr(g.pick("2", "0.30", "1e-6", "0"))
			return n
		case 1:
			n, _ := ParseExpr(g.pick("[MPa]", "[1]", "[10⁶ mm⁴]", "[kN·m]", "[1/(MPa·d)]"))
			return n
		}
		s, _ := ParseSymbol(g.pick("a", "b_w", "f_{p0,1k}", "A_{p,i}", "x_{G,j,n}", "d'", "φ(t,t_0)", "e", "π"))
		return s
	}
	next := func() Node { return g.node(g.Intn(depth), bound) }
	switch g.Intn(9) {
	case 0:
		return &Negate{X: next()}
	case 1, 2, 3:
		return &Binary{Op: []rune("+−·/")[g.Intn(4)], L: next(), R: next()}
	case 4:
		return &Power{Base: next(), Exp: next()}
	case 5:
		return &Call{Fn: g.pick("sqrt", "exp", "ln", "abs", "sin", "cos", "tan", "cot", "arcsin", "arccos"), Args: []Node{next()}}
	case 6:
		args := []Node{next(), next()}
		for g.Intn(2) == 0 {
			args = append(args, next())
		}
		return &Call{Fn: g.pick("min", "max"), Args: args}
	case 7:
		index := g.pick("i", "j", "n")
		if strings.Contains(bound, index) {
			return next()
		}
		return &Rows{Op: g.pick("Σ", "min", "max"), Index: index, X: g.node(g.Intn(depth), bound+index)}
	}
	c := &Cases{Otherwise: next()}
	for len(c.Arms) == 0 || g.Intn(2) == 0 {
		c.Arms = append(c.Arms, Arm{g.cond(g.Intn(depth), bound), next()})
	}
	return c
}

func (g grower) cond(depth int, bound string) Cond {
	if depth > 0 && g.Intn(2) == 0 {
		return &Logic{Op: g.pick("and", "or"), L: g.cond(depth-1, bound), R: g.cond(depth-1, bound)}
	}
	c := &Compare{X: []Node{g.node(depth, bound)}}
	for len(c.Rel) == 0 || g.Intn(3) == 0 {
		c.Rel, c.X = append(c.Rel, g.pick("≤", "<", "≥", ">", "=")), append(c.X, g.node(depth, bound))
	}
	return c
}

func TestGrownTreesPrint(t *testing.T) {
	g := grower{rand.New(rand.NewSource(3))}
	tried := 0
	for range 20000 {
		n := g.node(1+g.Intn(6), "")
		s := Print(n)
		if len([]rune(s)) > maxPrinted {
			continue
		}
		again, err := ParseExpr(s)
		if err != nil {
			t.Fatalf("%s: %v", s, err)
		}
		if !Equal(n, again) {
			t.Fatalf("%s is read as another tree, %s", s, Print(again))
		}
		tried++
		c := g.cond(g.Intn(4), "")
		if s = PrintCond(c); len([]rune(s)) > maxPrinted {
			continue
		}
		if again, err := ParseCond(s); err != nil || !EqualCond(c, again) {
			t.Fatalf("%s: %v", s, err)
		}
	}
	if tried < 15000 {
		t.Errorf("only %d trees tried", tried)
	}
}
