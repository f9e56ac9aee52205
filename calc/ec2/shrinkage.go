package ec2

import "soffit/calc/clause"

// Shrinkage, 3.1.4(6) and B.2; shortening positive. t is the age, t_s the age at which drying begins, as a rule the end of
// curing, both by the calendar. Before t_s nothing dries. Domain: 20 to 100 % humidity (Table 3.2), f_ck of Table 3.1.

const dryDomain = "20·[%] ≤ RH ≤ 100·[%]"

// ShrinkageHumidity is β_RH.
var ShrinkageHumidity = clause.Define(&clause.Formula{
	ID: "shrinkage-humidity", Name: "Influence of humidity on drying shrinkage", Ref: en("B.2(1)", "B.12"),
	Text: "β_RH = 1.55·(1 − (RH/(100·[%]))^3)", Domain: dryDomain,
	Examples: append(hand("0.7564", "RH = 80 %"), append(hand("1.3563", "RH = 50 %"), hand("0", "RH = 100 %")...)...),
})

const table32 = "EN 1992-1-1 Table 3.2"

// DryingShrinkageBasic is ε_cd,0.
var DryingShrinkageBasic = clause.Define(&clause.Formula{
	ID: "drying-shrinkage-basic", Name: "Basic drying shrinkage strain", Ref: en("B.2(1)", "B.11"),
	Text: "ε_{cd,0} = 0.85·(220 + 110·α_ds1)·exp(−α_ds2·f_cm/(10·[MPa]))·10^(−6)·β_RH", Unit: "‰", Domain: meanDomain,
	Examples: []clause.Example{
		by(table32+", 20/25, 80 %", clause.Recalled, "0.30 ‰", "α_ds1 = 4", "α_ds2 = 0.12", "f_cm = 28 MPa", "β_RH = 0.7564"),
		by(table32+", 90/105, 20 %", clause.Recalled, "0.27 ‰", "α_ds1 = 4", "α_ds2 = 0.12", "f_cm = 98 MPa", "β_RH = 1.5376"),
		by("worked by hand", clause.Own, "0.21577 ‰", "α_ds1 = 3", "α_ds2 = 0.13", "f_cm = 38 MPa", "β_RH = 0.7564"),
		by("worked by hand", clause.Own, "0.37249 ‰", "α_ds1 = 6", "α_ds2 = 0.11", "f_cm = 38 MPa", "β_RH = 0.7564"),
	},
})

const table33 = "EN 1992-1-1 Table 3.3"

// ShrinkageSize is k_h, linear between the entries of Table 3.3. The table begins at 100 mm: below, its first value.
var ShrinkageSize = clause.Define(&clause.Formula{
	ID: "shrinkage-size", Name: "Influence of the size on drying shrinkage, linear between the values of the table", Ref: en("3.1.4(6) Table 3.3", ""),
	Text: "k_h = cases(h_0 ≤ 100·[mm]: 1.0; h_0 ≤ 200·[mm]: 1.0 − 0.15·(h_0 − 100·[mm])/(100·[mm]); h_0 ≤ 300·[mm]: 0.85 − 0.10·(h_0 − 200·[mm])/(100·[mm]); " +
		"h_0 ≤ 500·[mm]: 0.75 − 0.05·(h_0 − 300·[mm])/(200·[mm]); otherwise: 0.70)", Domain: "h_0 > 0·[mm]",
	Examples: []clause.Example{by(table33, clause.Recalled, "1.0", "h_0 = 100 mm"), by(table33, clause.Recalled, "0.85", "h_0 = 200 mm"),
		by(table33, clause.Recalled, "0.75", "h_0 = 300 mm"), by(table33, clause.Recalled, "0.70", "h_0 = 500 mm"), by(table33, clause.Recalled, "0.70", "h_0 = 800 mm"),
		by("worked by hand", clause.Own, "0.925", "h_0 = 150 mm"), by("worked by hand", clause.Own, "0.80", "h_0 = 250 mm"), by("worked by hand", clause.Own, "0.725", "h_0 = 400 mm"),
		by("worked by hand: below the table", clause.Own, "1.0", "h_0 = 60 mm")},
})

// DryingDevelopment is β_ds(t,t_s).
var DryingDevelopment = clause.Define(&clause.Formula{
	ID: "drying-development", Name: "Part of drying shrinkage that has come about", Ref: en("3.1.4(6)", "3.10"),
	Text:     "β_ds(t,t_s) = max(0; (t − t_s)/[d])/(max(0; (t − t_s)/[d]) + 0.04·sqrt((h_0/[mm])^3))",
	Domain:   "h_0 > 0·[mm] and t_s ≥ 0·[d]",
	Examples: append(hand("0.55051", "t = 93 d", "t_s = 3 d", "h_0 = 150 mm"), append(hand("0", "t = 3 d", "t_s = 3 d", "h_0 = 150 mm"), hand("0", "t = 1 d", "t_s = 3 d", "h_0 = 150 mm")...)...),
})

