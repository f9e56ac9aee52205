package text

import (
	"errors"
	"math"
	"slices"
	"strconv"
	"strings"
	"sync"
	"testing"
	"time"

	"soffit/report/draw"
	"soffit/report/mathset"
)

var style = Style{Size: 10}

// drawn draws lines; nothing may overlap or reach out of the column.
func drawn(t testing.TB, lines []Line, width draw.Pt) *draw.Recorder {
	t.Helper()
	var rec draw.Recorder
	Draw(&rec, 0, 0, lines)
	for _, f := range append(rec.Faults(), rec.Outside(draw.Box{X0: -0.5, Y0: -1, X1: width + 0.5, Y1: Height(lines) + 1}, nil)...) {
		t.Error(f)
	}
	return &rec
}

func read(t testing.TB, src string) Narrative {
	t.Helper()
	n, troubles := Read(src, func(key string) (mathset.Operand, error) {
		switch key {
		case "M_Rd":
			return mathset.Operand{Number: "1179.7", Unit: "kN·m", Anchor: "bending/m-rd"}, nil
		case "f_{p0,1k}":
			return mathset.Operand{Number: "1640", Unit: "MPa"}, nil
		}
		return mathset.Operand{}, errors.New("no such value")
	})
	for _, trouble := range troubles {
		t.Error(trouble)
	}
	return n
}

func joined(rec *draw.Recorder) string { return strings.Join(rec.Texts(), "|") }

func TestParagraphIsEven(t *testing.T) {
	p := Paragraph{Plain(strings.Repeat("The force in the strands follows from the strains of every layer. ", 6)),
		Math(func(size draw.Pt) mathset.Row {
			r, err := mathset.Inline(size, "λ·x ≤ h_f")
			if err != nil {
				t.Fatal(err)
			}
			return r
		}), Plain(", "), Strong("strong"), Plain(" and "), Slanted("slanted"), Plain(".")}
	for _, width := range []draw.Pt{120, 200, 330} {
		lines := p.Lines(width, style)
		rec := drawn(t, lines, width)
		var at []draw.Pt
		for _, k := range rec.Ink {
			if k.Kind == draw.TextInk && k.Size == 10 && !slices.Contains(at, k.At.Y) {
				at = append(at, k.At.Y)
			}
		}
		if len(at) != len(lines) {
			t.Fatalf("%d baselines of %d lines", len(at), len(lines))
		}
		for i := 1; i < len(at); i++ {
			if d := at[i] - at[i-1]; math.Abs(float64(d-12.5)) > 0.01 {
				t.Errorf("width %v: baselines %d and %d are %.2f apart, want 12.5", width, i-1, i, d)
			}
		}
		for _, l := range lines[:len(lines)-1] {
			if l.Width < 0.7*width {
				t.Errorf("width %v: a line is only %.1f long", width, l.Width)
			}
		}
	}
}

func TestUnitsStayWithNumbers(t *testing.T) {
	p := Paragraph{Plain("aaaa bbbb cccc 1145 MPa, dddd eeee 10⁶ mm⁴ ffff of 5 m.")}
	for width := draw.Pt(50); width < 250; width += 3 {
		rec := drawn(t, p.Lines(width, style), width)
		for _, s := range rec.Texts() {
			for _, unit := range []string{"MPa,", "mm", "m."} {
				if strings.HasPrefix(s, unit) && unit != "mm" {
					t.Errorf("width %v: a line begins with %q", width, s)
				}
			}
		}
	}
}

func TestLongWordsAreBroken(t *testing.T) {
	p := Paragraph{Typed("ultimate.bending/moment-resistance@midspan"), Plain(" and a-very-long-word-indeed " + strings.Repeat("x", 90))}
	lines := p.Lines(100, style)
	rec := drawn(t, lines, 100)
	if all := strings.Join(rec.Texts(), ""); !strings.Contains(all, "moment-resistance@midspan") {
		t.Errorf("letters are lost: %s", all)
	}
}

func TestMarkdown(t *testing.T) {
	cases := []struct{ src, want string }{
		{"a *b* **c** `M_Rd`.", "a|b|c|M|Rd|."},
		{"the moment {M_Rd} holds", "the moment|1179.7|kN·m|holds"},
		{"{f_{p0,1k}}", "1640|MPa"},
		{`a \{brace\} and \*star`, "a {brace} and *star"},
		{"`λ·x ≤ h_f`, then", "λ|·|x|≤|h|f|, then"},
		{"see `beam.yaml` now", "see|beam.yaml|now"},
		{"it's \"so\" -- yes...", "it’s “so” – yes…"},
		{"# Head\n\ntext", "Head|text"},
		{"- one\n- two\n  - three", "•|one|•|two|•|three"},
		{"3. one\n4. two", "3.|one|4.|two"},
		{"> said", "said"},
		{"```\na  b\n\tc\n```", "a  b|    c"},
		{"[here](#key) and [there](https://example.org)", "here|and there (https://example.|org)"},
		{"a  \nb", "a|b"},
		{"&lt;5 &#37;", "<5 %"},
		{"|a|b|\n|--|--:|\n|1 kN|{M_Rd}|", "a|b|1 kN|1179.7|kN·m"},
		{"10⁻³ mm²", "10|−3|mm|2"},
	}
	for _, c := range cases {
		rec := drawn(t, read(t, c.src).Lines(300, style), 300)
		if have := joined(rec); have != c.want {
			t.Errorf("%q is set as %q, want %q", c.src, have, c.want)
		}
	}
}

