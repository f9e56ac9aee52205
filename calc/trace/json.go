package trace

import (
	"bytes"
	"encoding/json"
	"fmt"
	"io"
	"strconv"

	"soffit/calc/clause"
	"soffit/calc/formula"
	"soffit/calc/quantity"
)

// Format names the file format of the record.
const Format = "soffit-trace/1"

// The JSON forms. Columns are flat, row-major over their axes; null marks a row where a branch was not taken.
type (
	noteJSON struct {
		Format       string        `json:"format"`
		Fingerprint  string        `json:"fingerprint"`
		DocumentMark string        `json:"documentFingerprint"`
		Document     Document      `json:"document"`
		Axes         []*Axis       `json:"axes"`
		Chapters     []chapterJSON `json:"chapters"`
	}
	chapterJSON struct {
		Number string      `json:"number"`
		Slug   string      `json:"slug"`
		Title  string      `json:"title"`
		Blocks []blockJSON `json:"blocks"`
	}
	blockJSON struct {
		Number  string      `json:"number"`
		Slug    string      `json:"slug"`
		Title   string      `json:"title"`
		Takes   []string    `json:"takes,omitempty"`
		Over    string      `json:"over,omitempty"`
		Row     string      `json:"row,omitempty"`
		Entries []entryJSON `json:"entries"`
	}
	entryJSON struct {
		Kind      string      `json:"kind"`
		Number    string      `json:"number,omitempty"`
		Key       string      `json:"key"`
		Symbol    string      `json:"symbol,omitempty"`
		Name      string      `json:"name,omitempty"`
		Clause    *clause.Ref `json:"clause,omitempty"`
		Formula   string      `json:"formula,omitempty"`
		Condition string      `json:"condition,omitempty"`
		Equation  string      `json:"equation,omitempty"`
		Source    string      `json:"source,omitempty"`
		Unit      string      `json:"unit,omitempty"`
		Decimals  *int        `json:"decimals,omitempty"`
		Axes      []string    `json:"axes,omitempty"`
		Value     *jsonNumber `json:"value,omitempty"`
		Shown     column      `json:"shown,omitempty"`
		Unrounded numbers     `json:"unrounded,omitempty"`
		Uses      []Use       `json:"uses,omitempty"`
		Residual  string      `json:"residual,omitempty"`
		Scale     string      `json:"scale,omitempty"`
		Tolerance float64     `json:"tolerance,omitempty"`
		Lower     numbers     `json:"lower,omitempty"`
		Upper     numbers     `json:"upper,omitempty"`
		Outcome   column      `json:"outcome,omitempty"`
		Yes       string      `json:"yes,omitempty"`
		No        string      `json:"no,omitempty"`
		Ratio     column      `json:"ratio,omitempty"`
		Margin    column      `json:"margin,omitempty"`
		Verdict   column      `json:"verdict,omitempty"`
		Worst     string      `json:"worst,omitempty"`
		Effect    *jsonNumber `json:"roundingEffect,omitempty"`
		Axis      string      `json:"axis,omitempty"`
		Columns   []string    `json:"columns,omitempty"`
		Figure    string      `json:"figure,omitempty"`
		Series    []Plot      `json:"series,omitempty"`
		At        string      `json:"at,omitempty"`
		Markdown  string      `json:"markdown,omitempty"`
	}
)

// column is the strings of the rows: a bare string where there is a single value, null where not taken.
type column []string

// MarshalJSON implements json.Marshaler.
func (c column) MarshalJSON() ([]byte, error) {
	if len(c) == 1 && c[0] != "" {
		return json.Marshal(c[0])
	}
	out := []byte{'['}
	for i, s := range c {
		if i > 0 {
			out = append(out, ',')
		}
		if s == "" {
			out = append(out, "null"...)
			continue
		}
		q, err := json.Marshal(s)
		if err != nil {
			return nil, err
		}
		out = append(out, q...)
	}
	return append(out, ']'), nil
}

