package quantity

import (
	"math"
	"testing"
)

func TestUnits(t *testing.T) {
	const mass = 1 / (86400.0 * 86400 * 1000) // N·s²/m in N·d²/mm
	for _, c := range []struct {
		in, out string
		dim     Dim
		factor  float64
	}{
		{"", "", None, 1}, {"1", "", None, 1}, {" kN ", "kN", Force, 1e3},
		{"mm", "mm", Length, 1}, {"cm", "cm", Length, 10}, {"m", "m", Length, 1e3}, {"km", "km", Length, 1e6},
		{"N", "N", Force, 1}, {"MN", "MN", Force, 1e6},
		{"Pa", "Pa", Stress, 1e-6}, {"kPa", "kPa", Stress, 1e-3}, {"MPa", "MPa", Stress, 1}, {"GPa", "GPa", Stress, 1e3},
		{"kg", "kg", Mass, mass}, {"g", "g", Mass, mass / 1e3}, {"t", "t", Mass, mass * 1e3},
		{"s", "s", Time, 1 / 86400.}, {"min", "min", Time, 1 / 1440.}, {"h", "h", Time, 1 / 24.}, {"d", "d", Time, 1}, {"y", "y", Time, 365},
		{"°C", "°C", Temperature, 1}, {"℃", "°C", Temperature, 1}, {"K", "K", Temperature, 1},
		{"rad", "rad", None, 1}, {"mrad", "mrad", None, 1e-3}, {"°", "°", None, math.Pi / 180}, {"%", "%", None, 0.01}, {"‰", "‰", None, 0.001},
		{"1/m", "1/m", Curvature, 1e-3}, {"kN·m", "kN·m", Moment, 1e6}, {"kNm", "kN·m", Moment, 1e6}, {"kN*m", "kN·m", Moment, 1e6},
		{"kN · m", "kN·m", Moment, 1e6}, {"N mm", "", None, 0}, {"Nmm", "N·mm", Moment, 1}, {"MNm", "MN·m", Moment, 1e9},
		{"kNm²", "kN·m²", Force.Mul(Area), 1e9}, {"kNm/m", "kN·m/m", Force, 1e3},
		{"kN/m", "kN/m", LineLoad, 1}, {"kN/m²", "kN/m²", Stress, 1e-3}, {"kN/m2", "kN/m²", Stress, 1e-3}, {"kN/m^2", "kN/m²", Stress, 1e-3},
		{"kN/m³", "kN/m³", UnitWeight, 1e-6}, {"N/mm²", "N/mm²", Stress, 1}, {"N/mm2", "N/mm²", Stress, 1},
		{"mm²", "mm²", Area, 1}, {"mm³", "mm³", Volume, 1}, {"mm⁴", "mm⁴", SecondMoment, 1}, {"cm4", "cm⁴", SecondMoment, 1e4},
		{"kg/m³", "kg/m³", Density, mass / 1e9}, {"kg/m", "kg/m", MassPerLength, mass / 1e3},
		{"10⁶ mm⁴", "10⁶ mm⁴", SecondMoment, 1e6}, {"10^6 mm^4", "10⁶ mm⁴", SecondMoment, 1e6}, {"10⁶mm⁴", "10⁶ mm⁴", SecondMoment, 1e6},
		{"10^-6/K", "10⁻⁶/K", ThermalExpansion, 1e-6}, {"10⁻⁶ 1/K", "10⁻⁶/K", ThermalExpansion, 1e-6}, {"10⁻³", "10⁻³", None, 1e-3},
		{"1/(MPa·d)", "1/(MPa·d)", None.Div(Stress.Mul(Time)), 1}, {"m/s²", "m/s²", Acceleration, 1e3 * 86400 * 86400},
		{"mm⁻¹", "mm⁻¹", Curvature, 1}, {"mm^-1", "mm⁻¹", Curvature, 1}, {"mm^(1/2)", "mm^(1/2)", Length.Pow(NewRat(1, 2)), 1},
		{"MPa^(-2/3)", "MPa^(-2/3)", Stress.Pow(NewRat(-2, 3)), 1}, {"mm/m", "mm/m", None, 1e-3},
	} {
		u, err := ParseUnit(c.in)
		if c.factor == 0 {
			if err == nil {
				t.Errorf("%q is read as %v", c.in, u)
			}
			continue
		}
		if err != nil {
			t.Errorf("%q: %v", c.in, err)
			continue
		}
		if u.String() != c.out || u.Dim() != c.dim || math.Abs(u.Factor()/c.factor-1) > 3e-16 {
			t.Errorf("%q: have %q, %v, %v, want %q, %v, %v", c.in, u, u.Dim(), u.Factor(), c.out, c.dim, c.factor)
		}
		if again, err := ParseUnit(u.String()); err != nil || again != u {
			t.Errorf("%q printed %q is read as %v (%v)", c.in, u, again, err)
		}
		if n := u.From(u.To(12.5)); math.Abs(n-12.5) > 4e-15 {
			t.Errorf("%q: 12.5 there and back is %v", c.in, n)
		}
	}
	if (Unit{}).Factor() != 1 || (Unit{}).Dim() != None || (Unit{}).To(3) != 3 {
		t.Error("the zero value is not the plain number")
	}
}

