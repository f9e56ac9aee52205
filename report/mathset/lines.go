package mathset

import "soffit/report/draw"

// Block is lines of mathematics under each other.
type Block struct {
	Lines []Line
	size  draw.Pt
}

// Line is one line of a block: its box starts at X; Y is its baseline below the block's top.
type Line struct {
	Box  Box
	X, Y draw.Pt
}

// Height of the block from the top of its first line's ink to the bottom of its last.
func (b Block) Height() draw.Pt {
	if len(b.Lines) == 0 {
		return 0
	}
	last := b.Lines[len(b.Lines)-1]
	return last.Y + last.Box.Depth
}

// Width is that of the longest line.
func (b Block) Width() draw.Pt {
	var w draw.Pt
	for _, l := range b.Lines {
		w = max(w, l.X+l.Box.Width)
	}
	return w
}

// Draw draws the block with its top left corner at x, y.
func (b Block) Draw(c draw.Canvas, x, y draw.Pt) {
	for i := range b.Lines {
		l := &b.Lines[i]
		l.Box.Draw(c, x+l.X, y+l.Y)
	}
}

// Right moves every line to end at the width, for a column of results.
func (b Block) Right(width draw.Pt) Block {
	out := Block{Lines: append([]Line(nil), b.Lines...), size: b.size}
	for i := range out.Lines {
		out.Lines[i].X = width - out.Lines[i].Box.Width
	}
	return out
}

// least is the share of its size to which a formula is made smaller at most, to fit its column.
const least = 0.8

// Lines breaks the row into lines no wider than width. Lines after the first that start with a relation
// stand under the first relation, other lines further in. A fraction too wide for the column is set with
// a solidus; what is too wide still is made smaller, to four fifths at most. Wider than that it stays and
// reaches out of the column, which a Recorder finds.
//
// A line begins with a relation, a sign or an item of a list; only where even the smallest size does not fit
// otherwise does one end with a dot or a solidus.
func (r Row) Lines(width draw.Pt) Block {
	best := r.at(r.size, 0, width, usual)
	if best.Width() <= width+0.01 {
		return best
	}
	indent := draw.Pt(2) * r.size
	for _, dearest := range []int{usual, never} {
		for _, scale := range []draw.Pt{1, 0.93, 0.86, least} {
			b := r.at(r.size*scale, width-indent, width, dearest)
			if b.Width() <= width+0.01 {
				return b
			}
			if b.Width() < best.Width() {
				best = b
			}
		}
	}
	return best
}

// Size is the size the block is set in.
func (b Block) Size() draw.Pt { return b.size }

// at sets the row within a width, fractions no wider than widest, with no break as dear as dearest.
func (r Row) at(size, widest, width draw.Pt, dearest int) Block {
	atoms := r.atoms
	if size != r.size || widest > 0 {
		atoms = r.again(size, widest)
	}
	b := Block{size: size}
	if len(atoms) == 0 {
		return b
	}
	b.Lines = breakLines(atoms, size, width, dearest)
	y := draw.Pt(0)
	for i := range b.Lines {
		l := &b.Lines[i]
		if i == 0 {
			y = l.Box.Height
		} else {
			y += max(b.Lines[i-1].Box.Depth+0.45*size+l.Box.Height, 1.3*size)
		}
		l.Y = y
	}
	return b
}

// breakLines chooses the breaks of least cost below dearest. A line more is better than a break at a sign, so that
// a formula falls apart at its relations while it can. Numbers begin a line of their own, if there is more than one.
func breakLines(atoms []atom, size, width draw.Pt, dearest int) []Line {
	// Where the first relation stands, and what follows it.
	var signAt, afterSign draw.Pt
	x, found := draw.Pt(0), false
	for i, a := range atoms {
		if i > 0 {
			x += a.gap
		}
		if a.relation > 0 && !found {
			signAt, afterSign, found = x, x+a.relation, true
		}
		x += a.box.Width
	}
	if signAt > 0.4*width {
		signAt = 1.5 * size
		afterSign = signAt
	}
	indent := func(i int) draw.Pt {
		switch {
		case i == 0:
			return 0
		case atoms[i].relation > 0:
			return signAt
		}
		return afterSign
	}
	divided := x > width+0.01
	const perLine, perOver = 30, 1e7
	n := len(atoms)
	cost := make([]float64, n+1)
	from := make([]int, n+1)
	for end := 1; end <= n; end++ {
		cost[end] = 1e300
	}
	for start := range n {
		if cost[start] >= 1e300 {
			continue
		}
		w := indent(start)
		for end := start + 1; end <= n; end++ {
			if end > start+1 {
				w += atoms[end-1].gap
			}
			w += atoms[end-1].box.Width
			if end > start+1 && atoms[end-1].turns && divided {
				break
			}
			if end < n && (atoms[end].cost >= dearest || end == start+1 && atoms[start].dots) {
				continue
			}
			k := cost[start] + perLine
			if over := float64((w - width) / size); over > 0.001 {
				k += perOver * over
			} else if end < n {
				slack := float64((width - w) / width)
				k += 10 * slack * slack
			}
			if end < n {
				k += float64(atoms[end].cost)
			}
			if k < cost[end] {
				cost[end], from[end] = k, start
			}
		}
	}
	var lines []Line
	for end := n; end > 0; end = from[end] {
		lines = append([]Line{{Box: joined(atoms[from[end]:end]), X: indent(from[end])}}, lines...)
	}
	return lines
}
