package clause

import "sync"

var registry struct {
	sync.Mutex
	formulas []*Formula
}

// Define enters a formula into the register of all formulas of the program and returns it. It is called from
// package variables only.
func Define(f *Formula) *Formula {
	registry.Lock()
	defer registry.Unlock()
	registry.formulas = append(registry.formulas, f)
	return f
}

// Formulas is every formula of the program, in no particular order.
func Formulas() []*Formula {
	registry.Lock()
	defer registry.Unlock()
	return append([]*Formula(nil), registry.formulas...)
}
