package section

import (
	"math"
	"slices"
	"testing"
)

// TestJumps: worked by hand from the measures.
func TestJumps(t *testing.T) {
	for _, c := range []struct {
		name   string
		form   Form
		jumps  []float64
		flange float64
		below  float64 // flange of the shape upside down
	}{
		{"rectangle", RectangularBeam{Width: 300, Depth: 600, Chamfer: 20, TopChamfer: 20}, nil, 0, 0},
		{"rectangle with chamfers at the soffit", RectangularBeam{Width: 300, Depth: 600, Chamfer: 20}, nil, 0, 0},
		{"T", TBeam{Depth: 800, Flange: Flange{Width: 400, Depth: 120}, Web: 200, Chamfer: 20}, []float64{680}, 120, 0},
		{"T with a haunch", TBeam{Depth: 800, Flange: Flange{Width: 400, Depth: 120, Haunch: 40}, Web: 200}, nil, 120, 0},
		{"I", IBeam{Depth: 1000, Top: Flange{Width: 400, Depth: 150, Haunch: 50}, Web: 150, Bottom: Flange{Width: 500, Depth: 200}}, []float64{200}, 150, 200},
		{"inverted T with chamfers", InvertedT{Depth: 700, Ledge: Flange{Width: 600, Depth: 250}, Web: 300, Chamfer: 20}, []float64{250}, 0, 250},
		{"box", BoxBeam{Width: 1000, Depth: 1000, TopWidth: 1400, Top: 150, Web: 120, Bottom: 140}, []float64{140, 850}, 150, 140},
		{"double T", DoubleT{Width: 2400, Depth: 600, Flange: 60, Spacing: 1200, StemBottom: 120, StemTop: 180, Haunch: 40}, []float64{540}, 60, 0},
		{"U", UBeam{Bottom: 900, Top: 1200, Depth: 1100, Web: 130, Floor: 150}, []float64{150}, 0, 150},
		{"round voids", HollowUnit{Width: 1200, Depth: 265, VoidWidth: 150, VoidDepth: 150, Count: 6, Spacing: 190, Level: 132}, nil, 58, 57},
		{"level voids", HollowUnit{Width: 1200, Depth: 265, VoidWidth: 300, VoidDepth: 120, Count: 3, Spacing: 380, Level: 130}, []float64{70, 190}, 75, 70},
		{"upright voids", HollowUnit{Width: 1200, Depth: 400, VoidWidth: 150, VoidDepth: 300, Count: 6, Spacing: 190, Level: 200}, nil, 50, 50},
		{"trapezoid", Trapezoid{Bottom: 300, Top: 500, Depth: 600}, nil, 0, 0},
	} {
		o := set(t, c.form)
		if got := o.Jumps(); !slices.EqualFunc(got, c.jumps, func(a, b float64) bool { return math.Abs(a-b) < 1e-9 }) {
			t.Errorf("%s: jumps at %v, want %v", c.name, got, c.jumps)
		}
		if got := o.TopFlange(); math.Abs(got-c.flange) > 1e-9 {
			t.Errorf("%s: flange of %g mm at the top, want %g", c.name, got, c.flange)
		}
		if got := o.Shape.Flipped().TopFlange(); math.Abs(got-c.below) > 1e-9 {
			t.Errorf("%s: flange of %g mm at the soffit, want %g", c.name, got, c.below)
		}
	}
}

// TestWidthsAt: the lesser of both is WidthAt; at a ledge they are the widths of the parts that meet.
func TestWidthsAt(t *testing.T) {
	o := set(t, IBeam{Depth: 1000, Top: Flange{Width: 400, Depth: 150}, Web: 150, Bottom: Flange{Width: 500, Depth: 200}})
	if under, above := o.WidthsAt(200); under != 500 || above != 150 {
		t.Errorf("%g and %g at the ledge, want 500 and 150", under, above)
	}
	for _, f := range []Form{
		HollowUnit{Width: 1200, Depth: 265, VoidWidth: 300, VoidDepth: 120, Count: 3, Spacing: 380, Level: 130},
		BoxBeam{Width: 1000, Depth: 1000, TopWidth: 1400, Top: 150, Web: 120, Bottom: 140, TopHaunch: 80},
	} {
		o := set(t, f)
		for k := 1; k < 100; k++ {
			y := o.Height() * float64(k) / 100
			if under, above := o.WidthsAt(y); math.Min(under, above) != o.WidthAt(y) {
				t.Errorf("%T at %g: %g and %g, WidthAt %g", f, y, under, above, o.WidthAt(y))
			}
		}
	}
}
