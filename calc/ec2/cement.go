package ec2

import "soffit/calc/clause"

// Cement is what a class of cement decides: growth of strength, ageing before loading, drying shrinkage. Class S is
// CEM 32.5 N, class N CEM 32.5 R and 42.5 N, class R CEM 42.5 R, 52.5 N and 52.5 R.
type Cement struct {
	Class     string
	Growth    float64 // s of 3.1.2(6)
	Ageing    float64 // α of B.1(2)
	Shrinkage [2]float64
}

// Cements are the classes; recalled.
var Cements = []Cement{
	{"S", 0.38, -1, [2]float64{3, 0.13}},
	{"N", 0.25, 0, [2]float64{4, 0.12}},
	{"R", 0.20, 1, [2]float64{6, 0.11}},
}

// FindCement looks a class up.
func FindCement(class string) (Cement, bool) {
	for _, c := range Cements {
		if c.Class == class {
			return c, true
		}
	}
	return Cement{}, false
}

// Coefficients of the cement, as the record names them.
var (
	CementGrowth     = clause.Given{ID: "cement-growth", Symbol: "s", Name: "Coefficient of the cement class for the growth of strength", Ref: en("3.1.2(6)", "")}
	CementAgeing     = clause.Given{ID: "cement-ageing", Symbol: "α", Name: "Exponent of the cement class for the age at loading", Ref: en("B.1(2)", "")}
	CementShrinkage1 = clause.Given{ID: "cement-shrinkage-1", Symbol: "α_ds1", Name: "Coefficient of the cement class for drying shrinkage", Ref: en("B.2(1)", "")}
	CementShrinkage2 = clause.Given{ID: "cement-shrinkage-2", Symbol: "α_ds2", Name: "Coefficient of the cement class for drying shrinkage", Ref: en("B.2(1)", "")}
)
