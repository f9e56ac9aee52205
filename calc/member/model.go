// Package member reads the member file: what a structural engineer writes by hand, checked and with every
// value's unit and place.
//
// The types of the model are the declaration of the file. A field is a key; its tags say what may be written:
//
//	key      the key as written; a "?" at the end: may be left out
//	eg       a fitting value: it gives the dimension, and the unit that hints propose
//	from,to  bounds, both allowed; above, below: bounds, not allowed themselves
//	least    of a list, how many rows at least; most: at most, mostRows where nothing is said
//	text     "name": text fit for the name of a row
//	words    the words allowed, separated by "|"
//	default  stands in where the key is left out; why says with what reason
//	when     "kind=T|I": the key belongs here only where the key kind says so
//	with     the key belongs here only beside that other key
//	or       just one of this key and those others; both says why where there are two
//	not      this key or that other, or neither
//	unless   the key may be left out only where that other key stands
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
	Topping   Topping   `key:"topping?" what:"concrete cast on the member later, which then works with it"`
	Strands   Strands   `key:"strands?" or:"ducts" both:"write one of them: a member is pretensioned or post-tensioned, both together are not covered" what:"pretensioned reinforcement"`
	Ducts     Ducts     `key:"ducts?" what:"post-tensioned reinforcement, grouted; left out where strands stand"`
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
	FckAtRelease Value `key:"f_ck at release" eg:"35 MPa" from:"12 MPa" to:"90 MPa" what:"characteristic cylinder strength when the tendons are released; of a post-tensioned member, when they are stressed"`
	Diagram      Word  `key:"stress diagram?" words:"block|parabola-rectangle|bilinear" what:"stress-strain diagram for bending, EN 1992-1-1 3.1.7; left out: block, with a topping parabola-rectangle"`
	Aggregate    Word  `key:"aggregate?" words:"quartzite|limestone|sandstone|basalt" default:"quartzite" why:"the values of EN 1992-1-1 Table 3.1 are for quartzite, 3.1.3(2)" what:"kind of aggregate, EN 1992-1-1 3.1.3(2)"`
}

