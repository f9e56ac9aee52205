package member

import (
	"fmt"

	"soffit/calc/section"
)

// checkShape looks for webs wider than their flanges and for flanges deeper than the section.
func (r *reader) checkShape(s *Shape) {
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
	}
}

func (r *reader) web(web, flange Value, name string) {
	if known(web, flange) && exceeds(web.Base(), flange.Base()) {
		r.at(web.Origin, "web width: have "+web.String()+", want at most "+flange.String()+", the width of the "+name, "write a web no wider than the flange")
	}
}

// outline is the section as strips from the soffit up; ok is false where the shape is not known or not
// possible.
func (s *Shape) outline() (section.Shape, bool) {
	flange := func(f *Flange) section.Flange {
		return section.Flange{Width: f.Width.Base(), Depth: f.Depth.Base(), Haunch: f.HaunchDepth.Base()}
	}
	var shape section.Shape
	var err error
	switch s.Kind.Text {
	case "rectangle":
		shape, err = section.Rectangle(s.Width.Base(), s.Depth.Base())
	case "T":
		f := section.Flange{Width: s.FlangeWidth.Base(), Depth: s.FlangeDepth.Base(), Haunch: s.HaunchDepth.Base()}
		if known(s.Depth, s.FlangeWidth, s.WebWidth) {
			shape, err = section.T(s.Depth.Base(), f, s.WebWidth.Base())
		}
	case "I":
		if known(s.Depth, s.TopFlange.Width, s.WebWidth, s.BottomFlange.Width) {
			shape, err = section.I(s.Depth.Base(), flange(&s.TopFlange), s.WebWidth.Base(), flange(&s.BottomFlange))
		}
	}
	return shape, err == nil && shape.Height() > 0
}
