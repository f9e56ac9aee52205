package sheet

import (
	"fmt"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/report/draw"
)

// The member of this fixture, its loads and every number in it are invented; its formulas are shaped like those
// of a design but are there to fill sheets with every kind of entry.

const invented = `format: soffit/1
document:
  project: Depot at the canal, hall 2
  title: Roof beam RB7
  number: KD-S-CN-0412
  revision: P02
  status: for review
concrete: {f_ck: 50 MPa, unit weight: 25 kN/m³, f_ck at release: 35 MPa}
shape: {kind: T, depth: 900 mm, flange width: 1200 mm, flange depth: 140 mm, web width: 240 mm}
strands:
  bond: good
  rows:
    - {name: bottom row, product: Y1860S7-15.2, count: 8, spacing: 40 mm, height: 50 mm, jacking stress: 1395 MPa, stated losses: {at release: 95 MPa, final: 250 MPa, source: estimate of the office}}
    - {name: second row, product: Y1860S7-15.2, count: 6, spacing: 40 mm, height: 100 mm, debonded length: 1.5 m, jacking stress: 1395 MPa}
	# a tab, and Greek: σ ≤ f
span: {length: 18.30 m}
`

func ref(c, eq string) clause.Ref {
	return clause.Ref{Document: "EN 1992-1-1", Clause: c, Equation: eq}
}

func literals(t testing.TB, s ...string) []quantity.Literal {
	t.Helper()
	out := make([]quantity.Literal, len(s))
	for i, x := range s {
		l, err := quantity.Parse(x)
		if err != nil {
			t.Fatalf("%q: %v", x, err)
		}
		out[i] = l
	}
	return out
}

// bench writes a fixture.
type bench struct {
	t testing.TB
	n *trace.Note
}

func (f bench) given(b *trace.Block, id, symbol, name, unit, value, source string, r clause.Ref) {
	b.Given(&clause.Given{ID: id, Symbol: symbol, Name: name, Unit: unit, Ref: r}, literals(f.t, value)[0], source)
}

func (f bench) column(b *trace.Block, id, symbol, name, unit string, a *trace.Axis, source string, values ...string) {
	b.GivenRows(&clause.Given{ID: id, Symbol: symbol, Name: name, Unit: unit}, a, literals(f.t, values...), source)
}

func (f bench) step(b *trace.Block, id, name, text, unit string, r clause.Ref) {
	b.Step(&clause.Formula{ID: id, Name: name, Text: text, Unit: unit, Ref: r})
}

// frame stands in for a diagram, whose own package tests what it draws.
type frame struct{ w, h draw.Pt }

func (f frame) Draw(c draw.Canvas, x, y draw.Pt) {
	c.Rect(x+1, y+1, f.w-2, f.h-2, draw.Style{Stroke: 0.5})
}

func init() {
	layFigure = func(_ *trace.Note, _ *trace.Figure, width draw.Pt) (drawing, draw.Pt, draw.Pt, error) {
		return frame{width, 180}, width, 180, nil
	}
}

// document has every field filled.
func document() trace.Document {
	return trace.Document{Program: "Soffit 0.1", Project: "Depot at the canal, hall 2", Title: "Roof beam RB7",
		Number: "KD-S-CN-0412", Revision: "P02", Status: "for review",
		Roles: []trace.Role{{Role: "prepared", Name: "Ines Marten", Organisation: "Marten & Holt, structural engineers", Date: "2026-03-12"},
			{Role: "checked", Name: "Tomas Aldridge-Weiss", Organisation: "Office for structural checking, Northgate"}, {Role: "approved"}},
		History: []trace.Issue{{Revision: "P01", Date: "2026-02-20", Text: "First issue for review."},
			{Revision: "P02", Date: "2026-03-12", Text: "Flange widened to 1200 mm after the review of the roof build-up; second row of strands debonded over 1.5 m at both ends, loads of the crane runway taken out."}},
		Drawings:  []trace.Drawing{{Number: "KD-S-DR-1107", Revision: "B", Title: "Roof beams, formwork and strands"}, {Number: "KD-S-DR-1108", Title: "Roof plan"}},
		InputName: "rb7.yaml", Input: invented}
}

