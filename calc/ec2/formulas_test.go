package ec2_test

import (
	"flag"
	"os"
	"sort"
	"strings"
	"testing"

	"soffit/calc/clause"
	_ "soffit/calc/ec2"
	"soffit/calc/formula"
	_ "soffit/calc/mechanics"
)

var update = flag.Bool("update", false, "rewrite the list of formula IDs")

func formulas() []*clause.Formula {
	fs := clause.Formulas()
	sort.Slice(fs, func(i, k int) bool { return fs[i].ID < fs[k].ID })
	return fs
}

// TestWorkedExamples works every example of every formula of the program.
func TestWorkedExamples(t *testing.T) {
	for _, f := range formulas() {
		if len(f.Examples) == 0 {
			t.Errorf("%s has no worked example", f.ID)
		}
		for _, e := range f.Examples {
			if e.Source == "" || e.Grade == "" {
				t.Errorf("%s: an example without source or grade", f.ID)
			}
			if got, err := f.Try(e); err != nil {
				t.Errorf("%s (%s, %s): %v; got %v", f.ID, e.Source, e.Grade, err, got)
			}
		}
	}
}

// TestPrintParse prints every formula back and parses it to the same tree.
func TestPrintParse(t *testing.T) {
	for _, f := range formulas() {
		tree, err := f.Parsed()
		if err != nil {
			t.Error(err)
			continue
		}
		again, err := formula.Parse(tree.String())
		if err != nil || !formula.Equal(tree.Expr, again.Expr) || tree.Symbol.Name != again.Symbol.Name {
			t.Errorf("%s: %s\nprints as %s: %v", f.ID, f.Text, tree, err)
		}
	}
}

// TestFormulaIDs holds the IDs against the lists of those in use and of those given up, which are never used again.
func TestFormulaIDs(t *testing.T) {
	const file = "testdata/formula-ids.txt"
	seen := map[string]bool{}
	var ids []string
	for _, f := range formulas() {
		if seen[f.ID] {
			t.Errorf("ID %s is used twice", f.ID)
		}
		seen[f.ID] = true
		ids = append(ids, f.ID)
	}
	if *update {
		if err := os.WriteFile(file, []byte(strings.Join(ids, "\n")+"\n"), 0o644); err != nil {
			t.Fatal(err)
		}
	}
	data, err := os.ReadFile(file)
	if err != nil {
		t.Fatal(err)
	}
	gone, err := os.ReadFile("testdata/retired-ids.txt")
	if err != nil {
		t.Fatal(err)
	}
	for _, id := range strings.Fields(string(gone)) {
		if seen[id] {
			t.Errorf("ID %s was given up and is used again", id)
		}
	}
	listed := map[string]bool{}
	for _, id := range strings.Fields(string(data)) {
		listed[id] = true
		if !seen[id] {
			t.Errorf("ID %s is listed and no longer there", id)
		}
	}
	for _, id := range ids {
		if !listed[id] {
			t.Errorf("ID %s is not listed: run go test ./calc/ec2 -update", id)
		}
	}
}
