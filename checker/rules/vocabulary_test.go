package rules

import (
	"testing"
	"testing/fstest"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/units"
)

var contactWords = []string{"not protected", "IPXXA", "IPXXB", "IPXXC", "IPXXD"}

func dimension(t testing.TB, name string) *units.Dimension {
	t.Helper()
	d, ok := units.DimensionNamed(name)
	if !ok {
		t.Fatalf("no quantity %s", name)
	}
	return d
}

// testVocabulary has the terms that the rule library reads, and a few more for refusals.
func testVocabulary(t testing.TB) *facts.Vocabulary {
	t.Helper()
	num := func(kind facts.Kind, id, quantity string, claim bool) *facts.Term {
		return &facts.Term{Kind: kind, ID: id, Label: id, Value: facts.Number, Dimension: dimension(t, quantity), Claim: claim}
	}
	v, err := facts.NewVocabulary(
		num(facts.Busbars, "withstand.current", "current", true),
		num(facts.Busbars, "withstand.duration", "time", true),
		num(facts.Busbars, "withstand.joule_integral", "joule_integral", true),
		num(facts.Busbars, "withstand.peak", "current", true),
		num(facts.Busbars, "withstand.peak_of_ratio", "current", false),
		num(facts.Busbars, "fault.joule_integral.at_least", "joule_integral", false),
		num(facts.Busbars, "fault.joule_integral.at_most", "joule_integral", false),
		num(facts.Busbars, "fault.peak.at_least", "current", false),
		num(facts.Busbars, "fault.peak.at_most", "current", false),
		&facts.Term{Kind: facts.Busbars, ID: "covering", Label: "covering", Value: facts.Ordered, ListID: "covering", Words: []string{"bare", "sleeved", "insulated"}, Claim: true},
		&facts.Term{Kind: facts.Busbars, ID: "weakest.at_least", Label: "weakest covering", Value: facts.Ordered, ListID: "covering", Words: []string{"bare", "sleeved", "insulated"}, Claim: true},
		&facts.Term{Kind: facts.Busbars, ID: "joints", Label: "joints", Value: facts.Word, ListID: "joints", Words: []string{"bare", "covered"}, Claim: true},
		&facts.Term{Kind: facts.Busbars, ID: "shape", Label: "shape", Value: facts.Word, ListID: "shape", Words: []string{"flat", "round"}, Claim: true},
		num(facts.Boards, "insulation.rated_voltage", "voltage", true),
		num(facts.Boards, "insulation.voltage_required.at_least", "voltage", false),
		num(facts.Boards, "insulation.voltage_required.at_most", "voltage", false),
		&facts.Term{Kind: facts.Boards, ID: "door_open.contact_protection", Label: "contact protection", Value: facts.Ordered, ListID: "contact_protection", Words: contactWords, Claim: true},
		&facts.Term{Kind: facts.Boards, ID: "work.under_voltage", Label: "work under voltage", Value: facts.Word, ListID: "work.under_voltage", Words: []string{"yes", "no"}},
		&facts.Term{Kind: facts.Boards, ID: "practice", Label: "practice", Value: facts.Word, ListID: "practice", Words: []string{IEC, NorthAmerican}},
	)
	if err != nil {
		t.Fatal(err)
	}
	return v
}

// testLimits are limits for refusals and limits that cannot be met.
const testLimits = `- {id: peak, label: peak, quantity: current, default: 100 kA, stricter: higher, clause: invented}
- {id: energy, label: ceiling, quantity: current, default: 10 kA, stricter: lower, clause: invented}
- {id: covering, label: covering, list: covering, default: sleeved, stricter: higher, clause: invented}
- {id: method, label: method, words: [box, open], default: box, clause: invented}
`

const testSeries = `rated_peak: {of: current, steps: [52.5 kA, 105 kA], source: invented}
covering: {of: covering, source: invented}
`

// header is the metadata of a rule XY-01 with what is given under custom.
func header(custom string) string {
	return `# METADATA
# title: An invented rule
# description: for tests
# custom:
#   rule: XY-01
#   line: limitation
#   grade: major
#   references: [common practice]
` + custom + `package boardproof.limitation.xy01

`
}

const (
	goodBody = `complies contains s.id if {
	some s in input.busbars
	s.withstand.peak >= s.fault.peak.at_most
}
`
	headerRows = 10 // rows before the first body with an empty custom
)

func packOf(rule string) fstest.MapFS {
	return fstest.MapFS{
		"xy01.rego":   {Data: []byte(rule)},
		"limits.yaml": {Data: []byte(testLimits)},
		"series.yaml": {Data: []byte(testSeries)},
	}
}

func mustLoad(t testing.TB, fsys fstest.MapFS, opt Options) *Pack {
	t.Helper()
	p, problems := Load(fsys, testVocabulary(t), opt)
	if p == nil {
		t.Fatalf("not loaded: %v", texts(problems))
	}
	return p
}

func texts(problems *place.Problems) []string {
	var list []string
	for _, p := range problems.All() {
		list = append(list, p.Place.String()+": "+p.Sentence())
	}
	return list
}

// subjectOf sets facts by term, as people write them; "" leaves a fact unknown.
func subjectOf(t testing.TB, v *facts.Vocabulary, kind facts.Kind, id string, values map[string]string) *facts.Subject {
	t.Helper()
	s := facts.NewSubject(kind, id, place.Place{File: "board.yaml", Line: 1})
	for name, text := range values {
		term, ok := v.Lookup(kind, name)
		if !ok {
			t.Fatalf("no term %s", name)
		}
		if text == "" {
			s.Set(&facts.Fact{Term: term})
			continue
		}
		f, said := parseFact(term, text)
		if said != nil {
			t.Fatalf("%s: %s", name, said.Sentence())
		}
		s.Set(f)
	}
	return s
}

func bars(t testing.TB, id string, values map[string]string) *facts.Subject {
	t.Helper()
	return subjectOf(t, testVocabulary(t), facts.Busbars, id, values)
}

func board(id string, subjects ...*facts.Subject) *facts.Board {
	return &facts.Board{ID: id, Subjects: subjects}
}
