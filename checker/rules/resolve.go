package rules

import (
	"path"
	"slices"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/place"
)

// resolver looks up what a form reads and refuses what does not fit together.
type resolver struct {
	file       string // as places show it
	form       *form
	vocabulary *facts.Vocabulary
	series     map[string]*Series
	slots      *slots
	problems   *place.Problems
}

// slots numbers the terms that rules read, by kind, so that a verdict finds its facts without a map.
type slots struct {
	of    map[*facts.Term]int
	terms map[facts.Kind][]*facts.Term
}

func (s *slots) slot(t *facts.Term) int {
	if n, ok := s.of[t]; ok {
		return n
	}
	n := len(s.terms[t.Kind])
	s.of[t] = n
	s.terms[t.Kind] = append(s.terms[t.Kind], t)
	return n
}

func (s *slots) clone() *slots {
	out := &slots{of: map[*facts.Term]int{}, terms: map[facts.Kind][]*facts.Term{}}
	if s == nil {
		return out
	}
	for t, n := range s.of {
		out.of[t] = n
	}
	for k, list := range s.terms {
		out.terms[k] = slices.Clone(list)
	}
	return out
}

func (r *resolver) refuse(row int, path string, said refusal) {
	r.refuseAt(place.Place{File: r.file, Line: row}, path, said)
}

func (r *resolver) refuseAt(at place.Place, path string, said refusal) {
	r.problems.Add(place.Problem{Place: at, Path: path, Kind: place.Rule, Got: said.got, Want: said.want, Hint: said.hint})
}

// rule builds the rule; what does not fit is reported and left out.
func (r *resolver) rule() *Rule {
	f, m := r.form, r.form.Metadata
	rule := &Rule{
		ID: m.Rule, Line: m.Line, Grade: m.Grade, Practice: m.Practice, Title: m.Title, Description: m.Description,
		References: m.References, Kind: f.Kind, Reasons: m.Reasons, Proof: m.Proof,
		Package: f.Package, File: r.file, Row: f.Row, SHA256: f.SHA256,
	}
	r.names()
	if f.Kind == "" {
		return rule // refused by the reader
	}
	if !slices.Contains(r.vocabulary.Kinds(), f.Kind) {
		var kinds []string
		for _, k := range r.vocabulary.Kinds() {
			kinds = append(kinds, string(k))
		}
		r.refuse(f.KindRow, "", refusal{place.Quote("input."+string(f.Kind)) + ", which is no kind of subject", "one of " + strings.Join(kinds, ", "), nearestHint(string(f.Kind), kinds)})
		return rule
	}
	for i, b := range f.Bodies {
		rule.bodies = append(rule.bodies, r.body(i, b))
	}
	for i := range rule.bodies {
		rule.Comparisons = append(rule.Comparisons, rule.bodies[i].comparisons...)
	}
	at := 0
	for i := range rule.bodies {
		n := len(rule.bodies[i].comparisons)
		rule.bodies[i].comparisons = rule.Comparisons[at : at+n : at+n]
		at += n
	}
	for _, c := range rule.Comparisons {
		for _, t := range c.Terms() {
			if !slices.Contains(rule.Needs, t) {
				rule.Needs = append(rule.Needs, t)
			}
		}
	}
	r.reasons()
	r.levers(rule)
	return rule
}

// names checks that file, package and metadata call the rule the same.
func (r *resolver) names() {
	m := r.form.Metadata
	if m.Rule == "" {
		return
	}
	short := strings.ToLower(strings.ReplaceAll(m.Rule, "-", ""))
	if got := path.Base(r.form.File); got != short+".rego" {
		r.refuse(0, "", refusal{"the rule " + m.Rule + " in a file named " + place.Quote(got), "the file " + short + ".rego", ""})
	}
	if want := "boardproof." + m.Line + "." + short; m.Line != "" && r.form.Package != want {
		r.refuse(r.form.Row, "", refusal{"package " + place.Quote(r.form.Package), "package " + want, ""})
	}
}

func (r *resolver) reasons() {
	used := map[string]bool{}
	var defined []string
	for key := range r.form.Metadata.Reasons {
		defined = append(defined, key)
	}
	slices.Sort(defined)
	for _, b := range r.form.Bodies {
		if b.Set != "exempt" {
			continue
		}
		used[b.Reason] = true
		if !slices.Contains(defined, b.Reason) {
			r.refuse(b.Row, "exempt", refusal{"the reason " + place.Quote(b.Reason) + " without a sentence", "a reason of the metadata", firstOf(nearestHint(b.Reason, defined), "add it under custom, reasons")})
		}
	}
	for _, key := range defined {
		if !used[key] {
			r.refuse(r.form.Row, "custom.reasons", refusal{"the reason " + place.Quote(key) + ", which no body gives", "reasons of exempt bodies", "remove it"})
		}
	}
}

func firstOf(texts ...string) string {
	for _, t := range texts {
		if t != "" {
			return t
		}
	}
	return ""
}

