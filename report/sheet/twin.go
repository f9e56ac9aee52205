package sheet

import "soffit/report/draw"

// cell is an entry of a list set in two columns down the sheet.
type cell struct {
	h     draw.Pt
	above draw.Pt // part of h that is left out at the head of a column
	paint func(c draw.Canvas, x, y draw.Pt)
}

const (
	twinGap   draw.Pt = 18
	twinWidth         = (width - twinGap) / 2
)

// twin sets cells in two columns of equal height, read down the left one first on each sheet.
func twin(owner string, cells []cell, above draw.Pt) *element {
	return closer(owner, cells, nil, above)
}

// closer is twin, but the same cells set closer are taken where those then need no further sheet; nil for none.
func closer(owner string, cells, tight []cell, above draw.Pt) *element {
	e := &element{owner: owner, above: above}
	left1, h := halves(cells)
	e.height = h
	e.paint = twinPaint(owner, cells, left1)
	e.split = func(room draw.Pt) (first, rest *element) {
		n, l := fitting(cells, room)
		if n < len(cells) && tight != nil {
			if _, h := halves(tight); h <= room {
				return twin(owner, tight, above).whole(), nil
			}
		}
		if n == 0 {
			return nil, nil
		}
		if n == len(cells) {
			return twin(owner, cells, above).whole(), nil
		}
		head := &element{owner: owner, above: above, height: room, paint: twinPaint(owner, cells[:n], l)}
		others := tight
		if others != nil {
			others = others[n:]
		}
		return head, closer(owner, cells[n:], others, 0)
	}
	return e
}

func (e *element) whole() *element {
	e.split = nil
	return e
}

func twinPaint(owner string, cells []cell, leftOnes int) func(draw.Canvas, draw.Pt) {
	return func(c draw.Canvas, y draw.Pt) {
		x, at := left, y
		for i, k := range cells {
			if i == leftOnes {
				x, at = left+twinWidth+twinGap, y
			}
			if i == 0 || i == leftOnes {
				at -= k.above
			}
			c.Owner("full " + owner)
			k.paint(c, x, at)
			at += k.h
		}
	}
}

// halves divides cells into two columns of least height.
func halves(cells []cell) (leftOnes int, height draw.Pt) {
	total := draw.Pt(0)
	for _, k := range cells {
		total += k.h
	}
	h := draw.Pt(0)
	for i, k := range cells {
		if h+k.h > total-h {
			// The cell in the middle goes where the columns stay shorter.
			if with, without := max(h+k.h, total-h-k.h), max(h, total-h); with <= without {
				return i + 1, with
			}
			return i, max(h, total-h)
		}
		h += k.h
	}
	return len(cells), h
}

// fitting is how many cells fill two columns of a height, and how many of them the left one.
func fitting(cells []cell, room draw.Pt) (n, leftOnes int) {
	if _, h := halves(cells); h <= room {
		l, _ := halves(cells)
		return len(cells), l
	}
	h := draw.Pt(0)
	for n < len(cells) && h+cells[n].h <= room {
		h += cells[n].h
		n++
	}
	leftOnes, h = n, 0
	for n < len(cells) && h+cells[n].h <= room {
		h += cells[n].h
		n++
	}
	return n, leftOnes
}
