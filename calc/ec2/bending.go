package ec2

import "soffit/calc/clause"

// Ultimate bending with strain compatibility, 6.1 and 3.1.7(3). Sagging: the top is compressed. Row i is a row of
// tendons at depth d_{p,i}, row j one of bars at depth d_{s,j}, part n a trapezoid of the section whose upper edge is at
// depth z_{c,n}. ε_{p0,i} is the strain of the steel when the concrete beside it has none.

const compatible = "6.1(2)P"

// PrestressForce is P at the station.
var PrestressForce = clause.Define(&clause.Formula{
	ID: "prestress-force", Name: "Prestressing force at the station", Ref: en("5.10.8(1)", ""),
	Text: "P_d = γ_P·Σ_i(A_{p,i}·σ_{pt,i})", Unit: "kN",
	Examples: hand("1273.2 kN", "γ_P = 1.0", "A_{p,i} = 1112 mm²", "σ_{pt,i} = 1145 MPa"),
})

// PrestressMoment is the moment of P about the centroid.
var PrestressMoment = clause.Define(&clause.Formula{
	ID: "prestress-moment", Name: "Its moment about the centroid, tension below", Ref: en("5.10.8(1)", ""),
	Text: "M_P = γ_P·Σ_i(A_{p,i}·σ_{pt,i}·e_i)", Unit: "kN·m",
	Examples: hand("560.23 kN·m", "γ_P = 1.0", "A_{p,i} = 1112 mm²", "σ_{pt,i} = 1145 MPa", "e_i = 440 mm"),
})

// ConcreteStressAtTendon is σ_cp.
var ConcreteStressAtTendon = clause.Define(&clause.Formula{
	ID: "concrete-stress-at-tendon", Name: "Concrete stress at each row from the prestress alone, compression positive",
	Text: "σ_{cp,i} = P_d/A_c + M_P·e_i/I_c", Unit: "MPa",
	Examples: append(hand("7.96 MPa", "P_d = 1273.2 kN", "A_c = 420000 mm²", "M_P = 560.2 kN·m", "I_c = 50000 10⁶ mm⁴", "e_i = 440 mm"),
		by("Lin & Burns, Design of Prestressed Concrete Structures, 3rd ed., Ex. 1-1: 600 + 720 psi at the soffit", clause.Recalled, "9.1 MPa",
			"P_d = 1601.36 kN", "A_c = 387096 mm²", "M_P = 244.048 kN·m", "I_c = 18730.9 10⁶ mm⁴", "e_i = 381 mm")),
})

// Prestrain is ε_p0.
var Prestrain = clause.Define(&clause.Formula{
	ID: "prestrain", Name: "Strain of the steel at zero strain of the concrete beside it", Ref: en("6.1(2)P", ""),
	Text: "ε_{p0,i} = γ_P·σ_{pt,i}/E_{p,i} + σ_{cp,i}/E_cm", Unit: "‰", Digits: 6,
	Examples: hand("6.0870 ‰", "γ_P = 1.0", "σ_{pt,i} = 1145 MPa", "E_{p,i} = 195 GPa", "σ_{cp,i} = 7.96 MPa", "E_cm = 36.99 GPa"),
})

// LimitForce is the steel force with every tendon row at what it can carry.
var LimitForce = clause.Define(&clause.Formula{
	ID: "limit-force", Name: "Tension with every row at its limit, to be confirmed", Ref: en(compatible, ""),
	Text: "F_lim = Σ_i(A_{p,i}·σ_{av,i})", Unit: "kN",
	Examples: hand("1585.8 kN", "A_{p,i} = 1112 mm²", "σ_{av,i} = 1426.1 MPa"),
})

// LimitForceWithBars is LimitForce with bars.
var LimitForceWithBars = clause.Define(&clause.Formula{
	ID: "limit-force-with-bars", Name: "Tension with every row and every bar at its limit, to be confirmed", Ref: en(compatible, ""),
	Text: "F_lim = Σ_i(A_{p,i}·σ_{av,i}) + Σ_j(A_{s,j}·σ_{sa,j})", Unit: "kN",
	Examples: hand("1935.5 kN", "A_{p,i} = 1112 mm²", "σ_{av,i} = 1426.1 MPa", "A_{s,j} = 804.25 mm²", "σ_{sa,j} = 434.78 MPa"),
})

// SteelAnchored asks whether any steel counts at the station.
var SteelAnchored = &clause.Condition{
	ID: "steel-anchored", Name: "Steel at the station", Ref: en("8.10.2.3", ""), Text: "F_lim > 0·[kN]",
	Yes: "steel is anchored here", No: "no steel is anchored here",
}

// NoResistance is the resistance where no steel is anchored.
var NoResistance = clause.Define(&clause.Formula{
	ID: "no-resistance", Name: "Moment resistance: none is counted", Ref: en(compatible, ""),
	Text: "M_Rd = 0·[kN·m]", Unit: "kN·m", Digits: 6, Examples: hand("0 kN·m"),
})

