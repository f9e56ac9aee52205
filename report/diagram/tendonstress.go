package diagram

import (
	"cmp"
	"fmt"
	"math"
	"slices"
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// tendonStress draws the stress in the tendons: the stress present and that available at ultimate, a graph for each
// kind of row. Rows alike share one. Where the stress is built up by bond at the ends and then keeps its value, the
// first part of the member from end A is drawn; where it changes all along, as with friction in ducts, the whole length.
//
// Roles: x over the stations (from end A); present, available over stations and rows of tendons; optional stressed-A,
// stressed-B over the rows (other than 0 where a row is stressed from that end), marked by arrows.
func tendonStress(d *data, width draw.Pt) *tape {
	along := d.alongBy(d.stations("x"))
	rows := d.axis("available", false)
	if d.err != nil {
		return nil
	}
	var pulled [2]column
	for i, role := range []string{"stressed-A", "stressed-B"} {
		if d.has(role) {
			pulled[i] = d.beside(role, column{axis: rows, cells: make([]cell, len(rows.Rows))})
		}
	}
	var kinds []endStress
	for i, name := range rows.Rows {
		e := endStress{rows: []string{name}}
		at := trace.Place{{Axis: rows, Row: i}}
		e.present, e.available = d.over("present", along.x.axis, at), d.over("available", along.x.axis, at)
		if d.err != nil {
			return nil
		}
		for k, c := range pulled {
			e.pulled[k] = c.len() > 0 && c.cells[i].value != 0
		}
		k := slices.IndexFunc(kinds, func(o endStress) bool {
			return same(o.present, e.present) && same(o.available, e.available) && o.pulled == e.pulled
		})
		if k >= 0 {
			kinds[k].rows = append(kinds[k].rows, name)
			continue
		}
		kinds = append(kinds, e)
	}
	left := kinds[min(len(kinds), mostKinds):]
	kinds = kinds[:min(len(kinds), mostKinds)]
	reach := 0.0
	whole := d.has("stressed-A") || d.has("stressed-B")
	for _, e := range kinds {
		reach = max(reach, e.full(along))
		whole = whole || e.varies()
	}
	half := (along.start() + along.end()) / 2
	near := along.within(min(along.start()+1.3*(reach-along.start()), half))
	const gap draw.Pt = 12
	least, widest, height := draw.Pt(145), draw.Pt(240), draw.Pt(74)
	if len(kinds) > 4 {
		height = 60
	}
	if whole {
		near = along
		least, widest = 230, 480
	}
	columns := max(min(int((width+gap)/(least+gap)), len(kinds)), 1)
	w := min((width-gap*draw.Pt(columns-1))/draw.Pt(columns), widest)
	t := &tape{}
	y := draw.Pt(0)
	for k, e := range kinds {
		if k > 0 && k%columns == 0 {
			y = t.ink.Y1 + 14
		}
		if whole {
			e.drawWhole(t, near, draw.Pt(k%columns)*(w+gap), y, w, height)
			continue
		}
		e.draw(t, near, draw.Pt(k%columns)*(w+gap), y, w, height)
	}
	e := kinds[0]
	y, x := t.ink.Y1+12, yRoom
	t.Line(x, y, x+16, y, outline)
	l := label{}.symbol(e.available.line().Symbol).say(draw.Serif, " available at ultimate")
	l.draw(t, x+20, y+middle)
	x += 20 + l.width + 16
	t.Rect(x, y, 16, 5, draw.Style{Fill: envelope})
	t.Line(x, y, x+16, y, medium, dashed...)
	label{}.symbol(e.present.line().Symbol).say(draw.Serif, " present, grey below it").draw(t, x+20, y+middle)
	if len(left) > 0 {
		label{}.say(draw.Serif, fmt.Sprintf("%d more rows differ from these and are not drawn; the record holds them", len(left))).draw(t, yRoom, y+12+middle)
	}
	return t
}

// mostKinds is how many graphs a figure has.
const mostKinds = 9

// endStress is the stress in rows that are alike.
type endStress struct {
	rows               []string
	present, available column
	pulled             [2]bool // stressed from end A, from end B
}

// varies tells whether the stress present changes by more than a hundredth where all the stress is available: along
// bonded strands it is constant there.
func (e endStress) varies() bool {
	var full float64
	for _, v := range e.available.cells {
		full = max(full, v.value)
	}
	lo, hi := math.Inf(1), math.Inf(-1)
	for i, v := range e.present.cells {
		if v.taken() && e.available.cells[i].value >= 0.995*full {
			lo, hi = min(lo, v.value), max(hi, v.value)
		}
	}
	return hi-lo > 0.01*hi
}

// drawWhole draws the stress over the whole length, with the values present at the ends, the greatest and the least.
func (e endStress) drawWhole(t *tape, along course, left, top, width, height draw.Pt) {
	g := newGraph(along, width, nil)
	g.x.a, g.x.b = g.x.a+left, g.x.b+left-14
	g.values(top, height, false, e.present, e.available)
	present, available := g.points(e.present), g.points(e.available)
	g.fill(t, present, envelope)
	g.zero(t)
	g.curve(t, present, medium, dashed...)
	g.curve(t, available, outline)
	unit := label{}.say(draw.Serif, ", ").then(titled(e.available, ""))
	title := pick(len(e.rows) > 1, "rows ", "row ") + strings.Join(e.rows, ", ")
	g.scaleY(t, label{}.say(draw.Bold, shorten(draw.Bold, title, g.x.b-g.x.a+22-unit.width)).then(unit))
	for k, x := range []draw.Pt{g.x.a, g.x.b} { // towards the jack
		if e.pulled[k] {
			run := pick[draw.Pt](k == 0, -1, 1)
			y := present[pick(k == 0, 0, len(present)-1)].Y
			arrow(t, x-run*9, y+6, x, y+6, medium, 4)
			g.ways.taken = append(g.ways.taken, draw.BoxAt(min(x, x-run*9), y+4, 9, 4))
		}
	}
	g.ends(t, e.available, e.present)
	first, last := along.order[0], along.order[len(along.order)-1]
	least := -1
	for _, i := range along.order {
		if v := e.present.cells[i]; v.taken() && (least < 0 || v.value < e.present.cells[least].value) {
			least = i
		}
	}
	most, at := g.greatest(e.present, 1)
	written := map[string]bool{}
	if v := e.present.cells[last]; v.taken() {
		written[v.shown] = true
	}
	note := func(v, x cell, side direction) {
		if v.taken() && !written[v.shown] {
			written[v.shown] = true
			g.mark(t, g.at(x.value, v.value), side, label{}.number(v).say(draw.Serif, " at ").value(x))
		}
	}
	note(e.present.cells[first], along.x.cells[first], below)
	note(most, at, below)
	if least >= 0 {
		note(e.present.cells[least], along.x.cells[least], below)
	}
	g.scaleX(t, g.y.at(0)+5)
}

// full is the first place from which on the stress available, and that present, stay near
// their greatest value in the half of the member.
func (e endStress) full(along course) float64 {
	half := (along.start() + along.end()) / 2
	place := along.start()
	for _, c := range []column{e.present, e.available} {
		var most float64
		for _, i := range along.order {
			if along.x.cells[i].value <= half {
				most = max(most, c.cells[i].value)
			}
		}
		for _, i := range along.order {
			if c.cells[i].taken() && c.cells[i].value >= 0.995*most {
				place = max(place, along.x.cells[i].value)
				break
			}
		}
	}
	return place
}

// within is the course up to the first station at or beyond a place.
func (c course) within(x float64) course {
	for k, i := range c.order {
		if c.x.cells[i].value >= x {
			return course{c.x, c.order[:k+1]}
		}
	}
	return c
}

func (e endStress) draw(t *tape, along course, left, top, width, height draw.Pt) {
	g := newGraph(along, width, nil)
	g.x.a, g.x.b = g.x.a+left, g.x.b+left-16 // less room for the values at the end
	g.values(top, height, false, e.present, e.available)
	present, available := g.points(e.present), g.points(e.available)
	g.fill(t, present, envelope)
	g.zero(t)
	g.curve(t, present, medium, dashed...)
	g.curve(t, available, outline)
	title := "row "
	if len(e.rows) > 1 {
		title = "rows "
	}
	unit := label{}.say(draw.Serif, ", ").then(titled(e.available, ""))
	g.scaleY(t, label{}.say(draw.Bold, shorten(draw.Bold, title+strings.Join(e.rows, ", "), g.x.b-g.x.a+22-unit.width)).then(unit))
	g.ends(t, e.available, e.present)
	g.bends(t, e)
}

// bends is a level axis with the places where the stress begins and where it is full.
func (g *graph) bends(c draw.Canvas, e endStress) {
	places := []cell{g.along.x.cells[g.along.order[0]]}
	for _, col := range []column{e.available, e.present} {
		begin, full := e.bend(g.along, col)
		places = append(places, begin, full)
	}
	slices.SortStableFunc(places, func(a, b cell) int { return cmp.Compare(a.value, b.value) })
	places = slices.CompactFunc(places, func(a, b cell) bool { return a.shown == b.shown })
	var at, room []draw.Pt
	var ls []label
	for i, p := range places {
		l := label{}.number(p)
		if i == len(places)-1 {
			l = l.gap(0.17).say(draw.Serif, p.line.Unit.String())
		}
		ls = append(ls, l)
		at, room = append(at, g.x.at(p.value)), append(room, l.width+4)
	}
	to := spread(at, room, g.x.a-14, g.x.b+10)
	y := g.y.at(0)
	for i, l := range ls {
		c.Polyline([]draw.Point{{X: at[i], Y: y}, {X: at[i], Y: y + 3}, {X: to[i], Y: y + 7}}, draw.Style{Stroke: hair})
		l.centre(c, to[i], y+9+size*0.66)
	}
	label{}.symbol(g.along.x.line().Symbol).right(c, to[0]-room[0]/2-4, y+9+size*0.66)
}

// bend is where a column leaves zero and where it is full.
func (e endStress) bend(along course, c column) (begin, full cell) {
	var most float64
	for _, i := range along.order {
		most = max(most, c.cells[i].value)
	}
	begin = along.x.cells[along.order[0]]
	for _, i := range along.order {
		if c.cells[i].value <= 0 {
			begin = along.x.cells[i]
		}
		if full = along.x.cells[i]; c.cells[i].value >= 0.995*most {
			break
		}
	}
	return begin, full
}

// ends writes the values at the right ends of lines beside them.
func (g *graph) ends(c draw.Canvas, of ...column) {
	i := g.along.order[len(g.along.order)-1]
	var at, room []draw.Pt
	var ls []label
	for _, col := range of {
		if v := col.cells[i]; v.taken() {
			ls = append(ls, label{}.number(v))
			at, room = append(at, g.y.at(v.value)), append(room, leading)
		}
	}
	for k, y := range spread(at, room, -1e6, 1e6) {
		ls[k].draw(c, g.x.b+3, y+middle)
	}
}
