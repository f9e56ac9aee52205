package design_test

import (
	"math"
	"slices"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/statics"
	"soffit/calc/trace"
)

// value is a value as a member file would give it.
func value(t testing.TB, s string) member.Value {
	t.Helper()
	l, err := quantity.Parse(s)
	if err != nil {
		t.Fatal(err)
	}
	return member.Value{Literal: l, Origin: member.Origin{Given: true}}
}

// edited designs the invented beam after a change of its model, and holds the record against its own proof.
func edited(t testing.TB, b beam, edit func(*member.Member)) *trace.Note {
	t.Helper()
	m, findings := member.Read("beam.yaml", []byte(b.text()), design.Options())
	if err := findings.Err(); err != nil {
		t.Fatal(err)
	}
	edit(m)
	n, err := design.RunAlone(m)
	if err != nil {
		t.Fatal(err)
	}
	if _, differences := trace.Closure(n); len(differences) > 0 {
		t.Errorf("%v", differences[0])
	}
	return n
}

// bearingAt moves the bearings of a beam: places from the ends of the concrete.
func bearingAt(t testing.TB, a, b string) func(*member.Member) {
	return func(m *member.Member) {
		m.Span.BearingA.FromEnd, m.Span.BearingB.FromEnd = value(t, a), value(t, b)
	}
}

// action is an action of a kind with one load; load says which.
func action(name, kind string, load func(*member.Load)) member.Action {
	a := member.Action{Name: member.Word{Text: name}, Kind: member.Word{Text: kind}, Loads: make([]member.Load, 1)}
	if kind == "variable" {
		a.Category.Text = "B"
	}
	load(&a.Loads[0])
	return a
}

// line is an entry that must be there.
func line(t testing.TB, n *trace.Note, key string) *trace.Line {
	t.Helper()
	l := trace.LineOf(n.Entry(key))
	if l == nil {
		t.Fatalf("%s is not recorded", key)
	}
	return l
}

// at is the carried value of an entry at a station, and at rows of further axes, in base units.
func at(t testing.TB, n *trace.Note, key string, rows ...string) float64 {
	t.Helper()
	l := line(t, n, key)
	if len(rows) != len(l.Axes) {
		t.Fatalf("%s runs over %d axes", key, len(l.Axes))
	}
	var place trace.Place
	for k, a := range l.Axes {
		r := a.Row(rows[k])
		if r < 0 {
			t.Fatalf("%s: no row %q of %q", key, rows[k], a.Rows)
		}
		place = append(place, trace.Fixed{Axis: a, Row: r})
	}
	return l.Values[trace.Flat(l.Axes, place)]
}

// effect is the effect of a load at a station, from whichever side it is summed: load-moment, load-shear-left, load-shear-right.
func effect(t testing.TB, n *trace.Note, id, station, load string) float64 {
	t.Helper()
	for _, key := range []string{"actions.effects/" + id, "actions.effects/" + id + "-beyond"} {
		l := trace.LineOf(n.Entry(key))
		if l == nil {
			continue
		}
		i := trace.Flat(l.Axes, trace.Place{{Axis: l.Axes[0], Row: l.Axes[0].Row(station)}, {Axis: l.Axes[1], Row: l.Axes[1].Row(load)}})
		if l.Taken(i) {
			return l.Values[i]
		}
	}
	t.Fatalf("no %s of %s at %s", id, load, station)
	return 0
}

// stationsOf are the names of the stations.
func stationsOf(t testing.TB, n *trace.Note) []string {
	return line(t, n, "actions.effects/position").Axes[0].Rows
}

const (
	kNm = 1e6 // in N·mm
	kN  = 1e3 // in N
)

