package member

import (
	"cmp"
	"fmt"
	"math"
	"slices"
	"strings"

	"soffit/calc/section"
)

// fine is at how many places a way along the member is looked at.
const fine = 200

// checkFit looks for strands, ducts and bars that lie outside the concrete or in one another.
func (r *reader) checkFit(m *Member, o section.Outline, ok bool) {
	list := r.layers(m)
	for i := range list {
		a := &list[i]
		apart := a.apart(r)
		if ok && apart && !a.overTopping(r, m, o) && a.inDepth(r, o) {
			a.inConcrete(r, o)
		} else if ok && !apart {
			a.inDepth(r, o)
		}
		for k := range i {
			list[k].clear(r, a)
		}
	}
}

// apart finds strands of one row that lie in one another, and positions that are not symmetrical.
func (a *layer) apart(r *reader) bool {
	fail := func(o Origin, msg, hint string) bool {
		a.xs = nil
		r.at(o, msg, hint)
		return false
	}
	if len(a.positions) > 0 {
		if a.xs == nil {
			return false // a finding already
		}
		if len(a.xs) != a.n {
			return fail(a.across(), fmt.Sprintf("positions: have %d, want %d, one for each of the %s", len(a.xs), a.n, a.what), "write as many positions as count says")
		}
		for i, x := range a.xs {
			if opposite := a.xs[a.n-1-i]; math.Abs(x+opposite) > 1e-3 {
				return fail(a.across(), "positions: "+shown(x, a.positions[0])+" has none opposite at "+shown(-x, a.positions[0])+"; a row is symmetrical, bending sideways is not covered",
					"write each position on both sides of the axis of symmetry, [-150 mm, 150 mm]; one on the axis as 0 mm")
			}
		}
	}
	for i := 1; i < len(a.xs); i++ {
		if d := a.xs[i] - a.xs[i-1]; exceeds(a.d, d) {
			if len(a.positions) > 0 {
				return fail(a.across(), "positions: "+shown(a.xs[i-1], a.positions[0])+" and "+shown(a.xs[i], a.positions[0])+" lie within "+shown(d, a.positions[0])+", want at least "+shown(a.d, a.positions[0])+", the diameter",
					"write the places of the axes across the section")
			}
			return fail(a.spacing.Origin, "spacing: have "+a.spacing.String()+", want at least "+shown(a.d, a.spacing)+", the diameter", "write the distance between the axes")
		}
	}
	return true
}

// inDepth finds a height at which the row sticks out of the soffit or the top.
func (a *layer) inDepth(r *reader, o section.Outline) bool {
	low, high := a.d/2, o.Height()-a.d/2
	if a.points != nil {
		return a.ductInDepth(r, o)
	}
	y, top := a.profile.Extremes()
	switch {
	case exceeds(low, y):
		r.at(a.height.Origin, "height: have "+a.height.String()+", want at least "+shown(low, a.height)+", half the diameter", "write the height of the axes above the soffit")
	case exceeds(y, high):
		r.at(a.height.Origin, "height: have "+a.height.String()+", want at most "+shown(high, a.height)+" in a section "+shown(o.Height(), a.height)+" deep", "write the height of the axes above the soffit")
	case exceeds(top, high):
		r.at(a.rise.Origin, "rise at ends: "+a.name+" comes up to "+shown(top, a.height)+", want at most "+shown(high, a.height)+" in a section "+shown(o.Height(), a.height)+" deep",
			"write by how much the strands lie higher at the ends than between the points, at most "+shown(high-y, a.rise)+" here")
	default:
		return true
	}
	return false
}

// ductInDepth is inDepth along a profile: it tells of the place where the duct is farthest out.
func (a *layer) ductInDepth(r *reader, o section.Outline) bool {
	worst, at := 0.0, 0.0
	for _, x := range looked(a.profile, fine) {
		y := a.profile.Height(x)
		if out := max(a.d/2-y, y+a.d/2-o.Height()); exceeds(out+o.Height(), o.Height()) && out > worst {
			worst, at = out, x
		}
	}
	if worst == 0 {
		return true
	}
	p := a.point(at)
	y := a.profile.Height(at)
	limit := "at most " + shown(o.Height()-a.d/2, p.Height) + " in a section " + shown(o.Height(), p.Height) + " deep"
	if y < o.Height()/2 {
		limit = "at least " + shown(a.d/2, p.Height) + ", half the diameter of the duct"
	}
	r.at(p.Height.Origin, "profile: "+a.name+" lies at height "+shown(y, p.Height)+" at "+metres(at)+", beyond the section; want "+limit, "write heights of the axis above the soffit, and lines that keep within the section between the points")
	return false
}

// point is the point of the profile to which the line at a place leads.
func (a *layer) point(at float64) *ProfileRow {
	for i := range a.points {
		if a.points[i].At.Base() >= at {
			return &a.points[i]
		}
	}
	return &a.points[len(a.points)-1]
}

