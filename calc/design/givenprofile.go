package design

import (
	"fmt"
	"strconv"

	"soffit/calc/mechanics"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/tendon"
	"soffit/calc/trace"
)

// profilesOf are the profiles of the rows, in their order, from end A to end B of the concrete, of a section as deep as given.
func profilesOf(m *member.Member, depth float64) ([]tendon.Profile, error) {
	length := m.Span.Length.Base()
	var out []tendon.Profile
	add := func(name string, p tendon.Profile, err error) error {
		if err != nil {
			return fmt.Errorf("row %q: %w", name, err)
		}
		if !quantity.Agree(p.To(), length) || p.From() != 0 {
			return fmt.Errorf("row %q: the profile goes from %g m to %g m, the concrete from 0 m to %g m", name, p.From()/1000, p.To()/1000, length/1000)
		}
		if least, greatest := p.Extremes(); least <= 0 || greatest >= depth {
			return fmt.Errorf("row %q: its axis runs from %.1f mm to %.1f mm above the soffit and leaves the concrete, which is %.1f mm deep", name, least, greatest, depth)
		}
		out = append(out, p)
		return nil
	}
	for i := range m.Strands.Rows {
		r := &m.Strands.Rows[i]
		p, err := r.Path(m.Span.Length)
		if err == nil && deflected(r) && r.Deflected.FromEnd.Base() > length/2 {
			err = fmt.Errorf("held down %s from the ends of a member of %s", r.Deflected.FromEnd, m.Span.Length)
		}
		if err := add(r.Name.Text, p, err); err != nil {
			return nil, err
		}
	}
	for i := range m.Ducts.Rows {
		r := &m.Ducts.Rows[i]
		p, err := r.Path()
		if err := add(r.Name.Text, p, err); err != nil {
			return nil, err
		}
	}
	return out, nil
}

// givenProfile records the segments of the profiles between the points of the member file, works their slopes and
// curvatures, and asks that each meets its points. Only the slope reached before each segment comes from the kernel: it stands
// beside the slope at the end of the segment before.
func (j *job) givenProfile(c *trace.Chapter) {
	b := c.Block("profile", "Profiles of the tendons", nil)
	j.profile = b
	most := 0
	for _, p := range j.profiles {
		most = max(most, len(p.Segments))
	}
	names := make([]string, most)
	for m := range names {
		names[m] = "segment " + strconv.Itoa(m+1)
	}
	j.segments = j.n.Axis("segment", "segment of the profile, from end A", "m", names)
	source := j.profileSource()
	start := make([]quantity.Literal, len(j.profiles))
	for i, p := range j.profiles {
		start[i] = number(p.Segments[0].Height, "mm", mostDecimals)
	}
	b.GivenRows(def("start", "y_{0,i}", "Height at end A", "mm"), j.rows, start, source)
	column := func(id, symbol, name, unit, source string, beyond float64, f func(p tendon.Profile, m int) float64) {
		var v []quantity.Literal
		for _, p := range j.profiles {
			for m := range most {
				x := beyond
				if m < len(p.Segments) {
					x = f(p, m)
				}
				v = append(v, number(x, unit, mostDecimals))
			}
		}
		b.GivenOver(def(id, symbol, name, unit), []*trace.Axis{j.rows, j.segments}, v, source)
	}
	length := j.m.Span.Length.Base()
	column("segment-start", "x_{s,i,m}", "Start of each segment, from end A", "m", source, length, func(p tendon.Profile, m int) float64 { return p.Segments[m].Start })
	column("segment-length", "l_{s,i,m}", "Length of each segment along the member; 0: the row has no such segment", "m", source, 0, func(p tendon.Profile, m int) float64 { return p.Segments[m].Length })
	column("segment-from", "y_{s,i,m}", "Height at the start of each segment", "mm", source, 0, func(p tendon.Profile, m int) float64 { return p.Segments[m].Height })
	column("segment-to", "y_{e,i,m}", "Height of the point at its end", "mm", source, 0, func(p tendon.Profile, m int) float64 { return p.Points[m+1].Height })
	column("segment-line", "f_{s,i,m}", "Line of each segment: 1 straight, 2 a parabola level at its end, 0 one level at its start, 3 one that goes on in the direction reached", "", source, 0, func(p tendon.Profile, m int) float64 {
		return map[tendon.Line]float64{tendon.Straight: 1, tendon.LevelHere: 2, tendon.LevelBefore: 0, tendon.Onward: 3}[p.Points[m+1].By]
	})
	column("segment-slope-before", "s_{b,i,m}", "Slope with which the tendon comes to the start: that at the end of the segment before", "", "that at the end of the segment before, found below", 0, func(p tendon.Profile, m int) float64 {
		if m == 0 {
			return p.Segments[0].Slope
		}
		before := p.Segments[m-1]
		return before.SlopeAt(before.Length)
	})
	b.Steps(mechanics.SegmentSlope, mechanics.SegmentHalfCurvature, mechanics.SegmentEndSlope, mechanics.Kink, mechanics.ProfileFit)
	b.Require(mechanics.ProfileMeets)
}

// mostDecimals is with how many decimals a column of a profile can be shown at most.
const mostDecimals = 9

// profileSource says from which lines of the member file the profiles come.
func (j *job) profileSource() string {
	var from []member.Origin
	for i := range j.m.Ducts.Rows {
		for k := range j.m.Ducts.Rows[i].Profile {
			from = append(from, j.m.Ducts.Rows[i].Profile[k].Height.Origin)
		}
	}
	for i := range j.m.Strands.Rows {
		r := &j.m.Strands.Rows[i]
		from = append(from, r.Height.Origin, r.Deflected.Rise.Origin, r.Deflected.FromEnd.Origin)
	}
	return lines(from...)
}