// TestOverhangs: overhangs longer than the depth have stations up to the ends of the concrete; each load has −q·a²/2 at the
// bearing, to the digit, and nothing at the end.
func TestOverhangs(t *testing.T) {
	n := edited(t, beam{length: "14 m"}, bearingAt(t, "2 m", "2.3 m"))
	for _, load := range []struct {
		name string
		q    float64
	}{{"self-weight", 4.5}, {"finishes", 4}, {"floor overhang A", 6}, {"floor overhang B", 6}} {
		a, b := -load.q*2*2/2, -load.q*2.3*2.3/2
		switch load.name {
		case "floor overhang A":
			b = 0
		case "floor overhang B":
			a = 0
		}
		for _, c := range []struct {
			station string
			want    float64
		}{{"end A", 0}, {"bearing A", a}, {"bearing B", b}, {"end B", 0}} {
			if got := effect(t, n, "load-moment", c.station, load.name) / kNm; math.Abs(got-c.want) > 1e-9 {
				t.Errorf("%s at %s: %g kN·m, want %g", load.name, c.station, got, c.want)
			}
		}
		if v := effect(t, n, "load-shear-left", "end B", load.name); v != 0 {
			t.Errorf("%s: shear force %g N at end B", load.name, v)
		}
	}
	names := stationsOf(t, n)
	for _, want := range []string{"end A", "overhang A 0.1", "overhang A 0.9", "bearing A", "mid-span", "bearing B", "overhang B 0.5", "end B"} {
		if !slices.Contains(names, want) {
			t.Errorf("no station %q in %q", want, names)
		}
	}
	if x := at(t, n, "actions.effects/position", "overhang A 0.1"); x != 1800 {
		t.Errorf("the first tenth from bearing A stands at %g mm", x)
	}
	// An overhang at one end leaves the other end as it is.
	n = edited(t, beam{length: "14 m"}, bearingAt(t, "150 mm", "2.3 m"))
	if names := stationsOf(t, n); slices.Contains(names, "end A") || !slices.Contains(names, "end B") || names[0] != "bearing A" {
		t.Errorf("stations %q", names)
	}
	// As long as the depth is no overhang.
	if names := stationsOf(t, edited(t, beam{length: "14 m"}, bearingAt(t, "600 mm", "600 mm"))); slices.Contains(names, "end A") || slices.Contains(names, "end B") {
		t.Errorf("stations %q", names)
	}
}

// TestPatternLoading: the parts of a variable load count where they are unfavourable only, by hand: g = 4.5 + 4 kN/m, q = 6
// kN/m, 10 m between the bearings, 2 m beyond each.
func TestPatternLoading(t *testing.T) {
	n := edited(t, beam{length: "14 m"}, bearingAt(t, "2 m", "2 m"))
	g, q, l, a := 8.5, 6.0, 10.0, 2.0
	permanent := l*l/8 - a*a/2
	for _, c := range []struct {
		key, station string
		want         float64
	}{
		{"moment", "mid-span", 1.35*g*permanent + 1.5*q*l*l/8},
		{"moment-least", "mid-span", g*permanent - 1.5*q*a*a/2},
		{"moment-least", "bearing A", -(1.35*g + 1.5*q) * a * a / 2},
		{"moment", "bearing A", -g * a * a / 2},
	} {
		near(t, c.key+" at "+c.station, at(t, n, "actions.ultimate/"+c.key, c.station)/kNm, c.want, 1e-5)
	}
	// The largest reaction: all of the span and the overhang beside it, the far overhang empty.
	near(t, "R_A,Ed", at(t, n, "actions.reactions/design-reaction-a")/kN, 1.35*g*7+1.5*q*(l/2+a*(l+a/2)/l), 1e-5)
	near(t, "R_A,Ed,min", at(t, n, "actions.reactions/design-reaction-a-least")/kN, g*7-1.5*q*a*a/2/l, 1e-5)
	near(t, "R_B,k", at(t, n, "actions.service-reactions/service-reaction-b")/kN, g*7+q*(l/2+a*(l+a/2)/l), 1e-5)
	near(t, "R_B,k,min", at(t, n, "actions.service-reactions/service-reaction-b-least")/kN, g*7-q*a*a/2/l, 1e-5)
	// Short ends: one load, as it is written.
	if rows := line(t, beam{}.run(t), "given.actions/imposed").Axes[0].Rows; !slices.Equal(rows, []string{"self-weight", "finishes", "floor"}) {
		t.Errorf("loads %q", rows)
	}
}

