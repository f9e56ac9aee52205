package ec2

import "soffit/calc/clause"

// Bending with fibres of concrete, 3.1.7(1) and (2). Fibre m has the area A_{f,m} at the depth z_{f,m} from the compressed
// edge. The bilinear law is that of the parabola–rectangle with the exponent 1 and the strains ε_c3 and ε_cu3.

// The law chosen: the strain at which the strength is reached, the ultimate strain and the exponent.
var (
	LawStrain, BilinearLawStrain     = law("law-strain", "Strain at which the strength is reached", "ε_cy", "ε_c2", "ε_c3", "‰", "2 ‰")
	LawUltimate, BilinearLawUltimate = law("law-ultimate-strain", "Ultimate strain", "ε_cu", "ε_cu2", "ε_cu3", "‰", "3.5 ‰")
	LawExponent, BilinearLawExponent = law("law-exponent", "Exponent of the law", "n_σ", "n", "1", "", "1")
)

func law(id, name, symbol, parabola, bilinear, unit, want string) (*clause.Formula, *clause.Formula) {
	define := func(id, ref, from string) *clause.Formula {
		f := &clause.Formula{ID: id, Name: name, Ref: en(ref, ""), Text: symbol + " = " + from, Unit: unit, Examples: hand(want)}
		if from != "1" {
			f.Examples = hand(want, from+" = "+want)
		}
		return clause.Define(f)
	}
	return define(id, "3.1.7(1)", parabola), define(id+"-bilinear", "3.1.7(2)", bilinear)
}

// FibreStrain is the strain of a fibre, compression positive. What is stretched counts as 0: it bears nothing, and where x is a
// few millimetres its strain would take the digits of the column.
var FibreStrain = clause.Define(&clause.Formula{ID: "fibre-strain", Name: "Strain of each fibre, compression positive; 0 where it is stretched", Ref: en("6.1(2)P", ""),
	Text: "ε_{f,m} = max(0; κ·(x − z_{f,m}))", Unit: "‰", Digits: 7,
	Examples: append(hand("2 ‰", "κ = 20 1/km", "x = 150 mm", "z_{f,m} = 50 mm"), hand("0 ‰", "κ = 20 1/km", "x = 150 mm", "z_{f,m} = 200 mm")...)})

// FibreStress is the stress of a fibre.
var FibreStress = clause.Define(&clause.Formula{ID: "fibre-stress", Name: "Stress of each fibre", Ref: en("3.1.7(1), (2)", "3.17, 3.18"),
	Text: "σ_{f,m} = f_cd·(1 − max(0; 1 − max(0; ε_{f,m})/ε_cy)^n_σ)", Unit: "MPa", Digits: 6,
	Examples: append(hand("15 MPa", "f_cd = 20 MPa", "ε_{f,m} = 1 ‰", "ε_cy = 2 ‰", "n_σ = 2"), append(hand("20 MPa", "f_cd = 20 MPa", "ε_{f,m} = 3 ‰", "ε_cy = 2 ‰", "n_σ = 2"),
		append(hand("0 MPa", "f_cd = 20 MPa", "ε_{f,m} = -1 ‰", "ε_cy = 2 ‰", "n_σ = 2"), hand("8 MPa", "f_cd = 20 MPa", "ε_{f,m} = 0.7 ‰", "ε_cy = 1.75 ‰", "n_σ = 1")...)...)...)})

// FibreForce and FibreForceDepth are the resultant of the fibres.
var (
	FibreForce = clause.Define(&clause.Formula{ID: "fibre-force", Name: "Force of the concrete", Ref: en("6.1(2)P", ""), Text: "F_c = Σ_m(A_{f,m}·σ_{f,m})", Unit: "kN", Digits: 7,
		Examples: hand("500 kN", "A_{f,m} = 10000 mm², 20000 mm²", "σ_{f,m} = 20 MPa, 15 MPa")})
	FibreForceDepth = clause.Define(&clause.Formula{ID: "fibre-force-depth", Name: "Depth of that force from the compressed edge", Ref: en("6.1(2)P", ""),
		Text: "d_c = Σ_m(A_{f,m}·σ_{f,m}·z_{f,m})/F_c", Unit: "mm", Digits: 6,
		Examples: hand("32 mm", "A_{f,m} = 10000 mm², 20000 mm²", "σ_{f,m} = 20 MPa, 15 MPa", "z_{f,m} = 20 mm, 40 mm", "F_c = 500 kN")})
)
