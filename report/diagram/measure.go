package diagram

import (
	"cmp"
	"math"
	"slices"
)

// measure is one dimension of a section: its ends in mm, a left of or under b. A level one runs from left to right, an
// upright one from below upwards.
type measure struct {
	value  cell
	a, b   point
	level  bool
	within bool // it reaches its ends only through the section
}

func (m measure) length() float64 { return math.Hypot(m.b.x-m.a.x, m.b.y-m.a.y) }

// from and to are the ends along the dimension.
func (m measure) from() float64 { return pick(m.level, m.a.x, m.a.y) }
func (m measure) to() float64   { return pick(m.level, m.b.x, m.b.y) }

// meets tells whether two dimensions of one direction have more than an end in common.
func (m measure) meets(o measure) bool { return m.from() < o.to()-near && o.from() < m.to()-near }

func pick[T any](yes bool, a, b T) T {
	if yes {
		return a
	}
	return b
}

// measures reads the role dimension, with its ends in dimension-x1, -y1, -x2, -y2. Those of length 0 are left out, and
// of several alike all but the first.
func (d *data) measures() []measure {
	if !d.has("dimension") {
		return nil
	}
	v := d.rows("dimension")
	x1, y1 := d.beside("dimension-x1", v), d.beside("dimension-y1", v)
	x2, y2 := d.beside("dimension-x2", v), d.beside("dimension-y2", v)
	if d.err != nil {
		return nil
	}
	var out []measure
	for i, c := range v.cells {
		m := measure{value: c, a: point{x1.cells[i].value, y1.cells[i].value}, b: point{x2.cells[i].value, y2.cells[i].value}}
		if c.value == 0 && m.length() < near {
			continue
		}
		name := v.axis.Rows[i]
		switch {
		case math.Abs(m.a.y-m.b.y) < near:
			m.level = true
			if m.a.x > m.b.x {
				m.a, m.b = m.b, m.a
			}
		case math.Abs(m.a.x-m.b.x) < near:
			if m.a.y > m.b.y {
				m.a, m.b = m.b, m.a
			}
		default:
			d.fail("dimension %s is neither level nor upright", name)
			return nil
		}
		if math.Abs(m.length()-c.value) > 2*near {
			d.fail("dimension %s is %s, its ends are %.1f mm apart", name, c.shown, m.length())
			return nil
		}
		if !slices.ContainsFunc(out, m.repeats) {
			out = append(out, m)
		}
	}
	return out
}

// repeats tells whether a dimension says what another has said of the same places.
func (m measure) repeats(o measure) bool {
	return m.level == o.level && math.Abs(m.from()-o.from()) < near && math.Abs(m.to()-o.to()) < near
}

// side is where a dimension stands.
type side int

const (
	over side = iota
	under
	beforeLeft
	beforeRight
	inside
)

// stand says where a dimension stands best, and gives it there: of a section with two like halves it may be the one on
// the other side.
func (s *shape) stand(m measure) (measure, side) {
	const seen = 1e-9
	hidden := func(m measure, dx, dy float64) float64 { return s.unseen(m.a, dx, dy) + s.unseen(m.b, dx, dy) }
	if m.level {
		up, down := hidden(m, 0, 1) <= seen, hidden(m, 0, -1) <= seen
		switch {
		case m.a.y > s.height-near:
			return m, over
		case m.a.y < near:
			return m, under
		case up && (!down || m.a.y > s.height/2):
			return m, over
		case down:
			return m, under
		}
		return m, inside
	}
	other := m
	other.a, other.b = s.mirror(m.a), s.mirror(m.b)
	switch {
	case hidden(m, -1, 0) <= seen:
		return m, beforeLeft
	case s.mirrored && hidden(other, -1, 0) <= seen:
		return other, beforeLeft
	case hidden(m, 1, 0) <= seen:
		return m, beforeRight
	}
	return m, inside
}

// unseen is the length of concrete between a point and the outside in a direction: none where a corner of the outline at
// its height, or in its line, is seen from there.
func (s *shape) unseen(p point, dx, dy float64) float64 {
	least := s.hidden(p, dx, dy)
	for _, r := range s.outer {
		for _, q := range r {
			if dx != 0 && math.Abs(q.y-p.y) < near || dy != 0 && math.Abs(q.x-p.x) < near {
				least = min(least, s.hidden(q, dx, dy))
			}
		}
	}
	return least
}

// dimensions is how the dimensions of a section are shared out.
type dimensions struct {
	side [inside][]measure
	in   []placed
}

// share shares the dimensions out. What finds no room inside stands outside, with lines through the section.
func (s *crossSection) share(f frame) dimensions {
	var out dimensions
	var inner []measure
	for _, m := range s.measures {
		m, at := s.shape.stand(m)
		if at == inside {
			inner = append(inner, m)
			continue
		}
		out.side[at] = append(out.side[at], m)
	}
	slices.SortStableFunc(inner, func(a, b measure) int { return cmp.Compare(a.length(), b.length()) })
	for {
		r := s.room(f)
		for _, ms := range out.side {
			for _, m := range ms {
				if m.within {
					r.through(f, &s.shape, m)
				}
			}
		}
		failed := -1
		out.in = nil
		for i, m := range inner {
			p, ok := r.place(f, &s.shape, m)
			if !ok {
				failed = i
				break
			}
			out.in = append(out.in, p)
		}
		if failed < 0 {
			return out
		}
		m := inner[failed]
		m.within = true
		at := beforeLeft
		if m.level {
			at = over
			if s.shape.hidden(m.a, 0, -1)+s.shape.hidden(m.b, 0, -1) <= s.shape.hidden(m.a, 0, 1)+s.shape.hidden(m.b, 0, 1) {
				at = under
			}
		} else if s.shape.hidden(m.a, 1, 0)+1 < s.shape.hidden(m.a, -1, 0) {
			if at = beforeRight; s.shape.mirrored {
				at = beforeLeft
				m.a, m.b = s.shape.mirror(m.a), s.shape.mirror(m.b)
			}
		}
		out.side[at] = append(out.side[at], m)
		inner = slices.Delete(inner, failed, failed+1)
	}
}
