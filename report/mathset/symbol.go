package mathset

import (
	"strings"
	"unicode"

	"soffit/calc/formula"
	"soffit/fonts"
	"soffit/report/draw"
)

// nucleus is set matter that takes scripts; last is its last glyph, if it ends in one, for placing them
// by its outline.
type nucleus struct {
	box    Box
	lastAt draw.Pt // start of the last glyph
	face   draw.Face
	last   rune // 0 for matter that is no glyph
}

// letters sets the base of a symbol: letters italic, but Δ and figures upright.
func (m *setter) letters(size draw.Pt, s string) nucleus {
	var n nucleus
	for _, r := range s {
		f := draw.Italic
		if r == 'Δ' || !unicode.IsLetter(r) {
			f = draw.Serif
		}
		g := fonts.Of(f, r)
		b := text(f, size, string(r))
		// An italic letter may lean out of its advance on both sides.
		left := draw.Pt(max(0, 0.01-g.XMin)) * size
		var lean Box
		lean.put(left, 0, b)
		lean.Width = left + max(b.Width, draw.Pt(g.XMax)*size)
		n.lastAt, n.face, n.last = n.box.Width+left, f, r
		n.box.add(lean)
	}
	return n
}

// rightOf is where the nucleus ends, in the heights between y0 and y1 above its baseline.
func (n nucleus) rightOf(size, y0, y1 draw.Pt) draw.Pt {
	if n.last == 0 {
		return n.box.Width
	}
	const slack = 0.03
	_, right, ink := fonts.ProfileOf(n.face, n.last).At(float64(y0/size)-slack, float64(y1/size)+slack)
	end := n.box.Width
	if !ink {
		return max(n.lastAt, end-0.16*size)
	}
	return min(max(n.lastAt+draw.Pt(right)*size, end-0.22*size), end+0.1*size)
}

// scripts adds superscript and subscript, either of which may be empty. Their places follow the outline
// of the nucleus, their distance from each other is kept.
func scripts(n nucleus, size draw.Pt, sup, sub Box) Box {
	hasSup, hasSub := len(sup.items) > 0, len(sub.items) > 0
	if !hasSup && !hasSub {
		return n.box
	}
	down, up := draw.Pt(subDown)*size, draw.Pt(supUp)*size
	x := draw.Pt(measure().xHeight) * size
	if hasSub {
		down = max(down, sub.Height-0.78*x)
		if n.last == 0 {
			down = max(down, n.box.Depth+0.02*size)
		}
	}
	if hasSup {
		up = max(up, sup.Depth+x/3)
		if n.last == 0 {
			up = max(up, n.box.Height-0.32*size)
		}
	}
	if hasSup && hasSub {
		if gap := up - sup.Depth - (sub.Height - down); gap < stackGap*size {
			down += stackGap*size - gap
		}
	}
	b := n.box
	b.items = append([]item(nil), n.box.items...)
	width := b.Width
	if hasSub {
		at := n.rightOf(size, -down-sub.Depth, -down+sub.Height) + scriptGap*size
		b.put(at, down, sub)
		width = max(width, at+sub.Width)
	}
	if hasSup {
		at := n.rightOf(size, up-sup.Depth, up+sup.Height) + scriptGap*size
		b.put(at, -up, sup)
		width = max(width, at+sup.Width)
	}
	b.Width = width + scriptTail*size
	return b
}

// subscript sets the text of a subscript: words and figures upright, row indices and the coordinates
// x, y, z italic, Greek letters italic.
func (m *setter) subscript(size draw.Pt, s *formula.Symbol) Box {
	if s.Sub == "" {
		return Box{}
	}
	parts := strings.Split(s.Sub, ",")
	plain := len(parts) - len(s.Index)
	var b Box
	for i, p := range parts {
		if i > 0 {
			b.add(text(draw.Serif, size, ","))
			b.space(0.03 * size)
		}
		if i >= plain {
			if name, ok := m.Index[p]; ok {
				b.add(text(draw.Serif, size, name))
			} else {
				b.add(m.letters(size, p).box)
			}
			continue
		}
		b.add(m.subscriptPart(size, p))
	}
	return b
}

func (m *setter) subscriptPart(size draw.Pt, p string) Box {
	switch p {
	case "x", "y", "z", "i", "j":
		return m.letters(size, p).box
	}
	var b Box
	var upright strings.Builder
	flush := func() {
		b.add(text(draw.Serif, size, upright.String()))
		upright.Reset()
	}
	for _, r := range p {
		if r == '-' {
			r = '−'
		}
		if unicode.Is(unicode.Greek, r) && unicode.IsLower(r) {
			flush()
			b.add(m.letters(size, string(r)).box)
			continue
		}
		upright.WriteRune(r)
	}
	flush()
	return b
}

// symbol sets a symbol, raised to exp if that is not empty.
func (m *setter) symbol(size draw.Pt, s *formula.Symbol, exp Box) Box {
	n := m.letters(size, s.Base)
	if _, constant := s.Constant(); constant {
		n = nucleus{box: text(draw.Serif, size, s.Base)}
	}
	sup := exp
	if s.Primes > 0 {
		// Primes stand at their own height beside the letter; an exponent follows them.
		marks := text(draw.Serif, size, strings.Repeat("′", s.Primes))
		g := fonts.Of(fonts.Serif, '′')
		up := draw.Pt(supUp) * size
		var b Box
		b.put(-draw.Pt(g.XMin)*size+0.02*size, up, marks)
		b.Width = marks.Width - draw.Pt(g.XMin)*size
		b.Height, b.Depth = marks.Height-up, max(0, up-draw.Pt(g.YMin)*size)
		b.Depth = 0
		b.add(exp)
		sup = b
	}
	b := scripts(n, size, sup, m.subscript(m.script(size), s))
	if s.Arg != "" {
		b = row(b, m.around(size, '(', m.argument(size, s.Arg), ')'))
	}
	return b
}

// argument sets what stands in the brackets of f_cm(t) or φ(t,t_0).
func (m *setter) argument(size draw.Pt, s string) Box {
	var b Box
	for i, p := range strings.FieldsFunc(s, func(r rune) bool { return r == ',' || r == ';' }) {
		if i > 0 {
			b.add(text(draw.Serif, size, ","))
			b.space(thin * size)
		}
		b.add(m.raw(size, strings.TrimSpace(p)))
	}
	return b
}

// raw sets text that is a symbol or a plain expression of single letters, figures and signs.
func (m *setter) raw(size draw.Pt, s string) Box {
	if n, err := formula.ParseExpr(s); err == nil {
		plain := *m
		plain.Operand, plain.Anchor = nil, nil
		return plain.box(size, n)
	}
	var b Box
	for _, r := range s {
		if unicode.IsLetter(r) {
			b.add(m.letters(size, string(r)).box)
		} else {
			b.add(text(draw.Serif, size, string(r)))
		}
	}
	return b
}
