package diagram

import (
	"fmt"
	"math"

	"soffit/report/draw"
)

// elevation draws the member from the side with its bearings, rows of tendons and loads. Lengths and depths
// have their own scales where the member is long, which is said.
//
// Roles: length, depth (of the concrete, without a topping), support-A, support-B (bearing centres from end A),
// bearing-A, bearing-B (lengths of bearings); over the rows of tendons level (above the soffit), optional debonded
// (length from each end), end-level (height at the ends of rows that are held down) with held-down (distance of the two
// points from the nearer end, 0 for none); or in place of level profile-x over the stations (from end A) with profile-y
// (height) over stations and rows; load-q (force a length), load-F (force), load-from, load-to (from end A) over the
// loads, where q = 0 marks a point load at load-from; optional load-N (along the member, compression positive) over the
// loads; optional span (between bearing centres), overhang-B (bearing
// centre B from end B), topping-depth, the outline (see shape), whose edges are then seen, bar-level (above the soffit)
// over the rows of bars.
func elevation(d *data, width draw.Pt) *tape {
	e := sideView{length: d.one("length"), depth: d.one("depth"), a: d.one("support-A"), b: d.one("support-B"),
		bearingA: d.one("bearing-A"), bearingB: d.one("bearing-B"), rows: d.paths()}
	if d.has("span") {
		e.span = d.one("span")
	}
	if d.has("overhang-B") {
		e.overhang = d.one("overhang-B")
	}
	if d.has("topping-depth") {
		e.topping = d.one("topping-depth")
	}
	if d.has("corner-x") {
		s := d.shape()
		if off := s.height - e.depth.value; d.err == nil && (off > 2*near || off < -2*near) {
			d.fail("role \"depth\": %s, the outline is %.1f mm deep", e.depth.shown, s.height)
		}
		if d.err == nil {
			e.seen = s.silhouette()
		}
	}
	if d.has("bar-level") {
		e.bars = d.rows("bar-level")
	}
	e.loads, e.axials = d.loads(), d.axials()
	if d.err != nil {
		return nil
	}
	t := e.fitted(width, true)
	beside := e.l
	if beside >= 0.7*width {
		return t
	}
	u := e.fitted(width, false)
	const least draw.Pt = 190 // of the member beside a listing
	if beside < least || e.l > 1.3*beside {
		return u
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
	length, depth, a, b, bearingA, bearingB cell
	span, overhang, topping                 cell // not taken if not given
	rows                                    []path
	bars                                    column    // may be none
	seen                                    []float64 // heights of edges, mm
	loads                                   []loading
	axials                                  []label // forces along the member
	beside                                  bool    // the listing of the rows, else it stands below

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
	for i, r := range e.rows {
		for _, o := range e.rows[:i] {
			if d := r.apart(o); d > 0 {
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
	top := -e.h - up.of(e.topping.value)
	if e.topping.taken() {
		c.Rect(0, top, e.l, -e.h-top, draw.Style{Stroke: medium, Fill: cast})
	}
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
	drawLoads(c, e.loads, e.per, e.l, top)
	low := e.dimensions(c, under)
	const left draw.Pt = -9
	extendLeft(c, -e.h, 0, left)
	extendLeft(c, 0, 0, left)
	if e.topping.taken() {
		extendLeft(c, top, 0, left)
		stack(c, left, []draw.Pt{top, -e.h, 0}, []label{label{}.value(e.topping), label{}.value(e.depth)})
	} else {
		stack(c, left, []draw.Pt{-e.h, 0}, []label{label{}.value(e.depth)})
	}
	note := "elevation " + along.String()
	if up != along {
		note = fmt.Sprintf("elevation: lengths %s, depths %s", along, up)
	}
	words(note).centre(c, e.l/2, low+size+5)
	y := low + size + 5
	for _, l := range e.axials {
		y += leading
		l.centre(c, e.l/2, y)
	}
	if !e.beside {
		l.below(c, 0, y+15)
	}
}

// edges draws the edges of flanges, haunches and webs that are seen from the side, as far as they are apart on paper.
func (e *sideView) edges(c draw.Canvas, up scale) {
	const apart draw.Pt = 1.6
	last := draw.Pt(0)
	for _, v := range e.seen {
		if y := up.of(v); y-last >= apart && e.h-y >= apart {
			c.Line(0, -y, e.l, -y, edge)
			last = y
		}
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
		if e.a.value > 0 {
			across(c, 0, a, y, label{}.value(e.a), -1)
		}
		mid := label{}.value(e.span)
		if mid.width+4 <= b-a {
			across(c, a, b, y, mid, 1)
		} else { // on a line of its own
			across(c, a, b, y+13, mid, 1)
			extend(a, y+13)
			extend(b, y+13)
			last += 13
		}
		if e.overhang.taken() && e.overhang.value > 0 {
			extend(e.l, y)
			v := label{}.value(e.overhang)
			side := 1
			if mid.width/2+v.width+10 < (b-a)/2 { // over the line of the span
				side = -1
			}
			across(c, b, e.l, y, v, side)
		}
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
