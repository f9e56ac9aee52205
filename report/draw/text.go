package draw

import (
	"unicode/utf8"

	"soffit/fonts"
)

// Glyphs walks the glyphs of s as they are set and gives their width at size 1. Face is the one asked for,
// Marks where that lacks the rune, or Serif where Marks lacks it too; x is the place of the glyph from the
// start of the text; g.Has is false where no face has it.
func Glyphs(f Face, s string, visit func(r rune, face Face, x float64, g *fonts.Glyph)) (width float64) {
	var before rune
	for _, r := range s {
		if r == '\u2010' || r == '\u2011' { // hyphens by their own names look like the common one
			r = '-'
		}
		face, g := f, fonts.Of(f, r)
		if !g.Has {
			face, g = Marks, fonts.Of(Marks, r)
			if !g.Has {
				face, g = Serif, fonts.Of(Serif, r)
			}
			before = 0
		} else if before != 0 {
			width += fonts.Kern(f, before, r)
		}
		if visit != nil {
			visit(r, face, width, g)
		}
		width += g.Advance
		before = 0
		if face == f {
			before = r
		}
	}
	return width
}

// Width is the advance width of s, kerning and replaced glyphs included.
func Width(f Face, size Pt, s string) Pt {
	return size * Pt(Glyphs(f, s, nil))
}

// Extent is the box around the ink of s when its baseline starts at 0, 0: Y0 is negative above the
// baseline. Text without ink has the zero Box.
func Extent(f Face, size Pt, s string) Box {
	var b Box
	Glyphs(f, s, func(r rune, _ Face, x float64, g *fonts.Glyph) {
		if g.XMax > g.XMin {
			at := Pt(x)
			b = b.Union(Box{at + Pt(g.XMin), -Pt(g.YMax), at + Pt(g.XMax), -Pt(g.YMin)})
		}
	})
	return Box{b.X0 * size, b.Y0 * size, b.X1 * size, b.Y1 * size}
}

// Missing are the runes of s which can't be set in the face, neither by its own glyphs nor by lent ones.
func Missing(f Face, s string) []rune {
	var out []rune
	Glyphs(f, s, func(r rune, _ Face, _ float64, g *fonts.Glyph) {
		if !g.Has {
			out = append(out, r)
		}
	})
	return out
}

// TextRight sets s so that it ends at x.
func TextRight(c Canvas, x, y Pt, f Face, size Pt, s string) {
	c.Text(x-Width(f, size, s), y, f, size, s)
}

// TextCentre sets s with its middle at x.
func TextCentre(c Canvas, x, y Pt, f Face, size Pt, s string) {
	c.Text(x-Width(f, size, s)/2, y, f, size, s)
}

// Fit shortens s with an ellipsis so that it is no wider than width.
func Fit(f Face, size, width Pt, s string) string {
	if Width(f, size, s) <= width {
		return s
	}
	for len(s) > 0 {
		_, n := utf8.DecodeLastRuneInString(s)
		s = s[:len(s)-n]
		if Width(f, size, s+"…") <= width {
			return s + "…"
		}
	}
	return ""
}
