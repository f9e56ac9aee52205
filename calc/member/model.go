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
//	or       either this key or that other, not both
//	among    the key names a row of that list, or one of the same list in Options
//	what     what the key holds, in words: the schema says it, and editors show it
//
// A new key is a new field.
package member

import "soffit/calc/diag"

// Member is one member file. All values are in the units as written, see Value.Base. It is complete and
// checked only if Read gave no finding.
type Member struct {
	File   string
	Source []byte

	Format    Word      `key:"format" words:"soffit/1" what:"form of this file; stands first"`
	Document  Document  `key:"document" what:"what the title sheet says"`
	Basis     Basis     `key:"basis" what:"code, classes and national parameters that the design is done to"`
	Concrete  Concrete  `key:"concrete" what:"concrete of the member"`
	Shape     Shape     `key:"shape" what:"cross-section"`
	Strands   Strands   `key:"strands" what:"pretensioned reinforcement"`
	Bars      Bars      `key:"bars?" what:"passive reinforcement"`
	Span      Span      `key:"span" what:"length of the member and its two bearings"`
	Actions   []Action  `key:"actions" what:"permanent and variable actions; the self-weight is always added; [] where there is nothing else"`
	Narrative Narrative `key:"narrative?" what:"text of your own at the beginning of a chapter, in Markdown"`
}

// Document is what the title sheet says of the note.
type Document struct {
	Pos        diag.Pos
	Project    Word       `key:"project" eg:"Harbour sheds" what:"name of the project"`
	Title      Word       `key:"title" eg:"Roof beam R1" what:"what the note is about"`
	Number     Word       `key:"number" eg:"HS-CAL-012" what:"number of the note"`
	Revision   Word       `key:"revision" eg:"A" what:"revision of the note, the last one of the history"`
	Status     Word       `key:"status" words:"draft|prepared|checked|approved" what:"what has been done to the note so far"`
	Originator Word       `key:"originator?" eg:"name of the office" what:"office that the note comes from"`
	History    []Revision `key:"history?" what:"revisions, the first issue first"`
	Drawings   []Drawing  `key:"drawings?" what:"drawings that the note goes with"`
	Prepared   Role       `key:"prepared" what:"who prepared the note"`
	Checked    Role       `key:"checked?" what:"who checks it; from DSL2 on another person, at DSL3 another organisation"`
	Approved   Role       `key:"approved?" what:"who approves it"`
}

// Revision is one line of the revision history.
type Revision struct {
	Pos      diag.Pos
	Revision Word `key:"revision" eg:"A" what:"sign of the revision"`
	Date     Date `key:"date" what:"day of the revision"`
	Text     Word `key:"text" eg:"first issue" what:"what it brought"`
}

// Drawing is a drawing that the note goes with.
type Drawing struct {
	Pos      diag.Pos
	Number   Word `key:"number" eg:"HS-DRG-104" what:"number of the drawing"`
	Revision Word `key:"revision" eg:"B" what:"its revision"`
	Title    Word `key:"title" eg:"Roof beams, general arrangement" what:"its title"`
}

// Role is who answers for a step of the document. The zero Role was left out.
type Role struct {
	Pos          diag.Pos
	Name         Word `key:"name" eg:"first and last name" what:"first and last name"`
	Organisation Word `key:"organisation?" eg:"name of the office" what:"office of that person"`
	Date         Date `key:"date?" what:"day on which it was done"`
}

