package member

import (
	"fmt"

	"soffit/calc/quantity"
)

// checkDucts looks at products, stresses, losses and profiles of post-tensioned reinforcement.
func (r *reader) checkDucts(m *Member) {
	d := &m.Ducts
	r.names(nameList(d.Rows, func(s *DuctRow) Word { return s.Name }))
	for i := range d.Rows {
		s := &d.Rows[i]
		r.checkStress(d.Products, s.Product, s.JackingStress, "write the stress at the anchorage during stressing")
		if s.Count.N > 1 && s.Spacing == (Value{}) && len(s.Positions) == 0 {
			r.at(Origin{Pos: s.Pos}, fmt.Sprintf("rows: have no spacing, want a length for %d ducts", s.Count.N), "add, for example, spacing: 200 mm")
		}
		r.checkLosses(s.JackingStress, s.StatedLosses.AtStressing, s.StatedLosses.Final, "at stressing", "write the sum of all losses beside friction, those at stressing included")
		if diameter, _, ok := product(d.Products, r.opt.Products, s.Product.Text); ok && s.Diameter.Present() && s.Strands.N > 0 {
			// Circles side by side in a circle take at most its area.
			if taken := float64(s.Strands.N) * diameter * diameter; taken > s.Diameter.Base()*s.Diameter.Base() {
				r.at(s.Diameter.Origin, fmt.Sprintf("duct diameter: %d strands of %s do not go into a duct of %s", s.Strands.N, millimetres(diameter), s.Diameter), "write the outer diameter of the duct, and how many strands are in one")
			}
		}
		r.checkProfile(s, m.Span.Length)
	}
}

// checkProfile looks for points out of order and for lines that have no beginning.
func (r *reader) checkProfile(s *DuctRow, length Value) {
	points := s.Profile
	if len(points) < 2 {
		return
	}
	for i := range points {
		p := &points[i]
		switch {
		case i == 0 && p.By.Given:
			r.at(p.By.Origin, "by: have it at the first point, to which no line leads", "remove it; the line to a point stands at the point that it ends at")
		case i > 0 && p.By == (Word{}):
			r.at(Origin{Pos: p.Pos}, "profile: the second and further points want by, the line from the point before", "add, for example, by: parabola level here")
		case i == 1 && p.By.Text == "parabola onward":
			r.at(p.By.Origin, "by: have parabola onward with no line before it that gives the direction", "write parabola level here, parabola level before or straight line")
		}
		if i > 0 && known(p.At, points[i-1].At) && !exceeds(p.At.Base(), points[i-1].At.Base()) {
			r.at(p.At.Origin, "at: have "+p.At.String()+", want more than "+points[i-1].At.String()+", the place of the point before", "write the points from end A to end B")
		}
	}
	first, last := points[0].At, points[len(points)-1].At
	if known(first) && first.Base() != 0 {
		r.at(first.Origin, "at: have "+first.String()+" at the first point, want 0 m, end A of the concrete", "begin with the height at end A")
	}
	if known(last, length) && !quantity.Agree(last.Base(), length.Base()) {
		r.at(last.Origin, "at: have "+last.String()+" at the last point, want "+length.String()+", end B of the concrete", "end with the height at end B")
	}
}
