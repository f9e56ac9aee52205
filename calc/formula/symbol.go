package formula

import (
	"math"
	"strings"
	"unicode"
)

// functions are the names of functions with their least and greatest number of arguments.
var functions = map[string][2]int{
	"sqrt": {1, 1}, "exp": {1, 1}, "ln": {1, 1}, "abs": {1, 1},
	"sin": {1, 1}, "cos": {1, 1}, "tan": {1, 1}, "cot": {1, 1},
	"arcsin": {1, 1}, "arccos": {1, 1},
	"min": {2, 100}, "max": {2, 100},
}

// words are the other names that no symbol can have.
var words = map[string]bool{"and": true, "or": true, "cases": true, "otherwise": true}

func isIndex(s string) bool { return s == "i" || s == "j" || s == "n" || s == "m" }

// Constant gives the value of a symbol that needs none from outside; the only one is π.
func (s *Symbol) Constant() (float64, bool) { return math.Pi, s.Name == "π" }

// newSymbol completes a symbol from its parts: the canonical name and the indices.
func newSymbol(pos Pos, base, sub string, primes int, arg string) *Symbol {
	s := &Symbol{Pos: pos, Base: base, Sub: sub, Primes: primes, Arg: arg, Index: indices(sub)}
	s.Name = s.spelling()
	return s
}

// spelling puts the name together: f_ck, f_{p0,1k}, d_p', φ(t,t_0). Braces stand where the subscript has
// more than letters and digits.
func (s *Symbol) spelling() string {
	var b strings.Builder
	b.WriteString(s.Base)
	if s.Sub != "" {
		if strings.IndexFunc(s.Sub, func(r rune) bool { return !subscriptRune(r) }) < 0 {
			b.WriteString("_" + s.Sub)
		} else {
			b.WriteString("_{" + s.Sub + "}")
		}
	}
	b.WriteString(strings.Repeat("'", s.Primes))
	if s.Arg != "" {
		b.WriteString("(" + s.Arg + ")")
	}
	return b.String()
}

// indices finds the row indices in a subscript: its trailing parts i, j, n, m. The first part is one only as i
// or j: A_i runs over rows, γ_n does not.
func indices(sub string) []string {
	parts := strings.Split(sub, ",")
	first := len(parts)
	for first > 0 && isIndex(parts[first-1]) && (first > 1 || parts[0] == "i" || parts[0] == "j") {
		first--
	}
	if first == len(parts) {
		return nil
	}
	return parts[first:]
}

func letter(r rune) bool        { return unicode.IsLetter(r) || unicode.Is(unicode.Mn, r) }
func digit(r rune) bool         { return '0' <= r && r <= '9' }
func subscriptRune(r rune) bool { return letter(r) || digit(r) || r == '∞' }

// sameLetter maps look-alikes of Greek letters to the letters.
func sameLetter(r rune) rune {
	switch r {
	case '\u00B5': // micro sign
		return 'μ'
	case '\u2126': // ohm sign
		return 'Ω'
	case '\u2206': // increment
		return 'Δ'
	case '′':
		return '\''
	}
	return r
}

// tight takes the spaces out of raw text but for a single one between two words.
func tight(raw []rune) string {
	word := func(r rune) bool { return subscriptRune(r) || r == '.' }
	var out []rune
	space := false
	for _, r := range raw {
		if unicode.IsSpace(r) {
			space = true
			continue
		}
		if space && len(out) > 0 && word(out[len(out)-1]) && word(r) {
			out = append(out, ' ')
		}
		space = false
		out = append(out, r)
	}
	return string(out)
}
