package ec2

import "soffit/calc/clause"

// What ends the resistance, and the steel that counts in tension.

// TendonCounts and BarCounts are 1 for steel that counts as tension steel at the station, 0 for the rest.
var (
	TendonCounts = clause.Define(&clause.Formula{ID: "tendon-counts", Name: "1 for a row beyond the centroid that is bonded here, 0 for the others",
		Text: "t_{p,i} = cases(d_{p,i} > z_0 and s_i > 0·[mm]: 1; otherwise: 0)", Unit: "", Digits: 1,
		Examples: append(hand("1, 0", "d_{p,i} = 1090 mm, 90 mm", "z_0 = 600 mm", "s_i = 5 m, 5 m"), hand("0", "d_{p,i} = 1040 mm", "z_0 = 600 mm", "s_i = 0 m")...)})
	PostTendonCounts = clause.Define(&clause.Formula{ID: "post-tendon-counts", Name: "1 for a row beyond the centroid, 0 for the others",
		Text: "t_{p,i} = cases(d_{p,i} > z_0: 1; otherwise: 0)", Unit: "", Digits: 1,
		Examples: hand("1, 0", "d_{p,i} = 1090 mm, 90 mm", "z_0 = 600 mm")})
	BarCounts = clause.Define(&clause.Formula{ID: "bar-counts", Name: "1 for a row beyond the centroid, 0 for the others",
		Text: "t_{s,j} = cases(d_{s,j} > z_0: 1; otherwise: 0)", Unit: "", Digits: 1,
		Examples: hand("1, 0", "d_{s,j} = 600 mm, 40 mm", "z_0 = 225 mm")})
)

// TendonsInTension is how many rows of tendons lie in the tension zone, bonded or not.
var TendonsInTension = clause.Define(&clause.Formula{ID: "tendons-in-tension", Name: "Number of rows of tendons beyond the centroid", Text: "n_t = Σ_i(cases(d_{p,i} > z_0: 1; otherwise: 0))", Unit: "", Digits: 2,
	Examples: hand("1", "d_{p,i} = 1090 mm, 90 mm", "z_0 = 600 mm")})

// BareBarCounts leaves out bars of a topping that is not there yet, which have no area.
var BareBarCounts = clause.Define(&clause.Formula{ID: "bare-bar-counts", Name: "1 for a row of the bare member beyond the centroid, 0 for the others",
	Text: "t_{s,j} = cases(A_{s,j} > 0·[mm²] and d_{s,j} > z_0: 1; otherwise: 0)", Unit: "", Digits: 1,
	Examples: hand("1, 0", "A_{s,j} = 402 mm², 0 mm²", "d_{s,j} = 600 mm, 1000 mm", "z_0 = 225 mm")})

