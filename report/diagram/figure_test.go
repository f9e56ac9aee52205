package diagram

import (
	"bytes"
	"math"
	"reflect"
	"regexp"
	"strconv"
	"strings"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/quantity"
	"soffit/calc/trace"
	"soffit/report/draw"
)

func drawn(t testing.TB, n *trace.Note, f *trace.Figure, width draw.Pt) *draw.Recorder {
	t.Helper()
	fig, err := Lay(n, f, width)
	if err != nil {
		t.Fatal(err)
	}
	r := &draw.Recorder{}
	fig.Draw(r, 0, 0)
	return r
}

var numeral = regexp.MustCompile(`−?[0-9]+(\.[0-9]+)?`)

// TestNumbersComeFromTheRecord: every number on the figures without graduations is one that the record shows,
// apart from scales.
func TestNumbersComeFromTheRecord(t *testing.T) {
	for _, m := range append(samples(), kindsOfSection()...) {
		n, figs := m.note(t)
		shown := map[string]bool{}
		names := ""
		n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
			if l := trace.LineOf(e); l != nil {
				names += l.Symbol.Name + " "
				for _, s := range l.Shown {
					shown[strings.ReplaceAll(s, "-", "−")] = true
				}
			}
		})
		for _, a := range n.Axes {
			names += strings.Join(a.Rows, " ") + " "
		}
		for _, id := range []string{"fig-section", "fig-section-loose", "fig-elevation", "fig-elevation-parts", "fig-ultimate", "fig-ultimate-hogging", "fig-ultimate-curve"} {
			count := 0
			for _, width := range []draw.Pt{320, 510} {
				for _, text := range drawn(t, n, figs[id], width).Texts() {
					if strings.Contains(text, "1:") || strings.Contains(names, text) {
						continue
					}
					for _, number := range numeral.FindAllString(strings.ReplaceAll(text, "\u2009", ""), -1) {
						count++
						if !shown[number] {
							t.Errorf("%s: %q in %q is not in the record", id, number, text)
						}
					}
				}
			}
			if count < 8 {
				t.Errorf("%s has %d numbers", id, count)
			}
		}
	}
}

// TestSectionIsToScale measures the concrete on paper against the scale written under it.
func TestSectionIsToScale(t *testing.T) {
	m := tBeam()
	n, figs := m.note(t)
	for _, width := range []draw.Pt{320, 510} {
		r := drawn(t, n, figs["fig-section"], width)
		want := draw.Pt(0)
		for _, s := range r.Texts() {
			switch {
			case strings.Contains(s, "1:20,"):
				want = 20
			case strings.Contains(s, "1:15,"):
				want = 15
			}
		}
		if want == 0 {
			t.Fatal("no scale written")
		}
		for _, k := range r.Ink {
			if k.Kind == draw.AreaInk {
				w, h := k.Box.Width()/draw.Mm*want, k.Box.Height()/draw.Mm*want
				if math.Abs(float64(w-1200)) > 0.1 || math.Abs(float64(h-750)) > 0.1 {
					t.Errorf("at 1:%.0f the section measures %.2f mm by %.2f mm, want 1200 by 750", float64(want), float64(w), float64(h))
				}
				break
			}
		}
	}
}

// TestForcesAreInProportion measures the arrows of the tension forces.
func TestForcesAreInProportion(t *testing.T) {
	n, figs := tBeam().note(t)
	r := drawn(t, n, figs["fig-ultimate-bare"], 510)
	l := trace.LineOf(n.Entry("all.bending/force"))
	tendons := l.Axes[1]
	var want []float64
	for i := range tendons.Rows {
		at := trace.Place{{Axis: l.Axes[0], Row: l.Axes[0].Row("midspan")}, {Axis: tendons, Row: i}}
		want = append(want, l.Values[trace.Flat(l.Axes, at)])
	}
	// Shaft and head of one arrow lie on one height: a head's triangle with its tip at the right.
	var cut draw.Pt
	for _, k := range r.Ink { // the force in the block points at the cut
		if k.Kind == draw.AreaInk && k.Tone == 0 && k.Box.Width() > 4 {
			cut = k.Box.X0
			break
		}
	}
	var got []float64
	for _, k := range r.Ink {
		if k.Kind == draw.AreaInk && k.Tone == 0 && k.Box.Width() > 2 && k.Box.X0 >= cut-0.01 {
			got = append(got, float64(k.Box.X1-cut))
		}
	}
	got = got[1:] // without the force in the block
	if len(got) < len(want) {
		t.Fatalf("%d arrows, want %d", len(got), len(want))
	}
	for i := range want {
		if r := got[i] / got[0] / (want[i] / want[0]); math.Abs(r-1) > 0.01 {
			t.Errorf("arrow of row %s is %.3f times as long as in proportion", tendons.Rows[i], r)
		}
	}
}

