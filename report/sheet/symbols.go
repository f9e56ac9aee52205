package sheet

import (
	"slices"
	"strings"
	"unicode"

	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
)

// meaning is a symbol, what it stands for, and where that is said first.
type meaning struct {
	symbol *formula.Symbol
	name   string
	unit   string
	number string
	key    string
}

// meanings lists every symbol of a note with each of its meanings, sorted: Latin letters, then Greek.
func meanings(n *trace.Note) []meaning {
	var out []meaning
	seen := map[[2]string]bool{}
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		l := trace.LineOf(e)
		if l == nil || seen[[2]string{l.Symbol.Name, l.Name}] {
			return
		}
		seen[[2]string{l.Symbol.Name, l.Name}] = true
		out = append(out, meaning{l.Symbol, l.Name, l.Unit.String(), l.Number, l.Key})
	})
	slices.SortStableFunc(out, func(a, b meaning) int { return strings.Compare(symbolOrder(a.symbol), symbolOrder(b.symbol)) })
	return out
}

// symbolOrder sorts symbols by script, letter regardless of case, capital first, then subscript.
func symbolOrder(s *formula.Symbol) string {
	var b strings.Builder
	first := []rune(s.Base)[0]
	if first == 'Δ' && len([]rune(s.Base)) > 1 {
		first = []rune(s.Base)[1] // a difference stands beside what it is a difference of
	}
	if unicode.Is(unicode.Greek, first) {
		b.WriteByte('2')
	} else {
		b.WriteByte('1')
	}
	b.WriteRune(unicode.ToLower(first))
	if unicode.IsLower(first) {
		b.WriteByte('2')
	} else {
		b.WriteByte('1')
	}
	b.WriteString(strings.ToLower(strings.TrimPrefix(s.Name, "Δ")))
	if strings.HasPrefix(s.Name, "Δ") {
		b.WriteByte(1)
	}
	return b.String()
}

// symbolList sets the register of symbols in two columns.
func (c *composer) symbolList() {
	const symbolWidth, numberWidth = 56, 34
	var cells []cell
	for _, m := range meanings(c.note) {
		box := c.symbol(m.symbol, tableSize+0.5, nil)
		at := draw.Pt(symbolWidth)
		text := stack{w: twinWidth - symbolWidth - numberWidth - 6}
		wide := box.Width > symbolWidth-4
		if wide {
			at = box.Width + 6
			text.w = twinWidth - at - numberWidth - 6
		}
		words := capital(m.name)
		if m.unit != "" {
			words += ", " + strings.ReplaceAll(m.unit, " ", "\u2009")
		}
		text.words(draw.Serif, noteSize, noteLead-0.4, 0, words)
		shift := max(0, box.Height-tableSize*ascent)
		cells = append(cells, cell{max(text.bottom+shift, tableSize*ascent+shift+box.Depth) + 3, 0, func(cv draw.Canvas, x, y draw.Pt) {
			y += shift
			base := y + (noteSize)*ascent
			box.Draw(cv, x, base)
			text.paint(cv, x+at, y)
			w := draw.Width(draw.Serif, smallSize, m.number)
			cv.Text(x+twinWidth-w, base, draw.Serif, smallSize, m.number)
			cv.Link(x+twinWidth-w, base-smallSize*ascent, w, smallLead, m.key)
		}})
	}
	c.add(twin("symbols", cells, 6))
}
