package mechanics

import "soffit/calc/clause"

// The section without its ducts, before they are grouted, and with its steel as concrete of as many times the area as
// its modulus is that of the concrete. Row i of ducts has n_{d,i} of them, of outer diameter φ_{d,i}, at y_{p,i} above the
// soffit.

// DuctArea is the area of the ducts of a row.
var DuctArea = clause.Define(&clause.Formula{
	ID: "duct-area", Name: "Area of the ducts of each row", Text: "A_{h,i} = n_{d,i}·π·φ_{d,i}^2/4", Unit: "mm²", Digits: 6,
	Examples: hand("10053.1 mm²", "n_{d,i} = 2", "φ_{d,i} = 80 mm"),
})

// Net properties.
var (
	NetArea = clause.Define(&clause.Formula{
		ID: "net-area", Name: "Area without the ducts", Text: "A_net = A_c − Σ_i(A_{h,i})", Unit: "mm²", Digits: 6,
		Examples: hand("480000 mm²", "A_c = 500000 mm²", "A_{h,i} = 10000 mm², 10000 mm²"),
	})
	NetCentroid = clause.Define(&clause.Formula{
		ID: "net-centroid", Name: "Its centroid above the soffit", Text: "y_net = (A_c·y_cg − Σ_i(A_{h,i}·y_{p,i}))/A_net", Unit: "mm", Digits: 6,
		Examples: hand("512.5 mm", "A_c = 500000 mm²", "y_cg = 500 mm", "A_{h,i} = 10000 mm², 10000 mm²", "y_{p,i} = 150 mm, 250 mm", "A_net = 480000 mm²"),
	})
	NetInertia = clause.Define(&clause.Formula{
		ID: "net-inertia", Name: "Its second moment of area", Text: "I_net = I_c + A_c·(y_cg − y_net)^2 − Σ_i(A_{h,i}·(φ_{d,i}^2/16 + (y_{p,i} − y_net)^2))", Unit: "10⁶ mm⁴", Digits: 6,
		Examples: []clause.Example{by("worked by hand: a rectangle of 1000 by 500 mm less a hole of 10 000 mm², 112.838 mm across, at 100 mm", clause.Own, "40026.1 10⁶ mm⁴",
			"I_c = 41666.67 10⁶ mm⁴", "A_c = 500000 mm²", "y_cg = 500 mm", "y_net = 508.1633 mm", "A_{h,i} = 10000 mm²", "φ_{d,i} = 112.838 mm", "y_{p,i} = 100 mm")},
	})
	NetLowerModulus = clause.Define(&clause.Formula{
		ID: "net-lower-modulus", Name: "Its section modulus, bottom fibre", Text: "W_{net,b} = I_net/y_net", Unit: "10³ mm³", Digits: 6,
		Examples: hand("100.000 10³ mm³", "I_net = 10 10⁶ mm⁴", "y_net = 100 mm"),
	})
	NetUpperModulus = clause.Define(&clause.Formula{
		ID: "net-upper-modulus", Name: "Its section modulus, top fibre", Text: "W_{net,t} = I_net/(h − y_net)", Unit: "10³ mm³", Digits: 6,
		Examples: hand("50.000 10³ mm³", "I_net = 10 10⁶ mm⁴", "y_net = 100 mm", "h = 300 mm"),
	})
)

// TendonRatio and BarRatio are ratios of moduli.
var (
	TendonRatio = clause.Define(&clause.Formula{
		ID: "tendon-modular-ratio", Name: "Ratio of the moduli of the tendons and the concrete", Text: "α_{e,i} = E_{p,i}/E_cm", Unit: "", Digits: 6,
		Examples: hand("5.27027", "E_{p,i} = 195 GPa", "E_cm = 37 GPa"),
	})
	BarRatio = clause.Define(&clause.Formula{
		ID: "bar-modular-ratio", Name: "Ratio of the moduli of the bars and the concrete", Text: "α_es = E_s/E_cm", Unit: "", Digits: 6,
		Examples: hand("5.40541", "E_s = 200 GPa", "E_cm = 37 GPa"),
	})
)

