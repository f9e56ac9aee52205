package mathset

import (
	"soffit/calc/formula"
	"soffit/report/draw"
)

// call sets a function and its arguments.
func (m *setter) call(c ctx, n *formula.Call) []atom {
	in := c
	in.lead = true
	switch {
	case n.Fn == "sqrt" && len(n.Args) == 1:
		return one(root(c.size, joined(m.expr(in, n.Args[0]))))
	case n.Fn == "abs" && len(n.Args) == 1:
		return m.enclose(c, m.expr(in, n.Args[0]), '|', '|')
	}
	name := text(draw.Serif, c.size, n.Fn)
	if len(n.Args) == 1 && m.class(c, n.Args[0]) == atomic {
		switch n.Fn {
		case "sin", "cos", "tan", "cot", "ln", "arcsin", "arccos":
			name.space(thin * c.size)
			name.add(joined(m.expr(c, n.Args[0])))
			return one(name)
		}
	}
	return glued(name, m.list(c, len(n.Args), func(i int) []atom { return m.expr(in, n.Args[i]) }))
}

// glued puts a box before the first atom.
func glued(b Box, atoms []atom) []atom {
	out := append([]atom(nil), atoms...)
	marks := out[0].box.marks
	out[0].box = row(b, out[0].box)
	out[0].box.marks = marks
	out[0].cost = never
	return out
}

// list sets items in brackets, separated by semicolons, for a comma may be a decimal one.
func (m *setter) list(c ctx, n int, set func(i int) []atom) []atom {
	var all []atom
	for i := range n {
		atoms := append([]atom(nil), set(i)...)
		if i > 0 {
			all[len(all)-1].box = row(all[len(all)-1].box, text(draw.Serif, c.size, ";"))
			atoms[0].gap, atoms[0].cost = thick*c.size, atList
		}
		for k := 1; k < len(atoms); k++ {
			if atoms[k].cost < never {
				atoms[k].cost += perLevel
			}
		}
		all = append(all, atoms...)
	}
	return m.enclose(c, all, '(', ')')
}

// written tells whether a reduction is set term by term.
func (m *setter) written(n *formula.Rows) bool { return m.Operand != nil && m.Len != nil }

// rows sets Σ, min and max over an index: in symbols with the index below, in numbers term by term, the
// first and the last where there are more than four.
func (m *setter) rows(c ctx, n *formula.Rows) []atom {
	if m.written(n) {
		return m.terms(c, n)
	}
	if n.Op == "Σ" {
		k := m.class(ctx{size: c.size, linear: c.linear, at: c.at}, n.X)
		in := c
		in.lead = false
		body := m.bracketed(in, n.X, k == summed || k == armed || k == negative)
		b := m.bigSum(c, n.Index)
		b.space(thin * c.size)
		return glued(b, body)
	}
	b := m.operator(c, n.Op, n.Index)
	in := c
	in.lead = true
	if k := m.class(in, n.X); k == atomic {
		b.space(thin * c.size)
		return glued(b, m.expr(in, n.X))
	}
	return glued(b, m.bracketed(in, n.X, true))
}

// at is the place of a term of a reduction.
func at(c ctx, index string, row int) ctx {
	rows := make(map[string]int, len(c.at)+1)
	for k, v := range c.at {
		rows[k] = v
	}
	rows[index] = row
	c.at = rows
	return c
}

// terms sets a reduction term by term. A sum of one row is its term, as class tells those around it.
func (m *setter) terms(c ctx, n *formula.Rows) []atom {
	count := m.Len(n.Index)
	if count == 0 {
		return one(number(draw.Serif, c.size, "0"))
	}
	if count == 1 && n.Op == "Σ" {
		return m.expr(at(c, n.Index, 0), n.X) // what stands around it has put brackets where the term needs them
	}
	term := func(row int) ctx {
		in := at(c, n.Index, row)
		in.lead = true
		return in
	}
	show := make([]int, 0, 4) // −1 stands for dots
	if count <= 4 {
		for i := range count {
			show = append(show, i)
		}
	} else {
		show = append(show, 0, -1, count-1)
	}
	set := func(i int) []atom {
		if show[i] < 0 {
			return one(text(draw.Serif, c.size, "…"))
		}
		return m.expr(term(show[i]), n.X)
	}
	if n.Op != "Σ" {
		return glued(text(draw.Serif, c.size, n.Op), m.list(c, len(show), set))
	}
	var all []atom
	for i := range show {
		if show[i] < 0 {
			all = append(all, prefixed(c, "+", medium, set(i), medium, atSign)...)
			all[len(all)-1].dots = true
			continue
		}
		in := term(show[i])
		in.lead = i == 0 && c.lead
		k := m.class(in, n.X)
		atoms := m.bracketed(in, n.X, k == summed || k == armed || m.minus(in, n.X))
		if i > 0 {
			atoms = prefixed(c, "+", medium, atoms, medium, atSign)
		}
		all = append(all, atoms...)
	}
	return all
}

