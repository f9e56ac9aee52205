package ec2

import (
	"slices"
	"strings"

	"soffit/calc/clause"
)

// The curvature at the ultimate limit state: the greatest that concrete and steel allow with the neutral axis at x.
//
// Concrete, 6.1(3)P to (6): the compressed edge at its ultimate strain; where a compression flange of depth z_fl is wholly
// compressed, its mean strain at ε_c2 or ε_c3; where the whole section is compressed, the strain at the depth
// (1 − ε_c2/ε_cu2)·h at ε_c2. Steel with an inclined branch: a row that is anchored at its strain limit.

// Curvature is the curvature for a way of taking the concrete: Alone where nothing else limits it, Concrete where steel
// may limit it too.
type Curvature struct{ Alone, Concrete *clause.Formula }

const (
	flangeTerm = "; cases(x > z_fl: %/(x − z_fl/2); otherwise: #)"
	coreTerm   = "cases(x > h_v: ε_cy/(x − (1 − ε_cy/ε_cu)·h_v); otherwise: ε_cu/x)"
)

// The ways of taking the concrete.
var (
	BlockCurvature        = curvatureOf("", "the compressed edge at its ultimate strain", "ε_cu3/x", hand("29.429 1/km", "ε_cu3 = 3.5 ‰", "x = 118.93 mm")...)
	FlangedBlockCurvature = curvatureOf("flanged-", "the compressed edge at its ultimate strain, a wholly compressed flange at its mean strain", "min(ε_cu3/x"+term("ε_c3", "ε_cu3/x")+")",
		append(hand("12.5 1/km", "ε_cu3 = 3.5 ‰", "x = 200 mm", "ε_c3 = 1.75 ‰", "z_fl = 120 mm"), hand("35 1/km", "ε_cu3 = 3.5 ‰", "x = 100 mm", "ε_c3 = 1.75 ‰", "z_fl = 120 mm")...)...)
	FibreCurvature = curvatureOf("fibre-", "the compressed edge at its ultimate strain, a wholly compressed section at that of its core", coreTerm,
		append(hand("5 1/km", "ε_cu = 3.5 ‰", "ε_cy = 2 ‰", "x = 700 mm", "h_v = 700 mm"), hand("4 1/km", "ε_cu = 3.5 ‰", "ε_cy = 2 ‰", "x = 800 mm", "h_v = 700 mm")...)...)
	FlangedFibreCurvature = curvatureOf("flanged-fibre-", "the compressed edge at its ultimate strain, a wholly compressed flange or section at its mean strain", "min("+coreTerm+term("ε_cy", "ε_cu/x")+")",
		append(hand("14.2857 1/km", "ε_cu = 3.5 ‰", "ε_cy = 2 ‰", "x = 200 mm", "h_v = 700 mm", "z_fl = 120 mm"), hand("35 1/km", "ε_cu = 3.5 ‰", "ε_cy = 2 ‰", "x = 100 mm", "h_v = 700 mm", "z_fl = 120 mm")...)...)
	ToppedCurvature = curvatureOf("topped-", "topping and member at their ultimate strains, a wholly compressed flange or section at its mean strain",
		"min("+toppingStrains.Replace(coreTerm+guarded("ε_cy", "ε_cu/x"))+"; cases(x > h_top: (ε_cu − ε_le)/(x − h_top); otherwise: ε_{cu,t}/x))",
		governed("ε_{cu,t} = 3.5 ‰", "ε_{cy,t} = 2 ‰", "ε_cu = 3.5 ‰", "h_top = 100 mm", "x = 300 mm", "h_v = 700 mm")(
			hand("11.6667 1/km", "ε_le = 1.1 ‰", "z_fl = 0 mm"), hand("7 1/km", "ε_le = 2.1 ‰", "z_fl = 0 mm"), hand("8 1/km", "ε_le = 1.1 ‰", "z_fl = 100 mm"))...)
	ToppedBelowCurvature = curvatureOf("topped-below-", "the soffit of the member at its ultimate strain beside the strain locked in, the topping at its own, a wholly compressed flange or section at its mean strain",
		"min("+besideLocked.Replace(coreTerm+guarded("ε_cy", "ε_cu/x"))+"; cases(x > h_v − h_top: ε_{cu,t}/(x − (h_v − h_top)); otherwise: (ε_cu − ε_le)/x))",
		governed("ε_cu = 3.5 ‰", "ε_cy = 2 ‰", "ε_le = 0.5 ‰", "x = 300 mm", "h_v = 700 mm", "h_top = 100 mm", "ε_{cu,t} = 3.5 ‰")(
			hand("10 1/km", "z_fl = 0 mm"), hand("6 1/km", "z_fl = 100 mm"))...)
)

// governed completes examples, in each of which another limit governs, with the operands that they share.
func governed(shared ...string) func(lists ...[]clause.Example) []clause.Example {
	return func(lists ...[]clause.Example) []clause.Example {
		all := slices.Concat(lists...)
		for i := range all {
			all[i].Given = append(all[i].Given, shared...)
		}
		return all
	}
}

