package quantity

import (
	"math"
	"strconv"
	"strings"
	"unicode"
	"unicode/utf8"
)

// Literal is a value as someone wrote it: "1200 kN".
type Literal struct {
	Number string // as written, with ASCII '-' and '.', without spaces
	Unit   Unit
}

// Quantity gives the value in base units. A Literal from Parse has always one; another whose Number cannot
// be read gives NaN.
func (l Literal) Quantity() Quantity {
	v, err := numeric(l.Number)
	if err != nil {
		v = math.NaN()
	}
	return Quantity{l.Unit.To(v), l.Unit.dim}
}

// String gives "1200 kN", "0.85", "5 %"; a power of ten in the unit is joined as a factor, "5·10⁶ mm⁴".
func (l Literal) String() string {
	switch {
	case l.Unit.name == "":
		return l.Number
	case strings.HasPrefix(l.Unit.name, "10"):
		return l.Number + "·" + l.Unit.name
	}
	return l.Number + " " + l.Unit.name
}

// The bounds of a value in base units: beyond them lies no quantity of the trade, and squares would run out
// of range.
const (
	smallest = 1e-100
	largest  = 1e100
)

const maxLiteral = 250 // bytes

// Parse reads a number with its unit, "1200 kN", "−0.5 ‰", "12 500 mm²", "1e-5 1/K", or a plain number. The
// error is an *Error; its Hint says what to write.
func Parse(s string) (Literal, error) {
	s = strings.TrimSpace(s)
	if !utf8.ValidString(s) {
		return Literal{}, &Error{Msg: "value is not text in UTF-8"}
	}
	if len(s) > maxLiteral {
		return Literal{}, &Error{Msg: "value is too long: " + quoted(s[:maxLiteral])}
	}
	number, rest, err := scanNumber(s)
	if err != nil {
		return Literal{}, err
	}
	v, err := numeric(number)
	if err != nil {
		return Literal{}, err
	}
	rest = strings.TrimSpace(rest)
	if after, ok := cutAny(rest, "·", "×", "*"); ok { // 5·10⁶ mm⁴
		if after = strings.TrimSpace(after); !strings.HasPrefix(after, "10") {
			return Literal{}, &Error{Msg: quoted(s) + " has a product sign after the number", Hint: "write " + number + " " + clip(after)}
		}
		rest = after
	}
	u, err := ParseUnit(rest)
	if err != nil {
		e := *err.(*Error)
		if w, ok := strings.CutPrefix(e.Hint, "write "); ok {
			e.Hint = "write " + number + " " + w
		}
		return Literal{}, &e
	}
	if b := math.Abs(u.To(v)); b != 0 && (b < smallest || b > largest) || b == 0 && v != 0 {
		return Literal{}, &Error{Msg: quoted(s) + " is out of range"}
	}
	return Literal{number, u}, nil
}

// ParseAs is Parse for a value whose dimension is known: a missing unit and another dimension are errors that
// say what to write.
func ParseAs(s string, want Dim) (Literal, error) {
	l, err := Parse(s)
	if err == nil {
		err = l.Want(want)
	}
	return l, err
}

// Want gives an error where l does not have the dimension wanted: "have 350 kN, want a length: write 350 mm".
// The unit proposed is the customary one.
func (l Literal) Want(want Dim) error {
	if l.Unit.dim == want {
		return nil
	}
	proposal := Literal{l.Number, want.Customary()}
	return &Error{Msg: "have " + l.String() + ", want " + want.Indefinite(), Hint: "write " + proposal.String()}
}

