package design

import (
	"soffit/calc/ec2"
	"soffit/calc/mechanics"
	"soffit/calc/trace"
	"soffit/templates"
)

// prestressChapter gives tendon stresses from the stated losses, and the lengths of transmission and anchorage.
func (j *job) prestressChapter(c *trace.Chapter) {
	if j.ducted() {
		j.stressedTendons(c)
	} else {
		j.releasedTendons(c)
	}
	if !j.hasBars() {
		return
	}
	takes := trace.Take(j.section)
	if !j.profiled() {
		takes = append(takes, trace.Take(j.positions)...)
	}
	if j.ducted() {
		takes = append(takes, trace.Take(j.parameters, j.strengths)...)
	} else {
		takes = append(takes, trace.Take(j.transmission)...)
	}
	takes = append(takes, trace.Take(j.barData, j.barStrengths)...)
	if j.hasTopping() {
		takes = append(takes, trace.Take(j.toppingStrengths)...)
		if !j.ducted() {
			takes = append(takes, trace.Take(j.parameters)...)
		}
	}
	b := c.Block("bar-anchorage", "Anchorage of the bars", nil, takes...)
	j.barAnchorage = b
	if j.profiled() { // the places of the steel run over stations, which there are none of yet
		b.Step(mechanics.BarDepth)
	}
	if j.ducted() {
		b.Steps(ec2.BondStrengthCap, ec2.BondTensileStrength)
	}
	if j.hasTopping() {
		b.Steps(ec2.ToppingBondTensileStrength, ec2.ToppedBarBondConditions, ec2.BarBondSize, ec2.ToppedBarBond, ec2.BarAnchorageLength)
		return
	}
	b.Steps(ec2.BarBondConditions, ec2.BarBondSize, ec2.BarBond, ec2.BarAnchorageLength)
}

// releasedTendons is pretensioning: stresses, then transmission and anchorage by bond.
func (j *job) releasedTendons(c *trace.Chapter) {
	b := c.Block("stress", "Tendon stress", nil, trace.Take(j.parameters, j.tendons, j.tendonStrengths)...)
	j.stress = b
	b.Step(ec2.JackingLimit)
	b.Check(ec2.JackingKept)
	b.Steps(ec2.InitialStress, ec2.ReleaseLimit)
	b.Check(ec2.ReleaseKept)
	b.Step(ec2.FinalStress)

	places := j.positions
	if j.profiled() {
		places = c.Block("end-heights", "Heights of the tendons at the ends", nil, trace.Take(j.section, j.profile)...)
		places.Steps(mechanics.EndLevel, mechanics.TendonDepth)
	}
	b = c.Block("transmission", "Transmission and anchorage of the tendons", nil, trace.Take(j.parameters, j.section, places, j.tendons, j.strengths, j.tendonStrengths, j.stress)...)
	j.transmission = b
	b.Text("transmission", templates.Text("transmission"))
	b.Steps(ec2.TendonBondConditions, ec2.TensileDesignStrengthAtRelease, ec2.TransmissionBond, ec2.TransmissionLength, ec2.LowerTransmissionLength, ec2.UpperTransmissionLength)
	b.Steps(ec2.BondStrengthCap, ec2.BondTensileStrength, ec2.AnchorageBond, ec2.AnchorageLength)

	if j.anyDeflected() {
		b = c.Block("hold-down", "Where tendons are held down", nil, trace.Take(j.span, j.tendons, j.tendonStrengths, j.stress)...)
		b.Text("hold-down", templates.Text("deflected"))
		b.Steps(mechanics.HoldDownForce, mechanics.DeviationForce)
	}
}

// stressedTendons is post-tensioning: the stresses at the anchorage that the tendon is stressed from, its greatest.
func (j *job) stressedTendons(c *trace.Chapter) {
	b := c.Block("stress", "Tendon stress at the stressed anchorage", nil, trace.Take(j.parameters, j.tendons, j.tendonStrengths)...)
	j.stress = b
	b.Step(ec2.JackingLimit)
	b.Check(ec2.JackingKept)
	b.Steps(ec2.StressedInitialStress, ec2.StressedLimit)
	b.Check(ec2.StressedKept)
	b.Step(ec2.StressedFinalStress)
}

