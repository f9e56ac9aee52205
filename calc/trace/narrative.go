package trace

import (
	"fmt"
	"strings"

	"soffit/calc/formula"
)

// Narrative puts the engineer's own text at the head of a chapter, once the whole record is there. Each {symbol} in it
// stands for the value of that symbol in the chapter, or else in the one block of the note that has it, at the
// row which that block works in full; {block path/entry} names an entry outright.
func (c *Chapter) Narrative(markdown string) error {
	if len(c.Blocks) == 0 || c.note.err != nil {
		return c.note.err
	}
	b := c.Blocks[0]
	e := &Text{Head: Head{Key: b.build.path + "/narrative"}, Markdown: strings.TrimSpace(markdown)}
	for _, name := range Placeholders(markdown) {
		from, err := c.find(name)
		if err != nil {
			return err
		}
		e.Uses = append(e.Uses, Use{Symbol: name, From: from})
	}
	c.note.entries[e.Key] = e
	b.Entries = append([]Entry{e}, b.Entries...)
	return nil
}

// find looks for what a name in a narrative stands for.
func (c *Chapter) find(name string) ([]string, error) {
	if strings.Contains(name, "/") {
		l := LineOf(c.note.entries[name])
		if l == nil {
			return nil, fmt.Errorf("{%s}: the note has no value under this name", name)
		}
		return c.note.at(l)
	}
	s, err := formula.ParseSymbol(name)
	if err != nil {
		return nil, fmt.Errorf("{%s} is no symbol: %w", name, err)
	}
	blocks := suppliers(c.Blocks, s.Name)
	if len(blocks) == 0 {
		for _, other := range c.note.Chapters {
			blocks = append(blocks, suppliers(other.Blocks, s.Name)...)
		}
	}
	switch len(blocks) {
	case 0:
		return nil, fmt.Errorf("{%s}: no step of the note gives this symbol", name)
	case 1:
	default:
		return nil, fmt.Errorf("{%s} is given in %s and in %s: write {%s} or another of its entries", name, blocks[0].Path(), blocks[1].Path(), blocks[0].build.symbols[s.Name][0].Key)
	}
	var from []string
	for _, l := range blocks[0].build.symbols[s.Name] {
		f, err := c.note.at(l)
		if err != nil {
			return nil, fmt.Errorf("{%s}: %w", name, err)
		}
		from = append(from, f...)
	}
	return from, nil
}

func suppliers(blocks []*Block, symbol string) []*Block {
	var out []*Block
	for _, b := range blocks {
		if len(b.build.symbols[symbol]) > 0 {
			out = append(out, b)
		}
	}
	return out
}

// at names a line at the row that its block works in full.
func (n *Note) at(l *Line) ([]string, error) {
	key := l.Key
	for _, a := range l.Axes {
		if a.Index != "" {
			return nil, fmt.Errorf("%s runs over each %s: a text holds single values only", l.Symbol.Name, a.Title)
		}
		n.Each(func(_ *Chapter, b *Block, e Entry) {
			if e.Common().Key == l.Key {
				key += "@" + a.Rows[b.Row]
			}
		})
	}
	return []string{key}, nil
}
