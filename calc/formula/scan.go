package formula

import (
	"math"
	"strconv"
	"strings"
	"unicode"
	"unicode/utf8"

	"soffit/calc/quantity"
)

// kind of a token. Operators, brackets and signs have their own rune as kind; '≤' and its like are relation.
type kind rune

const (
	end kind = -1 - iota
	number
	unitLit
	symbol
	function
	rows
	word
	relation
)

type token struct {
	kind   kind
	pos    Pos
	text   string // as it prints; of rows the operator
	index  string // of rows
	value  float64
	unit   quantity.Unit
	symbol *Symbol
}

// startsValue reports whether t can begin a value, so that right behind another value a sign is missing.
func (t *token) startsValue() bool {
	switch t.kind {
	case number, unitLit, symbol, function, rows, '(':
		return true
	}
	return t.kind == word && t.text == "cases"
}

// maxSource bounds the text read, in runes. What is printed back is held to a smaller bound, see limit.
const maxSource = 20000

type scanner struct {
	src    []rune
	at     int
	tokens []token
}

func scan(text string) ([]token, error) {
	if !utf8.ValidString(text) {
		return nil, errorAt(0, "formula is not text in UTF-8")
	}
	s := &scanner{src: []rune(text)}
	if len(s.src) > maxSource {
		return nil, errorAt(maxSource, "formula is longer than %d characters", maxSource)
	}
	for i, r := range s.src {
		s.src[i] = sameLetter(r)
	}
	s.tokens = make([]token, 0, len(s.src)/2+2)
	for {
		for unicode.IsSpace(s.peek()) {
			s.at++
		}
		if s.at == len(s.src) {
			s.tokens = append(s.tokens, token{kind: end, pos: Pos(s.at), text: "end of formula"})
			return s.tokens, nil
		}
		t, err := s.next()
		if err != nil {
			return nil, err
		}
		s.tokens = append(s.tokens, t)
	}
}

func (s *scanner) peek() rune { return s.ahead(0) }

func (s *scanner) ahead(n int) rune {
	if s.at+n < len(s.src) {
		return s.src[s.at+n]
	}
	return 0
}

// run takes the runes that fit.
func (s *scanner) run(fits func(rune) bool) string {
	from := s.at
	for s.at < len(s.src) && fits(s.src[s.at]) {
		s.at++
	}
	return string(s.src[from:s.at])
}

func (s *scanner) next() (token, error) {
	t := token{pos: Pos(s.at)}
	r := s.peek()
	switch {
	case digit(r):
		return s.number()
	case letter(r) || r == '∑':
		return s.name()
	case r == '[':
		return s.unit()
	}
	s.at++
	t.kind, t.text = kind(r), string(r)
	switch r {
	case '+', '/', '^', '(', ')', ':', '·', '−':
	case '*', '⋅':
		t.kind, t.text = '·', "·"
	case '-':
		t.kind, t.text = '−', "−"
	case ';', ',':
		if r == ',' && s.behindNumber() && digit(s.peek()) {
			return t, errorAt(t.pos, "comma between digits: write a decimal point, or ; between two arguments")
		}
		t.kind = ';'
	case '≤', '≥', '=', '<', '>':
		t.kind = relation
		if r == '=' && s.peek() == '=' {
			return t, errorAt(t.pos, "== is no relation: write =")
		}
		if s.peek() == '=' && (r == '<' || r == '>') {
			s.at++
			t.text = map[rune]string{'<': "≤", '>': "≥"}[r]
		}
	default:
		return t, s.strange(t.pos, r)
	}
	return t, nil
}

// behindNumber reports whether the sign just taken follows a number without a space.
func (s *scanner) behindNumber() bool {
	n := len(s.tokens)
	return n > 0 && s.tokens[n-1].kind == number && digit(s.src[s.at-2])
}

func (s *scanner) strange(pos Pos, r rune) error {
	switch {
	case r == '×' || r == '∙' || r == '•':
		return errorAt(pos, "%c is no sign of the notation: write ·", r)
	case r == '÷' || r == '∕':
		return errorAt(pos, "%c is no sign of the notation: write /", r)
	case r == '–' || r == '—':
		return errorAt(pos, "%c is a dash: write −", r)
	case r == '√':
		return errorAt(pos, "√ is no sign of the notation: write sqrt(…)")
	case r == '.' && digit(s.peek()):
		return errorAt(pos, "number begins with a point: write 0.%s", clip(s.run(digit)))
	case strings.ContainsRune("²³¹⁰⁴⁵⁶⁷⁸⁹⁻", r):
		return errorAt(pos, "raised %c is no sign of the notation: write ^ with the exponent", r)
	case r == '≠':
		return errorAt(pos, "≠ is no relation of the notation: write < and > joined by or")
	case r == ']':
		return errorAt(pos, "] without [")
	case r == '_' || r == '{' || r == '\'':
		return errorAt(pos, "%c without a symbol before it", r)
	case unicode.IsPrint(r):
		return errorAt(pos, "%c is no sign of the notation", r)
	}
	return errorAt(pos, "%U is no sign of the notation", r)
}

func (s *scanner) number() (token, error) {
	t := token{kind: number, pos: Pos(s.at)}
	t.text = s.run(digit)
	if len(t.text) > 1 && t.text[0] == '0' {
		return t, errorAt(t.pos, "number begins with a zero: %s", clip(t.text))
	}
	if s.peek() == '.' {
		if !digit(s.ahead(1)) {
			return t, errorAt(t.pos, "number ends with a point: write %s", clip(t.text))
		}
		s.at++
		t.text += "." + s.run(digit)
	}
	if r := s.peek(); r == 'e' || r == 'E' {
		sign := 0
		if c := s.ahead(1); c == '-' || c == '+' || c == '−' {
			sign = 1
		}
		if digit(s.ahead(1 + sign)) {
			t.text += "e"
			if c := s.ahead(1); c == '-' || c == '−' {
				t.text += "-"
			}
			s.at += 1 + sign
			t.text += s.run(digit)
		}
	}
	if len(t.text) > 40 {
		return t, errorAt(t.pos, "number %s is too long", clip(t.text))
	}
	v, err := strconv.ParseFloat(t.text, 64)
	mantissa, _, _ := strings.Cut(t.text, "e")
	if err != nil || math.IsInf(v, 0) || v == 0 && strings.Trim(mantissa, "0.") != "" {
		return t, errorAt(t.pos, "number %s is out of range", t.text)
	}
	t.value = v
	return t, nil
}

func (s *scanner) unit() (token, error) {
	t := token{kind: unitLit, pos: Pos(s.at)}
	s.at++
	inner := s.run(func(r rune) bool { return r != ']' && r != '[' })
	if s.peek() != ']' {
		return t, errorAt(t.pos, "[ without ]")
	}
	s.at++
	if strings.TrimSpace(inner) == "" {
		return t, errorAt(t.pos, "no unit in brackets: write [mm], for a plain number 1")
	}
	u, err := quantity.ParseUnit(inner)
	if err != nil {
		return t, errorAt(t.pos, "%v", err)
	}
	t.unit, t.text = u, printUnit(u)
	return t, nil
}