// fixture is a note with every kind of entry; chapters repeats the calculation to make it long.
func fixture(t testing.TB, repeats int) *trace.Note {
	t.Helper()
	n := trace.New(document())
	f := bench{t, n}
	var stations []string
	for i := range 41 {
		stations = append(stations, fmt.Sprintf("%.3fL", float64(i)/40))
	}
	stations[0], stations[20], stations[40] = "bearing A", "midspan", "bearing B"
	over := n.Axis("stations", "stations along the span", "", stations)
	rows := n.Axis("tendons", "tendon rows", "i", []string{"bottom row", "second row"})
	loads := n.Axis("actions", "actions", "j", []string{"self-weight", "roof build-up", "snow above 1000 m", "services", "suspended walkway"})

	v := n.Chapter("verdict", "Verdict")
	vb := v.Block("summary", "What governs", nil)
	vb.Text("words", "The beam carries its loads in bending. **Two criteria fail**: see the table. What would mend them:\n\n- one more strand in the bottom row, or\n- a flange of 160 mm.\n")

	given := f.basis(n, over, rows, loads)
	for k := range repeats {
		f.design(n, k, over, rows, loads, given)
	}
	if err := n.Err(); err != nil {
		t.Fatal(err)
	}
	return n
}

func (f bench) basis(n *trace.Note, over, rows, loads *trace.Axis) map[string]*trace.Block {
	c := n.Chapter("basis", "Basis")
	std := c.Block("parameters", "National parameters", nil)
	std.Text("words", "Values are those recommended in EN 1992-1-1 unless a source is named beside them. Concrete stress is positive in compression, a moment positive sagging.")
	f.given(std, "gamma-c", "γ_C", "partial factor of concrete, persistent", "", "1.5", "recommended value", ref("2.4.2.4(1)", ""))
	f.given(std, "gamma-s", "γ_S", "partial factor of steel", "", "1.15", "recommended value", ref("2.4.2.4(1)", ""))
	f.given(std, "alpha-cc", "α_cc", "coefficient for long-term effects on the compressive strength and for unfavourable effects of the way the load is applied", "", "0.85", "national annex of an invented land, table NA.1, 2019 edition", ref("3.1.6(1)P", ""))
	f.given(std, "lambda", "λ", "depth factor of the block", "", "0.80", "", ref("3.1.7(3)", "3.19"))
	f.given(std, "eta", "η", "strength factor of the block", "", "1.0", "", ref("3.1.7(3)", "3.21"))
	limits := c.Block("limits", "What this note covers, and what it does not", nil, trace.Take(std)...)
	limits.Text("limits", "**Not justified here:** shear and torsion, stresses and cracking in service, deflection, splitting at the ends, fire, lifting and transport. Ultimate bending is, at `σ_p` of {γ_S} and {α_cc}.")

	c = n.Chapter("member", "The member as given")
	m := c.Block("concrete", "Concrete and shape", nil)
	f.given(m, "f-ck", "f_ck", "characteristic compressive strength", "MPa", "50 MPa", "rb7.yaml, line 8", clause.Ref{})
	f.given(m, "depth", "h", "depth of the section", "mm", "900 mm", "rb7.yaml, line 9", clause.Ref{})
	f.given(m, "width", "b_f", "width of the flange", "mm", "1200 mm", "rb7.yaml, line 9", clause.Ref{})
	f.given(m, "flange", "h_f", "depth of the flange", "mm", "140 mm", "rb7.yaml, line 9", clause.Ref{})
	f.given(m, "web", "b_w", "width of the web", "mm", "240 mm", "rb7.yaml, line 9", clause.Ref{})
	f.given(m, "gross-area", "A_c", "gross area of the section, as in the drawing of the producer", "mm²", "350400 mm²", "rb7.yaml, line 9", clause.Ref{})
	f.given(m, "inertia", "I_c", "second moment of area", "10⁶ mm⁴", "28450·10⁶ mm⁴", "rb7.yaml, line 9", clause.Ref{})
	f.given(m, "length", "L", "span between the bearings", "m", "18.00 m", "rb7.yaml, line 16", clause.Ref{})
	f.given(m, "e-p", "E_p", "modulus of the strands", "GPa", "195 GPa", "product table", ref("3.3.6(3)", ""))
	f.given(m, "f-p01k", "f_{p0,1k}", "characteristic 0.1 % proof stress", "MPa", "1640 MPa", "declared by the producer", clause.Ref{})
	f.given(m, "eps-cu3", "ε_cu3", "ultimate strain of the block", "‰", "3.5 ‰", "Table 3.1", ref("3.1.3", "Table 3.1"))

	s := c.Block("strands", "Strands", nil)
	f.column(s, "count", "n_i", "number of strands", "", rows, "rb7.yaml, lines 13 and 14", "8", "6")
	f.column(s, "level", "y_i", "axis above the soffit", "mm", rows, "rb7.yaml, lines 13 and 14", "50 mm", "100 mm")
	f.column(s, "area", "A_{p,i}", "area of the row", "mm²", rows, "product table", "1120 mm²", "840 mm²")
	f.column(s, "prestress", "σ_{p,∞,i}", "stress after all losses, as stated", "MPa", rows, "rb7.yaml, lines 13 and 14", "1145 MPa", "1145.5 MPa")
	s.Figure("section", "section", "Section with strands.", "", trace.Plot{Role: "level", Key: "level"})

	a := c.Block("actions", "Actions", nil)
	f.column(a, "q", "q_j", "uniform load", "kN/m", loads, "rb7.yaml", "8.76 kN/m", "6.3 kN/m", "12.5 kN/m", "0.75 kN/m", "1 kN/m")
	f.column(a, "gamma", "γ_j", "partial factor", "", loads, "EN 1990 Table A1.2(B)", "1.35", "1.35", "1.5", "1.35", "1.5")
	f.step(a, "total", "Design load, all actions unfavourable", "q_Ed = Σ_j(γ_j·q_j)", "kN/m", clause.Ref{Document: "EN 1990", Clause: "6.4.3.2", Equation: "6.10"})

	st := c.Block("stations", "Stations and bending moment", over)
	var x []string
	for i := range over.Rows {
		x = append(x, fmt.Sprintf("%.3f m", 18*float64(i)/40))
	}
	f.column(st, "x", "x", "distance from bearing A", "m", over, "40 equal parts", x...)
	return map[string]*trace.Block{"std": std, "m": m, "s": s, "a": a, "st": st}
}

