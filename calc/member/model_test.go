package member

import (
	"strings"
	"testing"

	"soffit/calc/diag"
)

// whole is a member file that states little, so that the defaults show.
const whole = `format: soffit/1
document: {project: Sheds, title: Plank, number: "7", revision: A, status: draft, prepared: {name: Ada Vane}}
basis:
  combination: 6.10
  consequence class: CC3
  national parameters:
    gamma_G,sup: {value: 1.30, source: annex}
    ψ: {table: {snow: [0.5, 0.2, 0], A: [0.7, 0.5, 0.3], B: [0.7, 0.5, 0.3], wind: [0.6, 0.2, 0]}, source: annex}
    A_s,max: {expression: "0.03*A_c", source: annex}
concrete: {f_ck: 50 N/mm2, unit weight: 25 kN/m^3, f_ck at release: 0.035 GPa}
shape: {kind: rectangle, depth: 20 cm, width: 0.6 m}
strands:
  bond: poor
  rows:
    - {name: middle, product: Y1860S7-12.9, count: 1, height: 40 mm, jacking stress: 1 300 MPa, stated losses: {at release: 90 MPa, final: 200 MPa, source: s}}
span: {length: 6.0 m, bearing A: {from end: 0.1 m, length: 100 mm}, bearing B: {from end: 100 mm, length: 10 cm}}
actions:
  - name: finish
    kind: permanent
    loads:
      - uniform: 1.5 kN/m
      - {uniform: −0.5 kN/m, from: 2 m, to: 3 m}
      - {point: 2 kN, at: 3.0 m}
narrative:
  verdict: |
    First line.

    Second paragraph.
`

func TestModel(t *testing.T) {
	m, found := Read("whole.yaml", []byte(whole), testOptions)
	if m == nil {
		t.Fatal(found)
	}
	value := func(what string, v Value, text string, base float64, at diag.Pos, given bool, why string) {
		t.Helper()
		if v.String() != text || v.Base() != base || v.Pos != at || v.Given != given || v.Why != why {
			t.Errorf("%s: have %q = %v at %v, given %v %q", what, v, v.Base(), v.Pos, v.Given, v.Why)
		}
	}
	value("f_ck", m.Concrete.Fck, "50 N/mm²", 50, diag.Pos{Line: 10, Col: 18}, true, "")
	value("f_ck at release", m.Concrete.FckAtRelease, "0.035 GPa", 35, diag.Pos{Line: 10, Col: 69}, true, "")
	value("depth", m.Shape.Depth, "20 cm", 200, diag.Pos{Line: 11, Col: 33}, true, "")
	value("design working life", m.Basis.DesignWorkingLife, "50 y", 50*365, diag.Pos{Line: 4, Col: 3}, false, "building structures, EN 1990 Table 2.1 category 4")
	row := &m.Strands.Rows[0]
	value("spacing", row.Spacing, "0 mm", 0, diag.Pos{Line: 15, Col: 7}, false, "a single strand")
	value("debonded length", row.DebondedLength, "0 m", 0, diag.Pos{Line: 15, Col: 7}, false, "bonded from the ends")
	value("jacking stress", row.JackingStress, "1300 MPa", 1300, diag.Pos{Line: 15, Col: 86}, true, "")
	loads := m.Actions[0].Loads
	value("from", loads[0].From, "0 m", 0, diag.Pos{Line: 21, Col: 9}, false, "from end A")
	value("to", loads[0].To, "6.0 m", 6000, diag.Pos{Line: 21, Col: 9}, false, "to end B")
	value("uniform", loads[1].Uniform, "-0.5 kN/m", -0.5, diag.Pos{Line: 22, Col: 19}, true, "")
	value("at", loads[2].At, "3.0 m", 3000, diag.Pos{Line: 23, Col: 27}, true, "")
	if loads[2].Uniform.Present() || loads[2].From.Present() || loads[0].Point.Present() || loads[0].At.Given {
		t.Error("a load is uniform or a point load")
	}

	word := func(what string, w Word, text string, given bool, why string) {
		t.Helper()
		if w.Text != text || w.Given != given || !strings.Contains(w.Why, why) {
			t.Errorf("%s: have %q, given %v %q", what, w.Text, w.Given, w.Why)
		}
	}
	word("combination", m.Basis.Combination, "6.10", true, "")
	word("supervision level", m.Basis.SupervisionLevel, "DSL3", false, "goes with CC3")
	word("release", m.Strands.Release, "sudden", false, "transmission length")
	word("number", m.Document.Number, "7", true, "")
	if len(m.Bars.Rows) != 0 || m.Document.Checked.Name.Present() || m.Strands.Rows[0].Count.N != 1 {
		t.Error("bars, checker or count")
	}

	ndp := m.Basis.NationalParameters
	if len(ndp) != 3 || ndp[0].Key != "γ_{G,sup}" || ndp[0].Pos.Line != 7 || ndp[0].Source.Text != "annex" {
		t.Fatalf("national parameters: %+v", ndp)
	}
	value("γ_{G,sup}", ndp[0].Value, "1.30", 1.3, diag.Pos{Line: 7, Col: 26}, true, "")
	if table := ndp[1].Table; len(table) != 4 || table[0].Name != "A" || table[2].Name != "snow" || table[2].Values[1].Base() != 0.2 {
		t.Errorf("table: %+v", table)
	}
	if ndp[2].Tree == nil || ndp[2].Expression.Text != "0.03*A_c" {
		t.Errorf("expression: %+v", ndp[2])
	}
	if n := m.Narrative; len(n) != 1 || n[0].Slot != "verdict" || n[0].Text != "First line.\n\nSecond paragraph." || n[0].Pos.Line != 25 {
		t.Errorf("narrative: %+v", n)
	}
	if m.File != "whole.yaml" || string(m.Source) != whole {
		t.Error("file or source")
	}
}

// TestLimits reads files that are large, long, or doubled in part.
func TestLimits(t *testing.T) {
	many := strings.Repeat("    - {name: n, date: x}\n", 400)
	for src, want := range map[string]string{
		strings.Repeat("x", 10_000_001):                              "file of 10000001 bytes, want at most 1000000",
		whole + strings.Repeat("# a remark\n", 20_000):               "", // long, but a member file
		strings.Replace(whole, "document: {", "document: {{", 1):     "x.yaml:2:11: ",
		whole + "document:\n  history:\n" + many:                     "document: second time, first on line 2",
		"\uFEFF" + strings.ReplaceAll(whole, "\n", "\r\n"):           "",
		strings.Replace(whole, "actions:\n", "actions: []\nold:", 1): "old: unknown key in the file",
	} {
		m, found := Read("x.yaml", []byte(src), testOptions)
		if (m == nil) == (len(found) == 0) {
			t.Errorf("a member and findings, or neither: %s", found)
		}
		if len(found) > mostFindings+1 {
			t.Errorf("%d findings", len(found))
		}
		if want == "" && m == nil || want != "" && !strings.Contains(found.String(), want) {
			t.Errorf("want %q, have %s", want, found)
		}
	}
}

// TestManyFindings tells of the first and counts the rest.
func TestManyFindings(t *testing.T) {
	src := strings.Replace(whole, "actions:\n", "extra:\nactions:\n", 1) + strings.Repeat("  a: b\n", 500)
	_, found := Read("x.yaml", []byte(src), testOptions)
	if last := found[len(found)-1]; len(found) != mostFindings+1 || !strings.HasSuffix(last.Msg, "findings more") {
		t.Errorf("%d findings, the last %v", len(found), last)
	}
}
