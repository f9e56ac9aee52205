package member

import (
	"fmt"
	"maps"
	"reflect"
	"slices"
	"strings"
	"unicode/utf8"

	"soffit/calc/diag"
	"soffit/calc/formula"
	"soffit/calc/node"
	"soffit/calc/quantity"
)

// NationalParameters are the nationally determined parameters that the member file replaces, in the order
// of the file.
type NationalParameters []NationalParameter

// NationalParameter is one of them: a Value, an Expression or a Table, whichever is set.
type NationalParameter struct {
	Pos        diag.Pos // of the key
	Key        string   // ParameterSpec.Key, whatever the spelling: "α_cc"
	Value      Value
	Expression Word         // as written
	Tree       formula.Node // of the expression; nil without one
	Table      []TableRow   // in the order of ParameterSpec.Rows
	Source     Word
}

// TableRow is one row of a parameter that is a table.
type TableRow struct {
	Name   string
	Values []Value
}

// parameterText is a parameter as it stands in the file.
type parameterText struct {
	Value      *node.Node `key:"value?" what:"value that replaces the recommended one"`
	Expression *node.Node `key:"expression?" what:"expression in symbols of the note"`
	Table      *node.Node `key:"table?" what:"rows of values, all of them; repeat the recommended ones where they stay"`
	Source     Word       `key:"source" eg:"national annex, clause" what:"document and clause that state it"`
}

// spelled is a parameter's key without what may be left out in writing.
var spelled = strings.NewReplacer("{", "", "}", "", " ", "").Replace

func (r *reader) nationalParameters(n *node.Node, to *NationalParameters) {
	if n.Kind != node.Mapping {
		r.find(placeOf(n), "national parameters: have "+have(n)+", want keys", "write the symbols below, further in")
		return
	}
	byName := map[string]*ParameterSpec{}
	var names []string
	for i := range r.opt.NationalParameters {
		s := &r.opt.NationalParameters[i]
		byName[spelled(s.Key)], byName[spelled(s.Ascii)] = s, s
		names = append(names, s.Key, s.Ascii)
	}
	first := map[*ParameterSpec]int{}
	for _, e := range n.Entries {
		s := byName[spelled(e.Key.Text)]
		if s == nil {
			r.find(placeOf(e.Key), clip(e.Key.Text)+": unknown national parameter", r.insteadParameter(e.Key.Text, names))
			continue
		}
		if line := first[s]; line > 0 {
			r.find(placeOf(e.Key), fmt.Sprintf("%s: second time, first on line %d", e.Key.Text, line), "remove one of them")
			continue
		}
		first[s] = e.Key.Pos.Line
		if e.Value.Kind == node.Scalar || e.Value.Kind == node.List {
			r.find(placeOf(e.Value), e.Key.Text+": have "+have(e.Value)+", want keys", "write "+either(s.forms())+", and source, on lines of their own below, further in")
			continue
		}
		var text parameterText
		if e.Value.Kind == node.Mapping {
			r.mapping(e.Value, reflect.ValueOf(&text).Elem(), e.Key.Text, placeOf(e.Key))
			*to = append(*to, r.parameter(e.Key, s, &text))
		}
	}
}

// insteadParameter proposes the parameters that a key was likely meant for: those whose symbols begin with it, in whichever
// spelling, "γ_G" γ_{G,sup} and γ_{G,inf}; and those whose table holds it, "ψ_0" ψ. Else the nearest.
func (r *reader) insteadParameter(key string, names []string) string {
	word := strings.ToLower(spelled(key))
	if utf8.RuneCountInString(word) < 3 {
		return instead(key, names)
	}
	var begun, within []string
	for _, s := range r.opt.NationalParameters {
		for _, name := range []string{s.Key, s.Ascii} {
			known := strings.ToLower(spelled(name))
			if strings.HasPrefix(known, word) {
				begun = append(begun, name)
				break
			}
			if s.Kind == Table && strings.HasPrefix(word, known+"_") {
				within = append(within, name)
				break
			}
		}
	}
	if meant := append(begun, within...); len(meant) > 0 && len(meant) <= mostMeant {
		return "write " + either(meant)
	}
	return instead(key, names)
}

// forms are the keys under which the parameter may be stated.
func (s *ParameterSpec) forms() []string {
	switch {
	case s.Kind == Table:
		return []string{"table"}
	case s.Kind == Expression || s.Symbols != nil:
		return []string{"value", "expression"}
	}
	return []string{"value"}
}

