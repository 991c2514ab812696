package review

import (
	"cmp"
	"fmt"
	"slices"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
	"boardproof/checker/working"
)

// grades lists the grades, weightiest first.
var grades = []string{rules.Major, rules.Minor, rules.Observation}

func weight(grade string) int {
	if i := slices.Index(grades, grade); i >= 0 {
		return len(grades) - i
	}
	return 0
}

// findings turns verdicts into findings and applies what the stage of the board asks
// for: from "for construction" on, a major requirement that is met by declaration
// only is not met but asked.
func findings(board *spec.Board, limits []*facts.Fact, verdicts []rules.Verdict) []*Finding {
	list := make([]*Finding, 0, len(verdicts))
	for _, v := range verdicts {
		f := &Finding{Rule: v.Rule, Subject: v.Subject, Outcome: v.Outcome}
		for _, c := range v.Decisive {
			f.Compared = append(f.Compared, compare(v.Subject, limits, c))
		}
		switch v.Outcome {
		case rules.Unjudged:
			f.Why, f.Place = v.Fault, v.FaultPlace
		case rules.Exempt:
			f.Why = v.Rule.Reason(v.Reason)
		}
		f.inspect()
		if f.Outcome == rules.Complies && f.Rule.Grade == rules.Major && f.Basis == working.Declared && mustBeShown(board) {
			f.Outcome = rules.Clarify
			f.Why = "met by declaration only; at this stage a major requirement has to be shown"
			f.Lacks = evidenceLack(board, f)
		}
		list = append(list, f)
	}
	slices.SortStableFunc(list, func(a, b *Finding) int {
		return cmp.Or(
			cmp.Compare(slices.Index(rules.Lines, a.Rule.Line), slices.Index(rules.Lines, b.Rule.Line)),
			cmp.Compare(a.Rule.ID, b.Rule.ID))
	})
	return list
}

// mustBeShown reports whether the board's stage no longer accepts declarations. A board
// whose stage nobody stated may be one that is built already.
func mustBeShown(board *spec.Board) bool {
	return !board.Stage.Said() || board.Stage.Value.Rank() >= spec.StageForConstruction.Rank()
}

func evidenceLack(board *spec.Board, f *Finding) working.Lacks {
	what := "evidence for " + f.Subject.ID
	if f.Rule.Proof != "" {
		what += ", verification " + f.Rule.Proof
	}
	evidence := working.Lack{
		Path: "evidence", What: what, Place: f.Place,
		Unit:    "a test report, or a comparison with a tested design, that names this circuit and these values",
		Because: "declared, not shown",
	}
	if board.Stage.Said() {
		return working.Lacks{evidence}
	}
	stage := working.Lack{Path: board.Stage.Path, What: facts.Name(board.Stage.At), Unit: facts.Example(board.Stage.At), Place: board.Stage.Place}
	return working.Lacks{{What: stage.What + ", or " + what, OneOf: []working.Lack{stage, evidence}, Place: stage.Place}}
}

// inspect derives basis, place, governing state and what is missing from the
// comparisons.
func (f *Finding) inspect() {
	f.Basis = working.NoBasis
	for _, c := range f.Compared {
		for _, side := range []Side{c.Found, c.Required} {
			if side.Fact == nil {
				continue
			}
			f.take(side.Fact)
		}
	}
	if c, ok := f.Decisive(); ok && f.Place.IsZero() {
		f.Place = c.Found.Place
		if c.Required.Fact != nil && c.Required.Fact.How != nil {
			f.State = c.Required.Fact.How.Case
		}
	}
	if f.Place.IsZero() {
		f.Place = f.Subject.Place
	}
	if f.Outcome != rules.Clarify {
		f.Lacks, f.Outside = nil, nil
	}
}

// Decisive is the comparison that a finding is about: the one that fails by most. A
// word that has to be a word is a condition of the rule, not what it measures, and
// decides only if there is nothing else.
func (f *Finding) Decisive() (Compared, bool) {
	var worst Compared
	found := false
	for _, c := range f.Compared {
		if !found || worst.Equality && !c.Equality || worst.Equality == c.Equality && c.Relative < worst.Relative {
			worst, found = c, true
		}
	}
	return worst, found
}

// take adds one fact's claims, lacks and limits to the finding.
func (f *Finding) take(fact *facts.Fact) {
	if !fact.Known {
		f.Lacks = f.Lacks.Union(fact.Lacks)
		if fact.Outside != nil {
			f.Outside = append(f.Outside, fact.Outside)
		}
		return
	}
	if basis := fact.How.Basis(); basis != working.NoBasis {
		if f.Basis == working.NoBasis || basis < f.Basis {
			f.Basis = basis
		}
		fact.How.Walk(func(w *working.Working) {
			if w.Leaf != nil && w.Leaf.Claim && !slices.ContainsFunc(f.RestsOn, func(have *working.Working) bool { return have.Leaf.Path == w.Leaf.Path }) {
				f.RestsOn = append(f.RestsOn, w)
			}
		})
	}
}

// placeOf is the line that states a fact: the first leaf below it, a claim if there
// is one; for an unknown fact the place where the missing value belongs.
func placeOf(fact *facts.Fact) place.Place {
	if !fact.Known {
		for _, lack := range fact.Lacks {
			if !lack.Place.IsZero() {
				return lack.Place
			}
		}
		return place.Place{}
	}
	var first, claim place.Place
	fact.How.Walk(func(w *working.Working) {
		if w.Leaf == nil {
			return
		}
		if first.IsZero() {
			first = w.Leaf.Place
		}
		if claim.IsZero() && w.Leaf.Claim {
			claim = w.Leaf.Place
		}
	})
	if claim.IsZero() {
		return first
	}
	return claim
}

// Weakest names the claim on which a compliance rests most weakly, and how many more
// are as weak.
func (f *Finding) Weakest() string {
	name, more := "", 0
	for _, w := range f.RestsOn {
		if w.Leaf.Basis > f.Basis {
			continue
		}
		if name == "" {
			name = w.Leaf.Title
		} else {
			more++
		}
	}
	if more > 0 {
		name += fmt.Sprintf(" and %d more", more)
	}
	return name
}
