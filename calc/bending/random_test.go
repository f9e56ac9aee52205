package bending

import (
	"math"
	"testing"

	"gonum.org/v1/gonum/integrate/quad"
	"pgregory.net/rapid"

	"soffit/calc/section"
)

// anyShape draws one to five strips of any widths.
func anyShape(t *rapid.T) section.Shape {
	strips := rapid.SliceOfN(rapid.Custom(func(t *rapid.T) section.Strip {
		return section.Strip{
			Height: rapid.Float64Range(10, 700).Draw(t, "height"),
			Bottom: rapid.Float64Range(50, 1500).Draw(t, "bottom"),
			Top:    rapid.Float64Range(50, 1500).Draw(t, "top"),
		}
	}), 1, 5).Draw(t, "strips")
	return ok[section.Shape](t)(section.New(strips...))
}

// anyLayers draws one to eight layers anywhere in the depth, with any law; some capped, some idle, some
// with their strain limit spent.
func anyLayers(t *rapid.T, shape section.Shape) []Layer {
	strength := shape.Area() * 20 // the layers' share of it decides how deep the neutral axis lies
	return rapid.SliceOfN(rapid.Custom(func(t *rapid.T) Layer {
		l := Layer{Law: anyLaw(t), Cap: inf}
		l.Depth = shape.Height() * rapid.Float64Range(0.02, 0.98).Draw(t, "d/h")
		l.Area = strength / l.Law.stress[l.Law.points-1] * math.Pow(10, rapid.Float64Range(-4, 0.3).Draw(t, "log share"))
		if rapid.Bool().Draw(t, "prestressed") {
			l.Prestrain = l.Law.Yield().Strain * rapid.Float64Range(0.2, 1.05).Draw(t, "ε_p0/ε_y")
		} else {
			l.Prestrain = rapid.SampledFrom([]float64{0, 0, 0, -3e-4}).Draw(t, "ε_p0")
		}
		switch rapid.IntRange(0, 11).Draw(t, "kind") {
		case 0, 1, 2:
			l.Cap = l.Law.Yield().Stress * rapid.Float64Range(0, 1.1).Draw(t, "cap/f")
		case 3:
			l.Area = 0
		case 4:
			if rapid.IntRange(0, 4).Draw(t, "spent") == 0 {
				l.Prestrain = l.Law.Yield().Strain * 8
			}
		}
		return l
	}), 1, 8).Draw(t, "layers")
}

// classes of concrete: λ, η, ε_cu3 and n, ε_c2, ε_cu2 of EN 1992-1-1, Table 3.1 and 3.1.7 (recalled).
var classes = []struct {
	fck, lambda, eta, cu3, n, c2, cu2 float64
}{
	{20, 0.8, 1, 3.5, 2, 2, 3.5},
	{35, 0.8, 1, 3.5, 2, 2, 3.5},
	{50, 0.8, 1, 3.5, 2, 2, 3.5},
	{60, 0.775, 0.95, 2.9, 1.6, 2.3, 2.9},
	{70, 0.75, 0.90, 2.7, 1.45, 2.4, 2.7},
	{90, 0.7, 0.80, 2.6, 1.4, 2.6, 2.6},
}

func anyConcrete(t *rapid.T) (BlockLaw, Parabola) {
	c := rapid.SampledFrom(classes).Draw(t, "concrete")
	fcd := c.fck / 1.5 * rapid.SampledFrom([]float64{0.85, 1}).Draw(t, "α_cc")
	return BlockLaw{c.lambda, c.eta * fcd, c.cu3 / 1e3}, Parabola{c.n, c.c2 / 1e3, c.cu2 / 1e3, fcd}
}

// pulled sums the layers from their definition, apart from the solver's own sums.
func pulled(x, k float64, layers []Layer) (force, moment, size float64) {
	for _, l := range layers {
		stress := l.Law.Stress(l.Prestrain + k*(l.Depth-x))
		if stress > l.Cap {
			stress = l.Cap
		}
		if stress < -l.Cap {
			stress = -l.Cap
		}
		force += l.Area * stress
		moment += l.Area * stress * l.Depth
		size += l.Area * math.Abs(stress)
	}
	return force, moment, size
}

// limits checks that no strain is past its limit and that one is at it.
func limits(t *rapid.T, name string, a Axis, h, epsCu, epsC float64, layers []Layer) {
	t.Helper()
	used := a.TopStrain / epsCu
	if a.X > h && epsC > 0 {
		used = math.Max(used, a.Curvature*(a.X-(1-epsC/epsCu)*h)/epsC)
	}
	at := -1
	for i, l := range layers {
		if l.Area == 0 || l.Cap == 0 || math.IsInf(l.Law.Limit(), 1) || l.Depth <= a.X {
			continue
		}
		if u := a.Curvature * (l.Depth - a.X) / (l.Law.Limit() - l.Prestrain); u > used {
			used, at = u, i
		}
	}
	if math.Abs(used-1) > 1e-9 {
		t.Errorf("%s: limiting strain used to %.12g", name, used)
	}
	if a.Pivot == PivotSteel && at != a.Layer && at != -1 {
		l := layers[a.Layer]
		if u := a.Curvature * (l.Depth - a.X) / (l.Law.Limit() - l.Prestrain); math.Abs(u-1) > 1e-9 {
			t.Errorf("%s: layer %d governs, said %d", name, at, a.Layer)
		}
	}
}

