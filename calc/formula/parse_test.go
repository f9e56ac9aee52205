package formula

import (
	"slices"
	"strings"
	"testing"
)

// written gives formulas as one types them and as they print; "" stands for the same.
var written = [][2]string{
	{"f_cd = α_cc·f_ck/γ_C", ""},
	{"f_cd=α_cc*f_ck/γ_C", "f_cd = α_cc·f_ck/γ_C"},
	{"f_cm = f_ck + 8·[MPa]", ""},
	{"f_ctm = 0.30*(f_ck/[MPa])^(2/3)*[MPa]", "f_ctm = 0.30·(f_ck/[MPa])^(2/3)·[MPa]"},
	{"f_ctm = cases(f_ck <= 50*[MPa]: 0.30·(f_ck/[MPa])^(2/3)·[MPa]; otherwise: 2.12·ln(1+f_cm/(10·[MPa]))·[MPa])",
		"f_ctm = cases(f_ck ≤ 50·[MPa]: 0.30·(f_ck/[MPa])^(2/3)·[MPa]; otherwise: 2.12·ln(1 + f_cm/(10·[MPa]))·[MPa])"},
	{"E_cm(t) = (f_cm(t)/f_cm)^0.3·E_cm", ""},
	{"β_cc(t) = exp(s·(1 − sqrt(28·[d]/t)))", ""},
	{"φ(t, t_0) = φ_0·β_c(t , t_0)", "φ(t,t_0) = φ_0·β_c(t,t_0)"},
	{"F_p = Σ_i(A_{p,i}·f_pd)", ""},
	{"F_p = ∑_i( A_{p, i}*f_pd )", "F_p = Σ_i(A_{p,i}·f_pd)"},
	{"M_Rd = Σ_i(F_{p,i}·(d_{p,i} − λ·x/2)) + Σ_j(F_{s,j}·(d_{s,j} − λ·x/2))", ""},
	{"κ = min(ε_cu2/x; min_i((ε_ud − ε_{p0,i})/(d_i − x)))", ""},
	{"k = max(0, min(x - l_{db,i}, L))", "k = max(0; min(x − l_{db,i}; L))"},
	{"x = −b + sqrt(b^2 − 4·a·c)", ""},
	{"x = -b^2", "x = −b^2"}, {"x = (-b)^2", "x = (−b)^2"}, {"x = −(b^2)", "x = −b^2"}, {"x = -(a*b)", "x = −(a·b)"}, {"x = (-a)*b", "x = −a·b"},
	{"x = a - -b", "x = a − (−b)"}, {"x = a*-b", "x = a·(−b)"}, {"x = --a", "x = −(−a)"}, {"x = a^-2", "x = a^(−2)"}, {"x = a + (−b)·c", ""},
	{"x = a - (b - c) - d", "x = a − (b − c) − d"}, {"x = (a - b) - c", "x = a − b − c"}, {"x = a/(b/c)/d", ""}, {"x = a·(b·c)", ""}, {"x = a/(b·c)", ""},
	{"x = a + (b + c)", ""}, {"x = (a + b)·c", ""}, {"x = (a^b)^c", ""}, {"x = a^(b^c)", ""}, {"x = sqrt(a)^2", ""}, {"x = [MPa]^(1/2)·[mm²/m]", ""},
	{"x = 2^n", ""}, {"x = 1e-6·a", ""}, {"x = 1E+6·a", "x = 1e6·a"}, {"x = ((((a))))", "x = a"}, {"x = [N/mm2]/[1]", "x = [N/mm²]/[1]"},
	{"Δσ_{p,c+s+r} = ∆x", "Δσ_{p,c+s+r} = Δx"}, {"f_{ck} = f_{p0,1k}", "f_ck = f_{p0,1k}"}, {"d_p'' = d_p′·x'", "d_p'' = d_p'·x'"}, {"µ = Ω", "μ = Ω"},
	{"σ_{pm∞,i} = σ_∞·ε_{top  flange , 1}", "σ_{pm∞,i} = σ_∞·ε_{top flange,1}"}, {"x = f(a-b, c*(d+e))", "x = f(a−b,c·(d+e))"}, {"x = f_1'(t)^2", ""},
	{"x̄ = x̄_1 + ȳ", ""}, {"x = π·φ^2/4", ""}, {"x = sinx + minimum·cot(θ) + Λ_max", ""},
	{"x = cases(a < b and c ≥ d and e = 0: 1; (a > b or c < d) and e > 1: 2; otherwise: 3)", ""},
	{"x = cases(a<b or c<d and e<f: 1; otherwise: 2)", "x = cases(a < b or (c < d and e < f): 1; otherwise: 2)"},
	{"x = cases(0 ≤ x < (a + b)·c ≤ d: cases(a = b: 1; otherwise: −2); otherwise: −y)", ""},
	{"x = cases(((a + b) < c): 1; ((a) + b)/c < d: 2; otherwise: 3)", "x = cases(a + b < c: 1; (a + b)/c < d: 2; otherwise: 3)"},
	{"x = cases(a < b and (c < d and e < f): 1; otherwise: 2)", ""},
}

