package section

// Properties are those a second method finds, in mm, mm², mm⁴; the names are those of Shape.
type Properties struct {
	Area, Centroid, Inertia, LateralInertia float64
}

// ByStrips finds the properties a second way: every strip is cut into n level slices, each is taken as a
// rectangle of its middle width, and the second moment is summed about the soffit and moved to the centroid.
// It knows no formula of the trapezoid. Area is exact; the others miss the exact ones by a part that shrinks
// with n². It panics if n < 1.
func (s Shape) ByStrips(n int) Properties {
	if n < 1 {
		panic("section.ByStrips: n < 1")
	}
	var a, ay, ayy, lateral float64
	foot := 0.0
	for _, t := range s.strips {
		dy := t.Height / float64(n)
		for k := range n {
			y := (float64(k) + 0.5) * dy
			b := t.widthAt(y)
			y += foot
			a += b * dy
			ay += b * dy * y
			ayy += b*dy*y*y + b*dy*dy*dy/12
			lateral += dy * b * b * b / 12
		}
		foot += t.Height
	}
	return Properties{Area: a, Centroid: ay / a, Inertia: ayy - ay*ay/a, LateralInertia: lateral}
}