func (f bench) design(n *trace.Note, k int, over, rows, loads *trace.Axis, g map[string]*trace.Block) {
	suffix, word := "", "Ultimate bending"
	if k > 0 {
		suffix, word = fmt.Sprint("-", k+1), fmt.Sprint("Ultimate bending, variant ", k+1)
	}
	c := n.Chapter("ultimate"+suffix, word)
	mat := c.Block("materials", "Design strengths", nil, trace.Take(g["std"], g["m"], g["s"])...)
	f.step(mat, "f-cd", "Design compressive strength of the concrete", "f_cd = α_cc·f_ck/γ_C", "MPa", ref("3.1.6(1)P", "3.15"))
	f.step(mat, "f-ctm", "Mean tensile strength, by the strength class", "f_ctm = cases(f_ck ≤ 50·[MPa]: 0.30·(f_ck/[MPa])^(2/3)·[MPa]; otherwise: 2.12·ln(1+(f_ck+8·[MPa])/(10·[MPa]))·[MPa])", "MPa", ref("3.1.3", "Table 3.1"))
	f.step(mat, "f-pd", "Design strength of the strands, horizontal branch", "f_pd = f_{p0,1k}/γ_S", "MPa", ref("3.3.6(6)", ""))
	f.step(mat, "prestrain", "Prestrain of each row", "ε_{p0,i} = σ_{p,∞,i}/E_p", "‰", ref("5.10.8", ""))
	f.step(mat, "d", "Depth of each row below the top", "d_i = h − y_i", "mm", clause.Ref{})
	f.step(mat, "F-y", "Force of each row at its design strength", "F_{y,i} = A_{p,i}·f_pd", "kN", ref("3.3.6(6)", ""))
	f.step(mat, "A-p", "Area of all strands", "A_p = Σ_i(A_{p,i})", "mm²", clause.Ref{})
	f.step(mat, "d-p", "Depth of the resultant of all strands, each row weighed by its area", "d_p = Σ_i(A_{p,i}·d_i)/A_p", "mm", clause.Ref{})

	eff := c.Block("effects", "Bending moment and transmission", over, trace.Take(g["std"], g["m"], g["s"], g["a"], g["st"], mat)...)
	eff.Row = 20
	f.step(eff, "moment", "Design bending moment", "M_Ed = q_Ed·x·(L−x)/2", "kN·m", clause.Ref{})
	f.step(eff, "l-a", "Distance to the nearer end of the beam", "l_x = min(x; L−x) + 150·[mm]", "mm", clause.Ref{})
	full, part := eff.Choose(&clause.Condition{ID: "transmitted", Name: "Is the prestress transmitted here?", Text: "l_x ≥ 1000·[mm]", Yes: "transmitted in full", No: "within the transmission length", Ref: ref("8.10.2.2", "")})
	eff.On(full, func() {
		f.step(eff, "share-full", "Share of the tendon stress available", "k_x = 1", "", ref("8.10.2.3", ""))
	})
	eff.On(part, func() {
		f.step(eff, "share-part", "Share of the tendon stress available, linear from the end", "k_x = l_x/(1000·[mm])", "", ref("8.10.2.3", ""))
	})
	f.step(eff, "available", "Stress available in each row", "σ_{pd,i} = k_x·f_pd·(d_i/d_i)", "MPa", ref("8.10.2.3", ""))
	f.step(eff, "force", "Force available in each row", "F_{p,i} = A_{p,i}·σ_{pd,i}", "kN", clause.Ref{})
	eff.Table("along", "Moment and available force along the span", over, "moment", "l-a", "share-full", "available", "force")
	eff.Figure("graph", "effects", "Bending moment along the span, sagging drawn downward.", "", trace.Plot{Role: "x", Key: g["st"].Path() + "/x"})

	b := c.Block("bending", "Resistance at every station, sagging", over, trace.Take(g["std"], g["m"], g["s"], g["st"], mat, eff)...)
	residual := &clause.Formula{ID: "residual", Name: "Residual of the equilibrium", Text: "ΔF = Σ_i(F_{p,i}) − F_c", Unit: "kN", Ref: ref("6.1(2)P", "")}
	root := &clause.Root{ID: "axis", Name: "Depth of the neutral axis by equilibrium of the horizontal forces on the section", Unknown: "x_u", Unit: "mm", Digits: 7,
		Equation: "Σ_i(F_{p,i}) = λ·x_u·b_f·η·f_cd", Residual: residual, Scale: "F_c", Tolerance: 1e-4, Ref: ref("6.1(2)P", "")}
	b.Root(root, func(r *trace.Row) (trace.Proposal, error) {
		sum := 0.0
		for _, v := range r.Column("F_{p,i}") {
			sum += v
		}
		v := sum / (r.Value("λ") * r.Value("b_f") * r.Value("η") * r.Value("f_cd"))
		return trace.Proposal{X: v, Lo: 0, Hi: 900}, nil
	})
	f.step(b, "compression", "Force of the compressed block", "F_c = λ·x_u·b_f·η·f_cd", "kN", ref("3.1.7(3)", "3.19"))
	b.Step(residual)
	b.Prove(root)
	flange, _ := b.Choose(&clause.Condition{ID: "in-flange", Name: "Is the block within the flange?", Text: "λ·x_u ≤ h_f and x_u < h", Yes: "in the flange", No: "in the web", Ref: ref("3.1.7(3)", "Fig. 3.5")})
	b.On(flange, func() {
		f.step(b, "centroid", "Depth of the centroid of the block", "y_c = λ·x_u/2", "mm", clause.Ref{})
	})
	b.Decide(&clause.Condition{ID: "ductile", Name: "Is the neutral axis low enough for every row to yield?", Text: "x_u/d_p > 0.45", Yes: "over-reinforced", No: "every row yields", Ref: ref("5.6.3", "")})
	f.step(b, "strain", "Strain of each row: prestrain at zero concrete strain and that of bending", "ε_{p,i} = ε_{p0,i} + ε_cu3·(d_i − x_u)/x_u", "‰", ref("6.1(2)P", ""))
	f.step(b, "lever", "Lever arm of each row about the centroid of the block", "z_i = d_i − y_c", "mm", clause.Ref{})
	f.step(b, "moment-row", "Moment of each row", "M_i = F_{p,i}·z_i", "kN·m", clause.Ref{})
	f.step(b, "resistance", "Moment resistance about the line of the block's force", "M_Rd = Σ_i(M_i)", "kN·m", ref("6.1(2)P", ""))
	f.step(b, "long", "A long formula to be broken over lines, with roots and powers", "Q_x = sqrt(M_Rd^2 + (F_c·y_c)^2) + Σ_i(A_{p,i}·σ_{pd,i}·(d_i − y_c)) − max(F_c·y_c; M_Ed; 0.25·[kN·m]) + (1.25·λ·x_u)·b_f·f_ctm·h_f/(1 + 2·(h_f/h)^3) + abs(M_Ed − M_Rd)/2", "kN·m", ref("6.1(2)P", "6.2.a"))
	b.Check(&clause.Check{ID: "bending", Name: "Bending, sagging", Demand: "M_Ed", Limit: "M_Rd", Ref: ref("6.1", "")})
	b.Figure("ultimate", "ultimate", "Strain, stress and forces at the ultimate limit state.", "midspan", trace.Plot{Role: "strain", Key: "strain"})
	b.Table("resistances", "Neutral axis and resistance along the span", over, g["st"].Path()+"/x", "axis", "compression", "centroid", "strain", "moment-row", "resistance", eff.Path()+"/moment")
	b.Figure("envelope", "resistance", "Bending moment against resistance along the span.", "", trace.Plot{Role: "demand", Key: eff.Path() + "/moment"})
	b.Text("remark", "At midspan the moment is {M_Ed} against {M_Rd}: the flange alone carries the compression, `x_u` being {x_u}. "+
		"Nearer the ends the strands are not yet *bonded* over their full length, so that the resistance falls to nothing.")

	d := c.Block("detail", "Minimum steel and a margin", nil, trace.Take(g["std"], g["m"], mat)...)
	f.step(d, "A-min", "Least area of steel in the tension zone", "A_min = max(0.26·f_ctm/f_pd; 0.0013)·b_w·d_p", "mm²", ref("9.2.1.1(1)", "9.1N"))
	d.Check(&clause.Check{ID: "least", Name: "Minimum steel", Demand: "A_min", Limit: "A_p", Ref: ref("9.2.1.1(1)", "")})
	f.step(d, "A-max", "Most steel allowed by the producer's mould", "A_max = 0.0055·A_c", "mm²", ref("9.2.1.1(3)", ""))
	d.Check(&clause.Check{ID: "most", Name: "Maximum steel the mould takes in its lower part without congestion at the stop ends", Demand: "A_p", Limit: "A_max", Ref: ref("9.2.1.1(3)", "")})
	f.step(d, "tension", "Stress at the bottom, compression positive, turned round to be tension", "σ_ct = 0.5·[MPa] − 1.2·[MPa]", "MPa", ref("7.3.1", ""))
	f.step(d, "none", "Tension allowed", "σ_lim = 0·[MPa]", "MPa", ref("7.3.1(5)", "Table 7.1N"))
	d.Check(&clause.Check{ID: "decompression", Name: "Decompression, frequent", Demand: "σ_ct", Limit: "σ_lim", Ref: ref("7.3.1(5)", "")})
}
