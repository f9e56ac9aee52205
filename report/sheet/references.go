package sheet

import (
	"slices"
	"strconv"
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
)

// citation is a rule and the entries that follow it.
type citation struct {
	document, rule string
	by             []mention
}

// citations lists the rules a note follows, by document and clause.
func citations(n *trace.Note) []citation {
	at := map[[2]string]*citation{}
	n.Each(func(_ *trace.Chapter, _ *trace.Block, e trace.Entry) {
		h := e.Common()
		if h.Ref.Document == "" {
			return
		}
		rule := h.Ref.Clause
		if h.Ref.Equation != "" {
			rule = strings.TrimSpace(rule + " (" + h.Ref.Equation + ")")
		}
		k := [2]string{h.Ref.Document, rule}
		if at[k] == nil {
			at[k] = &citation{document: k[0], rule: k[1]}
		}
		at[k].by = append(at[k].by, mention{h.Number, h.Key})
	})
	out := make([]citation, 0, len(at))
	for _, v := range at {
		out = append(out, *v)
	}
	slices.SortFunc(out, func(a, b citation) int {
		if a.document != b.document {
			return strings.Compare(a.document, b.document)
		}
		return natural(a.rule, b.rule)
	})
	return out
}

// natural compares texts, runs of digits by their number: 3.1.7 before 3.1.10.
func natural(a, b string) int {
	for a != "" && b != "" {
		x, y := digits(a), digits(b)
		if x > 0 && y > 0 {
			p, q := strings.TrimLeft(a[:x], "0"), strings.TrimLeft(b[:y], "0")
			if len(p) != len(q) {
				return len(p) - len(q)
			}
			if c := strings.Compare(p, q); c != 0 {
				return c
			}
			a, b = a[x:], b[y:]
			continue
		}
		if a[0] != b[0] {
			return int(a[0]) - int(b[0])
		}
		a, b = a[1:], b[1:]
	}
	return len(a) - len(b)
}

func digits(s string) int {
	n := 0
	for n < len(s) && '0' <= s[n] && s[n] <= '9' {
		n++
	}
	return n
}

// runs lists numbers of entries after a word, those that follow each other by the first and the last.
func runs(word string, ms []mention) []bit {
	var kept []mention
	var through []bool // from the one before
	for i := 0; i < len(ms); {
		end := i
		for end+1 < len(ms) && follows(ms[end].number, ms[end+1].number) {
			end++
		}
		kept, through = append(kept, ms[i]), append(through, false)
		if end-i >= 2 {
			kept, through = append(kept, ms[end]), append(through, true)
			i = end
		}
		i++
	}
	bits := listed(word, kept, false)
	for i, t := range through {
		if t {
			bits[i].resize(strings.TrimSuffix(bits[i].text, ","))
			bits[i+1].resize("… " + bits[i+1].text)
		}
	}
	return bits
}

// follows tells whether an entry's number is the next one of the same block.
func follows(a, b string) bool {
	i, k := strings.LastIndexByte(a, '.'), strings.LastIndexByte(b, '.')
	if i < 0 || k < 0 || a[:i] != b[:k] {
		return false
	}
	x, err1 := strconv.Atoi(a[i+1:])
	y, err2 := strconv.Atoi(b[k+1:])
	return err1 == nil && err2 == nil && y == x+1
}

// referenceList sets the rules followed, under the documents they stand in.
func (c *composer) referenceList() {
	const ruleWidth = 92
	var cells []cell
	document := ""
	flush := func() {
		if len(cells) > 0 {
			c.add(twin("references", cells, 3))
			cells = nil
		}
	}
	for _, r := range citations(c.note) {
		if r.document != document {
			flush()
			document = r.document
			name := document
			c.add(&element{owner: "references", above: 12, height: textSize * (ascent + descent), keep: true, paint: func(cv draw.Canvas, y draw.Pt) {
				cv.Owner("full references")
				cv.Text(left, y+textSize*ascent, draw.Bold, textSize, name)
			}})
		}
		rule := stack{w: ruleWidth - 4}
		rule.words(draw.Serif, noteSize, noteLead-0.4, 0, r.rule)
		by := stack{w: twinWidth - ruleWidth}
		by.bits(runs("in", r.by), 0, false)
		cells = append(cells, cell{max(rule.bottom, by.bottom) + 3, 0, func(cv draw.Canvas, x, y draw.Pt) {
			rule.paint(cv, x, y)
			by.paint(cv, x+ruleWidth, y+(noteSize-tinySize)*ascent)
		}})
	}
	flush()
}
