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
	ID: "part-area", Name: "Area of each part", Text: "A_{c,n} = (b_{u,n} + b_{o,n})/2·h_{c,n}", Unit: "mm²", Digits: 7,
	Examples: hand("12000 mm²", "b_{u,n} = 200 mm", "b_{o,n} = 100 mm", "h_{c,n} = 80 mm"),
})

// PartCentroid is the height of a part's centroid above the soffit.
var PartCentroid = clause.Define(&clause.Formula{
	ID: "part-centroid", Name: "Centroid of each part above the soffit",
	Text: "y_{c,n} = y_{u,n} + h_{c,n}·(b_{u,n} + 2·b_{o,n})/(3·(b_{u,n} + b_{o,n}))", Unit: "mm", Digits: 7,
	Examples: hand("40 mm", "y_{u,n} = 0 mm", "b_{u,n} = 200 mm", "b_{o,n} = 200 mm", "h_{c,n} = 80 mm"),
})

// PartInertia is the second moment of area of a part about its own centroid.
var PartInertia = clause.Define(&clause.Formula{
	ID: "part-inertia", Name: "Second moment of area of each part about its own centroid",
	Text: "I_{c,n} = h_{c,n}^3·(b_{u,n}^2 + 4·b_{u,n}·b_{o,n} + b_{o,n}^2)/(36·(b_{u,n} + b_{o,n}))", Unit: "10⁶ mm⁴", Digits: 7,
	Examples: hand("8.53333 10⁶ mm⁴", "b_{u,n} = 200 mm", "b_{o,n} = 200 mm", "h_{c,n} = 80 mm"),
})

// Girders of the appendix that the sums are held against, in inches: their parts from the soffit up.
const (
	girders = "PCI Journal, May–June 2021, appendix, type I beam: "
	larger  = "PCI Journal, May–June 2021, appendix, type II beam: "
	memory  = "; its parts from memory"
)

// Area and AreaWithVoids are the area of the section.
var (
	Area = clause.Define(&clause.Formula{
		ID: "area", Name: "Area of the concrete section", Text: "A_c = Σ_n(A_{c,n})", Unit: "mm²", Digits: 6,
		Examples: []clause.Example{by(girders+"276 (in²)"+memory, clause.Recalled, "276.00 mm²", "A_{c,n} = 80 mm², 55 mm², 66 mm², 27 mm², 48 mm²"),
			by(larger+"369 (in²)"+memory, clause.Recalled, "369.00 mm²", "A_{c,n} = 108 mm², 72 mm², 90 mm², 27 mm², 72 mm²")},
	})
	AreaWithVoids = clause.Define(&clause.Formula{
		ID: "area-with-voids", Name: "Area of the concrete section", Text: "A_c = Σ_n(A_{c,n}) − Σ_m(A_{v,m})", Unit: "mm²", Digits: 6,
		Examples: hand("211971 mm²", "A_{c,n} = 318000 mm²", "A_{v,m} = 106028.75 mm²"),
	})
)

// Centroid and CentroidWithVoids are the height of the centroid above the soffit.
var (
	Centroid = clause.Define(&clause.Formula{
		ID: "centroid", Name: "Centroid above the soffit", Text: "y_cg = Σ_n(A_{c,n}·y_{c,n})/A_c", Unit: "mm", Digits: 6,
		Examples: append(hand("150 mm", "A_{c,n} = 100 mm², 100 mm²", "y_{c,n} = 100 mm, 200 mm", "A_c = 200 mm²"),
			by(girders+"12.59 (in)"+memory, clause.Recalled, "12.59 mm", "A_{c,n} = 80 mm², 55 mm², 66 mm², 27 mm², 48 mm²", "y_{c,n} = 2.5 mm, 7.12121 mm, 15.5 mm, 22.66667 mm, 26 mm", "A_c = 276 mm²"),
			by(larger+"15.83 (in)"+memory, clause.Recalled, "15.83 mm", "A_{c,n} = 108 mm², 72 mm², 90 mm², 27 mm², 72 mm²", "y_{c,n} = 3 mm, 8.5 mm, 19.5 mm, 28.66667 mm, 33 mm", "A_c = 369 mm²")),
	})
	CentroidWithVoids = clause.Define(&clause.Formula{
		ID: "centroid-with-voids", Name: "Centroid above the soffit", Text: "y_cg = (Σ_n(A_{c,n}·y_{c,n}) − Σ_m(A_{v,m}·y_{vc,m}))/A_c", Unit: "mm", Digits: 6,
		Examples: hand("250 mm", "A_{c,n} = 300 mm²", "y_{c,n} = 200 mm", "A_{v,m} = 100 mm²", "y_{vc,m} = 100 mm", "A_c = 200 mm²"),
	})
)

