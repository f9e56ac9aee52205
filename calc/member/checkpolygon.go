package member

import (
	"fmt"
	"math"
	"strconv"

	"soffit/calc/section"
)

// corners of the part of a polygon that a refusal names; nil for a round void.
func (s *Shape) corners(p section.Part) []Corner {
	switch {
	case p.Kind == section.Outer:
		return s.Corners
	case p.Kind == section.Hole && p.Index < len(s.Holes):
		return s.Holes[p.Index].Corners
	}
	return nil
}

// named is a part of a polygon in the words of the member file.
func named(p section.Part) string {
	switch p.Kind {
	case section.Outer:
		return "the outline"
	case section.Hole:
		return "hole " + strconv.Itoa(p.Index+1)
	case section.Void:
		return "round void " + strconv.Itoa(p.Index+1)
	}
	return "the section"
}

// origin is the place of a part in the file, or of a corner of it.
func (s *Shape) origin(p section.Part, corner int) (key string, o Origin) {
	list := s.corners(p)
	switch {
	case corner >= 0 && corner < len(list):
		return "corners", Origin{Pos: list[corner].Pos}
	case p.Kind == section.Hole && len(list) > 0:
		return "holes", Origin{Pos: s.Holes[p.Index].Pos}
	case p.Kind == section.Void && p.Index < len(s.RoundVoids):
		return "round voids", Origin{Pos: s.RoundVoids[p.Index].Pos}
	case len(list) > 0:
		return "corners", Origin{Pos: list[0].Pos}
	}
	return "kind", s.Kind.Origin
}

// edge is the edge that begins at a corner: "the edge from corner 2 (200 mm, 0 mm) to corner 3 (200 mm, 600 mm)".
func (s *Shape) edge(p section.Part, corner int) string {
	list := s.corners(p)
	if corner < 0 || corner >= len(list) {
		return named(p)
	}
	next := (corner + 1) % len(list)
	return "the edge from " + cornerText(list, corner) + " to " + cornerText(list, next)
}

func cornerText(list []Corner, i int) string {
	return fmt.Sprintf("corner %d (%s, %s)", i+1, list[i].X, list[i].Y)
}

// spot is a point in the coordinates of the file.
func spot(p section.Point) string {
	return "(" + short(clean(p.X)) + " mm, " + short(clean(p.Y)) + " mm)"
}

// clean is 0 for what rounding leaves of 0.
func clean(v float64) float64 {
	if math.Abs(v) < 1e-6 {
		return 0
	}
	return v
}

// refuse tells of lines that make no section.
func (r *reader) refuse(s *Shape, e *section.Refusal) {
	key, at := s.origin(e.Part, e.Corner)
	of := "" // which part, where it is not the outline
	if e.Part.Kind != section.Outer {
		of = "of " + named(e.Part) + " "
	}
	const inOrder = "write the corners in the order in which they follow one another along the line, either way round"
	switch e.Reason {
	case section.FewCorners:
		r.at(at, fmt.Sprintf("%s: %s has %g corners apart from one another, want at least 3", key, named(e.Part), e.Have), "write each corner once, at its own place")
	case section.NoArea:
		r.at(at, key+": the corners "+of+"lie on one line", "write x and y of the corners around an area")
	case section.SelfCrossing:
		r.at(at, fmt.Sprintf("%s: %s %scrosses %s at %s", key, s.edge(e.Part, e.Corner), of, s.edge(e.Part, e.OtherCorner), spot(e.At)), inOrder)
	case section.SelfTouching:
		hint := "write corners that keep apart: an edge must not come back to another; write what is enclosed as one of holes"
		if n := len(s.corners(e.Part)); n > 0 && (e.OtherCorner == e.Corner+1 || e.Corner == 0 && e.OtherCorner == n-1) {
			hint = "write no corner from which the line runs back over itself"
		}
		r.at(at, fmt.Sprintf("%s: %s %stouches %s at %s", key, s.edge(e.Part, e.Corner), of, s.edge(e.Part, e.OtherCorner), spot(e.At)), hint)
	case section.Crossing, section.Touching:
		inner, corner, other, otherCorner := e.Other, e.OtherCorner, e.Part, e.Corner
		if e.Other.Kind == section.Outer {
			inner, corner, other, otherCorner = e.Part, e.Corner, e.Other, e.OtherCorner
		}
		key, at := s.origin(inner, -1)
		verb := "crosses"
		if e.Reason == section.Touching {
			verb = "touches"
		}
		by := ""
		if corner >= 0 {
			by = ", by " + s.edge(inner, corner)
		}
		of := named(other)
		if otherCorner >= 0 && other.Kind == section.Outer {
			of = s.edge(other, otherCorner) + " of the outline"
		}
		hint := "write it wholly within the concrete, clear of the outline; what is open to the outside is written as corners of the outline"
		if other.Kind != section.Outer {
			hint = "write both with concrete between them, or as one"
		}
		r.at(at, fmt.Sprintf("%s: %s %s %s at %s%s", key, named(inner), verb, of, spot(e.At), by), hint)
	case section.HoleOutside:
		r.at(at, fmt.Sprintf("%s: %s at %s lies outside the outline", key, named(e.Part), spot(e.At)), "write x and y from the same lines as those of the corners of the outline")
	case section.Nested:
		r.at(at, fmt.Sprintf("%s: %s lies within %s", key, named(e.Part), named(e.Other)), "remove it: there is no concrete around it")
	default:
		r.at(at, key+": "+e.Error(), "write corners around one area of concrete")
	}
}