// scanNumber cuts the number off the front of s and normalises it; the rest is untouched.
func scanNumber(s string) (number, rest string, err error) {
	fail := func(msg, hint string) (string, string, error) { return "", "", &Error{msg, hint} }
	if s == "" {
		return fail("empty value", "write a number with its unit")
	}
	body := s
	sign := ""
	if after, ok := cutAny(body, "-", "−"); ok {
		sign, body = "-", after
	} else if after, ok := strings.CutPrefix(body, "+"); ok {
		body = after
	}
	n := digitsAt(body)
	if n == 0 {
		if d := digitsAt(strings.TrimPrefix(body, ".")); d > 0 && body[0] == '.' {
			return fail(quoted(s)+" begins with a point", "write "+sign+"0"+clip(body))
		}
		return fail(quoted(s)+" does not begin with a number", "write a number with its unit")
	}
	whole, body := body[:n], body[n:]
	for n <= 3 && whole[0] != '0' { // groups of three, 12 500
		r, size := utf8.DecodeRuneInString(body)
		if !unicode.Is(unicode.Zs, r) || digitsAt(body[size:]) != 3 || strings.ContainsAny(first(body[size+3:]), "⁰¹²³⁴⁵⁶⁷⁸⁹⁻^") {
			break
		}
		whole, body = whole+body[size:size+3], body[size+3:]
	}
	if len(whole) > 1 && whole[0] == '0' {
		w := strings.TrimLeft(whole[:len(whole)-1], "0") + whole[len(whole)-1:]
		return fail(quoted(s)+" begins with a zero", "write "+sign+w+clip(body))
	}
	if strings.HasPrefix(body, ",") {
		n := digitsAt(body[1:])
		tail := clip(body[1+n:])
		switch {
		case n == 3 && sign+whole != "0" && !strings.ContainsAny(first(body[1+n:]), ".,"):
			return fail("comma in "+quoted(s), "write "+sign+whole+"."+body[1:4]+tail+" or "+sign+whole+body[1:4]+tail)
		case n > 0 && strings.ContainsAny(first(body[1+n:]), ".,"):
			return fail("comma in "+quoted(s), "write "+sign+whole+strings.ReplaceAll(clip(body), ",", ""))
		case n > 0:
			return fail("decimal comma in "+quoted(s), "write "+sign+whole+"."+body[1:1+n]+tail)
		}
		return fail("comma in "+quoted(s), "write "+sign+whole+tail)
	}
	number = sign + whole
	if after, ok := strings.CutPrefix(body, "."); ok {
		n := digitsAt(after)
		if n == 0 {
			return fail(quoted(s)+" has a point without decimals", "write "+number+clip(after))
		}
		number, body = number+"."+after[:n], after[n:]
		if body != "" && (body[0] == '.' || body[0] == ',') {
			return fail(quoted(s)+" has more than one point or comma", "")
		}
	}
	if body != "" && (body[0] == 'e' || body[0] == 'E') {
		after, sign := body[1:], ""
		if a, ok := cutAny(after, "-", "−"); ok {
			sign, after = "-", a
		} else if a, ok := strings.CutPrefix(after, "+"); ok {
			after = a
		}
		if n := digitsAt(after); n > 0 {
			number, body = number+"e"+sign+after[:n], after[n:]
		}
	}
	return number, body, nil
}

// numeric gives the value of a normalised number; it must be finite, of at most 15 significant digits, and 0
// only if it is written so.
func numeric(number string) (float64, error) {
	mantissa, _, _ := strings.Cut(number, "e")
	significant := strings.TrimLeft(strings.Replace(strings.TrimPrefix(mantissa, "-"), ".", "", 1), "0")
	if len(significant) > 15 && strings.Trim(significant[15:], "0") != "" {
		return 0, &Error{Msg: quoted(number) + " has more than 15 significant digits"}
	}
	v, err := strconv.ParseFloat(number, 64)
	if err != nil || math.IsInf(v, 0) || math.IsNaN(v) || v == 0 && significant != "" {
		return 0, &Error{Msg: quoted(number) + " is out of range"}
	}
	return v + 0, nil // no −0
}

func digitsAt(s string) int {
	n := 0
	for n < len(s) && '0' <= s[n] && s[n] <= '9' {
		n++
	}
	return n
}

func first(s string) string {
	_, n := utf8.DecodeRuneInString(s)
	return s[:n]
}

func cutAny(s string, prefixes ...string) (string, bool) {
	for _, p := range prefixes {
		if after, ok := strings.CutPrefix(s, p); ok {
			return after, true
		}
	}
	return s, false
}

// clip bounds text taken over into a message.
func clip(s string) string {
	const most = 40
	if utf8.RuneCountInString(s) <= most {
		return s
	}
	return string([]rune(s)[:most]) + "…"
}

// quoted prints what was written without control characters; bounded.
func quoted(s string) string {
	s = strings.Map(func(r rune) rune {
		if !unicode.IsPrint(r) {
			return '\uFFFD'
		}
		return r
	}, s)
	return clip(s)
}
