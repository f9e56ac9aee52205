package sheet

import (
	"soffit/report/draw"
)

// An element is a measured piece of a note that stands on one sheet undivided.
type element struct {
	owner  string  // what its ink belongs to
	above  draw.Pt // space wanted above; none at the top of a sheet
	height draw.Pt
	keep   bool    // stays on the sheet of the element after it
	fresh  bool    // begins a new sheet
	least  draw.Pt // of room left on the sheet, else it begins a new one
	opens  bool    // heads what follows: no figure from before passes it
	floats bool    // where it does not fit, what follows may go before it; it then heads the next sheet
	ruled  bool    // belongs to the four columns of a calculation sheet
	spans  span    // hairlines it stands across, if ruled
	// across are the heights, from its upper edge, in which it reaches over the hairline before the result; the
	// hairline is drawn elsewhere. Nil where it reaches over it all along.
	across []reach
	head   *element // repeated above it on a sheet that does not show it yet; the head is its own head
	// grouped rows of a head have a gap after every fifth on a sheet.
	grouped bool
	// split divides the element where it does not fit into the room left; rest is nil where all of it does,
	// first is nil where nothing does. An element without split is never divided.
	split func(room draw.Pt) (first, rest *element)
	// begins is the room below what is kept with it in which an element with split is begun; 0 for leastSplit.
	begins draw.Pt
	// paint draws the element, y being its upper edge.
	paint func(c draw.Canvas, y draw.Pt)
	// running is what the head of the sheet calls the chapter from this element on; "" for no change.
	running string
	anchors []string
}

// reach is a range of heights.
type reach struct{ from, to draw.Pt }

// keepTogether binds a run of elements to one sheet.
func keepTogether(es []*element) []*element {
	for i := range len(es) - 1 {
		es[i].keep = true
	}
	return es
}

// keepHeadings binds to a heading, beside what follows it, a second line where the first is no more than one.
func keepHeadings(es []*element) []*element {
	const twoLines = 2 * tableLead
	for i, e := range es {
		if i == 0 || i+1 == len(es) || e.opens || !es[i-1].opens || e.height >= twoLines {
			continue
		}
		if next := es[i+1]; !next.opens && !next.fresh {
			e.keep = true
		}
	}
	return es
}

// keepEnds binds the first two and the last two of a run, so that neither stands alone on a sheet.
func keepEnds(es []*element) []*element {
	if len(es) > 1 {
		es[0].keep = true
		es[len(es)-2].keep = true
	}
	return es
}