// FlangeTrial is the neutral axis with the block in the flange.
var FlangeTrial = clause.Define(&clause.Formula{
	ID: "axis-flange-trial", Name: "Depth of the neutral axis if the block lies in the top part", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "x_f = F_lim/(λ·η·f_cd·b_f)", Unit: "mm", Digits: 6,
	Examples: hand("118.936 mm", "F_lim = 1585.8 kN", "λ = 0.8", "η = 1", "f_cd = 33.333 MPa", "b_f = 500 mm"),
})

// BlockInFlange asks whether the block lies in the top part.
var BlockInFlange = &clause.Condition{
	ID: "block-in-flange", Name: "Place of the block", Ref: en("3.1.7(3)", ""), Text: "λ·x_f ≤ h_f",
	Yes: "block in the flange", No: "block below the flange",
}

// HaunchRest is the area of the block below the flange.
var HaunchRest = clause.Define(&clause.Formula{
	ID: "block-rest", Name: "Area that the block needs below the flange", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "A_r = F_lim/(η·f_cd) − b_f·h_f", Unit: "mm²", Digits: 6,
	Examples: hand("17500 mm²", "F_lim = 1350 kN", "η = 1", "f_cd = 20 MPa", "b_f = 500 mm", "h_f = 100 mm"),
})

// HaunchDepth is how far the block reaches into the haunch, whose width falls from b_f to b_w over h_h.
var HaunchDepth = clause.Define(&clause.Formula{
	ID: "block-in-haunch-depth", Name: "Depth of the block within the haunch, whose width falls from that of the flange to that of the web",
	Ref:  en("3.1.7(3) Figure 3.5", ""),
	Text: "c_h = h_h/(b_f − b_w)·(b_f − sqrt(b_f^2 − 2·(b_f − b_w)/h_h·A_r))", Unit: "mm", Digits: 6,
	Examples: hand("42.0844 mm", "h_h = 100 mm", "b_f = 500 mm", "b_w = 100 mm", "A_r = 17500 mm²"),
})

// HaunchTrial is the neutral axis with the lower edge of the block in the haunch below the flange.
var HaunchTrial = clause.Define(&clause.Formula{
	ID: "axis-haunch-trial", Name: "Depth of the neutral axis if the block ends in the haunch", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "x_h = (h_f + c_h)/λ", Unit: "mm", Digits: 6,
	Examples: hand("177.606 mm", "h_f = 100 mm", "c_h = 42.0844 mm", "λ = 0.8"),
})

// BlockInHaunch asks whether the block ends in the haunch.
var BlockInHaunch = &clause.Condition{
	ID: "block-in-haunch", Name: "Place of the block", Ref: en("3.1.7(3)", ""), Text: "F_lim ≤ η·f_cd·(b_f·h_f + (b_f + b_w)/2·h_h)",
	Yes: "block ends in the haunch", No: "block reaches the web",
}

// WebTrial is the neutral axis with the lower edge of the block in the web.
var WebTrial = clause.Define(&clause.Formula{
	ID: "axis-web-trial", Name: "Depth of the neutral axis if the block ends in the web", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "x_w = (h_f + h_h + (F_lim/(η·f_cd) − b_f·h_f − (b_f + b_w)/2·h_h)/b_w)/λ", Unit: "mm", Digits: 6,
	Examples: hand("312.5 mm", "h_f = 100 mm", "h_h = 100 mm", "b_f = 500 mm", "b_w = 100 mm", "F_lim = 1700 kN", "η = 1", "f_cd = 20 MPa", "λ = 0.8"),
})

// BlockInWeb asks whether the block ends above the lower flange.
var BlockInWeb = &clause.Condition{
	ID: "block-in-web", Name: "Place of the block", Ref: en("3.1.7(3)", ""), Text: "λ·x_w ≤ z_w",
	Yes: "block ends in the web", No: "block reaches below the web",
}

// Trial is a neutral axis that supposes every row of steel at its limit, by where the block ends: the strains
// on it, the questions that confirm it, and the axis if it stands.
type Trial struct {
	Strain, BarStrain, Axis *clause.Formula
	RowsYield, BarsYield    *clause.Condition
}

func trial(place, x string) Trial {
	return Trial{
		Strain: clause.Define(&clause.Formula{
			ID: "trial-strain-" + place, Name: "Strain of each row on the trial", Ref: en(compatible, ""),
			Text: "ε_{t,i} = ε_{p0,i} + ε_cu3·(d_{p,i} − " + x + ")/" + x, Unit: "‰",
			Examples: hand("36.136 ‰", "ε_{p0,i} = 6.087 ‰", "ε_cu3 = 3.5 ‰", "d_{p,i} = 1140 mm", x+" = 118.93 mm"),
		}),
		BarStrain: clause.Define(&clause.Formula{
			ID: "trial-bar-strain-" + place, Name: "Strain of each bar row on the trial", Ref: en(compatible, ""),
			Text: "ε_{ts,j} = ε_cu3·(d_{s,j} − " + x + ")/" + x, Unit: "‰",
			Examples: hand("12.686 ‰", "ε_cu3 = 3.5 ‰", "d_{s,j} = 550 mm", x+" = 118.93 mm"),
		}),
		Axis: clause.Define(&clause.Formula{ID: "axis-" + place, Name: "Depth of the neutral axis: the trial stands", Ref: en(compatible, ""),
			Text: "x = " + x, Unit: "mm", Digits: 6, Examples: hand("118.93 mm", x+" = 118.93 mm")}),
		RowsYield: &clause.Condition{
			ID: "every-row-yields-" + place, Name: "Tendons on the trial", Ref: en(compatible, ""), Text: "min_i(ε_{t,i} − σ_{av,i}/E_{p,i}) ≥ 0",
			Yes: "every row reaches its limit", No: "not every row reaches its limit: strains decide"},
		BarsYield: &clause.Condition{
			ID: "every-bar-yields-" + place, Name: "Bars on the trial", Ref: en(compatible, ""), Text: "min_j(ε_{ts,j} − σ_{sa,j}/E_s) ≥ 0",
			Yes: "every bar reaches its limit", No: "not every bar reaches its limit: strains decide"},
	}
}

