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

// exampleList groups the steps by the source of the best worked example of their formula.
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
		best := source{"replaced in the member file: no worked example", ""}
		if parsed, err := f.Parsed(); err == nil && parsed.String() == s.Formula.String() {
			e := slices.MinFunc(f.Examples, func(a, b clause.Example) int { return slices.Index(grades, a.Grade) - slices.Index(grades, b.Grade) })
			best = source{e.Source, e.Grade}
		}
		if steps[best] == nil {
			order = append(order, best)
		}
		steps[best] = append(steps[best], fmt.Sprintf("[%s](#%s)", s.Number, s.Key))
	})
	slices.SortStableFunc(order, func(a, b source) int { return slices.Index(grades, a.grade) - slices.Index(grades, b.grade) })
	var b strings.Builder
	b.WriteString("Each formula carries a worked example that is run with the tests of the program. By the source of the example, with its grade:\n\n")
	for _, s := range order {
		grade := ""
		if s.grade != "" {
			grade = " (" + string(s.grade) + ")"
		}
		fmt.Fprintf(&b, "- %s%s: %s\n", s.text, grade, strings.Join(steps[s], ", "))
	}
	return b.String()
}
