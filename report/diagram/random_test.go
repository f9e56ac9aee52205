package diagram

import (
	"fmt"
	"math"
	"testing"

	"pgregory.net/rapid"

	cross "soffit/calc/section"
	"soffit/report/draw"
)

// measuresOf are the dimensions of a form of the trade, each where it is natural.
func measuresOf(form cross.Form) []dimension {
	switch f := form.(type) {
	case cross.RectangularBeam:
		return []dimension{level("width", -f.Width/2, f.Chamfer, f.Width), upright("depth", -f.Width/2, 0, f.Depth), level("chamfer", f.Width/2-f.Chamfer, 0, f.Chamfer),
			level("top chamfer", f.Width/2-f.TopChamfer, f.Depth, f.TopChamfer)}
	case cross.TBeam:
		under := f.Depth - f.Flange.Depth
		return []dimension{upright("depth", -f.Flange.Width/2, 0, f.Depth), level("flange width", -f.Flange.Width/2, f.Depth, f.Flange.Width), upright("flange depth", -f.Flange.Width/2, under, f.Flange.Depth),
			upright("haunch depth", -f.Web/2, under-f.Flange.Haunch, f.Flange.Haunch), level("web width", -f.Web/2, f.Chamfer, f.Web), level("chamfer", f.Web/2-f.Chamfer, 0, f.Chamfer)}
	case cross.IBeam:
		under, on := f.Depth-f.Top.Depth, f.Bottom.Depth+f.Bottom.Haunch
		return []dimension{upright("depth", -f.Top.Width/2, 0, f.Depth), level("top flange width", -f.Top.Width/2, f.Depth, f.Top.Width), upright("top flange depth", -f.Top.Width/2, under, f.Top.Depth),
			upright("top flange haunch depth", -f.Web/2, under-f.Top.Haunch, f.Top.Haunch), level("web width", -f.Web/2, (under-f.Top.Haunch+on)/2, f.Web),
			level("bottom flange width", -f.Bottom.Width/2, f.Bottom.Depth, f.Bottom.Width), upright("bottom flange depth", -f.Bottom.Width/2, 0, f.Bottom.Depth), upright("bottom flange haunch depth", -f.Web/2, f.Bottom.Depth, f.Bottom.Haunch),
			level("chamfer", f.Bottom.Width/2-f.Chamfer, 0, f.Chamfer)}
	case cross.UBeam:
		side := (f.Bottom + (f.Top-f.Bottom)*(f.Floor+f.Haunch)/f.Depth) / 2
		return []dimension{upright("depth", -f.Top/2, 0, f.Depth), level("bottom width", -f.Bottom/2, 0, f.Bottom), level("top width", -f.Top/2, f.Depth, f.Top), level("web thickness", f.Top/2-f.Web, f.Depth, f.Web),
			upright("floor thickness", 0, 0, f.Floor), upright("haunch", side-f.Web, f.Floor, f.Haunch), level("chamfer", f.Bottom/2-f.Chamfer, 0, f.Chamfer)}
	case cross.BoxBeam:
		x, high := f.Width/2-f.Web, f.Depth-f.Top
		return []dimension{upright("depth", -f.Width/2, 0, f.Depth), level("width", -f.Width/2, f.Depth/2, f.Width), level("top slab width", -f.TopWidth/2, f.Depth, f.TopWidth), upright("top slab depth", 0, high, f.Top),
			level("web thickness", x, f.Depth/2, f.Web), upright("bottom slab depth", 0, 0, f.Bottom), level("top slab haunch", x-f.TopHaunch, high, f.TopHaunch), upright("bottom slab haunch", -x, f.Bottom, f.BottomHaunch),
			level("chamfer", f.Width/2-f.Chamfer, 0, f.Chamfer)}
	case cross.DoubleT:
		under, x := f.Depth-f.Flange, f.Spacing/2
		return []dimension{upright("depth", -f.Width/2, 0, f.Depth), level("width", -f.Width/2, f.Depth, f.Width), upright("flange depth", -f.Width/2, under, f.Flange), level("stem spacing", -x, 0, f.Spacing),
			level("stem width at soffit", x-f.StemBottom/2, 0, f.StemBottom), level("stem width at flange", x-f.StemTop/2, under-f.Haunch, f.StemTop), upright("haunch", x+f.StemTop/2, under-f.Haunch, f.Haunch),
			level("chamfer", -x-f.StemBottom/2, 0, f.Chamfer)}
	case cross.HollowUnit:
		first, j := -f.Spacing*float64(f.Count-1)/2, f.Joint
		out := []dimension{upright("depth", -f.Width/2, 0, f.Depth), level("width", -f.Width/2, f.Chamfer, f.Width), level("voids width", first-f.VoidWidth/2, f.Level, f.VoidWidth), upright("voids depth", first, f.Level-f.VoidDepth/2, f.VoidDepth),
			upright("voids height", first, 0, f.Level), level("chamfer", f.Width/2-f.Chamfer, 0, f.Chamfer), level("joint inset", f.Width/2-j.Inset, f.Depth, j.Inset), upright("joint from", f.Width/2, 0, j.From), upright("joint to", f.Width/2, 0, j.To),
			level("joint recess", f.Width/2-j.Recess, (j.From+j.To)/2, j.Recess)}
		if f.Count > 1 {
			out = append(out, level("voids spacing", first, f.Level, f.Spacing))
		}
		return out
	}
	return nil
}

