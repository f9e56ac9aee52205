// Package mechanics holds the formulas that belong to no code: properties of a section, statics of a simple
// beam, sums of forces. They stand beside the clauses of calc/ec2 in the same form and are recorded the same
// way.
package mechanics

import "soffit/calc/clause"

// Section properties. The section is a stack of trapezoids n from the soffit up: height h_{c,n}, lower width
// b_{u,n}, upper width b_{o,n}, lower edge at y_{u,n} above the soffit.

func by(source string, grade clause.Grade, want string, given ...string) clause.Example {
	return clause.Example{Source: source, Grade: grade, Want: want, Given: given}
}

func hand(want string, given ...string) []clause.Example {
	return []clause.Example{by("worked by hand", clause.Own, want, given...)}
}

// PartArea is the area of a part.
var PartArea = clause.Define(&clause.Formula{
	ID: "part-area", Name: "Area of each part", Text: "A_{c,n} = (b_{u,n} + b_{o,n})/2·h_{c,n}", Unit: "mm²", Digits: 6,
	Examples: hand("12000 mm²", "b_{u,n} = 200 mm", "b_{o,n} = 100 mm", "h_{c,n} = 80 mm"),
})

// PartCentroid is the height of a part's centroid above the soffit.
var PartCentroid = clause.Define(&clause.Formula{
	ID: "part-centroid", Name: "Centroid of each part above the soffit",
	Text: "y_{c,n} = y_{u,n} + h_{c,n}·(b_{u,n} + 2·b_{o,n})/(3·(b_{u,n} + b_{o,n}))", Unit: "mm", Digits: 6,
	Examples: hand("40 mm", "y_{u,n} = 0 mm", "b_{u,n} = 200 mm", "b_{o,n} = 200 mm", "h_{c,n} = 80 mm"),
})

// PartInertia is the second moment of area of a part about its own centroid.
var PartInertia = clause.Define(&clause.Formula{
	ID: "part-inertia", Name: "Second moment of area of each part about its own centroid",
	Text: "I_{c,n} = h_{c,n}^3·(b_{u,n}^2 + 4·b_{u,n}·b_{o,n} + b_{o,n}^2)/(36·(b_{u,n} + b_{o,n}))", Unit: "10⁶ mm⁴", Digits: 6,
	Examples: hand("8.53333 10⁶ mm⁴", "b_{u,n} = 200 mm", "b_{o,n} = 200 mm", "h_{c,n} = 80 mm"),
})

// Area is the area of the section.
var Area = clause.Define(&clause.Formula{
	ID: "area", Name: "Area of the concrete section", Text: "A_c = Σ_n(A_{c,n})", Unit: "mm²", Digits: 6,
	Examples: []clause.Example{by("PCI Journal, May–June 2021, appendix, type I beam: 276 (in²); its parts from memory", clause.Recalled, "276.00 mm²",
		"A_{c,n} = 80 mm², 55 mm², 66 mm², 27 mm², 48 mm²")},
})

// Centroid is the height of the centroid above the soffit.
var Centroid = clause.Define(&clause.Formula{
	ID: "centroid", Name: "Centroid above the soffit", Text: "y_cg = Σ_n(A_{c,n}·y_{c,n})/A_c", Unit: "mm", Digits: 6,
	Examples: hand("150 mm", "A_{c,n} = 100 mm², 100 mm²", "y_{c,n} = 100 mm, 200 mm", "A_c = 200 mm²"),
})

// Inertia is the second moment of area.
var Inertia = clause.Define(&clause.Formula{
	ID: "inertia", Name: "Second moment of area", Text: "I_c = Σ_n(I_{c,n} + A_{c,n}·(y_{c,n} − y_cg)^2)", Unit: "10⁶ mm⁴", Digits: 6,
	Examples: hand("10 10⁶ mm⁴", "A_{c,n} = 1000 mm², 1000 mm²", "y_{c,n} = 100 mm, 200 mm", "y_cg = 150 mm", "I_{c,n} = 2500000 mm⁴, 2500000 mm⁴"),
})

// LowerModulus is the section modulus of the bottom fibre.
var LowerModulus = clause.Define(&clause.Formula{
	ID: "lower-modulus", Name: "Section modulus, bottom fibre", Text: "W_b = I_c/y_cg", Unit: "10³ mm³", Digits: 6,
	Examples: hand("100.000 10³ mm³", "I_c = 10 10⁶ mm⁴", "y_cg = 100 mm"),
})

// UpperModulus is the section modulus of the top fibre.
var UpperModulus = clause.Define(&clause.Formula{
	ID: "upper-modulus", Name: "Section modulus, top fibre", Text: "W_t = I_c/(h − y_cg)", Unit: "10³ mm³", Digits: 6,
	Examples: hand("50.000 10³ mm³", "I_c = 10 10⁶ mm⁴", "y_cg = 100 mm", "h = 300 mm"),
})

// Eccentricity is the distance of a tendon row below the centroid.
var Eccentricity = clause.Define(&clause.Formula{
	ID: "eccentricity", Name: "Eccentricity of each row, below the centroid positive", Text: "e_i = y_cg − y_{p,i}", Unit: "mm", Digits: 6,
	Examples: hand("440 mm", "y_cg = 500 mm", "y_{p,i} = 60 mm"),
})

// TendonDepth is the depth of a tendon row from the top.
var TendonDepth = clause.Define(&clause.Formula{
	ID: "tendon-depth", Name: "Depth of each row from the top", Text: "d_{p,i} = h − y_{p,i}", Unit: "mm", Digits: 6,
	Examples: hand("1140 mm", "h = 1200 mm", "y_{p,i} = 60 mm"),
})

// BarDepth is the depth of a bar row from the top.
var BarDepth = clause.Define(&clause.Formula{
	ID: "bar-depth", Name: "Depth of each row from the top", Text: "d_{s,j} = h − y_{s,j}", Unit: "mm", Digits: 6,
	Examples: hand("550 mm", "h = 600 mm", "y_{s,j} = 50 mm"),
})

// SelfWeight is the weight of the member per length.
var SelfWeight = clause.Define(&clause.Formula{
	ID: "self-weight", Name: "Self-weight of the member per length", Text: "g_0 = γ_{conc}·A_c", Unit: "kN/m",
	Examples: hand("10.5 kN/m", "γ_{conc} = 25 kN/m³", "A_c = 420000 mm²"),
})

// FlangeOverhang is the width of the top part beyond the web on one side.
var FlangeOverhang = clause.Define(&clause.Formula{
	ID: "flange-overhang", Name: "Overhang of the flange on each side", Text: "b_1 = (b_f − b_w)/2", Unit: "mm", Digits: 6,
	Examples: hand("450 mm", "b_f = 1200 mm", "b_w = 300 mm"),
})
