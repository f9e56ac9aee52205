package member

import "soffit/calc/quantity"

// complete puts in the defaults that follow from other values.
func (m *Member) complete() {
	b := &m.Basis
	if level, ok := map[string]string{"CC1": "DSL1", "CC2": "DSL2", "CC3": "DSL3"}[b.ConsequenceClass.Text]; ok && b.SupervisionLevel == (Word{}) {
		b.SupervisionLevel = Word{level, Origin{Pos: b.Pos, Why: "goes with " + b.ConsequenceClass.Text + ", EN 1990 Annex B"}}
	}
	single := func(v *Value, positions []Value, n Count, what string, row Origin) {
		if n.N == 1 && *v == (Value{}) && len(positions) == 0 {
			*v = Value{quantity.Literal{Number: "0", Unit: quantity.MustUnit("mm")}, Origin{Pos: row.Pos, Why: what}}
		}
	}
	for i := range m.Strands.Rows {
		s := &m.Strands.Rows[i]
		single(&s.Spacing, s.Positions, s.Count, "a single strand", Origin{Pos: s.Pos})
		if s.DebondedLength == (Value{}) {
			s.DebondedLength = Value{quantity.Literal{Number: "0", Unit: quantity.MustUnit("m")}, Origin{Pos: s.Pos, Why: "bonded from the ends"}}
		}
	}
	for i := range m.Ducts.Rows {
		s := &m.Ducts.Rows[i]
		single(&s.Spacing, s.Positions, s.Count, "a single duct", Origin{Pos: s.Pos})
	}
	for i := range m.Bars.Rows {
		s := &m.Bars.Rows[i]
		single(&s.Spacing, s.Positions, s.Count, "a single bar", Origin{Pos: s.Pos})
	}
	for i := range m.Actions {
		if a := &m.Actions[i]; m.Topping.Present() && a.ActsOn == (Word{}) {
			a.ActsOn = Word{"composite member", Origin{Pos: a.Pos, Why: "with its topping"}}
			if a.Kind.Text == "construction" {
				a.ActsOn = Word{"bare member", Origin{Pos: a.Pos, Why: "during construction"}}
			}
		}
		for k := range m.Actions[i].Loads {
			l := &m.Actions[i].Loads[k]
			if !l.Uniform.Present() {
				continue
			}
			if l.From == (Value{}) {
				l.From = Value{quantity.Literal{Number: "0", Unit: quantity.MustUnit("m")}, Origin{Pos: l.Pos, Why: "from end A"}}
			}
			if l.To == (Value{}) && m.Span.Length.Present() {
				l.To = Value{m.Span.Length.Literal, Origin{Pos: l.Pos, Why: "to end B"}}
			}
		}
	}
}
