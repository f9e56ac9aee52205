package member

import (
	"fmt"
	"reflect"
	"slices"
	"strconv"
	"strings"

	"soffit/calc/diag"
	"soffit/calc/node"
	"soffit/calc/quantity"
)

// mostRows is how many rows a list of the member file may have, where its tag says nothing else.
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
		hint := "write " + strings.Join(keys, ", ") + " on lines of their own below, further in"
		if n.Kind == node.List {
			hint += ", or in one line: {" + strings.Join(p.examples(keys), ", ") + "}"
		}
		r.find(placeOf(n), label+": have "+have(n)+", want keys", hint)
		return
	}
	if len(n.Entries) == 0 && len(p.required()) == 0 {
		r.find(placeOf(n), label+": have no keys, want "+either(p.all()), "write them, or remove this")
		return
	}
	seen := r.entries(n, p, label)
	for i := range p.fields {
		f := &p.fields[i]
		if f.or != nil {
			r.oneOf(f, p, into.Type(), seen, label, at)
		}
		if other, ok := seen[f.not]; f.not != "" && ok && has(seen, f.key) {
			r.find(placeOf(other.Key), f.not+": have it beside "+f.key+", want one of them", "remove one of them")
		}
		r.field(&p.fields[i], p, seen, into, label, at, n.Pos)
	}
}

// required are the keys that have to be there.
func (p *plan) required() []string {
	var keys []string
	for i := range p.fields {
		if f := &p.fields[i]; (!f.optional || f.unless != "") && f.std == "" && f.with == "" && f.when == "" {
			keys = append(keys, f.key)
		}
	}
	return keys
}

// examples are keys with a fitting value each; those of groups of keys are left out.
func (p *plan) examples(keys []string) []string {
	var out []string
	for _, key := range keys {
		if f := p.find(key); f.example != "" {
			out = append(out, key+": "+f.example)
		}
	}
	return out
}

// entries sorts the keys of a mapping; unknown and repeated ones are found. What stands under a mistyped key
// is read as what was meant, so that nothing wrong in it stays hidden.
func (r *reader) entries(n *node.Node, p *plan, label string) map[string]node.Entry {
	seen, meant := map[string]node.Entry{}, map[string]node.Entry{}
	word := wordIn(n, p)
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

// wordIn tells the word of a key of the mapping, as written or as it was likely meant; "" where there is none.
func wordIn(n *node.Node, p *plan) func(string) string {
	return func(key string) string {
		for _, e := range n.Entries {
			if f := p.find(key); f != nil && e.Key.Text == key && e.Value.Kind == node.Scalar {
				near, _ := quantity.Nearest(e.Value.Text, f.words)
				return near
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
	} else if f.optional && (f.unless == "" || has(seen, f.unless)) || !decided {
		return
	}
	msg := label + ": have no " + f.key
	if to.Kind() != reflect.Struct || isScalar(to.Type()) {
		msg += ", want " + f.want(to.Type())
	}
	r.find(at, msg, f.add(to.Type()))
}

func has(seen map[string]node.Entry, key string) bool {
	_, ok := seen[key]
	return ok
}

// oneOf finds two keys of which one stands in the place of the other, and the lack of all. Where a key that belongs
// beside one of them is there, it has its finding already.
func (r *reader) oneOf(f *field, p *plan, t reflect.Type, seen map[string]node.Entry, label string, at place) {
	keys := append([]string{f.key}, f.or...)
	first := slices.IndexFunc(keys, func(key string) bool { return has(seen, key) })
	if first < 0 {
		if !slices.ContainsFunc(p.fields, func(o field) bool { return has(seen, o.key) && slices.Contains(keys, o.with) }) {
			last := len(f.or)
			hint := f.add(t.Field(f.index).Type)
			if f.example == "" {
				other := p.find(f.or[0])
				hint += "; or " + strings.TrimPrefix(other.add(t.Field(other.index).Type), "add ")
			}
			r.find(at, label+": have no "+strings.Join(keys[:last], ", no ")+" and no "+keys[last]+", want one of them", hint)
		}
		return
	}
	for _, key := range keys[first+1:] {
		if e := seen[key]; has(seen, key) {
			there := placeOf(e.Value)
			if e.Value.Kind != node.Scalar {
				there = placeOf(e.Key)
			}
			r.find(there, key+": have it beside "+keys[first]+", want one of them", f.both)
		}
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
	if n, ok := to.Addr().Interface().(**node.Node); ok {
		*n = e.Value
		return
	}
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
	case *[]Value:
		r.values(e.Value, f, to)
	case *NationalParameters:
		r.nationalParameters(e.Value, to)
	case *Narrative:
		r.narrative(e.Value, to)
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
	case *[]Value:
		*to = []Value{{Origin: o}}
	default:
		if v := reflect.ValueOf(to).Elem(); v.Kind() == reflect.Struct {
			if p := planOf(v.Type()); p.place >= 0 {
				v.Field(p.place).Set(reflect.ValueOf(at))
			}
		}
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
	if n := len(e.Value.Items); n == 0 && f.least > 0 {
		r.find(placeOf(e.Value), f.key+": have no rows, want at least "+counted(f.least), "begin each row with - on a line of its own below")
	} else if n < f.least {
		r.find(placeOf(e.Key), fmt.Sprintf("%s: have %d, want at least %d", f.key, n, f.least), "add further rows, each beginning with - on a line of its own")
	}
	for i, item := range e.Value.Items {
		if i == f.most {
			r.find(placeOf(item), fmt.Sprintf("%s: have %d rows, want at most %d", f.key, len(e.Value.Items), f.most), "")
			return
		}
		one := reflect.New(to.Type().Elem()).Elem()
		if item.Kind == node.Broken {
			// A row all the same: it has its finding.
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

// counted is a small number in a sentence: "one", "2".
func counted(n int) string {
	if n == 1 {
		return "one"
	}
	return strconv.Itoa(n)
}

// values reads a list of values, [100 mm, 200 mm].
func (r *reader) values(n *node.Node, f *field, to *[]Value) {
	if n.Kind != node.List || len(n.Items) == 0 {
		one := f.example
		if n.Kind == node.Scalar {
			if l, err := quantity.ParseAs(n.Text, f.eg.Unit.Dim()); err == nil {
				one = strings.TrimPrefix(l.String(), "-")
			}
		}
		hint := "write a list, for example [-" + one + ", " + one + "]"
		have := have(n)
		if n.Kind == node.List {
			have = "an empty list"
		}
		r.find(placeOf(n), f.key+": have "+have+", want a list", hint)
		return
	}
	*to = nil
	for i, item := range n.Items {
		if i == f.most {
			r.find(placeOf(item), fmt.Sprintf("%s: have %d, want at most %d", f.key, len(n.Items), f.most), "")
			return
		}
		v := Value{Origin: Origin{Pos: item.Pos, Given: true}}
		if item.Kind != node.Broken {
			r.value(item, f, &v)
		}
		*to = append(*to, v)
	}
}
