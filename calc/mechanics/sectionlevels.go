package mechanics

import "soffit/calc/clause"

// Static moment and width at levels of the section. A level lies at y_e above the soffit, or at the centroid where
// k_cg = 1 and y_e = 0. The static moment is that of the area below the level about the centroid, which is that of the
// area above it.

const atLevel = "y_e + k_cg·y_cg"

// LevelPartDepth is how far each part reaches up to the level.
var LevelPartDepth = clause.Define(&clause.Formula{
	ID: "level-part-depth", Name: "Depth of each part below the level", Text: "c_{l,n} = max(0; min(h_{c,n}; " + atLevel + " − y_{u,n}))", Unit: "mm", Digits: 7,
	Examples: append(hand("100 mm", "h_{c,n} = 500 mm", "y_e = 0 mm", "k_cg = 1", "y_cg = 300 mm", "y_{u,n} = 200 mm"),
		hand("500 mm", "h_{c,n} = 500 mm", "y_e = 700 mm", "k_cg = 0", "y_cg = 300 mm", "y_{u,n} = 200 mm")...),
})

// LevelPartWidth is the width of each part at its end below the level.
var LevelPartWidth = clause.Define(&clause.Formula{
	ID: "level-part-width", Name: "Width of each part at the level", Text: "b_{l,n} = b_{u,n} + (b_{o,n} − b_{u,n})·c_{l,n}/h_{c,n}", Unit: "mm", Digits: 7,
	Examples: hand("220 mm", "b_{u,n} = 200 mm", "b_{o,n} = 300 mm", "c_{l,n} = 100 mm", "h_{c,n} = 500 mm"),
})

// LevelPartMoment is the static moment of what each part has below the level.
var LevelPartMoment = clause.Define(&clause.Formula{
	ID: "level-part-moment", Name: "Static moment about the centroid of what each part has below the level",
	Text: "S_{l,n} = c_{l,n}·((b_{u,n} + b_{l,n})/2·(y_cg − y_{u,n} − c_{l,n}/2) − (b_{l,n} − b_{u,n})·c_{l,n}/12)", Unit: "10³ mm³", Digits: 7,
	Examples: append(hand("9000 10³ mm³", "c_{l,n} = 300 mm", "b_{u,n} = 200 mm", "b_{l,n} = 200 mm", "y_cg = 300 mm", "y_{u,n} = 0 mm"),
		by("worked by hand: a triangle of base 300 mm and height 300 mm, area 45 000 mm² at 100 mm", clause.Own, "9000 10³ mm³", "c_{l,n} = 300 mm", "b_{u,n} = 300 mm", "b_{l,n} = 0 mm", "y_cg = 300 mm", "y_{u,n} = 0 mm")),
})

// LevelRoundPlace is how high the level lies in each circle.
var LevelRoundPlace = clause.Define(&clause.Formula{
	ID: "level-round-place", Name: "Level above the lowest point of each circle", Text: "t_{0,m} = " + atLevel + " − y_{v,m} + r_{v,m}", Unit: "mm", Digits: 8,
	Examples: hand("78 mm", "y_e = 0 mm", "k_cg = 1", "y_cg = 135 mm", "y_{v,m} = 132 mm", "r_{v,m} = 75 mm"),
})

// LevelRoundDepth is how far each round part reaches up to the level.
var LevelRoundDepth = clause.Define(&clause.Formula{
	ID: "level-round-depth", Name: "Reach of each round part up to the level, from the lowest point of the circle", Text: "t_{l,m} = max(u_{1,m}; min(u_{2,m}; t_{0,m}))", Unit: "mm", Digits: 8,
	Examples: append(hand("78 mm", "u_{1,m} = 0 mm", "u_{2,m} = 150 mm", "t_{0,m} = 78 mm"), hand("75 mm", "u_{1,m} = 75 mm", "u_{2,m} = 150 mm", "t_{0,m} = 20 mm")...),
})

// segmentTo is the area of a circle up to a height t above its lowest point.
func segmentTo(t string) string {
	return "(r_{v,m}^2·arccos(1 − " + t + "/r_{v,m}) − (r_{v,m} − " + t + ")·sqrt(" + t + "·(2·r_{v,m} − " + t + ")))"
}

// LevelRoundArea is the area of round parts below the level.
var LevelRoundArea = clause.Define(&clause.Formula{
	ID: "level-round-area", Name: "Area of the round parts below the level", Text: "A_{l,m} = n_{v,m}·(" + segmentTo("t_{l,m}") + " − " + segmentTo("u_{1,m}") + ")", Unit: "mm²", Digits: 7,
	Examples: append(hand("53014.38 mm²", "n_{v,m} = 6", "r_{v,m} = 75 mm", "t_{l,m} = 75 mm", "u_{1,m} = 0 mm"),
		by("handbook table of circular segments: area for h/d = 0.25 is 0.15355·d²", clause.Recalled, "1535.5 mm²", "n_{v,m} = 1", "r_{v,m} = 50 mm", "t_{l,m} = 25 mm", "u_{1,m} = 0 mm")),
})

