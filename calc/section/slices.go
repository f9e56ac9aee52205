package section

// ByStrips finds the properties a second way: every strip is cut into n level slices, each is taken as a
// rectangle of its middle width, and the second moment is summed about the soffit and moved to the centroid.
// It knows no formula of the trapezoid or the circle. The area of straight strips is exact; all else misses
// the exact values by a part that shrinks with n², where round parts begin or end with n^1.5. The lateral
// inertia is found for a stack of strips alone, else it is 0: an Outline's BySlices has it. It panics if
// n < 1.
func (s Shape) ByStrips(n int) Properties {
	if n < 1 {
		panic("section.ByStrips: n < 1")
	}
	var a, ay, ayy, lateral float64
	for i, t := range s.strips {
		foot := s.levels[i]
		dy := t.Height / float64(n)
		for k := range n {
			y := (float64(k) + 0.5) * dy
			b := t.widthAt(y)
			y += foot
			for _, c := range s.curves {
				b += c.WidthAt(y)
			}
			a += b * dy
			ay += b * dy * y
			ayy += b*dy*y*y + b*dy*dy*dy/12
			lateral += dy * b * b * b / 12
		}
	}
	if !s.stacked {
		lateral = 0
	}
	return Properties{Area: a, Centroid: ay / a, Inertia: ayy - ay*ay/a, LateralInertia: lateral}
}

// Chord is concrete at one level, from left to right, mm.
type Chord struct{ From, To float64 }

// Chords lists the concrete that a level line at height y above the soffit meets, from left to right: what
// the webs beside the voids are wide. At the level of a ledge it is what lies just above.
func (o Outline) Chords(y float64) []Chord {
	var out []Chord
	cuts := o.cuts(y, nil)
	for i := 1; i < len(cuts); i += 2 {
		out = append(out, Chord{cuts[i-1], cuts[i]})
	}
	return out
}

// cuts lists where a level line enters and leaves the concrete, in the room of the list given.
func (o Outline) cuts(y float64, cuts []float64) []float64 {
	cuts = cuts[:0]
	for _, rings := range [2][]Ring{o.contour.Outer, o.contour.Holes} {
		for _, r := range rings {
			a := r[len(r)-1]
			for _, b := range r {
				if (a.Y > y) != (b.Y > y) {
					cuts = append(cuts, a.X+(y-a.Y)/(b.Y-a.Y)*(b.X-a.X))
				}
				a = b
			}
		}
	}
	for _, rounds := range [2][]Round{o.contour.Voids, o.contour.Discs} {
		for _, r := range rounds {
			if half := r.halfWidth(y); half > 0 {
				cuts = append(cuts, r.X-half, r.X+half)
			}
		}
	}
	return sorted(cuts)
}

// BySlices finds the properties a third way: every strip is cut into n level slices, each is taken as the
// rectangles of concrete that the line through its middle meets, and their moments are summed about soffit and
// x = 0 and moved to the centroid. It knows no formula of polygon, trapezoid or circle, and takes of the strips
// only where they lie; what it misses shrinks with n², where round parts begin or end with n^1.5. It panics if
// n < 1.
func (o Outline) BySlices(n int) Properties {
	if n < 1 {
		panic("section.BySlices: n < 1")
	}
	var a, ax, ay, axx, ayy, axy float64
	var cuts []float64
	for i := 1; i < len(o.levels); i++ {
		dy := (o.levels[i] - o.levels[i-1]) / float64(n)
		for k := range n {
			y := o.levels[i-1] + (float64(k)+0.5)*dy
			cuts = o.cuts(y, cuts)
			for i := 1; i < len(cuts); i += 2 {
				b, x := cuts[i]-cuts[i-1], (cuts[i-1]+cuts[i])/2
				da := b * dy
				a += da
				ax += da * x
				ay += da * y
				axx += da * (x*x + b*b/12)
				ayy += da * (y*y + dy*dy/12)
				axy += da * x * y
			}
		}
	}
	return Properties{
		Area: a, CentroidX: ax / a, Centroid: ay / a,
		LateralInertia: axx - ax*ax/a, Inertia: ayy - ay*ay/a, Product: axy - ax*ay/a,
	}
}
