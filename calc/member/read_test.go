package member

import (
	"flag"
	"os"
	"path/filepath"
	"regexp"
	"strings"
	"testing"
)

var update = flag.Bool("update", false, "rewrite the expected findings in testdata/bad")

const (
	samples = "../../testdata/members"
	bad     = "../../testdata/bad"
)

func files(t testing.TB, dir string) map[string][]byte {
	t.Helper()
	names, err := filepath.Glob(dir + "/*.yaml")
	if err != nil || len(names) == 0 {
		t.Fatalf("no files in %s: %v", dir, err)
	}
	out := map[string][]byte{}
	for _, name := range names {
		src, err := os.ReadFile(name)
		if err != nil {
			t.Fatal(err)
		}
		out[filepath.Base(name)] = src
	}
	return out
}

// TestBad compares the findings of each bad file with those expected beside it.
func TestBad(t *testing.T) {
	distinct := map[string]bool{}
	for name, src := range files(t, bad) {
		t.Run(name, func(t *testing.T) {
			m, found := Read(name, src, testOptions)
			if m != nil || len(found) == 0 {
				t.Fatalf("no finding")
			}
			for _, f := range found {
				distinct[f.Msg] = true
			}
			golden := filepath.Join(bad, strings.TrimSuffix(name, ".yaml")+".txt")
			got := found.String() + "\n"
			if *update {
				if err := os.WriteFile(golden, []byte(got), 0o644); err != nil {
					t.Fatal(err)
				}
			}
			want, err := os.ReadFile(golden)
			if err != nil {
				t.Fatal(err)
			}
			if got != string(want) {
				t.Errorf("have\n%s\nwant\n%s", got, want)
			}
		})
	}
	if len(distinct) < 150 {
		t.Errorf("%d distinct findings", len(distinct))
	}
}

var instructs = regexp.MustCompile(`\b(write|add|begin)\b|the keys here: `)

// TestNewcomers reads what people write who see the member file for the first time: every finding says what to write.
func TestNewcomers(t *testing.T) {
	people := 0
	for name, src := range files(t, bad) {
		if !strings.HasPrefix(name, "new-") {
			continue
		}
		people++
		_, found := Read(name, src, testOptions)
		for _, f := range found {
			if !instructs.MatchString(f.Hint) {
				t.Errorf("does not say what to write: %s", f)
			}
		}
	}
	if people < 10 {
		t.Errorf("%d people", people)
	}
}
