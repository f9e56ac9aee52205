package design

import (
	"testing"

	"soffit/calc/member"
	"soffit/calc/quantity"
)

// TestHogs: an overhang longer than the depth, or a load that acts upward, may bend the member upward; an axial force of
// either sign may not.
func TestHogs(t *testing.T) {
	value := func(s string) member.Value {
		l, err := quantity.Parse(s)
		if err != nil {
			t.Fatal(err)
		}
		return member.Value{Literal: l}
	}
	for _, c := range []struct {
		fromEnd string
		load    member.Load
		want    bool
	}{
		{"150 mm", member.Load{Uniform: value("6 kN/m")}, false},
		{"600 mm", member.Load{Uniform: value("6 kN/m")}, false},
		{"601 mm", member.Load{Uniform: value("6 kN/m")}, true},
		{"150 mm", member.Load{Uniform: value("-6 kN/m")}, true},
		{"150 mm", member.Load{Point: value("-1 kN"), At: value("1 m")}, true},
		{"150 mm", member.Load{Axial: value("-100 kN")}, false},
	} {
		m := &member.Member{Actions: []member.Action{{Loads: []member.Load{c.load}}}}
		m.Shape = member.Shape{Kind: member.Word{Text: "rectangle"}, Width: value("300 mm"), Depth: value("600 mm")}
		m.Span.BearingA.FromEnd, m.Span.BearingB.FromEnd = value("150 mm"), value(c.fromEnd)
		f, err := formOf(&m.Shape)
		if err != nil {
			t.Fatal(err)
		}
		j := &job{m: m, form: f, shape: f.outline.Shape}
		if j.hogs() != c.want {
			t.Errorf("%s, %+v: %v", c.fromEnd, c.load, j.hogs())
		}
	}
}
