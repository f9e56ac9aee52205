package fonts

import (
	"math"
	"sync"
	"testing"
)

func TestRunesOfNotes(t *testing.T) {
	const letters = "αβγδεζηθικλμνξπρστυφχψωΔΣΦΨΩABCabc0123456789≤≥≠≈±·×−–—°′∑√∞‰%…½“”‘’éäöü²³¹"
	for _, f := range []Face{Serif, Italic, Bold} {
		for _, r := range letters {
			if !Has(f, r) {
				t.Errorf("%v lacks %q", f, r)
			}
		}
	}
	for _, r := range letters + "✓✗☐☑⁻⁰⁹↪⌀∅→" {
		if !Has(Marks, r) {
			t.Errorf("marks lack %q", r)
		}
	}
	if Has(Serif, 'ཀ') || Has(Serif, '\U0001D70E') || Has(Serif, -1) || Has(Serif, 0x10FFFF) {
		t.Error("the serif face claims runes that it lacks")
	}
}

func TestFiguresStandUnderEachOther(t *testing.T) {
	for f := range Face(Count) {
		for a := '0'; a <= '9'; a++ {
			if Of(f, a).Advance != Of(f, '0').Advance {
				t.Errorf("%v: %q is as wide as %v, 0 as %v", f, a, Of(f, a).Advance, Of(f, '0').Advance)
			}
			for b := '0'; b <= '9'; b++ {
				if Kern(f, a, b) != 0 {
					t.Errorf("%v kerns %q %q", f, a, b)
				}
			}
		}
	}
	if Kern(Serif, 'A', 'V') >= 0 {
		t.Error("A and V are not drawn together")
	}
	if Kern(Serif, 'σ', 'V') != 0 || Kern(Marks, 'A', 'V') != 0 {
		t.Error("pairs outside ASCII or of the typewriter face are kerned")
	}
}

// A letter's ink: heights of Liberation Serif in units of 1/2048 em (recalled).
func TestBounds(t *testing.T) {
	h := Of(Serif, 'H')
	if h.YMin != 0 || math.Abs(h.YMax-1341.0/2048) > 1e-9 {
		t.Errorf("H reaches from %v to %v, want 0 to %v", h.YMin, h.YMax, 1341.0/2048)
	}
	if p := Of(Serif, 'p'); p.YMin >= 0 || p.XMax <= p.XMin {
		t.Errorf("p: %+v", p.YMin)
	}
	if s := Of(Serif, ' '); !s.Has || s.Advance != 0.25 || s.XMax != s.XMin {
		t.Error("a blank has ink, or is not a quarter wide")
	}
}

func TestProfileLiesWithinBounds(t *testing.T) {
	for f := range Face(Count) {
		for _, r := range "fjgTVdσφ1(∑√" {
			g, p := Of(f, r), ProfileOf(f, r)
			left, right, ink := p.At(-0.5, 1.2)
			if !ink || math.Abs(left-g.XMin) > 0.01 || math.Abs(right-g.XMax) > 0.01 {
				t.Errorf("%v %q: profile from %.3f to %.3f, bounds from %.3f to %.3f", f, r, left, right, g.XMin, g.XMax)
			}
		}
	}
	// T is narrow at its foot.
	low, wide := func(y0, y1 float64) float64 {
		l, r, _ := ProfileOf(Serif, 'T').At(y0, y1)
		return r - l
	}, Of(Serif, 'T').XMax-Of(Serif, 'T').XMin
	if low(0.2, 0.4) > 0.3*wide {
		t.Error("the stem of T is as wide as its bar")
	}
	if _, _, ink := ProfileOf(Serif, 'ཀ').At(0, 1); ink {
		t.Error("a missing glyph has ink")
	}
}

func TestFromManyGoroutines(t *testing.T) {
	var group sync.WaitGroup
	for range 8 {
		group.Go(func() {
			for f := range Face(Count) {
				for r := rune(' '); r < 0x2700; r += 7 {
					Of(f, r)
					ProfileOf(f, r)
					Kern(f, r&127, 'o')
				}
			}
		})
	}
	group.Wait()
}
