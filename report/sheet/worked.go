package sheet

import (
	"soffit/calc/formula"
	"soffit/calc/trace"
	"soffit/report/mathset"
)

// worked is the row of an entry that the sheet works in full.
type worked struct {
	place trace.Place // rows of the entry's axes, and of the block's implicit axis
	flat  int         // position in the entry's series
}

// workedAt chooses the row: that of the block and of every other axis; where that was not taken, the
// first that was. ok is false where no row was.
func workedAt(b *trace.Block, axes []*trace.Axis, rows int, taken func(i int) bool) (w worked, ok bool) {
	home := trace.Place{}
	if b.Over != nil {
		home = home.With(b.Over, b.Row)
	}
	at := home
	for _, a := range axes {
		if a != b.Over {
			at = at.With(a, a.Work)
		}
	}
	if i := trace.Flat(axes, at); i >= 0 && taken(i) {
		return worked{at, i}, true
	}
	for i := range rows {
		if taken(i) {
			at := home
			for _, q := range trace.PlaceAt(axes, i) {
				at = at.With(q.Axis, q.Row)
			}
			return worked{at, i}, true
		}
	}
	return worked{at, 0}, false
}

// workedLine is workedAt for a line: where the chosen row of its index axes is nothing but zero, the first row at the
// same place along the member that is not shows more.
func workedLine(b *trace.Block, l *trace.Line) (worked, bool) {
	w, ok := workedAt(b, l.Axes, len(l.Shown), l.Taken)
	if !ok || l.Values[w.flat] != 0 {
		return w, ok
	}
	for i, v := range l.Values {
		if v == 0 || !l.Taken(i) {
			continue
		}
		at, same := w.place, true
		for _, q := range trace.PlaceAt(l.Axes, i) {
			same = same && (q.Axis.Index != "" || q.Row == w.place.Of(q.Axis))
			at = at.With(q.Axis, q.Row)
		}
		if same {
			return worked{at, i}, true
		}
	}
	return w, ok
}

// indices are the rows of the index letters at the place.
func (w worked) indices() map[string]int {
	out := map[string]int{}
	for _, q := range w.place {
		if q.Axis.Index != "" {
			out[q.Axis.Index] = q.Row
		}
	}
	return out
}

// operands gives a formula its numbers at a place.
type operands struct {
	note *trace.Note
	uses []trace.Use
	w    worked
}

// find is the line and the row that a symbol stands for, the rows of its indices given by at.
func (o *operands) find(name string, at map[string]int) (*trace.Line, int, bool) {
	for _, u := range o.uses {
		if u.Symbol != name {
			continue
		}
		p := o.w.place
		for _, from := range u.From {
			for _, a := range axesOf(o.note, from) {
				if r, ok := at[a.Index]; ok && a.Index != "" {
					p = p.With(a, r)
				}
			}
		}
		l, i, err := o.note.Resolve(u, p)
		return l, i, err == nil
	}
	return nil, 0, false
}

func axesOf(n *trace.Note, from string) []*trace.Axis {
	for i := range from {
		if from[i] == '@' {
			from = from[:i]
			break
		}
	}
	if l := trace.LineOf(n.Entry(from)); l != nil {
		return l.Axes
	}
	return nil
}

// numbers is the setting in which a formula is printed with its numbers.
func (o *operands) numbers() mathset.Setting {
	s := o.symbols()
	s.Operand = func(sym *formula.Symbol, at map[string]int) (mathset.Operand, bool) {
		l, i, ok := o.find(sym.Name, at)
		if !ok {
			return mathset.Operand{}, false
		}
		return mathset.Operand{Number: l.Shown[i], Unit: l.Unit.String(), Anchor: l.Key}, true
	}
	s.Anchor = nil
	s.Len = o.rows
	s.Holds = o.holds
	return s
}

// symbols is the setting in which it is printed with its symbols, each leading to where it comes from.
func (o *operands) symbols() mathset.Setting {
	return mathset.Setting{Size: textSize, At: o.w.indices(), Anchor: func(sym *formula.Symbol, at map[string]int) string {
		if l, _, ok := o.find(sym.Name, at); ok {
			return l.Key
		}
		return ""
	}}
}

// rows is how many rows an index has in the operands.
func (o *operands) rows(index string) int {
	for _, u := range o.uses {
		for _, from := range u.From {
			for _, a := range axesOf(o.note, from) {
				if a.Index == index {
					return len(a.Rows)
				}
			}
		}
	}
	return 0
}

func (o *operands) holds(c formula.Cond, at map[string]int) bool {
	p := formula.CompileCond(c)
	f := &reading{o: o, symbols: p.Symbols, at: map[string]int{}}
	for k, v := range at {
		f.at[k] = v
	}
	ok, err := p.Holds(f)
	return ok && err == nil
}

// reading gives a compiled condition the printed values.
type reading struct {
	o       *operands
	symbols []*formula.Symbol
	at      map[string]int
}

// Value is the printed value in base units; a symbol without one is 0.
func (f *reading) Value(slot int) float64 {
	if l, i, ok := f.o.find(f.symbols[slot].Name, f.at); ok {
		return l.Values[i]
	}
	return 0
}

func (f *reading) Len(index string) int      { return f.o.rows(index) }
func (f *reading) Set(index string, row int) { f.at[index] = row }
