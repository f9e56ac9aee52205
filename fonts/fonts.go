// Package fonts holds the four typefaces of a note and their metrics.
//
// Lengths are in em: multiples of the size at which a face is set; x runs to the right and y up from
// the baseline. All functions may be called from several goroutines.
package fonts

import (
	"sync"
	"sync/atomic"

	"github.com/go-fonts/dejavu/dejavusansmono"
	"github.com/go-fonts/liberation/liberationserifbold"
	"github.com/go-fonts/liberation/liberationserifitalic"
	"github.com/go-fonts/liberation/liberationserifregular"
	"golang.org/x/image/font"
	"golang.org/x/image/font/sfnt"
	"golang.org/x/image/math/fixed"
)

// Face is one of the typefaces.
type Face uint8

// Serif sets text, numbers, units and words; Italic variables and emphasis; Bold headings and results.
// Marks is a typewriter face for listings and fingerprints, and lends the signs which the others lack.
const (
	Serif Face = iota
	Italic
	Bold
	Marks
	Count = 4 // number of faces
)

// String names the face.
func (f Face) String() string {
	return [...]string{"serif", "italic", "bold", "marks"}[f&3]
}

// Bytes is the TrueType file of the face. It must not be changed.
func Bytes(f Face) []byte {
	switch f {
	case Italic:
		return liberationserifitalic.TTF
	case Bold:
		return liberationserifbold.TTF
	case Marks:
		return dejavusansmono.TTF
	}
	return liberationserifregular.TTF
}

// Glyph is the metrics of one rune of a face. Ink bounds are all zero for a blank.
type Glyph struct {
	Has                    bool // the face has the rune
	Advance                float64
	XMin, YMin, XMax, YMax float64
	index                  sfnt.GlyphIndex
	profile                atomic.Pointer[Profile]
}

type page [256]Glyph

type faceData struct {
	once  sync.Once
	font  *sfnt.Font
	upem  float64
	mu    sync.Mutex
	buf   sfnt.Buffer
	pages [256]atomic.Pointer[page]
}

var faces [Count]faceData

var none Glyph

func load(f Face) *faceData {
	d := &faces[f&3]
	d.once.Do(func() {
		parsed, err := sfnt.Parse(Bytes(f))
		if err != nil {
			panic("fonts: embedded face " + f.String() + ": " + err.Error())
		}
		d.font = parsed
		d.upem = float64(parsed.UnitsPerEm())
	})
	return d
}

// Of is the glyph of a rune. A rune which the face lacks has a Glyph with Has false; so has every rune
// above U+FFFF.
func Of(f Face, r rune) *Glyph {
	if r < 0 || r > 0xFFFF {
		return &none
	}
	d := load(f)
	p := d.pages[r>>8].Load()
	if p == nil {
		p = d.fill(r >> 8)
	}
	return &p[r&0xFF]
}

// Has tells whether the face itself has the rune.
func Has(f Face, r rune) bool { return Of(f, r).Has }

func (d *faceData) fill(n rune) *page {
	d.mu.Lock()
	defer d.mu.Unlock()
	if p := d.pages[n].Load(); p != nil {
		return p
	}
	p := new(page)
	ppem := fixed.I(int(d.upem))
	em := func(v fixed.Int26_6) float64 { return float64(v) / 64 / d.upem }
	for i := range p {
		gid, err := d.font.GlyphIndex(&d.buf, n<<8|rune(i))
		if err != nil || gid == 0 {
			continue
		}
		box, adv, err := d.font.GlyphBounds(&d.buf, gid, ppem, font.HintingNone)
		if err != nil {
			continue
		}
		g := &p[i]
		g.Has, g.index = true, gid
		// A PDF carries advances as thousandths of an em: those are the ones that the reader's screen uses.
		g.Advance = float64(int(em(adv)*1000+0.5)) / 1000
		g.XMin, g.XMax = em(box.Min.X), em(box.Max.X)
		g.YMin, g.YMax = -em(box.Max.Y), -em(box.Min.Y)
	}
	d.pages[n].Store(p)
	return p
}
