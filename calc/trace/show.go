package trace

import (
	"strconv"
	"strings"

	"soffit/calc/clause"
	"soffit/calc/formula"
)

// Table shows columns of this block side by side, named by the IDs of their entries; a full key
// ("actions.stations/position") brings in a column of another block.
func (b *Block) Table(id, title string, axis *Axis, columns ...string) {
	if b.stopped() {
		return
	}
	keys := b.keys(columns)
	b.record(&Table{Head: b.head(id, title, clause.Ref{}), Axis: axis, Columns: keys})
}

// Figure records a diagram of a kind, drawn from the entries named in plots (role, then ID or key).
func (b *Block) Figure(id, kind, caption, at string, plots ...Plot) {
	if b.stopped() {
		return
	}
	for i := range plots {
		plots[i].Key = b.keys([]string{plots[i].Key})[0]
	}
	h := Head{Key: b.build.path + "/" + id, Name: caption, Number: b.build.note.figureNumber(b)}
	b.record(&Figure{Head: h, Kind: kind, Series: plots, At: at})
}

func (b *Block) keys(ids []string) []string {
	out := make([]string, len(ids))
	for i, id := range ids {
		out[i] = id
		if !strings.Contains(id, "/") {
			out[i] = b.build.path + "/" + id
		}
		if b.build.note.entries[out[i]] == nil {
			b.fail("shows %s, which is not recorded", out[i])
		}
	}
	return out
}

func (n *Note) figureNumber(b *Block) string {
	chapter, _, _ := strings.Cut(b.Number, ".")
	count := 1
	n.Each(func(c *Chapter, _ *Block, e Entry) {
		if _, ok := e.(*Figure); ok && c.Number == chapter {
			count++
		}
	})
	return chapter + "." + strconv.Itoa(count)
}

// Text records narrative. Each {symbol} in it stands for the value in the scope of the block, at the row the
// sheet works in full.
func (b *Block) Text(id, markdown string) {
	if b.stopped() || strings.TrimSpace(markdown) == "" {
		return
	}
	e := &Text{Head: Head{Key: b.build.path + "/" + id}, Markdown: strings.TrimSpace(markdown)}
	var symbols []*formula.Symbol
	for _, name := range Placeholders(markdown) {
		s, err := formula.ParseSymbol(name)
		if err != nil {
			b.fail("text %s: {%s}: %w", id, name, err)
			return
		}
		symbols = append(symbols, s)
	}
	fr, err := b.bind(symbols)
	if err != nil {
		b.fail("text %s: %w", id, err)
		return
	}
	e.Uses = fr.uses(symbols)
	for i := range e.Uses {
		e.Uses[i].Symbol = Placeholders(markdown)[i]
	}
	b.record(e)
}

// Placeholders are the distinct {symbol} of a Markdown text in order; braces inside a symbol's subscript
// belong to it, {M_{Ed,max}}.
func Placeholders(markdown string) []string {
	var out []string
	seen := map[string]bool{}
	SplitPlaceholders(markdown, func(string) {}, func(s string) {
		if !seen[s] {
			seen[s] = true
			out = append(out, s)
		}
	})
	return out
}

// SplitPlaceholders hands the plain pieces and the {symbols} of a text to two functions in order. Braces within
// `code`, where a formula stands as it is, are plain.
func SplitPlaceholders(markdown string, plain, symbol func(string)) {
	start, code := 0, false
	for i := 0; i < len(markdown); i++ {
		switch {
		case markdown[i] == '`':
			code = !code
		case markdown[i] == '{' && !code:
			end := closing(markdown, i)
			if end < 0 {
				continue
			}
			plain(markdown[start:i])
			symbol(markdown[i+1 : end])
			start, i = end+1, end
		}
	}
	plain(markdown[start:])
}

// closing is the position of the brace that closes the one at i, −1 if none does.
func closing(s string, i int) int {
	depth := 0
	for k := i; k < len(s); k++ {
		switch s[k] {
		case '{':
			depth++
		case '}':
			if depth--; depth == 0 {
				return k
			}
		}
	}
	return -1
}

// Has says whether the block has recorded an entry of this ID.
func (b *Block) Has(id string) bool { return b.build.note.entries[b.build.path+"/"+id] != nil }
