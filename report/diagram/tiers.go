package diagram

import (
	"cmp"
	"math"
	"slices"

	"soffit/report/draw"
)

// tiers share dimensions of one side out on lines, the first nearest to the section: short ones inside of those that
// they are part of, and neighbours in one line.
func tiers(ms []measure) [][]measure {
	slices.SortStableFunc(ms, func(a, b measure) int {
		if d := a.length() - b.length(); math.Abs(d) > near {
			return cmp.Compare(a.length(), b.length())
		}
		return cmp.Compare(a.from(), b.from())
	})
	var out [][]measure
	for _, m := range ms {
		k := len(out)
		for k > 0 && !slices.ContainsFunc(out[k-1], m.meets) {
			k--
		}
		if k == len(out) {
			out = append(out, nil)
		}
		out[k] = append(out[k], m)
	}
	return out
}

// balance moves some of many lines of upright dimensions from the left to the right of a section with like halves; the
// shortest and the longest stay.
func (d *dimensions) balance(s *shape) {
	rows := tiers(d.side[beforeLeft])
	if len(rows) < 4 {
		return
	}
	d.side[beforeLeft] = nil
	for k, row := range rows {
		for _, m := range row {
			at := beforeLeft
			if k >= 1 && k <= len(rows)/2 {
				at = beforeRight
				m.a, m.b = s.mirror(m.a), s.mirror(m.b)
			}
			d.side[at] = append(d.side[at], m)
		}
	}
}

// start is where the line from an end to a dimension outside begins: at the surface, or within at the end itself.
func (s *shape) start(m measure, p point, at side) float64 {
	if m.within {
		return pick(m.level, p.y, p.x)
	}
	lo, hi := s.ends(pick(m.level, p.x, p.y), m.level)
	if top := s.strip(); top != nil && !m.level && p.y > s.height-near {
		lo, hi = min(lo, top[0][0].x), max(hi, top[0][1].x)
	}
	if lo > hi {
		return pick(m.level, p.y, p.x)
	}
	return pick(at == over || at == beforeRight, hi, lo)
}

// levelTiers draws dimensions over or under the section: a line each tier apart from y on, figures over the line, in the
// middle or beyond an end where no line to an outer one comes down. Limit is how far figures may reach to the right
// of what they measure. It returns the farthest line.
func (s *crossSection) levelTiers(c draw.Canvas, f frame, ms []measure, y, apart draw.Pt, at side, limit draw.Pt) draw.Pt {
	type set struct{ from, to draw.Pt } // figures in a tier
	rows := tiers(ms)
	last := y
	for k := 0; k < len(rows); k++ {
		base := y + apart*draw.Pt(k)
		last = base
		var written []set
		var outer []draw.Pt // where lines to outer tiers pass
		for _, row := range rows[k+1:] {
			for _, m := range row {
				outer = append(outer, f.at(m.from(), 0).X, f.at(m.to(), 0).X)
			}
		}
		var lines []set
		for _, m := range rows[k] {
			lines = append(lines, set{f.at(m.from(), 0).X, f.at(m.to(), 0).X})
		}
		for i, m := range rows[k] {
			x0, x1 := lines[i].from, lines[i].to
			l := label{}.length(m.value)
			free := func(from, to draw.Pt, self bool) bool {
				for _, x := range outer {
					if x > from-1.5 && x < to+1.5 {
						return false
					}
				}
				for _, w := range written {
					if from < w.to+3 && w.from < to+3 {
						return false
					}
				}
				for j, w := range lines {
					if j != i && from < w.to+1 && w.from-1 < to {
						return false
					}
				}
				return self || to <= limit
			}
			// Places of the figures: in the middle, along the line, beyond the ends, and beyond all lines.
			type place struct{ x0, from, to draw.Pt } // start of the figures, ends of the line
			var places []place
			if l.width+4 <= x1-x0 {
				for _, t := range []draw.Pt{0.5, 0.4, 0.6, 0.3, 0.7, 0.2, 0.8} {
					if v := x0 + (x1-x0)*t - l.width/2; v >= x0+2 && v+l.width <= x1-2 {
						places = append(places, place{v, x0, x1})
					}
				}
			}
			right := func(past draw.Pt) place { return place{past + 3, x0 - beyond, past + 4 + l.width} }
			left := func(past draw.Pt) place { return place{past - 3 - l.width, past - 4 - l.width, x1 + beyond} }
			beyondEnds := []place{right(x1), left(x0)}
			var far []place
			for _, x := range outer {
				if x > x1 {
					far = append(far, right(x))
				}
				if x < x0 {
					far = append(far, left(x))
				}
			}
			for _, w := range append(slices.Clone(lines), written...) {
				if w.to > x1 {
					far = append(far, right(w.to))
				}
				if w.from < x0 {
					far = append(far, left(w.from))
				}
			}
			slices.SortStableFunc(far, func(a, b place) int { return cmp.Compare(a.to-a.from, b.to-b.from) })
			if at == over {
				slices.Reverse(beyondEnds)
			}
			places = append(append(places, beyondEnds...), far...)
			p := places[0]
			for _, q := range places {
				if free(q.x0, q.x0+l.width, q.x0 < x1) {
					p = q
					break
				}
			}
			for _, e := range [2]point{m.a, m.b} {
				extendDown(c, f.at(e.x, 0).X, f.at(0, s.shape.start(m, e, at)).Y, base)
			}
			ticks(c, x0, base)
			ticks(c, x1, base)
			c.Line(p.from, base, p.to, base, hair)
			l.draw(c, p.x0, base-clearance-l.depth)
			written = append(written, set{p.x0, p.x0 + l.width})
		}
	}
	return last
}

