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
	ID: "prestress-moment", Name: "Moment of the prestressing force about the centroid", Ref: en("5.10.8(1)", ""),
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

// Curvature is κ with the concrete at its limit.
var Curvature = clause.Define(&clause.Formula{
	ID: "curvature", Name: "Curvature, the top fibre at its ultimate strain", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = ε_cu3/x", Unit: "1/km", Digits: 8,
	Examples: hand("29.429 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm"),
})

// CurvatureWithLimit is κ with the concrete or the outermost steel at its limit.
var CurvatureWithLimit = clause.Define(&clause.Formula{
	ID: "curvature-with-limit", Name: "Curvature: the top fibre at its ultimate strain, or an anchored row of tendons at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = min(ε_cu3/x; min_i(cases(d_{p,i} > x and σ_{av,i} ≥ f_{pd,i}: (ε_{pud,i} − ε_{p0,i})/(d_{p,i} − x); otherwise: ε_cu3/x)))", Unit: "1/km", Digits: 8,
	Examples: hand("24.889 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm", "d_{p,i} = 1140 mm", "ε_{pud,i} = 31.5 ‰", "ε_{p0,i} = 6.087 ‰", "σ_{av,i} = 1426.1 MPa", "f_{pd,i} = 1426.1 MPa"),
})

// CurvatureWithBarLimit is CurvatureWithLimit with bars that have a limit too.
var CurvatureWithBarLimit = clause.Define(&clause.Formula{
	ID: "curvature-with-bar-limit", Name: "Curvature: the top fibre at its ultimate strain, or an anchored row of bars at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = min(ε_cu3/x; min_j(cases(d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: ε_{sud,j}/(d_{s,j} − x); otherwise: ε_cu3/x)))", Unit: "1/km", Digits: 8,
	Examples: hand("29.429 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm", "d_{s,j} = 1140 mm", "ε_{sud,j} = 45 ‰", "σ_{sa,j} = 465.9 MPa", "f_{yd,j} = 434.78 MPa"),
})

// CurvatureWithBothLimits has tendons and bars with limits.
var CurvatureWithBothLimits = clause.Define(&clause.Formula{
	ID: "curvature-with-both-limits", Name: "Curvature: the top fibre at its ultimate strain, or an anchored row of steel at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
	Text: "κ = min(ε_cu3/x; min_i(cases(d_{p,i} > x and σ_{av,i} ≥ f_{pd,i}: (ε_{pud,i} − ε_{p0,i})/(d_{p,i} − x); otherwise: ε_cu3/x)); min_j(cases(d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: ε_{sud,j}/(d_{s,j} − x); otherwise: ε_cu3/x)))",
	Unit: "1/km", Digits: 8,
	Examples: hand("24.889 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm", "d_{p,i} = 1140 mm", "ε_{pud,i} = 31.5 ‰", "ε_{p0,i} = 6.087 ‰", "σ_{av,i} = 1426.1 MPa", "f_{pd,i} = 1426.1 MPa",
		"d_{s,j} = 1140 mm", "ε_{sud,j} = 45 ‰", "σ_{sa,j} = 465.9 MPa", "f_{yd,j} = 434.78 MPa"),
})

// TopStrain is the strain of the top fibre.
var TopStrain = clause.Define(&clause.Formula{
	ID: "top-strain", Name: "Strain of the top fibre", Ref: en("6.1(3)P", ""), Text: "ε_c = κ·x", Unit: "‰", Digits: 6,
	Examples: hand("3.5 ‰", "κ = 29.429 1/km", "x = 118.93 mm"),
})

// TendonStrain is ε_p.
var TendonStrain = clause.Define(&clause.Formula{
	ID: "tendon-strain", Name: "Strain of each row: prestrain and that of bending", Ref: en(compatible, ""),
	Text: "ε_{p,i} = ε_{p0,i} + κ·(d_{p,i} − x)", Unit: "‰", Digits: 7,
	Examples: hand("36.136 ‰", "ε_{p0,i} = 6.087 ‰", "κ = 29.429 1/km", "d_{p,i} = 1140 mm", "x = 118.93 mm"),
})

// BarStrain is ε_s.
var BarStrain = clause.Define(&clause.Formula{
	ID: "bar-strain", Name: "Strain of each bar row", Ref: en(compatible, ""), Text: "ε_{s,j} = κ·(d_{s,j} − x)", Unit: "‰", Digits: 7,
	Examples: hand("12.686 ‰", "κ = 29.429 1/km", "d_{s,j} = 550 mm", "x = 118.93 mm"),
})

// TendonStress is σ_p on the horizontal branch.
var TendonStress = clause.Define(&clause.Formula{
	ID: "tendon-stress", Name: "Stress of each row, at most what is anchored", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "σ_{p,i} = max(−σ_{av,i}; min(E_{p,i}·ε_{p,i}; f_{pd,i}; σ_{av,i}))", Unit: "MPa", Digits: 6,
	Examples: append(hand("1426.1 MPa", "σ_{av,i} = 1426.1 MPa", "E_{p,i} = 195 GPa", "ε_{p,i} = 36 ‰", "f_{pd,i} = 1426.1 MPa"),
		hand("975 MPa", "σ_{av,i} = 1426.1 MPa", "E_{p,i} = 195 GPa", "ε_{p,i} = 5 ‰", "f_{pd,i} = 1426.1 MPa")...),
})

