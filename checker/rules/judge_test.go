package rules

import (
	"context"
	"fmt"
	"math"
	"slices"
	"strings"
	"testing"
	"testing/fstest"

	"pgregory.net/rapid"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// clone is a rule file under another name.
func clone(text, id, short string) *fstest.MapFile {
	return &fstest.MapFile{Data: []byte(strings.NewReplacer("XY-01", id, "xy01", short).Replace(text))}
}

func judgeOne(t *testing.T, p *Pack, b *facts.Board) []Verdict {
	t.Helper()
	got, err := p.Judge(context.Background(), b)
	if err != nil {
		t.Fatal(err)
	}
	return got[0]
}

func lines(list []Comparison) []string {
	var out []string
	for _, c := range list {
		out = append(out, c.String())
	}
	return out
}

func TestVerdictsOfTheLibrary(t *testing.T) {
	t.Parallel()
	p := ownPack(t, Options{})
	for _, c := range []struct {
		name, rule string
		subject    *facts.Subject
		want       Outcome
		body       int
		decisive   []string
	}{
		{"complies", "WTH-02", bars(t, "A", goodBars), Complies, 0, []string{"s.withstand.peak >= s.fault.peak.at_most"}},
		{"departs", "WTH-02", bars(t, "A", map[string]string{"withstand.peak": "143 kA", "fault.peak.at_least": "177 kA"}), Departs, 1, []string{"s.withstand.peak < s.fault.peak.at_least"}},
		{"nothing said", "WTH-02", bars(t, "A", nil), Clarify, -1, []string{"s.withstand.peak >= s.fault.peak.at_most", "s.withstand.peak < s.fault.peak.at_least"}},
		{"facts without value", "WTH-02", bars(t, "A", map[string]string{"withstand.peak": "", "fault.peak.at_most": "1 kA"}), Clarify, -1, []string{"s.withstand.peak >= s.fault.peak.at_most", "s.withstand.peak < s.fault.peak.at_least"}},
		{"only what lacks", "WTH-02", bars(t, "A", map[string]string{"withstand.peak": "143 kA", "fault.peak.at_least": "100 kA"}), Clarify, -1, []string{"s.withstand.peak >= s.fault.peak.at_most"}},
		{"between the bounds", "WTH-02", bars(t, "A", map[string]string{"withstand.peak": "143 kA", "fault.peak.at_least": "140 kA", "fault.peak.at_most": "150 kA"}), Clarify, -1, []string{"s.withstand.peak >= s.fault.peak.at_most"}},
		{"peak not covered", "WTH-01", bars(t, "A", map[string]string{
			"withstand.joule_integral": "4 GA2s", "fault.joule_integral.at_least": "3 GA2s", "fault.joule_integral.at_most": "3 GA2s",
			"withstand.peak": "143 kA", "fault.peak.at_most": "194 kA",
		}), Clarify, -1, []string{"s.withstand.peak >= s.fault.peak.at_most"}},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			for _, v := range judgeOne(t, p, board("b", c.subject)) {
				if v.Rule.ID != c.rule {
					continue
				}
				if v.Outcome != c.want || v.Body != c.body || !slices.Equal(lines(v.Decisive), c.decisive) || v.Subject != c.subject {
					t.Errorf("got %s, body %d, %q, fault %q", v.Outcome, v.Body, lines(v.Decisive), v.Fault)
				}
			}
		})
	}
}

func TestPractice(t *testing.T) {
	t.Parallel()
	for _, c := range []struct {
		rule, board string
		want        Outcome
	}{
		{"", NorthAmerican, Complies}, {IEC, "", Complies}, {IEC, IEC, Complies}, {IEC, NorthAmerican, Exempt}, {NorthAmerican, IEC, Exempt}, {NorthAmerican, NorthAmerican, Complies},
	} {
		custom := ""
		if c.rule != "" {
			custom = "#   practice: " + c.rule + "\n"
		}
		p := mustLoad(t, packOf(header(custom)+goodBody), Options{})
		subjects := []*facts.Subject{bars(t, "A", goodBars)}
		if c.board != "" {
			subjects = append(subjects, subjectOf(t, testVocabulary(t), facts.Boards, "b", map[string]string{"practice": c.board}))
		}
		v := judgeOne(t, p, board("b", subjects...))[0]
		if v.Outcome != c.want || (v.Outcome == Exempt) != (v.Reason == OtherPractice) {
			t.Errorf("rule %q, board %q: %s %s", c.rule, c.board, v.Outcome, v.Reason)
		}
	}
}

