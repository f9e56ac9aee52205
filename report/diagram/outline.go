package diagram

import (
	"math"
	"slices"

	"soffit/report/draw"
)

// point is a place in a section, mm: x to the right, y above the soffit.
type point struct{ x, y float64 }

// ring is a closed line of corners, either way round.
type ring []point

// void is a round or oblong void at its centre, mm.
type void struct{ x, y, width, depth float64 }

// shape is a section as it is drawn: rings of concrete with holes and voids in them and a topping on top,
// lengths in mm. The strip on top is as wide and as deep as the cells say; they are not taken where there is none.
type shape struct {
	outer, holes []ring
	voids        []void
	wide, deep   cell // of the topping

	left, right, height float64 // of the bare section
	mirrored            bool    // left and right halves are alike
}

// near is how far places of the record may be apart that are meant to be one, mm: they are printed rounded.
const near = 0.6

// shape reads the roles corner-x, corner-y, corner-ring (0 for the outer line, another number for each hole) over the
// corners; optional void-x, void-y (centre), void-width, void-depth over the voids; optional topping-width,
// topping-depth.
func (d *data) shape() shape {
	x := d.rows("corner-x")
	y, number := d.beside("corner-y", x), d.beside("corner-ring", x)
	if d.err != nil {
		return shape{}
	}
	var numbers []int
	rings := map[int]ring{}
	for i, v := range number.cells {
		n := int(math.Round(v.value))
		if _, ok := rings[n]; !ok {
			numbers = append(numbers, n)
		}
		rings[n] = append(rings[n], point{x.cells[i].value, y.cells[i].value})
	}
	var s shape
	for _, n := range numbers {
		switch r := rings[n].bent(); {
		case len(r) < 3:
			d.fail("ring %d of the outline has %d corners", n, len(r))
		case n == 0:
			s.outer = append(s.outer, r)
		default:
			s.holes = append(s.holes, r)
		}
	}
	if len(s.outer) == 0 {
		d.fail("the outline has no ring 0")
		return shape{}
	}
	s.left, s.right = math.Inf(1), math.Inf(-1)
	low := math.Inf(1)
	for _, p := range s.outer[0] {
		s.left, s.right = min(s.left, p.x), max(s.right, p.x)
		low, s.height = min(low, p.y), max(s.height, p.y)
	}
	if !(s.right > s.left && s.height > 0 && math.Abs(low) < near) {
		d.fail("the outline runs from %g mm to %g mm across and from %g mm to %g mm above the soffit", s.left, s.right, low, s.height)
	}
	if d.has("void-x") {
		x := d.rows("void-x")
		y, w, h := d.beside("void-y", x), d.beside("void-width", x), d.beside("void-depth", x)
		for i := range x.cells {
			s.voids = append(s.voids, void{x.cells[i].value, y.cells[i].value, w.cells[i].value, h.cells[i].value})
		}
	}
	if d.has("topping-depth") {
		s.wide, s.deep = d.one("topping-width"), d.one("topping-depth")
	}
	s.mirrored = s.symmetrical()
	return s
}

// middle is the x of the middle of the section: its axis of symmetry if it has one.
func (s *shape) middle() float64 { return (s.left + s.right) / 2 }

// total is the depth with the topping.
func (s *shape) total() float64 { return s.height + s.deep.value }

// reach is the x of the left and right end with the topping.
func (s *shape) reach() (left, right float64) {
	w := s.wide.value / 2
	return min(s.left, s.middle()-w), max(s.right, s.middle()+w)
}

// widest is the width with the topping.
func (s *shape) widest() float64 {
	l, r := s.reach()
	return r - l
}

func (s *shape) mirror(p point) point { return point{2*s.middle() - p.x, p.y} }

func (s *shape) symmetrical() bool {
	for _, r := range append(slices.Clone(s.outer), s.holes...) {
		for _, p := range r {
			if !s.onFace(s.mirror(p)) {
				return false
			}
		}
	}
	for _, v := range s.voids {
		m := s.mirror(point{v.x, v.y})
		if !slices.ContainsFunc(s.voids, func(o void) bool {
			return math.Abs(o.x-m.x) < near && math.Abs(o.y-m.y) < near && math.Abs(o.width-v.width) < near && math.Abs(o.depth-v.depth) < near
		}) {
			return false
		}
	}
	return true
}

