package sheet

import "soffit/report/draw"

// A long narrow table is folded: its rows run down in panels side by side, each under its own head, the first panel
// first. It breaks over sheets across all its panels at once.
const (
	leastFolded         = 8 // rows of a table that is folded
	leastPanel          = 4 // rows of a panel, but in what is left of a table
	leastBegun          = 8 // lines begun on a sheet that does not hold the rest
	leastLeft           = 3 // lines left for the next sheet
	wideSaves           = 4 // lines that a wider place must save
	panelGap    draw.Pt = 14
	tableBottom draw.Pt = 3 // below the last row
)

// panels is how a table is folded.
type panels struct {
	t      *table
	labels []draw.Pt
	gap    draw.Pt // between columns
	w      draw.Pt // of a panel
	n      int     // panels side by side
	s      span
}

// panelled folds a table that has been measured where that makes it shorter; false where it is too wide or has too
// few rows. It takes the place, and the room between columns, that make the fewest lines; a wider place only where
// that saves some.
func (t *table) panelled(labels []draw.Pt) (panels, bool) {
	best, lines := panels{}, len(t.rows)
	if lines < leastFolded {
		return best, false
	}
	for _, s := range []span{spanWide, spanFull} {
		saves := 1
		if s == spanFull && best.n > 0 {
			saves = wideSaves
		}
		start := lines
		for _, gap := range []draw.Pt{11, 8.5, 6.5} {
			w := t.width(labels, gap, len(t.columns))
			n := min(int((s.column().w+panelGap)/(w+panelGap)), len(t.rows)/leastPanel)
			if n < 2 {
				continue
			}
			if l := linesOf(len(t.rows), n); l < lines && l <= start-saves {
				best, lines = panels{t, labels, gap, w, n, s}, l
			}
		}
	}
	return best, best.n > 0
}

// linesOf is how many lines rows make in n panels.
func linesOf(rows, n int) int { return (rows + n - 1) / n }

// element is the rows from the first on.
func (p panels) element(first int, above draw.Pt) *element {
	rows := len(p.t.rows) - first
	lines := linesOf(rows, p.n)
	e := p.part(first, rows, lines)
	e.above = above
	e.begins = above + p.height(min(lines, leastBegun))
	e.split = func(room draw.Pt) (*element, *element) {
		n := p.fitting(room)
		switch {
		case n >= lines:
			e.split = nil
			return e, nil
		case n < leastBegun:
			return nil, nil
		case linesOf(rows-n*p.n, p.n) < leastLeft:
			n -= leastLeft
		}
		head := p.part(first, n*p.n, n)
		head.above = above
		return head, p.element(first+n*p.n, 0)
	}
	return e
}

// height of a head and so many lines.
func (p panels) height(lines int) draw.Pt {
	return p.t.headHeight() + draw.Pt(lines)*rowLead + draw.Pt((lines-1)/groupOf)*groupGap + tableBottom
}

// fitting is how many lines a height holds.
func (p panels) fitting(room draw.Pt) int {
	n := int((room - p.t.headHeight() - tableBottom) / rowLead)
	for n > 0 && p.height(n) > room+0.01 {
		n--
	}
	return max(n, 0)
}

// part is so many rows from the first on, in panels of so many lines.
func (p panels) part(first, rows, lines int) *element {
	t := p.t
	owner := p.s.column().name + " " + t.owner
	return &element{owner: t.owner, height: p.height(lines), ruled: true, spans: p.s, paint: func(c draw.Canvas, y draw.Pt) {
		c.Owner(owner)
		x := p.s.column().x
		for at := first; at < first+rows; at += lines {
			t.paintHead(c, x, y, p.w, p.gap, p.labels)
			below := y + t.headHeight()
			for i := at; i < min(at+lines, first+rows); i++ {
				if i > at && (i-at)%groupOf == 0 {
					below += groupGap
				}
				t.paintRow(c, i, x, below, p.w, p.gap, p.labels)
				below += rowLead
			}
			c.Line(x, below+1, x+p.w, below+1, strongRule)
			x += p.w + panelGap
		}
	}}
}
