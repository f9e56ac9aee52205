package member

import (
	"fmt"
	"math"
	"slices"

	"soffit/calc/quantity"
)

// checkProducts looks at each product of the file for itself: strengths, strains, area and mass must go
// together.
func (r *reader) checkProducts(products []Product) {
	r.names(nameList(products, func(p *Product) Word { return p.Name }))
	for i := range products {
		p := &products[i]
		if _, ok := r.tabled(p.Name.Text); ok {
			r.at(p.Name.Origin, "name: have "+p.Name.Text+", which is a product of the tables", "write another name, or leave the product out")
		}
		if known(p.Fpk, p.Fp01k) && exceeds(p.Fp01k.Base(), p.Fpk.Base()) {
			r.at(p.Fp01k.Origin, "f_p01k: have "+p.Fp01k.String()+", want at most "+p.Fpk.String()+", the tensile strength", "write the 0.1 % proof strength that the maker declares")
		}
		if known(p.Fp01k, p.Ep, p.StrainAtMaximum) {
			if first := p.Fp01k.Base() / p.Ep.Base(); !exceeds(p.StrainAtMaximum.Base(), first) {
				r.at(p.StrainAtMaximum.Origin, "strain at maximum force: have "+p.StrainAtMaximum.String()+", want more than "+shown(first, p.StrainAtMaximum)+", where f_p01k is reached", "write the characteristic strain at maximum force ε_uk, 35 ‰ for strand")
			}
		}
		if known(p.Area, p.Diameter) {
			if circle := math.Pi / 4 * p.Diameter.Base() * p.Diameter.Base(); p.Area.Base() > 1.02*circle {
				r.at(p.Area.Origin, "area: have "+p.Area.String()+", want at most "+shown(circle, p.Area)+", a full circle of "+p.Diameter.String(), "write the nominal area of one strand, and its diameter")
			}
		}
		if known(p.Area, p.Mass) {
			if steel := p.Area.Base() * density; math.Abs(p.Mass.Base()/steel-1) > 0.1 {
				r.at(p.Mass.Origin, "mass: have "+p.Mass.String()+", want about "+shown(steel, p.Mass)+", that of "+p.Area.String()+" of steel", "write mass and area of the same product")
			}
		}
	}
}

// density of steel, in base units of mass per mm³.
var density = quantity.MustUnit("kg/m³").To(7850)

func (r *reader) tabled(name string) (ProductSpec, bool) {
	for _, p := range r.opt.Products {
		if p.Name == name {
			return p, true
		}
	}
	return ProductSpec{}, false
}

// product finds diameter and f_pk of a product of the file or of the tables, 0 where unknown; ok is false where there is no
// such product.
func product(own []Product, tables []ProductSpec, name string) (diameter, tensile float64, ok bool) {
	for i := range own {
		if p := &own[i]; p.Name.Text == name {
			return p.Diameter.Base(), p.Fpk.Base(), true
		}
	}
	for _, p := range tables {
		if p.Name == name {
			return p.Diameter, p.Tensile, true
		}
	}
	return 0, 0, false
}

// checkStress looks for the product of a row, and at its jacking stress.
func (r *reader) checkStress(own []Product, name Word, jack Value, hint string) {
	_, tensile, ok := product(own, r.opt.Products, name.Text)
	if name.Present() && !ok {
		r.at(name.Origin, "product: have "+clip(name.Text)+", which neither the tables nor products know", instead(name.Text, r.productNames(own)))
	}
	if jack.Present() && tensile > 0 && exceeds(jack.Base(), tensile) {
		r.at(jack.Origin, "jacking stress: have "+jack.String()+", want at most "+shown(tensile, jack)+", the tensile strength of the product", hint)
	}
}

// checkLosses looks at the order of stated losses; first is what they are at release or stressing.
func (r *reader) checkLosses(jack, first, final Value, key, hint string) {
	if known(final, first) && exceeds(first.Base(), final.Base()) {
		r.at(final.Origin, "final: have "+final.String()+", want at least "+first.String()+", the losses "+key, hint)
	}
	if known(jack, final) && !exceeds(jack.Base(), final.Base()) {
		r.at(final.Origin, "final: have "+final.String()+", want less than "+jack.String()+", the jacking stress", "write the sum of all losses")
	}
}

// checkStrands looks at products, stresses and losses, and at how much of the length is debonded.
func (r *reader) checkStrands(m *Member) {
	rows := m.Strands.Rows
	r.names(nameList(rows, func(s *StrandRow) Word { return s.Name }))
	for i := range rows {
		s := &rows[i]
		r.checkStress(m.Strands.Products, s.Product, s.JackingStress, "write the stress in the strand before release, without the losses")
		if s.Count.N > 1 && s.Spacing == (Value{}) && len(s.Positions) == 0 {
			r.at(Origin{Pos: s.Pos}, fmt.Sprintf("rows: have no spacing, want a length for %d strands", s.Count.N), "add, for example, spacing: 50 mm")
		}
		r.checkLosses(s.JackingStress, s.StatedLosses.AtRelease, s.StatedLosses.Final, "at release", "count all losses from the jacking stress")
		if known(s.DebondedLength, m.Span.Length) && !exceeds(m.Span.Length.Base()/2, s.DebondedLength.Base()) {
			r.at(s.DebondedLength.Origin, "debonded length: have "+s.DebondedLength.String()+", want less than "+shown(m.Span.Length.Base()/2, s.DebondedLength)+", half the length", "write the length from each end")
		}
		r.checkDeflection(s, m.Span.Length)
	}
}

// checkDeflection looks for places at which strands cannot be held down, and for deflected strands that are debonded.
func (r *reader) checkDeflection(s *StrandRow, length Value) {
	d := &s.Deflected
	if !d.Present() {
		return
	}
	if known(d.FromEnd, length) && exceeds(d.FromEnd.Base(), length.Base()/2) {
		r.at(d.FromEnd.Origin, "held down from ends: have "+d.FromEnd.String()+", want at most "+shown(length.Base()/2, d.FromEnd)+", half the length", "write the distance of each of the two points from its nearer end; half the length for one point at mid-length")
	}
	if s.DebondedLength.Base() > 0 {
		r.at(s.DebondedLength.Origin, "debonded length: have it for strands that are deflected, which is not covered", "write 0 m, or rows of their own for debonded and for deflected strands")
	}
}

func (r *reader) productNames(own []Product) []string {
	var names []string
	for i := range own {
		if w := own[i].Name; w.Present() {
			names = append(names, w.Text)
		}
	}
	for _, p := range r.opt.Products {
		names = append(names, p.Name)
	}
	slices.Sort(names)
	return names
}

func (r *reader) checkBars(m *Member) {
	r.names(nameList(m.Bars.Rows, func(s *BarRow) Word { return s.Name }))
}
