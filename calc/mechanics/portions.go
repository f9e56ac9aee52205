package mechanics

import "soffit/calc/clause"

// The loads in three portions n of the member: left of bearing A (k_{L,n} = 1), between the bearings (k_{C,n} = 1), right
// of bearing B (k_{R,n} = 1). Static equilibrium counts each portion for itself. A point load over a bearing belongs to
// the middle portion.

// PortionFrom and PortionTo are the ends of a portion.
var (
	PortionFrom = clause.Define(&clause.Formula{
		ID: "portion-from", Name: "Start of each portion, from end A", Text: "x_{1,n} = k_{C,n}·x_A + k_{R,n}·x_B", Unit: "m", Digits: 6,
		Examples: append(hand("2 m", "k_{C,n} = 1", "k_{R,n} = 0", "x_A = 2 m", "x_B = 10 m"), hand("10 m", "k_{C,n} = 0", "k_{R,n} = 1", "x_A = 2 m", "x_B = 10 m")...),
	})
	PortionTo = clause.Define(&clause.Formula{
		ID: "portion-to", Name: "End of each portion, from end A", Text: "x_{2,n} = k_{L,n}·x_A + k_{C,n}·x_B + k_{R,n}·L", Unit: "m", Digits: 6,
		Examples: append(hand("2 m", "k_{L,n} = 1", "k_{C,n} = 0", "k_{R,n} = 0", "x_A = 2 m", "x_B = 10 m", "L = 13 m"),
			hand("13 m", "k_{L,n} = 0", "k_{C,n} = 0", "k_{R,n} = 1", "x_A = 2 m", "x_B = 10 m", "L = 13 m")...),
	})
)

// LoadFrom and LoadTo are the ends of a load within a portion; alike where it does not reach into it.
var (
	LoadFrom = clause.Define(&clause.Formula{
		ID: "load-from", Name: "Start of each load within the portion", Text: "a_{i,n} = min(max(a_i; x_{1,n}); x_{2,n})", Unit: "m", Digits: 6,
		Examples: append(hand("2 m", "a_i = 0 m", "x_{1,n} = 2 m", "x_{2,n} = 10 m"), hand("2 m", "a_i = 7 m", "x_{1,n} = 0 m", "x_{2,n} = 2 m")...),
	})
	LoadTo = clause.Define(&clause.Formula{
		ID: "load-to", Name: "End of each load within the portion", Text: "b_{i,n} = min(max(b_i; x_{1,n}); x_{2,n})", Unit: "m", Digits: 6,
		Examples: append(hand("10 m", "b_i = 13 m", "x_{1,n} = 2 m", "x_{2,n} = 10 m"), hand("10 m", "b_i = 7 m", "x_{1,n} = 10 m", "x_{2,n} = 13 m")...),
	})
)

// SpreadForce is what a spread load weighs on a portion.
var SpreadForce = clause.Define(&clause.Formula{
	ID: "spread-force", Name: "Force of each spread load on the portion", Text: "Q_{i,n} = q_i·(b_{i,n} − a_{i,n})", Unit: "kN", Digits: 7,
	Examples: hand("80 kN", "q_i = 10 kN/m", "a_{i,n} = 2 m", "b_{i,n} = 10 m"),
})

// PointForce is what a point load weighs on a portion.
var PointForce = clause.Define(&clause.Formula{
	ID: "point-force", Name: "Force of each point load on the portion",
	Text: "F_{i,n} = cases(k_{L,n} = 1 and a_i < x_A: F_i; k_{C,n} = 1 and x_A ≤ a_i ≤ x_B: F_i; k_{R,n} = 1 and a_i > x_B: F_i; otherwise: 0·[kN])", Unit: "kN", Digits: 7,
	Examples: append(append(hand("30 kN", "k_{L,n} = 1", "k_{C,n} = 0", "k_{R,n} = 0", "a_i = 1 m", "x_A = 2 m", "x_B = 10 m", "F_i = 30 kN"),
		hand("0 kN", "k_{L,n} = 0", "k_{C,n} = 0", "k_{R,n} = 1", "a_i = 10 m", "x_A = 2 m", "x_B = 10 m", "F_i = 30 kN")...),
		hand("30 kN", "k_{L,n} = 0", "k_{C,n} = 1", "k_{R,n} = 0", "a_i = 10 m", "x_A = 2 m", "x_B = 10 m", "F_i = 30 kN")...),
})

// PortionReactionA and PortionReactionB are what a load on a portion adds to the reactions, upward positive.
var (
	PortionReactionA = clause.Define(&clause.Formula{
		ID: "portion-reaction-a", Name: "Reaction at bearing A to each load on each portion, moments about B",
		Text: "R_{A,i,n} = (Q_{i,n}·(x_B − (a_{i,n} + b_{i,n})/2) + F_{i,n}·(x_B − a_i))/l", Unit: "kN", Digits: 7,
		Examples: hand("-5.625 kN", "Q_{i,n} = 30 kN", "a_{i,n} = 10 m", "b_{i,n} = 13 m", "F_{i,n} = 0 kN", "a_i = 0 m", "x_B = 10 m", "l = 8 m"),
	})
	PortionReactionB = clause.Define(&clause.Formula{
		ID: "portion-reaction-b", Name: "Reaction at bearing B to each load on each portion, moments about A",
		Text: "R_{B,i,n} = (Q_{i,n}·((a_{i,n} + b_{i,n})/2 − x_A) + F_{i,n}·(a_i − x_A))/l", Unit: "kN", Digits: 7,
		Examples: hand("-3.75 kN", "Q_{i,n} = 0 kN", "a_{i,n} = 2 m", "b_{i,n} = 2 m", "F_{i,n} = 30 kN", "a_i = 1 m", "x_A = 2 m", "l = 8 m"),
	})
)
