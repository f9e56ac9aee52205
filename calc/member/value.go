package member

import (
	"soffit/calc/diag"
	"soffit/calc/quantity"
)

// Origin says where an entry of the model comes from.
type Origin struct {
	Pos   diag.Pos // of what was written; of the mapping where a default stands in
	Given bool     // written in the member file; false for a default and for what was left out
	Why   string   // the reason of a default, "" otherwise
}

// Value is a number with its unit, as written or as the default says. Where an optional value was left out
// and has no default, it is the zero Value.
type Value struct {
	quantity.Literal
	Origin
}

// Present reports whether there is a value, given or by default.
func (v Value) Present() bool { return v.Number != "" }

// Base is the value in base units (N, mm, MPa, day, °C; ratios as plain numbers), 0 where not Present.
func (v Value) Base() float64 {
	if !v.Present() {
		return 0
	}
	return v.Quantity().Value
}

// Count is a whole number, at least 1 in a model.
type Count struct {
	N int
	Origin
}

// Word is text: free, or one of the words that the key allows.
type Word struct {
	Text string
	Origin
}

// Present reports whether there is text, given or by default.
func (w Word) Present() bool { return w.Text != "" }

// Date is a day of the calendar, ISO 8601: "2031-04-07".
type Date struct {
	Text string
	Origin
}

// Present reports whether a date was given.
func (d Date) Present() bool { return d.Text != "" }
