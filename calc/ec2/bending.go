package ec2

import "soffit/calc/clause"

// Ultimate bending with strain compatibility, 6.1 and 3.1.7. Depths count from the compressed edge: the top where the
// moment sags, the soffit where it hogs. Row i is a row of tendons at depth d_{p,i}, row j one of bars at depth d_{s,j}.
// ε_{p0,i} is the strain of the steel when the concrete beside it has none.

const compatible = "6.1(2)P"

// CountedStress is the stress of a row that the resistance is counted with. Prestress near the compressed edge takes from the
// resistance: rows within half the depth of the centroid from there count at transfer, where it is greatest, over l_pt1.
var CountedStress = clause.Define(&clause.Formula{
	ID: "counted-stress", Name: "Stress of each row that is counted: near the compressed edge at transfer, else after all losses", Ref: en("5.10.8(1)", ""),
	Text: "σ_{pu,i} = cases(d_{p,i} < z_0/2: max(σ_{pi,i}; σ_{pt,i}); otherwise: σ_{pt,i})", Unit: "MPa",
	Examples: hand("1228 MPa, 1145 MPa", "d_{p,i} = 60 mm, 900 mm", "z_0 = 500 mm", "σ_{pi,i} = 1228 MPa, 1228 MPa", "σ_{pt,i} = 1145 MPa, 1145 MPa"),
})

// PrestressForce is P at the station.
var PrestressForce = clause.Define(&clause.Formula{
	ID: "prestress-force", Name: "Prestressing force at the station", Ref: en("5.10.8(1)", ""),
	Text: "P_d = γ_P·Σ_i(A_{p,i}·σ_{pu,i})", Unit: "kN",
	Examples: hand("1273.2 kN", "γ_P = 1.0", "A_{p,i} = 1112 mm²", "σ_{pu,i} = 1145 MPa"),
})

// PrestressMoment is the moment of P about the centroid.
var PrestressMoment = clause.Define(&clause.Formula{
	ID: "prestress-moment", Name: "Moment of the prestressing force about the centroid", Ref: en("5.10.8(1)", ""),
	Text: "M_P = γ_P·Σ_i(A_{p,i}·σ_{pu,i}·e_i)", Unit: "kN·m",
	Examples: hand("560.23 kN·m", "γ_P = 1.0", "A_{p,i} = 1112 mm²", "σ_{pu,i} = 1145 MPa", "e_i = 440 mm"),
})

// ConcreteStressAtTendon is σ_cp.
var ConcreteStressAtTendon = clause.Define(&clause.Formula{
	ID: "concrete-stress-at-tendon", Name: "Concrete stress at each row from the prestress alone, compression positive",
	Text: "σ_{cp,i} = P_d/A_c + M_P·e_i/I_c", Unit: "MPa",
	Examples: append(hand("7.96 MPa", "P_d = 1273.2 kN", "A_c = 420000 mm²", "M_P = 560.2 kN·m", "I_c = 50000 10⁶ mm⁴", "e_i = 440 mm"),
		by("Lin & Burns, Design of Prestressed Concrete Structures, 3rd ed., Ex. 1-1: 600 + 720 psi at the soffit", clause.Recalled, "9.1 MPa",
			"P_d = 1601.36 kN", "A_c = 387096 mm²", "M_P = 244.048 kN·m", "I_c = 18730.9 10⁶ mm⁴", "e_i = 381 mm")),
})

// SelfWeightMoment is the moment of the self-weight alone.
var SelfWeightMoment = clause.Define(&clause.Formula{
	ID: "self-weight-moment", Name: "Moment of the self-weight at the station", Text: "M_g = Σ_i(w_i·M_i)", Unit: "kN·m", Digits: 6,
	Examples: hand("200 kN·m", "w_i = 1, 0", "M_i = 200 kN·m, 80 kN·m"),
})

// ConcreteStressWhenGrouted is σ_cp of a post-tensioned member: its tendons are grouted when the self-weight acts.
var ConcreteStressWhenGrouted = clause.Define(&clause.Formula{
	ID: "concrete-stress-when-grouted", Name: "Concrete stress at each row from the prestress and the self-weight, which act when the tendons are grouted, compression positive",
	Text: "σ_{cp,i} = P_d/A_c + (M_P − M_g)·e_i/I_c", Unit: "MPa",
	Examples: hand("6.20 MPa", "P_d = 1273.2 kN", "A_c = 420000 mm²", "M_P = 560.2 kN·m", "M_g = 200 kN·m", "I_c = 50000 10⁶ mm⁴", "e_i = 440 mm"),
})

