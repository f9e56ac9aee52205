package diagram

import (
	"cmp"
	"math"
	"slices"

	"soffit/report/draw"
)

// path is a row of tendons from the side: its heights above the soffit at places from end A, mm, straight between them.
type path struct {
	name                           string
	x, y                           []float64
	level, end, debonded, heldDown cell   // not taken if not given
	places                         []cell // heights at the places, where they were given one by one
}

// straight tells whether the row keeps one height.
func (p path) straight() bool {
	for _, y := range p.y {
		if math.Abs(y-p.y[0]) > near {
			return false
		}
	}
	return true
}

// at is the height at a place.
func (p path) at(x float64) float64 {
	for i := 1; i < len(p.x); i++ {
		if x <= p.x[i] {
			if p.x[i] == p.x[i-1] {
				return p.y[i]
			}
			return p.y[i-1] + (p.y[i]-p.y[i-1])*(x-p.x[i-1])/(p.x[i]-p.x[i-1])
		}
	}
	return p.y[len(p.y)-1]
}

// apart is the least distance of the heights of two rows other than 0, 0 if there is none.
func (p path) apart(o path) float64 {
	least := math.Inf(1)
	for i, x := range p.x {
		if p.straight() || !o.straight() && i != 0 && i != len(p.x)-1 && i != len(p.x)/2 {
			continue // lines that cross come as near as they like
		}
		if d := math.Abs(p.y[i] - o.at(x)); d > near {
			least = min(least, d)
		}
	}
	if p.straight() && o.straight() {
		least = math.Abs(p.y[0] - o.y[0])
	}
	if math.IsInf(least, 1) {
		return 0
	}
	return least
}

// paths reads the rows of tendons of an elevation, see there.
func (d *data) paths() []path {
	if d.has("profile-y") {
		return d.profiles()
	}
	level := d.rows("level")
	optional := func(role string) column {
		if d.has(role) {
			return d.beside(role, level)
		}
		return column{cells: make([]cell, level.len())}
	}
	debonded, end, held := optional("debonded"), optional("end-level"), optional("held-down")
	length := d.one("length").value
	if d.err != nil {
		return nil
	}
	var out []path
	for i, v := range level.cells {
		p := path{name: level.axis.Rows[i], x: []float64{0, length}, y: []float64{v.value, v.value}, level: v, debonded: debonded.cells[i]}
		if at := held.cells[i].value; at > 0 && end.cells[i].taken() && math.Abs(end.cells[i].value-v.value) > near {
			if 2*at > length {
				d.fail("row %s is held down %s from the ends of %g m", p.name, held.cells[i].shown, length/1000)
			}
			p.end, p.heldDown = end.cells[i], held.cells[i]
			p.x = []float64{0, at, length - at, length}
			p.y = []float64{p.end.value, v.value, v.value, p.end.value}
		}
		out = append(out, p)
	}
	return out
}

// profiles reads rows whose heights are given at stations.
func (d *data) profiles() []path {
	x := d.stations("profile-x")
	rows := d.axis("profile-y", false)
	if d.err != nil {
		return nil
	}
	if !d.runs("profile-y", true) {
		d.fail("role \"profile-y\" does not run over %s", x.axis.Name)
		return nil
	}
	debonded := column{cells: make([]cell, len(rows.Rows))}
	if d.has("debonded") {
		debonded = d.beside("debonded", column{axis: rows, cells: debonded.cells})
	}
	var out []path
	for i, name := range rows.Rows {
		p := path{name: name, debonded: debonded.cells[i]}
		y := d.over("profile-y", x.axis, d.place().With(rows, i))
		var order []int
		for k := range y.cells {
			if y.cells[k].taken() && x.cells[k].taken() {
				order = append(order, k)
			}
		}
		slices.SortStableFunc(order, func(a, b int) int { return cmp.Compare(x.cells[a].value, x.cells[b].value) })
		if len(order) < 2 {
			d.fail("role \"profile-y\": row %s has fewer than two heights", name)
			return nil
		}
		for _, k := range order {
			p.x, p.y, p.places = append(p.x, x.cells[k].value), append(p.y, y.cells[k].value), append(p.places, y.cells[k])
		}
		out = append(out, p)
	}
	return out
}

// lowest is the height of a row given at stations that is least, the first of several.
func (p path) lowest() cell {
	best := p.places[0]
	for _, v := range p.places {
		if v.value < best.value {
			best = v
		}
	}
	return best
}

// tendons draws a line for each row, dashed where it is debonded, with a ring where it is held down, and gives the
// listing of the rows.
func (e *sideView) tendons(c draw.Canvas, up scale) listing {
	l := listing{}
	type field struct {
		head string
		of   func(p path) cell // not taken where there is nothing to say
	}
	none := cell{}
	bent := func(v func(p path) cell) func(p path) cell {
		return func(p path) cell {
			if p.places == nil || p.straight() {
				return none
			}
			return v(p)
		}
	}
	fields := []field{
		{"height", func(p path) cell {
			if p.places != nil && p.straight() {
				return p.places[0]
			}
			return p.level
		}},
		{"at end A", bent(func(p path) cell { return p.places[0] })},
		{"lowest", bent(path.lowest)},
		{"at end B", bent(func(p path) cell { return p.places[len(p.places)-1] })},
		{"at ends", func(p path) cell { return p.end }},
		{"held down at", func(p path) cell { return p.heldDown }},
		{"debonded", func(p path) cell { return pick(p.debonded.value > 0, p.debonded, none) }},
	}
	l.heads = []label{words("row")}
	var shown []field
	for _, k := range fields {
		if slices.ContainsFunc(e.rows, func(p path) bool { return k.of(p).taken() }) {
			shown = append(shown, k)
			l.heads = append(l.heads, words(k.head))
		}
	}
	for _, p := range e.rows {
		at := func(x float64) draw.Point { return draw.Point{X: draw.Pt(x) * e.per, Y: -up.of(p.at(x))} }
		part := func(from, to float64, style draw.Style) {
			pts := []draw.Point{at(from)}
			for _, x := range p.x {
				if x > from && x < to {
					pts = append(pts, at(x))
				}
			}
			c.Polyline(append(pts, at(to)), style)
		}
		length := e.length.value
		loose := min(p.debonded.value, length/2)
		if loose > 0 {
			for _, k := range [2][3]float64{{0, loose, loose}, {length - loose, length, length - loose}} {
				part(k[0], k[1], draw.Style{Stroke: hair, Dash: dashed})
				q := at(k[2])
				c.Line(q.X, q.Y-1.4, q.X, q.Y+1.4, hair)
			}
		}
		part(loose, length-loose, draw.Style{Stroke: medium})
		if p.heldDown.taken() {
			for _, x := range p.x[1:3] {
				q := at(x)
				c.Circle(q.X, q.Y, 1.6, draw.Style{Stroke: hair, Fill: draw.White})
			}
		}
		line := listed{from: e.l + clearance, y: at(length).Y, name: p.name}
		for _, k := range shown {
			v := k.of(p)
			if !v.taken() {
				line.columns = append(line.columns, text(""))
				continue
			}
			line.columns = append(line.columns, entry{label{}.value(v), beforePoint(v)})
		}
		l.lines = append(l.lines, line)
	}
	return l
}
