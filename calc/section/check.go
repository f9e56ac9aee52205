package section

import (
	"cmp"
	"math"
	"slices"
)

// check refuses rings that are none, lines that meet, and parts that lie in the wrong place.
func (p *parts) check() error {
	for i := range p.list {
		if k := &p.list[i]; k.isRing {
			if err := k.alone(p.eps); err != nil {
				return err
			}
		}
	}
	for i := range p.list {
		for j := i + 1; j < len(p.list); j++ {
			if err := p.list[i].against(&p.list[j], p.eps); err != nil {
				return err
			}
		}
	}
	return p.housed()
}

// alone checks a ring by itself.
func (k *part) alone(eps float64) error {
	n := len(k.ring)
	if n < 3 {
		return &Refusal{Reason: FewCorners, Part: k.Part, Corner: -1, OtherCorner: -1, Have: float64(n)}
	}
	far := k.ring[1] // the corner farthest from the first: all others beside this line, or on it
	for _, q := range k.ring {
		if distance(k.ring[0], q) > distance(k.ring[0], far) {
			far = q
		}
	}
	wide := 0.0
	for _, q := range k.ring {
		wide = math.Max(wide, math.Abs(edge{k.ring[0], far}.off(q)))
	}
	if wide <= eps {
		return &Refusal{Reason: NoArea, Part: k.Part, Corner: -1, OtherCorner: -1, Have: wide}
	}
	return k.itself(eps)
}

// itself looks for edges of a ring that cross or touch one another.
func (k *part) itself(eps float64) error {
	n := len(k.ring)
	edges := k.ring.edges()
	order := make([]int, n) // by the lower end, so that most pairs need no look
	for i := range order {
		order[i] = i
	}
	low := func(i int) float64 { return math.Min(edges[i].a.Y, edges[i].b.Y) }
	slices.SortStableFunc(order, func(i, j int) int { return cmp.Compare(low(i), low(j)) })
	var worst *Refusal
	for s, i := range order {
		high := math.Max(edges[i].a.Y, edges[i].b.Y)
		for _, j := range order[s+1:] {
			if low(j) > high+eps {
				break
			}
			a, b := min(i, j), max(i, j)
			how, at := touchOrCross(edges, a, b, eps)
			if how == apart {
				continue
			}
			reason := SelfTouching
			if how == crossing {
				reason = SelfCrossing
			}
			r := &Refusal{Reason: reason, Part: k.Part, Corner: k.corner[a], OtherCorner: k.corner[b], At: at}
			if worst == nil || before(r, worst) {
				worst = r
			}
		}
	}
	if worst == nil {
		return nil
	}
	return worst
}

// before puts crossings before touches, and corners in order.
func before(a, b *Refusal) bool {
	if a.Reason != b.Reason {
		return a.Reason == SelfCrossing
	}
	return a.Corner < b.Corner || a.Corner == b.Corner && a.OtherCorner < b.OtherCorner
}

// touchOrCross looks at the edges i < j of a ring. Neighbours share a corner and must not lie on one another.
func touchOrCross(edges []edge, i, j int, eps float64) (meeting, Point) {
	a, b := edges[i], edges[j]
	if j == len(edges)-1 && i == 0 {
		a, b = b, a
	} else if j != i+1 {
		return a.meets(b, eps)
	}
	switch {
	case a.distance(b.b) <= eps:
		return touching, b.b
	case b.distance(a.a) <= eps:
		return touching, a.a
	}
	return apart, Point{}
}

// against looks for two parts whose lines meet.
func (k *part) against(o *part, eps float64) error {
	how, at, ck, co := apart, Point{}, -1, -1
	switch {
	case k.isRing && o.isRing:
		how, at, ck, co = ringRing(k, o, eps)
	case k.isRing:
		how, at, ck = ringRound(k, o.round, eps)
	case o.isRing:
		how, at, co = ringRound(o, k.round, eps)
	default:
		how, at = roundRound(k.round, o.round, eps)
	}
	if how == apart {
		return nil
	}
	reason := Touching
	if how == crossing {
		reason = Crossing
	}
	return &Refusal{Reason: reason, Part: k.Part, Other: o.Part, Corner: ck, OtherCorner: co, At: at}
}

