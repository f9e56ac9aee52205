package sheet

import (
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// table is columns of numbers under heads, one line a row.
type table struct {
	owner   string
	heads   []string   // over the labels of the rows
	words   []string   // over those heads, nil for none
	rows    [][]string // labels of each row
	labels  [][]stack  // those labels, set
	columns []tableColumn
	mark    int  // the row worked in full, −1 for none
	along   bool // its rows are places along the member
	counted bool // its rows have numbers and no names
	placed  bool // its first column says where they are
}

type tableColumn struct {
	number, key string
	symbol      *mathset.Box
	unit        mathset.Box
	cells       []string
	strong      []bool  // of cells set bold, nil for none
	left, right draw.Pt // widest part before and after the point
	w           draw.Pt
}

const (
	labelGap draw.Pt = 5.5 // between number and name of a row
	cellPad  draw.Pt = 3   // beside the outer ones
	groupOf          = 5   // rows between gaps, which guide the eye
	groupGap draw.Pt = 3
	whole            = 8    // rows that are not divided over sheets
	headLead draw.Pt = 10.2 // between the lines of a table's head
	rowLead  draw.Pt = 11.2
)

// cellOf is a number as printed, a dash where the branch was not taken.
func cellOf(l *trace.Line, i int) string {
	if i < 0 || !l.Taken(i) {
		return "–"
	}
	return printed(l.Shown[i])
}

// printed is a number as the sheets print it: a true minus sign, digits in groups of three from five before the
// point on.
func printed(s string) string {
	sign := ""
	if t, ok := strings.CutPrefix(s, "-"); ok {
		sign, s = "−", t
	}
	whole, _ := pointAt(s)
	if len(whole) < 5 || strings.Trim(whole, "0123456789") != "" {
		return sign + s
	}
	var b strings.Builder
	b.WriteString(sign)
	for i, d := range whole {
		if i > 0 && (len(whole)-i)%3 == 0 {
			b.WriteRune('\u2009')
		}
		b.WriteRune(d)
	}
	return b.String() + s[len(whole):]
}

// pointAt divides a number before its point, two numbers with dots between them before that of the second.
func pointAt(cell string) (before, after string) {
	if i := strings.LastIndexByte(cell, '.'); i >= 0 {
		return cell[:i], cell[i:]
	}
	return cell, ""
}

func (k *tableColumn) face(i int) draw.Face {
	if k.strong != nil && k.strong[i] {
		return draw.Bold
	}
	return draw.Serif
}

// measure finds the width of a column.
func (k *tableColumn) measure() {
	k.left, k.right = 0, 0
	for i, s := range k.cells {
		if s == "–" {
			continue
		}
		b, a := pointAt(s)
		k.left = max(k.left, draw.Width(k.face(i), tableSize, b))
		k.right = max(k.right, draw.Width(k.face(i), tableSize, a))
	}
	k.w = max(k.left+k.right, k.symbol.Width, k.unit.Width, draw.Width(draw.Serif, tinySize, k.number))
}

// widestLabel is the most room for the name of a row.
const widestLabel draw.Pt = 140

// setLabels sets the names of the rows, each on one line, and gives the widths of their columns.
func (t *table) setLabels() []draw.Pt {
	w := make([]draw.Pt, len(t.heads))
	for i, h := range t.heads {
		w[i] = draw.Width(draw.Italic, tableSize, h)
	}
	for i, h := range t.words {
		w[i] = max(w[i], draw.Width(draw.Serif, smallSize, h))
	}
	for _, r := range t.rows {
		set := make([]stack, len(r))
		for i, s := range r {
			set[i].w = 10 * widestLabel
			set[i].words(draw.Serif, tableSize, 0, 0, s)
			if len(set[i].inks) > 0 && set[i].inks[0].width() > widestLabel {
				set[i] = stack{w: widestLabel}
				set[i].put(ink{face: draw.Serif, size: tableSize, text: draw.Fit(draw.Serif, tableSize, widestLabel, s)}, tableSize*ascent, 0, 0, 0)
			}
			if len(set[i].inks) > 0 {
				set[i].inks[0].y = 0
				w[i] = max(w[i], set[i].inks[0].width())
			}
		}
		t.labels = append(t.labels, set)
	}
	return w
}

// elements measures the table: in the work column where it is narrow enough, across work and result, or across
// the sheet; in several tables one under the other where even that is too narrow, each with the names of its rows
// and the column of their places.
func (t *table) elements(above draw.Pt) []*element {
	for n := 1; ; n++ {
		var out []*element
		for i, p := range t.divided(n) {
			if i > 0 {
				above = 9
			}
			es := p.folded().set(above, n >= len(t.columns))
			if es == nil {
				out = nil
				break
			}
			out = append(out, es...)
		}
		if out != nil {
			return out
		}
	}
}

// divided is the table in n parts of about as many columns; each begins with the places of the rows.
func (t *table) divided(n int) []*table {
	kept := 0
	if t.placed {
		kept = 1
	}
	rest := t.columns[kept:]
	n = max(min(n, len(rest)), 1)
	out := make([]*table, 0, n)
	for k := range n {
		p := *t
		p.columns = append(t.columns[:kept:kept], rest[k*len(rest)/n:(k+1)*len(rest)/n]...)
		out = append(out, &p)
	}
	return out
}

// set measures the table: folded where it is long and narrow, else in the narrowest place that holds it; nil where
// none does, unless it must be set.
func (t *table) set(above draw.Pt, must bool) []*element {
	t.labels = nil
	for i := range t.columns {
		t.columns[i].measure()
	}
	labels := t.setLabels()
	if p, ok := t.panelled(labels); ok {
		return []*element{p.element(0, above)}
	}
	for _, s := range []span{spanNone, spanWide, spanFull} {
		for _, gap := range []draw.Pt{11, 8.5, 6.5} {
			if w := t.width(labels, gap, len(t.columns)); w <= s.column().w {
				return t.measured(labels, gap, w, s, above)
			}
		}
	}
	if must {
		return t.measured(labels, 6.5, t.width(labels, 6.5, len(t.columns)), spanFull, above)
	}
	return nil
}

// width is that of the labels and the first n columns.
func (t *table) width(labels []draw.Pt, gap draw.Pt, n int) draw.Pt {
	w := 2*cellPad + markWidth
	for i, l := range labels {
		w += l
		if i > 0 {
			w += labelGap
		}
	}
	for i := range t.columns[:n] {
		w += gap + t.columns[i].w
	}
	return w
}

const markWidth draw.Pt = 8

// measured gives the elements of a table that fits: its head and its rows.
func (t *table) measured(labels []draw.Pt, gap, w draw.Pt, s span, above draw.Pt) []*element {
	x0 := s.column().x
	owner := s.column().name + " " + t.owner
	head := &element{owner: t.owner, above: above, height: t.headHeight(), keep: true, ruled: true, spans: s}
	head.head = head
	head.paint = func(c draw.Canvas, y draw.Pt) {
		c.Owner(owner)
		t.paintHead(c, x0, y, w, gap, labels)
	}
	out := []*element{head}
	for i := range t.rows {
		e := &element{owner: t.owner, height: rowLead, ruled: true, spans: s, head: head, grouped: len(t.rows) > groupOf+2}
		last := i == len(t.rows)-1
		if last {
			e.height += tableBottom
		}
		e.paint = func(c draw.Canvas, y draw.Pt) {
			c.Owner(owner)
			t.paintRow(c, i, x0, y, w, gap, labels)
			if last {
				c.Line(x0, y+rowLead+1, x0+w, y+rowLead+1, strongRule)
			}
		}
		out = append(out, e)
	}
	if len(t.rows) <= whole {
		return keepTogether(out)
	}
	keepEnds(out[1:])
	return out
}

// headHeight is the height of the head: numbers, symbols and, where there are any, units.
func (t *table) headHeight() draw.Pt {
	for i := range t.columns {
		if t.columns[i].unit.Width > 0 {
			return 3*headLead + 5.5
		}
	}
	return 2*headLead + 5.5
}

func (t *table) paintHead(c draw.Canvas, x0, y, w, gap draw.Pt, labels []draw.Pt) {
	height := t.headHeight()
	c.Line(x0, y, x0+w, y, strongRule)
	c.Line(x0, y+height-2, x0+w, y+height-2, tableRule)
	x := x0 + cellPad + markWidth
	for i, h := range t.heads {
		c.Text(x, y+2*headLead-1, draw.Italic, tableSize, h)
		if i < len(t.words) {
			c.Text(x, y+headLead-1.5, draw.Serif, smallSize, t.words[i])
		}
		x += labels[i] + labelGap
	}
	x -= labelGap
	for i := range t.columns {
		k := &t.columns[i]
		x += gap + k.w
		nw := draw.Width(draw.Serif, tinySize, k.number)
		c.Text(x-nw, y+headLead-1.5, draw.Serif, tinySize, k.number)
		c.Link(x-nw, y+1, nw, headLead, k.key)
		k.symbol.Draw(c, x-k.symbol.Width, y+2*headLead-1)
		k.unit.Draw(c, x-k.unit.Width, y+3*headLead-0.5)
	}
}

func (t *table) paintRow(c draw.Canvas, i int, x0, y, w, gap draw.Pt, labels []draw.Pt) {
	if i == t.mark {
		c.Rect(x0, y+0.4, w, rowLead-0.6, draw.Style{Fill: draw.Grey(0.92)})
	}
	base := y + rowLead - 2.8
	if i == t.mark {
		c.Text(x0+1.5, base, draw.Marks, tableSize-1, "▸")
	}
	x := x0 + cellPad + markWidth
	for k := range t.labels[i] {
		t.labels[i][k].paint(c, x, base)
		x += labels[k] + labelGap
	}
	x -= labelGap
	for k := range t.columns {
		col := &t.columns[k]
		x += gap + col.w
		s := col.cells[i]
		before, _ := pointAt(s)
		face := col.face(i)
		at := x - col.right - draw.Width(face, tableSize, before)
		if s == "–" {
			at = x - (col.w+draw.Width(face, tableSize, s))/2
		}
		c.Text(at, base, face, tableSize, s)
	}
}
