package draw

// Turned draws on another canvas, turned by a quarter to be read from below upwards: what is drawn at
// 0, 0 lands on X, Y of the other canvas, what is drawn to the right goes up. Text alone can be turned
// once: TextUp on a Turned canvas panics, for no drawing of a note needs it.
type Turned struct {
	On   Canvas
	X, Y Pt
}

func (t Turned) at(p Point) Point { return Point{t.X + p.Y, t.Y - p.X} }

func (t Turned) all(pts []Point) []Point {
	out := make([]Point, len(pts))
	for i, p := range pts {
		out[i] = t.at(p)
	}
	return out
}

// Text draws on the other canvas.
func (t Turned) Text(x, y Pt, f Face, size Pt, s string) {
	p := t.at(Point{x, y})
	t.On.TextUp(p.X, p.Y, f, size, s)
}

// TextUp panics.
func (t Turned) TextUp(x, y Pt, f Face, size Pt, s string) { panic("draw: text turned twice: " + s) }

// Line draws on the other canvas.
func (t Turned) Line(x1, y1, x2, y2, width Pt, dash ...Pt) {
	a, b := t.at(Point{x1, y1}), t.at(Point{x2, y2})
	t.On.Line(a.X, a.Y, b.X, b.Y, width, dash...)
}

// Rect draws on the other canvas.
func (t Turned) Rect(x, y, w, h Pt, style Style) {
	p := t.at(Point{x + w, y})
	t.On.Rect(p.X, p.Y, h, w, style)
}

// Polygon draws on the other canvas.
func (t Turned) Polygon(pts []Point, style Style) { t.On.Polygon(t.all(pts), style) }

// Polyline draws on the other canvas.
func (t Turned) Polyline(pts []Point, style Style) { t.On.Polyline(t.all(pts), style) }

// Circle draws on the other canvas.
func (t Turned) Circle(x, y, r Pt, style Style) {
	p := t.at(Point{x, y})
	t.On.Circle(p.X, p.Y, r, style)
}

// Path draws on the other canvas.
func (t Turned) Path(p Path, style Style) {
	out := make(Path, len(p))
	for i, s := range p {
		out[i] = Segment{s.Kind, t.at(s.A), t.at(s.B), t.at(s.P)}
	}
	t.On.Path(out, style)
}

// Hidden goes to the other canvas.
func (t Turned) Hidden(x, y, size Pt, s string) {
	p := t.at(Point{x, y})
	t.On.Hidden(p.X, p.Y, size, s)
}

// Link goes to the other canvas.
func (t Turned) Link(x, y, w, h Pt, anchor string) {
	p := t.at(Point{x + w, y})
	t.On.Link(p.X, p.Y, h, w, anchor)
}

// Anchor goes to the other canvas.
func (t Turned) Anchor(name string, x, y Pt) {
	p := t.at(Point{x, y})
	t.On.Anchor(name, p.X, p.Y)
}

// Owner goes to the other canvas.
func (t Turned) Owner(label string) { t.On.Owner(label) }
