package member_test

import (
	"path/filepath"
	"strings"
	"testing"
)

// TestSchemaSlips: one slip each in the form of a sample, and the place at which the schema has it, / for the file; "" where there is
// nothing wrong with the form.
func TestSchemaSlips(t *testing.T) {
	s := compiled(t)
	names, sources := good(t)
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
		{"box.", "\nducts:", "\nstrands: {bond: good, rows: [{name: a, product: Y1860S7-12.5, count: 1, height: 50 mm, jacking stress: 1 GPa, stated losses: {at release: 1 MPa, final: 2 MPa, source: s}}]}\nducts:", "/"},
		{"box.", "coefficient: 0.19", "coefficient: 19", "/ducts/friction/coefficient"},
		{"box.", "unintended angle: 0.008 1/m", "unintended angle: 0.008", "/ducts/friction/unintended angle"},
		{"box.", "by: straight line", "by: line", "/ducts/rows/1/profile/1/by"},
		{"box.", "strands: 7", "strands: 0", "/ducts/rows/0/strands"},
		{"box.", "spacing: 740 mm", "spacing: 740 mm\n      positions: [-370 mm, 370 mm]", "/ducts/rows/0"},
		{"box.", "stressed from: A", "stressed from: C", "/ducts/rows/1/stressed from"},
		{"box.", "at stressing: 60 MPa", "at release: 60 MPa", "/ducts/rows/0/stated losses"},
		{"hollow unit.", "    from: 60 mm\n", "", "/shape/joint"},
		{"hollow unit.", "casting: unpropped", "casting: wet", "/topping/casting"},
		{"hollow unit.", "kind: construction", "kind: construction\n    category: A", "/actions/1"},
		{"hollow unit.", "count: 6", "count: 6\n    shape: round", "/shape/voids"},
		{"trapezoid.", "      group: straight\n", "", "/strands/rows/0"},
		{"trapezoid.", "        held down from ends: 5.0 m\n", "", "/strands/groups/2/deflected"},
		{"inverted T.", "count: 8", "count: 8\n      group: low", "/strands/rows/0/group"},
		{"double T.", "[-625 mm, -575 mm, 575 mm, 625 mm]", "[]", "/strands/rows/0/positions"},
		{"double T.", "[-625 mm, -575 mm, 575 mm, 625 mm]", "[-625, 625 mm]", "/strands/rows/0/positions/0"},
		{"polygon.", "{x: 250 mm, y: 0 mm}", "{x: 250, y: 0 mm}", "/shape/corners/1/x"},
		{"polygon.", "{x: 250 mm, y: 0 mm}", "{x: 250 mm, z: 0 mm}", "/shape/corners/1"},
		{"polygon.", "- axial: 80 kN", "- {axial: 80 kN, uniform: 1 kN/m}", "/actions/1/loads/0"},
		{"polygon.", "- axial: 80 kN", "- {axial: 80 kN, at: 1 m}", "/actions/1/loads/0"},
		{"polygon.", "stress diagram: parabola-rectangle", "stress diagram: curve", "/concrete/stress diagram"},
		{"U.", "acts on: bare member", "acts on: bare", "/actions/1/acts on"},
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
			} else if err == nil || !strings.Contains(err.Error(), "at '"+strings.TrimSuffix(e.at, "/")+"':") {
				t.Errorf("%s: want an error at %s, have %v", e.new, e.at, err)
			}
		}
	}
}
