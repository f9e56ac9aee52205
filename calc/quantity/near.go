package quantity

import (
	"slices"
	"strings"
	"unicode/utf8"
)

// Nearest finds the known spelling that a mistyped one most likely means: the same but for capitals, or one
// slip away (a letter missing, added, wrong, two swapped), two slips in words of six letters and more. Words
// of one letter have no near miss but for capitals. Among equals the first in alphabetical order wins.
func Nearest(word string, known []string) (string, bool) {
	length := utf8.RuneCountInString(word)
	if length == 0 || length > 60 {
		return "", false
	}
	most := 1
	if length >= 6 {
		most = 2
	}
	known = slices.Clone(known)
	slices.Sort(known)
	best, slips := "", most+1
	for _, k := range known {
		switch n := utf8.RuneCountInString(k); {
		case k == word:
			return k, true
		case strings.EqualFold(k, word):
			if slips > 0 {
				best, slips = k, 0
			}
		case length > 1 && n > 1 && max(n-length, length-n) <= most:
			if d := distance([]rune(word), []rune(k)); d < slips {
				best, slips = k, d
			}
		}
	}
	return best, slips <= most
}

// distance counts the slips between two words: insertion, deletion, substitution, swap of neighbours.
func distance(a, b []rune) int {
	before, row := make([]int, len(b)+1), make([]int, len(b)+1)
	for j := range row {
		row[j] = j
	}
	var earlier []int
	for i := range a {
		before, row, earlier = row, make([]int, len(b)+1), before
		row[0] = i + 1
		for j := range b {
			cost := 1
			if a[i] == b[j] {
				cost = 0
			}
			row[j+1] = min(before[j]+cost, before[j+1]+1, row[j]+1)
			if i > 0 && j > 0 && a[i] == b[j-1] && a[i-1] == b[j] {
				row[j+1] = min(row[j+1], earlier[j-1]+1)
			}
		}
	}
	return row[len(b)]
}
