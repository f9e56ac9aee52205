package trace

import (
	"errors"
	"fmt"

	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// reader rebuilds a note from its JSON form; the first fault sticks.
type reader struct {
	axes map[string]*Axis
	err  error
}

func (in *noteJSON) note() (*Note, error) {
	n := New(in.Document)
	n.Axes, n.stated = in.Axes, in.Fingerprint
	r := &reader{axes: map[string]*Axis{}}
	for _, a := range in.Axes {
		if a == nil || len(a.Rows) == 0 {
			return nil, errors.New("an axis without rows")
		}
		if a.Work < 0 || a.Work >= len(a.Rows) {
			return nil, fmt.Errorf("axis %q has no row %d", a.Name, a.Work)
		}
		r.axes[a.Name] = a
	}
	for _, cj := range in.Chapters {
		c := &Chapter{Number: cj.Number, Slug: cj.Slug, Title: cj.Title, note: n}
		n.Chapters = append(n.Chapters, c)
		for _, bj := range cj.Blocks {
			b := &Block{Number: bj.Number, Slug: bj.Slug, Title: bj.Title, Takes: bj.Takes}
			b.build = &builder{note: n, path: c.Slug + "." + b.Slug, symbols: map[string][]*Line{}}
			if bj.Over != "" {
				b.Over = r.axis(bj.Over)
				if r.err == nil {
					if b.Row = b.Over.Row(bj.Row); b.Row < 0 {
						return nil, fmt.Errorf("block %s has no row %q", bj.Number, bj.Row)
					}
				}
			}
			c.Blocks = append(c.Blocks, b)
			for i := range bj.Entries {
				e := r.entry(&bj.Entries[i])
				if r.err != nil {
					return nil, fmt.Errorf("%s: %w", bj.Entries[i].Key, r.err)
				}
				b.record(e)
			}
		}
	}
	if r.err == nil {
		r.err = n.err
	}
	return n, r.err
}

func (r *reader) fail(err error) {
	if r.err == nil && err != nil {
		r.err = err
	}
}

func (r *reader) axis(name string) *Axis {
	a := r.axes[name]
	if a == nil {
		r.fail(fmt.Errorf("no axis %q", name))
	}
	return a
}

func (r *reader) axesOf(names []string) []*Axis {
	var out []*Axis
	for _, n := range names {
		if a := r.axis(n); a != nil {
			out = append(out, a)
		}
	}
	return out
}

func (r *reader) unit(s string) quantity.Unit {
	u, err := quantity.ParseUnit(s)
	r.fail(err)
	return u
}

func (r *reader) head(j *entryJSON) Head {
	h := Head{Number: j.Number, Key: j.Key, Name: j.Name}
	if j.Clause != nil {
		h.Ref = *j.Clause
	}
	return h
}

func (r *reader) line(j *entryJSON) Line {
	l := Line{Head: r.head(j)}
	var err error
	l.Symbol, err = formula.ParseSymbol(j.Symbol)
	r.fail(err)
	l.Axes, l.Unit = r.axesOf(j.Axes), r.unit(j.Unit)
	n := size(l.Axes)
	if r.err == nil && (len(j.Shown) != n || len(j.Unrounded) != n || j.Decimals == nil) {
		r.fail(fmt.Errorf("%d shown and %d unrounded values for %d rows", len(j.Shown), len(j.Unrounded), n))
	}
	if r.err != nil {
		return l
	}
	l.Decimals = *j.Decimals
	l.Shown, l.Values, l.Shadow = j.Shown, make([]float64, n), make([]float64, n)
	for i, s := range l.Shown {
		if s == "" {
			continue
		}
		if j.Unrounded[i] == nil {
			r.fail(fmt.Errorf("row %d has no unrounded value", i))
			return l
		}
		r.fail(l.set(i, s, l.Unit.To(float64(*j.Unrounded[i]))))
	}
	return l
}

func (r *reader) entry(j *entryJSON) Entry {
	switch j.Kind {
	case "given":
		return &Given{Line: r.line(j), Source: j.Source}
	case "step":
		tree, err := formula.Parse(j.Formula)
		r.fail(err)
		return &Step{Line: r.line(j), Formula: tree, Uses: j.Uses}
	case "root":
		e := &Root{Line: r.line(j), Equation: j.Equation, Residual: j.Residual, Scale: j.Scale, Tolerance: j.Tolerance}
		e.Lo, e.Hi = r.base(j.Lower, e.Unit), r.base(j.Upper, e.Unit)
		return e
	case "choice":
		return r.choice(j)
	case "check":
		return r.check(j)
	case "table":
		return &Table{Head: r.head(j), Axis: r.axis(j.Axis), Columns: j.Columns}
	case "figure":
		return &Figure{Head: r.head(j), Kind: j.Figure, Series: j.Series, At: j.At}
	case "text":
		return &Text{Head: r.head(j), Markdown: j.Markdown, Uses: j.Uses}
	}
	r.fail(fmt.Errorf("unknown kind %q", j.Kind))
	return &Text{}
}

func (r *reader) base(in numbers, u quantity.Unit) []float64 {
	out := make([]float64, len(in))
	for i, v := range in {
		if v != nil {
			out[i] = u.To(float64(*v))
		}
	}
	return out
}

func (r *reader) choice(j *entryJSON) Entry {
	cond, err := formula.ParseCond(j.Condition)
	r.fail(err)
	e := &Choice{Head: r.head(j), Axes: r.axesOf(j.Axes), Cond: cond, Yes: j.Yes, No: j.No, Uses: j.Uses}
	for _, o := range j.Outcome {
		switch o {
		case "":
			e.Outcomes = append(e.Outcomes, NotAsked)
		case "no":
			e.Outcomes = append(e.Outcomes, No)
		case "yes":
			e.Outcomes = append(e.Outcomes, Yes)
		default:
			r.fail(fmt.Errorf("unknown outcome %q", o))
		}
	}
	if len(e.Outcomes) != size(e.Axes) {
		r.fail(fmt.Errorf("%d outcomes for %d rows", len(e.Outcomes), size(e.Axes)))
	}
	return e
}

func (r *reader) check(j *entryJSON) Entry {
	e := &Check{Head: r.head(j), Axes: r.axesOf(j.Axes), Unit: r.unit(j.Unit), Ratio: j.Ratio, Margin: j.Margin}
	n := size(e.Axes)
	if r.err == nil && (len(j.Uses) != 2 || len(j.Ratio) != n || len(j.Margin) != n || len(j.Verdict) != n) {
		r.fail(fmt.Errorf("a check needs demand, limit and %d ratios, margins and verdicts", n))
	}
	if r.err != nil {
		return e
	}
	e.Demand, e.Limit = j.Uses[0], j.Uses[1]
	e.Fails, e.Value = make([]bool, n), make([]float64, n)
	e.Worst = -1
	for i, v := range j.Verdict {
		if v != "fails" && v != "passes" && v != "" {
			r.fail(fmt.Errorf("unknown verdict %q", v))
		}
		e.Fails[i] = v == "fails"
		if e.Ratio[i] != "" {
			f, err := quantity.Value(e.Ratio[i])
			r.fail(err)
			e.Value[i] = f
		}
		if RowName(e.Axes, i) == j.Worst {
			e.Worst = i
		}
	}
	if e.Worst < 0 {
		r.fail(fmt.Errorf("no row %q is the worst", j.Worst))
		e.Worst = 0
	}
	if j.Effect != nil {
		e.Effect = float64(*j.Effect)
	}
	return e
}
