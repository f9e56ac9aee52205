package mathset

import (
	"fmt"
	"math"
	"math/rand/v2"
	"slices"
	"strings"
	"testing"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// Nothing touches anything, no glyph is missing, and all ink lies within the box that is declared.
func faultless(t *testing.T, name string, b Box) {
	t.Helper()
	var rec draw.Recorder
	rec.Owner(name)
	b.Draw(&rec, 0, 0)
	for _, f := range rec.Faults() {
		t.Errorf("%s: %v", name, f)
	}
	const over = 0.6 // an italic letter at either end may lean out a little
	for _, f := range rec.Outside(draw.Box{X0: -over, Y0: -b.Height - 0.01, X1: b.Width + over, Y1: b.Depth + 0.01}, nil) {
		t.Errorf("%s: %v; box is %.1f wide, %.1f high, %.1f deep", name, f, b.Width, b.Height, b.Depth)
	}
}

func TestFormulasAreFaultless(t *testing.T) {
	for _, src := range formulas {
		f := parsed(src)
		for _, size := range []draw.Pt{7, 10.5, 14} {
			for rows := range 6 {
				s, n := inSymbols(), inNumbers(rows)
				s.Size, n.Size = size, size
				r := whole(s, n, f)
				faultless(t, src, r.Box())
				s.Running, n.Running = true, true
				faultless(t, src+" running", whole(s, n, f).Box())
			}
		}
	}
}

func TestLinesKeepWithin(t *testing.T) {
	for _, src := range formulas {
		r := whole(inSymbols(), inNumbers(3), parsed(src))
		for width := draw.Pt(230); width < 480; width += 10 {
			b := r.Lines(width)
			if b.Width() > width+0.01 {
				t.Errorf("%s in %v: lines are %.1f wide", src, width, b.Width())
			}
			var rec draw.Recorder
			b.Draw(&rec, 50, 50)
			for _, f := range append(rec.Faults(), rec.Outside(draw.BoxAt(49, 50, width+2, b.Height()), nil)...) {
				t.Errorf("%s in %v: %v", src, width, f)
			}
		}
	}
}

func TestLinesFallApartAtRelations(t *testing.T) {
	f := parsed("σ_b = P_m0/A_c + P_m0·e_p·y_b/I_c − M_g·y_b/I_c")
	b := whole(inSymbols(), inNumbers(2), f).Lines(330)
	if len(b.Lines) != 3 {
		t.Fatalf("have %d lines, want 3", len(b.Lines))
	}
	var rec draw.Recorder
	b.Draw(&rec, 0, 0)
	var at []draw.Pt
	for _, k := range rec.Ink {
		if k.Text == "=" && (len(at) == 0 || k.At.X <= at[0]+0.01) {
			at = append(at, k.At.X)
		}
	}
	if len(at) != 3 || math.Abs(float64(at[1]-at[0])) > 0.01 || math.Abs(float64(at[2]-at[0])) > 0.01 {
		t.Errorf("relations that begin lines stand at %v, want them under each other", at)
	}
}

// random builds a tree of the depth.
func random(r *rand.Rand, depth int) formula.Node {
	leaf := func() formula.Node {
		if r.IntN(3) == 0 {
			return &formula.Number{Text: fmt.Sprint(r.IntN(300)), Value: 1}
		}
		names := []string{"x", "f_ck", "M_g", "A_{p,i}", "ψ_0", "d'", "φ(t,t_0)", "Δσ_{p,c+s+r}", "j_y", "I_c", "a", "Q", "γ_{G,j}''"}
		s, err := formula.ParseSymbol(names[r.IntN(len(names))])
		if err != nil {
			panic(err)
		}
		return s
	}
	if depth == 0 {
		return leaf()
	}
	next := func() formula.Node { return random(r, depth-1-r.IntN(depth)) }
	switch r.IntN(12) {
	case 0:
		return &formula.Negate{X: next()}
	case 1:
		return &formula.Power{Base: next(), Exp: next()}
	case 2:
		return &formula.Call{Fn: "sqrt", Args: []formula.Node{next()}}
	case 3:
		return &formula.Call{Fn: []string{"exp", "ln", "abs", "sin"}[r.IntN(4)], Args: []formula.Node{next()}}
	case 4:
		return &formula.Call{Fn: "max", Args: []formula.Node{next(), next(), next()}}
	case 5:
		return &formula.Rows{Op: []string{"Σ", "min", "max"}[r.IntN(3)], Index: "i", X: next()}
	case 6:
		return &formula.Cases{Arms: []formula.Arm{{If: &formula.Compare{X: []formula.Node{next(), next()}, Rel: []string{"≤"}}, Then: next()}},
			Otherwise: next()}
	default:
		return &formula.Binary{Op: []rune("+−··///")[r.IntN(7)], L: next(), R: next()}
	}
}

func TestRandomTreesAreFaultless(t *testing.T) {
	r := rand.New(rand.NewPCG(1, 2))
	for k := range 600 {
		n := random(r, 1+k%5)
		for _, s := range []Setting{inSymbols(), inNumbers(k % 6)} {
			row := s.Expr(n)
			faultless(t, formula.Print(n), row.Box())
			row.Lines(300)
			s.Running = true
			faultless(t, formula.Print(n)+" running", s.Expr(n).Box())
		}
		if t.Failed() {
			return
		}
	}
}

func TestBarStandsOnTheAxis(t *testing.T) {
	var rec draw.Recorder
	inSymbols().Expr(parsed("x = c − a/b").Expr).Box().Draw(&rec, 100, 100)
	var minus, bar draw.Box
	for _, k := range rec.Ink {
		switch {
		case k.Text == "−":
			minus = k.Box
		case k.Kind == draw.StrokeInk:
			bar = k.Box
		}
	}
	if d := (minus.Y0 + minus.Y1 - bar.Y0 - bar.Y1) / 2; math.Abs(float64(d)) > 0.05 {
		t.Errorf("the bar stands %.2f points off the minus", d)
	}
}

// Words and figures of subscripts are upright, running indices and coordinates italic.
func TestFaces(t *testing.T) {
	cases := map[string]string{ // in order: serif plain, italic in _
		"M_Rd":         "_M_ Rd",
		"A_{p,i}":      "_A_ p , _i_",
		"σ_x":          "_σ_ _x_",
		"k_σ":          "_k_ _σ_",
		"Δσ_{p,c+s+r}": "Δ _σ_ p , c+s+r",
		"φ(t,t_0)":     "_φ_ ( _t_ , _t_ 0 )",
		"d_i'":         "_d_ _i_ ′",
		"γ_n":          "_γ_ n",
		"k_1":          "_k_ 1",
		"π":            "π",
	}
	for src, want := range cases {
		s, err := formula.ParseSymbol(src)
		if err != nil {
			t.Fatal(err)
		}
		var rec draw.Recorder
		inSymbols().Symbol(s).Box().Draw(&rec, 0, 0)
		var have []string
		for _, k := range rec.Ink {
			if k.Face == draw.Italic {
				have = append(have, "_"+k.Text+"_")
			} else {
				have = append(have, k.Text)
			}
		}
		if h := strings.Join(have, " "); h != want {
			t.Errorf("%s is set as %s, want %s", src, h, want)
		}
	}
}

// What is set, as the texts in the order drawn, drawn signs by their hidden text; bars are not among them.
func TestBrackets(t *testing.T) {
	cases := []struct{ src, symbols, numbers string }{
		{"z = a·(b + c)", "a · ( b + c )", ""},
		{"z = (a + b) + c", "a + b + c", ""},
		{"z = a − (b + c)", "a − ( b + c )", ""},
		{"z = −(a + b)", "− ( a + b )", ""},
		{"z = (a·b)^2", "( a · b ) 2", ""},
		{"z = f_ck^2", "f ck 2", "( 45 MPa ) 2"},
		{"z = 2·M_g", "2 · M g", "2 · ( −83.3 kN·m )"},
		{"z = M_g·2", "M g · 2", "−83.3 kN·m · 2"},
		{"z = x + M_g·2", "x + M g · 2", "69.323 mm + ( −83.3 kN·m ) · 2"},
		{"z = M_g^2", "M g 2", "( −83.3 kN·m ) 2"},
		{"z = b − M_g", "b − M g", "b − ( −83.3 kN·m )"},
		{"z = −M_g", "− M g", "− ( −83.3 kN·m )"},
		{"z = exp(−ψ_0)", "exp ( − ψ 0 )", "exp [ − ( −0.7 ) ]"},
		{"z = sin(θ)", "sin θ", "sin θ"},
		{"z = sin(2·θ)", "sin ( 2 · θ )", ""},
		{"z = 2·(3·(b + c) + 1)", "2 · [ 3 · ( b + c ) + 1 ]", ""},
		{"z = Σ_i(A_{p,i} + b)", "∑ i ( A p , i + b )", "( 855.7 kN + b ) + ( −114.9 kN + b )"},
		{"z = Σ_i(A_{p,i})·c", "( ∑ i A p , i ) · c", "[ 855.7 kN + ( −114.9 kN ) ] · c"},
		{"z = c·Σ_i(A_{p,i})", "c · ∑ i A p , i", "c · [ 855.7 kN + ( −114.9 kN ) ]"},
		{"z = min_i(A_{p,i})", "min i A p , i", "min ( 855.7 kN ; −114.9 kN )"},
		{"z = (f_ck/[MPa])^(2/3)", "f ck 2 / 3", "45 2 / 3"},
		{"z = 0.3·(f_ck/[MPa])·[MPa]", "0.3 · f ck", "0.3 · 45 MPa"},
		{"z = f_ck/[kPa]", "f ck", "45 MPa kPa"},
		{"z = 50·[MPa]", "50 MPa", "50 MPa"},
		{"z = E_p", "E p", "195\u2009000 MPa"},
		{"z = I_c", "I c", "12\u2009345\u2009678 × 10 6 mm 4"},
		{"z = 1e-6·a", "10 −6 · a", "10 −6 · ( 1.5 × 10 −3 )"},
		{"z = cases(x ≤ h_f: 1; otherwise: 2)", "{ 1 if x ≤ h f 2 otherwise", "{ 1 if 69.323 mm ≤ 140 mm 2 otherwise"},
	}
	for _, c := range cases {
		f := parsed(c.src)
		if have := strings.Join(texts(inSymbols().Expr(f.Expr)), " "); have != c.symbols {
			t.Errorf("%s in symbols: %s, want %s", c.src, have, c.symbols)
		}
		if have := strings.Join(texts(inNumbers(2).Expr(f.Expr)), " "); c.numbers != "" && have != c.numbers {
			t.Errorf("%s in numbers: %s, want %s", c.src, have, c.numbers)
		}
	}
}

func TestRunning(t *testing.T) {
	cases := map[string]string{
		"f_ck/γ_C":        "f ck / γ C",
		"(a + b)/(c·d)":   "( a + b ) / ( c · d )",
		"a/b/c":           "a / b / c",
		"a·b/c":           "a · b / c",
		"a/(b/c)":         "a / ( b / c )",
		"λ·x ≤ h_f":       "λ · x ≤ h f",
		"M_Rd = F_p·z":    "M Rd = F p · z",
		"0 < x and x < 1": "0 < x and x < 1",
	}
	for src, want := range cases {
		r, err := Inline(10, src)
		if err != nil {
			t.Errorf("%s: %v", src, err)
			continue
		}
		if have := strings.Join(texts(r), " "); have != want {
			t.Errorf("%s is set as %s, want %s", src, have, want)
		}
	}
	if _, err := Inline(10, "beam.yaml"); err == nil {
		t.Error("a file's name is taken for a formula")
	}
}

func TestTakenArm(t *testing.T) {
	f := parsed("η = cases(f_ck ≤ 50·[MPa]: 1.0; otherwise: 2.0)")
	n := inNumbers(1)
	n.Holds = func(formula.Cond, map[string]int) bool { return true }
	if have := strings.Join(texts(n.Expr(f.Expr)), " "); have != "1.0" {
		t.Errorf("have %s, want the arm that holds", have)
	}
}

func TestLongSumsShowFirstAndLast(t *testing.T) {
	f := parsed("F = Σ_i(A_{p,i})")
	if have := strings.Join(texts(inNumbers(5).Expr(f.Expr)), " "); have != "855.7 kN + … + 99 kN" {
		t.Error(have)
	}
}

func TestWorkedRow(t *testing.T) {
	f := parsed("ε_{p,i} = σ_{p,i}/E_p")
	s := inSymbols()
	s.Index = map[string]string{"i": "2"}
	n := inNumbers(2)
	n.At = map[string]int{"i": 1}
	r := s.Symbol(f.Symbol).Related("=", n.Expr(f.Expr))
	if have := strings.Join(texts(r), " "); have != "ε p , 2 = −114.9 kN 195\u2009000 MPa" {
		t.Error(have)
	}
}

func TestLinks(t *testing.T) {
	f := parsed("f_cd = α_cc·f_ck/γ_C")
	s := inSymbols()
	s.Anchor = func(n *formula.Symbol, _ map[string]int) string { return "to " + n.Name }
	var rec draw.Recorder
	whole(s, inNumbers(1), f).Box().Draw(&rec, 100, 100)
	var have []string
	for _, l := range rec.Links {
		have = append(have, l.Anchor)
		if l.Box.Width() < 5 || l.Box.Height() < 5 {
			t.Errorf("link to %s is only %.1f by %.1f points", l.Anchor, l.Box.Width(), l.Box.Height())
		}
	}
	want := []string{"to f_cd", "to α_cc", "to f_ck", "to γ_C", "materials/f-ck"}
	if !slices.Equal(have, want) {
		t.Errorf("links lead to %q, want %q", have, want)
	}
}

func TestDrawnSignsAreFound(t *testing.T) {
	var rec draw.Recorder
	inSymbols().Expr(parsed("x = sqrt((a/b + 1)/c)·abs(a/b)·(1 + a/b)").Expr).Box().Draw(&rec, 0, 0)
	if have := strings.Join(rec.Secret, " "); have != "√ | | ( )" {
		t.Errorf("hidden signs: %s", have)
	}
}

func TestInUnits(t *testing.T) {
	var have []string
	for _, w := range InUnits(parsed("k = (f_ck/[MPa])^(1/3)·(h_0/[mm]) + f_ck/[MPa]·sqrt(t/[d])").Expr) {
		have = append(have, w.Symbol.Name+" in "+w.Unit)
	}
	if want := []string{"f_ck in MPa", "h_0 in mm", "t in d"}; !slices.Equal(have, want) {
		t.Errorf("have %q, want %q", have, want)
	}
}

func TestSubscriptsKeepOneBaseline(t *testing.T) {
	var rec draw.Recorder
	inSymbols().Expr(parsed("x = f_cd + h_f + A_p + σ_cp + γ_C").Expr).Box().Draw(&rec, 0, 0)
	for _, k := range rec.Ink {
		if k.Size < 10 && k.At.Y != rec.Ink[1].At.Y {
			t.Errorf("subscript %s stands at %.2f, the first at %.2f", k.Text, k.At.Y, rec.Ink[1].At.Y)
		}
	}
}

func TestNumberGroups(t *testing.T) {
	for s, want := range map[string]string{"1234.5678": "1234.5678", "12345": "12\u2009345", "-1234567.25": "−1\u2009234\u2009567.25",
		"0.00001": "0.00001", "-5": "−5", "999": "999"} {
		if have := grouped(s); have != want {
			t.Errorf("%s is grouped %s, want %s", s, have, want)
		}
	}
}

func BenchmarkSet(b *testing.B) {
	trees := make([]*formula.Formula, len(formulas))
	for i, src := range formulas {
		trees[i] = parsed(src)
	}
	s, n := inSymbols(), inNumbers(3)
	b.ReportAllocs()
	for i := 0; b.Loop(); i++ {
		whole(s, n, trees[i%len(trees)]).Lines(330)
	}
}

func BenchmarkInline(b *testing.B) {
	b.ReportAllocs()
	for b.Loop() {
		if _, err := Inline(10, "M_Ed ≤ M_Rd"); err != nil {
			b.Fatal(err)
		}
	}
}
