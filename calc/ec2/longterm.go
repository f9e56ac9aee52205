package ec2

import "soffit/calc/clause"

// Losses of one row of tendons beside friction: elastic shortening, 5.10.4 and 5.10.5.1, and creep, shrinkage and relaxation
// together, 5.10.6; and the limits of the stresses that follow, 5.10.2.2 and 7.2. Losses are positive; stress of the concrete
// is compression positive; row i is a row of tendons, n a step of loading or of stressing.

const linBurns = "Lin & Burns, Design of Prestressed Concrete Structures, Ex. 4-1, 4-2: 15 × 15 in, 1.2 in², 150 ksi, n = 6; "

// ElasticShortening is the loss of a pretensioned row at release. σ_c,i is the stress of the concrete beside the row under
// the force at release and what acts at once. With the force before release on the transformed section it is exact; with the
// force after release on the concrete section it is exact too, and with the force before release on the concrete section
// an approximation, too large.
var ElasticShortening = clause.Define(&clause.Formula{
	ID: "elastic-shortening", Name: "Loss by elastic shortening at release", Ref: en("5.10.4(1)", ""),
	Text: "Δσ_{el,i} = E_{p,i}/E_cm(t_0)·σ_{c,i}", Unit: "MPa",
	Examples: append([]clause.Example{
		{Source: linBurns + "on the transformed section 4.675 ksi: 180 kip on 231 in²", Grade: clause.Recalled, Want: "32.233 MPa", Tolerance: 0.0035, Given: []string{"E_{p,i} = 30 GPa", "E_cm(t_0) = 5 GPa", "σ_{c,i} = 5.37256 MPa"}},
		by(linBurns+"approximate 4.8 ksi: 180 kip on 225 in²", clause.Recalled, "33.09 MPa", "E_{p,i} = 30 GPa", "E_cm(t_0) = 5 GPa", "σ_{c,i} = 5.51581 MPa"),
	}, hand("65 MPa, 32.5 MPa", "E_{p,i} = 195 GPa, 195 GPa", "E_cm(t_0) = 30 GPa", "σ_{c,i} = 10 MPa, 5 MPa")...),
})

// StressingMean is j of 5.44 for the prestress of n_P equal tendons stressed one after another, on the mean; a permanent
// action after stressing has j = 1.
var StressingMean = clause.Define(&clause.Formula{
	ID: "stressing-mean", Name: "Coefficient of tendons stressed one after another, on the mean", Ref: en("5.10.5.1(2)", "5.44"),
	Text: "j_P = (n_P − 1)/(2·n_P)", Domain: "n_P ≥ 1",
	Examples: append(hand("0.375", "n_P = 4"), hand("0", "n_P = 1")...),
})

// StressingOrder is the coefficient of one tendon: the part of the n_P tendons that are stressed after it. Its mean over the
// tendons is that of 5.44.
var StressingOrder = clause.Define(&clause.Formula{
	ID: "stressing-order", Name: "Coefficient of the row by its place in the order of stressing: the part of the tendons stressed after it", Ref: en("5.10.5.1(2)", ""),
	Text: "j_{P,i} = (n_P − o_{P,i})/n_P", Domain: "1 ≤ o_{P,i} ≤ n_P",
	Examples: hand("0.75, 0.5, 0.25, 0", "n_P = 4", "o_{P,i} = 1, 2, 3, 4"),
})

// Loss by elastic shortening of post-tensioned rows: by the mean coefficient over steps of stressing and loading (5.44 by
// the area), and by the order.
var (
	StressingShortening = clause.Define(&clause.Formula{
		ID: "stressing-shortening", Name: "Loss by elastic shortening in stressing, over the steps of stressing and loading", Ref: en("5.10.5.1(2)", "5.44"),
		Text: "Δσ_{el,i} = E_{p,i}·Σ_n(j_{P,n}·Δσ_{c,i,n}/E_{cm,n})", Unit: "MPa",
		Examples: []clause.Example{
			by(linBurns+"four equal tendons, mean 1.8 ksi", clause.Recalled, "12.41 MPa", "E_{p,i} = 30 GPa", "j_{P,n} = 0.375", "Δσ_{c,i,n} = 5.51581 MPa", "E_{cm,n} = 5 GPa"),
			by("worked by hand", clause.Own, "32.5 MPa", "E_{p,i} = 195 GPa", "j_{P,n} = 0.5, 1", "Δσ_{c,i,n} = 12 MPa, -1 MPa", "E_{cm,n} = 30 GPa, 30 GPa"),
		}})
	OrderedShortening = clause.Define(&clause.Formula{
		ID: "ordered-shortening", Name: "Loss by elastic shortening from the tendons stressed after the row", Ref: en("5.10.5.1(2)", ""),
		Text: "Δσ_{el,i} = E_{p,i}/E_cm(t_0)·j_{P,i}·Δσ_{c,i}", Unit: "MPa",
		Examples: []clause.Example{by(linBurns+"four equal tendons, 3.6, 2.4, 1.2, 0 ksi", clause.Recalled, "24.82 MPa, 16.55 MPa, 8.27 MPa, 0.00 MPa", "E_{p,i} = 30 GPa, 30 GPa, 30 GPa, 30 GPa", "E_cm(t_0) = 5 GPa",
			"j_{P,i} = 0.75, 0.5, 0.25, 0", "Δσ_{c,i} = 5.51581 MPa, 5.51581 MPa, 5.51581 MPa, 5.51581 MPa")}})
)

