package place

import (
	"slices"
	"strconv"
)

// Problems gathers problems. The zero value is empty and ready; a nil pointer reads as empty.
// It is not safe for concurrent use.
type Problems struct {
	list   []Problem
	sorted bool
}

// Add adds problems in any order; one that is already there has no effect.
func (ps *Problems) Add(problems ...Problem) {
	for _, p := range problems {
		p.Related = slices.Clone(p.Related)
		ps.list = append(ps.list, p)
	}
	ps.sorted = false
}

// Sort puts the problems in order of place and removes duplicates: problems of the same place,
// path, kind, sentence and related places. All, Len, Err and Print do so on their own.
func (ps *Problems) Sort() {
	if ps == nil || ps.sorted {
		return
	}
	slices.SortStableFunc(ps.list, compareProblems)
	ps.list = slices.CompactFunc(ps.list, func(a, b Problem) bool { return compareProblems(a, b) == 0 })
	ps.sorted = true
}

// All returns the problems sorted and without duplicates.
func (ps *Problems) All() []Problem {
	if ps == nil {
		return nil
	}
	ps.Sort()
	return slices.Clone(ps.list)
}

// Len returns the number of problems without duplicates.
func (ps *Problems) Len() int {
	if ps == nil {
		return 0
	}
	ps.Sort()
	return len(ps.list)
}

// Err returns nil when there is no problem, otherwise ps itself, which errors.As finds again.
func (ps *Problems) Err() error {
	if ps.Len() == 0 {
		return nil
	}
	return ps
}

// Error returns the first problem with its place and the number of the others.
func (ps *Problems) Error() string {
	switch n := ps.Len(); n {
	case 0:
		return "no problem"
	case 1:
		return ps.list[0].line()
	case 2:
		return ps.list[0].line() + " (and 1 more problem)"
	default:
		return ps.list[0].line() + " (and " + strconv.Itoa(n-1) + " more problems)"
	}
}

// line returns the place and the sentence; the path stands in where no line or cell is known.
func (p Problem) line() string {
	s := p.Place.String() + ": "
	if p.Path != "" && p.Place.Line == 0 && p.Place.Cell == "" {
		s += Visible(p.Path) + ": "
	}
	return s + p.Sentence()
}
