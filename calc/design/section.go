package design

import (
	"soffit/calc/mechanics"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// sectionChapter gives the properties of the concrete section, bare, net and with its steel and topping, how it is seen
// from its compressed edge, and the places of the steel in it.
func (j *job) sectionChapter(c *trace.Chapter) {
	j.grossSection(c)
	j.levelsSection(c)
	j.fibreSection(c)
	j.views(c)
	heights := j.midSpanHeights(c)
	j.netSection(c, heights)
	j.transformedSection(c, heights)
	j.compositeSection(c)
	j.flangeSection(c)
	if j.hasTopping() {
		j.toppedViews(c)
	}
	if !j.profiled() {
		j.places(c)
	}
}

// grossSection gives area, centroid, second moment of area and moduli of the whole concrete, its weight and its notional
// size.
func (j *job) grossSection(c *trace.Chapter) {
	b := c.Block("gross", "Gross concrete section", nil, trace.Take(j.concrete, j.section)...)
	j.gross = b
	b.Steps(mechanics.PartArea, mechanics.PartCentroid, mechanics.PartInertia)
	if j.hasVoids() {
		b.Steps(mechanics.RoundArea, mechanics.RoundCentroid, mechanics.RoundInertia)
		b.Steps(mechanics.AreaWithVoids, mechanics.CentroidWithVoids, mechanics.InertiaWithVoids)
	} else {
		b.Steps(mechanics.Area, mechanics.Centroid, mechanics.Inertia)
	}
	b.Steps(mechanics.LowerModulus, mechanics.UpperModulus, mechanics.SelfWeight)
	o := &j.form.outline
	around := o.Perimeter()
	words := "The perimeter in contact with air is the whole outline, soffit and top with it."
	if o.InsidePerimeter() > 0 {
		words += " The faces of closed voids are not counted: their air is not renewed."
	}
	if j.hasTopping() {
		words += " The topping is left out: the value is that of the bare member."
	}
	b.Text("drying", words)
	b.Given(def("perimeter", "u", "Perimeter in contact with air", "mm"), number(around, "mm", min(places(around), 3)), "outline, from corner to corner")
	b.Step(mechanics.NotionalSize)
}

// centroidID is the ID of the formula that gives y_cg.
func (j *job) centroidID() string {
	return pick(j.hasVoids(), mechanics.CentroidWithVoids, mechanics.Centroid).ID
}

// levelsSection gives static moment and width at the centroid and where the width jumps.
func (j *job) levelsSection(c *trace.Chapter) {
	names := []string{"centroid"}
	level, centroid := []quantity.Literal{mm(0)}, []quantity.Literal{whole(1)}
	for _, y := range j.form.outline.Jumps() {
		names = append(names, mm(y).Number+" mm")
		level, centroid = append(level, mm(y)), append(centroid, whole(0))
	}
	axis := j.n.Axis("level", "level of the section", "", names)
	b := c.Block("levels", "Static moment and width at levels of the section", axis, trace.Take(j.section, j.gross)...)
	j.levels = b
	const source = "the centroid, and the levels at which the width of the outline jumps"
	b.GivenRows(def("level", "y_e", "Level above the soffit; 0 where it is that of the centroid", "mm"), axis, level, source)
	b.GivenRows(def("at-centroid", "k_cg", "1 at the centroid, 0 at the other levels", ""), axis, centroid, source)
	b.Steps(mechanics.LevelPartDepth, mechanics.LevelPartWidth, mechanics.LevelPartMoment)
	if j.hasVoids() {
		b.Steps(mechanics.LevelRoundPlace, mechanics.LevelRoundDepth, mechanics.LevelRoundArea, mechanics.LevelRoundMoment)
		b.Steps(mechanics.StaticMomentWithVoids, mechanics.UnderPartWidth, mechanics.AbovePartWidth, mechanics.UnderRoundWidth, mechanics.AboveRoundWidth)
		b.Steps(mechanics.WidthUnderWithVoids, mechanics.WidthAboveWithVoids)
	} else {
		b.Steps(mechanics.StaticMoment, mechanics.UnderPartWidth, mechanics.AbovePartWidth, mechanics.WidthUnder, mechanics.WidthAbove)
	}
	b.Step(mechanics.LevelWidth)
	if len(names) > 1 {
		moment := pick(j.hasVoids(), mechanics.StaticMomentWithVoids, mechanics.StaticMoment).ID
		b.Table("along", "Static moment and width of the section at its levels", axis, "level", moment, "level-width")
	}
}

// netSection takes the ducts out, as they are until they are grouted, at mid-span.
func (j *job) netSection(c *trace.Chapter, heights *trace.Block) {
	if len(j.m.Ducts.Rows) == 0 {
		return
	}
	b := c.Block("net", "Section without its ducts, before they are grouted, at mid-span", nil, with(trace.Take(j.section, j.gross, j.tendons), j.tendons, heights)...)
	j.net = b
	b.Steps(mechanics.DuctArea, mechanics.NetArea, mechanics.NetCentroid, mechanics.NetInertia, mechanics.NetLowerModulus, mechanics.NetUpperModulus)
}

// transformedSection counts the bonded steel as concrete, at mid-span.
func (j *job) transformedSection(c *trace.Chapter, heights *trace.Block) {
	takes := with(trace.Take(j.section, j.gross, j.strengths, j.tendons, j.tendonStrengths), j.tendons, heights)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.bareBars)...)
	}
	b := c.Block("transformed", "Section with its steel as concrete, at mid-span", nil, takes...)
	j.transformed = b
	b.Step(mechanics.TendonRatio)
	if j.hasBars() {
		b.Steps(mechanics.BarRatio, mechanics.TransformedAreaWithBars, mechanics.TransformedCentroidWithBars, mechanics.TransformedInertiaWithBars)
	} else {
		b.Steps(mechanics.TransformedArea, mechanics.TransformedCentroid, mechanics.TransformedInertia)
	}
	b.Steps(mechanics.TransformedLowerModulus, mechanics.TransformedUpperModulus)
}

// with adds a block to what is taken, unless it is that other one, which is taken already.
func with(takes []trace.Source, taken, more *trace.Block) []trace.Source {
	if more == taken {
		return takes
	}
	return append(takes, trace.Take(more)...)
}
