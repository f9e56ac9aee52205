package diagram

import (
	"math"
	"strings"
	"testing"

	"pgregory.net/rapid"

	cross "soffit/calc/section"
	"soffit/calc/trace"
	"soffit/report/draw"
)

// size of the area of a ring.
func (r ring) area() float64 {
	var a float64
	r.edges(func(p, q point) { a += p.x*q.y - q.x*p.y })
	return math.Abs(a) / 2
}

func areas(rs []ring) (a float64) {
	for _, r := range rs {
		a += r.area()
	}
	return a
}

// TestBetween cuts the outlines of all kinds of section: the parts between two heights have the area that the widths
// in between add up to, and the parts together that of the whole.
func TestBetween(t *testing.T) {
	for _, m := range kindsOfSection() {
		c := m.contour(t)
		for _, points := range append(c.Outer, c.Holes...) {
			var r ring
			low, high := math.Inf(1), math.Inf(-1)
			for _, p := range points {
				r = append(r, point{p.X, p.Y})
				low, high = min(low, p.Y), max(high, p.Y)
			}
			rapid.Check(t, func(t *rapid.T) {
				from := low + (high-low)*rapid.Float64Range(0, 1).Draw(t, "from")
				to := from + (high-from)*rapid.Float64Range(0, 1).Draw(t, "to")
				parts := areas(r.between(low-1, from)) + areas(r.between(from, to)) + areas(r.between(to, high+1))
				if math.Abs(parts-r.area()) > 1e-6*r.area() {
					t.Errorf("%s cut at %.2f and %.2f: parts %.1f, whole %.1f", m.name, from, to, parts, r.area())
				}
				const strips = 2000
				var sum float64
				for i := range strips {
					y := from + (to-from)*(float64(i)+0.5)/strips
					sum += breadth(r, y) * (to - from) / strips
				}
				if got := areas(r.between(from, to)); math.Abs(got-sum) > 2e-3*r.area() {
					t.Errorf("%s between %.2f and %.2f: %.1f, by strips %.1f", m.name, from, to, got, sum)
				}
			})
		}
	}
}

// breadth is the length within a ring on a level line.
func breadth(r ring, y float64) float64 {
	var w float64
	r.edges(func(a, b point) {
		if (a.y > y) != (b.y > y) {
			x := a.x + (b.x-a.x)*(y-a.y)/(b.y-a.y)
			w += x * math.Copysign(1, b.y-a.y)
		}
	})
	return math.Abs(w)
}

// TestStemsStayApart: a double T cut through its stems gives two rings, and none that reaches from one to the other.
func TestStemsStayApart(t *testing.T) {
	o, err := cross.DoubleT{Width: 2400, Depth: 600, Flange: 60, Spacing: 1200, StemBottom: 140, StemTop: 200}.Outline()
	if err != nil {
		t.Fatal(err)
	}
	var r ring
	for _, p := range o.Contour().Outer[0] {
		r = append(r, point{p.X, p.Y})
	}
	got := r.between(0, 200)
	if len(got) != 2 {
		t.Fatalf("%d rings, want 2", len(got))
	}
	for _, k := range got {
		// A stem is 140 mm wide at the soffit and 200 mm at 540 mm: 162.2 mm at 200 mm.
		if want := (140.0 + 140 + 60*200.0/540) / 2 * 200; math.Abs(k.area()-want) > 1 {
			t.Errorf("area %.1f, want %.1f", k.area(), want)
		}
	}
}

// shapeOf is a form as the figures read it.
func shapeOf(t *testing.T, f cross.Form) shape {
	m := &invented{form: f, length: 5, b: 5, tendons: []row{{name: "1", count: 1, level: 50, diameter: 12}}, loads: []load{{"g", 1, 0, 0, 5}}, x: 20, centroid: 100,
		dims: []dimension{{"depth", 0, 0, 0, 1}}}
	m.mesh()
	n, figs := m.note(t)
	d := read(n, figs["fig-section"])
	s := d.shape()
	if d.err != nil {
		t.Fatal(d.err)
	}
	return s
}

