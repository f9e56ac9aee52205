package draw

import (
	"fmt"
	"math"
	"slices"

	"soffit/fonts"
)

// FaultKind is what is wrong on a sheet.
type FaultKind uint8

// The faults which a Recorder finds.
const (
	TextOnText   FaultKind = iota // glyphs of two texts touch
	LineOnText                    // a line or the edge of a dark shape runs through a glyph
	TextOnDark                    // a glyph lies on a tone darker than a mid grey
	OutsideArea                   // ink outside the area it belongs in
	MissingGlyph                  // no face has the rune
)

// Fault is one finding. A and B are the ink concerned, in the order drawn; At is where.
type Fault struct {
	Kind FaultKind
	A, B Ink
	At   Box
	Rune rune // of MissingGlyph
}

// String says what is wrong, whose ink it is, and where in millimetres from the sheet's top left corner.
func (f Fault) String() string {
	at := fmt.Sprintf("at x %.1f mm, y %.1f mm", float64(f.At.X0/Mm), float64(f.At.Y0/Mm))
	switch f.Kind {
	case MissingGlyph:
		return fmt.Sprintf("no glyph for %q (U+%04X) in %s %s", f.Rune, f.Rune, f.A.describe(), at)
	case OutsideArea:
		return fmt.Sprintf("%s reaches outside its area %s", f.A.describe(), at)
	case TextOnDark:
		return fmt.Sprintf("%s lies on dark %s %s", f.B.describe(), f.A.describe(), at)
	}
	return fmt.Sprintf("%s overlaps %s %s", f.A.describe(), f.B.describe(), at)
}

func (k Ink) describe() string {
	what := "line"
	switch k.Kind {
	case TextInk:
		what = fmt.Sprintf("text %q", k.Text)
	case AreaInk:
		what = "shape"
	}
	if k.Owner != "" {
		what += " of " + k.Owner
	}
	return what
}

// touch is how far glyphs may reach into each other, in points: less is not seen.
const touch Pt = 0.1

// dark is the tone below which a shape's edge must not run through text, nor text lie on it.
const dark = 0.5

// Faults are the missing glyphs and all overlaps, in the order drawn.
func (r *Recorder) Faults() []Fault {
	return append(slices.Clone(r.missing), r.Overlaps()...)
}

// Missing are the glyphs which no face has.
func (r *Recorder) Missing() []Fault { return r.missing }

// Overlaps finds glyphs that touch other glyphs, lines and dark shapes, by the outlines of the glyphs,
// not by their bounding boxes alone. Ink that a later light rectangle covers is not seen under the text
// set upon that.
func (r *Recorder) Overlaps() []Fault {
	order := make([]int, 0, len(r.Ink))
	for i := range r.Ink {
		if !r.Ink[i].Box.Empty() {
			order = append(order, i)
		}
	}
	slices.SortStableFunc(order, func(a, b int) int {
		switch {
		case r.Ink[a].Box.Y0 < r.Ink[b].Box.Y0:
			return -1
		case r.Ink[a].Box.Y0 > r.Ink[b].Box.Y0:
			return 1
		}
		return 0
	})
	type found struct {
		a, b int
		f    Fault
	}
	var all []found
	for n, i := range order {
		for _, j := range order[n+1:] {
			if r.Ink[j].Box.Y0 >= r.Ink[i].Box.Y1 {
				break
			}
			a, b := min(i, j), max(i, j)
			if f, ok := r.meet(a, b); ok {
				all = append(all, found{a, b, f})
			}
		}
	}
	slices.SortFunc(all, func(x, y found) int {
		if x.a != y.a {
			return x.a - y.a
		}
		return x.b - y.b
	})
	out := make([]Fault, len(all))
	for i, f := range all {
		out[i] = f.f
	}
	return out
}

// meet compares two pieces of ink, a drawn before b.
func (r *Recorder) meet(ai, bi int) (Fault, bool) {
	a, b := &r.Ink[ai], &r.Ink[bi]
	if a.Kind != TextInk && b.Kind != TextInk || !a.Box.Overlaps(b.Box) {
		return Fault{}, false
	}
	if a.Kind == TextInk && b.Kind == TextInk {
		if at, ok := glyphsTouch(a, b); ok {
			return Fault{Kind: TextOnText, A: *a, B: *b, At: at}, true
		}
		return Fault{}, false
	}
	text, other := a, b
	if a.Kind != TextInk {
		text, other = b, a
	}
	if other.Tone >= dark && other.Kind == AreaInk {
		if other == b { // a light shape drawn over text hides it
			if at, ok := covers(other, text); ok {
				return Fault{Kind: LineOnText, A: *a, B: *b, At: at}, true
			}
		}
		return Fault{}, false
	}
	for i := range text.glyphs {
		g := &text.glyphs[i]
		if !g.box.Overlaps(other.Box) {
			continue
		}
		if at, ok := g.crossed(other, text); ok && !(text == b && r.covered(ai, bi, g.box)) {
			return Fault{Kind: LineOnText, A: *a, B: *b, At: at}, true
		}
		if other.Kind == AreaInk && other.contains(g.box) && text == b && !r.covered(ai, bi, g.box) {
			return Fault{Kind: TextOnDark, A: *a, B: *b, At: g.box}, true
		}
	}
	return Fault{}, false
}

