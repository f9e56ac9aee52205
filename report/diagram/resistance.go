package diagram

import (
	"math"
	"slices"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// resistance draws the design moments against the resistances along the member, sagging downward, and marks
// the place of the worst ratio as the check has it.
//
// Roles: over the stations x (from end A), demand, resistance; optional resistance-hogging (its size, drawn upward) with
// demand-least (the least moment, hogging negative) or demand-hogging (the size of the hogging moment, drawn upward);
// optional support-A, support-B (bearing centres from end A), check, check-hogging (the check of the one against the
// other; without it the one of the record that compares the two is taken).
func resistance(d *data, width draw.Pt) *tape {
	along := d.alongBy(d.stations("x"))
	sagging := against{demand: d.column(along, "demand"), capacity: d.column(along, "resistance"), sign: 1, demandSign: 1, check: d.checks["check"]}
	pairs := []against{sagging}
	if d.has("resistance-hogging") {
		role, sign := "demand-least", 1.0
		if !d.has(role) {
			role, sign = "demand-hogging", -1
		}
		pairs = append(pairs, against{demand: d.column(along, role), capacity: d.column(along, "resistance-hogging"), sign: -1, demandSign: sign, check: d.checks["check-hogging"]})
	}
	supports := d.supports()
	if d.err != nil {
		return nil
	}
	t := &tape{}
	g := newGraph(along, width, supports)
	var curves []column
	for _, p := range pairs {
		demand, capacity := p.drawn()
		curves = append(curves, demand, capacity)
	}
	g.values(0, pick[draw.Pt](len(pairs) > 1, 170, 130), true, curves...)
	for i := range pairs {
		g.fill(t, g.points(curves[2*i]), envelope)
	}
	g.graduated(t)
	for i := range pairs {
		g.curve(t, g.points(curves[2*i]), medium, dashed...)
		for _, run := range g.runs(curves[2*i+1]) {
			g.curve(t, run, outline)
		}
	}
	g.scaleY(t, titled(sagging.demand, "sagging downward"))
	g.bearings(t)
	for _, notes := range []bool{false, true} { // every line before the words
		for _, p := range pairs {
			g.against(t, d, p, notes)
		}
	}
	g.scaleX(t, g.ways.within.Y1+3)
	return t
}

// against is a demand with its resistance: sign is 1 for sagging, −1 for hogging; the demand times demandSign is drawn.
type against struct {
	demand, capacity column
	sign, demandSign float64
	check            *trace.Check
}

// drawn are demand and capacity with their values turned for drawing: a hogging resistance stands above zero however
// its sign is written.
func (p against) drawn() (demand, capacity column) {
	demand, capacity = column{axis: p.demand.axis}, column{axis: p.capacity.axis}
	for _, v := range p.demand.cells {
		v.value *= p.demandSign
		demand.cells = append(demand.cells, v)
	}
	for _, v := range p.capacity.cells {
		if p.sign < 0 {
			v.value = -math.Abs(v.value)
		}
		capacity.cells = append(capacity.cells, v)
	}
	return demand, capacity
}

// against marks where demand and resistance are nearest, as the check has it, and the greatest resistance: with dots
// and a line between them, or with words.
func (g *graph) against(t draw.Canvas, d *data, p against, notes bool) {
	demand, capacity := p.drawn()
	inner, outer := above, below // sides of the smaller and the greater
	if p.sign < 0 {
		inner, outer = below, above
	}
	c, i := d.comparison(g.along, p)
	if c == nil {
		if !notes {
			return
		}
		for k, col := range []column{demand, capacity} {
			if v, at := g.greatest(col, p.sign); v.taken() && v.value*p.sign > g.slight() {
				g.ways.note(t, g.at(at.value, v.value), []direction{inner, outer}[k], label{}.equals(v))
			}
		}
		return
	}
	x, e, r := g.along.x.cells[i], demand.cells[i], capacity.cells[i]
	a, b := g.at(x.value, e.value), g.at(x.value, r.value)
	if !notes {
		t.Line(a.X, a.Y, b.X, b.Y, hair)
		g.ways.line([]draw.Point{a, b})
		g.dot(t, a)
		g.dot(t, b)
		return
	}
	ratio := label{}.symbol(e.line.Symbol).gap(0.2).say(draw.Serif, "/").gap(0.2).symbol(r.line.Symbol).gap(0.28)
	ratio = ratio.say(draw.Serif, "= ").say(draw.Bold, c.Ratio[i]).say(draw.Serif, " at ").equals(x)
	if e.value*p.sign <= r.value*p.sign {
		g.ways.note(t, a, inner, ratio, label{}.equals(e))
		g.ways.note(t, b, outer, label{}.equals(r))
	} else { // the demand passes the resistance
		g.ways.note(t, b, inner, ratio, label{}.equals(r))
		g.ways.note(t, a, outer, label{}.equals(e))
	}
	if top, at := g.greatest(capacity, p.sign); top.shown != r.shown {
		g.ways.note(t, g.at(at.value, top.value), outer, label{}.equals(top))
	}
}

// comparison is the check of demand against resistance and its governing station.
func (d *data) comparison(along course, p against) (*trace.Check, int) {
	c := p.check
	if c == nil {
		for _, k := range d.note.Checks() {
			if uses(k.Demand, p.demand) && uses(k.Limit, p.capacity) {
				c = k
			}
		}
	}
	if c == nil || len(c.Axes) != 1 || c.Axes[0] != along.x.axis || c.Ratio[c.Worst] == "" ||
		!p.demand.cells[c.Worst].taken() || !p.capacity.cells[c.Worst].taken() {
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

// greatest is the greatest value of a column times sign and its place, the middle one of several.
func (g *graph) greatest(col column, sign float64) (v, at cell) {
	var where []int
	for _, i := range g.along.order {
		switch x := col.cells[i]; {
		case !x.taken() || len(where) > 0 && sign*x.value < sign*v.value:
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
