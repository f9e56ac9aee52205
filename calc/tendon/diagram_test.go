package tendon_test

import (
	"errors"
	"math"
	"testing"

	"gonum.org/v1/gonum/integrate/quad"
	"pgregory.net/rapid"

	"soffit/calc/tendon"
)

const strand = 195e3 // MPa

func unstressed(t testing.TB, p tendon.Profile, mu, k, modulus float64) tendon.Diagram {
	t.Helper()
	d, err := p.Unstressed(tendon.Friction{Mu: mu, K: k}, modulus)
	if err != nil {
		t.Fatal(err)
	}
	return d
}

func pull(t testing.TB, d tendon.Diagram, end tendon.End, stress float64) (tendon.Diagram, tendon.Change) {
	t.Helper()
	d, c, err := d.Pull(end, stress)
	if err != nil {
		t.Fatal(err)
	}
	return d, c
}

func slip(t testing.TB, d tendon.Diagram, end tendon.End, drawIn float64) (tendon.Diagram, tendon.Change) {
	t.Helper()
	d, c, err := d.Slip(end, drawIn)
	if err != nil {
		t.Fatal(err)
	}
	return d, c
}

// TestFrictionPublished: Krishna Raju, Prestressed Concrete, ch. 5, grade B (recalled, recomputed): 10 m, 1200 MPa, μ 0.35,
// wobble 0.0015/m beside μ. Published with the exponential made linear: 51.6, 34.8, 18 MPa; the exponential gives 50.51, 34.30,
// 17.87 MPa (recomputed).
func TestFrictionPublished(t *testing.T) {
	const mu, k = 0.35, 0.0015 / 0.35 / 1e3
	end := tendon.Point{X: 10000, By: tendon.LevelBefore}
	for _, c := range []struct {
		points             []tendon.Point
		published, exactly float64
	}{
		// ±50 mm: 100 mm of sag between the ends, angle 8·f/L = 0.08.
		{[]tendon.Point{{Height: 100}, {X: 5000, By: tendon.LevelHere}, {X: 10000, Height: 100, By: tendon.LevelBefore}}, 51.6, 50.51},
		{[]tendon.Point{{Height: 50}, {X: 5000, By: tendon.LevelHere}, {X: 10000, Height: 50, By: tendon.LevelBefore}}, 34.8, 34.30},
		{[]tendon.Point{{}, end}, 18, 17.87},
	} {
		d, _ := pull(t, unstressed(t, profile(t, c.points...), mu, k, strand), tendon.A, 1200)
		loss := 1200 - d.Stress(10000)
		near(t, "loss, recomputed", loss, c.exactly, 0.005)
		near(t, "loss, published", loss, c.published, 0.022*c.published)
		near(t, "loss made linear", 1200*(-math.Log(1-loss/1200)), c.published, 0.05)
	}
}

// bridge is the tendon of TestBridge: angle 0.006·x with x in m, so a curvature of 6e-6/mm.
func bridge(t testing.TB) tendon.Diagram {
	const l, curvature = 43000.0, 6e-6
	sag := curvature * l * l / 8
	p := profile(t, tendon.Point{Height: sag}, tendon.Point{X: l / 2, By: tendon.LevelHere}, tendon.Point{X: l, Height: sag, By: tendon.LevelBefore})
	return unstressed(t, p, 0.18, 0.002/0.18/1e3, 190e3)
}

// TestBridge: student's report on a bridge beam, ENIT Tunis 2020/21, family 1, grade A but weak: friction at six places; the
// report states 1488 MPa, its figures need 1455 MPa. Draw-in of 6 mm published 15.95 m and losses 138.46, 92.59, 46.75 MPa with
// the exponential made linear and rounded: held to 2.5 %. Exact, recomputed: 16.354 m, 139.44 MPa.
func TestBridge(t *testing.T) {
	d, _ := pull(t, bridge(t), tendon.A, 1455)
	for x, want := range map[float64]float64{5375: 23.889, 10750: 47.386, 21500: 93.23, 32250: 137.58, 37625: 159.2, 43000: 180.48} {
		near(t, "friction", 1455-d.Stress(x), want, 0.01)
	}
	after, c := slip(t, d, tendon.A, 6)
	near(t, "influence length", c.Length, 16354, 1)
	near(t, "loss at the anchorage", c.Before-c.After, 139.44, 0.005)
	near(t, "influence length, published", c.Length, 15950, 0.026*15950)
	for x, want := range map[float64]float64{0: 138.46, 5375: 92.59} {
		near(t, "draw-in, published", d.Stress(x)-after.Stress(x), want, 0.025*want)
	}
	// Here what is left is small: held to 2.5 % of the loss at the anchorage.
	near(t, "draw-in at 10.75 m", d.Stress(10750)-after.Stress(10750), 46.75, 0.025*138.46)
	if c.Whole || c.Movement != -6 || c.End != tendon.A {
		t.Errorf("%+v", c)
	}
}

