package member

import (
	"maps"
	"reflect"
	"slices"
	"strings"
)

// parameters are the national parameters in each of their spellings.
func (s *schemer) parameters() object {
	var properties object
	for i := range s.opt.NationalParameters {
		spec := &s.opt.NationalParameters[i]
		of := s.ref("parameter-"+spec.Ascii, func() object { return s.stated(spec) })
		keys := []string{spec.Key, spelled(spec.Key), spec.Ascii}
		slices.Sort(keys)
		for _, key := range slices.Compact(keys) {
			properties = append(properties, pair{key, of})
		}
	}
	return object{{"type", "object"}, {"additionalProperties", false}, {"properties", properties}}
}

// stated is a parameter in one of its forms, with the source.
func (s *schemer) stated(spec *ParameterSpec) object {
	p, t := planOf(reflect.TypeFor[parameterText]()), reflect.TypeFor[parameterText]()
	forms := spec.forms()
	var properties object
	for i := range p.fields {
		f := &p.fields[i]
		switch {
		case t.Field(f.index).Type == wordType:
			properties = append(properties, pair{f.key, s.key(f, wordType)})
		case slices.Contains(forms, f.key):
			properties = append(properties, pair{f.key, s.form(spec, f)})
		}
	}
	out := object{{"description", spec.describe()}, {"type", "object"}, {"additionalProperties", false}}
	if required := p.required(); len(forms) == 1 {
		out = append(out, pair{"required", append(slices.Clone(forms), required...)})
	} else {
		var choice []object
		for _, form := range forms {
			choice = append(choice, object{{"required", []string{form}}})
		}
		out = append(out, pair{"required", required}, pair{"oneOf", choice})
	}
	return append(out, pair{"properties", properties})
}

// describe says what the parameter is and which value stands without the entry.
func (spec *ParameterSpec) describe() string {
	name := spec.Name
	if name == "" {
		name = "national parameter"
	}
	out := name + ", " + spec.Key
	if spec.Recommended != "" {
		out += "; recommended: " + spec.Recommended
	}
	return out
}

func (s *schemer) form(spec *ParameterSpec, f *field) object {
	cell := spec.cell(f.key)
	cell.what = f.what
	if spec.Kind == Number && spec.Recommended != "" {
		cell.eg.Number = spec.Recommended
	}
	switch f.key {
	case "value":
		return append(object{{"description", cell.describeCell()}}, s.value(cell)...)
	case "expression":
		known := "symbols: " + strings.Join(slices.Sorted(maps.Keys(spec.Symbols)), ", ")
		text := &field{key: f.key}
		if spec.Kind == Expression {
			text.example = spec.Recommended
		}
		return append(object{{"description", f.what + "; " + cell.eg.Unit.Dim().Indefinite() + "; " + known}}, s.word(text)...)
	}
	var rows object
	for _, row := range spec.Rows {
		rows = append(rows, pair{row, object{{"type", "array"}, {"minItems", spec.Columns}, {"maxItems", spec.Columns}, {"items", s.value(cell)}}})
	}
	return object{{"description", f.what}, {"type", "object"}, {"additionalProperties", false}, {"required", spec.Rows}, {"properties", rows}}
}

// describeCell says what a value of a parameter is and within which bounds.
func (f *field) describeCell() string {
	if bounds := f.bounds(valueType); bounds != "" {
		return f.what + "; " + bounds
	}
	return f.what
}
