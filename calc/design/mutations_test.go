package design_test

import (
	"fmt"
	"math"
	"math/rand/v2"
	"os"
	"regexp"
	"slices"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
)

var numbers = regexp.MustCompile(`\b\d+(\.\d+)?\b`)

// mutate changes a member file a little, in a way that depends on the generator alone.
func mutate(r *rand.Rand, src string) string {
	lines := strings.Split(src, "\n")
	i := r.IntN(len(lines))
	switch r.IntN(6) {
	case 0: // a line goes
		lines = append(lines[:i:i], lines[i+1:]...)
	case 1: // a line stands twice
		lines = append(lines[:i+1:i+1], lines[i:]...)
	case 2, 3, 4: // a number grows or shrinks
		factor := []string{"0", "-1", "0.001", "0.5", "0.9", "1.1", "1.5", "3", "1000"}[r.IntN(9)]
		for k := range lines {
			l := (i + k) % len(lines)
			if at := numbers.FindAllStringIndex(lines[l], -1); len(at) > 0 {
				p := at[r.IntN(len(at))]
				var v, f float64
				fmt.Sscan(lines[l][p[0]:p[1]], &v)
				fmt.Sscan(factor, &f)
				lines[l] = lines[l][:p[0]] + fmt.Sprintf("%g", v*f) + lines[l][p[1]:]
				break
			}
		}
	default: // a unit changes
		units := []string{"mm", "m", "kN", "MPa", "kN/m", "‰"}
		a, b := units[r.IntN(len(units))], units[r.IntN(len(units))]
		lines[i] = strings.Replace(lines[i], " "+a, " "+b, 1)
	}
	return strings.Join(lines, "\n")
}

// mutants is how many mutations of each sample are tried.
var mutants = 40

// TestMutatedMembers: mutated member files each give findings, an error in words, or a whole note: never a panic,
// and never a value that is no number.
func TestMutatedMembers(t *testing.T) {
	r := rand.New(rand.NewPCG(7, 11))
	found, refused, whole := 0, 0, 0
	for _, file := range samples(t) {
		src, err := os.ReadFile(file)
		if err != nil {
			t.Fatal(err)
		}
		for range mutants {
			text := mutate(r, string(src))
			m, findings := member.Read("m.yaml", []byte(text), design.Options())
			if findings.Err() != nil {
				found++
				continue
			}
			n, err := design.Run(m)
			if err != nil {
				if refused++; len(err.Error()) < 20 {
					t.Errorf("an error that says little: %v", err)
				}
				t.Log(err)
				continue
			}
			whole++
			n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
				if l := trace.LineOf(e); l != nil {
					for i := range l.Shown {
						if l.Taken(i) && (math.IsNaN(l.Values[i]) || math.IsInf(l.Values[i], 0) || math.IsNaN(l.Shadow[i]) || math.IsInf(l.Shadow[i], 0)) {
							t.Errorf("%s is %s, unrounded %g", l.Key, l.Shown[i], l.Shadow[i])
						}
					}
				}
			})
			// A mutated load may be a thousand times too large, and its columns have as many digits less for what is as it should
			// be: beyond a ratio of 10 anywhere what rounding moves may grow with it.
			worst := n.Ranked()[0]
			if effect, check := n.Rounding(); !(effect < 0.002*max(1, slices.Max(check.Value))*max(1, worst.Value[worst.Worst]/10)) {
				t.Errorf("rounding moves %s by %.5f of %.3f", check.Name, effect, slices.Max(check.Value))
			}
			if _, differences := trace.Closure(n); len(differences) > 0 {
				t.Errorf("%d differences, first %v", len(differences), differences[0])
			}
		}
	}
	t.Logf("%d with findings, %d refused, %d notes", found, refused, whole)
	if found < 50 || whole < 50 {
		t.Errorf("the mutations are too wild or too tame: %d with findings, %d notes", found, whole)
	}
}
