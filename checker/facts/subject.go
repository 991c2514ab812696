package facts

import (
	"cmp"
	"slices"
	"strings"

	"boardproof/checker/place"
	"boardproof/checker/working"
)

// Fact is a term's value for one subject: a number, a word or an ordered word with
// its working; or what it lacks; or where its formula does not hold.
type Fact struct {
	Term    *Term
	Known   bool
	Number  float64 // SI, 12 significant digits
	Word    string
	Rank    int
	How     *working.Working
	Lacks   working.Lacks
	Outside *working.Outside
}

// Text is the value as people write it; empty if there is none.
func (f *Fact) Text() string {
	switch {
	case !f.Known:
		return ""
	case f.Term.Value == Number:
		return f.Term.Dimension.Format(f.Number)
	}
	return f.Word
}

// Subject is what a rule speaks about: one set of bars, one unit, the board.
type Subject struct {
	Kind  Kind
	ID    string // the name in the file; the board's own designation for the board
	Place place.Place
	facts map[string]*Fact
}

// NewSubject has no facts yet.
func NewSubject(kind Kind, id string, at place.Place) *Subject {
	return &Subject{Kind: kind, ID: id, Place: at, facts: map[string]*Fact{}}
}

// Set records a fact under its term.
func (s *Subject) Set(f *Fact) { s.facts[f.Term.ID] = f }

// Fact finds a fact by the term's dotted name; nil if the walk did not set it.
func (s *Subject) Fact(id string) *Fact { return s.facts[id] }

// Facts lists the facts sorted by term.
func (s *Subject) Facts() []*Fact {
	list := make([]*Fact, 0, len(s.facts))
	for _, f := range s.facts {
		list = append(list, f)
	}
	slices.SortFunc(list, func(a, b *Fact) int { return cmp.Compare(a.Term.ID, b.Term.ID) })
	return list
}

// Board is all that is known of one board.
type Board struct {
	ID       string
	Subjects []*Subject // sorted by kind, then in the order of the file
	States   []State    // the supply states, admitted and excluded
	Remarks  []Remark   // things the walk noticed that are no fact of a subject
}

// State is a supply state in words: what is closed, what feeds what, and, if it
// cannot come about, what excludes it.
type State struct {
	Name       string
	ExcludedBy string
	Place      place.Place // of the interlock that excludes it
}

// Remark is an assumption used or an observation made, for the report.
type Remark struct {
	Text  string
	Place place.Place
}

// Of lists the subjects of one kind.
func (b *Board) Of(kind Kind) []*Subject {
	var list []*Subject
	for _, s := range b.Subjects {
		if s.Kind == kind {
			list = append(list, s)
		}
	}
	return list
}

// Input is the subject as a rule sees it: nested by the dots of the terms, known
// facts only, an ordered word as {word, rank}. An unknown fact is an absent key.
func (s *Subject) Input(id string) map[string]any {
	out := map[string]any{"id": id}
	for _, f := range s.facts {
		if f.Known {
			put(out, strings.Split(f.Term.ID, "."), f.value())
		}
	}
	return out
}

// InputOf nests facts that belong to no subject, such as the limits.
func InputOf(facts []*Fact) map[string]any {
	out := map[string]any{}
	for _, f := range facts {
		if f.Known {
			put(out, strings.Split(f.Term.ID, "."), f.value())
		}
	}
	return out
}

func (f *Fact) value() any {
	switch f.Term.Value {
	case Word:
		return f.Word
	case Ordered:
		return map[string]any{"word": f.Word, "rank": f.Rank}
	}
	return f.Number
}

func put(into map[string]any, path []string, value any) {
	for _, step := range path[:len(path)-1] {
		next, ok := into[step].(map[string]any)
		if !ok {
			next = map[string]any{}
			into[step] = next
		}
		into = next
	}
	into[path[len(path)-1]] = value
}
