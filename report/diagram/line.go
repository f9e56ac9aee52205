package diagram

import (
	"math"

	"soffit/report/draw"
)

// Widths of lines.
const (
	edge    draw.Pt = 0.25 // edges within an outline
	hair    draw.Pt = 0.4  // dimensions, leaders, axes
	medium  draw.Pt = 0.6
	outline draw.Pt = 0.9 // concrete, governing curves
)

// Tones of areas.
var (
	concrete   = draw.Grey(0.94)
	compressed = draw.Grey(0.78)
	envelope   = draw.Grey(0.90)
	cast       = draw.Grey(0.98) // topping
	squeezed   = draw.Grey(0.84) // compressed topping
	faint      = draw.Grey(0.5)  // what lies elsewhere along the member
)

// chain is the dash of axes of symmetry and neutral axes, dashed that of hidden and second lines, long that of bars
// seen from the side.
var (
	long   = []draw.Pt{7, 1.5}
	chain  = []draw.Pt{6, 1.5, 1, 1.5}
	dashed = []draw.Pt{2.4, 1.6}
)

// arrow draws a line with a filled head at its end.
func arrow(c draw.Canvas, x1, y1, x2, y2, width, head draw.Pt) {
	d := draw.Pt(math.Hypot(float64(x2-x1), float64(y2-y1)))
	if d == 0 {
		return
	}
	head = min(head, d)
	ux, uy := (x2-x1)/d, (y2-y1)/d
	bx, by := x2-ux*head, y2-uy*head
	if d > head {
		c.Line(x1, y1, bx, by, width)
	}
	w := head * 0.32
	c.Polygon([]draw.Point{{X: x2, Y: y2}, {X: bx - uy*w, Y: by + ux*w}, {X: bx + uy*w, Y: by - ux*w}},
		draw.Style{Fill: draw.Black})
}

// leader leads from a thing at x0, y0 level to x1 and from there to a label at x2, y2.
func leader(c draw.Canvas, x0, y0, x1, x2, y2 draw.Pt) {
	pts := []draw.Point{{X: x0, Y: y0}, {X: x1, Y: y0}, {X: x2, Y: y2}}
	if y0 == y2 {
		pts = []draw.Point{{X: x0, Y: y0}, {X: x2, Y: y2}}
	}
	c.Polyline(pts, draw.Style{Stroke: hair})
}

// elbow is the room that leaders need between their level part and the labels so that they stay apart:
// as wide as half the longest way up or down.
func elbow(from, to []draw.Pt) draw.Pt {
	var far draw.Pt
	for i := range from {
		far = max(far, from[i]-to[i], to[i]-from[i])
	}
	return min(max(6, far/2), 24)
}
