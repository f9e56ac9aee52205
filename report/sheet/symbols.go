package sheet

import (
	"slices"
	"strings"
	"unicode"

	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
)

// meaning is a symbol, what it stands for, and where that is said.
type meaning struct {
	symbol *formula.Symbol
	name   string
	unit   string
	at     []mention
}

// meanings lists every symbol of a note with each of its meanings, sorted: Latin letters, then Greek.
func meanings(n *trace.Note) []meaning {
	var out []meaning
	seen := map[[2]string]int{}
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		l := trace.LineOf(e)
		if l == nil {
			return
		}
		k := [2]string{l.Symbol.Name, l.Name}
		i, ok := seen[k]
		if !ok {
			i = len(out)
			seen[k] = i
			out = append(out, meaning{symbol: l.Symbol, name: l.Name, unit: l.Unit.String()})
		}
		out[i].at = append(out[i].at, mention{l.Number, l.Key})
	})
	slices.SortStableFunc(out, func(a, b meaning) int { return strings.Compare(symbolOrder(a.symbol), symbolOrder(b.symbol)) })
	return out
}

// symbolOrder sorts symbols by script, letter regardless of case, capital first, then subscript: that without an index
// before those with one.
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
	b.WriteString(bare.Replace(strings.ToLower(strings.TrimPrefix(s.Name, "Δ"))))
	if strings.HasPrefix(s.Name, "Δ") {
		b.WriteByte(1)
	}
	return b.String()
}

// bare takes the signs of the notation out of a symbol's name.
var bare = strings.NewReplacer("{", "", "}", "", "_", " ")

// symbolList sets the register of symbols in two columns, the numbers of the entries at the right of each.
func (c *composer) symbolList() {
	const symbolWidth = 46
	var cells []cell
	for _, m := range meanings(c.note) {
		box := c.symbol(m.symbol, tableSize, nil)
		at := max(draw.Pt(symbolWidth), box.Width+6)
		text := stack{w: twinWidth - at}
		words := capital(m.name)
		if m.unit != "" {
			words += ", " + strings.ReplaceAll(m.unit, " ", "\u2009")
		}
		text.words(draw.Serif, smallSize, smallLead, 0, words)
		text.numbers(m.at)
		shift := max(0, box.Height-tableSize*ascent)
		cells = append(cells, cell{max(text.bottom+shift, tableSize*ascent+shift+box.Depth) + 2.4, 0, func(cv draw.Canvas, x, y draw.Pt) {
			y += shift
			box.Draw(cv, x, y+smallSize*ascent)
			text.paint(cv, x+at, y)
		}})
	}
	c.add(twin("symbols", cells, 6))
}

// numbers adds numbers of entries flush right: on the last line where they fit, else below it.
func (s *stack) numbers(ms []mention) {
	const apart = 8
	bits := listed("", ms, false)[1:]
	w := -blank
	for _, b := range bits {
		w += blank + b.w
	}
	if n := len(s.inks); n == 0 || s.inks[n-1].x+s.inks[n-1].width()+apart+w > s.w {
		s.bits(bits, 0, true)
		return
	}
	x := s.w - w
	for _, b := range bits {
		s.inks = append(s.inks, ink{x: x, y: s.baseline, face: draw.Serif, size: tinySize, text: b.text, link: b.link})
		x += b.w + blank
	}
}
