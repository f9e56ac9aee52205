package diagram

import (
	"math"
	"slices"
	"testing"

	"pgregory.net/rapid"

	"soffit/calc/quantity"
	"soffit/report/draw"
)

// TestSpread: places keep their order and distances, those that are apart stay, and the middle of a crowd
// stays where it was.
func TestSpread(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		n := rapid.IntRange(1, 9).Draw(t, "n")
		at, size := make([]draw.Pt, n), make([]draw.Pt, n)
		for i := range at {
			at[i] = draw.Pt(rapid.IntRange(0, 100).Draw(t, "at"))
			size[i] = draw.Pt(rapid.IntRange(5, 12).Draw(t, "size"))
		}
		to := spread(at, size, -1e6, 1e6)
		order := make([]int, n)
		for i := range order {
			order[i] = i
		}
		slices.SortStableFunc(order, func(a, b int) int { return int(at[a] - at[b]) })
		var sum, moved draw.Pt
		clash := false
		for k, i := range order {
			sum += at[i]
			moved += to[i]
			if k == 0 {
				continue
			}
			h := order[k-1]
			if least := (size[h] + size[i]) / 2; to[i]-to[h] < least-1e-9 {
				t.Fatalf("%v of size %v go to %v", at, size, to)
			} else if at[i]-at[h] < least {
				clash = true
			}
		}
		if math.Abs(float64(sum-moved)) > 1e-6 {
			t.Errorf("the middle of %v moves by %v", at, (moved-sum)/draw.Pt(n))
		}
		if !clash && !slices.Equal(at, to) {
			t.Errorf("%v move to %v without need", at, to)
		}
		// A floor pushes them up, as far as it must.
		low := spread(at, size, -1e6, 40)
		last := order[n-1]
		if low[last]+size[last]/2 > 40+1e-9 {
			t.Errorf("%v go to %v, below 40", at, low)
		}
	})
}

func TestScales(t *testing.T) {
	for _, c := range []struct {
		mm   float64
		room draw.Pt
		want scale
	}{{1200, 250, 15}, {1200, 226, 20}, {100, 57, 5}, {24000, 400, 175}, {1e9, 10, 5000}} {
		if got := fit(c.mm, c.room); got != c.want {
			t.Errorf("%g mm in %g pt: %s, want %s", c.mm, float64(c.room), got, c.want)
		}
	}
}

func TestGraduations(t *testing.T) {
	m := quantity.MustUnit("m")
	for _, c := range []struct {
		hi    float64 // mm
		count int
		want  []string
	}{
		{10000, 5, []string{"0", "2", "4", "6", "8", "10"}},
		{14300, 3, []string{"0", "5", "10"}},
		{1000, 4, []string{"0.00", "0.25", "0.50", "0.75", "1.00"}},
		{900, 1, []string{"0.0", "0.5"}},
	} {
		_, got := axis{lo: 0, hi: c.hi}.graduations(m, c.count)
		if c.count == 1 { // made finer until there are three
			if len(got) < 3 {
				t.Errorf("%g mm: %v, want three at least", c.hi, got)
			}
			continue
		}
		if !slices.Equal(got, c.want) {
			t.Errorf("%g mm in %d: %v, want %v", c.hi, c.count, got, c.want)
		}
	}
}

// TestMeets compares the clipping of a piece of a line with many points of it.
func TestMeets(t *testing.T) {
	rapid.Check(t, func(t *rapid.T) {
		v := func(name string) draw.Pt { return draw.Pt(rapid.IntRange(-20, 20).Draw(t, name)) }
		b := draw.BoxAt(v("x"), v("y"), 7, 5)
		s := [2]draw.Point{{X: v("x0"), Y: v("y0")}, {X: v("x1"), Y: v("y1")}}
		inside := false
		for i := range 2001 {
			k := draw.Pt(i) / 2000
			x, y := s[0].X+(s[1].X-s[0].X)*k, s[0].Y+(s[1].Y-s[0].Y)*k
			inside = inside || x > b.X0 && x < b.X1 && y > b.Y0 && y < b.Y1
		}
		if inside && !meets(s, b) {
			t.Errorf("%v runs through %v unseen", s, b)
		}
		if !inside && meets(s, b.Grow(-0.05)) {
			t.Errorf("%v is said to run through %v", s, b)
		}
	})
}

// TestShorten keeps both ends of a name.
func TestShorten(t *testing.T) {
	const name = "the lower row of strands in the bulb, no 12"
	for _, room := range []draw.Pt{30, 64, 100} {
		got := shorten(draw.Serif, name, room)
		if draw.Width(draw.Serif, size, got) > room || got[:3] != "the" || got[len(got)-2:] != "12" {
			t.Errorf("in %g pt: %q", float64(room), got)
		}
	}
	if got := shorten(draw.Serif, "row 1", 64); got != "row 1" {
		t.Errorf("a short name becomes %q", got)
	}
}
