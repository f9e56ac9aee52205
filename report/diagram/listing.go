package diagram

import (
	"cmp"
	"math"
	"slices"

	"soffit/report/draw"
)

// listing is a small table beside a drawing: a line per row of tendons, led to from where the row lies. The
// lines stay above the floor, where there is one.
type listing struct {
	heads []label
	lines []listed
	floor draw.Pt

	straight bool // leaders run level up to where the listing begins
}

// listed is one line: a row's name and its columns, or one remark across them. From and Y are where its leader starts; a free
// line has none, and stands near Y.
type listed struct {
	from, y draw.Pt
	free    bool
	name    string
	columns []entry
	remark  *label
	mark    func(c draw.Canvas, x, y draw.Pt) // before the first column
}

// entry is what stands in a column: set from its point, so that entries of a column stand on their points.
type entry struct {
	label
	point draw.Pt
}

func text(s string) entry { return entry{label: words(s)} }

// Room for the name of a row or a load beside a drawing and in a table below it.
const (
	nameRoom  draw.Pt = 64
	tableRoom draw.Pt = 130
)

func figures(c cell) entry { return entry{label{}.number(c), beforePoint(c)} }

// Distances between columns, and of the names from the start of a line that has a mark.
const (
	columnGap draw.Pt = 7
	markWidth draw.Pt = 8
)

// draw draws the listing right of x, its lines level with their rows as far as there is room.
func (l listing) draw(c draw.Canvas, x draw.Pt) { l.withNames(nameRoom).beside(c, x) }

// withNames puts the names of the rows, no longer than room, before their columns.
func (l listing) withNames(room draw.Pt) listing {
	l.lines = slices.Clone(l.lines)
	for i, e := range l.lines {
		if e.remark == nil {
			l.lines[i].columns = append([]entry{text(shorten(draw.Serif, e.name, room))}, e.columns...)
		}
	}
	return l
}

func (l listing) beside(c draw.Canvas, x draw.Pt) {
	var at, room []draw.Pt
	top := -1 // line under the heads
	for i, e := range l.lines {
		at, room = append(at, e.y), append(room, leading)
		if e.remark == nil && (top < 0 || e.y < l.lines[top].y) {
			top = i
		}
	}
	if len(l.heads) > 0 && top >= 0 { // the heads stand over the highest line as a line of their own
		head := l.lines[top].y - leading
		for _, e := range l.lines { // and under remarks that stand higher
			if e.remark != nil && e.y <= l.lines[top].y {
				head = max(head, e.y)
			}
		}
		at, room = append(at, head), append(room, leading)
	}
	floor := draw.Pt(1e6)
	if l.floor != 0 {
		floor = l.floor
	}
	to := spread(at, room, -1e6, floor)
	bend := elbow(at[:len(l.lines)], to[:len(l.lines)])
	x0 := x + bend + 2
	left, point := l.columns(x0 + l.marked())
	for i, e := range l.lines {
		switch turn := e.from + draw.Pt(math.Abs(float64(to[i]-e.y))); {
		case e.free:
		case l.crowded(i) && turn < x && !l.straight: // away from the others' lines at once
			c.Polyline([]draw.Point{{X: e.from, Y: e.y}, {X: turn, Y: to[i]}, {X: x + bend, Y: to[i]}}, draw.Style{Stroke: hair})
		default:
			leader(c, e.from, e.y, x, x+bend, to[i])
		}
		y := to[i] + middle
		if e.mark != nil {
			e.mark(c, x0+2.5, to[i])
		}
		if e.remark != nil {
			e.remark.draw(c, x0, y)
		}
		for k, col := range e.columns {
			col.label.draw(c, left[k]+point[k]-col.point, y)
		}
	}
	if len(to) > len(l.lines) {
		l.head(c, left, point, to[len(to)-1]+middle)
	}
}

// crowded tells whether the leader of a line would run close along another.
func (l listing) crowded(i int) bool {
	const apart = 4
	for k, e := range l.lines {
		if k != i && !e.free && math.Abs(float64(e.y-l.lines[i].y)) < apart {
			return true
		}
	}
	return false
}

// below draws the listing as a table without leaders, its heads at the baseline y, from x on, the highest
// row first. It returns the lowest baseline.
func (l listing) below(c draw.Canvas, x, y draw.Pt) draw.Pt {
	l = l.withNames(tableRoom)
	left, point := l.columns(x + l.marked())
	l.head(c, left, point, y)
	lines := slices.Clone(l.lines)
	slices.SortStableFunc(lines, func(a, b listed) int { return cmp.Compare(a.y, b.y) })
	for _, e := range lines {
		if e.remark != nil {
			continue
		}
		y += leading
		if e.mark != nil {
			e.mark(c, x+2.5, y-middle)
		}
		for k, col := range e.columns {
			col.label.draw(c, left[k]+point[k]-col.point, y)
		}
	}
	return y
}

// names is the listing with the names of the rows alone, for a drawing that has the rest below.
func (l listing) names() listing {
	out := listing{lines: slices.Clone(l.lines), floor: l.floor, straight: l.straight}
	for i := range out.lines {
		out.lines[i].columns = nil
	}
	return out
}

// marked is the room for marks before the first column.
func (l listing) marked() draw.Pt {
	for _, e := range l.lines {
		if e.mark != nil {
			return markWidth
		}
	}
	return 0
}

func (l listing) head(c draw.Canvas, left, point []draw.Pt, y draw.Pt) {
	for k, h := range l.heads {
		if point[k] > 0 && k+1 < len(left) { // over figures, to their right edge
			h.right(c, left[k+1]-columnGap, y)
			continue
		}
		h.draw(c, left[k], y)
	}
}

// columns gives where the columns start, with the right end after the last, and where their points lie.
func (l listing) columns(x draw.Pt) (left, point []draw.Pt) {
	n := len(l.heads)
	for _, e := range l.lines {
		n = max(n, len(e.columns))
	}
	left, point = make([]draw.Pt, n+1), make([]draw.Pt, n)
	for k := range n {
		var after draw.Pt
		for _, e := range l.lines {
			if k < len(e.columns) {
				point[k] = max(point[k], e.columns[k].point)
				after = max(after, e.columns[k].width-e.columns[k].point)
			}
		}
		w := point[k] + after
		if k < len(l.heads) && l.heads[k].width > w {
			if point[k] > 0 {
				point[k] += l.heads[k].width - w
			}
			w = l.heads[k].width
		}
		left[k] = x
		x += w + columnGap
	}
	left[n] = x
	return left, point
}
