package mathset

import (
	"regexp"
	"strings"
	"testing"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// sized keeps the least size of text.
type sized struct {
	draw.Recorder
	least draw.Pt
}

func (s *sized) Text(x, y draw.Pt, f draw.Face, size draw.Pt, t string) {
	if s.least == 0 || size < s.least {
		s.least = size
	}
}

func written(l Line) string {
	var s sequence
	l.Box.Draw(&s, 0, 0)
	return strings.Join(s.list, "")
}

var hanging = regexp.MustCompile(`[(\[][^()\[\]]{0,3}$`)

// TestLinesBeginWithSigns breaks every formula to a work column and a narrower one: no line begins with a dot or a
// solidus, none ends with little but an opened bracket, none is nothing but dots.
func TestLinesBeginWithSigns(t *testing.T) {
	for _, src := range formulas {
		f := parsed(src)
		for _, width := range []draw.Pt{250, 330} {
			b := whole(inSymbols(), inNumbers(5), f).Lines(width)
			for i, l := range b.Lines {
				s := written(l)
				if strings.HasPrefix(s, "·") || strings.HasPrefix(s, "/") {
					t.Errorf("%s at %v: a line begins %q", src, width, s)
				}
				if i < len(b.Lines)-1 && hanging.MatchString(s) {
					t.Errorf("%s at %v: a line ends %q", src, width, s)
				}
				if s == "+…" {
					t.Errorf("%s at %v: dots alone on a line", src, width)
				}
			}
		}
	}
}

func TestNothingBelowTheSmallestSize(t *testing.T) {
	for _, src := range formulas {
		f := parsed(src)
		for _, size := range []draw.Pt{7.5, 8, 9, 10} {
			symbols, numbers := inSymbols(), inNumbers(5)
			symbols.Size, numbers.Size = size, size
			var s sized
			for _, l := range whole(symbols, numbers, f).Lines(200).Lines {
				l.Box.Draw(&s, 0, 0)
			}
			least := Smallest
			if size*0.8 < least { // small print made smaller still to fit
				least = size * 0.8
			}
			if s.least < least-1e-9 {
				t.Errorf("%s at %v: type of %.2f points", src, size, float64(s.least))
			}
		}
	}
}

func TestNumbersBeginTheirLine(t *testing.T) {
	f := parsed("η = cases(f_ck ≤ 50·[MPa]: 1.0; otherwise: 1.0 − (f_ck − 50·[MPa])/(200·[MPa]))")
	symbols := inSymbols().Symbol(f.Symbol).Related("=", inSymbols().Expr(f.Expr))
	row := symbols.Next("=", inNumbers(2).Expr(f.Expr))
	if n := len(row.Lines(row.Width() + 1).Lines); n != 1 {
		t.Errorf("%d lines where one is wide enough", n)
	}
	lines := row.Lines(row.Width() - 40).Lines
	if s := written(lines[len(lines)-1]); len(lines) < 2 || !strings.HasPrefix(s, "=") || strings.Count(s, "=") != 1 {
		t.Errorf("the last of %d lines is %q, want that of the numbers", len(lines), s)
	}
}

func TestFractionsInFractionsAreInLine(t *testing.T) {
	n, err := formula.ParseExpr("(a/b·(c + d))/(e + f/g)")
	if err != nil {
		t.Fatal(err)
	}
	rules := 0
	for _, it := range inSymbols().Expr(n).Box().items {
		if it.kind == rule {
			rules++
		}
	}
	if rules != 1 {
		t.Errorf("%d fraction bars, want 1", rules)
	}
}

func TestMixedConditionsShowTheTree(t *testing.T) {
	for src, want := range map[string]string{"x < y or a < b and c < d": "x<yor(a<bandc<d)", "x < y and (a < b or c < d)": "x<yand(a<borc<d)",
		"x < y and a < b and c < d": "x<yanda<bandc<d"} {
		c, err := formula.ParseCond(src)
		if err != nil {
			t.Fatal(err)
		}
		var s sequence
		inSymbols().Cond(c).Box().Draw(&s, 0, 0)
		if got := strings.Join(s.list, ""); got != want {
			t.Errorf("%s: have %q, want %q", src, got, want)
		}
	}
}

func TestNoBracketsAroundOneQuantity(t *testing.T) {
	n, err := formula.ParseExpr("b_f/h_f")
	if err != nil {
		t.Fatal(err)
	}
	set := inNumbers(1)
	set.Running = true
	var s sequence
	set.Expr(n).Box().Draw(&s, 0, 0)
	if got := strings.Join(s.list, ""); strings.ContainsAny(got, "()") {
		t.Errorf("have %q, want no brackets", got)
	}
}

// places keeps texts with the heights of their baselines.
type places struct {
	draw.Recorder
	at map[draw.Pt][]string
}

func (p *places) Text(x, y draw.Pt, f draw.Face, size draw.Pt, t string) {
	if p.at == nil {
		p.at = map[draw.Pt][]string{}
	}
	p.at[y] = append(p.at[y], t)
}

// TestComparisonsInCasesStayWhole: a condition too long for its room breaks before "and" or "or", never before a
// relation.
func TestComparisonsInCasesStayWhole(t *testing.T) {
	c, err := formula.ParseCond("A_c > A_p and F_p ≥ M_g·e_p or f_ck ≤ f_cm")
	if err != nil {
		t.Fatal(err)
	}
	m := &setter{Setting: inSymbols(), widest: 130}
	m.Size = 10
	in := ctx{size: 10, lead: true}
	var p places
	m.narrowed(10, m.cond(in, c), 110).Draw(&p, 0, 0)
	lines := 0
	for _, texts := range p.at {
		first := texts[0]
		if strings.Contains("=<>≤≥", first) {
			t.Errorf("a line begins %q", first)
		}
		if first == "and" || first == "or" {
			lines++
		}
	}
	if lines == 0 {
		t.Error("the condition is not broken")
	}
}

// TestIndexIsClearOfItsWord: the index under min, max and Σ keeps a distance from it.
func TestIndexIsClearOfItsWord(t *testing.T) {
	const size = 10
	word, script := text(draw.Serif, size, "max"), text(draw.Italic, 7, "j")
	b := under(size, word, script)
	if gap := b.Depth - script.Depth - script.Height - word.Depth; gap < 1.9 {
		t.Errorf("the index stands %.2f points below the word, want 2", float64(gap))
	}
}
