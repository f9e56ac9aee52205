package trace

import (
	"fmt"
	"slices"
	"strconv"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// New starts an empty record.
func New(doc Document) *Note {
	return &Note{Document: doc, entries: map[string]Entry{}}
}

// Err is the first error met while recording; nothing is recorded after it.
func (n *Note) Err() error { return n.err }

// Axis declares a named run of rows. Index is empty for an implicit axis, or the letter i, j, n or m.
func (n *Note) Axis(name, title, index string, rows []string) *Axis {
	a := &Axis{Name: name, Title: title, Index: index, Rows: rows}
	for i, r := range rows {
		if a.Row(r) != i && n.err == nil {
			n.err = fmt.Errorf("two rows of %s are named %q", title, r)
		}
	}
	n.Axes = append(n.Axes, a)
	return a
}

// Chapter opens the next chapter; chapters number themselves in the order in which they are opened.
func (n *Note) Chapter(slug, title string) *Chapter {
	c := &Chapter{Number: strconv.Itoa(len(n.Chapters) + 1), Slug: slug, Title: title, note: n}
	n.Chapters = append(n.Chapters, c)
	return c
}

// Source is what a block takes: another block, or one row of it.
type Source struct {
	block *Block
	row   string
}

// Take names the blocks whose results a block may use. Nothing is inherited: not what they took themselves.
func Take(blocks ...*Block) []Source {
	out := make([]Source, len(blocks))
	for i, b := range blocks {
		out[i] = Source{block: b}
	}
	return out
}

// At takes one row of a block that runs over an implicit axis.
func At(b *Block, row string) Source { return Source{block: b, row: row} }

type source struct {
	block *Block
	row   int // −1: all rows
}

type builder struct {
	note    *Note
	path    string
	number  int
	symbols map[string][]*Line
	sources []source
	mask    []bool // active rows of the implicit axis; one row where there is none
	all     bool
	worst   *rank // of the checks so far: that of the worst decides which row is worked in full
}

// Block opens the next block of the chapter. over is its implicit axis, nil for single values.
func (c *Chapter) Block(slug, title string, over *Axis, takes ...Source) *Block {
	b := &Block{Number: c.Number + "." + strconv.Itoa(len(c.Blocks)+1), Slug: slug, Title: title, Over: over}
	rows := 1
	if over != nil {
		rows = len(over.Rows)
	}
	b.build = &builder{note: c.note, path: c.Slug + "." + slug, symbols: map[string][]*Line{}, all: true,
		mask: make([]bool, rows)}
	for i := range b.build.mask {
		b.build.mask[i] = true
	}
	for _, t := range takes {
		s := source{block: t.block, row: -1}
		name := t.block.Path()
		if t.row != "" {
			if t.block.Over == nil || t.block.Over.Row(t.row) < 0 {
				b.fail("takes %s at row %q, which it has not", name, t.row)
				continue
			}
			s.row = t.block.Over.Row(t.row)
			name += "@" + t.row
		}
		b.build.sources = append(b.build.sources, s)
		b.Takes = append(b.Takes, name)
	}
	c.Blocks = append(c.Blocks, b)
	return b
}

func (b *Block) stopped() bool { return b.build.note.err != nil }

func (b *Block) fail(format string, args ...any) {
	if b.build.note.err == nil {
		b.build.note.err = fmt.Errorf("%s: %w", b.build.path, fmt.Errorf(format, args...))
	}
}

func (b *Block) head(id, name string, ref clause.Ref) Head {
	b.build.number++
	return Head{Number: b.Number + "." + strconv.Itoa(b.build.number), Key: b.build.path + "/" + id, Name: name, Ref: ref}
}

func (b *Block) record(e Entry) {
	key := e.Common().Key
	if _, taken := b.build.note.entries[key]; taken {
		b.fail("%s is recorded twice", key)
		return
	}
	b.build.note.entries[key] = e
	b.Entries = append(b.Entries, e)
	if l := LineOf(e); l != nil {
		for _, other := range b.build.symbols[l.Symbol.Name] {
			if l.meets(&other.Series) {
				b.fail("%s is given twice on one row, by %s and %s", l.Symbol.Name, other.Key, l.Key)
			}
		}
		b.build.symbols[l.Symbol.Name] = append(b.build.symbols[l.Symbol.Name], l)
	}
}

// meets says whether two series have a value on the same row.
func (s *Series) meets(t *Series) bool {
	if !slices.Equal(s.Axes, t.Axes) {
		return true
	}
	for i := range s.Shown {
		if s.Taken(i) && t.Taken(i) {
			return true
		}
	}
	return false
}

// bind finds who supplies each symbol: this block, or exactly one of the blocks it takes.
func (b *Block) bind(symbols []*formula.Symbol) (*frame, error) {
	f := &frame{slots: make([][]supplier, len(symbols))}
	f.axes[implicit] = b.Over
	for i, s := range symbols {
		found := ""
		for _, l := range b.build.symbols[s.Name] {
			found = b.build.path
			if err := f.add(i, l, l.Key, -1); err != nil {
				return nil, err
			}
		}
		for _, src := range b.build.sources {
			lines := src.block.build.symbols[s.Name]
			if len(lines) == 0 {
				continue
			}
			if found != "" {
				return nil, fmt.Errorf("symbol %s is supplied twice, by %s and %s", s.Name, found, src.block.Path())
			}
			found = src.block.Path()
			for _, l := range lines {
				from := l.Key
				if src.row >= 0 {
					from += "@" + src.block.Over.Rows[src.row]
				} else if b.Over == nil && len(l.Axes) > 0 && l.Axes[0].Index == "" {
					return nil, fmt.Errorf("symbol %s runs over %q: take it at a row", s.Name, l.Axes[0].Name)
				}
				if err := f.add(i, l, from, src.row); err != nil {
					return nil, err
				}
			}
		}
		if found == "" {
			return nil, fmt.Errorf("symbol %s is supplied by nobody: %s", s.Name, formula.Unknown(s.Name, b.known()))
		}
	}
	return f, nil
}

func (b *Block) known() []string {
	var out []string
	for s := range b.build.symbols {
		out = append(out, s)
	}
	for _, src := range b.build.sources {
		for s := range src.block.build.symbols {
			out = append(out, s)
		}
	}
	return out
}

// Given records one value.
func (b *Block) Given(g *clause.Given, v quantity.Literal, source string) {
	b.GivenOver(g, nil, []quantity.Literal{v}, source)
}

// GivenRows records a value per row of an axis, all in the unit of g.
func (b *Block) GivenRows(g *clause.Given, axis *Axis, v []quantity.Literal, source string) {
	b.GivenOver(g, []*Axis{axis}, v, source)
}

// GivenOver records a value per row of several axes, row-major. A single value keeps its unit as written; a
// column is shown in the unit of g with the decimals of its most precise entry.
func (b *Block) GivenOver(g *clause.Given, axes []*Axis, v []quantity.Literal, source string) {
	if b.stopped() {
		return
	}
	if len(v) != size(axes) {
		b.fail("%s: %d values for %d rows", g.Symbol, len(v), size(axes))
		return
	}
	sym, err := formula.ParseSymbol(g.Symbol)
	if err != nil {
		b.fail("%s: %w", g.Symbol, err)
		return
	}
	unit, err := quantity.ParseUnit(g.Unit)
	if err != nil {
		b.fail("%s: %w", g.Symbol, err)
		return
	}
	e := &Given{Line: Line{Head: b.head(g.ID, g.Name, g.Ref), Symbol: sym}, Source: source}
	e.Series = Series{Axes: axes, Unit: unit, Shown: make([]string, len(v)), Values: make([]float64, len(v)),
		Shadow: make([]float64, len(v))}
	if len(axes) == 0 {
		e.Unit = v[0].Unit
	}
	for _, l := range v {
		if l.Unit.Dim() != unit.Dim() {
			b.fail("%s: have %s, a %s, want a %s", g.Symbol, l, l.Unit.Dim(), unit.Dim())
			return
		}
		e.Decimals = max(e.Decimals, decimalsOf(l, e.Unit))
	}
	for i, l := range v {
		shown := l.Number
		if len(axes) > 0 {
			shown = quantity.Format(e.Unit.From(l.Quantity().Value), e.Decimals)
		}
		if err := e.set(i, shown, 0); err != nil {
			b.fail("%s: %w", g.Symbol, err)
			return
		}
		e.Shadow[i] = e.Values[i]
	}
	b.record(e)
}

// decimalsOf is how many decimals show a literal in a unit without loss, at most 9.
func decimalsOf(l quantity.Literal, u quantity.Unit) int {
	v := u.From(l.Quantity().Value)
	for d := 0; d < 9; d++ {
		shown := quantity.Format(v, d)
		w, err := quantity.Value(shown)
		if err == nil && quantity.Format(w, 9) == quantity.Format(v, 9) {
			return d
		}
	}
	return 9
}

// set puts a shown number and the unrounded one into a row, carrying what is shown.
func (s *Series) set(i int, shown string, shadow float64) error {
	v, err := quantity.Value(shown)
	if err != nil {
		return err
	}
	s.Shown[i], s.Values[i], s.Shadow[i] = shown, s.Unit.To(v), shadow
	return nil
}
