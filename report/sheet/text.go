package sheet

import (
	"fmt"

	"soffit/calc/trace"
	"soffit/report/draw"
	"soffit/report/mathset"
	"soffit/report/text"
)

var bodyStyle = text.Style{Size: textSize, Leading: textLead, Gap: 5}

// textElements turn lines of running text into elements in a column.
func textElements(lines []text.Line, col column, owner string, above draw.Pt, ruled bool, s span) []*element {
	out := make([]*element, 0, len(lines))
	for i, l := range lines {
		e := &element{owner: owner, above: l.Before, height: l.Height + l.Depth, ruled: ruled, spans: s}
		if i == 0 {
			e.above = above
		}
		e.paint = func(c draw.Canvas, y draw.Pt) {
			c.Owner(col.name + " " + owner)
			l.Draw(c, col.x, y+l.Height)
		}
		out = append(out, e)
	}
	keepEnds(out)
	for i, l := range lines {
		out[i].keep = out[i].keep && i < len(lines)-1 || l.Keep
	}
	return out
}

// text sets narrative across work and result, its symbols in braces as values at the block's row.
func (c *composer) text(b *trace.Block, t *trace.Text) {
	lines := c.narrative(b, t, wideColumn.w, bodyStyle)
	es := textElements(lines, wideColumn, t.Key, entryGap+2, !plain(b), spanWide)
	if len(es) > 0 {
		es[0].anchors = append(es[0].anchors, t.Key)
	}
	c.add(es...)
}

// narrative sets the lines of a text of the record.
func (c *composer) narrative(b *trace.Block, t *trace.Text, w draw.Pt, style text.Style) []text.Line {
	at := worked{place: trace.Place{}}
	if b.Over != nil {
		at.place = at.place.With(b.Over, b.Row)
	}
	o := &operands{note: c.note, uses: t.Uses, w: at}
	first := map[string]int{"i": 0, "j": 0, "n": 0, "m": 0}
	n, troubles := text.Read(t.Markdown, func(key string) (mathset.Operand, error) {
		l, i, ok := o.find(key, first)
		if !ok {
			return mathset.Operand{}, fmt.Errorf("has no value at the row this block is worked for")
		}
		return mathset.Operand{Number: l.Shown[i], Unit: l.Unit.String(), Anchor: l.Key}, nil
	})
	if len(troubles) > 0 {
		c.fail("text %s: %w", t.Key, troubles[0])
	}
	return n.Lines(w, style)
}

// standing sets a text of the templates.
func (c *composer) standing(markdown string, w draw.Pt, style text.Style) []text.Line {
	n, troubles := text.Read(markdown, nil)
	if len(troubles) > 0 {
		c.fail("standing text: %w", troubles[0])
	}
	return n.Lines(w, style)
}