// TestSplitLoads: where a variable load is cut, by the places it reaches from and to; names stay apart.
func TestSplitLoads(t *testing.T) {
	for _, c := range []struct{ load, want string }{
		{"{uniform: 6 kN/m}", "live overhang A 0–2, live span 2–12, live overhang B 12–14"},
		{"{uniform: 6 kN/m, from: 1 m, to: 5 m}", "live overhang A 1–2, live span 2–5"},
		{"{uniform: 6 kN/m, from: 2 m, to: 12 m}", "live 2–12"},
		{"{uniform: 6 kN/m, to: 1.5 m}", "live 0–1.5"},
		{"{point: 6 kN, at: 1 m}", "live 1–1"},
		{"{uniform: 6 kN/m, from: 11 m}, {point: 5 kN, at: 3 m}", "live (1) span 11–12, live (1) overhang B 12–14, live (2) 3–3"},
	} {
		n := edited(t, beam{length: "14 m", actions: "  - {name: live, kind: variable, category: B, loads: [" + c.load + "]}"}, bearingAt(t, "2 m", "2 m"))
		from, to := line(t, n, "given.actions/from"), line(t, n, "given.actions/to")
		var got []string
		for i, name := range from.Axes[0].Rows[1:] {
			got = append(got, name+" "+quantity.Format(from.Values[i+1]/1e3, places(from.Values[i+1]))+"–"+quantity.Format(to.Values[i+1]/1e3, places(to.Values[i+1])))
		}
		if strings.Join(got, ", ") != c.want {
			t.Errorf("%s: %s, want %s", c.load, strings.Join(got, ", "), c.want)
		}
	}
	n := edited(t, beam{length: "14 m", actions: "  - {name: live, kind: variable, category: B, loads: [{uniform: 6 kN/m}]}\n  - {name: live span, kind: permanent, loads: [{uniform: 1 kN/m}]}"}, bearingAt(t, "2 m", "2 m"))
	if rows := line(t, n, "given.actions/from").Axes[0].Rows; rows[len(rows)-1] != "live span′" {
		t.Errorf("loads %q", rows)
	}
}

// places is whether a place in mm is no whole metre.
func places(mm float64) int {
	if math.Mod(mm, 1000) != 0 {
		return 1
	}
	return 0
}

// TestSymmetry: a member that is the same from both ends has the same moments at mirrored stations, and shear forces with
// opposite sign on opposite sides.
func TestSymmetry(t *testing.T) {
	n := edited(t, beam{length: "14 m", actions: "  - {name: finishes, kind: permanent, loads: [{uniform: 4 kN/m}]}\n  - {name: floor, kind: variable, category: B, loads: [{uniform: 6 kN/m}, {point: 10 kN, at: 1 m}, {point: 10 kN, at: 13 m}]}"}, bearingAt(t, "2 m", "2 m"))
	x := line(t, n, "actions.effects/position")
	for i, k := 0, len(x.Values)-1; k >= 0; i, k = i+1, k-1 {
		if x.Values[i] != 14000-x.Values[k] {
			t.Fatalf("stations at %g and %g mm", x.Values[i], x.Values[k])
		}
		for _, pair := range [][2]string{{"moment", "moment"}, {"moment-least", "moment-least"}} {
			if u, v := line(t, n, "actions.ultimate/"+pair[0]).Values[i], line(t, n, "actions.ultimate/"+pair[1]).Values[k]; math.Abs(u-v) > 2e3 {
				t.Errorf("%s: %g and %g N·mm at %g mm", pair[0], u, v, x.Values[i])
			}
		}
		for _, pair := range [][2]string{{"shear-left", "shear-right-least"}, {"shear-right", "shear-left-least"}} {
			if u, v := line(t, n, "actions.ultimate/"+pair[0]).Values[i], -line(t, n, "actions.ultimate/"+pair[1]).Values[k]; math.Abs(u-v) > 2 {
				t.Errorf("%s: %g and %g N at %g mm", pair[0], u, v, x.Values[i])
			}
		}
	}
}

