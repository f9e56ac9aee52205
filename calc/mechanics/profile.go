package mechanics

import "soffit/calc/clause"

// Profiles of tendons. Row i is a row of tendons, m a segment of its profile from x_{s,i,m} over l_{s,i,m}, from height
// y_{s,i,m} to y_{e,i,m}. Its line is f_{s,i,m}: 1 a straight line, 2 a parabola level at its end, 0 one level at its start, 3
// one that leaves its start in the direction s_{b,i,m} reached there. A row with fewer segments than the longest profile
// has zeros for the rest.

// SegmentSlope is the slope at the start of a segment.
var SegmentSlope = clause.Define(&clause.Formula{
	ID: "segment-slope", Name: "Slope at the start of each segment, rising towards end B positive", Digits: 8,
	Text: "s_{s,i,m} = cases(l_{s,i,m} = 0: 0; f_{s,i,m} = 3: s_{b,i,m}; otherwise: f_{s,i,m}·(y_{e,i,m} − y_{s,i,m})/l_{s,i,m})",
	Examples: append(append(append(
		hand("-0.08", "f_{s,i,m} = 1", "s_{b,i,m} = 0", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm"),
		hand("-0.16", "f_{s,i,m} = 2", "s_{b,i,m} = 0", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm")...),
		hand("0", "f_{s,i,m} = 0", "s_{b,i,m} = 0.1", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm")...),
		hand("0.1", "f_{s,i,m} = 3", "s_{b,i,m} = 0.1", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm")...),
})

// SegmentHalfCurvature is half of y″ of a segment.
var SegmentHalfCurvature = clause.Define(&clause.Formula{
	ID: "segment-half-curvature", Name: "Half the curvature of each segment, 0 of a straight line: u from its start the tendon is higher by slope times u and half curvature times u squared", Digits: 8, Unit: "1/m",
	Text: "c_{s,i,m} = cases(l_{s,i,m} = 0 or f_{s,i,m} = 1: 0·[1/m]; otherwise: ((y_{e,i,m} − y_{s,i,m})/l_{s,i,m} − s_{s,i,m})/l_{s,i,m})",
	Examples: append(append(append(
		hand("0 1/m", "f_{s,i,m} = 1", "s_{s,i,m} = -0.08", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm"),
		hand("0.008 1/m", "f_{s,i,m} = 2", "s_{s,i,m} = -0.16", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm")...),
		hand("-0.008 1/m", "f_{s,i,m} = 0", "s_{s,i,m} = 0", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm")...),
		hand("-0.018 1/m", "f_{s,i,m} = 3", "s_{s,i,m} = 0.1", "l_{s,i,m} = 10 m", "y_{s,i,m} = 1000 mm", "y_{e,i,m} = 200 mm")...),
})

// ProfileFit is by how much a segment misses the height written for its end: what rounding leaves of it.
var ProfileFit = clause.Define(&clause.Formula{
	ID: "profile-fit", Name: "By how much each segment misses the point at its end", Digits: 2, Unit: "mm",
	Text:     "Δy_{i,m} = y_{s,i,m} + s_{s,i,m}·l_{s,i,m} + c_{s,i,m}·l_{s,i,m}^2 − y_{e,i,m}",
	Examples: hand("0 mm", "y_{s,i,m} = 1000 mm", "s_{s,i,m} = -0.18", "l_{s,i,m} = 10 m", "c_{s,i,m} = 0.009 1/m", "y_{e,i,m} = 100 mm"),
})

// ProfileMeets asks that each segment meets the point at its end.
var ProfileMeets = &clause.Condition{ID: "profile-meets", Name: "Segments against the points of the profile", Text: "abs(Δy_{i,m}) ≤ 0.05·[mm]",
	Yes: "each segment meets its point", No: "a segment misses its point"}

// SegmentEndSlope is the slope at the end of a segment.
var SegmentEndSlope = clause.Define(&clause.Formula{
	ID: "segment-end-slope", Name: "Slope at the end of each segment, rising towards end B positive", Digits: 7,
	Text:     "s_{e,i,m} = s_{s,i,m} + 2·c_{s,i,m}·l_{s,i,m}",
	Examples: hand("0", "s_{s,i,m} = -0.18", "c_{s,i,m} = 0.009 1/m", "l_{s,i,m} = 10 m"),
})

// Kink is the change of slope from one segment to the next.
var Kink = clause.Define(&clause.Formula{
	ID: "kink", Name: "Kink at the start of each segment, the change of slope taken as the angle; less than 10⁻⁶ is none", Digits: 7,
	Text:     "k_{s,i,m} = cases(abs(s_{s,i,m} − s_{b,i,m}) < 0.000001 or l_{s,i,m} = 0: 0; otherwise: abs(s_{s,i,m} − s_{b,i,m}))",
	Examples: append(hand("0.0666667", "s_{s,i,m} = 0", "s_{b,i,m} = -0.0666667", "l_{s,i,m} = 1 m"), hand("0", "s_{s,i,m} = 0.1000001", "s_{b,i,m} = 0.1", "l_{s,i,m} = 1 m")...),
})

// TendonLevel is the height of a row at a station.
var TendonLevel = clause.Define(&clause.Formula{
	ID: "tendon-level", Name: "Height of each row above the soffit: that at end A and the rise over the segments passed", Digits: 7, Unit: "mm",
	Text: "y_{p,i} = y_{0,i} + Σ_m(s_{s,i,m}·max(0; min(x_m − x_{s,i,m}; l_{s,i,m})) + c_{s,i,m}·max(0; min(x_m − x_{s,i,m}; l_{s,i,m}))^2)",
	Examples: append(
		// A parabola of sag 900 mm over 20 m: at a quarter of the length three quarters of the sag.
		hand("325 mm", "y_{0,i} = 1000 mm", "x_m = 5 m", "s_{s,i,m} = -0.18, 0", "x_{s,i,m} = 0 m, 10 m", "l_{s,i,m} = 10 m, 10 m", "c_{s,i,m} = 0.009 1/m, 0.009 1/m"),
		hand("325 mm", "y_{0,i} = 1000 mm", "x_m = 15 m", "s_{s,i,m} = -0.18, 0", "x_{s,i,m} = 0 m, 10 m", "l_{s,i,m} = 10 m, 10 m", "c_{s,i,m} = 0.009 1/m, 0.009 1/m")...),
})

// TendonSlope is the direction of a row at a station.
var TendonSlope = clause.Define(&clause.Formula{
	ID: "tendon-slope", Name: "Slope of each row, rising towards end B positive; at a kink that on the side of end A", Digits: 5,
	Text: "θ_{p,i} = Σ_m(cases(x_{s,i,m} < x_m ≤ x_{s,i,m} + l_{s,i,m} or x_m = x_{s,i,m} = 0·[m]: s_{s,i,m} + 2·c_{s,i,m}·(x_m − x_{s,i,m}); otherwise: 0))",
	Examples: append(
		hand("-0.09", "x_m = 5 m", "s_{s,i,m} = -0.18, 0", "x_{s,i,m} = 0 m, 10 m", "l_{s,i,m} = 10 m, 10 m", "c_{s,i,m} = 0.009 1/m, 0.009 1/m"),
		hand("-0.18", "x_m = 0 m", "s_{s,i,m} = -0.18, 0", "x_{s,i,m} = 0 m, 10 m", "l_{s,i,m} = 10 m, 10 m", "c_{s,i,m} = 0.009 1/m, 0.009 1/m")...),
})

// EndLevel is the height of a row at the ends of the concrete, where deflected tendons are anchored by bond.
var EndLevel = clause.Define(&clause.Formula{
	ID: "end-level", Name: "Height of each row at the ends of the concrete", Text: "y_{p,i} = y_{0,i}", Unit: "mm", Digits: 7,
	Examples: hand("480 mm", "y_{0,i} = 480 mm"),
})

// HoldDownForce is what a row of deflected tendons pulls upward with at each place where it is held down, all its tendons
// together, while the stressing bed holds it. At a single place in the middle the tendons rise to both sides.
var HoldDownForce = clause.Define(&clause.Formula{
	ID: "hold-down-force", Name: "Upward force of all tendons of each row on the hold-down at each of its places, with the stress at jacking", Unit: "kN",
	Text: "P_{hd,i} = A_{p,i}·σ_{p,max,i}·" + sideways,
	Examples: append(append(hand("41.01 kN", "A_{p,i} = 450 mm²", "σ_{p,max,i} = 1370 MPa", "r_{d,i} = 400 mm", "a_{d,i} = 6 m", "L = 20 m"),
		hand("82.02 kN", "A_{p,i} = 450 mm²", "σ_{p,max,i} = 1370 MPa", "r_{d,i} = 400 mm", "a_{d,i} = 6 m", "L = 12 m")...),
		hand("0 kN", "A_{p,i} = 450 mm²", "σ_{p,max,i} = 1370 MPa", "r_{d,i} = 0 mm", "a_{d,i} = 0 m", "L = 20 m")...),
})

// DeviationForce is what the concrete takes over from the hold-down at release.
var DeviationForce = clause.Define(&clause.Formula{
	ID: "deviation-force", Name: "Upward force of each row on the concrete at each of these places just after release", Unit: "kN",
	Text:     "P_{dv,i} = A_{p,i}·σ_{pm0,i}·" + sideways,
	Examples: hand("38.91 kN", "A_{p,i} = 450 mm²", "σ_{pm0,i} = 1300 MPa", "r_{d,i} = 400 mm", "a_{d,i} = 6 m", "L = 20 m"),
})

// sideways is the sine of the slope, of both sides where there is one place in the middle, and 0 for straight rows.
const sideways = "cases(2·a_{d,i} ≥ L: 2; otherwise: 1)·r_{d,i}/sqrt(max(r_{d,i}^2 + a_{d,i}^2; 1·[mm²]))"

// GroupArea is the steel of a group of rows.
var GroupArea = clause.Define(&clause.Formula{
	ID: "group-area", Name: "Area of the tendons of each group", Text: "A_{g,n} = Σ_i(g_{i,n}·A_{p,i})", Unit: "mm²",
	Examples: hand("300 mm²", "A_{p,i} = 100 mm², 200 mm²", "g_{i,n} = 1, 1"),
})

// PresentForce is the force of a row at a station.
var PresentForce = clause.Define(&clause.Formula{
	ID: "present-force", Name: "Force of each row present at the station", Text: "F_{pt,i} = A_{p,i}·σ_{pt,i}", Unit: "kN",
	Examples: hand("1273.2 kN", "A_{p,i} = 1112 mm²", "σ_{pt,i} = 1145 MPa"),
})

// MidSpanHeight is the height of a row at mid-span.
var MidSpanHeight = clause.Define(&clause.Formula{
	ID: "mid-span-height", Name: "Height of each row at mid-span", Digits: 7, Unit: "mm", Text: "y_{p,i} = y_{m,i}", Examples: hand("120 mm", "y_{m,i} = 120 mm"),
})
