package member

import "strings"

// checkSpan looks for bearings that lie outside the member or in one another.
func (r *reader) checkSpan(s *Span) {
	for _, b := range []*Bearing{&s.BearingA, &s.BearingB} {
		if known(b.FromEnd, b.Length) && exceeds(b.Length.Base()/2, b.FromEnd.Base()) {
			r.at(b.FromEnd.Origin, "from end: have "+b.FromEnd.String()+", want at least "+shown(b.Length.Base()/2, b.FromEnd)+", half the length of the bearing",
				"write the distance from the end of the concrete to the middle of the bearing")
		}
	}
	a, b := &s.BearingA, &s.BearingB
	if !known(s.Length, a.FromEnd, a.Length, b.FromEnd, b.Length) {
		return
	}
	taken := a.FromEnd.Base() + a.Length.Base()/2 + b.FromEnd.Base() + b.Length.Base()/2
	if !exceeds(s.Length.Base(), taken) {
		r.at(s.Length.Origin, "length: have "+s.Length.String()+", want more than "+shown(taken, s.Length)+", what the bearings and the ends beyond them take",
			"write the length of the concrete, and smaller distances of the bearings from the ends")
	}
}

// checkActions looks for names taken twice, loads of no kind or of two, and loads off the member.
func (r *reader) checkActions(m *Member) {
	r.names(nameList(m.Actions, func(a *Action) Word { return a.Name }))
	for i := range m.Actions {
		a := &m.Actions[i]
		if n := strings.ToLower(a.Name.Text); n == "self-weight" || n == "self weight" {
			r.at(a.Name.Origin, "name: have "+a.Name.Text+", which is kept for the weight of the member", "leave the action out: the self-weight is always added; or write another name")
		}
		if a.ActsOn.Given && !m.Topping.Present() {
			r.at(a.ActsOn.Origin, "acts on: have "+a.ActsOn.Text+", but the file has no topping", "remove it, or add topping: with width, depth, f_ck, unit weight, casting")
		}
		for k := range a.Loads {
			r.checkLoad(&a.Loads[k], m.Span.Length)
		}
	}
}

func (r *reader) checkLoad(l *Load, length Value) {
	switch u, p, n := l.Uniform.Given, l.Point.Given, l.Axial.Given; {
	case u && p || u && n || p && n:
		return // a finding already
	case known(l.From, l.To) && !exceeds(l.To.Base(), l.From.Base()):
		const hint = "write from and to as distances from end A of the concrete"
		if l.To.Given {
			r.at(l.To.Origin, "to: have "+l.To.String()+", want more than "+l.From.String()+", where the load begins", hint)
		} else {
			r.at(l.From.Origin, "from: have "+l.From.String()+", want less than "+l.To.String()+", where the load ends", hint)
		}
	}
	if !length.Present() {
		return
	}
	for _, at := range []struct {
		key   string
		value Value
	}{{"from", l.From}, {"to", l.To}, {"at", l.At}} {
		if at.value.Given && exceeds(at.value.Base(), length.Base()) {
			r.at(at.value.Origin, at.key+": have "+at.value.String()+", want at most "+shown(length.Base(), at.value)+", the length of the concrete", "write the distance from end A of the concrete")
		}
	}
}
