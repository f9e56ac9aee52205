package member

import (
	"regexp"
	"time"

	"soffit/calc/node"
)

// Ways of writing a date that leave no doubt which day is meant.
var (
	dayFirst = regexp.MustCompile(`^(\d{1,2})\.(\d{1,2})\.(\d{4})$`)
	loose    = regexp.MustCompile(`^(\d{4})[-./](\d{1,2})[-./](\d{1,2})$`)
)

// date reads a day of the calendar.
func (r *reader) date(n *node.Node, f *field, to *Date) {
	s, ok := r.text(n, f, dateType)
	if !ok {
		return
	}
	if _, err := time.Parse(time.DateOnly, s); err != nil {
		want, hint := "a date as year-month-day", "write, for example, 2031-04-07"
		m := loose.FindStringSubmatch(s)
		if d := dayFirst.FindStringSubmatch(s); d != nil {
			m = []string{s, d[3], d[2], d[1]}
		}
		if m != nil {
			iso := m[1] + "-" + twoDigits(m[2]) + "-" + twoDigits(m[3])
			if _, err := time.Parse(time.DateOnly, iso); err == nil {
				hint = "write " + iso
			} else {
				want = "a day that the calendar has"
			}
		}
		r.find(placeOf(n), f.key+": have "+have(n)+", want "+want, hint)
		return
	}
	*to = Date{s, Origin{Pos: n.Pos, Given: true}}
}

func twoDigits(s string) string {
	if len(s) == 1 {
		return "0" + s
	}
	return s
}
