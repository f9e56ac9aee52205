package ec2

import "soffit/calc/clause"

// Transmission and anchorage of pretensioned tendons, 8.10.2. Row i is a row of tendons, s_i the length of it
// that is bonded between its nearer end and the station.

// InitialStress is σ_pm0.
var InitialStress = clause.Define(&clause.Formula{
	ID: "initial-stress", Name: "Tendon stress just after release, losses at release as stated", Ref: en("5.10.3(2)", ""),
	Text: "σ_{pm0,i} = σ_{p,max,i} − Δσ_{p0,i}", Unit: "MPa",
	Examples: hand("1300 MPa", "σ_{p,max,i} = 1395 MPa", "Δσ_{p0,i} = 95 MPa"),
})

// FinalStress is σ_pm∞.
var FinalStress = clause.Define(&clause.Formula{
	ID: "final-stress", Name: "Tendon stress after all losses, as stated", Ref: en("5.10.3(4)", ""),
	Text: "σ_{pm∞,i} = σ_{p,max,i} − Δσ_{p∞,i}", Unit: "MPa",
	Examples: hand("1145 MPa", "σ_{p,max,i} = 1395 MPa", "Δσ_{p∞,i} = 250 MPa"),
})

// JackingLimit is the greatest stress at jacking.
var JackingLimit = clause.Define(&clause.Formula{
	ID: "jacking-limit", Name: "Greatest stress allowed at jacking", Ref: en("5.10.2.1(1)P", "5.41"),
	Text: "σ_{max,i} = min(k_1·f_{pk,i}; k_2·f_{p0,1k,i})", Unit: "MPa",
	Examples: []clause.Example{by("post-tensioning approvals: 0.9·F_p0,1 = 221 kN for 150 mm²", clause.Recalled, "1476 MPa", "k_1 = 0.8", "f_{pk,i} = 1860 MPa", "k_2 = 0.9", "f_{p0,1k,i} = 1640 MPa")},
})

// JackingKept is σ_p,max ≤ the limit.
var JackingKept = &clause.Check{ID: "jacking-kept", Name: "Tendon stress at jacking", Ref: en("5.10.2.1(1)P", "5.41"), Demand: "σ_{p,max,i}", Limit: "σ_{max,i}"}

// ReleaseLimit is the greatest stress after release.
var ReleaseLimit = clause.Define(&clause.Formula{
	ID: "release-limit", Name: "Greatest stress allowed after release", Ref: en("5.10.3(2)", "5.43"),
	Text: "σ_{rel,i} = min(k_7·f_{pk,i}; k_8·f_{p0,1k,i})", Unit: "MPa",
	Examples: []clause.Example{by("post-tensioning approvals: 0.85·F_p0,1 = 209 kN for 150 mm²", clause.Recalled, "1394 MPa", "k_7 = 0.75", "f_{pk,i} = 1860 MPa", "k_8 = 0.85", "f_{p0,1k,i} = 1640 MPa")},
})

// ReleaseKept is σ_pm0 ≤ the limit.
var ReleaseKept = &clause.Check{ID: "release-kept", Name: "Tendon stress after release", Ref: en("5.10.3(2)", "5.43"), Demand: "σ_{pm0,i}", Limit: "σ_{rel,i}"}

// TensileDesignStrengthAtRelease is f_ctd(t), 0.7·f_ctm(t)/γ_C.
var TensileDesignStrengthAtRelease = clause.Define(&clause.Formula{
	ID: "tensile-design-strength-at-release", Name: "Design tensile strength at release", Ref: en("8.10.2.2(1)", ""),
	Text: "f_ctd(t) = α_ct·0.7·f_ctm(t)/γ_C", Unit: "MPa",
	Examples: hand("1.4087 MPa", "α_ct = 1.0", "f_ctm(t) = 3.0186 MPa", "γ_C = 1.5"),
})

// TendonBondConditions is η_1 of a row: what the member file states, but poor where Figure 8.2 says so.
var TendonBondConditions = clause.Define(&clause.Formula{
	ID: "tendon-bond-conditions", Name: "Factor of the bond conditions of each row: as stated, but poor in the upper zone", Ref: en("8.4.2(2) Figure 8.2, 8.10.2.2(1)", ""),
	Text: "η_{1,i} = cases(y_{p,i} ≤ 250·[mm] or (h > 600·[mm] and d_{p,i} ≥ 300·[mm]): η_1; otherwise: 0.7)", Unit: "", Digits: 2,
	Examples: append(hand("0.7", "y_{p,i} = 1050 mm", "h = 1100 mm", "d_{p,i} = 50 mm", "η_1 = 1.0"),
		append(hand("1.0", "y_{p,i} = 50 mm", "h = 1100 mm", "d_{p,i} = 1050 mm", "η_1 = 1.0"),
			hand("0.7", "y_{p,i} = 260 mm", "h = 600 mm", "d_{p,i} = 340 mm", "η_1 = 1.0")...)...),
})