// Any section: a root in its bracket whose residual, summed anew, is below 1e-6 of the force, at the limit of
// a strain; or a reason that is true.
func TestAnySection(t *testing.T) {
	counts := map[string]int{}
	rapid.Check(t, func(t *rapid.T) {
		shape := anyShape(t)
		layers := anyLayers(t, shape)
		block, parabola := anyConcrete(t)
		s, h := NewSection(shape), shape.Height()

		// Concrete summed anew: for the block from the area below it, for the parabola by quadrature.
		sums := map[string]func(x, k float64) (float64, float64){
			"block": func(x, _ float64) (float64, float64) {
				below, first := shape.Below(math.Max(0, h-block.Lambda*x))
				force := block.EtaFcd * (shape.Area() - below)
				return force, block.EtaFcd * (shape.Area()*(h-shape.Centroid()) - (below*h - first))
			},
			"fibres": func(x, k float64) (float64, float64) { return quadrature(shape, parabola, x, k) },
		}
		for name, concrete := range sums {
			var a Axis
			var err error
			hi, epsCu, epsC := h/block.Lambda, block.EpsCu, 0.0
			if name == "block" {
				a, err = s.NeutralAxis(block, layers)
			} else {
				a, err = s.Fibres(parabola, layers)
				hi, epsCu, epsC = 10*h, parabola.EpsCu2, parabola.EpsC2
			}
			if err != nil {
				truth(t, name, err, layers, h, hi, epsCu, epsC, concrete)
				counts[name+": "+reasonOf(err).Error()]++
				continue
			}
			counts[name+": root, "+a.Pivot.String()]++
			if !(a.X > 0 && a.X <= hi && a.Lo <= a.X && a.X <= a.Hi) {
				t.Errorf("%s: x = %g outside [%g, %g]", name, a.X, a.Lo, a.Hi)
			}
			force, first := concrete(a.X, a.Curvature)
			pull, moment, size := pulled(a.X, a.Curvature, layers)
			tol := 1e-6 * force
			if name == "fibres" {
				tol = 1.1e-6 * force // with a part for the quadrature
			}
			tol += 1e-13 * shape.Area() * parabola.Fcd // the area above, found here as a difference, is no better
			if !(math.Abs(force-pull) <= tol) || !(math.Abs(a.Residual) <= 1e-6*a.Concrete) {
				t.Errorf("%s: at x = %g the concrete gives %.12g, the steel %.12g, residual %g", name, a.X, force, pull, a.Residual)
			}
			near(t, name+" M", a.Moment, moment-first, 2*tol*h)
			near(t, name+" ΣF", a.Steel, pull, 1e-9*size)
			limits(t, name, a, h, epsCu, epsC, layers)
		}
	})
	for name, n := range counts {
		t.Logf("%6d %s", n, name)
	}
	total := 0
	for _, n := range counts {
		total += n
	}
	roots := total
	for _, r := range []Reason{NoTension, WhollyCompressed, LimitSpent} {
		roots -= counts["block: "+r.Error()] + counts["fibres: "+r.Error()]
	}
	if 4*roots < 3*total {
		t.Errorf("only %d of %d searches had a root", roots, total)
	}
}

func reasonOf(err error) Reason {
	if r, is := err.(*Refusal); is {
		return r.Reason
	}
	return 0
}

// truth checks a refusal against sums of its own.
func truth(t *rapid.T, name string, err error, layers []Layer, h, hi, epsCu, epsC float64, concrete func(x, k float64) (float64, float64)) {
	t.Helper()
	balance := func(x float64) float64 {
		k := epsCu / x
		if x > h && epsC > 0 {
			k = epsC / (x - (1-epsC/epsCu)*h)
		}
		for _, l := range layers {
			if l.Depth > x && l.Area > 0 && l.Cap > 0 {
				k = math.Min(k, (l.Law.Limit()-l.Prestrain)/(l.Depth-x))
			}
		}
		force, _ := concrete(x, k)
		pull, _, _ := pulled(x, k, layers)
		return force - pull
	}
	switch reasonOf(err) {
	case NoTension:
		if b := balance(1e-9 * h); b < 0 {
			t.Errorf("%s: no tension, but the balance at the top is %g", name, b)
		}
	case WhollyCompressed:
		for i := 1; i <= 50; i++ {
			x, slack := hi*float64(i)/50, 0.0
			if x > h && epsC > 0 { // below the section the search is by places: a narrow peak may escape it
				slack = 0.01 * epsC // times E·A of the layers, which is what the peak comes from
				size := 0.0
				for _, l := range layers {
					size += l.Area * l.Law.Modulus()
				}
				slack *= size
			}
			if balance(x) > slack {
				t.Errorf("%s: wholly compressed, but at x = %g the concrete prevails by %g", name, x, balance(x))
			}
		}
	case LimitSpent:
		spent := false
		for _, l := range layers {
			spent = spent || l.Prestrain >= l.Law.Limit()
		}
		if !spent {
			t.Errorf("%s: %v, but no limit is", name, err)
		}
	default:
		t.Errorf("%s: %v", name, err)
	}
}