// Shape is the cross-section. Which fields hold values depends on Kind.
type Shape struct {
	Pos             diag.Pos
	Kind            Word   `key:"kind" words:"rectangle|trapezoid|T|I|inverted T|U|box|double T|hollow unit|polygon" what:"kind of cross-section; the other keys follow from it"`
	Depth           Value  `key:"depth" eg:"900 mm" from:"50 mm" to:"10 m" when:"kind=rectangle|trapezoid|T|I|inverted T|U|box|double T|hollow unit" what:"overall depth"`
	Width           Value  `key:"width" eg:"400 mm" from:"40 mm" to:"20 m" when:"kind=rectangle|box|double T|hollow unit" what:"width; of a box, of the box without the overhangs of its top slab; of a hollow unit, at the soffit"`
	BottomWidth     Value  `key:"bottom width" eg:"300 mm" from:"40 mm" to:"20 m" when:"kind=trapezoid|U" what:"width at the soffit, over all"`
	TopWidth        Value  `key:"top width" eg:"400 mm" from:"40 mm" to:"20 m" when:"kind=trapezoid|U" what:"width at the top, over all"`
	FlangeWidth     Value  `key:"flange width" eg:"1200 mm" from:"40 mm" to:"20 m" when:"kind=T" what:"width of the flange at the top"`
	FlangeDepth     Value  `key:"flange depth" eg:"150 mm" from:"20 mm" to:"5 m" when:"kind=T|double T" what:"depth of the flange, without the haunch"`
	HaunchDepth     Value  `key:"haunch depth?" eg:"50 mm" from:"0 mm" to:"5 m" when:"kind=T" default:"0 mm" why:"no haunch stated" what:"depth over which the flange narrows to the web"`
	TopFlange       Flange `key:"top flange" when:"kind=I" what:"flange at the top"`
	WebWidth        Value  `key:"web width" eg:"160 mm" from:"40 mm" to:"20 m" when:"kind=T|I|inverted T" what:"width of the web"`
	BottomFlange    Flange `key:"bottom flange" when:"kind=I" what:"flange at the soffit"`
	Ledge           Flange `key:"ledge" when:"kind=inverted T" what:"part at the soffit whose ledges carry the floor; the haunch is the slope of their tops"`
	WebThickness    Value  `key:"web thickness" eg:"120 mm" from:"20 mm" to:"5 m" when:"kind=U|box" what:"thickness of one web, measured level"`
	FloorThickness  Value  `key:"floor thickness" eg:"150 mm" from:"20 mm" to:"5 m" when:"kind=U" what:"thickness of the floor between the webs"`
	TopSlab         Slab   `key:"top slab" when:"kind=box" what:"slab at the top of a box"`
	BottomSlab      Slab   `key:"bottom slab" when:"kind=box" what:"slab at the soffit of a box"`
	StemSpacing     Value  `key:"stem spacing" eg:"1200 mm" from:"40 mm" to:"20 m" when:"kind=double T" what:"distance of the stems' axes"`
	StemWidthSoffit Value  `key:"stem width at soffit" eg:"140 mm" from:"40 mm" to:"5 m" when:"kind=double T" what:"width of a stem at the soffit"`
	StemWidthFlange Value  `key:"stem width at flange" eg:"200 mm" from:"40 mm" to:"5 m" when:"kind=double T" what:"width of a stem under the flange or its haunch"`
	Haunch          Value  `key:"haunch?" eg:"50 mm" from:"0 mm" to:"2 m" when:"kind=U|double T" default:"0 mm" why:"no haunch stated" what:"leg of the haunch in the inner corners, as high as long"`
	Chamfer         Value  `key:"chamfer?" eg:"20 mm" from:"0 mm" to:"500 mm" when:"kind=rectangle|trapezoid|T|I|inverted T|U|box|double T|hollow unit" default:"0 mm" why:"no chamfer stated" what:"leg of the chamfers at the soffit, as high as long"`
	TopChamfer      Value  `key:"top chamfer?" eg:"20 mm" from:"0 mm" to:"500 mm" when:"kind=rectangle|trapezoid" default:"0 mm" why:"no chamfer stated" what:"leg of the chamfers at the top, as high as long"`
	Voids           Voids  `key:"voids" when:"kind=hollow unit" what:"voids in a row, round where width and depth are alike, else oblong"`
	Joint           Joint  `key:"joint?" when:"kind=hollow unit" what:"side of the unit, where it stands beside the next"`

	Corners    []Corner    `key:"corners" least:"3" most:"500" when:"kind=polygon" what:"corners of the outline in order, either way round"`
	Holes      []Hole      `key:"holes?" when:"kind=polygon" what:"holes with corners"`
	RoundVoids []RoundVoid `key:"round voids?" when:"kind=polygon" what:"round or oblong voids"`
}

// Slab is a slab of a box.
type Slab struct {
	Pos    diag.Pos
	Depth  Value `key:"depth" eg:"180 mm" from:"20 mm" to:"5 m" what:"thickness of the slab"`
	Width  Value `key:"width?" eg:"2400 mm" from:"40 mm" to:"20 m" what:"width over all, of the top slab only; left out: that of the box"`
	Haunch Value `key:"haunch?" eg:"100 mm" from:"0 mm" to:"2 m" default:"0 mm" why:"no haunch stated" what:"leg of the haunches towards the webs inside, as high as long"`
}

// Voids are equal voids in a row.
type Voids struct {
	Pos     diag.Pos
	Count   Count `key:"count" eg:"6" to:"100" what:"how many voids"`
	Spacing Value `key:"spacing?" eg:"190 mm" from:"10 mm" to:"5 m" what:"distance of their axes; left out only for a single void"`
	Width   Value `key:"width" eg:"150 mm" from:"10 mm" to:"5 m" what:"width of a void"`
	Depth   Value `key:"depth" eg:"150 mm" from:"10 mm" to:"5 m" what:"depth of a void"`
	Height  Value `key:"height" eg:"132 mm" from:"10 mm" to:"5 m" what:"height of the axes above the soffit"`
}

