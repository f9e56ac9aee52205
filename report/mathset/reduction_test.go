package mathset

import (
	"strings"
	"testing"

	"soffit/calc/formula"
)

// A sum written out over one row is its one term: what stands around it takes the brackets which that term needs.
// Over several rows it is a sum. Row 1 is 855.7 kN, row 2 −114.9 kN.
func TestBracketsAroundWrittenSums(t *testing.T) {
	cases := []struct{ src, one, two string }{
		{"z = b − Σ_i(c − A_{p,i})", "b − ( c − 855.7 kN )", "b − [ ( c − 855.7 kN ) + ( c − ( −114.9 kN ) ) ]"},
		{"z = b + Σ_i(c − A_{p,i})", "b + ( c − 855.7 kN )", "b + [ ( c − 855.7 kN ) + ( c − ( −114.9 kN ) ) ]"},
		{"z = k·Σ_i(c + A_{p,i})", "k · ( c + 855.7 kN )", "k · [ ( c + 855.7 kN ) + ( c + ( −114.9 kN ) ) ]"},
		{"z = Σ_i(c + A_{p,i})·k", "( c + 855.7 kN ) · k", "[ ( c + 855.7 kN ) + ( c + ( −114.9 kN ) ) ] · k"},
		{"z = Σ_i(A_{p,i})·k", "855.7 kN · k", "[ 855.7 kN + ( −114.9 kN ) ] · k"},
		{"z = k·Σ_i(c·A_{p,i})", "k · ( c · 855.7 kN )", "k · [ c · 855.7 kN + c · ( −114.9 kN ) ]"},
		{"z = Σ_i(c + A_{p,i})^2", "( c + 855.7 kN ) 2", "[ ( c + 855.7 kN ) + ( c + ( −114.9 kN ) ) ] 2"},
		{"z = Σ_i(A_{p,i})^2", "( 855.7 kN ) 2", "[ 855.7 kN + ( −114.9 kN ) ] 2"},
		{"z = k^Σ_i(c + A_{p,i})", "k c + 855.7 kN", "k ( c + 855.7 kN ) + ( c + ( −114.9 kN ) )"},
		{"z = Σ_i(c + A_{p,i})/k", "c + 855.7 kN k", "( c + 855.7 kN ) + ( c + ( −114.9 kN ) ) k"},
		{"z = k/Σ_i(c + A_{p,i})", "k c + 855.7 kN", "k ( c + 855.7 kN ) + ( c + ( −114.9 kN ) )"},
		{"z = −Σ_i(c + A_{p,i})", "− ( c + 855.7 kN )", "− [ ( c + 855.7 kN ) + ( c + ( −114.9 kN ) ) ]"},
		{"z = −Σ_i(−A_{p,i})", "− ( −855.7 kN )", "− [ −855.7 kN + ( − ( −114.9 kN ) ) ]"},
		{"z = b − Σ_i(−A_{p,i})", "b − ( −855.7 kN )", "b − [ −855.7 kN + ( − ( −114.9 kN ) ) ]"},
		{"z = Σ_j(b − Σ_i(c − A_{p,i}))", "b − ( c − 855.7 kN )", ""},
		{"z = b − Σ_j(Σ_i(c − A_{p,i}))", "b − ( c − 855.7 kN )", ""},
	}
	square := strings.NewReplacer("[", "(", "]", ")", "− ", "−")
	plain := func(s string) string { return square.Replace(s) } // kinds of brackets are tested elsewhere
	for _, c := range cases {
		f := parsed(c.src)
		for rows, want := range []string{"", c.one, c.two} {
			if want == "" {
				continue
			}
			if have := strings.Join(texts(inNumbers(rows).Expr(f.Expr)), " "); plain(have) != plain(want) {
				t.Errorf("%s over %d rows: %s, want %s", c.src, rows, have, want)
			}
		}
	}
	// The same where the second row, which is negative, is the only one.
	for src, want := range map[string]string{
		"z = b − Σ_i(A_{p,i})": "b − ( −114.9 kN )",
		"z = k·Σ_i(A_{p,i})":   "k · ( −114.9 kN )",
		"z = −Σ_i(A_{p,i})":    "− ( −114.9 kN )",
		"z = Σ_i(A_{p,i})^2":   "( −114.9 kN ) 2",
		"z = Σ_i(A_{p,i})·k":   "−114.9 kN · k",
	} {
		n := inNumbers(1)
		first := n.Operand
		n.Operand = func(s *formula.Symbol, _ map[string]int) (Operand, bool) { return first(s, map[string]int{"i": 1}) }
		if have := strings.Join(texts(n.Expr(parsed(src).Expr)), " "); have != want {
			t.Errorf("%s with one negative row: %s, want %s", src, have, want)
		}
	}
	// Nothing to add is a plain nought.
	if have := strings.Join(texts(inNumbers(0).Expr(parsed("z = k·Σ_i(c + A_{p,i})").Expr)), " "); have != "k · 0" {
		t.Errorf("over no rows: %s", have)
	}
	// In running text a fraction is set in line, where numerator and denominator need brackets.
	for src, want := range map[string]string{
		"z = Σ_i(c + A_{p,i})/k": "( c + 855.7 kN ) / k",
		"z = k/Σ_i(c·A_{p,i})":   "k / ( c · 855.7 kN )",
		"z = k/Σ_i(A_{p,i})":     "k / 855.7 kN",
	} {
		n := inNumbers(1)
		n.Running = true
		if have := strings.Join(texts(n.Expr(parsed(src).Expr)), " "); have != want {
			t.Errorf("%s in running text: %s, want %s", src, have, want)
		}
	}
}
