package mechanics

import "soffit/calc/clause"

// Differences between a result and the same found by a second method (suffix 2).

func difference(id, name, symbol, second, first, unit string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Text: symbol + " = " + second + "/" + first + " − 1", Unit: "‰", Digits: 3,
		Domain:   first + " > 0·[" + unit + "]",
		Examples: hand("10.0 ‰", second+" = 1.01 "+unit, first+" = 1 "+unit)})
}

// Relative differences of section properties and resistance.
var (
	AreaDifference       = difference("area-difference", "Difference of the area", "δ_A", "A_{c,2}", "A_c", "mm²")
	CentroidDifference   = difference("centroid-difference", "Difference of the centroid", "δ_y", "y_{cg,2}", "y_cg", "mm")
	InertiaDifference    = difference("inertia-difference", "Difference of the second moment of area", "δ_I", "I_{c,2}", "I_c", "10⁶ mm⁴")
	ResistanceDifference = difference("resistance-difference", "Difference of the moment resistance", "δ_M", "M_{Rd,2}", "M_Rd", "kN·m")
)

// SumOfMoments is the moment of all loads, unfactored.
var SumOfMoments = clause.Define(&clause.Formula{
	ID: "sum-of-moments", Name: "Moment of all loads together, unfactored", Text: "M_Σ = Σ_i(M_i)", Unit: "kN·m", Digits: 6,
	Examples: hand("30 kN·m", "M_i = 10 kN·m, 20 kN·m"),
})

// MomentDifference compares the moments of both methods.
var MomentDifference = clause.Define(&clause.Formula{
	ID: "moment-difference", Name: "Difference of the moments", Text: "ΔM = M_2 − M_Σ", Unit: "kN·m", Digits: 1,
	Examples: hand("0.1 kN·m", "M_2 = 10.1 kN·m", "M_Σ = 10 kN·m"),
})

// Differences of section properties found corner by corner (suffix 3).
var (
	PolygonAreaDifference     = difference("polygon-area-difference", "Difference of the area corner by corner", "δ_A3", "A_{c,3}", "A_c", "mm²")
	PolygonCentroidDifference = difference("polygon-centroid-difference", "Difference of the centroid corner by corner", "δ_y3", "y_{cg,3}", "y_cg", "mm")
	PolygonInertiaDifference  = difference("polygon-inertia-difference", "Difference of the second moment of area corner by corner", "δ_I3", "I_{c,3}", "I_c", "10⁶ mm⁴")
)

// SectionMethodsAgree holds both second methods to the properties: corner by corner only rounding to the printed digits is
// left; level slices miss round and sloping edges by a little.
var SectionMethodsAgree = &clause.Condition{ID: "section-methods-agree", Name: "Properties by all methods",
	Text: "max(abs(δ_A3); abs(δ_y3); abs(δ_I3)) ≤ 0.03·[‰] and max(abs(δ_A); abs(δ_y); abs(δ_I)) ≤ 0.1·[‰]",
	Yes:  "they agree within 0.03 ‰ corner by corner and 0.1 ‰ by slices", No: "they differ by more than 0.03 ‰ corner by corner or 0.1 ‰ by slices: a fault of the program"}
