package formula

import (
	"slices"
	"strings"

	"soffit/calc/quantity"
)

// Unknown says that a symbol has no value, with what was likely meant out of the known ones: a product
// written without its sign ("unknown symbol λx: write λ·x"), a slip of the pen, a Greek letter by name.
func Unknown(name string, known []string) string {
	msg := "unknown symbol " + clip(name)
	if product := splitProduct(name, known); product != "" {
		return msg + ": write " + product
	}
	if meant := meantSymbol(name, known); meant != "" {
		return msg + ": write " + meant
	}
	return msg
}

// splitProduct finds known symbols that make up the name one behind the other, or a known symbol in front of
// a bracket that was meant as a factor; "" if there are none. The longest first factor goes first.
func splitProduct(name string, known []string) string {
	if s, err := ParseSymbol(name); err == nil && s.Arg != "" {
		front := strings.TrimSuffix(name, "("+s.Arg+")")
		if !slices.Contains(known, front) {
			front = splitProduct(front, known)
		}
		if front == "" {
			return ""
		}
		return front + "·(" + s.Arg + ")"
	}
	return strings.Join(factors(name, known, 3), "·")
}

func factors(name string, known []string, more int) []string {
	runes := []rune(name)
	for n := len(runes) - 1; n > 0 && more > 0 && len(runes) < 60; n-- {
		front, rest := string(runes[:n]), string(runes[n:])
		if !slices.Contains(known, front) {
			continue
		}
		if slices.Contains(known, rest) {
			return []string{front, rest}
		}
		if tail := factors(rest, known, more-1); tail != nil {
			return append([]string{front}, tail...)
		}
	}
	return nil
}

// plain writes a symbol without what is often forgotten or replaced: braces, capitals, Greek letters.
func plain(name string) string {
	name = strings.NewReplacer("_", "", "{", "", "}", "", ",", "", " ", "").Replace(name)
	for greek, latin := range greekNames {
		name = strings.ReplaceAll(name, string(greek), latin)
	}
	return strings.ToLower(name)
}

func meantSymbol(name string, known []string) string {
	sorted := slices.Sorted(slices.Values(known))
	for _, k := range sorted {
		if plain(k) == plain(name) {
			return k
		}
	}
	if meant, ok := quantity.Nearest(name, sorted); ok {
		return meant
	}
	return ""
}

// greekNames are the letters' names. The variant forms of ε, θ, ρ, σ, φ are read as the letters.
var greekNames = map[rune]string{
	'α': "alpha", 'β': "beta", 'γ': "gamma", 'δ': "delta", 'ε': "epsilon", 'ϵ': "epsilon", 'ζ': "zeta", 'η': "eta",
	'θ': "theta", 'ϑ': "theta", 'ι': "iota", 'κ': "kappa", 'λ': "lambda", 'μ': "mu", 'ν': "nu", 'ξ': "xi", 'π': "pi",
	'ρ': "rho", 'ϱ': "rho", 'σ': "sigma", 'ς': "sigma", 'τ': "tau", 'φ': "phi", 'ϕ': "phi", 'χ': "chi", 'ψ': "psi",
	'ω': "omega", 'Γ': "gamma", 'Δ': "delta", 'Θ': "theta", 'Λ': "lambda", 'Ξ': "xi", 'Π': "pi", 'Φ': "phi", 'Ψ': "psi", 'Ω': "omega",
}
