package diagram

import (
	"math"
	"slices"

	"soffit/report/draw"
)

// loading is one load on the member as a figure shows it.
type loading struct {
	name     string
	size     cell    // the force, or the force a length
	from, to float64 // mm from end A
	point    bool
	label    label
}

// axials are the rows of loads that act along the member, in the optional role load-N, compression positive: a line of
// words for each.
func (d *data) axials() []label {
	if !d.has("load-N") {
		return nil
	}
	n := d.rows("load-N")
	var out []label
	for i, v := range n.cells {
		if v.value == 0 {
			continue
		}
		l := words(shorten(draw.Serif, n.axis.Rows[i], 1.4*nameRoom)).gap(0.5).value(v)
		out = append(out, l.say(draw.Serif, " along the member, "+pick(v.value > 0, "compression", "tension")))
	}
	return out
}

// loads are the rows of loads. A row without any force is left out.
func (d *data) loads() []loading {
	if !d.has("load-from") {
		return nil
	}
	from := d.rows("load-from")
	to, q, f := d.beside("load-to", from), d.beside("load-q", from), d.beside("load-F", from)
	if d.err != nil {
		return nil
	}
	length := d.one("length").value
	var out []loading
	for i, v := range from.cells {
		l := loading{name: from.axis.Rows[i], from: v.value, to: to.cells[i].value}
		l.label = words(shorten(draw.Serif, l.name, 1.4*nameRoom)).gap(0.5)
		switch {
		case q.cells[i].value != 0:
			l.size = q.cells[i]
			l.label = l.label.value(l.size)
			if l.from > 0 || l.to < length {
				l.label = l.label.say(draw.Serif, " from ").value(v).say(draw.Serif, " to ").value(to.cells[i])
			}
		case f.cells[i].value != 0:
			l.size, l.point, l.to = f.cells[i], true, l.from
			l.label = l.label.value(l.size).say(draw.Serif, " at ").value(v)
		default:
			continue
		}
		out = append(out, l)
	}
	return out
}

// band is a spread load on paper: from x0 to x1, its lower edge y, its height h, its label in it or above.
type band struct {
	loading
	x0, x1, y, h draw.Pt
	label0       draw.Pt // where the label starts
	inside       bool    // the label stands in the band
}

// top is the upper end of the band and its label.
func (b band) top() draw.Pt {
	if b.inside {
		return b.y - b.h
	}
	return b.y - b.h - size - 1
}

// drawLoads stacks the spread loads on the top edge of a member of length l on paper, at y, and puts the
// point loads on top of them. Heights of bands and lengths of arrows are proportional to the loads, but for
// a least height that lets a label stand in a band.
func drawLoads(c draw.Canvas, loads []loading, per, l, y draw.Pt) {
	bands := stackBands(loads, per, l, y-2.5)
	top := y - 2.5
	for i := range bands {
		bands[i].draw(c)
		top = min(top, bands[i].top())
	}
	drawPoints(c, loads, bands, per, l, y-2.5, top)
}

func stackBands(loads []loading, per, l, y draw.Pt) []band {
	const least, most draw.Pt = 11, 18
	var heaviest float64
	for _, v := range loads {
		if !v.point {
			heaviest = max(heaviest, math.Abs(v.size.value))
		}
	}
	var bands []band
	for _, v := range loads {
		if v.point {
			continue
		}
		b := band{loading: v, x0: draw.Pt(v.from) * per, x1: draw.Pt(v.to) * per,
			h: max(least, most*draw.Pt(math.Abs(v.size.value)/heaviest))}
		b.inside = v.label.width+16 <= b.x1-b.x0
		b.label0 = (b.x0+b.x1)/2 - v.label.width/2
		if !b.inside {
			b.label0 = max(min(b.label0, l-v.label.width), min(0, (l-v.label.width)/2))
			b.h = max(b.h-4, 8)
		}
		bands = append(bands, b)
	}
	slices.SortStableFunc(bands, func(a, b band) int { // the longest lie lowest
		return int(math.Round(float64((b.x1 - b.x0) - (a.x1 - a.x0))))
	})
	for i := range bands {
		b := &bands[i]
		b.y = y
		for _, u := range bands[:i] {
			lo, hi := u.reach()
			l0, h0 := b.reach()
			if l0 < hi+4 && lo < h0+4 {
				b.y = min(b.y, u.top()-2)
			}
		}
	}
	return bands
}

// reach is the room of the band along the member, its label included.
func (b band) reach() (lo, hi draw.Pt) {
	return min(b.x0, b.label0), max(b.x1, b.label0+b.label.width)
}

