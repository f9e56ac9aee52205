package member

import (
	"math"
	"slices"

	"soffit/calc/quantity"
	"soffit/calc/tendon"
)

// layer is a row of strands, ducts or bars as circles in the section, lengths in mm.
type layer struct {
	what            string // "strands", "ducts", "bars"
	name            string
	count           Count
	spacing, height Value // the height of a duct is that of its first point
	positions       []Value
	n               int
	d               float64   // diameter
	xs              []float64 // from the axis of symmetry, from left to right; nil where not known, or not possible
	profile         tendon.Profile
	rise            Value        // of deflected strands
	points          []ProfileRow // of ducts
}

// layers are the rows of which enough is known.
func (r *reader) layers(m *Member) []layer {
	if m.Strands.Present() && m.Ducts.Present() {
		return nil // one of them has to go: a finding already
	}
	var out []layer
	add := func(l layer, name Word, diameter float64, known bool) {
		if l.n = l.count.N; known && l.n > 0 && diameter > 0 {
			l.name, l.d = name.Text, diameter
			out = append(out, l)
		}
	}
	for i := range m.Strands.Rows {
		s := &m.Strands.Rows[i]
		d, _, ok := product(m.Strands.Products, r.opt.Products, s.Product.Text)
		p, way := s.way(m.Span.Length)
		add(layer{what: "strands", count: s.Count, spacing: s.Spacing, height: s.Height, positions: s.Positions, xs: s.Across(), profile: p, rise: s.Deflected.Rise}, s.Name, d, ok && way)
	}
	for i := range m.Ducts.Rows {
		s := &m.Ducts.Rows[i]
		if p, ok := s.way(); ok {
			add(layer{what: "ducts", count: s.Count, spacing: s.Spacing, height: s.Profile[0].Height, positions: s.Positions, xs: s.Across(), profile: p, points: s.Profile}, s.Name, s.Diameter.Base(), true)
		}
	}
	for i := range m.Bars.Rows {
		s := &m.Bars.Rows[i]
		add(layer{what: "bars", count: s.Count, spacing: s.Spacing, height: s.Height, positions: s.Positions, xs: s.Across(), profile: level(s.Height.Base())}, s.Name, s.Diameter.Base(), s.Height.Present())
	}
	return out
}

func millimetres(d float64) Value {
	return Value{Literal: quantity.Literal{Number: quantity.Format(d, 2), Unit: quantity.MustUnit("mm")}}
}

// key is the key that places the row across the section.
func (a *layer) key() string {
	switch {
	case len(a.positions) > 0:
		return "positions"
	case a.n == 1:
		return "height"
	case a.spacing.Given:
		return "spacing"
	}
	return "count"
}

// across is where that key stands.
func (a *layer) across() Origin {
	switch a.key() {
	case "positions":
		return a.positions[0].Origin
	case "spacing":
		return a.spacing.Origin
	case "height":
		return a.height.Origin
	}
	return a.count.Origin
}

// one is one of the row: "strand".
func (a *layer) one() string { return a.what[:len(a.what)-1] }

// clear finds a row b of which a strand lies in one of row a.
func (a *layer) clear(r *reader, b *layer) {
	least := (a.d + b.d) / 2
	if a.xs == nil || b.xs == nil {
		return
	}
	dy, at := nearest(a.profile, b.profile)
	if dy >= least {
		return
	}
	if apart := math.Hypot(gap(a.xs, b.xs), dy); exceeds(least, apart) {
		how, hint := "come within "+shown(apart, b.height), "write another height or spacing for one of the rows"
		if !straight(a.profile) || !straight(b.profile) {
			how += " near " + metres(math.Round(at/10)*10) + " from end A"
			if apart == 0 {
				how = "cross near " + metres(math.Round(at/10)*10) + " from end A"
			}
			hint = "write other places across the section for one of the rows: a spacing, or positions"
		}
		r.at(b.height.Origin, "height: "+a.name+" and "+b.name+" "+how+", axis to axis, want at least "+shown(least, b.height), hint)
	}
}

func metres(mm float64) string { return short(mm/1000) + " m" }

// nearest is how near two rows come in height, and where.
func nearest(p, q tendon.Profile) (dy, at float64) {
	dy = math.Inf(1)
	places := looked(p, fine)
	if !straight(q) {
		places = looked(q, fine)
		if !straight(p) {
			places = append(places, looked(p, fine)...)
		}
	}
	slices.Sort(places)
	var before float64
	for i, x := range places {
		d := p.Height(x) - q.Height(x)
		if i > 0 && before*d < 0 {
			return 0, x
		}
		if math.Abs(d) < dy {
			dy, at = math.Abs(d), x
		}
		before = d
	}
	return dy, at
}

// gap is the smallest distance between a place of one row and one of another, both from left to right.
func gap(a, b []float64) float64 {
	best := math.Inf(1)
	for i, k := 0, 0; i < len(a) && k < len(b); {
		d := a[i] - b[k]
		best = min(best, math.Abs(d))
		if d < 0 {
			i++
		} else {
			k++
		}
	}
	return best
}
