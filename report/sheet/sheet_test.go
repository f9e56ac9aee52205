package sheet

import (
	"bytes"
	"fmt"
	"strings"
	"testing"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// faults are all faults of layout of a note, sheet by sheet.
func faults(t testing.TB, l *layout) []string {
	t.Helper()
	var out []string
	anchors := map[string]bool{}
	links := map[string]bool{}
	for i := range l.pages {
		r := &draw.Recorder{}
		l.draw(i, r)
		for _, f := range r.Faults() {
			out = append(out, fmt.Sprintf("sheet %d: %s", i+1, f))
		}
		owners := map[string]bool{}
		for _, k := range r.Ink {
			owners[k.Owner] = true
		}
		for o := range owners {
			area, ok := Area(o)
			if !ok {
				out = append(out, fmt.Sprintf("sheet %d: ink of %q belongs to no column", i+1, o))
				continue
			}
			for _, f := range r.Outside(area, func(owner string) bool { return owner == o }) {
				out = append(out, fmt.Sprintf("sheet %d: %s", i+1, f))
			}
		}
		for _, a := range r.Anchors {
			if anchors[a.Name] {
				out = append(out, fmt.Sprintf("sheet %d: anchor %s a second time", i+1, a.Name))
			}
			anchors[a.Name] = true
		}
		for _, k := range r.Links {
			links[k.Anchor] = true
		}
	}
	for a := range links {
		if !anchors[a] {
			out = append(out, fmt.Sprintf("a link to %s leads nowhere", a))
		}
	}
	return out
}

func TestEverySheetIsClean(t *testing.T) {
	l, err := layOut(fixture(t, 3))
	if err != nil {
		t.Fatal(err)
	}
	for _, f := range faults(t, l) {
		t.Error(f)
	}
}

func TestFootFitsTwoLines(t *testing.T) {
	n := fixture(t, 1)
	n.Document.Program = "Soffit 10.12.100-trial"
	l, err := layOut(n)
	if err != nil {
		t.Fatal(err)
	}
	if got := len(l.furniture.caution); got != 2 {
		t.Errorf("the caution at the foot takes %d lines, want 2", got)
	}
	all := strings.Join(l.furniture.caution, " ")
	for _, want := range []string{"take precedence", "competent, licensed engineer must check", "can kill"} {
		if !strings.Contains(all, want) {
			t.Errorf("the foot does not say %q", want)
		}
	}
}

// TestHostileDocument sets the longest words a member file can bring, and none at all.
func TestHostileDocument(t *testing.T) {
	long := strings.Repeat("a beam with a name that goes on and on ", 6)
	word := strings.Repeat("unbreakable", 14)
	for name, d := range map[string]trace.Document{
		"nothing": {},
		"long": {Program: "Soffit 0.1", Project: long, Title: long, Number: long, Revision: long, Status: long, InputName: long,
			Roles:    []trace.Role{{Role: "prepared", Name: long, Organisation: long, Date: "2026-03-12"}, {Role: "countersigned by " + long, Name: long}},
			History:  []trace.Issue{{Revision: long, Date: "2026-02-20", Text: long + long + long}},
			Drawings: []trace.Drawing{{Number: long, Revision: long, Title: long}}, Input: long + long + "\r\n\x00\x1b\n" + word},
		"words": {Program: "Soffit 0.1", Project: word, Title: word, Number: word, Revision: word, Status: word, InputName: word,
			Roles:    []trace.Role{{Role: "prepared", Name: word, Organisation: word, Date: "2026-03-12"}},
			History:  []trace.Issue{{Revision: word, Date: "2026-02-20", Text: word}},
			Drawings: []trace.Drawing{{Number: word, Revision: word, Title: word}}, Input: strings.Repeat("a\n", 400)},
	} {
		n := fixture(t, 1)
		n.Document = d
		for _, b := range n.Chapters[1].Blocks {
			for _, e := range b.Entries {
				e.Common().Name = strings.TrimSpace(d.Title)
			}
		}
		l, err := layOut(n)
		if err != nil {
			t.Errorf("%s: %v", name, err)
			continue
		}
		for _, f := range faults(t, l) {
			t.Errorf("%s: %s", name, f)
		}
	}
}

func TestFaultsOfANoteAreErrors(t *testing.T) {
	n := fixture(t, 1)
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		if t, ok := e.(*trace.Table); ok {
			t.Columns = append(t.Columns, "basis.limits/limits")
		}
	})
	if _, err := Render(n, Options{}); err == nil || !strings.Contains(err.Error(), "basis.limits/limits") {
		t.Errorf("have %v, want an error that names the column without values", err)
	}
	n = fixture(t, 1)
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		if t, ok := e.(*trace.Text); ok {
			t.Markdown += " <b>bold</b>"
		}
	})
	if _, err := Render(n, Options{}); err == nil || !strings.Contains(err.Error(), "HTML") {
		t.Errorf("have %v, want an error about HTML", err)
	}
}

func TestEveryEntryIsReached(t *testing.T) {
	n := fixture(t, 1)
	l, err := layOut(n)
	if err != nil {
		t.Fatal(err)
	}
	at := map[string]int{}
	all := map[string]bool{}
	for i, p := range l.pages {
		r := &draw.Recorder{}
		l.draw(i, r)
		for _, a := range r.Anchors {
			at[a.Name] = i + 1
		}
		for _, s := range r.Texts() {
			all[s] = true
		}
		if !all[fmt.Sprintf("sheet %d of %d", i+1, len(l.pages))] {
			t.Errorf("sheet %d does not say which it is", i+1)
		}
		_ = p
	}
	last := 0
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		h := e.Common()
		if at[h.Key] == 0 {
			t.Errorf("%s stands on no sheet", h.Key)
		}
		if _, float := e.(*trace.Figure); !float {
			if at[h.Key] < last {
				t.Errorf("%s stands on sheet %d, before what comes before it", h.Key, at[h.Key])
			}
			last = at[h.Key]
		}
	})
}

func TestSameBytes(t *testing.T) {
	a, err := Render(fixture(t, 1), Options{})
	if err != nil {
		t.Fatal(err)
	}
	record, err := fixture(t, 1).JSON()
	if err != nil {
		t.Fatal(err)
	}
	again, err := trace.Read(bytes.NewReader(record))
	if err != nil {
		t.Fatal(err)
	}
	b, err := Render(again, Options{})
	if err != nil {
		t.Fatal(err)
	}
	if !bytes.Equal(a, b) {
		t.Error("a note read back from its record gives another file")
	}
}

func BenchmarkRender(b *testing.B) {
	n := fixture(b, 8)
	l, err := layOut(n)
	if err != nil {
		b.Fatal(err)
	}
	for b.Loop() {
		if _, err := Render(n, Options{}); err != nil {
			b.Fatal(err)
		}
	}
	b.ReportMetric(float64(len(l.pages)), "sheets")
}

func BenchmarkLayOut(b *testing.B) {
	n := fixture(b, 8)
	for b.Loop() {
		if _, err := layOut(n); err != nil {
			b.Fatal(err)
		}
	}
}
