package rules

import (
	"context"
	"errors"
	"fmt"
	"slices"
	"strconv"
	"sync"

	"github.com/open-policy-agent/opa/v1/ast"
	"github.com/open-policy-agent/opa/v1/rego"
	"github.com/open-policy-agent/opa/v1/storage/inmem"
	"github.com/open-policy-agent/opa/v1/topdown"

	"boardproof/checker/place"
)

// compilers is how many compilers share the rules of a pack; more than two do not pay (measured).
const compilers = 2

// engine compiles the rule files of one pack, once, and asks them.
type engine struct {
	files  []file                 // of the rules, in the order of modules
	shown  func(string) string    // name of a file in places
	parsed map[string]*ast.Module // by file name; nil entries are parsed when compiling
	schema any                    // of the input; nil where the pack was checked before

	once    sync.Once
	queries map[string]rego.PreparedEvalQuery // by package
	failed  map[string]error                  // by package: its query could not be prepared
	errs    []*ast.Error
}

func parserOptions() ast.ParserOptions {
	return ast.ParserOptions{RegoVersion: ast.RegoV1}
}

// compile does its work once; later calls return the same errors.
func (e *engine) compile(ctx context.Context) []*ast.Error {
	e.once.Do(func() {
		parts := min(compilers, 1+len(e.files)/4)
		results := make([]part, parts)
		var wait sync.WaitGroup
		for i := range results {
			wait.Go(func() {
				defer func() {
					if p := recover(); p != nil {
						results[i].errs = append(results[i].errs, &ast.Error{Code: "panic", Message: fmt.Sprint(p)})
					}
				}()
				results[i] = e.compilePart(ctx, i, parts)
			})
		}
		wait.Wait()
		e.queries, e.failed = map[string]rego.PreparedEvalQuery{}, map[string]error{}
		for _, r := range results {
			e.errs = append(e.errs, r.errs...)
			for name, q := range r.queries {
				e.queries[name] = q
			}
			for name, err := range r.failed {
				e.failed[name] = err
			}
		}
	})
	return e.errs
}

type part struct {
	queries map[string]rego.PreparedEvalQuery
	failed  map[string]error
	errs    []*ast.Error
}

// compilePart compiles every parts-th file and prepares one query for each package.
func (e *engine) compilePart(ctx context.Context, first, parts int) part {
	modules := map[string]*ast.Module{}
	out := part{queries: map[string]rego.PreparedEvalQuery{}, failed: map[string]error{}}
	for i := first; i < len(e.files); i += parts {
		f := e.files[i]
		m := e.parsed[f.name]
		if m == nil {
			var err error
			if m, err = ast.ParseModuleWithOpts(f.name, f.text, parserOptions()); err != nil {
				out.errs = append(out.errs, engineErrors(err)...)
				continue
			}
		}
		modules[f.name] = m
	}
	c := ast.NewCompiler().WithCapabilities(sandbox()).WithStrict(true).SetErrorLimit(0)
	if e.schema != nil {
		set := ast.NewSchemaSet()
		set.Put(ast.SchemaRootRef, e.schema)
		c = c.WithSchemas(set)
	}
	if c.Compile(modules); c.Failed() {
		out.errs = append(out.errs, c.Errors...)
		return out
	}
	store := inmem.New()
	for _, m := range modules {
		query := ast.NewBody(ast.NewExpr(ast.NewTerm(m.Package.Path)))
		q, err := rego.New(rego.Compiler(c), rego.Store(store), rego.StrictBuiltinErrors(true), rego.ParsedQuery(query)).
			PrepareForEval(context.WithoutCancel(ctx))
		if err != nil {
			out.failed[m.Package.Path.String()] = err
			continue
		}
		out.queries[m.Package.Path.String()] = q
	}
	return out
}

func engineErrors(err error) []*ast.Error {
	var list ast.Errors
	if errors.As(err, &list) {
		return list
	}
	return []*ast.Error{{Code: "parse", Message: err.Error()}}
}

// report turns what the engine says into problems.
func (e *engine) report(errs []*ast.Error, problems *place.Problems) {
	for _, err := range errs {
		p := place.Problem{Kind: place.Rule, Got: "a rule that the engine does not take (" + tame(err.Message) + ")", Want: "three sets of comparisons"}
		if err.Location != nil {
			p.Place = place.Place{File: e.shown(err.Location.File), Line: err.Location.Row, Column: err.Location.Col}
		}
		problems.Add(p)
	}
}

// proof is what the engine says a rule proves, by number of the subject.
type proof struct {
	complies, departs []int
	exempt            []exemption
}

type exemption struct {
	subject int
	reason  string
}

// prove asks one rule about all subjects of an input. It returns an error, never a panic: the engine
// panics on numbers that are not finite.
func (e *engine) prove(ctx context.Context, pkg string, input ast.Value, subjects int) (p proof, err error) {
	defer func() {
		if broken := recover(); broken != nil {
			p, err = proof{}, fmt.Errorf("the engine broke down (%v)", broken)
		}
	}()
	name := "data." + pkg
	query, ok := e.queries[name]
	if !ok {
		if err := e.failed[name]; err != nil {
			return proof{}, err
		}
		return proof{}, errors.New("the engine has no such rule")
	}
	results, err := query.Eval(ctx, rego.EvalParsedInput(input))
	if err != nil {
		return proof{}, err
	}
	if len(results) != 1 || len(results[0].Expressions) != 1 {
		return proof{}, errors.New("the engine gave no result")
	}
	document, ok := results[0].Expressions[0].Value.(map[string]any)
	if !ok {
		return proof{}, errors.New("the engine gave a result of another form")
	}
	return readProof(document, subjects)
}

func readProof(document map[string]any, subjects int) (proof, error) {
	var p proof
	for set, members := range document {
		list, ok := members.([]any)
		if !ok || !slices.Contains(sets, set) {
			return proof{}, errors.New("the engine gave a set of another form")
		}
		for _, member := range list {
			id, reason := member, ""
			if pair, ok := member.([]any); ok && set == "exempt" && len(pair) == 2 {
				id = pair[0]
				reason, _ = pair[1].(string)
			}
			text, ok := id.(string)
			n, err := strconv.Atoi(text)
			if !ok || err != nil || n < 0 || n >= subjects || (set == "exempt") != (reason != "") {
				return proof{}, errors.New("the engine named a subject that was not asked about")
			}
			switch set {
			case "complies":
				p.complies = append(p.complies, n)
			case "departs":
				p.departs = append(p.departs, n)
			case "exempt":
				p.exempt = append(p.exempt, exemption{n, reason})
			}
		}
	}
	return p, nil
}

// faultOf is the engine's error as a sentence, with the row it speaks of; 0 if none.
func faultOf(err error, overran bool) (text string, row int) {
	var failure *topdown.Error
	if errors.As(err, &failure) {
		if failure.Location != nil {
			row = failure.Location.Row
		}
		if overran && failure.Code == topdown.CancelErr {
			return "the rule ran longer than it may", row
		}
		return "the rule failed (" + tame(failure.Message) + ")", row
	}
	if overran {
		return "the rule ran longer than it may", 0
	}
	return "the rule failed (" + tame(err.Error()) + ")", 0
}
