package fonts

import (
	"sync/atomic"

	"golang.org/x/image/font"
	"golang.org/x/image/math/fixed"
)

// kerned are the runes between which pairs are drawn together: ASCII.
const kerned = 128

var kerns [Count]atomic.Pointer[[kerned][kerned]float64]

// Kern is the change of the distance between a and b where b follows a, in em; negative draws them
// together. It is 0 for runes outside ASCII, and between digits and blanks, so that columns of figures
// stand under each other.
func Kern(f Face, a, b rune) float64 {
	if uint32(a) >= kerned || uint32(b) >= kerned || f == Marks {
		return 0
	}
	t := kerns[f&3].Load()
	if t == nil {
		t = kernTable(f)
	}
	return t[a][b]
}

func kernTable(f Face) *[kerned][kerned]float64 {
	t := new([kerned][kerned]float64)
	for a := rune(' '); a < kerned-1; a++ { // glyphs first, for they take the lock too
		Of(f, a)
	}
	d := load(f)
	d.mu.Lock()
	defer d.mu.Unlock()
	ppem := fixed.I(int(d.upem))
	p := d.pages[0].Load()
	for a := '!'; a < kerned-1; a++ {
		for b := '!'; b < kerned-1; b++ {
			if figure(a) && figure(b) {
				continue
			}
			k, err := d.font.Kern(&d.buf, p[a].index, p[b].index, ppem, font.HintingNone)
			if err == nil {
				t[a][b] = float64(int(float64(k)/64/d.upem*1000)) / 1000
			}
		}
	}
	kerns[f&3].Store(t)
	return t
}

func figure(r rune) bool { return r >= '0' && r <= '9' || r == '.' || r == ',' }