// BarBondConditions is η_1 of a row of bars by Figure 8.2.
var BarBondConditions = clause.Define(&clause.Formula{
	ID: "bar-bond-conditions", Name: "Factor of the bond conditions of each row: good, but poor in the upper zone", Ref: en("8.4.2(2) Figure 8.2", ""),
	Text: "η_{1,j} = cases(y_{s,j} ≤ 250·[mm] or (h > 600·[mm] and d_{s,j} ≥ 300·[mm]): 1.0; otherwise: 0.7)", Unit: "", Digits: 2,
	Examples: append(hand("0.7", "y_{s,j} = 610 mm", "h = 650 mm", "d_{s,j} = 40 mm"), hand("1.0", "y_{s,j} = 50 mm", "h = 650 mm", "d_{s,j} = 600 mm")...),
})

// ToppedBarBondConditions is η_1 where bars may lie in a topping, which is poured by itself from the top of the member on.
var ToppedBarBondConditions = clause.Define(&clause.Formula{
	ID: "topped-bar-bond-conditions", Name: "Factor of the bond conditions of each row: good, but poor in the upper zone of the pour that it lies in", Ref: en("8.4.2(2) Figure 8.2", ""),
	Text: "η_{1,j} = cases(k_{t,j} = 1 and y_{s,j} − h ≤ 250·[mm]: 1.0; k_{t,j} = 1: 0.7; y_{s,j} ≤ 250·[mm] or (h > 600·[mm] and d_{s,j} ≥ 300·[mm]): 1.0; otherwise: 0.7)", Unit: "", Digits: 2,
	Examples: hand("1.0, 0.7, 1.0", "k_{t,j} = 1, 0, 0", "y_{s,j} = 1000 mm, 850 mm, 50 mm", "h = 900 mm", "d_{s,j} = -100 mm, 50 mm, 850 mm"),
})

// TransmissionBond is f_bpt.
var TransmissionBond = clause.Define(&clause.Formula{
	ID: "transmission-bond", Name: "Bond stress at transmission", Ref: en("8.10.2.2(1)", "8.15"),
	Text: "f_{bpt,i} = η_{p1,i}·η_{1,i}·f_ctd(t)", Unit: "MPa",
	Examples: hand("4.5078 MPa", "η_{p1,i} = 3.2", "η_{1,i} = 1.0", "f_ctd(t) = 1.4087 MPa"),
})

// TransmissionLength is l_pt.
var TransmissionLength = clause.Define(&clause.Formula{
	ID: "transmission-length", Name: "Basic transmission length", Ref: en("8.10.2.2(2)", "8.16"),
	Text: "l_{pt,i} = α_1·α_{2,i}·φ_{p,i}·σ_{pm0,i}/f_{bpt,i}", Unit: "mm",
	Examples: hand("1041.1 mm", "α_1 = 1.25", "α_{2,i} = 0.19", "φ_{p,i} = 15.2 mm", "σ_{pm0,i} = 1300 MPa", "f_{bpt,i} = 4.5078 MPa"),
})

// LowerTransmissionLength is l_pt1.
var LowerTransmissionLength = clause.Define(&clause.Formula{
	ID: "lower-transmission-length", Name: "Transmission length, lower design value (stresses at release, splitting)", Ref: en("8.10.2.2(3)", "8.17"),
	Text: "l_{pt1,i} = 0.8·l_{pt,i}", Unit: "mm",
	Examples: hand("832.88 mm", "l_{pt,i} = 1041.1 mm"),
})

// UpperTransmissionLength is l_pt2.
var UpperTransmissionLength = clause.Define(&clause.Formula{
	ID: "upper-transmission-length", Name: "Transmission length, upper design value (ultimate limit state)", Ref: en("8.10.2.2(3)", "8.18"),
	Text: "l_{pt2,i} = 1.2·l_{pt,i}", Unit: "mm",
	Examples: hand("1249.3 mm", "l_{pt,i} = 1041.1 mm"),
})

