package diagram

import "soffit/report/draw"

// parts is a section as trapezoids from the soffit up: lengths in mm.
type parts struct {
	height, lower, upper column
}

func (d *data) parts() parts {
	p := parts{height: d.rows("height")}
	p.lower, p.upper = d.beside("lower", p.height), d.beside("upper", p.height)
	for i := range p.height.cells {
		for _, c := range []column{p.height, p.lower, p.upper} {
			if d.err == nil && !(c.cells[i].taken() && c.cells[i].value > 0) {
				d.fail("part %s of the section has no height or width", p.height.axis.Rows[i])
			}
		}
	}
	return p
}

// levels are the heights of the boundaries of the parts above the soffit, from 0.
func (p parts) levels() []float64 {
	out := make([]float64, 1, p.height.len()+1)
	for _, h := range p.height.cells {
		out = append(out, out[len(out)-1]+h.value)
	}
	return out
}

// depth is the whole height.
func (p parts) depth() float64 {
	y := p.levels()
	return y[len(y)-1]
}

// widest is the greatest width.
func (p parts) widest() float64 {
	var w float64
	for i := range p.lower.cells {
		w = max(w, p.lower.cells[i].value, p.upper.cells[i].value)
	}
	return w
}

// width is the width at a height y above the soffit.
func (p parts) width(y float64) float64 {
	at := p.levels()
	for i := range p.height.cells {
		if y <= at[i+1] || i == p.height.len()-1 {
			t := min(max((y-at[i])/p.height.cells[i].value, 0), 1)
			return p.lower.cells[i].value + t*(p.upper.cells[i].value-p.lower.cells[i].value)
		}
	}
	return 0
}

// frame maps lengths of a section in mm to paper: x to the right from the axis of symmetry, y up from the
// soffit. Sx and Sy differ where widths and depths are not drawn to one scale.
type frame struct {
	x, y   draw.Pt // of the soffit in the axis of symmetry
	sx, sy draw.Pt
}

func (f frame) at(x, y float64) draw.Point {
	return draw.Point{X: f.x + draw.Pt(x)*f.sx, Y: f.y - draw.Pt(y)*f.sy}
}

// outline is the part of the section between two heights, as a polygon on paper.
func (p parts) outline(f frame, from, to float64) []draw.Point {
	var right, left []draw.Point
	add := func(w, y float64) {
		right = append(right, f.at(w/2, y))
		left = append(left, f.at(-w/2, y))
	}
	at := p.levels()
	for i := range p.height.cells {
		y0, y1 := max(at[i], from), min(at[i+1], to)
		if y0 >= y1 {
			continue
		}
		w0, w1 := p.lower.cells[i].value, p.upper.cells[i].value
		h := p.height.cells[i].value
		add(w0+(w1-w0)*(y0-at[i])/h, y0)
		add(w0+(w1-w0)*(y1-at[i])/h, y1)
	}
	for i := len(left) - 1; i >= 0; i-- {
		right = append(right, left[i])
	}
	return right
}
