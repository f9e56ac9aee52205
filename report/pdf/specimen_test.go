package pdf

import (
	"os"
	"path/filepath"
	"strings"
	"testing"

	"soffit/calc/formula"
	"soffit/report/draw"
	"soffit/report/mathset"
	"soffit/report/text"
)

// Invented values.
var values = map[string]mathset.Operand{
	"α_cc": {Number: "1.00"}, "f_ck": {Number: "45", Unit: "MPa", Anchor: "top"}, "γ_C": {Number: "1.50"},
	"x": {Number: "69.323", Unit: "mm"}, "λ": {Number: "0.80"}, "h_f": {Number: "140", Unit: "mm"},
	"σ_{p,∞}": {Number: "1145.2", Unit: "MPa"}, "E_p": {Number: "195000", Unit: "MPa"}, "ε_cu3": {Number: "3.5", Unit: "‰"},
	"P_m0": {Number: "2190.0", Unit: "kN"}, "A_c": {Number: "215000", Unit: "mm²"}, "I_c": {Number: "123.45", Unit: "10⁶ mm⁴"},
	"e_p": {Number: "312.4", Unit: "mm"}, "y_b": {Number: "398.2", Unit: "mm"}, "M_g": {Number: "-83.3", Unit: "kN·m"},
}

var formulas = []string{
	"f_cd = α_cc·f_ck/γ_C",
	"ε_{p,i} = σ_{p,∞}/E_p + ε_cu3·(d_i − x)/x",
	"M_Rd = Σ_i(F_{p,i}·(d_i − λ·x/2))",
	"f_ctm = 0.30·(f_ck/[MPa])^(2/3)·[MPa]",
	"σ_b = P_m0/A_c + P_m0·e_p·y_b/I_c − M_g·y_b/I_c",
	"k = min(1 + sqrt(200·[mm]/e_p); 2.0)",
	"η = cases(f_ck ≤ 50·[MPa]: 1.0; otherwise: 1.0 − (f_ck − 50·[MPa])/(200·[MPa]))",
	"φ(t,t_0) = φ_0·((t − t_0)/(β_H + t − t_0))^0.3",
}

const narrative = `# Strength in bending

The force in the strands follows from the strains, so that **every layer** stands at *its own*
prestress, here ` + "`σ_{p,∞}` = {σ_{p,∞}}" + `. The block lies in the flange while ` + "`λ·x ≤ h_f`" + `;
see [the head of the sheet](#top). Strains are of the order of 10⁻³, second moments of 10⁶ mm⁴.

1. Self-weight is added always.
2. Variable actions: ` + "`sqrt(x)/h_f`" + `.

| row | area | stress |
|:--|--:|--:|
| A-1 | 800 mm² | 1426.1 MPa |
| B-2 | 600 mm² | 1426.1 MPa |
`

var trees = func() []*formula.Formula {
	out := make([]*formula.Formula, len(formulas))
	for i, src := range formulas {
		f, err := formula.Parse(src)
		if err != nil {
			panic(err)
		}
		out[i] = f
	}
	return out
}()

// compose fills one sheet the way a work sheet is filled: texts, formulas in symbols and numbers, links.
func compose(c draw.Canvas, narrated text.Narrative) {
	symbols := mathset.Setting{Size: 10, Anchor: func(*formula.Symbol, map[string]int) string { return "top" }}
	numbers := mathset.Setting{Size: 10, Len: func(string) int { return 3 },
		Operand: func(s *formula.Symbol, at map[string]int) (mathset.Operand, bool) {
			if len(s.Index) > 0 && len(at) > 0 {
				return mathset.Operand{Number: "855.7", Unit: "kN"}, true
			}
			o, ok := values[s.Name]
			return o, ok
		}}
	y := draw.Pt(60)
	for _, f := range trees {
		c.Owner(f.String())
		y = text.Draw(c, 130, y, text.Paragraph{text.Plain("What is worked out here is said in words:")}.Lines(340, text.Style{}))
		b := symbols.Symbol(f.Symbol).Related("=", symbols.Expr(f.Expr)).Related("=", numbers.Expr(f.Expr)).Lines(330)
		b.Draw(c, 140, y+6)
		result := symbols.Symbol(f.Symbol).Related("=", symbols.Result("1426.1", "MPa")).Lines(100).Right(90)
		result.Draw(c, 475, y+6+b.Height()-12)
		c.Rect(575, y, 8, 8, draw.Style{Stroke: 0.4})
		y += b.Height() + 16
	}
	c.Owner("narrative")
	text.Draw(c, 130, y, narrated.Lines(330, text.Style{}))
}

func narrated(t testing.TB) text.Narrative {
	n, troubles := text.Read(narrative, func(key string) (mathset.Operand, error) { return values[key], nil })
	for _, trouble := range troubles {
		t.Error(trouble)
	}
	return n
}

// A sheet of formulas and text: nothing overlaps, another program finds no fault, the text comes out. With
// SOFFIT_SPECIMEN=FILE the sheet is kept for looking at.
func TestSpecimen(t *testing.T) {
	n := narrated(t)
	var rec draw.Recorder
	compose(&rec, n)
	for _, f := range append(rec.Faults(), rec.Outside(draw.BoxAt(130, 50, 460, 770), nil)...) {
		t.Error(f)
	}
	d := New(Options{Title: "Specimen", Created: created})
	c := d.Sheet()
	c.Anchor("top", 50, 50)
	compose(c, n)
	name := write(t, d)
	if keep := os.Getenv("SOFFIT_SPECIMEN"); keep != "" {
		b, err := os.ReadFile(name)
		if err == nil {
			err = os.WriteFile(filepath.Clean(keep), b, 0o666)
		}
		if err != nil {
			t.Fatal(err)
		}
	}
	if out := run(t, "qpdf", "--check", name); strings.Contains(out, "WARNING") {
		t.Error(out)
	}
	out := run(t, "pdftotext", "-layout", name, "-")
	for _, want := range []string{"σ", "ε", "≤", "√", "∑", "φ", "∞", "195 000 MPa", "1426.1 MPa", "every layer"} {
		if !strings.Contains(out, want) {
			t.Errorf("%q is not in the text of the file:\n%s", want, out)
		}
	}
}

func BenchmarkNote(b *testing.B) {
	n := narrated(b)
	b.ReportAllocs()
	for b.Loop() {
		d := New(Options{Title: "note", Created: created})
		for i := range 45 {
			s := d.Sheet()
			if i == 0 {
				s.Anchor("top", 0, 0)
			}
			compose(s, n)
		}
		if _, err := d.Bytes(); err != nil {
			b.Fatal(err)
		}
	}
}
