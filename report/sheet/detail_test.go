package sheet

import (
	"strings"
	"testing"

	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

func recorded(t *testing.T, n *trace.Note) []*draw.Recorder {
	t.Helper()
	var out []*draw.Recorder
	if err := Draw(n, func(int, int) draw.Canvas {
		out = append(out, &draw.Recorder{})
		return out[len(out)-1]
	}); err != nil {
		t.Fatal(err)
	}
	return out
}

func TestNoTypeBelowTheSmallest(t *testing.T) {
	for i, r := range recorded(t, fixture(t, 1)) {
		for _, k := range r.Ink {
			if k.Kind == draw.TextInk && k.Size < mathset.Smallest-1e-9 {
				t.Errorf("sheet %d: %q of %s is set in %.2f points", i+1, k.Text, k.Owner, float64(k.Size))
			}
		}
	}
}

func TestTitleShowsBothFingerprints(t *testing.T) {
	n := fixture(t, 1)
	all := strings.Join(recorded(t, n)[0].Texts(), " ")
	for _, want := range []string{strings.TrimPrefix(n.Fingerprint(), "sha256:"), strings.TrimPrefix(n.DocumentFingerprint(), "sha256:"), "printed values", "narrative"} {
		if !strings.Contains(all, want) {
			t.Errorf("the title sheet does not show %q", want)
		}
	}
}

// TestResultKeepsTogether: a result somewhat too long for its column is set smaller on one line.
func TestResultKeepsTogether(t *testing.T) {
	c := newComposer(trace.New(trace.Document{}))
	s, err := formula.ParseSymbol("M_{Ed,max}")
	if err != nil {
		t.Fatal(err)
	}
	for number, want := range map[string]int{"12.5": 1, "12345.6789": 1, "12345678.90123456": 2} {
		e := &columns{head: &trace.Head{}, work: stack{w: workColumn.w}, result: stack{w: resultColumn.w}}
		c.result(e, &trace.Line{Symbol: s, Series: trace.Series{Shown: []string{number}}}, worked{flat: 0})
		if got := len(e.result.inks); got != want {
			t.Errorf("%s: %d lines, want %d", number, got, want)
		}
		for _, k := range e.result.inks {
			if k.x < -0.01 {
				t.Errorf("%s reaches out of its column", number)
			}
		}
	}
}

// TestTickOverBar: the place of 1.00 is white where a black bar passes it.
func TestTickOverBar(t *testing.T) {
	white := func(ratio float64) int {
		var r draw.Recorder
		bar(&r, slot{0, 100}, 20, ratio, ratio > 1)
		n := 0
		for _, k := range r.Ink {
			if k.Kind == draw.AreaInk && k.Tone == 1 && k.Box.X0 < 80 && k.Box.X1 > 80 {
				n++
			}
		}
		return n
	}
	if got := white(1.3); got != 1 {
		t.Errorf("%d white ticks over a bar of 1.30, want 1", got)
	}
	if got := white(0.7); got != 0 {
		t.Errorf("%d white ticks beside a bar of 0.70, want none", got)
	}
}

// TestWideWorkKeepsTheHairline: the hairline before the result is left out beside the long line alone.
func TestWideWorkKeepsTheHairline(t *testing.T) {
	e := &columns{head: &trace.Head{Number: "1.1.1"}, work: stack{w: workColumn.w}, result: stack{w: resultColumn.w}, wide: true}
	e.work.words(draw.Serif, textSize, textLead, 0, "a title")
	e.work.put(ink{face: draw.Serif, size: textSize, text: strings.Repeat("wide ", 16)}, 8, 2, 3, 12)
	e.result.words(draw.Bold, textSize, textLead, 0, "result")
	e.result.right(0, e.result.w)
	el := e.element(false)
	if el.spans != spanWide || len(el.across) != 1 {
		t.Fatalf("%d gaps, want 1", len(el.across))
	}
	if r := el.across[0]; r.from < textLead/2 || r.to > el.height {
		t.Errorf("the gap is from %.1f to %.1f of %.1f", float64(r.from), float64(r.to), float64(el.height))
	}
	p := &page{placed: []placed{{el, bodyTop, false}}}
	var r draw.Recorder
	(&furniture{sheets: 1}).columns(&r, p)
	pieces := 0
	for _, k := range r.Ink {
		if k.Kind == draw.StrokeInk && k.Box.X0 < rule2 && k.Box.X1 > rule2 && k.Box.Height() > 1 {
			pieces++
		}
	}
	if pieces != 2 {
		t.Errorf("the hairline is drawn in %d pieces, want 2", pieces)
	}
}

func TestListingInTwoColumns(t *testing.T) {
	parts := func(line string) (twins, single int) {
		c := newComposer(trace.New(trace.Document{Input: strings.Repeat(line+"\n", 40)}))
		c.listing()
		for _, e := range c.elements {
			if e.split != nil {
				twins++
			} else {
				single++
			}
		}
		return twins, single
	}
	if a, b := parts("depth: 900 mm"); a != 1 || b != 0 {
		t.Errorf("short lines: %d lists in two columns and %d lines, want one list", a, b)
	}
	if a, b := parts(strings.Repeat("a long line ", 7)); a != 0 || b != 40 {
		t.Errorf("long lines: %d lists in two columns and %d lines, want 40 lines", a, b)
	}
}

// TestListingSetCloser: the member file is set closer where that saves a sheet, and only there.
func TestListingSetCloser(t *testing.T) {
	const lines = 120
	c := newComposer(trace.New(trace.Document{Input: strings.Repeat("depth: 900 mm\n", lines)}))
	c.listing()
	for _, x := range []struct {
		room  draw.Pt
		rest  bool
		first draw.Pt
	}{
		{lines / 2 * listingLead, false, lines / 2 * listingLead},
		{lines / 2 * closeLead, false, lines / 2 * closeLead},
		{lines/2*closeLead - 1, true, lines/2*closeLead - 1},
	} {
		first, rest := c.elements[0].split(x.room + 0.01)
		if (rest != nil) != x.rest || first == nil || first.height < x.first-0.02 || first.height > x.first+0.02 {
			t.Errorf("in %.1f points: %.1f high, a rest %v", float64(x.room), float64(first.height), rest != nil)
		}
	}
}