// The three trials.
var (
	TrialInFlange = trial("flange", "x_f")
	TrialInHaunch = trial("haunch", "x_h")
	TrialInWeb    = trial("web", "x_w")
)

// Curvature is κ with the concrete at its limit.
var Curvature = clause.Define(&clause.Formula{
	ID: "curvature", Name: "Curvature, the top fibre at its ultimate strain", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = ε_cu3/x", Unit: "1/km", Digits: 6,
	Examples: hand("29.429 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm"),
})

// CurvatureWithLimit is κ with the concrete or the outermost steel at its limit.
var CurvatureWithLimit = clause.Define(&clause.Formula{
	ID: "curvature-with-limit", Name: "Curvature: the top fibre at its ultimate strain, or an anchored row of tendons at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = min(ε_cu3/x; min_i(cases(d_{p,i} > x and σ_{av,i} ≥ f_{pd,i}: (ε_{pud,i} − ε_{p0,i})/(d_{p,i} − x); otherwise: ε_cu3/x)))", Unit: "1/km", Digits: 6,
	Examples: hand("24.889 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm", "d_{p,i} = 1140 mm", "ε_{pud,i} = 31.5 ‰", "ε_{p0,i} = 6.087 ‰", "σ_{av,i} = 1426.1 MPa", "f_{pd,i} = 1426.1 MPa"),
})

// CurvatureWithBarLimit is CurvatureWithLimit with bars that have a limit too.
var CurvatureWithBarLimit = clause.Define(&clause.Formula{
	ID: "curvature-with-bar-limit", Name: "Curvature: the top fibre at its ultimate strain, or an anchored row of bars at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = min(ε_cu3/x; min_j(cases(d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: ε_{sud,j}/(d_{s,j} − x); otherwise: ε_cu3/x)))", Unit: "1/km", Digits: 6,
	Examples: hand("29.429 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm", "d_{s,j} = 1140 mm", "ε_{sud,j} = 45 ‰", "σ_{sa,j} = 465.9 MPa", "f_{yd,j} = 434.78 MPa"),
})

// CurvatureWithBothLimits has tendons and bars with limits.
var CurvatureWithBothLimits = clause.Define(&clause.Formula{
	ID: "curvature-with-both-limits", Name: "Curvature: the top fibre at its ultimate strain, or an anchored row of steel at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = min(ε_cu3/x; min_i(cases(d_{p,i} > x and σ_{av,i} ≥ f_{pd,i}: (ε_{pud,i} − ε_{p0,i})/(d_{p,i} − x); otherwise: ε_cu3/x)); min_j(cases(d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: ε_{sud,j}/(d_{s,j} − x); otherwise: ε_cu3/x)))",
	Unit: "1/km", Digits: 6,
	Examples: hand("24.889 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm", "d_{p,i} = 1140 mm", "ε_{pud,i} = 31.5 ‰", "ε_{p0,i} = 6.087 ‰", "σ_{av,i} = 1426.1 MPa", "f_{pd,i} = 1426.1 MPa",
		"d_{s,j} = 1140 mm", "ε_{sud,j} = 45 ‰", "σ_{sa,j} = 465.9 MPa", "f_{yd,j} = 434.78 MPa"),
})

// TopStrain is the strain of the top fibre.
var TopStrain = clause.Define(&clause.Formula{
	ID: "top-strain", Name: "Strain of the top fibre", Ref: en("6.1(3)P", ""), Text: "ε_c = κ·x", Unit: "‰",
	Examples: hand("3.5 ‰", "κ = 29.429 1/km", "x = 118.93 mm"),
})

// TendonStrain is ε_p.
var TendonStrain = clause.Define(&clause.Formula{
	ID: "tendon-strain", Name: "Strain of each row: prestrain and that of bending", Ref: en(compatible, ""),
	Text: "ε_{p,i} = ε_{p0,i} + κ·(d_{p,i} − x)", Unit: "‰", Digits: 6,
	Examples: hand("36.136 ‰", "ε_{p0,i} = 6.087 ‰", "κ = 29.429 1/km", "d_{p,i} = 1140 mm", "x = 118.93 mm"),
})

// BarStrain is ε_s.
var BarStrain = clause.Define(&clause.Formula{
	ID: "bar-strain", Name: "Strain of each bar row", Ref: en(compatible, ""), Text: "ε_{s,j} = κ·(d_{s,j} − x)", Unit: "‰", Digits: 6,
	Examples: hand("12.686 ‰", "κ = 29.429 1/km", "d_{s,j} = 550 mm", "x = 118.93 mm"),
})

