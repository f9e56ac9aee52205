package diagram

import (
	"math"

	"soffit/report/draw"
)

// placed is a dimension inside the section on paper: ticks at its ends, its line, which may run on to its figures, the
// figures, and short lines across it at ends that lie on no surface.
type placed struct {
	measure
	a, b     draw.Point
	from, to draw.Point // of the line
	label    label
	x0, base draw.Pt
	loose    [2]bool
	lines    [][2]draw.Point // from the ends of what is measured to the line
	label0   draw.Box
}

// others are the lines of the dimension beside its own: those to it, up to their ends, and those across it.
func (p placed) others() [][2]draw.Point {
	var out [][2]draw.Point
	for _, e := range p.lines {
		a, b := e[0], e[1]
		if p.level {
			s := pick[draw.Pt](b.Y < a.Y, -1, 1)
			a.Y, b.Y = a.Y+s*clearance, b.Y+s*beyond
		} else {
			s := pick[draw.Pt](b.X < a.X, -1, 1)
			a.X, b.X = a.X+s*clearance, b.X+s*beyond
		}
		out = append(out, [2]draw.Point{a, b})
	}
	const half draw.Pt = 4
	for i, e := range [2]draw.Point{p.a, p.b} {
		switch {
		case !p.loose[i]:
		case p.level:
			out = append(out, [2]draw.Point{{X: e.X, Y: e.Y - half}, {X: e.X, Y: e.Y + half}})
		default:
			out = append(out, [2]draw.Point{{X: e.X - half, Y: e.Y}, {X: e.X + half, Y: e.Y}})
		}
	}
	return out
}

func (p placed) draw(c draw.Canvas) {
	for _, e := range append(p.others(), [2]draw.Point{p.from, p.to}) {
		c.Line(e[0].X, e[0].Y, e[1].X, e[1].Y, hair)
	}
	ticks(c, p.a.X, p.a.Y)
	ticks(c, p.b.X, p.b.Y)
	p.label.draw(c, p.x0, p.base)
}

// interior is the room inside a section on paper.
type interior struct{ placer }

// room is the interior with all that stands in it but dimensions.
func (s *crossSection) room(f frame) *interior {
	r := &interior{}
	p, q := f.at(s.shape.left, s.shape.height), f.at(s.shape.right, 0)
	r.within = draw.Box{X0: p.X, Y0: p.Y, X1: q.X, Y1: q.Y}
	closed := func(k ring) {
		p := f.ring(k)
		r.line(append(p, p[0]))
	}
	for _, rs := range [3][]ring{s.shape.outer, s.shape.holes, s.shape.strip()} {
		for _, k := range rs {
			closed(k)
		}
	}
	for _, v := range s.shape.voids {
		closed(v.ring(24))
	}
	l, e := s.shape.reach()
	level := func(y, from float64) {
		p := f.at(from, y)
		r.line([]draw.Point{p, {X: f.at(e, 0).X + 6, Y: p.Y}})
	}
	for _, v := range s.axes {
		level(v.value, l)
	}
	for _, k := range []dots{s.tendons, s.bars} {
		for i, y := range k.height {
			level(y, k.last(i))
		}
		k.each(f, func(_ int, p draw.Point, radius draw.Pt, _ bool) {
			r.taken = append(r.taken, draw.Box{X0: p.X, Y0: p.Y, X1: p.X, Y1: p.Y}.Grow(radius+0.8))
		})
	}
	return r
}

// through keeps labels off the lines which a dimension outside draws through the section.
func (r *interior) through(f frame, s *shape, m measure) {
	for _, e := range [2]point{m.a, m.b} {
		p := f.at(e.x, e.y)
		if m.level {
			r.line([]draw.Point{p, {X: p.X, Y: f.at(0, s.height).Y - 4}})
			r.line([]draw.Point{p, {X: p.X, Y: f.y + 4}})
			continue
		}
		r.line([]draw.Point{p, {X: f.at(s.left, 0).X - 4, Y: p.Y}})
		if o := s.mirror(e); s.mirrored { // it may be moved to the other side
			r.line([]draw.Point{f.at(o.x, o.y), {X: f.at(s.right, 0).X + 4, Y: p.Y}})
		}
	}
}

