package design_test

import (
	"bytes"
	"flag"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"github.com/santhosh-tekuri/jsonschema/v6"

	"soffit/calc/trace"
)

var update = flag.Bool("update", false, "rewrite the golden traces")

// TestGolden holds the record of every sample against the one kept, but for unrounded values, whose last digits
// differ between processors.
func TestGolden(t *testing.T) {
	for _, file := range samples(t) {
		n := run(t, file)
		data, err := n.JSON()
		if err != nil {
			t.Fatal(err)
		}
		golden := filepath.Join("../../testdata/golden", strings.TrimSuffix(filepath.Base(file), ".yaml")+".trace.json")
		if *update {
			if err := os.MkdirAll(filepath.Dir(golden), 0o755); err != nil {
				t.Fatal(err)
			}
			if err := os.WriteFile(golden, data, 0o644); err != nil {
				t.Fatal(err)
			}
		}
		want, err := os.ReadFile(golden)
		if err != nil {
			t.Fatal(err)
		}
		kept, err := trace.Read(bytes.NewReader(want))
		if err != nil {
			t.Fatal(err)
		}
		if kept.DocumentFingerprint() != n.DocumentFingerprint() || kept.Fingerprint() != n.Fingerprint() {
			t.Errorf("%s differs from %s, first here:\n%s\nrun go test ./calc/design -update if this is meant", file, golden, firstDifference(data, want))
		}
	}
}

func firstDifference(got, want []byte) string {
	g, w := strings.Split(string(got), "\n"), strings.Split(string(want), "\n")
	for i := range min(len(g), len(w)) {
		if g[i] != w[i] && !strings.Contains(g[i], `"unrounded"`) && !strings.Contains(g[i], "ingerprint") {
			return "have " + g[i] + "\nwant " + w[i]
		}
	}
	return "one is longer"
}

// TestSchema holds the record of every sample against the JSON Schema.
func TestSchema(t *testing.T) {
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
	for _, file := range samples(t) {
		data, err := run(t, file).JSON()
		if err != nil {
			t.Fatal(err)
		}
		doc, err := jsonschema.UnmarshalJSON(bytes.NewReader(data))
		if err != nil {
			t.Fatal(err)
		}
		if err := s.Validate(doc); err != nil {
			t.Errorf("%s: %v", file, err)
		}
	}
}
