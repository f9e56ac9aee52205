package design

import (
	"bytes"
	"fmt"
	"math"
	"strings"
	"testing"

	"soffit/calc/mechanics"
	"soffit/calc/member"
	"soffit/calc/section"
	"soffit/calc/trace"
)

// shapes are invented sections, one or more of each kind.
var shapes = map[string]string{
	"rectangle":             "{kind: rectangle, width: 300 mm, depth: 600 mm}",
	"rectangle, chamfers":   "{kind: rectangle, width: 300 mm, depth: 600 mm, chamfer: 20 mm, top chamfer: 15 mm}",
	"trapezoid":             "{kind: trapezoid, bottom width: 240 mm, top width: 400 mm, depth: 550 mm, chamfer: 15 mm}",
	"T":                     "{kind: T, depth: 800 mm, flange width: 700 mm, flange depth: 120 mm, haunch depth: 40 mm, web width: 200 mm}",
	"T, chamfer":            "{kind: T, depth: 800 mm, flange width: 700 mm, flange depth: 120 mm, web width: 200 mm, chamfer: 20 mm}",
	"I":                     "{kind: I, depth: 1100 mm, top flange: {width: 400 mm, depth: 160 mm, haunch depth: 60 mm}, web width: 140 mm, bottom flange: {width: 400 mm, depth: 180 mm, haunch depth: 80 mm}}",
	"I without a web":       "{kind: I, depth: 700 mm, top flange: {width: 500 mm, depth: 200 mm, haunch depth: 150 mm}, web width: 140 mm, bottom flange: {width: 400 mm, depth: 200 mm, haunch depth: 150 mm}}",
	"inverted T":            "{kind: inverted T, depth: 700 mm, ledge: {width: 600 mm, depth: 250 mm, haunch depth: 30 mm}, web width: 300 mm, chamfer: 20 mm}",
	"U":                     "{kind: U, bottom width: 900 mm, top width: 1300 mm, depth: 1100 mm, web thickness: 130 mm, floor thickness: 180 mm, haunch: 80 mm, chamfer: 20 mm}",
	"box":                   "{kind: box, width: 1000 mm, depth: 1000 mm, web thickness: 140 mm, top slab: {depth: 160 mm, width: 1600 mm, haunch: 90 mm}, bottom slab: {depth: 150 mm, haunch: 60 mm}, chamfer: 20 mm}",
	"double T":              "{kind: double T, width: 2400 mm, depth: 600 mm, flange depth: 60 mm, stem spacing: 1200 mm, stem width at soffit: 120 mm, stem width at flange: 180 mm, haunch: 40 mm, chamfer: 15 mm}",
	"hollow, round":         "{kind: hollow unit, width: 1196 mm, depth: 265 mm, voids: {count: 6, spacing: 190 mm, width: 150 mm, depth: 150 mm, height: 132 mm}, joint: {inset: 20 mm, recess: 32 mm, from: 60 mm, to: 200 mm, flank: 12 mm}}",
	"hollow, upright":       "{kind: hollow unit, width: 1200 mm, depth: 400 mm, voids: {count: 5, spacing: 223 mm, width: 165.5 mm, depth: 301.25 mm, height: 195 mm}, chamfer: 10 mm}",
	"hollow, level":         "{kind: hollow unit, width: 1200 mm, depth: 240 mm, voids: {count: 3, spacing: 380 mm, width: 300 mm, depth: 120 mm, height: 115 mm}}",
	"polygon":               "{kind: polygon, corners: [{x: 0 mm, y: 0 mm}, {x: 420 mm, y: 0 mm}, {x: 500 mm, y: 700 mm}, {x: 260 mm, y: 820 mm}, {x: 160 mm, y: 820 mm}, {x: -80 mm, y: 700 mm}]}",
	"polygon with holes":    "{kind: polygon, corners: [{x: 0 mm, y: 100 mm}, {x: 600 mm, y: 100 mm}, {x: 600 mm, y: 900 mm}, {x: 0 mm, y: 900 mm}], holes: [{corners: [{x: 100 mm, y: 500 mm}, {x: 500 mm, y: 500 mm}, {x: 300 mm, y: 800 mm}]}], round voids: [{x: 200 mm, y: 300 mm, width: 140 mm, depth: 140 mm}, {x: 400 mm, y: 300 mm, width: 140 mm, depth: 140 mm}, {x: 300 mm, y: 190 mm, width: 200 mm, depth: 60 mm}]}",
	"polygon, odd measures": "{kind: polygon, corners: [{x: 0 mm, y: 17.1234567 mm}, {x: 333.333333 mm, y: 17.1234567 mm}, {x: 345.678933 mm, y: 611.11111 mm}, {x: -12.3456 mm, y: 611.11111 mm}]}",
	"keel with a void":      "{kind: polygon, corners: [{x: -150 mm, y: 0 mm}, {x: 150 mm, y: 0 mm}, {x: 350 mm, y: 500 mm}, {x: -350 mm, y: 500 mm}], round voids: [{x: 0 mm, y: 260 mm, width: 200 mm, depth: 200 mm}]}",
	"type I":                "{kind: I, depth: 711.2 mm, top flange: {width: 304.8 mm, depth: 101.6 mm, haunch depth: 76.2 mm}, web width: 152.4 mm, bottom flange: {width: 406.4 mm, depth: 127 mm, haunch depth: 127 mm}}",
	"type II":               "{kind: I, depth: 914.4 mm, top flange: {width: 304.8 mm, depth: 152.4 mm, haunch depth: 76.2 mm}, web width: 152.4 mm, bottom flange: {width: 457.2 mm, depth: 152.4 mm, haunch depth: 152.4 mm}}",
}