// place finds where a dimension stands best inside, if it can: at its ends, along the surfaces that it joins, at a like
// void, or on the other side of the axis of symmetry.
func (r *interior) place(f frame, s *shape, m measure) (placed, bool) {
	best, least := placed{}, math.Inf(1)
	l := label{}.length(m.value)
	for _, k := range s.alike(m) {
		for _, at := range s.slides(k.measure, f) {
			for _, q := range variants(f, at.measure, l) {
				cost := k.cost + at.cost + q.cost
				if cost >= least {
					continue
				}
				if at.moved {
					for i, e := range [2]point{k.a, k.b} {
						q.lines = append(q.lines, [2]draw.Point{f.at(e.x, e.y), [2]draw.Point{q.a, q.b}[i]})
					}
				}
				if !at.moved {
					for i, e := range [2]point{at.a, at.b} {
						q.loose[i] = !s.onFace(e)
					}
				}
				if !r.free(q.placed) {
					continue
				}
				if at.moved {
					if cost += 4 * r.crossings(q.from, q.to); cost >= least {
						continue
					}
				}
				best, least = q.placed, cost
			}
		}
	}
	if math.IsInf(least, 1) {
		return placed{}, false
	}
	r.line([]draw.Point{best.from, best.to})
	for _, e := range [2]draw.Point{best.a, best.b} {
		r.line([]draw.Point{{X: e.X - tick, Y: e.Y + tick}, {X: e.X + tick, Y: e.Y - tick}})
	}
	for _, e := range best.others() {
		r.line(e[:])
	}
	r.taken = append(r.taken, best.label0)
	return best, true
}

// choice is a place of a dimension with what speaks against it.
type choice struct {
	measure
	cost  float64
	moved bool // away from the surfaces, with lines to it
}

// alike are the dimension and others that say the same: at each like void, and mirrored.
func (s *shape) alike(m measure) []choice {
	out := []choice{{measure: m}}
	add := func(a, b point, cost float64) {
		k := m
		k.a, k.b = a, b
		if m.level && a.x > b.x {
			k.a, k.b = b, a
		}
		out = append(out, choice{measure: k, cost: cost})
	}
	belongs := func(p point) int { // the void of which p is the centre or on the edge
		for i, v := range s.voids {
			if math.Hypot(p.x-v.x, p.y-v.y) < near || math.Abs(v.distance(p)) < near {
				return i
			}
		}
		return -1
	}
	if i, k := belongs(m.a), belongs(m.b); i >= 0 || k >= 0 {
		i = max(i, k)
		for j, v := range s.voids {
			o := s.voids[i]
			if j == i || v.width != o.width || v.depth != o.depth || math.Abs(v.y-o.y) > near {
				continue
			}
			a, b := point{m.a.x + v.x - o.x, m.a.y}, point{m.b.x + v.x - o.x, m.b.y}
			if belongs(a) >= 0 == (belongs(m.a) >= 0) && belongs(b) >= 0 == (belongs(m.b) >= 0) {
				add(a, b, 1+0.2*math.Abs(float64(j-i)))
			}
		}
	}
	if s.mirrored {
		add(s.mirror(m.a), s.mirror(m.b), 3)
	}
	return out
}

// slides are the places of a dimension along the surfaces that it joins, and some way from them.
func (s *shape) slides(m measure, f frame) []choice {
	out := []choice{{measure: m}}
	const step draw.Pt = 2
	per, lo, hi := f.sy, 0.0, s.height
	if !m.level {
		per, lo, hi = f.sx, s.left, s.right
	}
	for d := draw.Pt(7); d < 40; d += step {
		for _, by := range []float64{float64(d / per), -float64(d / per)} {
			k := m
			if m.level {
				k.a.y, k.b.y = m.a.y+by, m.b.y+by
			} else {
				k.a.x, k.b.x = m.a.x+by, m.b.x+by
			}
			out = append(out, choice{measure: k, cost: 9 + 0.4*float64(d), moved: true})
		}
	}
	if !s.onFace(m.a) || !s.onFace(m.b) {
		return out
	}
	by := float64(step / per)
	for _, dir := range []float64{1, -1} {
		for d := by; ; d += by {
			k := m
			if m.level {
				k.a.y, k.b.y = m.a.y+dir*d, m.b.y+dir*d
			} else {
				k.a.x, k.b.x = m.a.x+dir*d, m.b.x+dir*d
			}
			if v := pick(m.level, k.a.y, k.a.x); v < lo || v > hi || !s.onFace(k.a) || !s.onFace(k.b) {
				break
			}
			out = append(out, choice{measure: k, cost: 0.15 * d * float64(per)})
		}
	}
	return out
}

// variant is a dimension with its figures in one of their places.
type variant struct {
	placed
	cost float64
}

