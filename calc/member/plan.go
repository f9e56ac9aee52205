package member

import (
	"fmt"
	"reflect"
	"slices"
	"strconv"
	"strings"
	"sync"

	"soffit/calc/diag"
	"soffit/calc/quantity"
)

// plan is what the tags of a type say: the keys of a mapping in the order of the fields.
type plan struct {
	fields []field
	place  int // index of the Pos field, −1 where there is none
}

// field is one key.
type field struct {
	index    int
	key      string
	optional bool
	eg       quantity.Literal // of a Value: a fitting one
	example  string           // as it would be written
	low      *quantity.Literal
	high     *quantity.Literal
	most     int // of a Count, and of a list
	least    int // of a list
	words    []string
	std, why string // default and its reason; std "" is none
	name     bool   // a text that names a row
	when     string // the key that decides whether this one belongs here
	of       []string
	with     string   // the key beside which this one belongs
	or       []string // the keys in whose place this one may stand
	both     string   // what is said where two of them stand
	not      string   // the key beside which this one must not stand
	unless   string   // the key beside which this one may be left out
	among    string   // the key whose rows this one names
	what     string   // what the key holds
}

var (
	valueType  = reflect.TypeFor[Value]()
	valuesType = reflect.TypeFor[[]Value]()
	countType  = reflect.TypeFor[Count]()
	wordType   = reflect.TypeFor[Word]()
	dateType   = reflect.TypeFor[Date]()
	shapeType  = reflect.TypeFor[Shape]()
	posType    = reflect.TypeFor[diag.Pos]()
	plans      sync.Map // reflect.Type → *plan
)

// isScalar reports whether a field of the type is written as one piece of text.
func isScalar(t reflect.Type) bool {
	return t == valueType || t == countType || t == wordType || t == dateType
}

// planOf reads the tags of a struct type. It panics on tags that make no sense: a fault of the program.
func planOf(t reflect.Type) *plan {
	if p, ok := plans.Load(t); ok {
		return p.(*plan)
	}
	p := &plan{place: -1}
	for i := range t.NumField() {
		f := t.Field(i)
		if f.Type == posType && f.Name == "Pos" {
			p.place = i
		}
		if key := f.Tag.Get("key"); key != "" {
			p.fields = append(p.fields, newField(i, f, key))
		}
	}
	plans.Store(t, p)
	return p
}

func newField(index int, s reflect.StructField, key string) field {
	tag := s.Tag
	f := field{index: index, example: tag.Get("eg"), std: tag.Get("default"), why: tag.Get("why"), name: tag.Get("text") == "name",
		with: tag.Get("with"), both: tag.Get("both"), not: tag.Get("not"), unless: tag.Get("unless"), among: tag.Get("among"), what: tag.Get("what")}
	f.key, f.optional = strings.CutSuffix(key, "?")
	if w := tag.Get("words"); w != "" {
		f.words = strings.Split(w, "|")
		f.example = f.words[0]
	}
	if when := tag.Get("when"); when != "" {
		name, of, _ := strings.Cut(when, "=")
		f.when, f.of = name, strings.Split(of, "|")
	}
	if or := tag.Get("or"); or != "" {
		f.or = strings.Split(or, "|")
	}
	if (s.Type == valueType || s.Type == valuesType) && f.example != "" {
		f.eg = literal(s, "eg", quantity.Dim{})
		f.low, f.high = bound(s, "from", f.eg), bound(s, "to", f.eg)
		if f.std != "" {
			literal(s, "default", f.eg.Unit.Dim())
		}
	}
	f.least, _ = strconv.Atoi(tag.Get("least"))
	if s.Type == countType {
		f.most, _ = strconv.Atoi(tag.Get("to"))
	} else if s.Type.Kind() == reflect.Slice {
		f.most = mostRows
		if most := tag.Get("most"); most != "" {
			f.most, _ = strconv.Atoi(most)
		}
	}
	if s.Type == dateType {
		f.example = "2031-04-07"
	}
	return f
}

func bound(s reflect.StructField, tag string, eg quantity.Literal) *quantity.Literal {
	if s.Tag.Get(tag) == "" {
		return nil
	}
	l := literal(s, tag, eg.Unit.Dim())
	return &l
}

// literal reads a tag; a dimension other than none is asked for.
func literal(s reflect.StructField, tag string, want quantity.Dim) quantity.Literal {
	l, err := quantity.Parse(s.Tag.Get(tag))
	if err == nil && !want.IsNone() {
		err = l.Want(want)
	}
	if err != nil {
		panic(fmt.Sprintf("member: tag %s of %s: %v", tag, s.Name, err))
	}
	return l
}

// keys are those that belong where the word of the deciding key is as given; "" lets all belong.
func (p *plan) keys(word func(key string) string) []string {
	var keys []string
	for i := range p.fields {
		f := &p.fields[i]
		if w := word(f.when); f.when == "" || w == "" || slices.Contains(f.of, w) {
			keys = append(keys, f.key)
		}
	}
	return keys
}

// all are the keys of the plan.
func (p *plan) all() []string { return p.keys(func(string) string { return "" }) }

func (p *plan) find(key string) *field {
	for i := range p.fields {
		if p.fields[i].key == key {
			return &p.fields[i]
		}
	}
	return nil
}

// homes tells under which groups a key of the member file belongs.
var homes = sync.OnceValue(func() map[string][]string {
	m := map[string][]string{}
	gather(reflect.TypeFor[Member](), "", m)
	return m
})

func gather(t reflect.Type, path string, m map[string][]string) {
	p := planOf(t)
	for i := range p.fields {
		f := &p.fields[i]
		m[f.key] = append(m[f.key], path)
		below := t.Field(f.index).Type
		if below.Kind() == reflect.Slice {
			below = below.Elem()
		}
		if below.Kind() == reflect.Struct && !isScalar(below) && len(planOf(below).fields) > 0 {
			gather(below, strings.TrimPrefix(path+", "+f.key, ", "), m)
		}
	}
}