// TendonStress is σ_p on the horizontal branch.
var TendonStress = clause.Define(&clause.Formula{
	ID: "tendon-stress", Name: "Stress of each row, at most what is anchored", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "σ_{p,i} = max(−σ_{av,i}; min(E_{p,i}·ε_{p,i}; f_{pd,i}; σ_{av,i}))", Unit: "MPa",
	Examples: append(hand("1426.1 MPa", "σ_{av,i} = 1426.1 MPa", "E_{p,i} = 195 GPa", "ε_{p,i} = 36 ‰", "f_{pd,i} = 1426.1 MPa"),
		hand("975 MPa", "σ_{av,i} = 1426.1 MPa", "E_{p,i} = 195 GPa", "ε_{p,i} = 5 ‰", "f_{pd,i} = 1426.1 MPa")...),
})

// TendonStressOnIncline is σ_p on the inclined branch.
var TendonStressOnIncline = clause.Define(&clause.Formula{
	ID: "tendon-stress-inclined", Name: "Stress of each row on the inclined branch, at most what is anchored", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "σ_{p,i} = max(−σ_{av,i}; min(E_{p,i}·ε_{p,i}; f_{pd,i} + (f_{pk,i}/γ_S − f_{pd,i})·(ε_{p,i} − ε_{py,i})/(ε_{puk,i} − ε_{py,i}); σ_{av,i}))", Unit: "MPa",
	Examples: hand("1593.2 MPa", "σ_{av,i} = 1600 MPa", "E_{p,i} = 195 GPa", "ε_{p,i} = 31.5 ‰", "f_{pd,i} = 1426.1 MPa", "f_{pk,i} = 1860 MPa",
		"γ_S = 1.15", "ε_{py,i} = 7.3133 ‰", "ε_{puk,i} = 35 ‰"),
})

// BarStress is σ_s on the horizontal branch, the same in compression.
var BarStress = clause.Define(&clause.Formula{
	ID: "bar-stress", Name: "Stress of each bar row, at most what is anchored", Ref: en("3.2.7(2) Figure 3.8", ""),
	Text: "σ_{s,j} = max(−σ_{sa,j}; min(E_s·ε_{s,j}; σ_{sa,j}))", Unit: "MPa",
	Examples: append(hand("434.78 MPa", "σ_{sa,j} = 434.78 MPa", "E_s = 200 GPa", "ε_{s,j} = 12 ‰"),
		hand("-200 MPa", "σ_{sa,j} = 434.78 MPa", "E_s = 200 GPa", "ε_{s,j} = -1 ‰")...),
})

// BarStressOnIncline is σ_s on the inclined branch, the same in compression.
var BarStressOnIncline = clause.Define(&clause.Formula{
	ID: "bar-stress-inclined", Name: "Stress of each bar row on the inclined branch, at most what is anchored", Ref: en("3.2.7(2) Figure 3.8", ""),
	Text: "σ_{s,j} = max(−σ_{sa,j}; −f_{yd,j}·(1 + (k_{s,j} − 1)·max(0; −ε_{s,j} − ε_{sy,j})/(ε_{suk,j} − ε_{sy,j})); " +
		"min(E_s·ε_{s,j}; f_{yd,j}·(1 + (k_{s,j} − 1)·max(0; ε_{s,j} − ε_{sy,j})/(ε_{suk,j} − ε_{sy,j})); σ_{sa,j}))", Unit: "MPa",
	Examples: hand("465.9 MPa", "σ_{sa,j} = 480 MPa", "E_s = 200 GPa", "ε_{s,j} = 45 ‰", "f_{yd,j} = 434.78 MPa", "k_{s,j} = 1.08",
		"ε_{sy,j} = 2.1739 ‰", "ε_{suk,j} = 50 ‰"),
})

// TendonForce is F_p.
var TendonForce = clause.Define(&clause.Formula{
	ID: "tendon-force", Name: "Force of each row", Ref: en(compatible, ""), Text: "F_{p,i} = A_{p,i}·σ_{p,i}", Unit: "kN", Digits: 6,
	Examples: hand("1585.82 kN", "A_{p,i} = 1112 mm²", "σ_{p,i} = 1426.1 MPa"),
})

// BarForce is F_s.
var BarForce = clause.Define(&clause.Formula{
	ID: "bar-force", Name: "Force of each bar row", Ref: en(compatible, ""), Text: "F_{s,j} = A_{s,j}·σ_{s,j}", Unit: "kN", Digits: 6,
	Examples: hand("349.672 kN", "A_{s,j} = 804.25 mm²", "σ_{s,j} = 434.78 MPa"),
})

// BlockDepth is the depth of the block.
var BlockDepth = clause.Define(&clause.Formula{
	ID: "block-depth", Name: "Depth of the rectangular block", Ref: en("3.1.7(3) Figure 3.5", ""), Text: "a = λ·x", Unit: "mm", Digits: 6,
	Examples: hand("95.144 mm", "λ = 0.8", "x = 118.93 mm"),
})

