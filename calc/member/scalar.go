package member

import (
	"fmt"
	"math"
	"reflect"
	"strconv"
	"strings"

	"soffit/calc/node"
	"soffit/calc/quantity"
)

// want says in words what belongs to a key.
func (f *field) want(t reflect.Type) string {
	switch {
	case t == valueType && f.example == "":
		return "a value"
	case t == valueType:
		return f.eg.Unit.Dim().Indefinite()
	case f.words != nil && t.Kind() != reflect.Slice:
		return either(f.words)
	}
	switch t {
	case countType:
		return "a whole number"
	case dateType:
		return "a date"
	case wordType:
		return "text"
	}
	if t.Kind() == reflect.Slice {
		return "a list"
	}
	return "keys"
}

// add is the hint where the key is missing.
func (f *field) add(t reflect.Type) string {
	if f.example != "" {
		return "add, for example, " + f.key + ": " + f.example
	}
	hint := "add " + f.key + ":"
	if t.Kind() == reflect.Slice {
		t = t.Elem()
		hint += " and below it rows, each beginning with -,"
	}
	if t.Kind() == reflect.Struct {
		if keys := planOf(t).required(); len(keys) > 0 {
			hint += " with " + strings.Join(keys, ", ")
		}
	}
	return hint
}

// text is what a scalar holds; anything else is found.
func (r *reader) text(n *node.Node, f *field, t reflect.Type) (string, bool) {
	if n.Kind != node.Scalar || n.Text == "" {
		hint := ""
		if f.words != nil {
			hint = "write " + either(f.words)
		} else if f.example != "" {
			hint = "write, for example, " + f.example
		}
		r.find(placeOf(n), f.key+": have "+have(n)+", want "+f.want(t), hint)
		return "", false
	}
	return n.Text, true
}

// count reads a whole number from 1.
func (r *reader) count(n *node.Node, f *field, to *Count) {
	s, ok := r.text(n, f, countType)
	if !ok {
		return
	}
	k, err := strconv.Atoi(s)
	if err != nil || k < 1 || k > f.most || strconv.Itoa(k) != s {
		hint := "write, for example, " + f.example
		if l, err := quantity.Parse(number.FindString(s)); err == nil {
			if v := l.Quantity().Value; v == math.Trunc(v) && v >= 1 && v <= float64(f.most) {
				hint = "write " + strconv.Itoa(int(v))
			}
		}
		r.find(placeOf(n), fmt.Sprintf("%s: have %s, want a whole number from 1 to %d", f.key, have(n), f.most), hint)
		return
	}
	*to = Count{k, Origin{Pos: n.Pos, Given: true}}
}
