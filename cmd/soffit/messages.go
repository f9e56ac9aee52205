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
	return fmt.Sprintf("%d of %d checks fail: not for construction; worst %s, %s%s", failing, len(checks), size(worst), worst.Name, place(worst))
}

// size is by how much a check is met or missed: its ratio, or its margin where there is none.
func size(c *trace.Check) string {
	if c.Ratio[c.Worst] == "" {
		return "margin " + c.Margin[c.Worst] + " " + c.Unit.String()
	}
	return "ratio " + c.Ratio[c.Worst]
}

// failing says of each check that fails, the worst first, by how much and where.
func failing(n *trace.Note) []string {
	var out []string
	for _, c := range n.Ranked() {
		if c.Failed() {
			out = append(out, fmt.Sprintf("fails: %s %s, %s%s", c.Number, c.Name, size(c), place(c)))
		}
	}
	return out
}

// place is where a check is worst.
func place(c *trace.Check) string {
	if where := trace.RowName(c.Axes, c.Worst); where != "" {
		return " at " + where
	}
	return ""
}