// bigSum is Σ with its index: below it in display, beside it in running text.
func (m *setter) bigSum(c ctx, index string) Box {
	letter := m.indexName(m.script(c.size), index)
	if c.linear {
		b := text(draw.Serif, c.size, "∑")
		return scripts(nucleus{box: b, face: draw.Serif, last: '∑'}, c.size, Box{}, letter)
	}
	size := 1.35 * c.size
	sign := text(draw.Serif, size, "∑")
	// Centred on the axis.
	drop := (sign.Height-sign.Depth)/2 - axis(c.size)
	var s Box
	s.put(0, drop, sign)
	s.Width = sign.Width
	return under(c.size, s, letter)
}

// operator is min or max with its index.
func (m *setter) operator(c ctx, name, index string) Box {
	letter := m.indexName(m.script(c.size), index)
	b := text(draw.Serif, c.size, name)
	if c.linear {
		return scripts(nucleus{box: b}, c.size, Box{}, letter)
	}
	return under(c.size, b, letter)
}

func (m *setter) indexName(size draw.Pt, index string) Box {
	return m.letters(size, index).box
}

// under sets a script centred below a box.
func under(size draw.Pt, b, script Box) Box {
	w := max(b.Width, script.Width)
	var out Box
	out.put((w-b.Width)/2, 0, b)
	out.put((w-script.Width)/2, b.Depth+indexGap*size+script.Height, script)
	out.Width = w
	return out
}

// taken is the arm of cases that holds, nil if that is not known.
func (m *setter) taken(c ctx, n *formula.Cases) formula.Node {
	if m.Operand == nil || m.Holds == nil {
		return nil
	}
	for _, a := range n.Arms {
		if m.Holds(a.If, c.at) {
			return a.Then
		}
	}
	return n.Otherwise
}

// cases sets arms under each other behind a brace; in numbers the arm that is taken alone, where known.
func (m *setter) cases(c ctx, n *formula.Cases) []atom {
	if arm := m.taken(c, n); arm != nil {
		return m.expr(c, arm)
	}
	in := c
	in.lead, in.level = true, 0
	type line struct{ value, when Box }
	var lines []line
	var whens [][]atom
	width := draw.Pt(0)
	for _, a := range n.Arms {
		word := text(draw.Serif, c.size, "if")
		word.space(thick * c.size)
		whens = append(whens, glued(word, m.cond(in, a.If)))
		lines = append(lines, line{value: joined(m.expr(in, a.Then))})
		width = max(width, lines[len(lines)-1].value.Width)
	}
	lines = append(lines, line{value: joined(m.expr(in, n.Otherwise))})
	width = max(width, lines[len(lines)-1].value.Width)
	whens = append(whens, one(text(draw.Serif, c.size, "otherwise")))
	for i, w := range whens {
		lines[i].when = m.narrowed(c.size, w, m.widest-width-(quad+0.6)*c.size)
	}
	var stack Box
	y := draw.Pt(0)
	var top, bottom draw.Pt
	for i, l := range lines {
		up, down := max(l.value.Height, l.when.Height), max(l.value.Depth, l.when.Depth)
		if i == 0 {
			top = -up
		} else {
			y += max(bottom-y+0.28*c.size+up, 1.25*c.size)
		}
		stack.put(0, y, l.value)
		stack.put(width+quad*c.size, y, l.when)
		stack.Width = max(stack.Width, width+quad*c.size+l.when.Width)
		bottom = y + down
	}
	// Centred on the axis.
	shift := -axis(c.size) - (top+bottom)/2
	var b Box
	reach := (bottom-top)/2 + 0.06*c.size
	b.add(bracket(c.size, '{', reach))
	b.put(b.Width, shift, stack)
	b.Width += stack.Width
	return one(b)
}

// narrowed sets a condition in lines under each other if it is wider than the room, which counts only
// where the whole is bound to a width.
func (m *setter) narrowed(size draw.Pt, atoms []atom, room draw.Pt) Box {
	b := joined(atoms)
	if m.widest == 0 || b.Width <= room {
		return b
	}
	atoms = append([]atom(nil), atoms...)
	for i := range atoms {
		if atoms[i].relation > 0 { // a comparison stays whole
			atoms[i].relation, atoms[i].cost = 0, atOpening
		}
	}
	var out Box
	y := draw.Pt(0)
	for i, l := range breakLines(atoms, size, max(room, 4*size), never) {
		if i > 0 {
			y += max(out.Depth-y+0.2*size+l.Box.Height, 1.2*size)
			l.X = size
		}
		out.put(l.X, y, l.Box)
		out.Width = max(out.Width, l.X+l.Box.Width)
	}
	return out
}

// cond sets a condition.
func (m *setter) cond(c ctx, n formula.Cond) []atom {
	switch n := n.(type) {
	case *formula.Compare:
		c.lead = true
		out := m.expr(c, n.X[0])
		for i, rel := range n.Rel {
			out = append(out, related(c.size, rel, m.expr(c, n.X[i+1]))...)
		}
		return out
	case *formula.Logic:
		l, r := m.cond(c, n.L), m.cond(c, n.R)
		if o, ok := n.L.(*formula.Logic); ok && o.Op != n.Op {
			l = m.enclose(c, l, '(', ')')
		}
		if o, ok := n.R.(*formula.Logic); ok && o.Op != n.Op {
			r = m.enclose(c, r, '(', ')')
		}
		return append(l, prefixed(c, n.Op, thick, r, thick+0.05, atWord)...)
	}
	panic("mathset: a condition of no known kind")
}
