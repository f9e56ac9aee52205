package section

import "math"

// part is one part of a contour under check: a ring or a round.
type part struct {
	Part
	ring   Ring  // cleaned: no corner twice
	corner []int // of the contour, for each corner of ring
	round  Round
	isRing bool
}

// parts are all of a contour, with its extent.
type parts struct {
	list      []part
	low, high Point
	eps       float64 // distance within which things touch
}

// partsOf gathers the parts, refuses numbers that are none, and leaves out corners that stand twice.
func partsOf(c Contour) (*parts, error) {
	if len(c.Outer)+len(c.Discs) == 0 {
		return nil, &Refusal{Reason: Empty, Corner: -1, OtherCorner: -1}
	}
	p := &parts{low: Point{math.Inf(1), math.Inf(1)}, high: Point{math.Inf(-1), math.Inf(-1)}}
	for _, k := range []struct {
		kind  Kind
		rings []Ring
	}{{Outer, c.Outer}, {Hole, c.Holes}} {
		for i, r := range k.rings {
			if err := p.addRing(Part{k.kind, i}, r); err != nil {
				return nil, err
			}
		}
	}
	for _, k := range []struct {
		kind   Kind
		rounds []Round
	}{{Void, c.Voids}, {Disc, c.Discs}} {
		for i, r := range k.rounds {
			if err := p.addRound(Part{k.kind, i}, r); err != nil {
				return nil, err
			}
		}
	}
	p.eps = thin * math.Max(p.high.X-p.low.X, p.high.Y-p.low.Y)
	if math.IsInf(p.eps, 0) || math.IsNaN(p.eps) {
		return nil, &Refusal{Reason: NotFinite, Corner: -1, OtherCorner: -1}
	}
	for i := range p.list {
		if k := &p.list[i]; k.isRing {
			k.clean(p.eps)
		}
	}
	return p, nil
}

func (p *parts) addRing(name Part, r Ring) error {
	if len(r) == 0 {
		return &Refusal{Reason: FewCorners, Part: name, Corner: -1, OtherCorner: -1}
	}
	k := part{Part: name, isRing: true}
	for i, q := range r {
		if !finite(q.X) || !finite(q.Y) {
			return &Refusal{Reason: NotFinite, Part: name, Corner: i, OtherCorner: -1}
		}
		k.ring, k.corner = append(k.ring, q), append(k.corner, i)
		p.stretch(q)
	}
	p.list = append(p.list, k)
	return nil
}

func (p *parts) addRound(name Part, r Round) error {
	if !finite(r.X) || !finite(r.Y) || !finite(r.Width) || !finite(r.Depth) {
		return &Refusal{Reason: NotFinite, Part: name, Corner: -1, OtherCorner: -1}
	}
	if !(r.Width > 0 && r.Depth > 0) {
		return &Refusal{Reason: NoArea, Part: name, Corner: -1, OtherCorner: -1, Have: math.Min(r.Width, r.Depth)}
	}
	p.list = append(p.list, part{Part: name, round: r})
	p.stretch(Point{r.X - r.Width/2, r.Y - r.Depth/2})
	p.stretch(Point{r.X + r.Width/2, r.Y + r.Depth/2})
	return nil
}

func (p *parts) stretch(q Point) {
	p.low = Point{math.Min(p.low.X, q.X), math.Min(p.low.Y, q.Y)}
	p.high = Point{math.Max(p.high.X, q.X), math.Max(p.high.Y, q.Y)}
}

// clean leaves out corners that stand at the place of the one before them.
func (k *part) clean(eps float64) {
	var ring Ring
	var corner []int
	for i, q := range k.ring {
		if n := len(ring); n == 0 || distance(ring[n-1], q) > eps {
			ring, corner = append(ring, q), append(corner, k.corner[i])
		}
	}
	for n := len(ring); n > 1 && distance(ring[0], ring[n-1]) <= eps; n-- {
		ring, corner = ring[:n-1], corner[:n-1]
	}
	k.ring, k.corner = ring, corner
}

// concrete says whether the part is concrete; else it is taken out.
func (k *part) concrete() bool { return k.Kind == Outer || k.Kind == Disc }

// point is a point of the part's line or within it, at a distance from all other lines if none touch.
func (k *part) point() Point {
	if k.isRing {
		return k.ring[0]
	}
	return Point{k.round.X, k.round.Y}
}

func (k *part) contains(p Point) bool {
	if k.isRing {
		return k.ring.around(p)
	}
	return k.round.holds(p) > 0
}

// lowered is the contour with the lowest point at y = 0, its rings cleaned and turned: outer ones
// counter-clockwise, holes clockwise.
func (p *parts) lowered() Contour {
	var c Contour
	for _, k := range p.list {
		if !k.isRing {
			r := k.round
			r.Y -= p.low.Y
			if k.Kind == Void {
				c.Voids = append(c.Voids, r)
			} else {
				c.Discs = append(c.Discs, r)
			}
			continue
		}
		ring := make(Ring, len(k.ring))
		for i, q := range k.ring {
			ring[i] = Point{q.X, q.Y - p.low.Y}
		}
		if (ring.swept(ring[0]) < 0) == (k.Kind == Outer) {
			reverse(ring)
		}
		if k.Kind == Outer {
			c.Outer = append(c.Outer, ring)
		} else {
			c.Holes = append(c.Holes, ring)
		}
	}
	return c
}

// swept is the area of the ring seen from a point, positive counter-clockwise.
func (r Ring) swept(from Point) (area float64) {
	for _, e := range r.edges() {
		area += turn(from, e.a, e.b) / 2
	}
	return area
}

func finite(v float64) bool { return v-v == 0 }
