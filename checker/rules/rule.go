package rules

import (
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// Grades of a rule: what a departure from it means.
const (
	Major       = "major"       // the board must not be accepted as it is
	Minor       = "minor"       // to be put right, no bar to acceptance
	Observation = "observation" // worth knowing
)

// Practices a rule can belong to, and that the word of the term "practice" can name.
const (
	BothPractices = "both"
	IEC           = "IEC"
	NorthAmerican = "North American"
)

// OtherPractice is the built-in reason of an exemption: the rule belongs to the other practice.
const OtherPractice = "other_practice"

// practiceTerm is the word of a subject, or else of its board, that says which practice it follows.
const practiceTerm = "practice"

// Lines of defence, in the order in which rules are listed.
var Lines = []string{"prevention", "limitation", "regulation", "evidence"}

// Reference says what a rule rests on: a clause of a standard, or the practice of the trade.
type Reference struct {
	Standard string `json:"standard,omitempty"` // "IEC 61439-1"
	Edition  string `json:"edition,omitempty"`  // "2020"
	Clause   string `json:"clause,omitempty"`   // "5.3.5", "Table 7"
	Status   string `json:"status,omitempty"`   // how well it was confirmed: "from memory, unconfirmed"; empty if it was
	Practice bool   `json:"practice,omitempty"` // common practice, no source
}

// String is "IEC 61439-1:2020 5.3.5" or "common practice".
func (r Reference) String() string {
	if r.Practice {
		return "common practice"
	}
	text := r.Standard + ":" + r.Edition + " " + r.Clause
	if r.Status != "" {
		text += " (" + r.Status + ")"
	}
	return text
}

// Directions of a lever.
const (
	Raise = "raise"
	Lower = "lower"
)

// CureLever is a value that could be changed to clear a departure, which way, and in which steps.
type CureLever struct {
	Term      *facts.Term // of the rule's kind
	Direction string      // Raise or Lower
	Series    *Series     // nil: any value
}

// Rule is one requirement.
type Rule struct {
	ID          string // "WTH-01"
	Line        string // one of Lines
	Grade       string // Major, Minor or Observation
	Practice    string // BothPractices, IEC or NorthAmerican
	Title       string // up to 60 letters, no period
	Description string // why, for a tenderer
	References  []Reference
	Kind        facts.Kind // of the subjects it speaks about; derived from the bodies
	Cure        []CureLever
	Reasons     map[string]string // sentence of each named reason of its exemptions
	Proof       string            // clause of the design verification that would show it: "10.11"; may be empty

	Package string // "boardproof.limitation.wth01"
	File    string // slash path, as places show it
	Row     int    // of the package clause
	SHA256  string // of the file, in hex

	Needs       []*facts.Term // all terms the bodies read, limits included, each once, in order of reading
	Comparisons []Comparison  // of all bodies, in order of the file

	bodies []body
	engine *engine
}

// Place is where the rule begins.
func (r *Rule) Place() place.Place { return place.Place{File: r.File, Line: r.Row} }

// Reason is the sentence for a reason key of an exempt verdict; the key itself if it has none.
func (r *Rule) Reason(key string) string {
	if key == OtherPractice {
		return "belongs to " + r.Practice + " practice, which this board does not follow"
	}
	if text, ok := r.Reasons[key]; ok {
		return text
	}
	return key
}

// Proves lists the outcomes that the bodies of the rule can reach, in the order complies, departs,
// exempt. What it does not prove is Clarify.
func (r *Rule) Proves() []Outcome {
	var list []Outcome
	for _, o := range []Outcome{Complies, Departs, Exempt} {
		for _, b := range r.bodies {
			if b.outcome == o {
				list = append(list, o)
				break
			}
		}
	}
	return list
}

// Bodies is the number of bodies, numbered in order of the file.
func (r *Rule) Bodies() int { return len(r.bodies) }

// BodyPlace is where a body begins; the rule's own place for -1.
func (r *Rule) BodyPlace(number int) place.Place {
	if number < 0 || number >= len(r.bodies) {
		return r.Place()
	}
	return place.Place{File: r.File, Line: r.bodies[number].row}
}

// body is one way to prove one outcome: all its comparisons hold.
type body struct {
	outcome     Outcome
	reason      string // of an exemption
	row         int
	comparisons []Comparison
}

// Operand is one side of a comparison: a term, or words.
type Operand struct {
	Term  *facts.Term // nil for words
	Rank  bool        // the rank of an ordered word, not the word
	Word  string      // a literal word
	Words []string    // the literal set of "in"; Word is empty then

	slot int // where the term's fact stands among those of the kind
}

// Text is the operand as a rule writes it, for lists and messages.
func (o Operand) Text() string {
	switch {
	case o.Term == nil && o.Words != nil:
		return `{"` + strings.Join(o.Words, `", "`) + `"}`
	case o.Term == nil:
		return `"` + o.Word + `"`
	}
	name := "s." + o.Term.ID
	if o.Term.Kind == facts.Limits {
		name = "input.limits." + o.Term.ID
	}
	switch {
	case o.Rank:
		name += ".rank"
	case o.Term.Value == facts.Ordered:
		name += ".word"
	}
	return name
}

// isLimit tells whether the operand is something asked for by definition: a limit or a literal.
func (o Operand) isLimit() bool { return o.Term == nil || o.Term.Kind == facts.Limits }

// Comparison is one line of a body.
type Comparison struct {
	Set         Outcome // what its body proves
	Body        int     // number of the body in the rule, from 0
	Operator    string  // ">=", ">", "<=", "<", "==" or "in"
	Left, Right Operand
	Row         int
}

// Sides says which operand is observed, something found at the assembly, and which is what it has to
// meet. The side that is a claim is observed; limits and literals never are; if both sides or neither
// could be, the left one is.
func (c Comparison) Sides() (observed, required Operand) {
	if c.Right.isLimit() {
		return c.Left, c.Right
	}
	if c.Left.isLimit() || (c.Right.Term.Claim && !c.Left.Term.Claim) {
		return c.Right, c.Left
	}
	return c.Left, c.Right
}

// Terms are the terms it reads, the left one first.
func (c Comparison) Terms() []*facts.Term {
	var list []*facts.Term
	for _, o := range []Operand{c.Left, c.Right} {
		if o.Term != nil {
			list = append(list, o.Term)
		}
	}
	return list
}

// String is the line as written: "s.withstand.peak >= s.fault.peak.at_most".
func (c Comparison) String() string {
	return c.Left.Text() + " " + c.Operator + " " + c.Right.Text()
}