// CreepStress is what stands for φ·σ_c,QP where loads come at several ages: the sum over the steps, each with its own φ.
var CreepStress = clause.Define(&clause.Formula{
	ID: "creep-stress", Name: "Stress of the concrete beside each row times its creep coefficient, over the steps of loading", Ref: en("5.10.6(2)", ""),
	Text: "σ_{φ,i} = Σ_n(φ_{c,n}·Δσ_{c,i,n})", Unit: "MPa",
	Examples: hand("19.6 MPa", "φ_{c,n} = 2, 1.1", "Δσ_{c,i,n} = 12 MPa, -4 MPa"),
})

const handLongTerm = "worked by hand: (58.5 + 48 + 117)/(1 + 0.06175·2.44)"

// LongTermLoss is Δσ_p,c+s+r of one row as 5.46 stands; LongTermLossOfSteps has the steps of loading in the numerator and the
// creep of the first step in the denominator. The numerator is the row's own; the denominator is that of all rows, with A_p and
// z_cp of all of them and E_p their modulus, for they shorten together: exact for one row, else an approximation. No published value is known: hand derivation, limits and a time-step
// integration stand beside them. The limits are A_p → 0, where the three losses just add up with 0.8 of the relaxation, and
// no creep and no shrinkage, where nothing but that is left.
var (
	LongTermLoss = longTermLoss("long-term-loss", "Loss by creep, shrinkage and relaxation together", "φ(t,t_0)·σ_{c,QP,i}", []string{"φ(t,t_0) = 1.8", "σ_{c,QP,i} = 12 MPa"}, []string{"φ(t,t_0) = 0", "σ_{c,QP,i} = 12 MPa"})

	LongTermLossOfSteps = longTermLoss("long-term-loss-of-steps", "Loss by creep, shrinkage and relaxation together, over the steps of loading", "σ_{φ,i}", []string{"φ(t,t_0) = 1.8", "σ_{φ,i} = 21.6 MPa"}, []string{"φ(t,t_0) = 0", "σ_{φ,i} = 0 MPa"})
)

func longTermLoss(id, name, creep string, with, without []string) *clause.Formula {
	full := append([]string{"ε_cs(t,t_0) = 0.3 ‰", "E_{p,i} = 195 GPa", "Δσ_{pr,i} = 60 MPa", "E_cm = 36 GPa", "E_p = 195 GPa", "A_p = 2000 mm²", "A_c = 400000 mm²", "I_c = 50000 10⁶ mm⁴", "z_cp = 400 mm"}, with...)
	none := append([]string{"ε_cs(t,t_0) = 0 ‰", "E_{p,i} = 195 GPa", "Δσ_{pr,i} = 0 MPa", "E_cm = 36 GPa", "E_p = 195 GPa", "A_p = 2000 mm²", "A_c = 400000 mm²", "I_c = 50000 10⁶ mm⁴", "z_cp = 400 mm"}, without...)
	thin := append([]string{"ε_cs(t,t_0) = 0.3 ‰", "E_{p,i} = 195 GPa", "Δσ_{pr,i} = 60 MPa", "E_cm = 36 GPa", "E_p = 195 GPa", "A_p = 0 mm²", "A_c = 400000 mm²", "I_c = 50000 10⁶ mm⁴", "z_cp = 400 mm"}, with...)
	return clause.Define(&clause.Formula{
		ID: id, Name: name, Ref: en("5.10.6(2)", "5.46"),
		Text: "Δσ_{p,c+s+r,i} = (ε_cs(t,t_0)·E_{p,i} + 0.8·Δσ_{pr,i} + E_{p,i}/E_cm·" + creep + ")/(1 + E_p/E_cm·A_p/A_c·(1 + A_c/I_c·z_cp^2)·(1 + 0.8·φ(t,t_0)))", Unit: "MPa",
		Examples: []clause.Example{by(handLongTerm, clause.Own, "194.23 MPa", full...), by("nothing creeps, shrinks or relaxes", clause.Own, "0 MPa", none...), by("tendons without stiffness: 58.5 + 48 + 117", clause.Own, "223.5 MPa", thin...)},
	})
}

