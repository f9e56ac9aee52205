// Package draw is the drawing interface of a note: paper lengths, a canvas, and a recorder that finds
// faults of layout.
package draw

import "soffit/fonts"

// Pt is a length on paper in points, 1/72 inch. The origin of a sheet is its top left corner; x runs to
// the right, y down.
type Pt float64

// Mm is one millimetre on paper.
const Mm Pt = 72 / 25.4

// Width and height of an A4 sheet, portrait.
const (
	SheetWidth  Pt = 595.28
	SheetHeight Pt = 841.89
)

// Point is a place on a sheet.
type Point struct{ X, Y Pt }

// Face is a typeface.
type Face = fonts.Face

// The faces of a note. Marks is the typewriter face, for listings and fingerprints.
const (
	Serif  = fonts.Serif
	Italic = fonts.Italic
	Bold   = fonts.Bold
	Marks  = fonts.Marks
)

// Tone is a grey or nothing; its zero value is nothing.
type Tone struct {
	level float64
	set   bool
}

// Grey is a tone from 0, black, to 1, white.
func Grey(level float64) Tone { return Tone{min(max(level, 0), 1), true} }

// Black and White are the ends of the grey scale.
var Black, White = Grey(0), Grey(1)

// Level gives the grey and whether there is any.
func (t Tone) Level() (level float64, ok bool) { return t.level, t.set }

// Style says how a shape is inked. Its zero value draws nothing.
type Style struct {
	Stroke Pt   // width of the outline, 0 for none
	Fill   Tone // nothing by default
	Pen    Tone // tone of the outline, black by default
	Dash   []Pt // lengths on and off, none for a solid line
}

// Canvas takes ink. Implementations are a sheet of a PDF document and the Recorder.
type Canvas interface {
	// Text sets s with its baseline starting at x, y. A rune which the face lacks is lent by Marks or
	// Serif; one which they lack too is an error of the canvas.
	Text(x, y Pt, f Face, size Pt, s string)
	// TextUp is Text turned to be read from below upwards.
	TextUp(x, y Pt, f Face, size Pt, s string)
	Line(x1, y1, x2, y2, width Pt, dash ...Pt)
	Rect(x, y, w, h Pt, style Style)
	// Polygon is closed, Polyline open.
	Polygon(pts []Point, style Style)
	Polyline(pts []Point, style Style)
	Circle(x, y, r Pt, style Style)
	// Path is an outline with curves.
	Path(p Path, style Style)
	// Hidden puts text under a drawn sign, seen only by search and extraction.
	Hidden(x, y, size Pt, s string)
	// Link makes a rectangle, x, y its upper left corner, lead to an anchor.
	Link(x, y, w, h Pt, anchor string)
	// Anchor names a place for links; the place is shown at the top of the reader's window.
	Anchor(name string, x, y Pt)
	// Owner names what the following ink belongs to, for the Recorder's findings.
	Owner(label string)
}

// Path is a list of segments.
type Path []Segment

// Segment is one piece of a Path: a move or a line to P, or a Bézier curve to P if Curve is set, A and B
// its control points. Close joins the end to the last move.
type Segment struct {
	Kind SegmentKind
	A, B Point
	P    Point
}

// SegmentKind is what a Segment does.
type SegmentKind uint8

// The kinds of segments.
const (
	Move SegmentKind = iota
	LineTo
	CurveTo
	Close
)

// MoveTo adds a move.
func (p Path) MoveTo(x, y Pt) Path { return append(p, Segment{Kind: Move, P: Point{x, y}}) }

// LineTo adds a straight line.
func (p Path) LineTo(x, y Pt) Path { return append(p, Segment{Kind: LineTo, P: Point{x, y}}) }

// CurveTo adds a Bézier curve to x, y with the control points ax, ay and bx, by.
func (p Path) CurveTo(ax, ay, bx, by, x, y Pt) Path {
	return append(p, Segment{CurveTo, Point{ax, ay}, Point{bx, by}, Point{x, y}})
}

// Close closes the outline.
func (p Path) Close() Path { return append(p, Segment{Kind: Close}) }

// Box is a rectangle on a sheet, X0 ≤ X1, Y0 ≤ Y1.
type Box struct{ X0, Y0, X1, Y1 Pt }

// BoxAt is the rectangle with its upper left corner at x, y.
func BoxAt(x, y, w, h Pt) Box { return Box{x, y, x + w, y + h} }

// Width and Height of the box.
func (b Box) Width() Pt  { return b.X1 - b.X0 }
func (b Box) Height() Pt { return b.Y1 - b.Y0 }

// Empty tells whether the box has no area and no length.
func (b Box) Empty() bool { return b.X1 < b.X0 || b.Y1 < b.Y0 || b == Box{} }

// Union is the smallest box around both; an empty box adds nothing.
func (b Box) Union(o Box) Box {
	if b.Empty() {
		return o
	}
	if o.Empty() {
		return b
	}
	return Box{min(b.X0, o.X0), min(b.Y0, o.Y0), max(b.X1, o.X1), max(b.Y1, o.Y1)}
}

// Grow is the box widened by d on every side; d may be negative.
func (b Box) Grow(d Pt) Box { return Box{b.X0 - d, b.Y0 - d, b.X1 + d, b.Y1 + d} }

// Overlaps tells whether the two boxes share an area.
func (b Box) Overlaps(o Box) bool {
	return b.X0 < o.X1 && o.X0 < b.X1 && b.Y0 < o.Y1 && o.Y0 < b.Y1
}

// Inside tells whether b lies within o.
func (b Box) Inside(o Box) bool {
	return b.X0 >= o.X0 && b.X1 <= o.X1 && b.Y0 >= o.Y0 && b.Y1 <= o.Y1
}
