package formula

import (
	"fmt"
	"testing"

	"soffit/calc/quantity"
)

var sampleDims = map[string]quantity.Dim{
	"F": quantity.Force, "M": quantity.Moment, "l": quantity.Length, "A_i": quantity.Area, "f_ck": quantity.Stress, "f_ctm": quantity.Stress,
	"x": quantity.None, "λ": quantity.None, "t": quantity.Time, "θ": quantity.None,
}

func sampleDim(s *Symbol) (quantity.Dim, error) {
	d, ok := sampleDims[s.Name]
	if !ok {
		var known []string
		for k := range sampleDims {
			known = append(known, k)
		}
		return d, fmt.Errorf("%s", Unknown(s.Name, known))
	}
	return d, nil
}

func TestCheck(t *testing.T) {
	for src, want := range map[string]string{
		"0.30·(f_ck/[MPa])^(2/3)·[MPa]":      "stress",
		"F·l/2 + M":                          "moment",
		"2.12·ln(1 + f_ck/(10·[MPa]))·[MPa]": "stress",
		"sqrt(f_ck·f_ctm)":                   "stress",
		"sqrt(l)^2":                          "length",
		"f_ck^0.5·f_ck^(1/2)":                "stress",
		"f_ck^(−1)·F":                        "area",
		"f_ck^−0.25·f_ck^1.25":               "stress",
		"f_ck^(−2/4)":                        "length/force^(1/2)",
		"x^x·exp(−x)":                        "plain number",
		"x^(λ/3 + 1)":                        "plain number",
		"Σ_i(A_i·f_ck)":                      "force",
		"max_i(A_i) − min(A_i; l^2)":         "area",
		"max(0; F)":                          "force",
		"min(F; 0)":                          "force",
		"0 + F":                              "force",
		"F − 0":                              "force",
		"max(0; 0)":                          "plain number",
		"cases(F > 0: F; 0 < l: 0; otherwise: 2·F)":               "force",
		"cases(x ≤ 1 and (l = 0 or t > 28·[d]): 0; otherwise: M)": "moment",
		"F·cot(θ)·sin(π/4)":                                       "force",
		"abs(−F)":                                                 "force",
		"π·l^2/4":                                                 "area",
		"λ·x":                                                     "plain number",
		"[kN]/[m]":                                                "line load",
		"t/(t + 4·sqrt(l^3/[mm^3])·[d])":                          "plain number",
		"F + l":                                                   "column 5: cannot add a length (l) to a force (F)",
		"F − 2·l":                                                 "column 5: cannot subtract a length (2·l) from a force (F)",
		"(l·2)·F + F":                                             "column 11: cannot add a force (F) to a moment (l·2·F)",
		"F + 0·[m]":                                               "column 5: cannot add a length (0·[m]) to a force (F)",
		"F + (0 + 0)":                                             "column 6: cannot add a plain number (0 + 0) to a force (F)",
		"F·(1 + l)":                                               "column 8: cannot add a length (l) to a plain number (1)",
		"max(0; F; l)":                                            "column 11: max of a force (F) and a length (l)",
		"cases(F < l: 1; otherwise: 2)":                           "column 11: cannot compare a force (F) with a length (l)",
		"cases(0 < F ≤ x: 1; otherwise: 2)":                       "column 15: cannot compare a force (F) with a plain number (x)",
		"cases(x < 1: F; otherwise: 2)":                           "column 28: the arms of cases are a force (F) and a plain number (2)",
		"cases(x < 1: 1; otherwise: ln(l))":                       "column 31: ln of a length (l): want a plain number",
		"cases(x < 1 and F < l: 1; otherwise: 2)":                 "column 21: cannot compare a force (F) with a length (l)",
		"F^x":                   "column 3: a force (F) needs a rational number in digits as its exponent, as 2 or (2/3), not x",
		"F^(1/0)":               "column 4: a force (F) needs a rational number in digits as its exponent, as 2 or (2/3), not 1/0",
		"F^1e3":                 "column 3: a force (F) needs a rational number in digits as its exponent, as 2 or (2/3), not 1e3",
		"F^(1 + 1)":             "column 4: a force (F) needs a rational number in digits as its exponent, as 2 or (2/3), not 1 + 1",
		"x^(l + l)":             "column 4: the exponent of a plain number (x) is a length (l + l)",
		"exp(l·2)":              "column 5: exp of a length (l·2): want a plain number",
		"sin(F)":                "column 5: sin of a force (F): want a plain number",
		"((F^999999)^999999)^9": "column 12: power of a dimension out of range in (F^999999)^999999",
		"λx + 1":                "column 1: unknown symbol λx: write λ·x",
		"1 + l·(F + lF)":        "column 12: unknown symbol lF: write l·F",
		"fck + f_ctm":           "column 1: unknown symbol fck: write f_ck",
		"(l + l + l + l + l + l + l + l + l + l + l + l + l + l + l + l) + x": "column 67: cannot add a plain number (x) to a length (l + l + l + l + l + l + l + l + l + l + l + l + l + l + l + …)",
	} {
		n, err := ParseExpr(src)
		if err != nil {
			t.Errorf("%s: %v", src, err)
			continue
		}
		d, err := Check(n, sampleDim)
		got := d.String()
		if err != nil {
			got = err.Error()
			if _, ok := err.(*Error); !ok {
				t.Errorf("%s: error is a %T", src, err)
			}
		}
		if got != want {
			t.Errorf("%s\nhave %s\nwant %s", src, got, want)
		}
	}
}