// TestWhereDimensionsStand: a width is written where it is seen from, what is hidden stands inside.
func TestWhereDimensionsStand(t *testing.T) {
	i := shapeOf(t, cross.IBeam{Depth: 1000, Top: cross.Flange{Width: 600, Depth: 100, Haunch: 50}, Web: 150, Bottom: cross.Flange{Width: 400, Depth: 150, Haunch: 100}, Chamfer: 20})
	box := shapeOf(t, cross.BoxBeam{Width: 2000, Depth: 1000, Top: 200, Web: 250, Bottom: 150})
	for _, c := range []struct {
		name           string
		s              *shape
		x1, y1, x2, y2 float64
		want           side
		mirrored       bool
	}{
		{"top", &i, -300, 1000, 300, 1000, over, false},
		{"top flange over its side", &i, -300, 900, 300, 900, over, false},
		{"bottom flange over its side", &i, -200, 100, 200, 100, under, false},
		{"soffit", &i, -180, 0, 180, 0, under, false},
		{"web", &i, -75, 500, 75, 500, inside, false},
		{"depth", &i, -300, 0, -300, 1000, beforeLeft, false},
		{"depth of the web, right", &i, 75, 250, 75, 850, beforeLeft, false}, // its ends are seen from the left
		{"depth of the box, right", &box, 1000, 0, 1000, 1000, beforeLeft, false},
		{"flange in the axis", &i, 0, 900, 0, 1000, beforeLeft, false}, // its edge is seen from the left
		{"on the right face", &box, 1000, 300, 1000, 700, beforeLeft, true},
		{"web of a box", &box, 750, 500, 1000, 500, inside, false},
		{"slab of a box", &box, 0, 800, 0, 1000, inside, false},
	} {
		m := measure{a: point{c.x1, c.y1}, b: point{c.x2, c.y2}, level: c.y1 == c.y2}
		got, at := c.s.stand(m)
		if at != c.want || (got.a.x == -m.a.x && m.a.x != 0) != c.mirrored {
			t.Errorf("%s stands at %d as %v, want %d", c.name, at, got, c.want)
		}
	}
	if s := i.silhouette(); len(s) != 5 || s[0] != 20 || s[1] != 150 || s[4] != 900 {
		t.Errorf("edges are seen at %v", s)
	}
	if s := box.silhouette(); len(s) != 0 {
		t.Errorf("edges are seen at %v, want none of the hole", s)
	}
}

// TestTiers: short dimensions lie inside of those that they are part of, neighbours on one line.
func TestTiers(t *testing.T) {
	m := func(from, to float64) measure { return measure{a: point{from, 0}, b: point{to, 0}, level: true} }
	got := tiers([]measure{m(0, 1000), m(0, 200), m(200, 500), m(100, 150), m(600, 700)})
	var out []string
	for _, row := range got {
		var s []string
		for _, k := range row {
			s = append(s, strings.TrimSuffix(strings.Repeat("-", int(k.length()/100)), " "))
		}
		out = append(out, strings.Join(s, " "))
	}
	if len(got) != 3 || len(got[0]) != 3 || len(got[1]) != 1 || len(got[2]) != 1 || got[2][0].to() != 1000 {
		t.Errorf("tiers are %v: %v", got, out)
	}
}

// TestApartOf: figures keep their order, their distance, and off the lines.
func TestApartOf(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		var at, avoid []draw.Pt
		y := draw.Pt(0)
		for range rapid.IntRange(1, 7).Draw(t, "n") {
			y += draw.Pt(rapid.IntRange(1, 30).Draw(t, "step"))
			at = append(at, y)
		}
		for range rapid.IntRange(0, 4).Draw(t, "lines") {
			avoid = append(avoid, draw.Pt(rapid.IntRange(0, 120).Draw(t, "line")))
		}
		got := apartOf(at, avoid, 0)
		for i, v := range got {
			if i > 0 && v-got[i-1] < 6.4 {
				t.Errorf("%v past %v go to %v", at, avoid, got)
			}
			for _, a := range avoid {
				if max(v-a, a-v) < size/2-0.4 {
					t.Errorf("%v past %v go to %v", at, avoid, got)
				}
			}
		}
	})
	if got := apartOf([]draw.Pt{10, 40}, nil, 0); got[0] != 10 || got[1] != 40 {
		t.Errorf("figures apart move to %v", got)
	}
}

// TestVoidPath: the outline of an oblong void on paper runs along its edge.
func TestVoidPath(t *testing.T) {
	for _, v := range []void{{0, 200, 150, 150}, {30, 200, 180, 280}, {-20, 100, 300, 120}} {
		var r draw.Recorder
		r.Path(v.path(frame{sx: 1, sy: 1}), draw.Style{Stroke: 0.2})
		b := r.Ink[0].Box.Grow(-0.1)
		want := draw.Box{X0: draw.Pt(v.x - v.width/2), Y0: draw.Pt(-v.y - v.depth/2), X1: draw.Pt(v.x + v.width/2), Y1: draw.Pt(-v.y + v.depth/2)}
		if !b.Grow(-0.01).Inside(want) || !want.Grow(-0.1).Inside(b) {
			t.Errorf("%v is drawn in %v", v, b)
		}
		for _, p := range v.ring(40) {
			if math.Abs(v.distance(p)) > 1e-9 {
				t.Errorf("%v: corner %v lies off the edge", v, p)
			}
		}
	}
}

