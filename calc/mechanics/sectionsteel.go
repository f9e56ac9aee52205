package mechanics

import "soffit/calc/clause"

// Places of the steel in the section.

// Eccentricity is the distance of a tendon row below the centroid.
var Eccentricity = clause.Define(&clause.Formula{
	ID: "eccentricity", Name: "Eccentricity of each row, below the centroid positive", Text: "e_i = y_cg − y_{p,i}", Unit: "mm", Digits: 6,
	Examples: hand("440 mm", "y_cg = 500 mm", "y_{p,i} = 60 mm"),
})

// TendonDepth is the depth of a tendon row from the top.
var TendonDepth = clause.Define(&clause.Formula{
	ID: "tendon-depth", Name: "Depth of each row from the top", Text: "d_{p,i} = h − y_{p,i}", Unit: "mm", Digits: 6,
	Examples: hand("1140 mm", "h = 1200 mm", "y_{p,i} = 60 mm"),
})

// BarDepth is the depth of a bar row from the top.
var BarDepth = clause.Define(&clause.Formula{
	ID: "bar-depth", Name: "Depth of each row from the top", Text: "d_{s,j} = h − y_{s,j}", Unit: "mm", Digits: 6,
	Examples: hand("550 mm", "h = 600 mm", "y_{s,j} = 50 mm"),
})

// TendonDepthBelow and BarDepthBelow are the depths from the soffit, where that is the compressed edge.
var (
	TendonDepthBelow = clause.Define(&clause.Formula{
		ID: "tendon-depth-below", Name: "Depth of each row from the soffit, the compressed edge", Text: "d_{p,i} = y_{p,i}", Unit: "mm", Digits: 6,
		Examples: hand("60 mm", "y_{p,i} = 60 mm"),
	})
	BarDepthBelow = clause.Define(&clause.Formula{
		ID: "bar-depth-below", Name: "Depth of each row from the soffit, the compressed edge", Text: "d_{s,j} = y_{s,j}", Unit: "mm", Digits: 6,
		Examples: hand("50 mm", "y_{s,j} = 50 mm"),
	})
)
