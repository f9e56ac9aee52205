package trace

import (
	"fmt"
	"strings"

	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// An axis takes one of five places in a frame: the implicit one and one per index letter.
const (
	implicit = iota
	letterI
	letterJ
	letterN
	letterM
	places
)

func letter(index string) int {
	switch index {
	case "i":
		return letterI
	case "j":
		return letterJ
	case "n":
		return letterN
	case "m":
		return letterM
	}
	return implicit
}

// supplier is one line that gives a symbol its values, with the stride of each axis in it.
type supplier struct {
	line   *Line
	offset int
	stride [places]int
	from   string
}

// frame gives a compiled formula its operands at the current row of each axis.
type frame struct {
	slots  [][]supplier
	axes   [places]*Axis
	at     [places]int
	shadow bool
	miss   error
}

// add ties a line to a slot; picked is the row the implicit axis is held at, or −1.
func (f *frame) add(slot int, l *Line, path string, picked int) error {
	s := supplier{line: l, from: path}
	stride := 1
	for k := len(l.Axes) - 1; k >= 0; k-- {
		a := l.Axes[k]
		p := letter(a.Index)
		if p == implicit && picked >= 0 {
			s.offset += picked * stride
		} else {
			if f.axes[p] == nil {
				f.axes[p] = a
			}
			if f.axes[p] != a {
				return fmt.Errorf("%s runs over %q where this block runs over %q", l.Symbol.Name, a.Name, f.axes[p].Name)
			}
			s.stride[p] = stride
		}
		stride *= len(a.Rows)
	}
	f.slots[slot] = append(f.slots[slot], s)
	return nil
}

// Value is the operand in a slot at the current rows, in base units.
func (f *frame) Value(slot int) float64 {
	l, i := f.taken(slot)
	switch {
	case l == nil:
		if f.miss == nil {
			f.miss = fmt.Errorf("%s was not computed on this branch", f.slots[slot][0].line.Symbol.Name)
		}
		return 0
	case f.shadow:
		return l.Shadow[i]
	}
	return l.Values[i]
}

// taken is the line that gives the operand in a slot at the current rows, and the position in it; nil for none.
func (f *frame) taken(slot int) (*Line, int) {
	for k := range f.slots[slot] {
		s := &f.slots[slot][k]
		i := s.offset
		for p := range f.at {
			i += f.at[p] * s.stride[p]
		}
		if s.line.Shown[i] != "" {
			return s.line, i
		}
	}
	return nil, 0
}

// Len is the number of rows of an index.
func (f *frame) Len(index string) int {
	if a := f.axes[letter(index)]; a != nil {
		return len(a.Rows)
	}
	return 0
}

// Set moves an index to a row.
func (f *frame) Set(index string, row int) { f.at[letter(index)] = row }

// runs says whether any operand depends on an axis.
func (f *frame) runs(p int) bool {
	for _, s := range f.slots {
		for k := range s {
			if s[k].stride[p] != 0 {
				return true
			}
		}
	}
	return false
}

func (f *frame) uses(symbols []*formula.Symbol) []Use {
	out := make([]Use, len(symbols))
	for i, s := range symbols {
		out[i].Symbol = s.Name
		for _, sup := range f.slots[i] {
			out[i].From = append(out[i].From, sup.from)
		}
	}
	return out
}

func (f *frame) dim(symbols []*formula.Symbol) func(*formula.Symbol) (quantity.Dim, error) {
	return func(s *formula.Symbol) (quantity.Dim, error) {
		for i, t := range symbols {
			if t.Name == s.Name {
				return f.slots[i][0].line.Unit.Dim(), nil
			}
		}
		return quantity.Dim{}, fmt.Errorf("unknown symbol %s", s.Name)
	}
}

// values lists the operands at the current rows, for an error that people can act on.
func (f *frame) values(symbols []*formula.Symbol) string {
	var b strings.Builder
	for i, s := range symbols {
		sup := f.slots[i][0]
		if b.Len() > 0 {
			b.WriteString(", ")
		}
		fmt.Fprintf(&b, "%s = %s %s", s.Name,
			quantity.Format(sup.line.Unit.From(f.Value(i)), max(sup.line.Decimals, 0)), sup.line.Unit)
	}
	return b.String()
}
