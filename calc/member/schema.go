package member

import (
	"reflect"
	"slices"
	"strings"
	"unicode"
)

// Schema is the JSON Schema, draft 2020-12, of the member file, made from the declaration in the tags of the model and
// from what the options name. The same options give the same bytes.
//
// It says what the form of the file is: keys, words, types, units, and which key goes with which. It takes the file as
// a YAML reader of the core schema hands it on, 8 as a number and 50 mm as text. What can be seen only by comparing
// values is left to Read: a file that the schema passes may have findings. The other way round, Read accepts
// spellings of text and units that the schema marks, such as a title that reads as true or a unit of three names.
func Schema(opt Options) []byte {
	s := &schemer{opt: opt, made: map[string]int{}}
	root := object{
		{"$schema", "https://json-schema.org/draft/2020-12/schema"},
		{"$id", "soffit-member-1"},
		{"title", "Soffit member file"},
		{"description", "One prestressed concrete member. Every value carries its unit: 900 mm, 50 MPa."},
	}
	root = append(root, s.closed(reflect.TypeFor[Member](), "")...)
	root = append(root, pair{"$defs", s.defs})
	return append(appendJSON(nil, root, ""), '\n')
}

// schemer is one schema under way.
type schemer struct {
	opt  Options
	defs object
	made map[string]int // where a definition stands in defs
}

// ref refers to a definition, which is made once.
func (s *schemer) ref(name string, of func() object) object {
	if _, ok := s.made[name]; !ok {
		i := len(s.defs)
		s.made[name], s.defs = i, append(s.defs, pair{key: name})
		made := of()
		s.defs[i].value = made
	}
	return object{{"$ref", "#/$defs/" + name}}
}

// slug turns a name into one that needs no escape in a reference: "StrandRow" and "strand row" into "strand-row".
func slug(name string) string {
	var b strings.Builder
	for i, r := range name {
		switch {
		case unicode.IsUpper(r) && i > 0:
			if name[i-1] != ' ' {
				b.WriteByte('-')
			}
			b.WriteRune(unicode.ToLower(r))
		case unicode.IsLetter(r), unicode.IsDigit(r):
			b.WriteRune(unicode.ToLower(r))
		default:
			b.WriteByte('-')
		}
	}
	return b.String()
}

// group refers to the definition of a struct. Where a key decides which others belong, there is one definition for each of
// its words beside it.
func (s *schemer) group(t reflect.Type) object {
	p, name := planOf(t), slug(t.Name())
	by := p.decides()
	if by == nil {
		return s.ref(name, func() object { return s.closed(t, "") })
	}
	return s.ref(name, func() object {
		var cases []object
		for _, word := range by.words {
			cases = append(cases, object{
				{"if", object{{"properties", object{{by.key, object{{"const", word}}}}}, {"required", []string{by.key}}}},
				{"then", s.ref(name+"-"+slug(word), func() object { return s.closed(t, word) })},
			})
		}
		return object{
			{"type", "object"},
			{"required", p.required()},
			{"properties", object{{by.key, s.key(by, t.Field(by.index).Type)}}},
			{"allOf", cases},
		}
	})
}

// decides is the key whose word decides which others belong; nil where there is none.
func (p *plan) decides() *field {
	for i := range p.fields {
		if when := p.fields[i].when; when != "" {
			return p.find(when)
		}
	}
	return nil
}

