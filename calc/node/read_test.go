package node

import (
	"fmt"
	"strings"
	"testing"
	"time"
)

// dump writes a node with its places: line:col "text", {key: …}, [ … ].
func dump(n *Node) string {
	if n == nil {
		return "nothing"
	}
	at := fmt.Sprintf("%d:%d", n.Pos.Line, n.Pos.Col)
	switch n.Kind {
	case Scalar:
		if n.Quoted {
			return fmt.Sprintf("%s+%d%q", at, n.Width, n.Text)
		}
		return at + "+" + fmt.Sprint(n.Width) + n.Text
	case List:
		var parts []string
		for _, i := range n.Items {
			parts = append(parts, dump(i))
		}
		return at + "[" + strings.Join(parts, " ") + "]"
	case Mapping:
		var parts []string
		for _, e := range n.Entries {
			parts = append(parts, dump(e.Key)+": "+dump(e.Value))
		}
		return at + "{" + strings.Join(parts, ", ") + "}"
	}
	return at + "broken"
}

// TestPlain shows that every scalar is the text that was written, at its place.
func TestPlain(t *testing.T) {
	for src, want := range map[string]string{
		"a: 010\nb: yes\nc: 2.50\nd: .nan\ne: ~\nf: null\ng: 0x1F\nh: 2031-04-07\ni: 1_000\nj: 12:30": "1:1{1:1+1a: 1:4+3010, 2:1+1b: 2:4+3yes, 3:1+1c: 3:4+42.50, 4:1+1d: 4:4+4.nan, " +
			"5:1+1e: 5:4+1~, 6:1+1f: 6:4+4null, 7:1+1g: 7:4+40x1F, 8:1+1h: 8:4+102031-04-07, 9:1+1i: 9:4+51_000, 10:1+1j: 10:4+512:30}",
		"γ_C: 1 mm²  # why\n":                "1:1{1:1+3γ_C: 1:6+51 mm²}",
		"a: 'x: y'\nb: \" z \"\n":            `1:1{1:1+1a: 1:4+6"x: y", 2:1+1b: 2:4+3"z"}`,
		"a:\nb: |\n  two\n  lines\n":         `1:1{1:1+1a: 1:3+1, 2:1+1b: 2:4+1"two\nlines"}`,
		"\uFEFFa: 1\r\nb: [x, {y: 2}]\r\n":   "1:1{1:1+1a: 1:4+11, 2:1+1b: 2:4[2:5+1x 2:8{2:9+1y: 2:12+12}]}",
		"a: 1\na: 2\n":                       "1:1{1:1+1a: 1:4+11, 2:1+1a: 2:4+12}",
		"---\na: -5\n...\n":                  "2:1{2:1+1a: 2:4+2-5}",
		"a:\n- b\n-   c\n":                   "1:1{1:1+1a: 2:1[2:3+1b 3:5+1c]}",
		"a b: 1 #2\n":                        "1:1{1:1+3a b: 1:6+11}",
		"a: {b: 45, 5 c: , d: '1',2: }\n":    `1:1{1:1+1a: 1:4{1:5+1b: 1:8+245, 1:12+35 c: 1:17+1, 1:19+1d: 1:22+3"1", 1:26+12: 1:29+1}}`,
		"a: [1,5, 2, 3 m, '4',5 m, 6 m,7 m]": `1:1{1:1+1a: 1:4[1:5+11 1:7+15 1:10+12 1:13+33 m 1:18+3"4" 1:22+35 m 1:27+36 m 1:31+37 m]}`,
		"a:\n  b: 1\n  5 m:\n":               "1:1{1:1+1a: 2:3{2:3+1b: 2:6+11, 3:3+35 m: 3:7+1}}",
		"# nothing\n":                        "nothing",
		"":                                   "nothing",
		"~":                                  "1:1+1~",
	} {
		f, found := Read("x.yaml", []byte(src))
		if len(found) > 0 || dump(f.Root) != want {
			t.Errorf("%q: have\n%s\nwant\n%s\n%s", src, dump(f.Root), want, found)
		}
	}
}

