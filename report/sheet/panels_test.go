package sheet

import (
	"strconv"
	"strings"
	"testing"

	"soffit/calc/clause"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// counted is a table of rows that have numbers only, each cell another number than every other.
func counted(rows, columns int) *table {
	x := mathset.Setting{Size: tableSize}.Words(draw.Italic, "x").Box()
	t := &table{owner: "T", heads: []string{"m"}, words: []string{"fibre"}, mark: rows / 2, counted: true}
	for i := range rows {
		t.rows = append(t.rows, []string{strconv.Itoa(i + 1)})
	}
	for k := range columns {
		c := tableColumn{symbol: &x, number: "9.9." + strconv.Itoa(k), unit: mathset.Upright(draw.Serif, smallSize, "mm")}
		for i := range rows {
			c.cells = append(c.cells, strconv.Itoa(1000+i)+"."+strconv.Itoa(k)+"5")
		}
		t.columns = append(t.columns, c)
	}
	return t
}

// painted sets elements on sheets below a piece of some height and draws each sheet.
func painted(t *testing.T, es []*element, above draw.Pt) []*draw.Recorder {
	t.Helper()
	if above > 0 {
		es = append([]*element{piece("a", above)}, es...)
	}
	pages, err := fill(es)
	if err != nil {
		t.Fatal(err)
	}
	var out []*draw.Recorder
	for _, p := range pages {
		r := &draw.Recorder{}
		for _, e := range p.placed {
			e.paint(r, e.y)
		}
		for _, f := range append(r.Faults(), r.Outside(draw.Box{X0: left - 0.5, Y0: bodyTop - 0.5, X1: right + 0.5, Y1: bodyBottom + 0.5}, nil)...) {
			t.Error(f)
		}
		out = append(out, r)
	}
	return out
}

// TestLongTableIsFolded: every row stands once, in order down the panels, under heads with number, symbol and unit, the
// panels of a sheet beginning and ending within a line of each other.
func TestLongTableIsFolded(t *testing.T) {
	for _, c := range []struct {
		rows, columns int
		above         draw.Pt
		sheets        int
	}{
		{135, 2, 0, 1}, {135, 2, 300, 2}, {135, 3, 0, 1}, {135, 3, body - 60, 2}, {400, 3, 200, 3}, {8, 1, 0, 1}, {13, 1, 0, 1}, {61, 4, 0, 1},
	} {
		tab := counted(c.rows, c.columns)
		sheets := painted(t, tab.elements(0), c.above)
		name := strconv.Itoa(c.rows) + " rows of " + strconv.Itoa(c.columns)
		if len(sheets) != c.sheets {
			t.Errorf("%s: %d sheets, want %d", name, len(sheets), c.sheets)
		}
		next, marks := 0, 0
		for n, r := range sheets {
			heads, panels, units, bottom, tops := 0, 0, 0, draw.Pt(0), map[draw.Pt]bool{}
			last := draw.Point{}
			first := next
			for _, k := range r.Ink {
				switch {
				case k.Text == "fibre":
					heads++
					tops[k.At.Y] = true
				case k.Text == "mm":
					units++
				case k.Text == "▸":
					marks++
				case strings.HasSuffix(k.Text, ".05"): // the cells of the first column
					if k.Text != strconv.Itoa(1000+next)+".05" {
						t.Fatalf("%s, sheet %d: %s comes after row %d", name, n+1, k.Text, next)
					}
					if k.At.X > last.X+1 {
						panels++
					} else if k.At.Y <= last.Y {
						t.Errorf("%s: row %d stands above the one before", name, next+1)
					}
					last = k.At
					bottom = max(bottom, k.At.Y)
					next++
				}
			}
			if heads != panels || units != panels*c.columns || len(tops) > 1 || next > first && panels < 2 {
				t.Errorf("%s, sheet %d: %d heads at %d heights and %d units on %d panels", name, n+1, heads, len(tops), units, panels)
			}
			if n+1 < len(sheets) && next > first {
				if lines := (next - first) / panels; lines < leastBegun-leastLeft || (next-first)%panels != 0 {
					t.Errorf("%s: %d rows in %d panels before the sheet ends", name, next-first, panels)
				}
			}
		}
		if next != c.rows || marks != 1 {
			t.Errorf("%s: %d rows, %d marked", name, next, marks)
		}
	}
}

func TestShortOrWideTableIsNotFolded(t *testing.T) {
	for _, c := range [][2]int{{7, 1}, {2, 2}, {60, 8}} {
		if es := counted(c[0], c[1]).elements(0); len(es) != c[0]+1 {
			t.Errorf("%d rows of %d columns make %d elements, want a head and every row", c[0], c[1], len(es))
		}
	}
}

// TestFoldedTableKeepsItsTitle: the words above a folded table do not stay behind at the foot of a sheet.
func TestFoldedTableKeepsItsTitle(t *testing.T) {
	for above := body - 300; above < body; above += 7 {
		title := piece("title", 12)
		title.keep = true
		es := append([]*element{piece("a", above), title}, counted(135, 2).elements(3)...)
		for _, s := range strings.Split(filled(t, es...), " | ") {
			if strings.HasSuffix(s, "title") {
				t.Fatalf("%.0f points down: the title stands alone", float64(above))
			}
		}
	}
}

// TestLongRunOfLikeRows: of rows that are counted out, a run that says the same makes one line where it is long.
func TestLongRunOfLikeRows(t *testing.T) {
	tab := counted(60, 1)
	for i := 40; i < 60; i++ {
		tab.columns[0].cells[i] = "0.00"
	}
	f := tab.folded()
	if n := len(f.rows); n != 41 || f.rows[40][0] != "41 … 60" {
		t.Errorf("%d lines, the last of %q", n, f.rows[n-1][0])
	}
	for i := 40; i < 50; i++ {
		tab.columns[0].cells[i] = "1.00" + strconv.Itoa(i)
	}
	if n := len(tab.folded().rows); n != 60 {
		t.Errorf("%d lines, want every row where the run is short", n)
	}
}

// TestNumbersInPlaceOfNames: a name that is the word of its axis and the number is left out; others stay.
func TestNumbersInPlaceOfNames(t *testing.T) {
	n := trace.New(document())
	for _, c := range []struct{ axis, row, head, label string }{
		{"fibre", "fibre 1", "fibre m", "1"},
		{"bar", "corner bar 1", " m", "1, corner bar 1"},
	} {
		a := n.Axis(c.axis, "", "m", []string{c.row})
		got := rowsOf("T", []*trace.Axis{a})
		if h, l := got.words[0]+" "+got.heads[0], strings.Join(got.rows[0], ", "); h != c.head || l != c.label {
			t.Errorf("%s: head %q over %q, want %q over %q", c.axis, h, l, c.head, c.label)
		}
	}
}

// TestColumnsShareATable: a single value, narrative or a check between two columns over the same rows leaves them in
// one table behind the last; the order of the record stays.
func TestColumnsShareATable(t *testing.T) {
	n := trace.New(document())
	f := bench{t, n}
	rows := n.Axis("row", "", "i", []string{"low", "high"})
	bars := n.Axis("bar row", "", "j", []string{"front", "back"})
	b := n.Chapter("c", "Chapter").Block("b", "Block", nil)
	f.column(b, "a", "a_i", "first", "mm", rows, "file", "1 mm", "2 mm")
	b.Text("words", "Words between.")
	f.given(b, "k", "k", "single", "", "3", "file", clause.Ref{})
	f.column(b, "b", "b_i", "second", "mm", rows, "file", "5 mm", "6 mm")
	f.column(b, "q", "q_j", "of other rows", "mm", bars, "file", "7 mm", "8 mm")
	f.column(b, "c", "c_i", "third", "mm", rows, "file", "9 mm", "10 mm")
	f.step(b, "s", "Sum", "s_i = a_i + b_i", "mm", clause.Ref{})
	f.step(b, "total", "Total", "S = Σ_i(s_i)", "mm", clause.Ref{})
	f.step(b, "u", "Share", "u_i = s_i/S", "", clause.Ref{})
	if err := n.Err(); err != nil {
		t.Fatal(err)
	}
	c := newComposer(n)
	c.entries(b)
	if c.err != nil {
		t.Fatal(c.err)
	}
	var got []string
	for _, e := range c.elements {
		if e.head != nil && e.head == e {
			got = append(got, "table")
		} else if e.head == nil {
			got = append(got, e.owner)
		}
	}
	want := "1.1.1 " + b.Path() + "/words 1.1.2 1.1.3 table 1.1.4 table 1.1.5 table 1.1.6 1.1.7 1.1.8 table"
	if s := strings.Join(got, " "); s != want {
		t.Errorf("have %s, want %s", s, want)
	}
}
