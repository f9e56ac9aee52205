package member_test

import (
	"fmt"
	"math"
	"math/rand/v2"
	"os"
	"path/filepath"
	"reflect"
	"regexp"
	"slices"
	"strings"
	"testing"

	"soffit/calc/design"
	"soffit/calc/diag"
	"soffit/calc/member"
	"soffit/templates"
)

func samples(t testing.TB, folder string) (names []string, sources [][]byte) {
	t.Helper()
	names, err := filepath.Glob("../../testdata/" + folder + "/*.yaml")
	if err != nil || len(names) == 0 {
		t.Fatalf("no files in %s: %v", folder, err)
	}
	for _, name := range names {
		src, err := os.ReadFile(name)
		if err != nil {
			t.Fatal(err)
		}
		sources = append(sources, src)
	}
	return names, sources
}

// good are the samples, and the drafts without their comments: at least one for each kind of section.
func good(t testing.TB) (names []string, sources [][]byte) {
	t.Helper()
	names, sources = samples(t, "members")
	comment := regexp.MustCompile(`(?m) +# .*$`)
	for _, kind := range templates.Drafts() {
		text, _ := templates.Draft(kind)
		names, sources = append(names, kind+".yaml"), append(sources, comment.ReplaceAll(text, nil))
	}
	return names, sources
}

func TestSamples(t *testing.T) {
	names, sources := good(t)
	for i, src := range sources {
		m, found := member.Read(names[i], src, design.Options())
		if m == nil {
			t.Errorf("%s", found)
			continue
		}
		sound(t, m, found)
	}
}

// sound asserts what holds of every reading: a member or findings; every number of a member finite; findings
// sorted, in words, at a place.
func sound(t testing.TB, m *member.Member, found diag.List) {
	t.Helper()
	if (m == nil) == (len(found) == 0) {
		t.Fatalf("a member and findings, or neither: %s", found)
	}
	if m != nil {
		finite(t, reflect.ValueOf(*m), "member")
	}
	for i, f := range found {
		last := i == len(found)-1 && strings.HasSuffix(f.Msg, "findings more")
		if f.Msg == "" || f.File == "" || !last && (f.Line < 1 || f.Col < 1) || strings.HasSuffix(f.Msg, ".") || strings.HasSuffix(f.Hint, " ") {
			t.Fatalf("unfit finding %+v", f)
		}
		if i > 0 && !last && f.Pos.Before(found[i-1].Pos) {
			t.Fatalf("findings out of order: %s", found)
		}
	}
}

func finite(t testing.TB, v reflect.Value, path string) {
	switch x := v.Interface().(type) {
	case member.Value:
		if b := x.Base(); math.IsNaN(b) || math.IsInf(b, 0) || math.IsInf(b*b*b*b, 0) {
			t.Fatalf("%s = %v", path, b)
		}
		return
	case []byte:
		return
	}
	switch v.Kind() {
	case reflect.Struct:
		for i := range v.NumField() {
			if f := v.Type().Field(i); f.IsExported() && f.Name != "Tree" {
				finite(t, v.Field(i), path+"."+f.Name)
			}
		}
	case reflect.Slice:
		for i := range v.Len() {
			finite(t, v.Index(i), fmt.Sprintf("%s[%d]", path, i))
		}
	}
}

// mutation spoils a file in one way; the same number gives the same mutation.
type mutation struct {
	name  string
	spoil func(lines []string, r *rand.Rand) []string
}

var (
	unit   = regexp.MustCompile(`([0-9]) (mm²|mm|m|MPa|GPa|kN/m³|kN/m|kN|kg/m|y|‰)([,}\n ]|$)`)
	number = regexp.MustCompile(`[0-9]+(\.[0-9]+)?`)
	units  = []string{"mm", "m", "km", "MPa", "kN", "kN/m", "kN·m", "kg", "%", "", "°C", "furlong", "mm^", "/", "m/s/s", "10⁶ mm⁴"}
	odd    = []rune("\t\x00\u00A0\u200B\u2028\uFEFF\uFFFD'\"{}[]:#&*!|>%@`,-?~<=−·²é漢🏗\\")
	worse  = []string{"0", "-1", "1e308", "1e-308", "1e400", "-0", "NaN", ".inf", "0x10", "1_0", "1,5", "1.5.1", "99999999999999999999", "1e5", "00", ".5", "5."}
)

