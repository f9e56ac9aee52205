package sheet

import (
	"strings"

	"soffit/report/draw"
)

// The grid of every sheet, in points. A calculation sheet has four columns between hairlines: reference,
// work, result and check; every other sheet uses the same area undivided.
const (
	left  = 20 * draw.Mm // wider than the right margin: sheets are filed
	width = 173 * draw.Mm
	right = left + width

	headTop    draw.Pt = 36  // baseline of the first line of the head
	headLine   draw.Pt = 10  // between its lines
	headRule   draw.Pt = 61  // under the head
	columnRow  draw.Pt = 70  // baseline of the column heads
	columnRule draw.Pt = 74  // under the column heads
	bodyTop    draw.Pt = 84  // first ink of the body
	bodyBottom draw.Pt = 792 // last ink of the body
	footRule   draw.Pt = 799
	footTop    draw.Pt = 808 // baseline of the first line of the foot
	footLead   draw.Pt = 8.8
	footSize   draw.Pt = 7.3

	body = bodyBottom - bodyTop
)

// column is a vertical strip of the sheet: where its ink begins and how wide it may be.
type column struct {
	name  string
	x, w  draw.Pt
	right draw.Pt
}

func strip(name string, from, to, padLeft, padRight draw.Pt) column {
	return column{name, from + padLeft, to - from - padLeft - padRight, to - padRight}
}

// The places of the three hairlines.
const (
	rule1 = left + 64
	rule2 = right - 150
	rule3 = right - 41
)

var (
	referenceColumn = strip("reference", left, rule1, 0, 5)
	workColumn      = strip("work", rule1, rule2, 7, 7)
	resultColumn    = strip("result", rule2, rule3, 5, 5)
	checkColumn     = strip("check", rule3, right, 6, 0)
	wideColumn      = strip("wide", rule1, rule3, 7, 5) // work and result together
	fullColumn      = strip("full", left, right, 0, 0)
)

// span says which hairlines an element stands across.
type span uint8

const (
	spanNone span = iota // within the four columns
	spanWide             // across work and result
	spanFull             // across the sheet
)

func (s span) column() column {
	switch s {
	case spanWide:
		return wideColumn
	case spanFull:
		return fullColumn
	}
	return workColumn
}

// Sizes of type and distances between baselines.
const (
	textSize    draw.Pt = 10
	textLead    draw.Pt = 12.6
	tableSize   draw.Pt = 9
	tableLead   draw.Pt = 12
	smallSize   draw.Pt = 8
	smallLead   draw.Pt = 9.6
	noteSize    draw.Pt = 8.5
	noteLead    draw.Pt = 10.4
	tinySize    draw.Pt = 7.5
	tinyLead    draw.Pt = 9
	headSize    draw.Pt = 8
	blockSize   draw.Pt = 12
	chapterSize draw.Pt = 16

	entryGap   draw.Pt = 7 // above an entry
	lineGap    draw.Pt = 3 // between words and formula, and between the lines of a formula
	indent     draw.Pt = 10
	hairline   draw.Pt = 0.35
	tableRule  draw.Pt = 0.5
	strongRule draw.Pt = 0.9
)

// ascent is how far the capitals and brackets of a text face reach above the baseline, as part of its size.
const ascent = 0.74

// descent is how far it reaches below.
const descent = 0.23

// bearing is how far a letter such as j may reach left of where its line starts.
const bearing = 1

// Area is the part of a sheet in which the ink of an owner belongs, for tests that record sheets: the column, head
// or foot that the first word of the owner names. It is false for an owner that no sheet knows.
func Area(owner string) (draw.Box, bool) {
	word, _, _ := strings.Cut(owner, " ")
	for _, k := range []column{referenceColumn, workColumn, resultColumn, checkColumn, wideColumn, fullColumn} {
		if k.name == word {
			return draw.Box{X0: k.x - bearing, Y0: bodyTop - 1, X1: k.right, Y1: bodyBottom + 3}, true
		}
	}
	switch word {
	case "head", "hairline":
		return draw.Box{X0: left, Y0: headTop - 8, X1: right, Y1: footRule}, true
	case "foot":
		return draw.Box{X0: left, Y0: footRule - 1, X1: right, Y1: footTop + footLead + 3}, true
	}
	return draw.Box{}, false
}
