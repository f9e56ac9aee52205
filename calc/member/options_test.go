package member

import "soffit/calc/quantity"

// testOptions are a small selection of what a code of practice and a note give.
var testOptions = Options{
	NationalParameters: []ParameterSpec{
		{Key: "α_cc", Ascii: "alpha_cc", Min: 0.8, Max: 1},
		{Key: "γ_C", Ascii: "gamma_C", Min: 1, Max: 2},
		{Key: "γ_S", Ascii: "gamma_S", Min: 1, Max: 1.5},
		{Key: "γ_{G,sup}", Ascii: "gamma_G,sup", Min: 1, Max: 2},
		{Key: "γ_{G,inf}", Ascii: "gamma_G,inf", Min: 0.5, Max: 1},
		{Key: "γ_Q", Ascii: "gamma_Q", Min: 1, Max: 2},
		{Key: "ξ", Ascii: "xi", Min: 0.5, Max: 1},
		{Key: "k_ud", Ascii: "k_ud", Min: 0.1, Max: 1},
		{Key: "ψ", Ascii: "psi", Kind: Table, Max: 1, Rows: []string{"A", "B", "snow", "wind"}, Columns: 3},
		{Key: "A_{s,min}", Ascii: "A_s,min", Kind: Expression, Unit: "mm²", Symbols: map[string]quantity.Dim{
			"f_ctm": quantity.Stress, "f_yk": quantity.Stress, "b_t": quantity.Length, "d": quantity.Length}},
		{Key: "A_{s,max}", Ascii: "A_s,max", Kind: Expression, Unit: "mm²", Symbols: map[string]quantity.Dim{"A_c": quantity.Area}},
	},
	Products: []ProductSpec{
		{"Y1860S7-12.5", 12.5, 1860}, {"Y1860S7-12.9", 12.9, 1860}, {"Y1860S7-15.7", 15.7, 1860},
	},
	Narratives: []string{"verdict", "basis", "given", "ultimate"},
}
