package mechanics

import "soffit/calc/clause"

// The member with its topping: concrete of two moduli, the topping as concrete of the member n_t times as wide. The
// topping is b_top wide and h_top deep and lies on the top of the member.

// Composite properties.
var (
	CompositeDepth = clause.Define(&clause.Formula{
		ID: "composite-depth", Name: "Overall depth with the topping", Text: "h_tot = h + h_top", Unit: "mm", Digits: 7,
		Examples: hand("670 mm", "h = 600 mm", "h_top = 70 mm"),
	})
	ToppingRatio = clause.Define(&clause.Formula{
		ID: "topping-modular-ratio", Name: "Ratio of the moduli of the topping and the member", Text: "n_t = E_{cm,t}/E_cm", Unit: "", Digits: 6,
		Examples: hand("0.9", "E_{cm,t} = 33.3 GPa", "E_cm = 37 GPa"),
	})
	CompositeArea = clause.Define(&clause.Formula{
		ID: "composite-area", Name: "Area with the topping", Text: "A_co = A_c + n_t·b_top·h_top", Unit: "mm²", Digits: 6,
		Examples: hand("280000 mm²", "A_c = 180000 mm²", "n_t = 0.8", "b_top = 1250 mm", "h_top = 100 mm"),
	})
	CompositeCentroid = clause.Define(&clause.Formula{
		ID: "composite-centroid", Name: "Its centroid above the soffit", Text: "y_co = (A_c·y_cg + n_t·b_top·h_top·(h + h_top/2))/A_co", Unit: "mm", Digits: 6,
		Examples: hand("425 mm", "A_c = 180000 mm²", "y_cg = 300 mm", "n_t = 0.8", "b_top = 1250 mm", "h_top = 100 mm", "h = 600 mm", "A_co = 280000 mm²"),
	})
	CompositeInertia = clause.Define(&clause.Formula{
		ID: "composite-inertia", Name: "Its second moment of area", Text: "I_co = I_c + A_c·(y_co − y_cg)^2 + n_t·b_top·h_top·(h_top^2/12 + (h + h_top/2 − y_co)^2)", Unit: "10⁶ mm⁴", Digits: 6,
		Examples: []clause.Example{by("worked by hand: 5400 + 180 000·125² + 100 000·(100²/12 + 225²)", clause.Own, "13358.3 10⁶ mm⁴", "I_c = 5400 10⁶ mm⁴", "A_c = 180000 mm²", "y_co = 425 mm", "y_cg = 300 mm",
			"n_t = 0.8", "b_top = 1250 mm", "h_top = 100 mm", "h = 600 mm"),
			by("a rectangle of 300 by 700 mm made up of two: b·h³/12", clause.Own, "8575 10⁶ mm⁴", "I_c = 5400 10⁶ mm⁴", "A_c = 180000 mm²", "y_co = 350 mm", "y_cg = 300 mm", "n_t = 1", "b_top = 300 mm", "h_top = 100 mm", "h = 600 mm")},
	})
	CompositeLowerModulus = clause.Define(&clause.Formula{
		ID: "composite-lower-modulus", Name: "Its section modulus, bottom fibre", Text: "W_{co,b} = I_co/y_co", Unit: "10³ mm³", Digits: 6,
		Examples: hand("100.000 10³ mm³", "I_co = 10 10⁶ mm⁴", "y_co = 100 mm"),
	})
	CompositeUpperModulus = clause.Define(&clause.Formula{
		ID: "composite-upper-modulus", Name: "Its section modulus, top of the member (negative where the centroid lies in the topping)", Text: "W_{co,t} = I_co/(h − y_co)", Unit: "10³ mm³", Digits: 6,
		Examples: hand("50.000 10³ mm³", "I_co = 10 10⁶ mm⁴", "y_co = 100 mm", "h = 300 mm"),
	})
	CompositeToppingModulus = clause.Define(&clause.Formula{
		ID: "composite-topping-modulus", Name: "Its section modulus, top of the topping, for the stress of the topping", Text: "W_{co,o} = I_co/(n_t·(h_tot − y_co))", Unit: "10³ mm³", Digits: 6,
		Examples: hand("40.0000 10³ mm³", "I_co = 10 10⁶ mm⁴", "y_co = 100 mm", "h_tot = 412.5 mm", "n_t = 0.8"),
	})
)
