package member

import (
	"encoding/json"
	"reflect"
	"slices"
	"strconv"
	"strings"

	"soffit/calc/quantity"
)

// describe says what a key holds, within which bounds, with which other key, and what stands in for it.
func (f *field) describe(t reflect.Type) string {
	parts := []string{f.what}
	if bounds := f.bounds(t); bounds != "" {
		parts = append(parts, bounds)
	}
	if f.when != "" {
		parts = append(parts, "with "+f.when+" "+either(f.of))
	}
	if f.with != "" {
		parts = append(parts, "with "+f.with)
	}
	if f.or != nil {
		parts = append(parts, "either this or "+either(f.or))
	}
	switch {
	case f.std != "":
		parts = append(parts, "left out: "+f.std+" ("+f.why+")")
	case f.optional && f.or == nil && !strings.Contains(f.what, "left out"):
		parts = append(parts, "may be left out")
	}
	return strings.Join(parts, "; ")
}

// bounds are the bounds of a number in words, "" where there are none.
func (f *field) bounds(t reflect.Type) string {
	switch {
	case t == countType:
		return "a whole number, 1 to " + strconv.Itoa(f.most)
	case (t == valueType || t == valuesType) && (f.low != nil || f.high != nil):
		if t == valuesType {
			return "each " + f.eg.Unit.Dim().Indefinite() + ", " + f.range_()
		}
		return f.eg.Unit.Dim().Indefinite() + ", " + f.range_()
	}
	return ""
}

// value is a number with a unit of the right dimension. A plain number may be one of YAML, and then has bounds that a
// schema can hold.
func (s *schemer) value(f *field) object {
	d, signed := f.eg.Unit.Dim(), f.low == nil || f.low.Quantity().Value < 0
	name := slug(d.String())
	if signed {
		name = "signed-" + name
	}
	out := s.ref(name, func() object {
		pattern := quantity.NumberPattern(signed)
		if units := d.UnitPattern(); d.IsNone() {
			return object{{"type", []string{"string", "number"}}, {"pattern", "^" + pattern + `(\p{Zs}*` + units + ")?$"}}
		} else if units != "" {
			pattern += `\p{Zs}*` + units
		}
		return object{{"type", "string"}, {"pattern", "^" + pattern + "$"}}
	})
	if d.IsNone() && f.low != nil {
		out = append(out, pair{"minimum", f.low.Quantity().Value})
	}
	if d.IsNone() && f.high != nil {
		out = append(out, pair{"maximum", f.high.Quantity().Value})
	}
	if f.std != "" {
		out = append(out, pair{"default", f.std})
	}
	switch {
	case d.IsNone() && f.eg.Unit.String() == "":
		out = append(out, pair{"examples", []json.Number{json.Number(f.eg.Number)}})
	case f.example != "":
		out = append(out, pair{"examples", []string{f.example}})
	}
	return out
}

// count is a whole number; in quotes it is one too.
func count(f *field) object {
	n, err := strconv.Atoi(f.example)
	if err != nil {
		panic("member: example of " + f.key + ": " + err.Error())
	}
	return object{{"type", []string{"integer", "string"}}, {"minimum", 1}, {"maximum", f.most}, {"pattern", "^[1-9][0-9]*$"}, {"examples", []int{n}}}
}

// word is one of the words of the key, or free text.
func (s *schemer) word(f *field) object {
	var out object
	switch {
	case f.words != nil:
		out = among(f.words)
	case f.name:
		out = s.ref("name", func() object {
			return object{{"type", []string{"string", "number"}}, {"pattern", `^[\p{L}\p{Nd} ._+-]+$`}, {"maxLength", mostName}}
		})
	default:
		out = s.ref("text", func() object {
			return object{{"type", []string{"string", "number"}}, {"pattern", `^\s*\S(.*\S)?\s*$`}, {"maxLength", mostLine}}
		})
	}
	if f.std != "" {
		out = append(out, pair{"default", f.std})
	}
	switch {
	case f.among != "" && s.opt.named(f.among) != nil:
		out = append(out, pair{"examples", s.opt.named(f.among)})
	case f.words == nil && f.example != "":
		out = append(out, pair{"examples", []string{f.example}})
	}
	return out
}

// among allows words. One that looks like a number is a number to a YAML reader, 6.10 being 6.1; bounds let it pass
// without proposing it.
func among(words []string) object {
	if len(words) == 1 {
		return object{{"const", words[0]}}
	}
	list := object{{"enum", words}}
	choice := []object{list}
	for _, w := range words {
		if v, err := strconv.ParseFloat(w, 64); err == nil {
			choice = append(choice, object{{"type", "number"}, {"minimum", v}, {"maximum", v}})
		}
	}
	if len(choice) == 1 {
		return list
	}
	return object{{"anyOf", choice}}
}

func (s *schemer) date(f *field) object {
	return append(s.ref("date", func() object {
		return object{{"type", "string"}, {"format", "date"}, {"pattern", "^[0-9]{4}-(0[1-9]|1[0-2])-(0[1-9]|[12][0-9]|3[01])$"}}
	}), pair{"examples", []string{f.example}})
}

// named are the names that the options give for a list of the file, in alphabetical order; nil where the list has those
// of the file alone.
func (opt *Options) named(list string) []string {
	switch list {
	case "groups":
		return nil
	case "products":
	default:
		panic("member: no names for " + list)
	}
	names := []string{}
	for _, p := range opt.Products {
		names = append(names, p.Name)
	}
	slices.Sort(names)
	return names
}
