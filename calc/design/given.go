package design

import (
	"fmt"
	"strings"

	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// endCover is how far bars end from the ends of the concrete.
const endCover = "40 mm"

// givenChapter records the member as read.
func (j *job) givenChapter(c *trace.Chapter) {
	j.givenConcrete(c)
	j.givenSection(c)
	j.givenTendons(c)
	if len(j.m.Bars.Rows) > 0 {
		j.givenBars(c)
	}
	j.givenSpan(c)
	j.givenActions(c)
	j.givenFigures(c)
}

func (j *job) givenConcrete(c *trace.Chapter) {
	b := c.Block("concrete", "Concrete", nil)
	j.concrete = b
	m := &j.m.Concrete
	b.Given(def("strength", "f_ck", "Characteristic cylinder strength at 28 days", "MPa"), m.Fck.Literal, given(m.Fck))
	b.Given(def("strength-at-release", "f_ck(t)", "Characteristic strength asked for at release", "MPa"), m.FckAtRelease.Literal, given(m.FckAtRelease))
	b.Given(def("unit-weight", "γ_{conc}", "Unit weight of the concrete with its steel", "kN/m³"), m.UnitWeight.Literal, given(m.UnitWeight))
	factor := map[string]string{"quartzite": "1.0", "limestone": "0.9", "sandstone": "0.7", "basalt": "1.2"}[m.Aggregate.Text]
	b.Given(def("aggregate-factor", "k_agg", "Factor on the modulus for "+m.Aggregate.Text+" aggregate", "", ref(ec2.Code, "3.1.3(2)")), plain(factor, ""), origin(m.Aggregate.Origin))
}

func (j *job) givenSection(c *trace.Chapter) {
	b := c.Block("section", "Concrete section", nil)
	j.section = b
	s, f := &j.m.Shape, &j.form
	line := lines(s.Width.Origin, s.FlangeWidth.Origin, s.FlangeDepth.Origin, s.HaunchDepth.Origin, s.TopFlange.Width.Origin, s.TopFlange.Depth.Origin, s.TopFlange.HaunchDepth.Origin, s.WebWidth.Origin,
		s.BottomFlange.Width.Origin, s.BottomFlange.Depth.Origin, s.BottomFlange.HaunchDepth.Origin, s.Depth.Origin)
	b.Given(def("depth", "h", "Overall depth", "mm"), s.Depth.Literal, given(s.Depth))
	b.Given(def("top-width", "b_f", "Width at the top", "mm"), f.flange, lines(s.Width.Origin, s.FlangeWidth.Origin, s.TopFlange.Width.Origin))
	b.Given(def("top-depth", "h_f", "Depth over which the top has this width", "mm"), f.flangeDepth, lines(pick(s.Kind.Text == "rectangle", s.Depth.Origin, member.Origin{}), s.FlangeDepth.Origin, s.TopFlange.Depth.Origin))
	if s.Kind.Text != "rectangle" {
		b.Given(def("haunch-depth", "h_h", "Depth of the haunch below it", "mm"), f.haunch, lines(s.HaunchDepth.Origin, s.TopFlange.HaunchDepth.Origin))
		b.Given(def("web-width", "b_w", "Width of the web", "mm"), f.web, lines(s.WebWidth.Origin))
		b.Given(def("web-end", "z_w", "Depth from the top to the lower end of the web", "mm"), f.bottom, lines(s.Depth.Origin, s.BottomFlange.Depth.Origin, s.BottomFlange.HaunchDepth.Origin))
	}
	j.parts = j.n.Axis("part", "part of the section, from the soffit up", "n", f.names)
	j.parts.Work = len(f.names) - 1 // the top, which is compressed
	b.GivenRows(def("part-height", "h_{c,n}", "Height", "mm"), j.parts, f.height, line)
	b.GivenRows(def("part-lower", "b_{u,n}", "Lower width", "mm"), j.parts, f.lower, line)
	b.GivenRows(def("part-upper", "b_{o,n}", "Upper width", "mm"), j.parts, f.upper, line)
	level, below := make([]quantity.Literal, len(f.names)), 0.0
	depth := make([]quantity.Literal, len(f.names))
	for i, h := range f.height {
		level[i] = number(below, "mm", places(below))
		below += h.Quantity().Value
		depth[i] = number(s.Depth.Base()-below, "mm", places(s.Depth.Base()-below))
	}
	b.GivenRows(def("part-level", "y_{u,n}", "Lower edge above the soffit", "mm"), j.parts, level, "heights added up from the soffit")
	b.GivenRows(def("part-depth", "z_{c,n}", "Upper edge below the top", "mm"), j.parts, depth, "heights added up from the soffit")
}

// tendon is a row with its product, from the tables or from the member file.
type tendon struct {
	row                        *member.StrandRow
	area, diameter, fpk, ep    quantity.Literal
	proof, ultimate            quantity.Literal
	source                     string
	bondTransfer, bondUltimate string // η_p1, η_p2
	shape                      string // α_2
}

func (j *job) tendonRows() []tendon {
	rows := j.m.Strands.Rows
	out := make([]tendon, len(rows))
	for i := range rows {
		out[i] = j.tendonRow(&rows[i])
	}
	return out
}

func (j *job) tendonRow(r *member.StrandRow) tendon {
	t := tendon{row: r, bondTransfer: "3.2", bondUltimate: "1.2", shape: "0.19"}
	for k := range j.m.Strands.Products {
		p := &j.m.Strands.Products[k]
		if p.Name.Text != r.Product.Text {
			continue
		}
		t.area, t.diameter, t.fpk, t.ep, t.ultimate = p.Area.Literal, p.Diameter.Literal, p.Fpk.Literal, p.Ep.Literal, p.StrainAtMaximum.Literal
		t.proof = number(p.Fp01k.Base()*p.Area.Base(), "kN", 3)
		t.source = fmt.Sprintf("%s: f_p0,1k = %s declared × area; %s", r.Product.Text, p.Fp01k, p.Source.Text)
		if p.Kind.Text == "indented wire" {
			t.bondTransfer, t.bondUltimate, t.shape = "2.7", "1.4", "0.25"
		}
		return t
	}
	p, _ := ec2.FindProduct(r.Product.Text)
	t.area, t.diameter = number(p.Area, "mm²", places(p.Area)), number(p.Diameter, "mm", places(p.Diameter))
	t.fpk, t.ep, t.ultimate = number(p.Tensile, "MPa", 0), plain("195", "GPa"), plain("35", "‰")
	t.proof = plain(quantity.Format(p.FirstProof, 1), "kN")
	t.source = fmt.Sprintf("%s: %s, %s", p.Name, p.Source, p.Grade)
	return t
}

func (j *job) givenTendons(c *trace.Chapter) {
	b := c.Block("tendons", "Tendons", nil)
	j.tendons = b
	rows := j.tendonRows()
	names := make([]string, len(rows))
	var sources []string
	for i, r := range rows {
		names[i] = r.row.Name.Text
		if s := "- " + literal(r.source); !strings.Contains(strings.Join(sources, "\n"), s) {
			sources = append(sources, s)
		}
	}
	j.rows = j.n.Axis("tendon row", "row of tendons", "i", names)
	from := func(f func(*member.StrandRow) member.Origin) string {
		var out []member.Origin
		for _, r := range rows {
			out = append(out, f(r.row))
		}
		return lines(out...)
	}
	column := func(id, symbol, name, unit, source string, f func(tendon) quantity.Literal, where ...string) {
		g := def(id, symbol, name, unit)
		if len(where) > 0 {
			g.Ref = ref(ec2.Code, where[0])
		}
		b.GivenRows(g, j.rows, each(rows, f), source)
	}
	column("count", "n_{p,i}", "Number of tendons in the row", "", from(func(r *member.StrandRow) member.Origin { return r.Count.Origin }), func(t tendon) quantity.Literal { return whole(t.row.Count.N) })
	column("spacing", "s_{p,i}", "Spacing of the tendons between axes", "mm", from(func(r *member.StrandRow) member.Origin { return r.Spacing.Origin }), func(t tendon) quantity.Literal { return t.row.Spacing.Literal })
	column("level", "y_{p,i}", "Height of the tendons' axes above the soffit", "mm", from(func(r *member.StrandRow) member.Origin { return r.Height.Origin }), func(t tendon) quantity.Literal { return t.row.Height.Literal })
	column("debonded-length", "l_{db,i}", "Debonded length from each end", "mm", from(func(r *member.StrandRow) member.Origin { return r.DebondedLength.Origin }), func(t tendon) quantity.Literal { return t.row.DebondedLength.Literal })
	column("diameter", "φ_{p,i}", "Nominal diameter of one tendon", "mm", "product", func(t tendon) quantity.Literal { return t.diameter })
	column("area-of-one", "A_{p1,i}", "Area of one tendon", "mm²", "product", func(t tendon) quantity.Literal { return t.area })
	column("tensile-strength", "f_{pk,i}", "Characteristic tensile strength of the tendons", "MPa", "product", func(t tendon) quantity.Literal { return t.fpk })
	column("proof-force", "F_{p0,1,i}", "0.1 % proof force of one tendon", "kN", "product", func(t tendon) quantity.Literal { return t.proof })
	column("modulus", "E_{p,i}", "Modulus of elasticity of the tendons", "GPa", "product", func(t tendon) quantity.Literal { return t.ep }, "3.3.6(2), (3)")
	if j.inclined() {
		column("ultimate-strain", "ε_{puk,i}", "Characteristic strain at maximum force", "‰", "product", func(t tendon) quantity.Literal { return t.ultimate })
	}
	column("jacking-stress", "σ_{p,max,i}", "Stress at jacking", "MPa", from(func(r *member.StrandRow) member.Origin { return r.JackingStress.Origin }), func(t tendon) quantity.Literal { return t.row.JackingStress.Literal })
	column("loss-at-release", "Δσ_{p0,i}", "Loss of prestress up to and at release, as stated", "MPa", lossSource(rows), func(t tendon) quantity.Literal { return t.row.StatedLosses.AtRelease.Literal })
	column("loss-final", "Δσ_{p∞,i}", "Loss of prestress in all at the end of life, as stated", "MPa", lossSource(rows), func(t tendon) quantity.Literal { return t.row.StatedLosses.Final.Literal })
	column("bond-at-release", "η_{p1,i}", "Bond coefficient at release", "", "kind of tendon", func(t tendon) quantity.Literal { return plain(t.bondTransfer, "") }, "8.10.2.2(1)")
	column("bond-at-ultimate", "η_{p2,i}", "Bond coefficient at ultimate", "", "kind of tendon", func(t tendon) quantity.Literal { return plain(t.bondUltimate, "") }, "8.10.2.3(2)")
	column("tendon-form", "α_{2,i}", "Factor of the kind of tendon", "", "kind of tendon", func(t tendon) quantity.Literal { return plain(t.shape, "") }, "8.10.2.2(2)")
	release := map[string]string{"gradual": "1.0", "sudden": "1.25"}[j.m.Strands.Release.Text]
	b.Given(def("release", "α_1", "Factor of the way of release: "+j.m.Strands.Release.Text, "", ref(ec2.Code, "8.10.2.2(2)")), plain(release, ""), origin(j.m.Strands.Release.Origin))
	bond := map[string]string{"good": "1.0", "poor": "0.7"}[j.m.Strands.Bond.Text]
	b.Given(def("bond-conditions", "η_1", "Factor of the bond conditions of the lower zone: "+j.m.Strands.Bond.Text, "", ref(ec2.Code, "8.4.2, 8.10.2.2(1)")), plain(bond, ""), origin(j.m.Strands.Bond.Origin))
	b.Text("products", "Products:\n\n"+strings.Join(sources, "\n"))
}

func lossSource(rows []tendon) string {
	seen := map[string]bool{}
	var out []string
	for _, r := range rows {
		if s := r.row.StatedLosses.Source.Text; !seen[s] {
			seen[s] = true
			out = append(out, s)
		}
	}
	return "stated: " + strings.Join(out, "; ")
}

func (j *job) inclined() bool    { return j.m.Strands.SteelDiagram.Text == "inclined" }
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
	column("spacing", "s_{s,j}", "Spacing of the bars between axes", "mm", from(func(r *member.BarRow) member.Origin { return r.Spacing.Origin }), func(r member.BarRow) quantity.Literal {
		if !r.Spacing.Present() {
			return plain("0", "mm")
		}
		return r.Spacing.Literal
	})
	column("level", "y_{s,j}", "Height of the bars' axes above the soffit", "mm", from(func(r *member.BarRow) member.Origin { return r.Height.Origin }), func(r member.BarRow) quantity.Literal { return r.Height.Literal })
	column("yield-strength", "f_{yk,j}", "Characteristic yield strength of the bars", "MPa", from(func(r *member.BarRow) member.Origin { return r.Fyk.Origin }), func(r member.BarRow) quantity.Literal { return r.Fyk.Literal })
	if j.barInclined() {
		column("hardening", "k_{s,j}", "Ratio of tensile to yield strength by ductility class", "", "EN 1992-1-1 Table C.1 (recalled)", func(r member.BarRow) quantity.Literal { return plain(ductility[r.DuctilityClass.Text][0], "") })
		column("ultimate-strain", "ε_{suk,j}", "Characteristic strain at maximum force by ductility class", "‰", "EN 1992-1-1 Table C.1 (recalled)", func(r member.BarRow) quantity.Literal { return plain(ductility[r.DuctilityClass.Text][1], "‰") })
	}
	b.Given(def("steel-modulus", "E_s", "Modulus of elasticity of the bars", "GPa", ref(ec2.Code, "3.2.7(4)")), plain("200", "GPa"), "code")
	b.Given(def("end-cover", "c_e", "Distance of the ends of the bars from the ends of the concrete", "mm"), plain("40", "mm"), "assumption")
}

