package main

import (
	"bytes"
	"os"
	"os/exec"
	"path/filepath"
	"strings"
	"testing"
)

// tool finds an outside program; without it the test is skipped and says so, but where CI is set it fails.
func tool(t *testing.T, name string) string {
	t.Helper()
	path, err := exec.LookPath(name)
	if err != nil {
		if os.Getenv("CI") != "" {
			t.Fatalf("%s is not installed", name)
		}
		t.Skipf("%s is not installed: the note is not checked by it", name)
	}
	return path
}

func output(t *testing.T, name string, args ...string) string {
	t.Helper()
	out, err := exec.Command(tool(t, name), args...).CombinedOutput()
	if err != nil {
		t.Fatalf("%s %v: %v\n%s", name, args, err, out)
	}
	return string(out)
}

// TestNotesFromOutside holds the note of every sample against qpdf and the poppler tools.
func TestNotesFromOutside(t *testing.T) {
	files, err := filepath.Glob("../../testdata/members/*.yaml")
	if err != nil || len(files) < 2 {
		t.Fatalf("%d samples: %v", len(files), err)
	}
	dir := t.TempDir()
	var out, problems bytes.Buffer
	if code := run(append([]string{"note", "--out", dir}, files...), &out, &problems); code == noNote {
		t.Fatalf("%s%s", out.String(), problems.String())
	}
	for _, file := range files {
		pdf := filepath.Join(dir, strings.TrimSuffix(filepath.Base(file), ".yaml")+".pdf")
		if text := output(t, "qpdf", "--check", pdf); strings.Contains(text, "WARNING") {
			t.Errorf("%s: %s", pdf, text)
		}
		for _, line := range strings.Split(strings.TrimSpace(output(t, "pdffonts", pdf)), "\n")[2:] {
			// name, type of one to two words, encoding, emb, sub, uni, object: the three flags are counted from the end
			f := strings.Fields(line)
			if len(f) < 5 || f[len(f)-5] != "yes" || f[len(f)-4] != "yes" || f[len(f)-3] != "yes" {
				t.Errorf("%s: a font that is not embedded, not a subset or without a map to Unicode: %s", pdf, line)
			}
		}
		text := output(t, "pdftotext", pdf, "-")
		for _, sign := range []string{"σ", "ε", "≤", "Δ", "λ", "sheet 1 of "} {
			if !strings.Contains(text, sign) {
				t.Errorf("%s: %s does not come out as text", pdf, sign)
			}
		}
		if strings.Contains(file, "hollow-") && !strings.Contains(text, "√") {
			t.Errorf("%s: √ does not come out as text", pdf)
		}
		if strings.Contains(text, "NaN") || strings.Contains(text, "+Inf") {
			t.Errorf("%s: a value that is no number", pdf)
		}
	}
}
