package bending

import (
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"

	"soffit/calc/section"
)

// both runs a check on the block and on the fibres.
func both(s *Section, block BlockLaw, parabola Parabola, layers []Layer) map[string]func(*Section, []Layer) (Axis, error) {
	return map[string]func(*Section, []Layer) (Axis, error){
		"block":  func(s *Section, l []Layer) (Axis, error) { return s.NeutralAxis(block, l) },
		"fibres": func(s *Section, l []Layer) (Axis, error) { return s.Fibres(parabola, l) },
	}
}

// What must not change the resistance, or change it in proportion, whatever the section.
func TestMetamorphic(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		shape := anyShape(t)
		layers := anyLayers(t, shape)
		block, parabola := anyConcrete(t)
		s := NewSection(shape)
		order := rapid.Permutation(layers).Draw(t, "order")
		for name, solve := range both(s, block, parabola, layers) {
			a, err := solve(s, layers)
			same := func(change string, b Axis, errB error, force, length float64) {
				t.Helper()
				if (err == nil) != (errB == nil) || err != nil && reasonOf(err) != reasonOf(errB) {
					t.Errorf("%s, %s: %v, before %v", name, change, errB, err)
				}
				if err != nil || errB != nil {
					return
				}
				size := a.Concrete * shape.Height() * force * length
				near(t, name+" M, "+change, b.Moment, a.Moment*force*length, 1e-8*size)
				within(t, name+" x, "+change, b.X, a.X*length, 1e-8)
				near(t, name+" force, "+change, b.Concrete, a.Concrete*force, 1e-8*a.Concrete*force)
			}
			changed := func(change func(*Layer)) []Layer {
				c := slices.Clone(layers)
				for i := range c {
					change(&c[i])
				}
				return c
			}
			strips := func(width, height float64) *Section {
				c := shape.Strips()
				for i := range c {
					c[i] = section.Strip{Height: height * c[i].Height, Bottom: width * c[i].Bottom, Top: width * c[i].Top}
				}
				return NewSection(ok[section.Shape](t)(section.New(c...)))
			}

			b, errB := solve(strips(2, 1), changed(func(l *Layer) { l.Area *= 2 }))
			same("twice as wide with twice the steel", b, errB, 2, 1)

			b, errB = solve(strips(3, 3), changed(func(l *Layer) { l.Area *= 9; l.Depth *= 3 }))
			same("three times the size", b, errB, 9, 3)

			b, errB = solve(s, order)
			same("layers in another order", b, errB, 1, 1)

			halves := changed(func(l *Layer) { l.Area /= 2 })
			b, errB = solve(s, append(halves, halves...))
			same("each layer as two halves", b, errB, 1, 1)

			var cut []section.Strip
			for _, p := range shape.Strips() {
				m := (p.Bottom + p.Top) / 2
				cut = append(cut, section.Strip{Height: p.Height / 2, Bottom: p.Bottom, Top: m}, section.Strip{Height: p.Height / 2, Bottom: m, Top: p.Top})
			}
			b, errB = solve(NewSection(ok[section.Shape](t)(section.New(cut...))), layers)
			same("each strip as two", b, errB, 1, 1)

			// A cap at or above the greatest stress of the law does nothing.
			b, errB = solve(s, changed(func(l *Layer) {
				if math.IsInf(l.Cap, 1) {
					l.Cap = l.Law.stress[l.Law.points-1]
				}
			}))
			same("caps at the strength", b, errB, 1, 1)
		}
	})
}

// With every layer on the level branch the prestrain does not change the resistance.
func TestPrestrainAtYield(t *testing.T) {
	compared, total := 0, 0
	rapid.Check(t, func(t *rapid.T) {
		shape := anyShape(t)
		block, parabola := anyConcrete(t)
		s := NewSection(shape)
		var layers []Layer
		for range rapid.IntRange(1, 5).Draw(t, "layers") {
			law := horizontal(t, 195e3, rapid.Float64Range(1000, 1600).Draw(t, "fd"))
			layers = append(layers, Layer{
				Area:      shape.Area() * math.Pow(10, rapid.Float64Range(-5, -3).Draw(t, "log ρ")),
				Depth:     shape.Height() * rapid.Float64Range(0.4, 0.98).Draw(t, "d/h"),
				Prestrain: law.Yield().Strain * rapid.Float64Range(0, 1).Draw(t, "ε_p0/ε_y"),
				Cap:       inf, Law: law,
			})
		}
		more := slices.Clone(layers)
		for i := range more {
			more[i].Prestrain += rapid.Float64Range(0, 5e-3).Draw(t, "Δε_p0")
		}
		for name, solve := range both(s, block, parabola, layers) {
			total++
			a, err := solve(s, layers)
			if err != nil {
				continue
			}
			yield := true
			for i := range layers {
				yield = yield && layers[i].At(a.X, a.Curvature).Strain >= layers[i].Law.Yield().Strain
			}
			if !yield {
				continue
			}
			compared++
			b := ok[Axis](t)(solve(s, more))
			within(t, name+" x", b.X, a.X, 1e-11)
			within(t, name+" M", b.Moment, a.Moment, 1e-11)
		}
	})
	if 3*compared < total {
		t.Errorf("only %d of %d states had all layers at yield", compared, total)
	}
}