// TestFindings has what cannot be read, or must not: place, words, remedy, and what can be read of the rest.
func TestFindings(t *testing.T) {
	const alias, anchor, tag, column, sign = "write the value out; text that begins with * goes in quotes", "; text that begins with & goes in quotes",
		"; text that begins with ! goes in quotes", "bring keys of one group to one column", "put the text in quotes"
	for _, c := range []struct{ src, want, root string }{
		{"a: b: c\nd: 1", "1:5: a second colon in the line|" + sign, "1:1{1:1+1a: 1:1broken, 2:1+1d: 2:4+11}"},
		{"a:\n  b:1\n  c: 2\n", "2:4: no blank after the colon of b|write b: 1", ""},
		{"a:\n  b c:40 MPa # one\n  d: 2\n", "2:6: no blank after the colon of b c|write b c: 40 MPa", ""},
		{"a:\n  b: 1\n   c: 2\n", "3:4: a line further in than the one above|" + column, ""},
		{"a:\n  b: 1\n c: 2\n", "3:2: a line that does not fit the ones above|" + column, ""},
		{"a:\n  b\n  c: 1\n", "2:3: a key without a colon|write key: value", ""},
		{"a: 1\ntext\nb: 2\n", "2:1: have text without a key|write key: value", "1:1{1:1+1a: 1:4+11, 3:1+1b: 3:4+12}"},
		{"a: [1, 2\nb: 3\n", "1:4: a list in [ ] does not end, or lacks a comma|write [one, two]", "1:1{1:1+1a: 1:1broken, 2:1+1b: 2:4+13}"},
		{"a:\n  - {x: 1 y: 2}\n", "2:5: a mapping in { } does not end, or lacks a comma|write {key: value, key: value}", ""},
		{"a: 1\nb: 'xx\n", "2:4: text in quotes does not end|close the quotes", "1:1{1:1+1a: 1:4+11, 2:1+1b: 2:1broken}"},
		{"a: 'xx' yy\n", "1:4: text goes on after a closing quote or bracket|put the whole text in quotes", ""},
		{"a: @x\n", "1:4: a value begins with a sign that needs quotes|" + sign, ""},
		{"a: `x\n", "1:4: a value begins with a sign that needs quotes|" + sign, ""},
		{"a: \"\\q\"\n", "1:4: a backslash in double quotes|write the text in single quotes", ""},
		{"a: *x\n", "1:4: have alias *x, want the value itself|" + alias, ""},
		{"a: &x 1\nb: *x\n", "1:4: have anchor &x, want the value alone|remove &x" + anchor + "\n2:4: have alias *x, want the value itself|" + alias, "1:1{1:1+1a: 1:4broken, 2:1+1b: 2:4broken}"},
		{"a: {<<: {b: 1}, c: 2}\n", "1:5: have merge key <<, want the keys themselves|write the keys out", "1:1{1:1+1a: 1:4{1:17+1c: 1:20+12}}"},
		{"a: !!int 3\n", "1:4: have tag !!int, want the value alone|remove !!int" + tag, "1:1{1:1+1a: 1:4broken}"},
		{"a: !x y\n", "1:4: have tag !x, want the value alone|remove !x" + tag, "1:1{1:1+1a: 1:4broken}"},
		{"a: - b\n", "1:4: a list begins where a value should stand|write the list on the lines below its key, and a negative number without a blank behind the minus", ""},
		{"a: |x\n b\n", "1:4: text after the sign of a block|begin the text on the next line, further in", ""},
		{"a: ? x\n", "1:4: a value begins with ?|" + sign, ""},
		{"a: ]\n", "1:4: a value is missing|write key: value", ""},
		{"%x\na: 1\n", "1:1: a line begins with %|" + sign, "1:1{2:1+1a: 2:4+11}"},
		{"a:\n\tb: 1\n  \tc: 1\nd: [\n", "2:1: a tab at the beginning of the line, want blanks|write two blanks for each step to the right\n" +
			"3:3: a tab at the beginning of the line, want blanks|write two blanks for each step to the right\n4:4: a value is missing|write key: value", ""},
		{"a: 1\n---\nb: 2\n", "2:1: a second document begins here, want one to a file|remove the line --- above, or write the second document into a file of its own", "1:1{1:1+1a: 1:4+11}"},
		{"? [a]\n: b\n", "1:3: have a list as a key, want a word|", "1:1{}"},
		{"a: {b: 45,5 kN/m, c: 1}\n", "1:8: a comma separates entries here: have 45,5 kN/m|write 45.5 kN/m", "1:1{1:1+1a: 1:4{1:5+1b: 1:8broken, 1:19+1c: 1:22+11}}"},
		{"a: {b: -1,250kN}\n", "1:8: a comma separates entries here: have -1,250kN|write -1.250 kN or -1250 kN", ""},
		{"a: {b: 0,250 m}\n", "1:8: a comma separates entries here: have 0,250 m|write 0.250 m", ""},
		{"a: {b: 0,7}\n", "1:8: a comma separates entries here: have 0,7|write 0.7", ""},
		{"a: [1,5 m, 3,2 m]\n", "1:5: a comma separates values here: have 1,5 m|write 1.5 m; if two values are meant, give each its unit\n" +
			"1:12: a comma separates values here: have 3,2 m|write 3.2 m; if two values are meant, give each its unit", "1:1{1:1+1a: 1:4[1:5broken 1:12broken]}"},
		{"a: \xff\x00\nb: \u2028\n", "1:4: byte 0xFF is no text in UTF-8|remove it, and save the file as UTF-8\n2:4: control character U+2028 in the text|remove it, and save the file as UTF-8",
			"1:1{1:1+1a: 1:4+2��, 2:1+1b: 2:4+1�}"},
		{"\xff\xfea\x00", "1:1: file is in UTF-16, want UTF-8|save the file as UTF-8", "nothing"},
	} {
		f, found := Read("x.yaml", []byte(c.src))
		var got []string
		for _, x := range found {
			got = append(got, fmt.Sprintf("%d:%d: %s|%s", x.Line, x.Col, x.Msg, x.Hint))
		}
		if s := strings.Join(got, "\n"); s != c.want {
			t.Errorf("%q: have\n%s\nwant\n%s", c.src, s, c.want)
		}
		if c.root != "" && dump(f.Root) != c.root {
			t.Errorf("%q: have\n%s\nwant\n%s", c.src, dump(f.Root), c.root)
		}
	}
}

