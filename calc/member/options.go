package member

import "soffit/calc/quantity"

// Options say what the member file may name: these lists belong to the code of practice and to the note,
// not to the reading.
type Options struct {
	NationalParameters []ParameterSpec
	Products           []ProductSpec
	Narratives         []string // names of the slots
}

// ParameterKind is the form in which a nationally determined parameter can be stated.
type ParameterKind int

const (
	Number     ParameterKind = iota // value; an expression too, where Symbols are given
	Expression                      // expression, or a value
	Table                           // rows of values
)

// ParameterSpec is one nationally determined parameter.
type ParameterSpec struct {
	Key, Ascii  string // "α_cc", "alpha_cc"
	Kind        ParameterKind
	Min, Max    float64                 // bounds of a value, in Unit; both 0: none
	Unit        string                  // of the value, of the result of the expression, of the table's values
	Symbols     map[string]quantity.Dim // that an expression may use, by their names in formulas
	Rows        []string                // of a table
	Columns     int                     // of a table
	Name        string                  // in words; for the schema
	Recommended string                  // value or expression that stands without an entry, "" for a table; for the schema
}

// ProductSpec is a prestressing product of the tables, as far as reading needs it.
type ProductSpec struct {
	Name     string
	Diameter float64 // mm; 0: unknown, overlaps are not looked for
	Tensile  float64 // f_pk, MPa; 0: unknown, the jacking stress is not compared
}
