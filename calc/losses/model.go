// Package losses follows a prestressed section through time, step by step: concretes that creep and shrink, each from its own
// age, tendons that relax, bars, all in one plane of strain.
//
// Units are N, mm, MPa and days on one common time line. Stresses and strains are positive in tension and elongation, so
// concrete in compression is negative; heights count upward from the soffit; sagging moments and curvatures are positive. A plane
// gives the strain Strain − Curvature·y at the height y.
//
// Concrete is linear and obeys the principle of superposition: the strain at t is ∫J(t, t′)·dσ(t′) less the free shrinkage. The
// integral is taken step by step with the trapezoidal rule for gradual changes of stress, and exactly for sudden ones (the
// usual second-order step-by-step method). Within a concrete all is linear over its height, so that area, centroid and
// second moment stand for it exactly; no fibres are needed.
//
// Relaxation follows the method of equivalent time (EN 1992-1-1, Annex D): see Relaxation.
package losses

// Law is a concrete as it ages. Times are days on the common time line; a law that counts from its own casting shifts them.
type Law interface {
	// Compliance is the strain at t of a stress of 1 MPa that acts since loaded ≤ t, elastic strain included, 1/MPa, above 0:
	// at t = loaded it is the inverse of the modulus at that time.
	Compliance(t, loaded float64) float64
	// Shrinkage is the free shortening at t, positive; its origin is of no account.
	Shrinkage(t float64) float64
}

// Concrete is a part of the section that is cast at once. Its area should be net of steel; given gross, it is as if the concrete
// went through the steel.
type Concrete struct {
	Area     float64 // mm²
	Centroid float64 // mm above the soffit
	Inertia  float64 // mm⁴, about its own centroid
	Bottom   float64 // mm above the soffit: the edges at which stresses are given
	Top      float64
	Ageing   *Ageing
}

// Steel is a layer of tendons or bars.
type Steel struct {
	Area    float64 // mm²
	Height  float64 // mm above the soffit
	Modulus float64 // MPa
	// Stress is what it has when it joins the section, MPa, tension positive; 0 for bars. Relaxed is what it has lost of its
	// stress by relaxation before, MPa: Stress + Relaxed is what it would have without.
	Stress, Relaxed float64
	Relaxation      Relaxation // nil for none
}

// Section is all that ever makes up the section.
type Section struct {
	Concretes []Concrete
	Steel     []Steel
}

// Event is something sudden. The section answers elastically, with the moduli of the day.
type Event struct {
	Time float64 // days, one of the times of the time line
	// Moment and Force are added to what acts from outside: N·mm, sagging positive, and N, tension positive, at Height, mm.
	Moment, Force, Height float64
	// Concretes and Steel join, by index. A concrete joins without stress in whatever plane the section has, as one
	// that sets does; steel joins with its Stress.
	Concretes, Steel []int
	// Jacked: the joining steel is held at its Stress while the section gives way, as with jacks that press against it. Else it is
	// bonded already and gives way with the section, as at the release of pretensioned strands.
	Jacked bool
	// Leaving steel is cut or let go, by index.
	Leaving []int
}

// Plane is a plane of strain: Strain − Curvature·y at y mm above the soffit.
type Plane struct {
	Strain    float64 // at the soffit, elongation positive
	Curvature float64 // 1/mm, sagging positive
}

// At is the strain at a height, mm above the soffit.
func (p Plane) At(y float64) float64 { return p.Strain - p.Curvature*y }

// Edges are the stresses of a concrete at its two edges, MPa, tension positive; between them the stress is linear.
type Edges struct{ Bottom, Top float64 }

// State is the section at one time, after a step or an event. Parts that have not joined, or have left, have zeros.
type State struct {
	Time    float64
	Event   int // index of the event that led here, −1 for a step in time
	Plane   Plane
	Edges   []Edges   // of each concrete
	Stress  []float64 // of each layer of steel, MPa
	Relaxed []float64 // lost by relaxation so far, MPa, Steel.Relaxed included
	// Force and Moment are what the sum of all stresses lacks of the actions from outside, N, and N·mm about the soffit: nothing
	// but rounding.
	Force, Moment float64
}
