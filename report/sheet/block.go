package sheet

import (
	"fmt"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/text"
)

// chapter sets a chapter: its heading, then its blocks.
func (c *composer) chapter(ch *trace.Chapter) {
	c.heading(ch.Number, ch.Title, ch.Slug, "")
	c.elements[len(c.elements)-1].ruled = len(ch.Blocks) > 0 && !plain(ch.Blocks[0]) && ch.Slug != "verdict"
	switch head := c.elements[len(c.elements)-1]; ch.Slug {
	case "verdict":
		head.fresh = true
		c.verdict()
	case "basis": // below no more than the last lines of the verdict
		head.least = 0.6 * body
	}
	for _, b := range ch.Blocks {
		c.blockHeading(b)
		c.entries(b)
	}
}

// heading opens a part or a chapter.
func (c *composer) heading(number, title, anchor, words string) {
	running := title
	if number != "" {
		running = number + "\u2002" + title
	}
	lines := text.Words(draw.Bold, title).Lines(workColumn.w+resultColumn.w, text.Style{Size: chapterSize, Leading: chapterSize * 1.2})
	if len(lines) > 0 {
		words = draw.Fit(draw.Serif, textSize, right-workColumn.x-lines[0].Width-20, words)
	}
	h := chapterSize*ascent + draw.Pt(max(len(lines), 1)-1)*chapterSize*1.2 + 7
	c.add(&element{owner: "chapter " + title, above: 26, height: h + 1, keep: true, opens: true, running: running, anchors: []string{anchor},
		ruled: number != "", spans: spanFull,
		paint: func(cv draw.Canvas, y draw.Pt) {
			cv.Owner("full chapter " + title)
			x := left
			if number != "" {
				cv.Text(left, y+chapterSize*ascent, draw.Bold, chapterSize, number)
				x = workColumn.x
			}
			for i, l := range lines {
				l.Draw(cv, x, y+chapterSize*(ascent+1.2*draw.Pt(i)))
			}
			if words != "" {
				draw.TextRight(cv, right, y+chapterSize*ascent, draw.Serif, textSize, words)
			}
			cv.Line(left, y+h, right, y+h, strongRule)
		}})
}

// part opens a part after the chapters, on a new sheet unless a third of the sheet is left.
func (c *composer) part(title, anchor, words string) {
	c.heading("", title, anchor, words)
	c.elements[len(c.elements)-1].least = body / 3
}

// blockHeading opens a block; where it runs over rows it says which of them is worked.
func (c *composer) blockHeading(b *trace.Block) {
	e := &columns{head: &trace.Head{Number: b.Number, Key: b.Path()}, reference: stack{w: referenceColumn.w}, work: stack{w: wideColumn.w}, wide: true}
	e.reference.words(draw.Bold, blockSize, blockSize, 0, b.Number)
	e.work.words(draw.Bold, blockSize, blockSize*1.2, 0, b.Title)
	if b.Over != nil && worksRow(b) {
		e.work.words(draw.Italic, noteSize, noteLead, 2,
			fmt.Sprintf("Worked in full at %s; the record holds all %d rows.", b.Over.Rows[b.Row], len(b.Over.Rows)))
	}
	el := e.element(true)
	el.above, el.keep, el.opens, el.spans, el.ruled = 15, true, true, spanWide, !plain(b)
	c.add(el)
}

// plain tells whether a block is nothing but narrative and figures: it needs no columns and no checker's boxes.
func plain(b *trace.Block) bool {
	for _, e := range b.Entries {
		switch e.(type) {
		case *trace.Text, *trace.Figure:
		default:
			return false
		}
	}
	return true
}

// worksRow tells whether a block has entries worked at one row of its implicit axis.
func worksRow(b *trace.Block) bool {
	for _, e := range b.Entries {
		if l := trace.LineOf(e); l != nil && len(l.Axes) > 0 && l.Axes[0] == b.Over {
			return true
		}
	}
	return false
}

// entries sets the entries of a block in their order.
func (c *composer) entries(b *trace.Block) {
	listed := false // the entry before is a given value on a line of its own
	for i := 0; i < len(b.Entries); {
		if n := c.run(b, b.Entries[i:]); n > 0 {
			i += n
			listed = false
			continue
		}
		c.single(b, b.Entries[i], !listed)
		_, listed = b.Entries[i].(*trace.Given)
		i++
	}
}

// single sets one entry.
func (c *composer) single(b *trace.Block, e trace.Entry, first bool) {
	switch e := e.(type) {
	case *trace.Given:
		c.given(b, e, first)
	case *trace.Step:
		c.step(b, e)
	case *trace.Choice:
		c.choice(b, e)
	case *trace.Root:
		c.root(b, e)
	case *trace.Check:
		c.check(b, e)
	case *trace.Table:
		c.tableEntry(b, e)
	case *trace.Figure:
		c.figure(b, e)
	case *trace.Text:
		c.text(b, e)
	default:
		c.fail("an entry of no known kind: %T", e)
	}
}
