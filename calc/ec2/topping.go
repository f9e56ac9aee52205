package ec2

import (
	"regexp"
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/calc/clause"
)

// Concrete of a topping: the formulas of Table 3.1 and of 3.1.6 with symbols of their own.

// Topping values: those of the concrete of the same name.
var (
	ToppingMeanStrength         = ofTopping(MeanStrength)
	ToppingMeanTensileStrength  = ofTopping(MeanTensileStrength)
	ToppingLowerTensileStrength = ofTopping(LowerTensileStrength)
	ToppingSecantModulus        = ofTopping(SecantModulus)
	ToppingDesignStrength       = ofTopping(DesignStrength)
	ToppingUltimateStrain3      = ofTopping(UltimateStrain3)
	ToppingBilinearStrain       = ofTopping(BilinearStrain)
	ToppingParabolaStrain       = ofTopping(ParabolaStrain)
	ToppingUltimateStrain2      = ofTopping(UltimateStrain2)
	ToppingParabolaExponent     = ofTopping(ParabolaExponent)

	ToppingLawStrain, ToppingBilinearLawStrain     = ofTopping(LawStrain), ofTopping(BilinearLawStrain)
	ToppingLawUltimate, ToppingBilinearLawUltimate = ofTopping(LawUltimate), ofTopping(BilinearLawUltimate)
	ToppingLawExponent, ToppingBilinearLawExponent = ofTopping(LawExponent), ofTopping(BilinearLawExponent)
)

// The concrete of a stretched topping, for the minimum of steel.
var (
	StretchedStrength     = stretched("stretched-strength", "Characteristic strength of the stretched concrete", "f_ck", "f_{ck,t}")
	StretchedMeanTension  = stretched("stretched-mean-tension", "Mean tensile strength of the stretched concrete", "f_ctm", "f_{ctm,t}")
	StretchedLowerTension = stretched("stretched-lower-tension", "Lower tensile strength of the stretched concrete", "f_{ctk,0.05}", "f_{ctk,0.05,t}")
)

func stretched(id, name, symbol, from string) *clause.Formula {
	return clause.Define(&clause.Formula{ID: id, Name: name, Ref: en("3.1.3 Table 3.1", ""), Text: symbol + " = " + from, Unit: "MPa", Examples: hand("2.9 MPa", from+" = 2.9 MPa")})
}

// toppingSymbols are the symbols of the concrete that a topping has its own of. Its exponent of the parabola is n_{c,t}, for
// n_t is the ratio of the moduli.
var toppingSymbols = map[string]string{
	"f_ck": "f_{ck,t}", "f_cm": "f_{cm,t}", "f_ctm": "f_{ctm,t}", "f_{ctk,0.05}": "f_{ctk,0.05,t}", "E_cm": "E_{cm,t}", "k_agg": "k_{agg,t}", "f_cd": "f_{cd,t}",
	"ε_cu3": "ε_{cu3,t}", "ε_c3": "ε_{c3,t}", "ε_c2": "ε_{c2,t}", "ε_cu2": "ε_{cu2,t}", "n": "n_{c,t}",
	"ε_cy": "ε_{cy,t}", "ε_cu": "ε_{cu,t}", "n_σ": "n_{σ,t}",
}

var symbolPattern = regexp.MustCompile(`[\p{L}]+(_\{[^}]*\}|_[\p{L}\p{Nd}]+)?`)

// ofTopping is a formula of the concrete for the topping: the same text and examples, other symbols.
func ofTopping(f *clause.Formula) *clause.Formula {
	own := func(text string) string {
		return symbolPattern.ReplaceAllStringFunc(text, func(s string) string {
			if t, ok := toppingSymbols[s]; ok {
				return t
			}
			return s
		})
	}
	first, size := utf8.DecodeRuneInString(f.Name)
	g := &clause.Formula{ID: "topping-" + f.ID, Name: "Topping: " + string(unicode.ToLower(first)) + f.Name[size:], Ref: f.Ref, Text: own(f.Text), Unit: f.Unit, Digits: f.Digits, Domain: own(f.Domain)}
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