// Joint is the side of a hollow unit: a top edge set back, and a groove between two heights.
type Joint struct {
	Pos    diag.Pos
	Inset  Value `key:"inset?" eg:"20 mm" from:"0 mm" to:"500 mm" default:"0 mm" why:"the top as wide as the soffit" what:"by which the top edge stands back behind the soffit's"`
	Recess Value `key:"recess?" eg:"25 mm" from:"0 mm" to:"500 mm" default:"0 mm" why:"no groove" what:"by which the bottom of the groove stands back, 0 mm for no groove"`
	Low    Value `key:"from" eg:"60 mm" from:"0 mm" to:"5 m" with:"recess" what:"lower end of the groove above the soffit"`
	High   Value `key:"to" eg:"200 mm" from:"0 mm" to:"5 m" with:"recess" what:"upper end of the groove above the soffit"`
	Flank  Value `key:"flank?" eg:"10 mm" from:"0 mm" to:"500 mm" with:"recess" default:"0 mm" why:"square flanks" what:"height of each sloping flank of the groove"`
}

// Corner is a corner of a polygon. X counts to the right from any line, Y upward from any level.
type Corner struct {
	Pos diag.Pos
	X   Value `key:"x" eg:"200 mm" from:"-20 m" to:"20 m" what:"to the right of any vertical line"`
	Y   Value `key:"y" eg:"0 mm" from:"-20 m" to:"20 m" what:"above any level; the lowest corner is the soffit"`
}

// Hole is a hole with corners.
type Hole struct {
	Pos     diag.Pos
	Corners []Corner `key:"corners" least:"3" most:"500" what:"corners of the hole in order, either way round"`
}

// RoundVoid is a void at its centre: round where Width and Depth are alike, else oblong.
type RoundVoid struct {
	Pos   diag.Pos
	X     Value `key:"x" eg:"0 mm" from:"-20 m" to:"20 m" what:"centre, to the right of the line that the corners count from"`
	Y     Value `key:"y" eg:"300 mm" from:"-20 m" to:"20 m" what:"centre, above the level that the corners count from"`
	Width Value `key:"width" eg:"150 mm" from:"10 mm" to:"5 m" what:"width of the void"`
	Depth Value `key:"depth" eg:"150 mm" from:"10 mm" to:"5 m" what:"depth of the void"`
}

// Topping is a slab cast on the top of the member later. The zero Topping is none.
type Topping struct {
	Pos        diag.Pos
	Width      Value `key:"width" eg:"1200 mm" from:"40 mm" to:"20 m" what:"width of the topping"`
	Depth      Value `key:"depth" eg:"70 mm" from:"20 mm" to:"2 m" what:"depth of the topping above the top of the member"`
	Fck        Value `key:"f_ck" eg:"30 MPa" from:"12 MPa" to:"90 MPa" what:"characteristic cylinder strength at 28 days"`
	UnitWeight Value `key:"unit weight" eg:"25 kN/m³" from:"8 kN/m³" to:"40 kN/m³" what:"unit weight of the topping with its steel"`
	Aggregate  Word  `key:"aggregate?" words:"quartzite|limestone|sandstone|basalt" default:"quartzite" why:"the values of EN 1992-1-1 Table 3.1 are for quartzite, 3.1.3(2)" what:"kind of aggregate, EN 1992-1-1 3.1.3(2)"`
	Casting    Word  `key:"casting" words:"unpropped|propped" what:"unpropped: the bare member carries the wet topping; propped: props carry both weights until the topping is hard"`
}

// Present reports whether there is a topping.
func (t *Topping) Present() bool { return t.Pos.Line > 0 }

