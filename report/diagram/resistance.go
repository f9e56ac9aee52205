package diagram

import (
	"slices"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// resistance draws the design moment against the resistance along the member, sagging downward, and marks
// the place of the worst ratio as the check has it.
//
// Roles: over the stations x (from end A), demand, resistance; optional support-A, support-B (bearing
// centres from end A), check (the check of the one against the other; without it the one of the record
// that compares the two is taken).
func resistance(d *data, width draw.Pt) *tape {
	along := d.alongBy(d.stations("x"))
	demand, capacity := d.column(along, "demand"), d.column(along, "resistance")
	supports := d.supports()
	if d.err != nil {
		return nil
	}
	t := &tape{}
	g := newGraph(along, width, supports)
	g.values(0, 130, true, demand, capacity)
	ed, rd := g.points(demand), g.points(capacity)
	g.fill(t, ed, envelope)
	g.graduated(t)
	g.curve(t, ed, medium, dashed...)
	g.curve(t, rd, outline)
	g.scaleY(t, titled(demand, "sagging downward"))
	g.bearings(t)
	if c, i := d.comparison(along, demand, capacity); c != nil {
		x, e, r := along.x.cells[i], demand.cells[i], capacity.cells[i]
		p, q := g.at(x.value, e.value), g.at(x.value, r.value)
		t.Line(p.X, p.Y, q.X, q.Y, hair)
		g.ways.line([]draw.Point{p, q})
		g.dot(t, p)
		g.dot(t, q)
		ratio := label{}.symbol(e.line.Symbol).gap(0.2).say(draw.Serif, "/").gap(0.2).symbol(r.line.Symbol).gap(0.28)
		ratio = ratio.say(draw.Serif, "= ").say(draw.Bold, c.Ratio[i]).say(draw.Serif, " at ").equals(x)
		if p.Y <= q.Y {
			g.ways.note(t, p, above, ratio, label{}.equals(e))
			g.ways.note(t, q, below, label{}.equals(r))
		} else { // the demand passes the resistance
			g.ways.note(t, q, above, ratio, label{}.equals(r))
			g.ways.note(t, p, below, label{}.equals(e))
		}
		if top, at := g.greatest(capacity); top.shown != r.shown {
			g.ways.note(t, g.at(at.value, top.value), below, label{}.equals(top))
		}
	} else {
		for k, col := range []column{demand, capacity} {
			if v, at := g.greatest(col); v.taken() {
				g.ways.note(t, g.at(at.value, v.value), []direction{above, below}[k], label{}.equals(v))
			}
		}
	}
	g.scaleX(t, g.ways.within.Y1+3)
	return t
}

// comparison is the check of demand against resistance and its governing station.
func (d *data) comparison(along course, demand, capacity column) (*trace.Check, int) {
	c := d.check
	if c == nil {
		for _, k := range d.note.Checks() {
			if uses(k.Demand, demand) && uses(k.Limit, capacity) {
				c = k
			}
		}
	}
	if c == nil || len(c.Axes) != 1 || c.Axes[0] != along.x.axis || c.Ratio[c.Worst] == "" ||
		!demand.cells[c.Worst].taken() || !capacity.cells[c.Worst].taken() {
		return nil, 0
	}
	return c, c.Worst
}

func uses(u trace.Use, c column) bool {
	for _, x := range c.cells {
		if x.line != nil && slices.Contains(u.From, x.line.Key) {
			return true
		}
	}
	return false
}

// fill shades the area between a line and zero.
func (g *graph) fill(c draw.Canvas, pts []draw.Point, tone draw.Tone) {
	if len(pts) == 0 {
		return
	}
	y := g.y.at(0)
	area := append([]draw.Point{{X: pts[0].X, Y: y}}, pts...)
	area = append(area, draw.Point{X: pts[len(pts)-1].X, Y: y})
	c.Polygon(area, draw.Style{Fill: tone})
}

// greatest is the greatest value of a column and its place, the middle one of several.
func (g *graph) greatest(col column) (v, at cell) {
	var where []int
	for _, i := range g.along.order {
		switch x := col.cells[i]; {
		case !x.taken() || len(where) > 0 && x.value < v.value:
		case len(where) > 0 && x.value == v.value:
			where = append(where, i)
		default:
			v, where = x, []int{i}
		}
	}
	if len(where) == 0 {
		return cell{}, cell{}
	}
	return v, g.along.x.cells[where[len(where)/2]]
}
