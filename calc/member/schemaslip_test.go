package member_test

import (
	"path/filepath"
	"strings"
	"testing"
)

// TestSchemaSlips: one slip each in the form of a sample, and the place at which the schema has it; "" where there is
// nothing wrong with the form.
func TestSchemaSlips(t *testing.T) {
	s := compiled(t)
	names, sources := samples(t, "members")
	edits := []struct{ in, old, new, at string }{
		{"t-", "kind: T", "kind: I", "/shape"},
		{"t-", "  web width: 300 mm\n", "", "/shape"},
		{"t-", "  haunch depth: 40 mm\n", "", ""},
		{"t-", "kind: T", "kind: L", "/shape/kind"},
		{"t-", "    category: B\n", "", "/actions/2"},
		{"t-", "kind: permanent", "kind: permanent\n    category: B", "/actions/0"},
		{"t-", "category: B", "category: office", "/actions/2/category"},
		{"t-", "combination: 6.10a/b", "combination: 6.10b", "/basis/combination"},
		{"t-", "combination: 6.10a/b", "combination: 6.10", ""},
		{"t-", "combination: 6.10a/b", "combination: 6.11", "/basis/combination"},
		{"t-", "depth: 650 mm", "depth: 65 cm", ""},
		{"t-", "depth: 650 mm", "depth: 650mm", ""},
		{"t-", "depth: 650 mm", "depth: 650", "/shape/depth"},
		{"t-", "depth: 650 mm", "depth: 650 MPa", "/shape/depth"},
		{"t-", "depth: 650 mm", "depth: [650 mm]", "/shape/depth"},
		{"t-", "f_ck: 45 MPa", "f_ck: 45 N/mm²", ""},
		{"t-", "f_ck: 45 MPa", "f_ck: -45 N/mm²", "/concrete/f_ck"},
		{"t-", "uniform: 2.9 kN/m", "uniform: -2.9 kN/m", ""},
		{"t-", "uniform: 2.9 kN/m", "uniform: 2.9 kN/m²", "/actions/0/loads/0/uniform"},
		{"t-", "{point: 14 kN, at: 3.85 m}", "{point: 14 kN}", "/actions/1/loads/0"},
		{"t-", "{point: 14 kN, at: 3.85 m}", "{at: 3.85 m}", "/actions/1/loads/0"},
		{"t-", "{point: 14 kN, at: 3.85 m}", "{point: 14 kN, at: 3.85 m, uniform: 2 kN/m}", "/actions/1/loads/0"},
		{"t-", "{point: 14 kN, at: 3.85 m}", "{}", "/actions/1/loads/0"},
		{"t-", "count: 4", "count: '4'", ""},
		{"t-", "count: 4", "count: four", "/strands/rows/0/count"},
		{"t-", "name: lower", "name: a/b", "/strands/rows/0/name"},
		{"t-", "date: 2031-03-24, ", "date: 24.3.2031, ", "/document/history/0/date"},
		{"t-", "exposure: [XC3]", "exposure: [XC3, XC3]", "/basis/exposure"},
		{"ib-", "product: Y1860S7-12.5", "product: Y1860S7-12,5", "/strands/rows/0/product"},
		{"t-", "product: Harrow 7x12.9", "product: Harrow", ""}, // which products a file adds is beyond a schema
		{"ib-", "alpha_cc: {value: 0.85,", "α_cc: {value: 85 %,", ""},
		{"ib-", "alpha_cc: {value: 0.85,", "alpha_cc: {value: 0.5,", "/basis/national parameters/alpha_cc/value"},
		{"ib-", "alpha_cc: {value: 0.85,", "alpha_cd: {value: 0.85,", "/basis/national parameters"},
		{"ib-", "alpha_cc: {value: 0.85,", "alpha_cc: {table: 0.85,", "/basis/national parameters/alpha_cc"},
		{"ib-", "alpha_cc: {value: 0.85,", "A_s,max: {expression: 0.03·A_c,", ""},
		{"ib-", "alpha_cc: {value: 0.85,", "A_s,max: {value: 9000 mm², expression: 0.03·A_c,", "/basis/national parameters/A_s,max"},
		{"ib-", "narrative:\n  basis:", "narrative:\n  base:", "/narrative"},
		{"ib-", "format: soffit/1", "format: soffit/2", "/format"},
		{"ib-", "bottom flange: {width: 400 mm,", "bottom flange: {breadth: 400 mm,", "/shape/bottom flange"},
	}
	for _, e := range edits {
		for i, src := range sources {
			if !strings.HasPrefix(filepath.Base(names[i]), e.in) {
				continue
			}
			spoiled := strings.Replace(string(src), e.old, e.new, 1)
			if spoiled == string(src) {
				t.Fatalf("%s is not in %s", e.old, names[i])
			}
			_, doc, ok := document(names[i], []byte(spoiled))
			if !ok {
				t.Fatalf("%s cannot be read", e.new)
			}
			err := s.Validate(doc)
			if e.at == "" {
				if err != nil {
					t.Errorf("%s: %v", e.new, err)
				}
			} else if err == nil || !strings.Contains(err.Error(), "at '"+e.at+"':") {
				t.Errorf("%s: want an error at %s, have %v", e.new, e.at, err)
			}
		}
	}
}
