package rules

import (
	"strings"

	"github.com/open-policy-agent/opa/v1/ast"

	"boardproof/checker/facts"
)

// operand lets through s.<term>, input.limits.<term>, a text, and a set of texts.
func (r *reader) operand(t *ast.Term) (reading, bool) {
	switch v := t.Value.(type) {
	case ast.String:
		return reading{From: "word", Words: []string{string(v)}}, true
	case ast.Ref:
		return r.reference(t, v)
	case ast.Set:
		words := []string{}
		plain := v.Len() > 0
		for _, member := range v.Slice() {
			s, ok := member.Value.(ast.String)
			plain = plain && ok
			words = append(words, string(s))
		}
		if plain {
			return reading{From: "set", Words: words}, true
		}
		r.refuse(t.Location, refuseSet)
	default:
		r.refuse(t.Location, r.bare(t))
	}
	return reading{}, false
}

func (r *reader) reference(t *ast.Term, ref ast.Ref) (reading, bool) {
	if call, ok := ref[0].Value.(ast.Call); ok {
		r.refuse(t.Location, refuseCall(call[0].String()))
		return reading{}, false
	}
	var steps []string
	for _, step := range ref[1:] {
		s, ok := step.Value.(ast.String)
		if !ok {
			r.refuse(t.Location, refuseIndex(ref.String()))
			return reading{}, false
		}
		steps = append(steps, string(s))
	}
	switch root := ref[0].String(); {
	case root == "s" && len(steps) > 0:
		return reading{From: "s", Path: strings.Join(steps, ".")}, true
	case root == "input" && len(steps) > 1 && steps[0] == string(facts.Limits):
		return reading{From: "limits", Path: strings.Join(steps[1:], ".")}, true
	}
	r.refuse(t.Location, refuseReading(ref.String()))
	return reading{}, false
}

// bare says why a value cannot stand where it stands.
func (r *reader) bare(t *ast.Term) refusal {
	switch v := t.Value.(type) {
	case *ast.ArrayComprehension, *ast.SetComprehension, *ast.ObjectComprehension:
		return refuseComprehension
	case *ast.Not:
		return refuseNot
	case ast.Call:
		return refuseCall(v[0].String())
	case *ast.TemplateString:
		return refuseTemplate
	case ast.Number:
		return refuseNumber(v.String())
	case ast.Boolean:
		return refuseBoolean(v.String())
	case ast.Null:
		return refuseNull
	case ast.Var:
		return refuseVariable(v)
	case ast.Ref:
		return refuseBare(v.String())
	}
	return refuseOther
}