// DryingShrinkage is ε_cd(t).
var DryingShrinkage = clause.Define(&clause.Formula{
	ID: "drying-shrinkage", Name: "Drying shrinkage strain", Ref: en("3.1.4(6)", "3.9"),
	Text: "ε_cd(t) = β_ds(t,t_s)·k_h·ε_{cd,0}", Unit: "‰", Examples: hand("0.15277 ‰", "β_ds(t,t_s) = 0.55051", "k_h = 0.925", "ε_{cd,0} = 0.3 ‰"),
})

// AutogenousFinal is ε_ca(∞).
var AutogenousFinal = clause.Define(&clause.Formula{
	ID: "autogenous-final", Name: "Autogenous shrinkage strain in the end", Ref: en("3.1.4(6)", "3.12"),
	Text: "ε_ca(∞) = 2.5·(f_ck/[MPa] − 10)·10^(−6)", Unit: "‰", Domain: strengthDomain, Examples: append(hand("0.1 ‰", "f_ck = 50 MPa"), hand("0.05 ‰", "f_ck = 30 MPa")...),
})

// AutogenousDevelopment is β_as(t).
var AutogenousDevelopment = clause.Define(&clause.Formula{
	ID: "autogenous-development", Name: "Part of autogenous shrinkage that has come about", Ref: en("3.1.4(6)", "3.13"),
	Text: "β_as(t) = 1 − exp(−0.2·(t/[d])^0.5)", Domain: "t ≥ 0·[d]",
	Examples: append(hand("0.65295", "t = 28 d"), append(hand("0.18127", "t = 1 d"), hand("0", "t = 0 d")...)...),
})

// AutogenousShrinkage is ε_ca(t).
var AutogenousShrinkage = clause.Define(&clause.Formula{
	ID: "autogenous-shrinkage", Name: "Autogenous shrinkage strain", Ref: en("3.1.4(6)", "3.11"),
	Text: "ε_ca(t) = β_as(t)·ε_ca(∞)", Unit: "‰", Examples: hand("0.065295 ‰", "β_as(t) = 0.65295", "ε_ca(∞) = 0.1 ‰"),
})

// Shrinkage is ε_cs(t).
var Shrinkage = clause.Define(&clause.Formula{
	ID: "shrinkage", Name: "Shrinkage strain", Ref: en("3.1.4(6)", "3.8"),
	Text: "ε_cs(t) = ε_cd(t) + ε_ca(t)", Unit: "‰", Examples: hand("0.21807 ‰", "ε_cd(t) = 0.15277 ‰", "ε_ca(t) = 0.0653 ‰"),
})

// ShrinkageHeatCured is ε_cs(t) of heat-cured precast concrete, whose autogenous shrinkage may be left out. t_s is then not
// before the end of heat curing.
var ShrinkageHeatCured = clause.Define(&clause.Formula{
	ID: "shrinkage-heat-cured", Name: "Shrinkage strain of heat-cured concrete, the autogenous one being negligible", Ref: en("10.3.1.2(3), 3.1.4(6)", "3.8"),
	Text: "ε_cs(t) = ε_cd(t)", Unit: "‰", Examples: hand("0.15277 ‰", "ε_cd(t) = 0.15277 ‰"),
})

// The same at loading: t_0 for t.
var (
	DryingDevelopmentAtLoading     = atLoading(DryingDevelopment)
	DryingShrinkageAtLoading       = atLoading(DryingShrinkage)
	AutogenousDevelopmentAtLoading = atLoading(AutogenousDevelopment)
	AutogenousShrinkageAtLoading   = atLoading(AutogenousShrinkage)
	ShrinkageAtLoading             = atLoading(Shrinkage)
	ShrinkageHeatCuredAtLoading    = atLoading(ShrinkageHeatCured)
)

// ShrinkageSinceLoading is what of the shrinkage comes after t_0.
var ShrinkageSinceLoading = clause.Define(&clause.Formula{
	ID: "shrinkage-since-loading", Name: "Shrinkage strain since loading", Ref: en("3.1.4(6)", ""),
	Text: "ε_cs(t,t_0) = ε_cs(t) − ε_cs(t_0)", Unit: "‰",
	Examples: hand("0.17 ‰", "ε_cs(t) = 0.2 ‰", "ε_cs(t_0) = 0.03 ‰"),
})