// Basis is what the design is done to.
type Basis struct {
	Pos                diag.Pos
	Code               Word               `key:"code?" default:"EN 1992-1-1:2004+AC:2010+A1:2014" why:"the edition that the clauses of this note are keyed to" what:"code of practice with its edition"`
	Combination        Word               `key:"combination" words:"6.10|6.10a/b" what:"fundamental combination of actions, EN 1990 expression 6.10, or the less favourable of 6.10a and 6.10b"`
	ConsequenceClass   Word               `key:"consequence class?" words:"CC1|CC2|CC3" default:"CC2" why:"medium consequence, EN 1990 Table B.1" what:"consequence class, EN 1990 Annex B"`
	SupervisionLevel   Word               `key:"supervision level?" words:"DSL1|DSL2|DSL3" what:"design supervision level, EN 1990 Table B.4; left out: as the consequence class"`
	Exposure           []Word             `key:"exposure?" words:"X0|XC1|XC2|XC3|XC4|XD1|XD2|XD3|XS1|XS2|XS3|XF1|XF2|XF3|XF4|XA1|XA2|XA3" what:"exposure classes, EN 1992-1-1 Table 4.1, as a list"`
	DesignWorkingLife  Value              `key:"design working life?" eg:"50 y" from:"1 y" to:"200 y" default:"50 y" why:"building structures, EN 1990 Table 2.1 category 4" what:"design working life"`
	NationalParameters NationalParameters `key:"national parameters?" what:"values that replace the recommended ones, by symbol"`
}

// Concrete is the concrete of the member.
type Concrete struct {
	Pos          diag.Pos
	Fck          Value `key:"f_ck" eg:"50 MPa" from:"12 MPa" to:"90 MPa" what:"characteristic cylinder strength at 28 days"`
	UnitWeight   Value `key:"unit weight" eg:"25 kN/m³" from:"8 kN/m³" to:"40 kN/m³" what:"unit weight of the member with its steel"`
	CementClass  Word  `key:"cement class?" words:"S|N|R" default:"N" why:"normal early strength, EN 1992-1-1 3.1.2(6)" what:"cement class, EN 1992-1-1 3.1.2(6)"`
	FckAtRelease Value `key:"f_ck at release" eg:"35 MPa" from:"12 MPa" to:"90 MPa" what:"characteristic cylinder strength when the tendons are released"`
	Aggregate    Word  `key:"aggregate?" words:"quartzite|limestone|sandstone|basalt" default:"quartzite" why:"the values of EN 1992-1-1 Table 3.1 are for quartzite, 3.1.3(2)" what:"kind of aggregate, EN 1992-1-1 3.1.3(2)"`
}

// Shape is the cross-section. Which fields hold values depends on Kind.
type Shape struct {
	Pos          diag.Pos
	Kind         Word   `key:"kind" words:"rectangle|T|I" what:"kind of cross-section; the other keys follow from it"`
	Depth        Value  `key:"depth" eg:"900 mm" from:"50 mm" to:"10 m" what:"overall depth"`
	Width        Value  `key:"width" eg:"400 mm" from:"40 mm" to:"20 m" when:"kind=rectangle" what:"width"`
	FlangeWidth  Value  `key:"flange width" eg:"1200 mm" from:"40 mm" to:"20 m" when:"kind=T" what:"width of the flange at the top"`
	FlangeDepth  Value  `key:"flange depth" eg:"150 mm" from:"20 mm" to:"5 m" when:"kind=T" what:"depth of the flange, without the haunch"`
	HaunchDepth  Value  `key:"haunch depth?" eg:"50 mm" from:"0 mm" to:"5 m" when:"kind=T" default:"0 mm" why:"no haunch stated" what:"depth over which the flange narrows to the web"`
	TopFlange    Flange `key:"top flange" when:"kind=I" what:"flange at the top"`
	WebWidth     Value  `key:"web width" eg:"160 mm" from:"40 mm" to:"20 m" when:"kind=T|I" what:"width of the web"`
	BottomFlange Flange `key:"bottom flange" when:"kind=I" what:"flange at the soffit"`
}

// Flange is a flange of an I: full Width over Depth, then narrowing to the web over HaunchDepth.
type Flange struct {
	Pos         diag.Pos
	Width       Value `key:"width" eg:"500 mm" from:"40 mm" to:"20 m" what:"width of the flange"`
	Depth       Value `key:"depth" eg:"150 mm" from:"20 mm" to:"5 m" what:"depth of the flange, without the haunch"`
	HaunchDepth Value `key:"haunch depth?" eg:"50 mm" from:"0 mm" to:"5 m" default:"0 mm" why:"no haunch stated" what:"depth over which the flange narrows to the web"`
}