// The block where the top fibre stays below its ultimate strain: its depth and stress factors follow the resultant of
// the parabola–rectangle at that strain, related to the resultant at the ultimate strain, so that they are λ and η
// there.

// StrainRatio is the strain of the top fibre over ε_c2.
var StrainRatio = clause.Define(&clause.Formula{
	ID: "strain-ratio", Name: "Strain of the top fibre over that at the end of the parabola", Ref: en("3.1.7(1)", "3.17"),
	Text: "r_c = ε_c/ε_c2", Unit: "", Digits: 6, Examples: hand("0.5", "ε_c = 1 ‰", "ε_c2 = 2 ‰"),
})

// Fullness is the mean stress of the parabola–rectangle over the compressed depth, as part of f_cd.
var Fullness = clause.Define(&clause.Formula{
	ID: "fullness", Name: "Mean stress of the parabola–rectangle over the compressed depth, as part of the design strength", Ref: en("3.1.7(1)", "3.17, 3.18"),
	Text: "α_R = 1 − (1 − max(0; 1 − r_c)^(n + 1))/((n + 1)·r_c)", Unit: "", Digits: 6,
	Examples: []clause.Example{by("handbook coefficient of the full block, 17/21 = 0.810", clause.Recalled, "0.810", "r_c = 1.75", "n = 2"),
		by("worked by hand: r − r²/3", clause.Own, "0.416667", "r_c = 0.5", "n = 2")},
})

// ResultantDepth is the depth of the resultant of the parabola–rectangle as part of the compressed depth.
var ResultantDepth = clause.Define(&clause.Formula{
	ID: "resultant-depth", Name: "Depth of its resultant, as part of the compressed depth", Ref: en("3.1.7(1)", "3.17, 3.18"),
	Text: "k_a = 1 − (1/2 − (1 − max(0; 1 − r_c)^(n + 1)·(1 + (n + 1)·r_c))/((n + 1)·(n + 2)·r_c^2))/α_R", Unit: "", Digits: 6,
	Examples: []clause.Example{by("handbook coefficient of the full block, 99/238 = 0.416", clause.Recalled, "0.416", "r_c = 1.75", "n = 2", "α_R = 0.8095238"),
		by("worked by hand: (4 − r)/(12 − 4·r)", clause.Own, "0.35", "r_c = 0.5", "n = 2", "α_R = 0.4166667")},
})

// FullFullness is α_R at the ultimate strain.
var FullFullness = clause.Define(&clause.Formula{
	ID: "full-fullness", Name: "The same mean stress at the ultimate strain", Ref: en("3.1.7(1)", "3.17, 3.18"),
	Text: "α_Ru = 1 − ε_c2/((n + 1)·ε_cu2)", Unit: "", Digits: 6,
	Examples: []clause.Example{by("handbook coefficient of the full block, 17/21 = 0.810", clause.Recalled, "0.810", "ε_c2 = 2 ‰", "ε_cu2 = 3.5 ‰", "n = 2")},
})

// FullResultantDepth is k_a at the ultimate strain.
var FullResultantDepth = clause.Define(&clause.Formula{
	ID: "full-resultant-depth", Name: "The same depth at the ultimate strain", Ref: en("3.1.7(1)", "3.17, 3.18"),
	Text: "k_au = 1 − (1/2 − (ε_c2/ε_cu2)^2/((n + 1)·(n + 2)))/α_Ru", Unit: "", Digits: 6,
	Examples: []clause.Example{by("handbook coefficient of the full block, 99/238 = 0.416", clause.Recalled, "0.416", "ε_c2 = 2 ‰", "ε_cu2 = 3.5 ‰", "n = 2", "α_Ru = 0.8095238")},
})

// ReducedDepthFactor is λ where the top fibre is below its ultimate strain.
var ReducedDepthFactor = clause.Define(&clause.Formula{
	ID: "reduced-depth-factor", Name: "Depth factor of the block at that strain", Ref: en("3.1.7(3)", ""),
	Text: "λ_c = λ·k_a/k_au", Unit: "", Digits: 6, Examples: hand("0.67313", "λ = 0.8", "k_a = 0.35", "k_au = 0.4159664"),
})

// ReducedStressFactor is η where the top fibre is below its ultimate strain.
var ReducedStressFactor = clause.Define(&clause.Formula{
	ID: "reduced-stress-factor", Name: "Stress factor of the block at that strain", Ref: en("3.1.7(3)", ""),
	Text: "η_c = η·α_R/α_Ru·k_au/k_a", Unit: "", Digits: 6,
	Examples: hand("0.61172", "η = 1", "α_R = 0.4166667", "α_Ru = 0.8095238", "k_au = 0.4159664", "k_a = 0.35"),
})

// ReducedBlockDepth is the depth of the block with the reduced factors.
var ReducedBlockDepth = clause.Define(&clause.Formula{
	ID: "block-depth-reduced", Name: "Depth of the rectangular block", Ref: en("3.1.7(3) Figure 3.5", ""), Text: "a = λ_c·x", Unit: "mm", Digits: 6,
	Examples: hand("80 mm", "λ_c = 0.67", "x = 119.403 mm"),
})

