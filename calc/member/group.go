package member

import "fmt"

// common is one thing that a group may state for its rows.
type common struct {
	key     string
	written bool // in the row
	stated  bool // in the group
	wanted  bool // has to stand in one of them
	row     Origin
	copy    func()
}

// sharing lists what a row may have from its group.
func (s *StrandRow) sharing(g *Group) []common {
	value := func(key string, row, group *Value, wanted bool) common {
		return common{key, *row != (Value{}), *group != (Value{}), wanted, row.Origin, func() { *row = *group }}
	}
	product := common{"product", s.Product != (Word{}), g.Product != (Word{}), true, s.Product.Origin, func() { s.Product = g.Product }}
	losses := common{"stated losses", s.StatedLosses.Present(), g.StatedLosses.Present(), true, Origin{Pos: s.StatedLosses.Pos},
		func() { s.StatedLosses = g.StatedLosses }}
	deflected := common{"deflected", s.Deflected.Present(), g.Deflected.Present(), false, Origin{Pos: s.Deflected.Pos},
		func() { s.Deflected = g.Deflected }}
	return []common{
		product,
		value("debonded length", &s.DebondedLength, &g.DebondedLength, false),
		value("jacking stress", &s.JackingStress, &g.JackingStress, true),
		losses,
		deflected,
	}
}

// group finds the group of a row, nil where it belongs to none or to one that there is not.
func (s *Strands) group(name string) *Group {
	for i := range s.Groups {
		if g := &s.Groups[i]; name != "" && g.Name.Text == name {
			return g
		}
	}
	return nil
}

// share copies what the groups state into their rows, where these leave it out.
func (s *Strands) share() {
	for i := range s.Rows {
		row := &s.Rows[i]
		if g := s.group(row.Group.Text); g != nil {
			for _, v := range row.sharing(g) {
				if v.stated && !v.written {
					v.copy()
				}
			}
		}
	}
}

// checkGroups looks for groups that are not there or without rows, and for what is stated twice or nowhere. It looks at the
// rows as written, before share.
func (r *reader) checkGroups(s *Strands) {
	names := nameList(s.Groups, func(g *Group) Word { return g.Name })
	r.names(names)
	var known []string
	rows := map[string]int{}
	for _, n := range names {
		if n.Present() {
			known = append(known, n.Text)
		}
	}
	for i := range s.Rows {
		row := &s.Rows[i]
		if !row.Group.Present() {
			continue
		}
		rows[row.Group.Text]++
		g := s.group(row.Group.Text)
		if g == nil {
			hint := instead(row.Group.Text, known)
			if len(s.Groups) == 0 {
				hint = "add groups: with a row - name: " + row.Group.Text + ", or leave the key out"
			}
			r.at(row.Group.Origin, "group: have "+clip(row.Group.Text)+", which groups does not know", hint)
			continue
		}
		for _, v := range row.sharing(g) {
			if v.written && v.stated {
				r.at(v.row, v.key+": stated in the group "+g.Name.Text+" and in the row", "write it once: in the group where all its rows have it, else in each row")
			} else if v.wanted && !v.written && !v.stated {
				r.at(Origin{Pos: row.Pos}, "rows: have no "+v.key+", neither in the row nor in its group "+g.Name.Text, "add "+v.key+": to the group, or to the row")
			}
		}
	}
	for i := range s.Groups {
		if g := &s.Groups[i]; g.Name.Present() && rows[g.Name.Text] == 0 {
			r.at(g.Name.Origin, "name: have a group "+clip(g.Name.Text)+" that no row belongs to", fmt.Sprintf("write group: %s in its rows, or remove the group", g.Name.Text))
		}
	}
}