func TestOverlapIsUnjudged(t *testing.T) {
	t.Parallel()
	text := header("#   reasons: {bare: a sentence, flat: a sentence}\n") + goodBody + `
departs contains s.id if {
	some s in input.busbars
	s.shape == "round"
}

exempt contains [s.id, "bare"] if {
	some s in input.busbars
	s.joints == "bare"
}

exempt contains [s.id, "flat"] if {
	some s in input.busbars
	s.shape == "flat"
}
`
	p := mustLoad(t, packOf(text), Options{})
	with := func(more ...string) *facts.Subject {
		values := map[string]string{}
		for i := 0; i < len(more); i += 2 {
			values[more[i]] = more[i+1]
		}
		return bars(t, "A", values)
	}
	for _, c := range []struct {
		subject *facts.Subject
		want    string
	}{
		{with("withstand.peak", "2 kA", "fault.peak.at_most", "1 kA", "shape", "round"), "the rule proves complies (row 12) and departs (row 17) of one subject xy01.rego:12 [xy01.rego:17]"},
		{with("withstand.peak", "2 kA", "fault.peak.at_most", "1 kA", "joints", "bare"), `the rule proves complies (row 12) and exempt "bare" (row 22) of one subject xy01.rego:12 [xy01.rego:22]`},
		{with("shape", "flat", "joints", "bare"), `the rule proves exempt "bare" (row 22) and exempt "flat" (row 27) of one subject xy01.rego:22 [xy01.rego:27]`},
	} {
		v := judgeOne(t, p, board("b", c.subject, bars(t, "B", goodBars)))
		if got := fmt.Sprint(v[0].Fault, " ", v[0].FaultPlace, " ", v[0].FaultOther); v[0].Outcome != Unjudged || got != c.want {
			t.Errorf("got %s %s", v[0].Outcome, got)
		}
		if v[1].Outcome != Complies {
			t.Errorf("the other subject: %s", v[1].Outcome)
		}
	}
}

// TestTwoBodiesOfOneSetAreNoOverlap: either way of proof will do; the first that holds is shown.
func TestTwoBodiesOfOneSetAreNoOverlap(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(inFile(goodBody+"\ncomplies contains s.id if {\n\tsome s in input.busbars\n\ts.joints == \"covered\"\n}\n")), Options{})
	both := map[string]string{"withstand.peak": "2 kA", "fault.peak.at_most": "1 kA", "joints": "covered"}
	for body, values := range []map[string]string{both, {"joints": "covered"}} {
		if v := judgeOne(t, p, board("b", bars(t, "A", values)))[0]; v.Outcome != Complies || v.Body != body {
			t.Errorf("got %s by body %d, want body %d", v.Outcome, v.Body, body)
		}
	}
}

// TestDisagreementIsUnjudged lets the engine say what the comparisons do not bear out.
func TestDisagreementIsUnjudged(t *testing.T) {
	t.Parallel()
	for name, c := range map[string]struct{ module, want string }{
		"a silent pass":  {"complies contains s.id if some s in input.busbars\n", "the engine proves complies, plain comparison of the same facts proves nothing"},
		"nothing proven": {"x := 1\n", "the engine proves nothing, plain comparison of the same facts proves complies"},
		"other set":      {"departs contains s.id if some s in input.busbars\n", "the engine proves departs, plain comparison of the same facts proves complies"},
	} {
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			module := strings.Replace(c.module, "x := 1", "complies contains s.id if {\n\tsome s in input.busbars\n\ts.id == \"x\"\n}", 1)
			p := twoRules(t, module, Options{})
			values := goodBars
			if name == "a silent pass" {
				values = nil
			}
			v := judgeOne(t, p, board("b", bars(t, "A", values)))
			if v[0].Outcome != Unjudged || v[0].Fault != c.want || v[0].FaultPlace.String() != "xy01.rego:9" {
				t.Errorf("got %s %q %s", v[0].Outcome, v[0].Fault, v[0].FaultPlace)
			}
			if v[1].Outcome == Unjudged {
				t.Errorf("the other rule: %s", v[1].Fault)
			}
		})
	}
}