const memberText = `format: soffit/1
document: {project: Invented, title: Beam, number: X-1, revision: A, status: draft, prepared: {name: N. N.}}
basis: {combination: 6.10}
concrete: {f_ck: 50 MPa, unit weight: 25 kN/m³, f_ck at release: 35 MPa%s}
shape: %s%s
strands:
  bond: good
  rows:
    - {name: low, product: Y1860S7-12.5, count: 2, spacing: 60 mm, height: 45 mm, jacking stress: 1340 MPa, stated losses: {at release: 100 MPa, final: 250 MPa, source: invented}}
bars:
  rows:
    - {name: up, count: 2, diameter: 12 mm, spacing: 60 mm, height: 130 mm, f_yk: 500 MPa, ductility class: B}
span: {length: 14 m, bearing A: {from end: 1200 mm, length: 200 mm}, bearing B: {from end: 150 mm, length: 200 mm}}
actions: []
`

// reading reads a member of a shape; where strands or bars lie outside of it they are put where the finding proposes.
func reading(shape, concrete, topping string) (*member.Member, error) {
	text := fmt.Sprintf(memberText, concrete, shape, topping)
	for {
		m, findings := member.Read("m.yaml", []byte(text), Options())
		if findings == nil {
			return m, nil
		}
		lines, moved := strings.Split(text, "\n"), false
		for _, f := range findings {
			if _, proposal, ok := strings.Cut(f.Hint, "for example, "); ok && strings.HasPrefix(proposal, "positions: [") {
				lines[f.Line-1] = strings.Replace(lines[f.Line-1], "spacing: 60 mm", proposal, 1)
				moved = true
			}
		}
		if again := strings.Join(lines, "\n"); moved && again != text {
			text = again
			continue
		}
		return nil, findings.Err()
	}
}

// possible says whether a shape can be set out.
func possible(shape string) bool {
	m, err := reading(shape, "", "")
	if err == nil {
		_, err = newJob(m, false)
	}
	return err == nil
}

