package ec2

import (
	"strings"

	"soffit/calc/clause"
)

// Combinations of actions, EN 1990 6.4.3, 6.5.3 and A1. Load i is permanent (k_{G,i} = 1) or variable (k_{G,i} = 0); each
// load counts with its upper factor where that is unfavourable and with its lower one where it is favourable,
// station by station. Combination n has the leading variable action marked by l_{i,n} = 1.

// CombinationFactor is ψ of a load in an ultimate or characteristic combination.
var CombinationFactor = clause.Define(&clause.Formula{
	ID: "combination-factor", Name: "Combination factor of each load: 1 where its action leads, ψ₀ where it does not", Ref: en1990("6.4.3.2(3)", ""),
	Text: "ψ_{i,n} = cases(l_{i,n} = 1: 1; otherwise: ψ_{0,i})", Unit: "", Digits: 3,
	Examples: []clause.Example{by("EN 1990 Table A1.1, category A", clause.Recalled, "0.7", "l_{i,n} = 0", "ψ_{0,i} = 0.7")},
})

// CharacteristicFactor is ψ of a load in a characteristic combination.
var CharacteristicFactor = clause.Define(&clause.Formula{
	ID: "characteristic-factor", Name: "Factor of each load: 1 where its action leads, ψ₀ where it does not", Ref: en1990("6.5.3(2)a", "6.14b"),
	Text: "ψ_{i,n} = cases(l_{i,n} = 1: 1; otherwise: ψ_{0,i})", Unit: "", Digits: 3,
	Examples: []clause.Example{by("EN 1990 Table A1.1, snow up to 1000 m", clause.Recalled, "0.5", "l_{i,n} = 0", "ψ_{0,i} = 0.5")},
})

// FrequentFactor is ψ of a load in a frequent combination.
var FrequentFactor = clause.Define(&clause.Formula{
	ID: "frequent-factor", Name: "Factor of each load: ψ₁ where its action leads, ψ₂ where it does not", Ref: en1990("6.5.3(2)b", "6.15b"),
	Text: "ψ_{i,n} = cases(l_{i,n} = 1: ψ_{1,i}; otherwise: ψ_{2,i})", Unit: "", Digits: 3,
	Examples: []clause.Example{by("EN 1990 Table A1.1, category A", clause.Recalled, "0.5", "l_{i,n} = 1", "ψ_{1,i} = 0.5", "ψ_{2,i} = 0.3")},
})

// PermanentReduction is ξ where 6.10b reduces the permanent actions.
var PermanentReduction = clause.Define(&clause.Formula{
	ID: "permanent-reduction", Name: "Reduction of the permanent actions in 6.10b", Ref: en1990("6.4.3.2", "6.10b"),
	Text: "ξ_{G,n} = cases(k_{r,n} = 1: ξ; otherwise: 1)", Unit: "", Digits: 3,
	Examples: hand("0.85", "k_{r,n} = 1", "ξ = 0.85"),
})

