package review

import (
	"cmp"
	"slices"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
	"boardproof/checker/working"
)

// Query is one question to the tenderer: one missing value, and every requirement
// that waits for it.
type Query struct {
	working.Lack
	Waiting []*Finding
}

// Grade is the weightiest grade of what waits; empty if nothing does.
func (q *Query) Grade() string {
	best := ""
	for _, f := range q.Waiting {
		if weight(f.Rule.Grade) > weight(best) {
			best = f.Rule.Grade
		}
	}
	return best
}

// Rules lists the rules that wait, each once with its subjects.
func (q *Query) Rules() []Waiting {
	var list []Waiting
	for _, f := range q.Waiting {
		i := slices.IndexFunc(list, func(w Waiting) bool { return w.Rule == f.Rule })
		if i < 0 {
			list = append(list, Waiting{Rule: f.Rule})
			i = len(list) - 1
		}
		list[i].Subjects = append(list[i].Subjects, f.Subject.ID)
	}
	return list
}

// Waiting is one rule that waits for a value, and for which subjects.
type Waiting struct {
	Rule     *rules.Rule
	Subjects []string
}

// queries asks once for each missing value. Remarks ("see drawing") and doubtful
// values are asked even when no requirement waits for them.
func queries(board *spec.Board, findings []*Finding) []*Query {
	byKey := map[string]*Query{}
	var list []*Query
	ask := func(lack working.Lack, f *Finding) {
		q, ok := byKey[lack.Key()]
		if !ok {
			q = &Query{Lack: lack}
			byKey[lack.Key()] = q
			list = append(list, q)
		}
		if q.Because == "" {
			q.Because = lack.Because
		}
		if f != nil {
			q.Waiting = append(q.Waiting, f)
		}
	}
	for _, f := range findings {
		if f.Outcome != rules.Clarify {
			continue
		}
		for _, lack := range f.Lacks {
			ask(lack, f)
		}
		if len(f.Lacks) == 0 {
			ask(unproven(f), f)
		}
	}
	for _, r := range board.Remarks {
		ask(working.Lack{Path: r.Path, What: facts.Name(r.At), Place: r.Place, Unit: facts.Example(r.At), Because: place.Quote(r.Text) + " is no value"}, nil)
	}
	for _, d := range board.Doubts {
		ask(working.Lack{Path: d.Path, What: facts.Name(d.At), Place: d.Place, Unit: facts.Example(d.At), Because: place.Quote(d.Text) + " is outside the usual range " + d.Usual + ": is the unit right?"}, nil)
	}
	slices.SortStableFunc(list, func(a, b *Query) int {
		return cmp.Or(
			cmp.Compare(weight(b.Grade()), weight(a.Grade())),
			cmp.Compare(len(b.Waiting), len(a.Waiting)),
			cmp.Compare(a.Key(), b.Key()))
	})
	return list
}

// unproven is the question when nothing is missing and still nothing is proven: a
// formula outside its range, or two bounds with the rating between them.
func unproven(f *Finding) working.Lack {
	if len(f.Outside) > 0 {
		return working.Lack{What: f.Rule.Title + ", " + f.Subject.ID, Place: f.Place, Because: f.Outside[0].Reason}
	}
	return working.Lack{What: f.Rule.Title + ", " + f.Subject.ID, Place: f.Place, Because: "the values given neither show that it is met nor that it is missed"}
}
