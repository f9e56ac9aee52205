package diag

import (
	"cmp"
	"errors"
	"slices"
	"strings"
)

// List is what was found in one or several files. The zero value is empty and ready.
type List []Finding

// Add appends findings.
func (l *List) Add(f ...Finding) { *l = append(*l, f...) }

// Sort orders by file, place and words, and drops repetitions: the same mistakes always read the same.
func (l *List) Sort() {
	slices.SortStableFunc(*l, func(a, b Finding) int {
		return cmp.Or(
			cmp.Compare(a.File, b.File), cmp.Compare(a.Line, b.Line), cmp.Compare(a.Col, b.Col),
			cmp.Compare(a.Msg, b.Msg), cmp.Compare(a.Hint, b.Hint),
		)
	})
	*l = slices.Compact(*l)
}

// String is all findings, one under the other with a blank line between.
func (l List) String() string {
	parts := make([]string, len(l))
	for i, f := range l {
		parts[i] = f.String()
	}
	return strings.Join(parts, "\n\n")
}

// Err is nil for an empty list, else an error whose text is String.
func (l List) Err() error {
	if len(l) == 0 {
		return nil
	}
	return errors.New(l.String())
}
