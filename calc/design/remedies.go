package design

import (
	"fmt"
	"math"
	"slices"

	"soffit/calc/member"
)

// remedy is one way to change a member, step by step; apply changes a copy and says in words what it did, or
// returns "" where the step cannot be taken.
type remedy struct {
	id    string
	steps int
	apply func(m *member.Member, step int) string
}

// remedies are tried in this order, each from its smallest step up.
var remedies = []remedy{
	{"more-tendons", 8, moreTendons},
	{"added-row", 6, addedRow},
	{"fewer-tendons", 8, fewerTendons},
	{"more-strands", 8, moreStrands},
	{"fewer-strands", 8, fewerStrands},
	{"added-bars", 4, addedBars},
	{"stronger-concrete", 8, strongerConcrete},
	{"deeper-section", 12, deeperSection},
}

// lowest is the lowest row of strands; a post-tensioned member has none.
func lowest(m *member.Member) *member.StrandRow {
	low := 0
	for i := range m.Strands.Rows {
		if m.Strands.Rows[i].Height.Base() < m.Strands.Rows[low].Height.Base() {
			low = i
		}
	}
	return &m.Strands.Rows[low]
}

// spaced says that the tendons of a row stand apart, at least 30 mm.
func spaced(r *member.StrandRow) bool { return r.Spacing.Base() >= 30 }

// moreTendons adds to the lowest row while there is room.
func moreTendons(m *member.Member, step int) string {
	if len(m.Strands.Rows) == 0 {
		return ""
	}
	r := lowest(m)
	before := r.Count.N
	r.Count.N += step
	if !spaced(r) {
		return ""
	}
	o, err := m.Shape.Outline()
	edge := 2 * r.Height.Base() // as far from the sides as from the soffit
	if err != nil || float64(r.Count.N-1)*r.Spacing.Base() > o.WidthAt(0)-edge {
		return ""
	}
	return fmt.Sprintf("row %q with %d tendons instead of %d", r.Name.Text, r.Count.N, before)
}

// addedRow puts a further row like the lowest one 50 mm above the rows of the lower half, two tendons a step.
func addedRow(m *member.Member, step int) string {
	if len(m.Strands.Rows) == 0 {
		return ""
	}
	shape, err := m.Shape.Outline()
	if err != nil {
		return ""
	}
	rows := m.Strands.Rows
	low, top := *lowest(m), 0.0
	for _, r := range rows {
		if h := r.Height.Base(); h < shape.Height()/2 {
			top = max(top, h)
		}
	}
	like := low.Name.Text
	low.Name.Text, low.Count.N = unused("added", func(n string) bool {
		return slices.ContainsFunc(rows, func(r member.StrandRow) bool { return r.Name.Text == n })
	}), 2*step
	low.Height.Literal = number(top+50, "mm", places(top))
	if !spaced(&low) || float64(low.Count.N-1)*low.Spacing.Base() > shape.WidthAt(top+50)-100 {
		return ""
	}
	m.Strands.Rows = append(rows, low)
	return fmt.Sprintf("a further row of %d tendons like row %q at %s above the soffit", low.Count.N, like, low.Height)
}

// fewerTendons takes out of the lowest row: a member with too much steel fails without warning.
func fewerTendons(m *member.Member, step int) string {
	if len(m.Strands.Rows) == 0 {
		return ""
	}
	r := lowest(m)
	if r.Count.N <= step {
		return ""
	}
	before := r.Count.N
	r.Count.N -= step
	return fmt.Sprintf("row %q with %d tendons instead of %d", r.Name.Text, r.Count.N, before)
}

// mostFilled is how much of a duct's circle strands may take up here.
const mostFilled = 0.4

