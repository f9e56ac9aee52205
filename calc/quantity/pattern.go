package quantity

import (
	"cmp"
	"slices"
	"strings"
)

// classes are the dimensions that have units with names of their own.
var classes = []Dim{Stress, Force, Mass, Length, Time, Temperature}

// couples are those of which the trade makes quotients, kN/m³, and products, kN·m.
var couples = []struct {
	over, under Dim
	product     bool
}{{Force, Length, true}, {Mass, Length, false}, {Length, Time, false}}

// powers are the spellings of an exponent, in regular expressions.
var powers = [...]string{1: "", 2: `(²|2|\^2)`, 3: `(³|3|\^3)`, 4: `(⁴|4|\^4)`}

// UnitPattern is a regular expression, without anchors, for the units of a dimension as the trade writes them: a
// unit, its power, a quotient or a product of two. ParseUnit reads each of them; it reads more, such as powers of ten
// and longer products. The expression is of the part that RE2 and ECMA-262 share.
//
// The units of a plain number are its signs, such as % and ‰. Where the trade has no unit for the dimension it is "".
func (d Dim) UnitPattern() string {
	if d.IsNone() {
		return alternatives(None)
	}
	var forms []string
	add := func(of Dim, form string) {
		if of == d {
			forms = append(forms, form)
		}
	}
	for n := 1; n < len(powers); n++ {
		power := NewRat(n, 1)
		for _, c := range classes {
			add(c.Pow(power), raisedTo(c, n))
			add(None.Div(c.Pow(power)), "1/"+raisedTo(c, n))
		}
		for _, c := range couples {
			add(c.over.Div(c.under.Pow(power)), alternatives(c.over)+"/"+raisedTo(c.under, n))
			if c.product {
				add(c.over.Mul(c.under.Pow(power)), alternatives(c.over)+"[·*]"+raisedTo(c.under, n))
			}
		}
	}
	var sideBySide []string
	for name, parts := range joined {
		if atoms[parts[0]].dim.Mul(atoms[parts[1]].dim) == d {
			sideBySide = append(sideBySide, name)
		}
	}
	slices.Sort(sideBySide)
	forms = append(forms, sideBySide...)
	if len(forms) < 2 {
		return strings.Join(forms, "")
	}
	return "(" + strings.Join(forms, "|") + ")"
}

func raisedTo(class Dim, n int) string { return alternatives(class) + powers[n] }

// alternatives are the units of one class, the smallest first.
func alternatives(class Dim) string {
	var names []string
	for name, a := range atoms {
		if a.dim == class {
			names = append(names, name)
		}
	}
	slices.SortFunc(names, func(a, b string) int {
		x, y := atoms[a], atoms[b]
		return cmp.Or(cmp.Compare(x.over*y.under, y.over*x.under), strings.Compare(a, b))
	})
	return "(" + strings.Join(names, "|") + ")"
}

// NumberPattern is a regular expression, without anchors, for the number of a value as Parse reads it, with a minus or
// without one. The expression is of the part that RE2 and ECMA-262 share.
func NumberPattern(minus bool) string {
	sign := `\+?`
	if minus {
		sign = `[-−+]?`
	}
	return sign + `([1-9][0-9]{0,2}(\p{Zs}[0-9]{3})+|0|[1-9][0-9]*)(\.[0-9]+)?([eE][-−+]?[0-9]+)?`
}
