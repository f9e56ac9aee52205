package ec2

import "soffit/calc/clause"

// Cracks at the ultimate limit state, and what they ask of the tendons.

// The tension of the edge that the moment stretches, section uncracked: at the bottom, at the top where the moment hogs, and
// of a member with topping, where what acts before the topping is hard acts on the bare section and the rest on the composite
// one; each also beside an axial force.
var (
	BottomStress, AxialBottomStress = edgeStresses("bottom-stress", "Tension at the bottom with the design moment, section uncracked", "(M_Ed − M_P)/W_b",
		[2]string{"8.4904 MPa", "8.1067 MPa"}, "M_Ed = 1279.77 kN·m", "M_P = 474.31 kN·m", "W_b = 68744.3 10³ mm³", "P_d = 840.79 kN", "A_c = 260600 mm²")
	TopStress, AxialTopStress = edgeStresses("top-stress", "Tension at the top with the hogging design moment, section uncracked", "(M_{Ed,h} + M_P)/W_t",
		[2]string{"4.0 MPa", "3.5 MPa"}, "M_{Ed,h} = 400 kN·m", "M_P = 100 kN·m", "W_t = 100000 10³ mm³", "P_d = 200 kN", "A_c = 200000 mm²")
	ToppedBottomStress, AxialToppedBottomStress = edgeStresses("topped-bottom-stress", "Tension at the bottom with the design moment, sections uncracked: bare member with its permanent loads at their upper factor, then composite", "(max(γ_{G,sup}·M_0; M_0) − M_P)/W_b + (M_Ed − max(γ_{G,sup}·M_0; M_0))/W_{co,b}",
		[2]string{"2.0 MPa", "1.5 MPa"}, "M_0 = 300 kN·m", "γ_{G,sup} = 1.5", "M_P = 500 kN·m", "W_b = 100000 10³ mm³", "M_Ed = 1200 kN·m", "W_{co,b} = 150000 10³ mm³", "P_d = 500 kN", "A_c = 200000 mm²")

	ToppedTopStress = clause.Define(&clause.Formula{
		ID: "topped-top-stress", Name: "Tension at the top of the topping with the hogging moment after it is hard, section uncracked", Ref: en("8.10.2.3(1)", ""),
		Text: "σ_b = (M_{Ed,h} + M_0)/W_{co,o}", Unit: "MPa",
		Examples: hand("3 MPa", "M_{Ed,h} = 400 kN·m", "M_0 = -100 kN·m", "W_{co,o} = 100000 10³ mm³")})
)

// edgeStresses are a stress without axial force and beside one; want is what the example gives without, and with a compression of 100 kN.
func edgeStresses(id, name, bending string, want [2]string, given ...string) (*clause.Formula, *clause.Formula) {
	define := func(id, force, want string, given []string) *clause.Formula {
		return clause.Define(&clause.Formula{ID: id, Name: name, Ref: en("8.10.2.3(1)", ""), Text: "σ_b = " + bending + " − " + force + "/A_c", Unit: "MPa", Examples: hand(want, given...)})
	}
	return define(id, "P_d", want[0], given), define("axial-"+id, "(P_d + N_Ed)", want[1], append(given[:len(given):len(given)], "N_Ed = 100 kN"))
}

// ToppedMemberStress is the tension at the top of the member below a stretched topping.
var ToppedMemberStress = clause.Define(&clause.Formula{
	ID: "topped-member-stress", Name: "Tension at the top of the member under the topping", Ref: en("8.10.2.3(1)", ""),
	Text: "σ_t = (M_P − M_0)/W_t − P_d/A_c + (M_{Ed,h} + M_0)/W_{co,t}", Unit: "MPa",
	Examples: hand("4 MPa", "M_P = 500 kN·m", "M_0 = -100 kN·m", "W_t = 100000 10³ mm³", "P_d = 1200 kN", "A_c = 300000 mm²", "M_{Ed,h} = 400 kN·m", "W_{co,t} = 150000 10³ mm³"),
})

// CrackedTopping asks the same of a stretched topping and the member under it.
var CrackedTopping = &clause.Condition{ID: "cracked-at-ultimate", Name: "Cracks in bending at the ultimate limit state", Ref: en("8.10.2.3(1)", ""),
	Text: "σ_b > f_{ctk,0.05,t} or σ_t > f_{ctk,0.05}", Yes: "cracked in bending", No: "not cracked in bending: no further check of anchorage"}

