package design

import (
	"fmt"

	"soffit/calc/mechanics"
	"soffit/calc/quantity"
	"soffit/calc/section"
	"soffit/calc/trace"
	"soffit/templates"
)

// sectionSlices is in how many level slices the section is cut by the second method for its properties, at least.
const sectionSlices = 4000

// secondSection finds the properties of the section by level slices and corner by corner.
func (j *job) secondSection(c *trace.Chapter) {
	b := c.Block("section", "Section by slices and by corners", nil, trace.Take(j.gross)...)
	b.Text("second", templates.Text("second"))
	o := j.form.outline
	per := (sectionSlices-1)/len(o.Strips()) + 1
	how := fmt.Sprintf("%d level slices, each the rectangles of concrete that a line through its middle meets", per*len(o.Strips()))
	found(b, "", "2", "by slices", how, o.BySlices(per))
	b.Steps(mechanics.AreaDifference, mechanics.CentroidDifference, mechanics.InertiaDifference)
	how = "corner by corner round each ring, round voids by the formulas of the circle"
	found(b, "polygon-", "3", "corner by corner", how, o.ByPolygons())
	b.Steps(mechanics.PolygonAreaDifference, mechanics.PolygonCentroidDifference, mechanics.PolygonInertiaDifference)
	b.Decide(mechanics.SectionMethodsAgree)
}

// found records properties from a second method, in seven digits.
func found(b *trace.Block, id, suffix, words, how string, p section.Properties) {
	value := func(key, symbol, name, unit string, v float64) {
		shown := quantity.MustUnit(unit).From(v)
		b.Given(def(id+key, symbol, name+" "+words, unit), number(v, unit, max(quantity.Decimals(shown, 7), 0)), how)
	}
	value("area", "A_{c,"+suffix+"}", "Area", "mm²", p.Area)
	value("centroid", "y_{cg,"+suffix+"}", "Centroid", "mm", p.Centroid)
	value("inertia", "I_{c,"+suffix+"}", "Second moment of area", "10⁶ mm⁴", p.Inertia)
}
