package trace_test

import (
	"bytes"
	"math"
	"strings"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// A beam section in a few formulas, over stations and rows; all figures invented.
var (
	fcd      = &clause.Formula{ID: "fcd", Name: "design strength", Text: "f_cd = α·f_ck/γ_C", Unit: "MPa"}
	area     = &clause.Formula{ID: "area", Name: "area of a row", Text: "A_{p,i} = n_i·A_1", Unit: "mm²"}
	total    = &clause.Formula{ID: "total", Name: "total area", Text: "A_p = Σ_i(A_{p,i})", Unit: "mm²"}
	stress   = &clause.Formula{ID: "stress", Name: "stress", Text: "σ_{p,i} = f·min(1; x/l_i)", Unit: "MPa"}
	force    = &clause.Formula{ID: "force", Name: "force", Text: "F = Σ_i(A_{p,i}·σ_{p,i})", Unit: "kN"}
	shallow  = &clause.Formula{ID: "shallow", Name: "lever arm near the end", Text: "z = 0.8·h", Unit: "mm"}
	deep     = &clause.Formula{ID: "deep", Name: "lever arm", Text: "z = h − F/(2·b·f_cd)", Unit: "mm"}
	moment   = &clause.Formula{ID: "moment", Name: "resistance", Text: "M_Rd = F·z", Unit: "kN·m"}
	demand   = &clause.Formula{ID: "demand", Name: "demand", Text: "M_Ed = q·x·(L − x)/2", Unit: "kN·m"}
	near     = &clause.Condition{ID: "near", Name: "near the end", Text: "x < 1·[m]", Yes: "near", No: "away"}
	enough   = &clause.Check{ID: "enough", Name: "bending", Demand: "M_Ed", Limit: "M_Rd"}
	residual = &clause.Formula{ID: "residual", Name: "left over", Text: "r = y^2 − A_p", Unit: "mm²"}
	side     = &clause.Root{ID: "side", Name: "side of a square of the same area", Unknown: "y", Unit: "mm", Equation: "y^2 = A_p",
		Residual: residual, Scale: "A_p", Tolerance: 1e-3}
)

func lit(t testing.TB, s string) quantity.Literal {
	t.Helper()
	l, err := quantity.Parse(s)
	if err != nil {
		t.Fatal(err)
	}
	return l
}

func lits(t testing.TB, list string) []quantity.Literal {
	t.Helper()
	var out []quantity.Literal
	for _, s := range strings.Split(list, ",") {
		out = append(out, lit(t, strings.TrimSpace(s)))
	}
	return out
}

func given(symbol, unit string) *clause.Given {
	return &clause.Given{ID: "g-" + strings.ToLower(strings.NewReplacer("{", "", "}", "", ",", "-", "_", "-", "α", "alpha", "γ", "gamma").Replace(symbol)),
		Symbol: symbol, Name: "given " + symbol, Unit: unit}
}

// fixture builds a record; q is the load, which decides whether the check passes.
func fixture(t testing.TB, q string) *trace.Note {
	n := trace.New(trace.Document{Program: "test", Title: "invented beam", InputName: "x.yaml"})
	rows := n.Axis("row", "row", "i", []string{"low", "high"})
	stations := n.Axis("station", "station", "", []string{"A", "0.1 L", "mid-span"})
	c := n.Chapter("given", "Given")
	g := c.Block("values", "Values", nil)
	for _, v := range [][3]string{{"α", "", "0.85"}, {"f_ck", "MPa", "45 MPa"}, {"γ_C", "", "1.5"}, {"A_1", "mm²", "139 mm²"}, {"f", "MPa", "1426.1 MPa"},
		{"h", "mm", "60 cm"}, {"b", "mm", "300 mm"}, {"L", "m", "10 m"}, {"q", "kN/m", q}} {
		g.Given(given(v[0], v[1]), lit(t, v[2]), "test")
	}
	g.GivenRows(given("n_i", ""), rows, lits(t, "4, 2"), "test")
	g.GivenRows(given("l_i", "mm"), rows, lits(t, "1.2 m, 900 mm"), "test")
	c = n.Chapter("work", "Work")
	s := c.Block("section", "Section", nil, trace.Take(g)...)
	s.Steps(fcd, area, total)
	s.Root(side, func(r *trace.Row) (trace.Proposal, error) {
		x := math.Sqrt(r.Value("A_p"))
		return trace.Proposal{X: x, Lo: 0, Hi: 2 * x}, nil
	})
	s.Step(residual)
	s.Prove(side)
	b := c.Block("bending", "Bending", stations, trace.Take(g, s)...)
	b.GivenRows(given("x", "m"), stations, lits(t, "0.5 m, 1 m, 5 m"), "test")
	b.Steps(stress, force)
	yes, no := b.Choose(near)
	b.On(yes, func() { b.Step(shallow) })
	b.On(no, func() { b.Step(deep) })
	b.Steps(moment, demand)
	b.Check(enough)
	b.Text("words", "At the worst place {M_Ed} stands against {M_Rd}.")
	b.Table("along", "along the beam", stations, "g-x", "moment", "demand")
	return n
}

func TestCarriedIsPrinted(t *testing.T) {
	n := fixture(t, "30 kN/m")
	if err := n.Err(); err != nil {
		t.Fatal(err)
	}
	for key, want := range map[string]string{
		"work.section/fcd":     "25.500",
		"work.section/area":    "556.00 278.00",
		"work.section/total":   "834.00",
		"work.bending/stress":  "594.2 792.3 1188.4 1426.1 1426.1 1426.1",
		"work.bending/shallow": "480.00  ",
		"work.bending/demand":  "71.25 135.00 375.00",
	} {
		l := trace.LineOf(n.Entry(key))
		if l == nil {
			t.Errorf("%s is not recorded", key)
			continue
		}
		if got := strings.Join(l.Shown, " "); got != want {
			t.Errorf("%s: %q, want %q", key, got, want)
		}
		for i, s := range l.Shown {
			if s == "" {
				continue
			}
			v, err := quantity.Value(s)
			if err != nil || l.Unit.To(v) != l.Values[i] {
				t.Errorf("%s: carries %v, prints %s", key, l.Values[i], s)
			}
		}
	}
}

// TestClosureFromJSON proves every value from the file alone, after the unrounded values are made useless.
func TestClosureFromJSON(t *testing.T) {
	n := fixture(t, "30 kN/m")
	data, err := n.JSON()
	if err != nil {
		t.Fatal(err)
	}
	back, err := trace.Read(bytes.NewReader(data))
	if err != nil {
		t.Fatal(err)
	}
	back.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		if l := trace.LineOf(e); l != nil {
			for i := range l.Shadow {
				l.Shadow[i] = math.NaN()
			}
		}
	})
	proved, differences := trace.Closure(back)
	for _, d := range differences {
		t.Error(d)
	}
	if proved < 30 {
		t.Errorf("only %d values proved", proved)
	}
	again, err := mustRead(t, data).JSON()
	if err != nil || !bytes.Equal(again, data) {
		t.Errorf("the record does not come back as it was: %v", err)
	}
}

