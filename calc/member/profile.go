package member

import "soffit/calc/tendon"

// Path is the way of a row of strands along a member of this length. Errors are those of calc/tendon.
func (s *StrandRow) Path(length Value) (tendon.Profile, error) {
	y, l, d := s.Height.Base(), length.Base(), &s.Deflected
	if !d.Rise.Present() {
		return tendon.Level(l, y)
	}
	return tendon.Deflected(l, y, d.Rise.Base(), d.FromEnd.Base())
}

// way is Path where enough is known of the row, also where the length is not.
func (s *StrandRow) way(length Value) (p tendon.Profile, ok bool) {
	d := &s.Deflected
	if !d.Present() {
		return level(s.Height.Base()), s.Height.Present()
	}
	if !known(s.Height, d.Rise, d.FromEnd, length) || exceeds(d.FromEnd.Base(), length.Base()/2) {
		return tendon.Profile{}, false
	}
	p, err := s.Path(length)
	return p, err == nil
}

// level is the way of straight steel at one height; how long it is plays no part.
func level(y float64) tendon.Profile {
	p, _ := tendon.Level(1, y)
	return p
}

// lines are the kinds of line of a profile by their words.
var lines = map[string]tendon.Line{"straight line": tendon.Straight, "parabola level here": tendon.LevelHere, "parabola level before": tendon.LevelBefore, "parabola onward": tendon.Onward}

// Path is the way of a duct. Errors are those of calc/tendon.
func (d *DuctRow) Path() (tendon.Profile, error) {
	points := make([]tendon.Point, len(d.Profile))
	for i := range d.Profile {
		q := &d.Profile[i]
		line, drawn := lines[q.By.Text]
		if i > 0 && !drawn {
			line = -1
		}
		points[i] = tendon.Point{X: q.At.Base(), Height: q.Height.Base(), By: line}
	}
	return tendon.New(points...)
}

// way is Path where every point is known.
func (d *DuctRow) way() (p tendon.Profile, ok bool) {
	for i := range d.Profile {
		if !known(d.Profile[i].At, d.Profile[i].Height) {
			return tendon.Profile{}, false
		}
	}
	p, err := d.Path()
	return p, err == nil
}

// looked are the places at which to look at a profile: its points, and between them so many that there are at least n; one of
// a level row.
func looked(p tendon.Profile, n int) []float64 {
	whole := p.To() - p.From()
	if straight(p) {
		return []float64{p.From()}
	}
	var out []float64
	for _, s := range p.Segments {
		parts := 1 + int(float64(n)*s.Length/whole)
		for k := range parts {
			out = append(out, s.Start+s.Length*float64(k)/float64(parts))
		}
	}
	return append(out, p.To())
}

// straight says that steel lies at one height from end to end.
func straight(p tendon.Profile) bool { return len(p.Segments) == 1 && p.Steepest() == 0 }

// lowest is the least height of a profile.
func lowest(p tendon.Profile) float64 { least, _ := p.Extremes(); return least }