// Strands is the pretensioned reinforcement.
type Strands struct {
	Pos          diag.Pos
	SteelDiagram Word        `key:"steel diagram?" words:"horizontal|inclined" default:"horizontal" why:"horizontal top branch, EN 1992-1-1 3.3.6(7): no strain limit needed" what:"top branch of the stress-strain diagram, EN 1992-1-1 3.3.6(7)"`
	Release      Word        `key:"release?" words:"gradual|sudden" default:"sudden" why:"the longer transmission length, EN 1992-1-1 8.10.2.2(2)" what:"way of release"`
	Bond         Word        `key:"bond" words:"good|poor" what:"bond conditions, EN 1992-1-1 8.10.2.2(1)"`
	Products     []Product   `key:"products?" what:"prestressing steels of your own; those of the tables need no entry"`
	Rows         []StrandRow `key:"rows" least:"1" what:"rows of strands, each at one height"`
}

// Product is a prestressing steel described in the member file.
type Product struct {
	Pos             diag.Pos
	Name            Word  `key:"name" eg:"Y1860S7-15.7" text:"name" what:"name, as the rows use it"`
	Kind            Word  `key:"kind" words:"strand|indented wire" what:"kind of tendon: 8.10.2.2 has bond values for these alone"`
	Area            Value `key:"area" eg:"150 mm²" from:"1 mm²" to:"20000 mm²" what:"nominal area of one tendon"`
	Diameter        Value `key:"diameter" eg:"15.7 mm" from:"1 mm" to:"160 mm" what:"nominal diameter"`
	Mass            Value `key:"mass?" eg:"1.172 kg/m" from:"0.005 kg/m" to:"200 kg/m" what:"mass per length, to be held against the area"`
	Fpk             Value `key:"f_pk" eg:"1860 MPa" from:"500 MPa" to:"3000 MPa" what:"characteristic tensile strength"`
	Fp01k           Value `key:"f_p01k" eg:"1640 MPa" from:"400 MPa" to:"3000 MPa" what:"characteristic 0.1 % proof strength, as declared"`
	Ep              Value `key:"E_p" eg:"195 GPa" from:"100 GPa" to:"250 GPa" what:"modulus of elasticity"`
	StrainAtMaximum Value `key:"strain at maximum force" eg:"35 ‰" from:"5 ‰" to:"100 ‰" what:"characteristic strain at maximum force ε_uk"`
	Source          Word  `key:"source" eg:"name and number of the test certificate" what:"document that declares these values"`
}

// StrandRow is a row of equal strands at one height.
type StrandRow struct {
	Pos            diag.Pos
	Name           Word   `key:"name" eg:"bottom" text:"name" what:"name of the row, once each"`
	Product        Word   `key:"product" eg:"Y1860S7-15.7" among:"products" what:"prestressing steel, of the tables or of products"`
	Count          Count  `key:"count" eg:"8" to:"500" what:"how many strands"`
	Spacing        Value  `key:"spacing?" eg:"50 mm" from:"5 mm" to:"20 m" what:"distance between the axes; left out only for a single strand"` // 0 for a single strand
	Height         Value  `key:"height" eg:"50 mm" from:"1 mm" to:"10 m" what:"height of the axes above the soffit"`
	DebondedLength Value  `key:"debonded length?" eg:"1.5 m" from:"0 m" to:"100 m" default:"0 m" why:"bonded from the ends" what:"length without bond, from each end"`
	JackingStress  Value  `key:"jacking stress" eg:"1395 MPa" from:"10 MPa" to:"3000 MPa" what:"stress in the strand before release, without the losses"`
	StatedLosses   Losses `key:"stated losses" what:"losses, stated and not computed"`
}

// Losses are the losses of a row as stated, both counted from the jacking stress.
type Losses struct {
	Pos       diag.Pos
	AtRelease Value `key:"at release" eg:"95 MPa" from:"0 MPa" to:"3000 MPa" what:"losses up to and with release, counted from the jacking stress"`
	Final     Value `key:"final" eg:"250 MPa" from:"0 MPa" to:"3000 MPa" what:"all losses in the end, counted from the jacking stress"`
	Source    Word  `key:"source" eg:"number of the calculation" what:"document that computes the losses"`
}

