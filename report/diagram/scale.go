package diagram

import (
	"math"
	"strconv"

	"soffit/report/draw"
)

// ratios are the scales 1:n in which drawings are made.
var ratios = []int{2, 5, 10, 15, 20, 25, 30, 40, 50, 60, 75, 80, 100, 125, 150, 175, 200, 250, 300, 350, 400, 500,
	600, 750, 1000, 1500, 2000, 2500, 5000}

// scale is a drawing scale 1:n of lengths in mm.
type scale int

// per is paper length per mm.
func (s scale) per() draw.Pt { return draw.Mm / draw.Pt(s) }

// of is the paper length of v mm.
func (s scale) of(v float64) draw.Pt { return draw.Pt(v) * s.per() }

func (s scale) String() string { return "1:" + strconv.Itoa(int(s)) }

// fit is the largest scale at which v mm are no longer than room.
func fit(v float64, room draw.Pt) scale {
	for _, r := range ratios {
		if scale(r).of(v) <= room {
			return scale(r)
		}
	}
	return scale(ratios[len(ratios)-1])
}

// smaller is the next scale after s, false at the end of the list.
func (s scale) smaller() (scale, bool) {
	for _, r := range ratios {
		if scale(r) > s {
			return scale(r), true
		}
	}
	return s, false
}

// step is the distance between graduations of an axis over a length of span that has room for count of
// them: 1, 2, 2.5 or 5 times a power of ten.
func step(span float64, count int) float64 {
	if !(span > 0) {
		return 1
	}
	raw := span / float64(max(count, 1))
	p := math.Pow(10, math.Floor(math.Log10(raw)))
	for _, m := range []float64{1, 2, 2.5, 5} {
		if m*p >= raw*(1-1e-9) {
			return m * p
		}
	}
	return 10 * p
}

// decimals of a graduation.
func decimals(step float64) int {
	for d := 0; d < 9; d++ {
		if v := step * math.Pow(10, float64(d)); math.Abs(v-math.Round(v)) < 1e-6*v {
			return d
		}
	}
	return 9
}
