package member

import (
	"fmt"
	"reflect"
	"slices"
	"strings"

	"soffit/calc/diag"
	"soffit/calc/node"
	"soffit/calc/quantity"
)

// mostRows is how many rows a list of the member file may have.
const mostRows = 100

// mapping reads a group of keys into a struct by its plan. label and at name the group in findings about what
// is missing.
func (r *reader) mapping(n *node.Node, into reflect.Value, label string, at place) {
	p := planOf(into.Type())
	if n.Kind == node.Broken {
		return
	}
	if p.place >= 0 {
		into.Field(p.place).Set(reflect.ValueOf(n.Pos))
	}
	if n.Kind != node.Mapping {
		keys := p.required()
		if len(keys) == 0 {
			keys = p.all()
		}
		r.find(placeOf(n), label+": have "+have(n)+", want keys", "write "+strings.Join(keys, ", ")+" on lines of their own below, further in")
		return
	}
	if len(n.Entries) == 0 && len(p.required()) == 0 {
		r.find(placeOf(n), label+": have no keys, want "+either(p.all()), "write them, or remove this")
		return
	}
	seen := r.entries(n, p, label)
	for i := range p.fields {
		if f := &p.fields[i]; f.or != "" {
			r.oneOf(f, p, seen, label, at)
		}
		r.field(&p.fields[i], p, seen, into, label, at, n.Pos)
	}
}

// required are the keys that have to be there.
func (p *plan) required() []string {
	var keys []string
	for i := range p.fields {
		if f := &p.fields[i]; !f.optional && f.std == "" && f.with == "" && f.when == "" {
			keys = append(keys, f.key)
		}
	}
	return keys
}

// entries sorts the keys of a mapping; unknown and repeated ones are found. What stands under a mistyped key
// is read as what was meant, so that nothing wrong in it stays hidden.
func (r *reader) entries(n *node.Node, p *plan, label string) map[string]node.Entry {
	seen, meant := map[string]node.Entry{}, map[string]node.Entry{}
	word := wordIn(n)
	for _, e := range n.Entries {
		key := e.Key.Text
		f := p.find(key)
		if f == nil {
			near, hint := p.meant(key, word)
			r.find(placeOf(e.Key), fmt.Sprintf("%s: unknown key in %s", clip(key), label), hint)
			if _, ok := meant[near]; !ok && near != "" {
				meant[near] = e
			}
			continue
		}
		if first, ok := seen[key]; ok {
			r.find(placeOf(e.Key), fmt.Sprintf("%s: second time, first on line %d", key, first.Key.Pos.Line), "remove one of them")
			continue
		}
		seen[key] = e
	}
	for near, e := range meant {
		if _, ok := seen[near]; !ok {
			seen[near] = e
		}
	}
	return seen
}

// meant is the key that an unknown one is likely meant for, "" where none is, and the hint.
func (p *plan) meant(key string, word func(string) string) (near, hint string) {
	keys := p.keys(word)
	for _, k := range []string{key, strings.ReplaceAll(key, "_", " ")} {
		if near, ok := quantity.Nearest(k, keys); ok {
			return near, "write " + near
		}
	}
	hint = "the keys here: " + strings.Join(keys, ", ")
	if known := homes()[key]; len(known) > 0 && known[0] == "" {
		hint = key + " stands at the margin, in no group; " + hint
	} else if len(known) > 0 {
		hint = key + " belongs under " + known[0] + "; " + hint
	}
	return "", hint
}

// wordIn tells the word of a key of the mapping as written, "" where there is none.
func wordIn(n *node.Node) func(string) string {
	return func(key string) string {
		for _, e := range n.Entries {
			if e.Key.Text == key && e.Value.Kind == node.Scalar {
				return e.Value.Text
			}
		}
		return ""
	}
}

// field reads one key, or lets its default stand in.
func (r *reader) field(f *field, p *plan, seen map[string]node.Entry, into reflect.Value, label string, at place, origin diag.Pos) {
	e, written := seen[f.key]
	to := into.Field(f.index)
	if belongs, decided := r.belongs(f, p, seen, e, written); !belongs {
		return
	} else if written {
		r.read(e, f, to)
		return
	} else if f.std != "" {
		standIn(f, to, origin)
		return
	} else if f.optional || !decided {
		return
	}
	msg := label + ": have no " + f.key
	if to.Kind() != reflect.Struct || isScalar(to.Type()) {
		msg += ", want " + f.want(to.Type())
	}
	r.find(at, msg, f.add(to.Type()))
}

