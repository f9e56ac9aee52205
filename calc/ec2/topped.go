package ec2

import "soffit/calc/clause"

// A member with a topping: the member is strained when the topping is cast, the topping is not. The plane of strain is that
// of the topping; the member's lies beside it by the strain locked in, ε_0 at its centroid and κ_0 per height. Row j is in the
// topping where k_{t,j} = 1, fibre m where k_{t,m} = 1.

// LockedAxial and LockedCurvature are the strain and the curvature of the bare member under what it carries when the topping
// is hard.
var (
	LockedAxial = clause.Define(&clause.Formula{ID: "locked-axial", Name: "Strain of the bare member at its centroid when the topping is hard, compression positive", Ref: en("6.1(2)P", ""),
		Text: "ε_0 = P_d/(E_cm·A_c)", Unit: "‰", Digits: 6, Examples: hand("0.1 ‰", "P_d = 1400 kN", "E_cm = 35 GPa", "A_c = 400000 mm²")})
	LockedCurvature = clause.Define(&clause.Formula{ID: "locked-curvature", Name: "Curvature of the bare member when the topping is hard, sagging positive", Ref: en("6.1(2)P", ""),
		Text: "κ_0 = (M_0 − M_P)/(E_cm·I_c)", Unit: "1/km", Digits: 7, Examples: hand("-0.1 1/km", "M_0 = 300 kN·m", "M_P = 475 kN·m", "E_cm = 35 GPa", "I_c = 50000 10⁶ mm⁴")})
)

// The strain locked in at the steel, at the fibres and at the edge that may govern.
var (
	LockedAtTendons = clause.Define(&clause.Formula{ID: "locked-at-tendons", Name: "Strain locked in beside each row of tendons, compression positive", Text: "ε_{l,i} = ε_0 − κ_0·e_i", Unit: "‰", Digits: 6,
		Examples: hand("0.14 ‰", "ε_0 = 0.1 ‰", "κ_0 = -0.1 1/km", "e_i = 400 mm")})
	LockedAtBars = clause.Define(&clause.Formula{ID: "locked-at-bars", Name: "Strain of each row of bars when the topping is hard; none in the topping", Text: "ε_{s0,j} = −(1 − k_{t,j})·(ε_0 + κ_0·(y_{s,j} − y_cg))", Unit: "‰", Digits: 6,
		Examples: hand("-0.14 ‰, 0 ‰", "k_{t,j} = 0, 1", "ε_0 = 0.1 ‰", "κ_0 = -0.1 1/km", "y_{s,j} = 50 mm, 950 mm", "y_cg = 450 mm")})
	LockedAtFibres = clause.Define(&clause.Formula{ID: "locked-at-fibres", Name: "Strain locked in at each fibre, compression positive; none in the topping", Text: "ε_{lf,m} = (1 − k_{t,m})·(ε_0 + κ_0·(y_{f,m} − y_cg))", Unit: "‰", Digits: 6,
		Examples: hand("0.14 ‰, 0 ‰", "k_{t,m} = 0, 1", "ε_0 = 0.1 ‰", "κ_0 = -0.1 1/km", "y_{f,m} = 50 mm, 950 mm", "y_cg = 450 mm")})
	LockedAtTop = clause.Define(&clause.Formula{ID: "locked-at-top", Name: "Strain locked in at the top of the member, compression positive", Text: "ε_le = ε_0 + κ_0·(h − y_cg)", Unit: "‰", Digits: 6,
		Examples: hand("0.05 ‰", "ε_0 = 0.1 ‰", "κ_0 = -0.1 1/km", "h = 1000 mm", "y_cg = 500 mm")})
	LockedAtSoffit = clause.Define(&clause.Formula{ID: "locked-at-soffit", Name: "Strain locked in at the soffit, compression positive", Text: "ε_le = ε_0 − κ_0·y_cg", Unit: "‰", Digits: 6,
		Examples: hand("0.15 ‰", "ε_0 = 0.1 ‰", "κ_0 = -0.1 1/km", "y_cg = 500 mm")})
)

