package quantity

import "math"

// Unit is a unit of measurement. The zero value is the dimensionless unit of factor 1. Equal units in
// equal spelling compare equal with ==; N/mm² and MPa differ in spelling only.
//
// The base units are N, mm, day and °C, so that MPa has the factor 1, kN·m 10⁶ and kg the factor
// 1 N·s²/m = 1/(86 400²·1000) N·d²/mm. A year is 365 days. °C and K are read as the same step of
// temperature; a temperature counted from absolute zero has no place here.
type Unit struct {
	name   string
	factor float64 // 0 stands for 1
	dim    Dim
}

// Dim gives the dimension measured.
func (u Unit) Dim() Dim { return u.dim }

// Factor gives the number of base units in one u.
func (u Unit) Factor() float64 {
	if u.factor == 0 {
		return 1
	}
	return u.factor
}

// String gives the unit as printed: "kN·m", "mm²", "10⁶ mm⁴", "" for the plain number.
func (u Unit) String() string { return u.name }

// From converts a value in base units to the number of u in it.
func (u Unit) From(base float64) float64 { return base / u.Factor() }

// To converts a number of u to base units.
func (u Unit) To(number float64) float64 { return number * u.Factor() }

// atom is a unit with a name of its own. Its factor is over/under, both exact where the unit is decimal,
// so that a product of them is rounded once.
type atom struct {
	dim         Dim
	over, under float64
}

const (
	second   = 24 * 60 * 60 // in a day
	kilogram = second * second * 1000
)

var atoms = map[string]atom{
	"mm": {Length, 1, 1}, "cm": {Length, 10, 1}, "m": {Length, 1e3, 1}, "km": {Length, 1e6, 1},
	"N": {Force, 1, 1}, "kN": {Force, 1e3, 1}, "MN": {Force, 1e6, 1},
	"Pa": {Stress, 1, 1e6}, "kPa": {Stress, 1, 1e3}, "MPa": {Stress, 1, 1}, "GPa": {Stress, 1e3, 1},
	"g": {Mass, 1, kilogram * 1e3}, "kg": {Mass, 1, kilogram}, "t": {Mass, 1e3, kilogram},
	"s": {Time, 1, second}, "min": {Time, 1, 24 * 60}, "h": {Time, 1, 24}, "d": {Time, 1, 1}, "y": {Time, 365, 1},
	"°C": {Temperature, 1, 1}, "K": {Temperature, 1, 1},
	"rad": {None, 1, 1}, "mrad": {None, 1, 1e3}, "°": {None, math.Pi, 180},
	"%": {None, 1, 1e2}, "‰": {None, 1, 1e3},
}

// joined are products commonly written without a sign between the factors.
var joined = map[string][2]string{
	"Nmm": {"N", "mm"}, "Nm": {"N", "m"}, "kNmm": {"kN", "mm"}, "kNm": {"kN", "m"}, "MNm": {"MN", "m"},
}

// MustUnit is ParseUnit for units written in the program; it panics where the unit cannot be read.
func MustUnit(s string) Unit {
	u, err := ParseUnit(s)
	if err != nil {
		panic("quantity: " + err.Error())
	}
	return u
}
