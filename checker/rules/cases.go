package rules

import (
	"context"
	"io/fs"
	"path"
	"slices"
	"strings"

	"gopkg.in/yaml.v3"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// example is one case of a rule: the facts of one invented subject, and what the rule has to say.
type example struct {
	name   string
	at     place.Place
	facts  []*facts.Fact
	limits []Setting
	expect Outcome
	reason string
}

// CheckCases runs the cases beside the rule files of a pack, which p was loaded from, and returns how
// many verdicts were compared. It reports a case with another verdict; a fact whose absence turns a
// verdict into complies or exempt, or leaves one standing that was proven with it; a rule without a
// case for each verdict it can reach; and a rule that compares sizes without a case where they are
// equal.
func CheckCases(ctx context.Context, fsys fs.FS, p *Pack) (int, *place.Problems) {
	problems := &place.Problems{}
	src := collect(fsys, p.options.Dir, problems)
	compared := 0
	for _, f := range src.rules {
		r := p.ruleOf(src.shown(f.name))
		if r == nil {
			continue
		}
		name := strings.TrimSuffix(f.name, ruleSuffix) + casesSuffix
		i := slices.IndexFunc(src.cases, func(c file) bool { return c.name == name })
		if i < 0 {
			problems.Add(place.Problem{Place: place.Place{File: src.shown(name)}, Kind: place.MissingFile, Got: "no cases for " + r.ID, Want: "a file " + path.Base(name) + " beside the rule"})
			continue
		}
		d := &document{file: src.shown(name), problems: problems}
		t := &trial{pack: p.only(r), rule: r, problems: problems, reached: map[Outcome]bool{}}
		for _, e := range d.examples([]byte(src.cases[i].text), t.pack, r) {
			t.run(ctx, e)
		}
		t.finish(d.file)
		compared += t.compared
	}
	return compared, problems
}

func (p *Pack) ruleOf(file string) *Rule {
	for _, r := range p.rules {
		if r.File == file {
			return r
		}
	}
	return nil
}

// only is the pack reduced to one rule.
func (p *Pack) only(r *Rule) *Pack {
	out := *p
	out.rules = []*Rule{r}
	return &out
}

func (d *document) examples(text []byte, p *Pack, r *Rule) []example {
	const want = "a list of cases, each with name, facts and expect"
	root := d.root(text, want)
	if root == nil {
		return nil
	}
	var list []example
	for _, n := range d.list(root, "", want) {
		f := d.fields(n, "", want, "name", "facts", "limits", "expect", "reason")
		if n.Kind != yaml.MappingNode {
			continue
		}
		before := d.problems.Len()
		d.need(n, "", f, "name", "facts", "expect")
		e := example{at: d.at(n)}
		e.at.Column, e.at.EndColumn = 0, 0
		if v := f["name"]; v != nil {
			e.name = d.text(v, "name", "what the case is about")
		}
		if v := f["expect"]; v != nil {
			e.expect, _ = OutcomeNamed(d.word(v, "expect", outcomeNames[:]...))
		}
		if v := f["reason"]; v != nil {
			e.reason = d.text(v, "reason", "the reason of the exemption")
		}
		if v := f["facts"]; v != nil {
			e.facts = d.caseFacts(v, p, r)
		}
		if v := f["limits"]; v != nil {
			for _, k := range d.pairs(v, "limits", "limits with their values") {
				e.limits = append(e.limits, Setting{ID: k.name.Value, Text: d.text(k.value, "limits", "a value")})
			}
		}
		if d.problems.Len() == before {
			list = append(list, e)
		}
	}
	return list
}

func (d *document) caseFacts(n *yaml.Node, p *Pack, r *Rule) []*facts.Fact {
	var names []string
	for _, t := range r.Needs {
		if t.Kind != facts.Limits {
			names = append(names, t.ID)
		}
	}
	var list []*facts.Fact
	for _, k := range d.pairs(n, "facts", "terms with their values") {
		id := k.name.Value
		if id == practiceTerm {
			t := &facts.Term{Kind: r.Kind, ID: id, Value: facts.Word, Words: []string{IEC, NorthAmerican}}
			list = append(list, &facts.Fact{Term: t, Known: true, Word: d.word(k.value, id, t.Words...)})
			continue
		}
		t, ok := p.vocabulary.Lookup(r.Kind, id)
		if !ok || !slices.Contains(names, id) {
			d.add(place.Problem{Place: d.at(k.name), Path: "facts", Kind: place.UnknownName, Got: place.Quote(id) + ", which the rule does not read", Want: "one of " + strings.Join(names, ", "), Hint: nearestHint(id, names)})
			continue
		}
		fact, said := parseFact(t, d.text(k.value, "facts."+id, "a value"))
		if said != nil {
			said.Place, said.Path = d.at(k.value), "facts."+id
			d.add(*said)
			continue
		}
		list = append(list, fact)
	}
	return list
}

// trial runs the cases of one rule.
type trial struct {
	pack     *Pack
	rule     *Rule
	problems *place.Problems
	reached  map[Outcome]bool
	equal    bool // a case has two equal sides
	compared int
}

func (t *trial) fail(at place.Place, got, want, hint string) {
	t.problems.Add(place.Problem{Place: at, Path: t.rule.ID, Kind: place.Rule, Got: got, Want: want, Hint: hint})
}

func (t *trial) run(ctx context.Context, e example) {
	p, problems := t.pack.With(e.limits...)
	if p == nil {
		for _, problem := range problems.All() {
			problem.Place = e.at
			t.problems.Add(problem)
		}
		return
	}
	boards := []*facts.Board{boardOf(t.rule.Kind, e.facts, -1)}
	for i := range e.facts {
		boards = append(boards, boardOf(t.rule.Kind, e.facts, i))
	}
	judged, err := p.Judge(ctx, boards...)
	if err != nil {
		t.fail(e.at, "no verdict ("+tame(err.Error())+")", "a verdict", "")
		return
	}
	whole := judged[0][0]
	t.compared += len(judged)
	t.reached[whole.Outcome] = true
	t.equal = t.equal || t.hasEqual(e, p)
	if got, want := said(whole.Outcome, whole.Reason), said(e.expect, e.reason); whole.Outcome != e.expect || (e.reason != "" && e.reason != whole.Reason) {
		t.fail(e.at, got+" in the case "+place.Quote(e.name)+faultSuffix(whole), want, "")
		return
	}
	for i, f := range e.facts {
		t.lacking(e, whole, judged[i+1][0], f)
	}
}

// lacking compares a verdict with that of the same subject without one fact.
func (t *trial) lacking(e example, whole, v Verdict, without *facts.Fact) {
	t.reached[v.Outcome] = true
	if v.Outcome != Complies && v.Outcome != Exempt {
		return
	}
	if v.Outcome != whole.Outcome || v.Reason != whole.Reason {
		t.fail(e.at, said(v.Outcome, v.Reason)+" in the case "+place.Quote(e.name)+" without "+without.Term.ID, "nothing that was not proven before", "")
		return
	}
	for _, c := range v.Decisive {
		if slices.ContainsFunc(c.Terms(), func(read *facts.Term) bool { return read.Kind != facts.Limits && read.ID == without.Term.ID }) {
			t.fail(e.at, said(v.Outcome, v.Reason)+" in the case "+place.Quote(e.name)+" without "+without.Term.ID+", which it was proven with", "clarify", "")
			return
		}
	}
}

// hasEqual tells whether a comparison of sizes stands exactly at its limit.
func (t *trial) hasEqual(e example, p *Pack) bool {
	s := p.scene([]*facts.Board{boardOf(t.rule.Kind, e.facts, -1)})
	k := known{s.seats[t.rule.Kind][0].facts, s.limits}
	for i := range t.rule.Comparisons {
		c := t.rule.Comparisons[i]
		if c.Operator == "==" || c.Operator == "in" {
			continue
		}
		c.Operator = "=="
		if c.weigh(k) == holds {
			return true
		}
	}
	return false
}

func (t *trial) finish(file string) {
	at := place.Place{File: file}
	for _, o := range append(t.rule.Proves(), Clarify) {
		if !t.reached[o] {
			t.fail(at, "no case that ends in "+o.String(), "a case for each verdict that "+t.rule.ID+" can reach", "")
		}
	}
	sizes := slices.ContainsFunc(t.rule.Comparisons, func(c Comparison) bool { return c.Operator != "==" && c.Operator != "in" })
	if sizes && !t.equal {
		t.fail(at, "no case where both sides are equal", "a case at the limit itself", "")
	}
}

func said(o Outcome, reason string) string {
	if reason == "" {
		return o.String()
	}
	return o.String() + " (" + reason + ")"
}

func faultSuffix(v Verdict) string {
	if v.Fault == "" {
		return ""
	}
	return ": " + v.Fault
}

// boardOf is a board with one subject that has the facts but one; all of them for -1.
func boardOf(kind facts.Kind, list []*facts.Fact, without int) *facts.Board {
	subject := facts.NewSubject(kind, "case", place.Place{})
	for i, f := range list {
		if i != without {
			subject.Set(f)
		}
	}
	return &facts.Board{ID: "case", Subjects: []*facts.Subject{subject}}
}
