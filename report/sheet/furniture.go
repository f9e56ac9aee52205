package sheet

import (
	"fmt"
	"strings"
	"unicode"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/text"
)

// furniture is what every sheet carries around its body.
type furniture struct {
	number, title string
	issue         string // revision and status
	roles         string
	fingerprint   string
	program       string
	caution       []string
	sheets        int
}

func newFurniture(n *trace.Note, mark string, failed bool, caution string) *furniture {
	d := &n.Document
	f := &furniture{number: d.Number, title: d.Title, issue: "revision " + d.Revision, fingerprint: short(mark),
		program: d.Program}
	f.caution = wrap(draw.Serif, footSize, width-draw.Width(draw.Serif, footSize, d.Program)-20, caution)
	if d.Status != "" {
		f.issue += " · " + d.Status
	}
	if failed {
		f.issue += " · not for construction"
	}
	var parts []string
	for _, r := range signing(d.Roles)[:3] {
		date := r.Date
		if r.Name == "" || date == "" {
			date = "_______"
		}
		parts = append(parts, strings.TrimSpace(r.Role+" "+draw.Fit(draw.Serif, headSize, 36, initials(r.Name)))+" "+date)
	}
	f.roles = strings.Join(parts, "   ")
	return f
}

// signing are the roles in the order prepared, checked, approved, then others; the three are always there.
func signing(given []trace.Role) []trace.Role {
	var out []trace.Role
	usual := []string{"prepared", "checked", "approved"}
	for _, name := range usual {
		r := trace.Role{Role: name}
		for _, g := range given {
			if g.Role == name {
				r = g
			}
		}
		out = append(out, r)
	}
	for _, g := range given {
		if g.Role != usual[0] && g.Role != usual[1] && g.Role != usual[2] {
			out = append(out, g)
		}
	}
	return out
}

// initials are the first letters of the parts of a name, "TAW" for Tomas Aldridge-Weiss.
func initials(name string) string {
	var b strings.Builder
	fresh := true
	for _, r := range name {
		if unicode.IsLetter(r) {
			if fresh {
				b.WriteRune(unicode.ToUpper(r))
			}
			fresh = false
			continue
		}
		fresh = r != '\'' && r != '’'
	}
	return b.String()
}

// short is the first twelve digits of a fingerprint in groups of four.
func short(fingerprint string) string {
	_, hex, _ := strings.Cut(fingerprint, ":")
	hex = hex[:min(12, len(hex))]
	var groups []string
	for len(hex) > 4 {
		groups = append(groups, hex[:4])
		hex = hex[4:]
	}
	return strings.Join(append(groups, hex), " ")
}

// draw draws head and foot of sheet n, and the column heads and hairlines of a calculation sheet.
func (f *furniture) draw(c draw.Canvas, n int, p *page) {
	c.Owner("head")
	const gap = 14
	y := [3]draw.Pt{headTop, headTop + headLine, headTop + 2*headLine}
	// Each line has a part at the left, cut where it would meet the part at the right.
	line := func(i int, face draw.Face, size draw.Pt, s string, x draw.Pt) (end draw.Pt) {
		w := draw.Width(face, size, s)
		c.Text(right-w, y[i], face, size, s)
		return right - w - gap - x
	}
	number := draw.Fit(draw.Bold, headSize, width/2, f.number)
	c.Text(left, y[0], draw.Bold, headSize, number)
	x := left + draw.Width(draw.Bold, headSize, number) + 8
	room := line(0, draw.Bold, headSize, fmt.Sprintf("sheet %d of %d", n, f.sheets), x)
	c.Text(x, y[0], draw.Serif, headSize, draw.Fit(draw.Serif, headSize, room, f.title))
	room = line(1, draw.Marks, headSize-1.2, f.fingerprint, left)
	c.Text(left, y[1], draw.Serif, headSize, draw.Fit(draw.Serif, headSize, room, f.issue))
	room = line(2, draw.Serif, headSize, f.roles, left)
	running(c, left, y[2], room, p.running)
	c.Line(left, headRule, right, headRule, strongRule)

	c.Owner("foot")
	c.Line(left, footRule, right, footRule, tableRule)
	for i, s := range f.caution {
		c.Text(left, footTop+draw.Pt(i)*footLead, draw.Serif, footSize, s)
	}
	draw.TextRight(c, right, footTop, draw.Serif, footSize, f.program)

	if p.ruled() {
		f.columns(c, p)
	}
}

// running sets the chapter in the head, cut where it is too long; symbols in it stand as mathematics.
func running(c draw.Canvas, x, y, room draw.Pt, title string) {
	lines := text.Words(draw.Serif, title).Lines(10*width, text.Style{Size: headSize, Leading: headLine})
	if len(lines) == 1 && lines[0].Width <= room {
		lines[0].Draw(c, x, y)
		return
	}
	c.Text(x, y, draw.Serif, headSize, draw.Fit(draw.Serif, headSize, room, title))
}

// columns draws the heads of the columns and the hairlines between them, left out where an element stands across.
func (f *furniture) columns(c draw.Canvas, p *page) {
	c.Owner("head")
	c.Text(referenceColumn.x, columnRow, draw.Italic, headSize, "reference")
	c.Text(workColumn.x, columnRow, draw.Italic, headSize, "work")
	draw.TextRight(c, resultColumn.right, columnRow, draw.Italic, headSize, "result")
	c.Text(checkColumn.x, columnRow, draw.Italic, headSize, "check")
	c.Line(left, columnRule, right, columnRule, hairline)
	c.Owner("hairline")
	for i, x := range []draw.Pt{rule1, rule2, rule3} {
		h := hairlineAt{c: c, x: x, from: columnRule, open: true}
		for k, e := range p.placed {
			top := columnRule
			if k > 0 {
				top = (p.placed[k-1].y + p.placed[k-1].height + e.y) / 2
			}
			if e.ruled && e.spans == spanWide && i == 1 && e.across != nil {
				h.resume(top)
				for _, r := range e.across {
					h.stop(e.y + r.from)
					h.resume(e.y + r.to)
				}
				continue
			}
			if !e.ruled || e.spans == spanFull || e.spans == spanWide && i == 1 {
				h.stop(top)
			} else {
				h.resume(top)
			}
		}
		last := p.placed[len(p.placed)-1]
		end := last.y + last.height + 8
		if footRule-end < 90 {
			end = footRule
		}
		h.stop(end)
	}
}

// hairlineAt draws a hairline down a sheet, with gaps.
type hairlineAt struct {
	c       draw.Canvas
	x, from draw.Pt
	open    bool
}

// stop ends the line where something stands across it.
func (h *hairlineAt) stop(y draw.Pt) {
	if h.open && y > h.from+1 {
		h.c.Line(h.x, h.from, h.x, y, hairline)
	}
	h.open = false
}

// resume goes on with it.
func (h *hairlineAt) resume(y draw.Pt) {
	if !h.open {
		h.from, h.open = y, true
	}
}
