// Package sheet lays a note out on sheets: it turns the record into measured elements, fills sheets with them,
// and draws each sheet once on a canvas. It knows the record, not the engineering, and no output format but
// through draw.Canvas and the PDF document it hands back.
package sheet

import (
	"fmt"
	"slices"
	"time"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/pdf"
	"soffit/templates"
)

// Options of a rendering. The zero value is what an office wants.
type Options struct {
	Plain bool // the streams of the file uncompressed, for tests that read them
}

// Render is the note as a PDF file. An error names the entry that cannot be set: an entry of unknown kind, a
// figure whose data are missing, a symbol in narrative without a value, or something taller than a sheet.
func Render(n *trace.Note, opt Options) ([]byte, error) {
	l, err := layOut(n)
	if err != nil {
		return nil, err
	}
	d := pdf.New(pdf.Options{Title: n.Document.Number + " " + n.Document.Title, Author: author(&n.Document), Subject: n.Document.Project,
		Created: issued(&n.Document), Plain: opt.Plain})
	for i := range l.pages {
		l.draw(i, d.Sheet())
	}
	for _, h := range l.headings {
		title := h.title
		if h.number != "" {
			title = h.number + "  " + title
		}
		d.Outline(h.level, title, h.anchor)
	}
	out, err := d.Bytes()
	if err != nil {
		return nil, fmt.Errorf("sheet: %w", err)
	}
	return out, nil
}

// Draw draws every sheet of a note on the canvas that next gives for it, sheets counted from 1.
func Draw(n *trace.Note, next func(sheet, of int) draw.Canvas) error {
	l, err := layOut(n)
	if err != nil {
		return err
	}
	for i := range l.pages {
		l.draw(i, next(i+1, len(l.pages)))
	}
	return nil
}

// layout is a note on its sheets, before it is drawn.
type layout struct {
	pages     []*page
	furniture *furniture
	headings  []heading
}

// layOut measures a note and fills its sheets.
func layOut(n *trace.Note) (*layout, error) {
	c := newComposer(n)
	c.titleSheet()
	c.contents()
	for _, ch := range n.Chapters {
		c.chapter(ch)
	}
	c.part("Symbols", "part:symbols", "")
	c.symbolList()
	c.part("Clauses used", "part:references", "")
	c.referenceList()
	c.part("The member file as given", "part:input", n.Document.InputName)
	c.listing()
	if c.err != nil {
		return nil, c.err
	}
	pages, err := fill(keepHeadings(c.elements))
	if err != nil {
		return nil, fmt.Errorf("sheet: %w", err)
	}
	for i, p := range pages {
		for _, e := range p.placed {
			for _, a := range e.anchors {
				c.sheetOf[a] = i + 1
			}
		}
	}
	f := newFurniture(n, c.mark, judge(n).fail > 0, templates.Text("foot"))
	f.sheets = len(pages)
	return &layout{pages, f, c.headings()}, nil
}

// draw draws sheet i, counted from 0.
func (l *layout) draw(i int, c draw.Canvas) {
	p := l.pages[i]
	l.furniture.draw(c, i+1, p)
	for _, e := range p.placed {
		if !e.again {
			for _, a := range e.anchors {
				c.Anchor(a, left, e.y-8)
			}
		}
		e.paint(c, e.y)
	}
}

// author is who prepared the document.
func author(d *trace.Document) string {
	for _, r := range d.Roles {
		if r.Role == "prepared" {
			return r.Name
		}
	}
	return ""
}

// issued is the date the file carries, for no clock takes part: that on which it was prepared, else that of the
// last revision which has one. It is zero where neither is dated.
func issued(d *trace.Document) time.Time {
	for _, r := range d.Roles {
		if t, err := time.Parse(time.DateOnly, r.Date); err == nil && r.Role == "prepared" {
			return t
		}
	}
	for _, i := range slices.Backward(d.History) {
		if t, err := time.Parse(time.DateOnly, i.Date); err == nil {
			return t
		}
	}
	return time.Time{}
}