// LevelRoundMoment is their static moment.
var LevelRoundMoment = clause.Define(&clause.Formula{
	ID: "level-round-moment", Name: "Static moment about the centroid of what the round parts have below the level",
	Text: "S_{l,m} = A_{l,m}·(y_cg − y_{v,m}) + 2/3·n_{v,m}·((t_{l,m}·(2·r_{v,m} − t_{l,m}))^(3/2) − (u_{1,m}·(2·r_{v,m} − u_{1,m}))^(3/2))", Unit: "10³ mm³", Digits: 7,
	Examples: []clause.Example{by("worked by hand: six lower half circles, 6·2/3·r³ about their diameter", clause.Own, "1687.5 10³ mm³", "A_{l,m} = 53014.38 mm²", "y_cg = 132 mm", "y_{v,m} = 132 mm", "n_{v,m} = 6", "r_{v,m} = 75 mm", "t_{l,m} = 75 mm", "u_{1,m} = 0 mm")},
})

// StaticMoment and StaticMomentWithVoids are S of the level.
var (
	StaticMoment = clause.Define(&clause.Formula{
		ID: "static-moment", Name: "Static moment of the section at the level", Text: "S_l = Σ_n(S_{l,n})", Unit: "10³ mm³", Digits: 6,
		Examples: hand("12000 10³ mm³", "S_{l,n} = 9000 10³ mm³, 3000 10³ mm³"),
	})
	StaticMomentWithVoids = clause.Define(&clause.Formula{
		ID: "static-moment-with-voids", Name: "Static moment of the section at the level", Text: "S_l = Σ_n(S_{l,n}) − Σ_m(S_{l,m})", Unit: "10³ mm³", Digits: 6,
		Examples: hand("11000 10³ mm³", "S_{l,n} = 9000 10³ mm³, 3000 10³ mm³", "S_{l,m} = 1000 10³ mm³"),
	})
)

// Widths of each part just under and just above the level; 0 where the level lies outside it.
var (
	UnderPartWidth = partWidth("under-part-width", "b_{lu,n}", "under", "y_{u,n} < "+atLevel+" ≤ y_{u,n} + h_{c,n}", "500 mm, 0 mm")
	AbovePartWidth = partWidth("above-part-width", "b_{lo,n}", "above", "y_{u,n} ≤ "+atLevel+" < y_{u,n} + h_{c,n}", "0 mm, 140 mm")
)

func partWidth(id, symbol, where, within, want string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: "Width of each part just " + where + " the level, 0 where it does not reach there", Text: symbol + " = cases(" + within + ": b_{l,n}; otherwise: 0)", Unit: "mm", Digits: 7,
		Examples: hand(want, "y_e = 200 mm", "k_cg = 0", "y_cg = 400 mm", "y_{u,n} = 0 mm, 200 mm", "h_{c,n} = 200 mm, 500 mm", "b_{l,n} = 500 mm, 140 mm")})
}

// Widths of the round parts just under and just above the level.
var (
	UnderRoundWidth = roundWidth("under-round-width", "w_{lu,m}", "under", "u_{1,m} < t_{0,m} ≤ u_{2,m}", "150 mm, 0 mm")
	AboveRoundWidth = roundWidth("above-round-width", "w_{lo,m}", "above", "u_{1,m} ≤ t_{0,m} < u_{2,m}", "0 mm, 300 mm")
)

func roundWidth(id, symbol, where, within, want string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: "Width of the round parts just " + where + " the level", Text: symbol + " = cases(" + within + ": 2·n_{v,m}·sqrt(max(0; t_{0,m}·(2·r_{v,m} − t_{0,m}))); otherwise: 0)", Unit: "mm", Digits: 7,
		Examples: hand(want, "n_{v,m} = 1, 2", "r_{v,m} = 75 mm, 75 mm", "t_{0,m} = 75 mm, 75 mm", "u_{1,m} = 0 mm, 75 mm", "u_{2,m} = 75 mm, 150 mm")})
}

// Widths of the section just under and just above the level, net of round parts, and the lesser of them.
var (
	WidthUnder, WidthUnderWithVoids = widths("width-under", "under", "b_lu", "lu")
	WidthAbove, WidthAboveWithVoids = widths("width-above", "above", "b_lo", "lo")

	LevelWidth = clause.Define(&clause.Formula{
		ID: "level-width", Name: "Width of the section at the level: the lesser of both", Text: "b_l = min(b_lu; b_lo)", Unit: "mm", Digits: 6,
		Examples: hand("140 mm", "b_lu = 500 mm", "b_lo = 140 mm"),
	})
)

func widths(id, where, symbol, part string) (bare, voids *clause.Formula) {
	parts, rounds := "b_{"+part+",n}", "w_{"+part+",m}"
	define := func(id, text, want string, given ...string) *clause.Formula {
		return clause.Define(&clause.Formula{ID: id, Name: "Width of the section just " + where + " the level", Text: symbol + " = " + text, Unit: "mm", Digits: 7, Examples: hand(want, given...)})
	}
	return define(id, "Σ_n("+parts+")", "500 mm", parts+" = 500 mm, 0 mm"),
		define(id+"-with-voids", "Σ_n("+parts+") − Σ_m("+rounds+")", "350 mm", parts+" = 500 mm, 0 mm", rounds+" = 150 mm")
}
