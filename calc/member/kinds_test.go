package member

import (
	"math"
	"math/rand/v2"
	"slices"
	"strings"
	"testing"
)

// file is a member file of given parts; shape, steel and so on are lines without indent.
func file(shape, steel, actions string) string {
	in := func(s string) string { return "  " + strings.ReplaceAll(strings.TrimSpace(s), "\n", "\n  ") + "\n" }
	return `format: soffit/1
document: {project: Sheds, title: Beam, number: "7", revision: A, status: draft, prepared: {name: Ada Vane}}
basis: {combination: 6.10}
concrete: {f_ck: 50 MPa, unit weight: 25 kN/m³, f_ck at release: 36 MPa}
span: {length: 12 m, bearing A: {from end: 100 mm, length: 100 mm}, bearing B: {from end: 100 mm, length: 100 mm}}
shape:
` + in(shape) + steel + "\nactions: " + actions + "\n"
}

func row(name, place, height string) string {
	return "    - {name: " + name + ", product: Y1860S7-12.5, " + place + ", height: " + height +
		", jacking stress: 1300 MPa, stated losses: {at release: 90 MPa, final: 200 MPa, source: s}}\n"
}

func strandsOf(rows ...string) string {
	return "strands:\n  bond: good\n  rows:\n" + strings.Join(rows, "")
}

// TestKinds: one good file of each kind; areas worked out by hand.
func TestKinds(t *testing.T) {
	low := strandsOf(row("low", "count: 2, spacing: 50 mm", "40 mm"))
	stems := strandsOf(row("low", "count: 2, spacing: 1200 mm", "40 mm"), row("second", "count: 4, positions: [575 mm, -575 mm, 625 mm, -625 mm]", "80 mm"))
	oblong := 150.0*30 + math.Pi/4*150*150
	for _, c := range []struct {
		shape, steel string
		area         float64
	}{
		{"kind: rectangle\ndepth: 600 mm\nwidth: 300 mm\nchamfer: 20 mm\ntop chamfer: 10 mm", low, 600*300 - 400 - 100},
		{"kind: trapezoid\ndepth: 600 mm\nbottom width: 300 mm\ntop width: 500 mm", low, 600 * 400},
		{"kind: T\ndepth: 600 mm\nflange width: 900 mm\nflange depth: 120 mm\nhaunch depth: 30 mm\nweb width: 200 mm", low, 900*120 + 550*30 + 450*200},
		{"kind: I\ndepth: 600 mm\ntop flange: {width: 400 mm, depth: 100 mm}\nweb width: 120 mm\nbottom flange: {width: 300 mm, depth: 150 mm}", low, 400*100 + 350*120 + 300*150},
		{"kind: inverted T\ndepth: 600 mm\nledge: {width: 500 mm, depth: 200 mm, haunch depth: 20 mm}\nweb width: 300 mm\nchamfer: 10 mm", low, 500*200 + 400*20 + 380*300 - 100},
		{"kind: U\ndepth: 600 mm\nbottom width: 700 mm\ntop width: 700 mm\nweb thickness: 100 mm\nfloor thickness: 120 mm\nhaunch: 50 mm", low, 700*120 + 2*480*100 + 2500},
		{"kind: box\ndepth: 900 mm\nwidth: 800 mm\nweb thickness: 150 mm\ntop slab: {depth: 160 mm, width: 1200 mm, haunch: 60 mm}\nbottom slab: {depth: 140 mm}", low,
			1200*160 + 800*140 + 2*600*150 + 3600},
		{"kind: box\ndepth: 900 mm\nwidth: 800 mm\nweb thickness: 150 mm\ntop slab: {depth: 160 mm}\nbottom slab: {depth: 140 mm, haunch: 50 mm}", low,
			800*300 + 2*600*150 + 2500},
		{"kind: double T\ndepth: 600 mm\nwidth: 2400 mm\nflange depth: 100 mm\nstem spacing: 1200 mm\nstem width at soffit: 140 mm\nstem width at flange: 200 mm\nhaunch: 0 mm", stems,
			2400*100 + 2*170*500},
		{"kind: hollow unit\ndepth: 265 mm\nwidth: 1196 mm\nvoids: {count: 6, spacing: 190 mm, width: 150 mm, depth: 180 mm, height: 135 mm}", strandsOf(row("webs", "count: 5, spacing: 190 mm", "40 mm")),
			265*1196 - 6*oblong},
		{"kind: hollow unit\ndepth: 265 mm\nwidth: 1196 mm\nvoids: {count: 1, width: 150 mm, depth: 150 mm, height: 135 mm}\njoint: {inset: 20 mm, recess: 20 mm, from: 60 mm, to: 200 mm}", low,
			265*1196 - math.Pi/4*150*150 - 2*20*205},
		// clockwise, the first corner written again at the end, with hole and void; x and y from anywhere
		{`kind: polygon
corners: [{x: 1 m, y: 50 mm}, {x: 1 m, y: 650 mm}, {x: 1400 mm, y: 650 mm}, {x: 140 cm, y: 50 mm}, {x: 1 m, y: 50 mm}]
holes:
  - corners: [{x: 1100 mm, y: 150 mm}, {x: 1300 mm, y: 150 mm}, {x: 1200 mm, y: 250 mm}]
round voids:
  - {x: 1.2 m, y: 400 mm, width: 100 mm, depth: 100 mm}`, low, 600*400 - 200*100/2 - math.Pi/4*100*100},
	} {
		m, found := Read("kind.yaml", []byte(file(c.shape, c.steel, "[]")), testOptions)
		if m == nil {
			t.Errorf("%s", found)
			continue
		}
		o, err := m.Shape.Outline()
		if err != nil || math.Abs(o.Area()/c.area-1) > 1e-12 {
			t.Errorf("%s: area %.3f, want %.3f: %v", m.Shape.Kind.Text, o.Area(), c.area, err)
		}
	}
}

