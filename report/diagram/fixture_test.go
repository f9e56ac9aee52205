package diagram

import (
	"fmt"
	"math"
	"slices"
	"strconv"
	"strings"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/quantity"
	cross "soffit/calc/section"
	"soffit/calc/trace"
)

// invented is a member made up for these tests: nobody's design, with forces and strains that agree among
// themselves only as far as the pictures need it.
type invented struct {
	name     string
	parts    [][3]float64 // height, lower, upper width, mm, from the soffit up; or
	form     cross.Form
	dims     []dimension // beside those of the parts
	topping  [2]float64  // width, depth, mm
	tendons  []row
	bars     []row
	length   float64 // m
	a, b     float64 // bearing centres from end A, m
	bearing  [2]float64
	loads    []load
	stations []station
	centroid float64
	x        float64 // neutral axis, mm
	capacity float64 // resistance to the greatest moment, 0 for 1.12
	ducts    bool

	set *cross.Contour // of form, once set out
}

// row is a row of tendons or bars; places, if given, are those of each, end is another height at the ends, held how far
// from them it is held down.
type row struct {
	name                            string
	count                           int
	spacing, level, diameter, loose float64 // mm, loose in m
	places                          []float64
	end, held                       float64   // mm, m
	duct                            float64   // mm
	strands                         int       // in a duct
	profile                         []float64 // heights at the ends of twelve equal parts of the length, mm
}

// dimension is one of a section, mm.
type dimension struct {
	name           string
	x1, y1, x2, y2 float64
}

type load struct {
	name           string
	q, f, from, to float64 // kN/m, kN, m
}

type station struct {
	name string
	x    float64
}

// book writes givens with less ceremony.
type book struct {
	t    testing.TB
	note *trace.Note
	b    *trace.Block
}

func (k book) value(id, symbol, unit string, decimals int, v float64) trace.Plot {
	k.b.Given(&clause.Given{ID: id, Symbol: symbol, Name: id, Unit: unit}, k.literal(unit, decimals, v), "invented")
	return trace.Plot{Role: id, Key: id}
}

func (k book) literal(unit string, decimals int, v float64) quantity.Literal {
	return quantity.Literal{Number: strconv.FormatFloat(v, 'f', decimals, 64), Unit: quantity.MustUnit(unit)}
}

func (k book) rows(id, symbol, unit string, decimals int, axes []*trace.Axis, v []float64) trace.Plot {
	var ls []quantity.Literal
	for _, x := range v {
		ls = append(ls, k.literal(unit, decimals, x))
	}
	k.b.GivenOver(&clause.Given{ID: id, Symbol: symbol, Name: id, Unit: unit}, axes, ls, "invented")
	return trace.Plot{Role: id, Key: id}
}

func each[T any](in []T, f func(T) float64) []float64 {
	var out []float64
	for _, x := range in {
		out = append(out, f(x))
	}
	return out
}

// contour is the section as rings and voids.
func (m *invented) contour(t testing.TB) cross.Contour {
	if m.set != nil {
		return *m.set
	}
	if m.form != nil {
		o, err := m.form.Outline()
		if err != nil {
			t.Fatal(err)
		}
		c := o.Contour()
		m.set = &c
		return c
	}
	var right, left cross.Ring
	y := 0.0
	add := func(w, y float64) {
		right = append(right, cross.Point{X: w / 2, Y: y})
		left = append(cross.Ring{{X: -w / 2, Y: y}}, left...)
	}
	for i, p := range m.parts {
		if i == 0 || m.parts[i-1][2] != p[1] {
			add(p[1], y)
		}
		y += p[0]
		add(p[2], y)
	}
	return cross.Contour{Outer: []cross.Ring{append(right, left...)}}
}

// dimensions are those stated and, of parts, their heights and widths.
func (m *invented) dimensions() []dimension {
	out := m.dims
	y := 0.0
	for i, p := range m.parts {
		w := min(p[1], p[2]) / 2
		out = append(out, dimension{fmt.Sprintf("depth %d", i+1), -w, y, -w, y + p[0]},
			dimension{fmt.Sprintf("lower width %d", i+1), -p[1] / 2, y, p[1] / 2, y},
			dimension{fmt.Sprintf("upper width %d", i+1), -p[2] / 2, y + p[0], p[2] / 2, y + p[0]})
		y += p[0]
	}
	return out
}

