package rules

import (
	"context"
	"slices"
	"strings"
	"testing"
	"time"

	"github.com/open-policy-agent/opa/v1/ast"

	"boardproof/checker/facts"
)

// rawEngine compiles text past the reader, as nothing outside the tests can.
func rawEngine(text string, schema any) *engine {
	files := []file{{name: "raw.rego", text: text}, {name: "help.rego", text: helper}}
	return &engine{files: files, shown: func(s string) string { return s }, schema: schema}
}

// helper has two values where there are two bars, which stops the engine.
const helper = `package help

first := s.id if some s in input.busbars
`

func TestSandboxRefusesAtCompile(t *testing.T) {
	t.Parallel()
	for _, call := range []string{
		"time.now_ns()", `http.send({"method": "get", "url": "http://localhost"})`, `opa.runtime()`, `rand.intn("a", 3)`, `uuid.rfc4122("a")`,
		`net.lookup_ip_addr("localhost")`, `count([1])`, `object.get({}, "a", 1)`, `regex.match("a", "a")`, `walk({})`, `trace("a")`,
		`concat("", ["a"])`, "1 + 1", `print("a")`, `io.jwt.decode("a")`, `numbers.range(1, 2)`, `json.match_schema({}, {})`, "{1} & {2}",
	} {
		t.Run(call, func(t *testing.T) {
			t.Parallel()
			e := rawEngine("package a\n\nx := y if {\n\ty := "+call+"\n}\n", nil)
			errs := e.compile(context.Background())
			if len(errs) == 0 {
				t.Fatal("compiled")
			}
			if errs[0].Location == nil || errs[0].Location.Row != 4 || !strings.Contains(errs[0].Message, "undefined function") {
				t.Errorf("got %v", errs[0])
			}
		})
	}
}

func TestSandboxOffersNothingThatVaries(t *testing.T) {
	t.Parallel()
	c := sandbox()
	if len(c.Builtins) != len(allowedBuiltins) {
		t.Errorf("%d built-ins, %d allowed", len(c.Builtins), len(allowedBuiltins))
	}
	for _, b := range c.Builtins {
		if b.IsNondeterministic() {
			t.Errorf("%s varies", b.Name)
		}
	}
	if c.AllowNet == nil || len(c.AllowNet) != 0 {
		t.Errorf("hosts: %v; nil would mean all", c.AllowNet)
	}
}

func TestSchemaCatchesWhatTheReaderWouldNot(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	if p.engines[0].schema == nil {
		t.Error("an owner's pack is compiled without schema")
	}
	schema := InputSchema(p.Vocabulary())
	rule := func(line string) string {
		return "package boardproof.limitation.xy01\n\ncomplies contains s.id if {\n\tsome s in input.busbars\n\t" + line + "\n}\n"
	}
	for line, fine := range map[string]bool{
		"s.withstand.peak >= s.fault.peak.at_most":         true,
		"s.covering.rank >= input.limits.covering.rank":    true,
		"s.withstand.paek >= s.fault.peak.at_most":         false,
		"s.withstand.peak.at_most >= s.fault.peak.at_most": false,
		"s.withstand.peak >= input.limits.paek":            false,
		`s.withstand.peak == "65 kA"`:                      false,
		"s.covering.order >= input.limits.covering.rank":   false,
	} {
		errs := rawEngine(rule(line), schema).compile(context.Background())
		if fine != (len(errs) == 0) {
			t.Errorf("%s: %v", line, errs)
		}
	}
	if errs := rawEngine(rule("s.withstand.paek >= s.fault.peak.at_most"), nil).compile(context.Background()); len(errs) > 0 {
		t.Errorf("without schema nothing is checked, got %v", errs)
	}
}

func TestEngineErrorsAreReported(t *testing.T) {
	t.Parallel()
	e := rawEngine("package a\n\nx := y if {\n\ty := time.now_ns()\n}\n", nil)
	p := &Pack{engines: []*engine{e}, options: Options{}.filled()}
	err := p.Prepare(context.Background())
	if err == nil || err.Error() != "raw.rego:4:7: found a rule that the engine does not take (undefined function time.now_ns), expected three sets of comparisons" {
		t.Errorf("got %v", err)
	}
	if _, err := p.Judge(context.Background(), board("a")); err == nil {
		t.Error("judged with a pack that does not compile")
	}
}

// twoRules is a pack whose first rule is asked by another engine.
func twoRules(t *testing.T, module string, opt Options) *Pack {
	t.Helper()
	pack := packOf(header("") + goodBody)
	pack["xy02.rego"] = clone(header("")+goodBody, "XY-02", "xy02")
	p := mustLoad(t, pack, opt)
	e := rawEngine("package boardproof.limitation.xy01\n\n"+module, nil)
	broken := *p.rules[0]
	broken.engine = e
	p.rules[0] = &broken
	p.engines = append(p.engines, e)
	return p
}

func outcomes(verdicts []Verdict) []string {
	var list []string
	for _, v := range verdicts {
		list = append(list, v.Rule.ID+" "+v.Subject.ID+" "+v.Outcome.String())
	}
	return list
}

var goodBars = map[string]string{"withstand.peak": "143 kA", "fault.peak.at_most": "110 kA"}

const failing = `complies contains data.help.first if some s in input.busbars
`

