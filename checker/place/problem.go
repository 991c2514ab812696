package place

import (
	"cmp"
	"slices"
	"strings"
)

// A Kind says what sort of fault a Problem is; it never changes the sentence.
type Kind string

// Faults of a file as a whole.
const (
	Unreadable       Kind = "unreadable"        // the file cannot be opened or its syntax cannot be followed
	MissingFile      Kind = "missing file"      // a file that another one names is not there
	TooLarge         Kind = "too large"         // more bytes, rows or entries than are accepted
	TooDeep          Kind = "too deep"          // nested deeper than is accepted
	NotUTF8          Kind = "not UTF-8"         // bytes that are not UTF-8 text
	ControlCharacter Kind = "control character" // a control, bidirectional or invisible character
	SecondDocument   Kind = "second document"   // more than one YAML document in a file
	Alias            Kind = "alias"             // a YAML anchor, alias or merge key
	CustomTag        Kind = "custom tag"        // a YAML tag that is not a plain one
)

// Faults of keys, words and names.
const (
	DuplicateKey Kind = "duplicate key" // a key that stands twice in one mapping
	UnknownKey   Kind = "unknown key"   // a key the place does not have
	MissingKey   Kind = "missing key"   // a key the place must have
	UnknownWord  Kind = "unknown word"  // a word that is not in the list for this key
	UnknownName  Kind = "unknown name"  // a reference to something that is not declared
	WrongShape   Kind = "wrong shape"   // a list where a mapping is wanted, and the like
)

// Faults of a value. The kinds of units.Fault carry the same strings, so that Kind(fault.Kind) is
// right.
const (
	Empty              Kind = "empty"               // no text where a value is wanted
	NotANumber         Kind = "not a number"        // no plain number at the start of a quantity
	NotFinite          Kind = "not finite"          // NaN or infinity
	DecimalComma       Kind = "decimal comma"       // "6,5 kA"
	AmbiguousComma     Kind = "ambiguous comma"     // "1,600 kVA"
	ThousandsSeparator Kind = "thousands separator" // "1 600 kVA"
	TooManyDigits      Kind = "too many digits"     // more than are kept
	NoUnit             Kind = "no unit"             // a bare number where a unit is needed
	UnknownUnit        Kind = "unknown unit"        // a unit that is not known, or its capitals are not
	AmbiguousUnit      Kind = "ambiguous unit"      // a unit with two meanings in the trade
	WrongUnit          Kind = "wrong unit"          // a unit of another quantity
	SeveralValues      Kind = "several values"      // more than one value in one place
)

// Faults of the contents.
const (
	Impossible    Kind = "impossible"    // a value that cannot exist, such as a negative length
	Contradiction Kind = "contradiction" // two statements that cannot both hold
	Rule          Kind = "rule"          // a rule pack that breaks the rules about rules
)

// Kinds returns all kinds in the order of their declaration.
func Kinds() []Kind {
	return []Kind{Unreadable, MissingFile, TooLarge, TooDeep, NotUTF8, ControlCharacter, SecondDocument, Alias, CustomTag,
		DuplicateKey, UnknownKey, MissingKey, UnknownWord, UnknownName, WrongShape,
		Empty, NotANumber, NotFinite, DecimalComma, AmbiguousComma, ThousandsSeparator, TooManyDigits,
		NoUnit, UnknownUnit, AmbiguousUnit, WrongUnit, SeveralValues,
		Impossible, Contradiction, Rule}
}

// A Problem is one fault of the input. Got, Want and Hint are phrases in lower case without period;
// text from a file goes through Quote first.
type Problem struct {
	Place   Place
	Path    string  // where in the data, e.g. "busbars.main A.rated_current"
	Kind    Kind    // what sort of fault
	Got     string  // what was found: `"65"`, `a list`
	Want    string  // what was expected: `a current with its unit`
	Hint    string  // what to write instead, with its verb: `write "65 kA"`
	Related []Place // other places the fault speaks of, such as the first of two equal keys
}

// Sentence returns the problem as one line, without its place:
//
//	found "65", expected a current with its unit; write "65 kA"
//
// Parts that are empty are left out; a problem without any part is called by its kind. Characters
// that cannot be printed are escaped.
func (p Problem) Sentence() string {
	var parts []string
	if p.Got != "" {
		parts = append(parts, "found "+p.Got)
	}
	if p.Want != "" {
		parts = append(parts, "expected "+p.Want)
	}
	s := strings.Join(parts, ", ")
	switch {
	case s == "" && p.Hint == "":
		s = string(p.Kind)
	case s == "":
		s = p.Hint
	case p.Hint != "":
		s += "; " + p.Hint
	}
	if s == "" {
		s = "a fault without description"
	}
	return Visible(s)
}

// compareProblems orders by place, then path, kind, sentence and related places.
func compareProblems(a, b Problem) int {
	return cmp.Or(
		Compare(a.Place, b.Place),
		cmp.Compare(a.Path, b.Path),
		cmp.Compare(a.Kind, b.Kind),
		cmp.Compare(a.Sentence(), b.Sentence()),
		slices.CompareFunc(a.Related, b.Related, Compare),
	)
}
