package diagram

import "soffit/report/draw"

// section draws a cross-section to scale with its dimensions and the rows of tendons and bars.
//
// Roles, lengths in mm, heights above the soffit. The outline: see shape. Optional dimension with dimension-x1,
// dimension-y1, dimension-x2, dimension-y2 (ends) over the dimensions. Over the rows of tendons: count, level,
// diameter, and spacing; or, in place of spacing, position-x and position-row (number of the row from 0) over the
// tendons one by one; optional debonded (length from each end), end-level (height at the ends of the member),
// duct-diameter, strands (how many in a duct). Optional bar-count, bar-level, bar-diameter, bar-spacing or bar-position-x
// and bar-position-row over the rows of bars; depth (the whole depth as the record has it, of the bare section),
// total-depth (with the topping), centroid and composite-centroid (heights).
func section(d *data, width draw.Pt) *tape {
	s := crossSection{shape: d.shape(), measures: d.measures()}
	s.tendons = d.dots("", "level", s.shape.middle())
	if d.has("bar-level") {
		s.bars = d.dots("bar-", "level", s.shape.middle())
	}
	for _, v := range [2][2]string{{"centroid", "centroid "}, {"composite-centroid", "with topping "}} {
		if d.has(v[0]) {
			s.axes = append(s.axes, centroid{v[1], d.one(v[0])})
		}
	}
	add := func(c cell, x, from, to float64, level bool) {
		m := measure{value: c, a: point{x, from}, b: point{x, to}, level: level}
		for _, o := range s.measures {
			if m.repeats(o) {
				return
			}
		}
		s.measures = append(s.measures, m)
	}
	if d.err == nil {
		for i, role := range []string{"depth", "total-depth"} {
			if !d.has(role) {
				continue
			}
			c, to := d.one(role), []float64{s.shape.height, s.shape.total()}[i]
			if d.err == nil && (c.value-to > 2*near || to-c.value > 2*near) {
				d.fail("role %q: %s, the outline is %.1f mm deep", role, c.shown, to)
			}
			add(c, s.shape.left, 0, to, false)
		}
	}
	if d.err != nil {
		return nil
	}
	if top := s.shape.strip(); top != nil {
		add(s.shape.deep, top[0][0].x, s.shape.height, s.shape.total(), false)
	}
	at, t := s.fitted(width, rowsBeside)
	for _, in := range []rowsIn{rowsNamed, rowsBelow} { // what is drawn small is drawn larger with less beside it
		if draw.Pt(s.shape.total())*at.per() >= 110 {
			break
		}
		if larger, u := s.fitted(width, in); larger < at {
			at, t = larger, u
		}
	}
	return t
}

// rowsIn is where the rows of a section are listed: beside it; below it, with their names beside; or below alone.
type rowsIn int

const (
	rowsBeside rowsIn = iota
	rowsNamed
	rowsBelow
)

// fitted draws the section at the largest scale that fits.
func (s *crossSection) fitted(width draw.Pt, in rowsIn) (scale, *tape) {
	const tallest, most draw.Pt = 250, 440
	s.in = in
	at := max(fit(s.shape.total(), tallest), fit(s.shape.widest(), width))
	for {
		t := &tape{}
		s.draw(t, at)
		next, more := at.smaller()
		if t.ink.Width() <= width && t.ink.Height() <= most || !more {
			return at, t
		}
		at = next
	}
}

// crossSection is what the drawing of a section shows.
type crossSection struct {
	shape         shape
	measures      []measure
	tendons, bars dots
	axes          []centroid
	in            rowsIn
}

// centroid is the height of one, with what to call it.
type centroid struct {
	name string
	cell
}

