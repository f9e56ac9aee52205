package templates

import (
	"embed"
	"strings"
)

//go:embed drafts/*.yaml
var drafts embed.FS

// Drafts are the kinds of cross-section that there is a member file to start from for, in alphabetical order.
func Drafts() []string {
	entries, err := drafts.ReadDir("drafts")
	if err != nil {
		panic("templates: " + err.Error()) // the folder is in the program
	}
	var kinds []string
	for _, e := range entries {
		kinds = append(kinds, strings.TrimSuffix(e.Name(), ".yaml"))
	}
	return kinds
}

// Draft is the member file to start from for a kind of cross-section; ok is false where there is none.
func Draft(kind string) (text []byte, ok bool) {
	text, err := drafts.ReadFile("drafts/" + kind + ".yaml")
	return text, err == nil
}
