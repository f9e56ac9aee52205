package design_test

import (
	"fmt"
	"math"
	"math/rand/v2"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
)

// anyBeam is a member of random but sensible measures.
func anyBeam(r *rand.Rand) beam {
	between := func(lo, hi, step int) int { return lo + step*r.IntN((hi-lo)/step+1) }
	depth := between(300, 1600, 50)
	b := beam{length: fmt.Sprintf("%d.%d m", between(4, 25, 1), r.IntN(10)), combination: []string{"6.10", "6.10a/b"}[r.IntN(2)]}
	fck := between(30, 90, 5)
	b.concrete = fmt.Sprintf("{f_ck: %d MPa, unit weight: 25 kN/m³, f_ck at release: %d MPa}", fck, between(25, fck, 5))
	width := between(160, 500, 20)
	switch r.IntN(3) {
	case 0:
		b.shape = fmt.Sprintf("{kind: rectangle, width: %d mm, depth: %d mm}", width, depth)
	case 1:
		b.shape = fmt.Sprintf("{kind: T, depth: %d mm, flange width: %d mm, flange depth: %d mm, haunch depth: %d mm, web width: %d mm}", depth, width+between(0, 900, 100), between(60, depth/3, 10), 20*r.IntN(3), width)
	default:
		web := between(100, 160, 10)
		b.shape = fmt.Sprintf("{kind: I, depth: %d mm, top flange: {width: %d mm, depth: %d mm, haunch depth: %d mm}, web width: %d mm, bottom flange: {width: %d mm, depth: 100 mm, haunch depth: 30 mm}}",
			depth, web+between(40, 600, 20), between(60, depth/4, 10), 20*r.IntN(3), web, width)
	}
	rows := ""
	for i := range 1 + r.IntN(3) {
		rows += fmt.Sprintf("    - {name: row %d, product: Y1860S7-12.5, count: %d, spacing: 30 mm, height: %d mm, debonded length: %d mm, jacking stress: %d MPa, stated losses: {at release: 90 MPa, final: %d MPa, source: invented}}\n",
			i+1, 1+r.IntN((width-100)/30+1), 45+i*45, 500*r.IntN(3)*min(i, 1), between(900, 1400, 50), between(150, 400, 10))
	}
	diagram := []string{"horizontal", "inclined"}[r.IntN(2)]
	b.strands = "  bond: good\n  steel diagram: " + diagram + "\n  rows:\n" + strings.TrimSuffix(rows, "\n")
	if r.IntN(2) == 0 {
		b.bars = fmt.Sprintf("  steel diagram: %s\n  rows:\n    - {name: up, count: 2, diameter: %d mm, spacing: %d mm, height: %d mm, f_yk: 500 MPa, ductility class: B}",
			[]string{"horizontal", "inclined"}[r.IntN(2)], between(8, 20, 4), 60, depth-45)
	}
	b.actions = fmt.Sprintf("  - {name: dead, kind: permanent, loads: [{uniform: %d kN/m}]}\n  - {name: live, kind: variable, category: %s, loads: [{uniform: %d kN/m}, {point: %d kN, at: 2 m}]}", r.IntN(12), []string{"A", "C", "H"}[r.IntN(3)], r.IntN(15), r.IntN(60))
	return b
}

// trials is how many random members are run.
var trials = 60

// TestRandomMembers: each gives a closed note whose rounding moves no check, whose two ways of bending agree within 2 % wherever the
// concrete crushes in a compressed zone of at most 0.4 of the depth, or is refused in words.
func TestRandomMembers(t *testing.T) {
	r := rand.New(rand.NewPCG(3, 5))
	notes, refused, found := 0, 0, 0
	for range trials {
		b := anyBeam(r)
		m, findings := member.Read("beam.yaml", []byte(b.text()), design.Options())
		if findings.Err() != nil {
			found++
			continue
		}
		n, err := design.Run(m)
		if err != nil {
			refused++
			if !strings.Contains(err.Error(), "take out tendons") {
				t.Errorf("%v\n%s", err, b.text())
			}
			continue
		}
		notes++
		if _, differences := trace.Closure(n); len(differences) > 0 {
			t.Errorf("%v\n%s", differences[0], b.text())
		}
		if effect, check := n.Rounding(); !(effect < 0.002*max(1, check.Value[check.Worst]/10)) {
			t.Errorf("rounding moves %s by %.5f of %.3f\n%s", check.Name, effect, check.Value[check.Worst], b.text())
		}
		twoWays(t, n, b)
	}
	t.Logf("%d notes, %d refused, %d with findings", notes, refused, found)
	if notes < trials/2 {
		t.Errorf("only %d notes of %d", notes, trials)
	}
}

func twoWays(t *testing.T, n *trace.Note, b beam) {
	t.Helper()
	difference := trace.LineOf(n.Entry("second.bending/resistance-difference"))
	ratio := trace.LineOf(n.Entry("ultimate.bending/axis-ratio"))
	if difference == nil || ratio == nil {
		return
	}
	for i := range difference.Shown {
		if !difference.Taken(i) || !ratio.Taken(i) || ratio.Values[i] > 0.4 {
			continue
		}
		if d := math.Abs(difference.Values[i]); d > 0.02 {
			t.Errorf("two ways differ by %.4f at %s, x/d = %s\n%s", difference.Values[i], trace.RowName(difference.Axes, i), ratio.Shown[i], b.text())
			return
		}
	}
}