// TestSlipWithoutFriction: Krishna Raju, ch. 5, grade B: 1000 MPa, 210 GPa, slip 5 mm: 35 MPa on 30 m, 350 MPa on 3 m.
func TestSlipWithoutFriction(t *testing.T) {
	for length, want := range map[float64]float64{30000: 35, 3000: 350} {
		p, err := tendon.Level(length, 100)
		if err != nil {
			t.Fatal(err)
		}
		d, c := pull(t, unstressed(t, p, 0, 0, 210e3), tendon.A, 1000)
		near(t, "extension", c.Movement, 1000*length/210e3, 1e-9)
		d, c = slip(t, d, tendon.A, 5)
		near(t, "loss", c.Before-c.After, want, 1e-9)
		near(t, "stress at the far end", d.Stress(length), 1000-want, 1e-9)
		if !c.Whole || c.Length != length || len(d.Places()) != 2 {
			t.Errorf("%+v, %v", c, d.Places())
		}
	}
}

// TestSlipOnSlope: closed form of a constant slope p, x_A = sqrt(δ·E/p), loss 2·p·x_A, with which weak friction agrees to the
// first order; and the closed form of the exponential (own derivation):
// 4·sinh²(g·x_A/2)·σ/g = δ·E with the stress σ at x_A.
func TestSlipOnSlope(t *testing.T) {
	const jack, drawIn, l = 1400.0, 6.0, 60000.0
	p, err := tendon.Level(l, 100)
	if err != nil {
		t.Fatal(err)
	}
	for _, g := range []float64{1e-6, 4e-6, 2e-5} { // 1/mm
		d, _ := pull(t, unstressed(t, p, 1, g, strand), tendon.A, jack)
		_, c := slip(t, d, tendon.A, drawIn)
		if c.Whole {
			// Beyond the far end: σ_a·(e^{gL} − 1)/g is what is left of σ·(1 − e^{−gL})/g.
			area := jack * -math.Expm1(-g*l) / g
			near(t, "stress at the anchorage", c.After, (area-drawIn*strand)*g/math.Expm1(g*l), 1e-8)
			continue
		}
		half := math.Sinh(g * c.Length / 2)
		near(t, "∫Δσ·dx", jack*math.Exp(-g*c.Length)*4*half*half/g/strand, drawIn, 1e-9)
		near(t, "stress at the anchorage", c.After, jack*math.Exp(-2*g*c.Length), 1e-8)
		slope := jack * g
		if x := math.Sqrt(drawIn * strand / slope); x*g < 0.3 {
			near(t, "length of the small slope", c.Length, x, 0.6*g*x*x)
		}
	}
}

// TestKinks: straight lines without wobble, so friction at the kinks alone, and a draw-in whose influence ends at a kink.
func TestKinks(t *testing.T) {
	p, err := tendon.Deflected(18000, 80, 400, 6000)
	if err != nil {
		t.Fatal(err)
	}
	const jack, mu = 1400.0, 0.2
	f := math.Exp(-mu * 400 / 6000)
	d, _ := pull(t, unstressed(t, p, mu, 0, strand), tendon.A, jack)
	left, right := d.Sides(6000)
	near(t, "before the kink", left, jack, 1e-9)
	near(t, "after the kink", right, jack*f, 1e-9)
	near(t, "at the kink", d.Stress(6000), jack*f, 1e-9)
	near(t, "at the far end", d.Stress(18000), jack*f*f, 1e-9)
	// 0.5 mm over the 6 m before the kink: 16.25 MPa, less than the kink's 2·18.5 MPa.
	after, c := slip(t, d, tendon.A, 0.5)
	near(t, "loss", c.Before-c.After, 0.5*strand/6000, 1e-9)
	near(t, "influence length", c.Length, 6000, 1e-9)
	near(t, "beyond the kink", after.Stress(6001), jack*f, 1e-9)
	// More: the first kink is overcome, both parts move.
	after, c = slip(t, d, tendon.A, 2)
	near(t, "influence length", c.Length, 12000, 1e-9)
	near(t, "ratio at the kink", after.Stress(7000)/c.After, 1/f, 1e-12)
	near(t, "loss", 6000*(jack-c.After)+6000*(jack*f-c.After/f), 2*strand, 1e-6)
}

