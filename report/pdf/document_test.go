package pdf

import (
	"bytes"
	"fmt"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"sync"
	"testing"
	"time"

	"github.com/go-pdf/fpdf"

	"soffit/fonts"
	"soffit/report/draw"
)

var created = time.Date(2024, 3, 5, 0, 0, 0, 0, time.UTC)

func sample(plain bool) *Document {
	d := New(Options{Title: "Roof beam — σ ≤ f", Author: "A. Name", Subject: "Design note", Created: created, Plain: plain})
	for n := 1; n <= 3; n++ {
		s := d.Sheet()
		s.Owner("head")
		s.Text(60, 60, draw.Bold, 14, fmt.Sprintf("Sheet %d: AVATAR, To (brackets) and \\", n))
		s.Text(60, 80, draw.Serif, 10, "stress σ and strain ε: σ ≤ f, ε ≥ 0, ✓ ☐ 10⁻³ é — “quoted” × ·")
		s.Text(60, 100, draw.Italic, 10, "σ ε f x λ η φ")
		s.Hidden(60, 120, 10, "√")
		s.TextUp(40, 300, draw.Serif, 9, "upward V")
		s.Line(60, 130, 300, 130, 0.5)
		s.Line(60, 135, 300, 135, 0.5, 3, 2)
		s.Rect(60, 140, 50, 20, draw.Style{Stroke: 0.4, Fill: draw.Grey(0.8)})
		s.Circle(150, 150, 8, draw.Style{Stroke: 0.4})
		s.Polygon([]draw.Point{{X: 200, Y: 140}, {X: 220, Y: 160}, {X: 180, Y: 160}}, draw.Style{Fill: draw.Black})
		s.Polyline([]draw.Point{{X: 240, Y: 140}, {X: 250, Y: 160}, {X: 260, Y: 140}}, draw.Style{Stroke: 1})
		s.Anchor(fmt.Sprintf("a/%d", n), 60, 40)
		s.Link(60, 70, 100, 12, fmt.Sprintf("a/%d", n%3+1))
	}
	d.Outline(0, "Part σ", "a/1")
	d.Outline(1, "Chapter 1", "a/1")
	d.Outline(2, "Block 1.1", "a/2")
	d.Outline(1, "Chapter 2", "a/2")
	d.Outline(0, "Part 2", "a/3")
	return d
}

// tool finds an outside program; its absence skips the test, or fails it where CI=true.
func tool(t *testing.T, name string) string {
	t.Helper()
	path, err := exec.LookPath(name)
	if err == nil {
		return path
	}
	if os.Getenv("CI") == "true" {
		t.Fatalf("%s is not installed", name)
	}
	t.Skipf("%s is not installed: the file is not checked by another program", name)
	return ""
}

func write(t *testing.T, d *Document) string {
	t.Helper()
	b, err := d.Bytes()
	if err != nil {
		t.Fatal(err)
	}
	name := filepath.Join(t.TempDir(), "note.pdf")
	if err := os.WriteFile(name, b, 0o666); err != nil {
		t.Fatal(err)
	}
	return name
}

func run(t *testing.T, name string, args ...string) string {
	t.Helper()
	out, err := exec.Command(tool(t, name), args...).CombinedOutput()
	if err != nil {
		t.Fatalf("%s %s: %v\n%s", name, strings.Join(args, " "), err, out)
	}
	return string(out)
}

func TestCheckedByQpdf(t *testing.T) {
	out := run(t, "qpdf", "--check", write(t, sample(false)))
	if strings.Contains(out, "WARNING") || !strings.Contains(out, "No syntax or stream encoding errors") {
		t.Error(out)
	}
}

func TestTextComesOut(t *testing.T) {
	out := run(t, "pdftotext", write(t, sample(false)), "-")
	if strings.Contains(out, "Error") {
		t.Errorf("the reader of the file complains:\n%s", out)
	}
	for _, want := range []string{"σ", "ε", "≤", "√", "AVATAR, To (brackets) and \\", "✓ ☐ 10⁻³ é — “quoted” × ·", "upward V"} {
		if !strings.Contains(out, want) {
			t.Errorf("%q is not in the text of the file:\n%s", want, out)
		}
	}
}

func TestFontsAreSubsets(t *testing.T) {
	out := run(t, "pdffonts", write(t, sample(false)))
	lines := strings.Split(strings.TrimSpace(out), "\n")[2:]
	if len(lines) != 4 {
		t.Fatalf("have %d fonts, want 4:\n%s", len(lines), out)
	}
	for _, line := range lines {
		f := strings.Fields(line)
		if n := len(f); f[n-5] != "yes" || f[n-4] != "yes" || f[n-3] != "yes" || !strings.Contains(f[0], "+") {
			t.Errorf("not embedded as a subset with a map to Unicode: %s", line)
		}
	}
}