// UnmarshalJSON implements json.Unmarshaler.
func (c *column) UnmarshalJSON(data []byte) error {
	var one string
	if json.Unmarshal(data, &one) == nil {
		*c = column{one}
		return nil
	}
	var many []*string
	if err := json.Unmarshal(data, &many); err != nil {
		return err
	}
	*c = make(column, len(many))
	for i, s := range many {
		if s != nil {
			(*c)[i] = *s
		}
	}
	return nil
}

// jsonNumber is written with twelve significant digits: the last ones differ between processors.
type jsonNumber float64

// MarshalJSON implements json.Marshaler.
func (v jsonNumber) MarshalJSON() ([]byte, error) {
	return strconv.AppendFloat(nil, float64(v), 'g', 12, 64), nil
}

// numbers is a column of unrounded values, null where not taken; a bare number where there is one.
type numbers []*jsonNumber

// MarshalJSON implements json.Marshaler.
func (n numbers) MarshalJSON() ([]byte, error) {
	if len(n) == 1 && n[0] != nil {
		return n[0].MarshalJSON()
	}
	return json.Marshal([]*jsonNumber(n))
}

// UnmarshalJSON implements json.Unmarshaler.
func (n *numbers) UnmarshalJSON(data []byte) error {
	var one float64
	if json.Unmarshal(data, &one) == nil && string(data) != "null" {
		v := jsonNumber(one)
		*n = numbers{&v}
		return nil
	}
	return json.Unmarshal(data, (*[]*jsonNumber)(n))
}

func numbersOf(values []float64, shown []string, u quantity.Unit) numbers {
	out := make(numbers, len(values))
	for i, v := range values {
		if shown[i] != "" {
			w := jsonNumber(u.From(v))
			out[i] = &w
		}
	}
	return out
}

// JSON is the record as a file: stable, one entry a line within its block, both fingerprints in its head.
func (n *Note) JSON() ([]byte, error) {
	if n.err != nil {
		return nil, n.err
	}
	out := noteJSON{Format: Format, Document: n.Document, Axes: n.Axes, Fingerprint: n.Fingerprint(),
		DocumentMark: n.DocumentFingerprint()}
	out.Chapters = n.chaptersJSON()
	var b bytes.Buffer
	e := json.NewEncoder(&b)
	e.SetEscapeHTML(false)
	e.SetIndent("", " ")
	if err := e.Encode(out); err != nil {
		return nil, err
	}
	return compactColumns(b.Bytes()), nil
}

func (n *Note) chaptersJSON() []chapterJSON {
	var out []chapterJSON
	for _, c := range n.Chapters {
		cj := chapterJSON{Number: c.Number, Slug: c.Slug, Title: c.Title, Blocks: []blockJSON{}}
		for _, b := range c.Blocks {
			bj := blockJSON{Number: b.Number, Slug: b.Slug, Title: b.Title, Takes: b.Takes, Entries: []entryJSON{}}
			if b.Over != nil {
				bj.Over, bj.Row = b.Over.Name, b.Over.Rows[b.Row]
			}
			for _, e := range b.Entries {
				bj.Entries = append(bj.Entries, entryOf(e))
			}
			cj.Blocks = append(cj.Blocks, bj)
		}
		out = append(out, cj)
	}
	return out
}

