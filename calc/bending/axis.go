package bending

// Pivot says which strain is at its limit.
type Pivot int

const (
	// PivotTop: the top fibre is at ε_cu.
	PivotTop Pivot = iota
	// PivotSteel: a layer of steel is at ε_ud, the top fibre below ε_cu.
	PivotSteel
	// PivotCore: the section is wholly compressed and the fibre at the depth (1 − ε_c2/ε_cu2)·h is at ε_c2
	// (EN 1992-1-1, 6.1(6) and figure 6.1); by Fibres alone.
	PivotCore
	// PivotFlange: the mean strain of the compression flange is at its limit (EN 1992-1-1, 6.1(5)).
	PivotFlange
	// PivotEdge: the upper edge of a concrete within the section is at its ε_cu; with Limits alone.
	PivotEdge
)

func (p Pivot) String() string {
	switch p {
	case PivotTop:
		return "top fibre"
	case PivotSteel:
		return "steel"
	case PivotCore:
		return "core"
	case PivotFlange:
		return "flange"
	case PivotEdge:
		return "inner edge"
	}
	return "none"
}

// Axis is a state of strain in which the forces balance, at the limit of a strain.
type Axis struct {
	X         float64 // mm, depth of the neutral axis below the top fibre; with strain locked in that of the plane, maybe above it
	Curvature float64 // κ, 1/mm
	TopStrain float64 // κ·x, compression positive
	Pivot     Pivot
	Layer     int // index of the layer at its limit with PivotSteel, else −1
	Edge      int // index of the edge at its limit with PivotTop (0 for a section alone) and PivotEdge, else −1
	// Reduced: the zone narrows toward the compressed edge, and the stress of the block was cut by Narrowing.
	Reduced bool

	Concrete      float64 // N, force of the concrete, compression positive
	ConcreteDepth float64 // mm, depth of that force below the top fibre
	Steel         float64 // N, sum of the layers, tension positive
	Axial         float64 // N, the axial force, compression positive
	// Moment is M_Rd, N·mm, sagging positive: that of concrete and steel about the depth of the axial force,
	// about any depth if there is none. It is not positive where the steel pulls at or above the force of the
	// concrete: then the section does not resist sagging.
	Moment float64

	Residual float64 // N, Concrete − Steel − Axial
	Lo, Hi   float64 // mm, the bracket in which X was found
	Evals    int     // evaluations of the balance in the search
}

// NeutralAxis finds the neutral axis with the rectangular stress block, and M_Rd with it. x is sought in
// (0, h/λ], where the block covers the whole section; x > h says that the section is wholly compressed.
// The curvature is the smaller of ε_cu/x and what Curvature gives for the layers.
//
// Where steel, or a flange, governs, the block stands although the top fibre is below ε_cu: TopStrain tells.
// Where more than one state balances, which takes a strain limit reached in a layer that is not the lowest or
// in a flange, the state of smallest curvature is returned, for it is reached first; such states are told apart
// in 16 steps over the depth in which that limit can govern, and at the peaks between them.
//
// Residual is below 1e-6 of the force of the concrete, or of the axial one if that is greater; but for rounding
// where pulling and pushing steel nearly outweigh each other. Domain: λ in
// (0, 1], η·f_cd > 0, ε_cu > 0. Errors are *Refusal with every Reason. Nothing is allocated unless it fails.
func (s *Section) NeutralAxis(law BlockLaw, layers []Layer) (Axis, error) {
	return s.NeutralAxisUnder(Conditions{}, law, layers)
}

// NeutralAxisUnder is NeutralAxis under conditions.
func (s *Section) NeutralAxisUnder(c Conditions, law BlockLaw, layers []Layer) (Axis, error) {
	if err := law.check(); err != nil {
		return Axis{}, err
	}
	p := problem{section: s, layers: layers, block: law, epsCu: law.EpsCu, Conditions: c}
	return p.narrowing(s.height / law.Lambda)
}

// Fibres finds the neutral axis and M_Rd a second way, with the parabola–rectangle law of the concrete,
// integrated over the section. x is sought in (0, 10·h]; where x > h the strain turns about the core
// (PivotCore) instead of the top fibre. All else as NeutralAxis. Domain: n ≥ 1, 0 < ε_c2 ≤ ε_cu2, f_cd > 0.
//
// With N = 1, ε_c3 for ε_c2 and ε_cu3 for ε_cu2 the law is the bilinear one of 3.1.7(2).
func (s *Section) Fibres(law Parabola, layers []Layer) (Axis, error) {
	return s.FibresUnder(Conditions{}, law, layers)
}

// FibresUnder is Fibres under conditions.
func (s *Section) FibresUnder(c Conditions, law Parabola, layers []Layer) (Axis, error) {
	if err := law.check(); err != nil {
		return Axis{}, err
	}
	p := problem{section: s, layers: layers, curved: true, parabola: law, epsCu: law.EpsCu2, Conditions: c}
	return p.solve(deepest * s.height)
}
