package quantity

import (
	"math"
	"strings"
	"testing"
)

func TestParse(t *testing.T) {
	for _, c := range []struct {
		in, out string
		base    float64
	}{
		{"1200 kN", "1200 kN", 1.2e6}, {"1200kN", "1200 kN", 1.2e6}, {" 1 200 kN", "1200 kN", 1.2e6}, {"1\u2009234\u202f567.5 N", "1234567.5 N", 1234567.5},
		{"−0.5 ‰", "-0.5 ‰", -0.0005}, {"-0.5‰", "-0.5 ‰", -0.0005}, {"+3 m", "3 m", 3000}, {"5%", "5 %", 0.05}, {"0.85", "0.85", 0.85},
		{"0 mm", "0 mm", 0}, {"-0 mm", "-0 mm", 0}, {"1e-5 1/K", "1e-5 1/K", 1e-5}, {"1E+3 N", "1e3 N", 1000}, {"2e−3 m", "2e-3 m", 2},
		{"5·10⁶ mm⁴", "5·10⁶ mm⁴", 5e6}, {"5 10^6 mm4", "5·10⁶ mm⁴", 5e6}, {"5×10⁶mm⁴", "5·10⁶ mm⁴", 5e6}, {"12.0 10⁻⁶/K", "12.0·10⁻⁶/K", 12e-6},
		{"28 d", "28 d", 28}, {"50 y", "50 y", 18250}, {"12 h", "12 h", 0.5}, {"3d", "3 d", 3}, {"5 1/m", "5 1/m", 0.005},
		{"100000000000000000 N", "100000000000000000 N", 1e17}, {"0.000123456789012345", "0.000123456789012345", 0.000123456789012345},
		{"5 100 mm", "5100 mm", 5100},
	} {
		l, err := Parse(c.in)
		if err != nil {
			t.Errorf("%q: %v", c.in, err)
			continue
		}
		if q := l.Quantity(); l.String() != c.out || math.Abs(q.Value-c.base) > 1e-15*math.Abs(c.base) || q.Dim != l.Unit.Dim() {
			t.Errorf("%q: have %q, %v, want %q, %v", c.in, l, q.Value, c.out, c.base)
		}
		if again, err := Parse(l.String()); err != nil || again != l {
			t.Errorf("%q printed %q is read as %v (%v)", c.in, l, again, err)
		}
	}
	if math.Signbit(MustLiteral(t, "-0 mm").Quantity().Value) {
		t.Error("minus zero is carried")
	}
}

func TestParseErrors(t *testing.T) {
	for in, want := range map[string]string{
		"":                   "empty value: write a number with its unit",
		"kN":                 "kN does not begin with a number: write a number with its unit",
		"NaN m":              "NaN m does not begin with a number: write a number with its unit",
		".nan":               ".nan does not begin with a number: write a number with its unit",
		"-Inf kN":            "-Inf kN does not begin with a number: write a number with its unit",
		"0,5 m":              "decimal comma in 0,5 m: write 0.5 m",
		"0,500 m":            "decimal comma in 0,500 m: write 0.500 m",
		"-12,75 kN":          "decimal comma in -12,75 kN: write -12.75 kN",
		"1,200 kN":           "comma in 1,200 kN: write 1.200 kN or 1200 kN",
		"1,200.5 kN":         "comma in 1,200.5 kN: write 1200.5 kN",
		"1,200,300 N":        "comma in 1,200,300 N: write 1200300 N",
		"12, kN":             "comma in 12, kN: write 12 kN",
		"1.200.300 N":        "1.200.300 N has more than one point or comma",
		".5 m":               ".5 m begins with a point: write 0.5 m",
		"-.5 m":              "-.5 m begins with a point: write -0.5 m",
		"5. m":               "5. m has a point without decimals: write 5 m",
		"007 m":              "007 m begins with a zero: write 7 m",
		"00 m":               "00 m begins with a zero: write 0 m",
		"0x1f m":             "unknown unit x in x1f m",
		"350 Kn":             "unknown unit Kn: write 350 kN",
		"5 kN m":             "unit kN m has units side by side: write 5 kN·m",
		"5·kN":               "5·kN has a product sign after the number: write 5 kN",
		"1e500":              "1e500 is out of range",
		"1e-500 m":           "1e-500 is out of range",
		"1e200 m":            "1e200 m is out of range",
		"1e-200 m":           "1e-200 m is out of range",
		"1.2345678901234567": "1.2345678901234567 has more than 15 significant digits",
		"5 mm 3 mm":          "unit mm 3 mm has 3 mm left over",
		"18 \xff":            "value is not text in UTF-8",
		"12 m\x00":           "unit m\uFFFD has \uFFFD left over",
	} {
		l, err := Parse(in)
		if err == nil {
			t.Errorf("%q is read as %v", in, l)
			continue
		}
		if err.Error() != want {
			t.Errorf("%q:\nhave %v\nwant %s", in, err, want)
		}
		if _, ok := err.(*Error); !ok {
			t.Errorf("%q: error is a %T", in, err)
		}
	}
}

func TestWant(t *testing.T) {
	for _, c := range []struct {
		in   string
		want Dim
		text string
	}{
		{"18.3", Length, "have 18.3, want a length: write 18.3 mm"},
		{"350 kN", Length, "have 350 kN, want a length: write 350 mm"},
		{"35 %", Stress, "have 35 %, want a stress: write 35 MPa"},
		{"0.85 m", None, "have 0.85 m, want a plain number: write 0.85"},
		{"0,5", Length, "decimal comma in 0,5: write 0.5"},
		{"18.3 cm", Length, ""}, {"85 %", None, ""},
	} {
		_, err := ParseAs(c.in, c.want)
		if got := ""; err != nil {
			if got = err.Error(); got != c.text {
				t.Errorf("%s: have %s, want %s", c.in, got, c.text)
			}
		} else if c.text != "" {
			t.Errorf("%s: no error, want %s", c.in, c.text)
		}
	}
}

func TestMessagesAreBounded(t *testing.T) {
	for _, in := range []string{strings.Repeat("9", 1e5), strings.Repeat("k", 1e5), "1 " + strings.Repeat("k", 1e5), "1,5" + strings.Repeat(" ", 1e5) + "x", "1 " + strings.Repeat("m·", 1e5)} {
		if _, err := Parse(in); err == nil || len(err.Error()) > 400 {
			t.Errorf("%.20s…: message of %d bytes", in, len(err.Error()))
		}
	}
}