func entryOf(e Entry) entryJSON {
	h := e.Common()
	j := entryJSON{Number: h.Number, Key: h.Key, Name: h.Name}
	if h.Ref != (clause.Ref{}) {
		ref := h.Ref
		j.Clause = &ref
	}
	if l := LineOf(e); l != nil {
		j.line(l)
	}
	switch e := e.(type) {
	case *Given:
		j.Kind, j.Source = "given", e.Source
	case *Step:
		j.Kind, j.Formula, j.Uses = "step", e.Formula.String(), e.Uses
	case *Root:
		j.Kind, j.Equation, j.Residual, j.Scale, j.Tolerance = "root", e.Equation, e.Residual, e.Scale, e.Tolerance
		j.Lower, j.Upper = numbersOf(e.Lo, e.Shown, e.Unit), numbersOf(e.Hi, e.Shown, e.Unit)
	case *Choice:
		j.Kind, j.Condition, j.Yes, j.No, j.Uses, j.Axes = "choice", formula.PrintCond(e.Cond), e.Yes, e.No, e.Uses, names(e.Axes)
		j.Outcome = make(column, len(e.Outcomes))
		for i, o := range e.Outcomes {
			j.Outcome[i] = [...]string{"", "no", "yes"}[o]
		}
	case *Check:
		j.check(e)
	case *Table:
		j.Kind, j.Axis, j.Columns = "table", e.Axis.Name, e.Columns
	case *Figure:
		j.Kind, j.Figure, j.Series, j.At = "figure", e.Kind, e.Series, e.At
	case *Text:
		j.Kind, j.Markdown, j.Uses = "text", e.Markdown, e.Uses
	default:
		panic(fmt.Sprintf("trace: no JSON form of %T", e))
	}
	return j
}

func (j *entryJSON) line(l *Line) {
	j.Symbol, j.Unit, j.Axes, j.Shown = l.Symbol.Name, l.Unit.String(), names(l.Axes), l.Shown
	d := l.Decimals
	j.Decimals = &d
	j.Unrounded = numbersOf(l.Shadow, l.Shown, l.Unit)
	if len(l.Axes) == 0 {
		v := jsonNumber(l.Unit.From(l.Values[0]))
		j.Value = &v
	}
}

func (j *entryJSON) check(e *Check) {
	j.Kind, j.Uses, j.Axes, j.Unit = "check", []Use{e.Demand, e.Limit}, names(e.Axes), e.Unit.String()
	j.Ratio, j.Margin, j.Worst = e.Ratio, e.Margin, RowName(e.Axes, e.Worst)
	effect := jsonNumber(e.Effect)
	j.Effect = &effect
	j.Verdict = make(column, len(e.Fails))
	for i, f := range e.Fails {
		switch {
		case e.Ratio[i] == "" && e.Margin[i] == "":
		case f:
			j.Verdict[i] = "fails"
		default:
			j.Verdict[i] = "passes"
		}
	}
}

func names(axes []*Axis) []string {
	var out []string
	for _, a := range axes {
		out = append(out, a.Name)
	}
	return out
}

// compactColumns puts arrays of plain values on one line each, so that a column reads as one.
func compactColumns(data []byte) []byte {
	out := make([]byte, 0, len(data))
	for i := 0; i < len(data); {
		if data[i] == '"' {
			end := stringEnd(data, i)
			out = append(out, data[i:end]...)
			i = end
			continue
		}
		out = append(out, data[i])
		i++
		if data[i-1] != '[' {
			continue
		}
		end, flat := flatArray(data, i)
		for flat && i < end {
			switch c := data[i]; c {
			case '"':
				to := stringEnd(data, i)
				out = append(out, data[i:to]...)
				i = to
				continue
			case '\n', ' ':
			default:
				out = append(out, c)
			}
			i++
		}
	}
	return out
}

// stringEnd is the position behind the JSON string that begins at i.
func stringEnd(data []byte, i int) int {
	for i++; data[i] != '"'; i++ {
		if data[i] == '\\' {
			i++
		}
	}
	return i + 1
}

// flatArray finds the closing bracket of an array that holds no array or object.
func flatArray(data []byte, from int) (int, bool) {
	for k := from; k < len(data); k++ {
		switch data[k] {
		case '"':
			k = stringEnd(data, k) - 1
		case '[', '{':
			return 0, false
		case ']':
			return k, true
		}
	}
	return 0, false
}

// Read takes a record back from its JSON.
func Read(r io.Reader) (*Note, error) {
	var in noteJSON
	d := json.NewDecoder(r)
	d.DisallowUnknownFields()
	if err := d.Decode(&in); err != nil {
		return nil, err
	}
	if in.Format != Format {
		return nil, fmt.Errorf("format is %q, want %q", in.Format, Format)
	}
	return in.note()
}
