package diagram

import (
	"cmp"
	"math"
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

// apartOf moves figures at heights, which rise, apart and off the lines at the heights avoid, none over top: in their
// order, the sum of the squared moves least, on a grid of half a point.
func apartOf(at, avoid []draw.Pt, top draw.Pt) []draw.Pt {
	const off, grid, far = size/2 - 0.3, 0.5, 60 // of figures from a line
	if len(at) == 0 {
		return nil
	}
	low := at[0] - far
	n := int((at[len(at)-1]-low+far)/grid) + 1
	y := func(k int) draw.Pt { return low + grid*draw.Pt(k) }
	barred := make([]bool, n)
	for k := range barred {
		barred[k] = y(k) < top+1
		for _, v := range avoid {
			barred[k] = barred[k] || max(y(k)-v, v-y(k)) < off
		}
	}
	const gap = 15                     // steps between figures
	best := make([][]float64, len(at)) // least sum up to a figure that stands at k or before
	from := make([][]int, len(at))     // where it stands then
	for i, v := range at {
		best[i], from[i] = make([]float64, n), make([]int, n)
		for k := range n {
			cost := math.Inf(1)
			if !barred[k] {
				cost = float64((y(k) - v) * (y(k) - v))
				if i > 0 {
					cost += pick(k >= gap, best[i-1][max(k-gap, 0)], math.Inf(1))
				}
			}
			best[i][k], from[i][k] = cost, k
			if k > 0 && best[i][k-1] <= cost {
				best[i][k], from[i][k] = best[i][k-1], from[i][k-1]
			}
		}
	}
	out := make([]draw.Pt, len(at))
	if math.IsInf(best[len(at)-1][n-1], 1) { // no room: as they come
		copy(out, at)
		return out
	}
	for i, k := len(at)-1, n-1; i >= 0; i-- {
		k = from[i][k]
		if out[i] = y(k); max(out[i]-at[i], at[i]-out[i]) <= grid {
			out[i] = pick(slices.Contains(barred[max(k-1, 0):min(k+2, n)], true), out[i], at[i])
		}
		k -= gap
	}
	return out
}
