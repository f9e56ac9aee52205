package member

import (
	"fmt"
	"slices"
	"strings"
	"unicode/utf8"

	"soffit/calc/diag"
	"soffit/calc/node"
)

// Narrative is the text that the engineer adds to the note, in the order of the file.
type Narrative []Passage

// Passage is Markdown text for one slot of the note.
type Passage struct {
	Pos  diag.Pos // of the key
	Slot string
	Text string
}

// longestPassage is in characters.
const longestPassage = 20_000

func (r *reader) narrative(n *node.Node, to *Narrative) {
	slots := slices.Sorted(slices.Values(r.opt.Narratives))
	if n.Kind != node.Mapping {
		r.find(placeOf(n), "narrative: have "+have(n)+", want keys", "write "+either(slots)+" below, each with its text")
		return
	}
	first := map[string]int{}
	for _, e := range n.Entries {
		slot := e.Key.Text
		if line, ok := first[slot]; ok {
			r.find(placeOf(e.Key), fmt.Sprintf("%s: second time, first on line %d", clip(slot), line), "remove one of them")
			continue
		}
		first[slot] = e.Key.Pos.Line
		switch {
		case !slices.Contains(slots, slot):
			r.find(placeOf(e.Key), clip(slot)+": unknown key in narrative", instead(slot, slots))
		case e.Value.Kind == node.Broken:
		case e.Value.Kind != node.Scalar || strings.TrimSpace(e.Value.Text) == "":
			r.find(placeOf(e.Value), slot+": have "+have(e.Value)+", want text", "write | after the colon and the text on the lines below, further in")
		case utf8.RuneCountInString(e.Value.Text) > longestPassage:
			r.find(placeOf(e.Value), fmt.Sprintf("%s: have text of more than %d characters", slot, longestPassage), "shorten it")
		default:
			*to = append(*to, Passage{e.Key.Pos, slot, e.Value.Text})
		}
	}
}
