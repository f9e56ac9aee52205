package mathset

import (
	"strings"

	"soffit/report/draw"
)

// number sets a number as written: minus sign, digits before the point in groups of three from five
// digits on, a power of ten for an exponent.
func number(f draw.Face, size draw.Pt, s string) Box {
	mantissa, exponent, power := strings.Cut(strings.Replace(s, "E", "e", 1), "e")
	if !power {
		return text(f, size, grouped(mantissa))
	}
	ten := raised(f, size, "10", strings.TrimPrefix(strings.TrimLeft(strings.Replace(exponent, "-", "−", 1), "+"), "0"))
	if strings.HasPrefix(exponent, "-0") {
		ten = raised(f, size, "10", "−"+strings.TrimLeft(exponent[1:], "0"))
	}
	if mantissa == "1" {
		return ten
	}
	return row(text(f, size, grouped(mantissa)), times(f, size), ten)
}

func times(f draw.Face, size draw.Pt) Box {
	var b Box
	b.space(thin * size)
	b.add(text(f, size, "×"))
	b.space(thin * size)
	return b
}

// grouped is a number's text with minus sign and thin spaces.
func grouped(s string) string {
	sign := ""
	if t, ok := strings.CutPrefix(s, "-"); ok {
		sign, s = "−", t
	} else if t, ok := strings.CutPrefix(s, "−"); ok {
		sign, s = "−", t
	}
	whole, _, _ := strings.Cut(s, ".")
	if len(whole) < 5 || strings.Trim(whole, "0123456789") != "" {
		return sign + s
	}
	var b strings.Builder
	b.WriteString(sign)
	for i, d := range whole {
		if i > 0 && (len(whole)-i)%3 == 0 {
			b.WriteRune('\u2009')
		}
		b.WriteRune(d)
	}
	b.WriteString(s[len(whole):])
	return b.String()
}

func raised(f draw.Face, size draw.Pt, base, exponent string) Box {
	b := text(f, size, base)
	b.space(0.02 * size)
	e := text(f, scriptOf(size), exponent)
	b.put(b.Width, -supUp*size, e)
	b.Width += e.Width
	return b
}

// superscripts are the raised figures of unit names and the plain ones they are set from.
var superscripts = map[rune]string{'⁰': "0", '¹': "1", '²': "2", '³': "3", '⁴': "4", '⁵': "5", '⁶': "6",
	'⁷': "7", '⁸': "8", '⁹': "9", '⁻': "−"}

// unit sets a unit's name upright, its powers raised: "mm²", "10⁶ mm⁴", "kN/m²".
func unit(f draw.Face, size draw.Pt, s string) Box {
	var b Box
	var plain, power strings.Builder
	flush := func() {
		if plain.Len() > 0 {
			b.add(text(f, size, plain.String()))
			plain.Reset()
		}
		if power.Len() > 0 {
			e := text(f, scriptOf(size), power.String())
			b.space(0.03 * size)
			b.put(b.Width, -0.36*size, e)
			b.Width += e.Width
			power.Reset()
		}
	}
	for _, r := range s {
		up, ok := superscripts[r]
		switch {
		case ok:
			power.WriteString(up)
		case r == ' ':
			flush()
			b.space(thin * size)
		default:
			if power.Len() > 0 {
				flush()
			}
			plain.WriteRune(r)
		}
	}
	flush()
	return b
}

// quantity sets number and unit.
func quantity(number Box, f draw.Face, size draw.Pt, u string) Box {
	if u == "" {
		return number
	}
	b := row(number)
	switch {
	case strings.HasPrefix(u, "10"):
		b.add(times(f, size))
	case u == "°":
	default:
		b.space(unitGap * size)
	}
	b.add(unit(f, size, u))
	return b
}
