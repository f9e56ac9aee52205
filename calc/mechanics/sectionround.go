package mechanics

import "soffit/calc/clause"

// Round parts m taken out of the section: n_{v,m} equal circles of radius r_{v,m} with their centres at y_{v,m} above the
// soffit, or halves of them. The circle counts from u_{1,m} to u_{2,m}, measured upward from its lowest point: 0 to 2·r the
// whole, 0 to r its lower half, r to 2·r its upper half.

const handbook = "handbook formula of the half circle: "

// RoundArea is the area of round parts.
var RoundArea = clause.Define(&clause.Formula{
	ID: "round-area", Name: "Area of the round parts: π·r² of a circle, half of it of a half circle", Text: "A_{v,m} = n_{v,m}·π·r_{v,m}·(u_{2,m} − u_{1,m})/2", Unit: "mm²", Digits: 7,
	Examples: append(hand("106028.75 mm²", "n_{v,m} = 6", "r_{v,m} = 75 mm", "u_{1,m} = 0 mm", "u_{2,m} = 150 mm"),
		by(handbook+"area π·r²/2", clause.Recalled, "15708.0 mm²", "n_{v,m} = 1", "r_{v,m} = 100 mm", "u_{1,m} = 100 mm", "u_{2,m} = 200 mm")),
})

// RoundCentroid is the height of their centroid above the soffit.
var RoundCentroid = clause.Define(&clause.Formula{
	ID: "round-centroid", Name: "Centroid of the round parts above the soffit: the centre of a circle, 4·r/(3·π) beside it of a half circle",
	Text: "y_{vc,m} = y_{v,m} + 4/(3·π)·(u_{1,m} + u_{2,m} − 2·r_{v,m})", Unit: "mm", Digits: 7,
	Examples: []clause.Example{by("worked by hand: a whole circle", clause.Own, "132 mm", "y_{v,m} = 132 mm", "r_{v,m} = 75 mm", "u_{1,m} = 0 mm", "u_{2,m} = 150 mm"),
		by(handbook+"centroid 4·r/(3·π) = 0.4244·r from the diameter", clause.Recalled, "257.56 mm", "y_{v,m} = 300 mm", "r_{v,m} = 100 mm", "u_{1,m} = 0 mm", "u_{2,m} = 100 mm"),
		by(handbook+"centroid 4·r/(3·π) = 0.4244·r from the diameter", clause.Recalled, "342.44 mm", "y_{v,m} = 300 mm", "r_{v,m} = 100 mm", "u_{1,m} = 100 mm", "u_{2,m} = 200 mm")},
})

// RoundInertia is their second moment of area, each about its own centroid.
var RoundInertia = clause.Define(&clause.Formula{
	ID: "round-inertia", Name: "Second moment of area of the round parts about their own centroid: π/4·r⁴ of a circle, (π/8 − 8/(9·π))·r⁴ of a half circle",
	Text: "I_{v,m} = n_{v,m}·r_{v,m}^2·(π/8·r_{v,m}·(u_{2,m} − u_{1,m}) − 8/(9·π)·(u_{1,m} + u_{2,m} − 2·r_{v,m})^2)", Unit: "10⁶ mm⁴", Digits: 6,
	Examples: []clause.Example{by("worked by hand: π/4·r⁴ of a whole circle", clause.Own, "78.5398 10⁶ mm⁴", "n_{v,m} = 1", "r_{v,m} = 100 mm", "u_{1,m} = 0 mm", "u_{2,m} = 200 mm"),
		by(handbook+"second moment about its own centroid 0.1098·r⁴", clause.Recalled, "10.98 10⁶ mm⁴", "n_{v,m} = 1", "r_{v,m} = 100 mm", "u_{1,m} = 0 mm", "u_{2,m} = 100 mm"),
		by(handbook+"second moment about its own centroid 0.1098·r⁴", clause.Recalled, "21.95 10⁶ mm⁴", "n_{v,m} = 2", "r_{v,m} = 100 mm", "u_{1,m} = 100 mm", "u_{2,m} = 200 mm")},
})