// depth is the whole height of the bare section, mm.
func (m *invented) depth(t testing.TB) float64 {
	var h float64
	for _, p := range m.contour(t).Outer[0] {
		h = max(h, p.Y)
	}
	return h
}

// width is the net width of section and topping at a height, mm.
func (m *invented) width(t testing.TB, y float64) float64 {
	c := m.contour(t)
	if h := m.depth(t); y > h {
		return m.topping[0]
	}
	var w float64
	across := func(r cross.Ring, sign float64) {
		var at []float64
		for i, p := range r {
			q := r[(i+1)%len(r)]
			if (p.Y > y) != (q.Y > y) {
				at = append(at, p.X+(q.X-p.X)*(y-p.Y)/(q.Y-p.Y))
			}
		}
		slices.Sort(at)
		for i := 1; i < len(at); i += 2 {
			w += sign * (at[i] - at[i-1])
		}
	}
	for _, r := range c.Outer {
		across(r, 1)
	}
	for _, r := range c.Holes {
		across(r, -1)
	}
	for _, v := range c.Voids { // round ones
		if d := v.Depth/2 - math.Abs(y-v.Y); d > 0 {
			w -= v.Width - v.Depth + 2*math.Sqrt(d*(v.Depth-d))
		}
	}
	return w
}