func (s *crossSection) draw(c draw.Canvas, at scale) {
	f := frame{sx: at.per(), sy: at.per()}
	f.x = -draw.Pt(s.shape.middle()) * f.sx
	s.shape.fill(c, f, 0, s.shape.total(), concrete, cast)
	s.shape.outlines(c, f)
	l, r := s.shape.reach()
	left, right := f.at(l, 0).X, f.at(r, 0).X
	top := f.at(0, s.shape.total()).Y
	for _, v := range s.axes {
		y := f.at(0, v.value).Y
		c.Line(left-4, y, right+6, y, hair, chain...)
	}
	s.tendons.ink(c, f)
	s.bars.ink(c, f)

	d := s.share(f)
	for _, p := range d.in {
		p.draw(c)
	}
	if s.in == rowsBelow && s.shape.mirrored && len(d.side[beforeRight]) == 0 {
		d.balance(&s.shape)
	}
	reach := left
	if ms := d.side[beforeLeft]; len(ms) > 0 {
		reach = s.uprightTiers(c, f, ms, left-8, beforeLeft, nil)
	}
	list := s.rows(f)
	edge := right + 7
	if ms := d.side[beforeRight]; len(ms) > 0 {
		var taken []draw.Pt
		for _, e := range list.lines {
			if s.in != rowsBelow {
				taken = append(taken, e.y)
			}
		}
		edge = s.uprightTiers(c, f, ms, right+8, beforeRight, taken) + 6
		list.straight = true
	}
	for _, p := range d.in { // leaders that turn early would run into figures
		for _, e := range list.lines {
			list.straight = list.straight || p.label0.X1 > e.from
		}
	}
	if topping := s.shape.strip(); topping != nil {
		m := measure{value: s.shape.wide, a: topping[0][3], b: topping[0][2], level: true}
		same := false
		for _, o := range d.side[over] {
			same = same || m.repeats(o) && m.value.shown == o.value.shown
		}
		if !same {
			d.side[over] = append(d.side[over], m)
		}
	}
	if ms := d.side[over]; len(ms) > 0 {
		s.levelTiers(c, f, ms, top-10, -14, over, right+6)
	}
	bottom := f.y
	if ms := d.side[under]; len(ms) > 0 {
		bottom = s.levelTiers(c, f, ms, f.y+18, 14, under, 1e6) + beyond
	}
	y := bottom + size + 6
	note := "section " + at.String() + ", lengths in mm"
	words(note).centre(c, 0, y)
	for i := range s.tendons.height {
		if s.tendons.leaves(i) {
			y += leading
			words("grey: place at the ends of the member").centre(c, 0, y)
			break
		}
	}
	switch s.in {
	case rowsBeside:
		list.draw(c, edge)
		return
	case rowsNamed:
		list.names().draw(c, edge)
	}
	x := min(left-8, max(reach, left-40))
	y = list.below(c, x, y+16)
	if s.in == rowsBelow && len(s.axes) > 0 {
		l := label{}
		for i, v := range s.axes {
			if i > 0 {
				l = l.gap(2)
			}
			l = l.say(draw.Serif, v.name).equals(v.cell)
		}
		l.draw(c, x+list.marked(), y+leading+2)
	}
}

// rows lists the rows of tendons and bars, and names the centroid.
func (s *crossSection) rows(f frame) listing {
	l := listing{floor: f.y + 6}
	_, right := s.shape.reach()
	type field struct {
		head string
		of   func(r dots, i int) entry // empty where there is nothing to say
	}
	times := func(r dots, i int) entry {
		d := r.diameter.cells[i]
		if r.ducted(i) {
			d = r.duct.cells[i]
		}
		return entry{label{}.number(r.count.cells[i]).say(draw.Serif, " × Ø").length(d), label{}.number(r.count.cells[i]).width}
	}
	given := func(pick func(r dots) column, ok func(r dots, i int) bool, set func(cell) entry) func(r dots, i int) entry {
		return func(r dots, i int) entry {
			if c := pick(r); c.len() > 0 && c.cells[i].taken() && ok(r, i) {
				return set(c.cells[i])
			}
			return text("")
		}
	}
	valued := func(c cell) entry { return entry{label{}.value(c), beforePoint(c)} }
	every := func(dots, int) bool { return true }
	fields := []field{
		{"number × Ø", times},
		{"strands in each", given(func(r dots) column { return r.strands }, every, func(c cell) entry { n := label{}.number(c); return entry{n, n.width} })},
		{"spacing", given(func(r dots) column { return r.spacing }, func(r dots, i int) bool { return r.number(i) > 1 && r.spacing.cells[i].value > 0 }, lengths)},
		{"height", given(func(r dots) column { return r.level }, every, lengths)},
		{"at ends", given(func(r dots) column { return r.end }, dots.leaves, lengths)},
		{"debonded", given(func(r dots) column { return r.debonded }, dots.bare, valued)},
	}
	for i := range s.tendons.height {
		if s.tendons.ducted(i) {
			fields[0].head = "ducts × Ø"
		}
	}
	both := []dots{s.tendons, s.bars}
	l.heads = []label{words("row")}
	var shown []field
	for _, k := range fields {
		any := false
		for _, r := range both {
			for i := range r.height {
				any = any || k.of(r, i).width > 0
			}
		}
		if any {
			shown = append(shown, k)
			l.heads = append(l.heads, words(k.head))
		}
	}
	for _, r := range both {
		for i, v := range r.height {
			p := f.at(r.last(i), v)
			e := listed{from: p.X + r.radius(f, i) + clearance, y: p.Y, name: r.level.axis.Rows[i]}
			for _, k := range shown {
				e.columns = append(e.columns, k.of(r, i))
			}
			e.mark = func(c draw.Canvas, x, y draw.Pt) {
				if r.ducted(i) {
					r.dot(c, i, x, y, 2.4)
					return
				}
				r.dot(c, i, x, y, 1.5)
			}
			l.lines = append(l.lines, e)
		}
	}
	for _, v := range s.axes {
		name := words(v.name).equals(v.cell)
		l.lines = append(l.lines, listed{from: f.at(right, 0).X + 6, y: f.at(0, v.value).Y, remark: &name})
	}
	return l
}

// lengths is a length in its column.
func lengths(c cell) entry { return entry{label{}.length(c), beforePoint(c)} }
