package diag

import (
	"strings"
	"testing"
)

func TestString(t *testing.T) {
	for _, c := range []struct {
		name string
		f    Finding
		want string
	}{
		{"whole", Finding{"beam.yaml", Pos{14, 10}, "e_mid: have 350 kN, want a length", "  e_mid: 350 kN", 6, "write 350 mm"},
			"beam.yaml:14:10: e_mid: have 350 kN, want a length\n" +
				"   14 |   e_mid: 350 kN\n" +
				"      |          ^\n" +
				"hint: write 350 mm"},
		{"no place, no hint", Finding{File: "beam.yaml", Msg: "and 12 findings more"}, "beam.yaml: and 12 findings more"},
		{"no line to show", Finding{File: "b.yaml", Pos: Pos{1, 1}, Msg: "the file is empty"}, "b.yaml:1:1: the file is empty"},
		{"tab under tab", Finding{"b.yaml", Pos{3, 3}, "m", "\tab", 1, ""}, "b.yaml:3:3: m\n    3 | \tab\n      | \t ^"},
		{"columns are characters", Finding{"b.yaml", Pos{3, 7}, "m", "γ_C: é5", 1, ""}, "b.yaml:3:7: m\n    3 | γ_C: é5\n      |       ^"},
		{"behind the end", Finding{"b.yaml", Pos{3, 99}, "m", "ab", 1, ""}, "b.yaml:3:99: m\n    3 | ab\n      |   ^"},
		{"nothing unprintable", Finding{"b.yaml", Pos{1, 1}, "have \x1b[2J", "\x1b[2J\xff", 1, "write \x00"},
			"b.yaml:1:1: have �[2J\n    1 | �[2J�\n      | ^\nhint: write �"},
	} {
		if got := c.f.String(); got != c.want {
			t.Errorf("%s: have\n%s\nwant\n%s", c.name, got, c.want)
		}
	}
}

func TestLongLine(t *testing.T) {
	long := strings.Repeat("a", 500) + "X" + strings.Repeat("b", 500)
	for col, first := range map[int]string{1: "a", 60: "a", 501: "X", 1001: "b"} {
		lines := strings.Split(Finding{"f", Pos{1, col}, "m", long, 1, ""}.String(), "\n")
		at := strings.Index(lines[2], "^")
		shown := []rune(lines[1])
		if len(shown) > longest+12 || string(shown[at]) != first {
			t.Errorf("column %d: caret at %q of %q", col, string(shown[at:]), lines[1])
		}
	}
}

func TestListSort(t *testing.T) {
	at := func(file string, line, col int, msg string) Finding {
		return Finding{File: file, Pos: Pos{line, col}, Msg: msg}
	}
	var l List
	if l.Err() != nil {
		t.Error("an empty list is no error")
	}
	l.Add(at("b", 1, 1, "x"), at("a", 10, 1, "x"), at("a", 9, 2, "x"), at("a", 9, 2, "w"), at("a", 9, 1, "z"), at("a", 10, 1, "x"))
	l.Sort()
	const want = "a:9:1: z\n\na:9:2: w\n\na:9:2: x\n\na:10:1: x\n\nb:1:1: x"
	if got := l.Err().Error(); got != want {
		t.Errorf("have\n%s\nwant\n%s", got, want)
	}
	if !(Pos{1, 2}).Before(Pos{2, 1}) || (Pos{1, 2}).Before(Pos{1, 2}) || !(Pos{1, 1}).Before(Pos{1, 2}) {
		t.Error("Before")
	}
}
