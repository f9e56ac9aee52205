package design

import (
	"fmt"
	"slices"
	"strings"

	"soffit/calc/ec2"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// tendonRow is a row of tendons with its product, from the tables or from the member file: strands alone, or strands in
// ducts. One of the two is nil.
type tendonRow struct {
	strand                     *member.StrandRow
	duct                       *member.DuctRow
	name                       string
	area, diameter, fpk, ep    quantity.Literal
	proof, ultimate            quantity.Literal
	source                     string
	bondTransfer, bondUltimate string // η_p1, η_p2
	shape                      string // α_2
}

// ducted says that the member is post-tensioned.
func (j *job) ducted() bool { return len(j.m.Ducts.Rows) > 0 }

// deflected says that a row of strands is held down on the way.
func deflected(r *member.StrandRow) bool { return r.Deflected.Rise.Present() }

func (j *job) anyDeflected() bool {
	return slices.ContainsFunc(j.m.Strands.Rows, func(r member.StrandRow) bool { return deflected(&r) })
}

// profiled says that the heights of tendons change along the member.
func (j *job) profiled() bool { return j.ducted() || j.anyDeflected() }

// steelDiagram is the top branch of the stress-strain diagram of the tendons.
func (j *job) steelDiagram() member.Word {
	return pick(j.ducted(), j.m.Ducts.SteelDiagram, j.m.Strands.SteelDiagram)
}

func (j *job) inclined() bool { return j.steelDiagram().Text == "inclined" }

func (j *job) tendonRows() []tendonRow {
	var out []tendonRow
	for i := range j.m.Strands.Rows {
		r := &j.m.Strands.Rows[i]
		out = append(out, tendonRow{strand: r, name: r.Name.Text}.of(r.Product.Text, j.m.Strands.Products))
	}
	for i := range j.m.Ducts.Rows {
		r := &j.m.Ducts.Rows[i]
		out = append(out, tendonRow{duct: r, name: r.Name.Text}.of(r.Product.Text, j.m.Ducts.Products))
	}
	return out
}

// of is the row with what its product declares.
func (t tendonRow) of(product string, own []member.Product) tendonRow {
	t.bondTransfer, t.bondUltimate, t.shape = "3.2", "1.2", "0.19"
	for k := range own {
		p := &own[k]
		if p.Name.Text != product {
			continue
		}
		t.area, t.diameter, t.fpk, t.ep, t.ultimate = p.Area.Literal, p.Diameter.Literal, p.Fpk.Literal, p.Ep.Literal, p.StrainAtMaximum.Literal
		t.proof = number(p.Fp01k.Base()*p.Area.Base(), "kN", 3)
		t.source = fmt.Sprintf("%s: f_p0,1k = %s declared × area; %s", product, p.Fp01k, p.Source.Text)
		if p.Kind.Text == "indented wire" {
			t.bondTransfer, t.bondUltimate, t.shape = "2.7", "1.4", "0.25"
		}
		return t
	}
	p, _ := ec2.FindProduct(product)
	t.area, t.diameter = number(p.Area, "mm²", places(p.Area)), number(p.Diameter, "mm", places(p.Diameter))
	t.fpk, t.ep, t.ultimate = number(p.Tensile, "MPa", 0), plain("195", "GPa"), plain("35", "‰")
	t.proof = plain(quantity.Format(p.FirstProof, 1), "kN")
	t.source = fmt.Sprintf("%s: %s, %s", p.Name, p.Source, p.Grade)
	return t
}

// tendonColumns records columns of given.tendons.
type tendonColumns struct {
	j    *job
	b    *trace.Block
	rows []tendonRow
}

func (c *tendonColumns) column(id, symbol, name, unit, source string, f func(tendonRow) quantity.Literal, where ...string) {
	g := def(id, symbol, name, unit)
	if len(where) > 0 {
		g.Ref = ref(ec2.Code, where[0])
	}
	c.b.GivenRows(g, c.j.rows, each(c.rows, f), source)
}

// value is a column of values of the member file; what was left out is 0.
func (c *tendonColumns) value(id, symbol, name, unit string, f func(tendonRow) member.Value) {
	var from []member.Origin
	for _, r := range c.rows {
		from = append(from, f(r).Origin)
	}
	c.column(id, symbol, name, unit, lines(from...), func(r tendonRow) quantity.Literal {
		if v := f(r); v.Present() {
			return v.Literal
		}
		return plain("0", unit)
	})
}

func (c *tendonColumns) count(id, symbol, name string, f func(tendonRow) member.Count) {
	var from []member.Origin
	for _, r := range c.rows {
		from = append(from, f(r).Origin)
	}
	c.column(id, symbol, name, "", lines(from...), func(r tendonRow) quantity.Literal { return whole(f(r).N) })
}

// loss is a column of stated losses with the documents that state them.
func (c *tendonColumns) loss(id, symbol, name string, f func(tendonRow) (member.Value, member.Word)) {
	var out []string
	for _, r := range c.rows {
		if _, source := f(r); !slices.Contains(out, source.Text) {
			out = append(out, source.Text)
		}
	}
	c.column(id, symbol, name, "MPa", "stated: "+strings.Join(out, "; "), func(r tendonRow) quantity.Literal { v, _ := f(r); return v.Literal })
}

func (j *job) givenTendons(c *trace.Chapter) {
	b := c.Block("tendons", "Tendons", nil)
	j.tendons = b
	t := &tendonColumns{j, b, j.tendonRows()}
	names := make([]string, len(t.rows))
	var sources []string
	for i, r := range t.rows {
		names[i] = r.name
		if s := "- " + literal(r.source); !slices.Contains(sources, s) {
			sources = append(sources, s)
		}
	}
	j.rows = j.n.Axis("tendon row", "row of tendons", "i", names)
	if j.ducted() {
		j.givenDucts(t)
	} else {
		j.givenStrands(t)
	}
	b.Text("products", "Products:\n\n"+strings.Join(sources, "\n"))
	if j.profiled() {
		j.givenProfile(c)
	}
}

// across says where the tendons of a row lie across the section.
func (t tendonRow) across() (n int, spacing member.Value, positions []member.Value) {
	if t.duct != nil {
		return t.duct.Count.N, t.duct.Spacing, t.duct.Positions
	}
	return t.strand.Count.N, t.strand.Spacing, t.strand.Positions
}

// placed says that tendons stand at places of their own, not at an even spacing.
func (j *job) placed() bool {
	return slices.ContainsFunc(j.m.Strands.Rows, func(r member.StrandRow) bool { return len(r.Positions) > 0 }) ||
		slices.ContainsFunc(j.m.Ducts.Rows, func(r member.DuctRow) bool { return len(r.Positions) > 0 })
}

// givenPlaces records the spacing of each row, or, where any row is spaced unevenly, the place of every tendon across the
// section.
func (j *job) givenPlaces(t *tendonColumns, what string) {
	if !j.placed() {
		t.value("spacing", "s_{p,i}", "Spacing of the "+what+" between axes", "mm", func(r tendonRow) member.Value { _, s, _ := r.across(); return s })
		return
	}
	var names []string
	var x, row []quantity.Literal
	var from []member.Origin
	for i, r := range t.rows {
		n, spacing, positions := r.across()
		from = append(from, spacing.Origin)
		for k := range n {
			at := (float64(k) - float64(n-1)/2) * spacing.Base()
			if len(positions) > 0 {
				if k >= len(positions) {
					break
				}
				at = positions[k].Base()
				from = append(from, positions[k].Origin)
			}
			names = append(names, fmt.Sprintf("%s %d", r.name, k+1))
			x, row = append(x, number(at, "mm", places(at))), append(row, whole(i))
		}
	}
	axis := j.n.Axis("tendon", what[:len(what)-1]+" of a row", "m", names)
	t.b.GivenRows(def("position-x", "x_{p,m}", "Place across the section, from the axis of symmetry, to the right positive", "mm"), axis, x, lines(from...))
	t.b.GivenRows(def("position-row", "r_{p,m}", "Row that it belongs to, counted from 0", ""), axis, row, "order of the rows")
}

// givenLevel is the column of heights: of profiled tendons that at mid-span, for drawings.
func (j *job) givenLevel(t *tendonColumns) {
	if !j.profiled() {
		t.value("level", "y_{p,i}", "Height of the tendons' axes above the soffit", "mm", func(r tendonRow) member.Value { return r.strand.Height })
		return
	}
	middle := (j.m.Span.BearingA.FromEnd.Base() + j.m.Span.Length.Base() - j.m.Span.BearingB.FromEnd.Base()) / 2
	level := make([]quantity.Literal, len(t.rows))
	for i := range level {
		y := j.profiles[i].Height(middle)
		level[i] = number(y, "mm", places(y))
	}
	t.b.GivenRows(def("level", "y_{m,i}", "Height of the tendons' axes above the soffit at mid-span", "mm"), j.rows, level, "the profile at mid-span")
}

// givenProduct is what the product says.
func (j *job) givenProduct(t *tendonColumns, tendon string) {
	t.column("diameter", "φ_{p,i}", "Nominal diameter of one "+tendon, "mm", "product", func(r tendonRow) quantity.Literal { return r.diameter })
	t.column("area-of-one", "A_{p1,i}", "Area of one "+tendon, "mm²", "product", func(r tendonRow) quantity.Literal { return r.area })
	t.column("tensile-strength", "f_{pk,i}", "Characteristic tensile strength of the tendons", "MPa", "product", func(r tendonRow) quantity.Literal { return r.fpk })
	t.column("proof-force", "F_{p0,1,i}", "0.1 % proof force of one "+tendon, "kN", "product", func(r tendonRow) quantity.Literal { return r.proof })
	t.column("modulus", "E_{p,i}", "Modulus of elasticity of the tendons", "GPa", "product", func(r tendonRow) quantity.Literal { return r.ep }, "3.3.6(2), (3)")
	if j.inclined() {
		t.column("ultimate-strain", "ε_{puk,i}", "Characteristic strain at maximum force", "‰", "product", func(r tendonRow) quantity.Literal { return r.ultimate })
	}
}

// givenStrands is pretensioned reinforcement.
func (j *job) givenStrands(t *tendonColumns) {
	b := t.b
	t.count("count", "n_{p,i}", "Number of tendons in the row", func(r tendonRow) member.Count { return r.strand.Count })
	j.givenPlaces(t, "tendons")
	j.givenLevel(t)
	if j.anyDeflected() {
		t.value("rise", "r_{d,i}", "Rise of deflected tendons at the ends; 0: straight", "mm", func(r tendonRow) member.Value { return r.strand.Deflected.Rise })
		t.value("held-down", "a_{d,i}", "Distance from each end to where deflected tendons are held down", "m", func(r tendonRow) member.Value { return r.strand.Deflected.FromEnd })
	}
	t.value("debonded-length", "l_{db,i}", "Debonded length from each end", "mm", func(r tendonRow) member.Value { return r.strand.DebondedLength })
	j.givenProduct(t, "tendon")
	t.value("jacking-stress", "σ_{p,max,i}", "Stress at jacking", "MPa", func(r tendonRow) member.Value { return r.strand.JackingStress })
	t.loss("loss-at-release", "Δσ_{p0,i}", "Loss of prestress up to and at release, as stated", func(r tendonRow) (member.Value, member.Word) {
		return r.strand.StatedLosses.AtRelease, r.strand.StatedLosses.Source
	})
	t.loss("loss-final", "Δσ_{p∞,i}", "Loss of prestress in all at the end of life, as stated", func(r tendonRow) (member.Value, member.Word) {
		return r.strand.StatedLosses.Final, r.strand.StatedLosses.Source
	})
	t.column("bond-at-release", "η_{p1,i}", "Bond coefficient at release", "", "kind of tendon", func(r tendonRow) quantity.Literal { return plain(r.bondTransfer, "") }, "8.10.2.2(1)")
	t.column("bond-at-ultimate", "η_{p2,i}", "Bond coefficient at ultimate", "", "kind of tendon", func(r tendonRow) quantity.Literal { return plain(r.bondUltimate, "") }, "8.10.2.3(2)")
	t.column("tendon-form", "α_{2,i}", "Factor of the kind of tendon", "", "kind of tendon", func(r tendonRow) quantity.Literal { return plain(r.shape, "") }, "8.10.2.2(2)")
	release := map[string]string{"gradual": "1.0", "sudden": "1.25"}[j.m.Strands.Release.Text]
	b.Given(def("release", "α_1", "Factor of the way of release: "+j.m.Strands.Release.Text, "", ref(ec2.Code, "8.10.2.2(2)")), plain(release, ""), origin(j.m.Strands.Release.Origin))
	bond := map[string]string{"good": "1.0", "poor": "0.7"}[j.m.Strands.Bond.Text]
	b.Given(def("bond-conditions", "η_1", "Factor of the bond conditions of the lower zone: "+j.m.Strands.Bond.Text, "", ref(ec2.Code, "8.4.2, 8.10.2.2(1)")), plain(bond, ""), origin(j.m.Strands.Bond.Origin))
	j.givenGroups(t)
}

// givenGroups says which rows make up each group.
func (j *job) givenGroups(t *tendonColumns) {
	if len(j.m.Strands.Groups) == 0 {
		return
	}
	names := make([]string, len(j.m.Strands.Groups))
	for n := range names {
		names[n] = j.m.Strands.Groups[n].Name.Text
	}
	j.groups = j.n.Axis("tendon group", "group of rows of tendons", "n", names)
	var member []quantity.Literal
	for _, r := range t.rows {
		for _, name := range names {
			member = append(member, flag(r.strand.Group.Text == name))
		}
	}
	t.b.GivenOver(def("membership", "g_{i,n}", "1 where the row belongs to the group, else 0", ""), []*trace.Axis{j.rows, j.groups}, member, "member file, group of each row")
}

// givenDucts is post-tensioned reinforcement.
func (j *job) givenDucts(t *tendonColumns) {
	t.count("count", "n_{d,i}", "Number of ducts in the row, one tendon in each", func(r tendonRow) member.Count { return r.duct.Count })
	t.count("strands", "n_{t,i}", "Number of strands in one duct", func(r tendonRow) member.Count { return r.duct.Strands })
	j.givenPlaces(t, "ducts")
	t.value("duct-diameter", "φ_{d,i}", "Outer diameter of the duct", "mm", func(r tendonRow) member.Value { return r.duct.Diameter })
	j.givenLevel(t)
	j.givenProduct(t, "strand")
	t.value("jacking-stress", "σ_{p,max,i}", "Stress at the anchorage during stressing", "MPa", func(r tendonRow) member.Value { return r.duct.JackingStress })
	t.loss("loss-at-stressing", "Δσ_{p0,i}", "Loss of prestress when stressed, beside friction, as stated", func(r tendonRow) (member.Value, member.Word) {
		return r.duct.StatedLosses.AtStressing, r.duct.StatedLosses.Source
	})
	t.loss("loss-final", "Δσ_{p∞,i}", "Loss of prestress in all at the end of life, beside friction, as stated", func(r tendonRow) (member.Value, member.Word) {
		return r.duct.StatedLosses.Final, r.duct.StatedLosses.Source
	})
	for _, end := range []string{"A", "B"} {
		t.column("stressed-from-"+strings.ToLower(end), "k_{"+end+",i}", "1 where stressed from end "+end+", else 0", "", "stressed from, in the member file", func(r tendonRow) quantity.Literal {
			return flag(r.duct.StressedFrom.Text == end || r.duct.StressedFrom.Text == "both ends")
		})
	}
	f := &j.m.Ducts.Friction
	source := func(v member.Value) string { return fmt.Sprintf("%s (%s)", f.Source.Text, given(v)) }
	t.b.Given(def("friction", "μ", "Coefficient of friction between tendon and duct", "", ref(ec2.Code, "5.10.5.2(2)")), f.Mu.Literal, source(f.Mu))
	t.b.Given(def("unintended-angle", "k", "Unintended change of direction per length", "1/m", ref(ec2.Code, "5.10.5.2(3)")), f.Wobble.Literal, source(f.Wobble))
}
