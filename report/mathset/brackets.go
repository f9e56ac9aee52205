package mathset

import (
	"soffit/calc/formula"
	"soffit/report/draw"
)

// leastOpening is how much of a bracket's matter at least ends a line, in em.
const leastOpening = 6

// bracketed sets a node in brackets if wanted.
func (m *setter) bracketed(c ctx, n formula.Node, want bool) []atom {
	if !want {
		return m.expr(c, n)
	}
	c.lead = true
	c.level++
	return m.enclose(c, m.expr(c, n), '(', ')')
}

// enclose puts brackets around atoms; around brackets of the same kind they become square.
func (m *setter) enclose(c ctx, atoms []atom, left, right rune) []atom {
	if len(atoms) == 0 {
		return atoms
	}
	var whole Box // its measures alone
	for i := range atoms {
		whole.Height, whole.Depth = max(whole.Height, atoms[i].box.Height), max(whole.Depth, atoms[i].box.Depth)
		whole.marks = max(whole.marks, atoms[i].box.marks)
	}
	reach := span(c.size, whole)
	if left == '(' && whole.marks == roundInside {
		left, right = '[', ']'
	}
	out := append([]atom(nil), atoms...)
	opening := draw.Pt(0) // what would stand at the end of a line behind the bracket
	for i := range out {
		out[i].relation = 0
		if i > 0 && out[i].cost < never {
			out[i].cost += perLevel
			if opening < leastOpening*c.size {
				out[i].cost += atOpening
			}
		}
		opening += out[i].gap + out[i].box.Width
	}
	first, last := &out[0], &out[len(out)-1]
	first.box = row(bracket(c.size, left, reach), first.box)
	last.box = row(last.box, bracket(c.size, right, reach))
	marks := roundInside
	if left == '[' {
		marks = squareInside
	}
	first.box.marks = marks
	return out
}
