package diagram

import "soffit/report/draw"

// tape is a Canvas that keeps what is drawn on it, with the box around the ink, and draws it again
// elsewhere. A diagram is drawn on tapes until it fits, then once on paper.
type tape struct {
	ops []func(c draw.Canvas, dx, dy draw.Pt)
	ink draw.Box
}

var _ draw.Canvas = (*tape)(nil)

// replay draws what the tape holds, moved by dx, dy.
func (t *tape) replay(c draw.Canvas, dx, dy draw.Pt) {
	for _, op := range t.ops {
		op(c, dx, dy)
	}
}

func (t *tape) keep(box draw.Box, op func(c draw.Canvas, dx, dy draw.Pt)) {
	t.ops = append(t.ops, op)
	if box == (draw.Box{}) {
		return
	}
	if t.ink == (draw.Box{}) {
		t.ink = box
		return
	}
	t.ink = t.ink.Union(box)
}

// Text keeps text.
func (t *tape) Text(x, y draw.Pt, f draw.Face, size draw.Pt, s string) {
	e := draw.Extent(f, size, s)
	t.keep(draw.Box{X0: x + e.X0, Y0: y + e.Y0, X1: x + e.X1, Y1: y + e.Y1}, func(c draw.Canvas, dx, dy draw.Pt) {
		c.Text(x+dx, y+dy, f, size, s)
	})
}

// TextUp keeps turned text.
func (t *tape) TextUp(x, y draw.Pt, f draw.Face, size draw.Pt, s string) {
	e := draw.Extent(f, size, s)
	t.keep(draw.Box{X0: x + e.Y0, Y0: y - e.X1, X1: x + e.Y1, Y1: y - e.X0}, func(c draw.Canvas, dx, dy draw.Pt) {
		c.TextUp(x+dx, y+dy, f, size, s)
	})
}

// Line keeps a line.
func (t *tape) Line(x1, y1, x2, y2, width draw.Pt, dash ...draw.Pt) {
	box := draw.Box{X0: min(x1, x2), Y0: min(y1, y2), X1: max(x1, x2), Y1: max(y1, y2)}.Grow(width / 2)
	t.keep(box, func(c draw.Canvas, dx, dy draw.Pt) {
		c.Line(x1+dx, y1+dy, x2+dx, y2+dy, width, dash...)
	})
}

// Rect keeps a rectangle.
func (t *tape) Rect(x, y, w, h draw.Pt, style draw.Style) {
	t.keep(draw.BoxAt(x, y, w, h).Grow(style.Stroke/2), func(c draw.Canvas, dx, dy draw.Pt) {
		c.Rect(x+dx, y+dy, w, h, style)
	})
}

// Polygon keeps a closed shape.
func (t *tape) Polygon(pts []draw.Point, style draw.Style) {
	t.keep(around(pts).Grow(style.Stroke/2), func(c draw.Canvas, dx, dy draw.Pt) {
		c.Polygon(moved(pts, dx, dy), style)
	})
}

// Polyline keeps an open line.
func (t *tape) Polyline(pts []draw.Point, style draw.Style) {
	t.keep(around(pts).Grow(style.Stroke/2), func(c draw.Canvas, dx, dy draw.Pt) {
		c.Polyline(moved(pts, dx, dy), style)
	})
}

// Circle keeps a circle.
func (t *tape) Circle(x, y, r draw.Pt, style draw.Style) {
	t.keep(draw.BoxAt(x-r, y-r, 2*r, 2*r).Grow(style.Stroke/2), func(c draw.Canvas, dx, dy draw.Pt) {
		c.Circle(x+dx, y+dy, r, style)
	})
}

// Path keeps an outline with curves; its box is the one around the control points.
func (t *tape) Path(p draw.Path, style draw.Style) {
	var pts []draw.Point
	for _, s := range p {
		switch s.Kind {
		case draw.CurveTo:
			pts = append(pts, s.A, s.B, s.P)
		case draw.Move, draw.LineTo:
			pts = append(pts, s.P)
		}
	}
	t.keep(around(pts).Grow(style.Stroke/2), func(c draw.Canvas, dx, dy draw.Pt) {
		out := make(draw.Path, len(p))
		for i, s := range p {
			at := moved([]draw.Point{s.A, s.B, s.P}, dx, dy)
			out[i] = draw.Segment{Kind: s.Kind, A: at[0], B: at[1], P: at[2]}
		}
		c.Path(out, style)
	})
}

// Hidden keeps unseen text, which takes no room.
func (t *tape) Hidden(x, y, size draw.Pt, s string) {
	t.keep(draw.Box{}, func(c draw.Canvas, dx, dy draw.Pt) { c.Hidden(x+dx, y+dy, size, s) })
}

// Link keeps a link, which takes no room.
func (t *tape) Link(x, y, w, h draw.Pt, anchor string) {
	t.keep(draw.Box{}, func(c draw.Canvas, dx, dy draw.Pt) { c.Link(x+dx, y+dy, w, h, anchor) })
}

// Anchor keeps an anchor.
func (t *tape) Anchor(name string, x, y draw.Pt) {
	t.keep(draw.Box{}, func(c draw.Canvas, dx, dy draw.Pt) { c.Anchor(name, x+dx, y+dy) })
}

// Owner keeps a change of owner.
func (t *tape) Owner(label string) {
	t.keep(draw.Box{}, func(c draw.Canvas, _, _ draw.Pt) { c.Owner(label) })
}

func moved(pts []draw.Point, dx, dy draw.Pt) []draw.Point {
	out := make([]draw.Point, len(pts))
	for i, p := range pts {
		out[i] = draw.Point{X: p.X + dx, Y: p.Y + dy}
	}
	return out
}

// around is the box around some points.
func around(pts []draw.Point) draw.Box {
	if len(pts) == 0 {
		return draw.Box{}
	}
	b := draw.Box{X0: pts[0].X, Y0: pts[0].Y, X1: pts[0].X, Y1: pts[0].Y}
	for _, p := range pts[1:] {
		b = draw.Box{X0: min(b.X0, p.X), Y0: min(b.Y0, p.Y), X1: max(b.X1, p.X), Y1: max(b.Y1, p.Y)}
	}
	return b
}
