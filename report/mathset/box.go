// Package mathset sets the trees of package formula as mathematics: boxes of glyphs, rules and drawn
// signs with exact width, height and depth, placed by the metrics of the note's faces.
//
// A Setting says how: size, symbols or numbers, stacked or in running text. It gives Rows, which know
// where they may be broken; a Row becomes one Box, or with Equation a Block of lines within a width.
package mathset

import "soffit/report/draw"

// Box is set matter with its baseline at 0: Height of ink above it, Depth below, both counted positive,
// and Width along it. Its zero value is empty.
type Box struct {
	Width, Height, Depth draw.Pt

	items []item
	marks brackets
}

// brackets are the outermost brackets side by side in a box, so that others around them differ.
type brackets uint8

const (
	noBrackets brackets = iota
	roundInside
	squareInside
)

type itemKind uint8

const (
	glyphs itemKind = iota
	rule
	shape
	ghost
	jump
	child
)

// item is ink at x, y from the start of the baseline, y down.
type item struct {
	kind itemKind
	face draw.Face
	x, y draw.Pt
	size draw.Pt // of glyphs and ghost; length of a rule
	line draw.Pt // thickness of a rule
	text string  // glyphs, ghost; anchor of a jump
	path *draw.Path
	box  *Box
}

// Draw draws the box with its baseline starting at x, y.
func (b Box) Draw(c draw.Canvas, x, y draw.Pt) {
	for i := range b.items {
		it := &b.items[i]
		switch it.kind {
		case glyphs:
			c.Text(x+it.x, y+it.y, it.face, it.size, it.text)
		case rule:
			c.Line(x+it.x, y+it.y, x+it.x+it.size, y+it.y, it.line)
		case shape:
			moved := make(draw.Path, len(*it.path))
			for k, s := range *it.path {
				s.A.X, s.A.Y = s.A.X+x+it.x, s.A.Y+y+it.y
				s.B.X, s.B.Y = s.B.X+x+it.x, s.B.Y+y+it.y
				s.P.X, s.P.Y = s.P.X+x+it.x, s.P.Y+y+it.y
				moved[k] = s
			}
			c.Path(moved, draw.Style{Fill: draw.Black})
		case ghost:
			c.Hidden(x+it.x, y+it.y, it.size, it.text)
		case jump:
			c.Link(x+it.x, y+it.y-b.Height, b.Width, b.Height+b.Depth, it.text)
		case child:
			it.box.Draw(c, x+it.x, y+it.y)
		}
	}
}

// put places another box with its baseline at x, y and widens heights, not the width.
func (b *Box) put(x, y draw.Pt, o Box) {
	b.Height, b.Depth = max(b.Height, o.Height-y), max(b.Depth, o.Depth+y)
	if n := len(o.items); n > 3 || n > 0 && o.items[0].kind == jump {
		inner := new(Box)
		*inner = o
		b.items = append(b.items, item{kind: child, x: x, y: y, box: inner})
		return
	}
	for i := range o.items { // little is copied rather than pointed at
		it := o.items[i]
		it.x, it.y = it.x+x, it.y+y
		b.items = append(b.items, it)
	}
}

// add places another box at the end.
func (b *Box) add(o Box) {
	b.put(b.Width, 0, o)
	b.Width += o.Width
	b.marks = max(b.marks, o.marks)
}

func (b *Box) space(w draw.Pt) { b.Width += w }

// row is boxes side by side.
func row(boxes ...Box) Box {
	n := 0
	for i := range boxes {
		n += min(len(boxes[i].items), 3)
	}
	b := Box{items: make([]item, 0, n)}
	for _, o := range boxes {
		b.add(o)
	}
	return b
}

// text is a run of one face with the exact height and depth of its ink.
func text(f draw.Face, size draw.Pt, s string) Box {
	if s == "" {
		return Box{}
	}
	e := draw.Extent(f, size, s)
	return Box{Width: draw.Width(f, size, s), Height: max(-e.Y0, 0), Depth: max(e.Y1, 0),
		items: []item{{kind: glyphs, face: f, size: size, text: s}}}
}

// linked is the box leading to an anchor, if there is one.
func linked(b Box, anchor string) Box {
	if anchor == "" {
		return b
	}
	out := Box{Width: b.Width, Height: b.Height, Depth: b.Depth, items: make([]item, 1, 4)}
	out.items[0] = item{kind: jump, text: anchor}
	out.put(0, 0, b)
	return out
}

// strut gives the box at least this height and depth.
func strut(b Box, height, depth draw.Pt) Box {
	b.Height, b.Depth = max(b.Height, height), max(b.Depth, depth)
	return b
}
