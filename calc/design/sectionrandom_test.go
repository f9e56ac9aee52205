package design

import (
	"fmt"
	"math"
	"math/rand/v2"
	"strings"
	"testing"

	"soffit/calc/member"
	"soffit/calc/trace"
)

// anyShape is a shape of random measures, whole millimetres or with up to three decimals.
func anyShape(r *rand.Rand) string {
	fine := r.IntN(2) == 0
	v := func(lo, hi float64) float64 {
		x := lo + (hi-lo)*r.Float64()
		if fine {
			return math.Round(x*1e3) / 1e3
		}
		return math.Round(x)
	}
	h, chamfer := v(300, 1500), v(0, 25)
	switch r.IntN(10) {
	case 0:
		return fmt.Sprintf("{kind: rectangle, width: %g mm, depth: %g mm, chamfer: %g mm, top chamfer: %g mm}", v(150, 600), h, chamfer, v(0, 20))
	case 1:
		return fmt.Sprintf("{kind: trapezoid, bottom width: %g mm, top width: %g mm, depth: %g mm, chamfer: %g mm}", v(100, 400), v(100, 700), h, chamfer)
	case 2:
		return fmt.Sprintf("{kind: T, depth: %g mm, flange width: %g mm, flange depth: %g mm, haunch depth: %g mm, web width: %g mm, chamfer: %g mm}", h, v(400, 2000), v(60, h/3), v(0, 80), v(120, 400), chamfer)
	case 3:
		return fmt.Sprintf("{kind: I, depth: %g mm, top flange: {width: %g mm, depth: %g mm, haunch depth: %g mm}, web width: %g mm, bottom flange: {width: %g mm, depth: %g mm, haunch depth: %g mm}, chamfer: %g mm}",
			h, v(300, 900), v(60, h/5), v(0, h/5), v(100, 250), v(300, 700), v(60, h/5), v(0, h/5), chamfer)
	case 4:
		return fmt.Sprintf("{kind: inverted T, depth: %g mm, ledge: {width: %g mm, depth: %g mm, haunch depth: %g mm}, web width: %g mm, chamfer: %g mm}", h, v(500, 900), v(100, h/2), v(0, 60), v(200, 400), chamfer)
	case 5:
		return fmt.Sprintf("{kind: U, bottom width: %g mm, top width: %g mm, depth: %g mm, web thickness: %g mm, floor thickness: %g mm, haunch: %g mm, chamfer: %g mm}", v(800, 1000), v(900, 1500), h, v(80, 150), v(100, h/3), v(0, 90), chamfer)
	case 6:
		return fmt.Sprintf("{kind: box, width: %g mm, depth: %g mm, web thickness: %g mm, top slab: {depth: %g mm, width: %g mm, haunch: %g mm}, bottom slab: {depth: %g mm, haunch: %g mm}, chamfer: %g mm}",
			v(900, 1200), h+300, v(100, 200), v(100, 200), v(1300, 2400), v(0, 100), v(100, 200), v(0, 100), chamfer)
	case 7:
		return fmt.Sprintf("{kind: double T, width: %g mm, depth: %g mm, flange depth: %g mm, stem spacing: %g mm, stem width at soffit: %g mm, stem width at flange: %g mm, haunch: %g mm, chamfer: %g mm}",
			v(2300, 2500), h, v(50, 120), v(1100, 1300), v(100, 150), v(150, 220), v(0, 60), chamfer)
	case 8:
		d := v(200, 450)
		return fmt.Sprintf("{kind: hollow unit, width: %g mm, depth: %g mm, voids: {count: %d, spacing: %g mm, width: %g mm, depth: %g mm, height: %g mm}, joint: {inset: %g mm, recess: %g mm, from: %g mm, to: %g mm, flank: %g mm}}",
			v(1190, 1210), d, 3+r.IntN(3), v(195, 220), v(90, 160), v(90, d-70), math.Round(d/2), v(0, 10), v(12, 30), v(30, 60), v(d-80, d-50), v(0, 15))
	}
	return anyPolygon(r, v, h)
}

// anyPolygon is symmetrical, with level top and soffit and the sides in any slopes, at times with a hole or with round voids.
func anyPolygon(r *rand.Rand, v func(lo, hi float64) float64, h float64) string {
	n := 1 + r.IntN(4)
	var xy, left []float64
	narrowest := math.Inf(1)
	for k := range n + 1 {
		x, y := v(100, 400), math.Round(h*float64(k)/float64(n)*1e3)/1e3
		narrowest = min(narrowest, x)
		xy, left = append(xy, x, y), append([]float64{-x, y}, left...)
	}
	text := polygonText(append(xy, left...)...)
	switch at := 0.6 * h; {
	case r.IntN(3) == 0 && narrowest > 150:
		return strings.TrimSuffix(text, "}") + fmt.Sprintf(", round voids: [{x: 0 mm, y: %g mm, width: %g mm, depth: %g mm}]}", at, v(40, 120), v(40, 120))
	case r.IntN(3) == 0 && narrowest > 150:
		w := v(30, 60)
		return strings.TrimSuffix(text, "}") + fmt.Sprintf(", holes: [{corners: [{x: %g mm, y: %g mm}, {x: %g mm, y: %g mm}, {x: 0 mm, y: %g mm}]}]}", -w, at, w, at, at+50)
	}
	return text
}

// AnyShape serves the tests that look at whole members.
var AnyShape = anyShape

// RunAlone designs a member without trying remedies for what fails.
func RunAlone(m *member.Member) (*trace.Note, error) { return run(m, true) }

// TestRandomSections: 150 random sections give a closed record, the kernel's values and three methods that agree, or are
// refused for what their measures are.
func TestRandomSections(t *testing.T) {
	r := rand.New(rand.NewPCG(17, 4))
	made := 0
	for range 150 {
		shape := anyShape(r)
		topping := []string{"", wetTopping}[r.IntN(2)]
		if !possible(shape) {
			continue
		}
		j := setOut(t, shape, []string{"", ", stress diagram: bilinear"}[r.IntN(2)], topping)
		made++
		if _, differences := trace.Closure(j.n); len(differences) > 0 {
			t.Errorf("%v\n%s", differences[0], shape)
		}
		o := j.form.outline
		j.within(t, shape, "section.gross/"+j.areaID(), o.Area(), 1e-5)
		j.within(t, shape, "section.gross/"+j.centroidID(), o.Centroid(), 1e-5)
		if c, ok := j.n.Entry("second.section/section-methods-agree").(*trace.Choice); !ok || c.Outcomes[0] != trace.Yes {
			t.Errorf("the methods disagree\n%s", shape)
		}
		levels(t, shape, j)
		seen(t, shape, j)
	}
	t.Logf("%d sections", made)
	if made < 100 {
		t.Errorf("only %d sections", made)
	}
}
