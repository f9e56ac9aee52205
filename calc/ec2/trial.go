package ec2

import "soffit/calc/clause"

// The trial of ultimate bending: every row of steel at its limit, and where the block would end.

// LimitForce is the steel force with every tendon row at what it can carry.
var LimitForce = clause.Define(&clause.Formula{
	ID: "limit-force", Name: "Tension with every row at its limit, to be confirmed", Ref: en(compatible, ""),
	Text: "F_lim = Σ_i(A_{p,i}·σ_{av,i})", Unit: "kN", Digits: 7,
	Examples: hand("1585.8 kN", "A_{p,i} = 1112 mm²", "σ_{av,i} = 1426.1 MPa"),
})

// LimitForceWithBars is LimitForce with bars.
var LimitForceWithBars = clause.Define(&clause.Formula{
	ID: "limit-force-with-bars", Name: "Tension with every row and every bar at its limit, to be confirmed", Ref: en(compatible, ""),
	Text: "F_lim = Σ_i(A_{p,i}·σ_{av,i}) + Σ_j(A_{s,j}·σ_{sa,j})", Unit: "kN", Digits: 7,
	Examples: hand("1935.5 kN", "A_{p,i} = 1112 mm²", "σ_{av,i} = 1426.1 MPa", "A_{s,j} = 804.25 mm²", "σ_{sa,j} = 434.78 MPa"),
})

// SteelAnchoredAxially is SteelAnchored beside an axial force, which a tension must not exceed.
var SteelAnchoredAxially = &clause.Condition{
	ID: "steel-anchored-axially", Name: "Steel at the station", Ref: en("8.10.2.3", ""), Text: "F_lim > 0·[kN] and F_lim + N_Ed > 0·[kN]",
	Yes: "steel is anchored here and holds the axial force", No: "no steel is anchored here, or not enough to hold the axial tension",
}

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

// PartlyCompressed asks whether the neutral axis lies in the section.
var PartlyCompressed = &clause.Condition{
	ID: "partly-compressed", Name: "Neutral axis", Ref: en("6.1(5), (6)", ""), Text: "x ≤ h",
	Yes: "within the section", No: "the section is wholly compressed: too much steel, no resistance is counted",
}

// NoResistanceCompressed is the resistance where the section is wholly compressed, which is not covered.
var NoResistanceCompressed = clause.Define(&clause.Formula{
	ID: "no-resistance-compressed", Name: "Moment resistance: none is counted where the section is wholly compressed", Ref: en("6.1(5), (6)", ""),
	Text: "M_Rd = 0·[kN·m]", Unit: "kN·m", Digits: 6, Examples: hand("0 kN·m"),
})

// FlangeTrial is the neutral axis with the block in the flange.
var FlangeTrial = clause.Define(&clause.Formula{
	ID: "axis-flange-trial", Name: "Depth of the neutral axis if the block lies in the outermost part", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "x_f = F_lim/(λ·η·f_cd·b_f)", Unit: "mm", Digits: 7,
	Examples: hand("118.936 mm", "F_lim = 1585.8 kN", "λ = 0.8", "η = 1", "f_cd = 33.333 MPa", "b_f = 500 mm"),
})

// BlockInFlange asks whether the neutral axis, and with it the block, lies in the outermost part, a rectangle.
var BlockInFlange = &clause.Condition{
	ID: "block-in-flange", Name: "Place of the block", Ref: en("3.1.7(3)", ""), Text: "x_f ≤ h_f",
	Yes: "neutral axis and block in the outermost part", No: "neutral axis beyond the outermost part: strains decide",
}

// BlockInRectangle is BlockInFlange for a section without a flange.
var BlockInRectangle = &clause.Condition{
	ID: "block-in-section", Name: "Place of the block", Ref: en("3.1.7(3)", ""), Text: "λ·x_f ≤ h_f",
	Yes: "block within the section", No: "block deeper than the section",
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
			Text: "x = " + x, Unit: "mm", Digits: 7, Examples: hand("118.93 mm", x+" = 118.93 mm")}),
		RowsYield: &clause.Condition{
			ID: "every-row-yields-" + place, Name: "Tendons on the trial", Ref: en(compatible, ""), Text: "min_i(ε_{t,i} − σ_{av,i}/E_{p,i}) ≥ 0",
			Yes: "every row reaches its limit", No: "not every row reaches its limit: strains decide"},
		BarsYield: &clause.Condition{
			ID: "every-bar-yields-" + place, Name: "Bars on the trial", Ref: en(compatible, ""), Text: "min_j(ε_{ts,j} − σ_{sa,j}/E_s) ≥ 0",
			Yes: "every bar reaches its limit", No: "not every bar reaches its limit: strains decide"},
	}
}

// TrialInFlange is the trial with the block in the outermost part.
var TrialInFlange = trial("flange", "x_f")