// setOut records a member of a shape up to its section, and the second methods for it.
func setOut(t *testing.T, shape, concrete, topping string) *job {
	t.Helper()
	m, err := reading(shape, concrete, topping)
	if err != nil {
		t.Fatalf("%v\n%s", err, shape)
	}
	j, err := newJob(m, false)
	if err != nil {
		t.Fatalf("%v\n%s", err, shape)
	}
	j.m.Span.BearingB.FromEnd.Literal = number(2*j.shape.Height(), "mm", 0) // it hogs
	j.basisChapter(j.n.Chapter("basis", "Basis"))
	j.givenChapter(j.n.Chapter("given", "The member as given"))
	j.materialsChapter(j.n.Chapter("materials", "Materials"))
	j.sectionChapter(j.n.Chapter("section", "Section"))
	j.secondSection(j.n.Chapter("second", "Second methods"))
	if err := j.n.Err(); err != nil {
		t.Fatalf("%v\n%s", err, shape)
	}
	return j
}

// value is a single recorded value in base units.
func (j *job) value(t *testing.T, key string) float64 {
	t.Helper()
	l := trace.LineOf(j.n.Entry(key))
	if l == nil || len(l.Values) != 1 {
		t.Fatalf("%s is no single value", key)
	}
	return l.Values[0]
}

// within holds a recorded value to a value known otherwise, to half a unit of the last digit printed and the rounding of
// what went in.
func (j *job) within(t *testing.T, what, key string, want, relative float64) {
	t.Helper()
	if got := j.value(t, key); !(math.Abs(got-want) <= relative*math.Abs(want)) {
		t.Errorf("%s, %s: %.9g, want %.9g", what, key, got, want)
	}
}

const wetTopping = "\ntopping: {width: 1200 mm, depth: 80 mm, f_ck: 30 MPa, unit weight: 25 kN/m³, casting: unpropped}"

// TestSections: for every kind, bare and with a topping, the record is closed, its properties are those of the kernel in
// all printed digits, and three methods agree.
func TestSections(t *testing.T) {
	for name, shape := range shapes {
		for _, topping := range []string{"", wetTopping} {
			j := setOut(t, shape, ", stress diagram: parabola-rectangle", topping)
			data, err := j.n.JSON()
			if err != nil {
				t.Fatal(err)
			}
			back, err := trace.Read(bytes.NewReader(data))
			if err != nil {
				t.Fatal(err)
			}
			proved, differences := trace.Closure(back)
			if len(differences) > 0 || proved < 60 {
				t.Errorf("%s: %d proved, %v", name, proved, differences)
			}
			o := j.form.outline
			j.within(t, name, "section.gross/"+j.areaID(), o.Area(), 5e-6)
			j.within(t, name, "section.gross/"+j.centroidID(), o.Centroid(), 5e-6)
			inertia := strings.Replace(j.areaID(), "area", "inertia", 1)
			j.within(t, name, "section.gross/"+inertia, o.Inertia(), 2e-5)
			j.within(t, name, "section.gross/notional-size", 2*o.Area()/o.Perimeter(), 1e-4)
			c, ok := j.n.Entry("second.section/section-methods-agree").(*trace.Choice)
			if !ok || c.Outcomes[0] != trace.Yes {
				t.Errorf("%s: the methods disagree", name)
			}
			levels(t, name, j)
			seen(t, name, j)
		}
	}
}

// levels holds static moments and widths to the kernel.
func levels(t *testing.T, name string, j *job) {
	t.Helper()
	o := j.form.outline
	moment := trace.LineOf(j.n.Entry("section.levels/" + pick(j.hasVoids(), "static-moment-with-voids", "static-moment")))
	width := trace.LineOf(j.n.Entry("section.levels/level-width"))
	for i, y := range append([]float64{o.Centroid()}, o.Jumps()...) {
		largest := o.StaticMoment(o.Centroid())
		if got, want := moment.Values[i], o.StaticMoment(y); math.Abs(got-want) > 2e-5*largest {
			t.Errorf("%s: static moment %g at %g, want %g", name, got, y, want)
		}
		slope := math.Abs(o.WidthAt(y+1e-3) - o.WidthAt(y-1e-3)) // what the rounding of the centroid may move
		if i > 0 {
			slope = 0
		}
		if got, want := width.Values[i], o.WidthAt(y); math.Abs(got-want) > 2e-5*want+1e-2+slope {
			t.Errorf("%s: width %g at %g, want %g", name, got, y, want)
		}
	}
}

