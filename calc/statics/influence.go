package statics

// ByInfluence finds the moment, N·mm, and the shear, N, at x a second way: the loads are weighed with the
// influence lines of the section, which are drawn from the movement of the beam as a mechanism and need no
// reaction, and integrated numerically in n slices a load. The shear is the mean of the values left and
// right of x. Signs as Moment and Shear. The parts of a load that hold the kink of the line are exact to
// 1/n² of their share. It panics if n < 1.
func (s Loaded) ByInfluence(x float64, n int) (moment, shear float64) {
	if n < 1 {
		panic("statics.ByInfluence: n < 1")
	}
	for _, l := range s.Loads {
		moment += l.Force * s.Beam.momentLine(x, l.From)
		shear += l.Force * s.Beam.shearLine(x, l.From)
		dx := (l.To - l.From) / float64(n)
		for k := range n {
			at := l.From + (float64(k)+0.5)*dx
			moment += l.Intensity * dx * s.Beam.momentLine(x, at)
			shear += l.Intensity * dx * s.Beam.shearLine(x, at)
		}
	}
	return moment, shear
}

// momentLine is the moment at x, mm, from a unit load at at: the sag of a beam hinged at x and bent there
// by one radian, held at the bearings.
func (b Beam) momentLine(x, at float64) float64 {
	span := b.B - b.A
	switch {
	case x <= b.A:
		return -max(0, x-at)
	case x >= b.B:
		return -max(0, at-x)
	case at <= x:
		return (at - b.A) * (b.B - x) / span
	default:
		return (b.B - at) * (x - b.A) / span
	}
}

// shearLine is the shear at x from a unit load at at: the sag of a beam cut at x and offset there by one,
// its two parts kept parallel and held at the bearings. At a jump it is the mean of the two sides.
func (b Beam) shearLine(x, at float64) float64 {
	return (b.shearLineSide(x, at, true) + b.shearLineSide(x, at, false)) / 2
}

// shearLineSide is the line of the section just left or just right of x.
func (b Beam) shearLineSide(x, at float64, left bool) float64 {
	before := at < x || at == x && !left // the load stands left of the section
	switch {
	case x < b.A || x == b.A && left:
		if before {
			return -1
		}
		return 0
	case x > b.B || x == b.B && !left:
		if before {
			return 0
		}
		return 1
	case before:
		return (b.A - at) / (b.B - b.A)
	default:
		return (b.B - at) / (b.B - b.A)
	}
}
