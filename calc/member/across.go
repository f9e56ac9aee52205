package member

import "slices"

// across are the places of n axes across the section, mm from the axis of symmetry, from left to right: as stated, or
// evenly spaced about it. It is nil where neither is known.
func across(n int, spacing Value, positions []Value) []float64 {
	var xs []float64
	switch {
	case n < 1:
	case len(positions) > 0:
		if !known(positions...) {
			return nil
		}
		for _, p := range positions {
			xs = append(xs, p.Base())
		}
		slices.Sort(xs)
	case n == 1:
		return []float64{0}
	case spacing.Present():
		for i := range n {
			xs = append(xs, (float64(i)-float64(n-1)/2)*spacing.Base())
		}
	}
	return xs
}

// Across are the places of the strands across the section, mm from the axis of symmetry, from left to right.
func (s *StrandRow) Across() []float64 { return across(s.Count.N, s.Spacing, s.Positions) }

// Across are the places of the ducts across the section, mm from the axis of symmetry, from left to right.
func (s *DuctRow) Across() []float64 { return across(s.Count.N, s.Spacing, s.Positions) }

// Across are the places of the bars across the section, mm from the axis of symmetry, from left to right; nil where
// neither spacing nor positions are stated.
func (s *BarRow) Across() []float64 { return across(s.Count.N, s.Spacing, s.Positions) }