// TestLoadsAndReactions: reactions, moments and shear forces of each load against the statics of the kernels at every
// station, their sum against the loads, and the portions against the whole.
func TestLoadsAndReactions(t *testing.T) {
	n := edited(t, beam{length: "14 m", actions: "  - {name: dead, kind: permanent, loads: [{uniform: 4 kN/m, from: 1 m, to: 9 m}, {point: 13 kN, at: 0.5 m}, {point: 7 kN, at: 13.5 m}]}\n" +
		"  - {name: live, kind: variable, category: B, loads: [{uniform: 6.3 kN/m}, {point: -20 kN, at: 2 m}, {point: 11 kN, at: 11.7 m}]}"}, bearingAt(t, "2 m", "2.3 m"))
	q, f, from, to := line(t, n, "actions.loads/load"), line(t, n, "given.actions/point"), line(t, n, "given.actions/from"), line(t, n, "given.actions/to")
	x := line(t, n, "actions.effects/position")
	partsA, partsB := line(t, n, "actions.portions/portion-reaction-a"), line(t, n, "actions.portions/portion-reaction-b")
	beam := statics.Beam{Length: 14000, A: 2000, B: 11700}
	var force, total float64
	for i, name := range q.Axes[0].Rows {
		s, err := beam.Load(statics.Load{Force: f.Values[i], Intensity: q.Values[i], From: from.Values[i], To: to.Values[i]})
		if err != nil {
			t.Fatal(err)
		}
		ra, rb := at(t, n, "actions.loads/reaction-a", name), at(t, n, "actions.loads/reaction-b", name)
		for _, c := range [][2]float64{{ra, s.A}, {rb, s.B}, {partsA.Values[3*i] + partsA.Values[3*i+1] + partsA.Values[3*i+2], s.A}, {partsB.Values[3*i] + partsB.Values[3*i+1] + partsB.Values[3*i+2], s.B}} {
			if math.Abs(c[0]-c[1]) > 0.5 {
				t.Errorf("%s: reaction %g N, want %g", name, c[0], c[1])
			}
		}
		force, total = force+ra+rb, total+s.Total()
		for k, at := range x.Values {
			station := x.Axes[0].Rows[k]
			m, left, right := effect(t, n, "load-moment", station, name), effect(t, n, "load-shear-left", station, name), effect(t, n, "load-shear-right", station, name)
			l, r := s.Shear(at)
			if math.Abs(m-s.Moment(at)) > 1e3 || math.Abs(left-l) > 1 || math.Abs(right-r) > 1 {
				t.Errorf("%s at %s: M = %g, V = %g and %g, want %g, %g and %g", name, station, m, left, right, s.Moment(at), l, r)
			}
		}
	}
	near(t, "sum of the reactions", force, total, 1e-6)
	near(t, "sum of the loads", total/kN, 4.5*14+4*8+13+7+6.3*14-20+11, 1e-6)
}

// TestBends: deflected strands have a station where they are held down, ducts one at each point of their profile and none of
// bond; a place has one station.
func TestBends(t *testing.T) {
	n := edited(t, beam{}, func(m *member.Member) { m.Strands.Rows[0].Deflected.FromEnd = value(t, "4.1 m") })
	if a, b := at(t, n, "actions.effects/position", "held down low A"), at(t, n, "actions.effects/position", "held down low B"); a != 4100 || b != 8200 {
		t.Errorf("held down at %g and %g mm", a, b)
	}
	n = designed(t, girder(t, func(m *member.Member) {
		d := &m.Ducts.Rows[0]
		d.Name.Text = "lower"
		d.Profile = []member.ProfileRow{{At: value(t, "0 m"), Height: value(t, "450 mm")}, {At: value(t, "4.1 m"), Height: value(t, "200 mm"), By: word("straight line")},
			{At: value(t, "10.15 m"), Height: value(t, "100 mm"), By: word("parabola level here")}, {At: value(t, "20.3 m"), Height: value(t, "450 mm"), By: word("parabola level before")}}
	}))
	names := stationsOf(t, n)
	if x := at(t, n, "actions.effects/position", "profile lower 2"); x != 4100 {
		t.Errorf("second point at %g mm", x)
	}
	for _, s := range names {
		if s == "profile lower 1" || s == "profile lower 3" || s == "profile lower 4" || strings.HasPrefix(s, "start") || strings.HasPrefix(s, "l_") {
			t.Errorf("a station %q", s)
		}
	}
}

