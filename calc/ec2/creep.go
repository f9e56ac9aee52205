package ec2

import "soffit/calc/clause"

// Creep, 3.1.4 and B.1. φ(t,t_0) counts from the strain at 28 days with the tangent modulus E_c = 1.05·E_cm, 3.1.4(2):
// creep strain is φ·σ_c/E_c. 5.46 and 7.20 put E_cm in its place, which makes creep greater by 5 %. RH is the relative
// humidity, h_0 = 2·A_c/u the notional size (for a topping, its own). t and t_0 are ages by the calendar; the age at loading
// that counts is t_{0,adj} (loading-age). Domain: 40 to 100 % humidity, −40 to +40 °C in use, f_ck of Table 3.1.

const (
	meanDomain = "20·[MPa] ≤ f_cm ≤ 98·[MPa]"
	airDomain  = "40·[%] ≤ RH ≤ 100·[%]"
	mc90       = "CEB-FIP Model Code 1990 Table 2.1.9"
)

// CreepStrength1 to CreepStrength3 are α_1, α_2, α_3: 1 up to 35 MPa, so that B.3a and B.3b, B.8a and B.8b are one.
var (
	CreepStrength1 = creepStrength("1", "0.7", "0.94406")
	CreepStrength2 = creepStrength("2", "0.2", "0.98369")
	CreepStrength3 = creepStrength("3", "0.5", "0.95971")
)

func creepStrength(number, exponent, want string) *clause.Formula {
	return clause.Define(&clause.Formula{
		ID: "creep-strength-" + number, Name: "Influence of the strength on creep, 1 up to 35 MPa", Ref: en("B.1(1)", "B.8c"),
		Text: "α_" + number + " = min(1; (35·[MPa]/f_cm)^" + exponent + ")", Domain: meanDomain,
		Examples: append(hand(want, "f_cm = 38 MPa"), append(hand("1", "f_cm = 35 MPa"), hand("1", "f_cm = 28 MPa")...)...),
	})
}

// CreepHumidity is φ_RH.
var CreepHumidity = clause.Define(&clause.Formula{
	ID: "creep-humidity", Name: "Influence of humidity and size on creep", Ref: en("B.1(1)", "B.3a, B.3b"),
	Text:   "φ_RH = (1 + (1 − RH/(100·[%]))/(0.1·(h_0/[mm])^(1/3))·α_1)·α_2",
	Domain: airDomain + " and h_0 > 0·[mm]",
	Examples: append(hand("1.3333", "RH = 80 %", "h_0 = 150 mm", "α_1 = 0.94406", "α_2 = 0.98369"),
		append(hand("1", "RH = 100 %", "h_0 = 150 mm", "α_1 = 1", "α_2 = 1"), hand("2.0", "RH = 50 %", "h_0 = 125 mm", "α_1 = 1", "α_2 = 1")...)...),
})

// CreepStrength is β(f_cm).
var CreepStrength = clause.Define(&clause.Formula{
	ID: "creep-strength", Name: "Influence of the strength on creep", Ref: en("B.1(1)", "B.4"),
	Text: "β(f_cm) = 16.8/sqrt(f_cm/[MPa])", Domain: meanDomain,
	Examples: append(hand("2.7253", "f_cm = 38 MPa"), hand("2.4", "f_cm = 49 MPa")...),
})

// CreepLoadingAge is β(t_0).
var CreepLoadingAge = clause.Define(&clause.Formula{
	ID: "creep-loading-age", Name: "Influence of the age at loading on creep", Ref: en("B.1(1)", "B.5"),
	Text: "β(t_0) = 1/(0.1 + (t_{0,adj}/[d])^0.20)", Domain: "t_{0,adj} ≥ 0.5·[d]",
	Examples: append(hand("0.48845", "t_{0,adj} = 28 d"), append(hand("0.90909", "t_{0,adj} = 1 d"), hand("0.47619", "t_{0,adj} = 32 d")...)...),
})

// CreepDelay is β_H.
var CreepDelay = clause.Define(&clause.Formula{
	ID: "creep-delay", Name: "Time that creep goes by, from humidity and size", Ref: en("B.1(1)", "B.8a, B.8b"),
	Text:     "β_H = min(1.5·(1 + (0.012·RH/[%])^18)·h_0/[mm] + 250·α_3; 1500·α_3)·[d]",
	Unit:     "d",
	Domain:   airDomain + " and h_0 > 0·[mm]",
	Examples: append(hand("572.84 d", "RH = 80 %", "h_0 = 150 mm", "α_3 = 0.959715"), hand("1439.6 d", "RH = 100 %", "h_0 = 1500 mm", "α_3 = 0.959715")...),
})