func TestCheckCond(t *testing.T) {
	for src, want := range map[string]string{
		"λ·l ≤ 0":              "",
		"0 < F and F ≤ 2·F":    "",
		"F ≤ l or x < 1":       "column 5: cannot compare a force (F) with a length (l)",
		"x < 1 or M = F":       "column 14: cannot compare a moment (M) with a force (F)",
		"x < 1 and 2 = 3 < λl": "column 19: unknown symbol λl: write λ·l",
	} {
		c, err := ParseCond(src)
		if err != nil {
			t.Fatal(err)
		}
		got := ""
		if err := CheckCond(c, sampleDim); err != nil {
			got = err.Error()
		}
		if got != want {
			t.Errorf("%s\nhave %s\nwant %s", src, got, want)
		}
	}
	if _, err := Check(nil, sampleDim); err == nil {
		t.Error("no tree has a dimension")
	}
	if CheckCond(nil, sampleDim) == nil {
		t.Error("no condition is sound")
	}
}

func TestUnknown(t *testing.T) {
	known := []string{"λ", "x", "d_p", "b_w", "f_ck", "f_{p0,1k}", "α_cc", "γ_C", "ε_cu2", "A_{p,i}", "M_Rd", "N"}
	for name, want := range map[string]string{
		"λx":           "unknown symbol λx: write λ·x",
		"λxd_p":        "unknown symbol λxd_p: write λ·x·d_p",
		"xb_w":         "unknown symbol xb_w: write x·b_w",
		"x(λ+1)":       "unknown symbol x(λ+1): write x·(λ+1)",
		"λx(N)":        "unknown symbol λx(N): write λ·x·(N)",
		"fck":          "unknown symbol fck: write f_ck",
		"f_cK":         "unknown symbol f_cK: write f_ck",
		"f_p01k":       "unknown symbol f_p01k: write f_{p0,1k}",
		"alpha_cc":     "unknown symbol alpha_cc: write α_cc",
		"gamma_c":      "unknown symbol gamma_c: write γ_C",
		"ϵ_cu2":        "unknown symbol ϵ_cu2: write ε_cu2",
		"ε_cu3":        "unknown symbol ε_cu3: write ε_cu2",
		"M_Rk":         "unknown symbol M_Rk: write M_Rd",
		"M_rd":         "unknown symbol M_rd: write M_Rd",
		"A_pi":         "unknown symbol A_pi: write A_{p,i}",
		"q":            "unknown symbol q",
		"Q_k(t)":       "unknown symbol Q_k(t)",
		"σ_{c,QP}":     "unknown symbol σ_{c,QP}",
		"":             "unknown symbol ",
		"λxxxxxxxxxxx": "unknown symbol λxxxxxxxxxxx",
	} {
		if got := Unknown(name, known); got != want {
			t.Errorf("have %s, want %s", got, want)
		}
	}
	if got := Unknown("x", nil); got != "unknown symbol x" {
		t.Errorf("nothing known: %s", got)
	}
}
