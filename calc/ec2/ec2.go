// Package ec2 is EN 1992-1-1:2004+AC:2010+A1:2014, with what it needs of EN 1990 and of the product standards,
// as values: formulas, conditions, checks, tables and national parameters. One file holds one group of clauses.
// The texts of the standards were not opened while this was written: every clause and equation number is
// recalled, and the worked examples beside the formulas say where their figures come from.
package ec2

import "soffit/calc/clause"

// Documents cited.
const (
	Code      = "EN 1992-1-1"
	Actions   = "EN 1990"
	Execution = "EN 1991-1-6"
)

func en(clauseNumber, equation string) clause.Ref {
	return clause.Ref{Document: Code, Clause: clauseNumber, Equation: equation}
}

func en1990(clauseNumber, equation string) clause.Ref {
	return clause.Ref{Document: Actions, Clause: clauseNumber, Equation: equation}
}

func en1991(clauseNumber, equation string) clause.Ref {
	return clause.Ref{Document: Execution, Clause: clauseNumber, Equation: equation}
}

func by(source string, grade clause.Grade, want string, given ...string) clause.Example {
	return clause.Example{Source: source, Grade: grade, Want: want, Given: given}
}

// hand is an example worked by hand from the formula itself.
func hand(want string, given ...string) []clause.Example {
	return []clause.Example{by("worked by hand", clause.Own, want, given...)}
}
