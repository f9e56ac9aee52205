package design

import (
	"fmt"
	"strings"

	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// verdictChapter opens the note: what fails, and what would mend it, found by running the design again.
func (j *job) verdictChapter(c *trace.Chapter) {
	b := c.Block("checks", "The member in one picture", nil)
	j.elevation(b)
	if effect, check := j.n.Rounding(); check != nil {
		b.Text("rounding", fmt.Sprintf("Rounding to the printed digits moves no ratio of demand to limit by more than %.4f (%s %s).", effect+0.00005, check.Number, check.Name))
	}
	b.Text("remarks", j.remarks())
	if j.trying || j.n.Err() != nil {
		return
	}
	var failing []*trace.Check
	for _, k := range j.n.Checks() {
		if k.Failed() {
			failing = append(failing, k)
		}
	}
	if len(failing) > 0 {
		j.mends(c, failing)
	}
}

// remarks are outcomes that no check fails on but that a reader of the verdict must know.
func (j *job) remarks() string {
	var out []string
	for _, r := range []struct{ key, words string }{
		{"ultimate.bending/outermost-yields", "**Brittle:** the section is over-reinforced, the concrete crushes before the outermost row yields"},
		{"ultimate.bending/partly-compressed", "**Brittle:** the section is wholly compressed and no resistance is counted"},
		{"ultimate.bending/every-row-anchored", "A row that counts is not anchored up to its design strength and would slip before it yields"},
		{"ultimate.cracked/cracked-at-ultimate", ""},
	} {
		c, ok := j.n.Entry(r.key).(*trace.Choice)
		if !ok {
			continue
		}
		var at []string
		yes := false
		for i, o := range c.Outcomes {
			yes = yes || o == trace.Yes
			if o == trace.No {
				at = append(at, trace.RowName(c.Axes, i))
			}
		}
		switch {
		case r.words == "" && !yes:
			out = append(out, fmt.Sprintf("No station cracks in bending at the ultimate limit state ([%s](#%s)): the checks with the tension added by shear and of cracking before failure are not needed.", c.Number, c.Key))
		case r.words != "" && len(at) > 0:
			out = append(out, fmt.Sprintf("%s ([%s](#%s)), at %d of %d stations: %s.", r.words, c.Number, c.Key, len(at), len(c.Outcomes), some(at)))
		}
	}
	return strings.Join(out, "\n\n")
}

// some names the first and the last of a list.
func some(list []string) string {
	if len(list) < 4 {
		return strings.Join(list, ", ")
	}
	return list[0] + " … " + list[len(list)-1]
}

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
	{"stronger-concrete", 8, strongerConcrete},
	{"deeper-section", 12, deeperSection},
}

// moreTendons adds to the lowest row that has room.
func moreTendons(m *member.Member, step int) string {
	low := 0
	for i := range m.Strands.Rows {
		if m.Strands.Rows[i].Height.Base() < m.Strands.Rows[low].Height.Base() {
			low = i
		}
	}
	r := &m.Strands.Rows[low]
	before := r.Count.N
	r.Count.N += step
	f := formOf(&m.Shape)
	edge := 2 * r.Height.Base() // as far from the sides as from the soffit
	if float64(r.Count.N-1)*r.Spacing.Base() > f.lower[0].Quantity().Value-edge {
		return ""
	}
	return fmt.Sprintf("row %q with %d tendons instead of %d", r.Name.Text, r.Count.N, before)
}

// addedRow puts a further row like the lowest one 50 mm above the rows of the lower half, two tendons a step.
func addedRow(m *member.Member, step int) string {
	rows := m.Strands.Rows
	low, top := rows[0], 0.0
	for _, r := range rows {
		if r.Height.Base() < low.Height.Base() {
			low = r
		}
		if h := r.Height.Base(); h < m.Shape.Depth.Base()/2 {
			top = max(top, h)
		}
	}
	like := low.Name.Text
	low.Name.Text, low.Count.N = "added", 2*step
	low.Height.Literal = number(top+50, "mm", places(top))
	f := formOf(&m.Shape)
	shape, err := f.shape()
	if err != nil || float64(low.Count.N-1)*low.Spacing.Base() > shape.WidthAt(top+50)-100 {
		return ""
	}
	m.Strands.Rows = append(rows, low)
	return fmt.Sprintf("a further row of %d tendons like row %q at %s above the soffit", low.Count.N, like, low.Height)
}