// note records the member and one figure of each kind.
func (m *invented) note(t testing.TB) (*trace.Note, map[string]*trace.Figure) {
	t.Helper()
	n := trace.New(trace.Document{Title: "invented"})
	names := func(r []row) (out []string) {
		for _, x := range r {
			out = append(out, x.name)
		}
		return out
	}
	var loadNames, stationNames, cornerNames, dimensionNames []string
	var corners [][3]float64
	outer := m.contour(t)
	for k, r := range append(slices.Clone(outer.Outer), outer.Holes...) {
		for _, p := range r {
			cornerNames = append(cornerNames, strconv.Itoa(len(corners)+1))
			corners = append(corners, [3]float64{p.X, p.Y, float64(k)})
		}
	}
	dims := m.dimensions()
	for _, d := range dims {
		dimensionNames = append(dimensionNames, d.name)
	}
	for _, l := range m.loads {
		loadNames = append(loadNames, l.name)
	}
	for _, s := range m.stations {
		stationNames = append(stationNames, s.name)
	}
	stations := n.Axis("stations", "stations", "", stationNames)
	tendons := n.Axis("tendons", "rows of tendons", "i", names(m.tendons))
	parts := n.Axis("corners", "corners of the section", "n", cornerNames)
	measures := n.Axis("dimensions", "dimensions of the section", "n", dimensionNames)
	loads := n.Axis("loads", "loads", "n", loadNames)
	var bars *trace.Axis
	if len(m.bars) > 0 {
		bars = n.Axis("bars", "rows of bars", "j", names(m.bars))
	}
	ch := n.Chapter("all", "All")
	k := book{t, n, ch.Block("geometry", "Geometry", nil)}
	over := func(a *trace.Axis) []*trace.Axis { return []*trace.Axis{a} }
	corner := func(k int) func(p [3]float64) float64 { return func(p [3]float64) float64 { return p[k] } }
	outline := []trace.Plot{
		k.rows("corner-x", "x_{k,n}", "mm", 1, over(parts), each(corners, corner(0))),
		k.rows("corner-y", "y_{k,n}", "mm", 1, over(parts), each(corners, corner(1))),
		k.rows("corner-ring", "r_{k,n}", "", 0, over(parts), each(corners, corner(2))),
	}
	if len(outer.Voids) > 0 {
		var names []string
		for i := range outer.Voids {
			names = append(names, strconv.Itoa(i+1))
		}
		voids := over(n.Axis("voids", "voids", "n", names))
		outline = append(outline,
			k.rows("void-x", "x_{o,n}", "mm", 1, voids, each(outer.Voids, func(v cross.Round) float64 { return v.X })),
			k.rows("void-y", "y_{o,n}", "mm", 1, voids, each(outer.Voids, func(v cross.Round) float64 { return v.Y })),
			k.rows("void-width", "w_{o,n}", "mm", 1, voids, each(outer.Voids, func(v cross.Round) float64 { return v.Width })),
			k.rows("void-depth", "d_{o,n}", "mm", 1, voids, each(outer.Voids, func(v cross.Round) float64 { return v.Depth })))
	}
	if m.topping[1] > 0 {
		outline = append(outline, k.value("topping-width", "b_top", "mm", 0, m.topping[0]), k.value("topping-depth", "h_top", "mm", 0, m.topping[1]))
	}
	ends := []trace.Plot{
		k.rows("dimension", "v_n", "mm", 0, over(measures), each(dims, func(d dimension) float64 { return math.Hypot(d.x2-d.x1, d.y2-d.y1) })),
		k.rows("dimension-x1", "x_{1,n}", "mm", 1, over(measures), each(dims, func(d dimension) float64 { return d.x1 })),
		k.rows("dimension-y1", "y_{1,n}", "mm", 1, over(measures), each(dims, func(d dimension) float64 { return d.y1 })),
		k.rows("dimension-x2", "x_{2,n}", "mm", 1, over(measures), each(dims, func(d dimension) float64 { return d.x2 })),
		k.rows("dimension-y2", "y_{2,n}", "mm", 1, over(measures), each(dims, func(d dimension) float64 { return d.y2 })),
	}
	rows := func(prefix, index string, a *trace.Axis, r []row) []trace.Plot {
		return []trace.Plot{
			k.rows(prefix+"count", "n_{c,"+index+"}", "", 0, over(a), each(r, func(r row) float64 { return float64(r.count) })),
			k.rows(prefix+"spacing", "s_{"+index+"}", "mm", 0, over(a), each(r, func(r row) float64 { return r.spacing })),
			k.rows(prefix+"level", "y_{"+index+"}", "mm", 0, over(a), each(r, func(r row) float64 { return r.level })),
			k.rows(prefix+"diameter", "ø_{"+index+"}", "mm", 1, over(a), each(r, func(r row) float64 { return r.diameter })),
		}
	}
	tp := rows("", "i", tendons, m.tendons)
	level := tp[2]
	var deflected []trace.Plot
	if slices.ContainsFunc(m.tendons, func(r row) bool { return r.end > 0 }) {
		deflected = []trace.Plot{
			k.rows("end-level", "y_{e,i}", "mm", 0, over(tendons), each(m.tendons, func(r row) float64 { return max(r.end, r.level) })),
			k.rows("held-down", "l_{h,i}", "m", 2, over(tendons), each(m.tendons, func(r row) float64 { return r.held }))}
		tp = append(tp, deflected[0])
	}
	if m.ducts {
		tp = append(tp, k.rows("duct-diameter", "ø_{d,i}", "mm", 0, over(tendons), each(m.tendons, func(r row) float64 { return r.duct })),
			k.rows("strands", "n_{s,i}", "", 0, over(tendons), each(m.tendons, func(r row) float64 { return float64(r.strands) })))
	}
	single := func(prefix, index string, rs []row) []trace.Plot {
		if !slices.ContainsFunc(rs, func(r row) bool { return r.places != nil }) {
			return nil
		}
		var x, no []float64
		var names []string
		for i, r := range rs {
			for j := range r.count {
				at := (float64(j) - float64(r.count-1)/2) * r.spacing
				if r.places != nil {
					at = r.places[j]
				}
				x, no, names = append(x, at), append(no, float64(i)), append(names, fmt.Sprintf("%s-%d", r.name, j+1))
			}
		}
		one := over(n.Axis(prefix+"tendon positions", "one by one", "m", names))
		return []trace.Plot{k.rows(prefix+"position-x", "x_{"+index+",m}", "mm", 1, one, x), k.rows(prefix+"position-row", "n_{"+index+",m}", "", 0, one, no)}
	}
	tp = append(tp, single("", "p", m.tendons)...)
	debonded := k.rows("debonded", "l_{db,i}", "m", 2, over(tendons), each(m.tendons, func(r row) float64 { return r.loose }))
	var bp []trace.Plot
	if bars != nil {
		bp = append(rows("bar-", "j", bars, m.bars), single("bar-", "s", m.bars)...)
	}
	centroid := k.value("centroid", "y_s", "mm", 2, m.centroid)
	depth := k.value("depth", "h", "mm", 0, m.depth(t))
	sec := append(append(append([]trace.Plot{centroid, depth}, slices.Concat(outline, ends)...), tp...), bp...)
	total := m.depth(t) + m.topping[1]
	whole := k.value("total-depth", "h_tot", "mm", 0, total)
	if m.topping[1] > 0 {
		sec = append(sec, whole, k.value("composite-centroid", "y_co", "mm", 2, m.centroid+0.6*(total-m.centroid)*m.topping[1]/total))
	}
	k.b.Figure("fig-section", "section", "Section", "", sec...)
	k.b.Figure("fig-section-loose", "section", "Section, debonded shown", "", append([]trace.Plot{debonded}, sec...)...)

	el := []trace.Plot{depth, debonded, level,
		k.value("length", "l", "m", 2, m.length),
		k.value("support-A", "x_A", "m", 3, m.a), k.value("support-B", "x_B", "m", 3, m.b),
		k.value("span", "l_eff", "m", 3, m.b-m.a),
		k.value("bearing-A", "l_A", "mm", 0, m.bearing[0]), k.value("bearing-B", "l_B", "mm", 0, m.bearing[1]),
		k.rows("load-q", "q_n", "kN/m", 2, over(loads), each(m.loads, func(l load) float64 { return l.q })),
		k.rows("load-F", "F_n", "kN", 1, over(loads), each(m.loads, func(l load) float64 { return l.f })),
		k.rows("load-from", "a_n", "m", 2, over(loads), each(m.loads, func(l load) float64 { return l.from })),
		k.rows("load-to", "c_n", "m", 2, over(loads), each(m.loads, func(l load) float64 { return l.to })),
	}
	if m.ducts { // the last load also acts along the member
		along := make([]float64, len(m.loads))
		along[len(along)-1] = 120
		el = append(el, k.rows("load-N", "N_n", "kN", 0, over(loads), along))
	}
	k.b.Figure("fig-elevation", "elevation", "Elevation", "", el...)
	seen := append(append(append([]trace.Plot{}, el...), outline...), deflected...)
	if m.length-m.b > 0 {
		seen = append(seen, k.value("overhang-B", "a_B", "m", 3, m.length-m.b))
	}
	if bars != nil {
		seen = append(seen, bp[2])
	}
	k.b.Figure("fig-elevation-parts", "elevation", "Elevation with its edges", "", seen...)

	m.effects(ch, n, stations, el[4:6])
	if slices.ContainsFunc(m.tendons, func(r row) bool { return r.profile != nil }) {
		m.profiles(ch, n, tendons, seen)
	}
	outline = append(outline, tp...)
	outline = append(outline, bp...)
	m.bending(ch, n, stations, tendons, bars, outline, total)
	m.stress(ch, n, stations, tendons)
	if err := n.Err(); err != nil {
		t.Fatal(err)
	}
	figs := map[string]*trace.Figure{}
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		if f, ok := e.(*trace.Figure); ok {
			_, id, _ := cut(f.Key)
			figs[id] = f
		}
	})
	return n, figs
}

