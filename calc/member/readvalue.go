package member

import (
	"errors"
	"math"
	"regexp"
	"slices"
	"strings"

	"soffit/calc/node"
	"soffit/calc/quantity"
)

// number is the beginning of a value that looks like one, with a point or a comma.
var number = regexp.MustCompile(`^[+\-−]?[0-9]+([.,][0-9]+)?([eE][+\-−]?[0-9]+)?`)

// value reads a number with its unit, of the dimension of the example and within the bounds.
func (r *reader) value(n *node.Node, f *field, to *Value) {
	s, ok := r.text(n, f, valueType)
	if !ok {
		return
	}
	want := f.eg.Unit.Dim()
	l, err := quantity.ParseAs(s, want)
	if err != nil {
		r.find(placeOf(n), f.key+": have "+have(n)+", want "+f.want(valueType), f.write(s, err))
		return
	}
	if !f.within(l) {
		r.find(placeOf(n), f.key+": have "+l.String()+", want "+f.range_(), f.inRange(l))
		return
	}
	*to = Value{l, Origin{Pos: n.Pos, Given: true}}
}

func (f *field) within(l quantity.Literal) bool {
	v := l.Quantity().Value
	return (f.low == nil || v >= f.low.Quantity().Value) && (f.high == nil || v <= f.high.Quantity().Value)
}

func (f *field) range_() string {
	switch {
	case f.low == nil:
		return "at most " + f.high.String()
	case f.high == nil:
		return "at least " + f.low.String()
	}
	return f.low.String() + " to " + f.high.String()
}

// inRange proposes the unit that was forgotten or mistaken, or the bounds.
func (f *field) inRange(l quantity.Literal) string {
	if u := f.unitFor(l.Number); u != l.Unit {
		if m := (quantity.Literal{Number: l.Number, Unit: u}); f.within(m) {
			return "write " + m.String()
		}
	}
	if f.what != "" {
		return "write a value within these bounds: " + f.what
	}
	return "write a value within these bounds"
}

// write is the hint for what cannot be read as a value of the dimension wanted.
func (f *field) write(s string, err error) string {
	var e *quantity.Error
	if !errors.As(err, &e) {
		return ""
	}
	if l, err := quantity.Parse(s); err == nil {
		return f.other(l)
	}
	if proposal, ok := strings.CutPrefix(e.Hint, "write "); ok {
		if strings.Contains(proposal, " or ") { // a comma that can be read in two ways
			return e.Hint
		}
		if l, err := quantity.ParseAs(proposal, f.eg.Unit.Dim()); err == nil && f.within(l) {
			return e.Hint
		}
	}
	for _, mended := range []string{digits(s), pointed(s)} {
		if l, err := quantity.ParseAs(mended, f.eg.Unit.Dim()); err == nil && mended != s {
			return "write " + l.String()
		}
	}
	if strings.Contains(e.Msg, "does not begin with a number") {
		return "write, for example, " + f.example
	}
	if strings.HasPrefix(e.Msg, "unknown unit") && e.Hint == "" {
		return e.Msg + "; write, for example, " + f.example
	}
	found := strings.Replace(number.FindString(strings.TrimSpace(s)), ",", ".", 1)
	if l, err := quantity.Parse(found); err == nil {
		return f.other(l)
	}
	return e.Msg + "; write, for example, " + f.example
}

// gravity turns a mass into its weight.
var gravity = quantity.Literal{Number: "9.81", Unit: quantity.MustUnit("m/s²")}.Quantity()

// other is the hint for a value that can be read, but is of another dimension: a unit left out or mistaken, a mass
// instead of its weight, a load by area instead of by length.
func (f *field) other(l quantity.Literal) string {
	have, want := l.Unit.Dim(), f.eg.Unit.Dim()
	switch {
	case have.Mul(gravity.Dim) == want:
		weight := f.eg.Unit.From(l.Quantity().Value * gravity.Value)
		return "write " + quantity.Literal{Number: short(weight), Unit: f.eg.Unit}.String() + ", the weight of " + l.String()
	case have.Mul(quantity.Length) == want && have != quantity.None:
		return "write, for example, " + f.example + ": " + l.String() + " times the width that goes with it"
	case have != quantity.None || l.Unit.String() == "":
		if m := (quantity.Literal{Number: l.Number, Unit: f.unitFor(l.Number)}); f.within(m) {
			return "write " + m.String()
		}
	}
	return "write, for example, " + f.example
}

// digits replaces letters that stand for digits in a number, the O of "16O mm".
func digits(s string) string {
	n := strings.IndexFunc(s, func(r rune) bool { return !strings.ContainsRune("0123456789.OolI", r) })
	if n <= 0 || s[0] < '0' || s[0] > '9' {
		return s
	}
	return strings.NewReplacer("O", "0", "o", "0", "l", "1", "I", "1").Replace(s[:n]) + s[n:]
}

// grouped is a number in groups of three behind points, with a decimal comma.
var grouped = regexp.MustCompile(`^[0-9]{1,3}((?:\.[0-9]{3})+),[0-9]+`)

// pointed writes such a number with a decimal point alone.
func pointed(s string) string {
	n := len(grouped.FindString(s))
	return strings.Replace(strings.ReplaceAll(s[:n], ".", ""), ",", ".", 1) + s[n:]
}

// shared are units of one dimension that a number without unit may have been meant in.
var shared = [][]quantity.Unit{
	{quantity.MustUnit("mm"), quantity.MustUnit("m")},
	{quantity.MustUnit("MPa"), quantity.MustUnit("GPa")},
	{quantity.MustUnit("kN"), quantity.MustUnit("N")},
}

// unitFor is the unit in which a number comes nearest to the example.
func (f *field) unitFor(number string) quantity.Unit {
	best := f.eg.Unit
	far := func(u quantity.Unit) float64 {
		v := quantity.Literal{Number: number, Unit: u}.Quantity().Value
		return math.Abs(math.Log(math.Abs(v) / math.Abs(f.eg.Quantity().Value)))
	}
	for _, units := range shared {
		if !slices.Contains(units, best) {
			continue
		}
		for _, u := range units {
			if far(u) < far(best) {
				best = u
			}
		}
		break
	}
	return best
}
