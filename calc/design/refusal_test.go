package design

import (
	"math"
	"strings"
	"testing"

	"soffit/calc/bending"
)

// TestRefusals: what the kernels refuse is said in kN and ‰, with the axial force where there is one, and with what to change.
func TestRefusals(t *testing.T) {
	for _, c := range []struct {
		reason            bending.Reason
		have, limit, with float64
		want              []string
	}{
		{bending.WhollyCompressed, 5.2e6, 4.8e6, 6e5, []string{"axial compression of 600 kN press with 5200 kN", "4800 kN at most", "enlarge the section"}},
		{bending.WhollyCompressed, 5.2e6, 4.8e6, 0, []string{"the steel presses with 5200 kN", "take out tendons"}},
		{bending.WhollyCompressed, 5.2e6, 4.8e6, -2e5, []string{"less the axial tension of 200 kN presses with 5200 kN"}},
		{bending.NotHeld, 7.93e5, 9e5, -9e5, []string{"793 kN of an axial tension of 900 kN", "add tendons or bars"}},
		{bending.NotHeld, -1e5, 9e5, -9e5, []string{"holds 0 kN of"}},
		{bending.NoTension, -3e4, 0, 1e5, []string{"pressed with 30 kN", "beside an axial compression of 100 kN", "farther from the compressed edge"}},
		{bending.NoTension, 0, 0, 0, []string{"no row of steel pulls once"}},
		{bending.LimitSpent, 0.0213, 0.02, 0, []string{"the row low by 21.30 ‰", "20.00 ‰", "horizontal"}},
		{bending.LockedIn, 3e6, 2e6, 0, []string{"3000 kN", "2000 kN at most", "props"}},
		{bending.EdgeSpent, 0.0036, 0.0035, 0, []string{"3.60 ‰", "3.50 ‰", "props"}},
		{bending.Unbalanced, -1250, 10, -5e4, []string{"but for 1.25 kN", "0.01 kN are allowed", "axial tension of 50 kN", "by a millimetre"}},
		{bending.Unbalanced, math.NaN(), 0, 0, []string{"a fault of soffit"}},
	} {
		got := refused(&bending.Refusal{Reason: c.reason, Layer: -1, Have: c.have, Limit: c.limit}, c.with, "low").Error()
		for _, w := range c.want {
			if !strings.Contains(got, w) {
				t.Errorf("%v: %q has no %q", c.reason, got, w)
			}
		}
		if c.with == 0 && strings.Contains(got, "beside an axial") || strings.Contains(got, "e+0") || strings.Contains(got, "-") && !strings.Contains(got, "of soffit") {
			t.Errorf("%v: %q", c.reason, got)
		}
	}
	for reason := bending.NoTension; reason <= bending.LockedIn; reason++ {
		got := refused(&bending.Refusal{Reason: reason, Layer: 0, Have: 1, Limit: 2}, 0, "low").Error()
		if mends := strings.Contains(got, ": "); !mends || strings.Contains(got, "no neutral axis") && !strings.Contains(got, "a fault of soffit") {
			t.Errorf("%v: %q", reason, got)
		}
	}
}

// TestRefusedRow: a layer of the kernels is named after its row of tendons.
func TestRefusedRow(t *testing.T) {
	j := setOut(t, shapes["rectangle"], "", "")
	if got, want := j.layerName(nil, 0), j.tendonRows()[0].name; got != want || want == "" {
		t.Errorf("%q, want %q", got, want)
	}
	if got := j.layerName(nil, -1); got != "" {
		t.Errorf("no layer is called %q", got)
	}
}
