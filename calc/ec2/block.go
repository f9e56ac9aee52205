package ec2

import "soffit/calc/clause"

// The rectangular block over the parts of the section, 3.1.7(3).

// own317 marks what is derived here from the parabola–rectangle of 3.1.7(1): the code has no such rule.
var own317 = clause.Ref{Document: Code, Clause: "own derivation from 3.1.7(1)"}

// BlockDepth is the depth of the block.
var BlockDepth = clause.Define(&clause.Formula{
	ID: "block-depth", Name: "Depth of the rectangular block", Ref: en("3.1.7(3) Figure 3.5", ""), Text: "a = λ·x", Unit: "mm", Digits: 6,
	Examples: hand("95.144 mm", "λ = 0.8", "x = 118.93 mm"),
})

// The block where the compressed edge stays below its ultimate strain: its depth and stress factors follow the resultant of
// the parabola–rectangle at that strain, related to the resultant at the ultimate strain, so that they are λ and η
// there.

// FlangeWhollyCompressed asks whether the flange at the compressed edge is compressed over its whole depth.
var FlangeWhollyCompressed = &clause.Condition{ID: "flange-wholly-compressed", Name: "Flange at the compressed edge", Ref: en("6.1(5)", ""), Text: "x > z_fl",
	Yes: "wholly compressed: its mean strain governs", No: "not wholly compressed"}

// StrainRatio is the strain of the compressed edge over ε_c2.
var StrainRatio = clause.Define(&clause.Formula{
	ID: "strain-ratio", Name: "Strain of the compressed edge over that at the end of the parabola", Ref: own317,
	Text: "r_c = ε_c/ε_c2", Unit: "", Digits: 7, Examples: hand("0.5", "ε_c = 1 ‰", "ε_c2 = 2 ‰"),
})

// Fullness is the mean stress of the parabola–rectangle over the compressed depth, as part of f_cd.
var Fullness = clause.Define(&clause.Formula{
	ID: "fullness", Name: "Mean stress of the parabola–rectangle over the compressed depth, as part of the design strength", Ref: own317,
	Text: "α_R = 1 − (1 − q_c)/((n + 1)·r_c)", Unit: "", Digits: 7,
	Examples: []clause.Example{by("handbook coefficient of the full block, 17/21 = 0.810", clause.Recalled, "0.810", "q_c = 0", "r_c = 1.75", "n = 2"),
		by("worked by hand: r − r²/3", clause.Own, "0.416667", "q_c = 0.125", "r_c = 0.5", "n = 2")},
})

// ParabolaRest and ParabolaMoment are what the parabola leaves of a block of full stress, of order n + 1, and the
// moment of what it fills about the neutral axis.
var (
	ParabolaRest = clause.Define(&clause.Formula{ID: "parabola-rest", Name: "Rest of the parabola", Ref: own317,
		Text: "q_c = max(0; 1 − r_c)^(n + 1)", Unit: "", Digits: 7, Examples: append(hand("0.125", "r_c = 0.5", "n = 2"), hand("0", "r_c = 1.75", "n = 2")...)})
	ParabolaMoment = clause.Define(&clause.Formula{ID: "parabola-moment", Name: "Moment of the parabola–rectangle about the neutral axis, over that of the full depth", Ref: own317,
		Text: "m_c = 1/2 − (1 − q_c·(1 + (n + 1)·r_c))/((n + 1)·(n + 2)·r_c^2)", Unit: "", Digits: 7,
		Examples: append(hand("0.270833", "q_c = 0.125", "r_c = 0.5", "n = 2"), hand("0.472789", "q_c = 0", "r_c = 1.75", "n = 2")...)})
)

// ResultantDepth is the depth of the resultant of the parabola–rectangle as part of the compressed depth.
var ResultantDepth = clause.Define(&clause.Formula{
	ID: "resultant-depth", Name: "Depth of that resultant, as part of the compressed depth", Ref: own317,
	Text: "k_a = 1 − m_c/α_R", Unit: "", Digits: 7,
	Examples: []clause.Example{by("handbook coefficient of the full block, 99/238 = 0.416", clause.Recalled, "0.416", "m_c = 0.4727891", "α_R = 0.8095238"),
		by("worked by hand: (4 − r)/(12 − 4·r)", clause.Own, "0.35", "m_c = 0.2708333", "α_R = 0.4166667")},
})

