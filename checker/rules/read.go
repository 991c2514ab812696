package rules

import (
	"slices"
	"strings"
	"unicode/utf8"

	"github.com/open-policy-agent/opa/v1/ast"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// form is what one rule file says, before any name is looked up. The index of the program's own pack
// is a list of forms.
type form struct {
	File     string     `json:"file"` // slash path inside the pack
	SHA256   string     `json:"sha256"`
	Package  string     `json:"package"`
	Row      int        `json:"row"` // of the package clause
	Kind     facts.Kind `json:"kind"`
	KindRow  int        `json:"kind_row"`
	Metadata metadata   `json:"metadata"`
	Bodies   []bodyForm `json:"bodies"`
}

type bodyForm struct {
	Set     string     `json:"set"`
	Reason  string     `json:"reason,omitempty"`
	Row     int        `json:"row"`
	Compare []lineForm `json:"compare"`
}

type lineForm struct {
	Operator string  `json:"operator"`
	Left     reading `json:"left"`
	Right    reading `json:"right"`
	Row      int     `json:"row"`
	Column   int     `json:"column"`
	End      int     `json:"end"`
}

// reading is one side of a comparison as written.
type reading struct {
	From  string   `json:"from,omitempty"` // "s", "limits", "word" or "set"
	Path  string   `json:"path,omitempty"` // behind s. or input.limits.
	Words []string `json:"words,omitempty"`
}

// comparisonSigns are the operators let through, by the engine's name for them.
var comparisonSigns = map[string]string{"gte": ">=", "gt": ">", "lte": "<=", "lt": "<", "equal": "=="}

const membership = "internal.member_2"

// sets are the three things a rule may prove.
var sets = []string{"complies", "departs", "exempt"}

// reader goes through the syntax tree of one file and lets through what is listed here, refusing
// everything else.
type reader struct {
	file     string // as places show it
	form     *form
	problems *place.Problems
}

func (r *reader) refuse(at *ast.Location, said refusal) {
	p := place.Place{File: r.file}
	if at != nil {
		p.Line, p.Column = at.Row, at.Col
		if text := string(at.Text); text != "" && !strings.Contains(text, "\n") {
			p.EndColumn = at.Col + utf8.RuneCountInString(text)
		}
	}
	r.problems.Add(place.Problem{Place: p, Kind: place.Rule, Got: said.got, Want: said.want, Hint: said.hint})
}

func (r *reader) module(m *ast.Module) {
	r.form.Package = strings.TrimPrefix(m.Package.Path.String(), "data.")
	r.form.Row = m.Package.Location.Row
	for _, i := range m.Imports {
		r.refuse(i.Location, refuseImport(i.Path.String()))
	}
	proves := false
	for _, rule := range m.Rules {
		name := headName(rule.Head)
		proves = proves || name == "complies" || name == "departs"
		r.rule(rule, name)
	}
	if !proves {
		r.refuse(m.Package.Location, refuseNothingProven)
	}
}

// headName is the first part of what a rule is called.
func headName(head *ast.Head) string {
	if len(head.Reference) > 0 {
		return strings.Trim(head.Reference[0].Value.String(), `"`)
	}
	return head.Name.String()
}

func (r *reader) rule(rule *ast.Rule, name string) {
	head := rule.Head
	if rule.Else != nil {
		r.refuse(rule.Else.Location, refuseElse)
	}
	switch {
	case rule.Default:
		r.refuse(rule.Location, refuseDefault)
		return
	case len(head.Args) > 0:
		r.refuse(head.Location, refuseFunction(name))
		return
	case !slices.Contains(sets, name):
		r.refuse(head.Location, refuseHelper(name))
		return
	case len(head.Reference) != 1 || head.Key == nil || head.Value != nil:
		r.refuse(head.Location, refuseHead(name))
		return
	}
	b := bodyForm{Set: name, Row: rule.Location.Row}
	if !r.key(head, &b) {
		return
	}
	r.body(rule, &b)
	r.form.Bodies = append(r.form.Bodies, b)
}

// key checks what a set contains: s.id, for exemptions [s.id, "reason"].
func (r *reader) key(head *ast.Head, b *bodyForm) bool {
	k := head.Key
	if b.Set != "exempt" {
		if k.String() != "s.id" {
			r.refuse(k.Location, refuseKey(b.Set))
			return false
		}
		return true
	}
	pair, ok := k.Value.(*ast.Array)
	if !ok || pair.Len() != 2 || pair.Elem(0).String() != "s.id" {
		r.refuse(k.Location, refuseKey(b.Set))
		return false
	}
	reason, ok := pair.Elem(1).Value.(ast.String)
	if !ok {
		r.refuse(k.Location, refuseKey(b.Set))
		return false
	}
	b.Reason = string(reason)
	return true
}

func (r *reader) body(rule *ast.Rule, b *bodyForm) {
	before := r.problems.Len()
	ofKind := false
	for i, e := range rule.Body {
		if len(e.With) > 0 {
			r.refuse(e.With[0].Location, refuseWith)
			continue
		}
		if e.IsNegated() {
			r.refuse(e.Location, refuseNot)
			continue
		}
		switch terms := e.Terms.(type) {
		case *ast.SomeDecl:
			ofKind = r.some(e, terms, i) || ofKind
		case *ast.Every:
			r.refuse(e.Location, refuseEvery)
		case *ast.LogicalAnd, *ast.LogicalOr:
			r.refuse(e.Location, refuseAndOr)
		case *ast.Term:
			if terms.Location == nil || terms.Equal(ast.BooleanTerm(true)) {
				continue // a rule without body; reported below as comparing nothing
			}
			r.refuse(e.Location, r.bare(terms))
		case []*ast.Term:
			r.comparison(e, terms, b)
		default:
			r.refuse(e.Location, refuseOther)
		}
		if i == 0 && !e.IsSome() {
			r.refuse(e.Location, refuseNoSome)
		}
	}
	if len(b.Compare) == 0 && r.problems.Len() == before {
		r.refuse(rule.Location, refuseNoComparison(b.Set))
	}
	if !ofKind {
		b.Compare = nil // its names cannot be looked up
	}
}

// some checks `some s in input.<kind>`, first and once, over one kind in the whole file.
func (r *reader) some(e *ast.Expr, d *ast.SomeDecl, i int) bool {
	if i != 0 {
		r.refuse(e.Location, refuseSecondSome)
		return false
	}
	call, ok := d.Symbols[0].Value.(ast.Call)
	if len(d.Symbols) != 1 || !ok || len(call) != 3 || call[0].String() != membership || !call[1].Equal(ast.VarTerm("s")) {
		r.refuse(e.Location, refuseSomeShape)
		return false
	}
	over, ok := call[2].Value.(ast.Ref)
	if !ok || len(over) != 2 || !over[0].Equal(ast.InputRootDocument) {
		r.refuse(e.Location, refuseSomeOver)
		return false
	}
	kind, ok := over[1].Value.(ast.String)
	switch {
	case !ok || facts.Kind(kind) == facts.Limits:
		r.refuse(e.Location, refuseSomeOver)
		return false
	case r.form.Kind == "":
		r.form.Kind, r.form.KindRow = facts.Kind(kind), e.Location.Row
	case r.form.Kind != facts.Kind(kind):
		r.refuse(e.Location, refuseSecondKind(string(r.form.Kind), string(kind)))
		return false
	}
	return true
}

func (r *reader) comparison(e *ast.Expr, terms []*ast.Term, b *bodyForm) {
	name := terms[0].String()
	sign, ordinary := comparisonSigns[name]
	if name == membership {
		sign, ordinary = "in", true
	}
	if !ordinary || len(terms) != 3 {
		r.refuse(e.Location, refuseCall(name))
		return
	}
	line := lineForm{Operator: sign, Row: e.Location.Row, Column: e.Location.Col, End: e.Location.Col + utf8.RuneCount(e.Location.Text)}
	if _, list := terms[2].Value.(*ast.Array); list && sign == "in" {
		r.refuse(e.Location, refuseMembership)
		return
	}
	left, leftFine := r.operand(terms[1])
	right, rightFine := r.operand(terms[2])
	line.Left, line.Right = left, right
	if !leftFine || !rightFine {
		return
	}
	if (sign == "in") != (right.From == "set") || left.From == "set" {
		r.refuse(e.Location, refuseMembership)
		return
	}
	b.Compare = append(b.Compare, line)
}