func cut(key string) (string, string, bool) {
	for i := range key {
		if key[i] == '/' {
			return key[:i], key[i+1:], true
		}
	}
	return key, "", false
}

// moment and shear of the loads times factors for the first load and the others, kN·m and kN, at x m.
func (m *invented) moment(x, g, q float64) (mom, left, right float64) {
	var ra, rb float64
	for i, l := range m.loads {
		k := q
		if i == 0 {
			k = g
		}
		w, at := k*l.f, l.from // the resultant
		if l.f == 0 {
			w, at = k*l.q*(l.to-l.from), (l.from+l.to)/2
		}
		ra += w * (m.b - at) / (m.b - m.a)
		rb += w * (at - m.a) / (m.b - m.a)
		if l.f == 0 { // the part left of x
			d := min(max(x-l.from, 0), l.to-l.from)
			w, at = k*l.q*d, l.from+d/2
		}
		if at < x {
			mom -= w * (x - at)
			left -= w
		}
		if at < x || l.f != 0 && at == x {
			right -= w
		}
	}
	for _, r := range [][2]float64{{ra, m.a}, {rb, m.b}} {
		if r[1] < x {
			mom += r[0] * (x - r[1])
			left += r[0]
		}
		if r[1] <= x {
			right += r[0]
		}
	}
	return mom, left, right
}

