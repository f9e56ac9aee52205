package design

import (
	"strconv"

	"soffit/calc/member"
)

// zone is a stretch of the depth with a name of the trade, up to a level above the soffit.
type zone struct {
	name string
	to   float64 // mm
}

// zonesOf are the zones of a shape from the soffit up. A hollow unit and a polygon have none: their parts are named by
// their levels.
func zonesOf(s *member.Shape, h float64) []zone {
	v := func(values ...member.Value) (sum float64) {
		for _, x := range values {
			sum += x.Base()
		}
		return sum
	}
	z := []zone{{"chamfer", v(s.Chamfer)}}
	switch s.Kind.Text {
	case "rectangle", "trapezoid":
		return append(z, zone{s.Kind.Text, h - v(s.TopChamfer)}, zone{"top chamfer", h})
	case "T":
		return append(z, zone{"web", h - v(s.FlangeDepth, s.HaunchDepth)}, zone{"haunch", h - v(s.FlangeDepth)}, zone{"flange", h})
	case "I":
		t, b := &s.TopFlange, &s.BottomFlange
		return append(z, zone{"bottom flange", v(b.Depth)}, zone{"bottom haunch", v(b.Depth, b.HaunchDepth)},
			zone{"web", h - v(t.Depth, t.HaunchDepth)}, zone{"top haunch", h - v(t.Depth)}, zone{"top flange", h})
	case "inverted T":
		return append(z, zone{"ledge", v(s.Ledge.Depth)}, zone{"ledge haunch", v(s.Ledge.Depth, s.Ledge.HaunchDepth)}, zone{"web", h})
	case "U":
		return append(z, zone{"floor", v(s.FloorThickness)}, zone{"haunches", v(s.FloorThickness, s.Haunch)}, zone{"webs", h})
	case "box":
		t, b := &s.TopSlab, &s.BottomSlab
		return append(z, zone{"bottom slab", v(b.Depth)}, zone{"bottom haunches", v(b.Depth, b.Haunch)},
			zone{"webs", h - v(t.Depth, t.Haunch)}, zone{"top haunches", h - v(t.Depth)}, zone{"top slab", h})
	case "double T":
		return append(z, zone{"stems", h - v(s.FlangeDepth, s.Haunch)}, zone{"haunches", h - v(s.FlangeDepth)}, zone{"flange", h})
	}
	return nil
}

// namesOf names parts by the zone that the middle of each lies in, or as other says where there are no zones; where
// several would have one name they are numbered.
func namesOf(zones []zone, middle []float64, other func(i int) string) []string {
	names := make([]string, len(middle))
	for i, y := range middle {
		names[i] = other(i)
		for _, z := range zones {
			if y < z.to {
				names[i] = z.name
				break
			}
		}
	}
	return numbered(names)
}

// numbered puts numbers behind names that occur more than once.
func numbered(names []string) []string {
	count, seen := map[string]int{}, map[string]int{}
	for _, n := range names {
		count[n]++
	}
	out := make([]string, len(names))
	for i, n := range names {
		out[i] = n
		if count[n] > 1 {
			seen[n]++
			out[i] = n + " " + strconv.Itoa(seen[n])
		}
	}
	return out
}
