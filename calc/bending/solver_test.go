package bending

import (
	"fmt"
	"math"
	"testing"

	"soffit/calc/section"
)

// bisected finds the state a second way: x by halving between the top and the foot of the section, or above it, the curvature and
// the steel written out, the concrete by the quadrature of another library from corners and rounds.
func (c *composed) bisected(n Axial, flange CompressionFlange, layers []Layer) (x, moment float64) {
	state := func(x float64) (force, moment float64) {
		k := c.curvature(x, flange, layers)
		f, first := c.concrete(x, k)
		pull, turn, _ := pulled(x, k, layers)
		return f - pull - n.Force, turn - first + n.Force*n.Depth
	}
	less := func(x float64) bool { f, _ := state(x); return f < 0 }
	lo, hi := 0.0, c.height
	if !less(1e-6) { // little steel: the strain locked in does it
		lo, hi = -10*c.height, 0
	}
	for range 48 {
		if mid := (lo + hi) / 2; less(mid) {
			lo = mid
		} else {
			hi = mid
		}
	}
	_, moment = state(lo)
	return lo, moment
}

// ordinaryLayers are two rows of strand and bars near either face for a section of a trade.
func ordinaryLayers(t tester, part, area, fcd, h float64) []Layer {
	strand, bar := ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02)), horizontal(t, 200e3, fyd)
	a := part * area * fcd / fpd
	return []Layer{
		{Area: 0.7 * a, Depth: h - 45, Prestrain: 5.5e-3, Cap: inf, Law: strand},
		{Area: 0.3 * a, Depth: h - 90, Prestrain: 5.6e-3, Cap: inf, Law: strand},
		{Area: 0.2 * a, Depth: h - 40, Cap: inf, Law: bar},
		{Area: 0.1 * a, Depth: 40, Cap: inf, Law: bar},
	}
}

// Every section of the trade either way up, voids and rings among them, by itself and with a topping and locked-in
// strain, for classes of concrete and bilinear laws, with axial force and a limited flange: the whole solution
// within 1e-5 of one that shares nothing with it; and of the composite ones the graded fibres within 0.1 %.
func TestFibresOfTheTradeAgainstAnotherSolver(t *testing.T) {
	laws := []Parabola{{1, 1.75e-3, 3.5e-3, 30}, {1, 2.3e-3, 2.6e-3, 60}}
	for _, c := range classes[2:] {
		laws = append(laws, Parabola{c.n, c.c2 / 1e3, c.cu2 / 1e3, c.fck / 1.5})
	}
	states, pivots, worst, worstFibres := 0, map[Pivot]int{}, 0.0, 0.0
	for i, law := range laws {
		weak := Parabola{1, 1.75e-3, 3.5e-3, 20}
		if i%2 == 0 {
			weak = parabola20
		}
		for j, form := range trade {
			if (i+j)%2 != 0 {
				continue
			}
			o := set(t, form.form)
			for _, made := range []string{"alone", "turned", "topped", "topped, turned"} {
				m := &composed{}
				if made == "topped" {
					m.add(set(t, section.RectangularBeam{Width: 0.9 * o.Height(), Depth: 70}), weak)
				}
				if made == "alone" || made == "topped" {
					m.add(o, law)
				} else {
					m.add(o.Flipped(), law)
				}
				if made == "topped, turned" {
					m.add(set(t, section.RectangularBeam{Width: 0.9 * o.Height(), Depth: 70}), weak)
				}
				switch h := o.Height(); made { // prestress: most at the soffit of the member
				case "topped":
					m.bodies[1].Strain, m.bodies[1].Slope = 5e-5, 4e-4/h
				case "topped, turned":
					m.bodies[0].Strain, m.bodies[0].Slope = 4.5e-4, -4e-4/h
				}
				m.limits = LimitsOf(m.bodies)
				area := 0.0
				for _, b := range m.bodies {
					a, _ := b.Section.Above(b.Section.Height())
					area += a
				}
				model := modelled(m.bodies, m.limits, thin, share, m.ledges())
				for _, axial := range []float64{-0.01, 0, 0.08} {
					for _, deep := range []float64{0, 0.15} {
						if axial != 0 && deep != 0 {
							continue
						}
						for _, part := range []float64{0.02, 0.2} {
							c := Conditions{Axial: Axial{axial * area * law.Fcd, 0.5 * m.height}, Flange: CompressionFlange{deep * m.height, m.bodies[0].Law.EpsC2}}
							layers := ordinaryLayers(t, part, area, law.Fcd, m.height)
							name := fmt.Sprintf("law %d, %s %s, N %g, flange %g, steel %g", i, form.name, made, axial, deep, part)
							x, moment := m.bisected(c.Axial, c.Flange, layers)
							a := ok[Axis](t)(CompositeFibres(m.bodies, m.limits, c, layers))
							if a.X > m.height {
								continue // the other solver looks within the section
							}
							states++
							pivots[a.Pivot]++
							within(t, name+": M", a.Moment, moment, 1e-5)
							within(t, name+": x", a.X, x, 1e-5)
							worst = math.Max(worst, math.Abs(a.Moment/moment-1))
							if len(m.bodies) == 1 {
								b := ok[Axis](t)(m.bodies[0].Section.FibresUnder(c, law, layers))
								within(t, name+": M of the section", b.Moment, moment, 1e-5)
							}
							f := ok[Axis](t)(model.Axis(c, layers))
							within(t, name+": M by fibres", f.Moment, moment, 1e-3)
							worstFibres = math.Max(worstFibres, math.Abs(f.Moment/moment-1))
						}
					}
				}
			}
		}
	}
	t.Logf("%d states, %v: off by %.1e, fibres by %.1e at most", states, pivots, worst, worstFibres)
	if pivots[PivotTop] == 0 || pivots[PivotSteel] == 0 || pivots[PivotFlange] == 0 || pivots[PivotEdge] == 0 {
		t.Error("a pivot is missing")
	}
}