// closed is a struct with the keys that belong where the deciding key has the word, and no others.
func (s *schemer) closed(t reflect.Type, word string) object {
	p := planOf(t)
	var required []string
	var properties, beside object
	var choice, all []object
	for i := range p.fields {
		f := &p.fields[i]
		if f.when != "" && !slices.Contains(f.of, word) {
			continue
		}
		if !f.optional && f.with == "" {
			required = append(required, f.key)
		}
		if f.with != "" {
			beside = beside.need(f.key, f.with)
			if !f.optional {
				beside = beside.need(f.with, f.key)
			}
		}
		for _, key := range append([]string{f.key}, f.or...) {
			if f.or != nil {
				choice = append(choice, object{{"required", []string{key}}})
			}
		}
		if f.unless != "" {
			all = append(all, object{{"anyOf", []object{{{"required", []string{f.key}}}, {{"required", []string{f.unless}}}}}})
		}
		if f.not != "" {
			all = append(all, object{{"not", object{{"required", []string{f.key, f.not}}}}})
		}
		told := *f
		told.when = "" // it is one of the keys of this word
		of := s.key(&told, t.Field(f.index).Type)
		if by := p.decides(); word != "" && by == f {
			of = object{{"description", f.describe(wordType)}, {"const", word}}
		}
		properties = append(properties, pair{f.key, of})
	}
	out := object{{"type", "object"}, {"additionalProperties", false}}
	if required == nil {
		out = append(out, pair{"minProperties", 1})
	} else {
		out = append(out, pair{"required", required})
	}
	out = append(out, pair{"properties", properties})
	if beside != nil {
		out = append(out, pair{"dependentRequired", beside})
	}
	if choice != nil {
		out = append(out, pair{"oneOf", choice})
	}
	if all = append(all, s.named(t)...); all != nil {
		out = append(out, pair{"allOf", all})
	}
	return out
}

// need adds a key that has to be there beside another.
func (o object) need(key, other string) object {
	for i := range o {
		if o[i].key == key {
			o[i].value = append(o[i].value.([]string), other)
			return o
		}
	}
	return append(o, pair{key, []string{other}})
}

// key is the value of one key, with what an editor says of it.
func (s *schemer) key(f *field, t reflect.Type) object {
	out := object{{"description", f.describe(t)}}
	switch {
	case t == valueType:
		return append(out, s.value(f)...)
	case t == countType:
		return append(out, count(f)...)
	case t == wordType:
		return append(out, s.word(f)...)
	case t == dateType:
		return append(out, s.date(f)...)
	case t == reflect.TypeFor[NationalParameters]():
		return append(out, s.parameters()...)
	case t == reflect.TypeFor[Narrative]():
		return append(out, s.slots()...)
	case t.Kind() != reflect.Slice:
		return append(out, s.group(t)...)
	case t.Elem() == wordType:
		return append(out, pair{"type", "array"}, pair{"uniqueItems", true}, pair{"items", s.word(f)})
	case t == valuesType:
		return append(out, pair{"type", "array"}, pair{"minItems", 1}, pair{"maxItems", f.most}, pair{"items", s.value(f)})
	}
	out = append(out, pair{"type", "array"})
	if f.least > 0 {
		out = append(out, pair{"minItems", f.least})
	}
	return append(out, pair{"maxItems", f.most}, pair{"items", s.group(t.Elem())})
}

// named bounds the names that rows use where the list that could add some is left out: then those of the options are
// all there are, if any.
func (s *schemer) named(t reflect.Type) []object {
	p := planOf(t)
	var out []object
	for i := range p.fields {
		list := t.Field(p.fields[i].index).Type
		if list.Kind() != reflect.Slice || list.Elem().Kind() != reflect.Struct {
			continue
		}
		for _, f := range planOf(list.Elem()).fields {
			if f.among == "" {
				continue
			}
			name := object{{f.key, false}}
			if names := s.opt.named(f.among); names != nil {
				name = object{{f.key, object{{"enum", names}}}}
			}
			rows := object{{p.fields[i].key, object{{"items", object{{"properties", name}}}}}}
			out = append(out, object{
				{"if", object{{"not", object{{"required", []string{f.among}}}}}},
				{"then", object{{"properties", rows}}},
			})
		}
	}
	return out
}

// slots are the places of the engineer's own text.
func (s *schemer) slots() object {
	var properties object
	for _, slot := range s.opt.Narratives {
		text := s.ref("passage", func() object {
			return object{{"type", "string"}, {"pattern", `\S`}, {"maxLength", longestPassage}}
		})
		properties = append(properties, pair{slot, append(object{{"description", "opens the chapter " + slot + "; {M_Rd} in it stands for the value"}}, text...)})
	}
	return object{{"type", "object"}, {"additionalProperties", false}, {"properties", properties}}
}