// CrackedAtUltimate asks where the section cracks in bending at the ultimate limit state.
var CrackedAtUltimate = &clause.Condition{ID: "cracked-at-ultimate", Name: "Cracks in bending at the ultimate limit state", Ref: en("8.10.2.3(1)", ""),
	Text: "σ_b > f_{ctk,0.05}", Yes: "cracked in bending", No: "not cracked in bending: no further check of anchorage"}

// CrackedOfPostTensioned asks the same of a post-tensioned member, whose tendons need no bond to be anchored.
var CrackedOfPostTensioned = &clause.Condition{ID: "cracked-at-ultimate", Name: "Cracks in bending at the ultimate limit state", Ref: en("5.10.1(5)P", ""),
	Text: "σ_b > f_{ctk,0.05}", Yes: "cracked in bending", No: "not cracked in bending"}

// BetweenBearings asks where a post-tensioned member carries the tension that shear adds to its sagging moment.
var BetweenBearings = &clause.Condition{ID: "between-bearings", Name: "Place of the station", Ref: en("6.2.3(7)", ""), Text: "x_A ≤ x_m ≤ x_B",
	Yes: "between the bearings", No: "beyond a bearing"}

// Resists asks whether any resistance is counted at the station.
var Resists = &clause.Condition{ID: "resists", Name: "Resistance at the station", Text: "M_Rd > 0·[kN·m]", Yes: "counted", No: "no resistance is counted here: bending fails already"}

// LargestShear is the largest shear force at a station, either side and sign.
var LargestShear = clause.Define(&clause.Formula{
	ID: "largest-shear", Name: "Largest shear force at the station", Text: "V_max = max(abs(V_{Ed,l}); abs(V_{Ed,l,min}); abs(V_{Ed,r}); abs(V_{Ed,r,min}))", Unit: "kN", Digits: 6,
	Examples: hand("9 kN", "V_{Ed,l} = 1 kN", "V_{Ed,l,min} = -9 kN", "V_{Ed,r} = 2 kN", "V_{Ed,r,min} = -8 kN"),
})

// LargestShearBuilt is the same in use and while the member is built.
var LargestShearBuilt = clause.Define(&clause.Formula{
	ID: "largest-shear-built", Name: "Largest shear force at the station, in use or while the member is built",
	Text: "V_max = max(abs(V_{Ed,l}); abs(V_{Ed,l,min}); abs(V_{Ed,r}); abs(V_{Ed,r,min}); abs(V_{Ed,b,l}); abs(V_{Ed,b,l,min}); abs(V_{Ed,b,r}); abs(V_{Ed,b,r,min}))", Unit: "kN", Digits: 6,
	Examples: hand("12 kN", "V_{Ed,l} = 1 kN", "V_{Ed,l,min} = -9 kN", "V_{Ed,r} = 2 kN", "V_{Ed,r,min} = -8 kN", "V_{Ed,b,l} = 1 kN", "V_{Ed,b,l,min} = -12 kN", "V_{Ed,b,r} = 2 kN", "V_{Ed,b,r,min} = -8 kN"),
})

// Moments and shear forces while the member is built, as what the section must carry.
var (
	BuiltMoment        = built("built-moment", "Moment while the member is built", "M_Ed", "M_{Ed,b}", "kN·m")
	BuiltShearLeft     = built("built-shear-left", "Largest shear force left of the station while the member is built", "V_{Ed,l}", "V_{Ed,b,l}", "kN")
	BuiltShearLeftMin  = built("built-shear-left-least", "Least shear force left of the station while the member is built", "V_{Ed,l,min}", "V_{Ed,b,l,min}", "kN")
	BuiltShearRight    = built("built-shear-right", "Largest shear force right of the station while the member is built", "V_{Ed,r}", "V_{Ed,b,r}", "kN")
	BuiltShearRightMin = built("built-shear-right-least", "Least shear force right of the station while the member is built", "V_{Ed,r,min}", "V_{Ed,b,r,min}", "kN")
)

