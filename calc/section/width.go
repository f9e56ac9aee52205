package section

import "math"

// WidthAt is the width at height y above the soffit, mm, net of holes and voids. At a ledge it is the
// smaller of the two widths that meet there. Outside the section, y < 0 or y > Height, it is 0.
func (s Shape) WidthAt(y float64) float64 {
	if !(y >= 0 && y <= s.height) {
		return 0
	}
	width := math.Inf(1)
	for i := range s.strips {
		switch {
		case s.levels[i] < y && y < s.levels[i+1]:
			return s.width(i, y, true)
		case s.levels[i] == y:
			width = math.Min(width, s.width(i, y, true))
		case s.levels[i+1] == y:
			width = math.Min(width, s.width(i, y, false))
		}
	}
	return width
}

// width is the width at height y of the strip i: just above y, or just under it.
func (s Shape) width(i int, y float64, above bool) float64 {
	w := s.strips[i].widthAt(y - s.levels[i])
	for _, c := range s.curves {
		if above && y == c.Top() || !above && y == c.Foot() {
			continue
		}
		w += c.WidthAt(y)
	}
	return w
}

// LeastWidth is the smallest width between the heights from and to, mm: the b_w of a web, net of holes and
// voids. At the ends themselves a ledge does not count: the range is open. It is 0 where the range lies
// outside the section.
func (s Shape) LeastWidth(from, to float64) float64 {
	width := math.Inf(1)
	for i := range s.strips {
		lo, hi := math.Max(from, s.levels[i]), math.Min(to, s.levels[i+1])
		if lo < hi {
			width = math.Min(width, s.narrowest(i, lo, hi))
		}
	}
	if math.IsInf(width, 1) || from < 0 || to > s.height {
		return 0
	}
	return width
}

// narrowest is the smallest width of the strip i between lo and hi.
func (s Shape) narrowest(i int, lo, hi float64) float64 {
	cuts := []float64{lo, hi} // where a round part begins or ends
	for _, c := range s.curves {
		for _, y := range [2]float64{c.Foot(), c.Top()} {
			if lo < y && y < hi {
				cuts = append(cuts, y)
			}
		}
	}
	cuts = sorted(cuts)
	least := math.Inf(1)
	for k := 1; k < len(cuts); k++ {
		a, b := cuts[k-1], cuts[k]
		least = math.Min(least, math.Min(s.width(i, a, true), s.width(i, b, false)))
		if s.hollow(a, b) {
			least = math.Min(least, lowest(func(y float64) float64 { return s.width(i, y, true) }, a, b))
		}
	}
	return least
}

// hollow reports a round void between two heights: the width may be least between them.
func (s Shape) hollow(a, b float64) bool {
	for _, c := range s.curves {
		if !c.Solid && c.Foot() < b && a < c.Top() {
			return true
		}
	}
	return false
}

// lowest finds the least value of f between a and b. With voids alone f sags and has one; for shapes with
// round concrete too it looks in eight parts.
func lowest(f func(float64) float64, a, b float64) float64 {
	const parts = 8
	const golden = 0.61803398874989484820
	least := math.Inf(1)
	for k := range parts {
		l, r := a+(b-a)*float64(k)/parts, a+(b-a)*float64(k+1)/parts
		p, q := r-golden*(r-l), l+golden*(r-l)
		fp, fq := f(p), f(q)
		for range 40 {
			if fp < fq {
				r, q, fq = q, p, fp
				p = r - golden*(r-l)
				fp = f(p)
			} else {
				l, p, fp = p, q, fq
				q = l + golden*(r-l)
				fq = f(q)
			}
		}
		least = math.Min(least, math.Min(fp, fq))
	}
	return least
}
