package ec2

import (
	"strings"

	"soffit/calc/clause"
)

// Concrete by its age, 3.1.2, 3.1.3(3), B.1(3) and 10.3. t is the age in days since casting, at 20 °C; t_T the age at 20 °C
// that a temperature history comes to; t_0 the age at loading, as the calendar has it. Row i is a row of the temperature
// history: T_i from the age t_{b,i} to the age t_{e,i}. The last row must reach to the end of life, for an age beyond it does
// not grow. Ages carry eight or nine digits, for those of release and of the end of life stand in one column and share its last
// place. The exponential is 0.998 at 20 °C, not 1: printed as the standard has it.

// StrengthGrowth is β_cc(t). Exactly 1 at 28 days, above it later: 3.1.2(6).
var StrengthGrowth = clause.Define(&clause.Formula{
	ID: "strength-growth", Name: "Growth of the strength with age", Ref: en("3.1.2(6)", "3.2"),
	Text: "β_cc(t) = exp(s·(1 − sqrt(28·[d]/t)))", Domain: "t > 0·[d]",
	Examples: append(append(hand("0.77880", "s = 0.25", "t = 7 d"), hand("1", "s = 0.38", "t = 28 d")...),
		append(hand("0.57791", "s = 0.20", "t = 2 d"), hand("1.1169", "s = 0.25", "t = 90 d")...)...),
})

// StrengthGrowthByHistory is β_cc with the equivalent age and never above 1, which 10.3.1.1(3) asks for where
// concrete is heat-cured. It holds for cold concrete as well, whose strength would else be taken too great.
var StrengthGrowthByHistory = clause.Define(&clause.Formula{
	ID: "strength-growth-by-history", Name: "Growth of the strength with the equivalent age, at most 1", Ref: en("10.3.1.1(3), 3.1.2(6)", "3.2"),
	Text: "β_cc(t) = min(1; exp(s·(1 − sqrt(28·[d]/t_T))))", Domain: "t_T > 0·[d]",
	Examples: append(hand("0.51474", "s = 0.20", "t_T = 1.5 d"), hand("1", "s = 0.20", "t_T = 40 d")...),
})

// MeanStrengthAtAge is f_cm(t).
var MeanStrengthAtAge = clause.Define(&clause.Formula{
	ID: "mean-strength-at-age", Name: "Mean compressive strength at the age", Ref: en("3.1.2(6)", "3.1"),
	Text: "f_cm(t) = β_cc(t)·f_cm", Unit: "MPa",
	Examples: append(hand("29.594 MPa", "β_cc(t) = 0.7788", "f_cm = 38 MPa"), hand("58 MPa", "β_cc(t) = 1", "f_cm = 58 MPa")...),
})

// MeanStrengthFromRelease is f_cm(t) between the release of a heat-cured member, where a mean strength f_cmp was measured at
// the age t_p, and 28 days. Its logarithms may have any base.
var MeanStrengthFromRelease = clause.Define(&clause.Formula{
	ID: "mean-strength-from-release", Name: "Mean compressive strength at the age, from that measured at release of the heat-cured member", Ref: en("10.3.1.1(3)", "10.1"),
	Text: "f_cm(t) = f_cmp + (f_cm − f_cmp)/ln(28 − t_p/[d] + 1)·ln((t − t_p)/[d] + 1)", Unit: "MPa", Domain: "0·[d] < t_p ≤ t ≤ 28·[d] and t_p < 28·[d]",
	Examples: append(append(hand("53.216 MPa", "f_cmp = 35 MPa", "f_cm = 58 MPa", "t_p = 1 d", "t = 14 d"), hand("35 MPa", "f_cmp = 35 MPa", "f_cm = 58 MPa", "t_p = 1 d", "t = 1 d")...),
		hand("58 MPa", "f_cmp = 35 MPa", "f_cm = 58 MPa", "t_p = 1 d", "t = 28 d")...),
})

// CharacteristicStrengthAtAge is f_ck(t). Up to 3 days the standard asks for tests and gives no value.
var CharacteristicStrengthAtAge = clause.Define(&clause.Formula{
	ID: "characteristic-strength-at-age", Name: "Characteristic compressive strength at the age", Ref: en("3.1.2(5)", ""),
	Text: "f_ck(t) = cases(t < 28·[d]: f_cm(t) − 8·[MPa]; otherwise: f_ck)", Unit: "MPa", Domain: "t > 3·[d]",
	Examples: append(hand("21.594 MPa", "t = 7 d", "f_cm(t) = 29.594 MPa", "f_ck = 30 MPa"), hand("30 MPa", "t = 28 d", "f_cm(t) = 38 MPa", "f_ck = 30 MPa")...),
})

