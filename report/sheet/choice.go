package sheet

import (
	"fmt"
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// choice sets a branch: what is asked, the condition with its numbers, and the words of the outcome.
func (c *composer) choice(b *trace.Block, k *trace.Choice) {
	asked := func(i int) bool { return k.Outcomes[i] != trace.NotAsked }
	w, ok := workedAt(b, k.Axes, len(k.Outcomes), asked)
	if !ok {
		return
	}
	e := columnsFor(&k.Head, c.document, c.index.from(k.Uses, w.place))
	c.title(e, b, k.Name, k.Axes, w)
	o := &operands{note: c.note, uses: k.Uses, w: w}
	word := "holds"
	if k.Outcomes[w.flat] == trace.No {
		word = "does not hold"
	}
	set := mathset.Setting{Size: textSize}
	question := o.symbols().Cond(k.Cond).Then(0, set.Words(draw.Serif, ":"))
	answer := o.numbers().Cond(k.Cond).Then(0.5, set.Words(draw.Serif, word))
	if one := question.Then(0.6, answer); one.Width() <= e.work.w-indent {
		e.formula(one)
	} else {
		e.formula(question)
		e.formula(answer)
	}
	if others := c.outcomes(k); others != "" {
		e.work.small(func() { e.work.words(draw.Serif, smallSize, smallLead, 2, others) })
	}
	outcome := k.Yes
	if k.Outcomes[w.flat] == trace.No {
		outcome = k.No
	}
	e.result.words(draw.Bold, textSize, textLead, 0, outcome)
	e.result.right(0, e.result.w)
	c.add(e.element(false))
}

// outcomes says on which rows each way was taken, where there is more than one row.
func (c *composer) outcomes(k *trace.Choice) string {
	if len(k.Outcomes) < 2 {
		return ""
	}
	var parts []string
	for _, side := range []struct {
		outcome trace.Outcome
		words   string
	}{{trace.Yes, k.Yes}, {trace.No, k.No}} {
		is := func(i int) bool { return k.Outcomes[i] == side.outcome }
		n := 0
		for i := range k.Outcomes {
			if is(i) {
				n++
			}
		}
		switch n {
		case 0:
		case len(k.Outcomes):
			return fmt.Sprintf("%s on all %d rows", side.words, n)
		default:
			parts = append(parts, fmt.Sprintf("%s on %d of %d rows: %s", side.words, n, len(k.Outcomes), ranges(k.Axes, len(k.Outcomes), is)))
		}
	}
	return strings.Join(parts, "; ")
}

// ranges names rows, consecutive ones by the first and the last.
func ranges(axes []*trace.Axis, n int, is func(i int) bool) string {
	var parts []string
	for i := 0; i < n; i++ {
		if !is(i) {
			continue
		}
		end := i
		for end+1 < n && is(end+1) {
			end++
		}
		s := joined(trace.RowName(axes, i))
		if end > i {
			s += " … " + joined(trace.RowName(axes, end))
		}
		parts = append(parts, s)
		i = end
	}
	return strings.Join(parts, ", ")
}
