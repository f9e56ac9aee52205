// Package trace is the record of a design: numbered, unit-bearing, clause-referenced, serialisable. A
// chapter of the design writes what it does to a block as it does it; every reader (sheet, comparison,
// register) works from the record alone, and every printed value in it can be recomputed from it.
//
// An entry is a single value, or a column of values over axes: the stations along the member, the rows of
// tendons, the actions. One axis of a block may be implicit (the stations); the others carry an index
// letter that shows in the symbols (A_{p,i}).
package trace

import (
	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Note is the whole record.
type Note struct {
	Document Document
	Axes     []*Axis
	Chapters []*Chapter

	entries map[string]Entry
	stated  string // fingerprint in the file it was read from
	err     error
}

// Document is what the title sheet says: none of it decides a number.
type Document struct {
	Program    string    `json:"program"`
	Project    string    `json:"project"`
	Title      string    `json:"title"`
	Number     string    `json:"number"`
	Revision   string    `json:"revision"`
	Status     string    `json:"status"`
	Originator string    `json:"originator,omitempty"`
	Roles      []Role    `json:"roles,omitempty"`
	History    []Issue   `json:"history,omitempty"`
	Drawings   []Drawing `json:"drawings,omitempty"`
	InputName  string    `json:"inputName"`
	Input      string    `json:"input"`
}

// Role is one person's part in the document; Date is ISO 8601 or empty.
type Role struct {
	Role         string `json:"role"`
	Name         string `json:"name,omitempty"`
	Organisation string `json:"organisation,omitempty"`
	Date         string `json:"date,omitempty"`
}

// Issue is one line of the revision history.
type Issue struct {
	Revision string `json:"revision"`
	Date     string `json:"date"`
	Text     string `json:"text"`
}

// Drawing is a drawing the note goes with.
type Drawing struct {
	Number   string `json:"number"`
	Revision string `json:"revision,omitempty"`
	Title    string `json:"title,omitempty"`
}

// Axis is a named run of rows. Index is its letter in symbols, or empty for an implicit axis; Work is the row that
// a sheet works in full where nothing else chooses one.
type Axis struct {
	Name  string   `json:"name"`
	Title string   `json:"title"`
	Index string   `json:"index,omitempty"`
	Work  int      `json:"work,omitempty"`
	Rows  []string `json:"rows"`
}

// Row is the position of a named row, −1 if there is none.
func (a *Axis) Row(name string) int {
	for i, r := range a.Rows {
		if r == name {
			return i
		}
	}
	return -1
}

// Chapter is one numbered chapter.
type Chapter struct {
	Number, Slug, Title string
	Blocks              []*Block

	note *Note
}

// Block is a numbered run of entries with one scope: what it records itself and what it takes.
type Block struct {
	Number, Slug, Title string
	Takes               []string // "section.gross", "actions.stations@midspan"
	Over                *Axis    // implicit axis, nil if none
	Row                 int      // the row of Over that the sheet works in full
	Entries             []Entry

	build *builder
}

// Path is chapter and block, "ultimate.bending".
func (b *Block) Path() string { return b.build.path }

// Entry is one line of the record: *Given, *Step, *Choice, *Root, *Check, *Table, *Figure or *Text. The set
// is closed.
type Entry interface{ Common() *Head }

// Head is what every entry carries.
type Head struct {
	Number string // "7.2.5", for people; may change between revisions
	Key    string // "ultimate.bending/moment-resistance", for machines
	Name   string
	Ref    clause.Ref
}

// Common returns the head of an entry.
func (h *Head) Common() *Head { return h }

// Series is one value, or a value per row of its axes, row-major. Shown is what the sheet prints and what is
// carried; an empty string marks a row where the branch was not taken.
type Series struct {
	Axes     []*Axis
	Unit     quantity.Unit
	Decimals int
	Shown    []string
	Values   []float64 // carried, in base units
	Shadow   []float64 // the unrounded chain, in base units
}

// Taken says whether the row was computed.
func (s *Series) Taken(i int) bool { return s.Shown[i] != "" }

// Line is a symbol with its values: the common part of Given, Step and Root.
type Line struct {
	Head
	Series
	Symbol *formula.Symbol
}

// Given is a value from the member file, a table, a national parameter or a stated default.
type Given struct {
	Line
	Source string
}

// Use ties a symbol of a formula to the entries it comes from, "key" or "key@row": several where branches
// supply it on different rows.
type Use struct {
	Symbol string   `json:"symbol"`
	From   []string `json:"from"`
}

// Step is one formula evaluated.
type Step struct {
	Line
	Formula *formula.Formula
	Uses    []Use
}

// Root is a solved unknown, proved by the step Residual.
type Root struct {
	Line
	Equation  string
	Residual  string // key
	Scale     string // key
	Tolerance float64
	Lo, Hi    []float64 // bracket, base units
}

// Outcome of a choice at a row.
type Outcome int8

// Outcomes.
const (
	NotAsked Outcome = iota
	No
	Yes
)

// Choice is a branch of the design with the numbers it was taken on.
type Choice struct {
	Head
	Axes     []*Axis
	Cond     formula.Cond
	Outcomes []Outcome
	Yes, No  string // words for each outcome
	Uses     []Use
}

// Check is demand against limit: it fails where demand > limit in the carried or in the unrounded chain.
type Check struct {
	Head
	Axes          []*Axis
	Demand, Limit Use
	Ratio         []string // rounded up; "" where not taken or where the limit is not positive
	Margin        []string // limit − demand, only where the limit is not positive
	Fails         []bool
	Value         []float64 // the carried ratio; +Inf never: 0 where a margin is shown instead
	Unit          quantity.Unit
	Worst         int     // governing row
	Effect        float64 // largest |Δ(demand/limit)| between the two chains
}

// Failed says whether any row fails.
func (c *Check) Failed() bool {
	for _, f := range c.Fails {
		if f {
			return true
		}
	}
	return false
}

// Table shows columns recorded before side by side.
type Table struct {
	Head
	Axis    *Axis
	Columns []string // keys
}

// Figure is a diagram: its kind, and the entries it is drawn from.
type Figure struct {
	Head
	Kind   string
	Series []Plot
	At     string // row of the implicit axis the figure stands for, "" if none
}

// Plot names the role of an entry in a figure.
type Plot struct {
	Role string `json:"role"`
	Key  string `json:"key"`
}

// Text is narrative: Markdown in which {symbol} stands for a value with its unit.
type Text struct {
	Head
	Markdown string
	Uses     []Use
}

// Entry finds an entry by key, nil if there is none.
func (n *Note) Entry(key string) Entry { return n.entries[key] }

// LineOf is the line behind an entry that carries values, nil for the others.
func LineOf(e Entry) *Line {
	switch e := e.(type) {
	case *Given:
		return &e.Line
	case *Step:
		return &e.Line
	case *Root:
		return &e.Line
	}
	return nil
}

// Each calls f for every entry in order.
func (n *Note) Each(f func(*Chapter, *Block, Entry)) {
	for _, c := range n.Chapters {
		for _, b := range c.Blocks {
			for _, e := range b.Entries {
				f(c, b, e)
			}
		}
	}
}

// Checks are all checks in order.
func (n *Note) Checks() []*Check {
	var out []*Check
	n.Each(func(_ *Chapter, _ *Block, e Entry) {
		if c, ok := e.(*Check); ok {
			out = append(out, c)
		}
	})
	return out
}

// Rounding is the largest effect of rounding on any check, |Δ(demand/limit)|, and the check it falls on.
func (n *Note) Rounding() (effect float64, check *Check) {
	for _, c := range n.Checks() {
		if check == nil || c.Effect > effect {
			effect, check = c.Effect, c
		}
	}
	return effect, check
}
