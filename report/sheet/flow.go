package sheet

import (
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
	waiting []*element // floats for the top of the next sheet
	running string
}

// fill lays out the elements of the parts on sheets. An element taller than a sheet is an error.
func fill(elements []*element) ([]*page, error) {
	f := &flow{}
	f.turn()
	for i := 0; i < len(elements); {
		n := chunk(elements[i:])
		if err := f.put(elements[i:i+n], elements[i+n:]); err != nil {
			return nil, err
		}
		i += n
	}
	for len(f.waiting) > 0 {
		f.turn()
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

// turn begins a sheet, with the floats that wait for it.
func (f *flow) turn() {
	f.pages = append(f.pages, &page{running: f.running, y: bodyTop})
	waiting := f.waiting
	f.waiting = nil
	for i, e := range waiting {
		if !f.fits(waiting[i : i+1]) {
			f.waiting = waiting[i:]
			return
		}
		f.place(e)
	}
}

// need is the height of a run on the current sheet, with what must be repeated above it.
func (f *flow) need(es []*element) draw.Pt {
	h, p := draw.Pt(0), f.page()
	head := p.head
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
		head = e.head
		h += e.height
	}
	return h
}

func (f *flow) fits(es []*element) bool { return f.page().y+f.need(es) <= bodyBottom+0.01 }

func (f *flow) put(es, after []*element) error {
	if es[0].fresh && len(f.page().placed) > 0 {
		for f.turn(); len(f.waiting) > 0 || len(f.page().placed) > 0; f.turn() {
		}
	}
	if f.fits(es) {
		f.all(es)
		return nil
	}
	last := es[len(es)-1]
	if last.split != nil {
		if lead := es[:len(es)-1]; len(lead) == 0 || f.page().y+f.need(lead)+leastSplit <= bodyBottom {
			f.all(lead)
			return f.divide(last)
		}
	}
	// A figure waits for the next sheet; a heading above it then leads what comes after it.
	if last.floats && len(f.page().placed) > 0 {
		lead := es[:len(es)-1]
		next := after[:min(len(after), 1)]
		if len(after) > 0 {
			next = after[:chunk(after)]
		}
		enough := len(next) > 0 && !next[0].fresh && !next[len(next)-1].floats
		if len(lead) == 0 && f.queued()+last.height < body/2 || enough && f.fits(append(lead[:len(lead):len(lead)], next...)) {
			f.all(lead)
			f.waiting = append(f.waiting, last)
			return nil
		}
	}
	if len(f.page().placed) > 0 {
		f.turn()
		return f.put(es, after)
	}
	// The run is taller than a sheet: it breaks where it must.
	for _, e := range es {
		if !f.fits([]*element{e}) {
			if len(f.page().placed) == 0 {
				return fmt.Errorf("%s is taller than a sheet", e.owner)
			}
			f.turn()
		}
		f.place(e)
	}
	return nil
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
			f.turn()
			continue
		}
		f.place(first)
		if rest != nil {
			f.turn()
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
	p.head = e.head
	if e.running != "" {
		if len(p.placed) == 0 {
			p.running = e.running
		}
		f.running = e.running
	}
	p.placed = append(p.placed, placed{e, p.y, false})
	p.y += e.height
}
