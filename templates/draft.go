package templates

import (
	"embed"
	"slices"
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
		kinds = append(kinds, strings.ReplaceAll(strings.TrimSuffix(e.Name(), ".yaml"), "-", " "))
	}
	slices.Sort(kinds)
	return kinds
}

// DraftFile is the name of the file for a kind: "double T" in double-T.yaml.
func DraftFile(kind string) string { return strings.ReplaceAll(kind, " ", "-") + ".yaml" }

// Draft is the member file to start from for a kind of cross-section, "double T" or "double-T"; ok is false where there is
// none.
func Draft(kind string) (text []byte, ok bool) {
	text, err := drafts.ReadFile("drafts/" + DraftFile(kind))
	return text, err == nil
}
