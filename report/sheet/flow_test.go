package sheet

import (
	"strings"
	"testing"

	"soffit/report/draw"
)

// piece is an element of a height named by its owner.
func piece(owner string, h draw.Pt) *element {
	return &element{owner: owner, height: h, paint: func(draw.Canvas, draw.Pt) {}}
}

// filled lists the owners on each sheet.
func filled(t *testing.T, es ...*element) string {
	t.Helper()
	pages, err := fill(es)
	if err != nil {
		t.Fatal(err)
	}
	var sheets []string
	for _, p := range pages {
		var owners []string
		for _, e := range p.placed {
			owners = append(owners, e.owner)
			if e.y < bodyTop-0.01 || e.y+e.height > bodyBottom+0.02 {
				t.Errorf("%s stands at %.1f to %.1f, outside the body", e.owner, float64(e.y), float64(e.y+e.height))
			}
		}
		sheets = append(sheets, strings.Join(owners, " "))
	}
	return strings.Join(sheets, " | ")
}

func TestHeadingStaysWithWhatFollows(t *testing.T) {
	heading := piece("heading", 30)
	heading.keep = true
	if got, want := filled(t, piece("a", body-50), heading, piece("b", 40)), "a | heading b"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestFigureWaitsForTheNextSheet(t *testing.T) {
	figure := piece("figure", 200)
	figure.floats = true
	if got, want := filled(t, piece("a", body-100), figure, piece("b", 40), piece("c", 100)), "a b | figure c"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
	// A heading above it stays with it, and nothing new begins before it.
	heading, fresh := piece("heading", 20), piece("fresh", 20)
	heading.keep, heading.opens, fresh.fresh = true, true, true
	if got, want := filled(t, piece("a", body-100), heading, figure, piece("b", 40), fresh), "a | heading figure b | fresh"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
	// It never passes the next heading.
	if got, want := filled(t, piece("a", body-100), figure, heading, piece("b", 40)), "a | figure heading b"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
	if got, want := filled(t, piece("a", body-100), figure, piece("b", 40), heading, piece("c", 40)), "a b | figure heading c"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
	if got, want := filled(t, piece("a", body-100), figure), "a | figure"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestTableHeadIsRepeated(t *testing.T) {
	head := piece("head", 30)
	head.keep, head.head = true, head
	es := []*element{piece("a", body-100), head}
	for range 6 {
		r := piece("row", 25)
		r.head = head
		es = append(es, r)
	}
	if got, want := filled(t, es...), "a head row row | head row row row row"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

// rowsUnder are a head of 30 points and rows of 20 under it.
func rowsUnder(name string, rows int) []*element {
	head := piece(name, 30)
	head.keep, head.head = true, head
	out := []*element{head}
	for range rows {
		r := piece("row", 20)
		r.head = head
		out = append(out, r)
	}
	return out
}

func TestFigureStaysOutOfTables(t *testing.T) {
	figure := piece("figure", 200)
	figure.floats = true
	es := append([]*element{piece("a", body-100), figure}, rowsUnder("head", 5)...)
	if got, want := filled(t, append(es, piece("b", 40))...), "a head row row row | head row row figure b"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestGapsCountFromTheHeadOfTheSheet(t *testing.T) {
	es := append([]*element{piece("a", body-30-7*20-groupGap)}, rowsUnder("head", 16)...)
	for _, e := range es[1:] {
		e.grouped = true
	}
	pages, err := fill(es)
	if err != nil {
		t.Fatal(err)
	}
	for n, p := range pages {
		rows := 0
		for i := 1; i < len(p.placed); i++ {
			if p.placed[i].owner != "row" {
				continue
			}
			want := draw.Pt(0)
			if rows > 0 && rows%groupOf == 0 {
				want = groupGap
			}
			if got := p.placed[i].y - p.placed[i-1].y - p.placed[i-1].height; got != want {
				t.Errorf("sheet %d, row %d: a gap of %v, want %v", n+1, rows+1, float64(got), float64(want))
			}
			rows++
		}
	}
	if len(pages) != 2 {
		t.Fatalf("%d sheets, want 2", len(pages))
	}
}

func TestPartWantsRoom(t *testing.T) {
	part := piece("part", 20)
	part.keep, part.opens, part.least = true, true, body/3
	if got, want := filled(t, piece("a", body*0.7), part, piece("b", 40)), "a | part b"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
	if got, want := filled(t, piece("a", body*0.6), part, piece("b", 40)), "a part b"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestHeadingHasTwoLinesBelow(t *testing.T) {
	heading := piece("heading", 20)
	heading.keep, heading.opens = true, true
	es := func(h draw.Pt) []*element {
		return keepHeadings([]*element{piece("a", body-60), heading, piece("b", h), piece("c", 30)})
	}
	if got, want := filled(t, es(12)...), "a | heading b c"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
	if got, want := filled(t, es(30)...), "a heading b | c"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestTooTallIsAnError(t *testing.T) {
	_, err := fill([]*element{piece("monster", body+1)})
	if err == nil || !strings.Contains(err.Error(), "monster") {
		t.Errorf("have %v, want an error that names the element", err)
	}
	// A run that is too tall breaks instead.
	a, b := piece("a", body-10), piece("b", body-10)
	a.keep = true
	if got, want := filled(t, a, b), "a | b"; got != want {
		t.Errorf("have %q, want %q", got, want)
	}
}

func TestTwinColumnsGoOnOverleaf(t *testing.T) {
	var drawn int
	var cells []cell
	for range 100 {
		cells = append(cells, cell{h: 20, paint: func(draw.Canvas, draw.Pt, draw.Pt) { drawn++ }})
	}
	heading := piece("heading", 30)
	heading.keep = true
	pages, err := fill([]*element{piece("a", body-200), heading, twin("list", cells, 0)})
	if err != nil {
		t.Fatal(err)
	}
	for _, p := range pages {
		for _, e := range p.placed {
			e.paint(&draw.Recorder{}, e.y)
			if e.y+e.height > bodyBottom+0.02 {
				t.Errorf("%s ends at %.1f", e.owner, float64(e.y+e.height))
			}
		}
	}
	if drawn != len(cells) {
		t.Errorf("%d of %d cells drawn", drawn, len(cells))
	}
	if len(pages) != 3 {
		t.Errorf("%d sheets, want 3: the list begins under its heading", len(pages))
	}
}

func TestHalves(t *testing.T) {
	for _, c := range []struct {
		heights []draw.Pt
		left    int
		height  draw.Pt
	}{{nil, 0, 0}, {[]draw.Pt{5}, 1, 5}, {[]draw.Pt{5, 5}, 1, 5}, {[]draw.Pt{1, 1, 8}, 2, 8}, {[]draw.Pt{8, 1, 1}, 1, 8}, {[]draw.Pt{3, 3, 3}, 2, 6}} {
		var cells []cell
		for _, h := range c.heights {
			cells = append(cells, cell{h: h})
		}
		if l, h := halves(cells); l != c.left || h != c.height {
			t.Errorf("halves of %v: %d, %v; want %d, %v", c.heights, l, h, c.left, c.height)
		}
	}
}