// polygon looks at the size of a polygon and for what is not symmetrical.
func (r *reader) polygon(s *Shape, o section.Outline) bool {
	_, at := s.origin(section.Part{Kind: section.Outer}, -1)
	depth := planOf(shapeType).find("depth")
	if h := o.Height(); exceeds(depth.low.Quantity().Value, h) || exceeds(h, depth.high.Quantity().Value) {
		r.at(at, "corners: make a section "+shown(h, s.Corners[0].Y)+" deep, want "+depth.range_(), "write the corners in the unit that they are meant in: 600 mm, 0.6 m")
		return false
	}
	if !o.Symmetrical() {
		r.at(at, "corners: the section is not symmetrical about an upright axis"+s.alone()+"; bending sideways is not covered", "write each corner, hole and void with its like at the same height on the other side")
		return false
	}
	return true
}

// alone names the first corner or void that has none opposite: ": corner 2 (200 mm, 0 mm) has none opposite at …".
func (s *Shape) alone() string {
	low, high := math.Inf(1), math.Inf(-1)
	for _, c := range s.Corners {
		low, high = min(low, c.X.Base()), max(high, c.X.Base())
	}
	lists := [][]Corner{s.Corners}
	for _, h := range s.Holes {
		lists = append(lists, h.Corners)
	}
	near := func(ax, ay, bx, by float64) bool {
		return math.Abs(low+high-ax-bx) <= 1e-6*(high-low) && math.Abs(ay-by) <= 1e-6*(high-low)
	}
	for k, list := range lists {
		for i, c := range list {
			found := false
			for _, other := range lists {
				for _, d := range other {
					found = found || near(c.X.Base(), c.Y.Base(), d.X.Base(), d.Y.Base())
				}
			}
			if !found {
				of := ""
				if k > 0 {
					of = " of hole " + strconv.Itoa(k)
				}
				return fmt.Sprintf(": %s%s has none opposite, at (%s, %s)", cornerText(list, i), of, shown(clean(low+high-c.X.Base()), c.X), c.Y)
			}
		}
	}
	for i, v := range s.RoundVoids {
		found := false
		for _, w := range s.RoundVoids {
			found = found || near(v.X.Base(), v.Y.Base(), w.X.Base(), w.Y.Base()) && v.Width.Base() == w.Width.Base() && v.Depth.Base() == w.Depth.Base()
		}
		if !found {
			return fmt.Sprintf(": round void %d has no like opposite, at (%s, %s)", i+1, shown(clean(low+high-v.X.Base()), v.X), v.Y)
		}
	}
	return ""
}