// CharacteristicStrengthByHistory is f_ck(t) with the equivalent age.
var CharacteristicStrengthByHistory = clause.Define(&clause.Formula{
	ID: "characteristic-strength-by-history", Name: "Characteristic compressive strength at the equivalent age", Ref: en("3.1.2(5), 10.3.1.1(3)", ""),
	Text: "f_ck(t) = cases(t_T < 28·[d]: f_cm(t) − 8·[MPa]; otherwise: f_ck)", Unit: "MPa", Domain: "t_T > 3·[d]",
	Examples: append(hand("32 MPa", "t_T = 4 d", "f_cm(t) = 40 MPa", "f_ck = 50 MPa"), hand("50 MPa", "t_T = 30 d", "f_cm(t) = 58 MPa", "f_ck = 50 MPa")...),
})

// MeanTensileStrengthAtAge is f_ctm(t): exponent 1 before 28 days, 2/3 from then on.
var MeanTensileStrengthAtAge = clause.Define(&clause.Formula{
	ID: "mean-tensile-strength-at-age", Name: "Mean axial tensile strength at the age", Ref: en("3.1.2(9)", "3.4"),
	Text: "f_ctm(t) = cases(t < 28·[d]: β_cc(t); otherwise: β_cc(t)^(2/3))·f_ctm", Unit: "MPa", Domain: "t > 0·[d]",
	Examples: append(append(hand("2.2558 MPa", "t = 7 d", "β_cc(t) = 0.7788", "f_ctm = 2.8965 MPa"), hand("3.1180 MPa", "t = 90 d", "β_cc(t) = 1.1169", "f_ctm = 2.8965 MPa")...),
		hand("2.8965 MPa", "t = 28 d", "β_cc(t) = 1", "f_ctm = 2.8965 MPa")...),
})

// SecantModulusAtAge is E_cm(t).
var SecantModulusAtAge = clause.Define(&clause.Formula{
	ID: "secant-modulus-at-age", Name: "Secant modulus of elasticity at the age", Ref: en("3.1.3(3)", "3.5"),
	Text: "E_cm(t) = (f_cm(t)/f_cm)^0.3·E_cm", Unit: "GPa", Domain: "f_cm(t) > 0·[MPa]",
	Examples: append(hand("30.464 GPa", "f_cm(t) = 29.594 MPa", "f_cm = 38 MPa", "E_cm = 32.837 GPa"), hand("32.837 GPa", "f_cm(t) = 38 MPa", "f_cm = 38 MPa", "E_cm = 32.837 GPa")...),
})

// HistoryDuration is how long a row of the temperature history has lasted at the age.
var HistoryDuration = clause.Define(&clause.Formula{
	ID: "history-duration", Name: "Time spent in each row of the temperature history up to the age", Ref: en("B.1(3)", ""),
	Text: "Δt_i = max(0; min(t; t_{e,i}) − t_{b,i})", Unit: "d", Digits: 9,
	Examples: hand("0.125 d, 0.25 d, 0 d", "t = 9 h", "t_{b,i} = 0 h, 3 h, 12 h", "t_{e,i} = 3 h, 12 h, 15 h"),
})

// EquivalentAge is t_T of a temperature history. Domain 0 to 80 °C.
var EquivalentAge = clause.Define(&clause.Formula{
	ID: "equivalent-age", Name: "Age at 20 °C equivalent to the temperature history", Ref: en("B.1(3)", "B.10"),
	Text: "t_T = Σ_i(exp(−(4000/(273 + T_i/[°C]) − 13.65))·Δt_i)", Unit: "d", Digits: 8, Domain: "min_i(T_i) ≥ 0·[°C] and max_i(T_i) ≤ 80·[°C]",
	Examples: append(append(hand("2.3804 d", "T_i = 60 °C, 20 °C", "Δt_i = 8 h, 16 h"), hand("0.99812 d", "T_i = 20 °C", "Δt_i = 1 d")...),
		hand("2.3372 d", "T_i = 20 °C, 40 °C, 60 °C, 40 °C", "Δt_i = 3 h, 2 h, 8 h, 3 h")...),
})

// EquivalentAgeAt20 is t_T of concrete of which no temperature history is stated: the age itself.
var EquivalentAgeAt20 = clause.Define(&clause.Formula{
	ID: "equivalent-age-at-20", Name: "Age at 20 °C, no other temperature being stated", Ref: en("B.1(3)", ""),
	Text: "t_T = t", Unit: "d", Digits: 8, Examples: hand("7 d", "t = 7 d"),
})

// LoadingAge is the age at loading that creep goes by: adjusted for temperature and cement, 0.5 days at least. The duration
// of the load, t − t_0, is not adjusted.
var LoadingAge = clause.Define(&clause.Formula{
	ID: "loading-age", Name: "Age at loading, adjusted for temperature and cement", Ref: en("B.1(2)", "B.9"),
	Text: "t_{0,adj} = max(0.5·[d]; t_{0,T}·(9/(2 + (t_{0,T}/[d])^1.2) + 1)^α)", Unit: "d", Digits: 8, Domain: "t_{0,T} ≥ 0·[d]",
	Examples: append(append(hand("6.1886 d", "t_{0,T} = 2 d", "α = 1"), hand("2 d", "t_{0,T} = 2 d", "α = 0")...),
		append(hand("0.64635 d", "t_{0,T} = 2 d", "α = -1"), hand("0.5 d", "t_{0,T} = 1 d", "α = -1")...)...),
})