// BondStrengthCap is f_ctk,0.05 of C60/75, above which bond is not taken to grow.
var BondStrengthCap = clause.Define(&clause.Formula{
	ID: "bond-strength-cap", Name: "Tensile strength of C60/75, above which bond is not taken to grow", Ref: en("8.4.2(2), 8.10.2.3(3)", ""),
	Text: "f_ctk60 = 0.7·2.12·ln(1 + (60 + 8)/10)·[MPa]", Unit: "MPa",
	Examples: []clause.Example{by(table31+", C60/75", clause.Recalled, "3.05 MPa")},
})

// BondTensileStrength is f_ctd for bond.
var BondTensileStrength = clause.Define(&clause.Formula{
	ID: "bond-tensile-strength", Name: "Design tensile strength for bond", Ref: en("8.4.2(2), 8.10.2.3(2), (3)", "3.16"),
	Text: "f_ctd = α_ct·min(f_{ctk,0.05}; f_ctk60)/γ_C", Unit: "MPa",
	Examples: hand("1.9 MPa", "α_ct = 1.0", "f_{ctk,0.05} = 2.85 MPa", "f_ctk60 = 3.0484 MPa", "γ_C = 1.5"),
})

// AnchorageBond is f_bpd.
var AnchorageBond = clause.Define(&clause.Formula{
	ID: "anchorage-bond", Name: "Bond strength for anchorage at ultimate", Ref: en("8.10.2.3(2)", "8.20"),
	Text: "f_{bpd,i} = η_{p2,i}·η_{1,i}·f_ctd", Unit: "MPa",
	Examples: hand("2.28 MPa", "η_{p2,i} = 1.2", "η_{1,i} = 1.0", "f_ctd = 1.9 MPa"),
})

// AnchorageLength is l_bpd.
var AnchorageLength = clause.Define(&clause.Formula{
	ID: "anchorage-length", Name: "Anchorage length at ultimate", Ref: en("8.10.2.3(4)", "8.21"),
	Text: "l_{bpd,i} = l_{pt2,i} + α_{2,i}·φ_{p,i}·max(0; σ_{pd,i} − σ_{pm∞,i})/f_{bpd,i}", Unit: "mm",
	Examples: hand("1605.4 mm", "l_{pt2,i} = 1249.3 mm", "α_{2,i} = 0.19", "φ_{p,i} = 15.2 mm", "σ_{pd,i} = 1426.1 MPa", "σ_{pm∞,i} = 1145 MPa",
		"f_{bpd,i} = 2.28 MPa"),
})

// BondedLength is s_i.
var BondedLength = clause.Define(&clause.Formula{
	ID: "bonded-length", Name: "Bonded length between the station and the nearer end of each row", Ref: clause.Ref{},
	Text: "s_i = max(0; min(x_m − l_{db,i}; L − l_{db,i} − x_m))", Unit: "mm", Digits: 6,
	Examples: hand("500 mm", "x_m = 2 m", "l_{db,i} = 1500 mm", "L = 20 m"),
})

// PresentStress is σ_pt.
var PresentStress = clause.Define(&clause.Formula{
	ID: "present-stress", Name: "Prestress present at the station, linear over the upper transmission length", Ref: en("8.10.2.2(1), 8.10.2.3(5) Figure 8.17", ""),
	Text: "σ_{pt,i} = σ_{pm∞,i}·min(1; s_i/l_{pt2,i})", Unit: "MPa",
	Examples: hand("458.26 MPa", "σ_{pm∞,i} = 1145 MPa", "s_i = 500 mm", "l_{pt2,i} = 1249.3 mm"),
})

// InitialPresentStress is the stress present just after release, over the lower transmission length.
var InitialPresentStress = clause.Define(&clause.Formula{
	ID: "initial-present-stress", Name: "Prestress present just after release, linear over the lower transmission length: its greatest value", Ref: en("8.10.2.2(1), (3)", ""),
	Text: "σ_{pi,i} = σ_{pm0,i}·min(1; s_i/l_{pt1,i})", Unit: "MPa",
	Examples: hand("780.42 MPa", "σ_{pm0,i} = 1300 MPa", "s_i = 500 mm", "l_{pt1,i} = 832.88 mm"),
})

