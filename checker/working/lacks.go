package working

import (
	"cmp"
	"slices"
	"strings"

	"boardproof/checker/place"
)

// Lack is one value that would have to be stated: a leaf of the file, or a choice
// of leaves of which one would do, or a capability this program does not have.
type Lack struct {
	Path    string // "sources.TX1.impedance"; empty if no leaf of the file would help
	What    string // "impedance of TX1"
	Unit    string // how it is written, by example: "6 %"
	Place   place.Place
	OneOf   []Lack // instead of the above: any of these would do
	Because string // why it counts as missing although something stands there ("65 A is outside the usual range")
}

// Key identifies a lack: two with one key are one question.
func (l Lack) Key() string {
	if len(l.OneOf) > 0 {
		keys := make([]string, len(l.OneOf))
		for i, one := range l.OneOf {
			keys[i] = one.Key()
		}
		return strings.Join(keys, " | ")
	}
	if l.Path == "" {
		return "~" + l.What
	}
	return l.Path
}

// Lacks is a set of lacks, sorted by key.
type Lacks []Lack

// Union is the lacks of both, each once.
func (l Lacks) Union(other Lacks) Lacks {
	if len(other) == 0 {
		return l
	}
	return append(slices.Clone(l), other...).sorted()
}

func (l Lacks) sorted() Lacks {
	out := slices.Clone(l)
	slices.SortStableFunc(out, func(a, b Lack) int { return cmp.Compare(a.Key(), b.Key()) })
	return slices.CompactFunc(out, func(a, b Lack) bool { return a.Key() == b.Key() })
}