// bent is the ring without corners that lie on the line between their neighbours, which are no edges.
func (r ring) bent() ring {
	var out ring
	for i, p := range r {
		before, after := r[(i+len(r)-1)%len(r)], r[(i+1)%len(r)]
		if apartFrom(p, before, after) > near/10 {
			out = append(out, p)
		}
	}
	return out
}

// edges calls visit with each straight piece of a ring.
func (r ring) edges(visit func(a, b point)) {
	for i, p := range r {
		visit(p, r[(i+1)%len(r)])
	}
}

// around tells whether a point lies within the ring.
func (r ring) around(p point) bool {
	in := false
	r.edges(func(a, b point) {
		if (a.y > p.y) != (b.y > p.y) && p.x < a.x+(b.x-a.x)*(p.y-a.y)/(b.y-a.y) {
			in = !in
		}
	})
	return in
}

// distance is that of a point from the line of the ring.
func (r ring) distance(p point) float64 {
	least := math.Inf(1)
	r.edges(func(a, b point) { least = min(least, apartFrom(p, a, b)) })
	return least
}

// apartFrom is the distance of p from the piece of a line between a and b.
func apartFrom(p, a, b point) float64 {
	dx, dy := b.x-a.x, b.y-a.y
	t := 0.0
	if l := dx*dx + dy*dy; l > 0 {
		t = min(max(((p.x-a.x)*dx+(p.y-a.y)*dy)/l, 0), 1)
	}
	return math.Hypot(p.x-a.x-t*dx, p.y-a.y-t*dy)
}

// distance is that of a point from the edge of the void, negative within.
func (v void) distance(p point) float64 {
	r := min(v.width, v.depth) / 2
	return apartFrom(p, point{v.x - (v.width/2 - r), v.y - (v.depth/2 - r)}, point{v.x + (v.width/2 - r), v.y + (v.depth/2 - r)}) - r
}

// ring is the edge of the void as a line of n corners.
func (v void) ring(n int) ring {
	r := min(v.width, v.depth) / 2
	var out ring
	for i := range n {
		sin, cos := math.Sincos(2 * math.Pi * (float64(i) + 0.5) / float64(n))
		out = append(out, point{v.x + math.Copysign(v.width/2-r, cos) + r*cos, v.y + math.Copysign(v.depth/2-r, sin) + r*sin})
	}
	return out
}

// gaps are the holes and voids as rings.
func (s *shape) gaps() []ring {
	out := slices.Clone(s.holes)
	for _, v := range s.voids {
		out = append(out, v.ring(96))
	}
	return out
}

// concrete tells whether a point lies in the concrete of the bare section.
func (s *shape) concrete(p point) bool {
	in := false
	for _, r := range s.outer {
		in = in || r.around(p)
	}
	for _, r := range s.holes {
		in = in && !r.around(p)
	}
	for _, v := range s.voids {
		in = in && v.distance(p) > 0
	}
	return in
}

// onFace tells whether a point lies on a surface of the section.
func (s *shape) onFace(p point) bool {
	for _, rs := range [2][]ring{s.outer, s.holes} {
		for _, r := range rs {
			if r.distance(p) < near {
				return true
			}
		}
	}
	for _, v := range s.voids {
		if math.Abs(v.distance(p)) < near {
			return true
		}
	}
	return false
}

// hidden is the length of concrete between a point and the outside in the direction dx, dy of length 1, mm. Along a
// surface there is none.
func (s *shape) hidden(p point, dx, dy float64) float64 {
	far := s.height + s.right - s.left
	switch {
	case dy > 0:
		far = s.height - p.y
	case dy < 0:
		far = p.y
	case dx > 0:
		far = s.right - p.x
	case dx < 0:
		far = p.x - s.left
	}
	const n = 120
	within := 0
	for i := range n {
		t := far * (float64(i) + 0.5) / n
		x, y := p.x+dx*t, p.y+dy*t
		if s.concrete(point{x - near*dy, y - near*dx}) && s.concrete(point{x + near*dy, y + near*dx}) {
			within++
		}
	}
	return far * float64(within) / n
}

