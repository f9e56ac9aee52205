package ec2

import "soffit/calc/clause"

// Minimum and maximum steel, 9.2.1.1, and failure with warning, 5.10.1(5)P and (6).

// TensionPartDepth is the depth of each part below the centroid.
var TensionPartDepth = clause.Define(&clause.Formula{
	ID: "tension-part-depth", Name: "Depth of each part below the centroid", Text: "c_{t,n} = max(0; min(h_{c,n}; y_s − y_{u,n}))", Unit: "mm", Digits: 6,
	Examples: hand("300 mm", "h_{c,n} = 700 mm", "y_s = 500 mm", "y_{u,n} = 200 mm"),
})

// TensionPartArea is the area of each part below the centroid.
var TensionPartArea = clause.Define(&clause.Formula{
	ID: "tension-part-area", Name: "Area of each part below the centroid",
	Text: "A_{ct,n} = c_{t,n}·(b_{u,n} + (b_{o,n} − b_{u,n})·c_{t,n}/(2·h_{c,n}))", Unit: "mm²", Digits: 7,
	Examples: hand("42000 mm²", "c_{t,n} = 300 mm", "b_{u,n} = 140 mm", "b_{o,n} = 140 mm", "h_{c,n} = 700 mm"),
})

// TensionWidth is b_t.
var TensionWidth = clause.Define(&clause.Formula{
	ID: "tension-width", Name: "Mean width of the tension zone, below the centroid", Ref: en("9.2.1.1(1)", ""),
	Text: "b_t = Σ_n(A_{ct,n})/y_s", Unit: "mm",
	Examples: hand("204 mm", "A_{ct,n} = 60000 mm², 42000 mm²", "y_s = 500 mm"),
})

// MinimumSteel is A_s,min, a national parameter.
var MinimumSteel = clause.Define(&clause.Formula{
	ID: "minimum-steel", Name: "Minimum area of longitudinal steel in tension", Ref: en("9.2.1.1(1)", "9.1N"),
	Text: "A_{s,min} = max(0.26·f_ctm/f_yk·b_t·d; 0.0013·b_t·d)", Unit: "mm²",
	Examples: []clause.Example{
		by("Concrete Centre table of 9.1N: 0.15 % at C30, f_yk 500 (f_ctm 2.9 MPa)", clause.Recalled, "151 mm²", "f_ctm = 2.9 MPa", "f_yk = 500 MPa", "b_t = 100 mm", "d = 1000 mm"),
		by("Concrete Centre table of 9.1N: 0.13 % at C25", clause.Recalled, "133 mm²", "f_ctm = 2.56 MPa", "f_yk = 500 MPa", "b_t = 100 mm", "d = 1000 mm"),
	},
})

// TensionSteel is the steel counted, with bars.
var TensionSteelWithBars = clause.Define(&clause.Formula{
	ID: "tension-steel-with-bars", Name: "Steel counted: bars below the centroid, and tendons there by their strength left above the prestress (common practice, no source)",
	Ref: en("9.2.1.1(1)", ""),
	Text: "A_{s,prov} = Σ_j(cases(d_j > h − y_s: A_{s,j}; otherwise: 0·[mm²])) + " +
		"Σ_i(cases(e_i > 0·[mm]: A_{p,i}·(f_{p0,1k,i} − σ_{pm∞,i})/f_yk; otherwise: 0·[mm²]))", Unit: "mm²",
	Examples: hand("1900.9 mm²", "d_j = 550 mm", "h = 600 mm", "y_s = 300 mm", "A_{s,j} = 800 mm²", "e_i = 200 mm", "A_{p,i} = 1112 mm²",
		"f_{p0,1k,i} = 1640 MPa", "σ_{pm∞,i} = 1145 MPa", "f_yk = 500 MPa"),
})

// TensionSteel is the steel counted, tendons only.
var TensionSteel = clause.Define(&clause.Formula{
	ID: "tension-steel", Name: "Steel counted: tendons below the centroid by their strength left above the prestress (common practice, no source)",
	Ref:  en("9.2.1.1(1)", ""),
	Text: "A_{s,prov} = Σ_i(cases(e_i > 0·[mm]: A_{p,i}·(f_{p0,1k,i} − σ_{pm∞,i})/f_yk; otherwise: 0·[mm²]))", Unit: "mm²",
	Examples: hand("1100.9 mm²", "e_i = 200 mm", "A_{p,i} = 1112 mm²", "f_{p0,1k,i} = 1640 MPa", "σ_{pm∞,i} = 1145 MPa", "f_yk = 500 MPa"),
})

