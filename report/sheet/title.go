package sheet

import (
	"strings"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
	"soffit/report/text"
	"soffit/templates"
)

// titleSheet sets what an approver reads: the document, the verdict in words, what is not justified, the history
// and the signatures, the drawings, conditions and cautions.
func (c *composer) titleSheet() {
	d := &c.note.Document
	head := stack{w: fullColumn.w}
	head.words(draw.Serif, 11, 14, 0, d.Project)
	head.words(draw.Bold, 24, 27, 5, d.Title)
	c.add(&element{owner: "title", above: 0, height: head.bottom + 8, running: "Title sheet", anchors: []string{"part:title"},
		paint: func(cv draw.Canvas, y draw.Pt) {
			cv.Owner("full title")
			head.paint(cv, left, y)
		}})
	facts := [][2]string{{"document", d.Number}, {"revision", d.Revision}, {"status", d.Status}, {"member file", d.InputName}}
	if d.Originator != "" {
		facts = append([][2]string{{"originator", d.Originator}}, facts...)
	}
	c.facts(facts)
	c.fingerprints()
	c.verdictWords()
	c.limits()
	c.history(d.History)
	c.signatures(d.Roles)
	c.drawings(d.Drawings)
	c.partHead("Conditions and cautions")
	style := text.Style{Size: tableSize, Leading: 11, Gap: 2}
	c.add(textElements(c.standing(templates.Text("cautions"), fullColumn.w, style), fullColumn, "cautions", 3, false, spanFull)...)
}

// partHead opens a section of the title sheet.
func (c *composer) partHead(words string) {
	c.add(&element{owner: words, above: 13, height: textSize*(ascent+descent) + 1, keep: true, opens: true, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full " + words)
		cv.Text(left, y+textSize*ascent, draw.Bold, textSize, words)
	}})
}

// facts lists what the document is, name and value.
func (c *composer) facts(facts [][2]string) {
	const in = 80
	for i, f := range facts {
		if f[1] == "" {
			continue
		}
		v := stack{w: fullColumn.w - in}
		v.words(draw.Serif, textSize, textLead, 0, f[1])
		c.fact(f[0], in, v, i < len(facts)-1)
	}
}

// fingerprints shows both, each with what it covers.
func (c *composer) fingerprints() {
	const in = 80
	for i, f := range [][3]string{
		{"engineering", c.mark, "fingerprint of input, formulas, printed values and verdicts: what a role signs"},
		{"document", c.note.DocumentFingerprint(), "fingerprint of all that and of names, dates, titles and narrative"},
	} {
		v := stack{w: fullColumn.w - in}
		v.words(draw.Marks, 7.5, textLead, 0, strings.TrimPrefix(f[1], "sha256:"))
		v.words(draw.Serif, smallSize, smallLead, 0, f[2])
		c.fact(f[0], in, v, i == 0)
		c.elements[len(c.elements)-1].above = 3
	}
}

// fact is one line of what the document is.
func (c *composer) fact(name string, in draw.Pt, v stack, keep bool) {
	v.inks[0].y = textSize * ascent
	e := &element{owner: name, above: 1, height: max(v.bottom, textLead), keep: keep}
	e.paint = func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full " + name)
		cv.Text(left, y+textSize*ascent, draw.Italic, textSize, name)
		v.paint(cv, left+in, y)
	}
	c.add(e)
}

// verdictWords says in a frame what the checks come to, and names those that fail.
func (c *composer) verdictWords() {
	const pad, most = 8, 6
	j := judge(c.note)
	s := stack{w: fullColumn.w - 2*pad}
	words := j.words() + "."
	if j.fail > 0 {
		words += " Not for construction."
	}
	s.words(draw.Bold, 12.5, 15, 0, words)
	for i, k := range j.checks[:j.fail] {
		if i == most && j.fail > most+1 {
			s.words(draw.Serif, tableSize, tableLead, 2, count(j.fail-most)+" more, see the verdict")
			break
		}
		s.named(k)
	}
	if j.fail == 0 && len(j.checks) > 0 && printedRatio(j.checks[0]) > 0 {
		s.named(j.checks[0])
	}
	h := s.bottom + 2*pad - 2
	c.add(&element{owner: "verdict", above: 12, height: h, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full verdict")
		stroke := draw.Pt(0.8)
		if j.fail > 0 {
			stroke = 1.6
		}
		cv.Rect(left+stroke/2, y, width-stroke, h, draw.Style{Stroke: stroke})
		s.paint(cv, left+pad, y+pad-2)
	}})
}

