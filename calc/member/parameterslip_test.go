package member_test

import (
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
)

// TestParameterSlips: a key that is the beginning of several parameters names all of them, in the spelling in which it was
// written; one of a table names the table; any other the nearest.
func TestParameterSlips(t *testing.T) {
	for key, want := range map[string]string{
		"γ_G":       "write γ_{G,sup}, γ_{G,inf}, γ_{G,stb} or γ_{G,dst}",
		"γ_{G":      "write γ_{G,sup}, γ_{G,inf}, γ_{G,stb} or γ_{G,dst}",
		"gamma_G":   "write gamma_G,sup, gamma_G,inf, gamma_G,stb or gamma_G,dst",
		"gamma_g":   "write gamma_G,sup, gamma_G,inf, gamma_G,stb or gamma_G,dst",
		"psi_0":     "write psi_0,con or psi",
		"ψ_0":       "write ψ_{0,con} or ψ",
		"ψ_1":       "write ψ",
		"gamma_P":   "write gamma_P,fav",
		"A_s":       "write A_{s,min} or A_{s,max}",
		"gamma_D":   "write gamma_C",
		"alfa_cc":   "write alpha_cc",
		"γ_{G,sop}": "write γ_{G,sup}",
	} {
		src := "format: soffit/1\nbasis:\n  national parameters:\n    \"" + key + "\": {value: 1.2, source: annex}\n"
		_, found := member.Read("slip.yaml", []byte(src), design.Options())
		hint := ""
		for _, f := range found {
			if f.Msg == key+": unknown national parameter" {
				hint = f.Hint
			}
		}
		if hint != want {
			t.Errorf("%s: %q, want %q", key, hint, want)
		}
	}
}
