package diagram

import (
	"math"
	"slices"
	"strings"
	"testing"

	"soffit/report/draw"
)

// TestElevationShowsEdges: an elevation that knows the parts of the section has a thin line over the whole length for
// each edge between them, and one for each row of bars.
func TestElevationShowsEdges(t *testing.T) {
	m := tBeam()
	n, figs := m.note(t)
	long := func(id string) int {
		r, widest, count := drawn(t, n, figs[id], 510), draw.Pt(0), 0
		for _, k := range r.Ink {
			if k.Kind == draw.AreaInk {
				widest = max(widest, k.Box.Width())
			}
		}
		for _, k := range r.Ink {
			if k.Kind == draw.StrokeInk && k.Box.Height() < 0.5 && k.Box.Width() > widest-4 && k.Box.Width() < widest+1 {
				count++
			}
		}
		return count
	}
	if got, want := long("fig-elevation-parts")-long("fig-elevation"), len(m.parts)-1+len(m.bars); got != want || want < 3 {
		t.Errorf("%d lines more, want %d", got, want)
	}
	texts := strings.Join(drawn(t, n, figs["fig-elevation-parts"], 510).Texts(), " ")
	for _, b := range m.bars {
		if !strings.Contains(texts, b.name) {
			t.Errorf("the bars %q are not named", b.name)
		}
	}
}

// TestArrowsOfForcesAreApart: rows a few millimetres from each other have arrows that can be told apart.
func TestArrowsOfForcesAreApart(t *testing.T) {
	n, figs := tBeam().note(t)
	var heads []draw.Pt
	for _, k := range drawn(t, n, figs["fig-ultimate"], 510).Ink {
		if k.Kind == draw.AreaInk && k.Tone == 0 && k.Box.Height() < 3.5 && k.Box.Height() > 3 && math.Abs(float64(k.Box.Width()-5)) < 0.1 {
			heads = append(heads, (k.Box.Y0+k.Box.Y1)/2)
		}
	}
	if len(heads) < 4 {
		t.Fatalf("%d arrows", len(heads))
	}
	slices.Sort(heads)
	for i := 1; i < len(heads); i++ {
		if d := heads[i] - heads[i-1]; d < 4 {
			t.Errorf("two arrows %.1f points apart", float64(d))
		}
	}
}

// TestStrainsAreWritten: the whole strain of a row with room stands in the picture of strains and in the listing.
func TestStrainsAreWritten(t *testing.T) {
	n, figs := tBeam().note(t)
	count := 0
	for _, s := range drawn(t, n, figs["fig-ultimate"], 510).Texts() {
		if s == "35.075" {
			count++
		}
	}
	if count != 2 {
		t.Errorf("the strain of the second row is written %d times, want 2", count)
	}
}

// TestLoadsKeepTheirLabels: two point loads whose names would meet stand in one tier, each beside its arrow.
func TestLoadsKeepTheirLabels(t *testing.T) {
	m := tBeam()
	m.loads = []load{{"self-weight", 8, 0, 0, m.length}, {"post one", 0, 18, m.length * 0.45, 0}, {"post two", 0, 18, m.length * 0.55, 0}}
	n, figs := m.note(t)
	var base []draw.Pt
	for _, k := range drawn(t, n, figs["fig-elevation"], 510).Ink {
		if k.Kind == draw.TextInk && strings.HasPrefix(k.Text, "post") {
			base = append(base, k.At.Y)
		}
	}
	if len(base) != 2 || base[0] != base[1] {
		t.Errorf("the labels stand at %v, want two on one line", base)
	}
}

func TestThreeRowsAbreast(t *testing.T) {
	if !Spacious("tendon-stress") {
		t.Error("the figure of tendon stress does not take the width of the sheet")
	}
	n, figs := tBeam().note(t)
	var titles []draw.Pt
	r := drawn(t, n, figs["fig-stress"], 490)
	for _, k := range r.Ink {
		if k.Kind == draw.TextInk && strings.HasPrefix(k.Text, "row ") {
			titles = append(titles, k.At.Y)
		}
	}
	if len(titles) != 3 || titles[0] != titles[2] {
		t.Errorf("the rows stand at %v, want three abreast", titles)
	}
	if !strings.Contains(strings.Join(r.Texts(), " "), "grey") {
		t.Error("the legend does not say what is grey")
	}
}

// TestForcesAlongAreSaid: a force along the member stands in words under the elevation, others do not.
func TestForcesAlongAreSaid(t *testing.T) {
	for _, m := range kindsOfSection() {
		n, figs := m.note(t)
		got := strings.Count(strings.Join(drawn(t, n, figs["fig-elevation"], 510).Texts(), "|"), "along the member, compression")
		if want := pick(m.ducts, 1, 0); got != want {
			t.Errorf("%s: said %d times, want %d", m.name, got, want)
		}
	}
}

// TestStressAlongDucts: stress that changes with friction is drawn over the whole length, bonded strands near end A.
func TestStressAlongDucts(t *testing.T) {
	for _, m := range kindsOfSection() {
		n, figs := m.note(t)
		texts := strings.Join(drawn(t, n, figs["fig-stress"], 510).Texts(), "|")
		if got := strings.Contains(texts, "|40"); got != m.ducts {
			t.Errorf("%s of %g m: whole length %t: %s", m.name, m.length, got, texts)
		}
	}
}
