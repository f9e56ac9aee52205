package mathset

import (
	"sync"

	"soffit/calc/formula"
	"soffit/report/draw"
)

// known holds the boxes of symbols without exponent, for a note sets the same few over and over. A box
// is never changed once it is set.
var known struct {
	sync.RWMutex
	boxes map[knownKey]Box
}

// knownKey is all that the box of a symbol depends on: sizes of scripts follow the size of the formula.
type knownKey struct {
	name       string
	size, base draw.Pt
}

// mostKnown bounds the memory; a note has some hundred symbols in three sizes.
const mostKnown = 4096

func (m *setter) known(size draw.Pt, s *formula.Symbol) Box {
	key := knownKey{s.Name, size, m.Size}
	known.RLock()
	b, ok := known.boxes[key]
	known.RUnlock()
	if ok {
		return b
	}
	b = m.symbol(size, s, Box{})
	known.Lock()
	if known.boxes == nil || len(known.boxes) >= mostKnown {
		known.boxes = map[knownKey]Box{}
	}
	known.boxes[key] = b
	known.Unlock()
	return b
}
