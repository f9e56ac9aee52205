package text

import (
	"github.com/yuin/goldmark/ast"
	extast "github.com/yuin/goldmark/extension/ast"

	"soffit/report/draw"
)

// table is a small table of text: a head and rows between rules.
type table struct {
	align []extast.Alignment
	head  []Paragraph
	rows  [][]Paragraph
}

func (w *walker) table(n *extast.Table) *table {
	t := &table{align: n.Alignments}
	for r := n.FirstChild(); r != nil; r = r.NextSibling() {
		face := draw.Serif
		_, isHead := r.(*extast.TableHeader)
		if isHead {
			face = draw.Bold
		}
		var cells []Paragraph
		for c := r.FirstChild(); c != nil; c = c.NextSibling() {
			if c.Lines().Len() > 0 {
				w.at = w.lineOf(c.Lines().At(0).Start)
			}
			cells = append(cells, w.runs(ast.Node(c), face, ""))
		}
		if isHead {
			t.head = cells
		} else {
			t.rows = append(t.rows, cells)
		}
	}
	return t
}

const (
	heavyRule draw.Pt = 0.6
	lightRule draw.Pt = 0.3
)

// lines gives one Line a row. Columns are as wide as their text, and narrower where that is too wide
// for the column of text.
func (t *table) lines(width draw.Pt, s Style) []Line {
	all := append([][]Paragraph{t.head}, t.rows...)
	gap := 1.2 * s.Size
	widths := t.widths(all, width, gap, s.Size)
	total := draw.Pt(0)
	for _, w := range widths {
		total += w
	}
	total += gap * draw.Pt(max(len(widths)-1, 0))
	pad := 0.26 * s.Size
	var out []Line
	for i, cells := range all {
		rule := draw.Pt(0)
		switch i {
		case 0:
			rule = heavyRule
		case 1:
			rule = lightRule
		}
		l := t.row(cells, widths, gap, s)
		inner, up := l.draw, l.Height+pad
		isLast := i == len(all)-1
		down := l.Depth + pad
		l.Height, l.Depth, l.Width = up, down, total
		l.Keep = i == 0 || i == len(all)-2 && len(all) > 2
		l.draw = func(c draw.Canvas, x, y draw.Pt) {
			if rule > 0 {
				c.Line(x, y-up, x+total, y-up, rule)
			}
			inner(c, x, y)
			if isLast {
				c.Line(x, y+down, x+total, y+down, heavyRule)
			}
		}
		if i == 0 {
			l.Before = pad
		}
		out = append(out, l)
	}
	return out
}

// row sets the cells of a row beside each other on the baseline of their first lines.
func (t *table) row(cells []Paragraph, widths []draw.Pt, gap draw.Pt, s Style) Line {
	type cell struct {
		lines []Line
		x     draw.Pt
	}
	row := Line{Height: ascent * s.Size, Depth: descent * s.Size}
	var set []cell
	x := draw.Pt(0)
	for i, p := range cells {
		if i >= len(widths) {
			break
		}
		c := cell{p.Lines(widths[i], s), x}
		for k := range c.lines {
			free := widths[i] - c.lines[k].Width
			switch t.align[i] {
			case extast.AlignRight:
				moved(c.lines[k:k+1], free)
			case extast.AlignCenter:
				moved(c.lines[k:k+1], free/2)
			}
		}
		if len(c.lines) > 0 {
			row.Height = max(row.Height, c.lines[0].Height)
			row.Depth = max(row.Depth, Height(c.lines)-c.lines[0].Height)
		}
		set = append(set, c)
		x += widths[i] + gap
	}
	row.draw = func(cv draw.Canvas, x, y draw.Pt) {
		for _, c := range set {
			if len(c.lines) > 0 {
				Draw(cv, x+c.x, y-c.lines[0].Height, c.lines)
			}
		}
	}
	return row
}

// widths are the natural widths of the columns; where they are too wide together, the widest give way.
func (t *table) widths(all [][]Paragraph, width, gap, size draw.Pt) []draw.Pt {
	out := make([]draw.Pt, len(t.align))
	for _, cells := range all {
		for i, p := range cells {
			if i < len(out) {
				out[i] = max(out[i], p.Width(size)+0.01)
			}
		}
	}
	room := width - gap*draw.Pt(max(len(out)-1, 0))
	for range out {
		total, wide, n := draw.Pt(0), draw.Pt(0), 0
		for _, w := range out {
			total += w
		}
		if total <= room {
			break
		}
		// Columns beyond an even share are cut to what the others leave.
		share := room / draw.Pt(len(out))
		for _, w := range out {
			if w > share {
				wide += w
				n++
			}
		}
		left := room - (total - wide)
		for i, w := range out {
			if w > share {
				out[i] = left * w / wide
			}
		}
	}
	return out
}
