package mechanics

import "soffit/calc/clause"

// The section seen from the edge that is compressed: from the top where the moment sags, from the soffit where it hogs.
// z_{c,n} is the depth of the nearer edge of a part, b_{1,n} its width there, b_{2,n} that at the farther edge; z_{v,m} the
// depth of the centre of round parts, whose circle counts from t_{1,m} to t_{2,m}, measured from its nearer tip.

func view(id, name, text string, digits int, want string, given ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Text: text, Unit: "mm", Digits: digits, Examples: hand(want, given...)})
}

// From the top.
var (
	PartDepthTop  = view("part-depth-top", "Depth of each part's upper edge from the top", "z_{c,n} = h − y_{u,n} − h_{c,n}", 7, "150 mm", "h = 900 mm", "y_{u,n} = 250 mm", "h_{c,n} = 500 mm")
	NearWidthTop  = view("near-width-top", "Width of each part at its upper edge", "b_{1,n} = b_{o,n}", 7, "500 mm", "b_{o,n} = 500 mm")
	FarWidthTop   = view("far-width-top", "Width of each part at its lower edge", "b_{2,n} = b_{u,n}", 7, "140 mm", "b_{u,n} = 140 mm")
	RoundDepthTop = view("round-depth-top", "Depth of the centre of the circles from the top", "z_{v,m} = h − y_{v,m}", 8, "133 mm", "h = 265 mm", "y_{v,m} = 132 mm")
	RoundFromTop  = view("round-from-top", "Where the circle begins to count, downward from its highest point", "t_{1,m} = 2·r_{v,m} − u_{2,m}", 8, "75 mm", "r_{v,m} = 75 mm", "u_{2,m} = 75 mm")
	RoundToTop    = view("round-to-top", "Where it ceases to count, downward from its highest point", "t_{2,m} = 2·r_{v,m} − u_{1,m}", 8, "150 mm", "r_{v,m} = 75 mm", "u_{1,m} = 0 mm")
)

// From the soffit.
var (
	PartDepthBelow  = view("part-depth-below", "Depth of each part's lower edge from the soffit", "z_{c,n} = y_{u,n}", 7, "250 mm", "y_{u,n} = 250 mm")
	NearWidthBelow  = view("near-width-below", "Width of each part at its lower edge", "b_{1,n} = b_{u,n}", 7, "140 mm", "b_{u,n} = 140 mm")
	FarWidthBelow   = view("far-width-below", "Width of each part at its upper edge", "b_{2,n} = b_{o,n}", 7, "500 mm", "b_{o,n} = 500 mm")
	RoundDepthBelow = view("round-depth-below", "Depth of the centre of the circles from the soffit", "z_{v,m} = y_{v,m}", 8, "132 mm", "y_{v,m} = 132 mm")
	RoundFromBelow  = view("round-from-below", "Where the circle begins to count, upward from its lowest point", "t_{1,m} = u_{1,m}", 8, "0 mm", "u_{1,m} = 0 mm")
	RoundToBelow    = view("round-to-below", "Where it ceases to count, upward from its lowest point", "t_{2,m} = u_{2,m}", 8, "75 mm", "u_{2,m} = 75 mm")
)
