package diagram

import (
	"flag"
	"fmt"
	"os"
	"path/filepath"
	"testing"
	"time"

	"soffit/report/draw"
	"soffit/report/pdf"
)

var look = flag.String("look", "", "folder to which the sample figures are written as PDF, to be looked at")

// TestLook writes the figures of the sample members, a file for each kind and width, where -look asks for
// them.
func TestLook(t *testing.T) {
	if *look == "" {
		t.Skip("no folder given")
	}
	for _, w := range []draw.Pt{340, 510} {
		for _, id := range []string{"fig-section", "fig-section-loose", "fig-elevation", "fig-elevation-parts", "fig-elevation-profile", "fig-effects", "fig-ultimate", "fig-ultimate-hogging", "fig-ultimate-curve", "fig-resistance", "fig-resistance-both", "fig-stress"} {
			d := pdf.New(pdf.Options{Title: "figures", Created: time.Unix(0, 0)})
			var s *pdf.Sheet
			y := draw.SheetHeight
			for _, m := range append(samples(), kindsOfSection()...) {
				n, figs := m.note(t)
				if figs[id] == nil {
					continue
				}
				fig, err := Lay(n, figs[id], w)
				if err != nil {
					t.Errorf("%s %.0f: %v", id, float64(w), err)
					continue
				}
				if y+fig.Height+30 > draw.SheetHeight {
					s, y = d.Sheet(), 30
				}
				x := (draw.SheetWidth - w) / 2
				s.Rect(x, y, w, fig.Height, draw.Style{Stroke: 0.2, Pen: draw.Grey(0.8)})
				fig.Draw(s, x+(w-fig.Width)/2, y)
				y += fig.Height + 20
			}
			out, err := d.Bytes()
			if err != nil {
				t.Fatal(err)
			}
			file := filepath.Join(*look, fmt.Sprintf("%s-%.0f.pdf", id, float64(w)))
			if err := os.WriteFile(file, out, 0o644); err != nil {
				t.Fatal(err)
			}
		}
	}
}
