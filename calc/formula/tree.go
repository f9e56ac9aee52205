package formula

import "soffit/calc/quantity"

// Pos is the offset of a node in the source text, in runes from 0. It takes no part in equality.
type Pos int

// Node is one node of an expression's tree: *Number, *UnitLit, *Symbol, *Negate, *Binary, *Power,
// *Call, *Rows or *Cases. The set is closed; switches over it end in a default that is an error.
type Node interface{ At() Pos }

// Number is a plain number as it was written: "0.30" stays "0.30".
type Number struct {
	Pos   Pos
	Text  string
	Value float64
}

// UnitLit is one unit standing as a value, [MPa].
type UnitLit struct {
	Pos  Pos
	Unit quantity.Unit
}

// Symbol names a value: base, subscript, primes and argument, as M_Rd, f_{p0,1k}, φ(t,t_0), A_{p,i}.
// The index letters are the trailing subscript parts that run over rows; they are part of Name and of
// Sub: for A_{p,i} Sub is "p,i" and Index is ["i"].
type Symbol struct {
	Pos    Pos
	Name   string // canonical spelling, the identity of the symbol
	Base   string
	Sub    string // whole subscript without braces, "" if none
	Primes int
	Arg    string   // text between the brackets of f_cm(t), "" if none
	Index  []string // row indices in the order written, out of "i", "j", "n", "m"
}

// Negate is −x.
type Negate struct {
	Pos Pos
	X   Node
}

// Binary is a sum, difference, product or quotient. Op is one of '+', '−', '·', '/'.
type Binary struct {
	Pos  Pos
	Op   rune
	L, R Node
}

// Power is base^exponent.
type Power struct {
	Pos       Pos
	Base, Exp Node
}

// Call is a function of its arguments: sqrt, min, max, exp, ln, abs, sin, cos, tan, cot, arcsin, arccos.
type Call struct {
	Pos  Pos
	Fn   string
	Args []Node
}

// Rows reduces an expression over the rows of an index: Op is "Σ", "min" or "max".
type Rows struct {
	Pos   Pos
	Op    string
	Index string
	X     Node
}

// Cases takes the first arm whose condition holds.
type Cases struct {
	Pos       Pos
	Arms      []Arm
	Otherwise Node
}

// Arm is one branch of Cases.
type Arm struct {
	If   Cond
	Then Node
}

// Cond is a condition: *Compare or *Logic.
type Cond interface{ At() Pos }

// Compare is a chain of comparisons, a ≤ b < c. len(X) == len(Rel)+1; Rel out of ≤ < ≥ > =.
type Compare struct {
	Pos Pos
	X   []Node
	Rel []string
}

// Logic joins two conditions; Op is "and" or "or".
type Logic struct {
	Pos  Pos
	Op   string
	L, R Cond
}

// Formula is symbol = expression.
type Formula struct {
	Symbol *Symbol
	Expr   Node
}

func (n *Number) At() Pos  { return n.Pos }
func (n *UnitLit) At() Pos { return n.Pos }
func (n *Symbol) At() Pos  { return n.Pos }
func (n *Negate) At() Pos  { return n.Pos }
func (n *Binary) At() Pos  { return n.Pos }
func (n *Power) At() Pos   { return n.Pos }
func (n *Call) At() Pos    { return n.Pos }
func (n *Rows) At() Pos    { return n.Pos }
func (n *Cases) At() Pos   { return n.Pos }
func (n *Compare) At() Pos { return n.Pos }
func (n *Logic) At() Pos   { return n.Pos }
