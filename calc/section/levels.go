package section

import "math"

// same is the part of a width below which a difference is taken for rounding.
const same = 1e-9

// Jumps lists the levels within the section at which its width jumps, net of holes and voids, mm above the
// soffit from below up: ledges, undersides of flanges, floors and roofs of holes.
func (s Shape) Jumps() []float64 {
	var out []float64
	for i := 1; i < len(s.strips); i++ {
		y := s.levels[i]
		under, over := s.width(i-1, y, false), s.width(i, y, true)
		if math.Abs(over-under) > same*math.Max(under, over) {
			out = append(out, y)
		}
	}
	return out
}

// WidthsAt is the width at height y above the soffit just under and just above it, mm, net of holes and
// voids. They differ where the width jumps, and are 0 outside the section.
func (s Shape) WidthsAt(y float64) (under, above float64) {
	for i := range s.strips {
		if s.levels[i] < y && y <= s.levels[i+1] {
			under = s.width(i, y, false)
		}
		if s.levels[i] <= y && y < s.levels[i+1] {
			above = s.width(i, y, true)
		}
	}
	return under, above
}

// soffitZone is the part of the depth at the far edge in which a smaller width makes no web: a chamfer.
const soffitZone = 0.1

// TopFlange is the depth of a flange at the top, mm: as far as the width, net of holes and voids, does not
// fall from the top down, if it is wider there throughout than the narrowest web below; 0 where there is
// none. Haunches below are not in it. What is narrow in the last tenth of the depth is a chamfer, no web.
func (s Shape) TopFlange() float64 {
	end := 0.0 // level down to which the width does not fall
	for i := len(s.strips) - 1; i >= 0; i-- {
		t := s.strips[i]
		if t.Top-t.Bottom > same*t.Top { // narrows downward
			end = s.levels[i+1]
			break
		}
		if i > 0 && s.width(i-1, s.levels[i], false) < s.width(i, s.levels[i], true)*(1-same) {
			end = s.levels[i]
			break
		}
	}
	for _, c := range s.curves {
		if !c.Solid && c.Half != Lower {
			end = math.Max(end, c.Top())
		}
	}
	web := s.LeastWidth(soffitZone*s.height, end)
	if end >= s.height || end <= soffitZone*s.height || !(web < s.LeastWidth(end, s.height)*(1-same)) {
		return 0
	}
	return s.height - end
}
