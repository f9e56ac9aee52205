// Package text sets running text: paragraphs with inline mathematics, and narrative written in Markdown.
//
// What it gives is Lines, each with its height and depth, for the composer of sheets to place and to
// break over sheets.
package text

import (
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/calc/quantity"
	"soffit/fonts"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// Style is how text is set. Its zero fields are filled from Size, whose own default is 10 points.
type Style struct {
	Size    draw.Pt
	Leading draw.Pt // distance of baselines, 1.25 of the size by default
	Gap     draw.Pt // between paragraphs, half the leading by default
}

func (s Style) filled() Style {
	if s.Size == 0 {
		s.Size = 10
	}
	if s.Leading == 0 {
		s.Leading = 1.25 * s.Size
	}
	if s.Gap == 0 {
		s.Gap = s.Leading / 2
	}
	return s
}

// Heights of a line of plain text in em: letters with ascenders and descenders.
const (
	ascent  = 0.69
	descent = 0.22
)

// Run is a part of a paragraph: text of one face, or mathematics.
type Run struct {
	Face   draw.Face
	Text   string
	Anchor string // where it leads, "" for nowhere
	Scale  float64
	Whole  bool // set without a break within it
	math   func(size draw.Pt) mathset.Row
	broken bool // the line ends here
}

// Plain, Strong, Slanted and Typed are text of the four faces.
func Plain(s string) Run   { return Run{Face: draw.Serif, Text: s} }
func Strong(s string) Run  { return Run{Face: draw.Bold, Text: s} }
func Slanted(s string) Run { return Run{Face: draw.Italic, Text: s} }
func Typed(s string) Run   { return Run{Face: draw.Marks, Text: s, Scale: 0.8} }

// To is text that leads to an anchor.
func To(anchor, s string) Run { return Run{Face: draw.Serif, Text: s, Anchor: anchor} }

// Math is mathematics within text; it is asked for the row at the size of the text. Its Setting should
// be Running.
func Math(row func(size draw.Pt) mathset.Row) Run { return Run{math: row} }

// NewLine ends the line within a paragraph.
func NewLine() Run { return Run{broken: true} }

// Paragraph is text that is broken into lines.
type Paragraph []Run

// item is a word or a piece of mathematics.
type item struct {
	text   string // "" for a box
	face   draw.Face
	size   draw.Pt
	anchor string
	box    mathset.Box
	width  draw.Pt
	space  draw.Pt // before it, inside a line
	cost   float64 // of a break before it
	forced bool    // the line begins here
	up     draw.Pt
	down   draw.Pt
}

const never = 1e9

// items takes a paragraph apart: words, pieces of mathematics, spaces between them.
func (p Paragraph) items(size, width draw.Pt) []item {
	letters := 0
	for _, r := range p {
		letters += len(r.Text)
	}
	out := make([]item, 0, letters/5+4)
	space, forced := draw.Pt(0), false
	after := false // a number
	put := func(it item) {
		it.space = space
		if space == 0 && it.cost == 0 && len(out) > 0 {
			it.cost = never
		}
		it.forced = forced
		space, forced = 0, false
		out = append(out, it)
	}
	for _, r := range p {
		switch {
		case r.broken:
			forced = true
			continue
		case r.math != nil:
			after = false
			for i, pc := range r.math(size).Pieces() {
				cost := float64(pc.Cost)
				if i == 0 {
					cost = 0
				} else {
					space = pc.Gap
					cost += 4
				}
				put(item{box: pc.Box, width: pc.Box.Width, cost: cost, up: pc.Box.Height, down: pc.Box.Depth})
			}
			continue
		}
		s := r.size(size)
		blank := draw.Width(r.Face, s, " ")
		for _, w := range words(strings.ToValidUTF8(r.Text, "\uFFFD")) {
			if w == " " {
				space = blank
				continue
			}
			cuts := []part{{text: w}}
			if !r.Whole {
				cuts = parts(r.Face, s, w, width)
			}
			for i, part := range cuts {
				it := r.item(s, part.text)
				if i == 0 && space == 0 && !forced && joins(last(out), it, width) {
					after = endsInFigure(part.text)
					continue
				}
				switch {
				case i > 0:
					it.cost = part.cost
				case after && unitName(w):
					it.cost = never
				}
				put(it)
				after = endsInFigure(part.text)
			}
		}
	}
	return out
}

// joins lengthens the item before by text that follows it without a blank.
func joins(before *item, it item, width draw.Pt) bool {
	if before == nil || before.text == "" || it.text == "" || before.face != it.face || before.size != it.size || before.anchor != it.anchor {
		return false
	}
	s := before.text + it.text
	w := draw.Width(it.face, it.size, s)
	if width > 0 && w > width {
		return false
	}
	before.text, before.width = s, w
	return true
}

func (r Run) size(size draw.Pt) draw.Pt {
	if r.Scale > 0 {
		return size * draw.Pt(r.Scale)
	}
	return size
}

func (r Run) item(size draw.Pt, s string) item {
	it := item{text: s, face: r.Face, size: size, anchor: r.Anchor, up: ascent * size, down: descent * size}
	if strings.ContainsAny(s, "⁻⁰¹²³⁴⁵⁶⁷⁸⁹") && r.Face != draw.Marks {
		it.box = mathset.Upright(r.Face, size, s)
		it.text, it.width = "", it.box.Width
		it.up, it.down = max(it.up, it.box.Height), max(it.down, it.box.Depth)
		return it
	}
	it.width = draw.Width(r.Face, size, s)
	return it
}

// words cuts at blanks; a blank of any length gives one " ". No-break spaces stay within words.
func words(s string) []string {
	var out []string
	start := -1
	for i, r := range s {
		blank := unicode.IsSpace(r) && r != '\u00a0' && r != '\u202f' && r != '\u2009'
		switch {
		case blank:
			if start >= 0 {
				out = append(out, s[start:i])
				start = -1
			}
			if len(out) == 0 || out[len(out)-1] != " " {
				out = append(out, " ")
			}
		case start < 0:
			start = i
		}
	}
	if start >= 0 {
		out = append(out, s[start:])
	}
	return out
}

// endsInFigure tells whether a word is a number, so that a unit after it stays with it.
func endsInFigure(w string) bool {
	r, _ := utf8.DecodeLastRuneInString(w)
	return r >= '0' && r <= '9' || strings.ContainsRune("⁰¹²³⁴⁵⁶⁷⁸⁹", r)
}

// unitName tells whether a word is the name of a unit, with a stop after it perhaps.
func unitName(w string) bool {
	w = strings.TrimRight(w, ".,;:)!?")
	if len(w) > 12 {
		return false
	}
	_, err := quantity.ParseUnit(w)
	return w != "" && err == nil
}

type part struct {
	text string
	cost float64
}

// parts cuts a word where it may be broken: after hyphens and dashes, after the slashes and signs of a
// key or a file's name, and anywhere if nothing else fits the width.
func parts(f draw.Face, size draw.Pt, w string, width draw.Pt) []part {
	var out []part
	cut := func(s string, cost float64) {
		for draw.Width(f, size, s) > width && width > 0 {
			n := fitting(f, size, s, width)
			if n == 0 || n >= len(s) {
				break
			}
			out = append(out, part{s[:n], cost})
			s, cost = s[n:], 200
		}
		out = append(out, part{s, cost})
	}
	start, cost := 0, 0.0
	runes := []rune(w)
	at := 0
	for i, r := range runes {
		at += len(string(r))
		if i+2 >= len(runes) || i == 0 {
			continue
		}
		switch r {
		case '-', '–', '—':
			if unicode.IsLetter(runes[i-1]) && unicode.IsLetter(runes[i+1]) {
				cut(w[start:at], cost)
				start, cost = at, 12
			}
		case '/', '@', '.', '_', ':':
			if len(runes) > 16 && unicode.IsLetter(runes[i-1]) && unicode.IsLetter(runes[i+1]) {
				cut(w[start:at], cost)
				start, cost = at, 25
			}
		}
	}
	cut(w[start:], cost)
	return out
}

// fitting is the number of bytes of s, valid UTF-8, that fit the width.
func fitting(f draw.Face, size draw.Pt, s string, width draw.Pt) int {
	n := 0
	draw.Glyphs(f, s, func(_ rune, _ draw.Face, x float64, g *fonts.Glyph) {
		if draw.Pt(x+g.Advance)*size <= width {
			n++
		}
	})
	for i := range s {
		if n == 0 {
			return i
		}
		n--
	}
	return len(s)
}

// Width of the paragraph in one line.
func (p Paragraph) Width(size draw.Pt) draw.Pt {
	var w draw.Pt
	for i, it := range p.items(size, 0) {
		if i > 0 {
			w += it.space
		}
		w += it.width
	}
	return w
}

// Lines breaks the paragraph into lines no wider than width, ragged on the right, evenly.
func (p Paragraph) Lines(width draw.Pt, style Style) []Line {
	style = style.filled()
	items := p.items(style.Size, width)
	var out []Line
	for len(items) > 0 {
		n := 1
		for n < len(items) && !items[n].forced {
			n++
		}
		for _, l := range breakItems(items[:n], width) {
			out = append(out, newLine(l, style, last(out)))
		}
		items = items[n:]
	}
	if n := len(out); n > 1 { // neither the first line nor the last stands alone on a sheet
		out[0].Keep, out[n-2].Keep = true, true
	}
	return out
}
