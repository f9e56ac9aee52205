package trace

import (
	"crypto/sha256"
	"encoding/hex"
	"encoding/json"
	"io"
)

// Fingerprint is the engineering one: SHA-256 over the input that decides, the formulas, the printed values and
// the verdicts. Unrounded values, which differ between processors, where a value comes from, and the names,
// dates, titles and narrative of the document take no part in it.
func (n *Note) Fingerprint() string {
	return digest(func(w io.Writer) {
		enc := json.NewEncoder(w)
		n.Each(func(_ *Chapter, _ *Block, e Entry) {
			j := entryOf(e)
			switch j.Kind {
			case "text", "table", "figure":
				return
			}
			j.Number, j.Name, j.Source, j.Unrounded, j.Value, j.Lower, j.Upper, j.Effect = "", "", "", nil, nil, nil, nil, nil
			must(enc.Encode(j))
		})
	})
}

// DocumentFingerprint is over everything, names, dates and narrative included; unrounded values again not.
func (n *Note) DocumentFingerprint() string {
	return digest(func(w io.Writer) {
		enc := json.NewEncoder(w)
		must(enc.Encode(n.Document))
		must(enc.Encode(n.Axes))
		for _, c := range n.chaptersJSON() {
			for i := range c.Blocks {
				for k := range c.Blocks[i].Entries {
					j := &c.Blocks[i].Entries[k]
					j.Unrounded, j.Value, j.Lower, j.Upper, j.Effect = nil, nil, nil, nil, nil
				}
			}
			must(enc.Encode(c))
		}
	})
}

func digest(write func(io.Writer)) string {
	h := sha256.New()
	write(h)
	return "sha256:" + hex.EncodeToString(h.Sum(nil))
}

// must panics on what cannot happen: an entry without a JSON form, or a hash that refuses bytes.
func must(err error) {
	if err != nil {
		panic("trace: " + err.Error())
	}
}
