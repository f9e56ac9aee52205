package pdf

import (
	"bytes"
	"testing"

	"soffit/fonts"
)

// TestFontBytesStayAsTheyAre: writing a document leaves the typefaces, which all documents share, untouched. fpdf
// writes into the bytes of a monospaced face while it subsets it.
func TestFontBytesStayAsTheyAre(t *testing.T) {
	var before [fonts.Count][]byte
	for f := range before {
		before[f] = bytes.Clone(fonts.Bytes(fonts.Face(f)))
	}
	if _, err := sample(false).Bytes(); err != nil {
		t.Fatal(err)
	}
	for f := range before {
		if !bytes.Equal(before[f], fonts.Bytes(fonts.Face(f))) {
			t.Errorf("%v has changed", fonts.Face(f))
		}
	}
}
