package diagram

import (
	"math"

	"soffit/report/draw"
)

// placer finds room for labels among lines and other labels.
type placer struct {
	within   draw.Box // labels stay inside
	segments [][2]draw.Point
	taken    []draw.Box
}

func (p *placer) line(pts []draw.Point) {
	for i := 1; i < len(pts); i++ {
		p.segments = append(p.segments, [2]draw.Point{pts[i-1], pts[i]})
	}
}

// direction is where a label stands from the point it belongs to.
type direction struct{ x, y draw.Pt }

// Directions to prefer.
var (
	above = direction{0, -1}
	below = direction{0, 1}
)

// note sets the lines of a label near a point, in the free place that is nearest to the preferred side, with
// a leader where it is far.
func (p *placer) note(c draw.Canvas, at draw.Point, side direction, lines ...label) {
	last := lines[len(lines)-1]
	w, h := wide(lines...), lines[0].height+draw.Pt(len(lines)-1)*leading+last.depth
	const pad, up, over, most draw.Pt = 2, 3, 6, 130
	best, least := draw.Box{}, math.Inf(1)
	try := func(dx, dy draw.Pt) { // the middle of the label from the point
		b := draw.Box{X0: at.X + dx - w/2, Y0: at.Y + dy - h/2, X1: at.X + dx + w/2, Y1: at.Y + dy + h/2}
		if d := p.within.X0 - b.X0; d > 0 {
			b.X0, b.X1 = b.X0+d, b.X1+d
		}
		if d := b.X1 - p.within.X1; d > 0 {
			b.X0, b.X1 = b.X0-d, b.X1-d
		}
		x, y := min(max(at.X, b.X0), b.X1), min(max(at.Y, b.Y0), b.Y1)
		cost := math.Hypot(float64(x-at.X), float64(y-at.Y)) + 0.15*math.Abs(float64(b.X0+b.X1)/2-float64(at.X))
		if side.y*dy+side.x*dx <= 0 {
			cost += 25
		}
		if !b.Inside(p.within) {
			cost += 1000
		}
		const tie = 1e-6 // the first of equal places, whatever the rounding
		if cost < least-tie {
			cost += p.crossed([2]draw.Point{at, {X: x, Y: y}})
			if cost += p.clash(b.Grow(pad), least-cost); cost < least-tie {
				best, least = b, cost
			}
		}
	}
	near := func(d draw.Pt) bool { return float64(d) < min(float64(most), least) } // what is farther is no better
	for dy := draw.Pt(0); near(dy - h/2); dy += up {
		for dx := draw.Pt(0); near(dx - w/2); dx += over {
			if dx < w/2+4 && dy < h/2+4 { // on the point itself
				continue
			}
			for _, s := range [4]draw.Point{{X: dx, Y: dy}, {X: -dx, Y: dy}, {X: dx, Y: -dy}, {X: -dx, Y: -dy}} {
				try(s.X, s.Y)
			}
		}
	}
	b := best
	x, y := min(max(at.X, b.X0), b.X1), min(max(at.Y, b.Y0), b.Y1)
	if far := math.Hypot(float64(x-at.X), float64(y-at.Y)); far > 6 {
		f := draw.Pt(1 - 1.5/far)
		pts := []draw.Point{at, {X: at.X + (x-at.X)*f, Y: at.Y + (y-at.Y)*f}}
		c.Polyline(pts, draw.Style{Stroke: hair})
		p.line(pts)
	}
	if p.clash(b, 1) > 0 { // nowhere is there room: lines are broken for the label
		k := b.Grow(1)
		c.Rect(k.X0, k.Y0, k.Width(), k.Height(), draw.Style{Fill: draw.White})
	}
	for i, l := range lines {
		l.centre(c, (b.X0+b.X1)/2, b.Y0+lines[0].height+draw.Pt(i)*leading)
	}
	p.taken = append(p.taken, b)
}

// clash is how much a box is in the way: 100 for each line or label it meets, counted up to a limit.
func (p *placer) clash(b draw.Box, limit float64) float64 {
	var cost float64
	for _, t := range p.taken {
		if b.Overlaps(t) {
			cost += 100
		}
	}
	for _, s := range p.segments {
		if cost >= limit {
			break
		}
		if max(s[0].X, s[1].X) >= b.X0 && min(s[0].X, s[1].X) <= b.X1 &&
			max(s[0].Y, s[1].Y) >= b.Y0 && min(s[0].Y, s[1].Y) <= b.Y1 && meets(s, b) {
			cost += 100
		}
	}
	return cost
}

// crossed is how much a leader from a point is in the way of labels: 50 for each that it meets.
func (p *placer) crossed(leader [2]draw.Point) float64 {
	var cost float64
	for _, t := range p.taken {
		if at := leader[0]; (at.X < t.X0 || at.X > t.X1 || at.Y < t.Y0 || at.Y > t.Y1) && meets(leader, t) {
			cost += 50
		}
	}
	return cost
}

// meets tells whether a piece of a line runs through a box.
func meets(s [2]draw.Point, b draw.Box) bool {
	t0, t1 := draw.Pt(0), draw.Pt(1)
	dx, dy := s[1].X-s[0].X, s[1].Y-s[0].Y
	for _, e := range [4][2]draw.Pt{{-dx, s[0].X - b.X0}, {dx, b.X1 - s[0].X}, {-dy, s[0].Y - b.Y0}, {dy, b.Y1 - s[0].Y}} {
		switch d, q := e[0], e[1]; {
		case d == 0 && q < 0:
			return false
		case d < 0:
			t0 = max(t0, q/d)
		case d > 0:
			t1 = min(t1, q/d)
		}
	}
	return t0 <= t1
}
