package design

import (
	"fmt"
	"slices"

	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

func (j *job) barInclined() bool { return j.m.Bars.SteelDiagram.Text == "inclined" }
func (j *job) hasBars() bool     { return len(j.m.Bars.Rows) > 0 }

// ductility is k and ε_uk of a class, EN 1992-1-1 Table C.1.
var ductility = map[string][2]string{"A": {"1.05", "25"}, "B": {"1.08", "50"}, "C": {"1.15", "75"}}

func (j *job) givenBars(c *trace.Chapter) {
	b := c.Block("bars", "Passive bars", nil)
	j.barData = b
	rows := j.m.Bars.Rows
	names := make([]string, len(rows))
	for i := range rows {
		names[i] = rows[i].Name.Text
	}
	j.bars = j.n.Axis("bar row", "row of bars", "j", names)
	from := func(f func(*member.BarRow) member.Origin) string {
		var out []member.Origin
		for i := range rows {
			out = append(out, f(&rows[i]))
		}
		return lines(out...)
	}
	column := func(id, symbol, name, unit, source string, f func(member.BarRow) quantity.Literal) {
		b.GivenRows(def(id, symbol, name, unit), j.bars, each(rows, f), source)
	}
	column("count", "n_{s,j}", "Number of bars in the row", "", from(func(r *member.BarRow) member.Origin { return r.Count.Origin }), func(r member.BarRow) quantity.Literal { return whole(r.Count.N) })
	column("diameter", "φ_{s,j}", "Diameter of the bars", "mm", from(func(r *member.BarRow) member.Origin { return r.Diameter.Origin }), func(r member.BarRow) quantity.Literal { return r.Diameter.Literal })
	if j.barsPlaced() {
		j.givenBarPlaces(b)
	} else {
		column("spacing", "s_{s,j}", "Spacing of the bars between axes", "mm", from(func(r *member.BarRow) member.Origin { return r.Spacing.Origin }), spacingOf)
	}
	column("level", "y_{s,j}", "Height of the bars' axes above the soffit", "mm", from(func(r *member.BarRow) member.Origin { return r.Height.Origin }), func(r member.BarRow) quantity.Literal { return r.Height.Literal })
	column("yield-strength", "f_{yk,j}", "Characteristic yield strength of the bars", "MPa", from(func(r *member.BarRow) member.Origin { return r.Fyk.Origin }), func(r member.BarRow) quantity.Literal { return r.Fyk.Literal })
	if j.barInclined() {
		column("hardening", "k_{s,j}", "Ratio of tensile to yield strength by ductility class", "", "EN 1992-1-1 Table C.1 (recalled)", func(r member.BarRow) quantity.Literal { return plain(ductility[r.DuctilityClass.Text][0], "") })
		column("ultimate-strain", "ε_{suk,j}", "Characteristic strain at maximum force by ductility class", "‰", "EN 1992-1-1 Table C.1 (recalled)", func(r member.BarRow) quantity.Literal { return plain(ductility[r.DuctilityClass.Text][1], "‰") })
	}
	b.Given(def("steel-modulus", "E_s", "Modulus of elasticity of the bars", "GPa", ref(ec2.Code, "3.2.7(4)")), plain("200", "GPa"), "code")
	b.Given(def("end-cover", "c_e", "Distance of the ends of the bars from the ends of the concrete", "mm"), plain(endCover, "mm"), "assumption")
	if j.hasTopping() {
		depth := j.shape.Height()
		column("in-topping", "k_{t,j}", "1 for bars in the topping, above the top of the member, else 0", "", "height against the depth of the member", func(r member.BarRow) quantity.Literal { return flag(r.Height.Base() > depth) })
	}
}

// spacingOf is the spacing of a row, 0 where none is stated.
func spacingOf(r member.BarRow) quantity.Literal {
	if !r.Spacing.Present() {
		return plain("0", "mm")
	}
	return r.Spacing.Literal
}

// barsPlaced says that bars stand at places of their own, not at an even spacing.
func (j *job) barsPlaced() bool {
	return slices.ContainsFunc(j.m.Bars.Rows, func(r member.BarRow) bool { return len(r.Positions) > 0 })
}

// givenBarPlaces records the place of every bar across the section.
func (j *job) givenBarPlaces(b *trace.Block) {
	var names []string
	var x, row []quantity.Literal
	var from []member.Origin
	for i, r := range j.m.Bars.Rows {
		gap := spacingOf(r)
		from = append(from, r.Spacing.Origin)
		for k := range r.Count.N {
			at := (float64(k) - float64(r.Count.N-1)/2) * gap.Quantity().Value
			if k < len(r.Positions) {
				at = r.Positions[k].Base()
				from = append(from, r.Positions[k].Origin)
			}
			names = append(names, fmt.Sprintf("%s %d", r.Name.Text, k+1))
			x, row = append(x, mm(at)), append(row, whole(i))
		}
	}
	axis := j.n.Axis("bar", "bar of a row", "m", names)
	b.GivenRows(def("position-x", "x_{s,m}", "Place across the section, from the axis of symmetry, to the right positive", "mm"), axis, x, lines(from...))
	b.GivenRows(def("position-row", "r_{s,m}", "Row that it belongs to, counted from 0", ""), axis, row, "order of the rows")
}
