package design_test

import (
	"bytes"
	"fmt"
	"math"
	"math/rand"
	"slices"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

func quantityOf(t testing.TB, s string) member.Value {
	t.Helper()
	l, err := quantity.Parse(s)
	if err != nil {
		t.Fatal(err)
	}
	return member.Value{Literal: l, Origin: member.Origin{Given: true}}
}

func word(s string) member.Word { return member.Word{Text: s, Origin: member.Origin{Given: true}} }

// changed reads an invented beam and lets f change it.
func changed(t testing.TB, b beam, f func(m *member.Member)) *member.Member {
	t.Helper()
	m, findings := member.Read("beam.yaml", []byte(b.text()), design.Options())
	if err := findings.Err(); err != nil {
		t.Fatal(err)
	}
	f(m)
	return m
}

func designed(t testing.TB, m *member.Member) *trace.Note {
	t.Helper()
	n, err := design.Run(m)
	if err != nil {
		t.Fatal(err)
	}
	return n
}

// closes proves a record from its JSON, and that rounding moves no check by 0.002.
func closes(t testing.TB, n *trace.Note) {
	t.Helper()
	data, err := n.JSON()
	if err != nil {
		t.Fatal(err)
	}
	back, err := trace.Read(bytes.NewReader(data))
	if err != nil {
		t.Fatal(err)
	}
	proves(t, back)
	if effect, check := n.Rounding(); !(effect < 0.002) {
		t.Errorf("rounding moves %s by %g", check.Name, effect)
	}
}

// proves recomputes a record, and holds what rounding moves: 0.002, of a ratio above 1 as much of it.
func proves(t testing.TB, n *trace.Note) {
	t.Helper()
	proved, differences := trace.Closure(n)
	if proved < 1000 || len(differences) > 0 {
		t.Errorf("%d values proved: %v", proved, differences)
	}
	if effect, check := n.Rounding(); !(effect < 0.002*max(1, slices.Max(check.Value))) {
		t.Errorf("rounding moves %s by %g", check.Name, effect)
	}
}

// at reads a value of a record, in base units, at the station at x and, where it has rows, at row i.
func atStation(t testing.TB, n *trace.Note, key string, x float64, i int) float64 {
	t.Helper()
	l := trace.LineOf(n.Entry(key))
	if l == nil {
		t.Fatalf("%s is not recorded", key)
	}
	position := trace.LineOf(n.Entry("actions.effects/position"))
	row := -1
	for k, v := range position.Values {
		if math.Abs(v-x) < 1e-6 {
			row = k
		}
	}
	if row < 0 {
		t.Fatalf("no station at %g mm", x)
	}
	place := trace.Place{}
	for _, a := range l.Axes {
		place = place.With(a, i)
	}
	if l.Axes[0].Index == "" {
		place = place.With(l.Axes[0], row)
	}
	f := trace.Flat(l.Axes, place)
	if !l.Taken(f) {
		t.Fatalf("%s is not taken at %g mm", key, x)
	}
	return l.Shadow[f]
}

// girder is a post-tensioned rectangle 400 × 1000, 20.3 m long, with one duct of twelve strands of 150 mm² in a parabola of
// sag 350 mm; invented.
func girder(t testing.TB, change func(m *member.Member)) *member.Member {
	b := beam{shape: "{kind: rectangle, width: 400 mm, depth: 1000 mm}", length: "20.3 m", actions: "  - {name: roof, kind: permanent, loads: [{uniform: 2 kN/m}]}\n  - {name: floor, kind: variable, category: B, loads: [{uniform: 6 kN/m}]}"}
	return changed(t, b, func(m *member.Member) {
		m.Strands = member.Strands{}
		m.Ducts = member.Ducts{SteelDiagram: word("horizontal"), Friction: member.Friction{Mu: quantityOf(t, "0.19"), Wobble: quantityOf(t, "0.008 1/m"), Source: word("invented approval")}}
		m.Ducts.Rows = []member.DuctRow{{Name: word("duct"), Product: word("Y1860S7-15.7"), Strands: member.Count{N: 12}, Count: member.Count{N: 1}, Spacing: quantityOf(t, "0 mm"), Diameter: quantityOf(t, "80 mm"),
			Profile:      []member.ProfileRow{{At: quantityOf(t, "0 m"), Height: quantityOf(t, "450 mm")}, {At: quantityOf(t, "10.15 m"), Height: quantityOf(t, "100 mm"), By: word("parabola level here")}, {At: quantityOf(t, "20.3 m"), Height: quantityOf(t, "450 mm"), By: word("parabola level before")}},
			StressedFrom: word("both ends"), JackingStress: quantityOf(t, "1440 MPa"),
			StatedLosses: member.DuctLosses{AtStressing: quantityOf(t, "60 MPa"), Final: quantityOf(t, "210 MPa"), Source: word("invented")}}}
		change(m)
	})
}

func asIs(*member.Member) {}

// TestParabolaOfDuct holds height, eccentricity, slope, angle and stress against closed forms: 4·f·x·(L − x)/L², its slope,
// 8·f·x/L² and the exponential (own derivation).
func TestParabolaOfDuct(t *testing.T) {
	n := designed(t, girder(t, asIs))
	closes(t, n)
	const l, f = 20300.0, 350.0
	for _, x := range []float64{150, 5150, 10150, 13650, 20150} {
		y := 450 - 4*f*x*(l-x)/(l*l)
		near(t, "height", atStation(t, n, "prestress.profile/tendon-level", x, 0), y, 1e-6)
		near(t, "eccentricity", atStation(t, n, "section.positions/eccentricity", x, 0), 500-y, 1e-5)
		near(t, "depth", atStation(t, n, "section.positions/tendon-depth", x, 0), 1000-y, 1e-6)
		if s := atStation(t, n, "prestress.profile/tendon-slope", x, 0); math.Abs(s+4*f*(l-2*x)/(l*l)) > 1e-8 {
			t.Errorf("slope %g at %g", s, x)
		}
		near(t, "angle from A", atStation(t, n, "prestress.friction/angle-from-a", x, 0), 8*f*x/(l*l), 1e-6)
		nearer := math.Min(x, l-x)
		sigma := 1440 * math.Exp(-0.19*(8*f*nearer/(l*l)+0.008e-3*nearer))
		near(t, "stress after friction", atStation(t, n, "prestress.friction/stress-after-friction", x, 0), sigma, 1e-7)
		near(t, "present stress", atStation(t, n, "prestress.along/present-after-friction", x, 0), sigma-210, 1e-7)
		near(t, "initial stress", atStation(t, n, "prestress.along/initial-after-friction", x, 0), sigma-60, 1e-7)
		near(t, "available stress", atStation(t, n, "prestress.along/anchored-stress", x, 0), 246e3/150/1.15, 1e-9)
	}
	for _, c := range n.Checks() {
		if c.Failed() {
			t.Errorf("%s fails, ratio %s", c.Name, c.Ratio[c.Worst])
		}
	}
	near(t, "strands", atStation(t, n, "materials.tendons/strands-in-ducts", 10150, 0), 12, 0)
	near(t, "height for drawings", atStation(t, n, "given.tendons/level", 10150, 0), 100, 1e-9)
}

// TestGirderAtYield holds M_Rd at mid-span, where the tendon yields, against the closed form; it does not depend on the
// friction there.
func TestGirderAtYield(t *testing.T) {
	n := designed(t, girder(t, asIs))
	a, f, b, d, fcd := 12*150.0, 246e3/150/1.15, 400.0, 900.0, 40/1.5
	near(t, "M_Rd", unrounded(t, n, resistance), a*f*(d-a*f/(2*b*fcd)), 1e-6)
}

// TestStressedFromOneEnd: from A the stress falls all the way; from B it is that of A mirrored; from both it is symmetrical
// and the larger of the two.
func TestStressedFromOneEnd(t *testing.T) {
	from := func(end string) *trace.Note {
		return designed(t, girder(t, func(m *member.Member) { m.Ducts.Rows[0].StressedFrom = word(end) }))
	}
	a, b, both := from("A"), from("B"), from("both ends")
	const key, l = "prestress.along/present-after-friction", 20300.0
	before := math.Inf(1)
	for _, x := range []float64{150, 2650, 5150, 7650, 10150, 12650, 15150, 17650, 20150} {
		sa, sb := atStation(t, a, key, x, 0), atStation(t, b, key, x, 0)
		if sa >= before {
			t.Errorf("stressed from A the stress rises to %g at %g", sa, x)
		}
		before = sa
		near(t, "mirrored", atStation(t, b, key, l-x, 0), sa, 1e-9)
		near(t, "the larger of both", atStation(t, both, key, x, 0), math.Max(sa, sb), 1e-12)
		near(t, "symmetrical", atStation(t, both, key, l-x, 0), atStation(t, both, key, x, 0), 1e-9)
	}
}

// TestHarpedDuct: straight lines with kinks stressed from both ends are symmetrical, at the kinks too.
func TestHarpedDuct(t *testing.T) {
	m := girder(t, func(m *member.Member) {
		m.Ducts.Rows[0].Profile = []member.ProfileRow{{At: quantityOf(t, "0 m"), Height: quantityOf(t, "480 mm")}, {At: quantityOf(t, "6.15 m"), Height: quantityOf(t, "120 mm"), By: word("straight line")},
			{At: quantityOf(t, "14.15 m"), Height: quantityOf(t, "120 mm"), By: word("straight line")}, {At: quantityOf(t, "20.3 m"), Height: quantityOf(t, "480 mm"), By: word("straight line")}}
	})
	n := designed(t, m)
	closes(t, n)
	const kink = 360.0 / 6150
	for _, x := range []float64{150, 5150, 6150, 10150, 14150, 20150} {
		near(t, "symmetrical", atStation(t, n, "prestress.along/present-after-friction", 20300-x, 0), atStation(t, n, "prestress.along/present-after-friction", x, 0), 1e-7)
	}
	for _, c := range []struct{ x, a, b float64 }{{5150, 0, 2 * kink}, {6150, kink, 2 * kink}, {10150, kink, kink}, {14150, 2 * kink, kink}, {20150, 2 * kink, 0}} {
		if a, b := atStation(t, n, "prestress.friction/angle-from-a", c.x, 0), atStation(t, n, "prestress.friction/angle-from-b", c.x, 0); math.Abs(a-c.a) > 1e-8 || math.Abs(b-c.b) > 1e-8 {
			t.Errorf("angles %g and %g at %g, want %g and %g", a, b, c.x, c.a, c.b)
		}
	}
}

// TestNoFriction: without friction and unintended angle the force is the same everywhere.
func TestNoFriction(t *testing.T) {
	n := designed(t, girder(t, func(m *member.Member) {
		m.Ducts.Friction.Mu, m.Ducts.Friction.Wobble = quantityOf(t, "0"), quantityOf(t, "0 1/m")
		m.Ducts.Rows[0].StressedFrom = word("A")
	}))
	l := trace.LineOf(n.Entry("prestress.along/present-force"))
	for i, v := range l.Values {
		if v != l.Values[0] || math.Abs(v-1800*(1440-210)) > 1e-6 {
			t.Errorf("F = %s kN at %s", l.Shown[i], trace.RowName(l.Axes, i))
		}
	}
}

// TestUnevenProfiles: rows with chains of different length in one member, with a parabola that goes on, and bars.
func TestUnevenProfiles(t *testing.T) {
	b := girder(t, func(m *member.Member) {
		m.Bars.SteelDiagram = word("horizontal")
		m.Bars.Rows = []member.BarRow{{Name: word("corner"), Count: member.Count{N: 2}, Diameter: quantityOf(t, "16 mm"), Spacing: quantityOf(t, "300 mm"), Height: quantityOf(t, "50 mm"), Fyk: quantityOf(t, "500 MPa"), DuctilityClass: word("B")}}
		level := m.Ducts.Rows[0]
		level.Name, level.StressedFrom, level.Count = word("level"), word("B"), member.Count{N: 2}
		level.Strands, level.Spacing = member.Count{N: 3}, quantityOf(t, "250 mm")
		level.Profile = []member.ProfileRow{{At: quantityOf(t, "0 m"), Height: quantityOf(t, "200 mm")}, {At: quantityOf(t, "20.3 m"), Height: quantityOf(t, "220 mm"), By: word("straight line")}}
		m.Ducts.Rows[0].Profile = []member.ProfileRow{{At: quantityOf(t, "0 m"), Height: quantityOf(t, "700 mm")}, {At: quantityOf(t, "3 m"), Height: quantityOf(t, "500 mm"), By: word("straight line")},
			{At: quantityOf(t, "10.1 m"), Height: quantityOf(t, "150 mm"), By: word("parabola onward")}, {At: quantityOf(t, "20.3 m"), Height: quantityOf(t, "700 mm"), By: word("parabola level before")}}
		m.Ducts.Rows = append(m.Ducts.Rows, level)
	})
	n := designed(t, b)
	closes(t, n)
	near(t, "level row at mid-span", atStation(t, n, "prestress.profile/tendon-level", 10150, 1), 210, 1e-12)
	near(t, "chain at its point", atStation(t, n, "prestress.profile/tendon-level", 10100, 0), 150, 1e-5)
	near(t, "friction of the level row from B", atStation(t, n, "prestress.friction/friction-from-b", 10150, 1), 1440*(1-math.Exp(-0.19*0.008*10.15)), 1e-9)
	near(t, "strands of the level row", trace.LineOf(n.Entry("materials.tendons/strands-in-ducts")).Shadow[1], 6, 0)
	near(t, "depth of the bars", trace.LineOf(n.Entry("section.positions/bar-depth")).Shadow[0], 950, 1e-12)
}

// TestDuctsRefused: what makes no profile, and losses that leave nothing, end in words.
func TestDuctsRefused(t *testing.T) {
	for want, change := range map[string]func(m *member.Member){
		`row "duct": the profile goes from 0 m to 19 m, the concrete from 0 m to 20.3 m`: func(m *member.Member) { m.Ducts.Rows[0].Profile[2].At = quantityOf(t, "19 m") },
		"not beyond the one before": func(m *member.Member) { m.Ducts.Rows[0].Profile[1].At = quantityOf(t, "0 m") },
		"unknown kind of line":      func(m *member.Member) { m.Ducts.Rows[0].Profile[1].By = word("") },
		"runs from 100.0 mm to 1000.0 mm above the soffit and leaves the concrete": func(m *member.Member) { m.Ducts.Rows[0].Profile[0].Height = quantityOf(t, "1 m") },
		"friction and the stated losses take more": func(m *member.Member) {
			m.Ducts.Friction.Mu, m.Ducts.Friction.Wobble, m.Ducts.Rows[0].StatedLosses.Final = quantityOf(t, "1"), quantityOf(t, "0.1 1/m"), quantityOf(t, "900 MPa")
		},
	} {
		if _, err := design.Run(girder(t, change)); err == nil || !strings.Contains(err.Error(), want) {
			t.Errorf("%v, want %q", err, want)
		}
	}
}

// TestMendsOfDucts: a post-tensioned beam that fails names more strands, and the remedy mends it.
func TestMendsOfDucts(t *testing.T) {
	n := designed(t, girder(t, func(m *member.Member) { m.Ducts.Rows[0].Strands.N = 6 }))
	c, ok := n.Entry("ultimate.bending/bending-sufficient").(*trace.Check)
	if !ok || !c.Failed() {
		t.Fatalf("the check must fail: %+v", c)
	}
	found := false
	n.Each(func(_ *trace.Chapter, b *trace.Block, e trace.Entry) {
		if g, ok := e.(*trace.Given); ok && b.Slug == "mends" && strings.Contains(g.Name, "more in each duct") && g.Values[0] <= 1 {
			found = true
		}
	})
	if !found {
		t.Error("more strands are not named")
	}
}

// draped is the invented beam with two straight rows and one deflected, in two groups.
func draped(t testing.TB, change func(m *member.Member)) *member.Member {
	const losses = "jacking stress: 1340 MPa, stated losses: {at release: 100 MPa, final: 250 MPa, source: invented}}"
	b := beam{strands: "  bond: good\n  rows:\n    - {name: low, product: Y1860S7-12.5, count: 4, spacing: 60 mm, height: 50 mm, " + losses + "\n" +
		"    - {name: draped, product: Y1860S7-12.5, count: 2, spacing: 60 mm, height: 100 mm, " + losses}
	return changed(t, b, func(m *member.Member) {
		m.Strands.Groups = []member.Group{{Name: word("straight")}, {Name: word("deflected")}}
		m.Strands.Rows[0].Group, m.Strands.Rows[1].Group = word("straight"), word("deflected")
		m.Strands.Rows[1].Deflected = member.Deflection{Rise: quantityOf(t, "400 mm"), FromEnd: quantityOf(t, "4.15 m")}
		change(m)
	})
}

// TestDeflectedStrands holds heights, bond conditions and the hold-down force of deflected strands against what is drawn
// (own derivation).
func TestDeflectedStrands(t *testing.T) {
	n := designed(t, draped(t, asIs))
	closes(t, n)
	const slope = 400.0 / 4150
	for _, c := range []struct{ x, y float64 }{{150, 500 - 150*slope}, {3150, 500 - 3150*slope}, {4150, 100}, {6150, 100}, {8150, 100}, {9150, 100 + 1000*slope}, {12150, 500 - 150*slope}} {
		near(t, "height", atStation(t, n, "prestress.profile/tendon-level", c.x, 1), c.y, 1e-6)
		near(t, "eccentricity", atStation(t, n, "section.positions/eccentricity", c.x, 1)+1000, 1300-c.y, 1e-6)
		near(t, "height of the straight row", atStation(t, n, "prestress.profile/tendon-level", c.x, 0), 50, 1e-12)
	}
	bond := trace.LineOf(n.Entry("prestress.transmission/tendon-bond-conditions"))
	if bond.Values[0] != 1 || bond.Values[1] != 0.7 {
		t.Errorf("bond conditions %v: the deflected row is in the upper zone at its ends", bond.Values)
	}
	angle := math.Atan(slope)
	force := trace.LineOf(n.Entry("prestress.hold-down/hold-down-force"))
	near(t, "hold-down force", force.Shadow[1], 2*93*1340*math.Sin(angle), 1e-9)
	near(t, "hold-down force of the straight row", force.Shadow[0], 0, 0)
	near(t, "force on the concrete", trace.LineOf(n.Entry("prestress.hold-down/deviation-force")).Shadow[1], 2*93*1240*math.Sin(angle), 1e-9)
	groups := trace.LineOf(n.Entry("materials.tendons/group-area"))
	near(t, "area of the straight group", groups.Shadow[0], 4*93, 1e-12)
	near(t, "area of the deflected group", groups.Shadow[1], 2*93, 1e-12)
}

// TestSlightlyDeflected: with a rise of next to nothing the note comes to what it is for straight strands.
func TestSlightlyDeflected(t *testing.T) {
	straight := designed(t, draped(t, func(m *member.Member) { m.Strands.Rows[1].Deflected = member.Deflection{} }))
	bent := designed(t, draped(t, func(m *member.Member) { m.Strands.Rows[1].Deflected.Rise = quantityOf(t, "0.001 mm") }))
	near(t, "M_Rd", unrounded(t, bent, resistance), unrounded(t, straight, resistance), 1e-9)
	for _, x := range []float64{150, 6150} {
		for i := range 2 {
			near(t, "present stress", atStation(t, bent, "prestress.along/present-stress", x, i), atStation(t, straight, "prestress.along/present-stress", x, i), 1e-9)
		}
	}
}

// TestHeldDownOnce: held down in the middle alone; further out is refused.
func TestHeldDownOnce(t *testing.T) {
	n := designed(t, draped(t, func(m *member.Member) { m.Strands.Rows[1].Deflected.FromEnd = quantityOf(t, "6.15 m") }))
	near(t, "hold-down force, both sides rising", atStation(t, n, "prestress.hold-down/hold-down-force", 6150, 1), 2*2*93*1340*math.Sin(math.Atan(400.0/6150)), 1e-9)
	near(t, "height in the middle", atStation(t, n, "prestress.profile/tendon-level", 6150, 1), 100, 1e-7)
	m := draped(t, func(m *member.Member) { m.Strands.Rows[1].Deflected.FromEnd = quantityOf(t, "6.2 m") })
	if _, err := design.Run(m); err == nil || !strings.Contains(err.Error(), "held down 6.2 m from the ends") {
		t.Errorf("held down beyond the middle: %v", err)
	}
}

// TestPlacesAcross: where a row has places of its own, the record has that of every tendon, those of the other rows at their
// spacing.
func TestPlacesAcross(t *testing.T) {
	n := designed(t, draped(t, func(m *member.Member) {
		m.Strands.Rows[1].Positions = []member.Value{quantityOf(t, "-100 mm"), quantityOf(t, "90 mm")}
		m.Strands.Rows[1].Spacing = member.Value{}
	}))
	closes(t, n)
	x, row := trace.LineOf(n.Entry("given.tendons/position-x")), trace.LineOf(n.Entry("given.tendons/position-row"))
	if got, of := strings.Join(x.Shown, " "), strings.Join(row.Shown, " "); got != "-90 -30 30 90 -100 90" || of != "0 0 0 0 1 1" {
		t.Errorf("places %s of rows %s", got, of)
	}
	if n.Entry("given.tendons/spacing") != nil {
		t.Error("a spacing is recorded beside the places")
	}
}

// TestRandomProfiles: chains of lines at random close, and rounding moves no check of theirs.
func TestRandomProfiles(t *testing.T) {
	kinds := []string{"straight line", "parabola level here", "parabola level before", "parabola onward"}
	closed := 0
	for seed := range 16 {
		r := rand.New(rand.NewSource(int64(seed)))
		n, err := design.Run(girder(t, func(m *member.Member) {
			d, segments := &m.Ducts.Rows[0], 1+r.Intn(6)
			d.StressedFrom = word([]string{"A", "B", "both ends"}[r.Intn(3)])
			d.Profile = nil
			for k := range segments + 1 {
				p := member.ProfileRow{At: quantityOf(t, fmt.Sprintf("%.2f m", 20.3*float64(k)/float64(segments))), Height: quantityOf(t, fmt.Sprintf("%d mm", 100+r.Intn(700)))}
				switch {
				case k == 1:
					p.By = word(kinds[r.Intn(3)])
				case k > 1:
					p.By = word(kinds[r.Intn(4)])
				}
				d.Profile = append(d.Profile, p)
			}
			m.Bars.SteelDiagram = word("horizontal")
			for _, y := range []string{"50 mm", "950 mm"} {
				m.Bars.Rows = append(m.Bars.Rows, member.BarRow{Name: word(y), Count: member.Count{N: 6}, Diameter: quantityOf(t, "25 mm"), Spacing: quantityOf(t, "60 mm"), Height: quantityOf(t, y), Fyk: quantityOf(t, "500 MPa"), DuctilityClass: word("B")})
			}
		}))
		switch {
		case err == nil:
			closed++
			closes(t, n)
		case !strings.Contains(err.Error(), "leaves the concrete"):
			t.Errorf("seed %d: %v", seed, err)
		}
	}
	if closed < 8 {
		t.Errorf("%d profiles within the concrete", closed)
	}
}

// TestShearOnOverhangOfDucts: on an overhang of a post-tensioned member the tension that shear adds is checked at each station
// that hogs, cracked or not.
func TestShearOnOverhangOfDucts(t *testing.T) {
	n := designed(t, girder(t, func(m *member.Member) {
		bearingAt(t, "4 m", "150 mm")(m)
		m.Ducts.Rows[0].Profile[0].Height = quantityOf(t, "700 mm")
	}))
	closes(t, n)
	x := trace.LineOf(n.Entry("actions.effects/position"))
	asked, ok := n.Entry("ultimate.hogging-cracked/hogging-with-shear").(*trace.Check)
	if !ok {
		t.Fatal("no check of hogging with the tension that shear adds")
	}
	resists := trace.LineOf(n.Entry("ultimate.hogging-bending/moment-resistance"))
	beyond := 0
	for i, v := range x.Values {
		if v < 4000 && resists.Taken(i) && resists.Values[i] > 0 {
			beyond++
			if asked.Ratio[i] == "" {
				t.Errorf("nothing asked at %g mm", v)
			}
		}
	}
	if beyond < 8 {
		t.Errorf("%d stations on the overhang", beyond)
	}
}
