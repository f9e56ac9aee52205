package diagram

import (
	"fmt"
	"strings"

	"soffit/calc/trace"
)

// data reads the entries of a figure by their roles. The first fault is kept and asked for once at the end,
// so that a diagram reads as a list of what it needs.
type data struct {
	note   *trace.Note
	fig    *trace.Figure
	roles  map[string][]*trace.Line
	checks map[string]*trace.Check // the entries in roles that begin with "check" and are checks
	err    error
}

func read(n *trace.Note, f *trace.Figure) *data {
	d := &data{note: n, fig: f, roles: map[string][]*trace.Line{}, checks: map[string]*trace.Check{}}
	for _, p := range f.Series {
		e := n.Entry(p.Key)
		if c, ok := e.(*trace.Check); ok && strings.HasPrefix(p.Role, "check") {
			d.checks[p.Role] = c
			continue
		}
		l := trace.LineOf(e)
		if l == nil {
			d.fail("role %q: no values under key %s", p.Role, p.Key)
			continue
		}
		d.roles[p.Role] = append(d.roles[p.Role], l)
	}
	return d
}

func (d *data) fail(format string, args ...any) {
	if d.err == nil {
		d.err = fmt.Errorf("figure %s: %w", d.fig.Key, fmt.Errorf(format, args...))
	}
}

// has tells whether the figure has an entry in a role.
func (d *data) has(role string) bool { return len(d.roles[role]) > 0 }

// cell is one value as the record shows it. Its number is in base units: N, mm, MPa.
type cell struct {
	value float64
	shown string // empty where the branch was not taken
	line  *trace.Line
}

func (c cell) taken() bool { return c.shown != "" }

// column is a value per row of an axis.
type column struct {
	axis  *trace.Axis
	cells []cell
}

func (c column) len() int { return len(c.cells) }

// line is an entry of the column, for its symbol and unit.
func (c column) line() *trace.Line {
	for _, x := range c.cells {
		if x.line != nil {
			return x.line
		}
	}
	return nil
}

// values are the numbers in base units, 0 where not taken.
func (c column) values() []float64 {
	out := make([]float64, len(c.cells))
	for i, x := range c.cells {
		out[i] = x.value
	}
	return out
}

// place is where the figure stands: its row of every implicit axis that has one of this name.
func (d *data) place() trace.Place {
	var p trace.Place
	if d.fig.At == "" {
		return p
	}
	for _, a := range d.note.Axes {
		if a.Index == "" {
			if r := a.Row(d.fig.At); r >= 0 {
				p = p.With(a, r)
			}
		}
	}
	return p
}

// at is the value of a role at a place: of several entries in one role the first that was computed there.
func (d *data) at(role string, p trace.Place) cell {
	var c cell
	for _, l := range d.roles[role] {
		i := trace.Flat(l.Axes, p)
		if i < 0 {
			for _, a := range l.Axes {
				if p.Of(a) < 0 {
					d.fail("role %q: %s needs a row of %s, has %q", role, l.Key, a.Name, d.fig.At)
				}
			}
			return cell{}
		}
		if c.line == nil {
			c.line = l
		}
		if l.Taken(i) {
			return cell{l.Values[i], l.Shown[i], l}
		}
	}
	return c
}

// one is the value of a role that has a single one at the figure's place.
func (d *data) one(role string) cell {
	if !d.has(role) {
		d.fail("no entry in role %q", role)
		return cell{}
	}
	c := d.at(role, d.place())
	if !c.taken() {
		d.fail("role %q: not computed at %q", role, d.fig.At)
	}
	return c
}

// over is the values of a role along an axis, the other axes as place fixes them.
func (d *data) over(role string, a *trace.Axis, p trace.Place) column {
	out := column{axis: a, cells: make([]cell, len(a.Rows))}
	for i := range a.Rows {
		out.cells[i] = d.at(role, p.With(a, i))
	}
	return out
}

// axis is the axis over which a role runs: the implicit one or the one with an index letter.
func (d *data) axis(role string, implicit bool) *trace.Axis {
	if !d.has(role) {
		d.fail("no entry in role %q", role)
		return nil
	}
	var found *trace.Axis
	for _, l := range d.roles[role] {
		for _, a := range l.Axes {
			if (a.Index == "") == implicit {
				if found != nil && found != a {
					d.fail("role %q runs over %s and over %s", role, found.Name, a.Name)
				}
				found = a
			}
		}
	}
	if found == nil {
		d.fail("role %q: %s does not run over rows", role, d.roles[role][0].Key)
	}
	return found
}

// rows are the values of a role over its index letter, at the figure's place, where all must be computed.
func (d *data) rows(role string) column {
	a := d.axis(role, false)
	if a == nil {
		return column{}
	}
	c := d.over(role, a, d.place())
	for i, v := range c.cells {
		if !v.taken() {
			d.fail("role %q: not computed for row %s", role, a.Rows[i])
		}
	}
	return c
}

// beside are the rows of a role over the axis of another, which must be the same; a single value stands for
// every row.
func (d *data) beside(role string, as column) column {
	none := column{axis: as.axis, cells: make([]cell, as.len())}
	if d.err != nil {
		return none
	}
	c := column{axis: as.axis}
	if d.has(role) && !d.runs(role, false) {
		c = d.over(role, as.axis, d.place())
	} else {
		c = d.rows(role)
	}
	if d.err == nil && c.axis != as.axis {
		d.fail("role %q runs over %s, want %s", role, c.axis.Name, as.axis.Name)
	}
	if d.err != nil {
		return none
	}
	return c
}

// runs tells whether a role runs over an implicit axis, or over one with an index letter.
func (d *data) runs(role string, implicit bool) bool {
	for _, l := range d.roles[role] {
		for _, a := range l.Axes {
			if (a.Index == "") == implicit {
				return true
			}
		}
	}
	return false
}

// stations are the values of a role over the implicit axis.
func (d *data) stations(role string) column {
	a := d.axis(role, true)
	if a == nil {
		return column{}
	}
	return d.over(role, a, nil)
}
