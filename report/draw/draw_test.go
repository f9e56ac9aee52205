package draw

import (
	"strings"
	"testing"
)

func kinds(r *Recorder) string {
	var out []string
	for _, f := range r.Faults() {
		out = append(out, []string{"text on text", "line on text", "text on dark", "outside", "missing"}[f.Kind])
	}
	return strings.Join(out, ", ")
}

func TestFaults(t *testing.T) {
	cases := []struct {
		name string
		draw func(c *Recorder)
		want string
	}{
		{"apart", func(c *Recorder) { c.Text(0, 20, Serif, 10, "above"); c.Text(0, 31, Serif, 10, "below") }, ""},
		{"on each other", func(c *Recorder) { c.Text(0, 20, Serif, 10, "one"); c.Text(3, 22, Serif, 10, "two") }, "text on text"},
		{"tucked under an overhang", func(c *Recorder) { c.Text(0, 20, Italic, 10, "f"); c.Text(2.3, 22, Serif, 7, "cd") }, ""},
		{"descender above ascender", func(c *Recorder) { c.Text(0, 20, Serif, 10, "ggg"); c.Text(0, 26, Serif, 10, "ddd") }, "text on text"},
		{"ascender beside descender", func(c *Recorder) { c.Text(0, 20, Serif, 10, "g"); c.Text(5.2, 26, Serif, 10, "d") }, ""},
		{"struck through", func(c *Recorder) { c.Text(0, 20, Serif, 10, "text"); c.Line(-5, 17, 50, 17, 0.5) }, "line on text"},
		{"underlined", func(c *Recorder) { c.Text(0, 20, Serif, 10, "text"); c.Line(-5, 21, 50, 21, 0.5) }, ""},
		{"between words", func(c *Recorder) {
			c.Text(0, 20, Serif, 10, "I")
			c.Text(8, 20, Serif, 10, "I")
			c.Line(5.5, 0, 5.5, 40, 0.5)
		}, ""},
		{"slanting past a T", func(c *Recorder) { c.Text(0, 20, Serif, 20, "T"); c.Line(9.5, 22, 12, 10, 0.2) }, ""},
		{"slanting through", func(c *Recorder) { c.Text(0, 20, Serif, 20, "T"); c.Line(0, 5, 12, 22, 0.2) }, "line on text"},
		{"in a box", func(c *Recorder) { c.Rect(0, 0, 50, 20, Style{Stroke: 0.5}); c.Text(5, 14, Serif, 10, "text") }, ""},
		{"on light grey", func(c *Recorder) { c.Rect(0, 0, 50, 20, Style{Fill: Grey(0.8)}); c.Text(5, 14, Serif, 10, "text") }, ""},
		{"on black", func(c *Recorder) { c.Rect(0, 0, 50, 20, Style{Fill: Black}); c.Text(5, 14, Serif, 10, "x") }, "text on dark"},
		{"knocked out", func(c *Recorder) {
			c.Line(0, 10, 100, 10, 0.5)
			c.Rect(10, 0, 60, 20, Style{Fill: White})
			c.Text(15, 13, Serif, 10, "text")
		}, ""},
		{"knocked out too late", func(c *Recorder) {
			c.Text(15, 13, Serif, 10, "l")
			c.Rect(10, 0, 60, 20, Style{Fill: White})
		}, "line on text"},
		{"circle around", func(c *Recorder) { c.Circle(5, 5, 8, Style{Stroke: 0.5}); TextCentre(c, 5, 8, Serif, 8, "1") }, ""},
		{"circle through", func(c *Recorder) { c.Circle(5, 5, 3, Style{Stroke: 0.5}); TextCentre(c, 5, 8, Serif, 8, "W") }, "line on text"},
		{"curve through", func(c *Recorder) {
			c.Path(Path{}.MoveTo(0, 0).CurveTo(20, 0, 20, 30, 0, 30), Style{Stroke: 0.5})
			c.Text(12, 18, Serif, 10, "o")
		}, "line on text"},
		{"turned", func(c *Recorder) { c.TextUp(20, 60, Serif, 10, "upward"); c.Line(16, 40, 16, 80, 0.5) }, "line on text"},
		{"beside turned", func(c *Recorder) { c.TextUp(20, 60, Serif, 10, "upward"); c.Line(24, 40, 24, 80, 0.5) }, ""},
		{"missing", func(c *Recorder) { c.Text(0, 20, Serif, 10, "ཀ") }, "missing"},
		{"lent", func(c *Recorder) { c.Text(0, 20, Serif, 10, "✓ 10⁻³") }, ""},
	}
	for _, c := range cases {
		var r Recorder
		c.draw(&r)
		if have := kinds(&r); have != c.want {
			t.Errorf("%s: have %q, want %q: %v", c.name, have, c.want, r.Faults())
		}
	}
}

func TestFaultSaysWhose(t *testing.T) {
	var r Recorder
	r.Owner("step 8.3.4")
	r.Text(72, 100, Serif, 10, "one")
	r.Owner("figure 8.2")
	r.Text(73, 101, Serif, 10, "two")
	const want = `text "one" of step 8.3.4 overlaps text "two" of figure 8.2 at x 2`
	if f := r.Faults(); len(f) != 1 || !strings.HasPrefix(f[0].String(), want) {
		t.Errorf("have %v, want %s…", f, want)
	}
}

func TestOutside(t *testing.T) {
	var r Recorder
	r.Owner("result")
	TextRight(&r, 100, 20, Serif, 10, "within")
	r.Owner("work")
	r.Text(90, 40, Serif, 10, "beyond")
	column := BoxAt(0, 0, 100, 100)
	if f := r.Outside(column, nil); len(f) != 1 || f[0].A.Text != "beyond" {
		t.Errorf("have %v, want the text beyond the column", f)
	}
	if f := r.Outside(column, func(o string) bool { return o == "result" }); len(f) != 0 {
		t.Errorf("result: %v", f)
	}
	r.Line(0, 50, 100, 50, 3) // ends on the edges, without caps
	if f := r.Outside(column, nil); len(f) != 1 {
		t.Errorf("a line along the column is outside: %v", f)
	}
}

func TestMeasures(t *testing.T) {
	if w := Width(Serif, 10, "0123"); w != 20 {
		t.Errorf("four figures are %v wide, want 20", w)
	}
	if w, apart := Width(Serif, 10, "AV"), Width(Serif, 10, "A")+Width(Serif, 10, "V"); w >= apart {
		t.Errorf("AV is %v wide, its letters %v", w, apart)
	}
	if e := Extent(Serif, 10, "x"); e.Y0 >= 0 || e.Y1 < 0 || e.X1 > 5 {
		t.Errorf("extent of x: %+v", e)
	}
	if e := Extent(Serif, 10, "  "); e != (Box{}) {
		t.Errorf("blanks have ink: %+v", e)
	}
	if s := Fit(Serif, 10, 30, "a long text"); !strings.HasSuffix(s, "…") || Width(Serif, 10, s) > 30 {
		t.Errorf("fitted to %q", s)
	}
	if m := Missing(Serif, "aཀ✓"); len(m) != 1 || m[0] != 'ཀ' {
		t.Errorf("missing %q", m)
	}
}
