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
	listingStart draw.Pt = 22 // of the text, right of the line numbers
)

// listing sets the member file as given, with its line numbers.
func (c *composer) listing() {
	var out []*element
	for i, s := range inputLines(c.note.Document.Input) {
		lines := text.Listing([]string{printable(s)}, fullColumn.w-listingStart, text.Style{Size: listingSize, Leading: listingLead})
		number := strconv.Itoa(i + 1)
		e := &element{owner: "member file", height: listingLead * draw.Pt(len(lines)), anchors: []string{lineAnchor(i + 1)}}
		e.paint = func(cv draw.Canvas, y draw.Pt) {
			cv.Owner("full member file")
			base := y + listingSize
			draw.TextRight(cv, left+listingStart-8, base, draw.Serif, listingSize, number)
			for k, l := range lines {
				l.Draw(cv, left+listingStart, base+draw.Pt(k)*listingLead)
			}
		}
		out = append(out, e)
	}
	c.add(keepEnds(out)...)
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