// Prestrain is ε_p0.
var Prestrain = clause.Define(&clause.Formula{
	ID: "prestrain", Name: "Strain of the steel at zero strain of the concrete beside it", Ref: en("6.1(2)P", ""),
	Text: "ε_{p0,i} = γ_P·σ_{pu,i}/E_{p,i} + σ_{cp,i}/E_cm", Unit: "‰", Digits: 6,
	Examples: hand("6.0870 ‰", "γ_P = 1.0", "σ_{pu,i} = 1145 MPa", "E_{p,i} = 195 GPa", "σ_{cp,i} = 7.96 MPa", "E_cm = 36.99 GPa"),
})

// TopStrain is the strain of the compressed edge.
var TopStrain = clause.Define(&clause.Formula{
	ID: "top-strain", Name: "Strain of the compressed edge", Ref: en("6.1(3)P", ""), Text: "ε_c = κ·x", Unit: "‰", Digits: 6,
	Examples: hand("3.5 ‰", "κ = 29.429 1/km", "x = 118.93 mm"),
})

// BendingStrain is what bending adds to the strain of a row.
var BendingStrain = clause.Define(&clause.Formula{
	ID: "bending-strain", Name: "Strain of bending at each row", Ref: en(compatible, ""), Text: "Δε_{p,i} = κ·(d_{p,i} − x)", Unit: "‰", Digits: 7,
	Examples: hand("30.049 ‰", "κ = 29.429 1/km", "d_{p,i} = 1140 mm", "x = 118.93 mm"),
})

