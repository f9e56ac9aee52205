package ec2

import "soffit/calc/clause"

// Failure with warning, 5.10.1(5)P: cracks form before the resistance is spent when the load grows.

// InitialForce is the prestressing force just after release.
var InitialForce = clause.Define(&clause.Formula{
	ID: "initial-force", Name: "Greatest prestressing force at the station", Ref: en("5.10.1(6)", ""), Text: "P_i0 = Σ_i(A_{p,i}·σ_{pi,i})", Unit: "kN",
	Examples: hand("1365.5 kN", "A_{p,i} = 1112 mm²", "σ_{pi,i} = 1228 MPa"),
})

// InitialMoment is its moment about the centroid.
var InitialMoment = clause.Define(&clause.Formula{
	ID: "initial-moment", Name: "Moment of the greatest prestressing force about the centroid", Ref: en("5.10.1(6)", ""), Text: "M_Pi = Σ_i(A_{p,i}·σ_{pi,i}·e_i)", Unit: "kN·m",
	Examples: hand("600.84 kN·m", "A_{p,i} = 1112 mm²", "σ_{pi,i} = 1228 MPa", "e_i = 440 mm"),
})

// CrackingMoment is M_cr with the greatest prestress.
var CrackingMoment = clause.Define(&clause.Formula{
	ID: "cracking-moment", Name: "Greatest cracking moment: bottom fibre at its mean tensile strength, greatest prestress", Ref: en("5.10.1(5)P, (6)", ""),
	Text: "M_cr = (f_ctm + P_i0/A_c)·W_b + M_Pi", Unit: "kN·m",
	Examples: hand("1210.5 kN·m", "f_ctm = 4.0716 MPa", "P_i0 = 1273.2 kN", "A_c = 420000 mm²", "W_b = 91532 10³ mm³", "M_Pi = 560.35 kN·m"),
})

// FailureWithWarning is M_cr ≤ M_Rd.
var FailureWithWarning = &clause.Check{ID: "failure-with-warning", Name: "Warning before failure, load growing", Ref: en("5.10.1(5)P, (6)", ""),
	Demand: "M_cr", Limit: "M_Rd"}
