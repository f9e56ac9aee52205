package sheet

import (
	"slices"
	"strings"

	"soffit/calc/trace"
)

// index knows who uses whose results.
type index struct {
	note       *trace.Note
	to         map[string][]trace.Entry // entries that use a key, in order
	shown      map[string]*trace.Table  // the first table that shows a key in full
	inputLines int                      // lines of the member file as given
}

func newIndex(n *trace.Note) *index {
	x := &index{note: n, to: map[string][]trace.Entry{}, shown: map[string]*trace.Table{}}
	x.inputLines = len(inputLines(n.Document.Input))
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		switch e := e.(type) {
		case *trace.Text:
			return
		case *trace.Table:
			for _, key := range e.Columns {
				if x.shown[key] == nil {
					x.shown[key] = e
				}
			}
		}
		for _, u := range usesOf(e) {
			for _, from := range u.From {
				key, _, _ := strings.Cut(from, "@")
				if l := x.to[key]; len(l) == 0 || l[len(l)-1] != e {
					x.to[key] = append(l, e)
				}
			}
		}
	})
	return x
}

// usesOf are the operands of an entry.
func usesOf(e trace.Entry) []trace.Use {
	switch e := e.(type) {
	case *trace.Step:
		return e.Uses
	case *trace.Choice:
		return e.Uses
	case *trace.Check:
		return []trace.Use{e.Demand, e.Limit}
	case *trace.Root:
		return []trace.Use{{From: []string{e.Residual}}}
	case *trace.Text:
		return e.Uses
	}
	return nil
}

// mention is an entry named by its number and leading to it.
type mention struct{ number, key string }

// from lists the entries that give an entry its operands at a place, each once, in order of use.
func (x *index) from(uses []trace.Use, at trace.Place) []mention {
	var out []mention
	add := func(h *trace.Head) {
		m := mention{h.Number, h.Key}
		if !slices.Contains(out, m) {
			out = append(out, m)
		}
	}
	for _, u := range uses {
		if l, _, err := x.note.Resolve(u, at); err == nil {
			add(&l.Head)
			continue
		}
		for _, from := range u.From {
			key, _, _ := strings.Cut(from, "@")
			if e := x.note.Entry(key); e != nil {
				add(e.Common())
			}
		}
	}
	return out
}

// destinations lists the entries that use the result of an entry, and the table that shows it on all rows.
func (x *index) destinations(key string) []mention {
	out := make([]mention, 0, len(x.to[key])+1)
	for _, e := range x.to[key] {
		h := e.Common()
		out = append(out, mention{h.Number, h.Key})
	}
	return out
}

// tables is the table that shows an entry on all its rows.
func (x *index) tables(key string) []mention {
	if t := x.shown[key]; t != nil {
		return []mention{{t.Number, t.Key}}
	}
	return nil
}

// commonDocument is the document most rules of a note stand in.
func commonDocument(n *trace.Note) string {
	count := map[string]int{}
	best := ""
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		if d := e.Common().Ref.Document; d != "" {
			count[d]++
		}
	})
	for d, k := range count {
		if k > count[best] || k == count[best] && d < best {
			best = d
		}
	}
	return best
}