// BlockPartDepth is how deep the block reaches into each part.
var BlockPartDepth = clause.Define(&clause.Formula{
	ID: "block-part-depth", Name: "Depth of the block within each part",
	Text: "c_{c,n} = max(0; min(h_{c,n}; a − z_{c,n}))", Unit: "mm", Digits: 6,
	Examples: hand("20 mm", "h_{c,n} = 60 mm", "a = 120 mm", "z_{c,n} = 100 mm"),
})

// BlockPartWidth is the width of each part at the lower edge of the block.
var BlockPartWidth = clause.Define(&clause.Formula{
	ID: "block-part-width", Name: "Width of each part where the block ends",
	Text: "b_{c,n} = b_{o,n} + (b_{u,n} − b_{o,n})·c_{c,n}/h_{c,n}", Unit: "mm", Digits: 6,
	Examples: hand("380 mm", "b_{o,n} = 500 mm", "b_{u,n} = 140 mm", "c_{c,n} = 20 mm", "h_{c,n} = 60 mm"),
})

// BlockPartArea is the area of the block in each part.
var BlockPartArea = clause.Define(&clause.Formula{
	ID: "block-part-area", Name: "Area of the block within each part",
	Text: "A_{cc,n} = c_{c,n}·(b_{o,n} + b_{c,n})/2", Unit: "mm²", Digits: 6,
	Examples: hand("8800 mm²", "c_{c,n} = 20 mm", "b_{o,n} = 500 mm", "b_{c,n} = 380 mm"),
})

// BlockPartDepthOfCentroid is the depth of the centroid of the block's area in each part.
var BlockPartDepthOfCentroid = clause.Define(&clause.Formula{
	ID: "block-part-centroid", Name: "Depth of the centroid of that area from the top",
	Text: "z_{cc,n} = z_{c,n} + c_{c,n}/3·(b_{o,n} + 2·b_{c,n})/(b_{o,n} + b_{c,n})", Unit: "mm", Digits: 6,
	Examples: hand("109.545 mm", "z_{c,n} = 100 mm", "c_{c,n} = 20 mm", "b_{o,n} = 500 mm", "b_{c,n} = 380 mm"),
})

// ConcreteForce is F_c.
var ConcreteForce = clause.Define(&clause.Formula{
	ID: "concrete-force", Name: "Force of the block", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "F_c = η·f_cd·Σ_n(A_{cc,n})", Unit: "kN", Digits: 6,
	Examples: hand("1585.72 kN", "η = 1", "f_cd = 33.333 MPa", "A_{cc,n} = 47572 mm², 0 mm²"),
})

// ReducedConcreteForce is F_c with the reduced factors.
var ReducedConcreteForce = clause.Define(&clause.Formula{
	ID: "concrete-force-reduced", Name: "Force of the block", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "F_c = η_c·f_cd·Σ_n(A_{cc,n})", Unit: "kN", Digits: 6,
	Examples: hand("951.43 kN", "η_c = 0.6", "f_cd = 33.333 MPa", "A_{cc,n} = 47572 mm², 0 mm²"),
})

// ConcreteForceDepth is the depth of F_c.
var ConcreteForceDepth = clause.Define(&clause.Formula{
	ID: "concrete-force-depth", Name: "Depth of that force from the top", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "d_c = Σ_n(A_{cc,n}·z_{cc,n})/Σ_n(A_{cc,n})", Unit: "mm", Digits: 6,
	Examples: hand("47.572 mm", "A_{cc,n} = 47572 mm², 0 mm²", "z_{cc,n} = 47.572 mm, 100 mm"),
})

func steelSums(with, without *clause.Formula) (*clause.Formula, *clause.Formula) {
	return clause.Define(with), clause.Define(without)
}

// Sums over the steel, with and without bars.
var (
	ResidualWithBars, Residual = steelSums(
		&clause.Formula{ID: "residual-with-bars", Name: "Equilibrium: what is left of the forces", Ref: en(compatible, ""),
			Text: "ΔF = F_c − Σ_i(F_{p,i}) − Σ_j(F_{s,j})", Unit: "kN", Digits: 2,
			Examples: hand("0.1 kN", "F_c = 1935.6 kN", "F_{p,i} = 1000 kN, 585.8 kN", "F_{s,j} = 349.7 kN")},
		&clause.Formula{ID: "residual", Name: "Equilibrium: what is left of the forces", Ref: en(compatible, ""),
			Text: "ΔF = F_c − Σ_i(F_{p,i})", Unit: "kN", Digits: 2,
			Examples: hand("0.1 kN", "F_c = 1585.9 kN", "F_{p,i} = 1000 kN, 585.8 kN")})
	ResistanceWithBars, Resistance = steelSums(
		&clause.Formula{ID: "moment-resistance-with-bars", Name: "Moment resistance about the line of the concrete force", Ref: en(compatible, ""),
			Text: "M_Rd = Σ_i(F_{p,i}·z_{p,i}) + Σ_j(F_{s,j}·z_{s,j})", Unit: "kN·m", Digits: 6, Domain: balanced,
			Examples: hand("2.2 kN·m", "F_{p,i} = 1 kN", "z_{p,i} = 1 m", "F_{s,j} = 2 kN", "z_{s,j} = 600 mm")},
		&clause.Formula{ID: "moment-resistance", Name: "Moment resistance about the line of the concrete force", Ref: en(compatible, ""),
			Text: "M_Rd = Σ_i(F_{p,i}·z_{p,i})", Unit: "kN·m", Digits: 6, Domain: balanced,
			Examples: hand("2.2 kN·m", "F_{p,i} = 1 kN, 2 kN", "z_{p,i} = 1000 mm, 600 mm")})
)