// A graded block under a flange's limit where the member hogs: the box from below, layers turned, axial tension and
// compression; the state against halving with the block summed from the corners.
func TestGradedFlangeHogging(t *testing.T) {
	o := set(t, section.BoxBeam{Width: 1500, Depth: 1200, Top: 150, Web: 200, Bottom: 180, BottomHaunch: 60})
	s, f, h := NewSection(o.Shape.Flipped()), figureOf(o.Flipped()), o.Height()
	g := Graded{block20, parabola20}
	const step = 4.0
	bar := horizontal(t, 200e3, fyd)
	seen := map[Pivot]int{}
	for i, area := 0, 500.0; area < 16000; i, area = i+1, area*1.25 {
		strand := horizontal(t, 195e3, fpd)
		if i%2 == 0 {
			strand = ok[SteelLaw](t)(Inclined(195e3, fpd, fud, 0.035, 0.02))
		}
		layers := Hogging([]Layer{ // depths from the top
			{Area: area, Depth: 60, Prestrain: 5.5e-3, Cap: inf, Law: strand},
			{Area: 1500, Depth: 45, Cap: inf, Law: bar},
			{Area: 800, Depth: h - 50, Cap: inf, Law: bar},
			{Area: 1000, Depth: h - 110, Prestrain: 5e-3, Cap: inf, Law: strand},
		}, h)
		for _, n := range []float64{-1500e3, 0, 2500e3} {
			c := Conditions{Axial: s.AtCentroid(n), Flange: CompressionFlange{180, 2e-3}}
			m := composed{bodies: alone(s, parabola20), height: h}
			m.limits = LimitsOf(m.bodies)
			m.limits.Core.EpsC2 = m.limits.Core.EpsCu // the block has no core: ε_cu/x below the section too
			state := func(x float64) (force, moment float64) {
				k := m.curvature(x, c.Flange, layers)
				b, first := f.block(g.At(k*x), x)
				pull, turn, _ := pulled(x, k, layers)
				return b - pull - n, turn - first + n*c.Axial.Depth
			}
			// Of all the states that balance, that of smallest curvature.
			want, least := 0.0, inf
			for x := 1.0; x < h/0.8; x += step {
				if p, _ := state(x); p < 0 {
					if q, _ := state(x + step); q >= 0 && m.curvature(x, c.Flange, layers) < least {
						want, least = x, m.curvature(x, c.Flange, layers)
					}
				}
			}
			a, err := s.GradedAxisUnder(c, g, layers)
			if math.IsInf(least, 1) {
				if top, _ := state(1e-6 * h); top < 0 {
					refused(t, "too much", err, WhollyCompressed)
				}
				continue
			}
			if err != nil {
				t.Fatalf("%g mm², N %g: %v", area, n, err)
			}
			seen[a.Pivot]++
			lo, hi := want, want+step
			for range 60 {
				mid := (lo + hi) / 2
				if p, _ := state(mid); p < 0 {
					lo = mid
				} else {
					hi = mid
				}
			}
			_, moment := state(lo)
			within(t, fmt.Sprintf("%g mm², N %g: x", area, n), a.X, lo, 1e-7)
			within(t, fmt.Sprintf("%g mm², N %g: M", area, n), a.Moment, moment, 1e-7)
			if a.Pivot == PivotFlange {
				near(t, "strain in the middle", a.Curvature*(a.X-90), 2e-3, 1e-12)
			}
		}
	}
	t.Log(seen)
	if seen[PivotFlange] < 5 || seen[PivotSteel] < 3 || seen[PivotTop] < 3 {
		t.Errorf("%v", seen)
	}
}