// RelaxationEquivalentTime is t_eq, added to the time after tensioning. Rows of 20 °C and less count nothing; the rows are
// those in which the tendons are held.
var RelaxationEquivalentTime = clause.Define(&clause.Formula{
	ID: "relaxation-equivalent-time", Name: "Time that heat curing adds to the time after tensioning", Ref: en("10.3.2.1(2)", "10.2"),
	Text: "t_eq = 1.14^(T_max/[°C] − 20)/(T_max/[°C] − 20)·Σ_i(max(0; T_i/[°C] − 20)·Δt_i)", Unit: "h", Domain: "20·[°C] < T_max ≤ 80·[°C] and max_i(T_i) ≤ T_max",
	Examples: append(hand("1511.1 h", "T_max = 60 °C", "T_i = 20 °C, 60 °C", "Δt_i = 3 h, 8 h"),
		append(hand("1983.3 h", "T_max = 60 °C", "T_i = 20 °C, 40 °C, 60 °C, 40 °C", "Δt_i = 3 h, 2 h, 8 h, 3 h"), hand("0 h", "T_max = 21 °C", "T_i = 5 °C, 20 °C", "Δt_i = 8 h, 8 h")...)...),
})

// GreatestTemperature is T_max.
var GreatestTemperature = clause.Define(&clause.Formula{
	ID: "greatest-temperature", Name: "Greatest temperature of the history", Ref: en("10.3.2.1(2)", ""),
	Text: "T_max = max_i(T_i)", Unit: "°C", Examples: hand("60 °C", "T_i = 20 °C, 40 °C, 60 °C, 40 °C"),
})

// HeatCured asks whether the history heats the tendons at all.
var HeatCured = &clause.Condition{ID: "heat-cured", Name: "Heat curing", Ref: en("10.3.2.1(2)", ""), Text: "T_max > 20·[°C]",
	Yes: "warmer than 20 °C: relaxation is quickened", No: "never warmer than 20 °C"}

// ThermalLoss is Δσ_θ. T_0 is the temperature near the tendons when they were stressed; no loss arises where they were
// warmed beforehand.
var ThermalLoss = clause.Define(&clause.Formula{
	ID: "thermal-loss", Name: "Loss by heat curing of the concrete on the stretched tendons", Ref: en("10.5.2(1)", "10.3"),
	Text: "Δσ_{θ,i} = 0.5·E_{p,i}·α_c·(T_max − T_0)", Unit: "MPa", Domain: "T_max ≥ T_0",
	Examples: append(hand("39 MPa", "E_{p,i} = 195 GPa", "α_c = 1e-5 1/K", "T_max = 60 °C", "T_0 = 20 °C"), hand("0 MPa, 0 MPa", "E_{p,i} = 195 GPa, 205 GPa", "α_c = 1e-5 1/K", "T_max = 20 °C", "T_0 = 20 °C")...),
})

// The same at loading: t_0 for t.
var (
	StrengthGrowthAtLoading                  = atLoading(StrengthGrowth)
	StrengthGrowthByHistoryAtLoading         = atLoading(StrengthGrowthByHistory)
	MeanStrengthAtLoading                    = atLoading(MeanStrengthAtAge)
	MeanStrengthFromReleaseAtLoading         = atLoading(MeanStrengthFromRelease)
	CharacteristicStrengthAtLoading          = atLoading(CharacteristicStrengthAtAge)
	CharacteristicStrengthByHistoryAtLoading = atLoading(CharacteristicStrengthByHistory)
	SecantModulusAtLoading                   = atLoading(SecantModulusAtAge)
	HistoryDurationAtLoading                 = atLoading(HistoryDuration)
	EquivalentAgeAtLoading                   = atLoading(EquivalentAge)
	EquivalentAgeAt20AtLoading               = atLoading(EquivalentAgeAt20)
)

var loadingSymbols = map[string]string{"t": "t_0", "t_T": "t_{0,T}", "Δt_i": "Δt_{0,i}"}

// atLoading is a formula of the age for the age at loading: the same text and examples, other symbols.
func atLoading(f *clause.Formula) *clause.Formula {
	own := func(text string) string {
		return symbolPattern.ReplaceAllStringFunc(text, func(s string) string {
			if t, ok := loadingSymbols[s]; ok {
				return t
			}
			return s
		})
	}
	g := &clause.Formula{ID: strings.TrimSuffix(f.ID, "-at-age") + "-at-loading", Name: strings.TrimSuffix(f.Name, " at the age") + ", at loading", Ref: f.Ref, Text: own(f.Text), Unit: f.Unit, Digits: f.Digits, Domain: own(f.Domain)}
	for _, e := range f.Examples {
		given := make([]string, len(e.Given))
		for i, v := range e.Given {
			name, value, _ := strings.Cut(v, " = ")
			given[i] = own(name) + " = " + value
		}
		e.Given = given
		g.Examples = append(g.Examples, e)
	}
	return clause.Define(g)
}
