package draw

import (
	"math"

	"soffit/fonts"
)

// Kind is the kind of a piece of ink.
type Kind uint8

// The kinds of ink which a Recorder keeps.
const (
	TextInk   Kind = iota // a Text or TextUp
	StrokeInk             // a line or an outline
	AreaInk               // a filled shape
)

// Ink is one piece of what was drawn.
type Ink struct {
	Kind  Kind
	Owner string // the label in force when it was drawn
	Text  string // of TextInk
	Face  Face
	Size  Pt
	At    Point // start of the baseline of TextInk
	Up    bool  // turned text
	Box   Box   // around the ink, widths of strokes included
	Tone  float64

	glyphs []glyphInk
	pieces [][2]Point // straight pieces of a stroke or of the outline of an area
	width  Pt
}

type glyphInk struct {
	box  Box
	face Face
	r    rune
	x    Pt // start of the glyph along the baseline
}

// LinkArea is a place that leads to an anchor.
type LinkArea struct {
	Box    Box
	Anchor string
	Owner  string
}

// AnchorPoint is a place to which links lead.
type AnchorPoint struct {
	Name string
	At   Point
}

// Recorder is a Canvas that keeps what was drawn on one sheet. Its zero value is ready for use.
type Recorder struct {
	Ink     []Ink
	Links   []LinkArea
	Anchors []AnchorPoint
	Secret  []string // hidden text in the order drawn

	owner   string
	missing []Fault
}

var _ Canvas = (*Recorder)(nil)

// Owner labels the following ink.
func (r *Recorder) Owner(label string) { r.owner = label }

// Text records text.
func (r *Recorder) Text(x, y Pt, f Face, size Pt, s string) { r.text(x, y, f, size, s, false) }

// TextUp records turned text.
func (r *Recorder) TextUp(x, y Pt, f Face, size Pt, s string) { r.text(x, y, f, size, s, true) }

func (r *Recorder) text(x, y Pt, f Face, size Pt, s string, up bool) {
	ink := Ink{Kind: TextInk, Owner: r.owner, Text: s, Face: f, Size: size, At: Point{x, y}, Up: up}
	Glyphs(f, s, func(c rune, face Face, at float64, g *fonts.Glyph) {
		if !g.Has {
			r.missing = append(r.missing, Fault{Kind: MissingGlyph, A: Ink{Owner: r.owner, Text: s}, Rune: c,
				At: Box{x, y, x, y}})
			return
		}
		if g.XMax <= g.XMin {
			return
		}
		px := Pt(at) * size
		b := Box{x + px + Pt(g.XMin)*size, y - Pt(g.YMax)*size, x + px + Pt(g.XMax)*size, y - Pt(g.YMin)*size}
		if up {
			b = Box{x - Pt(g.YMax)*size, y - px - Pt(g.XMax)*size, x - Pt(g.YMin)*size, y - px - Pt(g.XMin)*size}
		}
		ink.Box = ink.Box.Union(b)
		ink.glyphs = append(ink.glyphs, glyphInk{b, face, c, x + px})
	})
	r.Ink = append(r.Ink, ink)
}

// Line records a line.
func (r *Recorder) Line(x1, y1, x2, y2, width Pt, dash ...Pt) {
	r.stroke([]Point{{x1, y1}, {x2, y2}}, width, 0)
}

// Rect records a rectangle.
func (r *Recorder) Rect(x, y, w, h Pt, style Style) {
	r.shape([]Point{{x, y}, {x + w, y}, {x + w, y + h}, {x, y + h}, {x, y}}, style)
}

// Polygon records a closed shape.
func (r *Recorder) Polygon(pts []Point, style Style) {
	if len(pts) > 0 {
		r.shape(append(append([]Point(nil), pts...), pts[0]), style)
	}
}

// Polyline records an open line.
func (r *Recorder) Polyline(pts []Point, style Style) { r.shape(pts, style) }

// Circle records a circle.
func (r *Recorder) Circle(x, y, radius Pt, style Style) {
	const n = 32
	pts := make([]Point, n+1)
	for i := range pts {
		a := 2 * math.Pi * float64(i) / n
		pts[i] = Point{x + radius*Pt(math.Cos(a)), y + radius*Pt(math.Sin(a))}
	}
	r.shape(pts, style)
}

