package diagram

import (
	"cmp"
	"slices"

	"soffit/report/draw"
)

// spread moves places along a line apart: neighbours i and i+1 in the order of at end at least
// (size[i]+size[i+1])/2 from each other, and the sum of the squared moves is least. Equal places keep their
// order. Lower and upper bound the ends of the first and last; where there is no room, upper gives way.
func spread(at, size []draw.Pt, lower, upper draw.Pt) []draw.Pt {
	n := len(at)
	order := make([]int, n)
	for i := range order {
		order[i] = i
	}
	slices.SortStableFunc(order, func(a, b int) int { return cmp.Compare(at[a], at[b]) })

	// With the distances taken off, the places need only rise: blocks of equal value, pooled.
	type block struct {
		sum   draw.Pt
		count int
	}
	var blocks []block
	offset := make([]draw.Pt, n)
	for k, i := range order {
		if k > 0 {
			offset[k] = offset[k-1] + (size[order[k-1]]+size[i])/2
		}
		blocks = append(blocks, block{at[i] - offset[k], 1})
		for len(blocks) > 1 {
			a, b := blocks[len(blocks)-2], blocks[len(blocks)-1]
			if a.sum/draw.Pt(a.count) <= b.sum/draw.Pt(b.count) {
				break
			}
			blocks = append(blocks[:len(blocks)-2], block{a.sum + b.sum, a.count + b.count})
		}
	}
	out := make([]draw.Pt, n)
	if n == 0 {
		return out
	}
	lo := lower + size[order[0]]/2
	hi := upper - size[order[n-1]]/2 - offset[n-1]
	k := 0
	for _, b := range blocks {
		v := max(min(b.sum/draw.Pt(b.count), hi), lo)
		for range b.count {
			out[order[k]] = v + offset[k]
			k++
		}
	}
	return out
}
