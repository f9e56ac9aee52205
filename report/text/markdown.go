package text

import (
	"fmt"
	"strings"
	"unicode/utf8"

	"github.com/yuin/goldmark"
	"github.com/yuin/goldmark/ast"
	"github.com/yuin/goldmark/extension"
	extast "github.com/yuin/goldmark/extension/ast"
	"github.com/yuin/goldmark/parser"
	gm "github.com/yuin/goldmark/text"
	"github.com/yuin/goldmark/util"

	"soffit/fonts"
	"soffit/report/draw"
	"soffit/report/mathset"
)

// Values resolves {key} in narrative: a symbol of the chapter, {M_Rd}, or an entry's full key.
type Values func(key string) (mathset.Operand, error)

// Trouble is something in narrative that cannot be set: Line from 1 in its source, what is wrong, and
// what to write instead.
type Trouble struct {
	Line int
	Msg  string
	Hint string
}

// Error is the trouble in one line.
func (t Trouble) Error() string {
	s := fmt.Sprintf("line %d: %s", t.Line, t.Msg)
	if t.Hint != "" {
		s += "; " + t.Hint
	}
	return s
}

// Narrative is text read from Markdown.
type Narrative struct{ blocks []block }

// block is one of *prose, *heading, *list, *quote, *listing, *table, *line.
type block interface {
	lines(width draw.Pt, s Style) []Line
}

type prose struct{ Paragraph }

type heading struct {
	level int
	text  Paragraph
}

type list struct {
	ordered bool
	start   int
	tight   bool
	items   [][]block
}

type quote struct{ blocks []block }

type listing struct{ text []string }

type line struct{}

// The reader knows paragraphs, headings, lists, quotations, code, links within the note and tables, no
// HTML and no pictures.
var reader = goldmark.New(
	goldmark.WithExtensions(extension.Table, extension.NewTypographer(extension.WithTypographicSubstitutions(signs))),
	goldmark.WithParserOptions(parser.WithInlineParsers(util.Prioritized(valueParser{}, 150))),
)

var signs = extension.TypographicSubstitutions{
	extension.LeftSingleQuote:  []byte("‘"),
	extension.RightSingleQuote: []byte("’"),
	extension.LeftDoubleQuote:  []byte("“"),
	extension.RightDoubleQuote: []byte("”"),
	extension.EnDash:           []byte("–"),
	extension.EmDash:           []byte("—"),
	extension.Ellipsis:         []byte("…"),
	extension.LeftAngleQuote:   []byte("«"),
	extension.RightAngleQuote:  []byte("»"),
	extension.Apostrophe:       []byte("’"),
}

// Read reads narrative in Markdown. `code` is set as mathematics where it is a symbol, an expression or a
// condition in the notation of formulas, else in the typewriter face; {key} becomes its value. Trouble is
// told in the order of the text; what is wrong is left out of the narrative or stands as it was written.
func Read(src string, values Values) (Narrative, []Trouble) {
	src = strings.NewReplacer("\r\n", "\n", "\r", "\n").Replace(src)
	r := walker{src: []byte(strings.ToValidUTF8(src, "\uFFFD")), values: values}
	r.settable(src)
	doc := reader.Parser().Parse(gm.NewReader(r.src))
	n := Narrative{r.blocks(doc)}
	return n, r.troubles
}

type walker struct {
	src      []byte
	values   Values
	troubles []Trouble
	at       int // line of the block being read
}

func (w *walker) trouble(line int, hint, format string, args ...any) {
	w.troubles = append(w.troubles, Trouble{line, fmt.Sprintf(format, args...), hint})
}

// settable finds what no typeface of the note can set.
func (w *walker) settable(src string) {
	line := 1
	seen := map[rune]bool{}
	for i, r := range src {
		_, n := utf8.DecodeRuneInString(src[i:])
		switch {
		case r == '\n':
			line++
		case r == '\t' || seen[r]:
		case r == utf8.RuneError && n == 1:
			seen[r] = true
			w.trouble(line, "write UTF-8", "a byte that is no letter")
		case !fonts.Has(fonts.Serif, r) && !fonts.Has(fonts.Marks, r):
			seen[r] = true
			w.trouble(line, "", "no typeface of the note has the sign %q (U+%04X)", r, r)
		}
	}
}

func (w *walker) lineOf(offset int) int { return 1 + strings.Count(string(w.src[:offset]), "\n") }

