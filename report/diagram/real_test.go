package diagram

import (
	"os"
	"path/filepath"
	"testing"
	"time"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/pdf"
)

func TestReal(t *testing.T) {
	files, _ := filepath.Glob("/tmp/out/*.trace.json")
	d := pdf.New(pdf.Options{Created: time.Unix(0, 0)})
	for _, w := range []draw.Pt{373, 490} {
	for _, file := range files {
		f, _ := os.Open(file)
		n, err := trace.Read(f)
		if err != nil { t.Error(err); continue }
		var s *pdf.Sheet
		y := draw.SheetHeight
		n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
			fg, ok := e.(*trace.Figure)
			if !ok { return }
			fig, err := Lay(n, fg, w)
			if err != nil { t.Error(file, err); return }
			var r draw.Recorder
			fig.Draw(&r, 0, 0)
			for _, x := range r.Faults() { t.Error(filepath.Base(file), fg.Kind, x) }
			if y+fig.Height+10 > draw.SheetHeight { s, y = d.Sheet(), 20 }
			fig.Draw(s, (draw.SheetWidth-fig.Width)/2, y)
			y += fig.Height + 18
		})
	}
	}
	out, err := d.Bytes()
	if err != nil { t.Fatal(err) }
	os.WriteFile("/tmp/look/real.pdf", out, 0o644)
}