// TestBothEnds: a symmetrical tendon pulled from both ends; the meeting is in the middle, each jack draws out half.
func TestBothEnds(t *testing.T) {
	d := bridge(t)
	one, first := pull(t, d, tendon.A, 1400)
	two, second := pull(t, one, tendon.B, 1400)
	near(t, "meeting", second.Length, 21500, 1e-6)
	for _, x := range []float64{0, 4000, 21500, 30000, 43000} {
		near(t, "symmetry", two.Stress(x), two.Stress(43000-x), 1e-9)
	}
	near(t, "all that is drawn out", first.Movement+second.Movement, two.Extension(0, 43000), 1e-9)
	near(t, "half", two.Extension(0, 21500), two.Extension(0, 43000)/2, 1e-9)
	near(t, "turned", two.Extension(21500, 0), -two.Extension(0, 21500), 0)
	near(t, "second jack", second.Movement, (two.Extension(0, 43000) - one.Extension(0, 43000)), 1e-9)
	near(t, "mean", two.Mean(), two.Extension(0, 43000)*190e3/43000, 1e-9)

	// Short influences do not meet, so their order is of no account.
	a, ca := slip(t, two, tendon.A, 3)
	a, cb := slip(t, a, tendon.B, 3)
	b, _ := slip(t, two, tendon.B, 3)
	b, _ = slip(t, b, tendon.A, 3)
	near(t, "lengths", ca.Length, cb.Length, 1e-6)
	for x := 0.0; x <= 43000; x += 1000 {
		near(t, "order", a.Stress(x), b.Stress(x), 1e-8)
	}
	// A long draw-in at A goes past the meeting, and there is no friction to stop it then: the other anchorage loses too.
	long, c := slip(t, two, tendon.A, 40)
	if !c.Whole {
		t.Errorf("%+v", c)
	}
	near(t, "as in the meeting so at B", long.Stress(43000)/two.Stress(43000), long.Stress(21500)/two.Stress(21500), 1e-12)
	// Pulled again to the same stress at A, the part near it is as before.
	again, c := pull(t, a, tendon.A, 1400)
	near(t, "drawn out again", c.Movement, 3, 1e-9)
	near(t, "as before", again.Stress(2000), two.Stress(2000), 1e-9)
}

// history draws a stressing at random, of one or both ends, with draw-ins, and gives every diagram on the way.
func history(t *rapid.T, p tendon.Profile, f tendon.Friction) (all []tendon.Diagram, changes []tendon.Change) {
	d, err := p.Unstressed(f, strand)
	if err != nil {
		t.Fatal(err)
	}
	all = append(all, d)
	for range rapid.IntRange(1, 6).Draw(t, "events") {
		end := rapid.SampledFrom([]tendon.End{tendon.A, tendon.B}).Draw(t, "end")
		var c tendon.Change
		if rapid.Bool().Draw(t, "pull") {
			d, c, err = d.Pull(end, rapid.Float64Range(200, 1600).Draw(t, "stress"))
		} else {
			d, c, err = d.Slip(end, rapid.Float64Range(0, 30).Draw(t, "draw-in"))
		}
		if err != nil {
			if !errors.Is(err, tendon.IdlePull) && !errors.Is(err, tendon.SlackSlip) {
				t.Fatal(err)
			}
			d = all[len(all)-1]
			continue
		}
		all, changes = append(all, d), append(changes, c)
	}
	return all, changes
}

