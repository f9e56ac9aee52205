package formula

import "slices"

// Equal reports whether two expressions are the same tree; positions take no part. Numbers are the same when
// they are written the same: 0.3 is not 0.30.
func Equal(a, b Node) bool {
	switch a := a.(type) {
	case *Number:
		b, ok := b.(*Number)
		return ok && a.Text == b.Text && a.Value == b.Value
	case *UnitLit:
		b, ok := b.(*UnitLit)
		return ok && a.Unit == b.Unit
	case *Symbol:
		b, ok := b.(*Symbol)
		return ok && sameSymbol(a, b)
	case *Negate:
		b, ok := b.(*Negate)
		return ok && Equal(a.X, b.X)
	case *Binary:
		b, ok := b.(*Binary)
		return ok && a.Op == b.Op && Equal(a.L, b.L) && Equal(a.R, b.R)
	case *Power:
		b, ok := b.(*Power)
		return ok && Equal(a.Base, b.Base) && Equal(a.Exp, b.Exp)
	case *Call:
		b, ok := b.(*Call)
		return ok && a.Fn == b.Fn && slices.EqualFunc(a.Args, b.Args, Equal)
	case *Rows:
		b, ok := b.(*Rows)
		return ok && a.Op == b.Op && a.Index == b.Index && Equal(a.X, b.X)
	case *Cases:
		b, ok := b.(*Cases)
		return ok && slices.EqualFunc(a.Arms, b.Arms, sameArm) && Equal(a.Otherwise, b.Otherwise)
	}
	return false
}

// EqualCond is Equal for conditions.
func EqualCond(a, b Cond) bool {
	switch a := a.(type) {
	case *Compare:
		b, ok := b.(*Compare)
		return ok && slices.Equal(a.Rel, b.Rel) && slices.EqualFunc(a.X, b.X, Equal)
	case *Logic:
		b, ok := b.(*Logic)
		return ok && a.Op == b.Op && EqualCond(a.L, b.L) && EqualCond(a.R, b.R)
	}
	return false
}

func sameArm(a, b Arm) bool { return EqualCond(a.If, b.If) && Equal(a.Then, b.Then) }

func sameSymbol(a, b *Symbol) bool {
	return a.Name == b.Name && a.Base == b.Base && a.Sub == b.Sub && a.Primes == b.Primes && a.Arg == b.Arg &&
		slices.Equal(a.Index, b.Index)
}
