package sheet

import (
	"soffit/calc/trace"
	"soffit/report/diagram"
	"soffit/report/draw"
)

// drawing is a figure laid out for a width.
type drawing interface {
	Draw(c draw.Canvas, x, y draw.Pt)
}

// layFigure lays out a figure and tells how wide and high it is.
var layFigure = func(n *trace.Note, f *trace.Figure, width draw.Pt) (d drawing, w, h draw.Pt, err error) {
	fig, err := diagram.Lay(n, f, width)
	if err != nil {
		return nil, 0, 0, err
	}
	return fig, fig.Width, fig.Height, nil
}

// figure sets a diagram with its caption below it: across work and result, or across the sheet where the kind
// wants the room.
func (c *composer) figure(b *trace.Block, f *trace.Figure) {
	s := spanWide
	if diagram.Spacious(f.Kind) {
		s = spanFull
	}
	col := s.column()
	fig, fw, fh, err := layFigure(c.note, f, col.w)
	if err != nil {
		c.fail("%w", err)
		return
	}
	if fw > col.w && s == spanWide { // beyond the hairlines
		s = spanFull
		col = s.column()
	}
	label := "Figure " + f.Number
	lead := draw.Width(draw.Bold, noteSize, label+"  ")
	caption := stack{w: col.w - lead}
	caption.words(draw.Serif, noteSize, noteLead, 0, f.Name)
	for i := range caption.inks {
		caption.inks[i].x = lead
	}
	if len(caption.inks) == 0 {
		caption.put(ink{face: draw.Serif, size: noteSize}, noteSize*ascent, noteSize*descent, 0, 0)
	}
	caption.inks = append(caption.inks, ink{y: caption.inks[0].y, face: draw.Bold, size: noteSize, text: label})
	at := fh + 8
	owner := col.name + " figure " + f.Number
	c.add(&element{owner: "figure " + f.Number, above: 12, height: at + caption.bottom + 5, ruled: !plain(b), spans: s, floats: true,
		anchors: []string{f.Key},
		paint: func(cv draw.Canvas, y draw.Pt) {
			cv.Owner(owner)
			fig.Draw(cv, col.x+(col.w-fw)/2, y)
			cv.Owner(owner)
			caption.paint(cv, col.x, y+at)
		}})
}
