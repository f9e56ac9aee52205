package diagram

import (
	"fmt"

	cross "soffit/calc/section"
)

// level and upright are dimensions by where they begin and how long they are.
func level(name string, x, y, long float64) dimension { return dimension{name, x, y, x + long, y} }

func upright(name string, x, y, long float64) dimension { return dimension{name, x, y, x, y + long} }

// kindsOfSection are members with a section of each kind that a member file knows.
func kindsOfSection() []*invented {
	span := func(m *invented, length, bearing float64) *invented {
		m.length, m.a, m.b, m.bearing = length, bearing, length-bearing, [2]float64{200, 200}
		if m.loads == nil {
			m.loads = []load{{"self-weight", 9.4, 0, 0, length}, {"finishes", 3.2, 0, 0, length}, {"imposed", 8, 0, 0, length}}
		}
		m.mesh()
		return m
	}
	strands := func(name string, count int, spacing, level float64) row {
		return row{name: name, count: count, spacing: spacing, level: level, diameter: 12.5}
	}
	bars := func(name string, count int, spacing, level float64) row {
		return row{name: name, count: count, spacing: spacing, level: level, diameter: 16}
	}

	rectangle := &invented{name: "rectangle", form: cross.RectangularBeam{Width: 400, Depth: 800, Chamfer: 20, TopChamfer: 15},
		dims:    []dimension{upright("depth", -200, 0, 800), level("width", -200, 400, 400), level("chamfer", 180, 0, 20), upright("chamfer up", 200, 0, 20), level("top chamfer", 185, 800, 15)},
		tendons: []row{strands("bottom", 6, 50, 60), strands("second", 4, 50, 110), strands("top", 2, 250, 750)},
		bars:    []row{bars("soffit bars", 2, 310, 45), bars("top bars", 2, 310, 755)}, centroid: 399.2, x: 171}

	trapezoid := &invented{name: "trapezoid", form: cross.Trapezoid{Bottom: 300, Top: 500, Depth: 700, Chamfer: 15},
		dims:    []dimension{upright("depth", -150, 0, 700), level("bottom width", -150, 0, 300), level("top width", -250, 700, 500), level("chamfer", -150, 0, 15)},
		tendons: []row{strands("1", 4, 50, 50), strands("2", 4, 50, 100), strands("3", 2, 320, 650)}, centroid: 381, x: 120}

	tee := &invented{name: "T with topping", form: cross.TBeam{Depth: 750, Flange: cross.Flange{Width: 1200, Depth: 140, Haunch: 60}, Web: 300, Chamfer: 20}, topping: [2]float64{1200, 70},
		dims: []dimension{upright("depth", -600, 0, 750), level("flange width", -600, 750, 1200), upright("flange depth", -600, 610, 140), upright("haunch depth", -150, 550, 60), level("web width", -150, 300, 300), level("chamfer", 130, 0, 20)},
		tendons: []row{{name: "bottom", count: 6, spacing: 45, level: 50, diameter: 12.5}, {name: "second", count: 4, spacing: 50, level: 95, diameter: 12.5, loose: 1.5},
			{name: "deflected 1", count: 2, spacing: 45, level: 140, diameter: 12.5, end: 540, held: 5}, {name: "deflected 2", count: 2, spacing: 45, level: 185, diameter: 12.5, end: 585, held: 5}, strands("top", 2, 200, 690)},
		bars: []row{bars("soffit", 2, 210, 45)}, centroid: 512.37, x: 69.3}

	eye := &invented{name: "I, twelve rows", form: cross.IBeam{Depth: 1200, Top: cross.Flange{Width: 700, Depth: 140, Haunch: 60}, Web: 160, Bottom: cross.Flange{Width: 500, Depth: 180, Haunch: 100}, Chamfer: 20},
		dims: []dimension{upright("depth", -350, 0, 1200), level("top flange width", -350, 1200, 700), upright("top flange depth", -350, 1060, 140), upright("top flange haunch", -80, 1000, 60),
			level("web width", -80, 640, 160), level("bottom flange width", -250, 20, 500), upright("bottom flange depth", -250, 0, 180), upright("bottom flange haunch", -250, 180, 100), upright("chamfer", -250, 0, 20)},
		bars: []row{bars("top bars", 4, 180, 1150)}, centroid: 577, x: 152}
	for i := range 11 {
		r := strands(fmt.Sprint(i+1), 8, 50, 50+45*float64(i))
		if i > 3 {
			r.count, r.spacing = 2, 60
		}
		r.loose = float64(i%3) * 1.5
		eye.tendons = append(eye.tendons, r)
	}

	ledge := &invented{name: "inverted T", form: cross.InvertedT{Depth: 700, Ledge: cross.Flange{Width: 700, Depth: 200, Haunch: 20}, Web: 340, Chamfer: 20}, topping: [2]float64{900, 80},
		dims:    []dimension{upright("depth", -170, 0, 700), level("ledge width", -350, 20, 700), upright("ledge depth", -350, 0, 200), upright("ledge haunch", -350, 200, 20), level("web width", -170, 460, 340), level("chamfer", 330, 0, 20)},
		tendons: []row{strands("a", 12, 50, 50), strands("b", 10, 50, 100), strands("c", 2, 240, 650)}, centroid: 300, x: 140}

	trough := &invented{name: "U", form: cross.UBeam{Bottom: 1000, Top: 1400, Depth: 900, Web: 160, Floor: 180, Haunch: 60, Chamfer: 25},
		dims: []dimension{upright("depth", -500, 0, 900), level("bottom width", -500, 0, 1000), level("top width", -700, 900, 1400), level("web thickness", 540, 900, 160), upright("floor thickness", 0, 0, 180),
			upright("haunch", -300, 180, 60), level("chamfer", 475, 0, 25)},
		tendons: []row{strands("floor", 16, 55, 60), strands("second", 14, 55, 115), {name: "webs", count: 2, level: 850, diameter: 12.5, places: []float64{-610, 610}}}, centroid: 390, x: 210}

	box := &invented{name: "box", form: cross.BoxBeam{Width: 4000, Depth: 2000, TopWidth: 7000, Top: 250, Web: 350, Bottom: 220, TopHaunch: 250, BottomHaunch: 150, Chamfer: 50},
		dims: []dimension{upright("depth", -2000, 0, 2000), level("width", -2000, 400, 4000), level("top slab width", -3500, 2000, 7000), upright("top slab depth", -3500, 1750, 250), level("web thickness", 1650, 900, 350),
			upright("bottom slab depth", 0, 0, 220), level("top slab haunch", 1400, 1750, 250), upright("bottom slab haunch", -1650, 220, 150), level("chamfer", -2000, 0, 50)},
		tendons: []row{{name: "lower", count: 2, spacing: 3650, level: 160, diameter: 15.7, duct: 100, strands: 19}, {name: "middle", count: 2, spacing: 3650, level: 320, diameter: 15.7, duct: 100, strands: 19},
			{name: "upper", count: 2, spacing: 3650, level: 480, diameter: 15.7, duct: 80, strands: 12}},
		ducts: true, bars: []row{bars("bottom slab bars", 24, 150, 50)}, centroid: 1227, x: 300,
		loads: []load{{"self-weight", 98, 0, 0, 48}, {"surfacing", 18, 0, 0, 48}, {"traffic", 40, 0, 0, 48}, {"axle 1", 0, 300, 0, 0}, {"axle 2", 0, 300, 24, 24}, {"axle 3", 0, 300, 48, 48}}}
	for i := range box.tendons {
		r := &box.tendons[i]
		for k := range 13 {
			t := float64(k)/6 - 1
			end := 700 + 500*float64(i)
			r.profile = append(r.profile, r.level+(end-r.level)*t*t)
		}
	}

	double := &invented{name: "double T", form: cross.DoubleT{Width: 2400, Depth: 600, Flange: 60, Spacing: 1200, StemBottom: 140, StemTop: 200, Haunch: 40, Chamfer: 15}, topping: [2]float64{2400, 70},
		dims: []dimension{upright("depth", -1200, 0, 600), level("width", -1200, 600, 2400), upright("flange depth", -1200, 540, 60), level("stem spacing", -600, 0, 1200), level("stem width at soffit", 530, 0, 140),
			level("stem width at flange", 500, 500, 200), upright("haunch", 700, 500, 40), level("chamfer", -670, 0, 15)},
		tendons: []row{{name: "1", count: 4, level: 50, diameter: 12.5, places: []float64{-625, -575, 575, 625}}, {name: "2", count: 4, level: 100, diameter: 12.5, places: []float64{-625, -575, 575, 625}},
			{name: "3", count: 2, level: 150, diameter: 12.5, places: []float64{-600, 600}, end: 350, held: 4}, {name: "4", count: 2, level: 200, diameter: 12.5, places: []float64{-600, 600}, end: 400, held: 4}},
		bars: []row{bars("mesh", 12, 200, 570)}, centroid: 418, x: 66}

	hollow := &invented{name: "hollow unit", form: cross.HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 190, Level: 132, Chamfer: 10,
		Joint: cross.Joint{Inset: 20, Recess: 25, From: 60, To: 200, Flank: 15}}, topping: [2]float64{1200, 60},
		dims: []dimension{upright("depth", -600, 0, 265), level("width", -600, 0, 1200), level("voids spacing", -475, 132, 190), level("voids width", -550, 132, 150), upright("voids depth", -475, 57, 150),
			upright("voids height", -475, 0, 132), level("joint inset", 580, 265, 20), upright("joint from", 600, 0, 60), upright("joint to", 600, 0, 200), level("joint recess", 575, 132, 25)},
		tendons: []row{{name: "lower", count: 7, level: 35, diameter: 9.3, places: []float64{-570, -380, -190, 0, 190, 380, 570}}, {name: "upper", count: 2, level: 240, diameter: 5, spacing: 1080}}, centroid: 131, x: 40}

	oblong := &invented{name: "hollow unit, oblong voids", form: cross.HollowUnit{Width: 1200, Depth: 400, VoidWidth: 185, VoidDepth: 280, Count: 4, Spacing: 280, Level: 205},
		dims:    []dimension{upright("depth", -600, 0, 400), level("width", -600, 0, 1200), level("voids spacing", -420, 205, 280), level("voids width", -512.5, 205, 185), upright("voids depth", -420, 65, 280), upright("voids height", -420, 0, 205)},
		tendons: []row{{name: "lower", count: 10, level: 40, diameter: 12.5, places: []float64{-570, -540, -300, -260, -20, 20, 260, 300, 540, 570}}}, centroid: 199, x: 60}

	polygon := &invented{name: "polygon", form: corners{outer: cross.Ring{{X: 0, Y: 0}, {X: 450, Y: 0}, {X: 450, Y: 250}, {X: 300, Y: 300}, {X: 300, Y: 750}, {X: 0, Y: 750}}, round: cross.Round{X: 150, Y: 450, Width: 120, Depth: 120}},
		dims:    []dimension{upright("depth", 0, 0, 750), level("width", 0, 0, 450), level("top", 0, 750, 300), upright("ledge", 450, 0, 250), upright("void height", 150, 0, 450), level("void width", 90, 450, 120)},
		tendons: []row{{name: "low", count: 6, level: 50, diameter: 12.5, places: []float64{60, 120, 180, 240, 300, 360}}, {name: "high", count: 2, level: 700, diameter: 12.5, places: []float64{60, 240}}, {name: "mid", count: 4, spacing: 60, level: 100, diameter: 12.5, places: []float64{60, 140, 220, 300}}},
		bars:    []row{{name: "ledge bars", count: 2, level: 210, diameter: 12, places: []float64{350, 410}}, {name: "corner", count: 2, spacing: 180, level: 45, diameter: 16}}, centroid: 330, x: 190}
	polygon.bars[1].places = []float64{40, 410}

	over := func(m *invented, a, b float64) *invented {
		m.a, m.b = a, b
		m.loads = append(m.loads, load{"parapet", 0, 12, 0, 0}, load{"sign", 0, 8, m.length, m.length}, load{"snow on the end", 3, 0, b, m.length})
		m.mesh()
		return m
	}
	return []*invented{span(rectangle, 12, 0.15), over(span(trapezoid, 14, 0.2), 2.5, 11), span(tee, 14.3, 0.15), span(eye, 24, 0.2), over(span(ledge, 9, 0.2), 1.2, 8.8), span(trough, 20, 0.3),
		span(box, 48, 0.5), span(double, 16, 0.1), span(hollow, 9.6, 0.05), span(oblong, 11, 0.05), span(polygon, 8, 0.15)}
}

// corners is a section by its corners.
type corners struct {
	outer cross.Ring
	round cross.Round
}

func (c corners) Outline() (cross.Outline, error) {
	return cross.NewOutline(cross.Contour{Outer: []cross.Ring{c.outer}, Voids: []cross.Round{c.round}})
}
