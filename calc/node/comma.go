package node

import (
	"fmt"
	"regexp"
	"strings"
)

var (
	whole    = regexp.MustCompile(`^[+\-−]?[0-9]+$`)          // a number as it stands before a decimal comma
	behind   = regexp.MustCompile(`^[0-9]+`)                  // the digits behind one
	measured = regexp.MustCompile(`^[0-9]+ ?[\pL%‰°µ][^:]*$`) // the digits behind one, and a unit
)

// adjoins reports whether only a comma stands between two scalars that read like a number with a decimal comma.
func adjoins(a, b *Node) bool {
	return a.Kind == Scalar && b.Kind == Scalar && !a.Quoted && !b.Quoted && whole.MatchString(a.Text) && behind.MatchString(b.Text) &&
		a.Pos.Line == b.Pos.Line && a.Pos.Col+a.Width+1 == b.Pos.Col
}

// commas finds decimal commas in { }, where they separate entries: {load: 45,5 kN/m} has a load of 45 and a key "5 kN/m"
// without a value. Nothing else is said of the two.
func (w *walker) commas(n *Node) {
	var kept []Entry
	for _, e := range n.Entries {
		if k := len(kept) - 1; k >= 0 && e.Value.Empty() && !e.Value.Quoted && adjoins(kept[k].Value, e.Key) {
			kept[k].Value = w.comma(kept[k].Value, e.Key, "entries", "")
			continue
		}
		kept = append(kept, e)
	}
	n.Entries = kept
}

// listCommas finds them in [ ]: [1,5 m, 3,2 m] has four values. A number without a unit, a comma without a blank and a
// number with one can be nothing else.
func (w *walker) listCommas(n *Node) {
	var kept []*Node
	for _, item := range n.Items {
		if k := len(kept) - 1; k >= 0 && item.Kind == Scalar && measured.MatchString(item.Text) && adjoins(kept[k], item) {
			kept[k] = w.comma(kept[k], item, "values", "; if two values are meant, give each its unit")
			continue
		}
		kept = append(kept, item)
	}
	n.Items = kept
}

// comma finds one; three digits behind it may be thousands.
func (w *walker) comma(a, b *Node, what, more string) *Node {
	width := a.Width + 1 + b.Width
	digits := behind.FindString(b.Text)
	tail := strings.TrimSpace(b.Text[len(digits):])
	if tail != "" {
		tail = " " + clip(tail)
	}
	hint := "write " + a.Text + "." + digits + tail
	if len(digits) == 3 && strings.TrimLeft(a.Text, "+-−")[0] != '0' {
		hint += " or " + a.Text + digits + tail
	}
	w.find(a.Pos, width, fmt.Sprintf("a comma separates %s here: have %s,%s", what, a.Text, clip(b.Text)), hint+more)
	return &Node{Kind: Broken, Pos: a.Pos, Width: width}
}
