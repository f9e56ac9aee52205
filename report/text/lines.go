package text

import "soffit/report/draw"

// Line is one line of text, or a row of a table, to be placed by the composer of sheets. Before is the
// distance from the depth of the line above, 0 at the top of a column.
type Line struct {
	Before, Height, Depth draw.Pt
	Keep                  bool // stays with the next line
	Width                 draw.Pt

	draw func(c draw.Canvas, x, y draw.Pt)
}

// Draw draws the line with its baseline starting at x, y.
func (l Line) Draw(c draw.Canvas, x, y draw.Pt) {
	if l.draw != nil {
		l.draw(c, x, y)
	}
}

// Height of lines from the top of the first to the depth of the last.
func Height(lines []Line) draw.Pt {
	var h draw.Pt
	for i, l := range lines {
		if i > 0 {
			h += l.Before
		}
		h += l.Height + l.Depth
	}
	return h
}

// Draw draws lines under each other with their top left corner at x, y and gives the place below them.
func Draw(c draw.Canvas, x, y draw.Pt, lines []Line) draw.Pt {
	for i, l := range lines {
		if i > 0 {
			y += l.Before
		}
		l.Draw(c, x, y+l.Height)
		y += l.Height + l.Depth
	}
	return y
}

// newLine makes a line of items under the line before, nil for the first.
func newLine(items []item, style Style, before *Line) Line {
	l := Line{Height: ascent * style.Size, Depth: descent * style.Size}
	for i, it := range items {
		l.Height, l.Depth = max(l.Height, it.up), max(l.Depth, it.down)
		if i > 0 {
			l.Width += it.space
		}
		l.Width += it.width
	}
	if before != nil { // baselines keep their distance but where mathematics needs more
		l.Before = max(style.Leading-before.Depth-l.Height, 0.08*style.Size)
	}
	l.draw = func(c draw.Canvas, x, y draw.Pt) { drawItems(c, items, x, y) }
	return l
}

// last is the last of a list, nil if it is empty.
func last[T any](list []T) *T {
	if len(list) == 0 {
		return nil
	}
	return &list[len(list)-1]
}

// drawItems draws the words of one face between other matter as one text.
func drawItems(c draw.Canvas, items []item, x, y draw.Pt) {
	for i := 0; i < len(items); {
		it := items[i]
		if i > 0 {
			x += it.space
		}
		if it.text == "" {
			it.box.Draw(c, x, y)
			it.link(c, x, y, it.width)
			x += it.width
			i++
			continue
		}
		s, w := it.text, it.width
		blank := draw.Width(it.face, it.size, " ")
		j := i + 1
		for ; j < len(items); j++ {
			o := items[j]
			if o.text == "" || o.face != it.face || o.size != it.size || o.anchor != it.anchor || o.space != blank {
				break
			}
			s += " " + o.text
			w += o.space + o.width
		}
		c.Text(x, y, it.face, it.size, s)
		it.link(c, x, y, w)
		x += w
		i = j
	}
}

func (it item) link(c draw.Canvas, x, y, width draw.Pt) {
	if it.anchor != "" {
		c.Link(x, y-it.up, width, it.up+it.down, it.anchor)
	}
}

// breakItems chooses the breaks that leave the lines most even.
func breakItems(items []item, width draw.Pt) [][]item {
	n := len(items)
	cost := make([]float64, n+1)
	from := make([]int, n+1)
	for i := 1; i <= n; i++ {
		cost[i] = 1e300
	}
	for start := range n {
		if cost[start] >= 1e300 {
			continue
		}
		var w draw.Pt
		for end := start + 1; end <= n; end++ {
			if end > start+1 {
				w += items[end-1].space
			}
			w += items[end-1].width
			over := float64((w - width) / width)
			if over > 1e-4 && end > start+1 && cost[end] < 1e300 {
				break
			}
			if end < n && items[end].cost >= never {
				continue
			}
			k := cost[start] + 10
			switch slack := -over; {
			case over > 1e-4:
				k += 1e6 * (1 + over)
			case end < n:
				k += 100*slack*slack + items[end].cost
			case slack > 0.88 && start > 0: // a last line of one short word
				k += 15
			}
			if k < cost[end] {
				cost[end], from[end] = k, start
			}
		}
	}
	var out [][]item
	for end := n; end > 0; end = from[end] {
		out = append([][]item{items[from[end]:end]}, out...)
	}
	return out
}
