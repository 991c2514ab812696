package rules

import (
	"fmt"
	"slices"
	"strings"

	"boardproof/checker/place"
)

// statement is what the engine says of one subject.
type statement struct {
	complies, departs bool
	reasons           []string
	fault             string
	row               int
}

func (p proof) tell(said []statement) {
	for _, n := range p.complies {
		said[n].complies = true
	}
	for _, n := range p.departs {
		said[n].departs = true
	}
	for _, e := range p.exempt {
		said[e.subject].reasons = append(said[e.subject].reasons, e.reason)
	}
}

func (r *Rule) verdict(s *seat, said statement, k known, truths []truth) Verdict {
	v := Verdict{Rule: r, Subject: s.subject, Body: -1}
	switch {
	case r.elsewhere(*s):
		v.Outcome, v.Reason = Exempt, OtherPractice
		return v
	case s.fault != "":
		return v.unjudged(s.fault, r.Place())
	case said.fault != "":
		at := r.Place()
		if said.row > 0 {
			at.Line = said.row
		}
		return v.unjudged(said.fault, at)
	}
	d := r.decide(k, truths)
	if fault := r.disagreement(said, d); fault != "" {
		return v.unjudged(fault, r.Place())
	}
	proven := r.holding(d)
	for _, n := range proven[min(1, len(proven)):] {
		first, b := r.bodies[proven[0]], r.bodies[n]
		if b.outcome != first.outcome || b.reason != first.reason {
			text := fmt.Sprintf("the rule proves %s (row %d) and %s (row %d) of one subject", first.name(), first.row, b.name(), b.row)
			return v.unjudged(text, r.BodyPlace(proven[0]), r.BodyPlace(n))
		}
	}
	if len(proven) == 0 {
		v.Decisive = r.open(d, k)
		return v
	}
	b := &r.bodies[proven[0]]
	v.Outcome, v.Reason, v.Body, v.Decisive = b.outcome, b.reason, proven[0], b.comparisons
	return v
}

func (v Verdict) unjudged(fault string, at place.Place, others ...place.Place) Verdict {
	v.Outcome, v.Fault, v.FaultPlace, v.FaultOther = Unjudged, fault, at, others
	return v
}

// name is "complies" or `exempt "no_live_work"`.
func (b *body) name() string {
	if b.outcome == Exempt {
		return `exempt "` + b.reason + `"`
	}
	return b.outcome.String()
}

// holding lists the bodies that hold.
func (r *Rule) holding(d decision) []int {
	var list []int
	for i, t := range d.truths {
		if t == holds {
			list = append(list, i)
		}
	}
	return list
}

// disagreement compares what the engine says with the plain comparisons; empty if they agree.
func (r *Rule) disagreement(said statement, d decision) string {
	var plain statement
	for i, t := range d.truths {
		if t != holds {
			continue
		}
		switch b := &r.bodies[i]; b.outcome {
		case Complies:
			plain.complies = true
		case Departs:
			plain.departs = true
		case Exempt:
			if !slices.Contains(plain.reasons, b.reason) {
				plain.reasons = append(plain.reasons, b.reason)
			}
		}
	}
	if said.complies == plain.complies && said.departs == plain.departs && sameWords(said.reasons, plain.reasons) {
		return ""
	}
	return "the engine proves " + said.text() + ", plain comparison of the same facts proves " + plain.text()
}

func sameWords(a, b []string) bool {
	if len(a) != len(b) {
		return false
	}
	for _, w := range a {
		if !slices.Contains(b, w) {
			return false
		}
	}
	return true
}

func (s statement) text() string {
	var parts []string
	if s.complies {
		parts = append(parts, "complies")
	}
	if s.departs {
		parts = append(parts, "departs")
	}
	for _, w := range slices.Sorted(slices.Values(s.reasons)) {
		parts = append(parts, `exempt "`+w+`"`)
	}
	if len(parts) == 0 {
		return "nothing"
	}
	return strings.Join(parts, " and ")
}
