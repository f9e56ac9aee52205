package mechanics

import "soffit/calc/clause"

// Parts of a flange beyond and between webs.

// FlangeOverhang is the width of the top part beyond the web on one side.
var FlangeOverhang = clause.Define(&clause.Formula{
	ID: "flange-overhang", Name: "Overhang of the flange on each side", Text: "b_1 = (b_f − b_w)/2", Unit: "mm", Digits: 6,
	Examples: hand("450 mm", "b_f = 1200 mm", "b_w = 300 mm"),
})

// StemOverhang and BetweenStems are the widths of a flange on two equal stems: beyond one of them, and half of what lies
// between them.
var (
	StemOverhang = clause.Define(&clause.Formula{
		ID: "stem-overhang", Name: "Overhang of the flange beyond each stem", Text: "b_1 = max(0; (b_f − s_w − b_w)/2)", Unit: "mm", Digits: 6,
		Examples: append(hand("500 mm", "b_f = 2400 mm", "s_w = 1200 mm", "b_w = 200 mm"), hand("0 mm", "b_f = 1400 mm", "s_w = 1200 mm", "b_w = 200 mm")...),
	})
	BetweenStems = clause.Define(&clause.Formula{
		ID: "between-stems", Name: "Half the width between the stems", Text: "b_2 = (s_w − b_w)/2", Unit: "mm", Digits: 6,
		Examples: hand("500 mm", "s_w = 1200 mm", "b_w = 200 mm"),
	})
)

// ToppingOverhangOnStems is the width of a topping beyond one of two webs.
var ToppingOverhangOnStems = clause.Define(&clause.Formula{
	ID: "topping-overhang-on-stems", Name: "Overhang of the topping beyond each web", Text: "b_{1,t} = max(0; (b_top − s_w − b_w)/2)", Unit: "mm", Digits: 6,
	Examples: hand("250 mm", "b_top = 1800 mm", "s_w = 1140 mm", "b_w = 160 mm"),
})

// ToppingOverhang is the width of a topping beyond the top edge of the member on one side.
var ToppingOverhang = clause.Define(&clause.Formula{
	ID: "topping-overhang", Name: "Overhang of the topping beyond the top edge of the member on each side", Text: "b_{1,t} = max(0; (b_top − b_f)/2)", Unit: "mm", Digits: 6,
	Examples: append(hand("400 mm", "b_top = 1200 mm", "b_f = 400 mm"), hand("0 mm", "b_top = 400 mm", "b_f = 500 mm")...),
})
