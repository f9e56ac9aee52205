// Package clause holds what a design code says as values: a formula with its symbol, name, clause,
// expression, unit and worked examples; a condition; a check; an unknown to be solved for. It knows no
// code of practice itself: calc/ec2 fills these in, calc/trace evaluates and records them.
package clause

import (
	"fmt"
	"strings"
	"sync"

	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Ref says where a rule stands. Equation is the bare number ("5.46", "6.2.a", "B.1") or empty.
type Ref struct {
	Document string `json:"document,omitempty"`
	Clause   string `json:"clause,omitempty"`
	Equation string `json:"equation,omitempty"`
}

// String is the reference as the sheet prints it, "EN 1992-1-1 3.1.6(1)P (3.15)".
func (r Ref) String() string {
	parts := make([]string, 0, 3)
	for _, p := range []string{r.Document, r.Clause} {
		if p != "" {
			parts = append(parts, p)
		}
	}
	if r.Equation != "" {
		parts = append(parts, "("+r.Equation+")")
	}
	return strings.Join(parts, " ")
}

// Grade says how well the source of a worked example, or the wording of a clause, is known.
type Grade string

const (
	Opened   Grade = "opened"         // the published text was read
	Recalled Grade = "recalled"       // from memory; never called verified
	Own      Grade = "own derivation" // worked by hand from the formula itself
)

// Example is a worked example of a formula: operands, the result and where it comes from.
// The result is compared within Tolerance, a number in the formula's display unit; a tolerance of 0
// asks for agreement to half a unit of the last digit in Want.
type Example struct {
	Source    string
	Grade     Grade
	Given     []string // "f_ck = 30 MPa"; rows of an index as "A_{p,i} = 800 mm², 600 mm²"
	Want      string   // "2.8965 MPa"
	Tolerance float64
}

// Formula is one formula of a code or of mechanics: the printed one and the evaluated one.
type Formula struct {
	ID       string // append-only; never a symbol, ordinal or coordinate
	Name     string // what the result is, in words
	Ref      Ref
	Text     string // in the notation of calc/formula
	Unit     string // display unit of the result
	Digits   int    // significant digits printed and carried; 0 means 5
	Origin   string // where a formula of the member file stands, for errors; "" for the program's own
	Domain   string // a condition on the operands outside which there is no result; "" if none
	Examples []Example

	once    sync.Once
	parsed  *formula.Formula
	program *formula.Program
	domain  *formula.Program
	unit    quantity.Unit
	err     error
}

func (f *Formula) load() {
	f.once.Do(func() {
		if f.parsed, f.err = formula.Parse(f.Text); f.err != nil {
			f.err = fmt.Errorf("formula %s: %w", f.ID, f.err)
			return
		}
		f.program = formula.Compile(f.parsed.Expr)
		if f.unit, f.err = quantity.ParseUnit(f.Unit); f.err != nil {
			f.err = fmt.Errorf("formula %s: %w", f.ID, f.err)
			return
		}
		if f.Domain != "" {
			c, err := formula.ParseCond(f.Domain)
			if err != nil {
				f.err = fmt.Errorf("formula %s: domain: %w", f.ID, err)
				return
			}
			f.domain = formula.CompileCond(c)
		}
	})
}

// Parsed is the tree of the formula, or why the text is none.
func (f *Formula) Parsed() (*formula.Formula, error) { f.load(); return f.parsed, f.err }

// Program is the compiled right-hand side; it is valid once Parsed has returned no error.
func (f *Formula) Program() *formula.Program { f.load(); return f.program }

// DomainProgram is the compiled domain condition, nil if there is none.
func (f *Formula) DomainProgram() *formula.Program { f.load(); return f.domain }

// DisplayUnit is the unit the result is printed and rounded in.
func (f *Formula) DisplayUnit() quantity.Unit { f.load(); return f.unit }

// SignificantDigits is how many digits of the result are printed and carried.
func (f *Formula) SignificantDigits() int {
	if f.Digits == 0 {
		return 5
	}
	return f.Digits
}

// With is the same formula with another expression, for a national parameter of the member file. The symbol on the
// left stays.
func (f *Formula) With(expr, origin string) *Formula {
	left, _, _ := strings.Cut(f.Text, "=")
	return &Formula{ID: f.ID, Name: f.Name, Ref: f.Ref, Origin: origin, Text: strings.TrimSpace(left) + " = " + expr,
		Unit: f.Unit, Digits: f.Digits, Domain: f.Domain}
}

// Condition is a branch of a design: what is asked, and the words for each outcome.
type Condition struct {
	ID, Name string
	Ref      Ref
	Text     string
	Yes, No  string

	once    sync.Once
	parsed  formula.Cond
	program *formula.Program
	err     error
}

func (c *Condition) load() {
	c.once.Do(func() {
		if c.parsed, c.err = formula.ParseCond(c.Text); c.err != nil {
			c.err = fmt.Errorf("condition %s: %w", c.ID, c.err)
			return
		}
		c.program = formula.CompileCond(c.parsed)
	})
}

// Parsed is the tree of the condition.
func (c *Condition) Parsed() (formula.Cond, error) { c.load(); return c.parsed, c.err }

// Program is the compiled condition; valid once Parsed has returned no error.
func (c *Condition) Program() *formula.Program { c.load(); return c.program }

// Check compares a demand with a limit: demand ≤ limit.
type Check struct {
	ID, Name      string
	Ref           Ref
	Demand, Limit string // symbols
}

// Root is an unknown found by a solver. The proposal is proved by Residual, a formula evaluated from the
// printed unknown, whose absolute value may be at most Tolerance·|Scale|.
type Root struct {
	ID, Name  string
	Ref       Ref
	Unknown   string // symbol
	Unit      string
	Digits    int
	Equation  string // the equation in words of symbols, "F_c = Σ_i(F_{p,i})"
	Residual  *Formula
	Scale     string // symbol
	Tolerance float64
}

// Given is an input: a value from the member file, a table, a national parameter or a stated default.
type Given struct {
	ID, Symbol, Name, Unit string
	Ref                    Ref
}
