package ec2

import (
	"soffit/calc/clause"
	"soffit/calc/quantity"
)

// Parameter is a nationally determined parameter with the value that the standard recommends: a number, an
// expression (Formula) or a table. Each can be replaced in the member file, with a source.
type Parameter struct {
	Given    clause.Given
	ASCII    string // spelling for the member file without Greek letters
	Value    string // recommended number, with unit; "" for an expression or a table
	Min, Max float64
	Formula  *clause.Formula         // recommended expression
	Symbols  map[string]quantity.Dim // what a replacing expression may use
	Rows     []string                // of a table
	Table    [][]string              // recommended numbers, row by row
}

func number(id, symbol, ascii, name, value string, lo, hi float64, ref clause.Ref) Parameter {
	l, err := quantity.Parse(value)
	if err != nil {
		panic("ec2: " + err.Error())
	}
	return Parameter{Given: clause.Given{ID: id, Symbol: symbol, Name: name, Unit: l.Unit.String(), Ref: ref}, ASCII: ascii, Value: value, Min: lo, Max: hi}
}

// Parameters are the national parameters in use, in the order in which the note lists them.
var Parameters = []Parameter{
	number("partial-factor-concrete", "γ_C", "gamma_C", "Partial factor for concrete", "1.5", 1, 2, en("2.4.2.4 Table 2.1N", "")),
	number("partial-factor-steel", "γ_S", "gamma_S", "Partial factor for reinforcing and prestressing steel", "1.15", 1, 1.5, en("2.4.2.4 Table 2.1N", "")),
	number("long-term-compression", "α_cc", "alpha_cc", "Coefficient for long-term effects on the compressive strength", "1.0", 0.8, 1, en("3.1.6(1)P", "")),
	number("long-term-tension", "α_ct", "alpha_ct", "Coefficient for long-term effects on the tensile strength", "1.0", 0.7, 1, en("3.1.6(2)P", "")),
	number("plain-tension", "α_{ct,pl}", "alpha_ct,pl", "Coefficient on the tensile strength of plain concrete", "0.8", 0.5, 1, en("12.3.1(1)", "")),
	number("partial-factor-prestress", "γ_P", "gamma_P,fav", "Partial factor for prestress, favourable", "1.0", 0.8, 1.1, en("2.4.2.2(1)", "")),
	number("strain-limit-ratio", "k_ud", "k_ud", "Ratio ε_ud/ε_uk of the inclined branch", "0.9", 0.1, 1, en("3.2.7(2), 3.3.6(7)", "")),
	number("jacking-limit-tensile", "k_1", "k_1", "Limit of the stress at jacking, part of f_pk", "0.8", 0.5, 0.95, en("5.10.2.1(1)P", "")),
	number("jacking-limit-proof", "k_2", "k_2", "Limit of the stress at jacking, part of f_p0,1k", "0.9", 0.5, 0.95, en("5.10.2.1(1)P", "")),
	number("release-limit-tensile", "k_7", "k_7", "Limit of the stress after release, part of f_pk", "0.75", 0.5, 0.95, en("5.10.3(2)", "")),
	number("release-limit-proof", "k_8", "k_8", "Limit of the stress after release, part of f_p0,1k", "0.85", 0.5, 0.95, en("5.10.3(2)", "")),
	number("strut-limit", "c_θ", "c_theta", "Largest cot θ of the struts allowed, which adds the most tension", "2.5", 1, 4, en("6.2.3(2)", "6.7N")),
	number("permanent-upper", "γ_{G,sup}", "gamma_G,sup", "Partial factor for permanent actions, unfavourable", "1.35", 1, 2, en1990("Table A1.2(B)", "")),
	number("permanent-lower", "γ_{G,inf}", "gamma_G,inf", "Partial factor for permanent actions, favourable", "1.0", 0.5, 1, en1990("Table A1.2(B)", "")),
	number("variable-upper", "γ_Q", "gamma_Q", "Partial factor for variable actions, unfavourable (favourable: 0)", "1.5", 1, 2, en1990("Table A1.2(B)", "")),
	number("permanent-reduction-factor", "ξ", "xi", "Reduction factor for permanent actions in 6.10b", "0.85", 0.5, 1, en1990("Table A1.2(B)", "6.10b")),
	number("equilibrium-stabilising", "γ_{G,stb}", "gamma_G,stb", "Partial factor for permanent actions that stabilise, static equilibrium", "0.9", 0.5, 1, en1990("Table A1.2(A)", "")),
	number("equilibrium-destabilising", "γ_{G,dst}", "gamma_G,dst", "Partial factor for permanent actions that destabilise, static equilibrium", "1.1", 1, 2, en1990("Table A1.2(A)", "")),
	number("equilibrium-variable", "γ_{Q,dst}", "gamma_Q,dst", "Partial factor for variable actions that destabilise, static equilibrium", "1.5", 1, 2, en1990("Table A1.2(A)", "")),
	number("construction-combination", "ψ_{0,con}", "psi_0,con", "Combination factor ψ₀ of construction loads", "1.0", 0.6, 1, en1991("A1.1(1)", "")),
	{Given: clause.Given{ID: "combination-factors", Symbol: "ψ", Name: "Combination factors ψ₀, ψ₁, ψ₂ by category", Ref: en1990("Table A1.1", "")},
		ASCII: "psi", Rows: Categories, Table: combinationFactors},
	{Given: clause.Given{ID: MinimumSteel.ID, Symbol: "A_{s,min}", Name: MinimumSteel.Name, Unit: MinimumSteel.Unit, Ref: MinimumSteel.Ref},
		ASCII: "A_s,min", Min: 1, Max: 1e6, Formula: MinimumSteel, Symbols: map[string]quantity.Dim{"f_ctm": quantity.Stress, "f_yk": quantity.Stress,
			"f_ck": quantity.Stress, "b_t": quantity.Length, "d": quantity.Length}},
	{Given: clause.Given{ID: MaximumSteel.ID, Symbol: "A_{s,max}", Name: MaximumSteel.Name, Unit: MaximumSteel.Unit, Ref: MaximumSteel.Ref},
		ASCII: "A_s,max", Min: 1, Max: 1e7, Formula: MaximumSteel, Symbols: map[string]quantity.Dim{"A_c": quantity.Area}},
}

// Categories are the categories of variable actions, EN 1990 Table A1.1.
var Categories = []string{"A", "B", "C", "D", "E", "F", "G", "H", "snow Nordic", "snow above 1000 m", "snow up to 1000 m", "wind", "temperature"}

// combinationFactors are ψ₀, ψ₁, ψ₂ of each category; recalled.
var combinationFactors = [][]string{
	{"0.7", "0.5", "0.3"}, {"0.7", "0.5", "0.3"}, {"0.7", "0.7", "0.6"}, {"0.7", "0.7", "0.6"}, {"1.0", "0.9", "0.8"},
	{"0.7", "0.7", "0.6"}, {"0.7", "0.5", "0.3"}, {"0", "0", "0"}, {"0.7", "0.5", "0.2"}, {"0.7", "0.5", "0.2"},
	{"0.5", "0.2", "0"}, {"0.6", "0.2", "0"}, {"0.6", "0.5", "0"},
}
