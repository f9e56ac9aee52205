package main

import (
	"bytes"
	"testing"

	"github.com/santhosh-tekuri/jsonschema/v6"
)

// printed is what a command writes to standard output.
func printed(t *testing.T, args ...string) []byte {
	t.Helper()
	var out, problems bytes.Buffer
	if code := run(args, &out, &problems); code != passes {
		t.Fatalf("%v: exit %d, %s", args, code, problems.String())
	}
	return out.Bytes()
}

// TestSchemas: both schemas are printed the same each time, each is a schema of its draft, and the record of every sample
// and of every draft fits the one of the record.
func TestSchemas(t *testing.T) {
	compiled := map[string]*jsonschema.Schema{}
	for _, of := range []string{"member", "trace"} {
		text := printed(t, "schema", of)
		if !bytes.Equal(text, printed(t, "schema", of)) {
			t.Errorf("the schema of the %s is printed in two ways", of)
		}
		if !bytes.HasSuffix(text, []byte("}\n")) {
			t.Errorf("the schema of the %s does not end with its line", of)
		}
		doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(text))
		if err != nil {
			t.Fatal(err)
		}
		if draft := doc.(map[string]any)["$schema"]; draft != "https://json-schema.org/draft/2020-12/schema" {
			t.Errorf("the schema of the %s follows %v", of, draft)
		}
		c := jsonschema.NewCompiler()
		if err := c.AddResource(of, doc); err != nil {
			t.Fatal(err)
		}
		if compiled[of], err = c.Compile(of); err != nil {
			t.Fatal(err)
		}
	}
	for name, src := range variants(t) {
		data, err := record(t, name, src).JSON()
		if err != nil {
			t.Fatal(err)
		}
		doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(data))
		if err != nil {
			t.Fatal(err)
		}
		if err := compiled["trace"].Validate(doc); err != nil {
			t.Errorf("the record of %s: %v", name, err)
		}
		if compiled["member"].Validate(doc) == nil {
			t.Errorf("the record of %s passes as a member file", name)
		}
	}
}