// TestBounds reads files made to be large, deep or many: each ends soon and is told of, or is harmless.
func TestBounds(t *testing.T) {
	if _, found := Read("x.yaml", []byte(strings.Repeat("a: 1\n", 2_000_001))); len(found) != 1 || found[0].Msg != "file of 10000005 bytes, want at most 1000000" {
		t.Errorf("10 MB: %s", found)
	}
	for _, unit := range []string{"[", "{", "a: ", "- ", "-\n", "a:\n", "? ", "&a ", "!", "'", `"`, "%", "|", "|\n", "a: *b\n", "*", "[a,", "{a: b,",
		"  - a\n", "a: 'b\n", "a: [\n", "@\n", "---\n", "\ta\n", "a: 1\n#c\n", "x: |\n a\n", "? a\n: ", "\x00\n", "\xff"} {
		src := strings.Repeat(unit, MaxBytes/len(unit))
		start := time.Now()
		f, found := Read("x.yaml", []byte(src))
		if d := time.Since(start); d > 20*time.Second {
			t.Errorf("%q took %v", unit, d)
		}
		if n := count(f.Root); n > 2*maxNodes+10 {
			t.Errorf("%q: %d nodes", unit, n)
		}
		if len(found) == 0 && unit != "'" {
			t.Errorf("%q: nothing found", unit)
		}
		for _, x := range found {
			if len(x.Msg)+len(x.Hint) > 500 {
				t.Fatalf("%q: finding of %d bytes", unit, len(x.Msg)+len(x.Hint))
			}
		}
	}
}

func count(n *Node) int {
	if n == nil {
		return 0
	}
	k := 1
	for _, e := range n.Entries {
		k += 1 + count(e.Value)
	}
	for _, i := range n.Items {
		k += count(i)
	}
	return k
}
