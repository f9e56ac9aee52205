package text

import (
	"strings"
	"testing"

	"soffit/report/draw"
)

func TestSubscripted(t *testing.T) {
	for in, want := range map[string]string{"Cracking moment at f_ctm, bottom": "f_ctm", "ratio (ε_ud/ε_uk) of": "ε_ud/ε_uk", "l_pt2 bottom A": "l_pt2",
		"none": "", "tensile strength f_ctm(t).": "f_ctm(t)", "of f_{p0,1k};": "f_{p0,1k}"} {
		start, end := subscripted(in)
		if got := in[start:end]; got != want {
			t.Errorf("in %q: %q, want %q", in, got, want)
		}
	}
}

// TestWordsFindsSymbols counts the pieces of mathematics in plain words.
func TestWordsFindsSymbols(t *testing.T) {
	for in, want := range map[string]int{"part of f_p0,1k, after release": 1, "F_p0,1 and f_ck": 2, "ψ₀, ψ₁ and ψ₂ by category": 3,
		"carbon as CO₂": 0, "`λ·x` below": 1, "a_": 0, "_": 0, "no symbol": 0, "f_{p0,1k}": 1, "of a_b_c_": 0} {
		n := 0
		var plain strings.Builder
		for _, r := range Words(draw.Serif, in) {
			if r.math != nil {
				n++
			} else {
				plain.WriteString(r.Text)
			}
		}
		if n != want {
			t.Errorf("%q: %d symbols, want %d; left as words %q", in, n, want, plain.String())
		}
	}
}

// TestNarrativeFindsSymbols: words with a subscript in Markdown are mathematics too.
func TestNarrativeFindsSymbols(t *testing.T) {
	n, troubles := Read("approvals: 0.9 F_p0,1 of ψ₀ and f_ck 50, _slanted_ and **f_ctm bold**", nil)
	if len(troubles) > 0 {
		t.Fatal(troubles)
	}
	symbols := 0
	for _, r := range n.blocks[0].(prose).Paragraph {
		if r.math != nil {
			symbols++
		} else if strings.ContainsAny(r.Text, "_₀") {
			t.Errorf("%q is left in words", r.Text)
		}
	}
	if symbols != 4 {
		t.Errorf("%d symbols, want 4", symbols)
	}
}

func TestNoWidows(t *testing.T) {
	p := Paragraph{Plain(strings.Repeat("some words to be broken into lines ", 12))}
	lines := p.Lines(150, Style{Size: 10})
	n := len(lines)
	if n < 4 {
		t.Fatalf("%d lines", n)
	}
	for i, l := range lines {
		if want := i == 0 || i == n-2; l.Keep != want {
			t.Errorf("line %d of %d stays with the next: %v, want %v", i+1, n, l.Keep, want)
		}
	}
}