func TestPrint(t *testing.T) {
	for _, c := range written {
		want := c[1]
		if want == "" {
			want = c[0]
		}
		f, err := Parse(c[0])
		if err != nil {
			t.Errorf("%s: %v", c[0], err)
			continue
		}
		if got := f.String(); got != want {
			t.Errorf("%s\nhave %s\nwant %s", c[0], got, want)
		}
		again, err := Parse(f.String())
		if err != nil {
			t.Errorf("%s printed: %v", f, err)
			continue
		}
		if !Equal(f.Expr, again.Expr) || !Equal(f.Symbol, again.Symbol) {
			t.Errorf("%s: another tree after printing", f)
		}
	}
}

func TestTree(t *testing.T) {
	p := func(src string) Node {
		n, err := ParseExpr(src)
		if err != nil {
			t.Fatal(err)
		}
		return n
	}
	a, b, c := p("a"), p("b"), p("c")
	bin := func(l Node, op rune, r Node) Node { return &Binary{Op: op, L: l, R: r} }
	for src, want := range map[string]Node{
		"a − b − c": bin(bin(a, '−', b), '−', c),
		"a/b·c":     bin(bin(a, '/', b), '·', c),
		"a + b·c":   bin(a, '+', bin(b, '·', c)),
		"−a·b":      bin(&Negate{X: a}, '·', b),
		"−a^b":      &Negate{X: &Power{Base: a, Exp: b}},
		"a·b^c":     bin(a, '·', &Power{Base: b, Exp: c}),
		"a^−b":      &Power{Base: a, Exp: &Negate{X: b}},
		"max(a, b)": &Call{Fn: "max", Args: []Node{a, b}},
		"Σ_j(a)":    &Rows{Op: "Σ", Index: "j", X: a},
		"min_n(a)":  &Rows{Op: "min", Index: "n", X: a},
	} {
		if got := p(src); !Equal(got, want) || Print(got) != Print(want) {
			t.Errorf("%s is read as %s, want %s", src, Print(got), Print(want))
		}
	}
	if pos := p("a + b·max(c; d)").(*Binary).R.(*Binary).R.(*Call).Args[1].At(); pos != 13 {
		t.Errorf("d stands at %d, want 13 runes", pos)
	}
}

func TestEqualTellsApart(t *testing.T) {
	list := []string{"a", "b", "a'", "a(b)", "a_b", "0.3", "0.30", "[mm]", "[cm]", "−a", "a + b", "a − b", "a·b", "a/b", "b + a", "a^b", "sqrt(a)", "abs(a)",
		"max(a; b)", "max(a; b; c)", "Σ_i(a)", "Σ_j(a)", "min_i(a)", "cases(a < b: 1; otherwise: 2)", "cases(a ≤ b: 1; otherwise: 2)", "cases(a < b < c: 1; otherwise: 2)",
		"cases(a < b: 1; otherwise: 3)", "cases(a < b and a < c: 1; otherwise: 2)", "cases(a < b or a < c: 1; otherwise: 2)", "cases(a < b: 1; a < c: 1; otherwise: 2)"}
	for i, s := range list {
		for j, u := range list {
			a, err := ParseExpr(s)
			if err != nil {
				t.Fatal(err)
			}
			b, err := ParseExpr("  " + u)
			if err != nil {
				t.Fatal(err)
			}
			if Equal(a, b) != (i == j) {
				t.Errorf("%s equal to %s: %v", s, u, i != j)
			}
		}
	}
	if Equal(nil, nil) || EqualCond(nil, nil) {
		t.Error("no tree equals no tree")
	}
}

