package trace_test

import (
	"bytes"
	"testing"

	"soffit/calc/trace"
)

// FuzzRead reads damaged records: a record or an error, never a panic, and what is read can be proved or found wanting.
func FuzzRead(f *testing.F) {
	data, err := fixture(f, "30 kN/m").JSON()
	if err != nil {
		f.Fatal(err)
	}
	f.Add(data)
	for _, swap := range [][2]string{{`"axes": ["row"]`, `"axes": ["station"]`}, {`"passes"`, `"banana"`}, {`"mid-span"`, `"nowhere"`}, {`[null,`, `[`}, {`"i"`, `"q"`}, {`"over": "station"`, `"over": "row"`}} {
		f.Add(bytes.Replace(data, []byte(swap[0]), []byte(swap[1]), 1))
		f.Add(bytes.ReplaceAll(data, []byte(swap[0]), []byte(swap[1])))
	}
	f.Add([]byte(`{"format":"soffit-trace/1","axes":[null],"chapters":[]}`))
	f.Fuzz(func(t *testing.T, data []byte) {
		n, err := trace.Read(bytes.NewReader(data))
		if err != nil {
			return
		}
		trace.Closure(n)
		n.Ranked()
	})
}