func (m *invented) effects(ch *trace.Chapter, n *trace.Note, stations *trace.Axis, supports []trace.Plot) {
	k := book{nil, n, ch.Block("effects", "Effects", stations)}
	over := []*trace.Axis{stations}
	get := func(pick func(x float64) float64) []float64 {
		return each(m.stations, func(s station) float64 { return pick(s.x) })
	}
	hi := func(i int) func(x float64) float64 {
		return func(x float64) float64 {
			a, b, c := m.moment(x, 1.35, 1.5)
			d, e, f := m.moment(x, 1, 0)
			return max([3]float64{a, b, c}[i], [3]float64{d, e, f}[i])
		}
	}
	lo := func(i int) func(x float64) float64 {
		return func(x float64) float64 {
			a, b, c := m.moment(x, 1.35, 1.5)
			d, e, f := m.moment(x, 1, 0)
			return min([3]float64{a, b, c}[i], [3]float64{d, e, f}[i])
		}
	}
	sup := append([]trace.Plot(nil), supports...)
	for i := range sup {
		sup[i].Key = "all.geometry/" + sup[i].Role
	}
	x := k.rows("x", "x", "m", 3, over, get(func(x float64) float64 { return x }))
	plots := []trace.Plot{x,
		k.rows("M-max", "M_{Ed,max}", "kN·m", 1, over, get(hi(0))), k.rows("M-min", "M_{Ed,min}", "kN·m", 1, over, get(lo(0))),
		k.rows("V-left-max", "V_{l,max}", "kN", 1, over, get(hi(1))), k.rows("V-left-min", "V_{l,min}", "kN", 1, over, get(lo(1))),
		k.rows("V-right-max", "V_{r,max}", "kN", 1, over, get(hi(2))), k.rows("V-right-min", "V_{r,min}", "kN", 1, over, get(lo(2))),
	}
	k.b.Figure("fig-effects", "effects", "Effects", "", append(plots, sup...)...)

	var most float64
	for _, v := range get(hi(0)) {
		most = max(most, v)
	}
	lt := 0.08 * m.length
	if most *= m.capacity / 1.12; m.capacity == 0 {
		most = max(slices.Max(get(hi(0))), 1)
	}
	res := k.rows("resistance", "M_Rd", "kN·m", 1, over, get(func(x float64) float64 {
		d := min(x, m.length-x)
		r := most * 1.12 * min(1, d/lt)
		for _, t := range m.tendons {
			if t.loose > 0 && d < t.loose+lt {
				r = min(r, most*1.12*(0.7+0.3*max(0, d-t.loose)/lt)*min(1, d/lt))
			}
		}
		return r
	}))
	dem := plots[1]
	dem.Role = "demand"
	check := &clause.Check{ID: "bending", Name: "bending", Demand: "M_{Ed,max}", Limit: "M_Rd"}
	k.b.Check(check)
	k.b.Figure("fig-resistance", "resistance", "Resistance", "", append([]trace.Plot{x, dem, res}, sup...)...)
	least := plots[2]
	least.Role = "demand-least"
	hog := slices.Min(get(lo(0)))
	up := k.rows("resistance-hogging", "M_{Rd,h}", "kN·m", 1, over, get(func(x float64) float64 { return max(1.3*-hog, 0.3*most) * min(1, x/lt+0.3, (m.length-x)/lt+0.3) }))
	k.b.Figure("fig-resistance-both", "resistance", "Resistances", "", append([]trace.Plot{x, dem, res, least, up}, sup...)...)
}

