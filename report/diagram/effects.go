package diagram

import (
	"cmp"
	"math"
	"slices"

	"soffit/report/draw"
)

// effects draws the envelopes of bending moment and shear along the member, moments on the tension side:
// sagging downward. The extreme values are written with their places.
//
// Roles, over the stations: x (from end A), M-max, M-min, V-left-max, V-left-min, V-right-max, V-right-min;
// optional support-A, support-B (bearing centres from end A).
func effects(d *data, width draw.Pt) *tape {
	x := d.stations("x")
	along := d.alongBy(x)
	top, bottom := d.column(along, "M-max"), d.column(along, "M-min")
	vmax := [2]column{d.column(along, "V-left-max"), d.column(along, "V-right-max")}
	vmin := [2]column{d.column(along, "V-left-min"), d.column(along, "V-right-min")}
	supports := d.supports()
	if d.err != nil {
		return nil
	}
	t := &tape{}
	g := newGraph(along, width, supports)
	g.values(0, 100, true, top, bottom)
	g.envelope(t, g.points(top), g.points(bottom))
	g.scaleY(t, titled(top, "sagging downward"))
	g.extreme(t, []column{top}, 1, below)
	if !same(top, bottom) {
		if g.hogs(bottom) {
			g.hogging(t, bottom)
		} else {
			g.extreme(t, []column{bottom}, 0, above)
		}
	}
	low := g.ways.within.Y1
	g.values(low+16, 80, false, vmax[0], vmax[1], vmin[0], vmin[1])
	g.envelope(t, g.points(vmax[:]...), g.points(vmin[:]...))
	g.scaleY(t, titled(vmax[0], ""))
	g.extreme(t, vmax[:], 1, above)
	g.extreme(t, vmin[:], -1, below)
	g.scaleX(t, g.ways.within.Y1+3)
	return t
}

// course is the stations in the order of their places along the member.
type course struct {
	x     column
	order []int
}

func (d *data) alongBy(x column) course {
	c := course{x: x}
	for i, v := range x.cells {
		if !v.taken() {
			d.fail("role \"x\": no place for station %s", x.axis.Rows[i])
			return c
		}
		c.order = append(c.order, i)
	}
	if len(c.order) < 2 {
		d.fail("role \"x\": needs two stations at least")
		return c
	}
	slices.SortStableFunc(c.order, func(i, j int) int { return cmp.Compare(x.cells[i].value, x.cells[j].value) })
	if c.end() <= c.start() {
		d.fail("role \"x\": all stations lie in one place")
	}
	return c
}

func (c course) start() float64 { return c.x.cells[c.order[0]].value }
func (c course) end() float64   { return c.x.cells[c.order[len(c.order)-1]].value }

// column is the values of a role at the stations of a course; a single value stands for all.
func (d *data) column(along course, role string) column {
	if d.err == nil && d.has(role) && !d.runs(role, true) {
		return d.over(role, along.x.axis, nil)
	}
	c := d.stations(role)
	if d.err == nil && c.axis != along.x.axis {
		d.fail("role %q runs over %s, want %s", role, c.axis.Name, along.x.axis.Name)
	}
	return c
}

// supports are the places of the bearings, if the figure names them.
func (d *data) supports() []cell {
	if !d.has("support-A") || !d.has("support-B") {
		return nil
	}
	return []cell{d.one("support-A"), d.one("support-B")}
}

func same(a, b column) bool {
	for i := range a.cells {
		if a.cells[i].shown != b.cells[i].shown {
			return false
		}
	}
	return true
}

// titled is the symbol without a subscript and the unit of a column, to stand over its axis.
func titled(c column, remark string) label {
	s := *c.line().Symbol
	s.Sub, s.Index, s.Name = "", nil, s.Base
	l := label{}.symbol(&s).gap(0.2).say(draw.Serif, "in "+c.line().Unit.String())
	if remark != "" {
		l = l.say(draw.Serif, ", "+remark)
	}
	return l
}

// hogs tells whether a column of moments goes below zero by more than can be overlooked.
func (g *graph) hogs(c column) bool {
	return slices.ContainsFunc(c.cells, func(v cell) bool { return v.value < -g.slight() })
}

// slight is a value that can be overlooked in the graph.
func (g *graph) slight() float64 { return 0.03 * (g.y.hi - g.y.lo) }

// hogging marks the least moment near each bearing, and the least of all where that lies elsewhere: each place once.
func (g *graph) hogging(c draw.Canvas, of column) {
	least := func(from, to float64) int {
		best := -1
		for _, i := range g.along.order {
			x := g.along.x.cells[i].value
			if v := of.cells[i]; v.taken() && v.value < -g.slight() && x >= from && x <= to && (best < 0 || v.value < of.cells[best].value) {
				best = i
			}
		}
		return best
	}
	marks := []int{least(g.along.start(), g.along.end())}
	if len(g.supports) == 2 {
		for _, s := range g.supports {
			if k := least(s.value-1, s.value+1); k >= 0 { // at the bearing, within a millimetre
				marks = append(marks, k)
			}
		}
	}
	for n, i := range marks {
		if i < 0 || slices.ContainsFunc(marks[:n], func(k int) bool { return of.cells[k].shown == of.cells[i].shown && k == i }) {
			continue
		}
		x := g.along.x.cells[i]
		g.mark(c, g.at(x.value, of.cells[i].value), above, label{}.equals(of.cells[i]).say(draw.Serif, " at ").equals(x))
	}
}

// extreme marks the value furthest in a direction, 1 up and −1 down, or the largest magnitude for 0, with
// its place.
func (g *graph) extreme(c draw.Canvas, of []column, sign float64, side direction) {
	var best cell
	station := -1
	for _, i := range g.along.order {
		for _, col := range of {
			v := col.cells[i]
			if !v.taken() {
				continue
			}
			key := func(x float64) float64 {
				if sign == 0 {
					return math.Abs(x)
				}
				return sign * x
			}
			if station < 0 || key(v.value) > key(best.value) {
				best, station = v, i
			}
		}
	}
	if station < 0 || best.value == 0 {
		return
	}
	x := g.along.x.cells[station]
	l := label{}.equals(best).say(draw.Serif, " at ").equals(x)
	g.mark(c, g.at(x.value, best.value), side, l)
}
