package rules

import (
	"context"
	"io/fs"
	"runtime"
	"slices"
	"strings"
	"sync"
	"time"

	"github.com/open-policy-agent/opa/v1/ast"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// Options of a pack. The zero value is usual.
type Options struct {
	Dir     string        // put before the file names in places: the folder as the user wrote it
	Base    *Pack         // its rules, limits and series are there too
	Workers int           // how many judge at a time; 0: one per processor
	Batch   int           // boards in one evaluation; 0: 8
	Budget  time.Duration // what one rule may take for one batch; 0: 2 s
}

const (
	usualBatch  = 8
	usualBudget = 2 * time.Second
)

func (o Options) filled() Options {
	if o.Workers <= 0 {
		o.Workers = runtime.GOMAXPROCS(0)
	}
	if o.Batch <= 0 {
		o.Batch = usualBatch
	}
	if o.Budget <= 0 {
		o.Budget = usualBudget
	}
	return o
}

// Pack is a set of rules with the limits they read. It does not change; several goroutines may use it.
type Pack struct {
	rules      []*Rule
	limits     []Limit
	series     map[string]*Series
	vocabulary *facts.Vocabulary // with the limits
	slots      *slots
	engines    []*engine
	digest     string
	options    Options
}

// Load reads an owner's pack and checks everything. The vocabulary has the terms of the subjects; the
// pack adds the limits of limits.yaml and those of opt.Base. If there is any problem the pack is nil:
// a pack is used whole or not at all.
func Load(fsys fs.FS, vocabulary *facts.Vocabulary, opt Options) (*Pack, *place.Problems) {
	problems := &place.Problems{}
	src := collect(fsys, opt.Dir, problems)
	p, ok := newPack(src, vocabulary, opt, problems)
	if !ok {
		return nil, problems
	}
	if len(src.rules) == 0 && src.limits == nil && problems.Len() == 0 {
		problems.Add(place.Problem{Place: place.Place{File: src.shown(".")}, Kind: place.Rule, Got: "no rule", Want: "a folder with one .rego file per rule"})
	}
	forms, modules := readAll(src, problems)
	p.add(src, forms, problems)
	if problems.Len() > 0 {
		return nil, problems
	}
	e := p.engines[len(p.engines)-1]
	e.parsed, e.schema = modules, InputSchema(p.vocabulary)
	e.report(e.compile(context.Background()), problems)
	if problems.Len() > 0 {
		return nil, problems
	}
	return p, problems
}

// newPack reads limits and series.
func newPack(src *source, vocabulary *facts.Vocabulary, opt Options, problems *place.Problems) (*Pack, bool) {
	p := &Pack{series: map[string]*Series{}, digest: src.digest(), options: opt.filled()}
	if b := opt.Base; b != nil {
		p.rules, p.limits, p.engines = slices.Clone(b.rules), slices.Clone(b.limits), slices.Clone(b.engines)
		for name, s := range b.series {
			p.series[name] = s
		}
		p.slots = b.slots.clone()
	} else {
		p.slots = (*slots)(nil).clone()
	}
	if src.limits != nil {
		d := &document{file: src.shown(limitsFile), problems: problems}
		p.limits = append(p.limits, readLimits(d, []byte(src.limits.text), vocabulary)...)
	}
	if src.series != nil {
		d := &document{file: src.shown(seriesFile), problems: problems}
		readSeries(d, []byte(src.series.text), vocabulary, p.series)
	}
	slices.SortStableFunc(p.limits, func(a, b Limit) int { return strings.Compare(a.Fact.Term.ID, b.Fact.Term.ID) })
	var err error
	if p.vocabulary, err = withLimits(vocabulary, p.limits); err != nil {
		at := place.Place{File: src.shown(limitsFile)}
		problems.Add(place.Problem{Place: at, Kind: place.Contradiction, Got: err.Error(), Want: "each limit once, none a group of others"})
		return nil, false
	}
	return p, true
}

// readAll reads the rule files, each on its own.
func readAll(src *source, problems *place.Problems) ([]*form, map[string]*ast.Module) {
	type result struct {
		form     *form
		module   *ast.Module
		problems place.Problems
	}
	results := make([]result, len(src.rules))
	var wait sync.WaitGroup
	gate := make(chan struct{}, compilers)
	for i, f := range src.rules {
		wait.Go(func() {
			gate <- struct{}{}
			defer func() { <-gate }()
			r := &results[i]
			r.form, r.module = readRule(f, src.shown(f.name), &r.problems)
		})
	}
	wait.Wait()
	modules := map[string]*ast.Module{}
	var forms []*form
	for i := range results {
		problems.Add(results[i].problems.All()...)
		if results[i].form != nil {
			forms = append(forms, results[i].form)
			modules[src.rules[i].name] = results[i].module
		}
	}
	return forms, modules
}

// readRule is the first stage for one file; nil if its text cannot be followed at all.
func readRule(f file, shown string, problems *place.Problems) (*form, *ast.Module) {
	out := &form{File: f.name, SHA256: f.sha256}
	m, err := ast.ParseModuleWithOpts(f.name, f.text, parserOptions())
	if err != nil {
		for _, e := range engineErrors(err) {
			p := place.Problem{Place: place.Place{File: shown}, Kind: place.Unreadable, Got: "text that is no rule (" + tame(e.Message) + ")", Want: "a package with three sets of comparisons"}
			if e.Location != nil {
				p.Place.Line, p.Place.Column = e.Location.Row, e.Location.Col
			}
			problems.Add(p)
		}
		return nil, nil
	}
	out.Metadata, _ = readMetadata(shown, f.text, problems)
	r := &reader{file: shown, form: out, problems: problems}
	r.module(m)
	return out, m
}

// add resolves the forms and appends their rules.
func (p *Pack) add(src *source, forms []*form, problems *place.Problems) {
	e := &engine{files: src.rules, shown: src.shown}
	p.engines = append(p.engines, e)
	byID, first := map[string]*Rule{}, map[string]*Rule{}
	for _, r := range p.rules {
		byID[r.ID], first[r.Package] = r, r
	}
	for _, f := range forms {
		r := &resolver{file: src.shown(f.File), form: f, vocabulary: p.vocabulary, series: p.series, slots: p.slots, problems: problems}
		rule := r.rule()
		rule.engine = e
		if other := firstRule(byID[rule.ID], first[rule.Package]); other != nil && rule.ID != "" {
			problems.Add(place.Problem{Place: rule.Place(), Kind: place.DuplicateKey, Got: "the rule " + rule.ID + " a second time", Want: "each rule once", Related: []place.Place{other.Place()}})
		}
		byID[rule.ID], first[rule.Package] = rule, rule
		p.rules = append(p.rules, rule)
	}
	slices.SortStableFunc(p.rules, func(a, b *Rule) int {
		if d := slices.Index(Lines, a.Line) - slices.Index(Lines, b.Line); d != 0 {
			return d
		}
		return strings.Compare(a.ID, b.ID)
	})
}

func firstRule(list ...*Rule) *Rule {
	for _, r := range list {
		if r != nil {
			return r
		}
	}
	return nil
}

// Rules lists the rules by line of defence, then by name.
func (p *Pack) Rules() []*Rule { return slices.Clone(p.rules) }

// Rule finds a rule by its name, such as "WTH-01".
func (p *Pack) Rule(id string) (*Rule, bool) {
	for _, r := range p.rules {
		if r.ID == id {
			return r, true
		}
	}
	return nil, false
}

// Limits lists the limits in force, sorted by name.
func (p *Pack) Limits() []*facts.Fact {
	list := make([]*facts.Fact, len(p.limits))
	for i, l := range p.limits {
		list[i] = l.Fact
	}
	return list
}

// Limit finds a limit with its default by name.
func (p *Pack) Limit(id string) (Limit, bool) {
	for _, l := range p.limits {
		if l.Fact.Term.ID == id {
			return l, true
		}
	}
	return Limit{}, false
}

// Series finds the steps of a cure by name.
func (p *Pack) Series(name string) (*Series, bool) {
	s, ok := p.series[name]
	return s, ok
}

// Vocabulary is the terms of subjects and limits together.
func (p *Pack) Vocabulary() *facts.Vocabulary { return p.vocabulary }

// Digest is the SHA-256, in hex, over the names and contents of the pack's rules, limits and series,
// without those of its base.
func (p *Pack) Digest() string { return p.digest }

// Prepare compiles the rules if that was not done yet. Judge does so by itself; a command that reads
// files first can let it run meanwhile. An error is a defect of the program's own pack.
func (p *Pack) Prepare(ctx context.Context) error {
	problems := &place.Problems{}
	for _, e := range p.engines {
		e.report(e.compile(ctx), problems)
	}
	return problems.Err()
}
