package mechanics

import (
	"fmt"

	"soffit/calc/clause"
)

// Statics of a beam on two bearings at x_A < x_B, distances x_m from end A of the concrete. Load i is q_i from a_i
// to b_i, or F_i at a_i; downward positive. Sagging moments are positive.

// Span is the distance of the bearings.
var Span = clause.Define(&clause.Formula{
	ID: "span", Name: "Span, between the middles of the bearings", Text: "l = x_B − x_A", Unit: "m", Digits: 5,
	Examples: hand("19.500 m", "x_B = 19.65 m", "x_A = 150 mm"),
})

// Load is the load per length of each load, the self-weight among them.
var Load = clause.Define(&clause.Formula{
	ID: "load", Name: "Load per length of each load", Text: "q_i = q_{0,i} + w_i·g_0", Unit: "kN/m",
	Examples: hand("10.5 kN/m", "q_{0,i} = 0 kN/m", "w_i = 1", "g_0 = 10.5 kN/m"),
})

// ReactionB is the reaction at bearing B of each load.
var ReactionB = clause.Define(&clause.Formula{
	ID: "reaction-b", Name: "Reaction at bearing B of each load, moments about A",
	Text: "R_{B,i} = (q_i·(b_i − a_i)·((a_i + b_i)/2 − x_A) + F_i·(a_i − x_A))/l", Unit: "kN", Digits: 7,
	Examples: hand("50 kN", "q_i = 10 kN/m", "F_i = 0 kN", "a_i = 0 m", "b_i = 10 m", "x_A = 0 m", "l = 10 m"),
})

// ReactionA is the reaction at bearing A of each load.
var ReactionA = clause.Define(&clause.Formula{
	ID: "reaction-a", Name: "Reaction at bearing A of each load, vertical equilibrium",
	Text: "R_{A,i} = q_i·(b_i − a_i) + F_i − R_{B,i}", Unit: "kN", Digits: 7,
	Examples: hand("70 kN", "q_i = 10 kN/m", "F_i = 20 kN", "a_i = 0 m", "b_i = 10 m", "R_{B,i} = 50 kN"),
})

// LoadMoment is the bending moment of each load at a station.
var LoadMoment = clause.Define(&clause.Formula{
	ID: "load-moment", Name: "Bending moment of each load, sagging positive",
	Text: "M_i = R_{A,i}·max(0; x_m − x_A) + R_{B,i}·max(0; x_m − x_B) − q_i/2·(max(0; x_m − a_i)^2 − max(0; x_m − b_i)^2) − F_i·max(0; x_m − a_i)",
	Unit: "kN·m", Digits: 6,
	Examples: append(hand("125.0 kN·m", "R_{A,i} = 50 kN", "R_{B,i} = 50 kN", "q_i = 10 kN/m", "F_i = 0 kN", "a_i = 0 m", "b_i = 10 m",
		"x_A = 0 m", "x_B = 10 m", "x_m = 5 m"),
		by("Nilson, Design of Prestressed Concrete, 2nd ed., Ex. 3.1: 550 plf on 40 ft, 110 ft·kip", clause.Recalled, "149.1 kN·m",
			"R_{A,i} = 48.930 kN", "R_{B,i} = 48.930 kN", "q_i = 8.02656 kN/m", "F_i = 0 kN", "a_i = 0 m", "b_i = 12.192 m",
			"x_A = 0 m", "x_B = 12.192 m", "x_m = 6.096 m")),
})

const shear = "V_{%s,i} = cases(x_m %s x_A: R_{A,i}; otherwise: 0·[kN]) + cases(x_m %s x_B: R_{B,i}; otherwise: 0·[kN])" +
	" − q_i·(max(0; x_m − a_i) − max(0; x_m − b_i)) − cases(x_m %s a_i: F_i; otherwise: 0·[kN])"

var shearExample = []string{"R_{A,i} = 60 kN", "R_{B,i} = 60 kN", "q_i = 10 kN/m", "F_i = 20 kN", "a_i = 5 m", "b_i = 5 m",
	"x_A = 0 m", "x_B = 10 m", "x_m = 5 m"}

// ShearLeft is the shear force of each load just left of a station.
var ShearLeft = clause.Define(&clause.Formula{
	ID: "load-shear-left", Name: "Shear force of each load just left of the station",
	Text: fmt.Sprintf(shear, "l", ">", ">", ">"), Unit: "kN", Digits: 6,
	Examples: hand("60 kN", shearExample...),
})

// ShearRight is the shear force of each load just right of a station.
var ShearRight = clause.Define(&clause.Formula{
	ID: "load-shear-right", Name: "Shear force of each load just right of the station",
	Text: fmt.Sprintf(shear, "r", "≥", "≥", "≥"), Unit: "kN", Digits: 6,
	Examples: hand("40 kN", shearExample...),
})
