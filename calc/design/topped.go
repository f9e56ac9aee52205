package design

import (
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// toppedViews are the section with its topping seen from the top and, where the member hogs, from the soffit.
func (j *job) toppedViews(c *trace.Chapter) {
	view := func(slug, title string, below bool) *trace.Block {
		b := c.Block(slug, title, nil, trace.Take(j.section, j.gross, j.topping, j.composite, j.fibres)...)
		b.Steps(mechanics.SeenDepthTopped, pick(below, mechanics.FibreDepthBelow, mechanics.FibreDepth), pick(below, mechanics.ToppedCentroidDepthBelow, mechanics.ToppedCentroidDepth))
		depth, source := j.toppedFlange(below)
		b.Given(def("flange-depth", "z_fl", "Depth of a compression flange at this edge; 0 mm for none", "mm"), mm(depth), source)
		return b
	}
	j.toppedFromTop = view("topped-from-top", "Section with topping seen from the top", false)
	if j.hogs() {
		j.toppedFromBelow = view("topped-from-below", "Section with topping seen from the soffit", true)
	}
}

// toppedFlange is the depth of a compression flange: seen from the top the topping, where it is wider than the narrowest part
// of the member.
func (j *job) toppedFlange(below bool) (float64, string) {
	switch narrowest := j.shape.LeastWidth(0, j.shape.Height()); {
	case below:
		return j.base("section.from-below/flange-depth", nil), "as of the bare member"
	case j.m.Topping.Width.Base() > narrowest:
		return j.m.Topping.Depth.Base(), "the topping, wider than the narrowest part of the member"
	}
	return 0, "the topping is no wider than the member"
}
