package main

import (
	"os"
	"os/exec"
	"regexp"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/ec2"
	"soffit/calc/member"
)

// TestReadme runs every command of the README in the order in which it stands there, but for the test command
// itself, which is what runs this.
func TestReadme(t *testing.T) {
	data, err := os.ReadFile("../../README.md")
	if err != nil {
		t.Fatal(err)
	}
	blocks := regexp.MustCompile("(?s)```sh\n(.*?)```").FindAllStringSubmatch(string(data), -1)
	ran, tests := 0, 0
	out := t.TempDir()
	for _, b := range blocks {
		for _, line := range strings.Split(strings.TrimSpace(b[1]), "\n") {
			if line == "go test ./..." {
				tests++
				continue
			}
			if !strings.HasPrefix(line, "go run ./cmd/soffit ") {
				t.Errorf("a command that no test runs: %s", line)
				continue
			}
			line = strings.ReplaceAll(line, "--out notes", "--out "+out)
			cmd := exec.Command("sh", "-c", line)
			cmd.Dir = "../.."
			if text, err := cmd.CombinedOutput(); err != nil {
				t.Errorf("%s: %v\n%s", line, err, text)
			}
			ran++
		}
	}
	if ran < 1 || tests != 1 {
		t.Errorf("%d commands run, %d test commands", ran, tests)
	}
	entries, err := os.ReadDir(out)
	if err != nil || len(entries) < 2 {
		t.Errorf("the sample note is not there: %v", err)
	}
}

// TestReadmeWords: the README names every kind of section, product, category, national parameter and chapter that the member
// file takes.
func TestReadmeWords(t *testing.T) {
	data, err := os.ReadFile("../../README.md")
	if err != nil {
		t.Fatal(err)
	}
	readme := string(data)
	var words []string
	for _, p := range ec2.Products {
		words = append(words, p.Name)
	}
	for _, p := range ec2.Parameters {
		words = append(words, p.Given.Symbol)
	}
	words = append(words, ec2.Categories[len("ABCDEFGH"):]...)
	words = append(words, design.Narratives...)
	for _, kind := range member.ShapeKinds() {
		words = append(words, "`"+kind+"`")
	}
	if len(words) < 50 {
		t.Errorf("%d words", len(words))
	}
	for _, w := range words {
		if !strings.Contains(readme, w) {
			t.Errorf("README.md does not name %s", w)
		}
	}
}
