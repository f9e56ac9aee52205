package section

import "math"

// Half says how much of a circle a Curve is.
type Half int

const (
	Whole Half = iota
	Lower      // the half under the centre
	Upper      // the half above it
)

// Curve is a round part of a shape: so many equal circles, or halves of circles, with their centres at one
// level. A void is taken out of the strips; round concrete is added to them.
type Curve struct {
	Radius float64 // mm
	Level  float64 // mm, of the centre
	Half   Half
	Count  int
	Solid  bool // concrete; else void
}

// Foot is the lowest level of the curve, mm.
func (c Curve) Foot() float64 {
	if c.Half == Upper {
		return c.Level
	}
	return c.Level - c.Radius
}

// Top is the highest level of the curve, mm.
func (c Curve) Top() float64 {
	if c.Half == Lower {
		return c.Level
	}
	return c.Level + c.Radius
}

// times is the number of circles with the sign of what they add to the concrete.
func (c Curve) times() float64 {
	if c.Solid {
		return float64(c.Count)
	}
	return -float64(c.Count)
}

// WidthAt is what the curve adds to the width of the section at level y, mm: negative for voids, 0 above and
// below it.
func (c Curve) WidthAt(y float64) float64 {
	t := y - c.Level
	if c.Half == Lower && t > 0 || c.Half == Upper && t < 0 || !(math.Abs(t) < c.Radius) {
		return 0
	}
	return c.times() * 2 * math.Sqrt((c.Radius-t)*(c.Radius+t))
}

// Below is what the curve adds under level y to the area, mm², and to the first moment about level 0, mm³:
// both negative for voids.
func (c Curve) Below(y float64) (area, moment float64) {
	switch {
	case !(y > c.Foot()):
		return 0, 0
	case y >= c.Top():
		return c.whole()
	}
	var first float64 // about the centre
	if c.Half == Upper {
		area, first = c.fromCentre(y - c.Level)
	} else {
		area, first = c.fromTip(y - (c.Level - c.Radius))
	}
	return c.times() * area, c.times() * (area*c.Level + first)
}

// whole is Below's for the whole curve.
func (c Curve) whole() (area, moment float64) {
	r := c.Radius
	n := c.times()
	switch c.Half {
	case Lower:
		return n * math.Pi * r * r / 2, n * r * r * (math.Pi/2*c.Level - 2*r/3)
	case Upper:
		return n * math.Pi * r * r / 2, n * r * r * (math.Pi/2*c.Level + 2*r/3)
	}
	return n * math.Pi * r * r, n * math.Pi * r * r * c.Level
}

// fromTip gives area and first moment about the centre of the segment of the circle up to s above its lowest
// point: r²·(2θ − sin 2θ)/2 and −2/3·(r·sin θ)³, cos θ = 1 − s/r.
func (c Curve) fromTip(s float64) (area, first float64) {
	r := c.Radius
	half := math.Sqrt(s * (2*r - s)) // r·sin θ
	u := 4 * math.Asin(math.Sqrt(math.Min(1, s/(2*r))))
	rest := u - math.Sin(u)
	if u < 0.5 { // the series of u − sin u, where the difference would lose its digits
		v := u * u
		rest = u * v / 6 * (1 - v/20*(1-v/42*(1-v/72*(1-v/110))))
	}
	return r * r * rest / 2, -2 * half * half * half / 3
}

// fromCentre gives area and first moment about the centre of the part of the circle between its centre and t
// above it.
func (c Curve) fromCentre(t float64) (area, first float64) {
	r := c.Radius
	u := t / r
	return t*math.Sqrt((r-t)*(r+t)) + r*r*math.Asin(u), -2 * r * r * r / 3 * math.Expm1(1.5*math.Log1p(-u*u))
}

// inertia is what the curve adds to the second moment of area about a level.
func (c Curve) inertia(level float64) float64 {
	area, moment := c.whole()
	own := area * c.Radius * c.Radius / 4 // about the centre
	e := c.Level - level
	return own + e*(2*(moment-area*c.Level)+area*e)
}

// flipped is the curve in a section of the given height turned upside down.
func (c Curve) flipped(height float64) Curve {
	c.Level = height - c.Level
	switch c.Half {
	case Lower:
		c.Half = Upper
	case Upper:
		c.Half = Lower
	}
	return c
}
