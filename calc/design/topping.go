package design

import (
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// toppingMaterial gives the design strengths of the topping, 3.1.
func (j *job) toppingMaterial(c *trace.Chapter) {
	if !j.hasTopping() {
		return
	}
	b := c.Block("topping", "Concrete of the topping", nil, trace.Take(j.parameters, j.topping)...)
	j.toppingStrengths = b
	b.Steps(ec2.ToppingMeanStrength, ec2.ToppingMeanTensileStrength, ec2.ToppingLowerTensileStrength, ec2.ToppingSecantModulus, ec2.ToppingDesignStrength)
	if j.law() == "bilinear" {
		b.Steps(ec2.ToppingBilinearStrain, ec2.ToppingUltimateStrain3)
		b.Steps(ec2.ToppingBilinearLawStrain, ec2.ToppingBilinearLawUltimate, ec2.ToppingBilinearLawExponent)
		return
	}
	b.Steps(ec2.ToppingParabolaStrain, ec2.ToppingUltimateStrain2, ec2.ToppingParabolaExponent)
	b.Steps(ec2.ToppingLawStrain, ec2.ToppingLawUltimate, ec2.ToppingLawExponent)
}

// compositeSection gives the properties of member and topping together, as concrete of the member.
func (j *job) compositeSection(c *trace.Chapter) {
	if !j.hasTopping() {
		return
	}
	b := c.Block("composite", "Member with its topping", nil, trace.Take(j.section, j.topping, j.gross, j.strengths, j.toppingStrengths)...)
	j.composite = b
	b.Text("assumed", "The topping lies on the top of the member over its whole width {b_top} and works with it without slip. Its concrete counts as concrete of the member, in the ratio of the moduli at 28 days; creep and shrinkage are left out of this ratio. The steel is left out.")
	b.Steps(mechanics.CompositeDepth, mechanics.ToppingRatio, mechanics.CompositeArea, mechanics.CompositeCentroid, mechanics.CompositeInertia)
	b.Steps(mechanics.CompositeLowerModulus, mechanics.CompositeUpperModulus, mechanics.CompositeToppingModulus)
}
