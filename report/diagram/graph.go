package diagram

import (
	"math"

	"soffit/calc/quantity"
	"soffit/report/draw"
)

// axis maps values in base units to paper, from lo at a to hi at b.
type axis struct {
	lo, hi float64
	a, b   draw.Pt
}

func (a axis) at(v float64) draw.Pt {
	if a.hi == a.lo {
		return a.a
	}
	return a.a + (a.b-a.a)*draw.Pt((v-a.lo)/(a.hi-a.lo))
}

// graduations are round values of a unit on the axis, in base units, with their numbers: about count of
// them, if possible three at least.
func (a axis) graduations(u quantity.Unit, count int) (at []float64, shown []string) {
	lo, hi := u.From(min(a.lo, a.hi)), u.From(max(a.lo, a.hi))
	for most := count + 8; len(at) < 3 && count < most; count++ {
		s := step(hi-lo, count)
		d := decimals(s)
		at, shown = at[:0], shown[:0]
		for k := math.Ceil(lo/s - 1e-9); k*s <= hi+1e-9*s; k++ {
			at = append(at, u.To(k*s))
			shown = append(shown, quantity.Format(k*s, d))
		}
	}
	return at, shown
}

// graph is a rectangle of paper with a level axis of places and an upright one of values.
type graph struct {
	x, y     axis
	unitY    quantity.Unit
	along    course
	supports []cell
	ways     placer
}

const yRoom draw.Pt = 34 // left of a graph, for the numbers of its upright axis

// newGraph takes the whole width for the places of a course.
func newGraph(along course, width draw.Pt, supports []cell) *graph {
	g := &graph{along: along, supports: supports}
	g.x = axis{lo: along.start(), hi: along.end(), a: yRoom, b: width - 12}
	return g
}

// values sets the upright axis: as high as height below top, with the columns' range and zero, positive
// values up or down.
func (g *graph) values(top, height draw.Pt, down bool, of ...column) {
	var lo, hi float64
	for _, c := range of {
		for _, v := range c.values() {
			lo, hi = min(lo, v), max(hi, v)
		}
	}
	if lo == hi {
		hi = 1
	}
	const room draw.Pt = 14 // for a label beyond the extreme
	g.unitY = of[0].line().Unit
	over, under := draw.Pt(0), draw.Pt(0)
	if down {
		under = room
		if lo < 0 {
			over = room
		}
		g.y = axis{lo: lo, hi: hi, a: top + over, b: top + over + height}
	} else {
		if over = room; lo < 0 {
			under = room
		}
		g.y = axis{lo: lo, hi: hi, a: top + over + height, b: top + over}
	}
	g.ways = placer{within: draw.Box{X0: g.x.a - 2, Y0: top, X1: g.x.b + 10, Y1: top + over + height + under}}
}

// points is the line of one column over the places, or of two that give the values left and right of each.
func (g *graph) points(of ...column) []draw.Point {
	var out []draw.Point
	for _, i := range g.along.order {
		for _, c := range of {
			if v := c.cells[i]; v.taken() {
				out = append(out, g.at(g.along.x.cells[i].value, v.value))
			}
		}
	}
	return out
}

// runs are the points of a column, stretch by stretch where stations without a value lie between.
func (g *graph) runs(c column) [][]draw.Point {
	var out [][]draw.Point
	broken := true
	for _, i := range g.along.order {
		v := c.cells[i]
		if !v.taken() {
			broken = true
			continue
		}
		if broken {
			out = append(out, nil)
		}
		last := len(out) - 1
		out[last] = append(out[last], g.at(g.along.x.cells[i].value, v.value))
		broken = false
	}
	return out
}

// envelope draws the area between two lines, the governing one heavier.
func (g *graph) envelope(c draw.Canvas, a, b []draw.Point) {
	area := append([]draw.Point(nil), a...)
	for i := len(b) - 1; i >= 0; i-- {
		area = append(area, b[i])
	}
	c.Polygon(area, draw.Style{Fill: envelope})
	g.graduated(c)
	g.curve(c, b, medium)
	g.curve(c, a, outline)
	g.bearings(c)
}

const (
	gradHeight draw.Pt = 2  // of a graduation mark
	gradRoom   draw.Pt = 30 // paper a graduation of places needs at least
	gradRise   draw.Pt = 22 // and one of values
)

