package bending

import (
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"

	"soffit/calc/section"
)

// composed is a section of bodies with the figures of their outlines, for sums of their own.
type composed struct {
	bodies  []Body
	figures []figure
	limits  Limits
	height  float64
}

func (c *composed) add(o section.Outline, law Parabola) {
	c.bodies = append(c.bodies, Body{Section: NewSection(o.Shape), Offset: c.height, Law: law})
	c.figures = append(c.figures, figureOf(o))
	c.height += o.Height()
}

// ledges are the depths within each body at which its width may jump.
func (c *composed) ledges() (out [][]float64) {
	for _, f := range c.figures {
		out = append(out, f.cuts)
	}
	return out
}

// curvature is written out from the definition, apart from the kernel.
func (c *composed) curvature(x float64, flange CompressionFlange, layers []Layer) float64 {
	k := math.Inf(1)
	for i, e := range c.limits.Edges {
		if z := c.bodies[i].Offset; x > z {
			k = math.Min(k, (e.EpsCu-c.bodies[i].Strain)/(x-z))
		}
	}
	if x > c.height {
		k = math.Min(k, c.limits.Core.EpsC2/(x-(1-c.limits.Core.EpsC2/c.limits.Core.EpsCu)*c.height))
	}
	if flange.Depth > 0 && x > flange.Depth {
		k = math.Min(k, flange.Strain/(x-flange.Depth/2))
	}
	for _, l := range layers {
		if l.Depth > x && l.Area > 0 && l.Cap > 0 {
			k = math.Min(k, (l.Law.Limit()-l.Prestrain)/(l.Depth-x))
		}
	}
	return k
}

// concrete is summed by quadrature from the corners.
func (c *composed) concrete(x, k float64) (force, moment float64) {
	for i, b := range c.bodies {
		f, m := c.figures[i].strained(b.Law, k*(x-b.Offset)+b.Strain, k-b.Slope)
		force += f
		moment += m + b.Offset*f
	}
	return force, moment
}

// anyComposed draws a member of any outline alone, with a topping, or upside down with the topping below; strain
// locked into any of the bodies.
func anyComposed(t *rapid.T) (*composed, string) {
	o, kind := anyOutline(t)
	_, law := anyConcrete(t)
	if rapid.IntRange(0, 3).Draw(t, "bilinear") == 0 {
		law.N = 1
	}
	c := &composed{}
	switch rapid.SampledFrom([]string{"alone", "topping above", "topping above", "topping below"}).Draw(t, "made of") {
	case "alone":
		c.add(o, law)
	case "topping above":
		c.add(anyTopping(t, o.Height()), anyParabola(t))
		c.add(o, law)
		kind += " under a topping"
	default:
		c.add(o.Flipped(), law)
		c.add(anyTopping(t, o.Height()), anyParabola(t))
		kind += " over a topping"
	}
	for i := range c.bodies {
		if b := &c.bodies[i]; rapid.IntRange(0, 3).Draw(t, "locked in") > 0 {
			lower := rapid.Float64Range(-1e-3, 1.4e-3).Draw(t, "at the lower edge")
			b.Strain = rapid.Float64Range(-1e-3, 1.4e-3).Draw(t, "at the upper edge")
			b.Slope = (lower - b.Strain) / b.Section.Height()
		}
	}
	c.limits = LimitsOf(c.bodies)
	return c, kind
}

func anyParabola(t *rapid.T) Parabola { _, p := anyConcrete(t); return p }

func anyTopping(t *rapid.T, h float64) section.Outline {
	return set(t, section.RectangularBeam{Width: h * rapid.Float64Range(0.3, 2).Draw(t, "topping width/h"), Depth: h * rapid.Float64Range(0.03, 0.3).Draw(t, "topping depth/h")})
}