func (w *walker) blocks(parent ast.Node) []block {
	var out []block
	for n := parent.FirstChild(); n != nil; n = n.NextSibling() {
		if n.Type() == ast.TypeBlock && n.Kind() != ast.KindList && n.Lines().Len() > 0 {
			w.at = w.lineOf(n.Lines().At(0).Start)
		}
		switch n := n.(type) {
		case *ast.Paragraph, *ast.TextBlock:
			out = append(out, prose{w.runs(n, draw.Serif, "")})
		case *ast.Heading:
			out = append(out, &heading{n.Level, w.runs(n, draw.Bold, "")})
		case *ast.List:
			l := &list{ordered: n.IsOrdered(), start: n.Start, tight: n.IsTight}
			for i := n.FirstChild(); i != nil; i = i.NextSibling() {
				l.items = append(l.items, w.blocks(i))
			}
			out = append(out, l)
		case *ast.Blockquote:
			out = append(out, &quote{w.blocks(n)})
		case *ast.FencedCodeBlock, *ast.CodeBlock:
			l := &listing{}
			for i := range n.Lines().Len() {
				at := n.Lines().At(i)
				l.text = append(l.text, strings.TrimRight(string(at.Value(w.src)), "\r\n"))
			}
			out = append(out, l)
		case *ast.ThematicBreak:
			out = append(out, line{})
		case *extast.Table:
			out = append(out, w.table(n))
		case *ast.HTMLBlock:
			w.trouble(w.at, "write Markdown", "HTML is not set in a note")
		default:
			w.trouble(w.at, "", "%s is not set in a note", n.Kind())
		}
	}
	return out
}

// runs reads what is within a block.
func (w *walker) runs(parent ast.Node, face draw.Face, anchor string) Paragraph {
	var out Paragraph
	before := "" // of the same words: an underscore divides them for the parser
	for n := parent.FirstChild(); n != nil; n = n.NextSibling() {
		switch n := n.(type) {
		case *ast.Text:
			s := before + string(util.UnescapePunctuations(n.Segment.Value(w.src)))
			before = ""
			if next, ok := n.NextSibling().(*ast.Text); ok && !n.HardLineBreak() && !n.SoftLineBreak() && next != nil {
				before = s
				continue
			}
			if strings.ContainsRune(s, '&') {
				s = string(util.ResolveEntityNames(util.ResolveNumericReferences([]byte(s))))
				for _, r := range draw.Missing(face, s) {
					w.trouble(w.at, "", "no typeface of the note has the sign %q (U+%04X)", r, r)
				}
			}
			out = append(out, wordsTo(face, anchor, s)...)
			switch {
			case n.HardLineBreak():
				out = append(out, NewLine())
			case n.SoftLineBreak():
				out = append(out, Run{Face: face, Text: " ", Anchor: anchor})
			}
		case *ast.String:
			out = append(out, Run{Face: face, Text: string(n.Value), Anchor: anchor})
		case *ast.Emphasis:
			inner := draw.Italic
			if n.Level >= 2 || face == draw.Bold {
				inner = draw.Bold
			}
			out = append(out, w.runs(n, inner, anchor)...)
		case *ast.CodeSpan:
			out = append(out, w.code(n, anchor))
		case *ast.Link:
			out = append(out, w.link(n, face)...)
		case *ast.AutoLink:
			out = append(out, Run{Face: face, Text: string(n.Label(w.src))})
		case *value:
			out = append(out, w.value(n)...)
		case *ast.Image:
			w.trouble(w.at, "say it in words or leave it out", "a picture in narrative is not set")
		case *ast.RawHTML:
			w.trouble(w.at, "write Markdown", "HTML is not set in a note")
		default:
			w.trouble(w.at, "", "%s is not set in a note", n.Kind())
		}
	}
	return out
}

// link leads to an anchor of the note, [text](#key); the address of any other link is printed.
func (w *walker) link(n *ast.Link, face draw.Face) Paragraph {
	to := string(n.Destination)
	if key, ok := strings.CutPrefix(to, "#"); ok {
		return w.runs(n, face, key)
	}
	return append(w.runs(n, face, ""), Run{Face: face, Text: " (" + to + ")"})
}

func (w *walker) code(n *ast.CodeSpan, anchor string) Run {
	var b strings.Builder
	for t := n.FirstChild(); t != nil; t = t.NextSibling() {
		if t, ok := t.(*ast.Text); ok {
			b.Write(t.Segment.Value(w.src))
		}
	}
	s := strings.ReplaceAll(b.String(), "\n", " ")
	if _, err := mathset.Inline(10, s); err != nil {
		r := Typed(s)
		r.Anchor = anchor
		return r
	}
	return Math(func(size draw.Pt) mathset.Row {
		row, err := mathset.Inline(size, s)
		if err != nil {
			panic("text: a formula that was read is read no more: " + s)
		}
		return row
	})
}

func (w *walker) value(v *value) Paragraph {
	at := w.lineOf(v.at)
	switch {
	case v.open:
		w.trouble(at, `write \{ for a brace that is text`, "a brace { without its end }")
	case v.key == "":
		w.trouble(at, "name a symbol between the braces", "empty braces {}")
	case v.at > 0 && w.src[v.at-1] == '_':
		w.trouble(at, "write symbols between back-ticks, `σ_{"+v.key+"}`", "_{%s} outside of a formula", v.key)
	case w.values == nil:
		w.trouble(at, "", "there is no value {%s} here", v.key)
	default:
		o, err := w.values(v.key)
		if err != nil {
			w.trouble(at, "", "{%s}: %v", v.key, err)
			break
		}
		if o.Number == "" {
			w.trouble(at, "", "{%s} has no number", v.key)
			break
		}
		return Paragraph{Math(func(size draw.Pt) mathset.Row {
			return mathset.Setting{Size: size, Running: true}.Number(o)
		})}
	}
	return Paragraph{Typed("{" + v.key + "}")}
}