// seen rebuilds the section from both views: area above a depth and its moment, against the kernel.
func seen(t *testing.T, name string, j *job) {
	t.Helper()
	for _, block := range []struct {
		slug, suffix string
		shape        section.Shape
	}{{"from-top", "top", j.form.outline.Shape.Flipped()}, {"from-below", "below", j.form.outline.Shape}} {
		column := func(id string) []float64 { return trace.LineOf(j.n.Entry("section." + block.slug + "/" + id)).Values }
		z, near, far := column("part-depth-"+block.suffix), column("near-width-"+block.suffix), column("far-width-"+block.suffix)
		height := trace.LineOf(j.n.Entry("given.section/part-height")).Values
		for _, share := range []float64{0.07, 0.3, 0.62, 1} {
			depth := share * block.shape.Height()
			var area, moment float64
			for n := range z {
				c := math.Max(0, math.Min(height[n], depth-z[n]))
				b := near[n] + (far[n]-near[n])*c/height[n]
				a := c * (near[n] + b) / 2
				area += a
				if a > 0 {
					moment += a * (z[n] + c*(near[n]+2*b)/(3*(near[n]+b)))
				}
			}
			if j.hasVoids() {
				count, r := trace.LineOf(j.n.Entry("given.section/round-count")).Values, trace.LineOf(j.n.Entry("given.section/round-radius")).Values
				centre, from, to := column("round-depth-"+block.suffix), column("round-from-"+block.suffix), column("round-to-"+block.suffix)
				segment := func(r, s float64) float64 {
					return r*r*math.Acos(1-s/r) - (r-s)*math.Sqrt(math.Max(0, s*(2*r-s)))
				}
				for m := range r {
					s := math.Max(from[m], math.Min(to[m], depth-centre[m]+r[m]))
					if s > 2*r[m] {
						t.Errorf("%s: a circle counts to %g of %g", name, s, 2*r[m])
					}
					a := count[m] * (segment(r[m], s) - segment(r[m], from[m]))
					area -= a
					moment -= a*centre[m] - 2./3*count[m]*(math.Pow(s*(2*r[m]-s), 1.5)-math.Pow(from[m]*(2*r[m]-from[m]), 1.5))
				}
			}
			wantArea, wantMoment := block.shape.Below(depth)
			if math.Abs(area-wantArea) > 4e-6*block.shape.Area() || math.Abs(moment-wantMoment) > 4e-6*block.shape.Area()*block.shape.Height() {
				t.Errorf("%s, %s, %.0f mm: area %.9g and moment %.9g, want %.9g and %.9g", name, block.slug, depth, area, moment, wantArea, wantMoment)
			}
		}
	}
}

// TestPublishedGirders: open girders of an appendix, converted from inches. Source: PCI Journal, May–June 2021, appendix;
// properties as printed there, measures from memory (recalled).
func TestPublishedGirders(t *testing.T) {
	const inch = 25.4
	for name, want := range map[string][3]float64{"type I": {276, 12.59, 22744}, "type II": {369, 15.83, 50979}} {
		j := setOut(t, shapes[name], "", "")
		for i, key := range []string{"area", "centroid", "inertia"} {
			got := j.value(t, "section.gross/"+key) / math.Pow(inch, []float64{2, 1, 4}[i])
			if tol := []float64{0.5, 0.005, 0.5}[i]; math.Abs(got-want[i]) > tol {
				t.Errorf("%s, %s: %.6g, want %g", name, key, got, want[i])
			}
		}
	}
}

// polygonText is a polygon through points given as x and y in turn.
func polygonText(xy ...float64) string {
	var corners []string
	for i := 0; i < len(xy); i += 2 {
		corners = append(corners, fmt.Sprintf("{x: %.9g mm, y: %.9g mm}", xy[i], xy[i+1]))
	}
	return "{kind: polygon, corners: [" + strings.Join(corners, ", ") + "]}"
}