// TestFailingRuleTakesOnlyItselfDown has a rule that the engine cannot finish where a board has two
// bars. Boards with one are judged, also in the same batch.
func TestFailingRuleTakesOnlyItselfDown(t *testing.T) {
	t.Parallel()
	p := twoRules(t, failing, Options{})
	got, err := p.Judge(context.Background(), board("one", bars(t, "A", goodBars)), board("two", bars(t, "A", goodBars), bars(t, "B", nil)))
	if err != nil {
		t.Fatal(err)
	}
	want := [][]string{
		{"XY-01 A complies", "XY-02 A complies"},
		{"XY-01 A unjudged", "XY-01 B unjudged", "XY-02 A complies", "XY-02 B clarify"},
	}
	for i := range want {
		if list := outcomes(got[i]); !slices.Equal(list, want[i]) {
			t.Errorf("board %d: got %q, want %q; %s", i, list, want[i], got[i][0].Fault)
		}
	}
	v := got[1][0]
	if !strings.HasPrefix(v.Fault, "the rule failed (") || v.FaultPlace.File != "xy01.rego" || v.FaultPlace.Line == 0 {
		t.Errorf("fault %q at %s", v.Fault, v.FaultPlace)
	}
}

const runaway = `complies contains a.id if {
	some a in input.busbars
	some b in input.busbars
	some c in input.busbars
	some d in input.busbars
	some e in input.busbars
	a.id == b.id
	c.id == d.id
	d.id == e.id
	e.id == "nothing"
}
`

func TestRunawayRuleTakesOnlyItselfDown(t *testing.T) {
	t.Parallel()
	p := twoRules(t, runaway, Options{Budget: 30 * time.Millisecond})
	var many []*facts.Subject
	for range 300 {
		many = append(many, bars(t, "A", goodBars))
	}
	begin := time.Now()
	got, err := p.Judge(context.Background(), board("large", many...), board("small", bars(t, "A", map[string]string{"withstand.peak": "1 kA"})))
	if err != nil {
		t.Fatal(err)
	}
	if v := got[0][0]; v.Outcome != Unjudged || v.Fault != "the rule ran longer than it may" || v.FaultPlace.File != "xy01.rego" {
		t.Errorf("got %s %q %s", v.Outcome, v.Fault, v.FaultPlace)
	}
	if v := got[0][300]; v.Rule.ID != "XY-02" || v.Outcome != Complies {
		t.Errorf("got %s %s", v.Rule.ID, v.Outcome)
	}
	if list := outcomes(got[1]); !slices.Equal(list, []string{"XY-01 A clarify", "XY-02 A clarify"}) {
		t.Errorf("small board: %q", list)
	}
	if took := time.Since(begin); took > 20*time.Second {
		t.Errorf("took %s", took)
	}
}

func TestPanicOfTheEngineIsAnError(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	input := ast.NewObject(ast.Item(ast.StringTerm("busbars"), ast.ArrayTerm(ast.ObjectTerm(
		ast.Item(ast.StringTerm("id"), ast.StringTerm("0")),
		ast.Item(ast.StringTerm("withstand"), ast.ObjectTerm(ast.Item(ast.StringTerm("peak"), ast.NewTerm(ast.Number("NaN"))))),
		ast.Item(ast.StringTerm("fault"), ast.ObjectTerm(ast.Item(ast.StringTerm("peak"), ast.ObjectTerm(ast.Item(ast.StringTerm("at_most"), ast.NewTerm(ast.Number("1"))))))),
	))))
	_, err := p.engines[0].prove(context.Background(), p.rules[0].Package, input, 1)
	if err == nil || !strings.HasPrefix(err.Error(), "the engine broke down (") {
		t.Errorf("got %v", err)
	}
}

func TestResultsOfAnotherFormAreErrors(t *testing.T) {
	t.Parallel()
	for name, document := range map[string]map[string]any{
		"no list":         {"complies": "0"},
		"another set":     {"strong": []any{"0"}},
		"a number":        {"complies": []any{0}},
		"nobody":          {"complies": []any{"3"}},
		"negative":        {"complies": []any{"-1"}},
		"exempt plain":    {"exempt": []any{"0"}},
		"exempt triple":   {"exempt": []any{[]any{"0", "a", "b"}}},
		"complies paired": {"complies": []any{[]any{"0", "a"}}},
	} {
		if p, err := readProof(document, 3); err == nil {
			t.Errorf("%s: %+v", name, p)
		}
	}
	p, err := readProof(map[string]any{"complies": []any{"0"}, "departs": []any{"1"}, "exempt": []any{[]any{"2", "why"}}}, 3)
	if err != nil || !slices.Equal(p.complies, []int{0}) || !slices.Equal(p.departs, []int{1}) || !slices.Equal(p.exempt, []exemption{{2, "why"}}) {
		t.Errorf("got %+v, %v", p, err)
	}
}

// TestJudgingParsesNoAnnotations: metadata is read by this package, for the program's own pack from the
// index only.
func TestJudgingParsesNoAnnotations(t *testing.T) {
	t.Parallel()
	text := header("") + goodBody
	m, err := ast.ParseModuleWithOpts("xy01.rego", text, parserOptions())
	if err != nil || len(m.Annotations) != 0 {
		t.Errorf("%d annotations, %v", len(m.Annotations), err)
	}
	withThem := parserOptions()
	withThem.ProcessAnnotation = true
	if m, err = ast.ParseModuleWithOpts("xy01.rego", text, withThem); err != nil || len(m.Annotations) == 0 {
		t.Errorf("the same text has annotations to parse: %d, %v", len(m.Annotations), err)
	}
}
