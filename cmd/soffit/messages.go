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
	checks := n.Checks()
	var failing []*trace.Check
	worst := checks[0]
	for _, c := range checks {
		if c.Failed() {
			failing = append(failing, c)
		}
		if c.Value[c.Worst] > worst.Value[worst.Worst] {
			worst = c
		}
	}
	if len(failing) == 0 {
		return fmt.Sprintf("all %d checks pass; highest ratio %s, %s%s", len(checks), worst.Ratio[worst.Worst], worst.Name, place(worst))
	}
	first := failing[0]
	size := "ratio " + first.Ratio[first.Worst]
	if first.Ratio[first.Worst] == "" {
		size = "margin " + first.Margin[first.Worst] + " " + first.Unit.String()
	}
	return fmt.Sprintf("%d of %d checks fail: not for construction; first %s, %s%s", len(failing), len(checks), size, first.Name, place(first))
}

// place is where a check is worst.
func place(c *trace.Check) string {
	if where := trace.RowName(c.Axes, c.Worst); where != "" {
		return " at " + where
	}
	return ""
}
