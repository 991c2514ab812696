package place

import (
	"slices"
	"strings"
)

// longestWord is the length in characters beyond which a word is no slip of the pen.
const longestWord = 100

// Nearest returns the known word that the writer most likely meant. Capitals and the separators "_",
// "-" and space do not count. Otherwise the distance is the number of characters to insert, drop,
// change or swap with the next one; it may be 1 for words of up to four characters, 2 for longer
// ones, and a third of the length from nine characters on, and never the whole word. Of words at
// the same distance the first in alphabetical order is returned.
func Nearest(word string, known []string) (string, bool) {
	given := bare(word)
	if len(given) == 0 || len(given) > longestWord {
		return "", false
	}
	limit := 2
	switch n := len(given); {
	case n <= 4:
		limit = 1
	case n >= 9:
		limit = n / 3
	}
	limit = min(limit, len(given)-1)
	best, found := "", false
	candidates := slices.Clone(known)
	slices.Sort(candidates)
	for _, k := range candidates {
		other := bare(k)
		if gap := len(other) - len(given); gap > limit || -gap > limit {
			continue
		}
		if d := distance(given, other); d <= limit && (!found || d < distance(given, bare(best))) {
			best, found = k, true
		}
	}
	return best, found
}

// bare returns the characters that count.
func bare(word string) []rune {
	return []rune(strings.NewReplacer("_", "", "-", "", " ", "").Replace(strings.ToLower(word)))
}

// distance returns the Damerau-Levenshtein distance in its restricted form, where no part is
// changed twice (optimal string alignment).
func distance(a, b []rune) int {
	before, previous, row := make([]int, len(b)+1), make([]int, len(b)+1), make([]int, len(b)+1)
	for j := range previous {
		previous[j] = j
	}
	for i := 1; i <= len(a); i++ {
		row[0] = i
		for j := 1; j <= len(b); j++ {
			change := 1
			if a[i-1] == b[j-1] {
				change = 0
			}
			row[j] = min(previous[j]+1, row[j-1]+1, previous[j-1]+change)
			if i > 1 && j > 1 && a[i-1] == b[j-2] && a[i-2] == b[j-1] {
				row[j] = min(row[j], before[j-2]+1)
			}
		}
		before, previous, row = previous, row, before
	}
	return previous[len(b)]
}
