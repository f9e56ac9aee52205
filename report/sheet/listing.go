package sheet

import (
	"strconv"
	"strings"

	"soffit/report/draw"
	"soffit/report/text"
)

// inputLines are the lines of the member file as given; a last line without text is none.
func inputLines(input string) []string {
	if input == "" {
		return nil
	}
	return strings.Split(strings.TrimSuffix(strings.ReplaceAll(input, "\r\n", "\n"), "\n"), "\n")
}

func lineAnchor(n int) string { return "input:" + strconv.Itoa(n) }

const (
	listingSize  draw.Pt = 7.2
	listingLead  draw.Pt = 9
	closeLead    draw.Pt = 8.3 // where that saves a sheet
	listingStart draw.Pt = 22  // of the text, right of the line numbers
)

// listing sets the member file as given, with its line numbers: in two columns where nearly all of its lines are short
// enough, the others going on in the next line.
func (c *composer) listing() {
	lines := inputLines(c.note.Document.Input)
	long := 0
	for _, s := range lines {
		if len(numbered(s, 1, twinWidth).set) > 1 {
			long++
		}
	}
	if len(lines) > 1 && long*mostLong <= len(lines) {
		cells, tight := make([]cell, len(lines)), make([]cell, len(lines))
		for i, s := range lines {
			l := numbered(s, i+1, twinWidth)
			set := func(lead draw.Pt) cell {
				return cell{l.height(lead), 0, func(cv draw.Canvas, x, y draw.Pt) {
					cv.Anchor(lineAnchor(i+1), left, y-8)
					l.paint(cv, x, y, lead)
				}}
			}
			cells[i], tight[i] = set(listingLead), set(closeLead)
		}
		c.add(closer("member file", cells, tight, 8))
		return
	}
	var out []*element
	for i, s := range lines {
		l := numbered(s, i+1, fullColumn.w)
		e := &element{owner: "member file", height: l.height(listingLead), anchors: []string{lineAnchor(i + 1)}}
		if i == 0 {
			e.above = 8
		}
		e.paint = func(cv draw.Canvas, y draw.Pt) {
			cv.Owner("full member file")
			l.paint(cv, left, y, listingLead)
		}
		out = append(out, e)
	}
	c.add(keepEnds(out)...)
}

// mostLong says which part of the lines may be too long for two columns: one in so many.
const mostLong = 5

// inputSet is a line of the member file set, with its number.
type inputSet struct {
	number string
	set    []text.Line
}

func numbered(s string, n int, w draw.Pt) inputSet {
	return inputSet{strconv.Itoa(n), text.Listing([]string{printable(s)}, w-listingStart, text.Style{Size: listingSize, Leading: listingLead})}
}

func (l inputSet) height(lead draw.Pt) draw.Pt { return lead * draw.Pt(len(l.set)) }

func (l inputSet) paint(cv draw.Canvas, x, y, lead draw.Pt) {
	base := y + listingSize
	draw.TextRight(cv, x+listingStart-8, base, draw.Serif, listingSize, l.number)
	for k, line := range l.set {
		line.Draw(cv, x+listingStart, base+draw.Pt(k)*lead)
	}
}

// printable replaces what no face can show; the record keeps the file itself.
func printable(s string) string {
	return strings.Map(func(r rune) rune {
		if r == '\t' {
			return r
		}
		if r < ' ' || r == 0x7f || len(draw.Missing(draw.Marks, string(r))) > 0 {
			return '□'
		}
		return r
	}, s)
}