// form draws a section of the trade, of buildable measures.
func form(t *rapid.T) cross.Form {
	mm := func(label string, lo, hi, by int) float64 {
		return float64(lo + by*rapid.IntRange(0, (hi-lo)/by).Draw(t, label))
	}
	none := func(label string, v float64) float64 { return v * float64(rapid.IntRange(0, 1).Draw(t, label)) }
	chamfer := none("chamfered", mm("chamfer", 10, 25, 5))
	switch rapid.IntRange(0, 6).Draw(t, "form") {
	case 0:
		return cross.RectangularBeam{Width: mm("width", 150, 1500, 50), Depth: mm("depth", 120, 1500, 20), Chamfer: chamfer, TopChamfer: none("top chamfered", 15)}
	case 1:
		h := mm("depth", 400, 1800, 20)
		return cross.TBeam{Depth: h, Flange: cross.Flange{Width: mm("flange", 600, 3000, 100), Depth: math.Round(h * 0.15), Haunch: none("haunched", 50)}, Web: mm("web", 150, 500, 10), Chamfer: chamfer}
	case 2:
		h := mm("depth", 600, 2400, 50)
		return cross.IBeam{Depth: h, Top: cross.Flange{Width: mm("top", 300, 1500, 50), Depth: math.Round(h * 0.1), Haunch: math.Round(h * 0.06)}, Web: mm("web", 120, 250, 10),
			Bottom: cross.Flange{Width: mm("bottom", 300, 1000, 50), Depth: math.Round(h * 0.14), Haunch: none("bottom haunched", math.Round(h*0.08))}, Chamfer: chamfer}
	case 3:
		return cross.UBeam{Bottom: mm("bottom", 800, 2000, 50), Top: mm("top", 900, 2600, 50), Depth: mm("depth", 600, 1800, 50), Web: mm("web", 100, 250, 10), Floor: mm("floor", 120, 300, 10), Haunch: none("haunched", 80), Chamfer: chamfer}
	case 4:
		w := mm("width", 1200, 6000, 100)
		return cross.BoxBeam{Width: w, TopWidth: w + none("overhangs", mm("overhang", 200, 4000, 100)), Depth: mm("depth", 900, 3000, 50), Top: mm("top", 150, 300, 10), Web: mm("web", 150, 400, 10), Bottom: mm("bottom", 150, 250, 10),
			TopHaunch: none("top haunched", 150), BottomHaunch: none("bottom haunched", 100), Chamfer: chamfer}
	case 5:
		b := mm("stem", 100, 180, 10)
		return cross.DoubleT{Width: mm("width", 2000, 3600, 100), Depth: mm("depth", 300, 1000, 50), Flange: mm("flange", 50, 120, 5), Spacing: mm("spacing", 1000, 1700, 50), StemBottom: b, StemTop: b + mm("taper", 0, 80, 10), Haunch: none("haunched", 40), Chamfer: none("cut", 15)}
	}
	d := mm("void", 100, 250, 5)
	h := d + mm("cover", 60, 120, 5)
	u := cross.HollowUnit{VoidWidth: d, VoidDepth: d + none("oblong", mm("longer", 10, 150, 10)), Count: rapid.IntRange(1, 8).Draw(t, "voids"), Spacing: d + mm("web", 30, 60, 5), Chamfer: none("cut", 10)}
	u.Depth = h + u.VoidDepth - d
	u.Level = math.Round(u.Depth/2) + mm("off", -10, 10, 5)
	u.Width = u.Spacing*float64(u.Count) + 120
	if rapid.Bool().Draw(t, "joint") {
		u.Joint = cross.Joint{Inset: 15, Recess: 20, From: math.Round(u.Depth * 0.25), To: math.Round(u.Depth * 0.75), Flank: 10}
	}
	return u
}

// TestSectionsAreClean draws sections and states of equilibrium of many forms at many widths, as TestFiguresAreClean.
func TestSectionsAreClean(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		m := &invented{form: form(rt), length: 12, a: 0.2, b: 11.8, bearing: [2]float64{200, 200}, loads: []load{{"g", 5, 0, 0, 12}}}
		if _, err := m.form.Outline(); err != nil {
			rt.Skip(err)
		}
		m.dims = measuresOf(m.form)
		h := m.depth(nil)
		left, right := math.Inf(1), math.Inf(-1)
		for _, p := range m.contour(nil).Outer[0] {
			left, right = min(left, p.X), max(right, p.X)
		}
		if rapid.Bool().Draw(rt, "topping") {
			m.topping = [2]float64{right - left, float64(rapid.IntRange(5, 15).Draw(rt, "depth of the topping") * 10)}
		}
		for i := range rapid.IntRange(1, 12).Draw(rt, "rows") {
			y := 40 + 45*float64(i)
			if y > h-30 {
				break
			}
			n := rapid.IntRange(1, max(1, min(8, int((m.width(nil, y)-80)/50)))).Draw(rt, "count")
			r := row{name: fmt.Sprintf("row %d", i+1), count: n, spacing: 50, level: y, diameter: 12.5}
			if d, ok := m.form.(cross.DoubleT); ok {
				r.count, r.spacing = 2, d.Spacing
			}
			if rapid.IntRange(0, 3).Draw(rt, "deflected") == 0 && y+100 < h {
				r.end, r.held = y+60, 4
			}
			m.tendons = append(m.tendons, r)
		}
		m.centroid = h * rapid.Float64Range(0.35, 0.65).Draw(rt, "centroid")
		m.x = h * rapid.Float64Range(0.05, 0.6).Draw(rt, "x")
		m.mesh()
		width := draw.Pt(rapid.IntRange(330, 516).Draw(rt, "paper"))
		n, figs := m.note(t)
		for _, id := range []string{"fig-section-loose", "fig-ultimate", "fig-ultimate-hogging", "fig-ultimate-curve", "fig-elevation-parts"} {
			fig, err := Lay(n, figs[id], width)
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
