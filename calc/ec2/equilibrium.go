package ec2

import "soffit/calc/clause"

// Static equilibrium of the member on its bearings, EN 1990 6.4.2: each load is cut at the bearings, and each part counts
// by the sign of what it adds to a reaction. A bearing lifts where more pulls it up than holds it down.

// Lifting asks whether a load, as a whole, lifts a bearing.
var Lifting = &clause.Condition{ID: "lifting", Name: "Loads that lift a bearing", Ref: en1990("6.4.1(1)a", ""),
	Text: "min_i(R_{A,i}) < 0·[kN] or min_i(R_{B,i}) < 0·[kN]",
	Yes:  "a load lifts a bearing: static equilibrium is justified below", No: "no load lifts a bearing: static equilibrium needs no further proof"}

// BearingAHeld and BearingBHeld ask whether the member bears down in each combination.
var (
	BearingAHeld = &clause.Condition{ID: "bearing-a-held", Name: "Bearing A in compression", Text: "R_{A,Ed,min} ≥ 0·[kN]",
		Yes: "the member bears down in each combination", No: "the least reaction pulls: the bearing must hold the member down with this force"}
	BearingBHeld = &clause.Condition{ID: "bearing-b-held", Name: "Bearing B in compression", Text: "R_{B,Ed,min} ≥ 0·[kN]",
		Yes: "the member bears down in each combination", No: "the least reaction pulls: the bearing must hold the member down with this force"}
)

// DestabilisingFactor is the factor of a load where it lifts a bearing.
var DestabilisingFactor = clause.Define(&clause.Formula{
	ID: "destabilising-factor", Name: "Factor of each load where it lifts a bearing", Ref: en1990("6.4.2, Tables A1.2(A) and B3", "6.7"),
	Text: "γ_{dst,i} = k_{dst,i}·K_FI·cases(k_{v,i} = 1: γ_{Q,dst}; otherwise: γ_{G,dst})", Unit: "",
	Examples: append(hand("1.65", "k_{dst,i} = 1", "K_FI = 1.1", "k_{v,i} = 1", "γ_{Q,dst} = 1.5", "γ_{G,dst} = 1.1"),
		append(hand("1.1", "k_{dst,i} = 1", "K_FI = 1.0", "k_{v,i} = 0", "γ_{Q,dst} = 1.5", "γ_{G,dst} = 1.1"),
			hand("0", "k_{dst,i} = 0", "K_FI = 1.0", "k_{v,i} = 1", "γ_{Q,dst} = 1.5", "γ_{G,dst} = 1.1")...)...),
})

func destabilising(bearing, id string) *clause.Formula {
	return clause.Define(&clause.Formula{
		ID: "destabilising-" + id, Name: "What lifts the member off bearing " + bearing, Ref: en1990("6.4.2(1)P", "6.7"),
		Text: "R_{" + bearing + ",dst} = Σ_i(γ_{dst,i}·Σ_n(max(0; −R_{" + bearing + ",i,n})))", Unit: "kN", Digits: 6,
		Examples: hand("44.5 kN", "γ_{dst,i} = 1.1, 1.5", "R_{"+bearing+",i,n} = 0 kN, 100 kN, -5 kN, 0 kN, 40 kN, -26 kN"), // 1.1·5 + 1.5·26
	})
}

func stabilising(bearing, id string) *clause.Formula {
	return clause.Define(&clause.Formula{
		ID: "stabilising-" + id, Name: "What holds the member down on bearing " + bearing, Ref: en1990("6.4.2(1)P", "6.7"),
		Text: "R_{" + bearing + ",stb} = γ_{G,stb}·Σ_i(k_{stb,i}·Σ_n(max(0; R_{" + bearing + ",i,n})))", Unit: "kN", Digits: 6,
		Examples: hand("90 kN", "γ_{G,stb} = 0.9", "k_{stb,i} = 1, 0", "R_{"+bearing+",i,n} = 0 kN, 100 kN, -5 kN, 0 kN, 40 kN, -27 kN"),
	})
}

// Sums of what lifts a bearing and of what holds it down.
var (
	DestabilisingA, StabilisingA = destabilising("A", "a"), stabilising("A", "a")
	DestabilisingB, StabilisingB = destabilising("B", "b"), stabilising("B", "b")
)

// Equilibrium is E_d,dst ≤ E_d,stb at bearings A and B; EquilibriumWhileBuilt the same while the member is built.
var (
	Equilibrium           = equilibrium("equilibrium-", "Static equilibrium: bearing ")
	EquilibriumWhileBuilt = equilibrium("equilibrium-while-built-", "Static equilibrium while the member is built: bearing ")
)

func equilibrium(id, name string) [2]*clause.Check {
	ref := en1990("6.4.2(1)P", "6.7")
	return [2]*clause.Check{
		{ID: id + "a", Name: name + "A does not lift", Ref: ref, Demand: "R_{A,dst}", Limit: "R_{A,stb}"},
		{ID: id + "b", Name: name + "B does not lift", Ref: ref, Demand: "R_{B,dst}", Limit: "R_{B,stb}"},
	}
}
