package design

import (
	"fmt"

	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/section"
	"soffit/calc/trace"
)

// givenSection records the shape: its depth, where its corners and voids lie, the measures as written, and the parts
// that properties and bending are worked from.
func (j *job) givenSection(c *trace.Chapter) {
	b := c.Block("section", "Concrete section", nil)
	j.section = b
	s, f := &j.m.Shape, &j.form
	depth := given(s.Depth)
	if !s.Depth.Present() {
		depth = "height of the corners; " + shapeSource(s)
	}
	b.Given(def("depth", "h", "Overall depth", "mm"), f.depth, depth)
	if s.Kind.Text == "T" || s.Kind.Text == "I" {
		b.Given(def("web-width", "b_w", "Width of the web", "mm"), s.WebWidth.Literal, given(s.WebWidth))
	}
	j.givenParts(b)
	j.givenOutline(b)
	j.givenDimensions(b)
}

// shapeSource says where in the member file the shape is described.
func shapeSource(s *member.Shape) string {
	return fmt.Sprintf("member file, shape on line %d", s.Kind.Pos.Line)
}

// givenParts records straight-sided and round parts.
func (j *job) givenParts(b *trace.Block) {
	p, source := &j.form.parts, shapeSource(&j.m.Shape)
	source += ", cut at each corner"
	j.parts = j.n.Axis("part", "part of the section, from the soffit up", "n", p.names)
	j.parts.Work = len(p.names) - 1 // the top, which is compressed
	b.GivenRows(def("part-height", "h_{c,n}", "Height", "mm"), j.parts, p.height, source)
	b.GivenRows(def("part-lower", "b_{u,n}", "Lower width, round voids not taken out", "mm"), j.parts, p.lower, source)
	b.GivenRows(def("part-upper", "b_{o,n}", "Upper width, round voids not taken out", "mm"), j.parts, p.upper, source)
	b.GivenRows(def("part-level", "y_{u,n}", "Lower edge above the soffit", "mm"), j.parts, p.level, source)
	if !j.hasVoids() {
		return
	}
	rounds := j.form.rounds
	names := make([]string, len(rounds))
	for i := range rounds {
		names[i] = rounds[i].name
	}
	j.rounds = j.n.Axis("round part", "round part taken out of the section: circles, or halves of them", "m", names)
	source = shapeSource(&j.m.Shape)
	column := func(id, symbol, name, unit string, of func(roundPart) quantity.Literal) {
		b.GivenRows(def(id, symbol, name, unit), j.rounds, each(rounds, of), source)
	}
	column("round-count", "n_{v,m}", "Number of equal circles at one level, the half circles of oblong voids among them", "", func(r roundPart) quantity.Literal { return whole(r.count) })
	column("round-radius", "r_{v,m}", "Radius of the circles", "mm", func(r roundPart) quantity.Literal { return r.radius })
	column("round-level", "y_{v,m}", "Centre of the circles above the soffit", "mm", func(r roundPart) quantity.Literal { return r.level })
	column("round-from", "u_{1,m}", "Where the circle begins to count, upward from its lowest point", "mm", func(r roundPart) quantity.Literal { return r.from })
	column("round-to", "u_{2,m}", "Where it ceases to count, upward from its lowest point", "mm", func(r roundPart) quantity.Literal { return r.to })
}

// hasVoids says that the section has round or oblong voids.
func (j *job) hasVoids() bool { return len(j.form.rounds) > 0 }

// drawn is a place in a drawing, to a thousandth of a millimetre at most: nothing is worked from it.
func drawn(v float64) quantity.Literal { return number(v, "mm", min(places(v), 3)) }

