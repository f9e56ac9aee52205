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

// product finds diameter and f_pk of a row, 0 where unknown; ok is false where there is no such product.
func (r *reader) product(m *Member, name string) (diameter, tensile float64, ok bool) {
	for i := range m.Strands.Products {
		if p := &m.Strands.Products[i]; p.Name.Text == name {
			return p.Diameter.Base(), p.Fpk.Base(), true
		}
	}
	p, ok := r.tabled(name)
	return p.Diameter, p.Tensile, ok
}

// checkStrands looks at products, stresses and losses, and at how much of the length is debonded.
func (r *reader) checkStrands(m *Member) {
	rows := m.Strands.Rows
	r.names(nameList(rows, func(s *StrandRow) Word { return s.Name }))
	for i := range rows {
		s := &rows[i]
		_, tensile, ok := r.product(m, s.Product.Text)
		if s.Product.Present() && !ok {
			r.at(s.Product.Origin, "product: have "+clip(s.Product.Text)+", which neither the tables nor products know", instead(s.Product.Text, r.productNames(m)))
		}
		if s.Count.N > 1 && s.Spacing == (Value{}) {
			r.at(Origin{Pos: s.Pos}, fmt.Sprintf("rows: have no spacing, want a length for %d strands", s.Count.N), "add, for example, spacing: 50 mm")
		}
		jack, l := s.JackingStress, &s.StatedLosses
		if jack.Present() && tensile > 0 && exceeds(jack.Base(), tensile) {
			r.at(jack.Origin, "jacking stress: have "+jack.String()+", want at most "+shown(tensile, jack)+", the tensile strength of the product", "write the stress in the strand before release, without the losses")
		}
		if known(l.Final, l.AtRelease) && exceeds(l.AtRelease.Base(), l.Final.Base()) {
			r.at(l.Final.Origin, "final: have "+l.Final.String()+", want at least "+l.AtRelease.String()+", the losses at release", "count all losses from the jacking stress")
		}
		if known(jack, l.Final) && !exceeds(jack.Base(), l.Final.Base()) {
			r.at(l.Final.Origin, "final: have "+l.Final.String()+", want less than "+jack.String()+", the jacking stress", "write the sum of all losses")
		}
		if known(s.DebondedLength, m.Span.Length) && !exceeds(m.Span.Length.Base()/2, s.DebondedLength.Base()) {
			r.at(s.DebondedLength.Origin, "debonded length: have "+s.DebondedLength.String()+", want less than "+shown(m.Span.Length.Base()/2, s.DebondedLength)+", half the length", "write the length from each end")
		}
	}
}

func (r *reader) productNames(m *Member) []string {
	var names []string
	for i := range m.Strands.Products {
		if w := m.Strands.Products[i].Name; w.Present() {
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
