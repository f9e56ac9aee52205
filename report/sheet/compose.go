package sheet

import (
	"fmt"
	"strconv"
	"strings"

	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
	"soffit/report/text"
)

// composer turns the entries of a note into elements.
type composer struct {
	note     *trace.Note
	index    *index
	mark     string // the engineering fingerprint
	document string // whose clauses are printed without its name
	elements []*element
	symbols  map[symbolKey]*mathset.Box
	sheetOf  map[string]int // the sheet an anchor stands on, known once the sheets are filled
	err      error
}

type symbolKey struct {
	name string
	size draw.Pt
	rows string
}

func newComposer(n *trace.Note) *composer {
	return &composer{note: n, index: newIndex(n), document: commonDocument(n), mark: n.Fingerprint(), symbols: map[symbolKey]*mathset.Box{}, sheetOf: map[string]int{}}
}

func (c *composer) fail(format string, args ...any) {
	if c.err == nil {
		c.err = fmt.Errorf("sheet: "+format, args...)
	}
}

func (c *composer) add(es ...*element) { c.elements = append(c.elements, es...) }

// symbol is a symbol set at a size, with these rows in place of its index letters; set once for all sheets.
func (c *composer) symbol(s *formula.Symbol, size draw.Pt, rows map[string]string) *mathset.Box {
	k := symbolKey{name: s.Name, size: size}
	for _, ix := range s.Index {
		k.rows += "," + rows[ix]
	}
	b, ok := c.symbols[k]
	if !ok {
		v := mathset.Setting{Size: size, Index: rows}.Symbol(s).Box()
		b = &v
		c.symbols[k] = b
	}
	return b
}

// rowNumbers prints rows of indices as figures counted from 1.
func rowNumbers(at map[string]int) map[string]string {
	if len(at) == 0 {
		return nil
	}
	out := make(map[string]string, len(at))
	for k, v := range at {
		out[k] = strconv.Itoa(v + 1)
	}
	return out
}

// result is what the result column says of a line at a row: symbol = value, somewhat smaller where one line is too
// long for it, in two lines where that is too long too.
func (c *composer) result(e *columns, l *trace.Line, w worked) {
	for _, size := range []draw.Pt{textSize, 9.3, noteSize} {
		set := mathset.Setting{Size: size, Index: rowNumbers(w.indices())}
		symbol, value := set.Symbol(l.Symbol), set.Result(l.Shown[w.flat], l.Unit.String())
		one := symbol.Related("=", value)
		fits := one.Width() <= e.result.w
		switch {
		case fits || e.wide && size == noteSize:
			e.result.lines(one.Lines(wideColumn.w), textSize, textLead, 0, 0)
		case size == noteSize:
			e.result.row(symbol, textSize, textLead, 0, 0)
			e.result.row(set.Words(draw.Serif, "=").Then(0.278, value), textSize, textLead, 2, 0)
		}
		if fits {
			break
		}
	}
	e.result.right(0, e.result.w)
}

// title adds the words of an entry, and the row it is worked for where that is not the block's.
func (c *composer) title(e *columns, b *trace.Block, name string, axes []*trace.Axis, w worked) {
	p := text.Words(draw.Serif, capital(name))
	if at := place(b, axes, w); at != "" {
		whole := draw.Width(draw.Italic, noteSize, "— "+at) <= e.work.w // it is not divided where one line holds it
		if whole {
			at = strings.ReplaceAll(at, " ", "\u00a0")
		}
		p = append(p, text.Run{Face: draw.Serif, Text: " "})
		for _, r := range text.Words(draw.Italic, "—\u00a0"+at) {
			r.Scale, r.Whole = float64(noteSize/textSize), whole
			p = append(p, r)
		}
	}
	e.work.paragraph(p, textSize, textLead, 0)
}

// place names the rows an entry is worked for; the implicit row only where it is not the block's.
func place(b *trace.Block, axes []*trace.Axis, w worked) string {
	var parts []string
	for _, a := range axes {
		r := w.place.Of(a)
		switch {
		case a.Index != "":
			parts = append(parts, a.Index+" = "+strconv.Itoa(r+1)+", "+a.Rows[r])
		case a != b.Over || r != b.Row:
			parts = append(parts, a.Rows[r])
		}
	}
	return strings.Join(parts, "; ")
}
