package review

import (
	"context"
	"slices"
	"time"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
	"boardproof/checker/working"
)

// Review is one board, judged. The slices are sorted as they are to be read.
type Review struct {
	Board *spec.Board
	Facts *facts.Board
	Pack  *rules.Pack
	On    time.Time // the date the review speaks for; no clock is read

	Findings    []*Finding   // every requirement of every subject, in the order of lines and rules
	Departures  []*Departure // worst first
	Unjudged    []*Finding
	Queries     []*Query // most weighty first
	Lines       []LineCount
	Counts      Counts
	Assumptions []Assumption
	Quantities  []Quantity // the key figures
	Cautions    []string
	NotLookedAt []string
}

// Finding is the judgement of one requirement for one subject.
type Finding struct {
	Rule     *rules.Rule
	Subject  *facts.Subject
	Outcome  rules.Outcome
	Why      string // reason of an exemption, fault of an unjudged rule, or what the stage asks for
	Basis    working.Basis
	RestsOn  []*working.Working // the claims that Basis is the weakest of
	Compared []Compared         // the comparisons that decided, or that could not be made
	Place    place.Place        // where to look first
	State    string             // supply state that governs
	Lacks    working.Lacks
	Outside  []*working.Outside
}

// Counts are the numbers of requirements by outcome.
type Counts struct {
	Complies, Departs, Clarify, Exempt, Unjudged int
	ByBasis                                      map[working.Basis]int // of those that comply
}

// LineCount is one line of defence at a glance. Rules is zero when the library has
// no rule for it: then it was not looked at.
type LineCount struct {
	Name  string
	Rules int
	Counts
}

// defences is the number of lines of defence; what rules.Lines has beyond them, the
// evidence, is shown only where the library has rules for it.
const defences = 3

// Options are the circumstances of a review.
type Options struct {
	On    time.Time
	Cures bool // whether to look for cures; it costs an evaluation for each value tried
}

// Make judges boards with a pack and composes a review of each, in the order given.
func Make(ctx context.Context, pack *rules.Pack, boards []*spec.Board, opt Options) ([]*Review, error) {
	reviews := make([]*Review, len(boards))
	all := make([]*facts.Board, len(boards))
	for i, b := range boards {
		all[i] = facts.Of(b)
	}
	verdicts, err := pack.Judge(ctx, all...)
	if err != nil {
		return nil, err
	}
	for i, b := range boards {
		r := &Review{Board: b, Facts: all[i], Pack: pack, On: opt.On}
		r.Findings = findings(b, pack.Limits(), verdicts[i])
		r.compose()
		if opt.Cures {
			r.findCures(ctx)
		}
		reviews[i] = r
	}
	return reviews, nil
}

// compose fills everything that follows from the findings.
func (r *Review) compose() {
	r.count()
	r.Departures = departures(r.Findings)
	for _, f := range r.Findings {
		if f.Outcome == rules.Unjudged {
			r.Unjudged = append(r.Unjudged, f)
		}
	}
	r.Queries = queries(r.Board, r.Findings)
	r.Assumptions = assumptions(r.Facts)
	r.Quantities = keyQuantities(r.Facts)
	r.NotLookedAt = r.notLookedAt()
	r.Cautions = r.cautions()
}

func (r *Review) count() {
	for _, name := range rules.Lines {
		line := LineCount{Name: name}
		for _, rule := range r.Pack.Rules() {
			if rule.Line == name {
				line.Rules++
			}
		}
		for _, f := range r.Findings {
			if f.Rule.Line == name {
				line.add(f)
			}
		}
		if line.Rules > 0 || slices.Index(rules.Lines, name) < defences {
			r.Lines = append(r.Lines, line)
		}
	}
	for _, f := range r.Findings {
		r.Counts.add(f)
	}
}

func (c *Counts) add(f *Finding) {
	switch f.Outcome {
	case rules.Complies:
		c.Complies++
		if c.ByBasis == nil {
			c.ByBasis = map[working.Basis]int{}
		}
		c.ByBasis[f.Basis]++
	case rules.Departs:
		c.Departs++
	case rules.Exempt:
		c.Exempt++
	case rules.Unjudged:
		c.Unjudged++
	default:
		c.Clarify++
	}
}

// Shown is the number of requirements met by more than somebody's word.
func (c Counts) Shown() int {
	n := 0
	for basis, count := range c.ByBasis {
		if basis > working.Declared {
			n += count
		}
	}
	return n
}

// Bound is the weight from which on an open point counts: everything, or only
// requirements of a grade or above.
type Bound string

// AnyQuery counts every departure, everything that is not proven and every question.
const AnyQuery Bound = "query"

// Bounds lists the bounds, widest first.
func Bounds() []Bound {
	return []Bound{AnyQuery, rules.Observation, rules.Minor, rules.Major}
}

// Open counts what stands against the board at or above a bound. What is not proven
// counts like a departure of the same grade: a bound never turns a missing value
// into a pass. A rule that could not be used always counts.
func (r *Review) Open(bound Bound) int {
	n := 0
	for _, f := range r.Findings {
		open := f.Outcome == rules.Departs || f.Outcome == rules.Clarify
		if f.Outcome == rules.Unjudged || open && weight(f.Rule.Grade) >= weight(string(bound)) {
			n++
		}
	}
	if bound == AnyQuery {
		for _, q := range r.Queries {
			if len(q.Waiting) == 0 {
				n++
			}
		}
	}
	return n
}
