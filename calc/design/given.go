package design

import (
	"fmt"

	"soffit/calc/ec2"
	"soffit/calc/trace"
)

// endCover is how far bars end from the ends of the concrete, mm.
const endCover = "40"

// givenChapter records the member as read.
func (j *job) givenChapter(c *trace.Chapter) {
	j.givenConcrete(c)
	j.givenSection(c)
	j.givenTendons(c)
	if len(j.m.Bars.Rows) > 0 {
		j.givenBars(c)
	}
	if j.hasTopping() {
		j.givenTopping(c)
	}
	j.givenSpan(c)
	j.givenActions(c)
}

func (j *job) givenConcrete(c *trace.Chapter) {
	b := c.Block("concrete", "Concrete", nil)
	j.concrete = b
	m := &j.m.Concrete
	b.Given(def("strength", "f_ck", "Characteristic cylinder strength at 28 days", "MPa"), m.Fck.Literal, given(m.Fck))
	b.Given(def("strength-at-release", "f_ck(t)", "Characteristic strength asked for at release", "MPa"), m.FckAtRelease.Literal, given(m.FckAtRelease))
	b.Given(def("unit-weight", "γ_{conc}", "Unit weight of the concrete with its steel", "kN/m³"), m.UnitWeight.Literal, given(m.UnitWeight))
	b.Given(def("aggregate-factor", "k_agg", "Factor on the modulus for "+m.Aggregate.Text+" aggregate", "", ref(ec2.Code, "3.1.3(2)")), plain(aggregates[m.Aggregate.Text], ""), origin(m.Aggregate.Origin))
}

// aggregates are the factors on the modulus by kind of aggregate, EN 1992-1-1 3.1.3(2).
var aggregates = map[string]string{"quartzite": "1.0", "limestone": "0.9", "sandstone": "0.7", "basalt": "1.2"}

func (j *job) givenSpan(c *trace.Chapter) {
	b := c.Block("span", "Length and bearings", nil)
	j.span = b
	s := &j.m.Span
	b.Given(def("length", "L", "Overall length of the concrete", "m"), s.Length.Literal, given(s.Length))
	b.Given(def("bearing-a", "x_A", "Middle of bearing A from end A", "m"), s.BearingA.FromEnd.Literal, given(s.BearingA.FromEnd))
	b.Given(def("bearing-b", "x_B", "Middle of bearing B from end A", "m"), j.bearingB(),
		fmt.Sprintf("length less %s from end B (%s)", s.BearingB.FromEnd, given(s.BearingB.FromEnd)))
	if _, over := j.overhangs(); over {
		b.Given(def("overhang-b", "l_{o,B}", "Middle of bearing B from end B", "m"), s.BearingB.FromEnd.Literal, given(s.BearingB.FromEnd))
	}
	b.Given(def("bearing-a-length", "l_A", "Length of bearing A", "mm"), s.BearingA.Length.Literal, given(s.BearingA.Length))
	b.Given(def("bearing-b-length", "l_B", "Length of bearing B", "mm"), s.BearingB.Length.Literal, given(s.BearingB.Length))
}

// givenFigures draws the section; the elevation stands with the verdict.
func (j *job) givenFigures(c *trace.Chapter) {
	b := c.Block("drawings", "Section to scale", nil)
	section := append(j.outlinePlots(j.hasTopping()), j.dimensionPlots()...)
	add := func(role, key string) { section = append(section, trace.Plot{Role: role, Key: key}) }
	add("depth", "given.section/depth")
	add("centroid", "section.gross/"+j.centroidID())
	if j.hasTopping() {
		add("total-depth", "section.composite/composite-depth")
		add("composite-centroid", "section.composite/composite-centroid")
	}
	add("count", "given.tendons/count")
	section = append(section, j.tendonPlaces()...)
	add("level", "given.tendons/level")
	add("diameter", "given.tendons/diameter")
	section = append(section, j.tendonSection()...)
	if j.hasBars() {
		add("bar-count", "given.bars/count")
		section = append(section, j.barPlaces()...)
		add("bar-level", "given.bars/level")
		add("bar-diameter", "given.bars/diameter")
	}
	b.Figure("section", "section", "Section, to scale; dimensions in mm.", "", section...)
}
