package sheet

import (
	"strings"
	"testing"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// along is a table of places and values along a member.
func along(mark int, cells string) *table {
	values := strings.Fields(cells)
	x := mathset.Setting{Size: tableSize}.Words(draw.Italic, "x").Box()
	t := &table{owner: "T", heads: []string{""}, mark: mark, along: true, placed: true,
		columns: []tableColumn{{symbol: &x}, {symbol: &x, cells: values}}}
	for i := range values {
		t.rows = append(t.rows, []string{string(rune('a' + i))})
		t.columns[0].cells = append(t.columns[0].cells, string(rune('0'+i))+".5")
	}
	return t
}

func TestRowsAlikeMakeOneLine(t *testing.T) {
	for _, c := range []struct {
		mark  int
		cells string
		want  string
	}{
		{-1, "1 2 2 2 3", "a 0.5 1, b … d 1.5 … 3.5 2, e 4.5 3"},
		{-1, "1 1 2 2 2 2", "a 0.5 1, b 1.5 1, c … f 2.5 … 5.5 2"},
		{3, "2 2 2 2 2 2 2", "a … c 0.5 … 2.5 2, d 3.5 2, e … g 4.5 … 6.5 2"},
		{1, "2 2 2 2", "a 0.5 2, b 1.5 2, c 2.5 2, d 3.5 2"},
		{-1, "– – –", "a … c 0.5 … 2.5 –"},
	} {
		f := along(c.mark, c.cells).folded()
		var got []string
		for i, r := range f.rows {
			got = append(got, r[0]+" "+f.columns[0].cells[i]+" "+f.columns[1].cells[i])
			if (i == f.mark) != (c.mark >= 0 && r[0] == string(rune('a'+c.mark))) {
				t.Errorf("%s: row %s is marked or not", c.cells, r[0])
			}
		}
		if s := strings.Join(got, ", "); s != c.want {
			t.Errorf("%s: have %q, want %q", c.cells, s, c.want)
		}
	}
	bold := along(-1, "2 2 2 2")
	bold.columns[1].strong = []bool{false, false, true, false}
	if got := len(bold.folded().rows); got != 4 {
		t.Errorf("a row that fails is drawn with others: %d lines, want 4", got)
	}
}

func TestWideTableRepeatsThePlaces(t *testing.T) {
	n := along(-1, "1 2 3 4")
	for len(n.columns) < 14 {
		n.columns = append(n.columns, tableColumn{symbol: n.columns[0].symbol, cells: []string{"12345.678", "2", "3", "4"}})
	}
	parts := n.divided(2)
	if len(parts) != 2 || len(parts[0].columns)+len(parts[1].columns) != 15 {
		t.Fatalf("%d parts", len(parts))
	}
	for i, p := range parts {
		if p.columns[0].cells[0] != "0.5" {
			t.Errorf("part %d begins with %q, want the places", i+1, p.columns[0].cells[0])
		}
		if d := len(p.columns); d < 7 || d > 8 {
			t.Errorf("part %d has %d columns", i+1, d)
		}
	}
	heads := 0
	for _, e := range n.elements(3) {
		if e.head == e {
			heads++
		}
	}
	if heads != 2 {
		t.Errorf("the table is set in %d parts, want 2", heads)
	}
}

func TestIssued(t *testing.T) {
	d := trace.Document{Roles: []trace.Role{{Role: "checked", Date: "2026-05-01"}}}
	if got := issued(&d); !got.IsZero() {
		t.Errorf("have %v, want no date", got)
	}
	d.History = []trace.Issue{{Date: "2026-02-20"}, {Date: "2026-03-12"}, {Date: ""}}
	if got := issued(&d).Format("2006-01-02"); got != "2026-03-12" {
		t.Errorf("have %s, want that of the last revision", got)
	}
	d.Roles = append(d.Roles, trace.Role{Role: "prepared", Date: "2026-03-10"})
	if got := issued(&d).Format("2006-01-02"); got != "2026-03-10" {
		t.Errorf("have %s, want that on which it was prepared", got)
	}
}
