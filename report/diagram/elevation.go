package diagram

import (
	"fmt"
	"math"

	"soffit/report/draw"
)

// elevation draws the member from the side with its bearings, rows of tendons and loads. Lengths and depths
// have their own scales where the member is long, which is said.
//
// Roles: length, depth (of the concrete), support-A, support-B (bearing centres from end A), bearing-A,
// bearing-B (lengths of bearings); level (above the soffit) and debonded (length from each end) over the
// rows of tendons; load-q (force a length), load-F (force), load-from, load-to (from end A) over the loads,
// where q = 0 marks a point load at load-from; optional span (between bearing centres), height, lower, upper (parts
// of the section from the soffit up, whose edges are then seen), bar-level (above the soffit) over the rows of bars.
func elevation(d *data, width draw.Pt) *tape {
	e := sideView{length: d.one("length"), depth: d.one("depth"), a: d.one("support-A"), b: d.one("support-B"),
		bearingA: d.one("bearing-A"), bearingB: d.one("bearing-B"), level: d.rows("level")}
	e.debonded = d.beside("debonded", e.level)
	if d.has("span") {
		e.span = d.one("span")
	}
	if d.has("height") {
		e.parts = d.parts()
	}
	if d.has("bar-level") {
		e.bars = d.rows("bar-level")
	}
	e.loads = d.loads()
	if d.err != nil {
		return nil
	}
	const least draw.Pt = 190 // of the member beside a listing
	t := e.fitted(width, true)
	if e.l < least {
		t = e.fitted(width, false)
	}
	return t
}

// fitted draws the member at the largest scale that fits, its rows listed beside or below it.
func (e *sideView) fitted(width draw.Pt, beside bool) *tape {
	e.beside = beside
	at := fit(e.length.value, width)
	for {
		t := &tape{}
		e.draw(t, at)
		next, more := at.smaller()
		if t.ink.Width() <= width || !more {
			return t
		}
		at = next
	}
}

// sideView is what an elevation shows.
type sideView struct {
	length, depth, a, b, bearingA, bearingB, span cell
	level, debonded, bars                         column // bars may be none
	parts                                         parts  // none if not given
	loads                                         []loading
	beside                                        bool // the listing of the rows, else it stands below

	l, h draw.Pt // of the concrete on paper; its soffit is at y = 0, end A at x = 0
	per  draw.Pt // along the length
}

// upright is the scale of depths: that of lengths where the member is stout enough to show its tendons, else
// one that keeps the lines of neighbouring rows apart.
func (e *sideView) upright(along scale) scale {
	const least, usual, most, apart draw.Pt = 44, 58, 92, 3
	h := along.of(e.depth.value)
	if h >= least && h <= 2*most {
		return along
	}
	nearest := math.Inf(1)
	for i, v := range e.level.cells {
		for _, u := range e.level.cells[:i] {
			if d := math.Abs(u.value - v.value); d > 0 {
				nearest = min(nearest, d)
			}
		}
	}
	up := fit(e.depth.value, most)
	for _, r := range ratios {
		if s := scale(r); s.of(e.depth.value) <= usual && s.of(nearest) >= apart {
			return s
		}
	}
	return up
}

func (e *sideView) draw(c draw.Canvas, along scale) {
	up := e.upright(along)
	e.per, e.l, e.h = along.per(), along.of(e.length.value), up.of(e.depth.value)
	c.Rect(0, -e.h, e.l, e.h, draw.Style{Stroke: outline, Fill: concrete})
	e.edges(c, up)
	l := e.tendons(c, up)
	e.reinforcement(c, up, &l)
	if e.beside {
		l.draw(c, e.l+6)
	} else {
		l.names().draw(c, e.l+6)
	}
	under := e.bearings(c)
	drawLoads(c, e.loads, e.per, e.l, -e.h)
	low := e.dimensions(c, under)
	const left draw.Pt = -9
	extendLeft(c, -e.h, 0, left)
	extendLeft(c, 0, 0, left)
	stack(c, left, []draw.Pt{-e.h, 0}, []label{label{}.value(e.depth)})
	note := "elevation " + along.String()
	if up != along {
		note = fmt.Sprintf("elevation: lengths %s, depths %s", along, up)
	}
	words(note).centre(c, e.l/2, low+size+5)
	if !e.beside {
		l.below(c, 0, low+size+20)
	}
}

