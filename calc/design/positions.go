package design

import (
	"soffit/calc/clause"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// places gives the depths of the steel: from the top, from the soffit where the member hogs, from the top of a topping; once,
// or where the heights of tendons change at each station.
func (j *job) places(c *trace.Chapter) {
	heights, over := j.tendons, (*trace.Axis)(nil)
	if j.profiled() {
		heights, over = j.heights, j.stations
	}
	place := func(slug, title string, view *trace.Block, steps ...*clause.Formula) *trace.Block {
		takes := trace.Take(j.section, j.gross, heights)
		if view != nil {
			takes = append(takes, trace.Take(view)...)
		}
		if j.hasBars() {
			takes = append(takes, trace.Take(j.barData)...)
		}
		b := c.Block(slug, title, over, takes...)
		if over != nil {
			b.Row = j.midSpan()
		}
		b.Steps(steps...)
		return b
	}
	steel := func(tendons, bars *clause.Formula) []*clause.Formula {
		if j.hasBars() {
			return []*clause.Formula{tendons, bars}
		}
		return []*clause.Formula{tendons}
	}
	j.positions = place("positions", "Places of the steel", nil, append([]*clause.Formula{mechanics.Eccentricity}, steel(mechanics.TendonDepth, mechanics.BarDepth)...)...)
	if j.hogs() {
		j.positionsBelow = place("positions-below", "Places of the steel from the soffit", nil, steel(mechanics.TendonDepthBelow, mechanics.BarDepthBelow)...)
	}
	if j.hasTopping() {
		j.toppedPositions = place("topped-positions", "Places of the steel from the top of the topping", j.toppedFromTop, steel(mechanics.ToppedTendonDepth, mechanics.ToppedBarDepth)...)
	}
}

// midSpanHeights gives the heights at mid-span of tendons whose heights change.
func (j *job) midSpanHeights(c *trace.Chapter) *trace.Block {
	if !j.profiled() {
		return j.tendons
	}
	b := c.Block("heights", "Heights of the tendons at mid-span", nil, trace.Take(j.tendons)...)
	b.Step(mechanics.MidSpanHeight)
	return b
}

// tendonPlaces is what drawings show of the places of the tendons across the section.
func (j *job) tendonPlaces() []trace.Plot {
	if j.placed() {
		return []trace.Plot{{Role: "position-x", Key: "given.tendons/position-x"}, {Role: "position-row", Key: "given.tendons/position-row"}}
	}
	return []trace.Plot{{Role: "spacing", Key: "given.tendons/spacing"}}
}

// barPlaces is what drawings show of the places of the bars across the section.
func (j *job) barPlaces() []trace.Plot {
	if j.barsPlaced() {
		return []trace.Plot{{Role: "bar-position-x", Key: "given.bars/position-x"}, {Role: "bar-position-row", Key: "given.bars/position-row"}}
	}
	return []trace.Plot{{Role: "bar-spacing", Key: "given.bars/spacing"}}
}

// tendonSection is what a drawing of the section shows of the rows of tendons beside their number, places, height and
// diameter.
func (j *job) tendonSection() []trace.Plot {
	if j.ducted() {
		return []trace.Plot{{Role: "strands", Key: "given.tendons/strands"}, {Role: "duct-diameter", Key: "given.tendons/duct-diameter"}}
	}
	plots := []trace.Plot{{Role: "debonded", Key: "given.tendons/debonded-length"}}
	if j.profiled() {
		plots = append(plots, trace.Plot{Role: "end-level", Key: "given.profile/start"})
	}
	return plots
}

// tendonElevation is what the elevation shows of the rows of tendons.
func (j *job) tendonElevation() []trace.Plot {
	if j.ducted() {
		return []trace.Plot{{Role: "profile-x", Key: "actions.effects/position"}, {Role: "profile-y", Key: "prestress.profile/" + mechanics.TendonLevel.ID}}
	}
	plots := []trace.Plot{{Role: "level", Key: "given.tendons/level"}, {Role: "debonded", Key: "given.tendons/debonded-length"}}
	if j.profiled() {
		plots = append(plots, trace.Plot{Role: "end-level", Key: "given.profile/start"}, trace.Plot{Role: "held-down", Key: "given.tendons/held-down"})
	}
	return plots
}
