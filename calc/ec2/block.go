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

// The block where the top fibre stays below its ultimate strain: its depth and stress factors follow the resultant of
// the parabola–rectangle at that strain, related to the resultant at the ultimate strain, so that they are λ and η
// there.

// StrainRatio is the strain of the top fibre over ε_c2.
var StrainRatio = clause.Define(&clause.Formula{
	ID: "strain-ratio", Name: "Strain of the top fibre over that at the end of the parabola", Ref: own317,
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

// ReducedDepthFactor is λ where the top fibre is below its ultimate strain.
var ReducedDepthFactor = clause.Define(&clause.Formula{
	ID: "reduced-depth-factor", Name: "Depth factor of the block at that strain", Ref: own317,
	Text: "λ_c = λ·k_a/k_au", Unit: "", Digits: 7, Examples: hand("0.67313", "λ = 0.8", "k_a = 0.35", "k_au = 0.4159664"),
})

// ReducedStressFactor is η where the top fibre is below its ultimate strain.
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
	Text: "b_{c,n} = b_{o,n} + (b_{u,n} − b_{o,n})·c_{c,n}/h_{c,n}", Unit: "mm", Digits: 6,
	Examples: hand("380 mm", "b_{o,n} = 500 mm", "b_{u,n} = 140 mm", "c_{c,n} = 20 mm", "h_{c,n} = 60 mm"),
})

// BlockPartArea is the area of the block in each part.
var BlockPartArea = clause.Define(&clause.Formula{
	ID: "block-part-area", Name: "Area of the block within each part",
	Text: "A_{cc,n} = c_{c,n}·(b_{o,n} + b_{c,n})/2", Unit: "mm²", Digits: 7,
	Examples: hand("8800 mm²", "c_{c,n} = 20 mm", "b_{o,n} = 500 mm", "b_{c,n} = 380 mm"),
})

// BlockPartDepthOfCentroid is the depth of the centroid of the block's area in each part.
var BlockPartDepthOfCentroid = clause.Define(&clause.Formula{
	ID: "block-part-centroid", Name: "Depth of the centroid of that area of each part from the top",
	Text: "z_{cc,n} = z_{c,n} + c_{c,n}·(b_{o,n} + 2·b_{c,n})/(3·(b_{o,n} + b_{c,n}))", Unit: "mm", Digits: 6,
	Examples: hand("109.545 mm", "z_{c,n} = 100 mm", "c_{c,n} = 20 mm", "b_{o,n} = 500 mm", "b_{c,n} = 380 mm"),
})

// BlockStress and ReducedBlockStress are the stress of the block.
var (
	BlockStress = clause.Define(&clause.Formula{ID: "block-stress", Name: "Stress of the block", Ref: en("3.1.7(3) Figure 3.5", ""), Text: "f_cb = η·f_cd", Unit: "MPa", Digits: 6,
		Examples: hand("30 MPa", "η = 1", "f_cd = 30 MPa")})
	ReducedBlockStress = clause.Define(&clause.Formula{ID: "block-stress-reduced", Name: "Stress of the block", Ref: own317, Text: "f_cb = η_c·f_cd", Unit: "MPa", Digits: 6,
		Examples: hand("27.84 MPa", "η_c = 0.928", "f_cd = 30 MPa")})
)

// ConcreteForce is F_c.
var ConcreteForce = clause.Define(&clause.Formula{
	ID: "concrete-force", Name: "Force of the block", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "F_c = f_cb·Σ_n(A_{cc,n})", Unit: "kN", Digits: 7,
	Examples: hand("1585.72 kN", "f_cb = 33.333 MPa", "A_{cc,n} = 47572 mm², 0 mm²"),
})

// ConcreteForceDepth is the depth of F_c.
var ConcreteForceDepth = clause.Define(&clause.Formula{
	ID: "concrete-force-depth", Name: "Depth of the block's force from the top", Ref: en("3.1.7(3) Figure 3.5", ""),
	Text: "d_c = Σ_n(A_{cc,n}·z_{cc,n})/Σ_n(A_{cc,n})", Unit: "mm", Digits: 6,
	Examples: hand("47.572 mm", "A_{cc,n} = 47572 mm², 0 mm²", "z_{cc,n} = 47.572 mm, 100 mm"),
})
