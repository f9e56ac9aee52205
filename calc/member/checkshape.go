package member

import (
	"errors"
	"fmt"
	"reflect"
	"regexp"
	"strconv"
	"strings"

	"soffit/calc/quantity"
	"soffit/calc/section"
)

// checkShape looks for measures that do not go together, and for lines that make no section. The outline is the section;
// ok is false where there is none, which has its finding.
func (r *reader) checkShape(s *Shape) (o section.Outline, ok bool) {
	before := len(r.found)
	r.proportions(s)
	if len(r.found) > before || !entire(reflect.ValueOf(s).Elem()) {
		return section.Outline{}, false
	}
	o, err := s.Outline()
	var measure *section.Measure
	var refusal *section.Refusal
	switch {
	case errors.As(err, &measure):
		r.measure(s, measure)
	case errors.As(err, &refusal) && s.Kind.Text == "hollow unit":
		r.voids(s, refusal)
	case errors.As(err, &refusal):
		r.refuse(s, refusal)
	case err != nil:
		r.at(s.Kind.Origin, "kind: "+err.Error(), "write other measures of the shape")
	case s.Kind.Text == "polygon":
		return o, r.polygon(s, o)
	}
	return o, err == nil
}

// proportions looks for webs wider than their flanges, flanges deeper than the section, and for what belongs together.
func (r *reader) proportions(s *Shape) {
	switch s.Kind.Text {
	case "T":
		r.web(s.WebWidth, s.FlangeWidth, "flange")
		if known(s.Depth, s.FlangeDepth, s.HaunchDepth) && !exceeds(s.Depth.Base(), s.FlangeDepth.Base()+s.HaunchDepth.Base()) {
			r.at(s.FlangeDepth.Origin, fmt.Sprintf("flange depth: flange and haunch take %s of a depth of %s, want a web below them",
				shown(s.FlangeDepth.Base()+s.HaunchDepth.Base(), s.Depth), s.Depth), "write a smaller flange depth, or a rectangle")
		}
	case "I":
		t, b := &s.TopFlange, &s.BottomFlange
		r.web(s.WebWidth, t.Width, "top flange")
		r.web(s.WebWidth, b.Width, "bottom flange")
		if known(s.Depth, t.Depth, t.HaunchDepth, b.Depth, b.HaunchDepth) {
			sum := t.Depth.Base() + t.HaunchDepth.Base() + b.Depth.Base() + b.HaunchDepth.Base()
			if exceeds(sum, s.Depth.Base()) {
				r.at(s.Depth.Origin, fmt.Sprintf("depth: have %s, want at least %s, what flanges and haunches take", s.Depth, shown(sum, s.Depth)), "write a greater depth, or smaller depths of the flanges")
			}
		}
	case "inverted T":
		r.web(s.WebWidth, s.Ledge.Width, "ledge")
		if l := &s.Ledge; known(s.Depth, l.Depth, l.HaunchDepth) && !exceeds(s.Depth.Base(), l.Depth.Base()+l.HaunchDepth.Base()) {
			r.at(l.Depth.Origin, fmt.Sprintf("depth: the ledge with its haunch takes %s of a depth of %s, want a web above it",
				shown(l.Depth.Base()+l.HaunchDepth.Base(), s.Depth), s.Depth), "write a smaller depth of the ledge, or a rectangle")
		}
	case "box":
		if b := &s.BottomSlab; b.Width.Given {
			r.at(b.Width.Origin, "width: belongs to the top slab only; the bottom slab is as wide as the box", "remove it")
		}
	case "hollow unit":
		if v := &s.Voids; v.Count.N > 1 && v.Spacing == (Value{}) {
			r.at(Origin{Pos: v.Pos}, fmt.Sprintf("voids: have no spacing, want a length for %d voids", v.Count.N), "add, for example, spacing: 190 mm")
		}
	}
}

func (r *reader) web(web, flange Value, name string) {
	if known(web, flange) && exceeds(web.Base(), flange.Base()) {
		part := "flange"
		if name == "ledge" {
			part = name
		}
		r.at(web.Origin, "web width: have "+web.String()+", want at most "+flange.String()+", the width of the "+name, "write a web no wider than the "+part)
	}
}

// measureText says in the words of the member file what a measure of calc/section is.
type measureText struct {
	key   string
	of    func(s *Shape) Value
	takes string // what adds up to the measure, where it is not the value itself
	write string
}

// larger is the greater of two values of the file.
func larger(a, b Value) Value {
	if b.Base() > a.Base() || !a.Given && b.Given {
		return b
	}
	return a
}

