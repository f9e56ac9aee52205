// Package member reads the member file: what a structural engineer writes by hand, checked and with every
// value's unit and place.
//
// The types of the model are the declaration of the file. A field is a key; its tags say what may be written:
//
//	key      the key as written; a "?" at the end: may be left out
//	eg       a fitting value: it gives the dimension, and the unit that hints propose
//	from,to  bounds, both allowed; above, below: bounds, not allowed themselves
//	least    of a list, how many rows at least
//	text     "name": text fit for the name of a row
//	words    the words allowed, separated by "|"
//	default  stands in where the key is left out; why says with what reason
//	when     "kind=T|I": the key belongs here only where the key kind says so
//	with     the key belongs here only beside that other key
//
// A new key is a new field.
package member

import "soffit/calc/diag"

// Member is one member file. All values are in the units as written, see Value.Base. It is complete and
// checked only if Read gave no finding.
type Member struct {
	File   string
	Source []byte

	Format    Word      `key:"format" words:"soffit/1"`
	Document  Document  `key:"document"`
	Basis     Basis     `key:"basis"`
	Concrete  Concrete  `key:"concrete"`
	Shape     Shape     `key:"shape"`
	Strands   Strands   `key:"strands"`
	Bars      Bars      `key:"bars?"`
	Span      Span      `key:"span"`
	Actions   []Action  `key:"actions"`
	Narrative Narrative `key:"narrative?"`
}

// Document is what the title sheet says of the note.
type Document struct {
	Pos        diag.Pos
	Project    Word       `key:"project" eg:"Harbour sheds"`
	Title      Word       `key:"title" eg:"Roof beam R1"`
	Number     Word       `key:"number" eg:"HS-CAL-012"`
	Revision   Word       `key:"revision" eg:"A"`
	Status     Word       `key:"status" words:"draft|prepared|checked|approved"`
	Originator Word       `key:"originator?" eg:"name of the office"`
	History    []Revision `key:"history?"`
	Drawings   []Drawing  `key:"drawings?"`
	Prepared   Role       `key:"prepared"`
	Checked    Role       `key:"checked?"`
	Approved   Role       `key:"approved?"`
}

// Revision is one line of the revision history.
type Revision struct {
	Pos      diag.Pos
	Revision Word `key:"revision" eg:"A"`
	Date     Date `key:"date"`
	Text     Word `key:"text" eg:"first issue"`
}

// Drawing is a drawing that the note goes with.
type Drawing struct {
	Pos      diag.Pos
	Number   Word `key:"number" eg:"HS-DRG-104"`
	Revision Word `key:"revision" eg:"B"`
	Title    Word `key:"title" eg:"Roof beams, general arrangement"`
}

// Role is who answers for a step of the document. The zero Role was left out.
type Role struct {
	Pos          diag.Pos
	Name         Word `key:"name" eg:"first and last name"`
	Organisation Word `key:"organisation?" eg:"name of the office"`
	Date         Date `key:"date?"`
}

// Basis is what the design is done to.
type Basis struct {
	Pos                diag.Pos
	Code               Word               `key:"code?" default:"EN 1992-1-1:2004+AC:2010+A1:2014" why:"the edition that the clauses of this note are keyed to"`
	Combination        Word               `key:"combination" words:"6.10|6.10a/b"`
	ConsequenceClass   Word               `key:"consequence class?" words:"CC1|CC2|CC3" default:"CC2" why:"medium consequence, EN 1990 Table B.1"`
	SupervisionLevel   Word               `key:"supervision level?" words:"DSL1|DSL2|DSL3"` // default: as the consequence class
	Exposure           []Word             `key:"exposure?" words:"X0|XC1|XC2|XC3|XC4|XD1|XD2|XD3|XS1|XS2|XS3|XF1|XF2|XF3|XF4|XA1|XA2|XA3"`
	DesignWorkingLife  Value              `key:"design working life?" eg:"50 y" from:"1 y" to:"200 y" default:"50 y" why:"building structures, EN 1990 Table 2.1 category 4"`
	NationalParameters NationalParameters `key:"national parameters?"`
}

