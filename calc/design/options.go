package design

import (
	"strings"

	"soffit/calc/ec2"
	"soffit/calc/member"
)

// Narratives are the slots of the note that take the engineer's own text: the chapter it opens.
var Narratives = []string{"verdict", "basis", "given", "materials", "section", "actions", "prestress", "ultimate", "second"}

// Options tell the member file which parameters, products and slots there are.
func Options() member.Options {
	o := member.Options{Narratives: Narratives}
	for _, p := range ec2.Parameters {
		s := member.ParameterSpec{Key: p.Given.Symbol, Ascii: p.ASCII, Min: p.Min, Max: p.Max, Unit: p.Given.Unit, Symbols: p.Symbols, Rows: p.Rows}
		s.Name, s.Recommended = p.Given.Name, p.Value
		switch {
		case p.Formula != nil:
			_, s.Recommended, _ = strings.Cut(p.Formula.Text, " = ")
			s.Kind = member.Expression
		case p.Rows != nil:
			s.Kind, s.Columns, s.Max = member.Table, len(p.Table[0]), 1
		}
		o.NationalParameters = append(o.NationalParameters, s)
	}
	for _, p := range ec2.Products {
		o.Products = append(o.Products, member.ProductSpec{Name: p.Name, Diameter: p.Diameter, Tensile: p.Tensile})
	}
	return o
}