func (j *job) givenSpan(c *trace.Chapter) {
	b := c.Block("span", "Length and bearings", nil)
	j.span = b
	s := &j.m.Span
	b.Given(def("length", "L", "Overall length of the concrete", "m"), s.Length.Literal, given(s.Length))
	b.Given(def("bearing-a", "x_A", "Middle of bearing A from end A", "m"), s.BearingA.FromEnd.Literal, given(s.BearingA.FromEnd))
	xb := s.Length.Base() - s.BearingB.FromEnd.Base()
	b.Given(def("bearing-b", "x_B", "Middle of bearing B from end A", "m"), number(xb, "m", max(places(xb/1000), 3)),
		fmt.Sprintf("length less %s from end B (%s)", s.BearingB.FromEnd, given(s.BearingB.FromEnd)))
	b.Given(def("bearing-a-length", "l_A", "Length of bearing A", "mm"), s.BearingA.Length.Literal, given(s.BearingA.Length))
	b.Given(def("bearing-b-length", "l_B", "Length of bearing B", "mm"), s.BearingB.Length.Literal, given(s.BearingB.Length))
}

// load is one load of an action; the self-weight is the first, and its size is computed.
type load struct {
	name      string
	origin    member.Origin
	action    int // −1: self-weight
	category  string
	q, f      quantity.Literal
	from, to  quantity.Literal
	permanent bool
}

