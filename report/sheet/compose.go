package sheet

import (
	"fmt"
	"strconv"
	"strings"

	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
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

// result is what the result column says of a line at a row: symbol = value, in two lines where one is too long.
func (c *composer) result(e *columns, l *trace.Line, w worked) {
	set := mathset.Setting{Size: textSize, Index: rowNumbers(w.indices())}
	symbol, value := set.Symbol(l.Symbol), set.Result(l.Shown[w.flat], l.Unit.String())
	if one := symbol.Related("=", value); one.Width() <= e.result.w || e.wide {
		e.result.lines(one.Lines(wideColumn.w), textSize, textLead, 0, 0)
	} else {
		e.result.row(symbol, textSize, textLead, 0, 0)
		e.result.row(set.Words(draw.Serif, "=").Then(0.278, value), textSize, textLead, 2, 0)
	}
	e.result.right(0, e.result.w)
}

// title adds the words of an entry, and the row it is worked for where that is not the block's.
func (c *composer) title(e *columns, b *trace.Block, name string, axes []*trace.Axis, w worked) {
	p := phrase(draw.Serif, capital(name))
	at := place(b, axes, w)
	if at == "" {
		e.work.paragraph(p, textSize, textLead, 0)
		return
	}
	beside := phrase(draw.Italic, " — "+at)
	for i := range beside {
		beside[i].Scale = float64(noteSize / textSize)
	}
	if one := append(p[:len(p):len(p)], beside...); one.Width(textSize) <= e.work.w {
		e.work.paragraph(one, textSize, textLead, 0)
		return
	}
	e.work.paragraph(p, textSize, textLead, 0)
	e.work.words(draw.Italic, noteSize, noteLead, 0.8, "for "+at)
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