// TendonStrain is ε_p.
var TendonStrain = clause.Define(&clause.Formula{
	ID: "tendon-strain", Name: "Strain of each row: prestrain and that of bending", Ref: en(compatible, ""),
	Text: "ε_{p,i} = ε_{p0,i} + Δε_{p,i}", Unit: "‰", Digits: 7,
	Examples: hand("36.136 ‰", "ε_{p0,i} = 6.087 ‰", "Δε_{p,i} = 30.049 ‰"),
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

// Sums over the steel, with and without bars, without axial force and with one.
var (
	ResidualWithBars, Residual               = residuals("", "")
	AxialResidualWithBars, AxialResidual     = residuals("axial-", " − N_Ed")
	ResistanceWithBars, Resistance           = resistances("", "")
	AxialResistanceWithBars, AxialResistance = resistances("axial-", " + N_Ed·(z_ax − d_c)")
)

func residuals(id, axial string) (*clause.Formula, *clause.Formula) {
	name, given := "Equilibrium: what is left of the forces", []string{"F_c = 1935.6 kN", "F_{p,i} = 1000 kN, 585.8 kN"}
	bars := append(given[:2:2], "F_{s,j} = 349.7 kN")
	want, bare := "0.1 kN", "349.8 kN"
	if axial != "" {
		given, bars, want, bare = append(given, "N_Ed = 0.1 kN"), append(bars, "N_Ed = 0.1 kN"), "0.0 kN", "349.7 kN"
	}
	return steelSums(
		&clause.Formula{ID: id + "residual-with-bars", Name: name, Ref: en(compatible, ""), Text: "ΔF = F_c − Σ_i(F_{p,i}) − Σ_j(F_{s,j})" + axial, Unit: "kN", Digits: 2, Examples: hand(want, bars...)},
		&clause.Formula{ID: id + "residual", Name: name, Ref: en(compatible, ""), Text: "ΔF = F_c − Σ_i(F_{p,i})" + axial, Unit: "kN", Digits: 2, Examples: hand(bare, given...)})
}

func resistances(id, axial string) (*clause.Formula, *clause.Formula) {
	name, given, want := "Moment resistance about the line of the concrete force", []string{"F_{p,i} = 1 kN", "z_{p,i} = 1 m"}, []string{"2.2 kN·m", "1 kN·m"}
	if axial != "" {
		name = "Moment resistance about the centroid of the bare section, where the axial force acts"
		given, want = append(given, "N_Ed = 10 kN", "z_ax = 300 mm", "d_c = 100 mm"), []string{"4.2 kN·m", "3 kN·m"}
	}
	return steelSums(
		&clause.Formula{ID: id + "moment-resistance-with-bars", Name: name, Ref: en(compatible, ""), Text: "M_Rd = Σ_i(F_{p,i}·z_{p,i}) + Σ_j(F_{s,j}·z_{s,j})" + axial, Unit: "kN·m", Digits: 6, Domain: balanced,
			Examples: hand(want[0], append(given[:len(given):len(given)], "F_{s,j} = 2 kN", "z_{s,j} = 600 mm")...)},
		&clause.Formula{ID: id + "moment-resistance", Name: name, Ref: en(compatible, ""), Text: "M_Rd = Σ_i(F_{p,i}·z_{p,i})" + axial, Unit: "kN·m", Digits: 6, Domain: balanced,
			Examples: hand(want[1], given...)})
}

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

// axisRoot is the neutral axis found from compatible strains.
func axisRoot(residual *clause.Formula, equation string) *clause.Root {
	return &clause.Root{ID: "axis-root", Name: "Depth of the neutral axis from compatible strains", Ref: en(compatible, ""),
		Unknown: "x", Unit: "mm", Digits: 7, Equation: equation, Residual: residual, Scale: "F_c", Tolerance: 1e-3}
}

// The unknown depth of the neutral axis, with and without bars, without axial force and with one.
var (
	AxisRootWithBars      = axisRoot(ResidualWithBars, "F_c = Σ_i(F_{p,i}) + Σ_j(F_{s,j})")
	AxisRoot              = axisRoot(Residual, "F_c = Σ_i(F_{p,i})")
	AxialAxisRootWithBars = axisRoot(AxialResidualWithBars, "F_c = Σ_i(F_{p,i}) + Σ_j(F_{s,j}) + N_Ed")
	AxialAxisRoot         = axisRoot(AxialResidual, "F_c = Σ_i(F_{p,i}) + N_Ed")
)

// BendingSufficient is M_Ed ≤ M_Rd.
var BendingSufficient = &clause.Check{ID: "bending-sufficient", Name: "Bending at ultimate, sagging", Ref: en("6.1", ""), Demand: "M_Ed", Limit: "M_Rd"}

// The hogging moment as a positive demand: of the finished member; of one without topping also while it is built; of the bare
// member while it is built.
var (
	HoggingMoment = clause.Define(&clause.Formula{ID: "hogging-moment", Name: "Design moment, hogging, as a positive number", Text: "M_{Ed,h} = max(0·[kN·m]; −M_{Ed,min})", Unit: "kN·m", Digits: 6,
		Examples: append(hand("120 kN·m", "M_{Ed,min} = -120 kN·m"), hand("0 kN·m", "M_{Ed,min} = 30 kN·m")...)})
	HoggingMomentBuilt = clause.Define(&clause.Formula{ID: "hogging-moment-built", Name: "Design moment, hogging, in use and while the member is built, as a positive number", Text: "M_{Ed,h} = max(0·[kN·m]; −M_{Ed,min}; −M_{Ed,b,min})", Unit: "kN·m", Digits: 6,
		Examples: append(hand("140 kN·m", "M_{Ed,min} = -120 kN·m", "M_{Ed,b,min} = -140 kN·m"), hand("0 kN·m", "M_{Ed,min} = 30 kN·m", "M_{Ed,b,min} = 10 kN·m")...)})
	BareHoggingMoment = clause.Define(&clause.Formula{ID: "bare-hogging-moment", Name: "Design moment on the bare member, hogging, as a positive number", Text: "M_{Ed,h} = max(0·[kN·m]; −M_{Ed,b,min})", Unit: "kN·m", Digits: 6,
		Examples: hand("140 kN·m", "M_{Ed,b,min} = -140 kN·m")})
)

// HoggingSufficient is M_Ed,h ≤ M_Rd.
var HoggingSufficient = &clause.Check{ID: "hogging-sufficient", Name: "Bending at ultimate, hogging", Ref: en("6.1", ""), Demand: "M_{Ed,h}", Limit: "M_Rd"}

// BareHoggingSufficient is the same where the bare member hogs.
var BareHoggingSufficient = &clause.Check{ID: "bare-hogging-sufficient", Name: "Bending at ultimate of the bare member during construction, hogging", Ref: en("6.1", ""), Demand: "M_{Ed,h}", Limit: "M_Rd"}

// BareSufficient is M_Ed,b ≤ M_Rd of the bare member during construction.
var BareSufficient = &clause.Check{ID: "bare-sufficient", Name: "Bending at ultimate of the bare member during construction", Ref: en("6.1", ""), Demand: "M_{Ed,b}", Limit: "M_Rd"}

// ConstructionSufficient is the same where the member has no topping and its resistance is that of the finished member.
var ConstructionSufficient = &clause.Check{ID: "construction-sufficient", Name: "Bending at ultimate during construction, sagging", Ref: en("6.1", ""), Demand: "M_{Ed,b}", Limit: "M_Rd"}

// AboveZeroCurvature asks whether the resistance lies above the moment that leaves the section without curvature. Below it
// the section would fail with its curvature upward: by the prestress, not by the loads.
var AboveZeroCurvature = &clause.Condition{ID: "above-zero-curvature", Name: "Resistance and the moment at zero curvature", Ref: en(compatible, ""), Text: "M_Rd ≥ M_P",
	Yes: "the resistance lies above the moment at which the section is without curvature",
	No:  "the resistance lies below the moment at which the section is without curvature: here the prestress governs, not the loads, and the stresses at release decide"}