func mustRead(t testing.TB, data []byte) *trace.Note {
	n, err := trace.Read(bytes.NewReader(data))
	if err != nil {
		t.Fatal(err)
	}
	return n
}

// TestClosureFindsTampering changes one printed digit at a time: each change is found.
func TestClosureFindsTampering(t *testing.T) {
	data, err := fixture(t, "30 kN/m").JSON()
	if err != nil {
		t.Fatal(err)
	}
	for _, swap := range [][2]string{{`"25.500"`, `"25.501"`}, {`"594.2"`, `"594.3"`}, {`"834.00"`, `"834.10"`}, {`"yes",`, `"no",`}, {`"71.25"`, `"71.26"`}} {
		bad := bytes.Replace(data, []byte(swap[0]), []byte(swap[1]), 1)
		if bytes.Equal(bad, data) {
			t.Fatalf("%s is not in the file", swap[0])
		}
		if _, differences := trace.Closure(mustRead(t, bad)); len(differences) == 0 {
			t.Errorf("%s for %s: not found", swap[1], swap[0])
		}
	}
}

func TestVerdict(t *testing.T) {
	for _, c := range []struct {
		q     string
		fails bool
	}{{"30 kN/m", false}, {"60 kN/m", true}} {
		n := fixture(t, c.q)
		if err := n.Err(); err != nil {
			t.Fatal(err)
		}
		check := n.Checks()[0]
		if check.Failed() != c.fails {
			t.Errorf("q = %s: failed %v", c.q, check.Failed())
		}
		if effect, _ := n.Rounding(); !(effect < 0.002) {
			t.Errorf("rounding moves a check by %g", effect)
		}
	}
}

// TestNeverUnityAboveUnity: a demand a hair above the limit fails and is not printed as 1.000.
func TestNeverUnityAboveUnity(t *testing.T) {
	for _, c := range []struct{ demand, ratio string }{{"100.001 kN", "1.001"}, {"100 kN", "1.000"}, {"99.9999 kN", "1.000"}, {"-3 kN", "0.000"}} {
		n := trace.New(trace.Document{})
		b := n.Chapter("c", "C").Block("b", "B", nil)
		b.Given(given("E", "kN"), lit(t, c.demand), "test")
		b.Given(given("R", "kN"), lit(t, "100 kN"), "test")
		b.Check(&clause.Check{ID: "check", Demand: "E", Limit: "R"})
		if err := n.Err(); err != nil {
			t.Fatal(err)
		}
		k := n.Checks()[0]
		if k.Ratio[0] != c.ratio || k.Failed() != (c.ratio == "1.001") {
			t.Errorf("%s of 100 kN: ratio %s, fails %v", c.demand, k.Ratio[0], k.Failed())
		}
	}
}

