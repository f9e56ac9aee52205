package formula

import "slices"

// FreeCondIndices lists the indices of a condition that no Σ, min or max over rows binds, in order of first use.
func FreeCondIndices(c Cond) []string {
	var l lister
	l.cond(c)
	return l.free
}

// lister goes through a tree in the order of its text.
type lister struct {
	symbols []*Symbol
	outer   []*Symbol // those of symbols all of whose indices are free
	free    []string
	bound   []string
	nested  []string // indices bound inside rows over themselves
}

func (l *lister) node(n Node) {
	switch n := n.(type) {
	case *Symbol:
		l.symbol(n)
	case *Negate:
		l.node(n.X)
	case *Binary:
		l.node(n.L)
		l.node(n.R)
	case *Power:
		l.node(n.Base)
		l.node(n.Exp)
	case *Call:
		for _, x := range n.Args {
			l.node(x)
		}
	case *Rows:
		if slices.Contains(l.bound, n.Index) {
			l.nested = append(l.nested, n.Index)
		}
		l.bound = append(l.bound, n.Index)
		l.node(n.X)
		l.bound = l.bound[:len(l.bound)-1]
	case *Cases:
		for _, a := range n.Arms {
			l.cond(a.If)
			l.node(a.Then)
		}
		l.node(n.Otherwise)
	}
}

func (l *lister) cond(c Cond) {
	switch c := c.(type) {
	case *Compare:
		for _, x := range c.X {
			l.node(x)
		}
	case *Logic:
		l.cond(c.L)
		l.cond(c.R)
	}
}

func (l *lister) symbol(s *Symbol) {
	if _, ok := s.Constant(); ok {
		return
	}
	named := func(t *Symbol) bool { return t.Name == s.Name }
	if !slices.ContainsFunc(l.symbols, named) {
		l.symbols = append(l.symbols, s)
	}
	outer := true
	for _, i := range s.Index {
		if slices.Contains(l.bound, i) {
			outer = false
		} else if !slices.Contains(l.free, i) {
			l.free = append(l.free, i)
		}
	}
	if outer && !slices.ContainsFunc(l.outer, named) {
		l.outer = append(l.outer, s)
	}
}

// start is the position at which the text of an expression begins, brackets left out.
func start(n Node) Pos {
	switch n := n.(type) {
	case *Binary:
		return start(n.L)
	case *Power:
		return start(n.Base)
	}
	return n.At()
}
