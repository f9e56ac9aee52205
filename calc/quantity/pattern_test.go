package quantity

import (
	"maps"
	"regexp"
	"slices"
	"testing"
)

// spellings are all units of up to two names with whole exponents, as the trade writes them.
func spellings() []string {
	names := slices.Concat(slices.Sorted(maps.Keys(atoms)), slices.Sorted(maps.Keys(joined)))
	raisings := []string{"", "²", "2", "^2", "³", "3", "^3", "⁴", "4", "^4", "⁵"}
	var out []string
	for _, a := range names {
		for _, p := range raisings {
			out = append(out, a+p, "1/"+a+p)
			for _, b := range names {
				out = append(out, a+"/"+b+p, a+"·"+b+p, a+"*"+b+p)
			}
		}
	}
	return out
}

// TestUnitPattern compares the pattern of each dimension with what ParseUnit makes of some thousand spellings.
func TestUnitPattern(t *testing.T) {
	patterns := map[Dim]*regexp.Regexp{}
	for d := range names {
		if p := d.UnitPattern(); p != "" {
			patterns[d] = regexp.MustCompile("^" + p + "$")
		}
	}
	for _, d := range []Dim{None, Length, Area, SecondMoment, Force, Stress, Moment, LineLoad, UnitWeight, MassPerLength, Density, Time, ThermalExpansion} {
		if patterns[d] == nil {
			t.Errorf("%s: no pattern", d)
		}
	}
	matched := map[Dim]int{}
	for _, s := range spellings() {
		u, err := ParseUnit(s)
		for d, p := range patterns {
			if !p.MatchString(s) {
				continue
			}
			matched[d]++
			if err != nil || u.Dim() != d {
				t.Errorf("%s: %q matches and reads as %s, %v", d, s, u.Dim(), err)
			}
		}
	}
	for d := range patterns {
		if matched[d] == 0 {
			t.Errorf("%s: nothing matches %s", d, patterns[d])
		}
	}
	for d, list := range map[Dim][]string{
		Length: {"mm", "m"}, Stress: {"MPa", "N/mm²", "N/mm2", "kN/m^2", "GPa"}, UnitWeight: {"kN/m³", "kN/m3", "kN/m^3"}, LineLoad: {"kN/m", "N/mm"},
		Moment: {"kN·m", "kNm", "kN*m"}, Area: {"mm²", "cm2"}, Time: {"y", "d"}, None: {"‰", "%"}, MassPerLength: {"kg/m", "g/m"}, Curvature: {"1/m"},
	} {
		for _, s := range list {
			if !patterns[d].MatchString(s) {
				t.Errorf("%s: %q does not match %s", d, s, patterns[d])
			}
		}
	}
	for _, s := range []string{"", "mmm", "kN", "m²", "MM", "m m", "mm."} {
		if patterns[Length].MatchString(s) {
			t.Errorf("%q matches as a length", s)
		}
	}
}

// TestNumberPattern holds the pattern against Parse.
func TestNumberPattern(t *testing.T) {
	plain, signed := regexp.MustCompile("^"+NumberPattern(false)+"$"), regexp.MustCompile("^"+NumberPattern(true)+"$")
	for _, s := range []string{"0", "1", "0.5", "12", "1200", "12 500", "12\u202F500.25", "1 234 567", "1e-5", "1.5E+3", "+3", "-3", "−0.5", "-1e−3",
		"", ".5", "5.", "05", "0200", "1,5", "1.5.1", "0x10", "1_0", "16O", "e5", "12 50", "0 500", "1234 567", "two", ".nan", "--1"} {
		l, err := Parse(s)
		reads := err == nil && l.Unit == Unit{}
		if signed.MatchString(s) != reads {
			t.Errorf("%q: Parse %v, pattern %v", s, err, !reads)
		}
		if minus := reads && l.Number[0] == '-'; plain.MatchString(s) != (reads && !minus) {
			t.Errorf("%q: pattern without a minus gives %v", s, plain.MatchString(s))
		}
	}
}
