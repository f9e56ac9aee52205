package section

import (
	"fmt"
	"math"
)

// Rectangle is a solid rectangle, lengths in mm. Errors as New.
func Rectangle(width, depth float64) (Shape, error) {
	return New(Strip{Height: depth, Bottom: width, Top: width})
}

// Flange is a flange at one edge of a T or an I, mm: full Width over Depth, then narrowing to the web in
// a straight line over Haunch, which may be 0.
type Flange struct{ Width, Depth, Haunch float64 }

// T is a web with a flange on top, lengths in mm. The flange may be narrower than the web.
// Errors as New; and where the flange with its haunch leaves no web.
func T(depth float64, flange Flange, web float64) (Shape, error) {
	return flanged(depth, flange, web, Flange{})
}

// I is a web between two flanges, lengths in mm. Errors as New; and where the flanges with their haunches
// are deeper than the section. Flanges that meet leave no web between them, which is allowed.
func I(depth float64, top Flange, web float64, bottom Flange) (Shape, error) {
	if !(bottom.Depth > 0) {
		return Shape{}, fmt.Errorf("bottom flange: depth %g mm, want a length above 0", bottom.Depth)
	}
	return flanged(depth, top, web, bottom)
}

func flanged(depth float64, top Flange, web float64, bottom Flange) (Shape, error) {
	between := depth - top.Depth - top.Haunch - bottom.Depth - bottom.Haunch
	if math.Abs(between) < thin*depth {
		between = 0 // flanges that meet but for rounding
	}
	switch {
	case !(top.Depth > 0):
		return Shape{}, fmt.Errorf("top flange: depth %g mm, want a length above 0", top.Depth)
	case !(top.Haunch >= 0) || !(bottom.Haunch >= 0):
		return Shape{}, fmt.Errorf("haunch depths %g mm and %g mm, want lengths from 0", top.Haunch, bottom.Haunch)
	case !(between >= 0) || between == 0 && bottom.Depth == 0:
		return Shape{}, fmt.Errorf("flanges and haunches take %g mm of a depth of %g mm", depth-between, depth)
	}
	var strips []Strip
	add := func(height, bottom, top float64) {
		if height != 0 {
			strips = append(strips, Strip{height, bottom, top})
		}
	}
	add(bottom.Depth, bottom.Width, bottom.Width)
	add(bottom.Haunch, bottom.Width, web)
	add(between, web, web)
	add(top.Haunch, web, top.Width)
	add(top.Depth, top.Width, top.Width)
	return New(strips...)
}
