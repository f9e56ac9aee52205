package mathset

import (
	"strings"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// Setting says how trees are set. Its zero value but for Size sets displayed formulas in symbols.
type Setting struct {
	Size draw.Pt

	// Running sets mathematics for a line of text: fractions with a solidus, indices beside signs.
	Running bool

	// Operand gives the number that takes the place of a symbol, at the rows of its indices; false
	// leaves the symbol. Nil sets symbols throughout.
	Operand func(s *formula.Symbol, at map[string]int) (Operand, bool)

	// Anchor names the place to which a symbol that stays a symbol leads, "" for none.
	Anchor func(s *formula.Symbol, at map[string]int) string

	// Len is the number of rows of an index. With Operand it has sums written out.
	Len func(index string) int

	// Holds tells which arm of cases is taken, so that only that one is set in numbers. Nil sets all.
	Holds func(c formula.Cond, at map[string]int) bool

	// At is the row of each free index.
	At map[string]int

	// Index is what is printed instead of an index letter: a worked row's name or number.
	Index map[string]string
}

// Operand is a value as printed: Number with an ASCII minus, Unit "" if none, Anchor the place to which
// it leads, "" for none.
type Operand struct{ Number, Unit, Anchor string }

// Row is set matter that knows where it may be broken.
type Row struct {
	atoms []atom
	size  draw.Pt
	again func(size, widest draw.Pt) []atom // sets the row anew at a size, fractions no wider than that
}

// atom is a piece that is never broken. Its relation or sign stands at its front.
type atom struct {
	box      Box
	gap      draw.Pt // before it, inside a line
	cost     int     // of a break before it
	relation draw.Pt // width of the relation at its front with the gap after it, 0 if none
	dots     bool    // stands for terms left out: not alone on a line
	turns    bool    // begins a line of its own where the row takes more than one
}

// Costs of breaking before an atom, a line more costing perLine: at a relation, a sign, each level of brackets more.
// Breaks that cost more than usual are made only where there is no other way: after a dot or a solidus, within a
// condition, and where little but the opening of a bracket would end a line.
const (
	atRelation = 0
	atWord     = 2
	atSign     = 40
	atList     = 45
	perLevel   = 50
	usual      = 1000
	atDot      = 2000
	atOpening  = 9000
	never      = 1 << 20
)

type setter struct {
	Setting
	widest draw.Pt // of a stacked fraction, 0 for no bound
}

// ctx is where in a formula a node stands.
type ctx struct {
	size   draw.Pt
	linear bool // fractions with a solidus
	lead   bool // nothing stands to the left: a minus sign needs no brackets
	level  int  // of brackets
	part   bool // of a fraction
	at     map[string]int
}

func (m *setter) script(size draw.Pt) draw.Pt {
	return max(scriptOf(size), leastScript*m.Size)
}

// scriptOf is the size of a script to matter of a size.
func scriptOf(size draw.Pt) draw.Pt { return max(size*scriptScale, min(size, Smallest)) }

func (s Setting) row(set func(m *setter, c ctx) []atom) Row {
	again := func(size, widest draw.Pt) []atom {
		m := &setter{Setting: s, widest: widest}
		m.Size = size
		return set(m, ctx{size: size, linear: s.Running, lead: true, at: s.At})
	}
	return Row{atoms: again(s.Size, 0), size: s.Size, again: again}
}

// Expr sets an expression.
func (s Setting) Expr(n formula.Node) Row {
	return s.row(func(m *setter, c ctx) []atom { return m.expr(c, n) })
}

// Cond sets a condition.
func (s Setting) Cond(n formula.Cond) Row {
	return s.row(func(m *setter, c ctx) []atom { return m.cond(c, n) })
}

// Symbol sets a symbol as such, never its value.
func (s Setting) Symbol(n *formula.Symbol) Row {
	s.Operand = nil
	return s.Expr(n)
}

// Value sets a number, as printed, with its unit.
func (s Setting) Value(number, unit string) Row { return s.value(draw.Serif, number, unit) }

// Result sets a number bold with its unit upright.
func (s Setting) Result(number, unit string) Row { return s.value(draw.Bold, number, unit) }

func (s Setting) value(f draw.Face, n, u string) Row {
	return s.row(func(m *setter, c ctx) []atom {
		return []atom{{box: quantity(number(f, c.size, n), draw.Serif, c.size, u), cost: never}}
	})
}

// Number sets an operand's number and unit, leading to its anchor.
func (s Setting) Number(o Operand) Row {
	return s.row(func(m *setter, c ctx) []atom { return one(m.value(c, o)) })
}

// Upright sets text of a face as it is, but raised figures, as in 10⁻³ mm², by the face's own figures.
func Upright(f draw.Face, size draw.Pt, s string) Box { return unit(f, size, s) }

// Words sets text upright, broken at its blanks.
func (s Setting) Words(f draw.Face, words string) Row {
	return s.row(func(m *setter, c ctx) []atom {
		var out []atom
		for _, w := range strings.Fields(words) {
			out = append(out, atom{box: text(f, c.size, w), gap: draw.Width(f, c.size, " "), cost: atWord})
		}
		return out
	})
}

// Then is the row followed by another after a gap in em, breakable between them. Each keeps its size.
func (r Row) Then(gap float64, o Row) Row {
	return r.with(o, func(size draw.Pt, atoms []atom) []atom {
		if len(atoms) > 0 {
			atoms = append([]atom(nil), atoms...)
			atoms[0].gap, atoms[0].cost = draw.Pt(gap)*size, atWord
		}
		return atoms
	})
}

// Related is the row followed by a relation, "=", "≤" …, and another row; it may be broken before the
// relation.
func (r Row) Related(rel string, o Row) Row {
	return r.with(o, func(size draw.Pt, atoms []atom) []atom { return related(size, rel, atoms) })
}

// Next is Related, but the other row begins a line of its own where the whole takes more than one.
func (r Row) Next(rel string, o Row) Row {
	return r.with(o, func(size draw.Pt, atoms []atom) []atom {
		out := related(size, rel, atoms)
		if len(out) > 0 {
			out[0].turns = true
		}
		return out
	})
}

// with is the row followed by what join makes of the other.
func (r Row) with(o Row, join func(size draw.Pt, atoms []atom) []atom) Row {
	switch {
	case r.again == nil:
		return o
	case o.again == nil:
		return r
	}
	set := func(size draw.Pt, first, second []atom) []atom {
		out := make([]atom, 0, len(first)+len(second))
		return append(append(out, first...), join(size, second)...)
	}
	again := func(size, widest draw.Pt) []atom {
		return set(size, r.again(size, widest), o.again(size*o.size/r.size, widest))
	}
	return Row{atoms: set(r.size, r.atoms, o.atoms), size: r.size, again: again}
}

func related(size draw.Pt, rel string, atoms []atom) []atom {
	if len(atoms) == 0 {
		return nil
	}
	sign := text(draw.Serif, size, rel)
	sign.space(thick * size)
	out := append([]atom(nil), atoms...)
	out[0].box = row(sign, out[0].box)
	out[0].gap, out[0].cost, out[0].relation = thick*size, atRelation, sign.Width
	return out
}

// Box is the row in one line.
func (r Row) Box() Box { return joined(r.atoms) }

// Width of the row in one line.
func (r Row) Width() draw.Pt {
	var w draw.Pt
	for i, a := range r.atoms {
		if i > 0 {
			w += a.gap
		}
		w += a.box.Width
	}
	return w
}

func joined(atoms []atom) Box {
	if len(atoms) == 1 {
		return atoms[0].box
	}
	n := 0
	for i := range atoms {
		n += min(len(atoms[i].box.items), 3)
	}
	b := Box{items: make([]item, 0, n)}
	for i, a := range atoms {
		if i > 0 {
			b.space(a.gap)
		}
		b.add(a.box)
	}
	return b
}

// Piece is a part of a row that is never broken, for setting a row within text.
type Piece struct {
	Box  Box
	Gap  draw.Pt // before it, inside a line
	Cost int     // of a break before it; 0 is best
}

// Pieces are the parts of the row.
func (r Row) Pieces() []Piece {
	out := make([]Piece, len(r.atoms))
	for i, a := range r.atoms {
		out[i] = Piece{a.box, a.gap, a.cost}
	}
	return out
}