// CreepDevelopment is β_c(t,t_0).
var CreepDevelopment = clause.Define(&clause.Formula{
	ID: "creep-development", Name: "Part of creep that has come about", Ref: en("B.1(1)", "B.7"),
	Text: "β_c(t,t_0) = ((t − t_0)/(β_H + t − t_0))^0.3", Domain: "t ≥ t_0 > 0·[d]",
	Examples: append(hand("0.99336", "t = 25550 d", "t_0 = 28 d", "β_H = 572.84 d"), append(hand("0", "t = 28 d", "t_0 = 28 d", "β_H = 572.84 d"), hand("0.81225", "t = 528 d", "t_0 = 28 d", "β_H = 500 d")...)...),
})

// NotionalCreep is φ_0.
var NotionalCreep = clause.Define(&clause.Formula{
	ID: "notional-creep", Name: "Notional creep coefficient", Ref: en("B.1(1)", "B.2"),
	Text:     "φ_0 = φ_RH·β(f_cm)·β(t_0)",
	Examples: hand("1.7747", "φ_RH = 1.3332", "β(f_cm) = 2.7253", "β(t_0) = 0.48845"),
})

// CreepCoefficient is φ(t,t_0).
var CreepCoefficient = clause.Define(&clause.Formula{
	ID: "creep-coefficient", Name: "Creep coefficient", Ref: en("B.1(1)", "B.1"),
	Text: "φ(t,t_0) = φ_0·β_c(t,t_0)",
	Examples: append([]clause.Example{by(mc90+", 80 %, 150 mm, 28 d; φ_0 and β_c worked by hand, every α = 1", clause.Recalled, "1.8", "φ_0 = 1.8323", "β_c(t,t_0) = 0.99325")},
		hand("0", "φ_0 = 1.8638", "β_c(t,t_0) = 0")...),
})

// StressRatioAtLoading is k_σ of 3.1.4(4).
var StressRatioAtLoading = clause.Define(&clause.Formula{
	ID: "stress-ratio-at-loading", Name: "Compressive stress over the strength at loading, 0 in tension", Ref: en("3.1.4(4)", ""),
	Text:     "k_σ = max(0; σ_c)/f_ck(t_0)",
	Examples: append(hand("0.6", "σ_c = 21 MPa", "f_ck(t_0) = 35 MPa"), hand("0", "σ_c = -2 MPa", "f_ck(t_0) = 35 MPa")...),
})

// LinearCreep asks whether creep is proportional to the stress.
var LinearCreep = &clause.Condition{ID: "linear-creep", Name: "Creep in proportion to the stress", Ref: en("3.1.4(4), 5.10.2.2(5)", ""), Text: "k_σ ≤ 0.45",
	Yes: "not above 0.45·f_ck(t_0): creep is linear", No: "above 0.45·f_ck(t_0): creep is nonlinear"}

// NonlinearCreep is φ_nl(t,t_0). The standard writes it for t = ∞; the factor does not depend on t, and it is 1 where
// the stress is 0.45·f_ck(t_0) or less.
var NonlinearCreep = clause.Define(&clause.Formula{
	ID: "nonlinear-creep", Name: "Creep coefficient with nonlinear creep above 0.45·f_ck(t_0)", Ref: en("3.1.4(4)", "3.7"),
	Text: "φ_nl(t,t_0) = φ(t,t_0)·exp(1.5·max(0; k_σ − 0.45))", Domain: "0 ≤ k_σ ≤ 1",
	Examples: append(hand("2.5046", "φ(t,t_0) = 2", "k_σ = 0.6"), append(hand("2", "φ(t,t_0) = 2", "k_σ = 0.45"), hand("2", "φ(t,t_0) = 2", "k_σ = 0.1")...)...),
})

// TangentModulus is E_c, to which φ refers.
var TangentModulus = clause.Define(&clause.Formula{
	ID: "tangent-modulus", Name: "Tangent modulus of elasticity at 28 days, to which the creep coefficient refers", Ref: en("3.1.4(2)", ""),
	Text: "E_c = 1.05·E_cm", Unit: "GPa", Examples: hand("34.479 GPa", "E_cm = 32.837 GPa"),
})

// CreepStrain is ε_cc(t,t_0) of a constant stress, compression positive.
var CreepStrain = clause.Define(&clause.Formula{
	ID: "creep-strain", Name: "Creep strain under a constant stress, compression positive", Ref: en("3.1.4(3)", "3.6"),
	Text: "ε_cc(t,t_0) = φ(t,t_0)·σ_c/E_c", Unit: "‰", Examples: hand("0.58006 ‰", "φ(t,t_0) = 2", "σ_c = 10 MPa", "E_c = 34.479 GPa"),
})

// EffectiveModulus is E_c,eff. The standard writes it for t = ∞ and with E_cm.
var EffectiveModulus = clause.Define(&clause.Formula{
	ID: "effective-modulus", Name: "Effective modulus of elasticity with creep", Ref: en("7.4.3(5)", "7.20"),
	Text: "E_{c,eff} = E_cm/(1 + φ(t,t_0))", Unit: "GPa", Domain: "φ(t,t_0) ≥ 0",
	Examples: append(hand("12 GPa", "E_cm = 36 GPa", "φ(t,t_0) = 2"), hand("36 GPa", "E_cm = 36 GPa", "φ(t,t_0) = 0")...),
})
