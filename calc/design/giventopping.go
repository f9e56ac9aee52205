package design

import (
	"soffit/calc/ec2"
	"soffit/calc/trace"
)

// hasTopping says that concrete is cast on the member later.
func (j *job) hasTopping() bool { return j.m.Topping.Depth.Present() }

// propped says that props carry the member and its topping until the topping is hard.
func (j *job) propped() bool { return j.hasTopping() && j.m.Topping.Casting.Text == "propped" }

// givenTopping records the topping as read.
func (j *job) givenTopping(c *trace.Chapter) {
	b := c.Block("topping", "Topping", nil)
	j.topping = b
	t := &j.m.Topping
	b.Given(def("width", "b_top", "Width of the topping", "mm"), t.Width.Literal, given(t.Width))
	b.Given(def("depth", "h_top", "Depth of the topping", "mm"), t.Depth.Literal, given(t.Depth))
	b.Given(def("strength", "f_{ck,t}", "Characteristic cylinder strength of the topping at 28 days", "MPa"), t.Fck.Literal, given(t.Fck))
	b.Given(def("unit-weight", "γ_{conc,t}", "Unit weight of the topping with its steel", "kN/m³"), t.UnitWeight.Literal, given(t.UnitWeight))
	b.Given(def("aggregate-factor", "k_{agg,t}", "Factor on the modulus of the topping for "+t.Aggregate.Text+" aggregate", "", ref(ec2.Code, "3.1.3(2)")), plain(aggregates[t.Aggregate.Text], ""), origin(t.Aggregate.Origin))
}
