package mathset

import (
	"soffit/fonts"
	"soffit/report/draw"
)

// around puts brackets around a box; they grow with it. A pair that encloses a bracket of the same size
// is made square by the caller.
func (m *setter) around(size draw.Pt, left rune, inner Box, right rune) Box {
	reach := span(size, inner)
	return row(bracket(size, left, reach), inner, bracket(size, right, reach))
}

// span is how far a bracket must reach above and below the axis to enclose the box.
func span(size draw.Pt, b Box) draw.Pt {
	a := axis(size)
	need := max(b.Height-a, b.Depth+a)
	return max(0.92*need, need-0.3*size)
}

// bracket is one of ( ) [ ] { | reaching to ±reach about the axis: the glyph of the face while that is
// long enough, else drawn, the glyph under it unseen for extraction.
func bracket(size draw.Pt, r rune, reach draw.Pt) Box {
	if reach <= plainReach*size && r != '{' {
		b := text(draw.Serif, size, string(r))
		if r == '|' {
			return bar(size, reach)
		}
		// Side bearings keep leaning letters clear of the sign.
		g := fonts.Of(fonts.Serif, r)
		const bearing = 0.06
		left, right := draw.Pt(max(0, bearing-g.XMin))*size, draw.Pt(max(0, bearing-(g.Advance-g.XMax)))*size
		var out Box
		out.put(left, 0, b)
		out.Width = left + b.Width + right
		return out
	}
	h := 2 * reach
	switch r {
	case '|':
		return bar(size, reach)
	case '[', ']':
		return square(size, r, h)
	case '{':
		return brace(size, h)
	}
	return round(size, r, h)
}

// drawn is a sign of height h centred on the axis, its path given from 0 at the top to h.
func drawn(size draw.Pt, r rune, h, width draw.Pt, p draw.Path) Box {
	a := axis(size)
	top := -(a + h/2)
	g := fonts.Of(fonts.Serif, r)
	scale := h / draw.Pt(g.YMax-g.YMin)
	return Box{Width: width, Height: a + h/2, Depth: max(0, h/2-a), items: []item{
		{kind: shape, y: top, path: &p},
		{kind: ghost, x: 0, y: top + draw.Pt(g.YMax)*scale, size: min(scale, 3*size), text: string(r)},
	}}
}

// round is a bracket of two arcs, thick in the middle and pointed at the ends.
func round(size draw.Pt, r rune, h draw.Pt) Box {
	w := min(0.17*size+0.055*h, 0.42*size)
	thickness := min(0.058*size+0.008*h, 0.09*size)
	tip := 0.022 * size
	in := 0.07 * size // bearing towards the outside and the matter inside
	outer, inner := in, in+thickness
	// The control points lie so that the arc is steep in the middle.
	p := draw.Path{}.
		MoveTo(in+w, 0).
		CurveTo(in+0.38*w, 0.13*h, outer, 0.30*h, outer, 0.5*h).
		CurveTo(outer, 0.70*h, in+0.38*w, 0.87*h, in+w, h).
		LineTo(in+w+tip, h-tip).
		CurveTo(in+0.55*w, 0.85*h, inner, 0.68*h, inner, 0.5*h).
		CurveTo(inner, 0.32*h, in+0.55*w, 0.15*h, in+w+tip, tip).
		Close()
	width := in + w + tip + 0.04*size
	if r == ')' {
		p = mirrored(p, width)
	}
	return drawn(size, r, h, width, p)
}

func mirrored(p draw.Path, width draw.Pt) draw.Path {
	for i := range p {
		p[i].A.X, p[i].B.X, p[i].P.X = width-p[i].A.X, width-p[i].B.X, width-p[i].P.X
	}
	return p
}

func square(size draw.Pt, r rune, h draw.Pt) Box {
	stem, foot, in := 0.06*size, 0.17*size, 0.09*size
	serif := 0.035 * size
	p := draw.Path{}.MoveTo(in, 0).LineTo(in+foot, 0).LineTo(in+foot, serif).LineTo(in+stem, serif).
		LineTo(in+stem, h-serif).LineTo(in+foot, h-serif).LineTo(in+foot, h).LineTo(in, h).Close()
	width := in + foot + 0.06*size
	if r == ']' {
		p = mirrored(p, width)
	}
	return drawn(size, r, h, width, p)
}

