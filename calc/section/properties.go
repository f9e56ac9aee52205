package section

import "math"

// Properties are those of a plane figure, in mm, mm², mm⁴; the names are those of Shape and Outline. They
// add: Plus joins figures, Times weighs one.
type Properties struct {
	Area, Centroid, Inertia, LateralInertia float64
	CentroidX                               float64 // x of the centroid; 0 for a stack of strips
	Product                                 float64 // product of inertia about the axes through the centroid
}

// Plus gives the properties of two figures together, each about its own centroid before, about the common one
// after. Their areas must not add to 0.
func (p Properties) Plus(q Properties) Properties {
	a := p.Area + q.Area
	if p.Area == 0 || q.Area == 0 {
		if q.Area != 0 {
			return q
		}
		return p
	}
	dx, dy := q.CentroidX-p.CentroidX, q.Centroid-p.Centroid
	w := p.Area * q.Area / a
	return Properties{
		Area:           a,
		Centroid:       p.Centroid + dy*q.Area/a,
		CentroidX:      p.CentroidX + dx*q.Area/a,
		Inertia:        p.Inertia + q.Inertia + w*dy*dy,
		LateralInertia: p.LateralInertia + q.LateralInertia + w*dx*dx,
		Product:        p.Product + q.Product + w*dx*dy,
	}
}

// Times weighs a figure: −1 for one taken out, the ratio of moduli for one of another material.
func (p Properties) Times(k float64) Properties {
	p.Area *= k
	p.Inertia *= k
	p.LateralInertia *= k
	p.Product *= k
	return p
}

// properties gives those of the whole contour from its rings and rounds; from is a point amid it.
func (c Contour) properties(from Point) Properties {
	var p Properties
	for _, r := range c.Outer {
		p = p.Plus(r.properties(from))
	}
	for _, d := range c.Discs {
		p = p.Plus(d.properties())
	}
	for _, r := range c.Holes { // clockwise: negative already
		p = p.Plus(r.properties(from))
	}
	for _, v := range c.Voids {
		p = p.Plus(v.properties().Times(-1))
	}
	return p
}

// properties gives those of the area within the ring, negative if the ring runs clockwise: the sums over its
// edges of the triangles between the edge and the point from.
func (r Ring) properties(from Point) Properties {
	var a, sx, sy, xx, yy, xy float64
	for _, e := range r.edges() {
		x1, y1, x2, y2 := e.a.X-from.X, e.a.Y-from.Y, e.b.X-from.X, e.b.Y-from.Y
		c := x1*y2 - x2*y1
		a += c / 2
		sx += c * (x1 + x2) / 6
		sy += c * (y1 + y2) / 6
		xx += c * (x1*x1 + x1*x2 + x2*x2) / 12
		yy += c * (y1*y1 + y1*y2 + y2*y2) / 12
		xy += c * (2*x1*y1 + x1*y2 + x2*y1 + 2*x2*y2) / 24
	}
	return Properties{
		Area: a, CentroidX: from.X + sx/a, Centroid: from.Y + sy/a,
		LateralInertia: xx - sx*sx/a, Inertia: yy - sy*sy/a, Product: xy - sx*sy/a,
	}
}

// properties gives those of a round: a rectangle and two half circles.
func (r Round) properties() Properties {
	rad, core := r.radius(), r.core()
	half := Properties{Area: math.Pi * rad * rad / 2, CentroidX: r.X, Centroid: r.Y}
	along := (math.Pi/8 - 8/(9*math.Pi)) * rad * rad * rad * rad // about its centroid, level with the diameter
	across := math.Pi / 8 * rad * rad * rad * rad
	out := 4 * rad / (3 * math.Pi) // of the centroid from the diameter
	first, second := half, half
	long := distance(core.a, core.b)
	box := Properties{Area: long * 2 * rad, CentroidX: r.X, Centroid: r.Y}
	lengthwise, broadside := 2*rad*long*long*long/12, long*8*rad*rad*rad/12
	if r.Depth > r.Width {
		first.Centroid, second.Centroid = core.a.Y-out, core.b.Y+out
		first.Inertia, first.LateralInertia = along, across
		box.Inertia, box.LateralInertia = lengthwise, broadside
	} else {
		first.CentroidX, second.CentroidX = core.a.X-out, core.b.X+out
		first.Inertia, first.LateralInertia = across, along
		box.Inertia, box.LateralInertia = broadside, lengthwise
	}
	second.Inertia, second.LateralInertia = first.Inertia, first.LateralInertia
	return box.Plus(first).Plus(second)
}
