package trace

import (
	"fmt"
	"strings"
)

// Place fixes the row of some axes.
type Place []Fixed

// Fixed is one axis at one row.
type Fixed struct {
	Axis *Axis
	Row  int
}

// With is the place with one more axis fixed, replacing an earlier row of the same axis.
func (p Place) With(a *Axis, row int) Place {
	out := make(Place, 0, len(p)+1)
	for _, q := range p {
		if q.Axis != a {
			out = append(out, q)
		}
	}
	return append(out, Fixed{a, row})
}

// Of is the row of an axis, or −1.
func (p Place) Of(a *Axis) int {
	for _, q := range p {
		if q.Axis == a {
			return q.Row
		}
	}
	return -1
}

// Flat is the position of a place in a series over axes, −1 if an axis is not fixed.
func Flat(axes []*Axis, p Place) int {
	i := 0
	for _, a := range axes {
		r := p.Of(a)
		if r < 0 {
			return -1
		}
		i = i*len(a.Rows) + r
	}
	return i
}

// PlaceAt is the place of a flat position.
func PlaceAt(axes []*Axis, i int) Place {
	p := make(Place, len(axes))
	for k := len(axes) - 1; k >= 0; k-- {
		n := len(axes[k].Rows)
		p[k] = Fixed{axes[k], i % n}
		i /= n
	}
	return p
}

// RowName names a flat position: "midspan", "midspan, row 1"; empty for a single value.
func RowName(axes []*Axis, i int) string {
	names := make([]string, 0, len(axes))
	for _, q := range PlaceAt(axes, i) {
		names = append(names, q.Axis.Rows[q.Row])
	}
	return strings.Join(names, ", ")
}

func size(axes []*Axis) int {
	n := 1
	for _, a := range axes {
		n *= len(a.Rows)
	}
	return n
}

// Resolve finds the line and the flat position that a use stands for at a place.
func (n *Note) Resolve(u Use, at Place) (*Line, int, error) {
	for _, from := range u.From {
		key, row, picked := strings.Cut(from, "@")
		l := LineOf(n.Entry(key))
		if l == nil {
			return nil, 0, fmt.Errorf("%s: no value under key %s", u.Symbol, key)
		}
		p := at
		if picked {
			for _, a := range l.Axes {
				if a.Index == "" {
					r := a.Row(row)
					if r < 0 {
						return nil, 0, fmt.Errorf("%s: no row %q", from, row)
					}
					p = p.With(a, r)
				}
			}
		}
		i := Flat(l.Axes, p)
		if i < 0 {
			return nil, 0, fmt.Errorf("%s: %s needs a row of %s", u.Symbol, key, l.Axes[0].Name)
		}
		if l.Taken(i) {
			return l, i, nil
		}
	}
	return nil, 0, fmt.Errorf("%s: not computed here", u.Symbol)
}
