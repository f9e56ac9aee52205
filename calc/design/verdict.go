package design

import (
	"fmt"
	"slices"
	"strings"

	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// verdictChapter opens the note: what fails, and what would mend it, found by running the design again.
func (j *job) verdictChapter(c *trace.Chapter) {
	b := c.Block("checks", "The member in one picture", nil)
	j.elevation(b)
	if effect, check := j.n.Rounding(); check != nil {
		b.Text("rounding", fmt.Sprintf("Rounding to the printed digits moves no ratio of demand to limit by more than %s (%s %s).", quantity.Format(effect+0.00005, 4), check.Number, check.Name))
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
	for _, q := range j.asked {
		title := lowered(q.title) + ": "
		for _, r := range []struct{ id, words string }{
			{"outermost-yields", "**Brittle:** the section is over-reinforced, the concrete crushes before the outermost row yields"},
			{"partly-compressed", "**Brittle:** the section is wholly compressed and no resistance is counted"},
			{"above-zero-curvature", "The resistance lies below the moment at which the section is without curvature"},
			{"every-row-anchored", "A row that counts is not anchored up to its design strength and would slip before it yields"},
		} {
			c, ok := j.n.Entry(q.block.Path() + "/" + r.id).(*trace.Choice)
			if !ok {
				continue
			}
			if at := count(c, trace.No); at > 0 {
				out = append(out, fmt.Sprintf("%s (%s[%s](#%s)), at %d of %d stations: %s.", r.words, pick(len(j.asked) > 1, title, ""), c.Number, c.Key, at, len(c.Outcomes), runs(c, trace.No)))
			}
		}
	}
	cracks := 0
	var choice *trace.Choice
	j.n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		if c, ok := e.(*trace.Choice); ok && strings.HasSuffix(c.Key, "/cracked-at-ultimate") {
			cracks += count(c, trace.Yes)
			choice = c
		}
	})
	if choice != nil && cracks == 0 {
		words := "Failure announces itself by method B of 5.10.1(6), pretensioned tendons in bond"
		if j.ducted() {
			words = "Cracking before failure is not asked for"
		}
		out = append(out, fmt.Sprintf("No station cracks in bending at the ultimate limit state ([%s](#%s)). %s.", choice.Number, choice.Key, words))
	}
	told := false
	for _, place := range []struct{ block, words string }{{"minimum-steel", ""}, {"hogging-minimum-steel", " at the top"}} {
		c, ok := j.n.Entry("ultimate." + place.block + "/bars-reach").(*trace.Choice)
		if told = told || ok; ok && count(c, trace.No) > 0 {
			out = append(out, fmt.Sprintf("The bars alone do not reach the minimum steel%s ([%s](#%s)), at %d stations: another method of 5.10.1(6) must show that the loss of tendons gives warning.", place.words, c.Number, c.Key, count(c, trace.No)))
		}
	}
	if j.ducted() && !told {
		out = append(out, "There are no bars: another method of 5.10.1(6) than A must show that the loss of tendons gives warning.")
	}
	if names := j.onProps(); len(names) > 0 {
		out = append(out, fmt.Sprintf("The topping is cast on props: the construction loads on the bare member (%s) enter no check. The bare member on its props, under these loads, and the props themselves are to be justified elsewhere.", strings.Join(names, ", ")))
	}
	return strings.Join(out, "\n\n")
}

// onProps are the construction loads on a bare member that props carry until its topping is hard.
func (j *job) onProps() []string {
	var out []string
	for k := range j.m.Actions {
		if a := &j.m.Actions[k]; j.propped() && a.Kind.Text == "construction" && j.onBare(a) {
			out = append(out, a.Name.Text)
		}
	}
	return out
}

// count is how many stations have an outcome.
func count(c *trace.Choice, want trace.Outcome) int {
	n := 0
	for _, o := range c.Outcomes {
		if o == want {
			n++
		}
	}
	return n
}

// runs names the stretches of stations that have an outcome, "bearing A … 0.15 l, 0.85 l … bearing B".
func runs(c *trace.Choice, want trace.Outcome) string {
	var out []string
	for i := 0; i < len(c.Outcomes); i++ {
		if c.Outcomes[i] != want {
			continue
		}
		first := i
		for i+1 < len(c.Outcomes) && c.Outcomes[i+1] == want {
			i++
		}
		name := trace.RowName(c.Axes, first)
		if i > first {
			name += " … " + trace.RowName(c.Axes, i)
		}
		out = append(out, name)
	}
	return strings.Join(out, ", ")
}