func (m *invented) stress(ch *trace.Chapter, n *trace.Note, stations, tendons *trace.Axis) {
	k := book{nil, n, ch.Block("transfer", "Transfer", stations)}
	over := []*trace.Axis{stations, tendons}
	var present, available []float64
	for _, s := range m.stations {
		d := min(s.x, m.length-s.x)
		for i, t := range m.tendons {
			lt := 70 * t.diameter / 1000
			if t.duct > 0 { // stressed from end A, friction and draw-in
				v := 1300 - 6*s.x
				if s.x < 0.4*m.length {
					v = 1300 - 6*(0.8*m.length-s.x)
				}
				present, available = append(present, v-20*float64(i)), append(available, 1426.1)
				continue
			}
			present = append(present, (1120-float64(i%2)*15)*max(0, min(1, (d-t.loose)/lt)))
			e := max(0, d-t.loose)
			switch {
			case e < lt:
				available = append(available, 1105*e/lt)
			default:
				available = append(available, min(1426.1, 1105+(1426.1-1105)*(e-lt)/(1.4*lt)))
			}
		}
	}
	var pulled []trace.Plot
	if m.ducts {
		pulled = append(pulled, k.rows("stressed-A", "n_{A,i}", "", 0, []*trace.Axis{tendons}, each(m.tendons, func(r row) float64 { return min(r.duct, 1) })))
	}
	k.b.Figure("fig-stress", "tendon-stress", "Stress", "", append(pulled,
		trace.Plot{Role: "x", Key: "all.effects/x"},
		k.rows("present", "σ_{pm,i}", "MPa", 1, over, present),
		k.rows("available", "σ_{pd,i}", "MPa", 1, over, available))...)
}

// profiles draws the elevation with heights of tendons given at the ends of twelve parts of the length.
func (m *invented) profiles(ch *trace.Chapter, n *trace.Note, tendons *trace.Axis, seen []trace.Plot) {
	const parts = 12
	var names []string
	var x, y []float64
	for i := range parts + 1 {
		names = append(names, fmt.Sprintf("point %d", i))
		x = append(x, m.length*float64(i)/parts)
		for _, r := range m.tendons {
			if r.profile == nil {
				y = append(y, r.level)
				continue
			}
			y = append(y, r.profile[i])
		}
	}
	points := n.Axis("points", "points of the tendons", "", names)
	k := book{nil, n, ch.Block("profiles", "Profiles", points)}
	plots := []trace.Plot{k.rows("profile-x", "x_p", "m", 3, []*trace.Axis{points}, x), k.rows("profile-y", "y_{p,i}", "mm", 0, []*trace.Axis{points, tendons}, y)}
	for _, p := range seen {
		switch p.Role {
		case "level", "end-level", "held-down":
		default:
			plots = append(plots, trace.Plot{Role: p.Role, Key: "all.geometry/" + strings.TrimPrefix(p.Key, "all.geometry/")})
		}
	}
	k.b.Figure("fig-elevation-profile", "elevation", "Elevation with profiles", "", plots...)
}

