package sheet

import (
	"soffit/calc/clause"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// columns is an entry of a calculation sheet in the making: what stands in each of the four columns.
type columns struct {
	head      *trace.Head
	reference stack
	work      stack
	result    stack
	to        []mention
	ticked    bool // the checker ticks it
	box       bool // the result is framed
	wide      bool // the work reaches across the result, which stands below it
}

// framePad is between a result and its frame.
const framePad draw.Pt = 2.5

// columnsFor starts an entry with its number, where the rule stands and where the operands come from.
func columnsFor(h *trace.Head, document string, from []mention) *columns {
	e := &columns{head: h, reference: stack{w: referenceColumn.w}, work: stack{w: workColumn.w},
		result: stack{w: resultColumn.w}, ticked: true}
	if h.Number != "" {
		// The number shares its baseline with the words beside it.
		e.reference.put(ink{face: draw.Bold, size: smallSize + 1, text: h.Number}, textSize*ascent, textSize*descent, 0, 0)
	}
	for _, line := range referenceLines(h.Ref, document) {
		e.reference.words(draw.Serif, smallSize, smallLead, 0, line)
	}
	e.reference.mentions("from", from, 0.5)
	return e
}

// referenceLines prints where a rule stands; the document is left out where the sheets take it as read.
func referenceLines(r clause.Ref, document string) []string {
	var lines []string
	if r.Document != "" && r.Document != document {
		lines = append(lines, r.Document)
	}
	s := r.Clause
	if r.Equation != "" {
		if s != "" {
			s += " "
		}
		s += "(" + r.Equation + ")"
	}
	if s != "" {
		lines = append(lines, s)
	}
	return lines
}

// formula adds a row of mathematics to the work: across the result where its own column is too narrow, or would
// break it into many lines.
func (e *columns) formula(r mathset.Row) {
	b := r.Lines(e.work.w - indent)
	if narrow := b.Width() > e.work.w-indent+0.05 || b.Size() < textSize; narrow || len(b.Lines) > 4 {
		if w := r.Lines(wideColumn.w - indent); narrow || w.Height()+textLead < 0.8*b.Height() {
			b, e.wide = w, true
		}
	}
	e.work.lines(b, textSize, textLead, lineGap, indent)
}

// element measures the entry. The result stands on the last line of the work, or on the first where that is
// asked for.
func (e *columns) element(onFirst bool) *element {
	shift := draw.Pt(0)
	if n := len(e.result.inks); n > 0 {
		target := e.work.baseline
		if onFirst && len(e.work.inks) > 0 {
			target = e.work.inks[0].y
		}
		shift = max(0, target-e.result.baseline)
		if e.wide && !e.clear(shift) {
			shift = e.work.bottom + 3
		}
	}
	tick := e.result.baseline + shift
	if len(e.result.inks) == 0 {
		tick = e.work.baseline
	}
	frame := draw.BoxAt(0, shift, e.result.w, e.result.bottom)
	if e.box {
		frame.X0 = frame.X1
		for i := range e.result.inks {
			frame.X0 = min(frame.X0, e.result.inks[i].x)
		}
		frame.X1 = e.result.inks[0].x + e.result.inks[0].width()
		frame = frame.Grow(framePad)
		frame.Y1++
	}
	e.result.oneLine("to", e.to, 1.5)
	h := max(e.reference.bottom, e.work.bottom, e.result.bottom+shift)
	number := e.head.Number
	if number == "" {
		number = e.head.Key
	}
	out := &element{owner: number, above: entryGap, height: h, ruled: true}
	work, result := "work ", "result "
	if e.wide {
		work, result, out.spans, out.across = "wide ", "wide ", spanWide, e.overhang(shift)
	}
	if e.head.Key != "" {
		out.anchors = []string{e.head.Key}
	}
	out.paint = func(c draw.Canvas, y draw.Pt) {
		c.Owner("reference " + number)
		e.reference.paint(c, referenceColumn.x, y)
		c.Owner(work + number)
		e.work.paint(c, workColumn.x, y)
		c.Owner(result + number)
		if e.box {
			c.Rect(resultColumn.x+frame.X0, y+frame.Y0, frame.Width(), frame.Height(), draw.Style{Stroke: strongRule})
		}
		e.result.paint(c, resultColumn.x, y+shift)
		if e.ticked {
			c.Owner("check " + number)
			tickBox(c, y+tick)
		}
	}
	return out
}

// clear tells whether the result, moved down by shift, stands clear of the work that reaches into its column.
func (e *columns) clear(shift draw.Pt) bool {
	const apart = 12
	top, left := e.result.inks[0].y+shift-textSize-2, resultColumn.w
	for i := range e.result.inks {
		left = min(left, e.result.inks[i].x)
	}
	for i := range e.work.inks {
		k := &e.work.inks[i]
		if k.y+k.down() > top && workColumn.x+k.x+k.width()+apart > resultColumn.x+left {
			return false
		}
	}
	return true
}

// overhang is where work, or a result moved down by shift, stands across the hairline between the two columns; pieces
// of the hairline too short to be seen as one are left out.
func (e *columns) overhang(shift draw.Pt) []reach {
	const shortest = 10
	out := []reach{}
	add := func(k *ink, x, y draw.Pt) {
		if x+k.x >= rule2+3 || x+k.x+k.width() <= rule2-3 {
			return
		}
		r := reach{y + k.y - k.up() - 1, y + k.y + k.down() + 1}
		if n := len(out); n > 0 && r.from-out[n-1].to < shortest {
			out[n-1].to = r.to
			return
		}
		out = append(out, r)
	}
	for i := range e.work.inks {
		add(&e.work.inks[i], workColumn.x, 0)
	}
	for i := range e.result.inks {
		add(&e.result.inks[i], resultColumn.x, shift)
	}
	return out
}

// tickBox draws the checker's mark and the line for initials on a baseline.
func tickBox(c draw.Canvas, y draw.Pt) {
	const side = 7
	c.Rect(checkColumn.x+0.3, y-side+0.3, side, side, draw.Style{Stroke: 0.6})
	c.Line(checkColumn.x+side+4, y+0.6, checkColumn.right, y+0.6, hairline, 1, 1.5)
}