// mends tries each remedy step by step: it records the first step with which every check passes, or else, for each
// failing check, the first with which that check passes and none fails that passed before.
func (j *job) mends(c *trace.Chapter, failing []*trace.Check) {
	b := c.Block("mends", "What would mend it", nil)
	b.Text("mends", "Each line is the smallest step of its kind, found by running the whole design again. It is a hint for the engineer, not a design.")
	record := func(id, name, ratio string) {
		b.Given(def(keyed(id), fmt.Sprintf("r_%d", len(b.Entries)), name, ""), quantity.Literal{Number: ratio}, "ratio then, the design run again")
	}
	found := map[string]bool{}
	for _, r := range remedies {
		first := map[string]attempt{}
		for step := 1; step <= r.steps; step++ {
			words, n := j.try(r, step)
			if n == nil {
				break
			}
			if left := failures(n); left == 0 {
				worst := n.Ranked()[0]
				record(r.id, fmt.Sprintf("Every check passes with %s; highest ratio, %s", words, worst.Name), worst.Ratio[worst.Worst])
				for _, k := range failing {
					found[k.Key] = true
				}
				first = nil
				break
			}
			for _, k := range failing {
				again, ok := n.Entry(k.Key).(*trace.Check)
				if _, had := first[k.Key]; !had && ok && !again.Failed() && j.noneNew(n) {
					first[k.Key] = attempt{words, again.Ratio[again.Worst], failures(n)}
				}
			}
		}
		for _, k := range failing {
			if t, ok := first[k.Key]; ok {
				found[k.Key] = true
				record(r.id+"-"+k.Key, fmt.Sprintf("%s passes with %s; checks failing still: %d", k.Name, t.words, t.left), t.ratio)
			}
		}
	}
	for _, k := range failing {
		if !found[k.Key] {
			b.Text("none-"+keyed(k.Key), fmt.Sprintf("%s (%s): nothing tried mends it alone. Tried: %s, concrete up to 90 MPa%s.", k.Name, k.Number,
				pick(j.ducted(), "up to 8 strands more in each duct as far as they fit, up to 8 strands fewer", "more tendons in the lowest row and in a further row as far as they fit, fewer tendons, two bars up to 25 mm"),
				pick(j.m.Shape.Depth.Present(), fmt.Sprintf(", depth up to %d mm more", 50*remedies[len(remedies)-1].steps), "")))
		}
	}
}

// attempt is a step of a remedy that mends one check and leaves others failing.
type attempt struct {
	words, ratio string
	left         int
}

func failures(n *trace.Note) int {
	count := 0
	for _, k := range n.Checks() {
		if k.Failed() {
			count++
		}
	}
	return count
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
	m.Strands.Rows = slices.Clone(m.Strands.Rows)
	m.Ducts.Rows = slices.Clone(m.Ducts.Rows)
	m.Bars.Rows = slices.Clone(m.Bars.Rows)
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
	plots := []trace.Plot{{Role: "length", Key: "given.span/length"}, {Role: "depth", Key: "given.section/depth"},
		{Role: "span", Key: "section.flange/span"}, {Role: "support-A", Key: "given.span/bearing-a"}, {Role: "support-B", Key: "given.span/bearing-b"},
		{Role: "bearing-A", Key: "given.span/bearing-a-length"}, {Role: "bearing-B", Key: "given.span/bearing-b-length"},
		{Role: "load-q", Key: j.loadKey()}, {Role: "load-F", Key: "given.actions/point"},
		{Role: "load-from", Key: "given.actions/from"}, {Role: "load-to", Key: "given.actions/to"}}
	plots = slices.Insert(plots, len(plots)-4, j.tendonElevation()...)
	plots = append(plots, j.outlinePlots(j.hasTopping())...)
	if _, b := j.overhangs(); b {
		plots = append(plots, trace.Plot{Role: "overhang-B", Key: "given.span/overhang-b"})
	}
	if j.hasAxial() {
		plots = append(plots, trace.Plot{Role: "load-N", Key: "given.actions/axial"})
	}
	if j.hasBars() {
		plots = append(plots, trace.Plot{Role: "bar-level", Key: "given.bars/level"})
	}
	b.Figure("elevation", "elevation", "The member: tendons, bearings and loads.", "", plots...)
}
