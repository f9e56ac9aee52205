package ec2

import "soffit/calc/clause"

// Minimum and maximum steel, 9.2.1.1.

// TensionPartDepth is the depth of each part below the centroid.
var TensionPartDepth = clause.Define(&clause.Formula{
	ID: "tension-part-depth", Name: "Depth of each part below the centroid", Text: "c_{t,n} = max(0; min(h_{c,n}; y_cg − y_{u,n}))", Unit: "mm", Digits: 6,
	Examples: hand("300 mm", "h_{c,n} = 700 mm", "y_cg = 500 mm", "y_{u,n} = 200 mm"),
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
	Text: "b_t = Σ_n(A_{ct,n})/y_cg", Unit: "mm",
	Examples: hand("204 mm", "A_{ct,n} = 60000 mm², 42000 mm²", "y_cg = 500 mm"),
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

// MinimumSteelPositive refuses an expression of the member file that gives less than nothing.
var MinimumSteelPositive = &clause.Condition{ID: "minimum-steel-positive", Name: "Minimum steel", Ref: en("9.2.1.1(1)", ""), Text: "A_{s,min} ≥ 0·[mm²]",
	Yes: "not negative", No: "the expression for the minimum steel gives a negative area"}

// MaximumSteelPositive does the same for the maximum.
var MaximumSteelPositive = &clause.Condition{ID: "maximum-steel-positive", Name: "Maximum steel", Ref: en("9.2.1.1(3)", ""), Text: "A_{s,max} ≥ 0·[mm²]",
	Yes: "not negative", No: "the expression for the maximum steel gives a negative area"}

// The steel counted towards the minimum: rows bonded at the station.
var TensionSteelWithBars, TensionSteel = steelSums(
	&clause.Formula{ID: "tension-steel-with-bars", Name: "Steel counted: bars, and tendons by their strength left above the prestress (common practice, no source)", Ref: en("9.2.1.1(1)", ""),
		Text: "A_{s,prov} = Σ_j(t_{s,j}·A_{s,j}) + Σ_i(t_{p,i}·A_{p,i}·(f_{p0,1k,i} − σ_{pm∞,i})/f_yk)", Unit: "mm²",
		Examples: hand("1900.9 mm²", "t_{s,j} = 1", "A_{s,j} = 800 mm²", "t_{p,i} = 1", "A_{p,i} = 1112 mm²", "f_{p0,1k,i} = 1640 MPa", "σ_{pm∞,i} = 1145 MPa", "f_yk = 500 MPa")},
	&clause.Formula{ID: "tension-steel", Name: "Steel counted: tendons by their strength left above the prestress (common practice, no source)", Ref: en("9.2.1.1(1)", ""),
		Text: "A_{s,prov} = Σ_i(t_{p,i}·A_{p,i}·(f_{p0,1k,i} − σ_{pm∞,i})/f_yk)", Unit: "mm²",
		Examples: hand("1100.9 mm²", "t_{p,i} = 1", "A_{p,i} = 1112 mm²", "f_{p0,1k,i} = 1640 MPa", "σ_{pm∞,i} = 1145 MPa", "f_yk = 500 MPa")})

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