// named adds a check in words: number, name, place, and its ratio or margin.
func (s *stack) named(k *trace.Check) {
	words := k.Number + "  " + capital(k.Name)
	if at := trace.RowName(k.Axes, k.Worst); at != "" {
		words += ", " + at
	}
	figure := text.Math(func(size draw.Pt) mathset.Row { return mathset.Setting{Size: size}.Result(k.Ratio[k.Worst], "") })
	switch {
	case k.Ratio[k.Worst] == "":
		words += ": margin "
		figure = text.Math(func(size draw.Pt) mathset.Row {
			return mathset.Setting{Size: size}.Result(k.Margin[k.Worst], k.Unit.String())
		})
	case k.Failed():
		words += ": ratio "
	default:
		words += ": the highest ratio, "
	}
	n := len(s.inks)
	s.paragraph(append(text.Words(draw.Serif, words), figure), tableSize, tableLead, 3)
	for i := n; i < len(s.inks); i++ {
		s.inks[i].link = k.Key
	}
}

// limits repeats the text "limits" of the basis: what the note covers and what it does not.
func (c *composer) limits() {
	c.note.Each(func(_ *trace.Chapter, b *trace.Block, e trace.Entry) {
		t, ok := e.(*trace.Text)
		if !ok || t.Key != "basis.limits/limits" {
			return
		}
		c.partHead(b.Title)
		style := text.Style{Size: tableSize, Leading: 11, Gap: 2}
		c.add(textElements(c.narrative(b, t, fullColumn.w, style), fullColumn, "limits", 3, false, spanFull)...)
	})
}

func (c *composer) history(issues []trace.Issue) {
	if len(issues) == 0 {
		return
	}
	c.partHead("Revisions")
	var rows [][]string
	for _, i := range issues {
		rows = append(rows, []string{i.Revision, i.Date, i.Text})
	}
	c.grid("revisions", []gridColumn{{"revision", 52}, {"date", 62}, {"what changed", 0}}, rows, 0)
}

func (c *composer) signatures(roles []trace.Role) {
	c.partHead("Roles and signatures")
	var rows [][]string
	for _, r := range signing(roles) {
		rows = append(rows, []string{r.Role, r.Name, r.Organisation, r.Date, ""})
	}
	c.grid("signatures", []gridColumn{{"role", 52}, {"name", 100}, {"organisation", 140}, {"date", 60}, {"signature", 0}}, rows, 23)
}

func (c *composer) drawings(ds []trace.Drawing) {
	if len(ds) == 0 {
		return
	}
	c.partHead("Drawings this note goes with")
	var rows [][]string
	for _, d := range ds {
		rows = append(rows, []string{d.Number, d.Revision, d.Title})
	}
	c.grid("drawings", []gridColumn{{"drawing", 112}, {"revision", 52}, {"title", 0}}, rows, 0)
}

// gridColumn is a column of a table of words; width 0 takes the rest of the sheet.
type gridColumn struct {
	head string
	w    draw.Pt
}

// grid sets a table of words across the sheet, its rows at least so high.
func (c *composer) grid(owner string, columns []gridColumn, rows [][]string, least draw.Pt) {
	const gap = 8
	fixed := draw.Pt(0)
	for _, k := range columns {
		fixed += k.w
	}
	x := make([]draw.Pt, len(columns))
	w := make([]draw.Pt, len(columns))
	at := left
	for i, k := range columns {
		w[i] = k.w - gap
		if k.w == 0 {
			w[i] = width - fixed
			k.w = width - fixed
		}
		x[i] = at
		at += k.w
	}
	head := &element{owner: owner, above: 2, height: 14, keep: true, paint: func(cv draw.Canvas, y draw.Pt) {
		cv.Owner("full " + owner)
		for i, k := range columns {
			cv.Text(x[i], y+9, draw.Italic, smallSize, k.head)
		}
		cv.Line(left, y+12.5, right, y+12.5, tableRule)
	}}
	head.head = head
	out := []*element{head}
	for _, r := range rows {
		cells := make([]stack, len(r))
		h := least
		for i, s := range r {
			cells[i].w = w[i]
			cells[i].words(draw.Serif, tableSize, tableLead-1, 0, s)
			h = max(h, cells[i].bottom+3.5)
		}
		h = max(h, tableLead)
		out = append(out, &element{owner: owner, height: h, head: head, paint: func(cv draw.Canvas, y draw.Pt) {
			cv.Owner("full " + owner)
			for i := range cells {
				cells[i].paint(cv, x[i], y+2)
			}
			cv.Line(left, y+h-0.5, right, y+h-0.5, 0.25)
		}})
	}
	c.add(keepTogether(out)...)
}