// TestAxial: by hand, 120 kN permanent compression and 50 kN of variable tension: 1.35·120 and 1.0·120 − 1.5·50; nothing
// is recorded where there is none.
func TestAxial(t *testing.T) {
	n := edited(t, beam{}, func(m *member.Member) {
		m.Actions = append(m.Actions, action("restraint", "permanent", func(l *member.Load) { l.Axial = value(t, "120 kN") }),
			action("wind", "variable", func(l *member.Load) { l.Axial = value(t, "-50 kN") }))
		m.Actions[3].Category.Text = "wind"
	})
	near(t, "N_Ed,max", at(t, n, "actions.ultimate/axial")/kN, 162, 1e-12)
	near(t, "N_Ed,min", at(t, n, "actions.ultimate/axial-least")/kN, 45, 1e-12)
	near(t, "N_Ed,min with the floor leading", at(t, n, "actions.ultimate/ultimate-axial-least", "6.10 floor leads")/kN, 120-0.6*75, 1e-12)
	near(t, "M_Ed", at(t, n, "actions.ultimate/moment", "mid-span"), at(t, beam{}.run(t), "actions.ultimate/moment", "mid-span"), 1e-12)
	for _, key := range []string{"actions.ultimate/axial", "given.actions/axial", "given.actions/on-bare", "actions.effects/moment-on-bare", "actions.construction/construction-moment", "actions.equilibrium/equilibrium-a"} {
		if (beam{}).run(t).Entry(key) != nil {
			t.Errorf("%s is recorded", key)
		}
	}
}

// topped casts a topping of 300 mm × 80 mm, 0.6 kN/m, and puts construction loads on: as many as sizes.
func topped(t testing.TB, casting string, sizes ...string) func(*member.Member) {
	return func(m *member.Member) {
		if casting != "" {
			m.Topping = member.Topping{Width: value(t, "300 mm"), Depth: value(t, "80 mm"), Fck: value(t, "30 MPa"), UnitWeight: value(t, "25 kN/m³"), Aggregate: member.Word{Text: "quartzite"}, Casting: member.Word{Text: casting}}
		}
		for _, s := range sizes {
			m.Actions = append(m.Actions, action("working platform "+s, "construction", func(l *member.Load) { l.Uniform = value(t, s) }))
		}
	}
}

// TestConstruction: the situation while the member is built, by hand for a simple beam: self-weight 4.5, topping 0.6, fresh 0.624,
// finishes 4 and floor 6 kN/m, which are there only in use.
func TestConstruction(t *testing.T) {
	per := (12.0*12/8 - 0.15*0.15/2) * kNm
	for _, c := range []struct {
		name                       string
		casting                    string
		sizes                      []string
		most, least, inUse, locked float64 // moments over per: while built, least, in use, M_0
	}{
		{"unpropped", "unpropped", nil, 1.35*4.5 + 1.5*0.624, 4.5, 1.35*9.1 + 1.5*6, 5.1},
		{"unpropped, loads", "unpropped", []string{"1.5 kN/m", "0.5 kN/m"}, 1.35*4.5 + 1.5*(0.624+1.5+0.5), 4.5, 1.35*9.1 + 1.5*6, 5.1},
		{"upward load", "unpropped", []string{"-1 kN/m"}, 1.35*4.5 + 1.5*0.624, 4.5 - 1.5, 1.35*9.1 + 1.5*6, 5.1},
		{"propped", "propped", []string{"1.5 kN/m"}, 0, 0, 1.35*9.1 + 1.5*6, 0},
		{"no topping", "", []string{"1.5 kN/m"}, 1.35*8.5 + 1.5*1.5, 4.5, 1.35*8.5 + 1.5*6, 0},
	} {
		n := edited(t, beam{}, topped(t, c.casting, c.sizes...))
		near(t, c.name+", M_Ed", at(t, n, "actions.ultimate/moment", "mid-span"), c.inUse*per, 1e-5)
		if c.casting != "" {
			if got := at(t, n, "actions.effects/moment-on-bare", "mid-span"); math.Abs(got-c.locked*per) > 1e4 {
				t.Errorf("%s: M_0 = %g kN·m, want %g", c.name, got/kNm, c.locked*per/kNm)
			}
		}
		if c.most == 0 {
			if n.Entry("actions.construction/construction-moment") != nil {
				t.Errorf("%s: the bare member on props is worked", c.name)
			}
			continue
		}
		near(t, c.name+", M_Ed,b", at(t, n, "actions.construction/construction-moment", "mid-span"), c.most*per, 1e-5)
		near(t, c.name+", M_Ed,b,min", at(t, n, "actions.construction/construction-moment-least", "mid-span"), c.least*per, 2e-5)
		near(t, c.name+", V_Ed,b", at(t, n, "actions.construction/construction-shear-right", "bearing A"), c.most*6*kN, 1e-3)
	}
}

