package diagram

import (
	"fmt"
	"math"
	"testing"

	"pgregory.net/rapid"

	"soffit/report/draw"
)

// member draws an invented but buildable member: rectangle, T or I, from a plank to a bridge beam, 1 to 8 rows
// of tendons, 0 to 3 rows of bars, 1 to 8 loads.
func member(t *rapid.T) *invented {
	step := func(label string, lo, hi, by int) float64 {
		return float64(lo + by*rapid.IntRange(0, (hi-lo)/by).Draw(t, label))
	}
	m := &invented{}
	h := step("depth", 150, 1800, 10)
	web := min(step("web", 120, 400, 20), h)
	kind := rapid.SampledFrom([]string{"rectangle", "T", "I"}).Draw(t, "kind")
	low := web
	switch {
	case kind == "rectangle":
		low = step("width", 150, 1200, 50)
		m.parts = [][3]float64{{h, low, low}}
	case kind == "T" || h < 500:
		flange := max(step("flange", 300, 2400, 100), web+100)
		thick := max(math.Round(h*0.15), 50)
		haunch := 0.0
		if rapid.Bool().Draw(t, "haunched") {
			haunch = 40
		}
		m.parts = [][3]float64{{h - thick - haunch, web, web}}
		if haunch > 0 {
			m.parts = append(m.parts, [3]float64{haunch, web, min(web+120, flange)})
		}
		m.parts = append(m.parts, [3]float64{thick, flange, flange})
	default:
		low = max(step("bulb", 300, 800, 50), web+100)
		top := max(step("top", 300, 1400, 100), web+100)
		b1, b2, t2, t1 := math.Round(h*0.12), math.Round(h*0.08), math.Round(h*0.06), math.Round(h*0.1)
		m.parts = [][3]float64{{b1, low, low}, {b2, low, web}, {h - b1 - b2 - t1 - t2, web, web}, {t2, web, top}, {t1, top, top}}
	}
	names := rapid.SampledFrom([]string{"%d", "row %d", "R%d lower strands", "an unusually long name of row no %d"})
	style := names.Draw(t, "names")
	rows := rapid.IntRange(1, 8).Draw(t, "rows")
	y := step("cover", 35, 60, 5)
	for i := range rows {
		if y > h-35 {
			break
		}
		n := rapid.IntRange(1, max(1, min(14, int((low-80)/45)))).Draw(t, "count")
		if y > m.parts[0][0] {
			n = min(n, 2)
		}
		r := row{name: fmt.Sprintf(style, i+1), count: n, spacing: 45, level: y, diameter: rapid.SampledFrom([]float64{7, 9.3, 12.5, 15.2}).Draw(t, "diameter")}
		if rapid.IntRange(0, 3).Draw(t, "loose") == 0 {
			r.loose = 0.5 * float64(rapid.IntRange(1, 4).Draw(t, "length loose"))
		}
		m.tendons = append(m.tendons, r)
		y += step("rise", 40, 50, 5)
		if i == rows-2 && rapid.Bool().Draw(t, "top row") {
			y = max(y, h-40)
		}
	}
	for i := range rapid.IntRange(0, 3).Draw(t, "bars") {
		level := []float64{40, h - 45, 85}[i]
		if level < h-30 {
			m.bars = append(m.bars, row{name: fmt.Sprintf("bars %d", i+1), count: 2, spacing: m.width(nil, level) - 70, level: level, diameter: 16})
		}
	}
	m.length = step("length", 3, 40, 1) + rapid.SampledFrom([]float64{0, 0.3, 0.75}).Draw(t, "and")
	for i := range m.tendons {
		m.tendons[i].loose = min(m.tendons[i].loose, math.Floor(m.length*2)/10)
	}
	m.a = rapid.SampledFrom([]float64{0.05, 0.1, 0.15, 0.3}).Draw(t, "a")
	if rapid.IntRange(0, 4).Draw(t, "overhang") == 0 {
		m.a = math.Round(m.length*1.5) / 10
	}
	m.b = m.length - m.a
	m.capacity = rapid.Float64Range(0.6, 1.8).Draw(t, "capacity")
	m.bearing = [2]float64{rapid.SampledFrom([]float64{70, 100, 200}).Draw(t, "bearing"), 100}
	m.loads = []load{{"self-weight", 1 + h/100, 0, 0, m.length}}
	for i := range rapid.IntRange(0, 7).Draw(t, "loads") {
		at := math.Round(m.length*rapid.Float64Range(0, 1).Draw(t, "at")*20) / 20
		size := 1 + math.Round(rapid.Float64Range(0, 1).Draw(t, "size")*400)/10
		name := rapid.SampledFrom([]string{"imposed", "screed and finishes", "plant", "a load that someone has named at length"}).Draw(t, "load name")
		name = fmt.Sprintf("%s %d", name, i+1)
		switch rapid.IntRange(0, 2).Draw(t, "kind of load") {
		case 0:
			m.loads = append(m.loads, load{name, size, 0, 0, m.length})
		case 1:
			to := math.Round((at+0.2+(m.length-at-0.2)*rapid.Float64Range(0, 1).Draw(t, "to"))*20) / 20
			if to > m.length || to <= at {
				at, to = 0, m.length/2
			}
			m.loads = append(m.loads, load{name, size, 0, at, to})
		case 2:
			m.loads = append(m.loads, load{name, 0, size * 3, at, at})
		}
	}
	m.centroid = h * rapid.Float64Range(0.4, 0.65).Draw(t, "centroid")
	m.x = h * rapid.Float64Range(0.04, 0.6).Draw(t, "x")
	m.mesh()
	return m
}

