package ec2

import "soffit/calc/clause"

// Concrete, 3.1: the analytical relations of Table 3.1 for 12 ≤ f_ck ≤ 90 MPa and the design strengths.

const (
	strengthDomain = "12·[MPa] ≤ f_ck ≤ 90·[MPa]"
	table31        = "EN 1992-1-1 Table 3.1"
)

// MeanStrength is f_cm.
var MeanStrength = clause.Define(&clause.Formula{
	ID: "mean-strength", Name: "Mean compressive strength at 28 days", Ref: en("3.1.3 Table 3.1", ""),
	Text: "f_cm = f_ck + 8·[MPa]", Unit: "MPa", Domain: strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "38 MPa", "f_ck = 30 MPa"), by(table31, clause.Recalled, "98 MPa", "f_ck = 90 MPa")},
})

// MeanTensileStrength is f_ctm, with the second relation above C50/60.
var MeanTensileStrength = clause.Define(&clause.Formula{
	ID: "mean-tensile-strength", Name: "Mean axial tensile strength", Ref: en("3.1.3 Table 3.1", ""),
	Text: "f_ctm = cases(f_ck ≤ 50·[MPa]: 0.30·(f_ck/[MPa])^(2/3)·[MPa]; otherwise: 2.12·ln(1 + f_cm/(10·[MPa]))·[MPa])",
	Unit: "MPa", Domain: strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "2.9 MPa", "f_ck = 30 MPa", "f_cm = 38 MPa"),
		by(table31, clause.Recalled, "4.1 MPa", "f_ck = 50 MPa", "f_cm = 58 MPa"),
		by(table31, clause.Recalled, "4.4 MPa", "f_ck = 60 MPa", "f_cm = 68 MPa"),
		by(table31, clause.Recalled, "5.0 MPa", "f_ck = 90 MPa", "f_cm = 98 MPa")},
})

// LowerTensileStrength is f_ctk,0.05.
var LowerTensileStrength = clause.Define(&clause.Formula{
	ID: "lower-tensile-strength", Name: "Axial tensile strength, 5 % fractile", Ref: en("3.1.3 Table 3.1", ""),
	Text: "f_{ctk,0.05} = 0.7·f_ctm", Unit: "MPa",
	Examples: []clause.Example{by(table31, clause.Recalled, "2.9 MPa", "f_ctm = 4.0716 MPa")},
})

// UpperTensileStrength is f_ctk,0.95.
var UpperTensileStrength = clause.Define(&clause.Formula{
	ID: "upper-tensile-strength", Name: "Axial tensile strength, 95 % fractile", Ref: en("3.1.3 Table 3.1", ""),
	Text: "f_{ctk,0.95} = 1.3·f_ctm", Unit: "MPa",
	Examples: []clause.Example{by(table31, clause.Recalled, "5.3 MPa", "f_ctm = 4.0716 MPa")},
})

// SecantModulus is E_cm with the factor for the aggregate of 3.1.3(2).
var SecantModulus = clause.Define(&clause.Formula{
	ID: "secant-modulus", Name: "Secant modulus of elasticity", Ref: en("3.1.3(2) Table 3.1", ""),
	Text: "E_cm = k_agg·22·(f_cm/(10·[MPa]))^0.3·[GPa]", Unit: "GPa",
	Examples: []clause.Example{by(table31, clause.Recalled, "37 GPa", "k_agg = 1", "f_cm = 58 MPa"),
		by(table31, clause.Recalled, "33 GPa", "k_agg = 1", "f_cm = 38 MPa")},
})

// PeakStrain is ε_c1.
var PeakStrain = clause.Define(&clause.Formula{
	ID: "peak-strain", Name: "Strain at peak stress, nonlinear analysis", Ref: en("3.1.5 Table 3.1", ""),
	Text: "ε_c1 = min(0.7·(f_cm/[MPa])^0.31; 2.8)·[‰]", Unit: "‰",
	Examples: []clause.Example{by(table31, clause.Recalled, "2.2 ‰", "f_cm = 38 MPa"), by(table31, clause.Recalled, "2.8 ‰", "f_cm = 98 MPa")},
})

// UltimateStrain1 is ε_cu1.
var UltimateStrain1 = clause.Define(&clause.Formula{
	ID: "ultimate-strain-nonlinear", Name: "Ultimate strain, nonlinear analysis", Ref: en("3.1.5 Table 3.1", ""),
	Text: "ε_cu1 = cases(f_ck ≤ 50·[MPa]: 3.5; otherwise: min(3.5; 2.8 + 27·((98·[MPa] − f_cm)/(100·[MPa]))^4))·[‰]", Unit: "‰",
	Domain:   strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "3.2 ‰", "f_ck = 55 MPa", "f_cm = 63 MPa"), by(table31, clause.Recalled, "3.5 ‰", "f_ck = 30 MPa", "f_cm = 38 MPa")},
})

// ParabolaStrain is ε_c2.
var ParabolaStrain = clause.Define(&clause.Formula{
	ID: "parabola-strain", Name: "Strain at the end of the parabola", Ref: en("3.1.7(1) Table 3.1", ""),
	Text: "ε_c2 = cases(f_ck ≤ 50·[MPa]: 2.0; otherwise: min(2.6; 2.0 + 0.085·(f_ck/[MPa] − 50)^0.53))·[‰]", Unit: "‰",
	Domain:   strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "2.3 ‰", "f_ck = 60 MPa"), by(table31, clause.Recalled, "2.0 ‰", "f_ck = 30 MPa"), by(table31, clause.Recalled, "2.6000 ‰", "f_ck = 90 MPa")},
})

