package bending

import "math"

// several gives the depth above which more than one state may balance: there a layer with a strain limit can
// govern and another lies below it, which stretches the more the deeper the neutral axis. It is 0 if no layer
// is so. Below that depth, and everywhere if there is none, the balance rises with x; but where the flange's
// strain governs, bars above its middle, a graded block and concrete short of its strength may let go as the
// neutral axis goes down, and so may all above an edge within the section: more than one state may balance at any
// depth.
func (p *problem) several() (reach float64) {
	if f := p.Flange; f.lets(p.layers) || f.Depth > 0 && (p.graded || p.locked || p.uneven || f.Strain < p.parabola.EpsC2) {
		return p.height()
	}
	if p.limits != nil && p.limits.inner() {
		return p.height()
	}
	epsCu := p.epsCu
	if p.limits != nil { // all edges at the top
		epsCu = p.limits.most()
	}
	lowest := 0.0
	for i := range p.layers {
		if l := &p.layers[i]; !l.idle() {
			lowest = math.Max(lowest, l.Depth)
		}
	}
	for i := range p.layers {
		l := &p.layers[i]
		if l.idle() || math.IsInf(l.Law.limit, 1) || l.Depth >= lowest {
			continue
		}
		// ε_cu/x = (ε_ud − ε_p0)/(d − x)
		reach = math.Max(reach, l.Depth*epsCu/(epsCu+l.Law.limit-l.Prestrain))
	}
	return reach
}

// first finds, of the states that balance between lo and hi, that of smallest curvature. It looks for changes
// of sign in steps from lo to reach, closer together toward the top, climbs the peaks that the steps show below
// zero, and goes on beyond reach, where the balance rises.
func (p *problem) first(lo, reach, hi float64) (Axis, error) {
	var best Axis
	var failed error
	evals := scan + 1
	take := func(axis Axis, err error) {
		evals += axis.Evals
		switch {
		case err != nil:
			failed = err
		case best.Evals == 0 || axis.Curvature < best.Curvature:
			best = axis
		}
	}
	var x, f [scan + 1]float64
	for i := range x {
		part := float64(i) / scan
		x[i] = lo + (reach-lo)*part*part
		f[i] = p.balance(x[i])
	}
	for i := 1; i <= scan; i++ {
		switch {
		case (f[i-1] < 0) != (f[i] < 0):
			take(p.within(x[i-1], x[i]))
		case i < scan && f[i] < 0 && f[i] >= f[i-1] && f[i] > f[i+1]:
			if peak, n := p.climb(x[i-1], x[i+1]); p.balance(peak) >= 0 {
				evals += n
				take(p.within(x[i-1], peak))
				take(p.within(peak, x[i+1]))
			}
		}
	}
	if f[scan] < 0 {
		take(p.single(x[scan], hi))
	}
	if best.Evals == 0 {
		return Axis{}, failed
	}
	best.Evals = evals
	return best, nil
}

// climb goes up to a peak of the balance between a and b by golden section and stops where the balance is no
// longer negative, or at the peak. evals counts the evaluations.
func (p *problem) climb(a, b float64) (x float64, evals int) {
	const golden = 0.61803398874989484820
	l, r := b-golden*(b-a), a+golden*(b-a)
	fl, fr := p.balance(l), p.balance(r)
	for evals = 2; evals < 40; evals++ {
		switch {
		case fl >= 0:
			return l, evals
		case fr >= 0:
			return r, evals
		case fl > fr:
			b, r, fr = r, l, fl
			l = b - golden*(b-a)
			fl = p.balance(l)
		default:
			a, l, fl = l, r, fr
			r = a + golden*(b-a)
			fr = p.balance(r)
		}
	}
	return (a + b) / 2, evals
}