// TestFiguresAreClean draws every figure of many members at many widths: no glyph touches another or a line,
// none is missing, nothing lies outside the area, and no figure is higher than half a sheet.
func TestFiguresAreClean(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		m := member(rt)
		width := draw.Pt(rapid.IntRange(320, 516).Draw(rt, "paper"))
		n, figs := m.note(t)
		for id, f := range figs {
			fig, err := Lay(n, f, width)
			if err != nil {
				rt.Fatalf("%s at %.0f pt: %v", id, float64(width), err)
			}
			if fig.Height > 460 {
				rt.Errorf("%s at %.0f pt is %.0f pt high", id, float64(width), float64(fig.Height))
			}
			var r draw.Recorder
			area := draw.BoxAt(40, 60, width, fig.Height)
			fig.Draw(&r, area.X0+(area.Width()-fig.Width)/2, area.Y0)
			for _, fault := range append(r.Faults(), r.Outside(area, nil)...) {
				rt.Errorf("%s at %.0f pt: %s", id, float64(width), fault)
			}
		}
	})
}

// TestKindsAreClean draws every figure of a member of each kind of section at several widths, as TestFiguresAreClean.
func TestKindsAreClean(t *testing.T) {
	for _, m := range kindsOfSection() {
		t.Run(m.name, func(t *testing.T) {
			n, figs := m.note(t)
			for id, f := range figs {
				for _, width := range []draw.Pt{320, 350, 384, 420, 516} {
					fig, err := Lay(n, f, width)
					if err != nil {
						t.Errorf("%s at %.0f pt: %v", id, float64(width), err)
						continue
					}
					if fig.Height > 460 {
						t.Errorf("%s at %.0f pt is %.0f pt high", id, float64(width), float64(fig.Height))
					}
					var r draw.Recorder
					area := draw.BoxAt(40, 60, width, fig.Height)
					fig.Draw(&r, area.X0+(area.Width()-fig.Width)/2, area.Y0)
					for _, fault := range append(r.Faults(), r.Outside(area, nil)...) {
						t.Errorf("%s at %.0f pt: %s", id, float64(width), fault)
					}
				}
			}
		})
	}
}
