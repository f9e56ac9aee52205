package diagram

import (
	"testing"

	"soffit/report/draw"
)

// BenchmarkLay lays out and draws each figure of a member with eight rows.
func BenchmarkLay(b *testing.B) {
	n, figs := iBeam().note(b)
	for _, id := range []string{"fig-section", "fig-elevation", "fig-effects", "fig-ultimate", "fig-resistance", "fig-stress"} {
		b.Run(figs[id].Kind, func(b *testing.B) {
			b.ReportAllocs()
			for b.Loop() {
				f, err := Lay(n, figs[id], 510)
				if err != nil {
					b.Fatal(err)
				}
				f.Draw(&draw.Recorder{}, 0, 0)
			}
		})
	}
}
