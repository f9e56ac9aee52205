package losses

import (
	"math"
	"slices"
)

// Timeline is the times at which sections are looked at. It serves any number of sections, from many goroutines.
type Timeline struct{ times []float64 }

// NewTimeline takes times in days that rise. An error is a *Refusal: BadTimes.
func NewTimeline(times ...float64) (*Timeline, error) {
	if len(times) == 0 {
		return nil, &Refusal{Reason: BadTimes}
	}
	for i, t := range times {
		if !finite(t) || i > 0 && !(t > times[i-1]) {
			return nil, &Refusal{Reason: BadTimes, Index: i, Have: t}
		}
	}
	return &Timeline{slices.Clone(times)}, nil
}

// Times are the times, days.
func (l *Timeline) Times() []float64 { return slices.Clone(l.times) }

// Graded gives times for a time line: the events, in days and rising, and n steps from each to the next, short at first and
// longer later: of equal length on the scale of ln(1 + τ/first), τ the days since the event. Twice as many steps halve every
// one on that scale and keep the times of before.
//
// first is above 0 and n 1 or more; Graded panics otherwise.
func Graded(events []float64, first float64, n int) []float64 {
	if !(first > 0) || n < 1 {
		panic("losses.Graded: first ≤ 0 or n < 1")
	}
	var out []float64
	for i, t := range events {
		if i > 0 {
			before := events[i-1]
			whole := math.Log1p((t - before) / first)
			for k := 1; k < n; k++ {
				out = append(out, before+first*math.Expm1(whole*float64(k)/float64(n)))
			}
		}
		out = append(out, t)
	}
	return out
}

// Ageing is a law of concrete at the times of a time line, from the time on from which it bears. It serves any number of
// concretes and sections.
type Ageing struct {
	line       *Timeline
	from       int
	compliance [][]float64 // at time from + i of a stress since time from + j, j ≤ i
	shrinkage  []float64
}

// Ageing tables a law from a time on, one of those of the time line: n times need n²/2 compliances. An error is a
// *Refusal: OffTime, BadLaw.
func (l *Timeline) Ageing(law Law, from float64) (*Ageing, error) {
	start, ok := slices.BinarySearch(l.times, from)
	if !ok {
		return nil, &Refusal{Reason: OffTime, Have: from}
	}
	times := l.times[start:]
	n := len(times)
	a := &Ageing{line: l, from: start, compliance: make([][]float64, n), shrinkage: make([]float64, n)}
	all := make([]float64, n*(n+1)/2)
	for i, t := range times {
		a.shrinkage[i] = law.Shrinkage(t)
		if !finite(a.shrinkage[i]) {
			return nil, &Refusal{Reason: BadLaw, Index: start + i, Have: a.shrinkage[i]}
		}
		a.compliance[i], all = all[:i+1:i+1], all[i+1:]
		for j := range a.compliance[i] {
			v := law.Compliance(t, times[j])
			if !(v > 0) || !finite(v) {
				return nil, &Refusal{Reason: BadLaw, Index: start + i, Have: v}
			}
			a.compliance[i][j] = v
		}
	}
	return a, nil
}
