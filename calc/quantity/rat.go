package quantity

import "strconv"

// Rat is a rational exponent in lowest terms. The zero value is 0; equal values compare equal with ==.
//
// Numerator and denominator stay below 2³⁰. What would need more, and a denominator of zero, becomes
// the one Rat that is not Valid; it stays so through every further operation and never equals a number.
type Rat struct {
	num int32
	den int32 // denominator − 1, so that the zero value is 0/1; −1 marks a value out of range
}

const ratLimit = 1<<30 - 1

var outOfRange = Rat{den: -1}

// NewRat gives n/d in lowest terms; it is not Valid where d is 0 or the terms are too large.
func NewRat(n, d int) Rat { return newRat(int64(n), int64(d)) }

func newRat(n, d int64) Rat {
	if d == 0 {
		return outOfRange
	}
	p, q := magnitude(n), magnitude(d)
	g := p
	for r := q; r != 0; {
		g, r = r, g%r
	}
	p, q = p/g, q/g
	if p > ratLimit || q > ratLimit {
		return outOfRange
	}
	num := int32(p)
	if (n < 0) != (d < 0) {
		num = -num
	}
	return Rat{num, int32(q) - 1}
}

func magnitude(n int64) uint64 {
	if n < 0 {
		return -uint64(n)
	}
	return uint64(n)
}

// Valid reports whether r is a number, not the mark of an exponent out of range.
func (r Rat) Valid() bool { return r.den >= 0 }

// Num gives the numerator, with the sign.
func (r Rat) Num() int { return int(r.num) }

// Den gives the denominator, at least 1; 0 where r is not Valid.
func (r Rat) Den() int { return int(r.den) + 1 }

// Float gives r as a float64, for use as an exponent; NaN where r is not Valid.
func (r Rat) Float() float64 { return float64(r.num) / float64(r.Den()) }

// Add gives r + s.
func (r Rat) Add(s Rat) Rat {
	n, d, e := int64(r.num), int64(r.Den()), int64(s.Den())
	return newRat(n*e+int64(s.num)*d, d*e)
}

// Mul gives r·s.
func (r Rat) Mul(s Rat) Rat {
	return newRat(int64(r.num)*int64(s.num), int64(r.Den())*int64(s.Den()))
}

// Neg gives −r.
func (r Rat) Neg() Rat { return Rat{-r.num, r.den} }

// Sign is −1, 0 or 1.
func (r Rat) Sign() int {
	switch {
	case r.num < 0:
		return -1
	case r.num > 0:
		return 1
	}
	return 0
}

// String gives "2", "-1", "2/3".
func (r Rat) String() string {
	switch {
	case !r.Valid():
		return "out of range"
	case r.den == 0:
		return strconv.Itoa(int(r.num))
	}
	return strconv.Itoa(int(r.num)) + "/" + strconv.Itoa(r.Den())
}

// superscript writes an exponent behind a unit or the name of a dimension: "" for 1, "²", "⁻¹", "^(2/3)".
func (r Rat) superscript() string {
	if r == (Rat{num: 1}) {
		return ""
	}
	if !r.Valid() || r.den != 0 {
		return "^(" + r.String() + ")"
	}
	var s []rune
	for _, c := range r.String() {
		if c == '-' {
			s = append(s, '⁻')
		} else {
			s = append(s, raised[c-'0'])
		}
	}
	return string(s)
}

var raised = []rune("⁰¹²³⁴⁵⁶⁷⁸⁹")