func (m *invented) bending(ch *trace.Chapter, n *trace.Note, stations, tendons, bars *trace.Axis, outline []trace.Plot, h float64) {
	const ecu, ep0 = 3.5, 5.6
	every := func(v float64) []float64 { return each(m.stations, func(station) float64 { return v }) }
	over := []*trace.Axis{stations}
	lines := func(of func(role string) bool) (out []trace.Plot) {
		for _, p := range outline {
			if of(p.Role) {
				out = append(out, trace.Plot{Role: p.Role, Key: "all.geometry/" + strings.TrimPrefix(p.Key, "all.geometry/")})
			}
		}
		return out
	}
	shape := lines(func(r string) bool {
		return strings.HasPrefix(r, "corner") || strings.HasPrefix(r, "void") || strings.HasPrefix(r, "topping")
	})
	rows := lines(func(r string) bool {
		switch r {
		case "level", "bar-level", "end-level":
			return false
		}
		return !strings.HasPrefix(r, "corner") && !strings.HasPrefix(r, "void") && !strings.HasPrefix(r, "topping")
	})
	at := func(r row, hogging bool) float64 { return pick(hogging, r.level, h-r.level) }
	// state records a state of equilibrium in a block of its own.
	state := func(slug string, x, fcd float64, hogging, curved bool) (*trace.Block, []trace.Plot) {
		b := ch.Block(slug, "Bending", stations)
		k := book{nil, n, b}
		area := func(depth float64) (a, s float64) { // of the section down to a depth, with its moment about the edge
			const strips = 300
			for i := range strips {
				t := (float64(i) + 0.5) / strips * depth
				w := m.width(k.t, pick(hogging, t, h-t))
				a += w * depth / strips
				s += w * depth / strips * t
			}
			return a, s
		}
		a, s := area(min(0.8*x, h))
		fc, yc := a*fcd/1000, s/a
		strain := func(d float64) float64 { return ecu * (d - x) / x }
		plots := append(slices.Clone(shape), k.value("h", "h", "mm", 0, h),
			k.rows("neutral-axis", "x", "mm", 2, over, every(x)),
			k.value("block-stress", "f_cd", "MPa", 3, fcd),
			k.rows("block-force", "F_c", "kN", 1, over, every(fc)),
			k.rows("block-centroid", "d_c", "mm", 2, over, every(yc)),
			k.value("strain-top", "ε_cu3", "‰", 1, ecu))
		if curved {
			const fibres = 64
			var names []string
			var level, stress []float64
			for i := range fibres {
				y := h * (float64(i) + 0.5) / fibres
				names = append(names, strconv.Itoa(i+1))
				level = append(level, y)
				e := ecu * (x - pick(hogging, y, h-y)) / x
				v := fcd * (1 - math.Pow(1-min(max(e, 0), 2)/2, 2))
				if m.topping[1] > 0 && y > h-m.topping[1] {
					v *= 0.7
				}
				stress = append(stress, v)
			}
			axis := n.Axis("fibres "+slug, "fibres", "m", names)
			var all []float64
			for range m.stations {
				all = append(all, stress...)
			}
			plots = append(plots, k.rows("fibre-level", "y_{f,m}", "mm", 2, []*trace.Axis{axis}, level),
				k.rows("fibre-stress", "σ_{c,m}", "MPa", 2, []*trace.Axis{stations, axis}, all))
		} else {
			plots = append(plots, k.rows("block-depth", "a", "mm", 2, over, every(0.8*x)))
		}
		if hogging {
			plots = append(plots, k.value("hogging", "n_h", "", 0, 1))
		}
		grid := func(id, symbol, unit string, dec int, a *trace.Axis, rs []row, f func(row) float64) {
			var v []float64
			for range m.stations {
				v = append(v, each(rs, f)...)
			}
			plots = append(plots, k.rows(id, symbol, unit, dec, []*trace.Axis{stations, a}, v))
		}
		total := 0.0
		for _, r := range m.tendons {
			total += float64(r.count)
		}
		whole := func(r row) float64 { return ep0 - r.level/1000 + strain(at(r, hogging)) }
		plots = append(plots, k.rows("depth", "d_i", "mm", 0, []*trace.Axis{tendons}, each(m.tendons, func(r row) float64 { return at(r, hogging) })))
		grid("prestrain", "ε_{p0,i}", "‰", 4, tendons, m.tendons, func(r row) float64 { return ep0 - r.level/1000 })
		grid("strain", "ε_{p,i}", "‰", 3, tendons, m.tendons, whole)
		grid("force", "F_{p,i}", "kN", 1, tendons, m.tendons, func(r row) float64 { return fc * float64(r.count) / total })
		grid("lever", "z_i", "mm", 2, tendons, m.tendons, func(r row) float64 { return at(r, hogging) - yc })
		if bars != nil {
			plots = append(plots, k.rows("bar-depth", "d_{s,j}", "mm", 0, []*trace.Axis{bars}, each(m.bars, func(r row) float64 { return at(r, hogging) })))
			grid("bar-strain", "ε_{s,j}", "‰", 3, bars, m.bars, func(r row) float64 { return strain(at(r, hogging)) })
			grid("bar-force", "F_{s,j}", "kN", 1, bars, m.bars, func(r row) float64 {
				return float64(r.count) * math.Pi / 4 * r.diameter * r.diameter * max(-435, min(435, strain(at(r, hogging))*200)) / 1000
			})
			grid("bar-lever", "z_{s,j}", "mm", 2, bars, m.bars, func(r row) float64 { return at(r, hogging) - yc })
		}
		return b, append(plots, k.rows("resistance", "M_Rd", "kN·m", 1, over, every(fc*(0.85*h-yc)/1000)))
	}
	b, plots := state("bending", m.x, 30, false, false)
	b.Figure("fig-ultimate-bare", "ultimate", "Strain, stress and forces, rows as lines", "midspan", slices.Clone(plots)...)
	b.Figure("fig-ultimate", "ultimate", "Strain, stress and forces", "midspan", append(plots, rows...)...)
	b, plots = state("bending-hogging", 0.22*h, 28, true, false)
	b.Figure("fig-ultimate-hogging", "ultimate", "Strain, stress and forces, hogging", "midspan", append(plots, rows...)...)
	b, plots = state("bending-curve", max(m.x, 0.2*h), 26, false, true)
	b.Figure("fig-ultimate-curve", "ultimate", "Strain, stress and forces, stress as a curve", "midspan", append(plots, rows...)...)
}