// balanced is the domain of a resistance: the forces balance to a thousandth, and the section is not wholly
// compressed, which the pivot at the top fibre does not cover (6.1(5) and (6)).
const balanced = "abs(ΔF) ≤ 0.001·F_c and x ≤ h"

// TendonLever and BarLever are lever arms about the line of F_c.
var (
	TendonLever = clause.Define(&clause.Formula{ID: "tendon-lever", Name: "Lever arm of each row about the concrete force", Ref: en(compatible, ""),
		Text: "z_{p,i} = d_{p,i} − d_c", Unit: "mm", Digits: 6, Examples: hand("1092.43 mm", "d_{p,i} = 1140 mm", "d_c = 47.57 mm")})
	BarLever = clause.Define(&clause.Formula{ID: "bar-lever", Name: "Lever arm of each bar row about the concrete force", Ref: en(compatible, ""),
		Text: "z_{s,j} = d_{s,j} − d_c", Unit: "mm", Digits: 6, Examples: hand("502.43 mm", "d_{s,j} = 550 mm", "d_c = 47.57 mm")})
)

// TendonCounts and BarCounts are 1 for steel that counts as tension steel at the station, 0 for the rest.
var (
	TendonCounts = clause.Define(&clause.Formula{ID: "tendon-counts", Name: "1 for a row below the centroid that is bonded here, 0 for the others",
		Text: "t_{p,i} = cases(e_i > 0·[mm] and s_i > 0·[mm]: 1; otherwise: 0)", Unit: "", Digits: 1,
		Examples: append(hand("1, 0", "e_i = 490 mm, -510 mm", "s_i = 5 m, 5 m"), hand("0", "e_i = 440 mm", "s_i = 0 m")...)})
	BarCounts = clause.Define(&clause.Formula{ID: "bar-counts", Name: "1 for a row below the centroid, 0 for the others",
		Text: "t_{s,j} = cases(d_{s,j} > h − y_cg: 1; otherwise: 0)", Unit: "", Digits: 1,
		Examples: hand("1, 0", "d_{s,j} = 600 mm, 40 mm", "h = 650 mm", "y_cg = 425 mm")})
)

// TensionSteelForce is the design force of the steel that counts: without any there is no effective depth.
var TensionSteelForceWithBars, TensionSteelForce = steelSums(
	&clause.Formula{ID: "tension-steel-force-with-bars", Name: "Design force of the steel below the centroid that is bonded here", Ref: en(compatible, ""),
		Text: "F_t = Σ_i(t_{p,i}·A_{p,i}·f_{pd,i}) + Σ_j(t_{s,j}·A_{s,j}·f_{yd,j})", Unit: "kN",
		Examples: hand("200 kN", "t_{p,i} = 1, 0", "A_{p,i} = 100 mm², 50 mm²", "f_{pd,i} = 1000 MPa, 1000 MPa", "t_{s,j} = 1", "A_{s,j} = 250 mm²", "f_{yd,j} = 400 MPa")},
	&clause.Formula{ID: "tension-steel-force", Name: "Design force of the rows below the centroid that are bonded here", Ref: en(compatible, ""),
		Text: "F_t = Σ_i(t_{p,i}·A_{p,i}·f_{pd,i})", Unit: "kN",
		Examples: hand("100 kN", "t_{p,i} = 1, 0", "A_{p,i} = 100 mm², 300 mm²", "f_{pd,i} = 1000 MPa, 1000 MPa")})

// TensionDepth is the effective depth, to the steel that counts, weighed by its design force.
var TensionDepthWithBars, TensionDepth = steelSums(
	&clause.Formula{ID: "tension-depth-with-bars", Name: "Effective depth, to that steel, weighed by its strength", Ref: en(compatible, ""),
		Text: "d = (Σ_i(t_{p,i}·A_{p,i}·f_{pd,i}·d_{p,i}) + Σ_j(t_{s,j}·A_{s,j}·f_{yd,j}·d_{s,j}))/F_t", Unit: "mm",
		Examples: hand("550 mm", "t_{p,i} = 1", "A_{p,i} = 100 mm²", "f_{pd,i} = 1000 MPa", "d_{p,i} = 500 mm", "t_{s,j} = 1", "A_{s,j} = 250 mm²", "f_{yd,j} = 400 MPa", "d_{s,j} = 600 mm", "F_t = 200 kN")},
	&clause.Formula{ID: "tension-depth", Name: "Effective depth, to those rows, weighed by their strength", Ref: en(compatible, ""),
		Text: "d = Σ_i(t_{p,i}·A_{p,i}·f_{pd,i}·d_{p,i})/F_t", Unit: "mm",
		Examples: hand("1025 mm", "t_{p,i} = 1, 1, 0", "A_{p,i} = 500 mm², 500 mm², 186 mm²", "f_{pd,i} = 1420 MPa, 1420 MPa, 1420 MPa", "d_{p,i} = 1050 mm, 1000 mm, 50 mm", "F_t = 1420 kN")})