func (j *job) loadRows() []load {
	length := j.m.Span.Length.Literal
	none, zero := plain("0", "kN/m"), plain("0", "m")
	out := []load{{name: "self-weight", action: -1, q: none, f: plain("0", "kN"), from: zero, to: length, permanent: true}}
	for k := range j.m.Actions {
		a := &j.m.Actions[k]
		for i := range a.Loads {
			l := &a.Loads[i]
			n := load{name: a.Name.Text, origin: member.Origin{Pos: l.Pos, Given: true}, action: k, category: a.Category.Text, permanent: a.Kind.Text == "permanent"}
			if len(a.Loads) > 1 {
				n.name = fmt.Sprintf("%s (%d)", a.Name.Text, i+1)
			}
			if l.Point.Present() {
				n.q, n.f, n.from, n.to = none, l.Point.Literal, l.At.Literal, l.At.Literal
			} else {
				n.q, n.f, n.from, n.to = l.Uniform.Literal, plain("0", "kN"), zero, length
				if l.From.Present() {
					n.from = l.From.Literal
				}
				if l.To.Present() {
					n.to = l.To.Literal
				}
			}
			out = append(out, n)
		}
	}
	return out
}

func (j *job) givenActions(c *trace.Chapter) {
	b := c.Block("actions", "Actions", nil, trace.Take(j.parameters)...)
	j.actionData = b
	loads := j.loadRows()
	names := make([]string, len(loads))
	for i, l := range loads {
		names[i] = l.name
	}
	j.loads = j.n.Axis("load", "load", "i", names)
	var from []member.Origin
	for _, l := range loads[1:] {
		from = append(from, l.origin)
	}
	line := lines(from...)
	if len(from) == 0 {
		line = "no action but the self-weight"
	}
	column := func(id, symbol, name, unit string, f func(load) quantity.Literal) {
		b.GivenRows(def(id, symbol, name, unit), j.loads, each(loads, f), line)
	}
	column("imposed", "q_{0,i}", "Load per length, downward, without the self-weight", "kN/m", func(l load) quantity.Literal { return l.q })
	column("weight-share", "w_i", "1 for the self-weight, 0 for the other loads", "", func(l load) quantity.Literal { return flag(l.action < 0) })
	column("point", "F_i", "Point load, downward (negative: upward)", "kN", func(l load) quantity.Literal { return l.f })
	column("from", "a_i", "Start of the load, or place of a point load, from end A", "m", func(l load) quantity.Literal { return l.from })
	column("to", "b_i", "End of the load, from end A", "m", func(l load) quantity.Literal { return l.to })
	column("permanent", "k_{G,i}", "1 for a permanent load, 0 for a variable one", "", func(l load) quantity.Literal { return flag(l.permanent) })
	for k, symbol := range []string{"ψ_{0,i}", "ψ_{1,i}", "ψ_{2,i}"} {
		b.GivenRows(def(fmt.Sprintf("psi-%d", k), symbol, [...]string{"Combination factor", "Frequent factor", "Quasi-permanent factor"}[k], "", ref(ec2.Actions, "Table A1.1")), j.loads,
			each(loads, func(l load) quantity.Literal { return j.psi(l.category, k) }), "category, from the national parameters")
	}
}