// covered tells whether a light shape drawn between the two pieces lies under the whole glyph.
func (r *Recorder) covered(a, b int, glyph Box) bool {
	for i := a + 1; i < b; i++ {
		k := &r.Ink[i]
		if k.Kind == AreaInk && k.Tone >= dark && glyph.Inside(k.Box) && k.contains(glyph) {
			return true
		}
	}
	return false
}

// contains tells whether the corners and the middle of the box lie inside the shape.
func (k *Ink) contains(b Box) bool {
	for _, p := range [...]Point{{b.X0, b.Y0}, {b.X1, b.Y0}, {b.X0, b.Y1}, {b.X1, b.Y1},
		{(b.X0 + b.X1) / 2, (b.Y0 + b.Y1) / 2}} {
		in := false
		for _, s := range k.pieces {
			if (s[0].Y > p.Y) != (s[1].Y > p.Y) && p.X < s[0].X+(s[1].X-s[0].X)*(p.Y-s[0].Y)/(s[1].Y-s[0].Y) {
				in = !in
			}
		}
		if !in {
			return false
		}
	}
	return true
}

func covers(shape, text *Ink) (Box, bool) {
	for _, g := range text.glyphs {
		if shape.contains(g.box) {
			return g.box, true
		}
	}
	return Box{}, false
}

func glyphsTouch(a, b *Ink) (Box, bool) {
	for i := range a.glyphs {
		g := &a.glyphs[i]
		if !g.box.Overlaps(b.Box) {
			continue
		}
		for j := range b.glyphs {
			h := &b.glyphs[j]
			if !g.box.Overlaps(h.box) {
				continue
			}
			common := Box{max(g.box.X0, h.box.X0), max(g.box.Y0, h.box.Y0), min(g.box.X1, h.box.X1), min(g.box.Y1, h.box.Y1)}
			if common.Width() < touch || common.Height() < touch {
				continue
			}
			if a.Up || b.Up || bandsTouch(g, a, h, b, common) {
				return common, true
			}
		}
	}
	return Box{}, false
}

// bandsTouch looks at the common height of two glyphs in steps of a quarter point.
func bandsTouch(g *glyphInk, a *Ink, h *glyphInk, b *Ink, common Box) bool {
	const step Pt = 0.25
	for y := common.Y0; y < common.Y1; y += step {
		l1, r1, ok1 := g.extent(a, y, min(y+step, common.Y1))
		l2, r2, ok2 := h.extent(b, y, min(y+step, common.Y1))
		if ok1 && ok2 && min(r1, r2)-max(l1, l2) > touch {
			return true
		}
	}
	return false
}

// extent is the ink of the glyph between two heights on the sheet.
func (g *glyphInk) extent(k *Ink, y0, y1 Pt) (left, right Pt, ok bool) {
	p := fonts.ProfileOf(g.face, g.r)
	l, r, ok := p.At(float64((k.At.Y-y1)/k.Size), float64((k.At.Y-y0)/k.Size))
	return g.x + Pt(l)*k.Size, g.x + Pt(r)*k.Size, ok
}

// crossed tells whether a straight piece of the other ink runs through the glyph.
func (g *glyphInk) crossed(other, text *Ink) (Box, bool) {
	half := float64(other.width / 2)
	for _, s := range other.pieces {
		x0, y0, x1, y1 := s[0].X, s[0].Y, s[1].X, s[1].Y
		if y0 > y1 {
			x0, y0, x1, y1 = x1, y1, x0, y0
		}
		wx, wy := Pt(half), Pt(half)
		if d := math.Hypot(float64(x1-x0), float64(y1-y0)); d > 0 {
			wx, wy = Pt(half*float64(y1-y0)/d), Pt(half*math.Abs(float64(x1-x0))/d)
		}
		top, bottom := max(y0-wy, g.box.Y0), min(y1+wy, g.box.Y1)
		if bottom-top < touch {
			continue
		}
		const step Pt = 0.25
		for y := top; y < bottom; y += step {
			e := min(y+step, bottom)
			a, b := min(x0, x1), max(x0, x1)
			if y1-y0 > 1e-6 {
				p := x0 + (x1-x0)*(min(max(y-wy, y0), y1)-y0)/(y1-y0)
				q := x0 + (x1-x0)*(min(max(e+wy, y0), y1)-y0)/(y1-y0)
				a, b = min(p, q), max(p, q)
			}
			l, r, ok := g.box.X0, g.box.X1, true
			if !text.Up {
				l, r, ok = g.extent(text, y, e)
			}
			if ok && min(b+wx, r)-max(a-wx, l) > touch {
				return Box{max(a-wx, l), y, min(b+wx, r), e}, true
			}
		}
	}
	return Box{}, false
}

// Outside finds ink beyond the area, of the owners that of accepts; nil accepts all.
func (r *Recorder) Outside(area Box, of func(owner string) bool) []Fault {
	var out []Fault
	for _, k := range r.Ink {
		if k.Box.Empty() || of != nil && !of(k.Owner) {
			continue
		}
		if !k.Box.Inside(area.Grow(touch)) {
			out = append(out, Fault{Kind: OutsideArea, A: k, At: k.Box})
		}
	}
	return out
}