// TensionSteelThere asks whether any steel below the centroid is bonded at the station.
var TensionSteelThere = &clause.Condition{
	ID: "tension-steel-there", Name: "Steel in the tension zone", Ref: en(compatible, ""), Text: "F_t > 0·[kN]",
	Yes: "steel below the centroid is bonded here", No: "no steel below the centroid is bonded here",
}

// AxisRatio is x/d.
var AxisRatio = clause.Define(&clause.Formula{
	ID: "axis-ratio", Name: "Relative depth of the neutral axis", Ref: en(compatible, ""), Text: "ξ_x = x/d", Unit: "",
	Examples: hand("0.10432", "x = 118.93 mm", "d = 1140 mm"),
})

// OutermostBonded is the depth of the outermost row of tendons that is bonded at the station.
var OutermostBonded = clause.Define(&clause.Formula{
	ID: "outermost-bonded", Name: "Depth of the outermost row of tendons that is bonded here", Text: "d_o = max_i(cases(s_i > 0·[mm]: d_{p,i}; otherwise: 0·[mm]))", Unit: "mm", Digits: 6,
	Examples: hand("1090 mm", "d_{p,i} = 1140 mm, 1090 mm", "s_i = 0 m, 2 m"),
})

// OutermostAnchorage is the part of its design strength that the outermost bonded row can anchor.
var OutermostAnchorage = clause.Define(&clause.Formula{
	ID: "outermost-anchorage", Name: "Part of its design strength that this row can anchor", Ref: en("8.10.2.3(5)", ""),
	Text: "r_a = max_i(cases(d_{p,i} = d_o: σ_{av,i}/f_{pd,i}; otherwise: 0))", Unit: "", Digits: 4,
	Examples: hand("0.5", "d_{p,i} = 1140 mm, 1090 mm", "d_o = 1140 mm", "σ_{av,i} = 700 MPa, 1400 MPa", "f_{pd,i} = 1400 MPa, 1400 MPa"),
})

// OutermostStrain is the strain of the outermost bonded row over its yield strain.
var OutermostStrain = clause.Define(&clause.Formula{
	ID: "outermost-strain", Name: "Strain of this row over its strain at the design strength", Ref: en("5.10.1(5)P", ""),
	Text: "r_y = max_i(cases(d_{p,i} = d_o: ε_{p,i}/ε_{py,i}; otherwise: 0))", Unit: "", Digits: 4,
	Examples: hand("3.5", "d_{p,i} = 1140 mm, 1090 mm", "d_o = 1140 mm", "ε_{p,i} = 24.5 ‰, 20 ‰", "ε_{py,i} = 7 ‰, 7 ‰"),
})

// OutermostAnchored asks whether anchorage or strength limits the outermost row.
var OutermostAnchored = &clause.Condition{
	ID: "outermost-anchored", Name: "Kind of failure: anchorage", Ref: en("8.10.2.3", ""), Text: "r_a ≥ 1",
	Yes: "the outermost row can be anchored up to its design strength",
	No:  "anchorage limits the outermost row: its bond fails before it yields, without warning",
}

// OutermostYields asks whether the outermost row yields before the section fails.
var OutermostYields = &clause.Condition{
	ID: "outermost-yields", Name: "Kind of failure: strength", Ref: en("5.10.1(5)P", ""), Text: "r_y ≥ 1",
	Yes: "the outermost row yields before the section fails",
	No:  "over-reinforced: the concrete crushes before the outermost row yields",
}

// ConcreteCrushes asks which strain ends the resistance.
var ConcreteCrushes = &clause.Condition{
	ID: "concrete-crushes", Name: "Strain that ends the resistance", Ref: en("6.1(3)P Figure 6.1", ""), Text: "ε_c ≥ 0.9999·ε_cu3",
	Yes: "the top fibre reaches its ultimate strain", No: "a row of steel reaches its strain limit, the top fibre is below its ultimate strain",
}

// AxisRoot is the neutral axis found from compatible strains.
func axisRoot(residual *clause.Formula, equation string) *clause.Root {
	return &clause.Root{ID: "axis-root", Name: "Depth of the neutral axis from compatible strains", Ref: en(compatible, ""),
		Unknown: "x", Unit: "mm", Digits: 7, Equation: equation, Residual: residual, Scale: "F_c", Tolerance: 2e-4}
}

// The unknown depth of the neutral axis, with and without bars.
var (
	AxisRootWithBars = axisRoot(ResidualWithBars, "F_c = Σ_i(F_{p,i}) + Σ_j(F_{s,j})")
	AxisRoot         = axisRoot(Residual, "F_c = Σ_i(F_{p,i})")
)

// BendingSufficient is M_Ed ≤ M_Rd.
var BendingSufficient = &clause.Check{ID: "bending-sufficient", Name: "Bending at ultimate, sagging", Ref: en("6.1", ""), Demand: "M_Ed", Limit: "M_Rd"}
