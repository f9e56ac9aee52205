// Package templates holds the standing texts of a note, in Markdown, so that an office can read and review
// them as they are printed.
package templates

import (
	"embed"
	"fmt"
	"strings"
)

//go:embed *.md
var files embed.FS

// Text is the standing text of a chapter by name ("bending"), in Markdown; {symbol} in it stands for the value
// of that symbol where the text is printed. It panics on a name that there is no text for: the names are
// written in the program.
func Text(name string) string {
	data, err := files.ReadFile(name + ".md")
	if err != nil {
		panic(fmt.Sprintf("templates: %v", err))
	}
	return strings.TrimSpace(string(data))
}
