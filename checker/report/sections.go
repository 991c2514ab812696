package report

import (
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/review"
	"boardproof/checker/rules"
)

// unjudged comes before everything else: a rule that could not be used.
func (p *page) unjudged(r *review.Review) {
	if len(r.Unjudged) == 0 {
		return
	}
	p.heading(2, "Rules that could not be used")
	for _, f := range r.Unjudged {
		p.line("- %s, %s: %s (%s) [%s]", md(f.Rule.Title), md(f.Subject.ID), md(f.Why), md(f.Place.String()), f.Rule.ID)
	}
}

func (p *page) departures(r *review.Review) {
	if len(r.Departures) == 0 {
		return
	}
	p.heading(2, "Departures")
	for i, d := range r.Departures {
		p.heading(3, "%d. %s: %s", i+1, md(d.Rule.Title), subjects(d.Subjects()))
		p.line("%s; %s, line of %s, %s\n", references(d.Rule), d.Rule.Grade, d.Rule.Line, d.Rule.ID)
		p.line("%s\n", md(d.Rule.Description))
		p.line("| | value | from |")
		p.line("|---|---|---|")
		for _, c := range d.Compared {
			if c.Equality {
				p.line("| given: %s | %s | %s |", md(c.Found.Label), md(c.Found.Text), md(at(c.Found.Place)))
				continue
			}
			p.line("| found: %s | %s | %s |", md(c.Found.Label), md(c.Found.Text), md(at(c.Found.Place)))
			p.line("| required: %s | %s | %s |", md(c.Required.Label), md(c.Required.Text), requiredFrom(d, c))
			if c.MarginText != "" {
				p.line("| margin | %s | |", md(c.MarginText))
			}
		}
		p.line("")
		for _, cure := range d.Cures {
			p.line("- Cure: %s", md(cure.Long))
		}
		if d.NoCure != "" {
			p.line("- Cure: %s", md(d.NoCure))
		}
		p.line("- Check by hand: %s", code(worksheetCommand(d)))
	}
}

func at(p place.Place) string {
	if p.IsZero() {
		return ""
	}
	return p.String()
}

func requiredFrom(d *review.Departure, c review.Compared) string {
	switch {
	case c.Required.Fact == nil:
		return references(d.Rule)
	case c.Required.Fact.Term.Kind == facts.Limits:
		return "limit of the library, " + md(c.Required.Fact.Term.Clause)
	case d.State != "":
		return "computed; " + md(d.State)
	}
	return "computed"
}

func references(rule *rules.Rule) string {
	texts := make([]string, len(rule.References))
	for i, ref := range rule.References {
		texts[i] = md(ref.String())
	}
	return strings.Join(texts, "; ")
}

// worksheetCommand prints the chain behind the required number, or the found one if
// the requirement is not computed.
func worksheetCommand(d *review.Departure) string {
	term := ""
	for _, c := range d.Compared {
		for _, side := range []review.Side{c.Found, c.Required} {
			if side.Fact != nil && side.Fact.Term.Kind != facts.Limits {
				term = side.Fact.Term.ID
			}
		}
	}
	return "boardproof worksheet " + shell(d.Subject.Place.File) + " " + shell(d.Subject.ID) + " " + term
}

func (p *page) queries(r *review.Review) {
	if len(r.Queries) == 0 {
		return
	}
	p.heading(2, "Queries to the tenderer")
	for i, q := range r.Queries {
		p.line("%d. Please give **%s**%s", i+1, md(q.What), queryTail(q))
		for _, w := range q.Rules() {
			p.line("   - waits: %s (%s, %s) for %s", md(w.Rule.Title), w.Rule.Grade, w.Rule.ID, subjects(w.Subjects))
		}
	}
}

func queryTail(q *review.Query) string {
	var parts []string
	if q.Unit != "" {
		parts = append(parts, "such as "+code(q.Unit))
	}
	for i, one := range q.OneOf {
		lead := "or "
		if i == 0 {
			lead = "one of: "
		}
		parts = append(parts, lead+md(one.What))
	}
	if q.Because != "" {
		parts = append(parts, md(q.Because))
	}
	if !q.Place.IsZero() {
		parts = append(parts, "belongs at "+md(q.Place.String()))
	}
	if len(parts) == 0 {
		return ""
	}
	return ": " + strings.Join(parts, "; ")
}

func (p *page) complies(r *review.Review) {
	if r.Counts.Complies == 0 {
		return
	}
	p.heading(2, "What complies, and on what basis")
	p.line("| requirement | subject | found | required | basis | weakest statement |")
	p.line("|---|---|---|---|---|---|")
	for _, f := range r.Findings {
		if f.Outcome != rules.Complies {
			continue
		}
		found, required := "", ""
		for i, c := range f.Compared {
			if i > 0 {
				found, required = found+"; ", required+"; "
			}
			found, required = found+md(c.Found.Text), required+md(c.Required.Text)
		}
		p.line("| %s [%s] | %s | %s | %s | %s | %s |", md(f.Rule.Title), f.Rule.ID, md(f.Subject.ID), found, required, basisText(f.Basis), md(f.Weakest()))
	}
}

func (p *page) exempt(r *review.Review) {
	if r.Counts.Exempt == 0 {
		return
	}
	p.heading(2, "What does not apply, and why")
	for _, f := range r.Findings {
		if f.Outcome == rules.Exempt {
			p.line("- %s, %s: %s [%s]", md(f.Rule.Title), md(f.Subject.ID), md(f.Why), f.Rule.ID)
		}
	}
}