func flag(yes bool) quantity.Literal {
	if yes {
		return plain("1", "")
	}
	return plain("0", "")
}

// psi is ψ_k of a category, 0 for a permanent load, which does not use it.
func (j *job) psi(category string, k int) quantity.Literal {
	for i := range ec2.Parameters {
		p := &ec2.Parameters[i]
		for r, name := range p.Rows {
			if name != category {
				continue
			}
			if own := j.own(p); own != nil {
				return own.Table[r].Values[k].Literal
			}
			return plain(p.Table[r][k], "")
		}
	}
	return plain("0", "")
}

// givenFigures draws the section; the elevation stands with the verdict.
func (j *job) givenFigures(c *trace.Chapter) {
	b := c.Block("drawings", "Section to scale", nil)
	section := []trace.Plot{{Role: "height", Key: "given.section/part-height"}, {Role: "lower", Key: "given.section/part-lower"},
		{Role: "upper", Key: "given.section/part-upper"}, {Role: "count", Key: "given.tendons/count"}, {Role: "spacing", Key: "given.tendons/spacing"},
		{Role: "level", Key: "given.tendons/level"}, {Role: "diameter", Key: "given.tendons/diameter"},
		{Role: "depth", Key: "given.section/depth"}, {Role: "debonded", Key: "given.tendons/debonded-length"}}
	if j.hasBars() {
		section = append(section, trace.Plot{Role: "bar-count", Key: "given.bars/count"}, trace.Plot{Role: "bar-spacing", Key: "given.bars/spacing"},
			trace.Plot{Role: "bar-level", Key: "given.bars/level"}, trace.Plot{Role: "bar-diameter", Key: "given.bars/diameter"})
	}
	b.Figure("section", "section", "Section, to scale; dimensions in mm.", "", section...)
}