func TestFactsThatCannotBeAreUnjudged(t *testing.T) {
	t.Parallel()
	v := testVocabulary(t)
	term := func(id string) *facts.Term {
		found, ok := v.Lookup(facts.Busbars, id)
		if !ok {
			t.Fatal(id)
		}
		return found
	}
	p := mustLoad(t, packOf(inFile(goodBody+`
departs contains s.id if {
	some s in input.busbars
	s.withstand.peak < s.fault.peak.at_least
	s.joints == "bare"
	s.covering.rank < input.limits.covering.rank
}
`)), Options{})
	crossed := bars(t, "A", map[string]string{"fault.peak.at_least": "2 kA"}).Fact("fault.peak.at_least")
	for name, c := range map[string]struct {
		fact *facts.Fact
		want string
	}{
		"bounds":        {crossed, "the fact fault.peak.at_least is above fault.peak.at_most"},
		"not a number":  {&facts.Fact{Term: term("withstand.peak"), Known: true, Number: math.NaN()}, "the fact withstand.peak is not a finite number"},
		"infinite":      {&facts.Fact{Term: term("withstand.peak"), Known: true, Number: math.Inf(1)}, "the fact withstand.peak is not a finite number"},
		"word":          {&facts.Fact{Term: term("joints"), Known: true, Word: "taped"}, "the fact joints is a word that is not in its list"},
		"rank":          {&facts.Fact{Term: term("covering"), Known: true, Word: "bare", Rank: 2}, "the fact covering has another rank than its word"},
		"rank too high": {&facts.Fact{Term: term("covering"), Known: true, Word: "bare", Rank: 9}, "the fact covering has another rank than its word"},
	} {
		broken := bars(t, "A", map[string]string{"fault.peak.at_most": "1 kA"})
		broken.Set(c.fact)
		got := judgeOne(t, p, board("b", broken, bars(t, "B", goodBars)))
		if got[0].Outcome != Unjudged || got[0].Fault != c.want {
			t.Errorf("%s: %s %q", name, got[0].Outcome, got[0].Fault)
		}
		if got[1].Outcome != Complies {
			t.Errorf("%s: the other bars %s", name, got[1].Outcome)
		}
	}
}

func TestSubjectsOfOneNameAreJudgedApart(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	got := judgeOne(t, p, board("b", bars(t, "A", goodBars), bars(t, "A", nil)))
	if got[0].Outcome != Complies || got[1].Outcome != Clarify {
		t.Errorf("got %q", outcomes(got))
	}
}

func TestEndOfContextIsAnError(t *testing.T) {
	t.Parallel()
	ctx, cancel := context.WithCancel(context.Background())
	cancel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	if got, err := p.Judge(ctx, board("b", bars(t, "A", goodBars))); err == nil {
		t.Errorf("got %v", got)
	}
	if got, err := p.Judge(context.Background()); err != nil || len(got) != 0 {
		t.Errorf("no boards: %v, %v", got, err)
	}
	if got, err := p.Judge(context.Background(), board("empty")); err != nil || len(got) != 1 || len(got[0]) != 0 {
		t.Errorf("empty board: %v, %v", got, err)
	}
}

// drawSubject invents facts: numbers of twelve digits around each other, equal ones often, many
// missing.
func drawSubject(t *rapid.T, v *facts.Vocabulary, kind facts.Kind, id string) *facts.Subject {
	s := facts.NewSubject(kind, id, place.Place{})
	for _, term := range v.Terms() {
		if term.Kind != kind || rapid.IntRange(0, 3).Draw(t, "missing") == 0 {
			continue
		}
		f := &facts.Fact{Term: term, Known: true}
		if term.Value == facts.Number {
			f.Number = rapid.OneOf(rapid.SampledFrom([]float64{0, 65000, 143000, 4.225e9, 1e-7, 123456789012}), rapid.Float64Range(-1e12, 1e12)).Draw(t, term.ID)
		} else {
			f.Rank = rapid.IntRange(0, len(term.Words)-1).Draw(t, term.ID)
			f.Word = term.Words[f.Rank]
		}
		s.Set(f)
	}
	ofKind := slices.DeleteFunc(slices.Clone(v.Terms()), func(term *facts.Term) bool { return term.Kind != kind })
	for _, pair := range boundsOf(ofKind) { // put bounds in order
		least, most := s.Fact(ofKind[pair.least].ID), s.Fact(ofKind[pair.most].ID)
		if least != nil && most != nil && least.Number > most.Number {
			least.Number, most.Number = most.Number, least.Number
		}
	}
	return s
}