// Inertia and InertiaWithVoids are the second moment of area about the level axis through the centroid.
var (
	Inertia = clause.Define(&clause.Formula{
		ID: "inertia", Name: "Second moment of area", Text: "I_c = Σ_n(I_{c,n} + A_{c,n}·(y_{c,n} − y_cg)^2)", Unit: "10⁶ mm⁴", Digits: 6,
		Examples: append(hand("10 10⁶ mm⁴", "A_{c,n} = 1000 mm², 1000 mm²", "y_{c,n} = 100 mm, 200 mm", "y_cg = 150 mm", "I_{c,n} = 2500000 mm⁴, 2500000 mm⁴"),
			by(girders+"22 744 (in⁴)"+memory, clause.Recalled, "0.022744 10⁶ mm⁴", "A_{c,n} = 80 mm², 55 mm², 66 mm², 27 mm², 48 mm²", "y_{c,n} = 2.5 mm, 7.12121 mm, 15.5 mm, 22.66667 mm, 26 mm",
				"y_cg = 12.5894 mm", "I_{c,n} = 166.667 mm⁴, 106.692 mm⁴, 665.5 mm⁴, 19.5 mm⁴, 64 mm⁴"),
			by(larger+"50 979 (in⁴)"+memory, clause.Recalled, "0.050979 10⁶ mm⁴", "A_{c,n} = 108 mm², 72 mm², 90 mm², 27 mm², 72 mm²", "y_{c,n} = 3 mm, 8.5 mm, 19.5 mm, 28.66667 mm, 33 mm",
				"y_cg = 15.8293 mm", "I_{c,n} = 324 mm⁴, 198 mm⁴, 1687.5 mm⁴, 19.5 mm⁴, 216 mm⁴")),
	})
	InertiaWithVoids = clause.Define(&clause.Formula{
		ID: "inertia-with-voids", Name: "Second moment of area", Text: "I_c = Σ_n(I_{c,n} + A_{c,n}·(y_{c,n} − y_cg)^2) − Σ_m(I_{v,m}) − Σ_m(A_{v,m}·(y_{vc,m} − y_cg)^2)", Unit: "10⁶ mm⁴", Digits: 6,
		Examples: hand("6 10⁶ mm⁴", "A_{c,n} = 1000 mm², 1000 mm²", "y_{c,n} = 100 mm, 200 mm", "y_cg = 150 mm", "I_{c,n} = 2500000 mm⁴, 2500000 mm⁴", "A_{v,m} = 100 mm²", "y_{vc,m} = 100 mm", "I_{v,m} = 3750000 mm⁴"),
	})
)

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

// SelfWeight is the weight of the member per length.
var SelfWeight = clause.Define(&clause.Formula{
	ID: "self-weight", Name: "Self-weight of the member per length", Text: "g_0 = γ_{conc}·A_c", Unit: "kN/m",
	Examples: hand("10.5 kN/m", "γ_{conc} = 25 kN/m³", "A_c = 420000 mm²"),
})

// NotionalSize is h_0.
var NotionalSize = clause.Define(&clause.Formula{
	ID: "notional-size", Name: "Notional size", Ref: clause.Ref{Document: "EN 1992-1-1", Clause: "3.1.4(5)"}, Text: "h_0 = 2·A_c/u", Unit: "mm", Digits: 5,
	Examples: hand("200 mm", "A_c = 180000 mm²", "u = 1800 mm"),
})
