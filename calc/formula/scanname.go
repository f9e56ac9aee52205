package formula

import (
	"strings"
	"unicode"
)

// name scans what begins with a letter: a symbol, a function, a reduction over rows, a word of the notation.
func (s *scanner) name() (token, error) {
	t := token{kind: symbol, pos: Pos(s.at)}
	if s.peek() == '∑' {
		s.src[s.at] = 'Σ'
	}
	if unicode.Is(unicode.Mn, s.peek()) {
		return t, errorAt(t.pos, "%U without a letter before it", s.peek())
	}
	base := s.run(letter)
	t.text = base
	_, fn := functions[base]
	if words[base] {
		t.kind = word
		return t, nil
	}
	if fn && s.peek() != '_' {
		t.kind = function
		return t, nil
	}
	if digit(s.peek()) {
		at := Pos(s.at)
		digits := s.run(digit)
		return t, errorAt(at, "digit right behind %s: write %s_%s", clip(base), clip(base), clip(digits))
	}
	sub, err := s.subscript(base)
	if err != nil {
		return t, err
	}
	if base == "Σ" || (base == "min" || base == "max") && isIndex(sub) {
		if !isIndex(sub) {
			return t, errorAt(t.pos, "Σ lacks its index: write Σ_i(…), with i, j or n")
		}
		t.kind, t.text, t.index = rows, base, sub
		return t, nil
	}
	if fn {
		return t, errorAt(t.pos, "%s is a function, not a symbol: write %s(…)", base, base)
	}
	if strings.ContainsRune(base, 'Σ') {
		return t, errorAt(t.pos, "Σ in the symbol %s: write Σ_i(…) for a sum", clip(base))
	}
	primes := len(s.run(func(r rune) bool { return r == '\'' }))
	if r := s.peek(); r == '_' || r == '∞' || letter(r) || primes > 0 && digit(r) {
		return t, errorAt(Pos(s.at), "%c behind the end of a symbol: the whole subscript stands in braces before primes, as f_{p0,1k}'", r)
	}
	if primes > 9 {
		return t, errorAt(t.pos, "more than nine primes")
	}
	arg := ""
	if s.peek() == '(' {
		if arg, err = s.argument(base); err != nil {
			return t, err
		}
	}
	t.symbol = newSymbol(t.pos, base, sub, primes, arg)
	t.text = t.symbol.Name
	return t, nil
}

func (s *scanner) subscript(base string) (string, error) {
	if s.peek() != '_' {
		return "", nil
	}
	pos := Pos(s.at)
	s.at++
	if s.peek() != '{' {
		sub := s.run(subscriptRune)
		if sub == "" {
			return "", errorAt(pos, "%s_ lacks its subscript", clip(base))
		}
		return sub, nil
	}
	s.at++
	from := s.at
	raw := s.run(func(r rune) bool {
		return r != '}' && !strings.ContainsRune("{()[]'", r) && (unicode.IsPrint(r) || unicode.IsSpace(r))
	})
	if s.peek() != '}' {
		if s.at == len(s.src) {
			return "", errorAt(pos, "{ without }")
		}
		return "", errorAt(Pos(s.at), "%q cannot stand in a subscript", s.peek())
	}
	sub := tight(s.src[from:s.at])
	s.at++
	if strings.TrimSpace(raw) == "" || strings.HasPrefix(sub, ",") || strings.HasSuffix(sub, ",") || strings.Contains(sub, ",,") {
		return "", errorAt(pos, "subscript {%s} has an empty part", clip(sub))
	}
	return sub, nil
}

func (s *scanner) argument(base string) (string, error) {
	pos, open := Pos(s.at), 0
	from := s.at + 1
	for ; s.at < len(s.src); s.at++ {
		switch r := s.src[s.at]; {
		case r == '(':
			open++
		case r == ')':
			open--
		case r == '[' || r == ']' || !unicode.IsPrint(r) && !unicode.IsSpace(r):
			return "", errorAt(Pos(s.at), "%q cannot stand in the argument of a symbol: write %s·(…) for a product", r, clip(base))
		case r == '-':
			s.src[s.at] = '−'
		case r == '*':
			s.src[s.at] = '·'
		}
		if open == 0 {
			break
		}
	}
	if s.at == len(s.src) {
		return "", errorAt(pos, "( without )")
	}
	arg := tight(s.src[from:s.at])
	s.at++
	if arg == "" {
		return "", errorAt(pos, "%s() lacks its argument", clip(base))
	}
	return arg, nil
}