// Concrete is the concrete of the member.
type Concrete struct {
	Pos          diag.Pos
	Fck          Value `key:"f_ck" eg:"50 MPa" from:"12 MPa" to:"90 MPa"` // characteristic cylinder strength at 28 days
	UnitWeight   Value `key:"unit weight" eg:"25 kN/m³" from:"8 kN/m³" to:"40 kN/m³"`
	CementClass  Word  `key:"cement class?" words:"S|N|R" default:"N" why:"normal early strength, EN 1992-1-1 3.1.2(6)"`
	FckAtRelease Value `key:"f_ck at release" eg:"35 MPa" from:"12 MPa" to:"90 MPa"` // when the tendons are released
	Aggregate    Word  `key:"aggregate?" words:"quartzite|limestone|sandstone|basalt" default:"quartzite" why:"the values of EN 1992-1-1 Table 3.1 are for quartzite, 3.1.3(2)"`
}

// Shape is the cross-section. Which fields hold values depends on Kind.
type Shape struct {
	Pos          diag.Pos
	Kind         Word   `key:"kind" words:"rectangle|T|I"`
	Depth        Value  `key:"depth" eg:"900 mm" from:"50 mm" to:"10 m"`
	Width        Value  `key:"width" eg:"400 mm" from:"40 mm" to:"20 m" when:"kind=rectangle"`
	FlangeWidth  Value  `key:"flange width" eg:"1200 mm" from:"40 mm" to:"20 m" when:"kind=T"`
	FlangeDepth  Value  `key:"flange depth" eg:"150 mm" from:"20 mm" to:"5 m" when:"kind=T"`
	HaunchDepth  Value  `key:"haunch depth?" eg:"50 mm" from:"0 mm" to:"5 m" when:"kind=T" default:"0 mm" why:"no haunch stated"`
	TopFlange    Flange `key:"top flange" when:"kind=I"`
	WebWidth     Value  `key:"web width" eg:"160 mm" from:"40 mm" to:"20 m" when:"kind=T|I"`
	BottomFlange Flange `key:"bottom flange" when:"kind=I"`
}

// Flange is a flange of an I: full Width over Depth, then narrowing to the web over HaunchDepth.
type Flange struct {
	Pos         diag.Pos
	Width       Value `key:"width" eg:"500 mm" from:"40 mm" to:"20 m"`
	Depth       Value `key:"depth" eg:"150 mm" from:"20 mm" to:"5 m"`
	HaunchDepth Value `key:"haunch depth?" eg:"50 mm" from:"0 mm" to:"5 m" default:"0 mm" why:"no haunch stated"`
}

// Strands is the pretensioned reinforcement.
type Strands struct {
	Pos          diag.Pos
	SteelDiagram Word        `key:"steel diagram?" words:"horizontal|inclined" default:"horizontal" why:"horizontal top branch, EN 1992-1-1 3.3.6(7): no strain limit needed"`
	Release      Word        `key:"release?" words:"gradual|sudden" default:"sudden" why:"the longer transmission length, EN 1992-1-1 8.10.2.2(2)"`
	Bond         Word        `key:"bond" words:"good|poor"`
	Products     []Product   `key:"products?"`
	Rows         []StrandRow `key:"rows" least:"1"`
}

// Product is a prestressing steel described in the member file.
type Product struct {
	Pos             diag.Pos
	Name            Word  `key:"name" eg:"Y1860S7-15.7" text:"name"`
	Kind            Word  `key:"kind" words:"strand|wire|bar"`
	Area            Value `key:"area" eg:"150 mm²" from:"1 mm²" to:"20000 mm²"`
	Diameter        Value `key:"diameter" eg:"15.7 mm" from:"1 mm" to:"160 mm"`
	Mass            Value `key:"mass?" eg:"1.172 kg/m" from:"0.005 kg/m" to:"200 kg/m"`
	Fpk             Value `key:"f_pk" eg:"1860 MPa" from:"500 MPa" to:"3000 MPa"`
	Fp01k           Value `key:"f_p01k" eg:"1640 MPa" from:"400 MPa" to:"3000 MPa"`
	Ep              Value `key:"E_p" eg:"195 GPa" from:"100 GPa" to:"250 GPa"`
	StrainAtMaximum Value `key:"strain at maximum force" eg:"35 ‰" from:"5 ‰" to:"100 ‰"` // ε_uk
	Source          Word  `key:"source" eg:"name and number of the test certificate"`
}

