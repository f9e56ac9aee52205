package ec2

import "soffit/calc/clause"

// Hogging from external loads at and beyond the bearings.

// HoggingTension is the tension at the top from external loads.
var HoggingTension = clause.Define(&clause.Formula{
	ID: "hogging-stress", Name: "Tension at the top from the hogging moment of the loads alone, section uncracked", Ref: en("12.3.1(2)", ""),
	Text: "σ_ct = M_{Ed,h}/W_t", Unit: "MPa",
	Examples: hand("0.002 MPa", "M_{Ed,h} = 0.16 kN·m", "W_t = 80000 10³ mm³"),
})

// PlainTensileStrength is f_ctd,pl.
var PlainTensileStrength = clause.Define(&clause.Formula{
	ID: "plain-tensile-strength", Name: "Design tensile strength of plain concrete", Ref: en("12.3.1(2)", "12.1"),
	Text: "f_{ctd,pl} = α_{ct,pl}·f_{ctk,0.05}/γ_C", Unit: "MPa",
	Examples: hand("1.52 MPa", "α_{ct,pl} = 0.8", "f_{ctk,0.05} = 2.85 MPa", "γ_C = 1.5"),
})

// Hogging asks where the moment is negative.
var Hogging = &clause.Condition{ID: "hogging", Name: "Sign of the least moment", Ref: clause.Ref{}, Text: "M_{Ed,h} > 0·[kN·m]",
	Yes: "hogging", No: "no hogging"}

// HoggingResisted is σ_ct ≤ f_ctd,pl.
var HoggingResisted = &clause.Check{ID: "hogging-resisted", Name: "Hogging of the loads alone (no prestress), plain concrete", Ref: en("12.3.1(2)", "12.1"),
	Demand: "σ_ct", Limit: "f_{ctd,pl}"}
