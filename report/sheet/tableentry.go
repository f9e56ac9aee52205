package sheet

import (
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// tableEntry sets a table of the record: its number and title, then its columns over the rows of its axis.
func (c *composer) tableEntry(b *trace.Block, t *trace.Table) {
	e := columnsFor(&t.Head, c.document, nil)
	e.work.words(draw.Bold, textSize, textLead, 0, t.Name)
	title := e.element(false)
	title.keep = true

	out := rowsOf(t.Number, []*trace.Axis{t.Axis})
	if t.Axis == b.Over {
		out.mark = b.Row
	}
	out.along = t.Axis.Index == ""
	for _, key := range t.Columns {
		switch e := c.note.Entry(key).(type) {
		case *trace.Check:
			c.ratioColumn(b, t.Axis, e, out)
		case *trace.Given, *trace.Step, *trace.Root:
			c.tableColumns(b, t.Axis, trace.LineOf(e), out)
		default:
			c.fail("table %s: column %s carries no values", t.Key, key)
			return
		}
	}
	if l := placesOf(c.note, t); l != nil {
		out.placed = out.columns[0].rising(func(i int) float64 { return l.Values[i] })
	}
	es := out.elements(3)
	title.spans = min(es[0].spans, spanWide)
	c.add(title)
	c.add(es...)
}

// placesOf is the first column of a table along the member, where it has one value for each place.
func placesOf(n *trace.Note, t *trace.Table) *trace.Line {
	if len(t.Columns) == 0 || t.Axis.Index != "" {
		return nil
	}
	if l := trace.LineOf(n.Entry(t.Columns[0])); l != nil && len(l.Axes) == 1 {
		return l
	}
	return nil
}

// tableColumns adds the column of a line, one for each row of its index axes where it has others than the table's.
func (c *composer) tableColumns(b *trace.Block, axis *trace.Axis, l *trace.Line, t *table) {
	var others []*trace.Axis
	n := 1
	for _, a := range l.Axes {
		if a.Index != "" && a != axis {
			others = append(others, a)
			n *= len(a.Rows)
		}
	}
	for k := range n {
		at := map[string]int{}
		place := trace.Place{}
		if b.Over != nil {
			place = place.With(b.Over, b.Row)
		}
		for _, q := range trace.PlaceAt(others, k) {
			place = place.With(q.Axis, q.Row)
			at[q.Axis.Index] = q.Row
		}
		col := c.tableColumn(l, rowNumbers(at))
		for i := range axis.Rows {
			p := place.With(axis, i)
			f := trace.Flat(l.Axes, p)
			if f < 0 {
				c.fail("table of %s: %s has no value on its rows", t.owner, l.Key)
			}
			col.cells = append(col.cells, cellOf(l, f))
		}
		t.columns = append(t.columns, col)
	}
}

// ratioColumn adds the ratios of a check, or its margins where it has no ratio; those that fail are bold.
func (c *composer) ratioColumn(b *trace.Block, axis *trace.Axis, k *trace.Check, t *table) {
	head := "ratio"
	if k.Ratio[k.Worst] == "" {
		head = "margin"
	}
	set := mathset.Setting{Size: tableSize}
	box := set.Words(draw.Serif, head).Box()
	col := tableColumn{number: k.Number, key: k.Key, symbol: &box}
	if head == "margin" {
		col.unit = mathset.Upright(draw.Serif, smallSize, k.Unit.String())
	}
	home := governing(b, k).place
	for i := range axis.Rows {
		f := trace.Flat(k.Axes, home.With(axis, i))
		if f < 0 {
			c.fail("table of %s: %s has no value on its rows", t.owner, k.Key)
			return
		}
		s := k.Ratio[f]
		if s == "" {
			s = k.Margin[f]
		}
		if s == "" {
			s = "–"
		}
		col.cells = append(col.cells, printed(s))
		col.strong = append(col.strong, k.Fails[f])
	}
	t.columns = append(t.columns, col)
}
