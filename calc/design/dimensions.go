package design

import (
	"soffit/calc/member"
	"soffit/calc/quantity"
)

// dimension is a measure of the section as the member file names it, with its end points in mm: to the right of the
// axis and above the soffit.
type dimension struct {
	name           string
	length         quantity.Literal
	x1, y1, x2, y2 float64
}

// dimensioner gathers the measures of a shape; those that are 0 or left out are passed over.
type dimensioner struct {
	list        []dimension
	left, right float64 // extent of the concrete
	depth       float64
}

// level is a measure across, from one x to another at a height.
func (d *dimensioner) level(name string, v member.Value, x1, x2, y float64) {
	if v.Base() > 0 {
		d.list = append(d.list, dimension{name, v.Literal, x1, y, x2, y})
	}
}

// across is a level measure symmetrical about the axis.
func (d *dimensioner) across(name string, v member.Value, y float64) {
	d.level(name, v, -v.Base()/2, v.Base()/2, y)
}

// upright is a measure of height from one level to another at an x.
func (d *dimensioner) upright(name string, v member.Value, x, y1, y2 float64) {
	if v.Base() > 0 {
		d.list = append(d.list, dimension{name, v.Literal, x, y1, x, y2})
	}
}

// flange is the width, depth and haunch of a flange whose outer face lies at a level, the flange on the side of up.
func (d *dimensioner) flange(name string, width, depth, haunch member.Value, face, up float64) {
	x := width.Base() / 2
	inner := face + up*depth.Base()
	d.across(name+" width", width, face)
	d.upright(name+" depth", depth, x, min(face, inner), max(face, inner))
	end := inner + up*haunch.Base()
	d.upright(name+" haunch depth", haunch, x, min(inner, end), max(inner, end))
}

// chamfer is the leg of a chamfer at the right-hand end of a face of some width at a level.
func (d *dimensioner) chamfer(name string, v member.Value, width, y float64) {
	d.level(name, v, width/2-v.Base(), width/2, y)
}

// dimensions are the measures of a shape: the whole depth at its left, widths at top and soffit, depths of flanges and
// slabs at their right-hand side.
func (f *form) dimensions(s *member.Shape) []dimension {
	d := &dimensioner{depth: f.outline.Height()}
	d.left, d.right = f.extent()
	h := d.depth
	d.list = append(d.list, dimension{"depth", f.depth, d.left, 0, d.left, h})
	switch s.Kind.Text {
	case "rectangle":
		d.across("width", s.Width, 0)
		d.chamfer("chamfer", s.Chamfer, s.Width.Base(), 0)
		d.chamfer("top chamfer", s.TopChamfer, s.Width.Base(), h)
	case "trapezoid":
		d.across("bottom width", s.BottomWidth, 0)
		d.across("top width", s.TopWidth, h)
		d.chamfer("chamfer", s.Chamfer, s.BottomWidth.Base(), 0)
		d.chamfer("top chamfer", s.TopChamfer, s.TopWidth.Base(), h)
	case "T":
		d.flange("flange", s.FlangeWidth, s.FlangeDepth, s.HaunchDepth, h, -1)
		d.web(s.WebWidth, s.Chamfer.Base(), h-s.FlangeDepth.Base()-s.HaunchDepth.Base())
		d.chamfer("chamfer", s.Chamfer, s.WebWidth.Base(), 0)
	case "I":
		t, b := &s.TopFlange, &s.BottomFlange
		d.flange("top flange", t.Width, t.Depth, t.HaunchDepth, h, -1)
		d.web(s.WebWidth, b.Depth.Base()+b.HaunchDepth.Base(), h-t.Depth.Base()-t.HaunchDepth.Base())
		d.flange("bottom flange", b.Width, b.Depth, b.HaunchDepth, 0, 1)
		d.chamfer("chamfer", s.Chamfer, b.Width.Base(), 0)
	case "inverted T":
		l := &s.Ledge
		d.web(s.WebWidth, h, h)
		d.flange("ledge", l.Width, l.Depth, l.HaunchDepth, 0, 1)
		d.chamfer("chamfer", s.Chamfer, l.Width.Base(), 0)
	case "U":
		d.trough(s)
	case "box":
		d.box(s)
	case "double T":
		d.doubleT(s)
	case "hollow unit":
		d.hollow(s)
	default: // polygon
		d.list = append(d.list, dimension{"width", mm(d.right - d.left), d.left, 0, d.right, 0})
	}
	return d.list
}

