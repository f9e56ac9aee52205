package member

import (
	"bytes"
	"encoding/json"
	"strings"
)

// object is a JSON object whose keys stay in order: the order of the declaration is what an editor proposes.
type object []pair

type pair struct {
	key   string
	value any // object, []object, []string, or what encoding/json writes
}

// lineWidth is how long a part of the schema may be on one line, in bytes.
const lineWidth = 120

// appendJSON writes a value, on one line where it fits.
func appendJSON(b []byte, v any, indent string) []byte {
	one := appendLine(nil, v)
	if len(indent)+len(one) <= lineWidth {
		return append(b, one...)
	}
	further := indent + "  "
	switch v := v.(type) {
	case object:
		b = append(b, "{\n"...)
		for i, p := range v {
			b = append(append(append(b, further...), plain(p.key)...), ": "...)
			b = appendJSON(b, p.value, further)
			b = appendBreak(b, i < len(v)-1)
		}
		return append(append(b, indent...), '}')
	case []object:
		b = append(b, "[\n"...)
		for i, o := range v {
			b = appendJSON(append(b, further...), o, further)
			b = appendBreak(b, i < len(v)-1)
		}
		return append(append(b, indent...), ']')
	}
	return append(b, one...)
}

func appendBreak(b []byte, more bool) []byte {
	if more {
		b = append(b, ',')
	}
	return append(b, '\n')
}

func appendLine(b []byte, v any) []byte {
	switch v := v.(type) {
	case object:
		b = append(b, '{')
		for i, p := range v {
			if i > 0 {
				b = append(b, ", "...)
			}
			b = append(append(b, plain(p.key)...), ": "...)
			b = appendLine(b, p.value)
		}
		return append(b, '}')
	case []object:
		return appendList(b, v)
	case []string:
		return appendList(b, v)
	}
	return append(b, plain(v)...)
}

func appendList[T any](b []byte, list []T) []byte {
	b = append(b, '[')
	for i, v := range list {
		if i > 0 {
			b = append(b, ", "...)
		}
		b = appendLine(b, v)
	}
	return append(b, ']')
}

// plain is a scalar in JSON, <, > and & as they are.
func plain(v any) string {
	var b bytes.Buffer
	e := json.NewEncoder(&b)
	e.SetEscapeHTML(false)
	if err := e.Encode(v); err != nil {
		panic("member: schema: " + err.Error())
	}
	return strings.TrimSuffix(b.String(), "\n")
}
