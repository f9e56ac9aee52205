package section

import (
	"math"
	"slices"
)

// Point is a place in the section, mm: X to the right, Y up.
type Point struct{ X, Y float64 }

// Ring is a closed line of straight edges from corner to corner, the last joined to the first, either way
// round. The first corner may stand again at the end.
type Ring []Point

func sorted(v []float64) []float64 { slices.Sort(v); return v }

// turn is twice the area of the triangle a, b, c, positive counter-clockwise.
func turn(a, b, c Point) float64 { return (b.X-a.X)*(c.Y-a.Y) - (c.X-a.X)*(b.Y-a.Y) }

func distance(a, b Point) float64 { return math.Hypot(b.X-a.X, b.Y-a.Y) }

// edge is a straight line between two points, which may coincide.
type edge struct{ a, b Point }

// nearest is the point of the edge closest to p.
func (e edge) nearest(p Point) Point {
	dx, dy := e.b.X-e.a.X, e.b.Y-e.a.Y
	l := dx*dx + dy*dy
	if l == 0 {
		return e.a
	}
	u := math.Max(0, math.Min(1, ((p.X-e.a.X)*dx+(p.Y-e.a.Y)*dy)/l))
	return Point{e.a.X + u*dx, e.a.Y + u*dy}
}

func (e edge) distance(p Point) float64 { return distance(p, e.nearest(p)) }

// off is the distance of p from the straight line through the edge, positive to its left.
func (e edge) off(p Point) float64 {
	l := distance(e.a, e.b)
	if l == 0 {
		return distance(e.a, p)
	}
	return turn(e.a, e.b, p) / l
}

// meeting tells how two edges lie to each other.
type meeting int

const (
	apart meeting = iota
	touching
	crossing
)

// meets finds how two edges lie to each other, and where they are closest. Within eps they touch.
func (e edge) meets(f edge, eps float64) (meeting, Point) {
	c, d, a, b := e.off(f.a), e.off(f.b), f.off(e.a), f.off(e.b)
	if astride(c, d, eps) && astride(a, b, eps) {
		u := a / (a - b)
		return crossing, Point{e.a.X + u*(e.b.X-e.a.X), e.a.Y + u*(e.b.Y-e.a.Y)}
	}
	gap, at := e.gap(f)
	if gap <= eps {
		return touching, at
	}
	return apart, at
}

// astride says that two points lie clearly on either side.
func astride(c, d, eps float64) bool { return c > eps && d < -eps || c < -eps && d > eps }

// gap is the distance of two edges, and a point where they are closest.
func (e edge) gap(f edge) (float64, Point) {
	c, d, a, b := e.off(f.a), e.off(f.b), f.off(e.a), f.off(e.b)
	if astride(c, d, 0) && astride(a, b, 0) {
		u := a / (a - b)
		return 0, Point{e.a.X + u*(e.b.X-e.a.X), e.a.Y + u*(e.b.Y-e.a.Y)}
	}
	least, at := math.Inf(1), Point{}
	for _, k := range [4]struct {
		line edge
		p    Point
	}{{e, f.a}, {e, f.b}, {f, e.a}, {f, e.b}} {
		if g := k.line.distance(k.p); g < least {
			least, at = g, k.p
		}
	}
	return least, at
}

// edges gives the edges of the ring in order; edge i begins at corner i.
func (r Ring) edges() []edge {
	out := make([]edge, len(r))
	for i, p := range r {
		out[i] = edge{p, r[(i+1)%len(r)]}
	}
	return out
}

// around reports whether the ring goes round p. On the ring itself the answer is either.
func (r Ring) around(p Point) bool {
	in := false
	for _, e := range r.edges() {
		if (e.a.Y > p.Y) != (e.b.Y > p.Y) && p.X < e.a.X+(p.Y-e.a.Y)/(e.b.Y-e.a.Y)*(e.b.X-e.a.X) {
			in = !in
		}
	}
	return in
}

// length is the length of the ring.
func (r Ring) length() (u float64) {
	for _, e := range r.edges() {
		u += distance(e.a, e.b)
	}
	return u
}

// Round is a circle, or a rectangle with a half circle at each of two ends: overall measures about a centre,
// mm. Where Width = Depth it is a circle; where Depth is greater it stands upright, the half circles below
// and above; where Width is, it lies level, the half circles left and right.
type Round struct{ X, Y, Width, Depth float64 }

// Circle is a Round.
func Circle(x, y, radius float64) Round { return Round{x, y, 2 * radius, 2 * radius} }

func (r Round) radius() float64 { return math.Min(r.Width, r.Depth) / 2 }

// core is the line between the centres of the half circles.
func (r Round) core() edge {
	u, v := math.Max(0, r.Width-r.Depth)/2, math.Max(0, r.Depth-r.Width)/2
	return edge{Point{r.X - u, r.Y - v}, Point{r.X + u, r.Y + v}}
}

// holds says by how much p lies inside the round; negative outside.
func (r Round) holds(p Point) float64 { return r.radius() - r.core().distance(p) }

// length is the length of its surface.
func (r Round) length() float64 {
	c := r.core()
	return 2*math.Pi*r.radius() + 2*distance(c.a, c.b)
}

// halfWidth is half the width of the round at level y, 0 above and below it.
func (r Round) halfWidth(y float64) float64 {
	rad, core := r.radius(), r.core()
	t := math.Max(0, math.Max(core.a.Y-y, y-core.b.Y)) // beyond the centre of a half circle
	if t >= rad {
		return 0
	}
	return core.b.X - r.X + math.Sqrt((rad-t)*(rad+t))
}