// ends are the least and the greatest x at which the outer line passes a height, or with the outer line turned the y at
// which it passes an x.
func (s *shape) ends(at float64, upright bool) (lo, hi float64) {
	lo, hi = math.Inf(1), math.Inf(-1)
	for _, r := range s.outer {
		r.edges(func(a, b point) {
			if upright {
				a, b = point{a.y, a.x}, point{b.y, b.x}
			}
			if min(a.y, b.y) > at+near || max(a.y, b.y) < at-near {
				return
			}
			if math.Abs(a.y-b.y) < near {
				lo, hi = min(lo, a.x, b.x), max(hi, a.x, b.x)
				return
			}
			x := a.x + (b.x-a.x)*min(max((at-a.y)/(b.y-a.y), 0), 1)
			lo, hi = min(lo, x), max(hi, x)
		})
	}
	return lo, hi
}

// silhouette are the heights of the edges that are seen from the side, without those of top and soffit.
func (s *shape) silhouette() []float64 {
	var out []float64
	for _, p := range s.outer[0] {
		if _, right := s.ends(p.y, false); p.x > right-near && p.y > near && p.y < s.height-near {
			out = append(out, p.y)
		}
	}
	slices.Sort(out)
	return slices.CompactFunc(out, func(a, b float64) bool { return math.Abs(a-b) < near })
}

// frame maps lengths of a section in mm to paper: x to the right, y up from the soffit. Sx and Sy differ where
// widths and depths are not drawn to one scale.
type frame struct {
	x, y   draw.Pt // of the soffit at x = 0
	sx, sy draw.Pt
}

func (f frame) at(x, y float64) draw.Point {
	return draw.Point{X: f.x + draw.Pt(x)*f.sx, Y: f.y - draw.Pt(y)*f.sy}
}

func (f frame) ring(r ring) []draw.Point {
	out := make([]draw.Point, len(r))
	for i, p := range r {
		out[i] = f.at(p.x, p.y)
	}
	return out
}

// strip is the topping as a ring, none where there is no topping.
func (s *shape) strip() []ring {
	if !s.deep.taken() {
		return nil
	}
	m, w := s.middle(), s.wide.value/2
	return []ring{{{m - w, s.height}, {m + w, s.height}, {m + w, s.total()}, {m - w, s.total()}}}
}

// fill lays tones over the concrete and the topping between two heights, with nothing in holes and voids.
func (s *shape) fill(c draw.Canvas, f frame, from, to float64, tone, top draw.Tone) {
	for _, part := range []struct {
		rings []ring
		tone  draw.Tone
	}{{s.outer, tone}, {s.strip(), top}, {s.gaps(), draw.White}} {
		for _, r := range part.rings {
			for _, k := range r.between(from, to) {
				c.Polygon(f.ring(k), draw.Style{Fill: part.tone})
			}
		}
	}
}

// outlines draws the lines of the section.
func (s *shape) outlines(c draw.Canvas, f frame) {
	for _, r := range s.strip() {
		c.Polygon(f.ring(r), draw.Style{Stroke: medium})
	}
	for _, rs := range [2][]ring{s.outer, s.holes} {
		for _, r := range rs {
			c.Polygon(f.ring(r), draw.Style{Stroke: outline})
		}
	}
	for _, v := range s.voids {
		c.Path(v.path(f), draw.Style{Stroke: outline})
	}
}

// path is the edge of the void on paper.
func (v void) path(f frame) draw.Path {
	const k = 0.5522847498 // of the radius: control points of a quarter of a circle
	r := min(v.width, v.depth) / 2
	at := func(sx, sy, u, w float64) draw.Point { // from the centre of the quarter in the corner sx, sy
		return f.at(v.x+sx*(v.width/2-r)+u*r, v.y+sy*(v.depth/2-r)+w*r)
	}
	start := at(1, -1, 1, 0)
	p := draw.Path{}.MoveTo(start.X, start.Y)
	for _, q := range [4][2]float64{{1, 1}, {-1, 1}, {-1, -1}, {1, -1}} { // each quarter counter-clockwise
		sx, sy := q[0], q[1]
		var from, a, b, to draw.Point
		if sx*sy > 0 {
			from, a, b, to = at(sx, sy, sx, 0), at(sx, sy, sx, sy*k), at(sx, sy, sx*k, sy), at(sx, sy, 0, sy)
		} else {
			from, a, b, to = at(sx, sy, 0, sy), at(sx, sy, sx*k, sy), at(sx, sy, sx, sy*k), at(sx, sy, sx, 0)
		}
		p = p.LineTo(from.X, from.Y).CurveTo(a.X, a.Y, b.X, b.Y, to.X, to.Y)
	}
	return p.Close()
}
