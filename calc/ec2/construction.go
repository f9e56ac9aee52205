package ec2

import "soffit/calc/clause"

// The situation while the member is built: it carries its weight, the fresh topping, what else is there already and the
// construction loads on its bare section. Only the self-weight is sure to be there where it helps.

// ConstructionFactor is ψ of a load while the member is built.
var ConstructionFactor = clause.Define(&clause.Formula{
	ID: "construction-factor", Name: "Combination factor of each load while the member is built: 1 where its action leads", Ref: en1990("6.4.3.2(3)", ""),
	Text: "ψ_{i,n} = cases(l_{i,n} = 1: 1; k_{c,i} = 1: ψ_{0,con}; otherwise: ψ_{0,i})", Unit: "", Digits: 3,
	Examples: append(hand("1", "l_{i,n} = 1", "k_{c,i} = 1", "ψ_{0,con} = 0.8", "ψ_{0,i} = 0"),
		append(hand("0.8", "l_{i,n} = 0", "k_{c,i} = 1", "ψ_{0,con} = 0.8", "ψ_{0,i} = 0"), hand("0.5", "l_{i,n} = 0", "k_{c,i} = 0", "ψ_{0,con} = 0.8", "ψ_{0,i} = 0.5")...)...),
})

// ConstructionUpperFactor is the factor of a load on the bare member where it is unfavourable.
var ConstructionUpperFactor = clause.Define(&clause.Formula{
	ID: "construction-upper-factor", Name: "Factor while the member is built where the load is unfavourable", Ref: en1990("6.4.3.2, Table A1.2(B)", "6.10"),
	Text: "γ_{u,b,i,n} = k_{b,i}·K_FI·cases(k_{G,i} = 1: γ_{G,sup}; otherwise: γ_Q·ψ_{i,n})", Unit: "",
	Examples: append(hand("1.35", "k_{b,i} = 1", "K_FI = 1.0", "k_{G,i} = 1", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0"),
		hand("0", "k_{b,i} = 0", "K_FI = 1.0", "k_{G,i} = 1", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0")...),
})

// ConstructionUpperFactorWithTopping has the fresh topping as a construction load, which EN 1991-1-6 makes it.
var ConstructionUpperFactorWithTopping = clause.Define(&clause.Formula{
	ID: "construction-upper-factor-with-topping", Name: "Factor while the member is built where the load is unfavourable; the fresh topping as a construction load and 1 kN/m³ heavier than when it is hard (EN 1991-1-1 Table A.1)", Ref: en1991("4.11.2", ""),
	Text: "γ_{u,b,i,n} = k_{b,i}·K_FI·cases(w_{t,i} = 1: max(γ_{G,sup}; γ_Q)·(1 + 1·[kN/m³]/γ_{conc,t}); k_{G,i} = 1: γ_{G,sup}; otherwise: γ_Q·ψ_{i,n})", Unit: "",
	Examples: append(hand("1.56", "k_{b,i} = 1", "K_FI = 1.0", "w_{t,i} = 1", "k_{G,i} = 1", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0", "γ_{conc,t} = 25 kN/m³"),
		hand("1.485", "k_{b,i} = 1", "K_FI = 1.1", "w_{t,i} = 0", "k_{G,i} = 1", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0", "γ_{conc,t} = 25 kN/m³")...),
})

// ConstructionLowerFactor is the factor of a load where it is favourable.
var ConstructionLowerFactor = clause.Define(&clause.Formula{
	ID: "construction-lower-factor", Name: "Factor while the member is built where the load is favourable: only the self-weight is sure to be there", Ref: en1990("6.4.3.2(3), Table A1.2(B)", ""),
	Text: "γ_{f,b,i} = w_i·γ_{G,inf}", Unit: "",
	Examples: append(hand("1", "w_i = 1", "γ_{G,inf} = 1"), hand("0", "w_i = 0", "γ_{G,inf} = 1")...),
})

func construction(id, name, symbol, op, effect string) *clause.Formula {
	u := unitOf(effect)
	want := "135 " + u // 1.35·100 + 0
	if op == "min" {
		want = "70 " + u // 1.0·100 − 1.5·20
	}
	return clause.Define(&clause.Formula{
		ID: "construction-" + id, Name: name, Ref: en1990("6.4.3.2(3)", ""),
		Text: symbol + " = Σ_i(" + op + "(γ_{u,b,i,n}·" + effect + "; γ_{f,b,i}·" + effect + "))", Unit: u, Digits: 6,
		Examples: hand(want, "γ_{u,b,i,n} = 1.35, 1.5", effect+" = 100 "+u+", -20 "+u, "γ_{f,b,i} = 1, 0"),
	})
}

// Effects of each combination while the member is built, largest and least.
var (
	ConstructionMoment        = construction("moment-each", "Largest moment on the bare member of each combination", "M_{Ed,b,n}", "max", "M_i")
	ConstructionMomentMin     = construction("moment-each-least", "Least moment on the bare member of each combination", "M_{Ed,b,min,n}", "min", "M_i")
	ConstructionShearLeft     = construction("shear-left-each", "Largest shear force on the bare member of each combination, left of the station", "V_{Ed,b,l,n}", "max", "V_{l,i}")
	ConstructionShearRight    = construction("shear-right-each", "Largest shear force on the bare member of each combination, right of the station", "V_{Ed,b,r,n}", "max", "V_{r,i}")
	ConstructionShearLeftMin  = construction("shear-left-each-least", "Least shear force on the bare member of each combination, left of the station", "V_{Ed,b,l,min,n}", "min", "V_{l,i}")
	ConstructionShearRightMin = construction("shear-right-each-least", "Least shear force on the bare member of each combination, right of the station", "V_{Ed,b,r,min,n}", "min", "V_{r,i}")
	ConstructionAxial         = construction("axial-each", "Greatest axial force on the bare member of each combination", "N_{Ed,b,n}", "max", "N_i")
	ConstructionAxialMin      = construction("axial-each-least", "Least axial force on the bare member of each combination", "N_{Ed,b,min,n}", "min", "N_i")
)

// Envelopes over the combinations while the member is built.
var (
	ConstructionMomentEnvelope        = envelope("construction-moment", "Largest moment on the bare member", "M_{Ed,b}", "max", "M_{Ed,b,n}", "kN·m")
	ConstructionMomentEnvelopeMin     = envelope("construction-moment-least", "Least moment on the bare member", "M_{Ed,b,min}", "min", "M_{Ed,b,min,n}", "kN·m")
	ConstructionShearLeftEnvelope     = envelope("construction-shear-left", "Largest shear force on the bare member left of the station", "V_{Ed,b,l}", "max", "V_{Ed,b,l,n}", "kN")
	ConstructionShearRightEnvelope    = envelope("construction-shear-right", "Largest shear force on the bare member right of the station", "V_{Ed,b,r}", "max", "V_{Ed,b,r,n}", "kN")
	ConstructionShearLeftEnvelopeMin  = envelope("construction-shear-left-least", "Least shear force on the bare member left of the station", "V_{Ed,b,l,min}", "min", "V_{Ed,b,l,min,n}", "kN")
	ConstructionShearRightEnvelopeMin = envelope("construction-shear-right-least", "Least shear force on the bare member right of the station", "V_{Ed,b,r,min}", "min", "V_{Ed,b,r,min,n}", "kN")
	ConstructionAxialEnvelope         = envelope("construction-axial", "Greatest axial force on the bare member, compression positive", "N_{Ed,b}", "max", "N_{Ed,b,n}", "kN")
	ConstructionAxialEnvelopeMin      = envelope("construction-axial-least", "Least axial force on the bare member", "N_{Ed,b,min}", "min", "N_{Ed,b,min,n}", "kN")
)