func TestSameBytes(t *testing.T) {
	want, err := sample(false).Bytes()
	if err != nil {
		t.Fatal(err)
	}
	var group sync.WaitGroup
	for range 8 {
		group.Go(func() {
			have, err := sample(false).Bytes()
			if err != nil || !bytes.Equal(have, want) {
				t.Errorf("another run gives another file, error %v", err)
			}
		})
	}
	group.Wait()
}

func TestOutlineAndLinks(t *testing.T) {
	b, err := sample(true).Bytes()
	if err != nil {
		t.Fatal(err)
	}
	for want, times := range map[string]int{
		"/Subtype /Link /F 4 ":            3,
		"/Type /Outlines /Count 4":        1,
		"/Count 2>>":                      1, // Part σ, open
		"/Count -1>>":                     1, // Chapter 1, closed
		"(a/2)[5 0 R /XYZ 0 801.89 null]": 1,
		"/ID [<":                          1,
	} {
		if n := bytes.Count(b, []byte(want)); n != times {
			t.Errorf("%q is %d times in the file, want %d", want, n, times)
		}
	}
	name := write(t, sample(true))
	if out := run(t, "pdfinfo", "-dests", name); strings.Count(out, "\"a/") != 3 {
		t.Errorf("named places:\n%s", out)
	}
	if out := run(t, "pdfinfo", name); !strings.Contains(out, "Roof beam — σ ≤ f") || !strings.Contains(out, "Pages:           3") {
		t.Errorf("document data:\n%s", out)
	}
}

func TestNothingIsSilent(t *testing.T) {
	d := New(Options{Created: created})
	s := d.Sheet()
	s.Owner("step 1.1.1")
	s.Text(10, 10, draw.Serif, 10, "a\U0001D70Eb")
	s.Text(10, 30, draw.Serif, 10, "tibetan ཀ")
	s.Link(0, 0, 1, 1, "nowhere")
	s.Anchor("twice", 1, 1)
	s.Anchor("twice", 1, 2)
	d.Outline(0, "ok", "twice")
	d.Outline(2, "deep", "gone")
	_, err := d.Bytes()
	if err == nil {
		t.Fatal("no error")
	}
	for _, want := range []string{"U+1D70E", "U+0F40", "of step 1.1.1", `link to "nowhere" leads nowhere`,
		`anchor "twice" on sheet 1 and on sheet 1`, `"deep" leads to "gone"`, "level 2 under level 0"} {
		if !strings.Contains(err.Error(), want) {
			t.Errorf("error lacks %q:\n%v", want, err)
		}
	}
	if _, err := New(Options{}).Bytes(); err == nil {
		t.Error("a document without sheets gives no error")
	}
}

// The widths by which text is measured are those by which the file's reader advances.
func TestWidthsAgree(t *testing.T) {
	f := fpdf.New("P", "pt", "A4", "")
	for face := range fonts.Face(fonts.Count) {
		f.AddUTF8FontFromBytes(face.String(), "", fonts.Bytes(face))
		f.SetFont(face.String(), "", 1000)
		for r := rune(' '); r < 0x2700; r++ {
			if g := fonts.Of(face, r); g.Has && g.Advance > 0 {
				if have := f.GetStringSymbolWidth(string(r)); float64(have) != float64(int(g.Advance*1000+0.5)) {
					t.Fatalf("%v %q: file has %d, metrics %.0f", face, r, have, g.Advance*1000)
				}
			}
		}
	}
}

func BenchmarkDocument(b *testing.B) {
	for b.Loop() {
		d := New(Options{Title: "note", Created: created})
		for range 45 {
			s := d.Sheet()
			for line := range 60 {
				for col := range 20 {
					f := draw.Face(col % 3)
					s.Text(draw.Pt(50+25*col), draw.Pt(40+12*line), f, draw.Pt(7+3*(col%2)), "run of σ")
				}
				s.Line(50, draw.Pt(40+12*line), 500, draw.Pt(40+12*line), 0.3)
				s.Link(50, draw.Pt(30+12*line), 20, 10, "top")
			}
		}
		d.sheets[0].Anchor("top", 0, 0)
		if _, err := d.Bytes(); err != nil {
			b.Fatal(err)
		}
	}
}

func TestUndated(t *testing.T) {
	d := New(Options{Title: "note"})
	d.Sheet()
	out, err := d.Bytes()
	if err != nil {
		t.Fatal(err)
	}
	for _, key := range []string{"/CreationDate", "/ModDate"} {
		if bytes.Contains(out, []byte(key)) {
			t.Errorf("a document without a date carries %s", key)
		}
	}
	if !bytes.Contains(out, []byte("/Producer")) {
		t.Error("its other data are lost")
	}
}