func TestSymbols(t *testing.T) {
	for _, c := range []struct {
		src, name, base, sub string
		primes               int
		arg                  string
		index                []string
	}{
		{"x", "x", "x", "", 0, "", nil},
		{"f_{ck}", "f_ck", "f", "ck", 0, "", nil},
		{"f_{p0,1k}", "f_{p0,1k}", "f", "p0,1k", 0, "", nil},
		{"A_{p, i}", "A_{p,i}", "A", "p,i", 0, "", []string{"i"}},
		{"γ_{G,j,n}", "γ_{G,j,n}", "γ", "G,j,n", 0, "", []string{"j", "n"}},
		{"d_i", "d_i", "d", "i", 0, "", []string{"i"}}, {"d_j", "d_j", "d", "j", 0, "", []string{"j"}}, {"d_n", "d_n", "d", "n", 0, "", nil}, {"x_m", "x_m", "x", "m", 0, "", nil}, {"r_{v,m}", "r_{v,m}", "r", "v,m", 0, "", []string{"m"}},
		{"d_{i,j}", "d_{i,j}", "d", "i,j", 0, "", []string{"i", "j"}}, {"d_{n,i}", "d_{n,i}", "d", "n,i", 0, "", []string{"i"}},
		{"d_{i,x}", "d_{i,x}", "d", "i,x", 0, "", nil}, {"d_{x,n}", "d_{x,n}", "d", "x,n", 0, "", []string{"n"}}, {"d_ij", "d_ij", "d", "ij", 0, "", nil},
		{"d_{p,i}''(t, t_0)", "d_{p,i}''(t,t_0)", "d", "p,i", 2, "t,t_0", []string{"i"}},
	} {
		s, err := ParseSymbol(c.src)
		if err != nil {
			t.Errorf("%s: %v", c.src, err)
			continue
		}
		if s.Name != c.name || s.Base != c.base || s.Sub != c.sub || s.Primes != c.primes || s.Arg != c.arg || !slices.Equal(s.Index, c.index) {
			t.Errorf("%s: have %+v, want %+v", c.src, s, c)
		}
	}
	for _, src := range []string{"", "2", "sqrt", "and", "x + y", "x_", "Σ_i", "min_i", "x)", "π²"} {
		if s, err := ParseSymbol(src); err == nil {
			t.Errorf("%q is read as the symbol %s", src, s.Name)
		}
	}
}

