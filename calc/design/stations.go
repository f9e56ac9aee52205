package design

import (
	"cmp"
	"fmt"
	"math"
	"slices"
	"strings"

	"soffit/calc/trace"
)

// spanParts and overhangParts are in how many equal parts the span and an overhang are cut for stations.
const (
	spanParts     = 40
	overhangParts = 10
)

// station is a place along the member at which everything is worked.
type station struct {
	name string
	x    float64 // mm from end A
}

// overhangs says at which ends the concrete reaches beyond the bearing by more than the depth of the section. Shorter ends
// are no overhangs: they load the bearing straight.
func (j *job) overhangs() (a, b bool) {
	h := j.shape.Height()
	return j.m.Span.BearingA.FromEnd.Base() > h, j.m.Span.BearingB.FromEnd.Base() > h
}

// stationList is the fortieths of the span, the tenths and the end of each overhang, each load, the bends of tendons, and
// where the force of a pretensioned row starts, has been handed over and can be anchored in full. Ends, bearings, loads
// and bends stand where they are, to the last digit, for the shear force or the height of the tendon breaks there; the
// others are rounded to 1 mm. One place has one station. Ends that are no overhang have none, but those of ducts, where tendons are anchored.
func (j *job) stationList() []station {
	length := j.m.Span.Length.Base()
	a, b := j.m.Span.BearingA.FromEnd.Base(), j.bearingB().Quantity().Value
	overA, overB := j.overhangs()
	first, last := pick(overA || j.ducted(), 0, a), pick(overB || j.ducted(), length, b)
	var all []station
	add := func(name string, x float64) {
		if x < first || x > last {
			return
		}
		for _, s := range all {
			if s.x == x {
				return
			}
		}
		for slices.ContainsFunc(all, func(s station) bool { return s.name == name }) {
			name += "′"
		}
		all = append(all, station{name, x})
	}
	round := func(name string, x float64) { add(name, math.Round(x)) }
	add("bearing A", a)
	add("bearing B", b)
	add("end A", 0)
	add("end B", length)
	for _, l := range j.loadRows() {
		from, to := l.from.Quantity().Value, l.to.Quantity().Value
		switch {
		case l.action < 0 || l.n.Quantity().Value != 0:
		case from == to:
			add("load "+l.name, from)
		default:
			add("load "+l.name+" from", from)
			add("load "+l.name+" to", to)
		}
	}
	round("mid-span", (a+b)/2)
	for k := 1; k < spanParts; k++ {
		round(fmt.Sprintf("%g l", float64(k)/spanParts), a+(b-a)*float64(k)/spanParts)
	}
	for k := 1; k < overhangParts; k++ { // counted from the bearing
		t := float64(k) / overhangParts
		if overA {
			round(fmt.Sprintf("overhang A %g", t), a*(1-t))
		}
		if overB {
			round(fmt.Sprintf("overhang B %g", t), b+(length-b)*t)
		}
	}
	for _, s := range append(j.bends(), j.bondStations()...) {
		add(s.name, s.x)
	}
	slices.SortFunc(all, func(s, t station) int { return cmp.Compare(s.x, t.x) })
	return all
}

// bends are the places where a row of tendons changes its direction or its line.
func (j *job) bends() []station {
	var out []station
	length := j.m.Span.Length.Base()
	for i := range j.m.Strands.Rows {
		r := &j.m.Strands.Rows[i]
		if x := r.Deflected.FromEnd; x.Present() {
			out = append(out, station{"held down " + r.Name.Text + " A", x.Base()}, station{"held down " + r.Name.Text + " B", length - x.Base()})
		}
	}
	for i := range j.m.Ducts.Rows {
		r := &j.m.Ducts.Rows[i]
		for k := range r.Profile {
			out = append(out, station{fmt.Sprintf("profile %s %d", r.Name.Text, k+1), r.Profile[k].At.Base()})
		}
	}
	return out
}

// bondStations are where the force of each pretensioned row starts, has been handed over and can be anchored in full.
func (j *job) bondStations() []station {
	if j.ducted() {
		return nil
	}
	length := j.m.Span.Length.Base()
	var out []station
	for i, r := range j.rows.Rows {
		row := trace.Place{{Axis: j.rows, Row: i}}
		debonded := j.base("given.tendons/debonded-length", row)
		for _, p := range []station{{"start", debonded}, {"l_pt2", debonded + j.base("prestress.transmission/upper-transmission-length", row)},
			{"l_bpd", debonded + j.base("prestress.transmission/anchorage-length", row)}} {
			x := math.Ceil(p.x) // never on the short side
			out = append(out, station{p.name + " " + r + " A", x}, station{p.name + " " + r + " B", length - x})
		}
	}
	return out
}

// stationSource says how the stations were chosen.
func (j *job) stationSource() string {
	out := []string{fmt.Sprintf("the span in %d parts", spanParts)}
	if a, b := j.overhangs(); a || b {
		out = append(out, fmt.Sprintf("overhangs in %d parts", overhangParts))
	}
	out = append(out, "loads")
	if len(j.bends()) > 0 {
		out = append(out, pick(!j.ducted(), "points where tendons are held down", "points of the profiles of tendons"))
	}
	if !j.ducted() {
		out = append(out, "ends of debonding, of l_pt2 and of l_bpd")
	}
	return strings.Join(out, ", ")
}
