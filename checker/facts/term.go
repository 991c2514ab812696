package facts

import (
	"cmp"
	"slices"
	"strings"

	"boardproof/checker/units"
)

// Kind is a kind of subject; it is also the name of the collection in a rule:
// `some s in input.busbars`.
type Kind string

// The kinds of subject that rules can speak about.
const (
	Boards  Kind = "boards"
	Busbars Kind = "busbars"
	Units   Kind = "units"
	Limits  Kind = "limits" // not a collection: input.limits, what an owner may tighten
)

// ValueKind is what a term's value is made of.
type ValueKind int

// A number carries a unit; a word is one of a list; an ordered word has a rank in
// its list, low to high.
const (
	Number ValueKind = iota
	Word
	Ordered
)

// Direction says which way a limit gets stricter.
type Direction int

// For limits only.
const (
	NotALimit Direction = iota
	Higher              // a higher value demands more
	Lower               // a lower value demands more
)

// Term is one entry of the vocabulary. ID is dotted; in a rule it is read as
// `s.<ID>`, an ordered word as `s.<ID>.rank`. A worst-of has two terms, ending in
// `.at_least` and `.at_most`.
type Term struct {
	Kind      Kind
	ID        string
	Label     string // "peak withstand current"
	Symbol    string // "Ipk"
	Value     ValueKind
	Dimension *units.Dimension // of a number
	Words     []string         // allowed words; low to high if ordered
	ListID    string           // name of the word list: ranks of one list only are comparable
	Claim     bool             // says something of the assembly: it is what is found, the other side is what is required
	Stricter  Direction        // of a limit
	Clause    string           // where a limit's default comes from
	Key       bool             // a key quantity: it stands in the report's table of figures

	// As shows a value in the quantity in which people speak of it; nil to show it as it is.
	As func(s *Subject, number float64) (Shown, bool)
}

// Vocabulary is all terms, limits included.
type Vocabulary struct {
	terms []*Term
	byKey map[string]*Term
}

// NewVocabulary indexes terms; a term spelt twice is a defect of the program and
// returns an error naming it.
func NewVocabulary(terms ...*Term) (*Vocabulary, error) {
	v := &Vocabulary{byKey: map[string]*Term{}}
	for _, t := range terms {
		if err := v.add(t); err != nil {
			return nil, err
		}
	}
	slices.SortFunc(v.terms, func(a, b *Term) int { return cmp.Or(cmp.Compare(a.Kind, b.Kind), cmp.Compare(a.ID, b.ID)) })
	return v, nil
}

// Terms lists all terms sorted by kind and name.
func (v *Vocabulary) Terms() []*Term { return v.terms }

// Kinds lists the kinds of subject that have terms, sorted, without limits.
func (v *Vocabulary) Kinds() []Kind {
	var kinds []Kind
	for _, t := range v.terms {
		if t.Kind != Limits && !slices.Contains(kinds, t.Kind) {
			kinds = append(kinds, t.Kind)
		}
	}
	return kinds
}

// Lookup finds a term by kind and dotted name.
func (v *Vocabulary) Lookup(kind Kind, id string) (*Term, bool) {
	t, ok := v.byKey[string(kind)+"."+id]
	return t, ok
}

func (v *Vocabulary) add(t *Term) error {
	key := string(t.Kind) + "." + t.ID
	for other := range v.byKey {
		if other == key || strings.HasPrefix(other, key+".") || strings.HasPrefix(key, other+".") {
			return &TermError{First: other, Second: key}
		}
	}
	v.byKey[key] = t
	v.terms = append(v.terms, t)
	return nil
}

// TermError says that two terms have one name, or that one's name begins the other's.
type TermError struct{ First, Second string }

// Error names both.
func (e *TermError) Error() string {
	return "the terms " + e.First + " and " + e.Second + " stand in each other's way"
}
