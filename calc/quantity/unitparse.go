package quantity

import (
	"fmt"
	"math"
	"strconv"
	"strings"
	"unicode"
	"unicode/utf8"
)

const (
	maxUnitLength = 80 // bytes
	maxPower      = 12 // of one unit
	maxTens       = 30 // power of ten in front
)

// ParseUnit reads a unit: products with '·' ('*'), powers (mm², mm2, mm^2, mm^(1/2)), one '/' before a unit
// or a bracketed product, a power of ten in front ("10⁶ mm⁴", "10^-6/K"). "" and "1" are the plain number.
// The error is an *Error; its Hint says what to write.
func ParseUnit(s string) (Unit, error) {
	s = strings.TrimSpace(s)
	if s == "" || s == "1" {
		return Unit{}, nil
	}
	if len(s) > maxUnitLength || !utf8.ValidString(s) {
		return Unit{}, &Error{Msg: quoted(s) + " is not a unit"}
	}
	p := &unitParser{whole: s, rest: strings.ReplaceAll(s, "℃", "°C"), over: 1, under: 1}
	p.unit()
	if p.err != nil {
		return Unit{}, p.err
	}
	u := Unit{p.name.String(), p.over / p.under, p.dim}
	if !(u.factor > smallest && u.factor < largest) || !u.dim.Valid() {
		return Unit{}, &Error{Msg: "unit " + quoted(s) + " is out of range"}
	}
	if u.name == "" {
		return Unit{}, nil
	}
	return u, nil
}

type unitParser struct {
	whole, rest string
	name        strings.Builder
	over, under float64
	dim         Dim
	err         *Error
}

func (p *unitParser) fail(msg, hint string) {
	if p.err == nil {
		p.err = &Error{msg, hint}
	}
}

func (p *unitParser) skip() { p.rest = strings.TrimLeftFunc(p.rest, unicode.IsSpace) }

func (p *unitParser) accept(signs ...string) bool {
	p.skip()
	rest, ok := cutAny(p.rest, signs...)
	p.rest = rest
	return ok
}

// unit = [tens] [product] ["/" (atom | "(" product ")")]
func (p *unitParser) unit() {
	tens := p.tens()
	p.skip()
	if p.rest != "" && !strings.HasPrefix(p.rest, "/") {
		if after, ok := strings.CutPrefix(p.rest, "1"); ok && strings.HasPrefix(strings.TrimSpace(after), "/") {
			p.rest = after
		} else {
			if tens {
				p.name.WriteByte(' ')
			}
			p.product(1)
		}
	} else if p.rest != "" && !tens {
		p.fail("unit "+quoted(p.whole)+" begins with /", "write 1"+clip(p.rest))
	}
	if p.err == nil && p.accept("/") {
		if n := p.name.Len(); n == 0 {
			p.name.WriteByte('1')
		}
		p.name.WriteByte('/')
		if p.accept("(") {
			p.name.WriteByte('(')
			p.product(-1)
			p.name.WriteByte(')')
			if p.err == nil && !p.accept(")") {
				p.fail("unit "+quoted(p.whole)+" has an open bracket", "")
			}
		} else {
			p.atom(-1)
			if p.err == nil && p.accept("·", "⋅", "*") {
				p.fail("unit "+quoted(p.whole)+" has a product after /", "put it in brackets, as 1/(MPa·d)")
			}
		}
	}
	p.skip()
	if p.err != nil || p.rest == "" {
		return
	}
	switch r, _ := utf8.DecodeRuneInString(p.rest); {
	case r == '/':
		p.fail("unit "+quoted(p.whole)+" has more than one /", "put the denominator in brackets, as 1/(MPa·d)")
	case unicode.IsLetter(r):
		p.fail("unit "+quoted(p.whole)+" has units side by side", "write "+p.name.String()+"·"+clip(p.rest))
	default:
		p.fail("unit "+quoted(p.whole)+" has "+quoted(p.rest)+" left over", "")
	}
}

// tens reads a power of ten in front.
func (p *unitParser) tens() bool {
	after, ok := strings.CutPrefix(p.rest, "10")
	if !ok {
		return false
	}
	hold := p.rest
	p.rest = after
	k, given := p.exponent(false)
	if p.err != nil {
		return false
	}
	if !given {
		p.rest = hold
		p.fail("unit "+quoted(p.whole)+" begins with a number", "write a power of ten as 10⁶ or 10^6")
		return false
	}
	if k.den != 0 || k.num == 0 || magnitude(int64(k.num)) > maxTens {
		p.fail(fmt.Sprintf("power of ten %v is out of range in unit %s", k, quoted(p.whole)), "")
		return false
	}
	p.name.WriteString("10" + k.superscriptAlways())
	p.scale(10, 1, k)
	return true
}

func (r Rat) superscriptAlways() string {
	if r == one {
		return "¹"
	}
	return r.superscript()
}

func (p *unitParser) product(sign int) {
	p.atom(sign)
	for p.err == nil && p.accept("·", "⋅", "*") {
		p.name.WriteString("·")
		p.atom(sign)
	}
}