// TestPolygonTurned: a polygon turned by 180°, mirrored, moved or written the other way round has the same properties, its
// centroid from the other edge where it is turned; that of a girder has those of the girder's own kind; all to 1e-9 in the
// kernel and to the printed digits in the record.
func TestPolygonTurned(t *testing.T) {
	girder := []float64{-203.2, 0, 203.2, 0, 203.2, 127, 76.2, 254, 76.2, 533.4, 152.4, 609.6, 152.4, 711.2, -152.4, 711.2, -152.4, 609.6, -76.2, 533.4, -76.2, 254, -203.2, 127}
	gable := []float64{0, 0, 420, 0, 500, 700, 260, 820, 160, 820, -80, 700}
	for name, xy := range map[string][]float64{"girder": girder, "gable": gable} {
		one := setOut(t, polygonText(xy...), "", "")
		if name == "girder" {
			same(t, "polygon of a girder", one, setOut(t, shapes["type I"], "", ""), false)
		}
		for how, f := range map[string]func(x, y float64) (float64, float64){
			"turned":   func(x, y float64) (float64, float64) { return 300 - x, 900 - y },
			"mirrored": func(x, y float64) (float64, float64) { return -x, y },
			"moved":    func(x, y float64) (float64, float64) { return x + 1000, y - 500 },
		} {
			other := make([]float64, len(xy))
			for i := 0; i < len(xy); i += 2 {
				other[i], other[i+1] = f(xy[i], xy[i+1])
			}
			same(t, name+" "+how, setOut(t, polygonText(other...), "", ""), one, how == "turned")
		}
		back := make([]float64, len(xy))
		for i := 0; i < len(xy); i += 2 {
			back[len(xy)-2-i], back[len(xy)-1-i] = xy[i], xy[i+1]
		}
		same(t, name+" the other way round", setOut(t, polygonText(back...), "", ""), one, false)
	}
}

func same(t *testing.T, name string, a, b *job, turned bool) {
	t.Helper()
	p, q := a.form.outline, b.form.outline
	y := q.Centroid()
	if turned {
		y = q.Height() - y
	}
	for _, c := range [][2]float64{{p.Area(), q.Area()}, {p.Centroid(), y}, {p.Inertia(), q.Inertia()}, {p.LateralInertia(), q.LateralInertia()}, {p.Perimeter(), q.Perimeter()}} {
		if math.Abs(c[0]-c[1]) > 1e-9*math.Abs(c[1]) {
			t.Errorf("%s: %.12g, want %.12g", name, c[0], c[1])
		}
	}
	a.within(t, name, "section.gross/area", b.value(t, "section.gross/area"), 5e-6)
	a.within(t, name, "section.gross/centroid", y, 5e-6)
	a.within(t, name, "section.gross/inertia", b.value(t, "section.gross/inertia"), 2e-5)
}

// TestSplit: a girder cut at a level in two gives its properties again when the two are put together.
func TestSplit(t *testing.T) {
	whole := setOut(t, shapes["type I"], "", "").form.outline
	lower := setOut(t, polygonText(-203.2, 0, 203.2, 0, 203.2, 127, 76.2, 254, 76.2, 400, -76.2, 400, -76.2, 254, -203.2, 127), "", "").form.outline
	upper := setOut(t, polygonText(-76.2, 400, 76.2, 400, 76.2, 533.4, 152.4, 609.6, 152.4, 711.2, -152.4, 711.2, -152.4, 609.6, -76.2, 533.4), "", "").form.outline
	p := upper.ByPolygons()
	p.Centroid += 400
	p = p.Plus(lower.ByPolygons())
	for _, c := range [][2]float64{{p.Area, whole.Area()}, {p.Centroid, whole.Centroid()}, {p.Inertia, whole.Inertia()}, {p.LateralInertia, whole.LateralInertia()}} {
		if math.Abs(c[0]-c[1]) > 1e-9*c[1] {
			t.Errorf("%.12g, want %.12g", c[0], c[1])
		}
	}
}

// areaID is the ID of the formula that gives A_c.
func (j *job) areaID() string { return pick(j.hasVoids(), mechanics.AreaWithVoids, mechanics.Area).ID }