func TestFacesAndLinks(t *testing.T) {
	rec := drawn(t, read(t, "a *b* **c *d*** [e](#key) {M_Rd}").Lines(300, style), 300)
	var faces []draw.Face
	for _, k := range rec.Ink {
		faces = append(faces, k.Face)
	}
	if want := []draw.Face{draw.Serif, draw.Italic, draw.Bold, draw.Serif, draw.Serif, draw.Serif}; !slices.Equal(faces, want) {
		t.Errorf("faces %v, want %v", faces, want)
	}
	if len(rec.Links) != 2 || rec.Links[0].Anchor != "key" || rec.Links[1].Anchor != "bending/m-rd" {
		t.Errorf("links: %+v", rec.Links)
	}
}

func TestTroubles(t *testing.T) {
	cases := map[string]string{
		"first\n\nthen {x_y} here":     "line 3: {x_y}: no such value",
		"a {brace":                     "line 1: a brace { without its end }; write \\{ for a brace that is text",
		"{}":                           "line 1: empty braces {}; name a symbol between the braces",
		"<b>bold</b>":                  "line 1: HTML is not set in a note; write Markdown",
		"text\n\n<div>\nx\n</div>":     "line 3: HTML is not set in a note; write Markdown",
		"tibetan\nཀ":                   "line 2: no typeface of the note has the sign 'ཀ' (U+0F40)",
		"entity &#x1F600;":             "line 1: no typeface of the note has the sign '😀' (U+1F600)",
		"broken \xe9":                  "line 1: a byte that is no letter; write UTF-8",
		"![p](p.png)":                  "line 1: a picture in narrative is not set; say it in words or leave it out",
		"the stress σ_{p,∞} is spread": "line 1: _{p,∞} outside of a formula; write symbols between back-ticks, `σ_{p,∞}`",
	}
	for src, want := range cases {
		_, troubles := Read(src, func(string) (mathset.Operand, error) { return mathset.Operand{}, errors.New("no such value") })
		if len(troubles) == 0 || troubles[0].Error() != want {
			t.Errorf("%q: have %v, want %s", src, troubles, want)
		}
	}
}

func TestTableKeepsItsColumn(t *testing.T) {
	n := read(t, "|action|value|remark|\n|:--|--:|:--|\n|finishes|2.5 kN/m|"+strings.Repeat("stated by the architect ", 12)+"|\n|snow|0.8 kN/m|below 1000 m|")
	for _, width := range []draw.Pt{180, 250, 400} {
		rec := drawn(t, n.Lines(width, style), width)
		var right []draw.Pt
		for _, k := range rec.Ink {
			if k.Kind == draw.TextInk && strings.HasSuffix(k.Text, "kN/m") {
				right = append(right, k.Box.X1)
			}
		}
		if len(right) != 2 || math.Abs(float64(right[0]-right[1])) > 0.01 {
			t.Errorf("width %v: values end at %v, want under each other", width, right)
		}
	}
}

func TestListingGoesOn(t *testing.T) {
	long := strings.Repeat("abcdefghij", 12)
	rec := drawn(t, Listing([]string{"key: value", "", "\t" + long}, 200, style), 200)
	all := strings.ReplaceAll(strings.Join(rec.Texts()[1:], ""), "↪ ", "")
	if strings.TrimSpace(all) != long {
		t.Errorf("have %q", all)
	}
}

func TestHeadingsKeepWithText(t *testing.T) {
	lines := read(t, "# Head\n\ntext").Lines(200, style)
	if !lines[0].Keep || lines[1].Keep {
		t.Error("a heading does not stay with its text, or text stays with nothing")
	}
}

func TestFromManyGoroutines(t *testing.T) {
	var group sync.WaitGroup
	for range 8 {
		group.Go(func() {
			for range 20 {
				read(t, "# A\n\n`M_Rd` {M_Rd} *x*\n\n|a|\n|-|\n|1|").Lines(200, style)
			}
		})
	}
	group.Wait()
}

func FuzzRead(f *testing.F) {
	for _, s := range []string{"a *b* `x` {y} [z](#k)", "|a|b|\n|-|-|\n|1|2|", "1. a\n   - b\n\n> c", "```\nx\n```", "{a{b}", "\\{", "***", "&#0;"} {
		f.Add(s)
	}
	f.Fuzz(func(t *testing.T, src string) {
		slow := time.AfterFunc(5*time.Second, func() { panic("slow: " + strconv.Quote(src)) })
		defer slow.Stop()
		n, troubles := Read(src, func(string) (mathset.Operand, error) { return mathset.Operand{Number: "1", Unit: "kN"}, nil })
		var rec draw.Recorder
		Draw(&rec, 0, 0, n.Lines(200, style))
		if len(troubles) == 0 && len(rec.Missing()) > 0 {
			t.Error(rec.Missing())
		}
	})
}

func BenchmarkNarrative(b *testing.B) {
	const src = "# Head\n\nThe force in the strands follows from `σ_{p,∞}`, so that **every layer** stands at *its own* prestress {M_Rd}; " +
		"the block lies in the flange while `λ·x ≤ h_f`.\n\n- one\n- two\n"
	b.ReportAllocs()
	for b.Loop() {
		read(b, src).Lines(330, style)
	}
}