// moreStrands adds to each duct while there is room.
func moreStrands(m *member.Member, step int) string {
	for i := range m.Ducts.Rows {
		r := &m.Ducts.Rows[i]
		r.Strands.N += step
		steel := tendonRow{}.of(r.Product.Text, m.Ducts.Products).area.Quantity().Value * float64(r.Strands.N)
		if d := r.Diameter.Base(); steel > mostFilled*math.Pi/4*d*d {
			return ""
		}
	}
	return strandsChanged(m, step, "more")
}

// fewerStrands takes out of each duct.
func fewerStrands(m *member.Member, step int) string {
	for i := range m.Ducts.Rows {
		if r := &m.Ducts.Rows[i]; r.Strands.N > step {
			r.Strands.N -= step
		} else {
			return ""
		}
	}
	return strandsChanged(m, step, "fewer")
}

func strandsChanged(m *member.Member, step int, way string) string {
	if len(m.Ducts.Rows) == 0 {
		return ""
	}
	return fmt.Sprintf("%d strand%s %s in each duct", step, pick(step == 1, "", "s"), way)
}

// addedBars puts two bars 45 mm above the lowest row, as far from the sides as that row is from the soffit.
func addedBars(m *member.Member, step int) string {
	if len(m.Strands.Rows) == 0 {
		return ""
	}
	low := lowest(m)
	diameter := []string{"12", "16", "20", "25"}[step-1]
	height := low.Height.Base() + 45
	shape, err := m.Shape.Outline()
	if err != nil || shape.WidthAt(height) < 2*low.Height.Base()+60 {
		return ""
	}
	bar := member.BarRow{Name: member.Word{Text: unused("added bars", func(n string) bool {
		return slices.ContainsFunc(m.Bars.Rows, func(r member.BarRow) bool { return r.Name.Text == n })
	})}, Count: member.Count{N: 2}, DuctilityClass: member.Word{Text: "B"}}
	bar.Diameter.Literal, bar.Fyk.Literal = plain(diameter, "mm"), plain("500", "MPa")
	bar.Height.Literal = number(height, "mm", places(height))
	bar.Spacing.Literal = number(shape.WidthAt(height)-2*low.Height.Base(), "mm", 0)
	if len(m.Bars.Rows) > 0 {
		bar.Fyk = m.Bars.Rows[0].Fyk
	} else {
		m.Bars.SteelDiagram.Text = "horizontal"
	}
	m.Bars.Rows = append(m.Bars.Rows, bar)
	return fmt.Sprintf("two bars of %s mm more at %s above the soffit, %s", diameter, bar.Height, bar.Fyk)
}

// unused is a name, with marks added until it is not taken.
func unused(name string, taken func(string) bool) string {
	for taken(name) {
		name += "′"
	}
	return name
}

// strongerConcrete raises f_ck by 5 MPa a step, to 90 MPa at most; the strength at release stays.
func strongerConcrete(m *member.Member, step int) string {
	v := m.Concrete.Fck.Base() + 5*float64(step)
	if v > 90 {
		return ""
	}
	before := m.Concrete.Fck.String()
	m.Concrete.Fck.Literal = number(v, "MPa", places(v))
	return fmt.Sprintf("f_ck %s instead of %s", m.Concrete.Fck, before)
}

// deeperSection raises the depth by 50 mm a step; what is stated of the tendons stays. A polygon has no depth of its own.
func deeperSection(m *member.Member, step int) string {
	if !m.Shape.Depth.Present() {
		return ""
	}
	before, top, more := m.Shape.Depth.String(), m.Shape.Depth.Base(), 50*float64(step)
	for i := range m.Bars.Rows {
		if r := &m.Bars.Rows[i]; r.Height.Base() > top { // in a topping, which rises too
			r.Height.Literal = number(r.Height.Base()+more, "mm", places(r.Height.Base()))
		}
	}
	m.Shape.Depth.Literal = number(top+more, "mm", places(top))
	return fmt.Sprintf("depth %s instead of %s, tendons at the same heights, the stated losses kept", m.Shape.Depth, before)
}
