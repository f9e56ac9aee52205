package trace_test

import (
	"bytes"
	"testing"

	"github.com/santhosh-tekuri/jsonschema/v6"

	"soffit/calc/trace"
)

// validator compiles the schema of the record.
func validator(t *testing.T) *jsonschema.Schema {
	t.Helper()
	doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(trace.Schema))
	if err != nil {
		t.Fatal(err)
	}
	c := jsonschema.NewCompiler()
	if err := c.AddResource("trace.schema.json", doc); err != nil {
		t.Fatal(err)
	}
	s, err := c.Compile("trace.schema.json")
	if err != nil {
		t.Fatal(err)
	}
	return s
}

func TestRecordFitsSchema(t *testing.T) {
	data, err := fixture(t, "30 kN/m").JSON()
	if err != nil {
		t.Fatal(err)
	}
	s := validator(t)
	doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(data))
	if err != nil {
		t.Fatal(err)
	}
	if err := s.Validate(doc); err != nil {
		t.Error(err)
	}
	for _, swap := range [][2]string{{`"kind": "step"`, `"kind": "leap"`}, {`"shown": "25.500"`, `"shown": "NaN"`}, {`"format": "soffit-trace/1"`, `"format": "soffit-trace/9"`}} {
		bad := bytes.Replace(data, []byte(swap[0]), []byte(swap[1]), 1)
		if bytes.Equal(bad, data) {
			t.Fatalf("%s is not in the file", swap[0])
		}
		doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(bad))
		if err != nil {
			t.Fatal(err)
		}
		if s.Validate(doc) == nil {
			t.Errorf("%s passes the schema", swap[1])
		}
	}
}