// variants are the places of figures: over the line of a level dimension, beside that of an upright one, or beyond an
// end.
func variants(f frame, m measure, l label) []variant {
	a, b := f.at(m.a.x, m.a.y), f.at(m.b.x, m.b.y)
	var out []variant
	add := func(from, to draw.Point, x0, base draw.Pt, cost float64) {
		out = append(out, variant{placed{measure: m, a: a, b: b, from: from, to: to, label: l, x0: x0, base: base, label0: l.at(x0, base)}, cost})
	}
	if m.level {
		base := a.Y - clearance - l.depth
		if l.width+4 <= b.X-a.X {
			for i, t := range []draw.Pt{0.5, 0.35, 0.65, 0.22, 0.78} {
				if x := a.X + (b.X-a.X)*t - l.width/2; x > a.X+2 && x+l.width < b.X-2 {
					add(a, b, x, base, float64(i))
				}
			}
		}
		left, right := a, b
		left.X, right.X = a.X-beyond, b.X+beyond
		add(left, draw.Point{X: b.X + 4 + l.width, Y: a.Y}, b.X+3, base, 8)
		add(draw.Point{X: a.X - 4 - l.width, Y: a.Y}, right, a.X-3-l.width, base, 8)
		return out
	}
	mid := (a.Y+b.Y)/2 + middle
	for i, t := range []draw.Pt{0, 0.2, -0.2} {
		y := mid + t*(a.Y-b.Y)
		add(a, b, a.X-3-l.width, y, float64(2*i))
		add(a, b, a.X+3, y, float64(2*i)+0.5)
	}
	top, low := b.Y-3-size, a.Y+3+size
	for _, x0 := range []draw.Pt{a.X - 3 - l.width, a.X + 3} {
		add(draw.Point{X: a.X, Y: a.Y + beyond}, draw.Point{X: a.X, Y: top}, x0, b.Y-4, 8)
		add(draw.Point{X: a.X, Y: low}, draw.Point{X: a.X, Y: b.Y - beyond}, x0, a.Y+4+l.height, 8)
	}
	return out
}

// free tells whether a dimension meets nothing: its figures no line, its line no dot or figures, and no line along it.
func (r *interior) free(p placed) bool {
	if !p.label0.Grow(1.2).Inside(r.within) || r.clash(p.label0.Grow(1.2), 1) > 0 {
		return false
	}
	line := around([]draw.Point{p.from, p.to})
	ends := [2]draw.Box{around([]draw.Point{p.a}).Grow(tick + 0.4), around([]draw.Point{p.b}).Grow(tick + 0.4)}
	for _, t := range r.taken {
		if line.Grow(0.6).Overlaps(t) || ends[0].Overlaps(t) || ends[1].Overlaps(t) {
			return false
		}
	}
	for _, e := range p.others() {
		if around(e[:]).Grow(0.8).Overlaps(p.label0) {
			return false
		}
		for _, t := range r.taken {
			if around(e[:]).Grow(0.6).Overlaps(t) {
				return false
			}
		}
	}
	for _, e := range p.lines {
		if r.along(around(e[:]), !p.level, 3) {
			return false
		}
	}
	// What runs on beyond the ends crosses nothing.
	for _, e := range [2][2]draw.Point{{p.from, nearest(p.from, p.a, p.b)}, {p.to, nearest(p.to, p.a, p.b)}} {
		d := draw.Pt(math.Hypot(float64(e[0].X-e[1].X), float64(e[0].Y-e[1].Y)))
		if d <= beyond {
			continue
		}
		k := 0.8 / d
		from := draw.Point{X: e[1].X + (e[0].X-e[1].X)*k, Y: e[1].Y + (e[0].Y-e[1].Y)*k}
		tail := draw.Box{X0: min(e[0].X, from.X), Y0: min(e[0].Y, from.Y), X1: max(e[0].X, from.X), Y1: max(e[0].Y, from.Y)}
		if r.clash(tail.Grow(0.3), 1) > 0 {
			return false
		}
	}
	return !r.along(line, p.level, 2.5)
}

// crossings counts the lines that one from a to b crosses.
func (r *interior) crossings(a, b draw.Point) float64 {
	n := 0.0
	line := around([]draw.Point{a, b}).Grow(0.1)
	for _, s := range r.segments {
		if meets(s, line) {
			n++
		}
	}
	return n
}

// along tells whether a line runs along another one nearer than close.
func (r *interior) along(line draw.Box, level bool, close draw.Pt) bool {
	for _, s := range r.segments {
		if level && max(s[0].Y-line.Y0, line.Y0-s[0].Y) < close && max(s[1].Y-line.Y0, line.Y0-s[1].Y) < close &&
			max(s[0].X, s[1].X) > line.X0+1 && min(s[0].X, s[1].X) < line.X1-1 {
			return true
		}
		if !level && max(s[0].X-line.X0, line.X0-s[0].X) < close && max(s[1].X-line.X0, line.X0-s[1].X) < close &&
			max(s[0].Y, s[1].Y) > line.Y0+1 && min(s[0].Y, s[1].Y) < line.Y1-1 {
			return true
		}
	}
	return false
}

// nearest is the one of two points that is nearer to p.
func nearest(p, a, b draw.Point) draw.Point {
	if math.Hypot(float64(p.X-a.X), float64(p.Y-a.Y)) <= math.Hypot(float64(p.X-b.X), float64(p.Y-b.Y)) {
		return a
	}
	return b
}
