package report

import (
	"fmt"

	"boardproof/checker/review"
)

// quantities is the table of key figures.
func (p *page) quantities(r *review.Review) {
	if len(r.Quantities) == 0 {
		return
	}
	p.heading(2, "Key quantities")
	p.line("| quantity | value | at | governing supply state |")
	p.line("|---|---|---|---|")
	for _, q := range r.Quantities {
		value, state := "not known: see the queries", ""
		if q.Fact.Known {
			value = q.Fact.Text()
			state = q.Fact.How.Case
		} else if q.Fact.Outside != nil {
			value = "no value: " + q.Fact.Outside.Reason
		}
		p.line("| %s %s | %s | %s | %s |", md(q.Fact.Term.Label), md(q.Fact.Term.Symbol), md(value), subjects(q.Subjects), md(state))
	}
}

// states lists the supply states reckoned with, and those excluded with what excludes them.
func (p *page) states(r *review.Review) {
	if len(r.Facts.States) == 0 {
		return
	}
	p.heading(2, "Supply states")
	p.line("Reckoned with:\n")
	excluded := 0
	for _, s := range r.Facts.States {
		if s.ExcludedBy != "" {
			excluded++
			continue
		}
		p.line("- %s", md(s.Name))
	}
	if excluded == 0 {
		p.line("\nNo combination of incomers and couplers is excluded by a mechanical or key interlock.")
		return
	}
	p.line("\nExcluded, as declared, by a mechanical or key interlock:\n")
	for _, s := range r.Facts.States {
		if s.ExcludedBy != "" {
			p.line("- %s: %s (%s)", md(s.Name), md(s.ExcludedBy), md(s.Place.String()))
		}
	}
}

func (p *page) documents(r *review.Review) {
	p.heading(2, "Documents the values came from")
	if len(r.Board.Documents.Entries) == 0 {
		p.line("None named: every value is taken as written in the files below.")
		return
	}
	p.line("| id | title | number | revision | date |")
	p.line("|---|---|---|---|---|")
	for _, d := range r.Board.Documents.Entries {
		date := ""
		if d.Value.Date.Said() {
			date = d.Value.Date.Value.String()
		}
		p.line("| %s | %s | %s | %s | %s |", md(d.Name), md(d.Value.Title.Value), md(d.Value.Number.Value), md(d.Value.Revision.Value), date)
	}
}

// digests freeze what was reviewed and with what.
func (p *page) digests(r *review.Review) {
	p.heading(2, "Files and library")
	p.line("| file | SHA-256 |")
	p.line("|---|---|")
	for _, f := range r.Board.Files() {
		p.line("| %s | %s |", md(f.Name), code(f.SHA256))
	}
	p.line("| rule library, %s | %s |", plural(len(r.Pack.Rules()), "rule", "rules"), code(r.Pack.Digest()))
	p.line("\nThis review is void if any of these files changes, or if the network's fault level, a transformer, an interlock or a setting changes from what they say.")
}

func (p *page) signOff(r *review.Review) {
	p.heading(2, "Sign-off")
	p.line("| role | name | date | signature |")
	p.line("|---|---|---|---|")
	roles := r.Board.Roles
	for _, role := range []struct {
		title string
		said  bool
		name  string
	}{
		{"prepared", roles.PreparedBy.Said(), roles.PreparedBy.Value},
		{"checked", roles.CheckedBy.Said(), roles.CheckedBy.Value},
		{"approved", roles.ApprovedBy.Said(), roles.ApprovedBy.Value},
	} {
		name := ""
		if role.said {
			name = md(role.name)
		}
		p.line("| %s | %s | | |", role.title, name)
	}
	p.line("%s", fmt.Sprintf("\nThe signature is for the files with the digests above, as reviewed on %s.", r.On.Format("2006-01-02")))
}
