package quantity

import (
	"math"
	"testing"
)

func TestAddingAForceToALength(t *testing.T) {
	force, length := MustLiteral(t, "350 kN").Quantity(), MustLiteral(t, "18.3 m").Quantity()
	_, err := Add(force, length)
	want := "cannot add a length to a force: 350 kN + 18300 mm"
	if err == nil || err.Error() != want {
		t.Errorf("have %v, want %s", err, want)
	}
	_, err = Sub(length, force)
	want = "cannot subtract a force from a length: 18300 mm − 350 kN"
	if err == nil || err.Error() != want {
		t.Errorf("have %v, want %s", err, want)
	}
	_, err = Compare(length, Quantity{0.85, None})
	want = "cannot compare a length with a plain number: 18300 mm and 0.85"
	if err == nil || err.Error() != want {
		t.Errorf("have %v, want %s", err, want)
	}
}

func MustLiteral(t *testing.T, s string) Literal {
	t.Helper()
	l, err := Parse(s)
	if err != nil {
		t.Fatal(err)
	}
	return l
}

func TestArithmetic(t *testing.T) {
	m := MustLiteral(t, "2 kN").Quantity()
	for _, c := range []struct {
		name string
		op   func(a, b Quantity) (Quantity, error)
		b    string
		want string // "" if it is an error
	}{
		{"+", Add, "500 N", "2.5 kN"}, {"−", Sub, "5 kN", "-3 kN"}, {"·", Mul, "3 m", "6 kN·m"},
		{"/", Div, "4 m", "0.5 kN/m"}, {"/", Div, "4 mm²", "500 MPa"}, {"/", Div, "1 kN", "2"}, {"/", Div, "0 m", ""},
		{"·", Mul, "2 s", "0.0462963 N·d"},
	} {
		got, err := c.op(m, MustLiteral(t, c.b).Quantity())
		if c.want == "" {
			if err == nil {
				t.Errorf("2 kN %s %s gives %v", c.name, c.b, got)
			}
			continue
		}
		if err != nil || got.String() != c.want {
			t.Errorf("2 kN %s %s: have %v (%v), want %s", c.name, c.b, got, err, c.want)
		}
	}
	huge := Quantity{1e300, Force}
	if q, err := Mul(huge, huge); err == nil {
		t.Errorf("overflow gives %v", q)
	}
	if _, err := Div(Quantity{1, Force}, Quantity{math.NaN(), Force}); err == nil {
		t.Error("division by NaN gives a value")
	}
}

func TestCompare(t *testing.T) {
	for _, c := range []struct {
		a, b float64
		want int
	}{
		{1, 2, -1}, {2, 1, 1}, {0.1 + 0.2, 0.3, 0}, {0.6 * 35, 21, 0}, {0, 1e-300, -1},
		{1, 1.0000000000001, -1}, {9.9999999999999, 9.9999999999998, 1}, {math.MaxFloat64, -math.MaxFloat64, 1},
	} {
		got, err := Compare(Quantity{c.a, Stress}, Quantity{c.b, Stress})
		if err != nil || got != c.want {
			t.Errorf("%v and %v: have %d (%v), want %d", c.a, c.b, got, err, c.want)
		}
	}
	if _, err := Compare(Quantity{math.NaN(), None}, Quantity{}); err == nil {
		t.Error("NaN compares")
	}
}

func TestDimNames(t *testing.T) {
	for d, want := range map[Dim]string{
		None: "a plain number", Length: "a length", Area: "an area", Force: "a force", Stress: "a stress", Moment: "a moment",
		LineLoad: "a line load", Density: "a density", SecondMoment: "a second moment of area", UnitWeight: "a unit weight",
		Force.Mul(Area).Mul(Time):               "a force·length²·time",
		None.Div(Area):                          "a 1/length²",
		None.Div(Stress.Mul(Time)):              "a length²/(force·time)",
		Stress.Pow(NewRat(2, 3)):                "a force^(2/3)/length^(4/3)",
		Length.Div(Temperature):                 "a length/temperature",
		Stress.Mul(Area).Div(Force):             "a plain number",
		Mass.Mul(Acceleration).Div(Area):        "a stress",
		Stress.Pow(NewRat(1, 2)).Mul(Curvature): "a force^(1/2)/length²",
	} {
		if got := d.Indefinite(); got != want {
			t.Errorf("have %s, want %s", got, want)
		}
	}
}