func built(id, name, symbol, from, unit string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Text: symbol + " = " + from, Unit: unit, Digits: 6, Examples: hand("120 "+unit, from+" = 120 "+unit)})
}

// LeverArm is z of the tension chord.
var LeverArm = clause.Define(&clause.Formula{
	ID: "lever-arm", Name: "Lever arm of the tension steel", Ref: en("6.2.3(7)", ""), Text: "z = d − d_c", Unit: "mm",
	Examples: hand("951.82 mm", "d = 1025 mm", "d_c = 73.18 mm"),
})

// AddedMoment is the moment equivalent of the tension that shear adds, ΔF_td·z.
var AddedMoment = clause.Define(&clause.Formula{
	ID: "added-moment", Name: "Moment equal to the tension that shear adds, vertical links", Ref: en("6.2.3(7)", "6.18"),
	Text: "ΔM = 0.5·V_max·c_θ·z", Unit: "kN·m",
	Examples: hand("113.61 kN·m", "V_max = 100 kN", "c_θ = 2.5", "z = 908.86 mm"),
})

// MomentWithShear is the moment to be resisted with the tension added by shear, at most the largest of the span.
var MomentWithShear = clause.Define(&clause.Formula{
	ID: "moment-with-shear", Name: "Moment with the tension that shear adds, at most the largest moment of the span", Ref: en("6.2.3(7)", "6.18"),
	Text: "M_{Ed,V} = min(M_{Ed,max}; M_Ed + ΔM)", Unit: "kN·m", Digits: 6,
	Examples: append(hand("900 kN·m", "M_{Ed,max} = 1200 kN·m", "M_Ed = 800 kN·m", "ΔM = 100 kN·m"), hand("850 kN·m", "M_{Ed,max} = 850 kN·m", "M_Ed = 800 kN·m", "ΔM = 100 kN·m")...),
})

// BendingWithShear is M_Ed,V ≤ M_Rd.
var BendingWithShear = &clause.Check{ID: "bending-with-shear", Name: "Bending with the tension added by shear", Ref: en("6.2.3(7)", "6.18"),
	Demand: "M_{Ed,V}", Limit: "M_Rd"}

// HoggingWithShear and its moments are the same where the moment hogs.
var (
	HoggingMomentWithShear = clause.Define(&clause.Formula{
		ID: "hogging-moment-with-shear", Name: "Hogging moment with the tension that shear adds, at most the largest of the member", Ref: en("6.2.3(7)", "6.18"),
		Text: "M_{Ed,V} = min(M_{Ed,h,max}; M_{Ed,h} + ΔM)", Unit: "kN·m", Digits: 6,
		Examples: hand("900 kN·m", "M_{Ed,h,max} = 1200 kN·m", "M_{Ed,h} = 800 kN·m", "ΔM = 100 kN·m")})
	HoggingWithShear     = &clause.Check{ID: "hogging-with-shear", Name: "Hogging with the tension added by shear", Ref: en("6.2.3(7)", "6.18"), Demand: "M_{Ed,V}", Limit: "M_Rd"}
	LargestHoggingMoment = clause.Define(&clause.Formula{
		ID: "largest-hogging-moment", Name: "Largest hogging design moment of the member", Text: "M_{Ed,h,max} = M_{Ed,h}", Unit: "kN·m", Digits: 6, Examples: hand("120 kN·m", "M_{Ed,h} = 120 kN·m")})
	NoLargerHoggingMoment = &clause.Condition{ID: "no-larger-hogging-moment", Name: "No station has a larger hogging moment", Text: "M_{Ed,h} ≤ M_{Ed,h,max}", Yes: "not larger", No: "larger"}
)

// LargestMoment is the largest design moment of the span.
var LargestMoment = clause.Define(&clause.Formula{
	ID: "largest-moment", Name: "Largest design moment at the stations", Text: "M_{Ed,max} = M_Ed", Unit: "kN·m", Digits: 6,
	Examples: hand("1279.77 kN·m", "M_Ed = 1279.77 kN·m"),
})

// NoLargerMoment proves M_Ed,max at every station.
var NoLargerMoment = &clause.Condition{ID: "no-larger-moment", Name: "No station has a larger moment", Text: "M_Ed ≤ M_{Ed,max}", Yes: "not larger", No: "larger"}
