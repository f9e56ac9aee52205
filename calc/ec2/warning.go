package ec2

import "soffit/calc/clause"

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