// Flange is a flange of an I, or the ledge of an inverted T: full Width over Depth, then narrowing to the web over HaunchDepth.
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
	Groups       []Group     `key:"groups?" what:"groups of rows that share what is stated here"`
	Rows         []StrandRow `key:"rows" least:"1" what:"rows of strands, each at one height"`
}

// Present reports whether the member is pretensioned.
func (s *Strands) Present() bool { return s.Pos.Line > 0 }

// Group is what rows of strands share.
type Group struct {
	Pos            diag.Pos
	Name           Word       `key:"name" eg:"straight" text:"name" what:"name of the group, once each"`
	Product        Word       `key:"product?" eg:"Y1860S7-15.7" among:"products" what:"prestressing steel of its rows"`
	DebondedLength Value      `key:"debonded length?" eg:"1.5 m" from:"0 m" to:"100 m" what:"length without bond, from each end"`
	JackingStress  Value      `key:"jacking stress?" eg:"1395 MPa" from:"10 MPa" to:"3000 MPa" what:"stress in the strands before release, without the losses"`
	StatedLosses   Losses     `key:"stated losses?" what:"losses, stated and not computed"`
	Deflected      Deflection `key:"deflected?" what:"path of strands that are held down on the way; the heights of the rows are those between the points"`
}

// Deflection is the path of deflected strands: straight from the ends to where they are held down, level between. Each
// row of a group rises by the same measure.
type Deflection struct {
	Pos     diag.Pos
	Rise    Value `key:"rise at ends" eg:"400 mm" from:"1 mm" to:"10 m" what:"how much higher the strands lie at the ends of the concrete"`
	FromEnd Value `key:"held down from ends" eg:"6 m" from:"0.1 m" to:"100 m" what:"distance of the two points at which the strands are held down from the nearer end"`
}

// Present reports whether the strands are deflected.
func (d *Deflection) Present() bool { return d.Pos.Line > 0 }

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

// StrandRow is a row of equal strands at one height. In a model it holds what its group states; findings at what is
// stated there are at the place in the group.
type StrandRow struct {
	Pos            diag.Pos
	Name           Word       `key:"name" eg:"bottom" text:"name" what:"name of the row, once each"`
	Group          Word       `key:"group?" eg:"straight" among:"groups" what:"group that the row belongs to; what the group states need not stand in the row"`
	Product        Word       `key:"product?" eg:"Y1860S7-15.7" among:"products" unless:"group" what:"prestressing steel, of the tables or of products; left out only where the group states it"`
	Count          Count      `key:"count" eg:"8" to:"500" what:"how many strands"`
	Spacing        Value      `key:"spacing?" eg:"50 mm" from:"5 mm" to:"20 m" not:"positions" what:"distance between the axes; left out only for a single strand, or where positions stand"` // 0 for a single strand
	Positions      []Value    `key:"positions?" eg:"150 mm" from:"-10 m" to:"10 m" most:"500" what:"place of each axis across the section, from the axis of symmetry, to the right positive: [-150 mm, 150 mm]; left out where the spacing is even"`
	Height         Value      `key:"height" eg:"50 mm" from:"1 mm" to:"10 m" what:"height of the axes above the soffit"`
	DebondedLength Value      `key:"debonded length?" eg:"1.5 m" from:"0 m" to:"100 m" what:"length without bond, from each end; left out: as the group states, else bonded from the ends"`
	Deflected      Deflection `key:"deflected?" what:"path of strands that are held down on the way; height is that between the points"`
	JackingStress  Value      `key:"jacking stress?" eg:"1395 MPa" from:"10 MPa" to:"3000 MPa" unless:"group" what:"stress in the strand before release, without the losses; left out only where the group states it"`
	StatedLosses   Losses     `key:"stated losses?" unless:"group" what:"losses, stated and not computed; left out only where the group states them"`
}

