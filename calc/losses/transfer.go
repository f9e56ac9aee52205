package losses

import "math"

// Transfer is the elastic moment of a release: bonded steel under tension lets go of its bed and holds on to the concrete.
type Transfer struct {
	Area, Centroid, Inertia float64 // of the concrete, mm², mm above the soffit, mm⁴
	Modulus                 float64 // of the concrete on that day, MPa
	Moment, Force, Height   float64 // of what acts at once, N·mm, sagging positive, and N, tension positive, at Height, mm above the soffit
	Steel                   []Steel // with the stress before
}

// Transformed gives the stress of each layer after the release, MPa, and the plane of strain, from the section in which the
// steel counts n times. An error is a *Refusal: BadTransfer, BadSteel.
func (t Transfer) Transformed() ([]float64, Plane, error) {
	if err := t.check(); err != nil {
		return nil, Plane{}, err
	}
	area, first := t.Area, t.Area*t.Centroid
	for _, p := range t.Steel {
		n := p.Modulus / t.Modulus
		area += n * p.Area
		first += n * p.Area * p.Height
	}
	centroid := first / area
	inertia := t.Inertia + t.Area*(t.Centroid-centroid)*(t.Centroid-centroid)
	force, moment := t.Force, t.Moment-t.Force*(t.Height-centroid)
	for _, p := range t.Steel {
		arm := p.Height - centroid
		inertia += p.Modulus / t.Modulus * p.Area * arm * arm
		force -= p.Area * p.Stress
		moment += p.Area * p.Stress * arm
	}
	curvature := moment / (t.Modulus * inertia)
	plane := Plane{force/(t.Modulus*area) + curvature*centroid, curvature}
	out := make([]float64, len(t.Steel))
	for i, p := range t.Steel {
		out[i] = p.Stress + p.Modulus*plane.At(p.Height)
	}
	return out, plane, nil
}

// Iterated gives the stress of each layer after the release, MPa, a second way: the forces of the steel act on the concrete
// alone, the steel shortens with it, and so again with the lesser forces until they stand; and how many rounds that took. It
// does not settle where the steel is stiffer than the concrete. An error is a *Refusal: BadTransfer, BadSteel, Unsettled.
func (t Transfer) Iterated() (stress []float64, count int, err error) {
	if err := t.check(); err != nil {
		return nil, 0, err
	}
	stress = make([]float64, len(t.Steel))
	for i, p := range t.Steel {
		stress[i] = p.Stress
	}
	for count = 1; count <= 500; count++ {
		force, moment := t.Force, t.Moment-t.Force*(t.Height-t.Centroid)
		for i, p := range t.Steel {
			force -= p.Area * stress[i]
			moment += p.Area * stress[i] * (p.Height - t.Centroid)
		}
		moved, size := 0.0, 0.0
		for i, p := range t.Steel {
			concrete := force/t.Area - moment/t.Inertia*(p.Height-t.Centroid)
			next := p.Stress + p.Modulus/t.Modulus*concrete
			moved, size = math.Max(moved, math.Abs(next-stress[i])), math.Max(size, math.Abs(next))
			stress[i] = next
		}
		if moved <= 1e-13*size && finite(size) {
			return stress, count, nil
		}
	}
	return nil, 0, &Refusal{Reason: Unsettled}
}

func (t Transfer) check() error {
	if !(t.Area > 0 && t.Inertia > 0 && t.Modulus > 0) || !finite(t.Area, t.Inertia, t.Modulus, t.Centroid, t.Moment, t.Force, t.Height) {
		return &Refusal{Reason: BadTransfer}
	}
	for i, p := range t.Steel {
		if !p.sound() {
			return &Refusal{Reason: BadSteel, Index: i}
		}
	}
	return nil
}

// sound says whether steel is steel.
func (p Steel) sound() bool {
	return p.Area >= 0 && p.Modulus > 0 && p.Relaxed >= 0 && finite(p.Area, p.Modulus, p.Relaxed, p.Height, p.Stress)
}