// sample members.
func tBeam() *invented {
	m := &invented{
		parts:   [][3]float64{{550, 300, 300}, {60, 300, 420}, {140, 1200, 1200}},
		tendons: []row{{name: "bottom", count: 6, spacing: 45, level: 50, diameter: 12.5}, {name: "second", count: 4, spacing: 50, level: 95, diameter: 12.5, loose: 1.5}, {name: "top", count: 2, spacing: 200, level: 690, diameter: 9.3}},
		bars:    []row{{name: "soffit", count: 2, spacing: 210, level: 45, diameter: 16}},
		length:  14.3, a: 0.15, b: 14.15, bearing: [2]float64{200, 200},
		loads: []load{{"self-weight", 8.61, 0, 0, 14.3}, {"finishes", 2.4, 0, 0, 14.3}, {"imposed", 6, 0, 0, 14.3},
			{"partition", 4, 0, 2, 9}, {"crane", 0, 45, 7.15, 7.15}},
		centroid: 512.37, x: 69.323,
	}
	m.mesh()
	return m
}

func iBeam() *invented {
	m := &invented{
		parts:  [][3]float64{{150, 500, 500}, {100, 500, 160}, {630, 160, 160}, {120, 160, 700}, {200, 700, 700}},
		length: 24, a: 0.2, b: 23.8, bearing: [2]float64{250, 250},
		loads:    []load{{"self-weight", 12.1, 0, 0, 24}, {"deck", 9.5, 0, 0, 24}, {"imposed", 14, 0, 0, 24}},
		centroid: 603.18, x: 152.4,
	}
	for i := range 8 {
		m.tendons = append(m.tendons, row{name: fmt.Sprintf("%d", i+1), count: 8, spacing: 50, level: 50 + 45*float64(i), diameter: 15.2, loose: float64(i%3) * 1.5})
		if i > 3 {
			m.tendons[i].count = 2
			m.tendons[i].spacing = 60
		}
	}
	m.mesh()
	return m
}

func plank() *invented {
	m := &invented{
		parts:   [][3]float64{{150, 1200, 1200}},
		tendons: []row{{name: "lower", count: 10, spacing: 110, level: 30, diameter: 9.3}},
		length:  5.2, a: 0.05, b: 5.15, bearing: [2]float64{70, 70},
		loads:    []load{{"self-weight", 4.5, 0, 0, 5.2}, {"screed", 1.2, 0, 0, 5.2}, {"imposed", 3, 0, 0, 5.2}},
		centroid: 75, x: 24.31,
	}
	m.mesh()
	return m
}

// mesh sets the stations: forty parts of the length, bearings, loads and ends of debonding.
func (m *invented) mesh() {
	at := map[int]string{}
	add := func(x float64, name string) {
		mm := int(math.Round(x * 1000))
		if mm < 0 || mm > int(math.Round(m.length*1000)) {
			return
		}
		if _, ok := at[mm]; !ok {
			at[mm] = name
		}
	}
	add(m.length/2, "midspan")
	add(m.a, "A")
	add(m.b, "B")
	for i := range 41 {
		add(m.length*float64(i)/40, fmt.Sprintf("%.4gL", float64(i)/40))
	}
	for _, l := range m.loads {
		add(l.from, "from:"+l.name)
		add(l.to, "to:"+l.name)
	}
	for _, t := range m.tendons {
		for _, e := range []float64{0, 70, 168} {
			x := t.loose + e*t.diameter/1000
			add(x, "t:"+t.name+strconv.Itoa(int(e)))
			add(m.length-x, "u:"+t.name+strconv.Itoa(int(e)))
		}
	}
	m.stations = nil
	for mm := range int(math.Round(m.length*1000)) + 1 {
		if name, ok := at[mm]; ok {
			m.stations = append(m.stations, station{name, float64(mm) / 1000})
		}
	}
}

func samples() []*invented { return []*invented{tBeam(), iBeam(), plank()} }
