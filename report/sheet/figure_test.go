package sheet

import (
	"testing"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// TestFigureWiderThanItsColumn: a figure that comes out wider than work and result together goes across the sheet, where no
// hairline runs through it.
func TestFigureWiderThanItsColumn(t *testing.T) {
	before := layFigure
	defer func() { layFigure = before }()
	for over, want := range map[draw.Pt]span{0: spanWide, 12: spanFull} {
		layFigure = func(_ *trace.Note, _ *trace.Figure, width draw.Pt) (drawing, draw.Pt, draw.Pt, error) {
			return frame{width + over, 180}, width + over, 180, nil
		}
		n := trace.New(trace.Document{})
		b := n.Chapter("c", "C").Block("b", "B", nil)
		b.Figure("f", "section", "Section.", "")
		c := newComposer(n)
		c.figure(b, n.Entry("c.b/f").(*trace.Figure))
		if c.err != nil || len(c.elements) != 1 || c.elements[0].spans != want {
			t.Fatalf("%g points over: %v, %+v", float64(over), c.err, c.elements)
		}
		var r draw.Recorder
		c.elements[0].paint(&r, 100)
		for _, k := range r.Ink {
			if col := want.column(); k.Box.X0 < col.x || k.Box.X1 > col.x+col.w {
				t.Errorf("%g points over: ink at %v", float64(over), k.Box)
			}
		}
	}
}