// TendonStressOnIncline is σ_p on the inclined branch.
var TendonStressOnIncline = clause.Define(&clause.Formula{
	ID: "tendon-stress-inclined", Name: "Stress of each row on the inclined branch, at most what is anchored", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "σ_{p,i} = max(−σ_{av,i}; min(E_{p,i}·ε_{p,i}; f_{pd,i} + (f_{pk,i}/γ_S − f_{pd,i})·(ε_{p,i} − ε_{py,i})/(ε_{puk,i} − ε_{py,i}); σ_{av,i}))", Unit: "MPa", Digits: 6,
	Examples: hand("1593.2 MPa", "σ_{av,i} = 1600 MPa", "E_{p,i} = 195 GPa", "ε_{p,i} = 31.5 ‰", "f_{pd,i} = 1426.1 MPa", "f_{pk,i} = 1860 MPa",
		"γ_S = 1.15", "ε_{py,i} = 7.3133 ‰", "ε_{puk,i} = 35 ‰"),
})

// BarStress is σ_s on the horizontal branch, the same in compression.
var BarStress = clause.Define(&clause.Formula{
	ID: "bar-stress", Name: "Stress of each bar row, at most what is anchored", Ref: en("3.2.7(2) Figure 3.8", ""),
	Text: "σ_{s,j} = max(−σ_{sa,j}; min(E_s·ε_{s,j}; σ_{sa,j}))", Unit: "MPa", Digits: 6,
	Examples: append(hand("434.78 MPa", "σ_{sa,j} = 434.78 MPa", "E_s = 200 GPa", "ε_{s,j} = 12 ‰"),
		hand("-200 MPa", "σ_{sa,j} = 434.78 MPa", "E_s = 200 GPa", "ε_{s,j} = -1 ‰")...),
})

// BarStressOnIncline is σ_s on the inclined branch, the same in compression.
var BarStressOnIncline = clause.Define(&clause.Formula{
	ID: "bar-stress-inclined", Name: "Stress of each bar row on the inclined branch, at most what is anchored", Ref: en("3.2.7(2) Figure 3.8", ""),
	Text: "σ_{s,j} = max(−σ_{sa,j}; −f_{yd,j}·(1 + (k_{s,j} − 1)·max(0; −ε_{s,j} − ε_{sy,j})/(ε_{suk,j} − ε_{sy,j})); " +
		"min(E_s·ε_{s,j}; f_{yd,j}·(1 + (k_{s,j} − 1)·max(0; ε_{s,j} − ε_{sy,j})/(ε_{suk,j} − ε_{sy,j})); σ_{sa,j}))", Unit: "MPa", Digits: 6,
	Examples: hand("465.9 MPa", "σ_{sa,j} = 480 MPa", "E_s = 200 GPa", "ε_{s,j} = 45 ‰", "f_{yd,j} = 434.78 MPa", "k_{s,j} = 1.08",
		"ε_{sy,j} = 2.1739 ‰", "ε_{suk,j} = 50 ‰"),
})

// TendonForce is F_p.
var TendonForce = clause.Define(&clause.Formula{
	ID: "tendon-force", Name: "Force of each row", Ref: en(compatible, ""), Text: "F_{p,i} = A_{p,i}·σ_{p,i}", Unit: "kN", Digits: 7,
	Examples: hand("1585.82 kN", "A_{p,i} = 1112 mm²", "σ_{p,i} = 1426.1 MPa"),
})

// BarForce is F_s.
var BarForce = clause.Define(&clause.Formula{
	ID: "bar-force", Name: "Force of each bar row", Ref: en(compatible, ""), Text: "F_{s,j} = A_{s,j}·σ_{s,j}", Unit: "kN", Digits: 7,
	Examples: hand("349.672 kN", "A_{s,j} = 804.25 mm²", "σ_{s,j} = 434.78 MPa"),
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

// balanced is the domain of a resistance: the forces balance to a thousandth, or to 50 N where next to no steel is
// anchored.
const balanced = "abs(ΔF) ≤ max(0.001·F_c; 0.05·[kN])"

// TendonLever and BarLever are lever arms about the line of F_c.
var (
	TendonLever = clause.Define(&clause.Formula{ID: "tendon-lever", Name: "Lever arm of each row about the concrete force", Ref: en(compatible, ""),
		Text: "z_{p,i} = d_{p,i} − d_c", Unit: "mm", Digits: 6, Examples: hand("1092.43 mm", "d_{p,i} = 1140 mm", "d_c = 47.57 mm")})
	BarLever = clause.Define(&clause.Formula{ID: "bar-lever", Name: "Lever arm of each bar row about the concrete force", Ref: en(compatible, ""),
		Text: "z_{s,j} = d_{s,j} − d_c", Unit: "mm", Digits: 6, Examples: hand("502.43 mm", "d_{s,j} = 550 mm", "d_c = 47.57 mm")})
)

// AxisRoot is the neutral axis found from compatible strains.
func axisRoot(residual *clause.Formula, equation string) *clause.Root {
	return &clause.Root{ID: "axis-root", Name: "Depth of the neutral axis from compatible strains", Ref: en(compatible, ""),
		Unknown: "x", Unit: "mm", Digits: 7, Equation: equation, Residual: residual, Scale: "F_c", Tolerance: 1e-3}
}

// The unknown depth of the neutral axis, with and without bars.
var (
	AxisRootWithBars = axisRoot(ResidualWithBars, "F_c = Σ_i(F_{p,i}) + Σ_j(F_{s,j})")
	AxisRoot         = axisRoot(Residual, "F_c = Σ_i(F_{p,i})")
)

// BendingSufficient is M_Ed ≤ M_Rd.
var BendingSufficient = &clause.Check{ID: "bending-sufficient", Name: "Bending at ultimate, sagging", Ref: en("6.1", ""), Demand: "M_Ed", Limit: "M_Rd"}
