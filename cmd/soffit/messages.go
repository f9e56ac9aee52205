package main

import (
	"fmt"
	"io"
	"strings"

	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// The words that the program says.
const (
	purpose = "Design notes for prestressed concrete members to EN 1992-1-1, from one member file each."
	seeHelp = "See soffit --help."
)

func say(w io.Writer, format string, args ...any) { fmt.Fprintf(w, format, args...) }

// unknown says which words there are, and which of them was likely meant.
func unknown(word string, known []string) string {
	msg := fmt.Sprintf("unknown kind %q; there are %s", word, strings.Join(known, ", "))
	if near, ok := quantity.Nearest(word, known); ok {
		msg += "; write " + near
	}
	return msg
}

// summary says in one line what a note came to.
func summary(n *trace.Note) string {
	checks := n.Ranked()
	failing := 0
	for _, c := range checks {
		if c.Failed() {
			failing++
		}
	}
	worst := checks[0]
	if failing == 0 {
		return fmt.Sprintf("all %d checks pass; highest ratio %s, %s%s", len(checks), worst.Ratio[worst.Worst], worst.Name, place(worst))
	}
	size := "ratio " + worst.Ratio[worst.Worst]
	if worst.Ratio[worst.Worst] == "" {
		size = "margin " + worst.Margin[worst.Worst] + " " + worst.Unit.String()
	}
	return fmt.Sprintf("%d of %d checks fail: not for construction; worst %s, %s%s", failing, len(checks), size, worst.Name, place(worst))
}

// place is where a check is worst.
func place(c *trace.Check) string {
	if where := trace.RowName(c.Axes, c.Worst); where != "" {
		return " at " + where
	}
	return ""
}