var mutations = []mutation{
	{"drop line", func(l []string, r *rand.Rand) []string { i := r.IntN(len(l)); return slices.Delete(l, i, i+1) }},
	{"duplicate line", func(l []string, r *rand.Rand) []string {
		i := r.IntN(len(l))
		return slices.Insert(l, r.IntN(len(l)), l[i])
	}},
	{"repeat line", func(l []string, r *rand.Rand) []string { i := r.IntN(len(l)); return slices.Insert(l, i, l[i]) }},
	{"swap lines", func(l []string, r *rand.Rand) []string {
		i, k := r.IntN(len(l)), r.IntN(len(l))
		l[i], l[k] = l[k], l[i]
		return l
	}},
	{"indent", func(l []string, r *rand.Rand) []string { i := r.IntN(len(l)); l[i] = "  " + l[i]; return l }},
	{"outdent", func(l []string, r *rand.Rand) []string {
		i := r.IntN(len(l))
		l[i] = strings.TrimPrefix(l[i], "  ")
		return l
	}},
	{"swap unit", func(l []string, r *rand.Rand) []string {
		return change(l, r, unit, "${1} "+units[r.IntN(len(units))]+"${3}")
	}},
	{"scramble number", func(l []string, r *rand.Rand) []string { return change(l, r, number, worse[r.IntN(len(worse))]) }},
	{"delete character", func(l []string, r *rand.Rand) []string {
		return character(l, r, func(c []rune, k int) []rune { return slices.Delete(c, k, k+1) })
	}},
	{"double character", func(l []string, r *rand.Rand) []string {
		return character(l, r, func(c []rune, k int) []rune { return slices.Insert(c, k, c[k]) })
	}},
	{"odd character", func(l []string, r *rand.Rand) []string {
		return character(l, r, func(c []rune, k int) []rune { return slices.Insert(c, k, odd[r.IntN(len(odd))]) })
	}},
	{"swap characters", func(l []string, r *rand.Rand) []string {
		return character(l, r, func(c []rune, k int) []rune {
			if k > 0 {
				c[k], c[k-1] = c[k-1], c[k]
			}
			return c
		})
	}},
	{"cut off", func(l []string, r *rand.Rand) []string { return l[:r.IntN(len(l))] }},
	{"cut a byte", func(l []string, r *rand.Rand) []string {
		i := r.IntN(len(l))
		if len(l[i]) > 0 {
			k := r.IntN(len(l[i]))
			l[i] = l[i][:k] + l[i][k+1:]
		}
		return l
	}},
}

// change replaces what a pattern matches on one of the lines that match.
func change(l []string, r *rand.Rand, pattern *regexp.Regexp, with string) []string {
	var fit []int
	for i, line := range l {
		if pattern.MatchString(line) && !strings.HasPrefix(line, "#") {
			fit = append(fit, i)
		}
	}
	i := fit[r.IntN(len(fit))]
	at := pattern.FindAllStringIndex(l[i], -1)
	k := at[r.IntN(len(at))]
	l[i] = l[i][:k[0]] + pattern.ReplaceAllString(l[i][k[0]:k[1]], with) + l[i][k[1]:]
	return l
}

func character(l []string, r *rand.Rand, spoil func([]rune, int) []rune) []string {
	i := r.IntN(len(l))
	for len(l[i]) == 0 {
		i = r.IntN(len(l))
	}
	c := []rune(l[i])
	l[i] = string(spoil(c, r.IntN(len(c))))
	return l
}

// TestMutations spoils the samples: whatever comes of it is a finding or a sound member, the same each time.
func TestMutations(t *testing.T) {
	const each = 20
	opt := design.Options()
	names, sources := good(t)
	total, silent := 0, map[string]int{}
	for i, src := range sources {
		for k, m := range mutations {
			for n := range each {
				spoiled := []byte(strings.Join(m.spoil(strings.Split(string(src), "\n"), rand.New(rand.NewPCG(uint64(k), uint64(n)))), "\n"))
				got, found := member.Read(names[i], spoiled, opt)
				sound(t, got, found)
				if _, again := member.Read(names[i], spoiled, opt); again.String() != found.String() {
					t.Fatalf("%s %d of %s reads in two ways:\n%s\n\n%s", m.name, n, names[i], found, again)
				}
				total++
				if got != nil {
					silent[m.name]++
				}
			}
		}
	}
	if total < 200*len(sources) {
		t.Errorf("%d mutations", total)
	}
	// A unit of another dimension never passes; mm for m and the same unit again may.
	if all := each * len(sources); silent["swap unit"] > all/4 || silent["delete character"] > all*3/4 || silent["cut off"] > all/4 {
		t.Errorf("passed without a finding: %v", silent)
	}
}

// TestOtherDimension gives every value of the samples, one after the other, a unit that does not fit.
func TestOtherDimension(t *testing.T) {
	opt := design.Options()
	names, sources := good(t)
	for i, src := range sources {
		values := unit.FindAllSubmatchIndex(src, -1)
		if len(values) < 20 {
			t.Errorf("%s: %d values", names[i], len(values))
		}
		for _, at := range values {
			line := 1 + strings.Count(string(src[:at[4]]), "\n")
			if begin := strings.LastIndexByte(string(src[:at[4]]), '\n') + 1; strings.Contains(string(src[begin:at[4]]), "title:") || src[begin] == '#' || strings.Contains(string(src[begin:at[4]]), "source:") {
				continue
			}
			for _, u := range []string{"kN·m", ""} {
				spoiled := string(src[:at[4]]) + u + string(src[at[5]:])
				m, found := member.Read(names[i], []byte(spoiled), opt)
				if m != nil {
					t.Errorf("%s:%d: %q for %q passes", names[i], line, u, src[at[4]:at[5]])
				} else if !slices.ContainsFunc(found, func(f diag.Finding) bool { return f.Line == line && strings.HasPrefix(f.Hint, "write ") }) {
					t.Errorf("%s:%d: %q for %q: %s", names[i], line, u, src[at[4]:at[5]], found)
				}
			}
		}
	}
}

// FuzzRead: whatever bytes come, a member or findings.
func FuzzRead(f *testing.F) {
	_, sources := good(f)
	_, faulty := samples(f, "bad")
	for _, src := range append(sources, faulty...) {
		f.Add(src)
	}
	opt := design.Options()
	f.Fuzz(func(t *testing.T, src []byte) {
		m, found := member.Read("fuzz.yaml", src, opt)
		sound(t, m, found)
		_ = found.String()
	})
}

func BenchmarkRead(b *testing.B) {
	opt := design.Options()
	names, sources := samples(b, "members")
	for b.Loop() {
		if m, found := member.Read(names[0], sources[0], opt); m == nil {
			b.Fatal(found)
		}
	}
}