// TestAnyStressing holds what must hold of any diagram: nowhere steeper than the friction allows, tension, the movement at the
// end the change of the extension (by another quadrature), and every stress the greatest of the pulls at most.
func TestAnyStressing(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, _ := random(rt)
		f := tendon.Friction{Mu: rapid.SampledFrom([]float64{0, 0.1, 0.2, 0.35}).Draw(rt, "μ"), K: rapid.SampledFrom([]float64{0, 5e-6, 1e-5}).Draw(rt, "k")}
		all, changes := history(rt, p, f)
		integral := func(d tendon.Diagram) (sum float64) {
			places := d.Places()
			for i := 1; i < len(places); i++ {
				if !(places[i] > places[i-1]) {
					rt.Fatalf("places %v", places)
				}
				sum += quad.Fixed(d.Stress, places[i-1], places[i], 12, quad.Legendre{}, 0)
			}
			return sum
		}
		for i, c := range changes {
			before, after := all[i], all[i+1]
			want := (integral(after) - integral(before)) / strand
			if math.Abs(want-c.Movement) > 1e-9*(1+after.Extension(p.From(), p.To())) {
				rt.Fatalf("movement %.12g, by quadrature %.12g", c.Movement, want)
			}
			if !(c.Length >= 0 && c.Length <= (p.To()-p.From())*(1+1e-12)) || c.Whole && math.Abs(c.Length-(p.To()-p.From())) > 1e-6 {
				rt.Fatalf("%+v", c)
			}
			// Beyond the length nothing changes, within it everything does, one way.
			for j := range 41 {
				x := p.From() + (p.To()-p.From())*float64(j)/40
				from := x - p.From()
				if c.End == tendon.B {
					from = p.To() - x
				}
				gain := after.Stress(x) - before.Stress(x)
				if from > c.Length*(1+1e-9)+1e-6 && math.Abs(gain) > 1e-9*(1+before.Stress(x)) || gain*c.Movement < -1e-9 {
					rt.Fatalf("at %g: %+v, gain %g", x, c, gain)
				}
			}
		}
		d := all[len(all)-1]
		places := d.Places()
		for i := 1; i < len(places); i++ {
			a, b := places[i-1], places[i]
			_, sa := d.Sides(a)
			sb, next := d.Sides(b)
			if sa == 0 {
				continue // not reached yet by any pull
			}
			grip := f.Mu * (p.Angle((a+b)/2, false) - p.Angle(a, false) + f.K*(b-a)/2) * 2
			if !(sa > 0 && sb > 0) || math.Abs(math.Log(sb/sa)) > grip+1e-9 {
				rt.Fatalf("from %g to %g: %g to %g MPa, friction allows %g", a, b, sa, sb, grip)
			}
			if i+1 < len(places) && next > 0 {
				kink := f.Mu * (p.Angle(b, false) + p.Angle(b, true) - p.Angle(p.To(), false))
				if math.Abs(math.Log(next/sb)) > kink+1e-9 {
					rt.Fatalf("jump at %g: %g to %g MPa, friction allows %g", b, sb, next, kink)
				}
			}
		}
	})
}

// TestPullIsTheExponential: after one pull the stress is that of (5.45) with Profile.Angle, from either end; and slopes for
// angles never give more stress than true angles.
func TestPullIsTheExponential(t *testing.T) {
	rapid.Check(t, func(rt *rapid.T) {
		p, _ := random(rt)
		const mu, k, jack = 0.19, 8e-6, 1440.0
		d, err := p.Unstressed(tendon.Friction{Mu: mu, K: k}, strand)
		if err != nil {
			rt.Fatal(err)
		}
		x := rapid.Float64Range(p.From(), p.To()).Draw(rt, "x")
		for _, end := range []tendon.End{tendon.A, tendon.B} {
			fromB := end == tendon.B
			path := x - p.From()
			if fromB {
				path = p.To() - x
			}
			pulled, c, err := d.Pull(end, jack)
			if err != nil || !c.Whole || c.Before != 0 || c.After != jack {
				rt.Fatalf("%+v, %v", c, err)
			}
			got, want := pulled.Stress(x), jack*math.Exp(-mu*(p.Angle(x, fromB)+k*path))
			if math.Abs(got-want) > 1e-9*jack {
				rt.Fatalf("end %d, at %g: %.12g, want %.12g", end, x, got, want)
			}
			if most := jack * math.Exp(-mu*(p.Turned(x, fromB)+k*path)); got > most*(1+1e-12) {
				rt.Fatalf("%g MPa, with true angles %g MPa", got, most)
			}
		}
	})
}