// oneOf finds two keys of which one stands in the place of the other, and the lack of both. Where a key that belongs
// beside one of them is there, it has its finding already.
func (r *reader) oneOf(f *field, p *plan, seen map[string]node.Entry, label string, at place) {
	_, first := seen[f.key]
	second, also := seen[f.or]
	switch {
	case first && also:
		r.find(placeOf(second.Value), f.or+": have it beside "+f.key+", want one of them", "write one of them here, and the other in a row of its own")
	case !first && !also && !slices.ContainsFunc(p.fields, func(o field) bool {
		_, there := seen[o.key]
		return there && (o.with == f.key || o.with == f.or)
	}):
		r.find(at, label+": have no "+f.key+" and no "+f.or+", want one of them", "add, for example, "+f.key+": "+f.example)
	}
}

// belongs reports whether the key has its place here, and whether that is certain. A key that is written
// where it does not belong is found.
func (r *reader) belongs(f *field, p *plan, seen map[string]node.Entry, e node.Entry, written bool) (belongs, decided bool) {
	if f.when != "" {
		by, ok := seen[f.when]
		known := ok && by.Value.Kind == node.Scalar && slices.Contains(p.find(f.when).words, by.Value.Text)
		if !known {
			return true, false
		}
		if !slices.Contains(f.of, by.Value.Text) {
			if written {
				r.find(placeOf(e.Key), fmt.Sprintf("%s: does not go with %s %s, but with %s", f.key, f.when, by.Value.Text, either(f.of)), "remove it, or change "+f.when)
			}
			return false, true
		}
	}
	if f.with != "" {
		if _, ok := seen[f.with]; !ok {
			if written {
				beside := p.find(f.with)
				r.find(placeOf(e.Key), fmt.Sprintf("%s: have no %s beside it", f.key, f.with), "add, for example, "+f.with+": "+beside.example)
			}
			return false, true
		}
	}
	return true, true
}

// read reads a value of whatever type into its field.
func (r *reader) read(e node.Entry, f *field, to reflect.Value) {
	mark(to, e.Value.Pos)
	if e.Value.Kind == node.Broken {
		return
	}
	switch to := to.Addr().Interface().(type) {
	case *Value:
		r.value(e.Value, f, to)
	case *Count:
		r.count(e.Value, f, to)
	case *Word:
		r.word(e.Value, f, to)
	case *Date:
		r.date(e.Value, f, to)
	case *NationalParameters:
		r.nationalParameters(e.Value, to)
	case *Narrative:
		r.narrative(e.Value, to)
	case **node.Node:
		*to = e.Value
	default:
		r.group(e, f, reflect.ValueOf(to).Elem())
	}
}

// mark tells a value that cannot be read from one that was left out.
func mark(to reflect.Value, at diag.Pos) {
	o := Origin{Pos: at, Given: true}
	switch to := to.Addr().Interface().(type) {
	case *Value:
		to.Origin = o
	case *Count:
		to.Origin = o
	case *Word:
		to.Origin = o
	case *Date:
		to.Origin = o
	}
}

// group reads a mapping, or a list of mappings or words.
func (r *reader) group(e node.Entry, f *field, to reflect.Value) {
	if to.Kind() == reflect.Struct {
		r.mapping(e.Value, to, f.key, placeOf(e.Key))
		return
	}
	if e.Value.Kind != node.List {
		hint := "begin each row with - on a line of its own below"
		if f.words != nil {
			hint = "write [" + e.Value.Text + "]"
		} else if f.key == "actions" && e.Value.Empty() {
			hint = "write actions: [] where there is nothing but the self-weight"
		}
		r.find(placeOf(e.Value), f.key+": have "+have(e.Value)+", want a list", hint)
		return
	}
	if len(e.Value.Items) < f.least {
		r.find(placeOf(e.Value), f.key+": have no rows, want at least one", "begin each row with - on a line of its own below")
	}
	for i, item := range e.Value.Items {
		if i == mostRows {
			r.find(placeOf(item), fmt.Sprintf("%s: have %d rows, want at most %d", f.key, len(e.Value.Items), mostRows), "")
			return
		}
		one := reflect.New(to.Type().Elem()).Elem()
		if item.Kind == node.Broken {
			continue
		} else if w, ok := one.Addr().Interface().(*Word); ok {
			r.word(item, f, w)
		} else {
			r.mapping(item, one, f.key, placeOf(item))
		}
		to.Set(reflect.Append(to, one))
	}
}

// standIn sets the default.
func standIn(f *field, to reflect.Value, origin diag.Pos) {
	o := Origin{Pos: origin, Why: f.why}
	switch to := to.Addr().Interface().(type) {
	case *Value:
		l, err := quantity.Parse(f.std)
		if err == nil {
			*to = Value{l, o}
		}
	case *Word:
		*to = Word{f.std, o}
	}
}