// inConcrete finds a strand, duct or bar that is not all round in the concrete. Bars without a spacing are taken side by
// side.
func (a *layer) inConcrete(r *reader, o section.Outline) {
	y, radius := a.profile.Segments[0].Height, a.d/2
	if a.xs == nil {
		taken, width := float64(a.n)*a.d, o.LeastWidth(y-radius, y+radius)
		if a.what == "bars" && exceeds(taken, width) {
			r.wide(a, taken, width)
		}
		return
	}
	places := looked(a.profile, fine)
	heights := map[float64]bool{}
	for _, at := range places {
		y := a.profile.Height(at)
		if heights[y] {
			continue
		}
		heights[y] = true
		b := bandAt(o, y, radius)
		for k, x := range a.xs {
			if !b.holds(o.CentroidX() + x) {
				a.outside(r, o, k, at, y, o.Clearance(o.CentroidX()+x, y))
				return
			}
		}
	}
}

func (r *reader) wide(a *layer, taken, width float64) {
	r.at(a.across(), fmt.Sprintf("spacing: %d in a row take %s, at height %s the concrete is %s wide", a.n, shown(taken, a.height), a.height, shown(width, a.height)), "write fewer in the row, a smaller spacing, or the height of a wider part")
}

// outside tells of one that lies outside the concrete, or too near to its surface.
func (a *layer) outside(r *reader, o section.Outline, k int, at, y, clear float64) {
	chords := widths(o, y)
	level := straight(a.profile)
	if level && a.n > 1 && len(a.positions) == 0 && len(chords) == 1 {
		taken := a.xs[a.n-1] - a.xs[0] + a.d
		if width := o.LeastWidth(y-a.d/2, y+a.d/2); width > 0 && exceeds(taken, width) {
			r.wide(a, taken, width)
			return
		}
	}
	from, key, like := a.across(), a.key(), a.height
	if key == "positions" {
		for _, p := range a.positions {
			if p.Base() == a.xs[k] {
				from = p.Origin
			}
		}
	}
	x, near := a.xs[k], ""
	if clear > 0 {
		near = " comes within " + shown(clear, like) + " of the surface of the concrete, less than half its diameter"
	} else {
		near = " lies outside the concrete or in a void"
	}
	which := fmt.Sprintf("the %s at %s from the axis of symmetry", a.one(), shown(x, like))
	if a.n == 1 {
		which = a.name
	}
	where := "at height " + shown(y, like)
	if !level {
		where += ", " + metres(at) + " from end A,"
	}
	msg := which + " " + where + near + "; there is concrete " + spread(chords, x)
	switch {
	case a.points != nil:
		p := a.point(at)
		r.at(p.Height.Origin, "profile: "+msg, a.propose(o, y, "write heights at which the duct lies in the concrete"))
	case !level && y != lowest(a.profile):
		r.at(a.rise.Origin, "rise at ends: "+msg, a.propose(o, y, "write a smaller rise, or other positions"))
	default:
		r.at(from, key+": "+msg, a.propose(o, y, "write the height of a wider part"))
	}
}

// widths is the concrete at one height, from the axis of symmetry.
func widths(o section.Outline, y float64) []chord {
	var out []chord
	for _, c := range o.Chords(y) {
		out = append(out, chord{From: c.From - o.CentroidX(), To: c.To - o.CentroidX()})
	}
	return out
}

// spread says where there is concrete, at most four parts of it, those nearest to x.
func spread(chords []chord, x float64) string {
	far := func(c chord) float64 { return max(c.From-x, x-c.To, 0) }
	list := slices.Clone(chords)
	slices.SortStableFunc(list, func(a, b chord) int { return cmp.Compare(far(a), far(b)) })
	list = list[:min(len(list), 4)]
	slices.SortFunc(list, func(a, b chord) int { return cmp.Compare(a.From, b.From) })
	var parts []string
	for _, c := range list {
		parts = append(parts, "from "+tenth(c.From)+" to "+tenth(c.To))
	}
	if len(parts) == 0 {
		return "nowhere"
	}
	if len(list) < len(chords) {
		return strings.Join(parts, ", ") + " …"
	}
	return strings.Join(parts, " and ")
}

// tenth writes a length in mm to a tenth.
func tenth(v float64) string { return short(clean(math.Round(v*10)/10)) + " mm" }

// propose writes positions at which the row would lie in the concrete at a height; otherwise is said where there are none,
// or the row keeps to the width already.
func (a *layer) propose(o section.Outline, y float64, otherwise string) string {
	chords := widths(o, y)
	if len(chords) < 2 {
		return otherwise
	}
	use := chords
	if a.n < len(use) { // one each in the outermost
		use = append(slices.Clone(chords[:a.n/2]), chords[len(chords)-a.n/2:]...)
	}
	if len(use) == 0 || a.n%len(use) != 0 {
		return otherwise + "; or rows with the same number in each web, by positions"
	}
	each := a.n / len(use)
	var xs []string
	for _, c := range use {
		mid, gap := math.Round(clean((c.From+c.To)/2)), 0.0
		if each > 1 {
			gap = 2 * math.Floor(min((c.To-c.From-2*a.d)/float64(each-1), 4*a.d)/2)
			if gap < a.d {
				return otherwise + "; or write two rows at different heights"
			}
		}
		for k := range each {
			x := mid + (float64(k)-float64(each-1)/2)*gap
			if b := bandAt(o, y, a.d/2); !b.holds(o.CentroidX() + x) {
				return otherwise + "; or write two rows at different heights"
			}
			xs = append(xs, tenth(x))
		}
	}
	hint := "write"
	if len(a.positions) == 0 {
		hint += " positions in the place of the spacing"
	}
	return hint + ", for example, positions: [" + strings.Join(xs, ", ") + "]"
}