// Path records an outline, its curves as straight pieces.
func (r *Recorder) Path(p Path, style Style) {
	var pts []Point
	var start Point
	flush := func() {
		if len(pts) > 1 {
			r.shape(pts, style)
		}
		pts = nil
	}
	for _, s := range p {
		switch s.Kind {
		case Move:
			flush()
			start, pts = s.P, []Point{s.P}
		case LineTo:
			pts = append(pts, s.P)
		case CurveTo:
			const n = 8
			from := pts[len(pts)-1]
			for i := 1; i <= n; i++ {
				pts = append(pts, bezier(from, s.A, s.B, s.P, Pt(i)/n))
			}
		case Close:
			pts = append(pts, start)
		}
	}
	flush()
}

func bezier(p, a, b, q Point, t Pt) Point {
	u := 1 - t
	k0, k1, k2, k3 := u*u*u, 3*u*u*t, 3*u*t*t, t*t*t
	return Point{k0*p.X + k1*a.X + k2*b.X + k3*q.X, k0*p.Y + k1*a.Y + k2*b.Y + k3*q.Y}
}

// Hidden keeps the text apart from the ink.
func (r *Recorder) Hidden(x, y, size Pt, s string) { r.Secret = append(r.Secret, s) }

// Link records a link.
func (r *Recorder) Link(x, y, w, h Pt, anchor string) {
	r.Links = append(r.Links, LinkArea{BoxAt(x, y, w, h), anchor, r.owner})
}

// Anchor records an anchor.
func (r *Recorder) Anchor(name string, x, y Pt) {
	r.Anchors = append(r.Anchors, AnchorPoint{name, Point{x, y}})
}

func (r *Recorder) shape(pts []Point, style Style) {
	if level, ok := style.Fill.Level(); ok && len(pts) > 2 {
		ink := Ink{Kind: AreaInk, Owner: r.owner, Tone: level}
		ink.add(pts, 0)
		r.Ink = append(r.Ink, ink)
	}
	if style.Stroke > 0 {
		level, _ := style.Pen.Level()
		r.stroke(pts, style.Stroke, level)
	}
}

func (r *Recorder) stroke(pts []Point, width Pt, tone float64) {
	ink := Ink{Kind: StrokeInk, Owner: r.owner, width: width, Tone: tone}
	ink.add(pts, width)
	r.Ink = append(r.Ink, ink)
}

func (k *Ink) add(pts []Point, width Pt) {
	first := true
	for i, p := range pts {
		b := Box{p.X, p.Y, p.X, p.Y}
		if first {
			k.Box, first = b, false
		} else {
			k.Box = Box{min(k.Box.X0, p.X), min(k.Box.Y0, p.Y), max(k.Box.X1, p.X), max(k.Box.Y1, p.Y)}
		}
		if i > 0 {
			k.pieces = append(k.pieces, [2]Point{pts[i-1], p})
		}
	}
	if len(pts) == 2 { // a line has no caps
		dx, dy := pts[1].X-pts[0].X, pts[1].Y-pts[0].Y
		if d := Pt(math.Hypot(float64(dx), float64(dy))); d > 0 {
			gx, gy := width/2*abs(dy)/d, width/2*abs(dx)/d
			k.Box = Box{k.Box.X0 - gx, k.Box.Y0 - gy, k.Box.X1 + gx, k.Box.Y1 + gy}
			return
		}
	}
	k.Box = k.Box.Grow(width / 2)
}

func abs(v Pt) Pt { return max(v, -v) }

// Bounds is the box around all ink.
func (r *Recorder) Bounds() Box {
	var b Box
	for _, k := range r.Ink {
		b = b.Union(k.Box)
	}
	return b
}

// Texts are the texts in the order drawn.
func (r *Recorder) Texts() []string {
	var out []string
	for _, k := range r.Ink {
		if k.Kind == TextInk {
			out = append(out, k.Text)
		}
	}
	return out
}
