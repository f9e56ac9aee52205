package bending

import (
	"fmt"
	"math"
	"testing"

	"soffit/calc/section"
)

// Why a block differs from the parabola–rectangle by more than 2 %.
const (
	// The zone narrows toward the compressed edge, so that most of it lies where the parabola falls off and the block
	// does not: 3.1.7(3) cuts the block by 10 % for it. With the cut it stays below the fibres, but for what stands
	// in cut.
	narrow = "the zone narrows toward the edge"
	// Some steel does not yield, so the moment follows the force of the concrete: λ·η is 0.736 where the parabola has
	// 0.695 in C60, 0.675 to 0.637 in C70. The block with the parabola's own force and depth in a rectangle differs
	// by 0.1 % at most.
	force = "the steel does not yield, and the block has more force"
	// The same the other way: 0.56 to 0.583 in C90; and the zone of the greatest forces reaches beyond a flange,
	// which the weaker block leaves first. On the safe side.
	weak = "the block has less force"
)

// over are the cases of the grid that exceed 2 %, by class and section, in which way it is turned.
var over = map[string]struct {
	why       string
	most, cut float64 // the greatest difference, and of the block with the cut above the fibres
}{
	"C20 triangle": {narrow, 0.027, 0}, "C35 triangle": {narrow, 0.027, 0}, "C50 triangle": {narrow, 0.027, 0},
	"C60 triangle": {narrow, 0.082, 0.018}, "C70 triangle": {narrow, 0.103, 0.037}, "C90 triangle": {narrow, 0.082, 0.013},
	"C60 T, hogging": {narrow, 0.028, 0}, "C60 double T, hogging": {narrow, 0.032, 0},
	"C70 T, hogging": {narrow, 0.024, 0}, "C70 double T, hogging": {narrow, 0.030, 0},
	"C60 round": {narrow, 0.029, 0}, "C60 round, hogging": {narrow, 0.029, 0},
	"C70 round": {narrow, 0.047, 0}, "C70 round, hogging": {narrow, 0.047, 0},
	"C60 trapezoid, wider at the top, hogging": {narrow, 0.037, 0}, "C60 trapezoid, wider at the soffit": {narrow, 0.037, 0},
	"C70 trapezoid, wider at the top, hogging": {narrow, 0.037, 0}, "C70 trapezoid, wider at the soffit": {narrow, 0.037, 0},
	"C60 inverted T": {force, 0.027, 0}, "C60 U": {force, 0.027, 0}, "C70 inverted T": {force, 0.023, 0}, "C70 U": {force, 0.022, 0},
	"C90 rectangle": {weak, 0.022, 0}, "C90 rectangle, hogging": {weak, 0.022, 0}, "C90 T, hogging": {weak, 0.023, 0},
	"C90 inverted T": {weak, 0.023, 0}, "C90 U": {weak, 0.024, 0}, "C90 I": {weak, 0.048, 0}, "C90 I, hogging": {weak, 0.051, 0},
	"C90 box": {weak, 0.030, 0}, "C90 box, hogging": {weak, 0.065, 0}, "C90 ring": {weak, 0.025, 0}, "C90 ring, hogging": {weak, 0.025, 0},
	"C90 hollow unit, round voids": {weak, 0.055, 0}, "C90 hollow unit, round voids, hogging": {weak, 0.055, 0},
	"C90 hollow unit, upright voids": {weak, 0.042, 0}, "C90 hollow unit, upright voids, hogging": {weak, 0.049, 0},
	"C90 hollow unit, level voids": {weak, 0.030, 0}, "C90 hollow unit, level voids, hogging": {weak, 0.030, 0},
}

