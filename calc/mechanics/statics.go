package mechanics

import (
	"fmt"

	"soffit/calc/clause"
)

// Statics of a beam on two bearings at x_A < x_B, distances x_m from end A of the concrete. Load i is q_i from a_i
// to b_i, or F_i at a_i; downward positive. Sagging moments are positive.

// Span is the distance of the bearings.
var Span = clause.Define(&clause.Formula{
	ID: "span", Name: "Span, between the middles of the bearings", Text: "l = x_B − x_A", Unit: "m", Digits: 6,
	Examples: hand("19.5000 m", "x_B = 19.65 m", "x_A = 150 mm"),
})

// Load is the load per length of each load, the self-weight among them.
var Load = clause.Define(&clause.Formula{
	ID: "load", Name: "Load per length of each load", Text: "q_i = q_{0,i} + w_i·g_0", Unit: "kN/m",
	Examples: hand("10.5 kN/m", "q_{0,i} = 0 kN/m", "w_i = 1", "g_0 = 10.5 kN/m"),
})

// LoadWithTopping is the load per length of each load where a topping is cast on the member.
var LoadWithTopping = clause.Define(&clause.Formula{
	ID: "load-with-topping", Name: "Load per length of each load", Text: "q_i = q_{0,i} + w_i·g_0 + w_{t,i}·g_t", Unit: "kN/m",
	Examples: append(hand("2.1 kN/m", "q_{0,i} = 0 kN/m", "w_i = 0", "g_0 = 10.5 kN/m", "w_{t,i} = 1", "g_t = 2.1 kN/m"),
		hand("10.5 kN/m", "q_{0,i} = 0 kN/m", "w_i = 1", "g_0 = 10.5 kN/m", "w_{t,i} = 0", "g_t = 2.1 kN/m")...),
})

// ToppingWeight is the weight of the topping per length.
var ToppingWeight = clause.Define(&clause.Formula{
	ID: "topping-weight", Name: "Weight of the topping per length", Text: "g_t = γ_{conc,t}·b_top·h_top", Unit: "kN/m",
	Examples: hand("2.1 kN/m", "γ_{conc,t} = 25 kN/m³", "b_top = 1200 mm", "h_top = 70 mm"),
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

// From bearing B on what stands right of a station is summed, so that nothing of the reactions is left at the end of an
// overhang.

// BeyondB asks whether a station stands over bearing B or beyond it.
var BeyondB = &clause.Condition{ID: "beyond-b", Name: "Side of bearing B", Text: "x_m ≥ x_B",
	Yes: "from bearing B on: what stands right of the station is summed", No: "left of bearing B: what stands left of the station is summed"}

// LoadMomentBeyond is the bending moment of each load at a station from bearing B on.
var LoadMomentBeyond = clause.Define(&clause.Formula{
	ID: "load-moment-beyond", Name: "Bending moment of each load, sagging positive, from what stands right of the station",
	Text: "M_i = −q_i/2·(max(0; b_i − x_m)^2 − max(0; a_i − x_m)^2) − F_i·max(0; a_i − x_m)", Unit: "kN·m", Digits: 6,
	Examples: append(hand("-40 kN·m", "q_i = 0 kN/m", "F_i = 10 kN", "a_i = 12 m", "b_i = 12 m", "x_m = 8 m"),
		hand("-20 kN·m", "q_i = 10 kN/m", "F_i = 0 kN", "a_i = 0 m", "b_i = 10 m", "x_m = 8 m")...),
})

var overhangExample = []string{"R_{B,i} = 25 kN", "q_i = 0 kN/m", "F_i = 20 kN", "a_i = 10 m", "b_i = 10 m", "x_B = 8 m"}

// ShearLeftBeyond is the shear force of each load just left of a station from bearing B on.
var ShearLeftBeyond = clause.Define(&clause.Formula{
	ID: "load-shear-left-beyond", Name: "Shear force of each load just left of the station, from what stands right of it",
	Text: "V_{l,i} = q_i·(max(0; b_i − x_m) − max(0; a_i − x_m)) + cases(a_i ≥ x_m: F_i; otherwise: 0·[kN]) − cases(x_m > x_B: 0·[kN]; otherwise: R_{B,i})", Unit: "kN", Digits: 6,
	Examples: append(hand("-5 kN", append([]string{"x_m = 8 m"}, overhangExample...)...), hand("20 kN", append([]string{"x_m = 10 m"}, overhangExample...)...)...),
})

// ShearRightBeyond is the shear force of each load just right of a station from bearing B on.
var ShearRightBeyond = clause.Define(&clause.Formula{
	ID: "load-shear-right-beyond", Name: "Shear force of each load just right of the station, from what stands right of it",
	Text: "V_{r,i} = q_i·(max(0; b_i − x_m) − max(0; a_i − x_m)) + cases(a_i > x_m: F_i; otherwise: 0·[kN])", Unit: "kN", Digits: 6,
	Examples: append(hand("20 kN", "q_i = 0 kN/m", "F_i = 20 kN", "a_i = 10 m", "b_i = 10 m", "x_m = 8 m"),
		hand("30 kN", "q_i = 10 kN/m", "F_i = 0 kN", "a_i = 9 m", "b_i = 12 m", "x_m = 8 m")...),
})

// BareMoment is the moment that the bare member carries before its topping is hard.
var BareMoment = clause.Define(&clause.Formula{
	ID: "moment-on-bare", Name: "Moment of the permanent loads on the bare member, unfactored", Text: "M_0 = Σ_i(k_{b,i}·k_{G,i}·M_i)", Unit: "kN·m", Digits: 6,
	Examples: hand("130 kN·m", "k_{b,i} = 1, 1, 0, 1", "k_{G,i} = 1, 1, 1, 0", "M_i = 100 kN·m, 30 kN·m, 20 kN·m, 40 kN·m"),
})
