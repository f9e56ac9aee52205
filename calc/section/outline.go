package section

import "math"

// Contour is what an Outline is made of, in any coordinates, mm. Rings may run either way round.
type Contour struct {
	Outer []Ring  // the concrete: at least one ring, or a disc
	Holes []Ring  // taken out of it
	Voids []Round // round or oblong, taken out of it
	Discs []Round // round concrete beside the rings
}

// Outline is a plane section with everything in its place: concrete within outer rings, holes and voids in
// it. It carries its Shape, whose methods give the properties; here stand those that need the place of things
// across the section. Its y is measured upward from the lowest point of the concrete, its x as given. The
// zero value is no section; NewOutline and the forms of the trade make one.
type Outline struct {
	Shape
	contour Contour
	soffit  float64
	eps     float64 // distance within which things touch
	whole   Properties
}

// NewOutline checks a contour and finds its properties. Corners that repeat the one before are left out.
// Parts that come within 1e-9 of the section's size touch. Errors are *Refusal with every Reason.
func NewOutline(c Contour) (Outline, error) {
	p, err := partsOf(c)
	if err != nil {
		return Outline{}, err
	}
	if err := p.check(); err != nil {
		return Outline{}, err
	}
	o := Outline{soffit: p.low.Y, eps: p.eps, contour: p.lowered()}
	middle := (p.low.X + p.high.X) / 2
	if o.Shape, err = decompose(o.contour, middle, p.high.Y-p.low.Y, p.high.X-p.low.X); err != nil {
		return Outline{}, err
	}
	o.whole = o.contour.properties(Point{middle, o.Shape.height / 2})
	o.Shape.lateral = o.whole.LateralInertia
	for _, r := range o.contour.Outer {
		o.Shape.around += r.length()
	}
	for _, d := range o.contour.Discs {
		o.Shape.around += d.length()
	}
	for _, r := range o.contour.Holes {
		o.Shape.inside += r.length()
	}
	for _, v := range o.contour.Voids {
		o.Shape.inside += v.length()
	}
	return o, nil
}

// Contour returns a copy of the parts as they are used: y from the lowest point, outer rings
// counter-clockwise, holes clockwise, no corner twice.
func (o Outline) Contour() Contour {
	return o.contour.changed(func(p Point) Point { return p }, func(r Round) Round { return r })
}

// Soffit is the y of the lowest point in the coordinates given to NewOutline, mm.
func (o Outline) Soffit() float64 { return o.soffit }

// CentroidX is the x of the centroid, mm.
func (o Outline) CentroidX() float64 { return o.whole.CentroidX }

// Product is the product of inertia about the level and the vertical axis through the centroid, mm⁴: 0 where
// bending about the level axis causes none about the other.
func (o Outline) Product() float64 { return o.whole.Product }

// ByPolygons gives the properties a second way: corner by corner round each ring, by the formulas of the
// polygon, and round parts by those of circle and rectangle. Shape's come from strips; the lateral inertia,
// CentroidX and Product are these.
func (o Outline) ByPolygons() Properties { return o.whole }

// Flipped is the outline upside down about its own middle height: hogging of the one is sagging of the other.
func (o Outline) Flipped() Outline {
	h := o.Shape.height
	o.Shape = o.Shape.Flipped()
	o.contour = o.contour.changed(
		func(p Point) Point { return Point{p.X, h - p.Y} },
		func(r Round) Round { r.Y = h - r.Y; return r })
	for _, rings := range [2][]Ring{o.contour.Outer, o.contour.Holes} {
		for _, r := range rings {
			reverse(r)
		}
	}
	o.whole.Centroid = h - o.whole.Centroid
	o.whole.Product = -o.whole.Product
	return o
}

// Symmetrical reports whether the right half is the left one mirrored, to 1e-6 of the section's size. If not,
// a moment about the level axis also bends the section sideways, which a Shape does not see.
func (o Outline) Symmetrical() bool {
	eps := 1000 * o.eps
	mirror := func(x float64) float64 { return 2*o.whole.CentroidX - x }
	for _, rings := range [2][]Ring{o.contour.Outer, o.contour.Holes} {
		var lines []edge
		for _, r := range rings {
			lines = append(lines, r.edges()...)
		}
		for _, e := range lines {
			if !onAny(lines, Point{mirror(e.a.X), e.a.Y}, eps) || !onAny(lines, Point{mirror((e.a.X + e.b.X) / 2), (e.a.Y + e.b.Y) / 2}, eps) {
				return false
			}
		}
	}
	for _, rounds := range [2][]Round{o.contour.Voids, o.contour.Discs} {
		for _, r := range rounds {
			found := false
			for _, s := range rounds {
				found = found || math.Abs(mirror(r.X)-s.X) <= eps && math.Abs(r.Y-s.Y) <= eps &&
					math.Abs(r.Width-s.Width) <= eps && math.Abs(r.Depth-s.Depth) <= eps
			}
			if !found {
				return false
			}
		}
	}
	return true
}

func onAny(lines []edge, p Point, eps float64) bool {
	for _, l := range lines {
		if l.distance(p) <= eps {
			return true
		}
	}
	return false
}

// Clearance is the distance from a point to the nearest surface of the concrete, mm: positive within the
// concrete, negative outside it and in holes and voids. x is as given, y above the soffit.
func (o Outline) Clearance(x, y float64) float64 {
	p := Point{x, y}
	least, in := math.Inf(1), false
	for _, r := range o.contour.Outer {
		in = in || r.around(p)
	}
	for _, d := range o.contour.Discs {
		in = in || d.holds(p) > 0
		least = math.Min(least, math.Abs(d.holds(p)))
	}
	for _, r := range o.contour.Holes {
		in = in && !r.around(p)
	}
	for _, v := range o.contour.Voids {
		in = in && !(v.holds(p) > 0)
		least = math.Min(least, math.Abs(v.holds(p)))
	}
	for _, rings := range [2][]Ring{o.contour.Outer, o.contour.Holes} {
		for _, r := range rings {
			for _, e := range r.edges() {
				least = math.Min(least, e.distance(p))
			}
		}
	}
	if !in {
		return -least
	}
	return least
}

// changed is a copy with its corners and rounds replaced.
func (c Contour) changed(point func(Point) Point, round func(Round) Round) Contour {
	rings := func(in []Ring) []Ring {
		var out []Ring
		for _, r := range in {
			n := make(Ring, len(r))
			for i, p := range r {
				n[i] = point(p)
			}
			out = append(out, n)
		}
		return out
	}
	rounds := func(in []Round) []Round {
		var out []Round
		for _, r := range in {
			out = append(out, round(r))
		}
		return out
	}
	return Contour{rings(c.Outer), rings(c.Holes), rounds(c.Voids), rounds(c.Discs)}
}

func reverse(r Ring) {
	for i, j := 0, len(r)-1; i < j; i, j = i+1, j-1 {
		r[i], r[j] = r[j], r[i]
	}
}