// ordinary draws a beam such as is built: rectangle, T or I, strands and bars low in it.
func ordinary(t *rapid.T) (section.Shape, []Layer) {
	h := rapid.Float64Range(400, 1800).Draw(t, "h")
	bw := rapid.Float64Range(120, 400).Draw(t, "b_w")
	flange := section.Flange{
		Width: bw * rapid.Float64Range(1.5, 5).Draw(t, "b_f/b_w"),
		Depth: h * rapid.Float64Range(0.1, 0.2).Draw(t, "h_f/h"), Haunch: h * rapid.Float64Range(0, 0.08).Draw(t, "haunch/h"),
	}
	var shape section.Shape
	switch rapid.SampledFrom([]string{"rectangle", "T", "I"}).Draw(t, "shape") {
	case "rectangle":
		shape = ok[section.Shape](t)(section.Rectangle(bw, h))
		flange.Width = bw
	case "T":
		shape = ok[section.Shape](t)(section.T(h, flange, bw))
	default:
		shape = ok[section.Shape](t)(section.I(h, flange, bw, section.Flange{Width: 2 * bw, Depth: 0.15 * h, Haunch: 0.1 * h}))
	}
	strand, bar := horizontal(t, 195e3, fpd), horizontal(t, 200e3, fyd)
	if rapid.Bool().Draw(t, "rising") {
		strand = ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
		bar = ok[SteelLaw](t)(Inclined(200e3, fyd, 1.08*fyd, 0.05, 0.045))
	}
	omega := rapid.Float64Range(0.03, 0.22).Draw(t, "ω")
	area := omega * flange.Width * h * 20 / fpd
	e := rapid.Float64Range(4.5e-3, 6.5e-3).Draw(t, "ε_p0")
	layers := []Layer{
		{Area: 0.5 * area, Depth: h - 50, Prestrain: e, Cap: inf, Law: strand},
		{Area: 0.3 * area, Depth: h - 100, Prestrain: 1.02 * e, Cap: inf, Law: strand},
		{Area: 0.1 * area, Depth: h - 150, Prestrain: 1.04 * e, Cap: inf, Law: strand},
		{Area: 0.2 * area, Depth: h - 45, Cap: inf, Law: bar},
		{Area: 0.05 * area, Depth: 45, Cap: inf, Law: bar},
	}
	return shape, layers
}

// Block and fibres give the same resistance within 2 % on ordinary sections.
func TestBlockAgainstFibres(t *testing.T) {
	worst := 0.0
	n := 0
	rapid.Check(t, func(t *rapid.T) {
		shape, layers := ordinary(t)
		s := NewSection(shape)
		a := ok[Axis](t)(s.NeutralAxis(block20, layers))
		f := ok[Axis](t)(s.Fibres(parabola20, layers))
		within(t, "M", a.Moment, f.Moment, 0.02)
		worst = math.Max(worst, math.Abs(a.Moment/f.Moment-1))
		n++
	})
	t.Logf("%d sections, worst difference %.3f %%", n, 100*worst)
}

// The whole second method against one with nothing in common: halving of the bracket, strains and forces
// written out, concrete by the quadrature of another library.
func TestFibresAgainstAnotherSolver(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		shape, layers := ordinary(t)
		_, law := anyConcrete(t)
		a, err := NewSection(shape).Fibres(law, layers)
		if err != nil {
			t.Skip(err)
		}
		if a.X > shape.Height() {
			t.Skip("wholly compressed")
		}
		state := func(x float64) (force, moment float64) {
			k := law.EpsCu2 / x
			for _, l := range layers {
				if l.Depth > x {
					k = math.Min(k, (l.Law.Limit()-l.Prestrain)/(l.Depth-x))
				}
			}
			c, first := quadrature(shape, law, x, k)
			pull, moment, _ := pulled(x, k, layers)
			return c - pull, moment - first
		}
		lo, hi := 1e-6, shape.Height()
		for range 60 {
			if mid := (lo + hi) / 2; func() bool { f, _ := state(mid); return f < 0 }() {
				lo = mid
			} else {
				hi = mid
			}
		}
		_, m := state(lo)
		within(t, "x", a.X, lo, 1e-5)
		within(t, "M", a.Moment, m, 1e-5)
	})
}