func TestParseErrors(t *testing.T) {
	for src, want := range map[string]string{
		"":                               "column 1: have end of formula, want a symbol",
		"x":                              "column 2: have end of formula, want =",
		"x =":                            "column 4: have end of formula, want a value",
		"x = a +":                        "column 8: have end of formula, want a value",
		"2 = x":                          "column 1: have 2, want a symbol",
		"max = 3":                        "column 1: max is a word of the notation, not a symbol",
		"x = (a":                         "column 7: have end of formula, want )",
		"x = a)":                         "column 6: ) without (",
		"x = 2 b":                        "column 7: no operator between two values: write 2·b",
		"x = 2b":                         "column 6: no operator between two values: write 2·b",
		"x = 50[MPa]":                    "column 7: no operator between two values: write 50·[MPa]",
		"x = 2(a + b)":                   "column 6: no operator between two values: write 2·(…)",
		"x = (a + b)(c)":                 "column 12: no operator between two values: write (a + b)·(…)",
		"x = a sqrt(b)":                  "column 7: no operator between two values: write a·sqrt(…)",
		"x = b_w d":                      "column 9: no operator between two values: write b_w·d",
		"x = (a < b) c":                  "column 13: have c behind a condition, want and, or, or the end",
		"x = a^b^c":                      "column 8: power of a power without brackets: write (a^b)^c or a^(b^c)",
		"x = a < b":                      "column 7: a condition stands where a value is wanted: <",
		"x = 1 + (a < b)":                "column 12: a condition stands where a value is wanted",
		"x = 0,5·a":                      "column 6: comma between digits: write a decimal point, or ; between two arguments",
		"x = max(0,5)":                   "column 10: comma between digits: write a decimal point, or ; between two arguments",
		"x = max(a, b; c)":               "column 13: both , and ; between arguments: write ; for all, and a decimal with a point",
		"x = A_p,i":                      "column 8: , outside the brackets of a function: a decimal takes a point, a subscript with a comma stands in braces, as A_{p,i}",
		"x = max(a)":                     "column 5: max with 1 of its arguments: want 2 to 100",
		"x = sqrt(a; b)":                 "column 5: sqrt with 2 of its arguments: want one",
		"x = sqrt a":                     "column 10: sqrt lacks its brackets: write sqrt(…)",
		"x = sqrt_a":                     "column 5: sqrt is a function, not a symbol: write sqrt(…)",
		"x = min_a(b)":                   "column 5: min is a function, not a symbol: write min(…)",
		"x = Σ(a)":                       "column 5: Σ lacks its index: write Σ_i(…), with i, j or n",
		"x = Σ_k(a)":                     "column 5: Σ lacks its index: write Σ_i(…), with i, j or n",
		"x = ΣM":                         "column 5: Σ in the symbol ΣM: write Σ_i(…) for a sum",
		"x = Σ_i(a + Σ_i(b))":            "column 13: Σ_i inside rows that run over i already",
		"x = cases(otherwise: 1)":        "column 5: cases has no condition: write the value alone",
		"x = cases(a < b: 1)":            "column 19: cases lacks its last arm: write ; otherwise: value",
		"x = cases(a: 1; otherwise: 2)":  "column 11: a value stands where a condition is wanted: write a relation, as x ≤ h",
		"x = cases(a < b; otherwise: 2)": "column 16: have ;, want :",
		"x = k1":                         "column 6: digit right behind k: write k_1",
		"x = f'_c":                       "column 7: _ behind the end of a symbol: the whole subscript stands in braces before primes, as f_{p0,1k}'",
		"x = a²":                         "column 6: raised ² is no sign of the notation: write ^ with the exponent",
		"x = a×b":                        "column 6: × is no sign of the notation: write ·",
		"x = √a":                         "column 5: √ is no sign of the notation: write sqrt(…)",
		"x = a – b":                      "column 7: – is a dash: write −",
		"x == a":                         "column 3: == is no relation: write =",
		"x = .5":                         "column 5: number begins with a point: write 0.5",
		"x = 5.":                         "column 5: number ends with a point: write 5",
		"x = 007":                        "column 5: number begins with a zero: 007",
		"x = 1e999":                      "column 5: number 1e999 is out of range",
		"x = 1e-999":                     "column 5: number 1e-999 is out of range",
		"x = [foo]":                      "column 5: unknown unit foo",
		"x = [Mpa]":                      "column 5: unknown unit Mpa: write MPa",
		"x = []":                         "column 5: no unit in brackets: write [mm], for a plain number 1",
		"x = [mm":                        "column 5: [ without ]",
		"x = f_{a":                       "column 6: { without }",
		"x = f_{}":                       "column 6: subscript {} has an empty part",
		"x = f_{a,,b}":                   "column 6: subscript {a,,b} has an empty part",
		"x = f()":                        "column 6: f() lacks its argument",
		"x = f(a":                        "column 6: ( without )",
		"x = f([mm])":                    "column 7: '[' cannot stand in the argument of a symbol: write f·(…) for a product",
		"x = a \xff":                     "column 1: formula is not text in UTF-8",
		"x = a ? b":                      "column 7: ? is no sign of the notation",
		"x = a\x00":                      "column 6: U+0000 is no sign of the notation",
	} {
		f, err := Parse(src)
		if err == nil {
			t.Errorf("%q is read as %s", src, f)
			continue
		}
		if err.Error() != want {
			t.Errorf("%q:\nhave %v\nwant %s", src, err, want)
		}
	}
	for _, src := range []string{"a", "a + b", "(a)", "a < b and c", "a <", "a < b c", "a ≠ b", "a < b or"} {
		if c, err := ParseCond(src); err == nil {
			t.Errorf("%q is read as the condition %s", src, PrintCond(c))
		}
	}
}

func TestBounds(t *testing.T) {
	const many = 100000
	for _, src := range []string{
		strings.Repeat("(", many), strings.Repeat("−", many) + "a", "a" + strings.Repeat(" + a", many), strings.Repeat("sqrt(", many), strings.Repeat("f(", many),
		strings.Repeat("(", 5000) + "a" + strings.Repeat(")", 5000), strings.Repeat("−", 5000) + "a", strings.Repeat("a^(", 200) + "a" + strings.Repeat(")", 200),
		strings.Repeat("cases(a<", 2000), strings.Repeat("Σ_i(", 2000), "[" + strings.Repeat("m·", 5000) + "m]", strings.Repeat("9", 5000), strings.Repeat("a", 9000),
		strings.Repeat("a+", 4000) + "a",
	} {
		n, err := ParseExpr(src)
		if err == nil {
			t.Errorf("%.20s… is read, %d characters printed", src, len(Print(n)))
		} else if len(err.Error()) > 600 {
			t.Errorf("%.20s…: message of %d bytes", src, len(err.Error()))
		}
	}
	deep := strings.Repeat("−(", maxNesting-1) + "−a" + strings.Repeat(")", maxNesting-1)
	long := strings.Repeat("a + ", 1990) + "a"
	for _, src := range []string{deep, long, strings.Repeat("(", 200) + "a" + strings.Repeat(")", 200), strings.Repeat("−", maxNesting+1) + "a"} {
		n, err := ParseExpr(src)
		if err != nil {
			t.Errorf("%.20s…: %v", src, err)
			continue
		}
		if again, err := ParseExpr(Print(n)); err != nil || !Equal(n, again) {
			t.Errorf("%.20s… after printing: %v", src, err)
		}
	}
}