// Transformed properties, without bars and with them. The concrete that the steel displaces is taken out: hence − 1.
var (
	TransformedArea             = transformed("transformed-area", "", "105000 mm²")
	TransformedAreaWithBars     = transformed("transformed-area-with-bars", " + Σ_j((α_es − 1)·A_{s,j})", "107000 mm²", "α_es = 5", "A_{s,j} = 500 mm²")
	TransformedCentroid         = transformedCentroid("transformed-centroid", "", "190.48 mm")
	TransformedCentroidWithBars = transformedCentroid("transformed-centroid-with-bars", " + Σ_j((α_es − 1)·A_{s,j}·y_{s,j})", "189.72 mm", "α_es = 5", "A_{s,j} = 500 mm²", "y_{s,j} = 150 mm")
	TransformedInertia          = transformedInertia("transformed-inertia", "", "1190.476 10⁶ mm⁴")
	TransformedInertiaWithBars  = transformedInertia("transformed-inertia-with-bars", " + Σ_j((α_es − 1)·A_{s,j}·(y_{s,j} − y_id)^2)", "1193.753 10⁶ mm⁴", "α_es = 5", "A_{s,j} = 500 mm²", "y_{s,j} = 150 mm")
	TransformedLowerModulus     = clause.Define(&clause.Formula{
		ID: "transformed-lower-modulus", Name: "Its section modulus, bottom fibre", Text: "W_{id,b} = I_id/y_id", Unit: "10³ mm³", Digits: 6,
		Examples: hand("100.000 10³ mm³", "I_id = 10 10⁶ mm⁴", "y_id = 100 mm"),
	})
	TransformedUpperModulus = clause.Define(&clause.Formula{
		ID: "transformed-upper-modulus", Name: "Its section modulus, top fibre", Text: "W_{id,t} = I_id/(h − y_id)", Unit: "10³ mm³", Digits: 6,
		Examples: hand("50.000 10³ mm³", "I_id = 10 10⁶ mm⁴", "y_id = 100 mm", "h = 300 mm"),
	})
)

func transformed(id, bars, want string, more ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: "Area of concrete and steel, the steel as concrete", Text: "A_id = A_c + Σ_i((α_{e,i} − 1)·A_{p,i})" + bars, Unit: "mm²", Digits: 6,
		Examples: hand(want, append([]string{"A_c = 100000 mm²", "α_{e,i} = 6", "A_{p,i} = 1000 mm²"}, more...)...)})
}

func transformedCentroid(id, bars, want string, more ...string) *clause.Formula {
	area := "A_id = 105000 mm²"
	if bars != "" {
		area = "A_id = 107000 mm²"
	}
	return clause.Define(&clause.Formula{ID: id, Name: "Its centroid above the soffit", Text: "y_id = (A_c·y_cg + Σ_i((α_{e,i} − 1)·A_{p,i}·y_{p,i})" + bars + ")/A_id", Unit: "mm", Digits: 6,
		Examples: hand(want, append([]string{area, "A_c = 100000 mm²", "y_cg = 200 mm", "α_{e,i} = 6", "A_{p,i} = 1000 mm²", "y_{p,i} = 0 mm"}, more...)...)})
}

func transformedInertia(id, bars, want string, more ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: "Its second moment of area", Text: "I_id = I_c + A_c·(y_cg − y_id)^2 + Σ_i((α_{e,i} − 1)·A_{p,i}·(y_{p,i} − y_id)^2)" + bars, Unit: "10⁶ mm⁴", Digits: 6,
		Examples: hand(want, append([]string{"I_c = 1000 10⁶ mm⁴", "y_id = 190.4762 mm", "A_c = 100000 mm²", "y_cg = 200 mm", "α_{e,i} = 6", "A_{p,i} = 1000 mm²", "y_{p,i} = 0 mm"}, more...)...)})
}