// TestCompressedZone measures what is shaded: the block from the compressed edge, at the top or at the soffit.
func TestCompressedZone(t *testing.T) {
	tone, _ := compressed.Level()
	m := kindsOfSection()[2] // a T with topping
	n, figs := m.note(t)
	zone := func(id string) (lo, hi, all draw.Pt) {
		var whole, part draw.Box
		for _, k := range drawn(t, n, figs[id], 510).Ink {
			if k.Kind != draw.AreaInk {
				continue
			}
			if k.Tone == tone || k.Tone == 0.84 {
				if part.Empty() || k.Box.X0 < part.X1 && k.Box.X1 > part.X0 {
					part = part.Union(k.Box)
				}
			} else if whole.Empty() || k.Tone > 0.9 && k.Tone < 1 {
				whole = whole.Union(k.Box)
			}
		}
		return whole.Y1 - part.Y1, part.Y0 - whole.Y0, whole.Height()
	}
	per := draw.Mm / 15 // depths at 1:15
	lo, hi, all := zone("fig-ultimate")
	if want := per * draw.Pt(0.8*m.x); math.Abs(float64(hi)) > 0.1 || math.Abs(float64(all-lo-want)) > 0.1 {
		t.Errorf("sagging: shaded %.2f below the top, %.2f above the soffit of %.2f", float64(hi), float64(lo), float64(all))
	}
	lo, hi, all = zone("fig-ultimate-hogging")
	if want := per * draw.Pt(0.8*0.22*820); math.Abs(float64(lo)) > 0.1 || math.Abs(float64(all-hi-want)) > 0.1 {
		t.Errorf("hogging: shaded %.2f below the top, %.2f above the soffit of %.2f", float64(hi), float64(lo), float64(all))
	}
}

// TestBothResistances: the resistance to hogging stands over the line of zero, that to sagging under it.
func TestBothResistances(t *testing.T) {
	n, figs := kindsOfSection()[1].note(t)
	var zero, top, bottom draw.Pt
	for _, k := range drawn(t, n, figs["fig-resistance-both"], 510).Ink {
		if k.Kind != draw.StrokeInk || k.Box.Width() < 300 {
			continue
		}
		if k.Box.Height() < 1 && zero == 0 {
			zero = k.Box.Y0
		}
		if top == 0 || k.Box.Y0 < top {
			top = k.Box.Y0
		}
		if k.Box.Height() > 1 {
			bottom = max(bottom, k.Box.Y1)
		}
	}
	l := trace.LineOf(n.Entry("all.effects/resistance-hogging"))
	r := trace.LineOf(n.Entry("all.effects/resistance"))
	most := func(v []float64) (m float64) {
		for _, x := range v {
			m = max(m, x)
		}
		return m
	}
	got, want := float64((zero-top)/(bottom-zero)), most(l.Values)/most(r.Values)
	if math.Abs(got/want-1) > 0.03 {
		t.Errorf("hogging is %.3f times as high as sagging, want %.3f", got, want)
	}
}

// TestProfile: a tendon is drawn at its heights, and one that is held down bends where it is.
func TestProfile(t *testing.T) {
	p := path{x: []float64{0, 4000, 8000, 12000}, y: []float64{600, 100, 100, 600}}
	for _, c := range [][2]float64{{0, 600}, {2000, 350}, {4000, 100}, {6000, 100}, {10000, 350}, {12000, 600}} {
		if got := p.at(c[0]); got != c[1] {
			t.Errorf("at %g mm: %g mm, want %g", c[0], got, c[1])
		}
	}
	m := kindsOfSection()[2]
	n, figs := m.note(t)
	rings := 0
	for _, k := range drawn(t, n, figs["fig-elevation-parts"], 510).Ink {
		if k.Kind == draw.AreaInk && k.Tone == 1 && math.Abs(float64(k.Box.Width()-3.2)) < 0.05 && math.Abs(float64(k.Box.Height()-3.2)) < 0.05 {
			rings++
		}
	}
	if rings != 4 {
		t.Errorf("%d points are marked, want two for each of two rows", rings)
	}
}