func TestUnitErrors(t *testing.T) {
	for in, want := range map[string]string{
		"Kn":          "unknown unit Kn: write kN",
		"KN/m2":       "unknown unit KN in KN/m2: write kN/m2",
		"Mpa":         "unknown unit Mpa: write MPa",
		"C":           "unknown unit C: write °C",
		"days":        "unknown unit days: write d",
		"knm":         "unknown unit knm: write kN·m",
		"psi":         "unknown unit psi",
		"furlong":     "unknown unit furlong",
		"kN m":        "unit kN m has units side by side: write kN·m",
		"kN/m/m":      "unit kN/m/m has more than one /: put the denominator in brackets, as 1/(MPa·d)",
		"1/MPa·d":     "unit 1/MPa·d has a product after /: put it in brackets, as 1/(MPa·d)",
		"1/kNm":       "unit 1/kNm has a product after /: put it in brackets, as 1/(MPa·d)",
		"1/(kN·m":     "unit 1/(kN·m has an open bracket",
		"/m":          "unit /m begins with /: write 1/m",
		"m^":          "unit m^ lacks an exponent after ^: write it as mm^2",
		"m^(1/0)":     "power of m is out of range in unit m^(1/0)",
		"m^0":         "power of m is out of range in unit m^0",
		"m^13":        "power of m is out of range in unit m^13",
		"10^99 m":     "power of ten 99 is out of range in unit 10^99 m",
		"106 mm4":     "unit 106 mm4 begins with a number: write a power of ten as 10⁶ or 10^6",
		"km^12·km^12": "unit km^12·km^12 is out of range",
		"kN·":         "unit kN· lacks a name at its end",
		"5 mm":        "unit 5 mm has a number in it",
		"mm)":         "unit mm) has ) left over",
		"m99999":      "unit m99999 has an exponent out of range",
	} {
		u, err := ParseUnit(in)
		if err == nil || err.Error() != want {
			t.Errorf("%q: have %v (%v), want %s", in, err, u, want)
		}
	}
	defer func() {
		if recover() == nil {
			t.Error("MustUnit takes anything")
		}
	}()
	MustUnit("foo")
}

func TestCustomaryUnits(t *testing.T) {
	for d := range names {
		u := d.Customary()
		again, err := ParseUnit(u.String())
		if err != nil || again != u || u.Dim() != d {
			t.Errorf("%v: customary unit %q is read as %q, %v (%v)", d, u, again, again.Dim(), err)
		}
	}
}

func TestNearest(t *testing.T) {
	known := []string{"depth", "width", "web width", "top flange", "span", "I"}
	for word, want := range map[string]string{
		"dept": "depth", "dpeth": "depth", "Width": "width", "wdith": "width", "web widht": "web width", "spam": "span",
		"topflange": "top flange", "i": "I", "x": "", "": "", "length": "", "depth": "depth",
	} {
		if got, ok := Nearest(word, known); got != want && ok || ok != (want != "") {
			t.Errorf("%q: have %q, want %q", word, got, want)
		}
	}
}
