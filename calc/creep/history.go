package creep

import (
	"fmt"
	"math"
)

// Interval is a time at one temperature, from one age to another.
type Interval struct {
	From, To    float64 // days
	Temperature float64 // °C
}

// History is the temperature of a concrete from casting on. Beyond its last interval the concrete is at 20 °C and ages as
// by the calendar.
type History []Interval

func (h History) check() error {
	end := 0.0
	for i, v := range h {
		switch {
		case v.From != end || !(v.To > v.From):
			return fmt.Errorf("interval %d of the temperature history runs from %g to %g d after one that ends at %g d", i+1, v.From, v.To, end)
		case !(v.Temperature >= 0 && v.Temperature <= 80):
			return fmt.Errorf("interval %d of the temperature history is at %g °C, outside 0 to 80 °C", i+1, v.Temperature)
		}
		end = v.To
	}
	return nil
}

// Equivalent is the age at 20 °C that age t comes to, B.10.
func (h History) Equivalent(t float64) float64 {
	sum, end := 0.0, 0.0
	for _, v := range h {
		if t <= v.From {
			return sum
		}
		sum += math.Exp(13.65-4000/(273+v.Temperature)) * (math.Min(t, v.To) - v.From)
		end = v.To
	}
	return sum + math.Max(0, t-end)
}

// Greatest is the greatest temperature, 20 °C at least.
func (h History) Greatest() float64 {
	top := 20.0
	for _, v := range h {
		top = math.Max(top, v.Temperature)
	}
	return top
}

// RelaxationHours is t_eq, what the history up to age t adds to the time after tensioning, in hours, 10.2. 0 where nothing
// is warmer than 20 °C.
func (h History) RelaxationHours(t float64) float64 {
	top := h.Greatest() - 20
	if top <= 0 {
		return 0
	}
	sum := 0.0
	for _, v := range h {
		sum += math.Max(0, v.Temperature-20) * math.Max(0, math.Min(t, v.To)-v.From) * 24
	}
	return math.Pow(1.14, top) / top * sum
}