// uprightTiers draws dimensions left or right of the section from x on, figures beyond their lines, moved apart where
// they are close and off the lines to outer tiers and the heights in taken. It returns how far it reaches.
func (s *crossSection) uprightTiers(c draw.Canvas, f frame, ms []measure, x draw.Pt, at side, taken []draw.Pt) draw.Pt {
	rows := tiers(ms)
	reach := x
	for k, row := range rows {
		slices.SortStableFunc(row, func(a, b measure) int { return cmp.Compare(b.from(), a.from()) })
		avoid := slices.Clone(taken)
		for _, r := range rows[k+1:] {
			for _, m := range r {
				avoid = append(avoid, f.at(0, m.from()).Y, f.at(0, m.to()).Y)
			}
		}
		var mid []draw.Pt
		var ls []label
		for _, m := range row {
			mid = append(mid, (f.at(0, m.from()).Y+f.at(0, m.to()).Y)/2)
			ls = append(ls, label{}.length(m.value))
		}
		to := apartOf(mid, avoid, f.at(0, s.shape.total()).Y)
		off := draw.Pt(0)
		for i := range to {
			if shifted(mid[i], to[i]) {
				off = 6
			}
		}
		out := pick[draw.Pt](at == beforeLeft, -1, 1)
		for i, m := range row {
			y0, y1 := f.at(0, m.to()).Y, f.at(0, m.from()).Y
			for _, e := range [2]point{m.a, m.b} {
				extendLeft(c, f.at(0, e.y).Y, f.at(s.shape.start(m, e, at), 0).X, x)
			}
			ticks(c, x, y0)
			ticks(c, x, y1)
			c.Line(x, y0-beyond, x, y1+beyond, hair)
			end := x + out*(3+off)
			if shifted(mid[i], to[i]) {
				c.Polyline([]draw.Point{{X: x + out*0.8, Y: mid[i]}, {X: end - out, Y: to[i]}}, draw.Style{Stroke: hair})
			}
			if at == beforeRight {
				ls[i].draw(c, end, to[i]+middle)
			} else {
				ls[i].right(c, end, to[i]+middle)
			}
		}
		reach = x + out*(3+off+wide(ls...))
		x = reach + out*6
	}
	return reach
}
