package sheet

import (
	"strconv"

	"soffit/report/draw"
	"soffit/report/text"
	"soffit/templates"
)

// heading is one line of the contents and of the outline: level 0 for parts and chapters, 1 for blocks.
type heading struct {
	level                 int
	number, title, anchor string
}

// headings lists parts, chapters and blocks in order.
func (c *composer) headings() []heading {
	out := []heading{{0, "", "Title sheet", "part:title"}, {0, "", "Contents", "part:contents"}}
	for _, ch := range c.note.Chapters {
		out = append(out, heading{0, ch.Number, ch.Title, ch.Slug})
		for _, b := range ch.Blocks {
			out = append(out, heading{1, b.Number, b.Title, b.Path()})
		}
	}
	return append(out, heading{0, "", "Symbols", "part:symbols"}, heading{0, "", "Clauses used", "part:references"},
		heading{0, "", "The member file as given", "part:input"})
}

// contents sets the list of parts with the sheets they begin on, and how to read a sheet; in two columns where one
// would leave no room for that.
func (c *composer) contents() {
	c.heading("", "Contents", "part:contents", "")
	c.elements[len(c.elements)-1].fresh = true
	style := text.Style{Size: tableSize, Leading: 11.2, Gap: 3}
	reading := templates.Text("reading")
	if c.document != "" {
		reading += "\n- **Clauses** without the name of a document are those of " + c.document + ".\n"
	}
	lines := c.standing(reading, fullColumn.w, style)
	room := body - 60 - text.Height(lines)

	list := c.headings()[2:]
	cells := make([]cell, len(list))
	total := draw.Pt(0)
	for i, h := range list {
		cells[i] = c.contentsLine(h, width, textSize)
		total += cells[i].h
	}
	if total <= room {
		for i, k := range cells {
			above := draw.Pt(0)
			if i == 0 {
				above = 4
			}
			c.add(&element{owner: "contents", above: above, height: k.h, paint: func(cv draw.Canvas, y draw.Pt) {
				cv.Owner("full contents")
				k.paint(cv, left, y)
			}})
		}
	} else {
		for i, h := range list {
			cells[i] = c.contentsLine(h, twinWidth, tableSize)
		}
		c.add(twin("contents", cells, 8))
	}
	c.partHead("How to read a sheet")
	c.add(keepTogether(textElements(lines, fullColumn, "reading", 3, false, spanFull))...)
}

// contentsLine is one line of the contents at a size, dots leading to the sheet's number.
func (c *composer) contentsLine(h heading, w, size draw.Pt) cell {
	lead := 1.22 * size
	face, above, in := draw.Serif, draw.Pt(0), 2.6*size
	if h.level == 0 {
		face, above, in = draw.Bold, 4, 0
	}
	at := in + 2.6*size + in/8
	if h.number == "" {
		at = in
	}
	lines := text.Words(face, h.title).Lines(w-30-at, text.Style{Size: size, Leading: lead})
	last := len(lines) - 1
	return cell{lead*draw.Pt(len(lines)) + above, above, func(cv draw.Canvas, x, y draw.Pt) {
		first := y + above + size*ascent
		base := first + draw.Pt(last)*lead
		sheet := strconv.Itoa(c.sheetOf[h.anchor])
		end := x + w - draw.Width(face, size, sheet)
		cv.Text(x+in, first, face, size, h.number)
		for i, l := range lines {
			l.Draw(cv, x+at, first+draw.Pt(i)*lead)
		}
		cv.Text(end, base, face, size, sheet)
		// The dots of all lines stand under each other.
		if from := x + at + lines[last].Width + 5; from < x+w-24 {
			cv.Line(x+w-20, base-0.5, from, base-0.5, 0.5, 0.5, 3.5)
		}
		cv.Link(x, y+above, w, lead*draw.Pt(last+1), h.anchor)
	}}
}
