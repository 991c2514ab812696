package rules

import (
	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// Outcome is what a rule says of a subject.
type Outcome int

// What is not proven is Clarify; Unjudged means that the rule itself failed.
const (
	Clarify Outcome = iota
	Complies
	Departs
	Exempt
	Unjudged
)

var outcomeNames = [...]string{"clarify", "complies", "departs", "exempt", "unjudged"}

// String is the word used in rules, cases and reports.
func (o Outcome) String() string {
	if o < 0 || int(o) >= len(outcomeNames) {
		return "no outcome"
	}
	return outcomeNames[o]
}

// OutcomeNamed finds an outcome by its word.
func OutcomeNamed(name string) (Outcome, bool) {
	for i, n := range outcomeNames {
		if n == name {
			return Outcome(i), true
		}
	}
	return Clarify, false
}

// Verdict is one rule about one subject.
type Verdict struct {
	Rule    *Rule
	Subject *facts.Subject
	Outcome Outcome
	Reason  string // of an exemption: its key, see Rule.Reason
	Body    int    // number of the body that proved it; -1 if none did

	// Decisive are the comparisons of the body that proved the verdict. For Clarify they are those
	// of the bodies that lack a fact; if no body lacks one, the comparisons that would have to hold
	// for Complies and do not.
	Decisive []Comparison

	Fault      string      // of Unjudged: what went wrong, in a sentence
	FaultPlace place.Place // file and row of the rule
	FaultOther []place.Place
}
