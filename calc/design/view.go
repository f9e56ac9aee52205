package design

import (
	"soffit/calc/bending"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// views give the section as it is seen from the edge that is compressed: from the top, and from the soffit where the
// member hogs.
func (j *job) views(c *trace.Chapter) {
	b := c.Block("from-top", "The section from the top, compressed where the moment sags", nil, j.viewSources()...)
	j.fromTop = b
	b.Step(mechanics.CentroidDepth)
	if j.fibred() && !j.hasTopping() {
		b.Steps(mechanics.SeenDepth, mechanics.FibreDepth)
	}
	b.Steps(mechanics.PartDepthTop, mechanics.NearWidthTop, mechanics.FarWidthTop)
	if j.hasVoids() {
		b.Steps(mechanics.RoundDepthTop, mechanics.RoundFromTop, mechanics.RoundToTop)
	}
	j.edge(b, true)
	if !j.hogs() {
		return
	}
	b = c.Block("from-below", "The section from the soffit, compressed where the moment hogs", nil, j.viewSources()...)
	j.fromBelow = b
	b.Step(mechanics.CentroidDepthBelow)
	if j.fibred() && !j.hasTopping() {
		b.Steps(mechanics.SeenDepth, mechanics.FibreDepthBelow)
	}
	b.Steps(mechanics.PartDepthBelow, mechanics.NearWidthBelow, mechanics.FarWidthBelow)
	if j.hasVoids() {
		b.Steps(mechanics.RoundDepthBelow, mechanics.RoundFromBelow, mechanics.RoundToBelow)
	}
	j.edge(b, false)
}

// viewSources are what a view takes.
func (j *job) viewSources() []trace.Source {
	if j.fibred() && !j.hasTopping() {
		return trace.Take(j.section, j.gross, j.fibres)
	}
	return trace.Take(j.section, j.gross)
}

// edge records what the outline shows at the compressed edge: its width and depth as a rectangle, a flange, and where the
// width first grows away from it.
func (j *job) edge(b *trace.Block, top bool) {
	width, depth := j.form.edge(top)
	shape := j.form.outline.Shape
	if !top {
		shape = shape.Flipped()
	}
	const source = "outline"
	b.Given(def("edge-width", "b_f", "Width at the compressed edge", "mm"), width, source)
	b.Given(def("edge-depth", "h_f", "Depth over which the section is a rectangle of this width, 0 where it is none", "mm"), depth, source)
	b.Given(def("flange-depth", "z_fl", "Depth of a compression flange, wider throughout than the narrowest web behind it; 0 where there is none", "mm"), mm(shape.TopFlange()), source)
	b.Given(def("narrowing-depth", "z_N", "Depth at which the width, net of voids, first grows away from the edge; the whole depth where it never does", "mm"), mm(bending.NewSection(shape).FirstGrowth()), source)
}
