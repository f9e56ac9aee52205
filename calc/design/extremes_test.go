package design_test

import (
	"fmt"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
)

// TestRoundingAtExtremes: rounding moves no check by 0.002, for short and long beams, many and few loads, steel at the
// top, narrow and deep sections; invented.
func TestRoundingAtExtremes(t *testing.T) {
	many := ""
	for i := range 15 {
		many += fmt.Sprintf(", {point: %d kN, at: %d.%d m}", 2+i, 1+i/2, i)
	}
	row := func(name string, count int, height string) string {
		return fmt.Sprintf("    - {name: %s, product: Y1860S7-12.5, count: %d, spacing: 40 mm, height: %s, jacking stress: 1340 MPa, stated losses: {at release: 100 MPa, final: 250 MPa, source: invented}}\n", name, count, height)
	}
	strands := func(rows ...string) string {
		return "  bond: good\n  rows:\n" + strings.TrimSuffix(strings.Join(rows, ""), "\n")
	}
	for name, b := range map[string]beam{
		"short":       {length: "3 m", actions: "  - {name: floor, kind: variable, category: B, loads: [{uniform: 60 kN/m}]}"},
		"long":        {length: "60 m", shape: "{kind: I, depth: 2500 mm, top flange: {width: 900 mm, depth: 200 mm}, web width: 180 mm, bottom flange: {width: 800 mm, depth: 250 mm}}", strands: strands(row("a", 18, "60 mm"), row("b", 18, "110 mm"), row("c", 18, "160 mm")), actions: "  - {name: floor, kind: variable, category: B, loads: [{uniform: 6 kN/m}]}"},
		"many loads":  {actions: "  - {name: floor, kind: variable, category: B, loads: [{uniform: 1 kN/m}" + many + "]}"},
		"top strand":  {strands: strands(row("low", 6, "50 mm"), row("top", 2, "560 mm"))},
		"one strand":  {shape: "{kind: rectangle, width: 100 mm, depth: 200 mm}", strands: strands(row("only", 1, "40 mm")), length: "4 m", actions: "  - {name: floor, kind: variable, category: B, loads: [{uniform: 1 kN/m}]}"},
		"light":       {actions: "  - {name: floor, kind: variable, category: B, loads: [{uniform: 0.01 kN/m}]}"},
		"permanent":   {actions: "  - {name: roof, kind: permanent, loads: [{uniform: 3 kN/m}]}"},
		"no action":   {actions: "  []"},
		"uplift":      {actions: "  - {name: wind, kind: variable, category: wind, loads: [{uniform: -4 kN/m}]}"},
		"strong bars": {bars: "  rows:\n    - {name: low, count: 2, diameter: 32 mm, spacing: 200 mm, height: 90 mm, f_yk: 500 MPa, ductility class: B}\n    - {name: up, count: 2, diameter: 32 mm, spacing: 200 mm, height: 550 mm, f_yk: 500 MPa, ductility class: B}"},
	} {
		m, findings := member.Read("beam.yaml", []byte(b.text()), design.Options())
		if err := findings.Err(); err != nil {
			t.Errorf("%s: %v", name, err)
			continue
		}
		n, err := design.Run(m)
		if err != nil {
			t.Errorf("%s: %v", name, err)
			continue
		}
		if effect, check := n.Rounding(); !(effect < 0.002) {
			t.Errorf("%s: rounding moves %s by %.5f", name, check.Name, effect)
		}
		if _, differences := trace.Closure(n); len(differences) > 0 {
			t.Errorf("%s: %v", name, differences[0])
		}
	}
}
