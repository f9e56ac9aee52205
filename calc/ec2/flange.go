package ec2

import "soffit/calc/clause"

// Effective width of a compressed flange, 5.3.2.1, over the distance l_0 of the points of zero moment.

// ZeroMoments is l_0 of a simple span, ZeroMomentsBetweenOverhangs where an overhang is loaded too.
var (
	ZeroMoments = clause.Define(&clause.Formula{ID: "zero-moments", Name: "Distance of the points of zero moment, simple span", Ref: en("5.3.2.1(2)", ""), Text: "l_0 = l", Unit: "m", Digits: 6,
		Examples: hand("11.75 m", "l = 11.75 m")})
	ZeroMomentsBetweenOverhangs = clause.Define(&clause.Formula{ID: "zero-moments-between-overhangs", Name: "Distance of the points of zero moment, an overhang at one end", Ref: en("5.3.2.1(2) Figure 5.2", ""), Text: "l_0 = 0.85·l", Unit: "m", Digits: 6,
		Examples: hand("10 m", "l = 11.7647 m")})
	ZeroMomentsBetweenTwo = clause.Define(&clause.Formula{ID: "zero-moments-between-two-overhangs", Name: "Distance of the points of zero moment, overhangs at both ends", Ref: en("5.3.2.1(2) Figure 5.2", ""), Text: "l_0 = 0.7·l", Unit: "m", Digits: 6,
		Examples: hand("7 m", "l = 10 m")})
)

// EffectiveFlange is b_eff of a compressed flange on both sides of a web.
var EffectiveFlange = clause.Define(&clause.Formula{
	ID: "effective-flange", Name: "Effective width of the compressed flange", Ref: en("5.3.2.1(3)", "5.7, 5.7a"),
	Text: "b_eff = b_w + 2·min(0.2·b_1 + 0.1·l_0; 0.2·l_0; b_1)", Unit: "mm",
	Examples: append(hand("1200 mm", "b_w = 300 mm", "b_1 = 450 mm", "l_0 = 11.75 m"), hand("1200 mm", "b_w = 200 mm", "b_1 = 1000 mm", "l_0 = 3 m")...),
})

// EffectiveFlangeOnStems is b_eff of a compressed flange on two equal stems: b_1 beyond each of them, b_2 half of what
// lies between them.
var EffectiveFlangeOnStems = clause.Define(&clause.Formula{
	ID: "effective-flange-on-stems", Name: "Effective width of the compressed flange on two stems", Ref: en("5.3.2.1(3)", "5.7, 5.7a"),
	Text: "b_eff = 2·(b_w + min(0.2·b_1 + 0.1·l_0; 0.2·l_0; b_1) + min(0.2·b_2 + 0.1·l_0; 0.2·l_0; b_2))", Unit: "mm",
	Examples: append(hand("2400 mm", "b_w = 200 mm", "b_1 = 500 mm", "b_2 = 500 mm", "l_0 = 12 m"), hand("1980 mm", "b_w = 200 mm", "b_1 = 500 mm", "b_2 = 450 mm", "l_0 = 3 m")...),
})

// WholeFlange asks whether the flange is effective over its whole width.
var WholeFlange = &clause.Condition{ID: "whole-flange", Name: "Effective part of the flange", Ref: en("5.3.2.1(3)", "5.7"), Text: "b_f ≤ b_eff",
	Yes: "the whole flange is effective", No: "only a part of the flange is effective, which is not covered here"}

// FlangeEffective is b_f ≤ b_eff.
var FlangeEffective = &clause.Check{ID: "flange-effective", Name: "The whole flange is effective", Ref: en("5.3.2.1(3)", "5.7"), Demand: "b_f", Limit: "b_eff"}

// EffectiveTopping is b_eff of a topping, the top edge of the member taken as the web.
var EffectiveTopping = clause.Define(&clause.Formula{
	ID: "effective-topping", Name: "Effective width of the topping", Ref: en("5.3.2.1(3)", "5.7, 5.7a"),
	Text: "b_{eff,t} = b_f + 2·min(0.2·b_{1,t} + 0.1·l_0; 0.2·l_0; b_{1,t})", Unit: "mm",
	Examples: append(hand("1200 mm", "b_f = 400 mm", "b_{1,t} = 400 mm", "l_0 = 12 m"), hand("1400 mm", "b_f = 400 mm", "b_{1,t} = 1000 mm", "l_0 = 3 m")...),
})

// EffectiveToppingOnStems is b_eff of a topping on two webs, b_2 half of what lies between them.
var EffectiveToppingOnStems = clause.Define(&clause.Formula{
	ID: "effective-topping-on-stems", Name: "Effective width of the topping on two webs", Ref: en("5.3.2.1(3)", "5.7, 5.7a"),
	Text: "b_{eff,t} = 2·(b_w + min(0.2·b_{1,t} + 0.1·l_0; 0.2·l_0; b_{1,t}) + min(0.2·b_2 + 0.1·l_0; 0.2·l_0; b_2))", Unit: "mm",
	Examples: append(hand("1800 mm", "b_w = 160 mm", "b_{1,t} = 250 mm", "b_2 = 490 mm", "l_0 = 17.6 m"), hand("1466 mm", "b_w = 160 mm", "b_{1,t} = 200 mm", "b_2 = 490 mm", "l_0 = 2.75 m")...),
})

// WholeTopping asks whether the topping is effective over its whole width.
var WholeTopping = &clause.Condition{ID: "whole-topping", Name: "Effective part of the topping", Ref: en("5.3.2.1(3)", "5.7"), Text: "b_top ≤ b_{eff,t}",
	Yes: "the whole topping is effective", No: "only a part of the topping is effective, which is not covered here"}

// ToppingEffective is b_top ≤ b_eff,t.
var ToppingEffective = &clause.Check{ID: "topping-effective", Name: "The whole topping is effective", Ref: en("5.3.2.1(3)", "5.7"), Demand: "b_top", Limit: "b_{eff,t}"}