// Any bodies with any strain locked in, layers and conditions, by integration and by fibres: a root in its bracket
// whose residual, summed anew, is below 1e-6 of the force, at the limit of a strain; or a reason that is true.
// 10,000 sections.
func TestAnyCompositeBalances(t *testing.T) {
	counts := map[string]int{}
	often(t, func(t *rapid.T) {
		m, kind := anyComposed(t)
		strength, area := 0.0, 0.0
		for _, b := range m.bodies {
			a, _ := b.Section.Above(b.Section.Height())
			area += a
			strength += a * b.Law.Fcd
		}
		layers := anyLayers(t, ok[section.Shape](t)(section.Rectangle(area/m.height, m.height)))
		var c Conditions
		if rapid.Bool().Draw(t, "axial") {
			c.Axial = Axial{strength * rapid.Float64Range(-0.3, 1).Draw(t, "N/strength"), m.height * rapid.Float64Range(0, 1).Draw(t, "depth of N")}
		}
		if rapid.IntRange(0, 3).Draw(t, "flange") == 0 {
			c.Flange = CompressionFlange{m.height * rapid.Float64Range(0.05, 0.5).Draw(t, "flange/h"), m.bodies[0].Law.EpsC2 - m.bodies[0].Strain/2}
		}
		model := modelled(m.bodies, m.limits, 1.0/60, 1.0/10, m.ledges())
		summed := func(x, k float64) (force, moment float64) {
			for _, f := range model.Fibres {
				s := f.Area * model.Laws[f.Law].Stress(k*(x-f.Depth)+f.Strain)
				force, moment = force+s, moment+s*f.Depth
			}
			return force, moment
		}
		for name, k := range map[string]struct {
			solve    func() (Axis, error)
			concrete func(x, k float64) (float64, float64)
		}{
			"bodies": {func() (Axis, error) { return CompositeFibres(m.bodies, m.limits, c, layers) }, m.concrete},
			"fibres": {func() (Axis, error) { return model.Axis(c, layers) }, summed},
		} {
			curvature := func(x float64) float64 { return m.curvature(x, c.Flange, layers) }
			balance := func(x float64) float64 {
				force, _ := k.concrete(x, curvature(x))
				pull, _, _ := pulled(x, curvature(x), layers)
				return force - pull - c.Axial.Force
			}
			a, err := k.solve()
			if err != nil {
				counts[name+": "+reasonOf(err).Error()]++
				if r := err.(*Refusal); r.Reason == NoTension && math.Abs(r.Have) < 1e-9*strength && math.Abs(c.Axial.Force) < 1e-9*strength {
					continue // so little that the doubles of x do not resolve it
				}
				if reasonOf(err) == LockedIn {
					force, _ := k.concrete(1e-9*m.height, curvature(1e-9*m.height))
					if r := err.(*Refusal); balance(1e-9*m.height) < -1e-12*strength || !(r.Limit > 0) || balance(-10*m.height) < 0 && !math.IsInf(curvature(-10*m.height), 1) || math.Abs(r.Have-force) > 1e-6*force+1e-9*strength {
						t.Errorf("%s, %s: %v, but the balance at the top is %g, the concrete's force %g", kind, name, err, balance(1e-9*m.height), force)
					}
					continue
				}
				if d := c.Flange.Depth; reasonOf(err) == Unbalanced && d > 0 && balance(d)*balance(d*(1+1e-12)) < 0 {
					if 2*c.Flange.Strain >= m.bodies[0].Law.EpsCu2-m.bodies[0].Strain {
						t.Errorf("%s, %s: %v without a jump", kind, name, err)
					}
					continue // the flange's limit comes in with a jump
				}
				honest(t, kind+", "+name, err, layers, balance, m.height, 10*m.height, strength)
				continue
			}
			counts[name+": root, "+a.Pivot.String()]++
			if a.X <= 0 {
				counts[name+": above the section"]++
			}
			if !((a.X > 0 || a.Pivot == PivotSteel) && a.X <= 10*m.height*(1+1e-12) && a.Lo <= a.X && a.X <= a.Hi) {
				t.Errorf("%s: x = %g outside [%g, %g]", name, a.X, a.Lo, a.Hi)
			}
			within(t, name+" κ", a.Curvature, curvature(a.X), 1e-9)
			force, first := k.concrete(a.X, a.Curvature)
			pull, moment, size := pulled(a.X, a.Curvature, layers)
			tol := 1.1e-6*math.Max(force, math.Abs(c.Axial.Force)) + 1e-10*strength
			if !(math.Abs(force-pull-c.Axial.Force) <= tol) || !(math.Abs(a.Residual) <= 1e-6*math.Max(a.Concrete, math.Abs(c.Axial.Force))+1e-13*size) {
				t.Errorf("%s, %s: at x = %g the concrete gives %.12g, the steel %.12g, N %g; residual %g", kind, name, a.X, force, pull, c.Axial.Force, a.Residual)
			}
			near(t, name+" M", a.Moment, moment-first+c.Axial.Force*c.Axial.Depth, 2*tol*m.height)
			near(t, name+" ΣF", a.Steel, pull, 1e-9*size)
			switch a.Pivot {
			case PivotTop, PivotEdge:
				b := m.bodies[a.Edge]
				within(t, name+" strain at the edge", a.Curvature*(a.X-b.Offset)+b.Strain, b.Law.EpsCu2, 1e-9)
				if a.Layer != -1 || (a.Pivot == PivotTop) != (b.Offset == 0) {
					t.Errorf("%s: %+v", name, a)
				}
			case PivotSteel:
				l := layers[a.Layer]
				within(t, name+" strain of the steel", a.Curvature*(l.Depth-a.X)+l.Prestrain, l.Law.Limit(), 1e-9)
			default:
				if a.Layer != -1 || a.Edge != -1 {
					t.Errorf("%s: %+v", name, a)
				}
			}
		}
	})
	total, roots := 0, 0
	for name, n := range counts {
		t.Logf("%6d %s", n, name)
		if name != "bodies: above the section" && name != "fibres: above the section" {
			total += n
		}
	}
	if counts["bodies: above the section"] == 0 || counts["fibres: above the section"] == 0 {
		t.Error("no root above the section")
	}
	for _, p := range []Pivot{PivotTop, PivotSteel, PivotCore, PivotFlange, PivotEdge} {
		for _, name := range []string{"bodies", "fibres"} {
			if counts[name+": root, "+p.String()] == 0 {
				t.Errorf("%s: no root at the %v", name, p)
			}
			roots += counts[name+": root, "+p.String()]
		}
	}
	if 5*roots < 3*total {
		t.Errorf("only %d of %d searches had a root", roots, total)
	}
}