// TestConstructionOnProps: construction loads on a member on props enter no check, which the verdict says of them alone.
func TestConstructionOnProps(t *testing.T) {
	for _, c := range []struct {
		casting, on string
		sizes       []string
		told        bool
	}{
		{"propped", "", []string{"1.5 kN/m", "0.5 kN/m"}, true},
		{"propped", "composite member", []string{"1.5 kN/m"}, false},
		{"propped", "", nil, false},
		{"unpropped", "", []string{"1.5 kN/m"}, false},
		{"", "", []string{"1.5 kN/m"}, false},
	} {
		n := edited(t, beam{}, func(m *member.Member) {
			topped(t, c.casting, c.sizes...)(m)
			for i := range m.Actions {
				if a := &m.Actions[i]; a.Kind.Text == "construction" {
					a.ActsOn.Text = c.on
				}
			}
		})
		told := ""
		if text, ok := n.Entry("verdict.checks/remarks").(*trace.Text); ok {
			told = text.Markdown
		}
		if strings.Contains(told, "enter no check") != c.told || c.told && !strings.Contains(told, "(working platform 1.5 kN/m, working platform 0.5 kN/m)") {
			t.Errorf("%s, %v %s: %q", c.casting, c.sizes, c.on, told)
		}
	}
}

// TestActsOn: what the member file says of the section that carries an action goes before what is usual: a screed on the bare
// member is locked in and counts while it is built; a construction load on the member with its topping does not, and leads in
// use.
func TestActsOn(t *testing.T) {
	per := (12.0*12/8 - 0.15*0.15/2) * kNm
	n := edited(t, beam{}, func(m *member.Member) {
		topped(t, "unpropped", "9 kN/m")(m)
		m.Actions[0].ActsOn.Text, m.Actions[2].ActsOn.Text = "bare member", "composite member"
	})
	near(t, "M_0", at(t, n, "actions.effects/moment-on-bare", "mid-span"), 9.1*per, 1e-5)
	near(t, "M_Ed,b", at(t, n, "actions.construction/construction-moment", "mid-span"), (1.35*8.5+1.5*0.624)*per, 1e-5)
	near(t, "M_Ed", at(t, n, "actions.ultimate/moment", "mid-span"), (1.35*9.1+1.5*9+1.5*0.7*6)*per, 1e-5)
	near(t, "M_char", at(t, n, "actions.characteristic/characteristic", "mid-span"), (9.1+6)*per, 1e-5)
}

// TestCombinationOfConstructionLoads: a national ψ₀ of construction loads takes hold where another leads.
func TestCombinationOfConstructionLoads(t *testing.T) {
	per := (12.0*12/8 - 0.15*0.15/2) * kNm
	n := edited(t, beam{combination: "6.10, national parameters: {\"psi_0,con\": {value: 0.6, source: invented annex}}"}, topped(t, "unpropped", "1.5 kN/m", "0.5 kN/m"))
	near(t, "M_Ed,b", at(t, n, "actions.construction/construction-moment", "mid-span"), (1.35*4.5+1.5*(0.624+1.5+0.6*0.5))*per, 2e-5)
}

// equilibrium is one of the checks, nil where it is not made.
func equilibrium(n *trace.Note, key string) *trace.Check {
	c, _ := n.Entry(key).(*trace.Check)
	return c
}

// TestEquilibrium: an overhang of 4 m with a variable point load at its end, by hand: g = 8.5 kN/m, 7.85 m between the
// bearings, 0.15 m beyond bearing B.
func TestEquilibrium(t *testing.T) {
	const g, l, a, c = 8.5, 7.85, 4.0, 0.15
	stb := 0.9 * g * (l/2 + c*(l+c/2)/l)
	for _, p := range []struct {
		point string
		kN    float64
		fails bool
	}{{"40 kN", 40, true}, {"20 kN", 20, false}} {
		n := edited(t, beam{length: "12 m", actions: "  - {name: finishes, kind: permanent, loads: [{uniform: 4 kN/m}]}\n  - {name: crane, kind: variable, category: B, loads: [{point: " + p.point + ", at: 0 m}]}"}, bearingAt(t, "4 m", "150 mm"))
		near(t, "stabilising at B", at(t, n, "actions.equilibrium/stabilising-b")/kN, stb, 1e-5)
		near(t, "destabilising at B", at(t, n, "actions.equilibrium/destabilising-b")/kN, 1.1*g*a*a/2/l+1.5*p.kN*a/l, 1e-5)
		near(t, "destabilising at A", at(t, n, "actions.equilibrium/destabilising-a")/kN, 1.1*g*c*c/2/l, 1e-3)
		if k := equilibrium(n, "actions.equilibrium/equilibrium-b"); k == nil || k.Failed() != p.fails {
			t.Errorf("%s: %+v", p.point, k)
		}
		if k := equilibrium(n, "actions.equilibrium/equilibrium-a"); k == nil || k.Failed() {
			t.Errorf("%s: %+v", p.point, k)
		}
	}
}