func TestNoInheritedScope(t *testing.T) {
	step := func(text string) *clause.Formula {
		return &clause.Formula{ID: "s", Name: "s", Text: text, Unit: "kN"}
	}
	for name, c := range map[string]struct {
		build func(n *trace.Note)
		want  string
	}{
		"twice": {func(n *trace.Note) {
			c := n.Chapter("c", "C")
			a, b := c.Block("a", "A", nil), c.Block("b", "B", nil)
			a.Given(given("F", "kN"), lit(t, "1 kN"), "test")
			b.Given(given("F", "kN"), lit(t, "2 kN"), "test")
			c.Block("d", "D", nil, trace.Take(a, b)...).Step(step("G = 2·F"))
		}, "supplied twice, by c.a and c.b"},
		"not at all": {func(n *trace.Note) {
			c := n.Chapter("c", "C")
			a := c.Block("a", "A", nil)
			a.Given(given("F", "kN"), lit(t, "1 kN"), "test")
			b := c.Block("b", "B", nil, trace.Take(a)...)
			b.Step(step("G = 2·F"))
			c.Block("d", "D", nil, trace.Take(b)...).Step(step("H = F + G"))
		}, "symbol F is supplied by nobody"},
		"dimension": {func(n *trace.Note) {
			b := n.Chapter("c", "C").Block("b", "B", nil)
			b.Given(given("F", "kN"), lit(t, "1 kN"), "test")
			b.Given(given("l", "m"), lit(t, "2 m"), "test")
			b.Step(step("G = F + l"))
		}, "length"},
		"zero": {func(n *trace.Note) {
			b := n.Chapter("c", "C").Block("b", "B", nil)
			b.Given(given("F", "kN"), lit(t, "1 kN"), "test")
			b.Given(given("k", ""), lit(t, "0"), "test")
			b.Step(step("G = F/k"))
		}, "zero"},
		"domain": {func(n *trace.Note) {
			b := n.Chapter("c", "C").Block("b", "B", nil)
			b.Given(given("F", "kN"), lit(t, "7 kN"), "test")
			b.Step(&clause.Formula{ID: "s", Text: "G = 2·F", Unit: "kN", Domain: "F ≤ 5·[kN]"})
		}, "outside its domain F ≤ 5·[kN]: F = 7 kN"},
		"unproved root": {func(n *trace.Note) {
			b := n.Chapter("c", "C").Block("b", "B", nil)
			b.Given(given("A_p", "mm²"), lit(t, "100 mm²"), "test")
			b.Root(side, func(*trace.Row) (trace.Proposal, error) { return trace.Proposal{X: 9}, nil })
			b.Step(residual)
			b.Prove(side)
		}, "no solution"},
		"wrong row": {func(n *trace.Note) {
			c := n.Chapter("c", "C")
			stations := n.Axis("station", "station", "", []string{"A", "B"})
			a := c.Block("a", "A", stations)
			a.GivenRows(given("F", "kN"), stations, lits(t, "1 kN, 2 kN"), "test")
			c.Block("d", "D", nil, trace.Take(a)...).Step(step("G = 2·F"))
		}, "take it at a row"},
	} {
		n := trace.New(trace.Document{})
		c.build(n)
		if err := n.Err(); err == nil || !strings.Contains(err.Error(), c.want) {
			t.Errorf("%s: %v, want %q in it", name, err, c.want)
		}
	}
}

// TestFingerprints: names and narrative leave the engineering fingerprint alone; a load does not.
func TestFingerprints(t *testing.T) {
	a, b, c := fixture(t, "30 kN/m"), fixture(t, "30 kN/m"), fixture(t, "31 kN/m")
	b.Document.Roles = []trace.Role{{Role: "checked", Name: "somebody"}}
	if a.Fingerprint() != b.Fingerprint() || a.DocumentFingerprint() == b.DocumentFingerprint() {
		t.Error("a name must move the document's fingerprint alone")
	}
	if a.Fingerprint() == c.Fingerprint() {
		t.Error("a load must move the engineering fingerprint")
	}
}

func BenchmarkTrace(b *testing.B) {
	for b.Loop() {
		if err := fixture(b, "30 kN/m").Err(); err != nil {
			b.Fatal(err)
		}
	}
}