// TestMirroredStressing: the mirrored tendon, handled from the other ends, has the mirrored diagram.
func TestMirroredStressing(t *testing.T) {
	p := profile(t, tendon.Point{Height: 900}, tendon.Point{X: 9000, Height: 100, By: tendon.LevelHere}, tendon.Point{X: 15000, Height: 100}, tendon.Point{X: 26000, Height: 700})
	m := profile(t, tendon.Point{Height: 700}, tendon.Point{X: 11000, Height: 100}, tendon.Point{X: 17000, Height: 100}, tendon.Point{X: 26000, Height: 900, By: tendon.LevelBefore})
	d, n := unstressed(t, p, 0.19, 1e-5, strand), unstressed(t, m, 0.19, 1e-5, strand)
	d, _ = pull(t, d, tendon.A, 1400)
	d, _ = pull(t, d, tendon.B, 1300)
	d, _ = slip(t, d, tendon.A, 6)
	d, _ = slip(t, d, tendon.B, 8)
	n, _ = pull(t, n, tendon.B, 1400)
	n, _ = pull(t, n, tendon.A, 1300)
	n, _ = slip(t, n, tendon.B, 6)
	n, _ = slip(t, n, tendon.A, 8)
	for x := 0.0; x <= 26000; x += 500 {
		near(t, "stress", d.Stress(x), n.Stress(26000-x), 1e-8)
	}
	near(t, "outside", d.Stress(-1)+d.Stress(26001), 0, 0)
}

func TestRefusals(t *testing.T) {
	p, err := tendon.Level(10000, 100)
	if err != nil {
		t.Fatal(err)
	}
	refused := func(what string, err error, want tendon.Reason) {
		t.Helper()
		var r *tendon.Refusal
		if !errors.As(err, &r) || !errors.Is(err, want) || r.Error() == "" {
			t.Errorf("%s: %v, want %v", what, err, want)
		}
	}
	_, err = p.Unstressed(tendon.Friction{Mu: -0.1}, strand)
	refused("μ", err, tendon.BadFriction)
	_, err = p.Unstressed(tendon.Friction{K: math.Inf(1)}, strand)
	refused("k", err, tendon.BadFriction)
	_, err = p.Unstressed(tendon.Friction{}, 0)
	refused("E", err, tendon.BadModulus)
	d := unstressed(t, p, 0.2, 1e-5, strand)
	_, _, err = d.Slip(tendon.A, 1)
	refused("slip of a slack tendon", err, tendon.SlackSlip)
	for _, s := range []float64{0, -5, math.NaN(), math.Inf(1)} {
		_, _, err = d.Pull(tendon.A, s)
		refused("stress", err, tendon.BadPull)
	}
	d, _ = pull(t, d, tendon.A, 1000)
	_, _, err = d.Pull(tendon.B, 900)
	refused("idle", err, tendon.IdlePull)
	for _, s := range []float64{-1, math.NaN(), math.Inf(1)} {
		_, _, err = d.Slip(tendon.A, s)
		refused("draw-in", err, tendon.BadSlip)
	}
	_, _, err = d.Slip(tendon.A, d.Extension(0, 10000))
	refused("all of it", err, tendon.SlackSlip)
	if same, c := slip(t, d, tendon.B, 0); same.Stress(5000) != d.Stress(5000) || c.Length != 0 || c.Before != c.After {
		t.Errorf("no draw-in: %+v", c)
	}
}

func BenchmarkStressing(b *testing.B) {
	d := bridge(b)
	b.ReportAllocs()
	for b.Loop() {
		s, _, _ := d.Pull(tendon.A, 1400)
		s, _, _ = s.Pull(tendon.B, 1400)
		s, _, _ = s.Slip(tendon.A, 6)
		if _, _, err := s.Slip(tendon.B, 6); err != nil {
			b.Fatal(err)
		}
	}
}