// MemberPrestrain, BarePrestrain and ToppedPrestrain are ε_p0 in the plane of the bare member and in that of the topping.
var (
	MemberPrestrain = clause.Define(&clause.Formula{ID: "member-prestrain", Name: "Strain of the steel at zero strain of the concrete beside it", Ref: en("6.1(2)P", ""),
		Text: "ε_{pb,i} = γ_P·σ_{pu,i}/E_{p,i} + σ_{cp,i}/E_cm", Unit: "‰", Digits: 6,
		Examples: hand("6.0870 ‰", "γ_P = 1.0", "σ_{pu,i} = 1145 MPa", "E_{p,i} = 195 GPa", "σ_{cp,i} = 7.96 MPa", "E_cm = 36.99 GPa")})
	BarePrestrain = clause.Define(&clause.Formula{ID: "bare-prestrain", Name: "Strain of the steel at zero strain of the concrete beside it, bare member", Ref: en("6.1(2)P", ""),
		Text: "ε_{p0,i} = ε_{pb,i}", Unit: "‰", Digits: 6, Examples: hand("6.087 ‰", "ε_{pb,i} = 6.087 ‰")})
	ToppedPrestrain = clause.Define(&clause.Formula{ID: "topped-prestrain", Name: "Strain of the steel at zero strain of the plane of the topping", Ref: en("6.1(2)P", ""),
		Text: "ε_{p0,i} = ε_{pb,i} − ε_{l,i}", Unit: "‰", Digits: 6, Examples: hand("5.947 ‰", "ε_{pb,i} = 6.087 ‰", "ε_{l,i} = 0.14 ‰")})
)

// BarBendingStrain is what bending adds to the strain of a row of bars.
var BarBendingStrain = clause.Define(&clause.Formula{
	ID: "bar-bending-strain", Name: "Strain of bending at each bar row", Ref: en(compatible, ""), Text: "Δε_{s,j} = κ·(d_{s,j} − x)", Unit: "‰", Digits: 7,
	Examples: hand("12.686 ‰", "κ = 29.429 1/km", "d_{s,j} = 550 mm", "x = 118.93 mm"),
})

// LockedBarStrain is the strain of bars that were strained before the topping was hard.
var LockedBarStrain = clause.Define(&clause.Formula{
	ID: "locked-bar-strain", Name: "Strain of each bar row", Ref: en(compatible, ""), Text: "ε_{s,j} = ε_{s0,j} + Δε_{s,j}", Unit: "‰", Digits: 7,
	Examples: hand("12.546 ‰", "ε_{s0,j} = -0.14 ‰", "Δε_{s,j} = 12.686 ‰"),
})

// ToppedFibreStrain and ToppedFibreStress are those of a fibre of topping or member.
var (
	ToppedFibreStrain = clause.Define(&clause.Formula{ID: "topped-fibre-strain", Name: "Strain of each fibre with that locked in, compression positive; 0 where it is stretched", Ref: en("6.1(2)P", ""),
		Text: "ε_{f,m} = max(0; κ·(x − z_{f,m}) + ε_{lf,m})", Unit: "‰", Digits: 7,
		Examples: append(hand("2.1 ‰", "κ = 20 1/km", "x = 150 mm", "z_{f,m} = 50 mm", "ε_{lf,m} = 0.1 ‰"), hand("0 ‰", "κ = 20 1/km", "x = 150 mm", "z_{f,m} = 200 mm", "ε_{lf,m} = 0.1 ‰")...)})
	ToppedFibreStress = clause.Define(&clause.Formula{ID: "topped-fibre-stress", Name: "Stress of each fibre by its law", Ref: en("3.1.7(1), (2)", "3.17, 3.18"),
		Text: "σ_{f,m} = cases(k_{t,m} = 1: f_{cd,t}·(1 − max(0; 1 − max(0; ε_{f,m})/ε_{cy,t})^n_{σ,t}); otherwise: f_cd·(1 − max(0; 1 − max(0; ε_{f,m})/ε_cy)^n_σ))", Unit: "MPa", Digits: 6,
		Examples: hand("15 MPa, 22.5 MPa", "k_{t,m} = 1, 0", "f_{cd,t} = 20 MPa", "ε_{f,m} = 1 ‰, 1 ‰", "ε_{cy,t} = 2 ‰", "n_{σ,t} = 2", "f_cd = 30 MPa", "ε_cy = 2 ‰", "n_σ = 2")})
)