func (b band) draw(c draw.Canvas) {
	c.Polyline([]draw.Point{{X: b.x0, Y: b.y}, {X: b.x0, Y: b.y - b.h}, {X: b.x1, Y: b.y - b.h}, {X: b.x1, Y: b.y}},
		draw.Style{Stroke: hair})
	tail, tip := b.y-b.h, b.y
	if b.size.value < 0 {
		tail, tip = tip, tail
		c.Line(b.x0, b.y, b.x1, b.y, hair)
	}
	n := max(int((b.x1-b.x0)/18), 1)
	for i := 0; i <= n; i++ {
		x := b.x0 + (b.x1-b.x0)*draw.Pt(i)/draw.Pt(n)
		if b.inside && x > b.label0-3 && x < b.label0+b.label.width+3 {
			continue
		}
		arrow(c, x, tail, x, tip, hair, 3)
	}
	if b.inside {
		b.label.draw(c, b.label0, b.y-b.h/2+middle)
		return
	}
	b.label.draw(c, b.label0, b.y-b.h-1-b.label.depth)
}

// drawPoints draws the point loads as arrows on top of the bands under them, with their labels in tiers
// above everything, so that no line to an arrow runs through a label.
func drawPoints(c draw.Canvas, loads []loading, bands []band, per, l, y, top draw.Pt) {
	var heaviest float64
	var points []loading
	for _, v := range loads {
		if v.point {
			points = append(points, v)
			heaviest = max(heaviest, math.Abs(v.size.value))
		}
	}
	if len(points) == 0 {
		return
	}
	const longest, shortest draw.Pt = 22, 5
	type placed struct {
		x, tip, tail, label0 draw.Pt
		tier                 int
	}
	at := make([]placed, len(points))
	for i, v := range points {
		p := placed{x: draw.Pt(v.from) * per, tip: y}
		for _, b := range bands {
			if lo, hi := b.reach(); p.x > lo-3 && p.x < hi+3 {
				p.tip = min(p.tip, b.top()-1)
			}
		}
		p.tail = p.tip - max(shortest, longest*draw.Pt(math.Abs(v.size.value)/heaviest))
		top = min(top, p.tail)
		p.label0 = p.x + 3
		if p.x > l/2 {
			p.label0 = p.x - 3 - v.label.width
		}
		at[i] = p
	}
	// A label stands beside its arrow, on the side where it is lowest, and higher than every arrow and label within
	// its width; the inner loads come first.
	order := make([]int, len(points))
	for i := range order {
		order[i] = i
	}
	outward := func(i int) draw.Pt { return max(at[i].x-l/2, l/2-at[i].x) }
	slices.SortStableFunc(order, func(a, b int) int { return int(math.Round(float64(100 * (outward(a) - outward(b))))) })
	// tier is the lowest one in which a label is clear of those set before; crossed counts the arrows still to come
	// that it would be in the way of.
	tier := func(k int, label0 draw.Pt) (tier, crossed int) {
		i := order[k]
		lo, hi := min(label0, at[i].x)-2, max(label0+points[i].label.width, at[i].x)+2
		for _, j := range order[:k] {
			jlo, jhi := min(at[j].x, at[j].label0)-2, max(at[j].x, at[j].label0+points[j].label.width)+2
			if lo < jhi && jlo < hi {
				tier = max(tier, at[j].tier+1)
			}
		}
		for _, j := range order[k+1:] {
			if at[j].x > lo && at[j].x < hi {
				crossed++
			}
		}
		return tier, crossed
	}
	for k, i := range order {
		p, w := &at[i], points[i].label.width
		other := p.x - 3 - w
		if p.label0 < p.x {
			other = p.x + 3
		}
		t, n := tier(k, p.label0)
		if u, m := tier(k, other); u+m < t+n && other >= 0 && other+w <= l {
			p.label0, t = other, u
		}
		p.tier = t
	}
	for i, p := range at {
		end := top - 2 - draw.Pt(p.tier)*leading - size*0.6 // beside the label
		if points[i].size.value < 0 {
			arrow(c, p.x, p.tip, p.x, end, outline, 5)
		} else {
			arrow(c, p.x, end, p.x, p.tip, outline, 5)
		}
	}
	for i, p := range at { // where a line cannot go round a label it is broken there
		base := top - 2 - draw.Pt(p.tier)*leading
		box := points[i].label.at(p.label0, base).Grow(1)
		for j, q := range at {
			if q.x > box.X0 && q.x < box.X1 && q.tier >= p.tier && j != i {
				c.Rect(box.X0, box.Y0, box.Width(), box.Height(), draw.Style{Fill: draw.White})
				break
			}
		}
		points[i].label.draw(c, p.label0, base)
	}
}
