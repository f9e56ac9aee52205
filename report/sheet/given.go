package sheet

import (
	"regexp"
	"strconv"
	"strings"

	"soffit/calc/clause"
	"soffit/calc/trace"
	"soffit/report/draw"
)

// given sets a value that was given: one line with name, source and value, the source on a second where it does
// not fit.
func (c *composer) given(b *trace.Block, g *trace.Given, first bool) {
	plain := g.Head
	plain.Ref = clause.Ref{}
	e := columnsFor(&plain, c.document, nil)
	w, ok := workedLine(b, &g.Line)
	if !ok {
		return
	}
	c.title(e, b, g.Name, nil, w)
	c.source(e, strings.Join(append(nonempty(g.Source), referenceLines(g.Ref, c.document)...), ", "))
	switch {
	case len(g.Axes) == 0:
		c.result(e, &g.Line, w)
	case g.Axes[0] == b.Over && len(g.Axes) == 1:
		c.result(e, &g.Line, w)
		e.to = c.index.tables(g.Key)
	case size(indexAxes(g)) == 1:
		c.result(e, &g.Line, w)
	default:
		box := c.symbol(g.Symbol, textSize, nil)
		e.result.inks = append(e.result.inks, ink{x: e.result.w - box.Width, y: textSize * ascent, box: box})
		e.result.baseline, e.result.bottom = textSize*ascent, textSize*(ascent+descent)
	}
	el := e.element(true)
	if !first {
		el.above = 2.5
	}
	c.add(el)
}

func nonempty(s string) []string {
	if s == "" {
		return nil
	}
	return []string{s}
}

var inputLine = regexp.MustCompile(`\blines? ([0-9]+)`)

// source adds where a value comes from, right on the line of its name if there is room. A line of the member
// file leads there.
func (c *composer) source(e *columns, source string) {
	if source == "" {
		return
	}
	link := ""
	if m := inputLine.FindStringSubmatch(source); m != nil && c.index.inputLines > 0 {
		if n, err := strconv.Atoi(m[1]); err == nil && n >= 1 && n <= c.index.inputLines {
			link = lineAnchor(n)
		}
	}
	w := draw.Width(draw.Serif, smallSize, source)
	if len(e.work.inks) == 0 {
		e.work.put(ink{face: draw.Serif, size: textSize}, textSize*ascent, textSize*descent, 0, 0)
	}
	last := e.work.inks[len(e.work.inks)-1]
	if last.x+last.width()+12+w <= e.work.w {
		e.work.inks = append(e.work.inks, ink{x: e.work.w - w, y: last.y, face: draw.Serif, size: smallSize, text: source, link: link})
		return
	}
	n := len(e.work.inks)
	e.work.words(draw.Serif, smallSize, smallLead, 0, source)
	for i := n; i < len(e.work.inks); i++ {
		e.work.inks[i].link = link
	}
}
