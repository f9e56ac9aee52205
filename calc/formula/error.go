package formula

import (
	"fmt"
	"strings"
)

// Error is what is wrong with a formula: in its text, in its dimensions, or with the values at hand.
type Error struct {
	Pos    Pos // of the part that is wrong
	Msg    string
	Values []SymbolValue // of the symbols involved, from evaluation only
}

// SymbolValue is a symbol with the value it had.
type SymbolValue struct {
	Symbol *Symbol
	Value  float64 // base units
}

// Error gives "column 7: division by zero: b − c (b = 5, c = 5 in base units)". Columns count runes from 1.
func (e *Error) Error() string {
	var b strings.Builder
	fmt.Fprintf(&b, "column %d: %s", int(e.Pos)+1, e.Msg)
	for i, v := range e.Values {
		sep := ", "
		if i == 0 {
			sep = " ("
		}
		fmt.Fprintf(&b, "%s%s = %.6g", sep, v.Symbol.Name, v.Value)
	}
	if len(e.Values) > 0 {
		b.WriteString(" in base units)")
	}
	return b.String()
}

func errorAt(pos Pos, format string, args ...any) *Error {
	return &Error{Pos: pos, Msg: fmt.Sprintf(format, args...)}
}

// clip bounds text taken over into a message.
func clip(s string) string {
	const most = 60
	if r := []rune(s); len(r) > most {
		return string(r[:most]) + "…"
	}
	return s
}
