// Package diagram draws the figures of a note on a canvas: in black, white and greys, to scale where they
// show geometry, with the numbers on them. A figure is drawn from the entries which the record names for
// it, each in a role, and from nothing else: whatever number stands on it is one the sheets print.
//
// Each kind of figure is one file: a function that draws it on a tape, registered under its name in kinds.
// The roles it reads, with their units, stand in its comment. Lengths of a thing drawn are in mm, those of
// paper in draw.Pt; a frame or a graph maps one to the other, in one place for each figure.
package diagram

import (
	"fmt"
	"math"
	"slices"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// maker draws a figure no wider than width on a tape, where that is possible.
type maker func(d *data, width draw.Pt) *tape

var kinds = map[string]maker{
	"section":       section,
	"elevation":     elevation,
	"effects":       effects,
	"ultimate":      ultimate,
	"resistance":    resistance,
	"tendon-stress": tendonStress,
}

// spacious are the kinds that are better read over the full width of a sheet than in a column of it.
var spacious = map[string]bool{"elevation": true, "ultimate": true, "tendon-stress": true}

// Kinds are the kinds of figures that can be drawn, sorted.
func Kinds() []string {
	var out []string
	for k := range kinds {
		out = append(out, k)
	}
	slices.Sort(out)
	return out
}

// Spacious tells whether a kind wants the full width of the sheet.
func Spacious(kind string) bool { return spacious[kind] }

// Figure is a diagram laid out for a width, ready to be drawn.
type Figure struct {
	Width, Height draw.Pt // of the ink
	tape          *tape
}

// excess is how much wider than asked a figure may come out: into the margins, where nothing else stands.
const excess = 6 * draw.Mm

// Lay lays a figure out for a width of paper. It is made narrower where its scale asks for it, and comes out up to 6 mm
// wider where its numbers need that. An error names the figure and the role that is missing, not computed, or runs over the
// wrong rows; or the kind, if there is none of that name; or the width it needs.
func Lay(n *trace.Note, f *trace.Figure, width draw.Pt) (*Figure, error) {
	m, ok := kinds[f.Kind]
	if !ok {
		return nil, fmt.Errorf("figure %s: no kind %q, want one of %q", f.Key, f.Kind, Kinds())
	}
	d := read(n, f)
	if d.err != nil {
		return nil, d.err
	}
	t := m(d, width)
	if d.err != nil {
		return nil, d.err
	}
	if w := t.ink.Width(); w > width+excess {
		return nil, fmt.Errorf("figure %s: needs %.0f mm of width, has %.0f mm", f.Key, math.Ceil(float64(w/draw.Mm)), float64(width/draw.Mm))
	}
	return &Figure{t.ink.Width(), t.ink.Height(), t}, nil
}

// Draw draws the figure with the upper left corner of its ink at x, y.
func (f *Figure) Draw(c draw.Canvas, x, y draw.Pt) {
	f.tape.replay(c, x-f.tape.ink.X0, y-f.tape.ink.Y0)
}