// web is the width of a web, half-way between its ends; at the top where it ends there.
func (d *dimensioner) web(width member.Value, from, to float64) {
	d.across("web width", width, (from+to)/2)
}

func (d *dimensioner) trough(s *member.Shape) {
	h, web, floor, haunch := d.depth, s.WebThickness.Base(), s.FloorThickness.Base(), s.Haunch.Base()
	side := (s.BottomWidth.Base() + (s.TopWidth.Base()-s.BottomWidth.Base())*floor/h) / 2 // outer face at the top of the floor
	d.across("top width", s.TopWidth, h)
	d.across("bottom width", s.BottomWidth, 0)
	d.level("web thickness", s.WebThickness, s.TopWidth.Base()/2-web, s.TopWidth.Base()/2, h)
	d.upright("floor thickness", s.FloorThickness, 0, 0, floor)
	d.level("haunch", s.Haunch, side-web-haunch, side-web, floor)
	d.chamfer("chamfer", s.Chamfer, s.BottomWidth.Base(), 0)
}

func (d *dimensioner) box(s *member.Shape) {
	h, x, t, b := d.depth, s.Width.Base()/2, &s.TopSlab, &s.BottomSlab
	web, inner := s.WebThickness.Base(), s.Width.Base()/2-s.WebThickness.Base()
	d.across("top slab width", t.Width, h)
	d.across("width", s.Width, 0)
	d.upright("top slab depth", t.Depth, 0, h-t.Depth.Base(), h)
	d.upright("bottom slab depth", b.Depth, 0, 0, b.Depth.Base())
	d.level("web thickness", s.WebThickness, x-web, x, h/2)
	d.level("top slab haunch", t.Haunch, inner-t.Haunch.Base(), inner, h-t.Depth.Base())
	d.level("bottom slab haunch", b.Haunch, inner-b.Haunch.Base(), inner, b.Depth.Base())
	d.chamfer("chamfer", s.Chamfer, s.Width.Base(), 0)
}

func (d *dimensioner) doubleT(s *member.Shape) {
	h, axis, under := d.depth, s.StemSpacing.Base()/2, d.depth-s.FlangeDepth.Base()
	low, up := s.StemWidthSoffit.Base()/2, s.StemWidthFlange.Base()/2
	d.across("width", s.Width, h)
	d.upright("flange depth", s.FlangeDepth, s.Width.Base()/2, under, h)
	d.level("stem spacing", s.StemSpacing, -axis, axis, 0)
	d.level("stem width at soffit", s.StemWidthSoffit, axis-low, axis+low, 0)
	d.level("stem width at flange", s.StemWidthFlange, axis-up, axis+up, under)
	d.level("haunch", s.Haunch, axis+up, axis+up+s.Haunch.Base(), under)
	d.level("chamfer", s.Chamfer, axis+low-s.Chamfer.Base(), axis+low, 0)
}

func (d *dimensioner) hollow(s *member.Shape) {
	v, k, x := &s.Voids, &s.Joint, s.Width.Base()/2
	n := float64(v.Count.N)
	first := -(n - 1) / 2 * v.Spacing.Base()
	level := v.Height.Base()
	d.across("width", s.Width, 0)
	d.level("void width", v.Width, first-v.Width.Base()/2, first+v.Width.Base()/2, level)
	if v.Depth.Base() != v.Width.Base() {
		d.upright("void depth", v.Depth, first, level-v.Depth.Base()/2, level+v.Depth.Base()/2)
	}
	if v.Count.N > 1 {
		d.level("void spacing", v.Spacing, first, first+v.Spacing.Base(), level)
	}
	d.upright("void height", v.Height, first, 0, level)
	d.level("joint inset", k.Inset, x-k.Inset.Base(), x, d.depth)
	if k.Recess.Base() > 0 {
		d.level("joint recess", k.Recess, x-k.Recess.Base(), x, (k.Low.Base()+k.High.Base())/2)
		d.upright("joint from", k.Low, x, 0, k.Low.Base())
		d.upright("joint to", k.High, x, 0, k.High.Base())
		d.upright("joint flank", k.Flank, x, k.Low.Base(), k.Low.Base()+k.Flank.Base())
	}
	d.chamfer("chamfer", s.Chamfer, s.Width.Base(), 0)
}
