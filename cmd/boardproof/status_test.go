package main

import (
	"errors"
	"testing"

	"boardproof/checker/review"
	"boardproof/checker/rules"
)

// TestBoundsNeverAcquit: what is not proven counts like a departure of its grade,
// whatever the bound; a rule that could not be used makes the status 2.
func TestBoundsNeverAcquit(t *testing.T) {
	t.Parallel()
	const notCounted, open, unusable = statusNothingOpen, statusOpen, statusUnusable
	for _, c := range []struct {
		name    string
		grade   string
		outcome rules.Outcome
		bound   review.Bound
		want    int
	}{
		{"a major requirement is not proven, bound major", rules.Major, rules.Clarify, rules.Major, open},
		{"a major requirement is not proven, bound minor", rules.Major, rules.Clarify, rules.Minor, open},
		{"a major requirement is not proven, bound observation", rules.Major, rules.Clarify, rules.Observation, open},
		{"a major requirement is not proven, bound query", rules.Major, rules.Clarify, review.AnyQuery, open},
		{"a major requirement departs, bound major", rules.Major, rules.Departs, rules.Major, open},
		{"a minor requirement departs, bound major", rules.Minor, rules.Departs, rules.Major, notCounted},
		{"a minor requirement departs, bound minor", rules.Minor, rules.Departs, rules.Minor, open},
		{"a minor requirement is not proven, bound minor", rules.Minor, rules.Clarify, rules.Minor, open},
		{"a minor requirement is not proven, bound major", rules.Minor, rules.Clarify, rules.Major, notCounted},
		{"an observation departs, bound minor", rules.Observation, rules.Departs, rules.Minor, notCounted},
		{"an observation departs, bound observation", rules.Observation, rules.Departs, rules.Observation, open},
		{"an observation is not proven, bound query", rules.Observation, rules.Clarify, review.AnyQuery, open},
		{"a requirement of no known grade departs, bound query", "", rules.Departs, review.AnyQuery, open},
		{"complies", rules.Major, rules.Complies, review.AnyQuery, notCounted},
		{"exempt", rules.Major, rules.Exempt, review.AnyQuery, notCounted},
		{"an observation could not be judged, bound major", rules.Observation, rules.Unjudged, rules.Major, unusable},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			f := &review.Finding{Rule: &rules.Rule{Grade: c.grade}, Outcome: c.outcome}
			r := &review.Review{Findings: []*review.Finding{f}}
			if c.outcome == rules.Unjudged {
				r.Unjudged = r.Findings
			}
			nothing := &review.Review{}
			if got := statusOf(conclude([]*review.Review{nothing, r}, c.bound)); got != c.want {
				t.Errorf("exit status %d, expected %d", got, c.want)
			}
		})
	}
}

// statusOf is the status that run would give an error of a command.
func statusOf(err error) int {
	var open *openError
	switch {
	case err == nil:
		return statusNothingOpen
	case errors.As(err, &open):
		return statusOpen
	}
	return statusUnusable
}

func TestColour(t *testing.T) {
	type environment map[string]string
	for _, c := range []struct {
		name       string
		flag       string
		env        environment
		isTerminal bool
		want       bool
	}{
		{"a terminal", "auto", nil, true, true},
		{"no terminal", "auto", nil, false, false},
		{"always, no terminal", "always", nil, false, true},
		{"always beats NO_COLOR", "always", environment{"NO_COLOR": "1"}, false, true},
		{"never beats CLICOLOR_FORCE", "never", environment{"CLICOLOR_FORCE": "1"}, true, false},
		{"NO_COLOR", "auto", environment{"NO_COLOR": "1"}, true, false},
		{"NO_COLOR beats CLICOLOR_FORCE", "auto", environment{"NO_COLOR": "1", "CLICOLOR_FORCE": "1"}, true, false},
		{"CLICOLOR_FORCE into a pipe", "auto", environment{"CLICOLOR_FORCE": "1"}, false, true},
		{"CLICOLOR_FORCE of nought is none", "auto", environment{"CLICOLOR_FORCE": "0"}, false, false},
		{"CLICOLOR_FORCE beats a dumb terminal", "auto", environment{"CLICOLOR_FORCE": "1", "TERM": "dumb"}, true, true},
		{"CLICOLOR of nought", "auto", environment{"CLICOLOR": "0"}, true, false},
		{"a dumb terminal", "auto", environment{"TERM": "dumb"}, true, false},
	} {
		t.Run(c.name, func(t *testing.T) {
			for _, name := range []string{"NO_COLOR", "CLICOLOR_FORCE", "CLICOLOR"} {
				t.Setenv(name, c.env[name])
			}
			t.Setenv("TERM", "xterm")
			if term := c.env["TERM"]; term != "" {
				t.Setenv("TERM", term)
			}
			if got := colour(c.flag, c.isTerminal); got != c.want {
				t.Errorf("colour %v, expected %v", got, c.want)
			}
		})
	}
}