// UpperFactor is the factor of a load where it is unfavourable, by 6.10.
var UpperFactor = clause.Define(&clause.Formula{
	ID: "upper-factor", Name: "Factor where the load is unfavourable", Ref: en1990("6.4.3.2, Tables A1.2(B) and B3", "6.10"),
	Text: "γ_{u,i,n} = K_FI·cases(k_{G,i} = 1: γ_{G,sup}; otherwise: γ_Q·ψ_{i,n})", Unit: "",
	Examples: append(hand("1.35", "K_FI = 1.0", "k_{G,i} = 1", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0"),
		hand("1.155", "K_FI = 1.1", "k_{G,i} = 0", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0.7")...),
})

// UpperFactorReduced is the factor of a load where it is unfavourable, by 6.10a or 6.10b.
var UpperFactorReduced = clause.Define(&clause.Formula{
	ID: "upper-factor-reduced", Name: "Factor where the load is unfavourable", Ref: en1990("6.4.3.2, Tables A1.2(B) and B3", "6.10a, 6.10b"),
	Text: "γ_{u,i,n} = K_FI·cases(k_{G,i} = 1: ξ_{G,n}·γ_{G,sup}; otherwise: γ_Q·ψ_{i,n})", Unit: "",
	Examples: hand("1.1475", "K_FI = 1.0", "k_{G,i} = 1", "ξ_{G,n} = 0.85", "γ_{G,sup} = 1.35", "γ_Q = 1.5", "ψ_{i,n} = 0"),
})

// LowerFactor is the factor of a load where it is favourable.
var LowerFactor = clause.Define(&clause.Formula{
	ID: "lower-factor", Name: "Factor where the load is favourable", Ref: en1990("6.4.3.2(3), Table A1.2(B)", ""),
	Text: "γ_{f,i} = cases(k_{G,i} = 1: γ_{G,inf}; otherwise: 0)", Unit: "",
	Examples: hand("0", "k_{G,i} = 0", "γ_{G,inf} = 1"),
})

func ultimate(id, name, symbol, op, effect string) *clause.Formula {
	return clause.Define(&clause.Formula{
		ID: id, Name: name, Ref: en1990("6.4.3.2(3)", ""),
		Text: symbol + " = Σ_i(" + op + "(γ_{u,i,n}·" + effect + "; γ_{f,i}·" + effect + "))",
		Unit: unitOf(effect), Digits: 6, Examples: factorExample(op, effect),
	})
}

func unitOf(effect string) string {
	if effect == "M_i" {
		return "kN·m"
	}
	return "kN"
}

// factorExample adds a permanent load of 100 and a variable one of −20 in units of the effect.
func factorExample(op, effect string) []clause.Example {
	u := unitOf(effect)
	want := "135 " + u // 1.35·100 + 0
	if op == "min" {
		want = "70 " + u // 1.0·100 − 1.5·20
	}
	return hand(want, "γ_{u,i,n} = 1.35, 1.5", effect+" = 100 "+u+", -20 "+u, "γ_{f,i} = 1, 0")
}

// Ultimate effects of each combination, largest and smallest.
var (
	UltimateMoment        = ultimate("ultimate-moment", "Largest moment of each combination", "M_{Ed,n}", "max", "M_i")
	UltimateMomentMin     = ultimate("ultimate-moment-least", "Least moment of each combination", "M_{Ed,min,n}", "min", "M_i")
	UltimateShearLeft     = ultimate("ultimate-shear-left", "Largest shear force of each combination, left of the station", "V_{Ed,l,n}", "max", "V_{l,i}")
	UltimateShearRight    = ultimate("ultimate-shear-right", "Largest shear force of each combination, right of the station", "V_{Ed,r,n}", "max", "V_{r,i}")
	UltimateShearLeftMin  = ultimate("ultimate-shear-left-least", "Least shear force of each combination, left of the station", "V_{Ed,l,min,n}", "min", "V_{l,i}")
	UltimateShearRightMin = ultimate("ultimate-shear-right-least", "Least shear force of each combination, right of the station", "V_{Ed,r,min,n}", "min", "V_{r,i}")
)

func envelope(id, name, symbol, op, of, unit string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Ref: clause.Ref{}, Text: symbol + " = " + op + "_n(" + of + ")", Unit: unit, Digits: 6,
		Examples: envelopeExample(op, of, unit)})
}

func envelopeExample(op, of, unit string) []clause.Example {
	want := "30 " + unit
	if op == "min" {
		want = "-10 " + unit
	}
	return hand(want, of+" = 20 "+unit+", 30 "+unit+", -10 "+unit)
}

// Envelopes over the combinations.
var (
	MomentEnvelope        = envelope("moment", "Largest moment at the station", "M_Ed", "max", "M_{Ed,n}", "kN·m")
	MomentEnvelopeMin     = envelope("moment-least", "Least moment at the station", "M_{Ed,min}", "min", "M_{Ed,min,n}", "kN·m")
	ShearLeftEnvelope     = envelope("shear-left", "Largest shear force left of the station", "V_{Ed,l}", "max", "V_{Ed,l,n}", "kN")
	ShearRightEnvelope    = envelope("shear-right", "Largest shear force right of the station", "V_{Ed,r}", "max", "V_{Ed,r,n}", "kN")
	ShearLeftEnvelopeMin  = envelope("shear-left-least", "Least shear force left of the station", "V_{Ed,l,min}", "min", "V_{Ed,l,min,n}", "kN")
	ShearRightEnvelopeMin = envelope("shear-right-least", "Least shear force right of the station", "V_{Ed,r,min}", "min", "V_{Ed,r,min,n}", "kN")
)

func service(id, name, sub string, ref clause.Ref) (moment, largest *clause.Formula) {
	moment = clause.Define(&clause.Formula{
		ID: id + "-moment", Name: name + ", each combination", Ref: ref,
		Text: "M_{" + sub + ",n} = Σ_i(max((k_{G,i} + (1 − k_{G,i})·ψ_{i,n})·M_i; k_{G,i}·M_i))", Unit: "kN·m", Digits: 6,
		Examples: hand("114 kN·m", "k_{G,i} = 1, 0", "ψ_{i,n} = 0, 0.7", "M_i = 100 kN·m, 20 kN·m"),
	})
	largest = envelope(id, name, "M_{"+sub+"}", "max", "M_{"+sub+",n}", "kN·m")
	return moment, largest
}

// Service moments: characteristic and frequent.
var (
	CharacteristicMoment, CharacteristicEnvelope = service("characteristic", "Largest moment, characteristic", "char", en1990("6.5.3(2)a", "6.14b"))
	FrequentMoment, FrequentEnvelope             = service("frequent", "Largest moment, frequent", "freq", en1990("6.5.3(2)b", "6.15b"))
)

// QuasiPermanentMoment is the largest quasi-permanent moment, where no action leads.
var QuasiPermanentMoment = clause.Define(&clause.Formula{
	ID: "quasi-permanent", Name: "Largest moment, quasi-permanent", Ref: en1990("6.5.3(2)c", "6.16b"),
	Text: "M_qp = Σ_i(max((k_{G,i} + (1 − k_{G,i})·ψ_{2,i})·M_i; k_{G,i}·M_i))", Unit: "kN·m", Digits: 6,
	Examples: hand("106 kN·m", "k_{G,i} = 1, 0", "ψ_{2,i} = 0, 0.3", "M_i = 100 kN·m, 20 kN·m"),
})

// The least service moments, of a member that hogs.
var (
	CharacteristicMomentMin, CharacteristicEnvelopeMin = serviceLeast("characteristic", "Least moment, characteristic", "char", en1990("6.5.3(2)a", "6.14b"))
	FrequentMomentMin, FrequentEnvelopeMin             = serviceLeast("frequent", "Least moment, frequent", "freq", en1990("6.5.3(2)b", "6.15b"))
	QuasiPermanentMomentMin                            = clause.Define(&clause.Formula{
		ID: "quasi-permanent-least", Name: "Least moment, quasi-permanent", Ref: en1990("6.5.3(2)c", "6.16b"),
		Text: "M_{qp,min} = Σ_i(min((k_{G,i} + (1 − k_{G,i})·ψ_{2,i})·M_i; k_{G,i}·M_i))", Unit: "kN·m", Digits: 6,
		Examples: hand("94 kN·m", "k_{G,i} = 1, 0", "ψ_{2,i} = 0, 0.3", "M_i = 100 kN·m, -20 kN·m"),
	})
)

func serviceLeast(id, name, sub string, ref clause.Ref) (moment, least *clause.Formula) {
	moment = clause.Define(&clause.Formula{
		ID: id + "-moment-least", Name: name + ", each combination", Ref: ref,
		Text: "M_{" + sub + ",min,n} = Σ_i(min((k_{G,i} + (1 − k_{G,i})·ψ_{i,n})·M_i; k_{G,i}·M_i))", Unit: "kN·m", Digits: 6,
		Examples: hand("86 kN·m", "k_{G,i} = 1, 0", "ψ_{i,n} = 0, 0.7", "M_i = 100 kN·m, -20 kN·m"),
	})
	least = envelope(id+"-least", name, "M_{"+sub+",min}", "min", "M_{"+sub+",min,n}", "kN·m")
	return moment, least
}

// Reactions are the reactions at a bearing, upward positive: the largest and the least of each combination, and over the
// combinations.
type Reactions struct {
	Each, EachLeast, Largest, Least *clause.Formula
}

func ultimateReactions(bearing, name string) Reactions {
	id, symbol, effect := "-reaction-"+strings.ToLower(bearing), "R_{"+bearing+",Ed", "R_{"+bearing+",i}"
	return Reactions{
		ultimate("ultimate"+id, "Largest reaction at "+name+" of each combination", symbol+",n}", "max", effect),
		ultimate("ultimate"+id+"-least", "Least reaction at "+name+" of each combination", symbol+",min,n}", "min", effect),
		envelope("design"+id, "Largest reaction at "+name+", ultimate limit state", symbol+"}", "max", symbol+",n}", "kN"),
		envelope("design"+id+"-least", "Least reaction at "+name+", ultimate limit state", symbol+",min}", "min", symbol+",min,n}", "kN"),
	}
}

func characteristicReactions(bearing, name string) Reactions {
	id, symbol, effect := "-reaction-"+strings.ToLower(bearing), "R_{"+bearing+",k", "R_{"+bearing+",i}"
	each := func(id, name, symbol, op, want string) *clause.Formula {
		return clause.Define(&clause.Formula{
			ID: id, Name: name, Ref: en1990("6.5.3(2)a", "6.14b"),
			Text: symbol + " = Σ_i(" + op + "((k_{G,i} + (1 − k_{G,i})·ψ_{i,n})·" + effect + "; k_{G,i}·" + effect + "))", Unit: "kN", Digits: 6,
			Examples: hand(want, "k_{G,i} = 1, 0, 0", "ψ_{i,n} = 0, 0.7, 1", effect+" = 100 kN, 20 kN, -30 kN"),
		})
	}
	return Reactions{
		each("characteristic"+id, "Largest reaction at "+name+", characteristic, each combination", symbol+",n}", "max", "114 kN"),
		each("characteristic"+id+"-least", "Least reaction at "+name+", characteristic, each combination", symbol+",min,n}", "min", "70 kN"),
		envelope("service"+id, "Largest reaction at "+name+", characteristic", symbol+"}", "max", symbol+",n}", "kN"),
		envelope("service"+id+"-least", "Least reaction at "+name+", characteristic", symbol+",min}", "min", symbol+",min,n}", "kN"),
	}
}

// Reactions at bearings A and B, at the ultimate limit state and in the characteristic combination.
var (
	UltimateReactions       = []Reactions{ultimateReactions("A", "bearing A"), ultimateReactions("B", "bearing B")}
	CharacteristicReactions = []Reactions{characteristicReactions("A", "bearing A"), characteristicReactions("B", "bearing B")}
)

// Axial force, compression positive: the same at every station.
var (
	UltimateAxial    = ultimate("ultimate-axial", "Greatest axial force of each combination, compression positive", "N_{Ed,n}", "max", "N_i")
	UltimateAxialMin = ultimate("ultimate-axial-least", "Least axial force of each combination", "N_{Ed,min,n}", "min", "N_i")
	AxialEnvelope    = envelope("axial", "Greatest axial force, compression positive", "N_{Ed,max}", "max", "N_{Ed,n}", "kN")
	AxialEnvelopeMin = envelope("axial-least", "Least axial force", "N_{Ed,min}", "min", "N_{Ed,min,n}", "kN")
)

// The axial force beside which the section is asked for its resistance: in use, and of a member without topping also while it
// is built; and that on the bare member of one with a topping.
var (
	GreatestAxial      = besideAxial("greatest-axial", "Axial force, the greatest of the combinations, compression positive", "N_{Ed,max}", "162 kN", "N_{Ed,max} = 162 kN")
	LeastAxial         = besideAxial("least-axial", "Axial force, the least of the combinations, compression positive", "N_{Ed,min}", "-45 kN", "N_{Ed,min} = -45 kN")
	GreatestAxialBuilt = besideAxial("greatest-axial-built", "Axial force, the greatest of the combinations in use and while the member is built, compression positive", "max(N_{Ed,max}; N_{Ed,b})", "180 kN", "N_{Ed,max} = 162 kN", "N_{Ed,b} = 180 kN")
	LeastAxialBuilt    = besideAxial("least-axial-built", "Axial force, the least of the combinations in use and while the member is built, compression positive", "min(N_{Ed,min}; N_{Ed,b,min})", "-60 kN", "N_{Ed,min} = 45 kN", "N_{Ed,b,min} = -60 kN")
	GreatestAxialBare  = besideAxial("greatest-axial-bare", "Axial force on the bare member, the greatest of the combinations, compression positive", "N_{Ed,b}", "162 kN", "N_{Ed,b} = 162 kN")
	LeastAxialBare     = besideAxial("least-axial-bare", "Axial force on the bare member, the least of the combinations, compression positive", "N_{Ed,b,min}", "-45 kN", "N_{Ed,b,min} = -45 kN")
)

func besideAxial(id, name, from, want string, given ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Text: "N_Ed = " + from, Unit: "kN", Digits: 6, Examples: hand(want, given...)})
}
