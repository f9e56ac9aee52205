package design

import (
	"soffit/calc/trace"
)

// bendingFigures draws the section at the ultimate limit state where it is worst, the resistance along the member, and lists
// what was found at each station.
func (j *job) bendingFigures(b *trace.Block, q *asked) {
	resistance := j.sums(q).resistance.ID
	found := j.rowsOf(b.Path() + "/" + resistance)
	if !found.Any() {
		return
	}
	at := j.stations.Rows[b.Row]
	if !found[b.Row] {
		at = j.largest(b.Path() + "/" + resistance) // nothing resists where it is worst
	}
	demand := map[string]string{"bending-sufficient": "actions.ultimate/moment", "hogging-sufficient": "ultimate.hogging/" + j.hoggingMomentID(),
		"bare-sufficient": "actions.construction/construction-moment", "bare-hogging-sufficient": "ultimate.bare-hogging/bare-hogging-moment"}[q.check.ID]
	b.Figure("section-diagram", "ultimate", "Strain, stress and forces at the ultimate limit state, "+at+".", at, j.ultimatePlots(b, q, at)...)
	switch {
	case q.below && !q.bare:
		plots := j.envelopePlots("actions.ultimate/moment", j.asked[0].block.Path()+"/"+j.sums(j.asked[0]).resistance.ID)
		plots = append(plots, trace.Plot{Role: "resistance-hogging", Key: b.Path() + "/" + resistance}, trace.Plot{Role: "demand-hogging", Key: demand})
		b.Figure("envelope", "resistance", "Design moments and moment resistances along the member, sagging and hogging.", "", plots...)
	case !q.bare:
		b.Figure("envelope", "resistance", "Design moment and moment resistance along the member.", "", j.envelopePlots("actions.ultimate/moment", b.Path()+"/"+resistance)...)
	}
	strains := []string{"actions.effects/position", j.curvatures(q)[len(j.curvatures(q))-1].ID, "tendon-strain", "tendon-stress" + pick(j.inclined(), "-inclined", "")}
	if j.hasBars() {
		strains = append(strains, pick(q.topped, "locked-bar-strain", "bar-strain"), "bar-stress"+pick(j.barInclined(), "-inclined", ""))
	}
	b.Table("strains", "Strains and stresses of the rows along the member", j.stations, strains...)
	columns := []string{"actions.effects/position"}
	for _, id := range []string{"block-depth", "block-depth-reduced", "concrete-force", "concrete-force-with-voids", "fibre-force", "concrete-force-depth", "concrete-force-depth-with-voids", "fibre-force-depth"} {
		if b.Has(id) {
			columns = append(columns, id)
		}
	}
	b.Table("along", "Bending along the member", j.stations, append(columns, demand, resistance, q.check.ID)...)
}

func (j *job) envelopePlots(demand, resistance string) []trace.Plot {
	return []trace.Plot{{Role: "x", Key: "actions.effects/position"}, {Role: "demand", Key: demand}, {Role: "resistance", Key: resistance},
		{Role: "support-A", Key: "given.span/bearing-a"}, {Role: "support-B", Key: "given.span/bearing-b"}}
}

// ultimatePlots are the roles of the section at the ultimate limit state at a station.
func (j *job) ultimatePlots(b *trace.Block, q *asked, at string) []trace.Plot {
	plots := j.outlinePlots(q.topped)
	add := func(role, key string) { plots = append(plots, trace.Plot{Role: role, Key: key}) }
	row := j.stations.Row(at)
	one := func(role string, ids ...string) { // the first of these that was computed there
		for _, id := range ids {
			if l := trace.LineOf(j.n.Entry(b.Path() + "/" + id)); l != nil && takenAt(l, row) {
				add(role, id)
				return
			}
		}
	}
	add("h", pick(q.topped, "section.composite/composite-depth", "given.section/depth"))
	one("neutral-axis", "axis-flange", "axis-root")
	if q.fibred {
		add("fibre-level", "section.fibres/fibre-level")
		one("fibre-stress", "fibre-stress", "topped-fibre-stress")
	} else {
		one("block-depth", "block-depth", "block-depth-reduced")
		one("block-stress", "block-stress", "block-stress-reduced", "block-stress-narrowing", "block-stress-narrowing-reduced")
	}
	one("block-force", "concrete-force", "concrete-force-with-voids", "fibre-force")
	one("block-centroid", "concrete-force-depth", "concrete-force-depth-with-voids", "fibre-force-depth")
	add("strain-top", "top-strain")
	depth := pick(q.topped && !q.below, "topped-", "")
	add("depth", q.places.Path()+"/"+depth+"tendon-depth"+pick(q.below, "-below", ""))
	add("prestrain", j.prestrainKey(q))
	add("strain", "tendon-strain")
	add("bending-strain", "bending-strain")
	add("force", "tendon-force")
	add("lever", "tendon-lever")
	add("count", "given.tendons/count")
	add("diameter", "given.tendons/diameter")
	plots = append(plots, j.tendonPlaces()...)
	if j.ducted() {
		add("duct-diameter", "given.tendons/duct-diameter")
	}
	if j.hasBars() {
		add("bar-depth", q.places.Path()+"/"+depth+"bar-depth"+pick(q.below, "-below", ""))
		add("bar-strain", pick(q.topped, "locked-bar-strain", "bar-strain"))
		if q.topped {
			add("bar-bending-strain", "bar-bending-strain")
		}
		add("bar-force", "bar-force")
		add("bar-lever", "bar-lever")
		add("bar-count", "given.bars/count")
		add("bar-diameter", "given.bars/diameter")
		plots = append(plots, j.barPlaces()...)
	}
	add("resistance", j.sums(q).resistance.ID)
	if q.below {
		add("hogging", q.view.Path()+"/"+pick(q.topped, "topped-centroid-depth-below", "centroid-depth-below"))
	}
	return plots
}

// prestrainKey is the entry that gives ε_p0.
func (j *job) prestrainKey(q *asked) string {
	for _, id := range []string{"prestrain", "topped-prestrain", "bare-prestrain"} {
		if key := q.prestrain[0].Path() + "/" + id; j.n.Entry(key) != nil {
			return key
		}
	}
	return ""
}

// takenAt says that an entry has a value at a station, or one for all.
func takenAt(l *trace.Line, row int) bool {
	if len(l.Axes) == 0 || l.Axes[0].Index != "" {
		return true
	}
	stretch := len(l.Shown) / len(l.Axes[0].Rows)
	return l.Taken(row * stretch)
}