// TestRecordReadBack: a figure of a record read from its file is the same.
func TestRecordReadBack(t *testing.T) {
	n, figs := iBeam().note(t)
	file, err := n.JSON()
	if err != nil {
		t.Fatal(err)
	}
	back, err := trace.Read(bytes.NewReader(file))
	if err != nil {
		t.Fatal(err)
	}
	for id, f := range figs {
		g, ok := back.Entry(f.Key).(*trace.Figure)
		if !ok {
			t.Fatalf("%s is not in the file", f.Key)
		}
		a, b := drawn(t, n, f, 510), drawn(t, back, g, 510)
		if !reflect.DeepEqual(a.Ink, b.Ink) {
			t.Errorf("%s differs after reading back", id)
		}
	}
}

// TestErrors: what a figure lacks is said by name.
func TestErrors(t *testing.T) {
	n, figs := tBeam().note(t)
	drop := func(id, role string) *trace.Figure {
		f := *figs[id]
		f.Series = nil
		for _, p := range figs[id].Series {
			if p.Role != role {
				f.Series = append(f.Series, p)
			}
		}
		return &f
	}
	swap := func(id, role, key string) *trace.Figure {
		f := drop(id, role)
		f.Series = append(f.Series, trace.Plot{Role: role, Key: key})
		return f
	}
	elsewhere := *figs["fig-ultimate"]
	elsewhere.At = "nowhere"
	strange := *figs["fig-section"]
	strange.Kind = "sketch"
	for _, c := range []struct {
		f     *trace.Figure
		width draw.Pt
		want  string
	}{
		{drop("fig-section", "level"), 400, `no entry in role "level"`},
		{drop("fig-elevation", "bearing-A"), 400, `no entry in role "bearing-A"`},
		{drop("fig-effects", "V-left-min"), 400, `no entry in role "V-left-min"`},
		{drop("fig-ultimate", "neutral-axis"), 400, `no entry in role "neutral-axis"`},
		{drop("fig-resistance", "x"), 400, `no entry in role "x"`},
		{drop("fig-stress", "available"), 400, `no entry in role "available"`},
		{swap("fig-section", "count", "all.geometry/corner-x"), 400, `role "count" runs over corners, want tendons`},
		{swap("fig-section", "count", "all.geometry/nothing"), 400, `role "count": no values under key all.geometry/nothing`},
		{swap("fig-effects", "M-max", "all.geometry/level"), 400, `M-max`},
		{swap("fig-section", "dimension-x2", "all.geometry/dimension-x1"), 400, `its ends are`},
		{swap("fig-section", "depth", "all.geometry/centroid"), 400, `the outline is 750.0 mm deep`},
		{swap("fig-ultimate", "h", "all.geometry/centroid"), 500, `the outline is 750.0 mm deep`},
		{drop("fig-section", "spacing"), 400, `no entry in role "spacing" or "position-x"`},
		{drop("fig-ultimate", "block-depth"), 400, `no entry in role "block-depth"`},
		{&elsewhere, 500, `needs a row of stations, has "nowhere"`},
		{&strange, 400, `no kind "sketch"`},
		{figs["fig-section"], 90, `mm of width, has 32 mm`},
	} {
		_, err := Lay(n, c.f, c.width)
		if err == nil || !strings.Contains(err.Error(), c.want) || !strings.Contains(err.Error(), c.f.Key) {
			t.Errorf("error is %v, want %q", err, c.want)
		}
	}
}

// TestSlightlyTooWide: a figure that needs up to 6 mm more than there is is laid out all the same; one that needs more says
// how much, in numbers that differ.
func TestSlightlyTooWide(t *testing.T) {
	said := regexp.MustCompile(`needs (\d+) mm of width, has (\d+) mm`)
	laid, over, refused := 0, 0, 0
	for _, m := range samples() {
		n, figs := m.note(t)
		for id, f := range figs {
			for width := 20 * draw.Mm; width < 200*draw.Mm; width += 9.7 {
				fig, err := Lay(n, f, width)
				if err == nil {
					laid++
					if fig.Width > width+6*draw.Mm {
						t.Errorf("%s, %s in %.1f mm is %.1f mm wide", m.name, id, width/draw.Mm, fig.Width/draw.Mm)
					} else if fig.Width > width+0.01 {
						over++
					}
					continue
				}
				refused++
				k := said.FindStringSubmatch(err.Error())
				if k == nil {
					t.Fatal(err)
				}
				needs, _ := strconv.Atoi(k[1])
				has, _ := strconv.Atoi(k[2])
				if needs < has+6 {
					t.Errorf("%s, %s: %v", m.name, id, err)
				}
			}
		}
	}
	if laid == 0 || over == 0 || refused == 0 {
		t.Errorf("%d laid out, %d of them wider than asked, %d refused", laid, over, refused)
	}
}