// strongerConcrete raises f_ck by 5 MPa a step, to 90 MPa at most; the strength at release stays.
func strongerConcrete(m *member.Member, step int) string {
	v := m.Concrete.Fck.Base() + 5*float64(step)
	if v > 90 {
		return ""
	}
	before := m.Concrete.Fck.String()
	m.Concrete.Fck.Literal = number(v, "MPa", 0)
	return fmt.Sprintf("f_ck %s instead of %s", m.Concrete.Fck, before)
}

// deeperSection raises the depth by 50 mm a step; what is stated of the tendons stays.
func deeperSection(m *member.Member, step int) string {
	before := m.Shape.Depth.String()
	m.Shape.Depth.Literal = number(m.Shape.Depth.Base()+50*float64(step), "mm", places(m.Shape.Depth.Base()))
	return fmt.Sprintf("depth %s instead of %s, tendons at the same heights, the stated losses kept", m.Shape.Depth, before)
}

// mends tries each remedy, step by step, until every failing check has passed once with nothing else failing.
func (j *job) mends(c *trace.Chapter, failing []*trace.Check) {
	b := c.Block("mends", "What would mend a failing check", nil)
	b.Text("mends", "Each line is the smallest step of its kind with which the check passes and none fails that passed before, found by running the whole design again. It is a hint for the engineer, not a design.")
	found := map[string]bool{}
	for _, r := range remedies {
		open := failing
		for step := 1; step <= r.steps && len(open) > 0; step++ {
			words, n := j.try(r, step)
			if n == nil {
				break
			}
			var rest []*trace.Check
			for _, k := range open {
				again, ok := n.Entry(k.Key).(*trace.Check)
				if !ok || again.Failed() || !j.noneNew(n) {
					rest = append(rest, k)
					continue
				}
				found[k.Key] = true
				symbol := fmt.Sprintf("r_%d", len(b.Entries))
				b.Given(def(keyed(r.id+"-"+k.Key), symbol, k.Name+": with "+words, ""), quantity.Literal{Number: again.Ratio[again.Worst]}, "the design run again; ratio then")
			}
			open = rest
		}
	}
	for _, k := range failing {
		if !found[k.Key] {
			b.Text("none-"+keyed(k.Key), fmt.Sprintf("%s (%s): nothing tried mends it alone. Tried: more tendons in the lowest row and in a further row as far as they fit, f_ck up to 90 MPa, depth up to %d mm more.",
				k.Name, k.Number, 50*remedies[len(remedies)-1].steps))
		}
	}
}

// keyed makes an ID of a key: no slash and no point.
func keyed(key string) string {
	out := []byte(key)
	for i, c := range out {
		if c == '/' || c == '.' {
			out[i] = '-'
		}
	}
	return string(out)
}

// try runs the design with one step of a remedy; no record where the step cannot be taken or nothing comes of it.
func (j *job) try(r remedy, step int) (words string, n *trace.Note) {
	m := *j.m
	m.Strands.Rows = append([]member.StrandRow(nil), m.Strands.Rows...)
	if words = r.apply(&m, step); words == "" {
		return "", nil
	}
	n, err := run(&m, true)
	if err != nil {
		return "", nil
	}
	return words, n
}

// noneNew says that no check fails that does not fail in the design at hand.
func (j *job) noneNew(n *trace.Note) bool {
	for _, k := range n.Checks() {
		before, ok := j.n.Entry(k.Key).(*trace.Check)
		if k.Failed() && (!ok || !before.Failed()) {
			return false
		}
	}
	return true
}

// elevation draws what the member is, in one picture.
func (j *job) elevation(b *trace.Block) {
	b.Figure("elevation", "elevation", "The member: tendons, bearings and loads.", "",
		trace.Plot{Role: "length", Key: "given.span/length"}, trace.Plot{Role: "depth", Key: "given.section/depth"},
		trace.Plot{Role: "span", Key: "section.flange/span"}, trace.Plot{Role: "support-A", Key: "given.span/bearing-a"}, trace.Plot{Role: "support-B", Key: "given.span/bearing-b"},
		trace.Plot{Role: "bearing-A", Key: "given.span/bearing-a-length"}, trace.Plot{Role: "bearing-B", Key: "given.span/bearing-b-length"},
		trace.Plot{Role: "level", Key: "given.tendons/level"}, trace.Plot{Role: "debonded", Key: "given.tendons/debonded-length"},
		trace.Plot{Role: "load-q", Key: "actions.loads/load"}, trace.Plot{Role: "load-F", Key: "given.actions/point"},
		trace.Plot{Role: "load-from", Key: "given.actions/from"}, trace.Plot{Role: "load-to", Key: "given.actions/to"})
}
