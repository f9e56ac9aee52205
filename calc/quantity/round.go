package quantity

import (
	"math"
	"strconv"
	"strings"
)

// Rounding of values for the sheet. A float64 is taken as its decimal of 15 significant digits, the most
// that a float64 always keeps; on that decimal the rounding is done digit by digit. So 1.005, which no
// float64 holds exactly, rounds to 1.01 as it does on paper.

const maxDecimals = 400 // beyond what a float64 can hold

// decimal is v's magnitude as 0.d₁d₂…d₁₅·10^(exp+1): the first digit has the place 10^exp.
type decimal struct {
	digits [15]byte
	exp    int
	neg    bool
}

func newDecimal(v float64) (d decimal) {
	var buf [32]byte
	s := strconv.AppendFloat(buf[:0], math.Abs(v), 'e', 14, 64) // d.dddddddddddddde±xx
	d.digits[0] = s[0]
	copy(d.digits[1:], s[2:16])
	for _, c := range s[18:] {
		d.exp = d.exp*10 + int(c-'0')
	}
	if s[17] == '-' {
		d.exp = -d.exp
	}
	d.neg = v < 0
	return d
}

// raises reports whether dropping the digits from position keep on adds one to the last kept.
func (d *decimal) raises(keep int, away bool) bool {
	if keep >= len(d.digits) {
		return false
	}
	if !away {
		return keep >= 0 && d.digits[keep] >= '5'
	}
	for _, c := range d.digits[max(keep, 0):] {
		if c != '0' {
			return true
		}
	}
	return false
}

// Decimals gives the number of decimals that show the given significant digits of v as rounded: 1 for
// 1843.19 and five digits, −1 for 654321. It is 0 for v = 0 and for what is no number. Digits below 1 are
// taken as 1.
func Decimals(v float64, digits int) int {
	if v == 0 || math.IsNaN(v) || math.IsInf(v, 0) {
		return 0
	}
	digits = max(digits, 1)
	d := newDecimal(v)
	if d.raises(digits, false) && strings.Trim(string(d.digits[:digits]), "9") == "" {
		d.exp++ // 9.99996 in five digits is 10.000
	}
	return digits - 1 - d.exp
}

// Format writes v with the given decimals, rounded half away from zero on the 15-digit decimal; negative
// decimals round to tens, hundreds …. The minus sign is ASCII, zero has none. Decimals are bounded to ±400.
// A value that is no number comes out as "NaN", "+Inf" or "-Inf", which Value refuses.
func Format(v float64, decimals int) string { return format(v, decimals, false) }

// FormatUp writes v rounded away from zero: no ratio above unity comes out as 1.00. It works on the
// 15-digit decimal, so that noise behind the 15th digit raises nothing. Otherwise as Format.
func FormatUp(v float64, decimals int) string { return format(v, decimals, true) }

func format(v float64, decimals int, away bool) string {
	if math.IsNaN(v) || math.IsInf(v, 0) {
		return strconv.FormatFloat(v, 'g', -1, 64)
	}
	decimals = min(max(decimals, -maxDecimals), maxDecimals)
	d := newDecimal(v)
	if d.digits[0] == '0' {
		d.exp = 0
	}
	keep := d.exp + 1 + decimals

	// q is the whole number of units of the last place, with a leading zero for the carry.
	q := make([]byte, 1, max(keep, decimals, 0)-min(decimals, 0)+8)
	q[0] = '0'
	if keep > 0 {
		q = append(q, d.digits[:min(keep, len(d.digits))]...)
		for i := len(d.digits); i < keep; i++ {
			q = append(q, '0')
		}
	}
	if d.raises(keep, away) {
		i := len(q) - 1
		for ; q[i] == '9'; i-- {
			q[i] = '0'
		}
		q[i]++
	}

	if decimals < 0 {
		for i := decimals; i < 0; i++ {
			q = append(q, '0')
		}
		decimals = 0
	}
	first := 0
	for first < len(q)-1-decimals && q[first] == '0' {
		first++
	}
	out := make([]byte, 0, len(q)+decimals+3)
	if d.neg && strings.Trim(string(q), "0") != "" {
		out = append(out, '-')
	}
	whole := len(q) - decimals
	if whole <= 0 {
		out = append(out, '0')
	} else {
		out = append(out, q[first:whole]...)
	}
	if decimals > 0 {
		out = append(out, '.')
		for i := whole; i < 0; i++ {
			out = append(out, '0')
		}
		out = append(out, q[max(whole, 0):]...)
	}
	return string(out)
}

// Value reads a number as shown on a sheet, from Format or with '−' and digits grouped by spaces.
func Value(shown string) (float64, error) {
	number, rest, err := scanNumber(strings.TrimSpace(shown))
	if err != nil {
		return 0, err
	}
	if rest != "" {
		return 0, &Error{Msg: quoted(shown) + " is not a number alone"}
	}
	return numeric(number)
}

// Agree reports whether a and b differ by no more than the noise of the computation, 16 units of a float64's
// last place (3.6e-15 of their size). Different decimals of 14 digits never agree; what a checker writes down
// as the same number compares as the same number, whatever the way it was computed.
func Agree(a, b float64) bool {
	return a == b || math.Abs(a-b) <= 16*0x1p-52*max(math.Abs(a), math.Abs(b))
}
