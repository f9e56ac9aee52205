package mechanics

import "soffit/calc/clause"

// What is seen from the compressed edge: the top, or the soffit where the moment hogs; without the topping or with it.

func seen(id, name, text, unit, want string, given ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Text: text, Unit: unit, Digits: 6, Examples: hand(want, given...)})
}

// The depth of the centroid from the compressed edge.
var (
	CentroidDepth            = seen("centroid-depth", "Depth of the centroid from the top", "z_0 = h − y_cg", "mm", "600 mm", "h = 1100 mm", "y_cg = 500 mm")
	CentroidDepthBelow       = seen("centroid-depth-below", "Depth of the centroid from the soffit", "z_0 = y_cg", "mm", "500 mm", "y_cg = 500 mm")
	ToppedCentroidDepth      = seen("topped-centroid-depth", "Depth of the composite centroid from the top", "z_0 = h_tot − y_co", "mm", "550 mm", "h_tot = 1200 mm", "y_co = 650 mm")
	ToppedCentroidDepthBelow = seen("topped-centroid-depth-below", "Depth of the composite centroid from the soffit", "z_0 = y_co", "mm", "650 mm", "y_co = 650 mm")
)

// The depth at which an axial force acts: the centroid of the bare section.
var (
	AxialDepth       = seen("axial-depth", "Depth of the axial force, at the centroid, from the top", "z_ax = h − y_cg", "mm", "600 mm", "h = 1100 mm", "y_cg = 500 mm")
	AxialDepthBelow  = seen("axial-depth-below", "Depth of the axial force, at the centroid of the bare section, from the soffit", "z_ax = y_cg", "mm", "500 mm", "y_cg = 500 mm")
	AxialDepthTopped = seen("axial-depth-topped", "Depth of the axial force, at the centroid of the bare section, from the top", "z_ax = h_v − y_cg", "mm", "700 mm", "h_v = 1200 mm", "y_cg = 500 mm")
)

// The whole depth, and the depth of the fibres from the compressed edge.
var (
	SeenDepth         = seen("seen-depth", "Depth of the section", "h_v = h", "mm", "1100 mm", "h = 1100 mm")
	SeenDepthTopped   = seen("seen-depth-topped", "Depth of the section with the topping", "h_v = h_tot", "mm", "1200 mm", "h_tot = 1200 mm")
	FibreDepth        = seen("fibre-depth", "Depth of each fibre from the top", "z_{f,m} = h_v − y_{f,m}", "mm", "1195 mm, 5 mm", "h_v = 1200 mm", "y_{f,m} = 5 mm, 1195 mm")
	FibreDepthBelow   = seen("fibre-depth-below", "Depth of each fibre from the soffit", "z_{f,m} = y_{f,m}", "mm", "5 mm, 1195 mm", "y_{f,m} = 5 mm, 1195 mm")
	ToppedTendonDepth = seen("topped-tendon-depth", "Depth of each row from the top of the topping", "d_{p,i} = h_v − y_{p,i}", "mm", "1140 mm", "h_v = 1200 mm", "y_{p,i} = 60 mm")
	ToppedBarDepth    = seen("topped-bar-depth", "Depth of each row from the top of the topping", "d_{s,j} = h_v − y_{s,j}", "mm", "50 mm", "h_v = 1200 mm", "y_{s,j} = 1150 mm")
)