// FullFullness is α_R at the ultimate strain.
var FullFullness = clause.Define(&clause.Formula{
	ID: "full-fullness", Name: "The same mean stress at the ultimate strain", Ref: own317,
	Text: "α_Ru = 1 − ε_c2/((n + 1)·ε_cu2)", Unit: "", Digits: 7,
	Examples: []clause.Example{by("handbook coefficient of the full block, 17/21 = 0.810", clause.Recalled, "0.810", "ε_c2 = 2 ‰", "ε_cu2 = 3.5 ‰", "n = 2")},
})

// FullResultantDepth is k_a at the ultimate strain.
var FullResultantDepth = clause.Define(&clause.Formula{
	ID: "full-resultant-depth", Name: "The same depth at the ultimate strain", Ref: own317,
	Text: "k_au = 1 − (1/2 − (ε_c2/ε_cu2)^2/((n + 1)·(n + 2)))/α_Ru", Unit: "", Digits: 7,
	Examples: []clause.Example{by("handbook coefficient of the full block, 99/238 = 0.416", clause.Recalled, "0.416", "ε_c2 = 2 ‰", "ε_cu2 = 3.5 ‰", "n = 2", "α_Ru = 0.8095238")},
})

// ReducedDepthFactor is λ where the compressed edge is below its ultimate strain.
var ReducedDepthFactor = clause.Define(&clause.Formula{
	ID: "reduced-depth-factor", Name: "Depth factor of the block at that strain", Ref: own317,
	Text: "λ_c = λ·k_a/k_au", Unit: "", Digits: 7, Examples: hand("0.67313", "λ = 0.8", "k_a = 0.35", "k_au = 0.4159664"),
})

// ReducedStressFactor is η where the compressed edge is below its ultimate strain.
var ReducedStressFactor = clause.Define(&clause.Formula{
	ID: "reduced-stress-factor", Name: "Stress factor of the block at that strain", Ref: own317,
	Text: "η_c = η·α_R·k_au/(α_Ru·k_a)", Unit: "", Digits: 7,
	Examples: hand("0.61172", "η = 1", "α_R = 0.4166667", "α_Ru = 0.8095238", "k_au = 0.4159664", "k_a = 0.35"),
})

// ReducedBlockDepth is the depth of the block with the reduced factors.
var ReducedBlockDepth = clause.Define(&clause.Formula{
	ID: "block-depth-reduced", Name: "Depth of the rectangular block", Ref: own317, Text: "a = λ_c·x", Unit: "mm", Digits: 6,
	Examples: hand("80 mm", "λ_c = 0.67", "x = 119.403 mm"),
})

// BlockPartDepth is how deep the block reaches into each part.
var BlockPartDepth = clause.Define(&clause.Formula{
	ID: "block-part-depth", Name: "Depth of the block within each part",
	Text: "c_{c,n} = max(0; min(h_{c,n}; a − z_{c,n}))", Unit: "mm", Digits: 6,
	Examples: hand("20 mm", "h_{c,n} = 60 mm", "a = 120 mm", "z_{c,n} = 100 mm"),
})

// BlockPartWidth is the width of each part at the lower edge of the block.
var BlockPartWidth = clause.Define(&clause.Formula{
	ID: "block-part-width", Name: "Width of each part where the block ends",
	Text: "b_{c,n} = b_{1,n} + (b_{2,n} − b_{1,n})·c_{c,n}/h_{c,n}", Unit: "mm", Digits: 6,
	Examples: hand("380 mm", "b_{1,n} = 500 mm", "b_{2,n} = 140 mm", "c_{c,n} = 20 mm", "h_{c,n} = 60 mm"),
})

// BlockPartArea is the area of the block in each part.
var BlockPartArea = clause.Define(&clause.Formula{
	ID: "block-part-area", Name: "Area of the block within each part",
	Text: "A_{cc,n} = c_{c,n}·(b_{1,n} + b_{c,n})/2", Unit: "mm²", Digits: 7,
	Examples: hand("8800 mm²", "c_{c,n} = 20 mm", "b_{1,n} = 500 mm", "b_{c,n} = 380 mm"),
})

