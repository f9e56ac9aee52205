package bending

import (
	"math"
	"slices"

	"gonum.org/v1/gonum/integrate/quad"
	"pgregory.net/rapid"

	"soffit/calc/section"
)

// figure is a section by its corners and rounds alone, for quadratures that share nothing with strips, slabs
// and closed forms. Depths z are from the top.
type figure struct {
	section.Contour
	height float64
	cuts   []float64 // depths of all corners, tips and ends of rounds
}

func figureOf(o section.Outline) figure {
	f := figure{Contour: o.Contour(), height: o.Height()}
	f.cuts = []float64{0, f.height}
	for _, rings := range [2][]section.Ring{f.Outer, f.Holes} {
		for _, r := range rings {
			for _, p := range r {
				f.cuts = append(f.cuts, f.height-p.Y)
			}
		}
	}
	for _, rounds := range [2][]section.Round{f.Voids, f.Discs} {
		for _, r := range rounds {
			e := math.Max(0, r.Depth-r.Width) / 2
			f.cuts = append(f.cuts, f.height-r.Y-r.Depth/2, f.height-r.Y+r.Depth/2, f.height-r.Y-e, f.height-r.Y+e)
		}
	}
	slices.Sort(f.cuts)
	return f
}

// width is the concrete at depth z, from where a level line meets each ring and round.
func (f figure) width(z float64) (w float64) {
	y := f.height - z
	cross := func(rings []section.Ring) (w float64) {
		for _, r := range rings {
			var xs []float64
			for i, p := range r {
				q := r[(i+1)%len(r)]
				if (p.Y > y) != (q.Y > y) {
					xs = append(xs, p.X+(y-p.Y)/(q.Y-p.Y)*(q.X-p.X))
				}
			}
			slices.Sort(xs)
			for i := 1; i < len(xs); i += 2 {
				w += xs[i] - xs[i-1]
			}
		}
		return w
	}
	chord := func(rounds []section.Round) (w float64) {
		for _, r := range rounds {
			rad := math.Min(r.Width, r.Depth) / 2
			t := math.Max(0, math.Abs(y-r.Y)-math.Max(0, r.Depth-r.Width)/2)
			if t < rad {
				w += math.Max(0, r.Width-r.Depth) + 2*math.Sqrt(rad*rad-t*t)
			}
		}
		return w
	}
	return cross(f.Outer) - cross(f.Holes) + chord(f.Discs) - chord(f.Voids)
}

// integral sums f times the width, and times width and depth, from the top to the depth to, piece by piece
// between the cuts and the extra ones. z = middle − half·cos φ takes away the roots at the tips.
func (f figure) integral(stress func(z float64) float64, to float64, extra ...float64) (force, moment float64) {
	cuts := append(slices.Clone(f.cuts), extra...)
	slices.Sort(cuts)
	place, weight := points()
	for i := 1; i < len(cuts); i++ {
		a, b := math.Max(0, cuts[i-1]), math.Min(to, cuts[i])
		if b-a < 1e-13*f.height {
			continue
		}
		for k, u := range place {
			phi := math.Pi * (1 + u) / 2
			z := (a+b)/2 - (b-a)/2*math.Cos(phi)
			df := stress(z) * f.width(z) * (b - a) / 2 * math.Sin(phi) * math.Pi / 2 * weight[k]
			force += df
			moment += df * z
		}
	}
	return force, moment
}

var place, weight []float64

// points are thirty places and weights of the Gauss rule of another library.
func points() ([]float64, []float64) {
	if place == nil {
		place, weight = make([]float64, 30), make([]float64, 30)
		quad.Legendre{}.FixedLocations(place, weight, -1, 1)
	}
	return place, weight
}

// block gives force and moment about the top of the rectangular block.
func (f figure) block(law BlockLaw, x float64) (force, moment float64) {
	to := math.Min(law.Lambda*x, f.height)
	return f.integral(func(float64) float64 { return law.EtaFcd }, to, to)
}

// parabola gives force and moment about the top of the parabola–rectangle law.
func (f figure) parabola(law Parabola, x, k float64) (force, moment float64) {
	end, full := math.Min(x, f.height), x-law.EpsC2/k
	return f.integral(func(z float64) float64 {
		switch e := k * (x - z); {
		case e <= 0:
			return 0
		case e >= law.EpsC2:
			return law.Fcd
		case e < 0.01*law.EpsC2:
			return -law.Fcd * math.Expm1(law.N*math.Log1p(-e/law.EpsC2))
		default:
			return law.Fcd * (1 - math.Pow(1-e/law.EpsC2, law.N))
		}
	}, end, end, math.Max(0, full))
}

