package member

import (
	"reflect"
	"slices"
	"strings"
	"testing"
)

// TestPlans goes through every type of the model: tags that make no sense panic in planOf, and examples and
// defaults must be what the key itself allows.
func TestPlans(t *testing.T) {
	keys := 0
	var visit func(reflect.Type)
	visit = func(typ reflect.Type) {
		p := planOf(typ)
		for i := range p.fields {
			f, below := &p.fields[i], typ.Field(p.fields[i].index).Type
			keys++
			if (below == valueType || below == valuesType) && f.example != "" {
				if !f.within(f.eg) {
					t.Errorf("%v %s: the example %s lies outside the bounds", typ, f.key, f.example)
				}
				if f.low == nil || f.high == nil || f.low.Quantity().Value >= f.high.Quantity().Value {
					t.Errorf("%v %s: no bounds", typ, f.key)
				}
			}
			if f.words != nil && f.std != "" && !slices.Contains(f.words, f.std) {
				t.Errorf("%v %s: the default %s is not one of the words", typ, f.key, f.std)
			}
			if (f.std == "") != (f.why == "") || f.std != "" && !f.optional {
				t.Errorf("%v %s: a default goes with a reason and a key that may be left out", typ, f.key)
			}
			if f.what == "" || strings.HasSuffix(f.what, ".") || strings.TrimSpace(f.what) != f.what {
				t.Errorf("%v %s: what it holds is not said, or not in the way of the others: %q", typ, f.key, f.what)
			}
			for _, or := range f.or {
				if !(f.optional && p.find(or) != nil && p.find(or).optional) || f.both == "" {
					t.Errorf("%v %s: of two keys that stand for one another both may be left out, and why not both stand is said", typ, f.key)
				}
			}
			for _, by := range []string{f.not, f.unless} {
				if by != "" && !(f.optional && p.find(by) != nil && p.find(by).optional) {
					t.Errorf("%v %s: depends on %s, which has to be a key that may be left out", typ, f.key, by)
				}
			}
			for _, by := range []string{f.when, f.with} {
				if by != "" && p.find(by) == nil {
					t.Errorf("%v %s: depends on %s, which is no key", typ, f.key, by)
				}
			}
			if f.when != "" {
				for _, w := range f.of {
					if !slices.Contains(p.find(f.when).words, w) {
						t.Errorf("%v %s: %s is no word of %s", typ, f.key, w, f.when)
					}
				}
			}
			if below.Kind() == reflect.Slice {
				below = below.Elem()
			}
			if below.Kind() == reflect.Struct && !isScalar(below) {
				if len(planOf(below).fields) > 0 {
					visit(below)
				}
			} else if below == wordType && f.words == nil && f.example == "" && f.std == "" {
				t.Errorf("%v %s: no example", typ, f.key)
			}
		}
	}
	visit(reflect.TypeFor[Member]())
	visit(reflect.TypeFor[parameterText]())
	if keys < 80 {
		t.Errorf("%d keys visited", keys)
	}
}
