// Package design is what an engineer does with the clauses: it takes a member, makes every calculation of the
// note in order and records it. One file is one chapter; contents.go is their order.
package design

import (
	"fmt"
	"path/filepath"
	"slices"
	"strconv"
	"strings"

	"soffit/calc/clause"
	"soffit/calc/diag"
	"soffit/calc/member"
	"soffit/calc/quantity"
	"soffit/calc/section"
	"soffit/calc/tendon"
	"soffit/calc/trace"
)

// Program is the name and version that the note carries.
const Program = "Soffit 0.1"

// job is one design under way: the member, the record, its axes, and the blocks that later ones take.
type job struct {
	m *member.Member
	n *trace.Note

	rows, bars, parts, rounds, fibreAxis, loads, stations *trace.Axis

	parameters, concrete, section, span, tendons, barData, actionData                *trace.Block
	strengths, tendonStrengths, barStrengths, bareBars, gross, positions, spanLength *trace.Block
	characteristic                                                                   *trace.Block
	reactions, effects, ultimate, stress, transmission, barAnchorage, along          *trace.Block
	resistance                                                                       *trace.Block

	levels, fromTop, fromBelow, positionsBelow, net, transformed *trace.Block // the section: from below only where it hogs, net only with ducts
	topping, toppingStrengths, composite, fibres                 *trace.Block // only with a topping; fibres only with a diagram other than the block
	toppedFromTop, toppedFromBelow, toppedPositions              *trace.Block
	construction                                                 *trace.Block // combination during construction; nil for none
	hogging, bareHogging                                         *trace.Block // hogging moments; bare only with a topping that the member carries

	axialForces, bareAxialForces []axialForce // one without a block where there is none
	asked                        []*asked     // the ways in which the section was asked for its resistance

	form  form          // the shape as the record has it
	shape section.Shape // the same for the kernels

	profile, heights, friction *trace.Block     // of tendons whose heights change; heights gives y_{p,i}
	segments, groups           *trace.Axis      // of profiles; of rows of strands
	profiles                   []tendon.Profile // of the rows, in their order

	findings diag.List // in what only the finished design can judge

	trying bool // a remedy is being tried: no further ones
}

// Run designs a member. The record is complete, or there is an error that says what could not be computed.
func Run(m *member.Member) (*trace.Note, error) { return run(m, false) }

// run designs a member; trying is set while a remedy for a failing check is tried.
func run(m *member.Member, trying bool) (*trace.Note, error) {
	j, err := newJob(m, trying)
	if err != nil {
		return nil, err
	}
	if j.profiles, err = profilesOf(m, j.shape.Height()); err != nil {
		return nil, fmt.Errorf("%s: %w", m.File, err)
	}
	j.contents()
	if err := j.n.Err(); err != nil {
		return nil, fmt.Errorf("%s: %w", m.File, err)
	}
	if err := j.findings.Err(); err != nil {
		return nil, err
	}
	return j.n, nil
}

// newJob sets the shape out and starts the record.
func newJob(m *member.Member, trying bool) (*job, error) {
	f, err := formOf(&m.Shape)
	if err != nil {
		return nil, fmt.Errorf("%s: shape: %w", m.File, err)
	}
	j := &job{m: m, n: trace.New(document(m)), form: f, shape: f.outline.Shape, trying: trying}
	return j, nil
}

func document(m *member.Member) trace.Document {
	d := &m.Document
	out := trace.Document{Program: Program, Project: d.Project.Text, Title: d.Title.Text, Number: d.Number.Text,
		Revision: d.Revision.Text, Status: d.Status.Text, Originator: d.Originator.Text, InputName: filepath.Base(m.File), Input: string(m.Source)}
	for _, r := range []struct {
		role string
		of   member.Role
	}{{"prepared", d.Prepared}, {"checked", d.Checked}, {"approved", d.Approved}} {
		out.Roles = append(out.Roles, trace.Role{Role: r.role, Name: r.of.Name.Text, Organisation: r.of.Organisation.Text, Date: r.of.Date.Text})
	}
	for _, h := range d.History {
		out.History = append(out.History, trace.Issue{Revision: h.Revision.Text, Date: h.Date.Text, Text: h.Text.Text})
	}
	for _, w := range d.Drawings {
		out.Drawings = append(out.Drawings, trace.Drawing{Number: w.Number.Text, Revision: w.Revision.Text, Title: w.Title.Text})
	}
	return out
}

// given says where a value of the member file comes from.
func given(v member.Value) string { return origin(v.Origin) }

func origin(o member.Origin) string {
	if o.Given {
		return "member file, line " + strconv.Itoa(o.Pos.Line)
	}
	return "default: " + o.Why
}

// lines says from which lines of the member file a column comes.
func lines(origins ...member.Origin) string {
	var list []string
	for _, o := range origins {
		if n := strconv.Itoa(o.Pos.Line); o.Given && !slices.Contains(list, n) {
			list = append(list, n)
		}
	}
	switch len(list) {
	case 0:
		return "default"
	case 1:
		return "member file, line " + list[0]
	}
	return "member file, lines " + strings.Join(list, ", ")
}

// plain is a number without unit, with a unit: values that the program itself puts in.
func plain(s, unit string) quantity.Literal {
	return quantity.Literal{Number: s, Unit: quantity.MustUnit(unit)}
}

// whole is a count.
func whole(n int) quantity.Literal { return plain(strconv.Itoa(n), "") }

// number shows a base value in a unit with as many decimals as asked.
func number(base float64, unit string, decimals int) quantity.Literal {
	u := quantity.MustUnit(unit)
	return quantity.Literal{Number: quantity.Format(u.From(base), decimals), Unit: u}
}

func def(id, symbol, name, unit string, ref ...clause.Ref) *clause.Given {
	g := &clause.Given{ID: id, Symbol: symbol, Name: name, Unit: unit}
	if len(ref) > 0 {
		g.Ref = ref[0]
	}
	return g
}

func ref(document, number string) clause.Ref { return clause.Ref{Document: document, Clause: number} }

// each collects a value per row.
func each[T any](rows []T, f func(T) quantity.Literal) []quantity.Literal {
	out := make([]quantity.Literal, len(rows))
	for i, r := range rows {
		out[i] = f(r)
	}
	return out
}

// lowered is a title within a sentence.
func lowered(s string) string { return strings.ToLower(s[:1]) + s[1:] }
