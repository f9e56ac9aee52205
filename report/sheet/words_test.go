package sheet

import (
	"strings"
	"testing"

	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
)

func TestPrinted(t *testing.T) {
	for in, want := range map[string]string{"0": "0", "-3.5": "−3.5", "1234.5": "1234.5", "12345": "12 345", "-1234567.25": "−1 234 567.25",
		"0.000012345": "0.000012345", "1e-6": "1e-6"} {
		if got := strings.ReplaceAll(printed(in), "\u2009", " "); got != want {
			t.Errorf("%s is printed %q, want %q", in, got, want)
		}
	}
}

func TestInitials(t *testing.T) {
	for in, want := range map[string]string{"": "", "Ines Marten": "IM", "Tomas Aldridge-Weiss": "TAW", "jörg o'neill": "JO", "Åsa Öberg": "ÅÖ"} {
		if got := initials(in); got != want {
			t.Errorf("initials of %q: %q, want %q", in, got, want)
		}
	}
}

func TestShort(t *testing.T) {
	if got, want := short("sha256:0123456789abcdef"), "0123 4567 89ab"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestNatural(t *testing.T) {
	order := []string{"2.4", "3.1.7(3)", "3.1.10", "3.1.10(1)", "9.2", "10.1", "B.1"}
	for i := 1; i < len(order); i++ {
		if natural(order[i-1], order[i]) >= 0 || natural(order[i], order[i-1]) <= 0 {
			t.Errorf("%s does not come before %s", order[i-1], order[i])
		}
	}
}

func TestCapital(t *testing.T) {
	for in, want := range map[string]string{"depth of the section": "Depth of the section", "x": "x", "E modulus": "E modulus",
		"f_ctm at release": "f_ctm at release", "ψ of snow": "ψ of snow", "élan": "Élan", "": ""} {
		if got := capital(in); got != want {
			t.Errorf("%q becomes %q, want %q", in, got, want)
		}
	}
}

func TestWrap(t *testing.T) {
	const w = 60
	for _, s := range []string{"a few words that go on", "unbreakablewordthatisfartoolongforthecolumn", "KD-S-CN-0412-rev-P02-for-review", "x"} {
		lines := wrap(draw.Serif, 10, w, s)
		for _, l := range lines {
			if got := draw.Width(draw.Serif, 10, l); got > w {
				t.Errorf("%q is %.1f wide", l, float64(got))
			}
		}
		if got, want := strings.ReplaceAll(strings.Join(lines, ""), " ", ""), strings.ReplaceAll(s, " ", ""); got != want {
			t.Errorf("%q became %q", s, lines)
		}
	}
}

func TestSymbolOrder(t *testing.T) {
	order := []string{"A_c", "A_{c,n}", "A_co", "A_p", "A_{p,i}", "a", "ΔF", "F_c", "f_cd", "f_ck", "x", "α_cc", "σ_c", "Δσ_p"}
	for i := 1; i < len(order); i++ {
		a, err := formula.ParseSymbol(order[i-1])
		if err != nil {
			t.Fatal(err)
		}
		b, err := formula.ParseSymbol(order[i])
		if err != nil {
			t.Fatal(err)
		}
		if symbolOrder(a) >= symbolOrder(b) {
			t.Errorf("%s does not come before %s", order[i-1], order[i])
		}
	}
}

// TestOneLineForAMeaning: a symbol defined at several places in the same words has one line with all of them.
func TestOneLineForAMeaning(t *testing.T) {
	var repeated int
	for _, m := range meanings(fixture(t, 3)) {
		if m.symbol.Name == "f_cd" {
			repeated++
			if len(m.at) != 3 {
				t.Errorf("f_cd is said to stand at %v, want three places", m.at)
			}
		}
	}
	if repeated != 1 {
		t.Errorf("f_cd has %d lines, want 1", repeated)
	}
}

func TestRunsOfNumbers(t *testing.T) {
	for in, want := range map[string]string{
		"1.2.3":                               "in 1.2.3",
		"1.2.3 1.2.4":                         "in 1.2.3, 1.2.4",
		"1.2.9 1.2.10 1.2.11 1.3.1":           "in 1.2.9 … 1.2.11, 1.3.1",
		"1.2.1 1.2.2 1.2.3 1.2.4 1.3.5":       "in 1.2.1 … 1.2.4, 1.3.5",
		"1.1.1 1.2.2 1.2.3 1.2.4":             "in 1.1.1, 1.2.2 … 1.2.4",
		"1.1.1 1.2.2 1.3.3":                   "in 1.1.1, 1.2.2, 1.3.3",
		"1.1.1 1.1.2 1.1.3 1.1.5 1.1.6":       "in 1.1.1 … 1.1.3, 1.1.5, 1.1.6",
		"1.1.1 1.1.2 1.1.3 1.2.1 1.2.2 1.2.3": "in 1.1.1 … 1.1.3, 1.2.1 … 1.2.3",
	} {
		var ms []mention
		for _, s := range strings.Fields(in) {
			ms = append(ms, mention{s, "to " + s})
		}
		var got []string
		for _, b := range runs("in", ms) {
			got = append(got, b.text)
		}
		if s := strings.Join(got, " "); s != want {
			t.Errorf("%s is listed %q, want %q", in, s, want)
		}
	}
}

func TestVerdictInWords(t *testing.T) {
	check := func(ratio, margin string, value float64, fails bool) *trace.Check {
		return &trace.Check{Ratio: []string{ratio}, Margin: []string{margin}, Value: []float64{value}, Fails: []bool{fails}}
	}
	j := judgement{checks: []*trace.Check{check("0.5", "", 0.5, false)}}
	for n, want := range map[int]string{0: "The one check of this note passes", 1: "The one check of this note fails"} {
		j.fail = n
		if got := j.words(); got != want {
			t.Errorf("have %q, want %q", got, want)
		}
	}
	j.checks = make([]*trace.Check, 31)
	for n, want := range map[int]string{0: "All 31 checks pass", 1: "One of 31 checks fails", 2: "Two of 31 checks fail", 31: "All 31 checks fail"} {
		j.fail = n
		if got := j.words(); got != want {
			t.Errorf("have %q, want %q", got, want)
		}
	}
}

func TestChecksByWeight(t *testing.T) {
	j := judge(fixture(t, 1))
	var names []string
	for _, k := range j.checks {
		names = append(names, k.Key[strings.IndexByte(k.Key, '/')+1:])
	}
	if got, want := strings.Join(names, " "), "most bending least decompression"; got != want {
		t.Errorf("checks come as %q, want %q", got, want)
	}
	if j.fail != 1 {
		t.Errorf("%d fail, want 1", j.fail)
	}
}