// BlockPartDepthOfCentroid is the depth of the centroid of the block's area in each part.
var BlockPartDepthOfCentroid = clause.Define(&clause.Formula{
	ID: "block-part-centroid", Name: "Depth of the centroid of that area of each part from the compressed edge",
	Text: "z_{cc,n} = z_{c,n} + c_{c,n}·(b_{1,n} + 2·b_{c,n})/(3·(b_{1,n} + b_{c,n}))", Unit: "mm", Digits: 6,
	Examples: hand("109.545 mm", "z_{c,n} = 100 mm", "c_{c,n} = 20 mm", "b_{1,n} = 500 mm", "b_{c,n} = 380 mm"),
})

// The stress of the block, with a compressed edge below its ultimate strain, and where the compressed zone may narrow.
var (
	BlockStress            = blockStress("block-stress", "η·f_cd", en("3.1.7(3) Figure 3.5", ""), "30 MPa", "η = 1", "f_cd = 30 MPa")
	ReducedBlockStress     = blockStress("block-stress-reduced", "η_c·f_cd", own317, "27.84 MPa", "η_c = 0.928", "f_cd = 30 MPa")
	NarrowingStress        = blockStress("block-stress-narrowing", "k_N·η·f_cd", en("3.1.7(3) Figure 3.5, Note", ""), "27 MPa", "k_N = 0.9", "η = 1", "f_cd = 30 MPa")
	NarrowingReducedStress = blockStress("block-stress-narrowing-reduced", "k_N·η_c·f_cd", own317, "25.056 MPa", "k_N = 0.9", "η_c = 0.928", "f_cd = 30 MPa")
)

func blockStress(id, text string, ref clause.Ref, want string, given ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: "Stress of the block", Ref: ref, Text: "f_cb = " + text, Unit: "MPa", Digits: 6, Examples: hand(want, given...)})
}

// The block over round parts, circles or half circles taken out of the section: so many of radius r_{v,m} with the centre
// at depth z_{v,m}; the circle counts between t_{1,m} and t_{2,m}, measured from its nearer tip.

// segment is the area of a circle up to the distance t from its tip.
func segment(t string) string {
	return "(r_{v,m}^2·arccos(1 − " + t + "/r_{v,m}) − (r_{v,m} − " + t + ")·sqrt(" + t + "·(2·r_{v,m} − " + t + ")))"
}

// BlockVoidDepth is how far the block reaches into each round part from the nearer tip of its circle.
var BlockVoidDepth = clause.Define(&clause.Formula{
	ID: "block-void-depth", Name: "Reach of the block into each round part, from the tip of the circle",
	Text: "t_{v,m} = max(t_{1,m}; min(t_{2,m}; a − z_{v,m} + r_{v,m}))", Unit: "mm", Digits: 7,
	Examples: append(hand("75 mm", "t_{1,m} = 0 mm", "t_{2,m} = 150 mm", "a = 100 mm", "z_{v,m} = 100 mm", "r_{v,m} = 75 mm"),
		append(hand("0 mm", "t_{1,m} = 0 mm", "t_{2,m} = 150 mm", "a = 20 mm", "z_{v,m} = 100 mm", "r_{v,m} = 75 mm"),
			hand("75 mm", "t_{1,m} = 75 mm", "t_{2,m} = 150 mm", "a = 20 mm", "z_{v,m} = 100 mm", "r_{v,m} = 75 mm")...)...),
})

// BlockVoidArea is the area that the block loses to each round part.
var BlockVoidArea = clause.Define(&clause.Formula{
	ID: "block-void-area", Name: "Area that the block loses to the round parts",
	Text: "A_{cv,m} = n_{v,m}·(" + segment("t_{v,m}") + " − " + segment("t_{1,m}") + ")", Unit: "mm²", Digits: 7,
	Examples: append(hand("8835.729 mm²", "n_{v,m} = 1", "r_{v,m} = 75 mm", "t_{v,m} = 75 mm", "t_{1,m} = 0 mm"),
		by("handbook table of circular segments: area for h/d = 0.25 is 0.15355·d²", clause.Recalled, "1535.5 mm²", "n_{v,m} = 1", "r_{v,m} = 50 mm", "t_{v,m} = 25 mm", "t_{1,m} = 0 mm")),
})

