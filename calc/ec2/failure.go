package ec2

import "soffit/calc/clause"

// What ends the resistance, and the steel that counts in tension.

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
		Text: "F_t = Σ_i(t_{p,i}·A_{p,i}·f_{pd,i}) + Σ_j(t_{s,j}·A_{s,j}·f_{yd,j})", Unit: "kN", Digits: 7,
		Examples: hand("200 kN", "t_{p,i} = 1, 0", "A_{p,i} = 100 mm², 50 mm²", "f_{pd,i} = 1000 MPa, 1000 MPa", "t_{s,j} = 1", "A_{s,j} = 250 mm²", "f_{yd,j} = 400 MPa")},
	&clause.Formula{ID: "tension-steel-force", Name: "Design force of the rows below the centroid that are bonded here", Ref: en(compatible, ""),
		Text: "F_t = Σ_i(t_{p,i}·A_{p,i}·f_{pd,i})", Unit: "kN", Digits: 7,
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
	Yes: "steel is bonded there", No: "no steel is bonded there",
}

// DepthWithoutTensionSteel is d where no steel is bonded in the tension zone: the whole depth, which asks the most.
var DepthWithoutTensionSteel = clause.Define(&clause.Formula{
	ID: "depth-without-tension-steel", Name: "Effective depth, no steel being bonded in the tension zone: the whole depth", Ref: en(compatible, ""), Text: "d = h", Unit: "mm",
	Examples: hand("1100 mm", "h = 1100 mm"),
})

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

// LeastAnchorage is how far the stress that can be anchored stays below the design strength in the row that counts
// where it stays farthest below.
var LeastAnchorage = clause.Define(&clause.Formula{
	ID: "least-anchorage", Name: "Stress anchored less design strength, the least of the rows that count", Ref: en("8.10.2.3(5)", ""),
	Text: "Δσ_a = min_i(cases(t_{p,i} = 1: σ_{av,i} − f_{pd,i}; otherwise: 0·[MPa]))", Unit: "MPa",
	Examples: hand("-700 MPa", "t_{p,i} = 1, 1, 0", "σ_{av,i} = 1400 MPa, 700 MPa, 0 MPa", "f_{pd,i} = 1400 MPa, 1400 MPa, 1400 MPa"),
})

// OutermostStrain is the strain of the outermost bonded row over its yield strain.
var OutermostStrain = clause.Define(&clause.Formula{
	ID: "outermost-strain", Name: "Strain of this row over that at its design strength", Ref: en(compatible, ""),
	Text: "r_y = max_i(cases(d_{p,i} = d_o: ε_{p,i}/ε_{py,i}; otherwise: 0))", Unit: "", Digits: 4,
	Examples: hand("3.5", "d_{p,i} = 1140 mm, 1090 mm", "d_o = 1140 mm", "ε_{p,i} = 24.5 ‰, 20 ‰", "ε_{py,i} = 7 ‰, 7 ‰"),
})

// EveryRowAnchored asks whether anchorage or strength limits the rows.
var EveryRowAnchored = &clause.Condition{
	ID: "every-row-anchored", Name: "Kind of failure: anchorage", Ref: en("8.10.2.3", ""), Text: "Δσ_a ≥ 0·[MPa]",
	Yes: "every row is anchored",
	No:  "anchorage limits a row: it slips before it yields",
}

// OutermostYields asks whether the outermost row yields before the section fails.
var OutermostYields = &clause.Condition{
	ID: "outermost-yields", Name: "Kind of failure: strength (own criterion)", Ref: en(compatible, ""), Text: "r_y ≥ 1",
	Yes: "the outermost row yields first",
	No:  "over-reinforced: the concrete crushes before the outermost row yields",
}

// ConcreteCrushes asks which strain ends the resistance.
var ConcreteCrushes = &clause.Condition{
	ID: "concrete-crushes", Name: "Strain that ends the resistance", Ref: en("6.1(3)P Figure 6.1", ""), Text: "ε_c ≥ 0.9999·ε_cu3",
	Yes: "the concrete crushes", No: "steel reaches its strain limit first",
}
