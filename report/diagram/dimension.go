package diagram

import "soffit/report/draw"

// Parts of a dimension: its line carries oblique ticks where the extension lines meet it.
const (
	tick      draw.Pt = 1.6 // half the height of a tick
	beyond    draw.Pt = 2   // of lines past the ticks
	clearance draw.Pt = 1.6 // between dimension line and figures, thing and extension line
)

func ticks(c draw.Canvas, x, y draw.Pt) {
	c.Line(x-tick, y+tick, x+tick, y-tick, medium)
}

// extendDown draws an extension line from a thing at y0 to the dimension line at y1, above or below.
func extendDown(c draw.Canvas, x, y0, y1 draw.Pt) {
	s := draw.Pt(1)
	if y1 < y0 {
		s = -1
	}
	c.Line(x, y0+s*clearance, x, y1+s*beyond, hair)
}

// extendLeft draws an extension line from a thing at x0 to the dimension line at x1, left or right.
func extendLeft(c draw.Canvas, y, x0, x1 draw.Pt) {
	s := draw.Pt(1)
	if x1 < x0 {
		s = -1
	}
	c.Line(x0+s*clearance, y, x1+s*beyond, y, hair)
}

// across draws a level dimension from x0 to x1 at y, its figures above the line: in the middle where
// there is room, else beyond the end to which side points, 1 for the right and −1 for the left.
func across(c draw.Canvas, x0, x1, y draw.Pt, l label, side int) {
	acrossPast(c, x0, x1, y, l, side, x1)
}

// acrossPast is across with figures that, beyond the right end, stand right of past too.
func acrossPast(c draw.Canvas, x0, x1, y draw.Pt, l label, side int, past draw.Pt) {
	if l.width+4 > x1-x0 {
		acrossOutside(c, x0, x1, y, l, side, past)
		return
	}
	ticks(c, x0, y)
	ticks(c, x1, y)
	c.Line(x0, y, x1, y, hair)
	l.centre(c, (x0+x1)/2, y-clearance-l.depth)
}

// acrossOutside is acrossPast with the figures beyond an end whatever the room between.
func acrossOutside(c draw.Canvas, x0, x1, y draw.Pt, l label, side int, past draw.Pt) {
	ticks(c, x0, y)
	ticks(c, x1, y)
	base := y - clearance - l.depth
	if side < 0 {
		c.Line(x0-4-l.width, y, x1+beyond, y, hair)
		l.right(c, x0-3, base)
		return
	}
	past = max(past, x1)
	c.Line(x0-beyond, y, past+4+l.width, y, hair)
	l.draw(c, past+3, base)
}

// stack draws a vertical chain of dimensions at x through the places y, top to bottom, the figures left of
// it and level, moved apart where the parts are short. It returns how far left it reaches, and whether the
// figures stay between the first and the last place.
func stack(c draw.Canvas, x draw.Pt, y []draw.Pt, ls []label) (left draw.Pt, inside bool) {
	c.Line(x, y[0]-beyond, x, y[len(y)-1]+beyond, hair)
	for _, v := range y {
		ticks(c, x, v)
	}
	mid, room := make([]draw.Pt, len(ls)), make([]draw.Pt, len(ls))
	for i := range ls {
		mid[i], room[i] = (y[i]+y[i+1])/2, leading-1
	}
	to := spread(mid, room, y[0]+hair, y[len(y)-1]-hair)
	off := draw.Pt(0)
	for i := range to {
		if shifted(mid[i], to[i]) {
			off = 6
		}
	}
	for i, l := range ls {
		at := x - 3
		if off > 0 {
			at = x - 3 - off
			if shifted(mid[i], to[i]) {
				c.Polyline([]draw.Point{{X: x - 0.8, Y: mid[i]}, {X: at + 1, Y: to[i]}}, draw.Style{Stroke: hair})
			}
		}
		l.right(c, at, to[i]+middle)
	}
	inside = leading*draw.Pt(len(ls))-draw.Pt(len(ls)) <= y[len(y)-1]-y[0]-2*hair
	return x - 3 - off - wide(ls...), inside
}

func shifted(from, to draw.Pt) bool { return from-to > 1.5 || to-from > 1.5 }