const rectangle = "kind: rectangle\ndepth: 600 mm\nwidth: 300 mm"

// TestEitherWayRound: a polygon reads the same with its corners in the other order, and from any of them.
func TestEitherWayRound(t *testing.T) {
	corners := []string{"{x: -250 mm, y: 0 mm}", "{x: 250 mm, y: 0 mm}", "{x: 250 mm, y: 200 mm}", "{x: 100 mm, y: 600 mm}", "{x: -100 mm, y: 600 mm}", "{x: -250 mm, y: 200 mm}"}
	for k := range 2 * len(corners) {
		list := append(slices.Clone(corners[k%6:]), corners[:k%6]...)
		if k >= 6 {
			slices.Reverse(list)
		}
		m, found := Read("p.yaml", []byte(file("kind: polygon\ncorners: ["+strings.Join(list, ", ")+"]", strandsOf(row("low", "count: 4, spacing: 50 mm", "40 mm")), "[]")), testOptions)
		if m == nil {
			t.Fatal(found)
		}
		if o, _ := m.Shape.Outline(); math.Abs(o.Area()-(500*200+350*400)) > 1e-6 {
			t.Errorf("area %g", o.Area())
		}
	}
}

// TestGroupsShare: rows have what their group states, with the place in the group.
func TestGroupsShare(t *testing.T) {
	steel := `strands:
  bond: good
  groups:
    - name: all
      product: Y1860S7-15.7
      jacking stress: 1300 MPa
      debonded length: 1.5 m
      stated losses: {at release: 90 MPa, final: 200 MPa, source: group}
    - {name: harped, deflected: {rise at ends: 300 mm, held down from ends: 4 m}}
  rows:
    - {name: one, group: all, count: 2, spacing: 50 mm, height: 50 mm}
` + row("two", "group: harped, count: 1", "100 mm") + row("three", "count: 2, positions: [100 mm, -100 mm]", "150 mm")
	m, found := Read("g.yaml", []byte(file(rectangle, steel, "[]")), testOptions)
	if m == nil {
		t.Fatal(found)
	}
	g, rows := m.Strands.Groups[0], m.Strands.Rows
	one := rows[0]
	if one.Product != g.Product || one.JackingStress != g.JackingStress || one.DebondedLength != g.DebondedLength || one.StatedLosses != g.StatedLosses || one.Deflected.Present() {
		t.Errorf("one: %+v", one)
	}
	if !one.DebondedLength.Given || one.DebondedLength.Base() != 1500 || one.JackingStress.Pos != g.JackingStress.Pos || one.StatedLosses.Source.Text != "group" {
		t.Errorf("one: %+v", one)
	}
	if two := rows[1]; !two.Deflected.Present() || two.Deflected.Rise.Base() != 300 || two.Spacing.Base() != 0 || two.Spacing.Why != "a single strand" || two.DebondedLength.Why != "bonded from the ends" {
		t.Errorf("two: %+v", two)
	}
	if x := rows[2].Across(); !slices.Equal(x, []float64{-100, 100}) || rows[2].Spacing != (Value{}) {
		t.Errorf("three at %v", x)
	}
	if x := rows[0].Across(); !slices.Equal(x, []float64{-25, 25}) {
		t.Errorf("one at %v", x)
	}
	if x := rows[1].Across(); !slices.Equal(x, []float64{0}) {
		t.Errorf("two at %v", x)
	}
	// between 0 and 4 m the strand comes down by 300 mm, 4 to 8 m it is level
	p, ok := rows[1].way(m.Span.Length)
	for at, want := range map[float64]float64{0: 400, 1000: 325, 4000: 100, 6000: 100, 8000: 100, 10000: 250, 12000: 400} {
		if y := p.Height(at); !ok || math.Abs(y-want) > 1e-9 {
			t.Errorf("height %g at %g, want %g", y, at, want)
		}
	}
}