// atom = name [exponent]
func (p *unitParser) atom(sign int) {
	p.skip()
	n := 0
	for n < len(p.rest) {
		r, size := utf8.DecodeRuneInString(p.rest[n:])
		if !unicode.IsLetter(r) && !strings.ContainsRune("°%‰'\"", r) {
			break
		}
		n += size
	}
	name := p.rest[:n]
	p.rest = p.rest[n:]
	if name == "" {
		switch {
		case digitsAt(p.rest) > 0:
			p.fail("unit "+quoted(p.whole)+" has a number in it", "")
		default:
			p.fail("unit "+quoted(p.whole)+" lacks a name"+where(p.rest), "")
		}
		return
	}
	parts, ok := joined[name]
	if !ok {
		parts[1] = name
	}
	last, ok := atoms[parts[1]]
	if !ok {
		p.unknown(name)
		return
	}
	if parts[0] != "" {
		f := atoms[parts[0]]
		p.name.WriteString(parts[0] + "·")
		p.dim = p.dim.Mul(f.dim.Pow(NewRat(sign, 1)))
		p.scale(f.over, f.under, NewRat(sign, 1))
		if sign < 0 && !strings.Contains(p.name.String(), "(") {
			p.fail("unit "+quoted(p.whole)+" has a product after /", "put it in brackets, as 1/(MPa·d)")
			return
		}
	}
	k, given := p.exponent(true)
	if p.err != nil {
		return
	}
	if !given {
		k = one
	}
	if !k.Valid() || k.num == 0 || math.Abs(k.Float()) > maxPower || k.den >= maxPower {
		p.fail(fmt.Sprintf("power of %s is out of range in unit %s", name, quoted(p.whole)), "")
		return
	}
	p.name.WriteString(parts[1] + k.superscript())
	k = k.Mul(NewRat(sign, 1))
	p.dim = p.dim.Mul(last.dim.Pow(k))
	p.scale(last.over, last.under, k)
}

func where(rest string) string {
	if rest == "" {
		return " at its end"
	}
	return " before " + quoted(rest)
}

// scale multiplies by (over/under)^k; whole powers stay exact products as long as they can.
func (p *unitParser) scale(over, under float64, k Rat) {
	if k.den != 0 {
		p.over *= math.Pow(over/under, k.Float())
		return
	}
	if k.num < 0 {
		over, under = under, over
	}
	for i := magnitude(int64(k.num)); i > 0; i-- {
		p.over *= over
		p.under *= under
	}
}

// exponent reads ², ⁻¹, ^2, ^-2, ^(1/2), ^(-1/2) and, where plain digits are one, 2.
func (p *unitParser) exponent(plain bool) (Rat, bool) {
	if after, ok := strings.CutPrefix(p.rest, "^"); ok {
		p.rest = after
		bracket := p.accept("(")
		n, ok := p.integer()
		d := 1
		if ok && bracket {
			if p.accept("/") {
				d, ok = p.integer()
			}
			ok = p.accept(")") && ok
		}
		if !ok {
			p.fail("unit "+quoted(p.whole)+" lacks an exponent after ^", "write it as mm^2")
		}
		return NewRat(n, d), true
	}
	if plain && digitsAt(p.rest) > 0 {
		k, ok := p.integer()
		if !ok {
			p.fail("unit "+quoted(p.whole)+" has an exponent out of range", "")
		}
		return NewRat(k, 1), true
	}
	var digits strings.Builder
	for {
		r, size := utf8.DecodeRuneInString(p.rest)
		if i := strings.IndexRune(string(raised), r); r == '⁻' && digits.Len() == 0 {
			digits.WriteByte('-')
		} else if i >= 0 && r != utf8.RuneError {
			for d, c := range raised {
				if c == r {
					digits.WriteByte(byte('0' + d))
				}
			}
		} else {
			break
		}
		p.rest = p.rest[size:]
	}
	if digits.Len() == 0 {
		return Rat{}, false
	}
	k, err := strconv.Atoi(digits.String())
	if err != nil {
		p.fail("unit "+quoted(p.whole)+" has an exponent out of range", "")
	}
	return NewRat(k, 1), true
}

func (p *unitParser) integer() (int, bool) {
	rest, neg := cutAny(p.rest, "-", "−")
	n := digitsAt(rest)
	if n == 0 || n > 4 {
		return 0, false
	}
	k, _ := strconv.Atoi(rest[:n])
	if neg {
		k = -k
	}
	p.rest = rest[n:]
	return k, true
}

// spoken are words and foreign spellings of units, with what to write.
var spoken = map[string]string{
	"c": "°C", "degc": "°C", "celsius": "°C", "kelvin": "K", "deg": "°", "degree": "°", "degrees": "°", "radian": "rad", "radians": "rad",
	"day": "d", "days": "d", "year": "y", "years": "y", "a": "y", "yr": "y", "hour": "h", "hours": "h", "hr": "h", "hrs": "h",
	"minute": "min", "minutes": "min", "mins": "min", "second": "s", "seconds": "s", "sec": "s",
	"percent": "%", "permille": "‰", "promille": "‰", "tonne": "t", "tonnes": "t", "metre": "m", "metres": "m", "meter": "m", "meters": "m",
	"newton": "N", "pascal": "Pa", "kilogram": "kg", "gram": "g", "millimetre": "mm",
}

func (p *unitParser) unknown(name string) {
	msg := "unknown unit " + quoted(name)
	if name != p.whole {
		msg += " in " + quoted(p.whole)
	}
	better, ok := spoken[strings.ToLower(name)]
	if !ok {
		known := make([]string, 0, len(atoms)+len(joined))
		for n := range atoms {
			known = append(known, n)
		}
		for n := range joined {
			known = append(known, n)
		}
		better, ok = Nearest(name, known)
	}
	if !ok {
		p.fail(msg, "")
		return
	}
	if parts, ok := joined[better]; ok {
		better = parts[0] + "·" + parts[1]
	}
	p.fail(msg, "write "+strings.Replace(p.whole, name, better, 1))
}