// AvailableStress is σ_av.
var AvailableStress = clause.Define(&clause.Formula{
	ID: "available-stress", Name: "Stress that can be anchored at ultimate", Ref: en("8.10.2.3(5) Figure 8.17", ""),
	Text: "σ_{av,i} = cases(s_i ≤ l_{pt2,i}: min(σ_{pt,i}; σ_{pd,i}); s_i < l_{bpd,i}: σ_{pm∞,i} + (σ_{pd,i} − σ_{pm∞,i})·(s_i − l_{pt2,i})/(l_{bpd,i} − l_{pt2,i}); otherwise: σ_{pd,i})",
	Unit: "MPa",
	Examples: append(hand("1285.6 MPa", "s_i = 1427.35 mm", "l_{pt2,i} = 1249.3 mm", "σ_{pt,i} = 1145 MPa", "l_{bpd,i} = 1605.4 mm",
		"σ_{pm∞,i} = 1145 MPa", "σ_{pd,i} = 1426.1 MPa"),
		hand("458.26 MPa", "s_i = 500 mm", "l_{pt2,i} = 1249.3 mm", "σ_{pt,i} = 458.26 MPa", "l_{bpd,i} = 1605.4 mm",
			"σ_{pm∞,i} = 1145 MPa", "σ_{pd,i} = 1426.1 MPa")...),
})

// BarBond is f_bd of ribbed bars.
var BarBond = clause.Define(&clause.Formula{
	ID: "bar-bond", Name: "Bond strength of ribbed bars", Ref: en("8.4.2(2)", "8.2"),
	Text: "f_{bd,j} = 2.25·η_{1,j}·η_{2,j}·f_ctd", Unit: "MPa",
	Examples: hand("4.275 MPa", "η_{1,j} = 1.0", "η_{2,j} = 1.0", "f_ctd = 1.9 MPa"),
})

// ToppedBarBond is f_bd where bars may lie in a topping, and ToppingBondTensileStrength is f_ctd for bond there.
var (
	ToppingBondTensileStrength = clause.Define(&clause.Formula{
		ID: "topping-bond-tensile-strength", Name: "Design tensile strength of the topping for bond", Ref: en("8.4.2(2)", "3.16"),
		Text: "f_{ctd,t} = α_ct·min(f_{ctk,0.05,t}; f_ctk60)/γ_C", Unit: "MPa",
		Examples: hand("1.3517 MPa", "α_ct = 1.0", "f_{ctk,0.05,t} = 2.0275 MPa", "f_ctk60 = 3.0484 MPa", "γ_C = 1.5"),
	})
	ToppedBarBond = clause.Define(&clause.Formula{
		ID: "topped-bar-bond", Name: "Bond strength of ribbed bars, in the concrete that they lie in", Ref: en("8.4.2(2)", "8.2"),
		Text: "f_{bd,j} = 2.25·η_{1,j}·η_{2,j}·cases(k_{t,j} = 1: f_{ctd,t}; otherwise: f_ctd)", Unit: "MPa",
		Examples: hand("3.0411 MPa, 4.275 MPa", "η_{1,j} = 1.0, 1.0", "η_{2,j} = 1.0, 1.0", "k_{t,j} = 1, 0", "f_{ctd,t} = 1.3516 MPa", "f_ctd = 1.9 MPa"),
	})
)

// BarBondSize is η_2.
var BarBondSize = clause.Define(&clause.Formula{
	ID: "bar-bond-size", Name: "Factor of the bar size", Ref: en("8.4.2(2)", ""),
	Text: "η_{2,j} = cases(φ_{s,j} ≤ 32·[mm]: 1.0; otherwise: (132·[mm] − φ_{s,j})/(100·[mm]))", Unit: "",
	Examples: append(hand("1.0", "φ_{s,j} = 16 mm"), hand("0.92", "φ_{s,j} = 40 mm")...),
})

// BarAnchorageLength is l_b,rqd with every α of 8.4.4 taken as 1.
var BarAnchorageLength = clause.Define(&clause.Formula{
	ID: "bar-anchorage-length", Name: "Basic anchorage length of straight bars, each α of 8.4.4 taken as 1", Ref: en("8.4.3(2)", "8.3"),
	Text: "l_{b,j} = φ_{s,j}·σ_{sd,j}/(4·f_{bd,j})", Unit: "mm",
	Examples: hand("406.81 mm", "φ_{s,j} = 16 mm", "σ_{sd,j} = 434.78 MPa", "f_{bd,j} = 4.275 MPa"),
})

// BarAvailableStress is σ_sa.
var BarAvailableStress = clause.Define(&clause.Formula{
	ID: "bar-available-stress", Name: "Stress that a straight bar can anchor at the station", Ref: en("8.4.3", ""),
	Text: "σ_{sa,j} = σ_{sd,j}·min(1; max(0; min(x_m − c_e; L − c_e − x_m))/l_{b,j})", Unit: "MPa",
	Examples: hand("217.39 MPa", "σ_{sd,j} = 434.78 MPa", "x_m = 240 mm", "c_e = 40 mm", "L = 10 m", "l_{b,j} = 400 mm"),
})