// tendons draws a line for each row, dashed where it is debonded, and gives the listing of the rows.
func (e *sideView) tendons(c draw.Canvas, up scale) listing {
	any := false
	for _, v := range e.debonded.cells {
		any = any || v.value > 0
	}
	l := listing{heads: []label{words("row"), words("height")}}
	if any {
		l.heads = append(l.heads, words("debonded"))
	}
	for i, v := range e.level.cells {
		y := -up.of(v.value)
		loose := min(draw.Pt(e.debonded.cells[i].value)*e.per, e.l/2)
		if loose > 0 {
			c.Line(0, y, loose, y, hair, dashed...)
			c.Line(e.l-loose, y, e.l, y, hair, dashed...)
			c.Line(loose, y-1.4, loose, y+1.4, hair)
			c.Line(e.l-loose, y-1.4, e.l-loose, y+1.4, hair)
		}
		c.Line(loose, y, e.l-loose, y, medium)
		line := listed{from: e.l + clearance, y: y, name: e.level.axis.Rows[i], columns: []entry{{label{}.value(v), beforePoint(v)}}}
		if any && e.debonded.cells[i].value > 0 {
			line.columns = append(line.columns, entry{label{}.value(e.debonded.cells[i]), beforePoint(e.debonded.cells[i])})
		}
		l.lines = append(l.lines, line)
	}
	return l
}

// edges draws the edges of flanges, haunches and web that are seen from the side.
func (e *sideView) edges(c draw.Canvas, up scale) {
	if e.parts.height.len() < 2 {
		return
	}
	levels := e.parts.levels()
	for _, v := range levels[1 : len(levels)-1] {
		c.Line(0, -up.of(v), e.l, -up.of(v), edge)
	}
}

// reinforcement draws a line of long dashes for each row of bars and adds it to the listing.
func (e *sideView) reinforcement(c draw.Canvas, up scale, l *listing) {
	for i, v := range e.bars.cells {
		y := -up.of(v.value)
		c.Line(0, y, e.l, y, hair, long...)
		l.lines = append(l.lines, listed{from: e.l + clearance, y: y, name: e.bars.axis.Rows[i], columns: []entry{{label{}.value(v), beforePoint(v)}}})
	}
}

const support draw.Pt = 7 // height of the sign for a support

// bearings draws plates of the true length, the signs of a fixed and a sliding support under them, and the
// length of each bearing beside it. It returns the lowest ink.
func (e *sideView) bearings(c draw.Canvas) draw.Pt {
	low := outline + 2 + support
	var reach draw.Pt // of the first label
	for i, b := range []struct{ at, length cell }{{e.a, e.bearingA}, {e.b, e.bearingB}} {
		x, w := draw.Pt(b.at.value)*e.per, max(draw.Pt(b.length.value)*e.per, 2)
		c.Rect(x-w/2, outline/2, w, 1.6, draw.Style{Fill: draw.Black})
		y := outline/2 + 1.6
		c.Polygon([]draw.Point{{X: x, Y: y}, {X: x - 4, Y: y + support}, {X: x + 4, Y: y + support}},
			draw.Style{Stroke: medium, Fill: draw.White})
		if i == 1 {
			c.Line(x-5, y+support+1.6, x+5, y+support+1.6, medium)
		}
		side := max(w/2, 5) + 4
		name := label{}.say(draw.Bold, "AB"[i:i+1]).say(draw.Serif, ", bearing ").value(b.length)
		if i == 0 {
			name.draw(c, x+side, y+support)
			reach = x + side + name.width
			continue
		}
		base := y + support
		if reach+8 > x-side-name.width {
			base += leading
			low += leading
		}
		name.right(c, x-side, base)
	}
	return low
}

// dimensions draws bearing centres and length below the bearings. It returns the lowest ink.
func (e *sideView) dimensions(c draw.Canvas, bottom draw.Pt) draw.Pt {
	a, b := draw.Pt(e.a.value)*e.per, draw.Pt(e.b.value)*e.per
	y := bottom + 17
	extend := func(x, to draw.Pt) { extendDown(c, x, bottom+2, to) }
	extend(a, y)
	extend(b, y)
	last := y
	la, lb := label{}.equals(e.a), label{}.equals(e.b)
	switch {
	case e.span.taken():
		across(c, 0, a, y, label{}.value(e.a), -1)
		across(c, a, b, y, label{}.value(e.span), 1)
	case a+3+la.width+8+lb.width+3 < b: // both from end A, on one line
		c.Line(0, y, b, y, hair)
		c.Circle(0, y, 1.6, draw.Style{Stroke: hair, Fill: draw.White})
		ticks(c, a, y)
		ticks(c, b, y)
		la.draw(c, a+3, y-clearance-la.depth)
		lb.right(c, b-3, y-clearance-lb.depth)
	default:
		across(c, 0, a, y, label{}.value(e.a), -1)
		last += 13
		extend(b, last)
		across(c, 0, b, last, label{}.value(e.b), 1)
	}
	last += 13
	extend(0, last)
	extend(e.l, last)
	across(c, 0, e.l, last, label{}.value(e.length), 1)
	return last + beyond
}
