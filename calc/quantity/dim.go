package quantity

import "strings"

// Dim is a dimension: powers of force, length, time and temperature. The zero value is dimensionless;
// equal dimensions compare equal with ==. Angles and ratios are dimensionless, mass is
// force·time²/length.
type Dim struct{ force, length, time, temperature Rat }

var one = Rat{num: 1}

// The dimensions of the trade.
var (
	None             = Dim{}
	Force            = Dim{force: one}
	Length           = Dim{length: one}
	Time             = Dim{time: one}
	Temperature      = Dim{temperature: one}
	Area             = power(Length, 2)
	Volume           = power(Length, 3)
	SecondMoment     = power(Length, 4) // of area
	Curvature        = power(Length, -1)
	Stress           = Force.Div(Area)
	Moment           = Force.Mul(Length)
	BendingStiffness = Stress.Mul(SecondMoment)
	LineLoad         = Force.Div(Length)
	UnitWeight       = Force.Div(Volume)
	Velocity         = Length.Div(Time)
	Acceleration     = Velocity.Div(Time)
	Mass             = Force.Div(Acceleration)
	MassPerLength    = Mass.Div(Length)
	Density          = Mass.Div(Volume)
	PerTime          = power(Time, -1)
	ThermalExpansion = power(Temperature, -1)
	names            = dimNames()
	baseNames        = [...]string{"force", "length", "time", "temperature"}
)

func power(d Dim, n int) Dim { return d.Pow(NewRat(n, 1)) }

func dimNames() map[Dim]string {
	return map[Dim]string{
		None: "plain number", Force: "force", Length: "length", Time: "time", Temperature: "temperature",
		Area: "area", Volume: "volume", SecondMoment: "second moment of area", Curvature: "curvature",
		Stress: "stress", Moment: "moment", BendingStiffness: "bending stiffness", LineLoad: "line load",
		UnitWeight: "unit weight", Velocity: "velocity", Acceleration: "acceleration", Mass: "mass",
		MassPerLength: "mass per length", Density: "density", PerTime: "rate", ThermalExpansion: "coefficient of expansion",
	}
}

// Mul gives the dimension of a product.
func (d Dim) Mul(e Dim) Dim {
	return Dim{d.force.Add(e.force), d.length.Add(e.length), d.time.Add(e.time), d.temperature.Add(e.temperature)}
}

// Div gives the dimension of a quotient.
func (d Dim) Div(e Dim) Dim {
	return Dim{d.force.Add(e.force.Neg()), d.length.Add(e.length.Neg()), d.time.Add(e.time.Neg()), d.temperature.Add(e.temperature.Neg())}
}

// Pow gives the dimension of a power; it may come out not Valid.
func (d Dim) Pow(r Rat) Dim {
	return Dim{d.force.Mul(r), d.length.Mul(r), d.time.Mul(r), d.temperature.Mul(r)}
}

// IsNone reports whether d is dimensionless.
func (d Dim) IsNone() bool { return d == None }

// Valid reports whether all powers are in range, see Rat.
func (d Dim) Valid() bool {
	return d.force.Valid() && d.length.Valid() && d.time.Valid() && d.temperature.Valid()
}

// String gives the word of the trade where there is one ("length", "stress", "moment", "plain number"
// for None), else the product of powers ("force·length³", "1/length²").
func (d Dim) String() string {
	if n, ok := names[d]; ok {
		return n
	}
	if !d.Valid() {
		return "dimension out of range"
	}
	var over, under []string
	for i, p := range [...]Rat{d.force, d.length, d.time, d.temperature} {
		switch p.Sign() {
		case 1:
			over = append(over, baseNames[i]+p.superscript())
		case -1:
			under = append(under, baseNames[i]+p.Neg().superscript())
		}
	}
	return quotient(over, under)
}

// Indefinite gives the name with its article, as findings want it: "a length", "an area".
func (d Dim) Indefinite() string {
	s := d.String()
	if strings.ContainsRune("aeio", rune(s[0])) { // none begins with a u as in "under"
		return "an " + s
	}
	return "a " + s
}

func quotient(over, under []string) string {
	s := strings.Join(over, "·")
	if len(under) == 0 {
		return s
	}
	if s == "" {
		s = "1"
	}
	if len(under) == 1 {
		return s + "/" + under[0]
	}
	return s + "/(" + strings.Join(under, "·") + ")"
}
