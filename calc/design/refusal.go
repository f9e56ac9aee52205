package design

import (
	"errors"
	"fmt"
	"math"

	"soffit/calc/bending"
	"soffit/calc/trace"
)

// inWords says of a section for which the kernels find no neutral axis why there is none and what the designer can change.
func (j *job) inWords(err error, r *trace.Row, q *asked) error {
	var refusal *bending.Refusal
	if !errors.As(err, &refusal) {
		return err
	}
	var axial float64
	if q.axial != nil {
		axial = r.Value("N_Ed")
	}
	name := ""
	if refusal.Reason == bending.LimitSpent || refusal.Reason == bending.BadLayer {
		name = j.layerName(r, refusal.Layer)
	}
	return refused(refusal, axial, name)
}

// layerName is the row of steel that a layer of the kernels stands for; see layers.
func (j *job) layerName(r *trace.Row, layer int) string {
	tendons := j.tendonRows()
	if layer >= 0 && layer < len(tendons) {
		return tendons[layer].name
	}
	layer -= len(tendons)
	if layer >= 0 && j.hasBars() {
		for i, area := range r.Column("A_{s,j}") {
			if area == 0 { // in a topping that is not there yet
				continue
			}
			if layer == 0 {
				return j.m.Bars.Rows[i].Name.Text
			}
			layer--
		}
	}
	return ""
}

// refused puts a refusal of the kernels into words; axial is N_Ed in N, compression positive, 0 where there is none, and row
// the name of the layer that it is about. Forces come out in kN, strains in ‰.
func refused(r *bending.Refusal, axial float64, row string) error {
	kn := func(v float64) string { return fmt.Sprintf("%.0f kN", math.Abs(v)/1e3) }
	beside, steel := "", "the steel presses"
	switch {
	case axial > 0:
		beside, steel = ", beside an axial compression of "+kn(axial), "the steel and the axial compression of "+kn(axial)+" press"
	case axial < 0:
		beside, steel = ", beside an axial tension of "+kn(axial), "the steel less the axial tension of "+kn(axial)+" presses"
	}
	switch r.Reason {
	case bending.WhollyCompressed:
		return fmt.Errorf("%s with %s where the whole section in compression gives %s at most: take out tendons, or enlarge the section", steel, kn(r.Have), kn(r.Limit))
	case bending.NotHeld:
		return fmt.Errorf("all steel together holds %s of an axial tension of %s: add tendons or bars, or lessen the axial tension", kn(max(r.Have, 0)), kn(r.Limit))
	case bending.NoTension:
		held := "no row of steel pulls"
		if r.Have < -500 {
			held += ", and all together are pressed with " + kn(r.Have)
		}
		return fmt.Errorf("%s once the section bends, so that nothing balances the concrete%s: place tendons or bars farther from the compressed edge", held, beside)
	case bending.LimitSpent:
		return fmt.Errorf("the prestress strains the row %s by %.2f ‰ before the section bends, where its strain limit is %.2f ‰: lower its jacking stress, or write steel diagram: horizontal", row, 1e3*r.Have, 1e3*r.Limit)
	case bending.LockedIn:
		return fmt.Errorf("the strain locked into the member when the topping hardens presses its concrete with %s, and steel and axial force bear %s at most%s: cast the topping on props, add steel near the stretched edge, or take out prestress", kn(r.Have), kn(max(r.Limit, 0)), beside)
	case bending.EdgeSpent:
		return fmt.Errorf("the strain locked in at the edge of the member when the topping hardens is %.2f ‰, where its concrete bears %.2f ‰: cast the topping on props, take out prestress, or enlarge the section", 1e3*r.Have, 1e3*r.Limit)
	case bending.Unbalanced:
		if math.IsNaN(r.Have) {
			return fmt.Errorf("the forces in the section cannot be summed%s; a fault of soffit, not of the file: %w", beside, r.Reason)
		}
		return fmt.Errorf("steel and concrete come into balance but for %.3g kN, where %.3g kN are allowed%s: move a row of steel, or change the depth of the section, by a millimetre", math.Abs(r.Have)/1e3, r.Limit/1e3, beside)
	}
	if row != "" {
		row = ", row " + row
	}
	return fmt.Errorf("the section cannot be worked%s%s; a fault of soffit, not of the file: %w", row, beside, r)
}
