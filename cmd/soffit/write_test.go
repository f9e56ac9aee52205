package main

import (
	"os"
	"path/filepath"
	"testing"
)

// TestOldSetOrNew: where the second file cannot be put in place, the first is as it was, and nothing is left beside.
func TestOldSetOrNew(t *testing.T) {
	dir := t.TempDir()
	first, second := filepath.Join(dir, "a.pdf"), filepath.Join(dir, "a.json")
	if err := os.WriteFile(first, []byte("old"), 0o644); err != nil {
		t.Fatal(err)
	}
	if err := os.Mkdir(second, 0o755); err != nil {
		t.Fatal(err)
	}
	if err := write(piece{first, []byte("new")}, piece{second, []byte("new")}); err == nil {
		t.Fatal("a folder was written over")
	}
	if data, _ := os.ReadFile(first); string(data) != "old" {
		t.Errorf("the first file is %q", data)
	}
	if err := os.Remove(second); err != nil {
		t.Fatal(err)
	}
	if err := write(piece{first, []byte("new")}, piece{second, []byte("new")}); err != nil {
		t.Fatal(err)
	}
	entries, err := os.ReadDir(dir)
	if err != nil || len(entries) != 2 {
		t.Errorf("%d files, want the two: %v", len(entries), err)
	}
	for _, f := range []string{first, second} {
		if data, _ := os.ReadFile(f); string(data) != "new" {
			t.Errorf("%s is %q", f, data)
		}
	}
}
