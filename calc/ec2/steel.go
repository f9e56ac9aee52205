package ec2

import "soffit/calc/clause"

// Steel, 3.2 and 3.3: design diagrams with horizontal or inclined branch. Row i is a row of tendons, row j one
// of bars.

// TendonArea is the area of a row.
var TendonArea = clause.Define(&clause.Formula{
	ID: "tendon-area", Name: "Area of the row", Ref: clause.Ref{},
	Text: "A_{p,i} = n_{p,i}·A_{p1,i}", Unit: "mm²",
	Examples: hand("1112 mm²", "n_{p,i} = 8", "A_{p1,i} = 139 mm²"),
})

// TendonDesignStrength is f_pd.
var TendonDesignStrength = clause.Define(&clause.Formula{
	ID: "tendon-design-strength", Name: "Design strength of the tendons", Ref: en("3.3.6(6)", ""),
	Text: "f_{pd,i} = f_{p0,1k,i}/γ_S", Unit: "MPa",
	Examples: hand("1426.1 MPa", "f_{p0,1k,i} = 1640 MPa", "γ_S = 1.15"),
})

// TendonYieldStrain is the strain at which the design strength is reached.
var TendonYieldStrain = clause.Define(&clause.Formula{
	ID: "tendon-yield-strain", Name: "Strain at the design strength", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "ε_{py,i} = f_{pd,i}/E_{p,i}", Unit: "‰",
	Examples: hand("7.3133 ‰", "f_{pd,i} = 1426.1 MPa", "E_{p,i} = 195 GPa"),
})

// TendonStrainLimit is ε_ud of the inclined branch.
var TendonStrainLimit = clause.Define(&clause.Formula{
	ID: "tendon-strain-limit", Name: "Strain limit of the inclined branch", Ref: en("3.3.6(7)", ""),
	Text: "ε_{pud,i} = k_ud·ε_{puk,i}", Unit: "‰",
	Examples: hand("31.5 ‰", "k_ud = 0.9", "ε_{puk,i} = 35 ‰"),
})

// TendonStressHorizontal is the greatest stress on the horizontal branch.
var TendonStressHorizontal = clause.Define(&clause.Formula{
	ID: "tendon-greatest-stress", Name: "Greatest design stress, horizontal branch without strain limit", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "σ_{pd,i} = f_{pd,i}", Unit: "MPa",
	Examples: hand("1426.1 MPa", "f_{pd,i} = 1426.1 MPa"),
})

// TendonStressInclined is the greatest stress on the inclined branch, at ε_ud.
var TendonStressInclined = clause.Define(&clause.Formula{
	ID: "tendon-greatest-stress-inclined", Name: "Greatest design stress, inclined branch at its strain limit", Ref: en("3.3.6(7) Figure 3.10", ""),
	Text: "σ_{pd,i} = f_{pd,i} + (f_{pk,i}/γ_S − f_{pd,i})·(ε_{pud,i} − ε_{py,i})/(ε_{puk,i} − ε_{py,i})", Unit: "MPa",
	Examples: hand("1593.2 MPa", "f_{pd,i} = 1426.1 MPa", "f_{pk,i} = 1860 MPa", "γ_S = 1.15", "ε_{pud,i} = 31.5 ‰",
		"ε_{py,i} = 7.3133 ‰", "ε_{puk,i} = 35 ‰"),
})

// BarArea is the area of a row of bars.
var BarArea = clause.Define(&clause.Formula{
	ID: "bar-area", Name: "Area of the row", Ref: clause.Ref{},
	Text: "A_{s,j} = n_{s,j}·π/4·φ_{s,j}^2", Unit: "mm²",
	Examples: hand("804.25 mm²", "n_{s,j} = 4", "φ_{s,j} = 16 mm"),
})

// BareBarArea is the area of a row of bars without those in a topping, which the bare member has not yet.
var BareBarArea = clause.Define(&clause.Formula{
	ID: "bare-bar-area", Name: "Area of the row in the bare member: none in the topping", Ref: clause.Ref{},
	Text: "A_{s,j} = (1 − k_{t,j})·n_{s,j}·π/4·φ_{s,j}^2", Unit: "mm²",
	Examples: hand("804.25 mm², 0 mm²", "k_{t,j} = 0, 1", "n_{s,j} = 4, 4", "φ_{s,j} = 16 mm, 16 mm"),
})

// BarDesignStrength is f_yd.
var BarDesignStrength = clause.Define(&clause.Formula{
	ID: "bar-design-strength", Name: "Design strength of the bars", Ref: en("3.2.7(2)", ""),
	Text: "f_{yd,j} = f_{yk,j}/γ_S", Unit: "MPa",
	Examples: []clause.Example{by("EN 1992-1-1, common value 434.8 MPa", clause.Recalled, "434.8 MPa", "f_{yk,j} = 500 MPa", "γ_S = 1.15")},
})

// BarYieldStrain is the strain at f_yd.
var BarYieldStrain = clause.Define(&clause.Formula{
	ID: "bar-yield-strain", Name: "Strain at the design strength", Ref: en("3.2.7 Figure 3.8", ""),
	Text: "ε_{sy,j} = f_{yd,j}/E_s", Unit: "‰",
	Examples: hand("2.1739 ‰", "f_{yd,j} = 434.78 MPa", "E_s = 200 GPa"),
})

// BarStrainLimit is ε_ud of bars.
var BarStrainLimit = clause.Define(&clause.Formula{
	ID: "bar-strain-limit", Name: "Strain limit of the inclined branch", Ref: en("3.2.7(2)", ""),
	Text: "ε_{sud,j} = k_ud·ε_{suk,j}", Unit: "‰",
	Examples: hand("45 ‰", "k_ud = 0.9", "ε_{suk,j} = 50 ‰"),
})

// BarStressHorizontal is the greatest stress of bars on the horizontal branch.
var BarStressHorizontal = clause.Define(&clause.Formula{
	ID: "bar-greatest-stress", Name: "Greatest design stress, horizontal branch without strain limit", Ref: en("3.2.7(2) Figure 3.8", ""),
	Text: "σ_{sd,j} = f_{yd,j}", Unit: "MPa",
	Examples: hand("434.78 MPa", "f_{yd,j} = 434.78 MPa"),
})

// BarStressInclined is the greatest stress of bars on the inclined branch.
var BarStressInclined = clause.Define(&clause.Formula{
	ID: "bar-greatest-stress-inclined", Name: "Greatest design stress, inclined branch at its strain limit", Ref: en("3.2.7(2) Figure 3.8", ""),
	Text: "σ_{sd,j} = f_{yd,j}·(1 + (k_{s,j} − 1)·(ε_{sud,j} − ε_{sy,j})/(ε_{suk,j} − ε_{sy,j}))", Unit: "MPa",
	Examples: hand("465.9 MPa", "f_{yd,j} = 434.78 MPa", "k_{s,j} = 1.08", "ε_{sud,j} = 45 ‰", "ε_{sy,j} = 2.1739 ‰", "ε_{suk,j} = 50 ‰"),
})
