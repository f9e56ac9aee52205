package member

import (
	"fmt"
	"strings"
)

// checkDocument looks at the roles, their dates and independence, and at the revision history.
func (r *reader) checkDocument(m *Member) {
	d := &m.Document
	r.checkHistory(d)
	r.checkRoles(d)
	r.checkIndependence(d, m.Basis.SupervisionLevel)
	first := map[string]bool{}
	for _, e := range m.Basis.Exposure {
		if e.Present() && first[e.Text] {
			r.at(e.Origin, "exposure: have "+e.Text+" a second time", "remove one of them")
		}
		first[e.Text] = true
	}
}

// checkHistory looks for the revision of the document in its history.
func (r *reader) checkHistory(d *Document) {
	first := map[string]int{}
	before := Date{}
	for _, h := range d.History {
		if h.Revision.Present() {
			if line := first[h.Revision.Text]; line > 0 {
				r.at(h.Revision.Origin, fmt.Sprintf("revision: have %s a second time, first on line %d", h.Revision.Text, line), "give each revision a line of its own")
			} else {
				first[h.Revision.Text] = h.Revision.Pos.Line
			}
		}
		if h.Date.Present() {
			if h.Date.Text < before.Text {
				r.at(h.Date.Origin, "date: have "+h.Date.Text+", want no day before "+before.Text+", the date of the revision above", "write the history in order of dates, the first issue first")
			}
			before = h.Date
		}
	}
	if len(first) > 0 && d.Revision.Present() && first[d.Revision.Text] == 0 {
		r.at(d.Revision.Origin, "revision: have "+d.Revision.Text+", which the history does not tell of", "add it to the history, or write the revision that the history ends with")
	}
}

// checkRoles looks for the names that the status speaks of, and at the order of the dates.
func (r *reader) checkRoles(d *Document) {
	needs := map[string]int{"checked": 1, "approved": 2}[d.Status.Text]
	for i, role := range []struct {
		key string
		of  *Role
	}{{"checked", &d.Checked}, {"approved", &d.Approved}} {
		if i < needs && role.of.Pos.Line == 0 {
			r.at(d.Status.Origin, "status: have "+d.Status.Text+", but nobody who "+role.key, "add "+role.key+": with name and date, or write the status reached")
		}
	}
	before, key := d.Prepared.Date, "prepared"
	for _, role := range []struct {
		key string
		of  Date
	}{{"checked", d.Checked.Date}, {"approved", d.Approved.Date}} {
		if role.of.Present() && before.Present() && role.of.Text < before.Text {
			r.at(role.of.Origin, "date: have "+role.key+" on "+role.of.Text+", before "+key+" on "+before.Text, "correct one of the dates")
		}
		if role.of.Present() {
			before, key = role.of, role.key
		}
	}
}

// checkIndependence compares who checks with who prepared, EN 1990 Table B.4: another person from DSL2 on,
// another organisation at DSL3.
func (r *reader) checkIndependence(d *Document, level Word) {
	if level.Text != "DSL2" && level.Text != "DSL3" {
		return
	}
	same := func(a, b Word) bool {
		return a.Present() && strings.EqualFold(strings.Join(strings.Fields(a.Text), " "), strings.Join(strings.Fields(b.Text), " "))
	}
	if same(d.Checked.Name, d.Prepared.Name) {
		r.at(d.Checked.Name.Origin, "name: have "+clip(d.Checked.Name.Text)+", who prepared the note; "+level.Text+" wants another person to check", "name another person, or write supervision level: DSL1")
	} else if level.Text == "DSL3" && same(d.Checked.Organisation, d.Prepared.Organisation) {
		r.at(d.Checked.Organisation.Origin, "organisation: have "+clip(d.Checked.Organisation.Text)+", which prepared the note; DSL3 wants another organisation to check", "name another organisation, or write supervision level: DSL2")
	}
}