// StrandRow is a row of equal strands at one height.
type StrandRow struct {
	Pos            diag.Pos
	Name           Word   `key:"name" eg:"bottom" text:"name"`
	Product        Word   `key:"product" eg:"Y1860S7-15.7"` // one of Strands.Products or of Options.Products
	Count          Count  `key:"count" eg:"8" to:"500"`
	Spacing        Value  `key:"spacing?" eg:"50 mm" from:"5 mm" to:"20 m"` // between axes; 0 for a single strand
	Height         Value  `key:"height" eg:"50 mm" from:"1 mm" to:"10 m"`   // of the axes above the soffit
	DebondedLength Value  `key:"debonded length?" eg:"1.5 m" from:"0 m" to:"100 m" default:"0 m" why:"bonded from the ends"`
	JackingStress  Value  `key:"jacking stress" eg:"1395 MPa" from:"10 MPa" to:"3000 MPa"`
	StatedLosses   Losses `key:"stated losses"`
}

// Losses are the losses of a row as stated, both counted from the jacking stress.
type Losses struct {
	Pos       diag.Pos
	AtRelease Value `key:"at release" eg:"95 MPa" from:"0 MPa" to:"3000 MPa"`
	Final     Value `key:"final" eg:"250 MPa" from:"0 MPa" to:"3000 MPa"`
	Source    Word  `key:"source" eg:"number of the calculation"`
}

// Bars is the passive reinforcement; without Rows there is none.
type Bars struct {
	Pos          diag.Pos
	SteelDiagram Word     `key:"steel diagram?" words:"horizontal|inclined" default:"horizontal" why:"horizontal top branch, EN 1992-1-1 3.2.7(2)b: no strain limit needed"`
	Rows         []BarRow `key:"rows" least:"1"`
}

// BarRow is a row of equal bars at one height.
type BarRow struct {
	Pos            diag.Pos
	Name           Word  `key:"name" eg:"bottom bars" text:"name"`
	Count          Count `key:"count" eg:"4" to:"500"`
	Diameter       Value `key:"diameter" eg:"16 mm" from:"4 mm" to:"60 mm"`
	Spacing        Value `key:"spacing?" eg:"80 mm" from:"5 mm" to:"20 m"` // between axes
	Height         Value `key:"height" eg:"60 mm" from:"1 mm" to:"10 m"`   // of the axes above the soffit
	Fyk            Value `key:"f_yk" eg:"500 MPa" from:"400 MPa" to:"600 MPa"`
	DuctilityClass Word  `key:"ductility class" words:"A|B|C"`
}

// Span is the length of the member and where it bears.
type Span struct {
	Pos      diag.Pos
	Length   Value   `key:"length" eg:"18.3 m" from:"0.5 m" to:"200 m"` // of the concrete
	BearingA Bearing `key:"bearing A"`
	BearingB Bearing `key:"bearing B"`
}

// Bearing is one support.
type Bearing struct {
	Pos     diag.Pos
	FromEnd Value `key:"from end" eg:"150 mm" from:"0 mm" to:"100 m"` // from the end of the concrete to the middle of the bearing
	Length  Value `key:"length" eg:"200 mm" from:"1 mm" to:"10 m"`    // along the member
}

// Action is a permanent or variable action beside the self-weight.
type Action struct {
	Pos      diag.Pos
	Name     Word   `key:"name" eg:"roofing" text:"name"`
	Kind     Word   `key:"kind" words:"permanent|variable"`
	Category Word   `key:"category" words:"A|B|C|D|E|F|G|H|snow above 1000 m|snow up to 1000 m|snow Nordic|wind|temperature" when:"kind=variable"`
	Loads    []Load `key:"loads" least:"1"`
}

// Load is one load of an action, downward positive, places counted from end A of the concrete: Uniform
// between From and To, the whole length by default; or Point at At.
type Load struct {
	Pos     diag.Pos
	Uniform Value `key:"uniform?" eg:"6 kN/m" from:"-10000 kN/m" to:"10000 kN/m"`
	From    Value `key:"from?" eg:"2 m" from:"0 m" to:"200 m" with:"uniform"`
	To      Value `key:"to?" eg:"9 m" from:"0 m" to:"200 m" with:"uniform"`
	Point   Value `key:"point?" eg:"45 kN" from:"-100000 kN" to:"100000 kN"`
	At      Value `key:"at" eg:"9.15 m" from:"0 m" to:"200 m" with:"point"`
}