// The plane of strain may be counted from any other: strain locked into everything, steel and edges included, turns
// the plane and leaves the state.
func TestLockedInPlaneIsAFrame(t *testing.T) {
	tried, compared := 0, 0
	rapid.Check(t, func(t *rapid.T) {
		m, kind := anyComposed(t)
		area := 0.0
		for _, b := range m.bodies {
			a, _ := b.Section.Above(b.Section.Height())
			area += a
		}
		layers := anyLayers(t, ok[section.Shape](t)(section.Rectangle(area/m.height, m.height)))
		e, s := rapid.Float64Range(-5e-4, 5e-4).Draw(t, "ε"), rapid.Float64Range(-1e-3, 1e-3).Draw(t, "s·h")/m.height
		other := composed{bodies: slices.Clone(m.bodies), height: m.height}
		for i := range other.bodies {
			b := &other.bodies[i]
			b.Strain += e + s*b.Offset
			b.Slope += s
		}
		moved := slices.Clone(layers)
		for i := range moved {
			moved[i].Prestrain -= e + s*moved[i].Depth
		}
		a, errA := CompositeFibres(m.bodies, m.limits, Conditions{}, layers)
		b, errB := CompositeFibres(other.bodies, LimitsOf(other.bodies), Conditions{}, moved)
		if errA != nil || errB != nil || a.Pivot == PivotCore || b.Pivot == PivotCore {
			return // the core belongs to the frame
		}
		tried++
		if k := a.Curvature + s; math.Abs(b.Curvature-k) > 1e-6*k {
			return // another of several states
		}
		compared++
		size := a.Concrete * m.height
		near(t, kind+" M", b.Moment, a.Moment, 1e-6*(size+math.Abs(a.Moment)))
		near(t, kind+" strain at the top", b.TopStrain+e, a.TopStrain, 1e-6*math.Abs(a.TopStrain)+1e-9)
	})
	t.Logf("%d of %d the same", compared, tried)
	if tried < 200 || compared < tried*97/100 {
		t.Errorf("only %d of %d compared", compared, tried)
	}
}