func bar(size, reach draw.Pt) Box {
	if reach <= plainReach*size {
		reach = 0.5 * size
	}
	h := 2 * reach
	stem, in := 0.05*size, 0.10*size
	p := draw.Path{}.MoveTo(in, 0).LineTo(in+stem, 0).LineTo(in+stem, h).LineTo(in, h).Close()
	return drawn(size, '|', h, 2*in+stem, p)
}

// brace is the left brace of cases.
func brace(size, h draw.Pt) Box {
	w := 0.34 * size // from the tips to the point
	t := 0.072 * size
	thinEnd := 0.028 * size
	in := 0.05 * size
	mid := in + w/2 // the stem
	curl := min(0.42*size, 0.25*h)
	half := h / 2
	p := draw.Path{}.
		MoveTo(in+w, 0).
		CurveTo(mid, 0, mid-t/2, 0.45*curl, mid-t/2, curl).
		LineTo(mid-t/2, half-curl).
		CurveTo(mid-t/2, half-0.42*curl, mid-t, half, in, half).
		CurveTo(mid-t, half, mid-t/2, half+0.42*curl, mid-t/2, half+curl).
		LineTo(mid-t/2, h-curl).
		CurveTo(mid-t/2, h-0.45*curl, mid, h, in+w, h).
		LineTo(in+w, h-thinEnd).
		CurveTo(mid+t, h-thinEnd, mid+t/2, h-0.5*curl, mid+t/2, h-curl).
		LineTo(mid+t/2, half+curl).
		CurveTo(mid+t/2, half+0.38*curl, mid, half+thinEnd, in+0.08*size, half).
		CurveTo(mid, half-thinEnd, mid+t/2, half-0.38*curl, mid+t/2, half-curl).
		LineTo(mid+t/2, curl).
		CurveTo(mid+t/2, 0.5*curl, mid+t, thinEnd, in+w, thinEnd).
		Close()
	return drawn(size, '{', h, in+w+0.12*size, p)
}

// root draws a root over its matter.
func root(size draw.Pt, inner Box) Box {
	line := draw.Pt(ruleWidth) * size
	gap := 0.14 * size
	inner = strut(inner, draw.Pt(measure().xHeight)*size+0.18*size, 0.06*size)
	top := inner.Height + gap + line // of the vinculum's upper edge above the baseline
	bottom := inner.Depth + 0.05*size
	h := top + bottom
	lean := min(0.30*size+0.05*(h-size), 0.5*size) // width of the rising stroke
	hook := 0.30 * size
	w := hook + lean
	// From the hook's tip down the thick stroke, up the thin one, along the vinculum.
	y := func(up draw.Pt) draw.Pt { return -up } // heights above the baseline
	low := y(-bottom)
	hookTop := y(-bottom) - min(0.52*h, 0.62*size)
	p := draw.Path{}.
		MoveTo(0.03*size, hookTop+0.09*size).
		LineTo(0.15*size, hookTop).
		LineTo(hook+0.01*size, low-0.16*size).
		LineTo(w-line*0.9, y(top)).
		LineTo(w+inner.Width+0.12*size, y(top)).
		LineTo(w+inner.Width+0.12*size, y(top)+line).
		LineTo(w, y(top)+line).
		LineTo(hook+0.025*size, low).
		LineTo(hook-0.035*size, low).
		LineTo(0.105*size, hookTop+0.085*size).
		LineTo(0.05*size, hookTop+0.125*size).
		Close()
	g := fonts.Of(fonts.Serif, '√')
	b := Box{Height: top, Depth: bottom, items: []item{
		{kind: ghost, x: 0, y: 0, size: min(w/draw.Pt(g.Advance), 2*size), text: "√"},
		{kind: shape, path: &p},
	}}
	b.put(w+0.06*size, 0, inner)
	b.Width = w + inner.Width + 0.17*size
	return b
}

// fraction stacks two boxes on a bar on the axis of matter of the size around; the parts' own size rules
// the distances.
func fraction(around, size draw.Pt, num, den Box) Box {
	a, line := axis(around), draw.Pt(ruleWidth)*around
	up := max(a+(numeratorUp-draw.Pt(measure().axis))*size, a+line/2+barGap*around+num.Depth)
	down := max((denomDown+draw.Pt(measure().axis))*size-a, den.Height-a+line/2+barGap*around)
	w := max(num.Width, den.Width) + 2*barOverhang*size
	var b Box
	in := draw.Pt(barBearing) * around
	b.put(in+(w-num.Width)/2, -up, num)
	b.items = append(b.items, item{kind: rule, x: in, y: -a, size: w, line: line})
	b.put(in+(w-den.Width)/2, down, den)
	b.Width = w + 2*in
	return b
}