// parameter reads the one form in which the parameter is stated.
func (r *reader) parameter(key *node.Node, s *ParameterSpec, text *parameterText) NationalParameter {
	p := NationalParameter{Pos: key.Pos, Key: s.Key, Source: text.Source}
	allowed, written := s.forms(), ""
	for _, form := range []struct {
		name string
		n    *node.Node
		read func(*node.Node)
	}{
		{"value", text.Value, func(n *node.Node) { r.value(n, s.cell("value"), &p.Value) }},
		{"expression", text.Expression, func(n *node.Node) { r.expression(n, s, &p) }},
		{"table", text.Table, func(n *node.Node) { r.table(n, key, s, &p) }},
	} {
		switch {
		case form.n == nil:
			continue
		case !slices.Contains(allowed, form.name):
			r.find(placeOf(form.n), key.Text+": have "+form.name+", want "+either(allowed), "write "+either(allowed))
		case written != "":
			r.find(placeOf(form.n), key.Text+": have "+form.name+" beside "+written+", want one of them", "remove one of them")
		case form.n.Kind != node.Broken:
			form.read(form.n)
		}
		written = form.name
	}
	if written == "" {
		r.find(placeOf(key), key.Text+": have no "+either(allowed), "add "+either(allowed)+", and the source")
	}
	return p
}

// cell is a value of the parameter as a field.
func (s *ParameterSpec) cell(key string) *field {
	u, err := quantity.ParseUnit(s.Unit)
	if err != nil {
		panic("member: unit of " + s.Key + ": " + err.Error())
	}
	as := func(v float64) *quantity.Literal { return &quantity.Literal{Number: short(v), Unit: u} }
	f := &field{key: key, eg: *as(1)}
	if s.Min != 0 || s.Max != 0 {
		f.low, f.high, f.eg = as(s.Min), as(s.Max), *as(s.Max)
	}
	f.example = f.eg.String()
	return f
}

// expression reads an expression; it must have the dimension of the parameter.
func (r *reader) expression(n *node.Node, s *ParameterSpec, p *NationalParameter) {
	r.word(n, &field{key: "expression"}, &p.Expression)
	if !p.Expression.Present() {
		return
	}
	known := slices.Sorted(maps.Keys(s.Symbols))
	tree, err := formula.ParseExpr(p.Expression.Text)
	if err == nil {
		var got quantity.Dim
		got, err = formula.Check(tree, func(sym *formula.Symbol) (quantity.Dim, error) {
			d, ok := s.Symbols[sym.Name]
			if !ok {
				return d, fmt.Errorf("%s", formula.Unknown(sym.Name, known))
			}
			return d, nil
		})
		if want := s.cell("").eg.Unit.Dim(); err == nil && got != want {
			r.find(placeOf(n), "expression: have "+got.Indefinite()+", want "+want.Indefinite(), "write an expression of the dimension of "+s.Key)
			return
		}
	}
	if err != nil {
		at, msg := placeOf(n), err.Error()
		if e, ok := err.(*formula.Error); ok {
			msg = e.Msg
			if !strings.Contains(n.Text, "\n") {
				at.at.Col += int(e.Pos)
				if n.Quoted {
					at.at.Col++
				}
				at.width = 1
			}
		}
		r.find(at, "expression: "+msg, "the symbols that may be used: "+strings.Join(known, ", "))
		return
	}
	p.Tree = tree
}

// table reads rows of values; all rows have to be there.
func (r *reader) table(n, key *node.Node, s *ParameterSpec, p *NationalParameter) {
	if n.Kind != node.Mapping {
		r.find(placeOf(n), "table: have "+have(n)+", want rows", "write "+either(s.Rows)+" below, each with its list of values")
		return
	}
	rows := map[string]*node.Node{}
	for _, e := range n.Entries {
		name := e.Key.Text
		if _, ok := rows[name]; ok {
			r.find(placeOf(e.Key), clip(name)+": second row of the name", "remove one of them")
			continue
		}
		rows[name] = e.Value
		if !slices.Contains(s.Rows, name) {
			r.find(placeOf(e.Key), clip(name)+": unknown row of "+key.Text, instead(name, s.Rows))
		}
	}
	var missing []string
	for _, name := range s.Rows {
		v, ok := rows[name]
		if !ok {
			missing = append(missing, name)
			continue
		}
		p.Table = append(p.Table, TableRow{name, r.cells(v, name, s)})
	}
	if missing != nil {
		r.find(placeOf(n), "table: have no row "+either(missing)+", want all rows", "add the rows; repeat the recommended values where they stay")
	}
}

func (r *reader) cells(n *node.Node, name string, s *ParameterSpec) []Value {
	if n.Kind != node.List || len(n.Items) != s.Columns {
		if n.Kind != node.Broken {
			hint := ""
			if n.Kind == node.List && len(n.Items) == 2*s.Columns {
				hint = "a comma separates values: write decimals with a point, 0.5"
			}
			r.find(placeOf(n), fmt.Sprintf("%s: have %s, want a list of %d values", name, haveRow(n), s.Columns), hint)
		}
		return nil
	}
	values := make([]Value, s.Columns)
	for i, item := range n.Items {
		if item.Kind != node.Broken {
			r.value(item, s.cell(name), &values[i])
		}
	}
	return values
}

func haveRow(n *node.Node) string {
	if n.Kind == node.List {
		return fmt.Sprintf("%d values", len(n.Items))
	}
	return have(n)
}
