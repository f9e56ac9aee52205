package section

import (
	"math"
	"testing"

	"gonum.org/v1/gonum/integrate/quad"
	"pgregory.net/rapid"
)

// The circle and its segments in closed form; from any table of plane figures, own derivation.
func TestCircleInClosedForm(t *testing.T) {
	const r = 100.0
	o := set(t, RoundBeam{Diameter: 2 * r})
	near(t, "A", o.Area(), math.Pi*r*r, 1e-10)
	near(t, "y", o.Centroid(), r, 1e-12)
	near(t, "I", o.Inertia(), math.Pi/4*r*r*r*r, 1e-6)
	near(t, "lateral I", o.LateralInertia(), math.Pi/4*r*r*r*r, 1e-6)
	near(t, "u", o.Perimeter(), 2*math.Pi*r, 1e-12)
	near(t, "S at the centroid", o.StaticMoment(r), 2*r*r*r/3, 1e-8)
	near(t, "W", o.TopModulus(), math.Pi/4*r*r*r, 1e-7)
	for _, degrees := range []float64{0.1, 1, 14, 15, 30, 60, 90, 120, 179, 180} {
		a := degrees * math.Pi / 180 // half the angle of the segment
		y := r * (1 - math.Cos(a))
		area, moment := o.Below(y)
		want := r * r * (a - math.Sin(2*a)/2)
		near(t, "area of a segment", area, want, 1e-9*want+1e-12)
		sin := r * math.Sin(a)
		near(t, "moment of a segment", moment, want*r-2*sin*sin*sin/3, 2e-9*want*r)
		near(t, "chord", o.WidthAt(y), 2*sin, 1e-6*r)
	}
	// A small segment is nearly a parabola: 2/3 of chord times rise.
	for _, s := range []float64{1e-3, 1e-6, 1e-9, 1e-12} {
		area, _ := o.Below(s)
		want := 2.0 / 3 * s * 2 * math.Sqrt(s*(2*r-s)) * (1 + s/(10*r))
		near(t, "small segment", area/want, 1, 1e-9)
	}

	ring := set(t, RoundBeam{Diameter: 600, Bore: 400})
	near(t, "A of the ring", ring.Area(), math.Pi*(300*300-200*200), 1e-9)
	near(t, "I of the ring", ring.Inertia(), math.Pi/4*(math.Pow(300, 4)-math.Pow(200, 4)), 1e-4)
	near(t, "S of the ring", ring.StaticMoment(300), 2.0/3*(27e6-8e6), 1e-6)
	near(t, "b of the ring", ring.WidthAt(300), 200, 1e-12)
	near(t, "least b of the ring", ring.LeastWidth(200, 400), 200, 1e-9)
	near(t, "u inside", ring.InsidePerimeter(), 400*math.Pi, 1e-9)
}

// Any curve, of either half, void or concrete: what it has below a level, against a quadrature of its width.
func TestCurveAgainstQuadrature(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		c := Curve{
			Radius: math.Pow(10, rapid.Float64Range(-1, 3).Draw(t, "log r")),
			Half:   rapid.SampledFrom([]Half{Whole, Lower, Upper}).Draw(t, "half"),
			Count:  rapid.IntRange(1, 9).Draw(t, "count"), Solid: rapid.Bool().Draw(t, "solid"),
		}
		c.Level = c.Radius * rapid.Float64Range(1, 5).Draw(t, "level/r")
		y := c.Foot() + (c.Top()-c.Foot())*rapid.Float64Range(-0.1, 1.1).Draw(t, "y")
		area, moment := c.Below(y)
		// z = middle − half·cos φ takes the roots at the tips away.
		lo, hi := c.Foot(), math.Max(c.Foot(), math.Min(y, c.Top()))
		integral := func(f func(z float64) float64) float64 {
			return quad.Fixed(func(phi float64) float64 {
				z := (lo+hi)/2 - (hi-lo)/2*math.Cos(phi)
				return f(z) * (hi - lo) / 2 * math.Sin(phi)
			}, 0, math.Pi, 60, quad.Legendre{}, 0)
		}
		size := float64(c.Count) * c.Radius * c.Radius
		if want := integral(c.WidthAt); math.Abs(area-want) > 1e-10*size {
			t.Errorf("area below %g: %g, want %g", y, area, want)
		}
		if want := integral(func(z float64) float64 { return z * c.WidthAt(z) }); math.Abs(moment-want) > 1e-10*size*c.Level {
			t.Errorf("moment below %g: %g, want %g", y, moment, want)
		}
		lo, hi = c.Foot(), c.Top()
		level := c.Level * rapid.Float64Range(-1, 2).Draw(t, "about")
		want := integral(func(z float64) float64 { return (z - level) * (z - level) * c.WidthAt(z) })
		relative(t, "I", c.inertia(level), want, 1e-9)

		f := c.flipped(7 * c.Radius)
		for _, y := range []float64{c.Foot(), c.Top(), y} {
			if math.Abs(y-c.Level) < 1e-9*c.Radius {
				continue // which half it is, rounding tells
			}
			if d := f.WidthAt(7*c.Radius-y) - c.WidthAt(y); math.Abs(d) > 1e-5*size/c.Radius {
				t.Errorf("flipped: width off by %g", d)
			}
		}
		if f.Foot() != 7*c.Radius-c.Top() && math.Abs(f.Foot()-7*c.Radius+c.Top()) > 1e-12*c.Radius {
			t.Errorf("flipped: from %g to %g", f.Foot(), f.Top())
		}
	})
}

// A void of a level oblong is a circle and a band of its length: the same as drawn with its parts apart.
func TestOblongInParts(t *testing.T) {
	hole := func(h Ring) Contour {
		return Contour{Outer: []Ring{{{0, 0}, {1000, 0}, {1000, 600}, {0, 600}}}, Holes: []Ring{h}}
	}
	for name, v := range map[string]Round{"level": {500, 300, 400, 200}, "upright": {500, 300, 200, 400}} {
		o := set(t, Contour{Outer: hole(nil).Outer, Voids: []Round{v}})
		// The void as a polygon of 4000 corners.
		var ring Ring
		core := v.core()
		for k := range 4000 {
			a := 2 * math.Pi * (float64(k) + 0.5) / 4000
			c := core.b
			if name == "upright" && math.Sin(a) < 0 || name == "level" && math.Cos(a) < 0 {
				c = core.a
			}
			ring = append(ring, Point{c.X + v.radius()*math.Cos(a), c.Y + v.radius()*math.Sin(a)})
		}
		p := set(t, hole(ring))
		near(t, name+" A", o.Area()/p.Area(), 1, 1e-6)
		near(t, name+" I", o.Inertia()/p.Inertia(), 1, 1e-6)
		near(t, name+" lateral I", o.LateralInertia()/p.LateralInertia(), 1, 1e-6)
		near(t, name+" u", o.InsidePerimeter()/p.InsidePerimeter(), 1, 1e-6)
		for y := 5.0; y < 600; y += 7 {
			near(t, name+" b", o.WidthAt(y), p.WidthAt(y), 0.02)
			near(t, name+" S", o.StaticMoment(y)/o.StaticMoment(300), p.StaticMoment(y)/p.StaticMoment(300), 1e-6)
		}
		for _, x := range []float64{100, 290, 310, 400, 500, 650, 705} {
			for y := 50.0; y < 600; y += 37 {
				near(t, name+" clearance", o.Clearance(x, y), p.Clearance(x, y), 1e-3)
			}
		}
	}
}
