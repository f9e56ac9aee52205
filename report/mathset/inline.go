package mathset

import (
	"soffit/calc/formula"
	"soffit/report/draw"
)

// Inline sets a symbol, an expression, a condition or a formula written in the notation of formulas, for
// running text: "M_Rd", "λ·x ≤ h_f". Text that is none of these is an error.
func Inline(size draw.Pt, s string) (Row, error) {
	set := Setting{Size: size, Running: true}
	if n, err := formula.ParseExpr(s); err == nil {
		return set.Expr(n), nil
	}
	c, err := formula.ParseCond(s)
	if err != nil {
		return Row{}, err
	}
	return set.Cond(c), nil
}

// Written is a symbol divided by a unit in a formula, f_ck/[MPa], which symbols are set without: the
// symbol stands for its number in that unit.
type Written struct {
	Symbol *formula.Symbol
	Unit   string
}

// InUnits lists the symbols that stand for numbers in a unit, in the order of the formula, each once.
func InUnits(n formula.Node) []Written {
	var out []Written
	inUnits(n, &out)
	return out
}

func inUnits(n formula.Node, out *[]Written) {
	switch n := n.(type) {
	case *formula.Negate:
		inUnits(n.X, out)
	case *formula.Power:
		inUnits(n.Base, out)
		inUnits(n.Exp, out)
	case *formula.Call:
		for _, x := range n.Args {
			inUnits(x, out)
		}
	case *formula.Rows:
		inUnits(n.X, out)
	case *formula.Cases:
		for _, a := range n.Arms {
			inUnitsCond(a.If, out)
			inUnits(a.Then, out)
		}
		inUnits(n.Otherwise, out)
	case *formula.Binary:
		s, isSymbol := n.L.(*formula.Symbol)
		u, isUnit := n.R.(*formula.UnitLit)
		if n.Op != '/' || !isSymbol || !isUnit {
			inUnits(n.L, out)
			inUnits(n.R, out)
			return
		}
		w := Written{s, u.Unit.String()}
		for _, o := range *out {
			if o.Symbol.Name == s.Name && o.Unit == w.Unit {
				return
			}
		}
		*out = append(*out, w)
	}
}

func inUnitsCond(c formula.Cond, out *[]Written) {
	switch c := c.(type) {
	case *formula.Compare:
		for _, x := range c.X {
			inUnits(x, out)
		}
	case *formula.Logic:
		inUnitsCond(c.L, out)
		inUnitsCond(c.R, out)
	}
}
