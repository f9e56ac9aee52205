package ec2

import "soffit/calc/clause"

// EffectiveFlange is b_eff of a compressed flange on both sides of a web, simple span l.
var EffectiveFlange = clause.Define(&clause.Formula{
	ID: "effective-flange", Name: "Effective width of the compressed flange, simple span", Ref: en("5.3.2.1(3)", "5.7, 5.7a"),
	Text: "b_eff = b_w + 2·min(0.2·b_1 + 0.1·l; 0.2·l; b_1)", Unit: "mm",
	Examples: append(hand("1200 mm", "b_w = 300 mm", "b_1 = 450 mm", "l = 11.75 m"), hand("1200 mm", "b_w = 200 mm", "b_1 = 1000 mm", "l = 3 m")...),
})

// WholeFlange asks whether the flange is effective over its whole width.
var WholeFlange = &clause.Condition{ID: "whole-flange", Name: "Effective part of the flange", Ref: en("5.3.2.1(3)", "5.7"), Text: "b_f ≤ b_eff",
	Yes: "the whole flange is effective", No: "only a part of the flange is effective, which is not covered here"}

// FlangeEffective is b_f ≤ b_eff.
var FlangeEffective = &clause.Check{ID: "flange-effective", Name: "The whole flange is effective", Ref: en("5.3.2.1(3)", "5.7"), Demand: "b_f", Limit: "b_eff"}
