package formula

import "testing"

func BenchmarkEval(b *testing.B) {
	for _, c := range []struct{ name, src string }{
		{"product", "α_cc·f_ck/γ_C"},
		{"power", "0.30·(f_ck/[MPa])^(2/3)·[MPa]"},
		{"cases", "cases(s_i ≤ l_{pt2,i}: σ_{pt,i}; s_i < l_{bpd,i}: σ_{pm∞,i} + (σ_{pd,i} − σ_{pm∞,i})·(s_i − l_{pt2,i})/(l_{bpd,i} − l_{pt2,i}); otherwise: σ_{pd,i})"},
		{"rows", "Σ_i(F_{p,i}·(d_{p,i} − λ·x/2))"},
	} {
		n, err := ParseExpr(c.src)
		if err != nil {
			b.Fatal(err)
		}
		p := Compile(n)
		f := &still{1, 40, 1.5, 0.8, 2, 3, 5}
		b.Run(c.name, func(b *testing.B) {
			b.ReportAllocs()
			for b.Loop() {
				if _, err := p.Eval(f); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}

func BenchmarkParse(b *testing.B) {
	b.ReportAllocs()
	for b.Loop() {
		if _, err := Parse("f_ctm = cases(f_ck ≤ 50·[MPa]: 0.30·(f_ck/[MPa])^(2/3)·[MPa]; otherwise: 2.12·ln(1 + f_cm/(10·[MPa]))·[MPa])"); err != nil {
			b.Fatal(err)
		}
	}
}

func BenchmarkCompile(b *testing.B) {
	n, _ := ParseExpr("Σ_i(F_{p,i}·(d_{p,i} − λ·x/2))")
	b.ReportAllocs()
	for b.Loop() {
		Compile(n)
	}
}