// TestActsOn: with a topping, actions act on the composite member, construction loads on the bare one, unless they say.
func TestActsOn(t *testing.T) {
	actions := `
  - {name: screed, kind: permanent, loads: [{uniform: 2 kN/m}]}
  - {name: gang, kind: construction, loads: [{uniform: 1 kN/m}, {axial: -20 kN}]}
  - {name: wet, kind: permanent, acts on: bare member, loads: [{uniform: 1 kN/m}]}
  - {name: props, kind: construction, acts on: composite member, loads: [{point: -10 kN, at: 6 m}]}`
	topping := "\ntopping: {width: 1 m, depth: 80 mm, f_ck: 30 MPa, unit weight: 25 kN/m³, casting: unpropped}\n"
	steel := strandsOf(row("low", "count: 4, spacing: 50 mm", "50 mm")) + "bars: {rows: [{name: top, count: 4, diameter: 12 mm, spacing: 250 mm, height: 640 mm, f_yk: 500 MPa, ductility class: B}]}"
	m, found := Read("a.yaml", []byte(file(rectangle, topping+steel, actions)), testOptions)
	if m == nil {
		t.Fatal(found)
	}
	for i, want := range []struct {
		on    string
		given bool
	}{{"composite member", false}, {"bare member", false}, {"bare member", true}, {"composite member", true}} {
		if a := m.Actions[i].ActsOn; a.Text != want.on || a.Given != want.given || want.given == (a.Why != "") {
			t.Errorf("%s: %+v", m.Actions[i].Name.Text, a)
		}
	}
	if l := m.Actions[1].Loads[1]; l.Axial.Base() != -20000 || l.From.Present() || l.To.Present() {
		t.Errorf("axial: %+v", l)
	}
	if !m.Topping.Present() || m.Topping.Aggregate.Text != "quartzite" || m.Concrete.Diagram.Present() {
		t.Error("topping or diagram")
	}
	bare, found := Read("a.yaml", []byte(file(rectangle, strandsOf(row("low", "count: 4, spacing: 50 mm", "50 mm")), "[{name: screed, kind: permanent, loads: [{uniform: 2 kN/m}]}]")), testOptions)
	if bare == nil || bare.Topping.Present() || bare.Actions[0].ActsOn.Present() {
		t.Errorf("without a topping: %s", found)
	}
}

// TestProfile: heights of a chain of lines, each worked out by hand.
func TestProfile(t *testing.T) {
	steel := `ducts:
  friction: {coefficient: 0.19, unintended angle: 0.008 1/m, source: s}
  rows:
    - name: chain
      product: Y1860S7-15.7
      strands: 7
      count: 1
      duct diameter: 60 mm
      stressed from: both ends
      jacking stress: 1400 MPa
      stated losses: {at stressing: 50 MPa, final: 200 MPa, source: s}
      profile:
        - {at: 0 m, height: 400 mm}
        - {at: 2 m, height: 300 mm, by: straight line}
        - {at: 4 m, height: 250 mm, by: parabola onward}
        - {at: 6 m, height: 200 mm, by: parabola level here}
        - {at: 12 m, height: 400 mm, by: parabola level before}
`
	m, found := Read("d.yaml", []byte(file(rectangle, steel, "[]")), testOptions)
	if m == nil {
		t.Fatal(found)
	}
	d := &m.Ducts.Rows[0]
	if d.Spacing.Base() != 0 || d.Spacing.Why != "a single duct" || !m.Ducts.Present() || m.Strands.Present() {
		t.Errorf("%+v", d.Spacing)
	}
	p, ok := d.way()
	for at, want := range map[float64]float64{
		0: 400, 1000: 350, 2000: 300,
		3000: 300 - 50 + 12.5, // slope −0.05 from the line before, then up by (−50 + 100)/2² of the square
		4000: 250,
		5000: 200 + 50.0/4, 6000: 200,
		9000: 200 + 200.0/4, 12000: 400,
	} {
		if y := p.Height(at); !ok || math.Abs(y-want) > 1e-9 {
			t.Errorf("height %g at %g, want %g", y, at, want)
		}
	}
	if n := len(looked(p, 200)); n < 200 || n > 220 {
		t.Errorf("%d places", n)
	}
	if mu := m.Ducts.Friction; mu.Mu.Base() != 0.19 || mu.Wobble.Base() != 8e-6 {
		t.Errorf("friction %v %v", mu.Mu.Base(), mu.Wobble.Base())
	}
}

