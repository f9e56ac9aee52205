// Package pdf writes a note as a PDF document: sheets with vector drawing and text in embedded subsets
// of the note's faces, links, outline. The same drawing gives the same bytes.
package pdf

import (
	"bytes"
	"errors"
	"fmt"
	"time"
	"unicode/utf16"

	"github.com/go-pdf/fpdf"

	"soffit/fonts"
	"soffit/report/draw"
)

// Options describe the document. Created is the date written into the file; it comes from the member
// file, never from a clock. A document whose Created is zero carries no date.
type Options struct {
	Title, Author, Subject, Keywords string
	Language                         string // "en" if empty
	Created                          time.Time
	Plain                            bool // streams uncompressed, for tests that read them
}

// Document is a PDF document in the making. Its sheets may be drawn from several goroutines, each sheet
// from one at a time; all else is for one goroutine.
type Document struct {
	options Options
	sheets  []*Sheet
	outline []outlineEntry
}

type outlineEntry struct {
	level  int
	title  string
	anchor string
}

// New starts a document.
func New(o Options) *Document { return &Document{options: o} }

// Sheet adds an A4 sheet, portrait.
func (d *Document) Sheet() *Sheet {
	s := &Sheet{number: len(d.sheets) + 1}
	s.body = make([]byte, 0, 32<<10)
	d.sheets = append(d.sheets, s)
	return s
}

// Sheets is the number of sheets so far.
func (d *Document) Sheets() int { return len(d.sheets) }

// Outline adds an entry to the outline beside the sheets: level 0 for a part, 1 for what is within, and
// so on, leading to the anchor.
func (d *Document) Outline(level int, title, anchor string) {
	d.outline = append(d.outline, outlineEntry{level, title, anchor})
}

type place struct {
	sheet int // from 1
	y     draw.Pt
}

// Bytes is the finished file. Its error tells all glyphs that no face has, links and outline entries
// without anchor, and anchors given twice.
func (d *Document) Bytes() ([]byte, error) {
	anchors, err := d.anchors()
	if err != nil {
		return nil, err
	}
	if len(d.sheets) == 0 {
		return nil, errors.New("pdf: document without sheets")
	}
	f := fpdf.NewCustom(&fpdf.InitType{OrientationStr: "P", UnitStr: "pt",
		Size: fpdf.SizeType{Wd: float64(draw.SheetWidth), Ht: float64(draw.SheetHeight)}})
	f.SetCatalogSort(true)
	f.SetCompression(false) // done when finishing, with one compressor for all sheets
	created := d.options.Created.UTC()
	if created.IsZero() { // the writer would take the clock's; it is taken out when finishing
		created = time.Unix(0, 0).UTC()
	}
	f.SetCreationDate(created)
	f.SetModificationDate(created)
	f.SetProducer("Soffit", true)
	f.SetTitle(d.options.Title, true)
	f.SetAuthor(d.options.Author, true)
	f.SetSubject(d.options.Subject, true)
	f.SetKeywords(d.options.Keywords, true)
	f.SetAutoPageBreak(false, 0)
	f.SetMargins(0, 0, 0)

	faces := d.useFaces(f)
	for _, s := range d.sheets {
		f.AddPage()
		f.RawWriteStr(string(s.body))
	}
	d.link(f, anchors)
	var out bytes.Buffer
	out.Grow(len(d.sheets) * 24 << 10)
	if err := f.Output(&out); err != nil {
		return nil, fmt.Errorf("pdf: %w", err)
	}
	return finish(out.Bytes(), finishing{faces: faces, outline: d.outline, anchors: anchors,
		language: d.options.Language, sheets: len(d.sheets), plain: d.options.Plain, undated: d.options.Created.IsZero()})
}

func (d *Document) anchors() (map[string]place, error) {
	var errs []error
	anchors := map[string]place{}
	for _, s := range d.sheets {
		errs = append(errs, s.errs...)
		for _, a := range s.anchors {
			if was, twice := anchors[a.Name]; twice {
				errs = append(errs, fmt.Errorf("pdf: anchor %q on sheet %d and on sheet %d", a.Name, was.sheet, s.number))
				continue
			}
			anchors[a.Name] = place{s.number, a.At.Y}
		}
	}
	for _, s := range d.sheets {
		for _, l := range s.links {
			if _, ok := anchors[l.Anchor]; !ok {
				errs = append(errs, fmt.Errorf("pdf: sheet %d: link to %q leads nowhere", s.number, l.Anchor))
			}
		}
	}
	level := -1
	for _, o := range d.outline {
		if _, ok := anchors[o.anchor]; !ok {
			errs = append(errs, fmt.Errorf("pdf: outline entry %q leads to %q, which is nowhere", o.title, o.anchor))
		}
		if o.level < 0 || o.level > level+1 {
			errs = append(errs, fmt.Errorf("pdf: outline entry %q is of level %d under level %d", o.title, o.level, level))
		}
		level = o.level
	}
	return anchors, errors.Join(errs...)
}

// link makes links and outline. Pages of the file are found by number, sheets being pages.
func (d *Document) link(f *fpdf.Fpdf, anchors map[string]place) {
	ids := map[string]int{}
	for _, s := range d.sheets {
		f.SetPage(s.number)
		for _, l := range s.links {
			id, ok := ids[l.Anchor]
			if !ok {
				id = f.AddLink()
				ids[l.Anchor] = id
				at := anchors[l.Anchor]
				f.SetLink(id, float64(at.y), at.sheet)
			}
			f.Link(float64(l.Box.X0), float64(l.Box.Y0), float64(l.Box.Width()), float64(l.Box.Height()), id)
		}
	}
	for _, o := range d.outline {
		at := anchors[o.anchor]
		f.SetPage(at.sheet)
		f.Bookmark(utf16BE(o.title), o.level, float64(at.y))
	}
	f.SetPage(len(d.sheets))
}

// useFaces embeds the faces that the sheets use. The file's writer learns which runes to keep in a
// subset by setting them once, on a template that never enters the file.
func (d *Document) useFaces(f *fpdf.Fpdf) []embedded {
	var used [fonts.Count]runeSet
	for _, s := range d.sheets {
		for i := range used {
			used[i].add(&s.used[i])
		}
	}
	var out []embedded
	for face := range fonts.Face(fonts.Count) {
		if used[face].empty() {
			continue
		}
		// A copy: while it subsets a monospaced face, fpdf writes into the bytes it was given.
		f.AddUTF8FontFromBytes(face.String(), "", bytes.Clone(fonts.Bytes(face)))
		runes := used[face].String()
		t := f.CreateTemplateCustom(fpdf.PointType{}, fpdf.SizeType{Wd: 1, Ht: 1}, func(t *fpdf.Tpl) {
			t.SetFont(face.String(), "", 1)
			t.Text(0, 0, runes)
		})
		out = append(out, embedded{face: face, resource: fontResource(t.Bytes()), runes: runes})
	}
	return out
}

// utf16BE is a text string of the file's outline, with its mark of byte order.
func utf16BE(s string) string {
	b := []byte{0xFE, 0xFF}
	for _, u := range utf16.Encode([]rune(s)) {
		b = append(b, byte(u>>8), byte(u))
	}
	return string(b)
}

// fontResource reads the name of a font resource out of "BT /Fname 1.00 Tf ET".
func fontResource(content []byte) string {
	_, after, _ := bytes.Cut(content, []byte("BT /"))
	name, _, _ := bytes.Cut(after, []byte(" "))
	return string(name)
}
