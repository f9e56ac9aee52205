package design

import (
	"soffit/calc/ec2"
	"soffit/calc/trace"
	"soffit/templates"
)

// prestressChapter gives tendon stresses from the stated losses, and the lengths of transmission and anchorage.
func (j *job) prestressChapter(c *trace.Chapter) {
	b := c.Block("stress", "Tendon stress", nil, trace.Take(j.parameters, j.tendons, j.tendonStrengths)...)
	j.stress = b
	b.Step(ec2.JackingLimit)
	b.Check(ec2.JackingKept)
	b.Steps(ec2.InitialStress, ec2.ReleaseLimit)
	b.Check(ec2.ReleaseKept)
	b.Step(ec2.FinalStress)

	b = c.Block("transmission", "Transmission and anchorage of the tendons", nil, trace.Take(j.parameters, j.section, j.positions, j.tendons, j.strengths, j.tendonStrengths, j.stress)...)
	j.transmission = b
	b.Text("transmission", templates.Text("transmission"))
	b.Steps(ec2.TendonBondConditions, ec2.TensileDesignStrengthAtRelease, ec2.TransmissionBond, ec2.TransmissionLength, ec2.LowerTransmissionLength, ec2.UpperTransmissionLength)
	b.Steps(ec2.BondStrengthCap, ec2.BondTensileStrength, ec2.AnchorageBond, ec2.AnchorageLength)
	if !j.hasBars() {
		return
	}
	b = c.Block("bar-anchorage", "Anchorage of the bars", nil, trace.Take(j.section, j.positions, j.transmission, j.barData, j.barStrengths)...)
	j.barAnchorage = b
	b.Steps(ec2.BarBondConditions, ec2.BarBondSize, ec2.BarBond, ec2.BarAnchorageLength)
}

// alongChapter gives what each row carries at each station.
func (j *job) alongChapter(c *trace.Chapter) {
	takes := trace.Take(j.effects, j.span, j.tendons, j.tendonStrengths, j.stress, j.transmission)
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barStrengths, j.barAnchorage)...)
	}
	b := c.Block("along", "Stress present and available along the member", j.stations, takes...)
	j.along = b
	b.Row = j.midSpan()
	b.Steps(ec2.BondedLength, ec2.PresentStress, ec2.InitialPresentStress, ec2.AvailableStress)
	if j.hasBars() {
		b.Step(ec2.BarAvailableStress)
	}
	b.Table("along", "Stress present and available in the rows along the member", j.stations, "actions.effects/position", "present-stress", "available-stress")
	b.Figure("diagram", "tendon-stress", "Stress in the tendons: present after all losses, and available at the ultimate limit state.", "",
		trace.Plot{Role: "x", Key: "actions.effects/position"}, trace.Plot{Role: "present", Key: "present-stress"}, trace.Plot{Role: "available", Key: "available-stress"})
}