// TestProposals: positions that a finding proposes are accepted.
func TestProposals(t *testing.T) {
	double := "kind: double T\ndepth: 600 mm\nwidth: 2400 mm\nflange depth: 80 mm\nstem spacing: 1200 mm\nstem width at soffit: 120 mm\nstem width at flange: 180 mm"
	unit := "kind: hollow unit\ndepth: 265 mm\nwidth: 1196 mm\nvoids: {count: 6, spacing: 190 mm, width: 150 mm, depth: 150 mm, height: 132 mm}"
	trough := "kind: U\ndepth: 900 mm\nbottom width: 600 mm\ntop width: 900 mm\nweb thickness: 120 mm\nfloor thickness: 150 mm"
	proposed := 0
	for shape, heights := range map[string][]string{double: {"50 mm", "300 mm", "500 mm"}, unit: {"60 mm", "132 mm", "200 mm"}, trough: {"200 mm", "500 mm", "850 mm"}} {
		for _, y := range heights {
			for _, n := range []string{"2", "4", "6", "7", "14"} {
				_, found := Read("p.yaml", []byte(file(shape, strandsOf(row("even", "count: "+n+", spacing: 20 mm", y)), "[]")), testOptions)
				for _, f := range found {
					_, positions, ok := strings.Cut(f.Hint, "positions: [")
					if !ok {
						continue
					}
					proposed++
					again := strandsOf(row("even", "count: "+n+", positions: ["+positions, y))
					if m, found := Read("p.yaml", []byte(file(shape, again, "[]")), testOptions); m == nil {
						t.Errorf("%s at %s: proposed [%s, but: %s", n, y, positions, found)
					}
				}
			}
		}
	}
	if proposed < 15 {
		t.Errorf("%d proposals", proposed)
	}
}

// TestBrokenShapeHasNoLines: where a key of the shape cannot be read, nothing is said of the lines.
func TestBrokenShapeHasNoLines(t *testing.T) {
	for _, corner := range []string{"{x: 0 mm, y: 700}", "{x: 0 mm}", "5", "{x: 0 mm, y: *a}"} {
		shape := "kind: polygon\ncorners:\n- {x: -200 mm, y: 0 mm}\n- {x: 200 mm, y: 0 mm}\n- " + corner + "\n- {x: 200 mm, y: 600 mm}\n- {x: -200 mm, y: 600 mm}"
		_, found := Read("b.yaml", []byte(file(shape, strandsOf(row("low", "count: 4, spacing: 50 mm", "50 mm")), "[]")), testOptions)
		if len(found) == 0 || strings.Contains(found.String(), "crosses") || strings.Contains(found.String(), "touches") || strings.Contains(found.String(), "symmetrical") {
			t.Errorf("%s: %s", corner, found)
		}
	}
}

// TestBand: whether a circle lies in the concrete, told quickly and by the clearance of the outline.
func TestBand(t *testing.T) {
	r := rand.New(rand.NewPCG(1, 2))
	in, out := 0, 0
	for _, shape := range []string{
		"kind: double T\ndepth: 600 mm\nwidth: 2400 mm\nflange depth: 80 mm\nstem spacing: 1200 mm\nstem width at soffit: 120 mm\nstem width at flange: 180 mm\nhaunch: 50 mm",
		"kind: hollow unit\ndepth: 600 mm\nwidth: 2396 mm\nvoids: {count: 6, spacing: 390 mm, width: 250 mm, depth: 350 mm, height: 300 mm}\njoint: {inset: 20 mm, recess: 60 mm, from: 60 mm, to: 200 mm, flank: 10 mm}",
		"kind: box\ndepth: 600 mm\nwidth: 1.6 m\nweb thickness: 250 mm\ntop slab: {depth: 180 mm, width: 2.4 m, haunch: 100 mm}\nbottom slab: {depth: 150 mm}",
		"kind: polygon\ncorners: [{x: 1 m, y: 0 mm}, {x: 3.4 m, y: 0 mm}, {x: 2.2 m, y: 600 mm}]\nround voids: [{x: 2.2 m, y: 200 mm, width: 600 mm, depth: 200 mm}]",
	} {
		m, found := Read("b.yaml", []byte(file(shape, strandsOf(row("low", "count: 2, spacing: 1200 mm", "30 mm")), "[]")), testOptions)
		if m == nil {
			t.Fatal(found)
		}
		o, _ := m.Shape.Outline()
		for range 4000 {
			x, y, radius := o.CentroidX()+2500*(r.Float64()-0.5), 600*r.Float64(), 1+60*r.Float64()
			b := bandAt(o, y, radius)
			want := o.Clearance(x, y) >= radius
			if b.holds(x) != want {
				t.Errorf("%s: circle of %g at (%g, %g): %v, clearance %g", m.Shape.Kind.Text, radius, x, y, !want, o.Clearance(x, y))
			}
			if want {
				in++
			} else {
				out++
			}
		}
	}
	if in < 1500 || out < 1500 {
		t.Errorf("%d in, %d out", in, out)
	}
}