// TestBarsOfAToppingToCome: bars above the section that have no force yet are not on it, nor in the listing; with a force
// they are.
func TestBarsOfAToppingToCome(t *testing.T) {
	for _, c := range []struct {
		diameter float64
		listed   bool
	}{{0.01, false}, {12, true}} {
		m := tBeam()
		m.bars = append(m.bars, row{name: "slab bars", count: 2, spacing: 200, level: 800, diameter: c.diameter})
		n, figs := m.note(t)
		for _, id := range []string{"fig-ultimate-bare", "fig-ultimate", "fig-ultimate-hogging"} {
			ink := drawn(t, n, figs[id], 510)
			texts := strings.Join(ink.Texts(), "|")
			if got := strings.Contains(texts, "slab bars"); got != c.listed || !strings.Contains(texts, "soffit") {
				t.Errorf("%s, bars of %g mm: texts are %s", id, c.diameter, texts)
			}
		}
	}
}

// TestBranches: of two entries in one role the one computed at the place is drawn.
func TestBranches(t *testing.T) {
	n := trace.New(trace.Document{})
	stations := n.Axis("stations", "stations", "", []string{"a", "b", "c"})
	k := book{t, n, n.Chapter("c", "C").Block("b", "B", stations)}
	k.rows("x", "x", "m", 1, []*trace.Axis{stations}, []float64{0, 4, 8})
	k.rows("demand", "M_Ed", "kN·m", 1, []*trace.Axis{stations}, []float64{0, 51.2, 0})
	yes, no := k.b.Choose(&clause.Condition{ID: "middle", Name: "m", Text: "M_Ed > 0", Yes: "y", No: "n"})
	k.b.On(yes, func() { k.b.Step(&clause.Formula{ID: "rd-yes", Name: "r", Text: "M_Rd = 2·M_Ed", Unit: "kN·m"}) })
	k.b.On(no, func() { k.b.Step(&clause.Formula{ID: "rd-no", Name: "r", Text: "M_Rd = M_Ed", Unit: "kN·m"}) })
	k.b.Figure("f", "resistance", "F", "", trace.Plot{Role: "x", Key: "x"}, trace.Plot{Role: "demand", Key: "demand"},
		trace.Plot{Role: "resistance", Key: "rd-no"}, trace.Plot{Role: "resistance", Key: "rd-yes"})
	if err := n.Err(); err != nil {
		t.Fatal(err)
	}
	all := strings.Join(drawn(t, n, n.Entry("c.b/f").(*trace.Figure), 400).Texts(), "|")
	if !strings.Contains(all, "|102.4") || !strings.Contains(all, "|51.2") {
		t.Errorf("texts are %s", all)
	}
}

// TestCheckGivesTheRatio: the ratio on the figure is the one the check shows, rounded up, at its place.
func TestCheckGivesTheRatio(t *testing.T) {
	n, figs := iBeam().note(t)
	c := n.Checks()[0]
	texts := strings.Join(drawn(t, n, figs["fig-resistance"], 400).Texts(), "|")
	if !strings.Contains(texts, "|"+c.Ratio[c.Worst]+"|") {
		t.Errorf("ratio %s is not in %s", c.Ratio[c.Worst], texts)
	}
	if x := trace.LineOf(n.Entry("all.effects/x")).Shown[c.Worst]; !strings.Contains(texts, "|"+x) {
		t.Errorf("place %s is not in %s", x, texts)
	}
}

// TestOtherUnitsAreWritten: lengths not in mm carry their unit on a section.
func TestOtherUnitsAreWritten(t *testing.T) {
	l := &trace.Line{Series: trace.Series{Unit: quantity.MustUnit("cm")}}
	if in, mm := (label{}).length(cell{120, "12", l}), (label{}).length(cell{120, "120", &trace.Line{Series: trace.Series{Unit: quantity.MustUnit("mm")}}}); in.width <= mm.width {
		t.Error("a length in cm has no unit")
	}
}
