package diagram

import (
	"fmt"
	"math"
	"slices"
	"strconv"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// invented is a member made up for these tests: nobody's design, with forces and strains that agree among
// themselves only as far as the pictures need it.
type invented struct {
	parts    [][3]float64 // height, lower, upper width, mm, from the soffit up
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
}

type row struct {
	name                            string
	count                           int
	spacing, level, diameter, loose float64 // mm, loose in m
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

// depth is the whole height of the section, mm.
func (m *invented) depth() float64 {
	var h float64
	for _, p := range m.parts {
		h += p[0]
	}
	return h
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
	var partNames, loadNames, stationNames []string
	for i := range m.parts {
		partNames = append(partNames, "part "+strconv.Itoa(i+1))
	}
	for _, l := range m.loads {
		loadNames = append(loadNames, l.name)
	}
	for _, s := range m.stations {
		stationNames = append(stationNames, s.name)
	}
	stations := n.Axis("stations", "stations", "", stationNames)
	tendons := n.Axis("tendons", "rows of tendons", "i", names(m.tendons))
	parts := n.Axis("parts", "parts of the section", "n", partNames)
	loads := n.Axis("loads", "loads", "n", loadNames)
	var bars *trace.Axis
	if len(m.bars) > 0 {
		bars = n.Axis("bars", "rows of bars", "j", names(m.bars))
	}
	ch := n.Chapter("all", "All")
	k := book{t, n, ch.Block("geometry", "Geometry", nil)}
	over := func(a *trace.Axis) []*trace.Axis { return []*trace.Axis{a} }
	outline := []trace.Plot{
		k.rows("height", "h_n", "mm", 0, over(parts), each(m.parts, func(p [3]float64) float64 { return p[0] })),
		k.rows("lower", "b_{l,n}", "mm", 0, over(parts), each(m.parts, func(p [3]float64) float64 { return p[1] })),
		k.rows("upper", "b_{u,n}", "mm", 0, over(parts), each(m.parts, func(p [3]float64) float64 { return p[2] })),
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
	debonded := k.rows("debonded", "l_{db,i}", "m", 2, over(tendons), each(m.tendons, func(r row) float64 { return r.loose }))
	var bp []trace.Plot
	if bars != nil {
		bp = rows("bar-", "j", bars, m.bars)
	}
	centroid := k.value("centroid", "y_s", "mm", 2, m.centroid)
	depth := k.value("depth", "h", "mm", 0, m.depth())
	sec := append(append(append([]trace.Plot{centroid, depth}, outline...), tp...), bp...)
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
	k.b.Figure("fig-elevation", "elevation", "Elevation", "", el...)
	seen := append(append([]trace.Plot{}, el...), outline...)
	if bars != nil {
		seen = append(seen, bp[2])
	}
	k.b.Figure("fig-elevation-parts", "elevation", "Elevation with its edges", "", seen...)

	m.effects(ch, n, stations, el[4:6])
	m.bending(ch, n, stations, tendons, bars, outline, depth)
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
}

func (m *invented) stress(ch *trace.Chapter, n *trace.Note, stations, tendons *trace.Axis) {
	k := book{nil, n, ch.Block("transfer", "Transfer", stations)}
	over := []*trace.Axis{stations, tendons}
	var present, available []float64
	for _, s := range m.stations {
		d := min(s.x, m.length-s.x)
		for i, t := range m.tendons {
			lt := 70 * t.diameter / 1000
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
	k.b.Figure("fig-stress", "tendon-stress", "Stress", "",
		trace.Plot{Role: "x", Key: "all.effects/x"},
		k.rows("present", "σ_{pm,i}", "MPa", 1, over, present),
		k.rows("available", "σ_{pd,i}", "MPa", 1, over, available))
}

func (m *invented) bending(ch *trace.Chapter, n *trace.Note, stations, tendons, bars *trace.Axis, outline []trace.Plot, depth trace.Plot) {
	b := ch.Block("bending", "Bending", stations)
	k := book{nil, n, b}
	h, x := m.depth(), m.x
	const fcd, ecu, ep0 = 30.0, 3.5, 5.6
	every := func(v float64) []float64 { return each(m.stations, func(station) float64 { return v }) }
	over := []*trace.Axis{stations}
	area := func(y float64) (a, s float64) { // of the section above y, with its moment about the top
		const strips = 400
		for i := range strips {
			t := (float64(i) + 0.5) / strips * (h - y)
			dy := (h - y) / strips
			level, w := 0.0, 0.0
			for _, p := range m.parts {
				if v := h - t; v >= level && v <= level+p[0] {
					w = p[1] + (p[2]-p[1])*(v-level)/p[0]
				}
				level += p[0]
			}
			a += w * dy
			s += w * dy * t
		}
		return a, s
	}
	a, s := area(h - 0.8*x)
	fc, yc := a*fcd/1000, s/a
	strain := func(d float64) float64 { return ecu * (d - x) / x }
	plots := append([]trace.Plot(nil), outline...)
	for i := range plots {
		plots[i].Key = "all.geometry/" + plots[i].Role
	}
	plots = append(plots, trace.Plot{Role: "h", Key: "all.geometry/depth"},
		k.rows("neutral-axis", "x", "mm", 2, over, every(x)),
		k.rows("block-depth", "a", "mm", 2, over, every(0.8*x)),
		k.value("block-stress", "f_cd", "MPa", 3, fcd),
		k.rows("block-force", "F_c", "kN", 1, over, every(fc)),
		k.rows("block-centroid", "d_c", "mm", 2, over, every(yc)),
		k.value("strain-top", "ε_cu3", "‰", 1, ecu))
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
	share := func(r row) float64 { return fc * float64(r.count) / total }
	plots = append(plots, k.rows("depth", "d_i", "mm", 0, []*trace.Axis{tendons}, each(m.tendons, func(r row) float64 { return h - r.level })))
	grid("prestrain", "ε_{p0,i}", "‰", 4, tendons, m.tendons, func(r row) float64 { return ep0 - r.level/1000 })
	grid("strain", "ε_{p,i}", "‰", 3, tendons, m.tendons, func(r row) float64 { return ep0 - r.level/1000 + strain(h-r.level) })
	grid("force", "F_{p,i}", "kN", 1, tendons, m.tendons, share)
	grid("lever", "z_i", "mm", 2, tendons, m.tendons, func(r row) float64 { return h - r.level - yc })
	if bars != nil {
		plots = append(plots, k.rows("bar-depth", "d_{s,j}", "mm", 0, []*trace.Axis{bars}, each(m.bars, func(r row) float64 { return h - r.level })))
		grid("bar-strain", "ε_{s,j}", "‰", 3, bars, m.bars, func(r row) float64 { return strain(h - r.level) })
		grid("bar-force", "F_{s,j}", "kN", 1, bars, m.bars, func(r row) float64 {
			return float64(r.count) * math.Pi / 4 * r.diameter * r.diameter * max(-435, min(435, strain(h-r.level)*200)) / 1000
		})
		grid("bar-lever", "z_{s,j}", "mm", 2, bars, m.bars, func(r row) float64 { return h - r.level - yc })
	}
	plots = append(plots, k.rows("resistance", "M_Rd", "kN·m", 1, over, every(fc*(0.85*h-yc)/1000)))
	b.Figure("fig-ultimate-bare", "ultimate", "Strain, stress and forces, rows as lines", "midspan", append([]trace.Plot(nil), plots...)...)
	for _, role := range []string{"count", "spacing", "diameter", "bar-count", "bar-spacing", "bar-diameter"} {
		if bars != nil || role[:3] != "bar" {
			plots = append(plots, trace.Plot{Role: role, Key: "all.geometry/" + role})
		}
	}
	b.Figure("fig-ultimate", "ultimate", "Strain, stress and forces", "midspan", plots...)
}

// sample members.
func tBeam() *invented {
	m := &invented{
		parts:   [][3]float64{{550, 300, 300}, {60, 300, 420}, {140, 1200, 1200}},
		tendons: []row{{"bottom", 6, 45, 50, 12.5, 0}, {"second", 4, 50, 95, 12.5, 1.5}, {"top", 2, 200, 690, 9.3, 0}},
		bars:    []row{{"soffit", 2, 210, 45, 16, 0}},
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
		m.tendons = append(m.tendons, row{fmt.Sprintf("%d", i+1), 8, 50, 50 + 45*float64(i), 15.2, float64(i%3) * 1.5})
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
		tendons: []row{{"lower", 10, 110, 30, 9.3, 0}},
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
