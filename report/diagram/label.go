package diagram

import (
	"strings"

	"soffit/calc/formula"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// Sizes of text.
const (
	size    draw.Pt = 7.5
	leading draw.Pt = 9.5         // least distance of the baselines of neighbouring labels
	middle  draw.Pt = 0.33 * size // from the middle of figures down to their baseline
)

var setting = mathset.Setting{Size: size, Running: true}

// label is one line of words, symbols and values.
type label struct {
	width, height, depth draw.Pt
	pieces               []piece
}

type piece struct {
	x    draw.Pt
	face draw.Face
	text string
	math *mathset.Box // instead of text
}

// words is a label of plain words.
func words(s string) label { return label{}.say(draw.Serif, s) }

// say adds words.
func (l label) say(f draw.Face, s string) label {
	e := draw.Extent(f, size, s)
	return l.add(piece{face: f, text: s}, draw.Width(f, size, s), -e.Y0, e.Y1)
}

func (l label) box(b mathset.Box) label {
	return l.add(piece{math: &b}, b.Width, b.Height, b.Depth)
}

func (l label) add(p piece, width, height, depth draw.Pt) label {
	p.x = l.width
	l.pieces = append(l.pieces[:len(l.pieces):len(l.pieces)], p)
	l.width += width
	l.height, l.depth = max(l.height, height), max(l.depth, depth)
	return l
}

// then adds another label.
func (l label) then(o label) label {
	from := l.width
	for _, p := range o.pieces {
		p.x += from
		l.pieces = append(l.pieces[:len(l.pieces):len(l.pieces)], p)
	}
	l.width += o.width
	l.height, l.depth = max(l.height, o.height), max(l.depth, o.depth)
	return l
}

// gap adds a blank of so many em.
func (l label) gap(em draw.Pt) label {
	l.width += em * size
	return l
}

// symbol adds a symbol, set as in the text.
func (l label) symbol(s *formula.Symbol) label { return l.box(setting.Symbol(s).Box()) }

// number adds a number as printed, without its unit.
func (l label) number(c cell) label { return l.box(setting.Value(c.shown, "").Box()) }

// value adds a number as printed with its unit.
func (l label) value(c cell) label {
	return l.box(setting.Value(c.shown, c.line.Unit.String()).Box())
}

// length adds a length to a drawing whose lengths are in mm: only other units are written out.
func (l label) length(c cell) label {
	if c.line.Unit.String() == "mm" {
		return l.number(c)
	}
	return l.value(c)
}

// equals adds "symbol = value".
func (l label) equals(c cell) label {
	return l.symbol(c.line.Symbol).gap(0.28).say(draw.Serif, "=").gap(0.28).value(c)
}

// draw sets the label with its baseline starting at x, y.
func (l label) draw(c draw.Canvas, x, y draw.Pt) {
	for _, p := range l.pieces {
		if p.math != nil {
			p.math.Draw(c, x+p.x, y)
			continue
		}
		c.Text(x+p.x, y, p.face, size, p.text)
	}
}

// right sets the label to end at x.
func (l label) right(c draw.Canvas, x, y draw.Pt) { l.draw(c, x-l.width, y) }

// centre sets the label with its middle at x.
func (l label) centre(c draw.Canvas, x, y draw.Pt) { l.draw(c, x-l.width/2, y) }

// at is the room the label takes with its baseline starting at x, y.
func (l label) at(x, y draw.Pt) draw.Box {
	return draw.Box{X0: x, Y0: y - l.height, X1: x + l.width, Y1: y + l.depth}
}

// shorten cuts the middle out of a name that is too long for a width, for its end tells it from others.
func shorten(f draw.Face, s string, width draw.Pt) string {
	r := []rune(s)
	for n := len(r); n > 0 && draw.Width(f, size, s) > width; n-- {
		tail := min(6, n/3)
		s = strings.TrimSpace(string(r[:n-tail])) + "…" + strings.TrimSpace(string(r[len(r)-tail:]))
	}
	return s
}

// wide is the widest of some labels.
func wide(ls ...label) draw.Pt {
	var w draw.Pt
	for _, l := range ls {
		w = max(w, l.width)
	}
	return w
}

// beforePoint is the width of a printed number up to its point.
func beforePoint(c cell) draw.Pt {
	for i, r := range c.shown {
		if r == '.' {
			return setting.Value(c.shown[:i], "").Width()
		}
	}
	return label{}.number(c).width
}
