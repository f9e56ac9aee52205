package diagram

import (
	"fmt"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// ultimate draws the equilibrium of a section at the ultimate limit state in four pictures side by side:
// the section with its compressed block, the strain due to bending, the stress in the block, and the forces
// with their lever arms; and lists for each row the strain before bending, the whole strain, the force and
// the lever arm.
//
// Roles, at the station of the figure: height, lower, upper (parts of the section); h, neutral-axis,
// block-depth, block-centroid (depths from the top), block-stress, block-force, strain-top, resistance;
// depth, prestrain, strain, force, lever over the rows of tendons; optional bar-depth, bar-strain,
// bar-force, bar-lever over the rows of bars, tension positive, lever positive below the force in the block;
// optional count, spacing, diameter, bar-count, bar-spacing, bar-diameter to draw the rows as they lie.
func ultimate(d *data, width draw.Pt) *tape {
	u := equilibrium{parts: d.parts(), h: d.one("h"), x: d.one("neutral-axis"), block: d.one("block-depth"),
		centroid: d.one("block-centroid"), stress: d.one("block-stress"), force: d.one("block-force"),
		strain: d.one("strain-top"), resistance: d.one("resistance")}
	u.rows = d.stressed("", "prestrain")
	if d.has("bar-depth") {
		u.rows = append(u.rows, d.stressed("bar-", "")...)
	}
	if d.err == nil && !(u.x.value > 0 && u.h.value > 0) {
		d.fail("neutral axis at %g mm of a depth of %g mm", u.x.value, u.h.value)
	}
	if d.err != nil {
		return nil
	}
	const tallest draw.Pt = 165
	up := fit(u.h.value, tallest)
	var t *tape
	for _, in := range []layout{roomy, tight, narrow} {
		for _, room := range []draw.Pt{130, 110, 95, 80, 66} {
			t = &tape{}
			u.draw(t, up, room, in)
			if t.ink.Width() <= width {
				return t
			}
		}
	}
	return t
}

// layout is how the pictures use the width: with all numbers beside them; with the depth of the neutral axis
// under the section; or with all numbers in a table below.
type layout int

const (
	roomy layout = iota
	tight
	narrow
)

// equilibrium is what the four pictures show.
type equilibrium struct {
	parts                                                    parts
	h, x, block, centroid, stress, force, strain, resistance cell
	rows                                                     []stressed
}

// stressed is a row of tendons or bars at ultimate. Prestrain is not taken for bars.
type stressed struct {
	name                                   string
	depth, prestrain, strain, force, lever cell
	offsets                                []float64 // mm from the axis of symmetry, nil if not known
	diameter                               float64
	bar                                    bool
}

func (d *data) stressed(prefix, prestrain string) []stressed {
	depth := d.rows(prefix + "depth")
	strain, force, lever := d.beside(prefix+"strain", depth), d.beside(prefix+"force", depth), d.beside(prefix+"lever", depth)
	var before column
	if prestrain != "" {
		before = d.beside(prestrain, depth)
	}
	var seen dots
	if d.has(prefix+"count") && d.has(prefix+"spacing") && d.has(prefix+"diameter") {
		seen = dots{count: d.beside(prefix+"count", depth), spacing: d.beside(prefix+"spacing", depth), diameter: d.beside(prefix+"diameter", depth)}
	}
	if d.err != nil {
		return nil
	}
	var out []stressed
	for i, v := range depth.cells {
		r := stressed{name: depth.axis.Rows[i], depth: v, strain: strain.cells[i], force: force.cells[i],
			lever: lever.cells[i], bar: prefix != ""}
		if before.len() > 0 {
			r.prestrain = before.cells[i]
		}
		if seen.count.len() > 0 {
			r.diameter = seen.diameter.cells[i].value
			for k := range seen.number(i) {
				r.offsets = append(r.offsets, seen.x(i, k))
			}
		}
		out = append(out, r)
	}
	return out
}

// Distances on paper of the pictures.
const (
	apart     draw.Pt = 14 // between two pictures
	strainRun draw.Pt = 48 // width of the strains
	blockRun  draw.Pt = 26 // width of the block of stress
	forceRun  draw.Pt = 50 // length of the greatest force
)

// draw draws the pictures with the top of the section at y = 0: widths of the section within room, the
// listing beside the forces or below.
func (u *equilibrium) draw(c draw.Canvas, up scale, room draw.Pt, in layout) {
	f := frame{sx: up.per(), sy: up.per(), y: draw.Pt(u.h.value) * up.per()}
	note := "scale " + up.String()
	if across := fit(u.parts.widest(), room); across > up {
		f.sx = across.per()
		note = fmt.Sprintf("widths %s, depths %s", across, up)
	}
	half := draw.Pt(u.parts.widest()) / 2 * f.sx
	u.section(c, f, half, in)

	gap, strainRun, forceRun := apart, strainRun, forceRun
	switch in {
	case tight:
		gap = 10
	case narrow:
		gap, strainRun, forceRun = 8, 0.85*strainRun, 0.8*forceRun
	}
	strain0 := half + gap
	zero, strain1, written := u.strains(c, f, strain0, strainRun)
	block0 := strain1 + gap
	block1 := u.stresses(c, f, block0, in)
	force0 := block1 + gap
	u.forces(c, f, force0, forceRun, in)

	c.Line(-half-10, u.axis(f), strain1+5, u.axis(f), hair, chain...)
	over := []label{label{}.equals(u.strain), label{}.equals(u.stress)}
	to := spread([]draw.Pt{(strain0 + zero) / 2, block0 + blockRun/2}, []draw.Pt{over[0].width + 7, over[1].width + 7}, -1e6, 1e6)
	for i, l := range over {
		l.centre(c, to[i], -4-l.depth)
	}
	y := f.y + size + 6
	words("section").centre(c, 0, y)
	words("bending strain").centre(c, (strain0+strain1)/2, y)
	words("stress").centre(c, block0+blockRun/2, y)
	words("forces").centre(c, force0+forceRun/2, y)
	y += leading + 1
	if left := -half - 10; in == narrow {
		words(note+", ").equals(u.h).draw(c, left, y)
		y = u.listing(f, 0).below(c, left, y+14)
		label{}.equals(u.x).gap(2).equals(u.block).draw(c, left, y+leading+2)
		label{}.equals(u.force).say(draw.Serif, " at ").equals(u.centroid).gap(2).equals(u.resistance).draw(c, left, y+2*leading+2)
		return
	}
	depths := label{}.equals(u.h)
	if in == tight {
		depths = depths.say(draw.Serif, ", ").equals(u.x)
	}
	words(note).centre(c, 0, y)
	depths.centre(c, 0, y+leading)
	if l := words("figures: whole strain"); written && (strain0+strain1)/2-l.width/2 > max(words(note).width, depths.width)/2+6 {
		l.centre(c, (strain0+strain1)/2, y)
	}
}

// axis is the height of the neutral axis on paper.
func (u *equilibrium) axis(f frame) draw.Pt { return f.at(0, u.h.value-u.x.value).Y }

// depthAt is a depth below the top on paper.
func (u *equilibrium) depthAt(f frame, depth float64) draw.Pt { return f.at(0, u.h.value-depth).Y }

// short is a value with its symbol, or the symbol alone where the value stands below.
func short(c cell, bare bool) label {
	if bare {
		return label{}.symbol(c.line.Symbol)
	}
	return label{}.equals(c)
}

// section draws the section with its compressed part and its rows, and the depth of the neutral axis left of
// it.
func (u *equilibrium) section(c draw.Canvas, f frame, half draw.Pt, in layout) {
	whole := u.parts.depth()
	c.Polygon(u.parts.outline(f, 0, whole), draw.Style{Fill: concrete})
	c.Polygon(u.parts.outline(f, max(whole-u.block.value, 0), whole), draw.Style{Fill: compressed})
	c.Polygon(u.parts.outline(f, 0, whole), draw.Style{Stroke: outline})
	for _, r := range u.rows {
		level := u.h.value - r.depth.value
		if len(r.offsets) == 0 {
			w := 0.35 * u.parts.width(level)
			p, q := f.at(-w, level), f.at(w, level)
			c.Line(p.X, p.Y, q.X, q.Y, outline)
			continue
		}
		for _, x := range r.offsets {
			p := f.at(x, level)
			radius := max(draw.Pt(r.diameter)*min(f.sx, f.sy)/2, 0.8)
			if r.bar {
				c.Circle(p.X, p.Y, max(radius, 1.1), draw.Style{Stroke: medium, Fill: draw.White})
				continue
			}
			c.Circle(p.X, p.Y, radius, draw.Style{Fill: draw.Black})
		}
	}
	x := -half - 8
	extendLeft(c, 0, f.at(-u.parts.width(whole)/2, 0).X, x)
	stack(c, x, []draw.Pt{0, u.axis(f)}, []label{short(u.x, in != roomy)})
}

// stresses draws the block of stress with its depth. It returns where the picture ends.
func (u *equilibrium) stresses(c draw.Canvas, f frame, x draw.Pt, in layout) draw.Pt {
	low := u.depthAt(f, min(u.block.value, u.h.value))
	c.Rect(x, 0, blockRun, low, draw.Style{Stroke: medium, Fill: compressed})
	c.Line(x, low, x, f.y, medium)
	at := x + blockRun + 6
	extendLeft(c, 0, x+blockRun, at)
	extendLeft(c, low, x+blockRun, at)
	c.Line(at, -beyond, at, low+beyond, hair)
	ticks(c, at, 0)
	ticks(c, at, low)
	l := short(u.block, in == narrow)
	if y := low + 5 + l.height; in != narrow && y+l.depth < f.y-2 {
		l.draw(c, x+4, y)
		return max(x+4+l.width, at+beyond)
	}
	l.draw(c, at+4, low/2+middle)
	return at + 4 + l.width
}

// listing is the rows with their numbers, led to from the line of lever arms at x.
func (u *equilibrium) listing(f frame, x draw.Pt) listing {
	var l listing
	bars := false
	for _, r := range u.rows {
		bars = bars || r.bar
	}
	head := func(c cell) label {
		s := *c.line.Symbol
		if bars { // one head for tendons and bars
			s = formula.Symbol{Name: s.Base, Base: s.Base}
		}
		return label{}.symbol(&s).say(draw.Serif, "/"+c.line.Unit.String())
	}
	if len(u.rows) > 0 {
		r := u.rows[0]
		before := label{}
		if r.prestrain.line != nil {
			before = before.symbol(r.prestrain.line.Symbol).say(draw.Serif, "/"+r.prestrain.line.Unit.String())
		}
		l.heads = []label{words("row"), before, head(r.strain), head(r.force), head(r.lever)}
	}
	for _, r := range u.rows {
		e := listed{from: x + clearance, y: u.depthAt(f, r.depth.value), name: r.name}
		before := text("")
		if r.prestrain.taken() {
			before = figures(r.prestrain)
		}
		e.columns = append(e.columns, before, figures(r.strain), figures(r.force), figures(r.lever))
		l.lines = append(l.lines, e)
	}
	return l
}
