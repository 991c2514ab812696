package rules

import (
	"context"
	"slices"
	"strings"
	"testing"
	"testing/fstest"

	"boardproof/checker/place"
)

const goodCases = `- name: stronger
  facts: {withstand.peak: 2 kA, fault.peak.at_most: 1 kA}
  expect: complies
- name: equal
  facts: {withstand.peak: 1 kA, fault.peak.at_most: 1 kA}
  expect: complies
`

func TestCasesThatFail(t *testing.T) {
	t.Parallel()
	unequal := strings.Replace(goodCases, "{withstand.peak: 1 kA", "{withstand.peak: 3 kA", 1)
	for _, c := range []struct {
		name, cases string
		want        []string
	}{
		{"good", goodCases, nil},
		{"none", "", []string{"xy01_cases.yaml: found no cases for XY-01, expected a file xy01_cases.yaml beside the rule"}},
		{"other verdict", goodCases + "- name: weaker\n  facts: {withstand.peak: 1 kA, fault.peak.at_most: 2 kA}\n  expect: departs\n", []string{
			`xy01_cases.yaml:7: found clarify in the case "weaker", expected departs`}},
		{"never at the limit", unequal, []string{
			"xy01_cases.yaml: found no case where both sides are equal, expected a case at the limit itself"}},
		{"never complies", "- name: weaker\n  facts: {withstand.peak: 1 kA, fault.peak.at_most: 2 kA}\n  expect: clarify\n", []string{
			"xy01_cases.yaml: found no case that ends in complies, expected a case for each verdict that XY-01 can reach",
			"xy01_cases.yaml: found no case where both sides are equal, expected a case at the limit itself"}},
		{"unread fact", strings.Replace(goodCases, "fault.peak.at_most: 1 kA}\n  expect: complies\n- name: eq", "fault.peak.at_most: 1 kA, joints: bare}\n  expect: complies\n- name: eq", 1), []string{
			`xy01_cases.yaml:2:59: found "joints", which the rule does not read, expected one of withstand.peak, fault.peak.at_most`}},
		{"no unit", strings.Replace(goodCases, "2 kA", "2", 1), []string{
			`xy01_cases.yaml:2:27: found "2", expected a current with its unit; write "2 kA" or "2 A"`}},
		{"unknown word", strings.Replace(goodCases, "expect: complies", "expect: passes", 1), []string{
			`xy01_cases.yaml:3:11: found "passes", expected one of clarify, complies, departs, exempt, unjudged`}},
		{"unknown limit", strings.Replace(goodCases, "  expect", "  limits: {peek: 1 kA}\n  expect", 1), []string{
			`xy01_cases.yaml:1: found "peek", which is no limit, expected one of covering, energy, method, peak; write peak`}},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			pack := packOf(header("") + goodBody)
			if c.cases != "" {
				pack["xy01_cases.yaml"] = &fstest.MapFile{Data: []byte(c.cases)}
			}
			compared, problems := CheckCases(context.Background(), pack, mustLoad(t, pack, Options{}))
			if got := texts(problems); !slices.Equal(got, c.want) {
				t.Errorf("got\n%q\nwant\n%q", got, c.want)
			}
			if c.want == nil && compared != 6 {
				t.Errorf("%d verdicts compared, want 2 cases and 4 without one fact", compared)
			}
		})
	}
}

// TestCasesNoticeASilentPass runs cases against a rule that also passes a subject of which less is
// known; the plain comparison is made to agree with it.
func TestCasesNoticeASilentPass(t *testing.T) {
	t.Parallel()
	pack := packOf(header("") + goodBody)
	pack["xy01_cases.yaml"] = &fstest.MapFile{Data: []byte(goodCases)}
	p := mustLoad(t, pack, Options{})
	e := rawEngine("package boardproof.limitation.xy01\n\ncomplies contains s.id if some s in input.busbars\n", nil)
	silent := *p.rules[0]
	silent.engine = e
	silent.bodies = []body{{outcome: Complies, comparisons: nil}}
	p.rules[0] = &silent
	p.engines = append(p.engines, e)
	_, problems := CheckCases(context.Background(), pack, p)
	want := "xy01_cases.yaml: found no case that ends in clarify, expected a case for each verdict that XY-01 can reach"
	if got := texts(problems); !slices.Contains(got, want) {
		t.Errorf("got %q", got)
	}
	weaker := "- name: weaker\n  facts: {withstand.peak: 1 kA, fault.peak.at_most: 2 kA}\n  expect: clarify\n"
	pack["xy01_cases.yaml"].Data = []byte(goodCases + weaker)
	_, problems = CheckCases(context.Background(), pack, p)
	want = `xy01_cases.yaml:7: found complies in the case "weaker", expected clarify`
	if got := texts(problems); !slices.Contains(got, want) {
		t.Errorf("got %q", got)
	}
}

// TestLackingFact reports a verdict that stands although a fact it was proven with is gone, and one
// that comes about by taking a fact away.
func TestLackingFact(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	r := p.rules[0]
	e := example{name: "a"}
	e.facts = bars(t, "A", goodBars).Facts()
	for _, c := range []struct {
		whole, less Verdict
		want        []string
	}{
		{Verdict{Outcome: Complies}, Verdict{Outcome: Clarify}, nil},
		{Verdict{Outcome: Departs}, Verdict{Outcome: Complies}, []string{`-: found complies in the case "a" without fault.peak.at_most, expected nothing that was not proven before`}},
		{Verdict{Outcome: Complies}, Verdict{Outcome: Complies, Decisive: r.Comparisons}, []string{`-: found complies in the case "a" without fault.peak.at_most, which it was proven with, expected clarify`}},
		{Verdict{Outcome: Exempt, Reason: "x"}, Verdict{Outcome: Exempt, Reason: "y"}, []string{`-: found exempt (y) in the case "a" without fault.peak.at_most, expected nothing that was not proven before`}},
	} {
		trial := &trial{pack: p, rule: r, problems: new(place.Problems), reached: map[Outcome]bool{}}
		trial.lacking(e, c.whole, c.less, e.facts[0])
		if got := texts(trial.problems); !slices.Equal(got, c.want) {
			t.Errorf("got %q, want %q", got, c.want)
		}
	}
}
