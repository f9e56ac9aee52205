package quantity

// Error says what is wrong with a value or a unit, and what to write instead.
type Error struct {
	Msg  string // without the remedy
	Hint string // "write 350 mm"; empty where there is nothing to propose
}

func (e *Error) Error() string {
	if e.Hint == "" {
		return e.Msg
	}
	return e.Msg + ": " + e.Hint
}
