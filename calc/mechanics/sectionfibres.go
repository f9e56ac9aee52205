package mechanics

import "soffit/calc/clause"

// Fibres m of the concrete, of area A_{f,m} with their centroids at y_{f,m} above the soffit, held against the section.

// The whole area and its first moment about the soffit, with a topping and without, against those of the fibres.
var (
	FibreAreaDifference              = ofFibres("fibre-area-difference", "Area of the fibres against that of the section", "δ_Af", "Σ_m(A_{f,m})", "A_c", "10.0 ‰", "A_{f,m} = 500 mm², 510 mm²", "A_c = 1000 mm²")
	FibreMomentDifference            = ofFibres("fibre-moment-difference", "First moment of the fibres about the soffit against that of the section", "δ_Sf", "Σ_m(A_{f,m}·y_{f,m})", "(A_c·y_cg)", "10.0 ‰", "A_{f,m} = 500 mm², 510 mm²", "y_{f,m} = 100 mm, 100 mm", "A_c = 1000 mm²", "y_cg = 100 mm")
	FibreAreaDifferenceWithTopping   = ofFibres("fibre-area-difference-with-topping", "Area of the fibres against that of member and topping", "δ_Af", "Σ_m(A_{f,m})", "(A_c + b_top·h_top)", "10.0 ‰", "A_{f,m} = 500 mm², 510 mm²", "A_c = 600 mm²", "b_top = 40 mm", "h_top = 10 mm")
	FibreMomentDifferenceWithTopping = ofFibres("fibre-moment-difference-with-topping", "First moment of the fibres about the soffit against that of member and topping", "δ_Sf", "Σ_m(A_{f,m}·y_{f,m})", "(A_c·y_cg + b_top·h_top·(h + h_top/2))", "10.0 ‰",
		"A_{f,m} = 500 mm², 510 mm²", "y_{f,m} = 40 mm, 40 mm", "A_c = 600 mm²", "y_cg = 30 mm", "b_top = 40 mm", "h_top = 10 mm", "h = 50 mm")
)

func ofFibres(id, name, symbol, fibres, section, want string, given ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Text: symbol + " = " + fibres + "/" + section + " − 1", Unit: "‰", Digits: 3, Examples: hand(want, given...)})
}

// FibresComplete holds the fibres to the section within 0.02 ‰: what rounding to the printed digits leaves.
var FibresComplete = &clause.Condition{ID: "fibres-complete", Name: "Fibres and section", Text: "max(abs(δ_Af); abs(δ_Sf)) ≤ 0.02·[‰]",
	Yes: "the fibres make up the section", No: "the fibres do not make up the section"}
