package ec2

import "soffit/calc/clause"

// Minimum and maximum steel, 9.2.1.1, and failure with warning, 5.10.1(5)P and (6).

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

// MinimumSteelOfDepth is A_s,min where no steel is bonded in the tension zone, d taken as h: nothing covers it.
var MinimumSteelOfDepth = clause.Define(&clause.Formula{
	ID: "minimum-steel-of-depth", Name: "Minimum area of longitudinal steel in tension, no steel being bonded there: depth in place of effective depth", Ref: en("9.2.1.1(1)", "9.1N"),
	Text: "A_{s,min} = max(0.26·f_ctm/f_yk·b_t·h; 0.0013·b_t·h)", Unit: "mm²",
	Examples: hand("150.8 mm²", "f_ctm = 2.9 MPa", "f_yk = 500 MPa", "b_t = 100 mm", "h = 1000 mm"),
})

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

// Cracks at the ultimate limit state, and what they ask of the tendons.

// BottomStress is the tension of the bottom fibre with the design moment, section uncracked.
var BottomStress = clause.Define(&clause.Formula{
	ID: "bottom-stress", Name: "Tension at the bottom with the design moment, section uncracked", Ref: en("8.10.2.3(1)", ""),
	Text: "σ_b = (M_Ed − M_P)/W_b − P_d/A_c", Unit: "MPa",
	Examples: hand("8.4904 MPa", "M_Ed = 1279.77 kN·m", "M_P = 474.31 kN·m", "W_b = 68744.3 10³ mm³", "P_d = 840.79 kN", "A_c = 260600 mm²"),
})

// CrackedAtUltimate asks where the section cracks in bending at the ultimate limit state.
var CrackedAtUltimate = &clause.Condition{ID: "cracked-at-ultimate", Name: "Cracks in bending at the ultimate limit state", Ref: en("8.10.2.3(1)", ""),
	Text: "σ_b > f_{ctk,0.05}", Yes: "cracked", No: "uncracked: anchorage needs no further check"}

// LargestShear is the largest shear force at a station, either side and sign.
var LargestShear = clause.Define(&clause.Formula{
	ID: "largest-shear", Name: "Largest shear force at the station", Text: "V_max = max(abs(V_{Ed,l}); abs(V_{Ed,l,min}); abs(V_{Ed,r}); abs(V_{Ed,r,min}))", Unit: "kN", Digits: 6,
	Examples: hand("9 kN", "V_{Ed,l} = 1 kN", "V_{Ed,l,min} = -9 kN", "V_{Ed,r} = 2 kN", "V_{Ed,r,min} = -8 kN"),
})

// LeverArm is z of the resistance.
var LeverArm = clause.Define(&clause.Formula{
	ID: "lever-arm", Name: "Lever arm of the inner forces", Ref: en("6.2.3(7)", ""), Text: "z = M_Rd/F_c", Unit: "mm",
	Examples: hand("908.86 mm", "M_Rd = 1507.63 kN·m", "F_c = 1658.82 kN"),
})

// AddedMoment is the moment equivalent of the tension that shear adds, ΔF_td·z.
var AddedMoment = clause.Define(&clause.Formula{
	ID: "added-moment", Name: "Moment equal to the tension that shear adds, vertical links", Ref: en("6.2.3(7)", "6.18"),
	Text: "ΔM = 0.5·V_max·cot(θ)·z", Unit: "kN·m",
	Examples: hand("113.61 kN·m", "V_max = 100 kN", "θ = 21.8014 °", "z = 908.86 mm"),
})

// MomentWithShear is the moment to be resisted with the tension added by shear, at most the largest of the span.
var MomentWithShear = clause.Define(&clause.Formula{
	ID: "moment-with-shear", Name: "Moment with the tension that shear adds, at most the largest moment of the span", Ref: en("6.2.3(7)", "6.18"),
	Text: "M_{Ed,V} = min(M_{Ed,max}; M_Ed + ΔM)", Unit: "kN·m", Digits: 6,
	Examples: append(hand("900 kN·m", "M_{Ed,max} = 1200 kN·m", "M_Ed = 800 kN·m", "ΔM = 100 kN·m"), hand("850 kN·m", "M_{Ed,max} = 850 kN·m", "M_Ed = 800 kN·m", "ΔM = 100 kN·m")...),
})

// BendingWithShear is M_Ed,V ≤ M_Rd.
var BendingWithShear = &clause.Check{ID: "bending-with-shear", Name: "Bending with the tension added by shear", Ref: en("6.2.3(7)", "6.18"),
	Demand: "M_{Ed,V}", Limit: "M_Rd"}

// LargestMoment is the largest design moment of the span.
var LargestMoment = clause.Define(&clause.Formula{
	ID: "largest-moment", Name: "Largest design moment of the span", Text: "M_{Ed,max} = M_Ed", Unit: "kN·m", Digits: 6,
	Examples: hand("1279.77 kN·m", "M_Ed = 1279.77 kN·m"),
})

// NoLargerMoment proves M_Ed,max at every station.
var NoLargerMoment = &clause.Condition{ID: "no-larger-moment", Name: "No station has a larger moment", Text: "M_Ed ≤ M_{Ed,max}", Yes: "not larger", No: "larger"}

// Failure with warning, 5.10.1(5)P, by method E of 5.10.1(6): cracks form before the resistance is spent, whether the
// load grows or tendons are lost.

// InitialForce is the prestressing force just after release.
var InitialForce = clause.Define(&clause.Formula{
	ID: "initial-force", Name: "Greatest prestressing force at the station", Ref: en("5.10.1(6)", ""), Text: "P_i0 = Σ_i(A_{p,i}·σ_{pi,i})", Unit: "kN",
	Examples: hand("1365.5 kN", "A_{p,i} = 1112 mm²", "σ_{pi,i} = 1228 MPa"),
})