// TestEquilibriumNeedsALift: no check where every load bears down on both bearings; wind that lifts more than 0.9 of the
// weight fails, CC3 raises what lifts.
func TestEquilibriumNeedsALift(t *testing.T) {
	if n := (beam{}).run(t); equilibrium(n, "actions.equilibrium/equilibrium-a") != nil || n.Entry("actions.reactions/lifting").(*trace.Choice).Outcomes[0] != trace.No {
		t.Error("a member that nothing lifts is checked")
	}
	wind := func(class, size string) *trace.Note {
		return edited(t, beam{combination: "6.10, consequence class: " + class, actions: "  - {name: wind, kind: variable, category: wind, loads: [{uniform: " + size + "}]}"}, func(*member.Member) {})
	}
	for _, c := range []struct {
		class, size string
		fails       bool
	}{{"CC2", "-2.69 kN/m", false}, {"CC2", "-2.71 kN/m", true}, {"CC3", "-2.69 kN/m", true}} { // 0.9·4.5/1.5 = 2.7
		if k := equilibrium(wind(c.class, c.size), "actions.equilibrium/equilibrium-a"); k == nil || k.Failed() != c.fails {
			t.Errorf("%s, %s: %+v", c.class, c.size, k)
		}
	}
	held := wind("CC2", "-3.1 kN/m").Entry("actions.reactions/bearing-a-held").(*trace.Choice)
	if held.Outcomes[0] != trace.No { // 4.5 − 1.5·3.1 < 0
		t.Error("the bearing is not said to be pulled")
	}
}

// TestEquilibriumInConstruction: the topping is cast on the overhang first, by hand: it lifts as a variable action, and only
// the self-weight holds.
func TestEquilibriumInConstruction(t *testing.T) {
	n := edited(t, beam{length: "12 m"}, func(m *member.Member) {
		bearingAt(t, "4 m", "150 mm")(m)
		topped(t, "unpropped", "2 kN/m")(m)
	})
	const g, l, a, c = 4.5, 7.85, 4.0, 0.15
	near(t, "stabilising", at(t, n, "actions.construction-equilibrium/stabilising-b")/kN, 0.9*g*(l/2+c*(l+c/2)/l), 1e-5)
	near(t, "destabilising", at(t, n, "actions.construction-equilibrium/destabilising-b")/kN, (1.1*g+1.5*0.6+1.5*2)*a*a/2/l, 1e-5)
	near(t, "in use", at(t, n, "actions.equilibrium/destabilising-b")/kN, (1.1*(g+0.6+4)+1.5*6)*a*a/2/l, 1e-5)
}

// TestRoundingOfReactions: rounding moves no check of members with overhangs, toppings and axial forces by 0.002.
func TestRoundingOfReactions(t *testing.T) {
	for _, at := range [][2]string{{"2 m", "2.3 m"}, {"1.2345 m", "150 mm"}, {"100 mm", "4.4444 m"}} {
		n := edited(t, beam{length: "14 m"}, func(m *member.Member) {
			bearingAt(t, at[0], at[1])(m)
			topped(t, "unpropped", "1.5 kN/m")(m)
			m.Actions = append(m.Actions, action("restraint", "permanent", func(l *member.Load) { l.Axial = value(t, "33.3 kN") }))
		})
		if effect, check := n.Rounding(); !(effect < 0.002*max(1, check.Value[check.Worst]/10)) {
			t.Errorf("%v: rounding moves %s by %.5f", at, check.Name, effect)
		}
	}
}