// anyOutline draws a form of the trade of any sensible measures, or a polygon that is none, with voids.
func anyOutline(t *rapid.T) (section.Outline, string) {
	part := func(name string, lo, hi float64) float64 { return rapid.Float64Range(lo, hi).Draw(t, name) }
	h := part("depth", 150, 2000)
	leg := h * part("chamfer/h", 0, 0.02)
	flange := func(name string) section.Flange {
		return section.Flange{Width: h * part(name+" width/h", 0.3, 1.5), Depth: h * part(name+" depth/h", 0.06, 0.2), Haunch: h * part(name+" haunch/h", 0, 0.15)}
	}
	web := h * part("web/h", 0.1, 0.4)
	var form section.Form
	kind := rapid.SampledFrom([]string{"rectangle", "trapezoid", "triangle", "T", "inverted T", "I", "U", "box", "double T",
		"hollow, round", "hollow, upright", "hollow, level", "round", "ring", "polygon"}).Draw(t, "kind")
	switch kind {
	case "rectangle":
		form = section.RectangularBeam{Width: web, Depth: h, Chamfer: leg, TopChamfer: leg}
	case "trapezoid":
		form = section.Trapezoid{Bottom: h * part("bottom/h", 0.1, 1), Top: h * part("top/h", 0.1, 1), Depth: h, Chamfer: leg}
	case "triangle":
		form = section.Trapezoid{Bottom: h * part("bottom/h", 0.3, 1), Depth: h}
		if rapid.Bool().Draw(t, "on its point") {
			form = section.Trapezoid{Top: h * part("top/h", 0.3, 1), Depth: h}
		}
	case "T":
		form = section.TBeam{Depth: h, Flange: flange("flange"), Web: web, Chamfer: leg}
	case "inverted T":
		form = section.InvertedT{Depth: h, Ledge: flange("ledge"), Web: web, Chamfer: leg}
	case "I":
		form = section.IBeam{Depth: h, Top: flange("top"), Web: web, Bottom: flange("bottom"), Chamfer: leg}
	case "U":
		form = section.UBeam{Bottom: h * part("bottom/h", 0.8, 1.2), Top: h * part("top/h", 1, 1.6), Depth: h,
			Web: h * part("wall/h", 0.08, 0.2), Floor: h * part("floor/h", 0.1, 0.25), Haunch: h * part("haunch/h", 0, 0.1), Chamfer: leg}
	case "box":
		w := h * part("width/h", 0.7, 2)
		form = section.BoxBeam{Width: w, Depth: h, TopWidth: w * part("slab/width", 1, 1.8), Top: h * part("top/h", 0.08, 0.25), Web: h * part("wall/h", 0.06, 0.2),
			Bottom: h * part("bottom/h", 0.08, 0.25), TopHaunch: h * part("haunch/h", 0, 0.12), BottomHaunch: h * part("haunch/h", 0, 0.1), Chamfer: leg}
	case "double T":
		a := h * part("spacing/h", 1, 3)
		form = section.DoubleT{Width: 2 * a, Depth: h, Flange: h * part("flange/h", 0.08, 0.2), Spacing: a, StemBottom: h * part("stem/h", 0.12, 0.3),
			StemTop: h * part("stem top/h", 0.12, 0.4), Haunch: h * part("haunch/h", 0, 0.1), Chamfer: leg}
	case "hollow, round", "hollow, upright", "hollow, level":
		d := h * part("void/h", 0.2, 0.75)
		u := section.HollowUnit{Depth: h, VoidWidth: d, VoidDepth: d, Count: rapid.IntRange(1, 8).Draw(t, "count"), Chamfer: leg}
		if kind == "hollow, upright" {
			u.VoidWidth *= part("slim", 0.3, 0.99)
		} else if kind == "hollow, level" {
			u.VoidWidth *= part("broad", 1.01, 3)
		}
		u.Spacing = u.VoidWidth + h*part("rib/h", 0.05, 0.3)
		u.Level = d/2 + (h-d)*part("level", 0.1, 0.9)
		u.Width = u.Spacing*float64(u.Count) + 0.3*h
		u.Joint = section.Joint{Inset: 0.02 * h, Recess: 0.1 * h, From: 0.4 * h, To: 0.9 * h, Flank: 0.1 * h}
		form = u
	case "round":
		form = section.RoundBeam{Diameter: h}
	case "ring":
		form = section.RoundBeam{Diameter: h, Bore: h * part("bore/h", 0.05, 0.9)}
	default: // corners between half and the whole radius, a round or oblong void and a hole clear of each other
		c := section.Contour{}
		var ring section.Ring
		n := rapid.IntRange(5, 10).Draw(t, "corners")
		for i := range n {
			a := 2 * math.Pi * (float64(i) + part("turn", 0, 0.6)) / float64(n)
			r := h / 2 * part("reach", 0.5, 1)
			ring = append(ring, section.Point{X: r * math.Cos(a), Y: r * math.Sin(a)})
		}
		c.Outer = []section.Ring{ring}
		if rapid.Bool().Draw(t, "void") {
			c.Voids = []section.Round{{X: 0.065 * h, Width: 0.1 * h * part("void width", 0.1, 1), Depth: 0.1 * h * part("void depth", 0.1, 1)}}
		}
		if rapid.Bool().Draw(t, "hole") {
			e := 0.04 * h
			c.Holes = []section.Ring{{{X: -0.065*h - e, Y: -e}, {X: -0.065*h + e, Y: -e / 2}, {X: -0.065 * h, Y: e}}}
		}
		form = c
	}
	o, err := form.Outline()
	if err != nil {
		t.Fatalf("%#v: %v", form, err)
	}
	return o, kind
}