// quadrature integrates the parabola–rectangle law over the shape with the Gauss rules of another library,
// in pieces between the strips' edges and the places where the law changes.
func quadrature(shape section.Shape, law Parabola, x, k float64) (force, moment float64) {
	h := shape.Height()
	y := 0.0
	cuts := []float64{h - x, h - x + law.EpsC2/k}
	for _, p := range shape.Strips() {
		a, b := y, y+p.Height
		inside := []float64{a}
		for _, c := range cuts {
			if c > a && c < b {
				inside = append(inside, c)
			}
		}
		inside = append(inside, b)
		for i := 1; i < len(inside); i++ {
			stress := func(y float64) float64 {
				width := p.Bottom + (p.Top-p.Bottom)*(y-a)/p.Height
				e := k * (x - (h - y))
				switch {
				case e <= 0:
					return 0
				case e >= law.EpsC2:
					return width * law.Fcd
				}
				return width * law.Fcd * (1 - math.Pow(1-e/law.EpsC2, law.N))
			}
			force += quad.Fixed(stress, inside[i-1], inside[i], 30, quad.Legendre{}, 0)
			moment += quad.Fixed(func(y float64) float64 { return stress(y) * (h - y) }, inside[i-1], inside[i], 30, quad.Legendre{}, 0)
		}
		y = b
	}
	return force, moment
}

// The exact integrals of any shape, neutral axis and curvature, tiny ones included.
func TestCompressionAgainstQuadrature(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		shape := anyShape(t)
		_, law := anyConcrete(t)
		x := shape.Height() * math.Pow(10, rapid.Float64Range(-4, 1).Draw(t, "log x/h"))
		k := law.EpsCu2 / x * math.Pow(10, rapid.Float64Range(-6, 0).Draw(t, "log κx/ε_cu"))
		force, moment := NewSection(shape).Compression(law, x, k)
		wantForce, wantMoment := quadrature(shape, law, x, k)
		within(t, "force", force, wantForce, 1e-7)
		within(t, "moment", moment, wantMoment, 1e-7)
	})
}

// No jump where the integration of a slab changes its way, as the curvature grows.
func TestCompressionIsContinuous(t *testing.T) {
	shape := ok[section.Shape](t)(section.I(1000, section.Flange{Width: 700, Depth: 120, Haunch: 80}, 150, section.Flange{Width: 550, Depth: 180, Haunch: 120}))
	s := NewSection(shape)
	const x = 400
	for _, c := range classes {
		law := Parabola{c.n, c.c2 / 1e3, c.cu2 / 1e3, 30}
		// Slabs end at 120, 200 and, cut by the neutral axis, 400 mm: to − from = gentle·(to − z0).
		for _, edge := range [][2]float64{{0, 120}, {120, 200}, {200, 400}} {
			z0 := edge[1] - (edge[1]-edge[0])/gentle
			k := law.EpsC2 / (x - z0)
			f1, m1 := s.Compression(law, x, k*(1-1e-13))
			f2, m2 := s.Compression(law, x, k*(1+1e-13))
			within(t, "force", f1, f2, 2e-12)
			within(t, "moment", m1, m2, 2e-12)
		}
	}
}

// A haunch of next to no depth does no harm, steep as its sides are.
func TestThinHaunch(t *testing.T) {
	shape := func(haunch float64) section.Shape {
		return ok[section.Shape](t)(section.T(400, section.Flange{Width: 180, Depth: 80, Haunch: haunch}, 120))
	}
	want := NewSection(shape(0))
	for _, haunch := range []float64{1e-6, 1e-5, 1e-4} {
		s := NewSection(shape(haunch))
		for _, c := range classes {
			law := Parabola{c.n, c.c2 / 1e3, c.cu2 / 1e3, 30}
			for x := 60.0; x < 400; x += 7 {
				f1, m1 := s.Compression(law, x, law.EpsCu2/x)
				f2, m2 := want.Compression(law, x, law.EpsCu2/x)
				within(t, "force", f1, f2, 1e-2*haunch)
				within(t, "moment", m1, m2, 1e-2*haunch)
			}
		}
	}
}