// Limits of the compression of the concrete, 5.10.2.2(5) and 7.2(2), (3), and of the tension of the steel, 7.2(5).
var (
	TransferLimit = stressLimit("transfer-stress-limit", "Greatest compression of the concrete when it is prestressed", en("5.10.2.2(5)", "5.42"), "σ_{c,lim}(t)", "0.6·f_ck(t)", "MPa", "21 MPa", "f_ck(t) = 35 MPa")
	// PretensionedTransferLimit stands only where tests or experience show that no longitudinal cracks form.
	PretensionedTransferLimit = stressLimit("transfer-stress-limit-pretensioned", "Greatest compression of the concrete at release of pretensioned tendons, longitudinal cracks being prevented as tests or experience show", en("5.10.2.2(5)", ""), "σ_{c,lim}(t)", "k_6·f_ck(t)", "MPa", "24.5 MPa", "k_6 = 0.7", "f_ck(t) = 35 MPa")
	CharacteristicLimit       = stressLimit("characteristic-stress-limit", "Greatest compression of the concrete, characteristic combination", en("7.2(2)", ""), "σ_{c,char,lim}", "k_{c1}·f_ck", "MPa", "30 MPa", "k_{c1} = 0.6", "f_ck = 50 MPa")
	QuasiPermanentLimit       = stressLimit("quasi-permanent-stress-limit", "Greatest compression of the concrete with linear creep, quasi-permanent combination", en("7.2(3)", ""), "σ_{c,qp,lim}", "k_{c2}·f_ck", "MPa", "22.5 MPa", "k_{c2} = 0.45", "f_ck = 50 MPa")
	TendonServiceLimit        = stressLimit("tendon-service-limit", "Greatest mean stress of the tendons, characteristic combination", en("7.2(5)", ""), "σ_{p,lim,i}", "k_{p5}·f_{pk,i}", "MPa", "1395 MPa", "k_{p5} = 0.75", "f_{pk,i} = 1860 MPa")
	BarServiceLimit           = stressLimit("bar-service-limit", "Greatest stress of the bars, characteristic combination", en("7.2(5)", ""), "σ_{s,lim,j}", "k_{s3}·f_{yk,j}", "MPa", "400 MPa", "k_{s3} = 0.8", "f_{yk,j} = 500 MPa")
)

func stressLimit(id, name string, ref clause.Ref, symbol, text, unit, want string, given ...string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Ref: ref, Text: symbol + " = " + text, Unit: unit, Examples: hand(want, given...)})
}

// Checks of these limits; σ_c stands for the greatest compression of the concrete where it is asked for.
var (
	TransferStressKept       = &clause.Check{ID: "transfer-stress-kept", Name: "Compression of the concrete when it is prestressed", Ref: en("5.10.2.2(5)", "5.42"), Demand: "σ_c", Limit: "σ_{c,lim}(t)"}
	CharacteristicStressKept = &clause.Check{ID: "characteristic-stress-kept", Name: "Compression of the concrete, characteristic combination", Ref: en("7.2(2)", ""), Demand: "σ_c", Limit: "σ_{c,char,lim}"}
	TendonServiceKept        = &clause.Check{ID: "tendon-service-kept", Name: "Stress of the tendons in service", Ref: en("7.2(5)", ""), Demand: "σ_{p,i}", Limit: "σ_{p,lim,i}"}
	BarServiceKept           = &clause.Check{ID: "bar-service-kept", Name: "Stress of the bars in service", Ref: en("7.2(5)", ""), Demand: "σ_{s,j}", Limit: "σ_{s,lim,j}"}

	// LinearCreepInService asks whether creep stays linear in service; if not, 3.7 holds.
	LinearCreepInService = &clause.Condition{ID: "linear-creep-in-service", Name: "Creep in proportion to the stress in service", Ref: en("7.2(3)", ""), Text: "σ_c ≤ σ_{c,qp,lim}",
		Yes: "not above the limit: creep is linear", No: "above the limit: creep is nonlinear"}
)

// TimeParameters are the national parameters of these limits, for Parameters to take in.
var TimeParameters = []Parameter{
	number("transfer-limit-pretensioned", "k_6", "k_6", "Limit of the compression at release of pretensioned tendons, part of f_ck(t), where tests or experience allow it", "0.7", 0.45, 0.8, en("5.10.2.2(5)", "")),
	number("characteristic-limit", "k_{c1}", "k_c1", "Limit of the compression of the concrete, characteristic combination, part of f_ck (k_1)", "0.6", 0.4, 0.8, en("7.2(2)", "")),
	number("linear-creep-limit", "k_{c2}", "k_c2", "Limit of the compression of the concrete for linear creep, quasi-permanent combination, part of f_ck (k_2)", "0.45", 0.3, 0.6, en("7.2(3)", "")),
	number("bar-service-limit-ratio", "k_{s3}", "k_s3", "Limit of the stress of bars, characteristic combination, part of f_yk (k_3)", "0.8", 0.4, 1, en("7.2(5)", "")),
	number("tendon-service-limit-ratio", "k_{p5}", "k_p5", "Limit of the mean stress of tendons, characteristic combination, part of f_pk (k_5)", "0.75", 0.4, 1, en("7.2(5)", "")),
}
