package ec2

import (
	"strings"

	"soffit/calc/clause"
)

// Failure with warning, 5.10.1(5)P: cracks form before the resistance is spent when the load grows.

// InitialForce is the prestressing force just after release.
var InitialForce = clause.Define(&clause.Formula{
	ID: "initial-force", Name: "Prestressing force at the station at transfer", Ref: en("5.10.1(6)", ""), Text: "P_i0 = Σ_i(A_{p,i}·σ_{pi,i})", Unit: "kN",
	Examples: hand("1365.5 kN", "A_{p,i} = 1112 mm²", "σ_{pi,i} = 1228 MPa"),
})

// InitialMoment is its moment about the centroid.
var InitialMoment = clause.Define(&clause.Formula{
	ID: "initial-moment", Name: "Moment of that force about the centroid", Ref: en("5.10.1(6)", ""), Text: "M_Pi = Σ_i(A_{p,i}·σ_{pi,i}·e_i)", Unit: "kN·m",
	Examples: hand("600.84 kN·m", "A_{p,i} = 1112 mm²", "σ_{pi,i} = 1228 MPa", "e_i = 440 mm"),
})

// FinalForce and FinalMoment are the prestressing force after all losses and its moment about the centroid.
var (
	FinalForce = clause.Define(&clause.Formula{ID: "final-force", Name: "Prestressing force at the station after all losses", Ref: en("5.10.1(6)", ""), Text: "P_∞ = Σ_i(A_{p,i}·σ_{pt,i})", Unit: "kN",
		Examples: hand("1273.2 kN", "A_{p,i} = 1112 mm²", "σ_{pt,i} = 1145 MPa")})
	FinalMoment = clause.Define(&clause.Formula{ID: "final-moment", Name: "Moment of that force about the centroid", Ref: en("5.10.1(6)", ""), Text: "M_P∞ = Σ_i(A_{p,i}·σ_{pt,i}·e_i)", Unit: "kN·m",
		Examples: hand("560.23 kN·m", "A_{p,i} = 1112 mm²", "σ_{pt,i} = 1145 MPa", "e_i = 440 mm")})
)

// The greatest cracking moment of the edge that the moment stretches, its mean tensile strength on the section with its steel as
// concrete, with the prestress that puts the crack off longest, that at transfer or after all losses; each also beside an axial
// force.
var (
	CrackingMoment, AxialCrackingMoment = crackingMoments("cracking-moment", "Greatest cracking moment: bottom fibre at its mean tensile strength, steel counted, prestress at transfer or after all losses",
		"W_{id,b}·(f_ctm + max(P_i0/A_c + M_Pi/W_b; P_∞/A_c + M_P∞/W_b)#)", [2]string{"1331.6 kN·m", "1355.5 kN·m"}, "f_ctm = 4.0716 MPa", "P_i0 = 1273.2 kN", "A_c = 420000 mm²", "W_b = 91532 10³ mm³", "W_{id,b} = 100685.2 10³ mm³", "M_Pi = 560.35 kN·m", "P_∞ = 1000 kN", "M_P∞ = 400 kN·m")
	HoggingCracking, AxialHoggingCracking = crackingMoments("hogging-cracking", "Greatest cracking moment, hogging: top fibre at its mean tensile strength, steel counted, prestress at transfer or after all losses",
		"W_{id,t}·(f_ctm + max(P_i0/A_c − M_Pi/W_t; P_∞/A_c − M_P∞/W_t)#)", [2]string{"500 kN·m", "525 kN·m"}, "f_ctm = 4 MPa", "P_i0 = 900 kN", "P_∞ = 800 kN", "A_c = 400000 mm²", "W_t = 100000 10³ mm³", "W_{id,t} = 100000 10³ mm³", "M_Pi = 150 kN·m", "M_P∞ = 100 kN·m")
	ToppedCrackingMoment, AxialToppedCrackingMoment = crackingMoments("topped-cracking-moment", "Greatest cracking moment: bottom fibre at its mean tensile strength, prestress at transfer or after all losses; bare member, then composite, its modulus raised by the steel as that of the bare member",
		"M_0 + W_{co,b}·W_{id,b}/W_b·(f_ctm + max(P_i0/A_c + M_Pi/W_b; P_∞/A_c + M_P∞/W_b) − M_0/W_b#)", [2]string{"1620.00 kN·m", "1661.25 kN·m"}, "M_0 = 300 kN·m", "W_{co,b} = 150000 10³ mm³", "W_{id,b} = 110000 10³ mm³", "f_ctm = 4 MPa", "P_i0 = 800 kN", "A_c = 400000 mm²", "M_Pi = 500 kN·m", "W_b = 100000 10³ mm³", "P_∞ = 700 kN", "M_P∞ = 450 kN·m")

	ToppedHoggingCrackingMoment = clause.Define(&clause.Formula{
		ID: "topped-hogging-cracking-moment", Name: "Cracking moment, hogging: top of the topping at its mean tensile strength", Ref: en("5.10.1(5)P, (6)", ""),
		Text: "M_cr = f_{ctm,t}·W_{co,o} − M_0", Unit: "kN·m",
		Examples: hand("200 kN·m", "f_{ctm,t} = 3 MPa", "W_{co,o} = 100000 10³ mm³", "M_0 = 100 kN·m")})
)

// crackingMoments are a moment without axial force and beside one; want is what the example gives without, and with a
// compression of 100 kN.
func crackingMoments(id, name, text string, want [2]string, given ...string) (*clause.Formula, *clause.Formula) {
	define := func(id, axial, want string, given []string) *clause.Formula {
		return clause.Define(&clause.Formula{ID: id, Name: name, Ref: en("5.10.1(5)P, (6)", ""), Text: "M_cr = " + strings.Replace(text, "#", axial, 1), Unit: "kN·m", Examples: hand(want, given...)})
	}
	return define(id, "", want[0], given), define("axial-"+id, " + N_Ed/A_c", want[1], append(given[:len(given):len(given)], "N_Ed = 100 kN"))
}

// FailureWithWarning is M_cr ≤ M_Rd.
var FailureWithWarning = &clause.Check{ID: "failure-with-warning", Name: "Warning before failure, load growing", Ref: en("5.10.1(5)P, (6)", ""),
	Demand: "M_cr", Limit: "M_Rd"}
