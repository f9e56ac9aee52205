package member

import (
	"math"

	"soffit/calc/section"
)

// span of concrete across the section, mm from the axis of symmetry.
type chord = section.Chord

// topEdges are the level parts of the top of a section, from the axis of symmetry.
func topEdges(o section.Outline) []chord {
	h, x := o.Height(), o.CentroidX()
	var out []chord
	for _, ring := range o.Contour().Outer {
		for i, a := range ring {
			b := ring[(i+1)%len(ring)]
			if a.Y >= h*(1-1e-9) && b.Y >= h*(1-1e-9) && a.X != b.X {
				out = append(out, chord{From: min(a.X, b.X) - x, To: max(a.X, b.X) - x})
			}
		}
	}
	return out
}

// checkTopping looks for a topping that the member does not bear, and for a diagram that does not go with one.
func (r *reader) checkTopping(m *Member, o section.Outline, ok bool) {
	t := &m.Topping
	if !t.Present() {
		return
	}
	if d := m.Concrete.Diagram; d.Text == "block" {
		r.at(d.Origin, "stress diagram: have block beside a topping; the block has no strain to lock in when the topping is cast", "write parabola-rectangle or bilinear, or leave the key out")
	}
	if !ok || !known(t.Width, t.Depth) {
		return
	}
	var level, borne float64
	for _, e := range topEdges(o) {
		level += e.To - e.From
		borne += max(min(e.To, t.Width.Base()/2)-max(e.From, -t.Width.Base()/2), 0)
	}
	const least = 1.0 // mm, of what the topping sits on
	depth := planOf(shapeType).find("depth").high
	switch all := o.Height() + t.Depth.Base(); {
	case level < least:
		r.at(Origin{Pos: t.Pos}, "topping: the top of the member has no level part that a topping could sit on", "write a shape with a level top, or leave the topping out")
	case borne < least:
		r.at(t.Width.Origin, "width: a topping "+t.Width.String()+" wide lies between the webs and sits on none of them", "write the width of the topping over all, that on the webs included")
	case exceeds(all, depth.Quantity().Value):
		r.at(t.Depth.Origin, "depth: with the member the topping is "+shown(all, t.Depth)+" deep, want at most "+depth.String(), "write the depth of the topping above the top of the member")
	}
}

// overTopping tells of bars above the member's top that do not lie within the topping; done is true where the row lies
// above the member.
func (a *layer) overTopping(r *reader, m *Member, o section.Outline) (done bool) {
	t, top := &m.Topping, o.Height()
	y, radius := a.profile.Segments[0].Height, a.d/2
	if a.what != "bars" || !t.Present() || !known(t.Width, t.Depth) || !exceeds(y+radius, top) {
		return false
	}
	high, half := top+t.Depth.Base(), t.Width.Base()/2
	reach := a.reach()
	switch {
	case exceeds(top, y-radius):
		r.at(a.height.Origin, "height: have "+a.height.String()+", where the bars lie in the joint between the member, "+shown(top, a.height)+" deep, and its topping",
			"write at most "+shown(top-radius, a.height)+" for bars of the member, at least "+shown(top+radius, a.height)+" for bars of the topping")
	case exceeds(y+radius, high):
		r.at(a.height.Origin, "height: have "+a.height.String()+", want at most "+shown(high-radius, a.height)+" in a topping that reaches up to "+shown(high, a.height), "write the height of the axes above the soffit of the member")
	case exceeds(reach, half):
		r.at(a.across(), a.key()+": the bars take "+shown(2*reach, a.height)+" in a topping "+t.Width.String()+" wide", "write fewer in the row, or a smaller spacing")
	}
	return true
}

// reach is how far a row reaches from the axis of symmetry, its diameters included; bars of which the places are not known
// are taken side by side.
func (a *layer) reach() float64 {
	if a.xs == nil {
		return float64(a.n) * a.d / 2
	}
	return max(math.Abs(a.xs[0]), math.Abs(a.xs[len(a.xs)-1])) + a.d/2
}
