package design

import (
	"soffit/calc/ec2"
	"soffit/calc/trace"
)

// materialsChapter gives the design strengths, 3.1 to 3.3.
func (j *job) materialsChapter(c *trace.Chapter) {
	b := c.Block("concrete", "Concrete", nil, trace.Take(j.parameters, j.concrete)...)
	j.strengths = b
	b.Steps(ec2.MeanStrength, ec2.MeanTensileStrength, ec2.LowerTensileStrength, ec2.SecantModulus, ec2.DesignStrength)
	b.Steps(ec2.BlockDepthFactor, ec2.BlockStressFactor, ec2.UltimateStrain3)
	b.Steps(ec2.ParabolaStrain, ec2.UltimateStrain2, ec2.ParabolaExponent)
	b.Steps(ec2.MeanStrengthAtRelease, ec2.MeanTensileStrengthAtRelease)

	b = c.Block("tendons", "Tendons", nil, trace.Take(j.parameters, j.tendons)...)
	j.tendonStrengths = b
	b.Steps(ec2.TendonArea, ec2.ProofStrength, ec2.TendonDesignStrength, ec2.TendonYieldStrain)
	if j.inclined() {
		b.Steps(ec2.TendonStrainLimit, ec2.TendonStressInclined)
	} else {
		b.Step(ec2.TendonStressHorizontal)
	}
	if !j.hasBars() {
		return
	}
	b = c.Block("bars", "Passive bars", nil, trace.Take(j.parameters, j.barData)...)
	j.barStrengths = b
	b.Steps(ec2.BarArea, ec2.BarDesignStrength, ec2.BarYieldStrain)
	if j.barInclined() {
		b.Steps(ec2.BarStrainLimit, ec2.BarStressInclined)
	} else {
		b.Step(ec2.BarStressHorizontal)
	}
}
