package diagram

import (
	"cmp"
	"slices"
)

// between is the part of a ring between two heights: several rings where they cut it into several.
func (r ring) between(from, to float64) []ring {
	var out []ring
	for _, k := range r.above(from) {
		for _, u := range k.turned().above(-to) {
			out = append(out, u.turned())
		}
	}
	return out
}

// turned is the ring upside down.
func (r ring) turned() ring {
	out := make(ring, len(r))
	for i, p := range r {
		out[len(r)-1-i] = point{p.x, -p.y}
	}
	return out
}

// above is the part of a ring over a level. The pieces of the line that lie over it are joined along the level, each
// from where it comes down to where the next to the right goes up: between these lies the area.
func (r ring) above(level float64) []ring {
	start := -1
	over := 0
	for i, p := range r {
		if p.y > level {
			over++
			if r[(i+len(r)-1)%len(r)].y <= level {
				start = i
			}
		}
	}
	switch {
	case over == 0:
		return nil
	case start < 0:
		return []ring{r}
	}
	cut := func(a, b point) point { return point{a.x + (b.x-a.x)*(level-a.y)/(b.y-a.y), level} }
	var pieces []ring
	for i := range r {
		p, before := r[(start+i)%len(r)], r[(start+i+len(r)-1)%len(r)]
		switch {
		case p.y > level && before.y <= level:
			pieces = append(pieces, ring{cut(before, p), p})
		case p.y > level:
			pieces[len(pieces)-1] = append(pieces[len(pieces)-1], p)
		case before.y > level:
			pieces[len(pieces)-1] = append(pieces[len(pieces)-1], cut(before, p))
		}
	}
	type end struct {
		x     float64
		piece int
		first bool
	}
	var ends []end
	for i, k := range pieces {
		ends = append(ends, end{k[0].x, i, true}, end{k[len(k)-1].x, i, false})
	}
	slices.SortStableFunc(ends, func(a, b end) int { return cmp.Compare(a.x, b.x) })
	next := make([]int, len(pieces))
	for i := 0; i < len(ends); i += 2 {
		a, b := ends[i], ends[i+1]
		if a.first == b.first { // lines that touch: one area with a seam
			return []ring{slices.Concat(pieces...)}
		}
		if a.first {
			a, b = b, a
		}
		next[a.piece] = b.piece
	}
	var out []ring
	done := make([]bool, len(pieces))
	for i := range pieces {
		var k ring
		for j := i; !done[j]; j = next[j] {
			done[j] = true
			k = append(k, pieces[j]...)
		}
		if k != nil {
			out = append(out, k)
		}
	}
	return out
}
