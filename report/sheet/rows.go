package sheet

import (
	"fmt"
	"slices"
	"strconv"
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// run sets entries from the first on that run over the same index axes and are worked for one row, with the few that
// stand between them, then one table of all their rows. It returns how many entries it took.
func (c *composer) run(b *trace.Block, entries []trace.Entry) int {
	axes := indexAxes(entries[0])
	if len(axes) == 0 {
		return 0
	}
	n, start := 0, len(c.elements)
	var lines []*trace.Line
	listed := false // as in entries
	for k := 0; k >= 0; k = between(entries[n:], entries[0], axes) {
		for _, e := range entries[n : n+k+1] {
			c.single(b, e, !listed)
			_, listed = e.(*trace.Given)
		}
		n += k + 1
		lines = append(lines, trace.LineOf(entries[n-1]))
	}
	switch {
	case len(c.elements) == start:
		return n // on no row was any of them computed
	case kind(entries[0]) != 1: // the table of a step may stand overleaf
	case n == 1:
		c.elements[start].keep = true
	default:
		// Of a long list the first two lines stay together, and the last three with the table.
		for i := start; i < len(c.elements); i++ {
			c.elements[i].keep = i == start || len(c.elements)-i <= 3 || n <= 5
		}
	}
	if size(axes) > 1 {
		c.rowsTable(b, axes, lines)
	} else {
		c.elements[len(c.elements)-1].keep = false
	}
	return n
}

// mostBetween is how many entries that are no narrative may stand between two columns of one table.
const mostBetween = 2

// between is how many entries stand before the next one that goes on with a run over axes which began with first; −1
// where the run ends. Single values, narrative and what is asked of the same rows may stand between, but nothing that
// runs over other rows, and no figure or table.
func between(entries []trace.Entry, first trace.Entry, axes []*trace.Axis) int {
	others := 0
	for i, e := range entries {
		own := indexAxes(e)
		if slices.Equal(own, axes) && kind(e) == kind(first) {
			return i
		}
		switch e := e.(type) {
		case *trace.Text:
			continue
		case *trace.Choice:
			own = indexed(e.Axes)
		case *trace.Check:
			own = indexed(e.Axes)
		case *trace.Given, *trace.Step, *trace.Root:
			if len(own) > 0 {
				return -1
			}
		default:
			return -1
		}
		if others++; others > mostBetween || len(own) > 0 && !slices.Equal(own, axes) {
			return -1
		}
	}
	return -1
}

// indexAxes are the axes with an index letter of an entry that carries values.
func indexAxes(e trace.Entry) []*trace.Axis {
	l := trace.LineOf(e)
	if l == nil {
		return nil
	}
	return indexed(l.Axes)
}

// indexed are those of some axes with an index letter.
func indexed(axes []*trace.Axis) []*trace.Axis {
	var out []*trace.Axis
	for _, a := range axes {
		if a.Index != "" {
			out = append(out, a)
		}
	}
	return out
}

func kind(e trace.Entry) int {
	switch e.(type) {
	case *trace.Given:
		return 1
	case *trace.Step:
		return 2
	case *trace.Root:
		return 3
	}
	return 0
}

// rowsTable shows all rows of a run at the worked row of the implicit axis: the rows of the first index axis down the
// table; those of a second across it where they are few.
func (c *composer) rowsTable(b *trace.Block, axes []*trace.Axis, lines []*trace.Line) {
	down, across := axes, []*trace.Axis(nil)
	if len(axes) == 2 && len(axes[1].Rows)*len(lines) <= mostAcross {
		down, across = axes[:1], axes[1:]
		c.legend(axes[1])
	}
	t := rowsOf(lines[0].Number, down)
	for _, l := range lines {
		w, _ := workedLine(b, l)
		for k := range size(across) {
			p := w.place
			at := map[string]int{}
			for _, q := range trace.PlaceAt(across, k) {
				p = p.With(q.Axis, q.Row)
				at[q.Axis.Index] = q.Row
			}
			col := c.tableColumn(l, rowNumbers(at))
			for i := range size(down) {
				for _, q := range trace.PlaceAt(down, i) {
					p = p.With(q.Axis, q.Row)
				}
				f := trace.Flat(l.Axes, p)
				if f == w.flat && kind(c.note.Entry(l.Key)) != 1 {
					t.mark = i
				}
				col.cells = append(col.cells, cellOf(l, f))
			}
			t.columns = append(t.columns, col)
		}
	}
	c.add(t.elements(4)...)
}

// mostAcross is how many columns a second index may make of a run.
const mostAcross = 10

func size(axes []*trace.Axis) int {
	n := 1
	for _, a := range axes {
		n *= len(a.Rows)
	}
	return n
}

// legend says what the numbers of an index stand for that runs across a table.
func (c *composer) legend(a *trace.Axis) {
	var parts []string
	for i, r := range a.Rows {
		parts = append(parts, fmt.Sprintf("%s = %d: %s", a.Index, i+1, r))
	}
	s := stack{w: workColumn.w}
	s.words(draw.Italic, noteSize, noteLead, 0, strings.Join(parts, "; "))
	c.add(&element{owner: "legend", above: 4, height: s.bottom, ruled: true, keep: true, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("work legend")
		s.paint(cv, workColumn.x, y)
	}})
}

// rowsOf is a table without columns over the rows of axes. At its left stand the number that is printed in symbols and
// the name of each row; a name that says no more than the number is left out.
func rowsOf(owner string, axes []*trace.Axis) *table {
	t := &table{owner: owner, mark: -1}
	bare := make([]bool, len(axes))
	for k, a := range axes {
		bare[k] = a.Index != "" && countedOut(a)
		switch {
		case bare[k]:
			t.heads, t.words = append(t.heads, a.Index), append(t.words, a.Name)
			t.counted = len(axes) == 1
			continue
		case a.Index != "":
			t.heads, t.words = append(t.heads, a.Index), append(t.words, "")
		}
		t.heads, t.words = append(t.heads, ""), append(t.words, "")
	}
	for i := range size(axes) {
		var labels []string
		for k, q := range trace.PlaceAt(axes, i) {
			if q.Axis.Index != "" {
				labels = append(labels, strconv.Itoa(q.Row+1))
			}
			if !bare[k] {
				labels = append(labels, q.Axis.Rows[q.Row])
			}
		}
		t.rows = append(t.rows, labels)
	}
	return t
}

// countedOut tells whether every row of an axis is called by the word of the axis and its number.
func countedOut(a *trace.Axis) bool {
	for i, r := range a.Rows {
		if r != a.Name+" "+strconv.Itoa(i+1) {
			return false
		}
	}
	return true
}

// tableColumn is a column of a table without its cells.
func (c *composer) tableColumn(l *trace.Line, rows map[string]string) tableColumn {
	var unit mathset.Box
	if u := l.Unit.String(); u != "" {
		unit = mathset.Upright(draw.Serif, smallSize, u)
	}
	return tableColumn{number: l.Number, key: l.Key, symbol: c.symbol(l.Symbol, tableSize, rows), unit: unit}
}
