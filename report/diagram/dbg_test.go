package diagram

import (
	"os"
	"testing"
	"time"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/pdf"
)

func dump(t testing.TB, n *trace.Note, f *trace.Figure, width draw.Pt, name string) {
	d := pdf.New(pdf.Options{Title: "figures", Created: time.Unix(0, 0)})
	s := d.Sheet()
	fig, _ := Lay(n, f, width)
	fig.Draw(s, 40, 60)
	out, _ := d.Bytes()
	os.WriteFile("/tmp/dlook/"+name+".pdf", out, 0o644)
}