// TensionSteelForce is the design force of the steel that counts: without any there is no effective depth.
var TensionSteelForceWithBars, TensionSteelForce = steelSums(
	&clause.Formula{ID: "tension-steel-force-with-bars", Name: "Design force of the steel beyond the centroid that is bonded here", Ref: en(compatible, ""),
		Text: "F_t = Σ_i(t_{p,i}·A_{p,i}·f_{pd,i}) + Σ_j(t_{s,j}·A_{s,j}·f_{yd,j})", Unit: "kN", Digits: 7,
		Examples: hand("200 kN", "t_{p,i} = 1, 0", "A_{p,i} = 100 mm², 50 mm²", "f_{pd,i} = 1000 MPa, 1000 MPa", "t_{s,j} = 1", "A_{s,j} = 250 mm²", "f_{yd,j} = 400 MPa")},
	&clause.Formula{ID: "tension-steel-force", Name: "Design force of the rows beyond the centroid that are bonded here", Ref: en(compatible, ""),
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

// TensionSteelThere asks whether any steel beyond the centroid is bonded at the station.
var TensionSteelThere = &clause.Condition{
	ID: "tension-steel-there", Name: "Steel in the tension zone", Ref: en(compatible, ""), Text: "F_t > 0·[kN]",
	Yes: "steel is bonded there", No: "no steel is bonded there",
}

// DepthWithoutTensionSteel is d where no steel is bonded in the tension zone: the whole depth, which asks the most.
var DepthWithoutTensionSteel = clause.Define(&clause.Formula{
	ID: "depth-without-tension-steel", Name: "Effective depth, no steel being bonded in the tension zone: the whole depth", Ref: en(compatible, ""), Text: "d = h", Unit: "mm",
	Examples: hand("1100 mm", "h = 1100 mm"),
})

// ToppedDepthWithoutTensionSteel is the same of a member with topping.
var ToppedDepthWithoutTensionSteel = clause.Define(&clause.Formula{
	ID: "topped-depth-without-tension-steel", Name: "Effective depth, no steel being bonded in the tension zone: the whole depth", Ref: en(compatible, ""), Text: "d = h_v", Unit: "mm",
	Examples: hand("1200 mm", "h_v = 1200 mm"),
})

// AxisRatio is x/d.
var AxisRatio = clause.Define(&clause.Formula{
	ID: "axis-ratio", Name: "Relative depth of the neutral axis", Ref: en(compatible, ""), Text: "ξ_x = x/d", Unit: "",
	Examples: hand("0.10432", "x = 118.93 mm", "d = 1140 mm"),
})

// OutermostSteel is the depth of the outermost row that counts as tension steel.
var OutermostSteelWithBars, OutermostSteel = steelSums(
	&clause.Formula{ID: "outermost-steel-with-bars", Name: "Depth of the outermost row that counts", Text: "d_o = max(max_i(t_{p,i}·d_{p,i}); max_j(t_{s,j}·d_{s,j}))", Unit: "mm", Digits: 6,
		Examples: hand("1150 mm", "t_{p,i} = 1, 0", "d_{p,i} = 1090 mm, 1140 mm", "t_{s,j} = 1", "d_{s,j} = 1150 mm")},
	&clause.Formula{ID: "outermost-steel", Name: "Depth of the outermost row that counts", Text: "d_o = max_i(t_{p,i}·d_{p,i})", Unit: "mm", Digits: 6,
		Examples: hand("1090 mm", "t_{p,i} = 0, 1", "d_{p,i} = 1140 mm, 1090 mm")})

// LeastAnchorage is how far the stress that can be anchored stays below the design strength in the row that counts
// where it stays farthest below.
var LeastAnchorageWithBars, LeastAnchorage = steelSums(
	&clause.Formula{ID: "least-anchorage-with-bars", Name: "Stress anchored less design strength, the least of the rows that count", Ref: en("8.10.2.3(5), 8.4.3", ""),
		Text: "Δσ_a = min(min_i(t_{p,i}·(σ_{av,i} − f_{pd,i})); min_j(t_{s,j}·(σ_{sa,j} − f_{yd,j})))", Unit: "MPa",
		Examples: hand("-200 MPa", "t_{p,i} = 0", "σ_{av,i} = 0 MPa", "f_{pd,i} = 1400 MPa", "t_{s,j} = 1", "σ_{sa,j} = 235 MPa", "f_{yd,j} = 435 MPa")},
	&clause.Formula{ID: "least-anchorage", Name: "Stress anchored less design strength, the least of the rows that count", Ref: en("8.10.2.3(5)", ""),
		Text: "Δσ_a = min_i(t_{p,i}·(σ_{av,i} − f_{pd,i}))", Unit: "MPa",
		Examples: hand("-700 MPa", "t_{p,i} = 1, 1, 0", "σ_{av,i} = 1400 MPa, 700 MPa, 0 MPa", "f_{pd,i} = 1400 MPa, 1400 MPa, 1400 MPa")})

// OutermostStrain is the strain of the outermost row that counts over its yield strain.
var OutermostStrainWithBars, OutermostStrain = steelSums(
	&clause.Formula{ID: "outermost-strain-with-bars", Name: "Strain of this row over that at its design strength", Ref: en(compatible, ""),
		Text: "r_y = max(max_i(cases(t_{p,i} = 1 and d_{p,i} = d_o: ε_{p,i}/ε_{py,i}; otherwise: 0)); max_j(cases(t_{s,j} = 1 and d_{s,j} = d_o: ε_{s,j}/ε_{sy,j}; otherwise: 0)))", Unit: "", Digits: 4,
		Examples: hand("4", "t_{p,i} = 1", "d_{p,i} = 1140 mm", "d_o = 1150 mm", "ε_{p,i} = 24.5 ‰", "ε_{py,i} = 7 ‰", "t_{s,j} = 1", "d_{s,j} = 1150 mm", "ε_{s,j} = 8.7 ‰", "ε_{sy,j} = 2.175 ‰")},
	&clause.Formula{ID: "outermost-strain", Name: "Strain of this row over that at its design strength", Ref: en(compatible, ""),
		Text: "r_y = max_i(cases(t_{p,i} = 1 and d_{p,i} = d_o: ε_{p,i}/ε_{py,i}; otherwise: 0))", Unit: "", Digits: 4,
		Examples: hand("3.5", "t_{p,i} = 1, 1", "d_{p,i} = 1140 mm, 1090 mm", "d_o = 1140 mm", "ε_{p,i} = 24.5 ‰, 20 ‰", "ε_{py,i} = 7 ‰, 7 ‰")})

// EveryRowAnchored asks whether anchorage or strength limits the rows.
var EveryRowAnchored = &clause.Condition{
	ID: "every-row-anchored", Name: "Kind of failure: anchorage", Ref: en("8.10.2.3, 8.4.3", ""), Text: "Δσ_a ≥ 0·[MPa]",
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
	Yes: "the concrete crushes at its edge", No: "steel or a wholly compressed flange reaches its limit first",
}
