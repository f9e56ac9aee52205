package sheet

import (
	"soffit/report/draw"
)

// An element is a measured piece of a note that stands on one sheet undivided.
type element struct {
	owner  string  // what its ink belongs to
	above  draw.Pt // space wanted above; none at the top of a sheet
	height draw.Pt
	keep   bool     // stays on the sheet of the element after it
	fresh  bool     // begins a new sheet
	floats bool     // where it does not fit, what follows may go before it; it then heads the next sheet
	ruled  bool     // belongs to the four columns of a calculation sheet
	spans  span     // hairlines it stands across, if ruled
	head   *element // repeated above it on a sheet that does not show it yet; the head is its own head
	// split divides the element where it does not fit into the room left; rest is nil where all of it does,
	// first is nil where nothing does. An element without split is never divided.
	split func(room draw.Pt) (first, rest *element)
	// paint draws the element, y being its upper edge.
	paint func(c draw.Canvas, y draw.Pt)
	// running is what the head of the sheet calls the chapter from this element on; "" for no change.
	running string
	anchors []string
}

// keepTogether binds a run of elements to one sheet.
func keepTogether(es []*element) []*element {
	for i := range len(es) - 1 {
		es[i].keep = true
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
