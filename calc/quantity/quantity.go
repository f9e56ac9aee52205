// Package quantity knows dimensions, units and how values are written: it reads "1200 kN" and prints by the
// rule that the value printed is the value carried.
//
// The base units are N, mm, day and °C, hence MPa for stress; the base unit of mass follows from them.
package quantity

import (
	"fmt"
	"math"
	"strings"
)

// Quantity is a value in base units with its dimension.
type Quantity struct {
	Value float64 // base units: N, mm, day, °C
	Dim   Dim
}

// Add gives a + b; different dimensions are an error naming them and the operands.
func Add(a, b Quantity) (Quantity, error) {
	if a.Dim != b.Dim {
		return Quantity{}, &Error{Msg: fmt.Sprintf("cannot add %s to %s: %v + %v", b.Dim.Indefinite(), a.Dim.Indefinite(), a, b)}
	}
	return finite(a.Value+b.Value, a.Dim, "+", a, b)
}

// Sub gives a − b; different dimensions are an error naming them and the operands.
func Sub(a, b Quantity) (Quantity, error) {
	if a.Dim != b.Dim {
		return Quantity{}, &Error{Msg: fmt.Sprintf("cannot subtract %s from %s: %v − %v", b.Dim.Indefinite(), a.Dim.Indefinite(), a, b)}
	}
	return finite(a.Value-b.Value, a.Dim, "−", a, b)
}

// Mul gives a·b.
func Mul(a, b Quantity) (Quantity, error) {
	return finite(a.Value*b.Value, a.Dim.Mul(b.Dim), "·", a, b)
}

// Div gives a/b; b = 0 is an error.
func Div(a, b Quantity) (Quantity, error) {
	if b.Value == 0 {
		return Quantity{}, &Error{Msg: fmt.Sprintf("division by zero: %v / %v", a, b)}
	}
	return finite(a.Value/b.Value, a.Dim.Div(b.Dim), "/", a, b)
}

// Compare gives −1, 0 or 1 as a is below, the same as (see Agree) or above b; different dimensions are an
// error naming them and the operands.
func Compare(a, b Quantity) (int, error) {
	switch {
	case a.Dim != b.Dim:
		return 0, &Error{Msg: fmt.Sprintf("cannot compare %s with %s: %v and %v", a.Dim.Indefinite(), b.Dim.Indefinite(), a, b)}
	case math.IsNaN(a.Value) || math.IsNaN(b.Value):
		return 0, &Error{Msg: fmt.Sprintf("cannot compare %v with %v", a, b)}
	case Agree(a.Value, b.Value):
		return 0, nil
	case a.Value < b.Value:
		return -1, nil
	}
	return 1, nil
}

func finite(v float64, d Dim, op string, a, b Quantity) (Quantity, error) {
	if math.IsNaN(v) || math.IsInf(v, 0) || !d.Valid() {
		return Quantity{}, &Error{Msg: fmt.Sprintf("result out of range: %v %s %v", a, op, b)}
	}
	return Quantity{v, d}, nil
}

// customary are the units in which a value of unknown origin is best read.
var customary = func() map[Dim]Unit {
	m := map[Dim]Unit{}
	for _, s := range strings.Fields("kN MPa kN·m kN/m kN/m³ kg kg/m kg/m³ m/s m/s² 1/m") {
		u := MustUnit(s)
		m[u.dim] = u
	}
	return m
}()

// Customary gives the unit in which the trade reads d: kN, kN·m, mm, MPa, kg/m³ …; for others the product of
// base units.
func (d Dim) Customary() Unit {
	if u, ok := customary[d]; ok {
		return u
	}
	if d == None {
		return Unit{}
	}
	var over, under []string
	for i, p := range [...]Rat{d.force, d.length, d.time, d.temperature} {
		name := [...]string{"N", "mm", "d", "°C"}[i]
		switch p.Sign() {
		case 1:
			over = append(over, name+p.superscript())
		case -1:
			under = append(under, name+p.Neg().superscript())
		}
	}
	return Unit{quotient(over, under), 1, d}
}

// String writes the quantity in its customary unit with up to six digits: "350 kN".
func (q Quantity) String() string {
	u := q.Dim.Customary()
	s := strings.Replace(fmt.Sprintf("%.6g", u.From(q.Value)), "e+", "e", 1)
	if u.name == "" {
		return s
	}
	return s + " " + u.name
}
