package diagram

import (
	"cmp"
	"fmt"
	"slices"
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// tendonStress draws the stress in the tendons along the first part of the member from end A: the stress
// present and that available at ultimate, a graph for each kind of row. Rows alike share one.
//
// Roles: x over the stations (from end A); present, available over stations and rows of tendons.
func tendonStress(d *data, width draw.Pt) *tape {
	along := d.alongBy(d.stations("x"))
	rows := d.axis("available", false)
	if d.err != nil {
		return nil
	}
	var kinds []endStress
	for i, name := range rows.Rows {
		e := endStress{rows: []string{name}}
		at := trace.Place{{Axis: rows, Row: i}}
		e.present, e.available = d.over("present", along.x.axis, at), d.over("available", along.x.axis, at)
		if d.err != nil {
			return nil
		}
		k := slices.IndexFunc(kinds, func(o endStress) bool { return same(o.present, e.present) && same(o.available, e.available) })
		if k >= 0 {
			kinds[k].rows = append(kinds[k].rows, name)
			continue
		}
		kinds = append(kinds, e)
	}
	left := kinds[min(len(kinds), mostKinds):]
	kinds = kinds[:min(len(kinds), mostKinds)]
	reach := 0.0
	for _, e := range kinds {
		reach = max(reach, e.full(along))
	}
	half := (along.start() + along.end()) / 2
	near := along.within(min(along.start()+1.3*(reach-along.start()), half))
	const least, gap draw.Pt = 145, 12
	height := draw.Pt(74)
	if len(kinds) > 4 {
		height = 60
	}
	columns := max(min(int((width+gap)/(least+gap)), len(kinds)), 1)
	w := min((width-gap*draw.Pt(columns-1))/draw.Pt(columns), 240)
	t := &tape{}
	y := draw.Pt(0)
	for k, e := range kinds {
		if k > 0 && k%columns == 0 {
			y = t.ink.Y1 + 14
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