// BlockVoidMoment is the first moment of that area about the compressed edge.
var BlockVoidMoment = clause.Define(&clause.Formula{
	ID: "block-void-moment", Name: "First moment of that area about the compressed edge",
	Text: "S_{cv,m} = A_{cv,m}·z_{v,m} − 2/3·n_{v,m}·((t_{v,m}·(2·r_{v,m} − t_{v,m}))^(3/2) − (t_{1,m}·(2·r_{v,m} − t_{1,m}))^(3/2))", Unit: "10³ mm³", Digits: 7,
	Examples: hand("602.3229 10³ mm³", "A_{cv,m} = 8835.729 mm²", "z_{v,m} = 100 mm", "n_{v,m} = 1", "r_{v,m} = 75 mm", "t_{v,m} = 75 mm", "t_{1,m} = 0 mm"),
})

// Narrows asks whether the compressed zone narrows toward its edge, from the depth z_N on.
var Narrows = &clause.Condition{ID: "narrows", Name: "Width of the compressed zone", Ref: en("3.1.7(3) Note", ""), Text: "min(x; h) > z_N",
	Yes: "the compressed zone narrows toward its edge: η·f_cd is reduced by 10 %", No: "the compressed zone does not narrow toward its edge"}

// Narrowing and NoNarrowing are the factor on η·f_cd.
var (
	Narrowing = clause.Define(&clause.Formula{ID: "narrowing", Name: "Factor for a compressed zone that narrows toward its edge", Ref: en("3.1.7(3) Note", ""), Text: "k_N = 0.9", Unit: "", Digits: 2,
		Examples: hand("0.9")})
	NoNarrowing = clause.Define(&clause.Formula{ID: "no-narrowing", Name: "Factor for a compressed zone that does not narrow toward its edge", Ref: en("3.1.7(3) Note", ""), Text: "k_N = 1", Unit: "", Digits: 2,
		Examples: hand("1")})
)

// ConcreteForce is F_c.
var ConcreteForce = clause.Define(&clause.Formula{
	ID: "concrete-force", Name: "Force of the block", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "F_c = f_cb·Σ_n(A_{cc,n})", Unit: "kN", Digits: 7,
	Examples: hand("1585.72 kN", "f_cb = 33.333 MPa", "A_{cc,n} = 47572 mm², 0 mm²"),
})

// ConcreteForceDepth is the depth of F_c.
var ConcreteForceDepth = clause.Define(&clause.Formula{
	ID: "concrete-force-depth", Name: "Depth of the block's force from the compressed edge", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "d_c = Σ_n(A_{cc,n}·z_{cc,n})/Σ_n(A_{cc,n})", Unit: "mm", Digits: 6,
	Examples: hand("47.572 mm", "A_{cc,n} = 47572 mm², 0 mm²", "z_{cc,n} = 47.572 mm, 100 mm"),
})

// ConcreteForceWithVoids and ConcreteForceDepthWithVoids leave round parts out.
var (
	ConcreteForceWithVoids = clause.Define(&clause.Formula{
		ID: "concrete-force-with-voids", Name: "Force of the block, round parts left out", Ref: en("3.1.7(3) Figure 3.5", ""),
		Text: "F_c = f_cb·(Σ_n(A_{cc,n}) − Σ_m(A_{cv,m}))", Unit: "kN", Digits: 7,
		Examples: hand("1200 kN", "f_cb = 30 MPa", "A_{cc,n} = 47572 mm², 0 mm²", "A_{cv,m} = 7572 mm²")})
	ConcreteForceDepthWithVoids = clause.Define(&clause.Formula{
		ID: "concrete-force-depth-with-voids", Name: "Depth of the block's force from the compressed edge", Ref: en("3.1.7(3) Figure 3.5", ""),
		Text: "d_c = (Σ_n(A_{cc,n}·z_{cc,n}) − Σ_m(S_{cv,m}))/(Σ_n(A_{cc,n}) − Σ_m(A_{cv,m}))", Unit: "mm", Digits: 6,
		Examples: hand("42.5 mm", "A_{cc,n} = 50000 mm²", "z_{cc,n} = 50 mm", "S_{cv,m} = 800 10³ mm³", "A_{cv,m} = 10000 mm²")})
)
