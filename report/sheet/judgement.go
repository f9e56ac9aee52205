package sheet

import (
	"fmt"
	"strings"

	"soffit/calc/quantity"
	"soffit/calc/trace"
)

// judgement is what the checks of a note come to.
type judgement struct {
	checks []*trace.Check // the worst first
	fail   int
}

func judge(n *trace.Note) judgement {
	j := judgement{checks: n.Ranked()}
	for _, k := range j.checks {
		if k.Failed() {
			j.fail++
		}
	}
	return j
}

// printedRatio is the ratio of a check at its governing row as the sheets print it, 0 for a margin.
func printedRatio(k *trace.Check) float64 {
	v, err := quantity.Value(k.Ratio[k.Worst])
	if err != nil {
		return 0
	}
	return v
}

var counting = [...]string{"no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten", "eleven", "twelve"}

func count(n int) string {
	if n < len(counting) {
		return counting[n]
	}
	return fmt.Sprint(n)
}

// words is the verdict in one sentence.
func (j judgement) words() string {
	n := len(j.checks)
	s := ""
	switch {
	case n == 0:
		s = "this note makes no check"
	case n == 1 && j.fail == 0:
		s = "the one check of this note passes"
	case n == 1:
		s = "the one check of this note fails"
	case j.fail == 0:
		s = fmt.Sprintf("all %s checks pass", count(n))
	case j.fail == n:
		s = fmt.Sprintf("all %s checks fail", count(n))
	case j.fail == 1:
		s = fmt.Sprintf("one of %s checks fails", count(n))
	default:
		s = fmt.Sprintf("%s of %s checks fail", count(j.fail), count(n))
	}
	return strings.ToUpper(s[:1]) + s[1:]
}
