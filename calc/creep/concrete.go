// Package creep has the laws of materials in time on plain numbers: growth of strength, creep and shrinkage of concrete by
// EN 1992-1-1 3.1 and Annex B, relaxation of prestressing steel by 3.3.2. It is the law side of a second method and knows
// nothing of the formulas that a note prints. Units: MPa, mm, days, °C; hours for relaxation. Ages count from casting.
package creep

import (
	"fmt"
	"math"
)

// Cement is a class of cement.
type Cement byte

// The classes: slow, normal, rapid.
const (
	S Cement = 'S'
	N Cement = 'N'
	R Cement = 'R'
)

// numbers of a class: growth of strength, exponent of the age at loading, the two of drying shrinkage.
func (c Cement) numbers() (growth, ageing, dry1, dry2 float64) {
	switch c {
	case S:
		return 0.38, -1, 3, 0.13
	case R:
		return 0.20, 1, 6, 0.11
	}
	return 0.25, 0, 4, 0.12
}

// Concrete is a concrete in its air. Fck and Ecm are those at 28 days; Humidity is a part of one; Size is the notional
// size 2·A_c/u. Drying begins at the age DryFrom. With a history strength goes by the equivalent age and never above that at
// 28 days. A heat-cured concrete has no autogenous shrinkage.
type Concrete struct {
	Fck, Ecm       float64
	Humidity, Size float64
	Cement         Cement
	DryFrom        float64
	History        History // nil: 20 °C, age as it is
	HeatCured      bool
}

// Check names the first value outside the range of the laws: 12 ≤ f_ck ≤ 90 MPa, humidity 40 to 100 %, size and modulus
// above zero, cement class S, N or R, temperatures 0 to 80 °C, a history without gaps from age 0.
func (c Concrete) Check() error {
	switch {
	case !(c.Fck >= 12 && c.Fck <= 90):
		return fmt.Errorf("f_ck %g MPa is outside 12 to 90 MPa", c.Fck)
	case !(c.Ecm > 0 && !math.IsInf(c.Ecm, 0)):
		return fmt.Errorf("modulus %g MPa is not above zero", c.Ecm)
	case !(c.Humidity >= 0.4 && c.Humidity <= 1):
		return fmt.Errorf("humidity %g is outside 0.4 to 1", c.Humidity)
	case !(c.Size > 0 && !math.IsInf(c.Size, 0)):
		return fmt.Errorf("notional size %g mm is not above zero", c.Size)
	case c.Cement != S && c.Cement != N && c.Cement != R:
		return fmt.Errorf("cement class %q is none of S, N, R", rune(c.Cement))
	case !(c.DryFrom >= 0):
		return fmt.Errorf("drying begins at age %g", c.DryFrom)
	}
	return c.History.check()
}

// Mean is f_cm at 28 days.
func (c Concrete) Mean() float64 { return c.Fck + 8 }

// Growth is β_cc at age t > 0, 3.2.
func (c Concrete) Growth(t float64) float64 {
	s, _, _, _ := c.Cement.numbers()
	b := math.Exp(s * (1 - math.Sqrt(28/c.History.Equivalent(t))))
	if c.History != nil {
		b = math.Min(1, b)
	}
	return b
}

// Strength is f_cm(t), 3.1.
func (c Concrete) Strength(t float64) float64 { return c.Growth(t) * c.Mean() }

// Tensile is f_ctm(t), 3.4 and Table 3.1.
func (c Concrete) Tensile(t float64) float64 {
	f := 0.30 * math.Cbrt(c.Fck*c.Fck)
	if c.Fck > 50 {
		f = 2.12 * math.Log(1+c.Mean()/10)
	}
	b := c.Growth(t)
	if t >= 28 {
		b = math.Cbrt(b * b)
	}
	return b * f
}

// Modulus is E_cm(t), 3.5.
func (c Concrete) Modulus(t float64) float64 { return math.Pow(c.Growth(t), 0.3) * c.Ecm }

// Tangent is E_c at 28 days, to which Creep refers.
func (c Concrete) Tangent() float64 { return 1.05 * c.Ecm }

// LoadingAge is the age at loading that creep goes by, B.9.
func (c Concrete) LoadingAge(t0 float64) float64 {
	_, ageing, _, _ := c.Cement.numbers()
	t := c.History.Equivalent(t0)
	return math.Max(0.5, t*math.Pow(9/(2+math.Pow(t, 1.2))+1, ageing))
}

// Creep is φ(t, t0), B.1: the creep strain at age t of a stress that stands since t0, over the elastic strain with the
// tangent modulus at 28 days. 0 for t ≤ t0.
func (c Concrete) Creep(t, t0 float64) float64 {
	if t <= t0 {
		return 0
	}
	fcm := c.Mean()
	a1, a2, a3 := 1.0, 1.0, 1.0
	if fcm > 35 {
		r := 35 / fcm
		a1, a2, a3 = math.Pow(r, 0.7), math.Pow(r, 0.2), math.Sqrt(r)
	}
	air := (1 + (1-c.Humidity)/(0.1*math.Cbrt(c.Size))*a1) * a2
	notional := air * 16.8 / math.Sqrt(fcm) / (0.1 + math.Pow(c.LoadingAge(t0), 0.2))
	delay := math.Min(1.5*(1+math.Pow(1.2*c.Humidity, 18))*c.Size+250*a3, 1500*a3)
	return notional * math.Pow((t-t0)/(delay+t-t0), 0.3)
}

// Nonlinear is the factor on Creep of a stress that is the part k of f_ck at loading, 3.7.
func Nonlinear(k float64) float64 { return math.Exp(1.5 * math.Max(0, k-0.45)) }

// Drying is ε_cd(t), 3.9 to 3.11 with B.11; shortening positive.
func (c Concrete) Drying(t float64) float64 {
	if t <= c.DryFrom {
		return 0
	}
	_, _, d1, d2 := c.Cement.numbers()
	basic := 0.85e-6 * (220 + 110*d1) * math.Exp(-d2*c.Mean()/10) * 1.55 * (1 - c.Humidity*c.Humidity*c.Humidity)
	t -= c.DryFrom
	return t / (t + 0.04*c.Size*math.Sqrt(c.Size)) * size(c.Size) * basic
}

// size is k_h, Table 3.3.
func size(h float64) float64 {
	at, value := [...]float64{100, 200, 300, 500}, [...]float64{1, 0.85, 0.75, 0.70}
	if h <= at[0] {
		return value[0]
	}
	for i := 1; i < len(at); i++ {
		if h <= at[i] {
			return value[i-1] + (value[i]-value[i-1])*(h-at[i-1])/(at[i]-at[i-1])
		}
	}
	return value[3]
}

// Autogenous is ε_ca(t), 3.11 to 3.13.
func (c Concrete) Autogenous(t float64) float64 {
	if c.HeatCured {
		return 0
	}
	return (1 - math.Exp(-0.2*math.Sqrt(math.Max(0, t)))) * 2.5e-6 * (c.Fck - 10)
}

// Shrinkage is ε_cs(t), 3.8; shortening positive.
func (c Concrete) Shrinkage(t float64) float64 { return c.Drying(t) + c.Autogenous(t) }
