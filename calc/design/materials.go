package design

import (
	"soffit/calc/clause"
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
)

// materialsChapter gives the design strengths, 3.1 to 3.3.
func (j *job) materialsChapter(c *trace.Chapter) {
	b := c.Block("concrete", "Concrete", nil, trace.Take(j.parameters, j.concrete)...)
	j.strengths = b
	b.Steps(ec2.MeanStrength, ec2.MeanTensileStrength, ec2.LowerTensileStrength, ec2.SecantModulus, ec2.DesignStrength)
	b.Steps(ec2.BlockDepthFactor, ec2.BlockStressFactor, ec2.UltimateStrain3)
	b.Steps(ec2.ParabolaStrain, ec2.UltimateStrain2, ec2.ParabolaExponent, ec2.BilinearStrain)
	switch j.law() {
	case "parabola-rectangle":
		b.Steps(ec2.LawStrain, ec2.LawUltimate, ec2.LawExponent)
	case "bilinear":
		b.Steps(ec2.BilinearLawStrain, ec2.BilinearLawUltimate, ec2.BilinearLawExponent)
	}
	b.Steps(ec2.MeanStrengthAtRelease, ec2.MeanTensileStrengthAtRelease)
	j.toppingMaterial(c)

	b = c.Block("tendons", "Tendons", nil, trace.Take(j.parameters, j.tendons)...)
	j.tendonStrengths = b
	if j.ducted() {
		b.Step(ec2.StrandsInDucts)
	}
	b.Steps(ec2.TendonArea, ec2.ProofStrength, ec2.TendonDesignStrength, ec2.TendonYieldStrain)
	if j.inclined() {
		b.Steps(ec2.TendonStrainLimit, ec2.TendonStressInclined)
	} else {
		b.Step(ec2.TendonStressHorizontal)
	}
	if j.groups != nil {
		b.Step(mechanics.GroupArea)
	}
	if !j.hasBars() {
		return
	}
	j.barStrengths = j.barBlock(c, "bars", "Passive bars", ec2.BarArea)
	j.bareBars = j.barStrengths
	if j.hasTopping() {
		j.bareBars = j.barBlock(c, "bare-bars", "Passive bars of the bare member", ec2.BareBarArea)
	}
}

// barBlock gives area and design strengths of the bars.
func (j *job) barBlock(c *trace.Chapter, slug, title string, area *clause.Formula) *trace.Block {
	b := c.Block(slug, title, nil, trace.Take(j.parameters, j.barData)...)
	b.Steps(area, ec2.BarDesignStrength, ec2.BarYieldStrain)
	if j.barInclined() {
		b.Steps(ec2.BarStrainLimit, ec2.BarStressInclined)
	} else {
		b.Step(ec2.BarStressHorizontal)
	}
	return b
}
