package design_test

import (
	"bytes"
	"os"
	"path/filepath"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/trace"
)

// samples are the member files of testdata.
func samples(t testing.TB) []string {
	t.Helper()
	files, err := filepath.Glob("../../testdata/members/*.yaml")
	if err != nil || len(files) < 2 {
		t.Fatalf("%d samples: %v", len(files), err)
	}
	return files
}

func read(t testing.TB, file string) *member.Member {
	t.Helper()
	src, err := os.ReadFile(file)
	if err != nil {
		t.Fatal(err)
	}
	m, findings := member.Read(filepath.Base(file), src, design.Options())
	if err := findings.Err(); err != nil {
		t.Fatal(err)
	}
	return m
}

func run(t testing.TB, file string) *trace.Note {
	t.Helper()
	n, err := design.Run(read(t, file))
	if err != nil {
		t.Fatal(err)
	}
	return n
}

// TestClosure proves every step, choice and check of every sample from its JSON alone, and that rounding moves no
// check by 0.002.
func TestClosure(t *testing.T) {
	for _, file := range samples(t) {
		n := run(t, file)
		data, err := n.JSON()
		if err != nil {
			t.Fatal(err)
		}
		back, err := trace.Read(bytes.NewReader(data))
		if err != nil {
			t.Fatal(err)
		}
		proved, differences := trace.Closure(back)
		for _, d := range differences {
			t.Errorf("%s: %v", file, d)
		}
		effect, check := n.Rounding()
		t.Logf("%s: %d values proved, %d bytes; rounding moves a check by %.5f at most (%s)", filepath.Base(file), proved, len(data), effect, check.Name)
		if !(effect < 0.002) {
			t.Errorf("%s: rounding moves %s by %g", file, check.Name, effect)
		}
		for _, c := range n.Checks() {
			t.Logf("%s %s: ratio %s at %s, fails %v", c.Number, c.Name, c.Ratio[c.Worst], trace.RowName(c.Axes, c.Worst), c.Failed())
		}
	}
}