// Losses are the losses of a row as stated, both counted from the jacking stress.
type Losses struct {
	Pos       diag.Pos
	AtRelease Value `key:"at release" eg:"95 MPa" from:"0 MPa" to:"3000 MPa" what:"losses up to and with release, counted from the jacking stress"`
	Final     Value `key:"final" eg:"250 MPa" from:"0 MPa" to:"3000 MPa" what:"all losses in the end, counted from the jacking stress"`
	Source    Word  `key:"source" eg:"number of the calculation" what:"document that computes the losses"`
}

// Present reports whether the losses are stated.
func (l *Losses) Present() bool { return l.Pos.Line > 0 }

// Ducts is the post-tensioned reinforcement: strands in ducts, grouted after stressing.
type Ducts struct {
	Pos          diag.Pos
	SteelDiagram Word      `key:"steel diagram?" words:"horizontal|inclined" default:"horizontal" why:"horizontal top branch, EN 1992-1-1 3.3.6(7): no strain limit needed" what:"top branch of the stress-strain diagram, EN 1992-1-1 3.3.6(7)"`
	Friction     Friction  `key:"friction" what:"friction between tendon and duct, EN 1992-1-1 5.10.5.2"`
	Products     []Product `key:"products?" what:"prestressing steels of your own; those of the tables need no entry"`
	Rows         []DuctRow `key:"rows" least:"1" what:"rows of ducts, each at one height at each place"`
}

// Present reports whether the member is post-tensioned.
func (d *Ducts) Present() bool { return d.Pos.Line > 0 }

// Friction is what the force of a tendon loses along its duct, EN 1992-1-1 5.10.5.2.
type Friction struct {
	Pos    diag.Pos
	Mu     Value `key:"coefficient" eg:"0.19" from:"0" to:"1" what:"coefficient of friction μ"`
	Wobble Value `key:"unintended angle" eg:"0.008 1/m" from:"0 1/m" to:"0.1 1/m" what:"unintentional angle per length k, in radians per metre"`
	Source Word  `key:"source" eg:"approval of the anchorage" what:"document that states these values"`
}

// DuctRow is a row of equal ducts side by side.
type DuctRow struct {
	Pos           diag.Pos
	Name          Word         `key:"name" eg:"lower" text:"name" what:"name of the row, once each"`
	Product       Word         `key:"product" eg:"Y1860S7-15.7" among:"products" what:"prestressing steel, of the tables or of products"`
	Strands       Count        `key:"strands" eg:"12" to:"100" what:"how many strands in one duct"`
	Count         Count        `key:"count" eg:"1" to:"50" what:"how many ducts side by side"`
	Spacing       Value        `key:"spacing?" eg:"200 mm" from:"5 mm" to:"20 m" not:"positions" what:"distance between the axes; left out only for a single duct, or where positions stand"` // 0 for a single duct
	Positions     []Value      `key:"positions?" eg:"400 mm" from:"-10 m" to:"10 m" what:"place of each axis across the section, from the axis of symmetry, to the right positive: [-400 mm, 400 mm]; left out where the spacing is even"`
	Diameter      Value        `key:"duct diameter" eg:"80 mm" from:"15 mm" to:"300 mm" what:"outer diameter of the duct"`
	Profile       []ProfileRow `key:"profile" least:"2" what:"height of the tendon's axis along the member, from end A to end B"`
	StressedFrom  Word         `key:"stressed from" words:"A|B|both ends" what:"end that the tendon is stressed from"`
	JackingStress Value        `key:"jacking stress" eg:"1440 MPa" from:"10 MPa" to:"3000 MPa" what:"stress at the anchorage during stressing"`
	StatedLosses  DuctLosses   `key:"stated losses" what:"losses beside friction, stated and not computed"`
}

// ProfileRow is a point of a profile and how the tendon comes to it from the point before.
type ProfileRow struct {
	Pos    diag.Pos
	At     Value `key:"at" eg:"0 m" from:"0 m" to:"200 m" what:"place along the member, from end A of the concrete"`
	Height Value `key:"height" eg:"450 mm" from:"1 mm" to:"10 m" what:"height of the tendon's axis above the soffit"`
	By     Word  `key:"by?" words:"straight line|parabola level here|parabola level before|parabola onward" what:"line from the point before to this one: a parabola that is level at this point, at the point before, or that goes on in the direction reached there; left out only at the first point"`
}

