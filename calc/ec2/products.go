package ec2

import "soffit/calc/clause"

// Product is a prestressing product. FirstProof is the force at 0.1 % proof strain: f_p0,1k is that force over
// the area, never a ratio of f_pk.
type Product struct {
	Name                 string
	Diameter, Area       float64 // mm, mm²
	Mass                 float64 // g/m
	Tensile              float64 // f_pk, MPa, by the grade
	Greatest, FirstProof float64 // F_m, F_p0,1, kN
	Grade                clause.Grade
	Source               string
}

const (
	catalogue = "makers' pages quoting FprEN 10138-3:2009 (a draft; cite the maker's approval for a real job)"
	fromMind  = "EN 10138-3 drafts"
)

// Products are seven- and three-wire strands.
var Products = []Product{
	{"Y1860S7-6.9", 6.9, 29, 226.5, 1860, 53.9, 47.4, clause.Opened, catalogue},
	{"Y1860S7-8.0", 8.0, 38, 296.8, 1860, 70.7, 62.2, clause.Opened, catalogue},
	{"Y1770S7-9.0", 9.0, 50, 390.5, 1770, 88.5, 77.9, clause.Opened, catalogue},
	{"Y1860S7-9.3", 9.3, 52, 406.1, 1860, 96.7, 85.1, clause.Opened, catalogue},
	{"Y1860S7-12.5", 12.5, 93, 726.3, 1860, 173, 152, clause.Opened, catalogue},
	{"Y1860S7-12.9", 12.9, 100, 781, 1860, 186, 164, clause.Opened, catalogue},
	{"Y1860S7-15.2", 15.2, 139, 1086, 1860, 259, 228, clause.Opened, catalogue},
	{"Y1860S7-15.3", 15.3, 140, 1093, 1860, 260, 229, clause.Opened, catalogue},
	{"Y1860S7-15.7", 15.7, 150, 1172, 1860, 279, 246, clause.Opened, catalogue},
	{"Y1770S7-15.7", 15.7, 150, 1172, 1770, 266, 234, clause.Opened, catalogue},
	{"Y1860S3-6.5", 6.5, 21.2, 165.6, 1860, 39.4, 34.7, clause.Opened, catalogue},
	{"Y1860S3-6.9", 6.9, 23.4, 182.8, 1860, 43.5, 38.3, clause.Opened, catalogue},
	{"Y1860S3-8.6", 8.6, 37.4, 292.1, 1860, 69.6, 61.2, clause.Opened, catalogue},
	{"Y1770S7-12.5", 12.5, 93, 726.3, 1770, 165, 145, clause.Recalled, fromMind},
	{"Y1770S7-12.9", 12.9, 100, 781, 1770, 177, 156, clause.Recalled, fromMind},
	{"Y1770S7-15.2", 15.2, 139, 1086, 1770, 246, 216, clause.Recalled, fromMind},
	{"Y1770S7-15.3", 15.3, 140, 1093, 1770, 248, 218, clause.Recalled, fromMind},
}

// FindProduct looks a product up by name.
func FindProduct(name string) (Product, bool) {
	for _, p := range Products {
		if p.Name == name {
			return p, true
		}
	}
	return Product{}, false
}

// ProofStrength is f_p0,1k, F_p0,1/A.
var ProofStrength = clause.Define(&clause.Formula{
	ID: "proof-strength", Name: "Characteristic 0.1 % proof strength, from the declared force", Ref: en("3.3.3(1)P", ""),
	Text: "f_{p0,1k,i} = F_{p0,1,i}/A_{p1,i}", Unit: "MPa",
	Examples: []clause.Example{
		by(catalogue+"; f_p0,1k of 139 mm²", clause.Opened, "1640 MPa", "F_{p0,1,i} = 228 kN", "A_{p1,i} = 139 mm²"),
		by(catalogue+"; f_p0,1k of 93 mm²", clause.Opened, "1634 MPa", "F_{p0,1,i} = 152 kN", "A_{p1,i} = 93 mm²"),
	},
})
