package design

import (
	"fmt"
	"slices"
	"strings"

	"soffit/calc/clause"
	"soffit/calc/trace"
	"soffit/templates"
)

// grades orders what is known of a worked example, the best first.
var grades = []clause.Grade{clause.Opened, clause.Recalled, clause.Own}

// validation says of every formula of the note what its worked example rests on, and what the solvers were held
// against.
func (j *job) validation(c *trace.Chapter) {
	b := c.Block("validation", "What the formulas and solvers were held against", nil)
	b.Text("solvers", templates.Text("validation"))
	b.Text("formulas", j.exampleList())
}

// exampleList groups the steps by the outside source of the best worked example of their formula; the others have one
// worked by hand.
func (j *job) exampleList() string {
	byID := map[string]*clause.Formula{}
	for _, f := range clause.Formulas() {
		byID[f.ID] = f
	}
	type source struct {
		text  string
		grade clause.Grade
	}
	steps := map[source][]string{}
	var order []source
	byHand, replaced := 0, []string{}
	j.n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		s, ok := e.(*trace.Step)
		if !ok {
			return
		}
		_, id, _ := strings.Cut(s.Key, "/")
		f := byID[id]
		if f == nil {
			return
		}
		link := fmt.Sprintf("[%s](#%s)", s.Number, s.Key)
		if parsed, err := f.Parsed(); err != nil || parsed.String() != s.Formula.String() {
			replaced = append(replaced, link)
			return
		}
		best := slices.MinFunc(f.Examples, func(a, b clause.Example) int { return slices.Index(grades, a.Grade) - slices.Index(grades, b.Grade) })
		if best.Grade == clause.Own {
			byHand++
			return
		}
		k := source{best.Source, best.Grade}
		if steps[k] == nil {
			order = append(order, k)
		}
		steps[k] = append(steps[k], link)
	})
	slices.SortStableFunc(order, func(a, b source) int { return slices.Index(grades, a.grade) - slices.Index(grades, b.grade) })
	var b strings.Builder
	b.WriteString("Each formula carries a worked example that is run with the tests of the program. Examples with an outside source:\n\n")
	for _, s := range order {
		fmt.Fprintf(&b, "- %s (%s): %s\n", s.text, s.grade, strings.Join(steps[s], ", "))
	}
	fmt.Fprintf(&b, "\nThe other %d steps rest on examples worked by hand from the formula itself (own derivation).", byHand)
	if len(replaced) > 0 {
		fmt.Fprintf(&b, " Replaced in the member file, without a worked example: %s.", strings.Join(replaced, ", "))
	}
	return b.String()
}
