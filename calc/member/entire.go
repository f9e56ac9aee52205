package member

import (
	"reflect"
	"slices"
)

// entire reports whether all of a group was read: nothing is missing that belongs there, and nothing broken.
func entire(group reflect.Value) bool {
	p := planOf(group.Type())
	for i := range p.fields {
		f := &p.fields[i]
		if f.when != "" && !slices.Contains(f.of, group.Field(p.find(f.when).index).Interface().(Word).Text) {
			continue
		}
		if f.with != "" && !given(group.Field(p.find(f.with).index)) {
			continue
		}
		if !read(f, group.Field(f.index)) {
			return false
		}
	}
	return true
}

// read reports whether the value of a key was read, or may be left out and was.
func read(f *field, v reflect.Value) bool {
	switch v := v.Interface().(type) {
	case Value:
		return v.Present() || f.optional && !v.Given
	case Count:
		return v.N > 0 || f.optional && !v.Given
	case Word:
		return v.Present() || f.optional && !v.Given
	}
	switch v.Kind() {
	case reflect.Struct:
		p := planOf(v.Type())
		return f.optional && v.Field(p.place).IsZero() || entire(v)
	case reflect.Slice:
		if v.Len() < f.least {
			return false
		}
		for i := range v.Len() {
			if !entire(v.Index(i)) {
				return false
			}
		}
	}
	return true
}

// given reports whether a value was written.
func given(v reflect.Value) bool {
	value, ok := v.Interface().(Value)
	return ok && value.Given
}