func (g *graph) at(x, y float64) draw.Point { return draw.Point{X: g.x.at(x), Y: g.y.at(y)} }

// curve draws a line through places and keeps labels off it.
func (g *graph) curve(c draw.Canvas, pts []draw.Point, width draw.Pt, dash ...draw.Pt) {
	c.Polyline(pts, draw.Style{Stroke: width, Dash: dash})
	g.ways.line(pts)
}

// scaleY draws the upright axis at the left with graduations, name and unit over it.
func (g *graph) scaleY(c draw.Canvas, name label) {
	x := g.x.a - 5
	top, bottom := min(g.y.a, g.y.b), max(g.y.a, g.y.b)
	c.Line(x, top, x, bottom, hair)
	at, shown := g.y.graduations(g.unitY, max(int((bottom-top)/gradRise), 2))
	for i, v := range at {
		y := g.y.at(v)
		c.Line(x-gradHeight, y, x, y, hair)
		n := label{}.box(setting.Value(shown[i], "").Box())
		n.right(c, x-gradHeight-1.5, y+middle)
	}
	left := x - gradHeight - 1.5 - 14
	name.draw(c, left, top-7)
	g.ways.taken = append(g.ways.taken, name.at(left, top-7).Grow(3))
}

// bearings marks where the member is borne, over the lines.
func (g *graph) bearings(c draw.Canvas) {
	y := g.y.at(0)
	for _, s := range g.supports {
		x := g.x.at(s.value)
		c.Polygon([]draw.Point{{X: x, Y: y}, {X: x - 2.5, Y: y + 4.5}, {X: x + 2.5, Y: y + 4.5}},
			draw.Style{Stroke: hair, Fill: draw.White})
		g.ways.taken = append(g.ways.taken, draw.BoxAt(x-2.5, y, 5, 4.5))
	}
}

// graduated draws the line of zero with marks at round places.
func (g *graph) graduated(c draw.Canvas) {
	g.zero(c)
	y := g.y.at(0)
	at, _ := g.x.graduations(g.unitX(), g.placesCount())
	for _, v := range at {
		c.Line(g.x.at(v), y-gradHeight/2, g.x.at(v), y+gradHeight/2, hair)
	}
}

// zero draws the line of zero.
func (g *graph) zero(c draw.Canvas) {
	y := g.y.at(0)
	c.Line(g.x.a, y, g.x.b, y, medium)
	g.ways.line([]draw.Point{{X: g.x.a, Y: y}, {X: g.x.b, Y: y}})
}

func (g *graph) placesCount() int { return max(int((g.x.b-g.x.a)/gradRoom), 2) }

func (g *graph) unitX() quantity.Unit { return g.along.x.line().Unit }

// scaleX draws the level axis below the graphs, at y, with numbers, the unit after the last and the symbol
// before the first.
func (g *graph) scaleX(c draw.Canvas, y draw.Pt) {
	c.Line(g.x.a, y, g.x.b, y, hair)
	at, shown := g.x.graduations(g.unitX(), g.placesCount())
	for i, v := range at {
		x := g.x.at(v)
		c.Line(x, y, x, y+gradHeight, hair)
		n := label{}.box(setting.Value(shown[i], "").Box())
		if i == len(at)-1 {
			n = n.say(draw.Serif, "\u2009"+g.unitX().String())
			n.draw(c, x-setting.Value(shown[i], "").Width()/2, y+gradHeight+2+size*0.66)
			continue
		}
		n.centre(c, x, y+gradHeight+2+size*0.66)
	}
	label{}.symbol(g.along.x.line().Symbol).right(c, g.x.a-8, y+gradHeight+2+size*0.66)
}

// mark is a dot on a curve with a label near it.
func (g *graph) mark(c draw.Canvas, p draw.Point, side direction, lines ...label) {
	g.dot(c, p)
	g.ways.note(c, p, side, lines...)
}

// dot marks a point and keeps labels off it.
func (g *graph) dot(c draw.Canvas, p draw.Point) {
	c.Circle(p.X, p.Y, 1.5, draw.Style{Fill: draw.Black})
	g.ways.taken = append(g.ways.taken, draw.Box{X0: p.X, Y0: p.Y, X1: p.X, Y1: p.Y}.Grow(1.5))
}
