package ec2

import "soffit/calc/clause"

// Minimum and maximum steel, 9.2.1.1.

// The tension zone lies beyond the centroid, at the depth z_0 from the compressed edge.

// TensionPartDepth is the depth of each part beyond the centroid.
var TensionPartDepth = clause.Define(&clause.Formula{
	ID: "tension-part-depth", Name: "Depth of each part in the tension zone, beyond the centroid", Text: "c_{t,n} = max(0; min(h_{c,n}; z_{c,n} + h_{c,n} − z_0))", Unit: "mm", Digits: 6,
	Examples: hand("300 mm", "h_{c,n} = 700 mm", "z_0 = 500 mm", "z_{c,n} = 100 mm"),
})

// TensionPartArea is the area of each part beyond the centroid.
var TensionPartArea = clause.Define(&clause.Formula{
	ID: "tension-part-area", Name: "Area of each part in the tension zone",
	Text: "A_{ct,n} = c_{t,n}·(b_{2,n} + (b_{1,n} − b_{2,n})·c_{t,n}/(2·h_{c,n}))", Unit: "mm²", Digits: 7,
	Examples: hand("42000 mm²", "c_{t,n} = 300 mm", "b_{2,n} = 140 mm", "b_{1,n} = 140 mm", "h_{c,n} = 700 mm"),
})

// TensionVoidReach and TensionVoidArea are what round parts take from the tension zone.
var (
	TensionVoidReach = clause.Define(&clause.Formula{
		ID: "tension-void-reach", Name: "Reach of the compression zone into each round part, from the tip of the circle",
		Text: "t_{t,m} = max(t_{1,m}; min(t_{2,m}; z_0 − z_{v,m} + r_{v,m}))", Unit: "mm", Digits: 7,
		Examples: hand("75 mm", "t_{1,m} = 0 mm", "t_{2,m} = 150 mm", "z_0 = 100 mm", "z_{v,m} = 100 mm", "r_{v,m} = 75 mm"),
	})
	TensionVoidArea = clause.Define(&clause.Formula{
		ID: "tension-void-area", Name: "Area that the tension zone loses to the round parts",
		Text: "A_{vt,m} = n_{v,m}·(" + segment("t_{2,m}") + " − " + segment("t_{t,m}") + ")", Unit: "mm²", Digits: 7,
		Examples: hand("8835.729 mm²", "n_{v,m} = 1", "r_{v,m} = 75 mm", "t_{2,m} = 150 mm", "t_{t,m} = 75 mm"),
	})
)

// TensionWidth is b_t.
var TensionWidth = clause.Define(&clause.Formula{
	ID: "tension-width", Name: "Mean width of the tension zone", Ref: en("9.2.1.1(1)", ""),
	Text: "b_t = Σ_n(A_{ct,n})/(h − z_0)", Unit: "mm",
	Examples: hand("204 mm", "A_{ct,n} = 60000 mm², 42000 mm²", "h = 1100 mm", "z_0 = 600 mm"),
})

// TensionWidthWithVoids is b_t with round parts left out.
var TensionWidthWithVoids = clause.Define(&clause.Formula{
	ID: "tension-width-with-voids", Name: "Mean width of the tension zone, round parts left out", Ref: en("9.2.1.1(1)", ""),
	Text: "b_t = (Σ_n(A_{ct,n}) − Σ_m(A_{vt,m}))/(h − z_0)", Unit: "mm",
	Examples: hand("200 mm", "A_{ct,n} = 60000 mm², 42000 mm²", "A_{vt,m} = 2000 mm²", "h = 1100 mm", "z_0 = 600 mm"),
})

// MinimumAtBottom asks where the minimum at the bottom is needed of a member that reaches past its bearings.
var MinimumAtBottom = &clause.Condition{ID: "minimum-at-bottom", Name: "Place of the station", Ref: en("9.2.1.1(1)", ""), Text: "x_A ≤ x_m ≤ x_B or M_Ed > 0·[kN·m]",
	Yes: "between the bearings or sagging", No: "beyond a bearing and hogging: no minimum at the bottom"}

