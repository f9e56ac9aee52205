package main

import (
	"encoding/json"
	"errors"
	"io"
	"os/exec"
	"strings"
	"testing"
)

// pack is what `go list -json` says of a package.
type pack struct {
	ImportPath           string
	Imports, TestImports []string
	XTestImports         []string
	Standard             bool
}

func packages(t *testing.T) []pack {
	t.Helper()
	cmd := exec.Command("go", "list", "-json=ImportPath,Imports,TestImports,XTestImports,Standard", "soffit/...")
	out, err := cmd.Output()
	if err != nil {
		t.Fatal(err)
	}
	var list []pack
	d := json.NewDecoder(strings.NewReader(string(out)))
	for {
		var p pack
		if err := d.Decode(&p); errors.Is(err, io.EOF) {
			return list
		} else if err != nil {
			t.Fatal(err)
		}
		list = append(list, p)
	}
}

// TestDirection: calculation never imports the report; the report never imports design or member file; each outside
// package is imported in one place.
func TestDirection(t *testing.T) {
	home := map[string]string{
		"gopkg.in/yaml.v3":               "soffit/calc/node",
		"github.com/yuin/goldmark":       "soffit/report/text",
		"github.com/go-pdf/fpdf":         "soffit/report/pdf",
		"github.com/alecthomas/kong":     "soffit/cmd/soffit",
		"github.com/go-fonts/liberation": "soffit/fonts",
		"github.com/go-fonts/dejavu":     "soffit/fonts",
		"golang.org/x/image":             "soffit/fonts",
	}
	list := packages(t)
	if len(list) < 15 {
		t.Fatalf("only %d packages listed", len(list))
	}
	for _, p := range list {
		for _, i := range p.Imports {
			switch {
			case strings.HasPrefix(p.ImportPath, "soffit/calc") && strings.HasPrefix(i, "soffit/report"):
				t.Errorf("%s imports %s", p.ImportPath, i)
			case strings.HasPrefix(p.ImportPath, "soffit/report") && (i == "soffit/calc/design" || i == "soffit/calc/member" || i == "soffit/calc/node"):
				t.Errorf("%s imports %s", p.ImportPath, i)
			}
			first, _, _ := strings.Cut(i, "/")
			if strings.HasPrefix(i, "soffit/") || !strings.Contains(first, ".") {
				continue
			}
			allowed := ""
			for module, place := range home {
				if i == module || strings.HasPrefix(i, module+"/") {
					allowed = place
				}
			}
			if allowed != p.ImportPath {
				t.Errorf("%s imports %s, which has its place in %q", p.ImportPath, i, allowed)
			}
		}
	}
}