// The block against the fibres over all classes of concrete, sections of the trade either way up, with axial
// tension, none and compression, with and without steel near the compressed edge: within 2 %, or a reason for the
// case that is true of each state in it.
func TestBlockAgainstFibresOverTheGrid(t *testing.T) {
	met, states, beyond := map[string]bool{}, 0, 0
	for _, c := range classes {
		fcd := c.fck / 1.5
		block := BlockLaw{c.lambda, c.eta * fcd, c.cu3 / 1e3}
		law := Parabola{c.n, c.c2 / 1e3, c.cu2 / 1e3, fcd}
		mean, depth := Graded{block, law}.resultant(law.EpsCu2 / law.EpsC2)
		alike := BlockLaw{2 * depth, mean * fcd / (2 * depth), block.EpsCu}
		for _, form := range trade {
			o := set(t, form.form)
			for name, shape := range map[string]section.Shape{"": o.Shape, ", hogging": o.Flipped().Shape} {
				name = fmt.Sprintf("C%g %s%s", c.fck, form.name, name)
				s, h := NewSection(shape), shape.Height()
				for _, axial := range []float64{-0.02, 0, 0.1} {
					n := Conditions{Axial: s.AtCentroid(axial * shape.Area() * fcd)}
					for part := 0.03; part <= 0.3; part *= 1.2 {
						area := part * shape.Area() * fcd / fpd
						strand, bar := horizontal(t, 195e3, fpd), horizontal(t, 200e3, fyd)
						low := []Layer{{Area: 0.7 * area, Depth: h - 45, Prestrain: 5.5e-3, Cap: inf, Law: strand}, {Area: 0.3 * area, Depth: h - 90, Prestrain: 5.6e-3, Cap: inf, Law: strand}}
						near := append(low[:2:2], Layer{Area: 0.002 * shape.Area(), Depth: 40, Cap: inf, Law: bar}, Layer{Area: 0.1 * area, Depth: 60, Prestrain: 6e-3, Cap: inf, Law: strand})
						for _, layers := range [][]Layer{low, near} {
							states++
							a, f := ok[Axis](t)(s.NeutralAxisUnder(n, block, layers)), ok[Axis](t)(s.FibresUnder(n, law, layers))
							off := a.Moment/f.Moment - 1
							if math.Abs(off) <= 0.02 {
								continue
							}
							beyond++
							met[name] = true
							k := over[name]
							if math.Abs(off) > k.most {
								t.Errorf("%s, N %g, steel %.3f: off by %.2f %%", name, axial, part, 100*off)
							}
							yield := layers[0].At(f.X, f.Curvature).Yields && layers[1].At(f.X, f.Curvature).Yields
							cut := n
							cut.Narrowing = 0.9
							b := ok[Axis](t)(s.NeutralAxisUnder(cut, block, layers))
							g := ok[Axis](t)(s.NeutralAxisUnder(n, alike, layers))
							switch k.why {
							case narrow:
								if !b.Reduced || b.Moment/f.Moment-1 > k.cut {
									t.Errorf("%s, N %g, steel %.3f: reduced %v, then off by %.2f %%", name, axial, part, b.Reduced, 100*(b.Moment/f.Moment-1))
								}
							case force:
								if yield || b.Reduced || math.Abs(g.Moment/f.Moment-1) > 1e-3 || mean >= c.lambda*c.eta {
									t.Errorf("%s, N %g, steel %.3f: yields %v, alike off by %.2f %%", name, axial, part, yield, 100*(g.Moment/f.Moment-1))
								}
							case weak:
								if off > 0 || mean < 1.04*c.lambda*c.eta || g.Moment < a.Moment {
									t.Errorf("%s, N %g, steel %.3f: off by %.2f %%, alike %.2f %%", name, axial, part, 100*off, 100*(g.Moment/f.Moment-1))
								}
							}
						}
					}
				}
			}
		}
	}
	for name := range over {
		if !met[name] {
			t.Errorf("%s is within 2 %%", name)
		}
	}
	t.Logf("%d of %d states differ by more than 2 %%, in %d cases", beyond, states, len(met))
}