// UncrackedEnd asks of the ends where no steel is anchored in full that they do not crack, as unreinforced concrete must not.
var UncrackedEnd = &clause.Check{ID: "uncracked-end", Name: "No crack in bending where no steel is anchored in full", Ref: en("9.2.1.1(2), 8.10.2.3(1)", ""), Demand: "σ_b", Limit: "f_{ctk,0.05}"}

// ToppingTensionWidth is b_t where the topping is stretched.
var ToppingTensionWidth = clause.Define(&clause.Formula{
	ID: "topping-tension-width", Name: "Width of the tension zone: the topping's", Ref: en("9.2.1.1(1)", ""), Text: "b_t = b_top", Unit: "mm", Examples: hand("1200 mm", "b_top = 1200 mm"),
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
	&clause.Formula{ID: "tension-steel-with-bars", Name: "Steel counted: bars, and tendons by their strength left above the prestress, as far as it is anchored (common practice, no source)", Ref: en("9.2.1.1(1)", ""),
		Text: "A_{s,prov} = Σ_j(t_{s,j}·A_{s,j}·min(1; σ_{sa,j}/f_{yd,j})) + Σ_i(t_{p,i}·A_{p,i}·min(1; (σ_{av,i} − σ_{pt,i})/max(f_{pd,i} − σ_{pt,i}; 1·[MPa]))·(f_{p0,1k,i} − σ_{pt,i})/f_yk)", Unit: "mm²",
		Examples: hand("1900.9 mm²", "t_{s,j} = 1", "A_{s,j} = 800 mm²", "σ_{sa,j} = 435 MPa", "f_{yd,j} = 435 MPa", "t_{p,i} = 1, 1", "A_{p,i} = 1112 mm², 500 mm²", "σ_{av,i} = 1426 MPa, 300 MPa", "f_{pd,i} = 1426 MPa, 1426 MPa", "f_{p0,1k,i} = 1640 MPa, 1640 MPa", "σ_{pt,i} = 1145 MPa, 300 MPa", "f_yk = 500 MPa")},
	&clause.Formula{ID: "tension-steel", Name: "Steel counted: tendons by their strength left above the prestress, as far as it is anchored (common practice, no source)", Ref: en("9.2.1.1(1)", ""),
		Text: "A_{s,prov} = Σ_i(t_{p,i}·A_{p,i}·min(1; (σ_{av,i} − σ_{pt,i})/max(f_{pd,i} − σ_{pt,i}; 1·[MPa]))·(f_{p0,1k,i} − σ_{pt,i})/f_yk)", Unit: "mm²",
		Examples: hand("1100.9 mm²", "t_{p,i} = 1, 1", "A_{p,i} = 1112 mm², 500 mm²", "σ_{av,i} = 1426 MPa, 300 MPa", "f_{pd,i} = 1426 MPa, 1426 MPa", "f_{p0,1k,i} = 1640 MPa, 1640 MPa", "σ_{pt,i} = 1145 MPa, 300 MPa", "f_yk = 500 MPa")})

// AnchoredInFull asks where the minimum applies: where a row that counts is anchored up to its design strength.
var AnchoredInFullWithBars, AnchoredInFull = &clause.Condition{ID: "anchored-in-full", Name: "Steel anchored in full in the tension zone", Ref: en("9.2.1.1(1), (2)", ""),
	Text: "Σ_i(cases(t_{p,i} = 1 and σ_{av,i} ≥ f_{pd,i}: 1; otherwise: 0)) > 0 or (n_t = 0 and Σ_j(cases(t_{s,j} = 1 and σ_{sa,j} ≥ f_{yd,j}: 1; otherwise: 0)) > 0)", Yes: anchoredYes, No: anchoredNo},
	&clause.Condition{ID: "anchored-in-full", Name: "Steel anchored in full in the tension zone", Ref: en("9.2.1.1(1), (2)", ""),
		Text: "Σ_i(cases(t_{p,i} = 1 and σ_{av,i} ≥ f_{pd,i}: 1; otherwise: 0)) > 0", Yes: anchoredYes, No: anchoredNo}

const (
	anchoredYes = "a row is anchored in full here"
	anchoredNo  = "no row is anchored in full here: unreinforced as far as the minimum goes"
)

// BarsAlone and BarsReach are method A of 5.10.1(6) for a post-tensioned member: bars that warn when tendons are lost.
var (
	BarsAlone = clause.Define(&clause.Formula{ID: "bars-alone", Name: "Bars alone in the tension zone, as far as they are anchored", Ref: en("5.10.1(6) A", ""), Text: "A_{s,bars} = Σ_j(t_{s,j}·A_{s,j}·min(1; σ_{sa,j}/f_{yd,j}))", Unit: "mm²",
		Examples: hand("958.19 mm²", "t_{s,j} = 1, 0", "A_{s,j} = 1570.8 mm², 804.2 mm²", "σ_{sa,j} = 265.35 MPa, 435 MPa", "f_{yd,j} = 435 MPa, 435 MPa")})
	BarsDepth = clause.Define(&clause.Formula{ID: "bars-depth", Name: "Depth of the outermost bars in the tension zone", Ref: en("5.10.1(6) A", ""), Text: "d_s = max_j(t_{s,j}·d_{s,j})", Unit: "mm", Digits: 6,
		Examples: hand("1340 mm", "t_{s,j} = 1, 0", "d_{s,j} = 1340 mm, 60 mm")})
	BarsNeeded = clause.Define(&clause.Formula{ID: "bars-needed", Name: "Minimum of bars alone, in the ratio of their depth to that of all steel", Ref: en("5.10.1(6) A, 9.2.1.1(1)", ""), Text: "A_{s,min,s} = A_{s,min}·max(1; d_s/d)", Unit: "mm²",
		Examples: hand("1466 mm²", "A_{s,min} = 1175 mm²", "d_s = 1340 mm", "d = 1074 mm")})
	BarsReach = &clause.Condition{ID: "bars-reach", Name: "Minimum steel by bars alone", Ref: en("5.10.1(6) A", ""), Text: "A_{s,bars} ≥ A_{s,min,s}",
		Yes: "the bars alone reach the minimum: they warn when tendons are lost", No: "the bars alone do not reach the minimum"}
)

// The same of a post-tensioned member, whose stress changes along the tendon.
var PostTensionSteelWithBars, PostTensionSteel = steelSums(
	&clause.Formula{ID: "post-tension-steel-with-bars", Name: "Steel counted: bars, and tendons by their strength left above the prestress (common practice, no source)", Ref: en("9.2.1.1(1)", ""),
		Text: "A_{s,prov} = Σ_j(t_{s,j}·A_{s,j}·min(1; σ_{sa,j}/f_{yd,j})) + Σ_i(t_{p,i}·A_{p,i}·(f_{p0,1k,i} − σ_{pt,i})/f_yk)", Unit: "mm²",
		Examples: hand("1900.9 mm²", "t_{s,j} = 1", "A_{s,j} = 800 mm²", "σ_{sa,j} = 435 MPa", "f_{yd,j} = 435 MPa", "t_{p,i} = 1", "A_{p,i} = 1112 mm²", "f_{p0,1k,i} = 1640 MPa", "σ_{pt,i} = 1145 MPa", "f_yk = 500 MPa")},
	&clause.Formula{ID: "post-tension-steel", Name: "Steel counted: tendons by their strength left above the prestress (common practice, no source)", Ref: en("9.2.1.1(1)", ""),
		Text: "A_{s,prov} = Σ_i(t_{p,i}·A_{p,i}·(f_{p0,1k,i} − σ_{pt,i})/f_yk)", Unit: "mm²",
		Examples: hand("1100.9 mm²", "t_{p,i} = 1", "A_{p,i} = 1112 mm²", "f_{p0,1k,i} = 1640 MPa", "σ_{pt,i} = 1145 MPa", "f_yk = 500 MPa")})

// TopSteelProvided is A_s,min ≤ A_s,prov where the moment hogs.
var TopSteelProvided = &clause.Check{ID: "minimum-top-steel-provided", Name: "Minimum steel in tension, at the top", Ref: en("9.2.1.1(1)", "9.1N"),
	Demand: "A_{s,min}", Limit: "A_{s,prov}"}

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
