package sheet

import (
	"cmp"
	"fmt"

	"soffit/report/draw"
)

// placed is an element on a sheet.
type placed struct {
	*element
	y     draw.Pt // upper edge
	again bool    // a head repeated
}

// page is one sheet before it is drawn.
type page struct {
	placed  []placed
	running string // chapter at the top of the sheet
	y       draw.Pt
	head    *element // the table head in force on this sheet
	rows    int      // placed under it
}

// ruled tells whether the page is a calculation sheet.
func (p *page) ruled() bool {
	for _, e := range p.placed {
		if e.ruled {
			return true
		}
	}
	return false
}

// flow fills sheets with elements in order.
type flow struct {
	pages   []*page
	waiting []*element // floats for the next place outside a table with room for them
	table   *element   // the head of the table that the last element belongs to
	running string
	tall    string // owner of a float that no sheet has room for
}

// fill lays out the elements of the parts on sheets. An element taller than a sheet is an error.
func fill(elements []*element) ([]*page, error) {
	f := &flow{}
	f.turn(false)
	for i := 0; i < len(elements); {
		n := chunk(elements[i:])
		if err := f.put(elements[i:i+n], elements[i+n:]); err != nil {
			return nil, err
		}
		i += n
	}
	f.land()
	for len(f.waiting) > 0 {
		f.turn(false)
	}
	if f.tall != "" {
		return nil, fmt.Errorf("%s is taller than a sheet", f.tall)
	}
	return f.pages, nil
}

// chunk is how many elements from the first on must stay on one sheet.
func chunk(es []*element) int {
	n := 1
	for n < len(es) && es[n-1].keep {
		n++
	}
	return n
}

func (f *flow) page() *page { return f.pages[len(f.pages)-1] }

// leastSplit is the room below a heading in which an element is begun that goes on overleaf.
const leastSplit draw.Pt = 80

// turn begins a sheet, with the floats that wait for it unless a table goes on there. A float that does not even fit an
// empty sheet is set there, and named as the fault that ends the
// setting: it would be waited for without end.
func (f *flow) turn(inTable bool) {
	f.pages = append(f.pages, &page{running: f.running, y: bodyTop})
	if inTable {
		return
	}
	f.land()
	if p := f.page(); len(p.placed) == 0 && len(f.waiting) > 0 {
		e := f.waiting[0]
		f.waiting = f.waiting[1:]
		f.tall = cmp.Or(f.tall, e.owner)
		f.place(e)
	}
}

// land places the floats that wait, as many as the sheet has room for.
func (f *flow) land() {
	for len(f.waiting) > 0 && f.fits(f.waiting[:1]) {
		e := f.waiting[0]
		f.waiting = f.waiting[1:]
		f.place(e)
	}
}

// need is the height of a run on the current sheet, with what must be repeated above it.
func (f *flow) need(es []*element) draw.Pt {
	h, p := draw.Pt(0), f.page()
	head, rows := p.head, p.rows
	for i, e := range es {
		if len(p.placed) > 0 || i > 0 {
			h += e.above
		}
		if e.head != nil && e.head != head && e.head != e {
			h += e.head.height
			if len(p.placed) > 0 || i > 0 {
				h += headGap
			}
		}
		if e.head != head || e.head == e {
			rows = 0
		}
		h += e.gap(rows)
		if e.head != e {
			rows++
		}
		head = e.head
		h += e.height
	}
	return h
}

// gap is the space above a row of a table that stands below so many others on its sheet.
func (e *element) gap(rows int) draw.Pt {
	if e.grouped && rows > 0 && rows%groupOf == 0 {
		return groupGap
	}
	return 0
}

func (f *flow) fits(es []*element) bool { return f.page().y+f.need(es) <= bodyBottom+0.01 }

func (f *flow) put(es, after []*element) error {
	inTable := es[0].head != nil && es[0].head != es[0] && es[0].head == f.table
	if !inTable {
		f.land()
	}
	switch {
	case es[0].fresh:
		f.clear()
	case es[0].least > 0 && f.page().y+es[0].above+es[0].least > bodyBottom:
		f.clear()
	case es[0].opens: // figures from before come first
		for len(f.waiting) > 0 {
			f.turn(false)
		}
	}
	if f.fits(es) {
		f.all(es)
		return nil
	}
	last := es[len(es)-1]
	if last.split != nil {
		if lead := es[:len(es)-1]; len(lead) == 0 || f.page().y+f.need(lead)+cmp.Or(last.begins, leastSplit) <= bodyBottom {
			f.all(lead)
			return f.divide(last)
		}
	}
	// A figure without a heading waits for the next sheet, unless a heading follows it.
	if last.floats && len(es) == 1 && len(f.page().placed) > 0 && len(after) > 0 && !after[0].opens && !after[0].fresh &&
		f.queued()+last.height < body/2 {
		f.waiting = append(f.waiting, last)
		return nil
	}
	if len(f.page().placed) > 0 {
		f.turn(inTable)
		return f.put(es, after)
	}
	// The run is taller than a sheet: it breaks where it must.
	for _, e := range es {
		if e.split != nil {
			if err := f.divide(e); err != nil {
				return err
			}
			continue
		}
		if !f.fits([]*element{e}) {
			if len(f.page().placed) == 0 {
				return fmt.Errorf("%s is taller than a sheet", e.owner)
			}
			f.turn(true)
		}
		f.place(e)
	}
	return nil
}

// clear begins a new sheet, after those of the figures that wait, unless the sheet is empty.
func (f *flow) clear() {
	for len(f.waiting) > 0 || len(f.page().placed) > 0 {
		f.turn(false)
	}
}

// headGap is the space above a repeated head that does not begin its sheet.
const headGap draw.Pt = 12

// queued is the height of the floats that wait.
func (f *flow) queued() draw.Pt {
	h := draw.Pt(0)
	for _, e := range f.waiting {
		h += e.above + e.height
	}
	return h
}

// divide spreads an element over as many sheets as it takes.
func (f *flow) divide(e *element) error {
	for e != nil {
		room := bodyBottom - f.page().y
		if len(f.page().placed) > 0 {
			room -= e.above
		}
		first, rest := e.split(room)
		if first == nil {
			if len(f.page().placed) == 0 {
				return fmt.Errorf("%s does not fit on a sheet", e.owner)
			}
			f.turn(true)
			continue
		}
		f.place(first)
		if rest != nil {
			f.turn(true)
		}
		e = rest
	}
	return nil
}

func (f *flow) all(es []*element) {
	for _, e := range es {
		f.place(e)
	}
}

// place puts an element on the current sheet, below its head where the sheet does not show that yet.
func (f *flow) place(e *element) {
	p := f.page()
	if len(p.placed) > 0 {
		p.y += e.above
	}
	if e.head != nil && e.head != p.head && e.head != e {
		if len(p.placed) > 0 {
			p.y += headGap
		}
		p.placed = append(p.placed, placed{e.head, p.y, true})
		p.y += e.head.height
	}
	if e.head != p.head || e.head == e {
		p.rows = 0
	}
	p.y += e.gap(p.rows)
	if e.head != e {
		p.rows++
	}
	p.head, f.table = e.head, e.head
	if e.running != "" {
		if len(p.placed) == 0 {
			p.running = e.running
		}
		f.running = e.running
	}
	p.placed = append(p.placed, placed{e, p.y, false})
	p.y += e.height
}
