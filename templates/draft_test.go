package templates_test

import (
	"reflect"
	"slices"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/member"
	"soffit/calc/node"
	"soffit/calc/trace"
	"soffit/templates"
)

// TestDraftOfEachKind: there is a draft for each kind of cross-section that the member file knows, and no other.
func TestDraftOfEachKind(t *testing.T) {
	kind, _ := reflect.TypeFor[member.Shape]().FieldByName("Kind")
	kinds := strings.Split(kind.Tag.Get("words"), "|")
	slices.Sort(kinds)
	if got := templates.Drafts(); !slices.Equal(got, kinds) {
		t.Errorf("drafts of %q, kinds %q", got, kinds)
	}
	for _, kind := range []string{"double T", "double-T"} {
		if text, ok := templates.Draft(kind); !ok || !strings.Contains(string(text), "kind: double T") || templates.DraftFile(kind) != "double-T.yaml" {
			t.Errorf("no draft of %q", kind)
		}
	}
	for _, no := range []string{"", "t", "double t", "../T", "T.yaml", "rectangle/"} {
		if _, ok := templates.Draft(no); ok {
			t.Errorf("a draft of %q", no)
		}
	}
}

// TestDraftsPass: each draft reads without a finding, is of its kind, and every check of its note passes.
func TestDraftsPass(t *testing.T) {
	for _, kind := range templates.Drafts() {
		src, _ := templates.Draft(kind)
		m, found := member.Read(kind+".yaml", src, design.Options())
		if m == nil {
			t.Errorf("%s", found)
			continue
		}
		if m.Shape.Kind.Text != kind {
			t.Errorf("%s: kind %s", kind, m.Shape.Kind.Text)
		}
		n, err := design.Run(m)
		if err != nil {
			t.Errorf("%s: %v", kind, err)
			continue
		}
		checks := n.Checks()
		if len(checks) < 6 {
			t.Errorf("%s: %d checks", kind, len(checks))
		}
		for _, c := range checks {
			if c.Failed() {
				t.Errorf("%s: %s fails, ratio %s", kind, c.Name, c.Ratio[c.Worst])
			}
		}
		if proved, differences := trace.Closure(n); proved < 1000 || len(differences) > 0 {
			t.Errorf("%s: %d values proved: %v", kind, proved, differences)
		}
	}
}

// TestDraftsSayEveryKey: each key of a draft has its comment where it first stands, and the drafts together show every key
// of the member file.
func TestDraftsSayEveryKey(t *testing.T) {
	shown := map[string]bool{}
	for _, kind := range templates.Drafts() {
		src, _ := templates.Draft(kind)
		f, found := node.Read(kind, src)
		if err := found.Err(); err != nil {
			t.Fatal(err)
		}
		lines := strings.Split(string(src), "\n")
		first := map[string]bool{}
		var visit func(n *node.Node, path string)
		visit = func(n *node.Node, path string) {
			for _, item := range n.Items {
				visit(item, path)
			}
			for _, e := range n.Entries {
				at := path + "/" + e.Key.Text
				line := lines[e.Key.Pos.Line-1]
				if _, comment, _ := strings.Cut(line, " # "); !first[at] && strings.TrimSpace(comment) == "" {
					t.Errorf("%s:%d: no comment on %s", kind, e.Key.Pos.Line, at)
				}
				first[at], shown[at] = true, true
				visit(e.Value, at)
			}
		}
		visit(f.Root, "")
		for i, l := range lines {
			if len([]rune(l)) > 120 || strings.TrimRight(l, " ") != l || strings.Contains(l, "\t") {
				t.Errorf("%s:%d: too long, a tab, or a blank at the end: %s", kind, i+1, l)
			}
		}
	}
	for _, key := range keys(reflect.TypeFor[member.Member](), "", map[reflect.Type]bool{}) {
		if !shown[key] {
			t.Errorf("no draft shows %s", key)
		}
	}
}

// keys are the keys of the member file with the groups in which they stand; of groups of one type, those of the first.
func keys(t reflect.Type, path string, seen map[reflect.Type]bool) []string {
	if seen[t] {
		return nil
	}
	seen[t] = true
	var out []string
	for i := range t.NumField() {
		f := t.Field(i)
		key := strings.TrimSuffix(f.Tag.Get("key"), "?")
		if key == "" {
			continue
		}
		at := path + "/" + key
		out = append(out, at)
		below := f.Type
		if below.Kind() == reflect.Slice {
			below = below.Elem()
		}
		if below.Kind() == reflect.Struct {
			out = append(out, keys(below, at, seen)...)
		}
	}
	return out
}
