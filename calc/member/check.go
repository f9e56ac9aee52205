package member

import (
	"strings"

	"soffit/calc/quantity"
)

// check looks for what each value for itself does not show. Values that could not be read are passed over:
// their findings stand already.
func (r *reader) check(m *Member) {
	r.checkDocument(m)
	r.checkConcrete(&m.Concrete)
	o, ok := r.checkShape(&m.Shape)
	r.checkTopping(m, o, ok)
	r.checkSpan(&m.Span)
	r.checkProducts(m.Strands.Products)
	r.checkProducts(m.Ducts.Products)
	r.checkStrands(m)
	r.checkDucts(m)
	r.checkBars(m)
	r.checkFit(m, o, ok)
	r.checkActions(m)
}

// at is a finding at a value.
func (r *reader) at(o Origin, msg, hint string) { r.find(place{o.Pos, 1}, msg, hint) }

// known reports whether all values were read.
func known(values ...Value) bool {
	for _, v := range values {
		if !v.Present() {
			return false
		}
	}
	return true
}

// exceeds reports whether a > b, in base units, beyond what two ways of writing the same number differ by.
func exceeds(a, b float64) bool { return a > b && !quantity.Agree(a, b) }

// shown writes a value in base units in the unit of another.
func shown(base float64, like Value) string {
	return quantity.Literal{Number: short(like.Unit.From(base)), Unit: like.Unit}.String()
}

// short writes a number in at most five digits, or all those before the point.
func short(v float64) string {
	s := quantity.Format(v, max(quantity.Decimals(v, 5), 0))
	if strings.ContainsRune(s, '.') {
		s = strings.TrimRight(strings.TrimRight(s, "0"), ".")
	}
	return s
}

// names finds names that occur twice in a list. Capitals make no difference: a reader would mix them up.
func (r *reader) names(list []Word) {
	first := map[string]Word{}
	for _, w := range list {
		if !w.Present() {
			continue
		}
		low := strings.ToLower(w.Text)
		if _, ok := first[low]; ok {
			r.at(w.Origin, "name: have "+w.Text+" a second time, want each name once", "write another name")
			continue
		}
		first[low] = w
	}
}

// nameList takes the names of the rows of a list.
func nameList[T any](rows []T, name func(*T) Word) []Word {
	list := make([]Word, len(rows))
	for i := range rows {
		list[i] = name(&rows[i])
	}
	return list
}

func (r *reader) checkConcrete(c *Concrete) {
	if known(c.Fck, c.FckAtRelease) && exceeds(c.FckAtRelease.Base(), c.Fck.Base()) {
		r.at(c.FckAtRelease.Origin, "f_ck at release: have "+c.FckAtRelease.String()+", want at most "+c.Fck.String()+", the strength at 28 days", "write the strength asked for when the tendons are released or stressed")
	}
}
