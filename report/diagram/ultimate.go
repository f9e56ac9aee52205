package diagram

import (
	"fmt"
	"math"
	"slices"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// ultimate draws the equilibrium of a section at the ultimate limit state in four pictures side by side:
// the section with its compressed zone, the strain due to bending, the stress in the concrete, and the forces
// with their lever arms; and lists for each row the strain before bending, the whole strain, the force and
// the lever arm.
//
// Roles, at the station of the figure. The outline with its topping: see shape. Lengths in mm, depths from the compressed
// edge, which is the top, or where the role hogging stands with a value other than 0 the soffit: h (with the topping),
// neutral-axis, block-centroid (depth of the force in the concrete), block-force, strain-top (at the compressed edge),
// resistance. Either block-depth and block-stress; or fibre-level (above the soffit) and fibre-stress (compression
// positive) over the fibres of the concrete, with optional block-stress, the greatest that the concrete can have. Over
// the rows of tendons depth, prestrain, strain, force, lever; optional bending-strain (without the prestrain), bar-depth, bar-strain, bar-force, bar-lever over
// the rows of bars, tension positive, lever positive on the side of the tension from the force in the concrete; optional
// count, diameter and spacing or position-x, position-row, the same with bar-, and duct-diameter to draw the rows as
// they lie.
func ultimate(d *data, width draw.Pt) *tape {
	u := equilibrium{shape: d.shape(), h: d.one("h"), x: d.one("neutral-axis"), centroid: d.one("block-centroid"),
		force: d.one("block-force"), strain: d.one("strain-top"), resistance: d.one("resistance")}
	u.hogging = d.has("hogging") && d.one("hogging").value != 0
	if d.has("fibre-stress") {
		u.curve = d.curve(&u.shape)
	} else {
		u.block = d.one("block-depth")
	}
	if u.curve == nil || d.has("block-stress") {
		u.stress = d.one("block-stress")
	}
	u.rows = d.stressed("", "prestrain", &u.shape)
	if d.has("bar-depth") {
		u.rows = append(u.rows, d.stressed("bar-", "", &u.shape)...)
	}
	if d.err == nil && !(u.x.value > 0 && u.h.value > 0) {
		d.fail("neutral axis at %g mm of a depth of %g mm", u.x.value, u.h.value)
	}
	if off := u.h.value - u.shape.total(); d.err == nil && (off > 2*near || off < -2*near) {
		d.fail("role \"h\": %s, the outline is %.1f mm deep", u.h.shown, u.shape.total())
	}
	if d.err != nil {
		return nil
	}
	const tallest, least draw.Pt = 165, 90
	var t *tape
	for _, in := range []layout{roomy, tight, narrow} {
		for _, room := range []draw.Pt{130, 110, 95, 80, 66} {
			up := fit(u.h.value, tallest)
			for across := fit(u.shape.widest(), room); across > 3*up; { // a wide section would look like another
				next, more := up.smaller()
				if !more || next.of(u.h.value) < least || next.of(u.nearest()) < forcesApart {
					break
				}
				up = next
			}
			t = &tape{}
			u.draw(t, up, room, in)
			if t.ink.Width() <= width {
				return t
			}
		}
	}
	return t
}

// nearest is the least distance of the depths of two rows that are not alike, mm.
func (u *equilibrium) nearest() float64 {
	least := u.h.value
	for i, r := range u.rows {
		for _, o := range u.rows[:i] {
			if d := math.Abs(r.depth.value - o.depth.value); d > near {
				least = min(least, d)
			}
		}
	}
	return least
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
	shape                                                    shape
	h, x, block, centroid, stress, force, strain, resistance cell // block not taken where there is a curve
	curve                                                    []fibre
	hogging                                                  bool
	rows                                                     []stressed
}

// written says which strain the figures give: that of bending where the record has it, else the whole.
func (u *equilibrium) written() string {
	for _, r := range u.rows {
		if r.bending.line == r.strain.line && r.prestrain.taken() {
			return "whole strain"
		}
	}
	return "strain of bending"
}

// stressed is a row of tendons or bars at ultimate. Prestrain is not taken for bars.
type stressed struct {
	name                                            string
	depth, prestrain, strain, bending, force, lever cell
	bar                                             bool
	seen                                            dots // where its row lies, none if not known
	row                                             int
}

// stressed are the rows of tendons, or with the prefix bar- those of bars. Bars outside the section and without a force are
// left out: a topping that is not there yet will hold them.
func (d *data) stressed(prefix, prestrain string, in *shape) []stressed {
	depth := d.rows(prefix + "depth")
	strain, force, lever := d.beside(prefix+"strain", depth), d.beside(prefix+"force", depth), d.beside(prefix+"lever", depth)
	var before column
	bend := strain
	if d.has(prefix + "bending-strain") {
		bend = d.beside(prefix+"bending-strain", depth)
	}
	if prestrain != "" {
		before = d.beside(prestrain, depth)
	}
	var seen dots
	if d.has(prefix+"count") && d.has(prefix+"diameter") && (d.has(prefix+"spacing") || d.has(prefix+"position-x")) {
		seen = d.dots(prefix, "depth", in.middle())
	}
	if d.err != nil {
		return nil
	}
	var out []stressed
	for i, v := range depth.cells {
		if outside := v.value < 0 || v.value > in.total(); prefix != "" && outside && force.cells[i].value == 0 {
			continue
		}
		r := stressed{name: depth.axis.Rows[i], depth: v, strain: strain.cells[i], bending: bend.cells[i], force: force.cells[i],
			lever: lever.cells[i], bar: prefix != "", seen: seen, row: i}
		if before.len() > 0 {
			r.prestrain = before.cells[i]
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

	forcesApart draw.Pt = 4.4 // least distance of two arrows
)

// draw draws the pictures with the top of the section at y = 0: widths of the section within room, the
// listing beside the forces or below.
func (u *equilibrium) draw(c draw.Canvas, up scale, room draw.Pt, in layout) {
	f := frame{sx: up.per(), sy: up.per(), y: draw.Pt(u.h.value) * up.per()}
	note := "scale " + up.String()
	if across := fit(u.shape.widest(), room); across > up {
		f.sx = across.per()
		note = fmt.Sprintf("widths %s, depths %s", across, up)
	}
	l, r := u.shape.reach()
	f.x = -draw.Pt(l+r) / 2 * f.sx
	half := draw.Pt(u.shape.widest()) / 2 * f.sx
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
	edges := []label{label{}.equals(u.strain), label{}.equals(u.greatest())}
	to := spread([]draw.Pt{(strain0 + zero) / 2, block0 + blockRun/2}, []draw.Pt{edges[0].width + 7, edges[1].width + 7}, -1e6, 1e6)
	y := f.y + size + 6
	for i, l := range edges {
		if u.hogging {
			l.centre(c, to[i], f.y+4+l.height)
			continue
		}
		l.centre(c, to[i], -4-l.depth)
	}
	if u.hogging {
		y += leading + 2
	}
	words("section").centre(c, 0, y)
	words("bending strain").centre(c, (strain0+strain1)/2, y)
	words("stress").centre(c, block0+blockRun/2, y)
	words("forces").centre(c, force0+forceRun/2, y)
	y += leading + 1
	if left := -half - 10; in == narrow {
		words(note+", ").equals(u.h).draw(c, left, y)
		y = u.listing(f, 0).below(c, left, y+14)
		axis := label{}.equals(u.x)
		if u.block.taken() {
			axis = axis.gap(2).equals(u.block)
		}
		axis.draw(c, left, y+leading+2)
		label{}.equals(u.force).say(draw.Serif, " at ").equals(u.centroid).gap(2).equals(u.resistance).draw(c, left, y+2*leading+2)
		return
	}
	depths := label{}.equals(u.h)
	if in == tight {
		depths = depths.say(draw.Serif, ", ").equals(u.x)
	}
	words(note).centre(c, 0, y)
	depths.centre(c, 0, y+leading)
	if l := words("figures: " + u.written()); written && (strain0+strain1)/2-l.width/2 > max(words(note).width, depths.width)/2+6 {
		l.centre(c, (strain0+strain1)/2, y)
	}
}

// axis is the height of the neutral axis on paper.
func (u *equilibrium) axis(f frame) draw.Pt { return u.depthAt(f, u.x.value) }

// level is the height above the soffit of a depth from the compressed edge, mm.
func (u *equilibrium) level(depth float64) float64 {
	return pick(u.hogging, depth, u.shape.total()-depth)
}

// depthAt is a depth from the compressed edge on paper.
func (u *equilibrium) depthAt(f frame, depth float64) draw.Pt { return f.at(0, u.level(depth)).Y }

// down is 1 where depths run down the paper and −1 where they run up.
func (u *equilibrium) down() draw.Pt { return pick[draw.Pt](u.hogging, -1, 1) }

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
	whole := u.shape.total()
	u.shape.fill(c, f, 0, whole, concrete, cast)
	depth := u.x.value
	if u.block.taken() {
		depth = u.block.value
	}
	edge, end := u.level(0), u.level(min(depth, whole))
	u.shape.fill(c, f, min(edge, end), max(edge, end), compressed, squeezed)
	u.shape.outlines(c, f)
	for _, r := range u.rows {
		level := u.level(r.depth.value)
		if r.seen.level.len() == 0 {
			lo, hi := u.shape.ends(level, false)
			p, q := f.at(lo+0.15*(hi-lo), level), f.at(hi-0.15*(hi-lo), level)
			c.Line(p.X, p.Y, q.X, q.Y, outline)
			continue
		}
		for _, x := range r.seen.x[r.row] {
			p := f.at(x, level)
			r.seen.dot(c, r.row, p.X, p.Y, r.seen.radius(f, r.row))
		}
	}
	x := -half - 8
	y := u.depthAt(f, 0)
	lo, _ := u.shape.ends(pick(u.hogging, 0, u.shape.height), false)
	if top := u.shape.strip(); top != nil && !u.hogging {
		lo = top[0][0].x
	}
	extendLeft(c, y, f.at(lo, 0).X, x)
	ends := []draw.Pt{y, u.axis(f)}
	slices.Sort(ends)
	stack(c, x, ends, []label{short(u.x, in != roomy)})
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
