package design

import (
	"cmp"
	"fmt"
	"math"
	"slices"

	"soffit/calc/mechanics"
	"soffit/calc/quantity"
	"soffit/calc/section"
	"soffit/calc/trace"
)

// Fibres are graded: finest at the faces, where strains and stresses decide.
const (
	finest = 400.0 // part of the depth that a fibre has at least
	grade  = 20.0  // part of the distance to the nearer face that it has at least
)

// fibre is a level slice of the concrete: its area and the height of its centroid above the soffit.
type fibre struct {
	area, level float64 // mm², mm
	topping     bool
}

// slab is a topping on a section: width and depth in mm, both 0 for none.
type slab struct{ width, depth float64 }

// fibresOf cuts a section with its topping into fibres from the soffit up: graded, and cut where the width jumps and at
// the interface. Areas and centroids are exact.
func fibresOf(o section.Outline, top slab) []fibre {
	h := o.Height()
	fixed := append([]float64{0, h}, o.Jumps()...)
	if top.depth > 0 {
		fixed = append(fixed, h+top.depth)
	}
	var out []fibre
	cuts := gradedCuts(h+top.depth, fixed)
	for i := 1; i < len(cuts); i++ {
		low, high := cuts[i-1], cuts[i]
		if low >= h {
			out = append(out, fibre{top.width * (high - low), (low + high) / 2, true})
			continue
		}
		a0, m0 := o.Below(low)
		a1, m1 := o.Below(high)
		out = append(out, fibre{a1 - a0, (m1 - m0) / (a1 - a0), false})
	}
	return out
}

// gradedCuts are levels from 0 to a height: graded ones, and the fixed ones, which push out those that come too close.
func gradedCuts(h float64, fixed []float64) []float64 {
	slices.Sort(fixed)
	fixed = slices.Compact(fixed)
	var cuts []float64
	free := func(y float64) bool {
		i, _ := slices.BinarySearch(fixed, y)
		near := math.Inf(1)
		for _, k := range []int{i - 1, i} {
			if k >= 0 && k < len(fixed) {
				near = math.Min(near, math.Abs(fixed[k]-y))
			}
		}
		return near > step(h, y)/2
	}
	for y := step(h, 0); y < h/2; y += step(h, y) {
		for _, c := range []float64{y, h - y} {
			if free(c) {
				cuts = append(cuts, c)
			}
		}
	}
	cuts = append(cuts, fixed...)
	slices.SortFunc(cuts, cmp.Compare)
	return cuts
}

// step is the depth of a fibre at a level of a section h deep.
func step(h, y float64) float64 { return math.Max(h/finest, math.Min(y, h-y)/grade) }

// fibreSection records the fibres and holds their sum against the section.
func (j *job) fibreSection(c *trace.Chapter) {
	if !j.fibred() {
		return
	}
	var top slab
	takes := trace.Take(j.section, j.gross)
	if j.hasTopping() {
		top = slab{j.m.Topping.Width.Base(), j.m.Topping.Depth.Base()}
		takes = append(takes, trace.Take(j.topping)...)
	}
	list := fibresOf(j.form.outline, top)
	names := make([]string, len(list))
	for i := range names {
		names[i] = fmt.Sprintf("fibre %d", i+1)
	}
	j.fibreAxis = j.n.Axis("fibre", "fibre of the concrete, from the soffit up", "m", names)
	j.fibreAxis.Work = len(names) - 1
	b := c.Block("fibres", "Fibres of the concrete", nil, takes...)
	j.fibres = b
	b.Text("graded", fmt.Sprintf("Bending at the ultimate limit state is worked with %d level slices of the concrete. They are 1/%g of the depth thick at the faces and up to 1/%g of their distance from the nearer face inside, cut where the width jumps; area and centroid of each are exact.", len(list), finest, grade))
	const source = "outline, cut into level slices"
	column := func(id, symbol, name, unit string, of func(fibre) quantity.Literal) {
		b.GivenRows(def(id, symbol, name, unit), j.fibreAxis, each(list, of), source)
	}
	column("fibre-area", "A_{f,m}", "Area", "mm²", func(f fibre) quantity.Literal { return number(f.area, "mm²", 3) })
	column("fibre-level", "y_{f,m}", "Centroid above the soffit", "mm", func(f fibre) quantity.Literal { return number(f.level, "mm", 4) })
	column("fibre-topping", "k_{t,m}", "1 in the topping, 0 in the member", "", func(f fibre) quantity.Literal { return flag(f.topping) })
	b.Step(pick(j.hasTopping(), mechanics.FibreAreaDifferenceWithTopping, mechanics.FibreAreaDifference))
	b.Step(pick(j.hasTopping(), mechanics.FibreMomentDifferenceWithTopping, mechanics.FibreMomentDifference))
	b.Require(mechanics.FibresComplete)
}
