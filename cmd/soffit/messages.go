package main

import (
	"fmt"
	"io"

	"soffit/calc/trace"
)

// The words that the program says.
const (
	purpose = "Design notes for prestressed concrete members to EN 1992-1-1, from one member file each."
	seeHelp = "See soffit --help."
)

func say(w io.Writer, format string, args ...any) { fmt.Fprintf(w, format, args...) }

// summary says in one line what a note came to.
func summary(n *trace.Note) string {
	checks := n.Checks()
	failed := 0
	var worst *trace.Check
	for _, c := range checks {
		if c.Failed() {
			failed++
		}
		if worst == nil || c.Value[c.Worst] > worst.Value[worst.Worst] {
			worst = c
		}
	}
	if worst == nil {
		return "no checks"
	}
	where := trace.RowName(worst.Axes, worst.Worst)
	if where != "" {
		where = " at " + where
	}
	verdict := fmt.Sprintf("all %d checks pass", len(checks))
	if failed > 0 {
		verdict = fmt.Sprintf("%d of %d checks fail: not for construction", failed, len(checks))
	}
	return fmt.Sprintf("%s; highest ratio %s, %s%s", verdict, worst.Ratio[worst.Worst], worst.Name, where)
}