// TestEngineAgreesWithPlainComparison and the order of judging does not matter: one board at a time,
// in batches of any size, with one worker or two.
func TestEngineAgreesWithPlainComparison(t *testing.T) {
	t.Parallel()
	v := facts.Terms()
	one := ownPack(t, Options{Workers: 1, Batch: 1})
	rapid.Check(t, func(t *rapid.T) {
		var boards []*facts.Board
		for i := range rapid.IntRange(1, 10).Draw(t, "boards") {
			b := &facts.Board{ID: fmt.Sprint(i)}
			for n := range rapid.IntRange(0, 3).Draw(t, "bars") {
				b.Subjects = append(b.Subjects, drawSubject(t, v, facts.Busbars, fmt.Sprint("bars ", n)))
			}
			b.Subjects = append(b.Subjects, drawSubject(t, v, facts.Boards, "board"))
			boards = append(boards, b)
		}
		many := *one
		many.options.Workers = rapid.IntRange(1, 3).Draw(t, "workers")
		many.options.Batch = rapid.IntRange(1, 9).Draw(t, "batch")
		together, err := many.Judge(context.Background(), boards...)
		if err != nil {
			t.Fatal(err)
		}
		for i, b := range boards {
			alone, err := one.Judge(context.Background(), b)
			if err != nil {
				t.Fatal(err)
			}
			if got, want := describe(together[i]), describe(alone[0]); !slices.Equal(got, want) {
				t.Fatalf("together\n%q\nalone\n%q", got, want)
			}
			for _, verdict := range alone[0] {
				if verdict.Outcome == Unjudged && !contradicts(verdict) {
					t.Fatalf("%s: %s", verdict.Rule.ID, verdict.Fault)
				}
			}
		}
	})
}

// contradicts tells whether a rule proves two things at once. Invented facts may contradict each other
// where those of a board cannot: a board without back-feed has none that could not be locked.
func contradicts(v Verdict) bool { return v.Outcome == Unjudged && len(v.FaultOther) > 0 }

func describe(verdicts []Verdict) []string {
	var list []string
	for _, v := range verdicts {
		list = append(list, fmt.Sprint(v.Rule.ID, v.Subject.ID, v.Outcome, v.Reason, v.Body, lines(v.Decisive), v.Fault))
	}
	return list
}

// TestNothingPassesByTakingAway removes one fact: no verdict becomes complies or exempt by it, and
// departs becomes nothing but departs or clarify.
func TestNothingPassesByTakingAway(t *testing.T) {
	t.Parallel()
	v := facts.Terms()
	p := ownPack(t, Options{Workers: 1})
	rapid.Check(t, func(t *rapid.T) {
		kind := rapid.SampledFrom([]facts.Kind{facts.Busbars, facts.Boards}).Draw(t, "kind")
		whole := drawSubject(t, v, kind, "s")
		all := whole.Facts()
		if len(all) == 0 {
			return
		}
		gone := rapid.IntRange(0, len(all)-1).Draw(t, "gone")
		less := facts.NewSubject(kind, "s", place.Place{})
		for i, f := range all {
			if i != gone {
				less.Set(f)
			}
		}
		got, err := p.Judge(context.Background(), board("whole", whole), board("less", less))
		if err != nil {
			t.Fatal(err)
		}
		for i, before := range got[0] {
			after := got[1][i]
			if contradicts(before) {
				continue
			}
			passes := after.Outcome == Complies || after.Outcome == Exempt
			if (passes && after.Outcome != before.Outcome) || after.Outcome == Unjudged {
				t.Fatalf("%s: %s without %s, %s with it", after.Rule.ID, after.Outcome, all[gone].Term.ID, before.Outcome)
			}
		}
	})
}
