package main

import (
	"bytes"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/sheet"
	"soffit/templates"
)

// variants are the samples, one of them with a load that makes a check fail, and the drafts.
func variants(t testing.TB) map[string][]byte {
	t.Helper()
	files, err := filepath.Glob("../../testdata/members/*.yaml")
	if err != nil || len(files) < 2 {
		t.Fatalf("%d samples: %v", len(files), err)
	}
	out := map[string][]byte{}
	for _, f := range files {
		src, err := os.ReadFile(f)
		if err != nil {
			t.Fatal(err)
		}
		out[filepath.Base(f)] = src
		if heavy := bytes.Replace(src, []byte("uniform: 5.2 kN/m"), []byte("uniform: 9 kN/m"), 1); !bytes.Equal(heavy, src) {
			out["overloaded-"+filepath.Base(f)] = heavy
		}
	}
	if len(out) <= len(files) {
		t.Fatal("no sample is overloaded")
	}
	for _, kind := range templates.Drafts() {
		out["draft-"+kind+".yaml"], _ = templates.Draft(kind)
	}
	return out
}

func record(t testing.TB, name string, src []byte) *trace.Note {
	t.Helper()
	m, findings := member.Read(name, src, design.Options())
	if err := findings.Err(); err != nil {
		t.Fatal(err)
	}
	n, err := design.Run(m)
	if err != nil {
		t.Fatal(err)
	}
	return n
}

// TestEverySheet draws every sheet of every sample on a recorder: no overlapping ink, nothing outside its column, no
// missing glyph, and every link leads somewhere.
func TestEverySheet(t *testing.T) {
	for name, src := range variants(t) {
		var sheets []*draw.Recorder
		err := sheet.Draw(record(t, name, src), func(int, int) draw.Canvas {
			sheets = append(sheets, &draw.Recorder{})
			return sheets[len(sheets)-1]
		})
		if err != nil {
			t.Fatal(err)
		}
		if len(sheets) < 20 {
			t.Errorf("%s: only %d sheets", name, len(sheets))
		}
		anchors := map[string]bool{}
		for i, r := range sheets {
			for _, f := range r.Faults() {
				t.Errorf("%s, sheet %d: %s", name, i+1, f)
			}
			owners := map[string]bool{}
			for _, k := range r.Ink {
				owners[k.Owner] = true
			}
			for o := range owners {
				area, ok := sheet.Area(o)
				if !ok {
					t.Errorf("%s, sheet %d: ink of %q belongs to no column", name, i+1, o)
					continue
				}
				for _, f := range r.Outside(area, func(owner string) bool { return owner == o }) {
					t.Errorf("%s, sheet %d: %s", name, i+1, f)
				}
			}
			for _, a := range r.Anchors {
				anchors[a.Name] = true
			}
		}
		for i, r := range sheets {
			for _, l := range r.Links {
				if !anchors[l.Anchor] {
					t.Errorf("%s, sheet %d: a link to %s leads nowhere", name, i+1, l.Anchor)
				}
			}
		}
	}
}

// TestReadBackGivesTheSameNote: the note is made from the record alone, so the record read back gives the same bytes.
func TestReadBackGivesTheSameNote(t *testing.T) {
	for name, src := range variants(t) {
		n := record(t, name, src)
		data, err := n.JSON()
		if err != nil {
			t.Fatal(err)
		}
		back, err := trace.Read(bytes.NewReader(data))
		if err != nil {
			t.Fatal(err)
		}
		first, err := sheet.Render(n, sheet.Options{})
		if err != nil {
			t.Fatal(err)
		}
		second, err := sheet.Render(back, sheet.Options{})
		if err != nil {
			t.Fatal(err)
		}
		if !bytes.Equal(first, second) {
			t.Errorf("%s: the note from the record read back differs", name)
		}
	}
}

// BenchmarkNote is the whole note: member file to PDF and record.
func BenchmarkNote(b *testing.B) {
	for name, src := range variants(b) {
		b.Run(strings.TrimSuffix(name, ".yaml"), func(b *testing.B) {
			for b.Loop() {
				n := record(b, name, src)
				if _, err := n.JSON(); err != nil {
					b.Fatal(err)
				}
				if _, err := sheet.Render(n, sheet.Options{}); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}

// BenchmarkSheets is the drawing of the note alone.
func BenchmarkSheets(b *testing.B) {
	for name, src := range variants(b) {
		n := record(b, name, src)
		b.Run(strings.TrimSuffix(name, ".yaml"), func(b *testing.B) {
			for b.Loop() {
				if _, err := sheet.Render(n, sheet.Options{}); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}