func (r *resolver) levers(rule *Rule) {
	for _, l := range r.form.Metadata.Cure {
		if l.Lever == "" {
			continue
		}
		term, ok := r.vocabulary.Lookup(rule.Kind, l.Lever)
		if !ok {
			r.refuse(l.Row, "custom.cure", refusal{"the lever " + place.Quote(l.Lever) + ", which is no term of " + string(rule.Kind), "a term of " + string(rule.Kind), nearestHint(l.Lever, r.termNames(rule.Kind))})
			continue
		}
		lever := CureLever{Term: term, Direction: l.Direction}
		if l.Steps != "" {
			lever.Series = r.series[l.Steps]
			switch {
			case lever.Series == nil:
				r.refuse(l.Row, "custom.cure", refusal{"the steps " + place.Quote(l.Steps), "a series of series.yaml", nearestHint(l.Steps, seriesNames(r.series))})
				continue
			case !lever.Series.fits(term):
				r.refuse(l.Row, "custom.cure", refusal{"steps of " + lever.Series.Of + " for " + term.ID + ", which is " + measureOf(term), "steps of the same quantity or list", ""})
				continue
			}
		}
		rule.Cure = append(rule.Cure, lever)
	}
}

func (r *resolver) termNames(kind facts.Kind) []string {
	var names []string
	for _, t := range r.vocabulary.Terms() {
		if t.Kind == kind {
			names = append(names, t.ID)
		}
	}
	return names
}

func (r *resolver) body(number int, f bodyForm) body {
	outcome, _ := OutcomeNamed(f.Set)
	b := body{outcome: outcome, reason: f.Reason, row: f.Row}
	ofSubject := false
	complete := true
	for _, line := range f.Compare {
		ofSubject = ofSubject || line.Left.From == "s" || line.Right.From == "s"
		c, ok := r.line(line, outcome)
		if !ok {
			complete = false
			continue
		}
		c.Set, c.Body, c.Row = outcome, number, line.Row
		b.comparisons = append(b.comparisons, c)
	}
	if complete && len(f.Compare) > 0 && !ofSubject {
		r.refuse(f.Row, f.Set, refuseNoComparison(f.Set))
	}
	return b
}

// operand looks up one side; what it lacks is reported.
func (r *resolver) operand(line lineForm, written reading) (Operand, bool) {
	switch written.From {
	case "word":
		return Operand{Word: written.Words[0], slot: -1}, true
	case "set":
		return Operand{Words: written.Words, slot: -1}, true
	}
	kind, prefix := r.form.Kind, "s."
	if written.From == "limits" {
		kind, prefix = facts.Limits, "input.limits."
	}
	if t, ok := r.vocabulary.Lookup(kind, written.Path); ok {
		if t.Value == facts.Ordered {
			r.refuseLine(line, refusal{prefix + written.Path + ", an ordered word, whose word and rank would be compared as one", "its rank or its word", "write " + prefix + t.ID + ".rank or " + prefix + t.ID + ".word"})
			return Operand{}, false
		}
		return Operand{Term: t, slot: r.slots.slot(t)}, true
	}
	if i := strings.LastIndex(written.Path, "."); i > 0 {
		base, part := written.Path[:i], written.Path[i+1:]
		if t, ok := r.vocabulary.Lookup(kind, base); ok && (part == "rank" || part == "word") {
			if t.Value == facts.Ordered {
				return Operand{Term: t, Rank: part == "rank", slot: r.slots.slot(t)}, true
			}
			r.refuseLine(line, refusal{prefix + written.Path + ", but " + t.ID + " is " + measureOf(t), prefix + t.ID, ""})
			return Operand{}, false
		}
	}
	r.refuseLine(line, r.unknown(kind, prefix, written.Path))
	return Operand{}, false
}

func (r *resolver) unknown(kind facts.Kind, prefix, path string) refusal {
	of := "a term of " + string(kind)
	if kind == facts.Limits {
		of = "a limit of limits.yaml"
	}
	if prefix == "s." && path == "id" {
		return refusal{"s.id, the name of a subject, for which no rule makes an exception", of, "say which subjects are meant by a term"}
	}
	names := r.termNames(kind)
	var members []string
	for _, name := range names {
		if strings.HasPrefix(name, path+".") && len(members) < 3 {
			members = append(members, prefix+name)
		}
	}
	if len(members) > 0 {
		return refusal{place.Quote(prefix+path) + ", a group of terms", of, "write " + strings.Join(members, " or ")}
	}
	hint := ""
	stem, part := path, ""
	for _, p := range []string{".rank", ".word"} {
		if s, ok := strings.CutSuffix(path, p); ok {
			stem, part = s, p
		}
	}
	if near, ok := place.Nearest(stem, names); ok {
		hint = "write " + prefix + near + part
	}
	return refusal{place.Quote(prefix+path) + ", which is not in the vocabulary", of, hint}
}

func (r *resolver) refuseLine(line lineForm, said refusal) {
	r.refuseAt(place.Place{File: r.file, Line: line.Row, Column: line.Column, EndColumn: line.End}, "", said)
}