func ringRing(k, o *part, eps float64) (meeting, Point, int, int) {
	how, at, ck, co := apart, Point{}, -1, -1
	theirs := o.ring.edges()
	for i, e := range k.ring.edges() {
		for j, f := range theirs {
			if !e.near(f, eps) {
				continue
			}
			if h, p := e.meets(f, eps); h > how {
				how, at, ck, co = h, p, k.corner[i], o.corner[j]
			}
		}
	}
	return how, at, ck, co
}

// near says that the boxes about two edges come within eps.
func (e edge) near(f edge, eps float64) bool {
	return math.Min(e.a.X, e.b.X) <= math.Max(f.a.X, f.b.X)+eps && math.Min(f.a.X, f.b.X) <= math.Max(e.a.X, e.b.X)+eps &&
		math.Min(e.a.Y, e.b.Y) <= math.Max(f.a.Y, f.b.Y)+eps && math.Min(f.a.Y, f.b.Y) <= math.Max(e.a.Y, e.b.Y)+eps
}

// ringRound finds how a ring and the line of a round meet, with the corner at which the nearest edge begins.
func ringRound(k *part, r Round, eps float64) (meeting, Point, int) {
	core, rad := r.core(), r.radius()
	least, at, corner := math.Inf(1), Point{}, -1
	for i, e := range k.ring.edges() {
		if g, p := core.gap(e); g < least {
			least, at, corner = g, p, k.corner[i]
		}
	}
	if least > rad+eps {
		return apart, Point{}, -1
	}
	if least >= rad-eps {
		return touching, at, corner
	}
	// The ring reaches into the round: wholly within it, or across its line.
	inner := math.Inf(1)
	for _, q := range k.ring {
		inner = math.Min(inner, r.holds(q))
	}
	switch {
	case inner > eps:
		return apart, Point{}, -1
	case inner >= -eps:
		return touching, at, corner
	}
	return crossing, at, corner
}

func roundRound(r, s Round, eps float64) (meeting, Point) {
	g, at := r.core().gap(s.core())
	sum := r.radius() + s.radius()
	switch {
	case g > sum+eps:
		return apart, at
	case g >= sum-eps:
		return touching, at
	}
	inner := math.Max(depthOf(r, s), depthOf(s, r))
	switch {
	case inner > eps:
		return apart, at
	case inner >= -eps:
		return touching, at
	}
	return crossing, at
}

// depthOf says by how much r lies within s, negative if it does not.
func depthOf(r, s Round) float64 {
	c := r.core()
	return math.Min(s.holds(c.a), s.holds(c.b)) - r.radius()
}

// housed checks which part lies in which, once no lines meet: holes and voids in concrete, nothing else in
// anything.
func (p *parts) housed() error {
	for i := range p.list {
		k := &p.list[i]
		in := false
		for j := range p.list {
			o := &p.list[j]
			if i == j || !o.contains(k.point()) || !k.isRing && !o.isRing && depthOf(k.round, o.round) < 0 || !k.isRing && o.isRing && k.surrounds(o) {
				continue
			}
			if k.concrete() || !o.concrete() {
				return &Refusal{Reason: Nested, Part: k.Part, Other: o.Part, Corner: -1, OtherCorner: -1, At: k.point()}
			}
			in = true
		}
		if !k.concrete() && !in {
			return &Refusal{Reason: HoleOutside, Part: k.Part, Corner: -1, OtherCorner: -1, At: k.point()}
		}
	}
	return nil
}

// surrounds says that the ring o, whose lines do not meet those of the round k, lies within k.
func (k *part) surrounds(o *part) bool { return k.round.holds(o.ring[0]) > 0 }