// InitialMoment is its moment about the centroid.
var InitialMoment = clause.Define(&clause.Formula{
	ID: "initial-moment", Name: "Its moment about the centroid", Ref: en("5.10.1(6)", ""), Text: "M_Pi = Σ_i(A_{p,i}·σ_{pi,i}·e_i)", Unit: "kN·m",
	Examples: hand("600.84 kN·m", "A_{p,i} = 1112 mm²", "σ_{pi,i} = 1228 MPa", "e_i = 440 mm"),
})

// CrackingMoment is M_cr with the greatest prestress.
var CrackingMoment = clause.Define(&clause.Formula{
	ID: "cracking-moment", Name: "Greatest cracking moment: bottom fibre at its mean tensile strength, greatest prestress", Ref: en("5.10.1(6) method E", ""),
	Text: "M_cr = (f_ctm + P_i0/A_c)·W_b + M_Pi", Unit: "kN·m",
	Examples: hand("1210.5 kN·m", "f_ctm = 4.0716 MPa", "P_i0 = 1273.2 kN", "A_c = 420000 mm²", "W_b = 91532 10³ mm³", "M_Pi = 560.35 kN·m"),
})

// FailureWithWarning is M_cr ≤ M_Rd.
var FailureWithWarning = &clause.Check{ID: "failure-with-warning", Name: "Warning before failure, load growing", Ref: en("5.10.1(6) method E", ""),
	Demand: "M_cr", Limit: "M_Rd"}

// RemainingShare is the share of the prestress at which the frequent moment cracks the section.
var RemainingShare = clause.Define(&clause.Formula{
	ID: "remaining-share", Name: "Share of the tendons left when the frequent moment cracks the section", Ref: en("5.10.1(6) method E", ""),
	Text: "ρ_E = min(1; (M_freq − f_ctm·W_b)/(P_d/A_c·W_b + M_P))", Unit: "",
	Examples: hand("0.48710", "M_freq = 686.72 kN·m", "f_ctm = 4.0716 MPa", "W_b = 68744.3 10³ mm³", "P_d = 1370.1 kN", "A_c = 260600 mm²", "M_P = 473.77 kN·m"),
})

// CracksWhenTendonsFail asks whether loss of tendons shows itself by cracks under the frequent moment.
var CracksWhenTendonsFail = &clause.Condition{ID: "cracks-when-tendons-fail", Name: "Tendons lost under the frequent moment", Ref: en("5.10.1(6) methods B and E", ""),
	Text: "ρ_E > 0", Yes: "cracks announce the loss",
	No: "the frequent moment does not crack the section even without prestress: method B, pretensioned tendons in bond, is relied upon"}

// RemainingResistance is a lower bound of the resistance with the tendons left: less steel has a longer lever arm.
var RemainingResistance = clause.Define(&clause.Formula{
	ID: "remaining-resistance", Name: "Resistance with the tendons left, accidental partial factor: a lower bound, for the lever arm grows as the steel gets less", Ref: en("5.10.1(6) method E, 2.4.2.4", ""),
	Text: "M_{Rd,E} = ρ_E·γ_S/γ_{S,acc}·M_Rd", Unit: "kN·m", Digits: 6,
	Examples: hand("844.52 kN·m", "ρ_E = 0.4871", "γ_S = 1.15", "γ_{S,acc} = 1", "M_Rd = 1507.63 kN·m"),
})

// WarningWhenTendonsFail is M_freq ≤ M_Rd,E.
var WarningWhenTendonsFail = &clause.Check{ID: "warning-when-tendons-fail", Name: "Warning before failure, tendons lost", Ref: en("5.10.1(6) method E", ""),
	Demand: "M_freq", Limit: "M_{Rd,E}"}

// Hogging from external loads at and beyond the bearings.

// OverhangStress is the tension at the top over a bearing from external loads.
var OverhangStress = clause.Define(&clause.Formula{
	ID: "hogging-stress", Name: "Tension at the top from the hogging moment of the loads alone, section uncracked", Ref: en("12.3.1(2)", ""),
	Text: "σ_ct = −M_{Ed,min}/W_t", Unit: "MPa", Digits: 3,
	Examples: hand("0.002 MPa", "M_{Ed,min} = -0.16 kN·m", "W_t = 80000 10³ mm³"),
})

// PlainTensileStrength is f_ctd,pl.
var PlainTensileStrength = clause.Define(&clause.Formula{
	ID: "plain-tensile-strength", Name: "Design tensile strength of plain concrete", Ref: en("12.3.1(2)", "12.1"),
	Text: "f_{ctd,pl} = α_{ct,pl}·f_{ctk,0.05}/γ_C", Unit: "MPa",
	Examples: hand("1.52 MPa", "α_{ct,pl} = 0.8", "f_{ctk,0.05} = 2.85 MPa", "γ_C = 1.5"),
})

// Hogging asks where the moment is negative.
var Hogging = &clause.Condition{ID: "hogging", Name: "Sign of the least moment", Ref: clause.Ref{}, Text: "M_{Ed,min} < 0·[kN·m]",
	Yes: "hogging", No: "no hogging"}

// HoggingResisted is σ_ct ≤ f_ctd,pl.
var HoggingResisted = &clause.Check{ID: "hogging-resisted", Name: "Hogging of the loads alone, plain concrete", Ref: en("12.3.1(2)", "12.1"),
	Demand: "σ_ct", Limit: "f_{ctd,pl}"}