// profileAlong gives, where the heights of tendons change, those at each station, with the places of the steel that follow,
// and of post-tensioned tendons the friction on the way.
func (j *job) profileAlong(c, section *trace.Chapter) {
	if !j.profiled() {
		return
	}
	b := c.Block("profile", "Heights of the tendons along the member", j.stations, trace.Take(j.effects, j.profile)...)
	j.heights = b
	b.Row = j.midSpan()
	b.Text("profile", templates.Text("profile"))
	b.Steps(mechanics.TendonLevel, mechanics.TendonSlope)
	b.Table("along", "Heights and slopes of the rows along the member", j.stations, "actions.effects/position", mechanics.TendonLevel.ID, mechanics.TendonSlope.ID)
	j.places(section)
	if !j.ducted() {
		return
	}
	b = c.Block("friction", "Friction along the tendons", j.stations, trace.Take(j.effects, j.span, j.tendons, j.profile)...)
	j.friction = b
	b.Row = j.midSpan()
	b.Text("friction", templates.Text("friction"))
	b.Steps(ec2.AngleFromA, ec2.AngleFromB, ec2.FrictionFromA, ec2.FrictionFromB, ec2.StressAfterFriction)
	b.Table("along", "Changes of direction and stress after friction along the member", j.stations, "actions.effects/position", ec2.AngleFromA.ID, ec2.AngleFromB.ID, ec2.StressAfterFriction.ID)
}

// alongChapter gives what each row carries at each station.
func (j *job) alongChapter(c *trace.Chapter) {
	takes := trace.Take(j.effects, j.span, j.tendons, j.tendonStrengths, j.stress)
	if j.ducted() {
		takes = append(takes, trace.Take(j.friction, j.profile)...)
	} else {
		takes = append(takes, trace.Take(j.transmission)...)
	}
	if j.hasBars() {
		takes = append(takes, trace.Take(j.barData, j.barStrengths, j.barAnchorage)...)
	}
	b := c.Block("along", "Stress present and available along the member", j.stations, takes...)
	j.along = b
	b.Row = j.midSpan()
	present, available, caption := ec2.PresentStress.ID, ec2.AvailableStress.ID, "Stress in the tendons: present after all losses, and available at the ultimate limit state."
	if j.ducted() {
		present, available = ec2.PresentAfterFriction.ID, ec2.AnchoredStress.ID
		b.Text("anchored", templates.Text("anchored"))
		b.Steps(ec2.PresentAfterFriction, ec2.InitialAfterFriction)
		b.Require(ec2.StressLeft)
		b.Steps(ec2.AnchoredLength, ec2.AnchoredStress)
	} else {
		b.Steps(ec2.BondedLength, ec2.PresentStress, ec2.InitialPresentStress, ec2.AvailableStress)
	}
	if j.hasBars() {
		b.Step(ec2.BarAvailableStress)
	}
	if j.profiled() {
		b.Step(mechanics.PresentForce)
		b.Table("along", "Stress and force present and stress available in the rows along the member", j.stations, "actions.effects/position", present, mechanics.PresentForce.ID, available)
	} else {
		b.Table("along", "Stress present and available in the rows along the member", j.stations, "actions.effects/position", present, available)
	}
	plots := []trace.Plot{{Role: "x", Key: "actions.effects/position"}, {Role: "present", Key: present}, {Role: "available", Key: available}}
	if j.ducted() {
		plots = append(plots, trace.Plot{Role: "stressed-A", Key: "given.tendons/stressed-from-a"}, trace.Plot{Role: "stressed-B", Key: "given.tendons/stressed-from-b"})
	}
	b.Figure("diagram", "tendon-stress", caption, "", plots...)
}