// DuctLosses are losses beside friction as stated, the same over the whole length.
type DuctLosses struct {
	Pos         diag.Pos
	AtStressing Value `key:"at stressing" eg:"60 MPa" from:"0 MPa" to:"3000 MPa" what:"losses of draw-in and of shortening when stressed, beside friction"`
	Final       Value `key:"final" eg:"210 MPa" from:"0 MPa" to:"3000 MPa" what:"all losses in the end, beside friction"`
	Source      Word  `key:"source" eg:"number of the calculation" what:"document that computes the losses"`
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
	Name           Word    `key:"name" eg:"bottom bars" text:"name" what:"name of the row, once each"`
	Count          Count   `key:"count" eg:"4" to:"500" what:"how many bars"`
	Diameter       Value   `key:"diameter" eg:"16 mm" from:"4 mm" to:"60 mm" what:"diameter of a bar"`
	Spacing        Value   `key:"spacing?" eg:"80 mm" from:"5 mm" to:"20 m" not:"positions" what:"distance between the axes"` // 0 for a single bar
	Positions      []Value `key:"positions?" eg:"100 mm" from:"-10 m" to:"10 m" most:"500" what:"place of each axis across the section, from the axis of symmetry, to the right positive: [-100 mm, 100 mm]; left out where the spacing is even"`
	Height         Value   `key:"height" eg:"60 mm" from:"1 mm" to:"10 m" what:"height of the axes above the soffit"`
	Fyk            Value   `key:"f_yk" eg:"500 MPa" from:"400 MPa" to:"600 MPa" what:"characteristic yield strength"`
	DuctilityClass Word    `key:"ductility class" words:"A|B|C" what:"ductility class, EN 1992-1-1 Table C.1"`
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
	Kind     Word   `key:"kind" words:"permanent|variable|construction" what:"permanent, variable, or variable during construction only, EN 1991-1-6"`
	Category Word   `key:"category" words:"A|B|C|D|E|F|G|H|snow above 1000 m|snow up to 1000 m|snow Nordic|wind|temperature" when:"kind=variable" what:"category, EN 1990 Table A1.1"`
	ActsOn   Word   `key:"acts on?" words:"bare member|composite member" what:"with a topping only: section that carries the action, the member before its topping is hard, or with it; left out: composite member, for construction loads bare member"`
	Loads    []Load `key:"loads" least:"1" what:"loads of the action, downward positive"`
}

// Load is one load of an action, downward positive, places counted from end A of the concrete: Uniform
// between From and To, the whole length by default; or Point at At; or an Axial force from end to end at the centroid
// of the bare section, compression positive.
type Load struct {
	Pos     diag.Pos
	Uniform Value `key:"uniform?" eg:"6 kN/m" from:"-10000 kN/m" to:"10000 kN/m" or:"point|axial" both:"write one of them here, and the other in a row of its own" what:"uniform load"`
	From    Value `key:"from?" eg:"2 m" from:"0 m" to:"200 m" with:"uniform" what:"where it begins, from end A of the concrete; left out: end A"`
	To      Value `key:"to?" eg:"9 m" from:"0 m" to:"200 m" with:"uniform" what:"where it ends, from end A of the concrete; left out: end B"`
	Point   Value `key:"point?" eg:"45 kN" from:"-100000 kN" to:"100000 kN" what:"point load; left out where uniform stands"`
	At      Value `key:"at" eg:"9.15 m" from:"0 m" to:"200 m" with:"point" what:"where it acts, from end A of the concrete"`
	Axial   Value `key:"axial?" eg:"120 kN" from:"-100000 kN" to:"100000 kN" what:"axial force from end to end at the centroid of the bare section, compression positive; alone in its line"`
}
