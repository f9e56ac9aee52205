package mathset

import (
	"sync"

	"soffit/fonts"
	"soffit/report/draw"
)

// Lengths of mathematics in em of the size in force.
const (
	thin    = 0.167 // beside a product's dot, after a function's name
	medium  = 0.222 // beside + and −
	unitGap = 0.2   // between number and unit
	thick   = 0.278 // beside a relation
	quad    = 1.0

	ruleWidth   = 0.045 // fraction bars, vinculum
	barOverhang = 0.07  // of a fraction bar over the wider part
	barBearing  = 0.08  // before and after a fraction bar
	numeratorUp = 0.66  // least rise of a numerator's baseline, display
	denomDown   = 0.69
	barGap      = 0.16 // least clear distance between bar and ink

	subDown    = 0.19 // drop of a subscript's baseline
	supUp      = 0.40 // rise of a superscript's
	scriptGap  = 0.035
	scriptTail = 0.045 // after a script
	stackGap   = 0.10  // least distance between superscript and subscript

	// Brackets grow around matter that reaches further from the axis, fractions and the like; scripts do
	// not make them grow.
	plainReach = 0.62

	indexGap = 0.2 // between a sign or word and the index below it

	scriptScale = 0.70
	leastScript = 0.55 // of the display size
)

// Smallest is the least size of type anywhere in a formula.
const Smallest draw.Pt = 6.5

// metrics are heights of the serif face in em.
type metrics struct {
	axis    float64 // height of minus, plus and fraction bars
	xHeight float64
}

var measure = sync.OnceValue(func() metrics {
	minus, x := fonts.Of(fonts.Serif, '−'), fonts.Of(fonts.Serif, 'x')
	return metrics{axis: (minus.YMin + minus.YMax) / 2, xHeight: x.YMax}
})

func axis(size draw.Pt) draw.Pt { return draw.Pt(measure().axis) * size }
