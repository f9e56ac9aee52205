package sheet

import "strings"

// alike is how many rows at least stand for each other as one.
const alike = 3

// least is how many rows of the table make one line: of a table along the member a few; of one whose rows are
// counted out so many that the table gets shorter though the names of the runs take more room than numbers.
func (t *table) least() int {
	if t.counted {
		return max(10, len(t.rows)/4)
	}
	return alike
}

// spanOf is a run of rows of a table drawn as one line, from the first to the last; both are the same for a row
// of its own.
type spanOf struct{ first, last int }

// lines are the lines a table is drawn in: rows along the member, or counted out, that say the same but for
// where they are make one line if they are many enough. The row worked in full keeps a line of its own.
func (t *table) lines() []spanOf {
	out := make([]spanOf, 0, len(t.rows))
	for i := 0; i < len(t.rows); {
		end := i
		if (t.along || t.counted) && i != t.mark {
			for end+1 < len(t.rows) && end+1 != t.mark && t.sameCells(i, end+1) {
				end++
			}
		}
		if end-i+1 < t.least() {
			end = i
		}
		out = append(out, spanOf{i, end})
		i = end + 1
	}
	return out
}

// sameCells tells whether two rows differ in nothing but their place.
func (t *table) sameCells(i, k int) bool {
	for c := range t.columns {
		col := &t.columns[c]
		if c == 0 && t.placed {
			continue
		}
		if col.cells[i] != col.cells[k] || col.face(i) != col.face(k) {
			return false
		}
	}
	return true
}

// folded is the table with its runs of like rows as one row each.
func (t *table) folded() *table {
	lines := t.lines()
	if len(lines) == len(t.rows) {
		return t
	}
	out := *t
	out.rows, out.mark = nil, -1
	out.columns = make([]tableColumn, len(t.columns))
	for c := range t.columns {
		out.columns[c] = t.columns[c]
		out.columns[c].cells, out.columns[c].strong = nil, nil
	}
	for n, l := range lines {
		if l.first == t.mark {
			out.mark = n
		}
		labels := append([]string(nil), t.rows[l.first]...)
		if l.last > l.first {
			for k, s := range t.rows[l.last] {
				labels[k] = fromTo(labels[k], s)
			}
		}
		out.rows = append(out.rows, labels)
		for c := range t.columns {
			from, col := &t.columns[c], &out.columns[c]
			s := from.cells[l.first]
			if c == 0 && t.placed && l.last > l.first {
				s = fromTo(s, from.cells[l.last])
			}
			col.cells = append(col.cells, s)
			if from.strong != nil {
				col.strong = append(col.strong, from.strong[l.first])
			}
		}
	}
	return &out
}

// fromTo names a run by its ends.
func fromTo(a, b string) string {
	if a == b {
		return a
	}
	return a + " … " + b
}

// rising tells whether the cells of a column are numbers that rise from row to row, as places along the member do.
func (k *tableColumn) rising(values func(i int) float64) bool {
	for i := range k.cells {
		if k.cells[i] == "–" || strings.Contains(k.cells[i], "…") || i > 0 && values(i) <= values(i-1) {
			return false
		}
	}
	return len(k.cells) > 1
}