var measures = map[string]measureText{
	"chamfer":               {"chamfer", func(s *Shape) Value { return s.Chamfer }, "both chamfers take", "write a smaller leg of the chamfer"},
	"chamfer at the top":    {"top chamfer", func(s *Shape) Value { return s.TopChamfer }, "both chamfers take", "write a smaller leg of the chamfer"},
	"chamfers":              {"chamfer", func(s *Shape) Value { return larger(s.Chamfer, s.TopChamfer) }, "those at the soffit and the top take", "write smaller legs of the chamfers"},
	"web thickness":         {"web thickness", func(s *Shape) Value { return s.WebThickness }, "both webs take", "write thinner webs, or a wider section"},
	"haunch":                {"haunch", func(s *Shape) Value { return larger(s.Haunch, larger(s.TopSlab.Haunch, s.BottomSlab.Haunch)) }, "both haunches take", "write a smaller leg of the haunch"},
	"haunches":              {"haunch", func(s *Shape) Value { return larger(s.TopSlab.Haunch, s.BottomSlab.Haunch) }, "those above and below take", "write smaller legs of the haunches"},
	"width of the top slab": {"width", func(s *Shape) Value { return s.TopSlab.Width }, "", "write the width over all with the overhangs, or leave it out"},
	"slab thicknesses":      {"depth", func(s *Shape) Value { return larger(s.TopSlab.Depth, s.BottomSlab.Depth) }, "both slabs take", "write thinner slabs, or a greater depth"},
	"floor thickness with haunch": {"floor thickness", func(s *Shape) Value { return s.FloorThickness }, "floor and haunch take",
		"write a thinner floor, or a greater depth"},
	"flange thickness with haunch": {"flange depth", func(s *Shape) Value { return s.FlangeDepth }, "flange and haunch take", "write a smaller flange depth, or a greater depth"},
	"stem width": {"stem width", func(s *Shape) Value { return larger(s.StemWidthFlange, s.StemWidthSoffit) }, "a stem with its haunches takes",
		"write thinner stems, a smaller haunch, or a greater stem spacing"},
	"stems":                 {"stem spacing", func(s *Shape) Value { return s.StemSpacing }, "the stems with their haunches take", "write a smaller stem spacing, thinner stems, or a greater width"},
	"void depth":            {"depth", func(s *Shape) Value { return s.Voids.Depth }, "", "write the depth of a void, smaller than that of the unit"},
	"inset of the top edge": {"inset", func(s *Shape) Value { return s.Joint.Inset }, "both insets take", "write a smaller inset"},
	"recess of the joint":   {"recess", func(s *Shape) Value { return s.Joint.Recess }, "both recesses take", "write a smaller recess"},
	"lower level of the joint with its flanks": {"from", func(s *Shape) Value { return s.Joint.Low }, "lower end and flanks of the groove come to",
		"write the heights above the soffit between which the groove lies, and smaller flanks"},
	"upper level of the joint": {"to", func(s *Shape) Value { return s.Joint.High }, "", "write the height above the soffit at which the groove ends"},
}

var millimetre = regexp.MustCompile(`[0-9.]+(e[+-]?[0-9]+)? mm`)

// measure tells of a measure that cannot be.
func (r *reader) measure(s *Shape, m *section.Measure) {
	want := strings.TrimSuffix(millimetre.ReplaceAllStringFunc(m.Want, func(n string) string {
		v, _ := strconv.ParseFloat(strings.TrimSuffix(n, " mm"), 64)
		return short(v) + " mm"
	}), ", for both")
	t, ok := measures[m.Name]
	if !ok {
		r.at(s.Kind.Origin, "kind: "+m.Name+" comes to "+short(m.Have)+" mm, want "+want, "write other measures of the shape")
		return
	}
	v := t.of(s)
	if quantity.Agree(v.Base(), m.Have) || t.takes == "" {
		r.at(v.Origin, t.key+": have "+v.String()+", want "+want, t.write)
		return
	}
	r.at(v.Origin, t.key+": "+t.takes+" "+short(m.Have)+" mm, want "+want, t.write)
}

// voids tells of the voids of a hollow unit that meet one another or the sides of the unit.
func (r *reader) voids(s *Shape, e *section.Refusal) {
	v := &s.Voids
	if e.Part.Kind == section.Void && e.Other.Kind == section.Void {
		r.at(v.Spacing.Origin, "spacing: have "+v.Spacing.String()+", want more than "+v.Width.String()+", the width of a void", "write the distance of the axes of the voids: what is more than their width is the web between them")
		return
	}
	low, high := v.Height.Base()-v.Depth.Base()/2, v.Height.Base()+v.Depth.Base()/2
	switch {
	case !exceeds(low, 0):
		r.at(v.Height.Origin, "height: voids "+v.Depth.String()+" deep at height "+v.Height.String()+" reach the soffit", "write the height of their axes above the soffit, more than half their depth")
	case !exceeds(s.Depth.Base(), high):
		r.at(v.Height.Origin, "height: voids "+v.Depth.String()+" deep at height "+v.Height.String()+" reach up to "+shown(high, v.Height)+" in a unit "+s.Depth.String()+" deep",
			"write the height of their axes above the soffit, and the depth of the unit")
	default:
		taken := float64(v.Count.N-1)*v.Spacing.Base() + v.Width.Base()
		at := v.Spacing.Origin
		if !at.Given {
			at = v.Width.Origin
		}
		r.at(at, "voids: "+strconv.Itoa(v.Count.N)+" in a row take "+shown(taken, s.Width)+" and reach the sides of a unit "+s.Width.String()+" wide",
			"write fewer voids, a smaller spacing or width of them, or a smaller recess of the joint")
	}
}