var (
	toppingStrains = strings.NewReplacer("ε_cy", "ε_{cy,t}", "ε_cu", "ε_{cu,t}")
	besideLocked   = strings.NewReplacer("ε_cy", "(ε_cy − ε_le)", "ε_cu", "(ε_cu − ε_le)")
)

// guarded is a term for a flange that there may be.
func guarded(strain, edge string) string {
	return strings.Replace(term(strain, edge), "x > z_fl", "z_fl > 0·[mm] and x > z_fl", 1)
}

func term(strain, edge string) string {
	return strings.NewReplacer("%", strain, "#", edge).Replace(flangeTerm)
}

func curvatureOf(id, words, text string, examples ...clause.Example) Curvature {
	ref := en("6.1(3)P to (6) Figure 6.1", "")
	return Curvature{
		Alone:    clause.Define(&clause.Formula{ID: id + "curvature", Name: "Curvature: " + words, Ref: ref, Text: "κ = " + text, Unit: "1/km", Digits: 8, Examples: examples}),
		Concrete: clause.Define(&clause.Formula{ID: id + "concrete-curvature", Name: "Curvature that the concrete allows: " + words, Ref: ref, Text: "κ_c = " + text, Unit: "1/km", Digits: 8, Examples: examples}),
	}
}

// Curvatures where steel may reach its strain limit before the concrete: tendons, bars, both.
var (
	CurvatureWithLimit      = limitedCurvature("curvature-with-limit", "an anchored row of tendons", tendonLimit)
	CurvatureWithBarLimit   = limitedCurvature("curvature-with-bar-limit", "an anchored row of bars", barLimit)
	CurvatureWithBothLimits = limitedCurvature("curvature-with-both-limits", "an anchored row of steel", tendonLimit+barLimit)

	BareCurvatureWithBarLimit   = limitedCurvature("curvature-with-bare-bar-limit", "an anchored row of bars of the bare member", bareBarLimit)
	BareCurvatureWithBothLimits = limitedCurvature("curvature-with-bare-limits", "an anchored row of steel of the bare member", tendonLimit+bareBarLimit)

	LockedCurvatureWithBarLimit   = limitedCurvature("curvature-with-locked-bar-limit", "an anchored row of bars", lockedBarLimit)
	LockedCurvatureWithBothLimits = limitedCurvature("curvature-with-both-locked-limits", "an anchored row of steel", tendonLimit+lockedBarLimit)
)

const (
	tendonLimit    = "; min_i(cases(d_{p,i} > x and σ_{av,i} ≥ f_{pd,i}: (ε_{pud,i} − ε_{p0,i})/(d_{p,i} − x); otherwise: κ_c))"
	barLimit       = "; min_j(cases(d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: ε_{sud,j}/(d_{s,j} − x); otherwise: κ_c))"
	bareBarLimit   = "; min_j(cases(A_{s,j} > 0·[mm²] and d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: ε_{sud,j}/(d_{s,j} − x); otherwise: κ_c))"
	lockedBarLimit = "; min_j(cases(d_{s,j} > x and σ_{sa,j} ≥ f_{yd,j}: (ε_{sud,j} − ε_{s0,j})/(d_{s,j} − x); otherwise: κ_c))"
)

func limitedCurvature(id, what, limits string) *clause.Formula {
	given, want := []string{"κ_c = 29.429 1/km", "x = 118.93 mm"}, ""
	if strings.Contains(limits, "_i(") {
		given, want = append(given, "d_{p,i} = 1140 mm", "ε_{pud,i} = 31.5 ‰", "ε_{p0,i} = 6.087 ‰", "σ_{av,i} = 1426.1 MPa", "f_{pd,i} = 1426.1 MPa"), "24.889 1/km"
	}
	if strings.Contains(limits, "_j(") {
		given, want = append(given, "d_{s,j} = 1140 mm", "ε_{sud,j} = 22.5 ‰", "σ_{sa,j} = 465.9 MPa", "f_{yd,j} = 434.78 MPa"), "22.036 1/km"
	}
	if strings.Contains(limits, "ε_{s0,j}") {
		given, want = append(given, "ε_{s0,j} = 0.1 ‰"), "21.938 1/km"
	}
	if strings.Contains(limits, "A_{s,j}") { // a second row, which is not there yet, would allow less
		two := strings.NewReplacer("d_{s,j} = 1140 mm", "d_{s,j} = 1140 mm, 1240 mm", "22.5 ‰", "22.5 ‰, 22.5 ‰", "465.9 MPa", "465.9 MPa, 465.9 MPa", "434.78 MPa", "434.78 MPa, 434.78 MPa")
		for i := range given {
			given[i] = two.Replace(given[i])
		}
		given = append(given, "A_{s,j} = 402 mm², 0 mm²")
	}
	examples := append(hand(want, given...), hand("20 1/km", append([]string{"κ_c = 20 1/km"}, given[1:]...)...)...)
	return clause.Define(&clause.Formula{ID: id, Name: "Curvature: what the concrete allows, or " + what + " at ε_ud, whichever is less", Ref: en("6.1(3)P Figure 6.1", ""),
		Text: "κ = min(κ_c" + limits + ")", Unit: "1/km", Digits: 8, Examples: examples})
}
