package fonts

import (
	"math"

	"golang.org/x/image/font/sfnt"
	"golang.org/x/image/math/fixed"
)

// Band is the height of one band of a Profile in em.
const Band = 1.0 / 32

const (
	bandLow = -16 // lowest band of a profile, −0.5 em
	bands   = 56  // up to 1.25 em
)

// Profile is the horizontal extent of a glyph's ink in bands of its height, for telling whether two
// glyphs truly touch where their bounding boxes overlap.
type Profile struct {
	left, right [bands]float64
}

// At gives the extent of the ink between the heights y0 and y1, and whether there is any.
func (p *Profile) At(y0, y1 float64) (left, right float64, ink bool) {
	left, right = math.Inf(1), math.Inf(-1)
	i0 := max(int(math.Floor(y0/Band))-bandLow, 0)
	i1 := min(int(math.Ceil(y1/Band))-bandLow, bands)
	for i := i0; i < i1; i++ {
		left, right = min(left, p.left[i]), max(right, p.right[i])
	}
	return left, right, right >= left
}

// ProfileOf is the profile of a rune's glyph; it has no ink where the face lacks the rune.
func ProfileOf(f Face, r rune) *Profile {
	g := Of(f, r)
	if p := g.profile.Load(); p != nil {
		return p
	}
	p := new(Profile)
	for i := range p.left {
		p.left[i], p.right[i] = math.Inf(1), math.Inf(-1)
	}
	if !g.Has {
		return p
	}
	d := load(f)
	d.mu.Lock()
	defer d.mu.Unlock()
	segs, err := d.font.LoadGlyph(&d.buf, g.index, fixed.I(int(d.upem)), nil)
	if err == nil {
		p.trace(segs, d.upem*64)
	}
	g.profile.Store(p)
	return p
}

func (p *Profile) trace(segs sfnt.Segments, scale float64) {
	var x, y float64
	at := func(q fixed.Point26_6) (float64, float64) { return float64(q.X) / scale, -float64(q.Y) / scale }
	var sx, sy float64
	for _, s := range segs {
		switch s.Op {
		case sfnt.SegmentOpMoveTo:
			x, y = at(s.Args[0])
			sx, sy = x, y
		case sfnt.SegmentOpLineTo:
			nx, ny := at(s.Args[0])
			p.stroke(x, y, nx, ny)
			x, y = nx, ny
		case sfnt.SegmentOpQuadTo:
			cx, cy := at(s.Args[0])
			ex, ey := at(s.Args[1])
			px, py := x, y
			const n = 8
			for i := 1; i <= n; i++ {
				t := float64(i) / n
				u := 1 - t
				nx, ny := u*u*x+2*u*t*cx+t*t*ex, u*u*y+2*u*t*cy+t*t*ey
				p.stroke(px, py, nx, ny)
				px, py = nx, ny
			}
			x, y = ex, ey
		}
	}
	p.stroke(x, y, sx, sy)
}

// stroke widens the bands that a piece of the outline passes.
func (p *Profile) stroke(x0, y0, x1, y1 float64) {
	if y0 > y1 {
		x0, y0, x1, y1 = x1, y1, x0, y0
	}
	i0 := int(math.Floor(y0 / Band))
	i1 := int(math.Floor(y1 / Band))
	for i := i0; i <= i1; i++ {
		k := i - bandLow
		if k < 0 || k >= bands {
			continue
		}
		lo, hi := max(y0, float64(i)*Band), min(y1, float64(i+1)*Band)
		a, b := x0, x1
		if y1 > y0 {
			a = x0 + (x1-x0)*(lo-y0)/(y1-y0)
			b = x0 + (x1-x0)*(hi-y0)/(y1-y0)
		}
		p.left[k] = min(p.left[k], a, b)
		p.right[k] = max(p.right[k], a, b)
	}
}