// MinimumSteelProvided is A_s,min ≤ A_s,prov.
var MinimumSteelProvided = &clause.Check{ID: "minimum-steel-provided", Name: "Minimum steel in tension", Ref: en("9.2.1.1(1)", "9.1N"),
	Demand: "A_{s,min}", Limit: "A_{s,prov}"}

// MaximumSteel is A_s,max, a national parameter.
var MaximumSteel = clause.Define(&clause.Formula{
	ID: "maximum-steel", Name: "Maximum area of longitudinal steel", Ref: en("9.2.1.1(3)", ""), Text: "A_{s,max} = 0.04·A_c", Unit: "mm²",
	Examples: hand("16800 mm²", "A_c = 420000 mm²"),
})

// TotalSteel and TotalSteelWithBars are the whole steel of the section.
var TotalSteelWithBars, TotalSteel = steelSums(
	&clause.Formula{ID: "total-steel-with-bars", Name: "Longitudinal steel of the section", Text: "A_{s,tot} = Σ_i(A_{p,i}) + Σ_j(A_{s,j})", Unit: "mm²",
		Examples: hand("1912 mm²", "A_{p,i} = 1112 mm²", "A_{s,j} = 800 mm²")},
	&clause.Formula{ID: "total-steel", Name: "Longitudinal steel of the section", Text: "A_{s,tot} = Σ_i(A_{p,i})", Unit: "mm²",
		Examples: hand("1668 mm²", "A_{p,i} = 1112 mm², 556 mm²")})

// MaximumSteelKept is A_s,tot ≤ A_s,max.
var MaximumSteelKept = &clause.Check{ID: "maximum-steel-kept", Name: "Maximum steel", Ref: en("9.2.1.1(3)", ""), Demand: "A_{s,tot}", Limit: "A_{s,max}"}

// CrackingMoment is M_cr.
var CrackingMoment = clause.Define(&clause.Formula{
	ID: "cracking-moment", Name: "Cracking moment, bottom fibre at f_ctm", Ref: en("7.1(2)", ""),
	Text: "M_cr = (f_ctm + P_d/A_c)·W_b + M_P", Unit: "kN·m",
	Examples: hand("1210.5 kN·m", "f_ctm = 4.0716 MPa", "P_d = 1273.2 kN", "A_c = 420000 mm²", "W_b = 91532 10³ mm³", "M_P = 560.35 kN·m"),
})

// FailureWithWarning is M_cr ≤ M_Rd.
var FailureWithWarning = &clause.Check{ID: "failure-with-warning", Name: "No brittle failure: the section cracks before it fails", Ref: en("5.10.1(6) method A", ""),
	Demand: "M_cr", Limit: "M_Rd"}

// OverhangStress is the tension at the top over a bearing.
var OverhangStress = clause.Define(&clause.Formula{
	ID: "hogging-stress", Name: "Tension at the top from the hogging moment, section uncracked, prestress not counted", Ref: en("12.6.1", ""),
	Text: "σ_ct = −M_{Ed,min}/W_t", Unit: "MPa", Digits: 3,
	Examples: hand("0.002 MPa", "M_{Ed,min} = -0.16 kN·m", "W_t = 80000 10³ mm³"),
})

// PlainTensileStrength is f_ctd,pl.
var PlainTensileStrength = clause.Define(&clause.Formula{
	ID: "plain-tensile-strength", Name: "Design tensile strength of plain concrete", Ref: en("12.3.1(1)", ""),
	Text: "f_{ctd,pl} = α_{ct,pl}·f_{ctk,0.05}/γ_C", Unit: "MPa",
	Examples: hand("1.52 MPa", "α_{ct,pl} = 0.8", "f_{ctk,0.05} = 2.85 MPa", "γ_C = 1.5"),
})

// Hogging asks where the moment is negative.
var Hogging = &clause.Condition{ID: "hogging", Name: "Sign of the least moment", Ref: clause.Ref{}, Text: "M_{Ed,min} < 0·[kN·m]",
	Yes: "hogging", No: "no hogging"}

// HoggingResisted is σ_ct ≤ f_ctd,pl.
var HoggingResisted = &clause.Check{ID: "hogging-resisted", Name: "Hogging beyond and over the bearings, as plain concrete", Ref: en("12.6.1", ""),
	Demand: "σ_ct", Limit: "f_{ctd,pl}"}
