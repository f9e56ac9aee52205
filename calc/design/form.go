package design

import (
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/section"
)

// form is the section as a stack of trapezoids from the soffit up, and the measures of its top.
type form struct {
	names                       []string
	height, lower, upper        []quantity.Literal
	flange, haunch, web, bottom quantity.Literal // b_f top width; h_f; haunch; web width; depth to the lower end of the web
	flangeDepth                 quantity.Literal
}

// formOf reads the shape. Heights are exact decimals of millimetres.
func formOf(s *member.Shape) form {
	mm := func(base float64) quantity.Literal { return number(base, "mm", places(base)) }
	var f form
	add := func(name string, height, lower, upper float64) {
		if height > 0 {
			f.names = append(f.names, name)
			f.height, f.lower, f.upper = append(f.height, mm(height)), append(f.lower, mm(lower)), append(f.upper, mm(upper))
		}
	}
	h := s.Depth.Base()
	switch s.Kind.Text {
	case "rectangle":
		w := s.Width.Base()
		add("rectangle", h, w, w)
		f.flange, f.web, f.flangeDepth, f.haunch, f.bottom = mm(w), mm(w), mm(h), mm(0), mm(h)
	case "T":
		w, bf, hf, hh := s.WebWidth.Base(), s.FlangeWidth.Base(), s.FlangeDepth.Base(), s.HaunchDepth.Base()
		add("web", h-hf-hh, w, w)
		add("haunch", hh, w, bf)
		add("flange", hf, bf, bf)
		f.flange, f.web, f.flangeDepth, f.haunch, f.bottom = mm(bf), mm(w), mm(hf), mm(hh), mm(h)
	default: // I
		w, t, u := s.WebWidth.Base(), &s.TopFlange, &s.BottomFlange
		bf, hf, hh := t.Width.Base(), t.Depth.Base(), t.HaunchDepth.Base()
		bb, hb, hhb := u.Width.Base(), u.Depth.Base(), u.HaunchDepth.Base()
		add("bottom flange", hb, bb, bb)
		add("bottom haunch", hhb, bb, w)
		add("web", h-hf-hh-hb-hhb, w, w)
		add("top haunch", hh, w, bf)
		add("top flange", hf, bf, bf)
		f.flange, f.web, f.flangeDepth, f.haunch, f.bottom = mm(bf), mm(w), mm(hf), mm(hh), mm(h-hb-hhb)
	}
	return f
}

// places is how many decimals of a millimetre a measure has, at most 6.
func places(mm float64) int {
	for d := 0; d < 6; d++ {
		v, err := quantity.Value(quantity.Format(mm, d))
		if err == nil && quantity.Format(v, 6) == quantity.Format(mm, 6) {
			return d
		}
	}
	return 6
}

// shape is the section for the kernels. The member file has refused what is none.
func (f *form) shape() (section.Shape, error) {
	strips := make([]section.Strip, len(f.height))
	for i := range strips {
		strips[i] = section.Strip{Height: f.height[i].Quantity().Value, Bottom: f.lower[i].Quantity().Value, Top: f.upper[i].Quantity().Value}
	}
	return section.New(strips...)
}