// Bars is the passive reinforcement; without Rows there is none.
type Bars struct {
	Pos          diag.Pos
	SteelDiagram Word     `key:"steel diagram?" words:"horizontal|inclined" default:"horizontal" why:"horizontal top branch, EN 1992-1-1 3.2.7(2)b: no strain limit needed" what:"top branch of the stress-strain diagram, EN 1992-1-1 3.2.7(2)"`
	Rows         []BarRow `key:"rows" least:"1" what:"rows of bars, each at one height"`
}

// BarRow is a row of equal bars at one height.
type BarRow struct {
	Pos            diag.Pos
	Name           Word  `key:"name" eg:"bottom bars" text:"name" what:"name of the row, once each"`
	Count          Count `key:"count" eg:"4" to:"500" what:"how many bars"`
	Diameter       Value `key:"diameter" eg:"16 mm" from:"4 mm" to:"60 mm" what:"diameter of a bar"`
	Spacing        Value `key:"spacing?" eg:"80 mm" from:"5 mm" to:"20 m" what:"distance between the axes"`
	Height         Value `key:"height" eg:"60 mm" from:"1 mm" to:"10 m" what:"height of the axes above the soffit"`
	Fyk            Value `key:"f_yk" eg:"500 MPa" from:"400 MPa" to:"600 MPa" what:"characteristic yield strength"`
	DuctilityClass Word  `key:"ductility class" words:"A|B|C" what:"ductility class, EN 1992-1-1 Table C.1"`
}

// Span is the length of the member and where it bears.
type Span struct {
	Pos      diag.Pos
	Length   Value   `key:"length" eg:"18.3 m" from:"0.5 m" to:"200 m" what:"overall length of the concrete"`
	BearingA Bearing `key:"bearing A" what:"bearing near end A, from which places along the member are counted"`
	BearingB Bearing `key:"bearing B" what:"bearing near end B"`
}

// Bearing is one support.
type Bearing struct {
	Pos     diag.Pos
	FromEnd Value `key:"from end" eg:"150 mm" from:"0 mm" to:"100 m" what:"from the end of the concrete to the middle of the bearing"`
	Length  Value `key:"length" eg:"200 mm" from:"1 mm" to:"10 m" what:"length of the bearing along the member"`
}

// Action is a permanent or variable action beside the self-weight.
type Action struct {
	Pos      diag.Pos
	Name     Word   `key:"name" eg:"roofing" text:"name" what:"name of the action, once each"`
	Kind     Word   `key:"kind" words:"permanent|variable" what:"permanent or variable"`
	Category Word   `key:"category" words:"A|B|C|D|E|F|G|H|snow above 1000 m|snow up to 1000 m|snow Nordic|wind|temperature" when:"kind=variable" what:"category, EN 1990 Table A1.1"`
	Loads    []Load `key:"loads" least:"1" what:"loads of the action, downward positive"`
}

// Load is one load of an action, downward positive, places counted from end A of the concrete: Uniform
// between From and To, the whole length by default; or Point at At.
type Load struct {
	Pos     diag.Pos
	Uniform Value `key:"uniform?" eg:"6 kN/m" from:"-10000 kN/m" to:"10000 kN/m" or:"point" what:"uniform load"`
	From    Value `key:"from?" eg:"2 m" from:"0 m" to:"200 m" with:"uniform" what:"where it begins, from end A of the concrete; left out: end A"`
	To      Value `key:"to?" eg:"9 m" from:"0 m" to:"200 m" with:"uniform" what:"where it ends, from end A of the concrete; left out: end B"`
	Point   Value `key:"point?" eg:"45 kN" from:"-100000 kN" to:"100000 kN" what:"point load; left out where uniform stands"`
	At      Value `key:"at" eg:"9.15 m" from:"0 m" to:"200 m" with:"point" what:"where it acts, from end A of the concrete"`
}