// UltimateStrain2 is ε_cu2.
var UltimateStrain2 = clause.Define(&clause.Formula{
	ID: "ultimate-strain-parabola", Name: "Ultimate strain, parabola–rectangle", Ref: en("3.1.7(1) Table 3.1", ""),
	Text: "ε_cu2 = cases(f_ck ≤ 50·[MPa]: 3.5; otherwise: min(3.5; 2.6 + 35·((90·[MPa] − f_ck)/(100·[MPa]))^4))·[‰]", Unit: "‰",
	Domain:   strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "2.9 ‰", "f_ck = 60 MPa"), by(table31, clause.Recalled, "2.6 ‰", "f_ck = 90 MPa")},
})

// ParabolaExponent is n.
var ParabolaExponent = clause.Define(&clause.Formula{
	ID: "parabola-exponent", Name: "Exponent of the parabola", Ref: en("3.1.7(1) Table 3.1", ""),
	Text: "n = cases(f_ck ≤ 50·[MPa]: 2.0; otherwise: min(2.0; 1.4 + 23.4·((90·[MPa] − f_ck)/(100·[MPa]))^4))", Unit: "", Digits: 4,
	Domain:   strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "1.6", "f_ck = 60 MPa"), by(table31, clause.Recalled, "1.4", "f_ck = 90 MPa")},
})

// BilinearStrain is ε_c3.
var BilinearStrain = clause.Define(&clause.Formula{
	ID: "bilinear-strain", Name: "Strain at the end of the first branch, bilinear law", Ref: en("3.1.7(2) Table 3.1", ""),
	Text: "ε_c3 = cases(f_ck ≤ 50·[MPa]: 1.75; otherwise: 1.75 + 0.55·(f_ck − 50·[MPa])/(40·[MPa]))·[‰]", Unit: "‰",
	Domain:   strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "1.9 ‰", "f_ck = 60 MPa"), by(table31, clause.Recalled, "2.3 ‰", "f_ck = 90 MPa")},
})

// UltimateStrain3 is ε_cu3.
var UltimateStrain3 = clause.Define(&clause.Formula{
	ID: "ultimate-strain", Name: "Ultimate strain, rectangular block", Ref: en("3.1.7(3) Table 3.1", ""),
	Text: "ε_cu3 = cases(f_ck ≤ 50·[MPa]: 3.5; otherwise: min(3.5; 2.6 + 35·((90·[MPa] − f_ck)/(100·[MPa]))^4))·[‰]", Unit: "‰",
	Domain:   strengthDomain,
	Examples: []clause.Example{by(table31, clause.Recalled, "3.1 ‰", "f_ck = 55 MPa"), by(table31, clause.Recalled, "3.5 ‰", "f_ck = 40 MPa")},
})

// BlockDepthFactor is λ.
var BlockDepthFactor = clause.Define(&clause.Formula{
	ID: "block-depth-factor", Name: "Depth factor of the rectangular block", Ref: en("3.1.7(3)", "3.19, 3.20"),
	Text: "λ = cases(f_ck ≤ 50·[MPa]: 0.8; otherwise: 0.8 − (f_ck − 50·[MPa])/(400·[MPa]))", Unit: "", Digits: 3, Domain: strengthDomain,
	Examples: append(hand("0.8", "f_ck = 50 MPa"), hand("0.7", "f_ck = 90 MPa")...),
})

// BlockStressFactor is η.
var BlockStressFactor = clause.Define(&clause.Formula{
	ID: "block-stress-factor", Name: "Stress factor of the rectangular block", Ref: en("3.1.7(3)", "3.21, 3.22"),
	Text: "η = cases(f_ck ≤ 50·[MPa]: 1.0; otherwise: 1.0 − (f_ck − 50·[MPa])/(200·[MPa]))", Unit: "", Digits: 3, Domain: strengthDomain,
	Examples: append(hand("1.0", "f_ck = 50 MPa"), hand("0.8", "f_ck = 90 MPa")...),
})

// DesignStrength is f_cd.
var DesignStrength = clause.Define(&clause.Formula{
	ID: "design-strength", Name: "Design compressive strength of the concrete", Ref: en("3.1.6(1)P", "3.15"),
	Text: "f_cd = α_cc·f_ck/γ_C", Unit: "MPa",
	Examples: hand("33.333 MPa", "α_cc = 1.0", "f_ck = 50 MPa", "γ_C = 1.5"),
})

// MeanStrengthAtRelease is f_cm(t) from the strength asked for at release.
var MeanStrengthAtRelease = clause.Define(&clause.Formula{
	ID: "mean-strength-at-release", Name: "Mean compressive strength at release", Ref: en("3.1.2(5)", ""),
	Text: "f_cm(t) = f_ck(t) + 8·[MPa]", Unit: "MPa",
	Examples: hand("43 MPa", "f_ck(t) = 35 MPa"),
})

// MeanTensileStrengthAtRelease is f_ctm(t), before 28 days (α = 1).
var MeanTensileStrengthAtRelease = clause.Define(&clause.Formula{
	ID: "mean-tensile-strength-at-release", Name: "Mean tensile strength at release, before 28 days (exponent α = 1)", Ref: en("3.1.2(9)", "3.4"),
	Text: "f_ctm(t) = f_cm(t)/f_cm·f_ctm", Unit: "MPa",
	Examples: hand("3.0186 MPa", "f_cm(t) = 43 MPa", "f_cm = 58 MPa", "f_ctm = 4.0716 MPa"),
})