// givenOutline records the corners and voids in their places.
func (j *job) givenOutline(b *trace.Block) {
	c, source := j.form.outline.Contour(), shapeSource(&j.m.Shape)
	var names []string
	var x, y, ring []quantity.Literal
	add := func(name string, ringNumber int, r section.Ring) {
		for i, p := range r {
			names = append(names, fmt.Sprintf("%scorner %d", name, i+1))
			x, y, ring = append(x, drawn(p.X)), append(y, drawn(p.Y)), append(ring, whole(ringNumber))
		}
	}
	for _, r := range c.Outer {
		add("", 0, r)
	}
	for i, r := range c.Holes {
		add(fmt.Sprintf("hole %d ", i+1), i+1, r)
	}
	axis := j.n.Axis("corner", "corner of the outline", "n", names)
	across := "to the right of the axis of symmetry"
	if j.m.Shape.Kind.Text == "polygon" {
		across = "to the right of the line that the member file counts from"
	}
	b.GivenRows(def("corner-x", "x_{k,n}", "Corner, "+across, "mm"), axis, x, source)
	b.GivenRows(def("corner-y", "y_{k,n}", "Corner above the soffit", "mm"), axis, y, source)
	b.GivenRows(def("corner-ring", "r_{k,n}", "Ring of the corner: 0 outside, 1 and on the holes", ""), axis, ring, source)
	if len(c.Voids) == 0 {
		return
	}
	names = nil
	for i := range c.Voids {
		names = append(names, fmt.Sprintf("void %d", i+1))
	}
	axis = j.n.Axis("void", "round or oblong void", "n", names)
	column := func(id, symbol, name string, of func(section.Round) float64) {
		b.GivenRows(def(id, symbol, name, "mm"), axis, each(c.Voids, func(r section.Round) quantity.Literal { return mm(of(r)) }), source)
	}
	column("void-x", "x_{o,n}", "Centre of the void, "+across, func(r section.Round) float64 { return r.X })
	column("void-y", "y_{o,n}", "Centre of the void above the soffit", func(r section.Round) float64 { return r.Y })
	column("void-width", "w_{o,n}", "Width of the void", func(r section.Round) float64 { return r.Width })
	column("void-depth", "d_{o,n}", "Depth of the void", func(r section.Round) float64 { return r.Depth })
}

// givenDimensions records the measures of the shape with their end points, for a drawing.
func (j *job) givenDimensions(b *trace.Block) {
	list := j.form.dimensions(&j.m.Shape)
	names := make([]string, len(list))
	for i := range list {
		names[i] = list[i].name
	}
	axis := j.n.Axis("dimension", "measure of the section", "n", names)
	column := func(id, symbol, name string, of func(dimension) quantity.Literal) {
		b.GivenRows(def(id, symbol, name, "mm"), axis, each(list, of), shapeSource(&j.m.Shape))
	}
	column("dimension", "l_{d,n}", "Measure", func(d dimension) quantity.Literal { return d.length })
	column("dimension-x1", "x_{d1,n}", "First end of the measure, from the axis", func(d dimension) quantity.Literal { return mm(d.x1) })
	column("dimension-y1", "y_{d1,n}", "First end of the measure above the soffit", func(d dimension) quantity.Literal { return mm(d.y1) })
	column("dimension-x2", "x_{d2,n}", "Second end of the measure, from the axis", func(d dimension) quantity.Literal { return mm(d.x2) })
	column("dimension-y2", "y_{d2,n}", "Second end of the measure above the soffit", func(d dimension) quantity.Literal { return mm(d.y2) })
}

// outlinePlots are the roles of a drawing of the section: its outline and voids, and its topping if asked.
func (j *job) outlinePlots(topped bool) []trace.Plot {
	roles := []string{"corner-x", "corner-y", "corner-ring"}
	if len(j.form.outline.Contour().Voids) > 0 {
		roles = append(roles, "void-x", "void-y", "void-width", "void-depth")
	}
	var out []trace.Plot
	for _, r := range roles {
		out = append(out, trace.Plot{Role: r, Key: "given.section/" + r})
	}
	if topped {
		out = append(out, trace.Plot{Role: "topping-width", Key: "given.topping/width"}, trace.Plot{Role: "topping-depth", Key: "given.topping/depth"})
	}
	return out
}

// dimensionPlots are the roles of its measures.
func (j *job) dimensionPlots() []trace.Plot {
	var out []trace.Plot
	for _, r := range []string{"dimension", "dimension-x1", "dimension-y1", "dimension-x2", "dimension-y2"} {
		out = append(out, trace.Plot{Role: r, Key: "given.section/" + r})
	}
	return out
}
