package report

import (
	"fmt"
	"strings"

	"boardproof/checker/place"
	"boardproof/checker/review"
	"boardproof/checker/working"
)

// summary is the first screen: who, what, the judgement in one sentence, the lines of
// defence, the worst departures with what was found and required, the first queries.
func (p *page) summary(r *review.Review) {
	p.line("# %s", strings.Join(title(r), ", "))
	p.line("\n%s\n", strings.Join(origin(r), ", "))
	p.line("**%s** %s\n", verdictLead(r), judgement(r))
	p.atAGlance(r)
	for i, d := range r.Departures {
		if i == 3 {
			break
		}
		if i == 0 {
			p.line("")
		}
		p.line("%d. **%s**, %s: %s", i+1, md(d.Rule.Title), subjects(d.Subjects()), foundRequired(d))
	}
	for i, q := range r.Queries {
		if i == 2 {
			break
		}
		if i == 0 {
			p.line("")
		}
		p.line("- Ask for %s%s", md(q.What), askedFor(q))
	}
}

func title(r *review.Review) []string {
	head := []string{md(r.Facts.ID)}
	if r.Board.Revision.Said() {
		head = append(head, "revision "+md(r.Board.Revision.Value))
	}
	if r.Board.Title.Said() {
		head = append(head, md(r.Board.Title.Value))
	}
	return head
}

func origin(r *review.Review) []string {
	line := []string{"Origin not stated"}
	if r.Board.OfferedBy.Said() {
		line = []string{"Offered by " + md(r.Board.OfferedBy.Value)}
	}
	if r.Board.Stage.Said() {
		line = append(line, r.Board.Stage.Value.Text())
	} else {
		line = append(line, "stage not stated")
	}
	if r.Board.Practice.Said() {
		line = append(line, r.Board.Practice.Value.Text()+" practice")
	}
	return append(line, "reviewed on "+r.On.Format("2006-01-02"))
}

func verdictLead(r *review.Review) string {
	c := r.Counts
	switch {
	case c.Unjudged+c.Departs+c.Clarify > 0 || len(r.Queries) > 0:
		return "Not shown to be safe as submitted:"
	case c.Complies+c.Exempt == 0:
		return "Nothing was judged:"
	}
	return "Nothing found against it in what was looked at:"
}

func judgement(r *review.Review) string {
	c := r.Counts
	var parts []string
	add := func(n int, one, many string) {
		if n > 0 {
			parts = append(parts, plural(n, one, many))
		}
	}
	add(c.Unjudged, "could not be judged", "could not be judged")
	add(c.Departs, "departs", "depart")
	add(c.Clarify, "is not proven", "are not proven")
	if c.Complies > 0 {
		text := plural(c.Complies, "complies", "comply")
		switch shown := c.Shown(); {
		case shown == c.Complies:
			text += " (shown)"
		case shown == 0:
			text += " (as declared, not shown)"
		default:
			text += fmt.Sprintf(" (%d shown, the rest only declared)", shown)
		}
		parts = append(parts, text)
	}
	add(c.Exempt, "does not apply", "do not apply")
	return "of " + plural(c.Complies+c.Departs+c.Clarify+c.Exempt+c.Unjudged, "requirement", "requirements") + ", " + strings.Join(parts, ", ") + "."
}

func (p *page) atAGlance(r *review.Review) {
	p.line("| line of defence | departs | open | complies | shown | exempt |")
	p.line("|---|---|---|---|---|---|")
	for i, line := range r.Lines {
		if line.Rules == 0 {
			p.line("| %d %s: not looked at | | | | | |", i+1, line.Name)
			continue
		}
		p.line("| %d %s | %d | %d | %d | %d | %d |", i+1, line.Name, line.Departs, line.Clarify+line.Unjudged, line.Complies, line.Shown(), line.Exempt)
	}
}

// foundRequired is "found 25 kA for 1 s, required 41.8 kA for 1 s, 16.8 kA short
// (40 %), in Q1 closed (tender.yaml:88:20). Cure: …".
func foundRequired(d *review.Departure) string {
	var text strings.Builder
	if c, ok := d.Decisive(); ok {
		text.WriteString("found " + md(c.Found.Text) + ", required " + md(c.Required.Text))
		if c.MarginText != "" {
			text.WriteString(", " + md(c.MarginText))
		}
	}
	if d.State != "" {
		text.WriteString(", with " + md(d.State))
	}
	text.WriteString(" (" + md(inFile(d.Place, d.Subject.Place.File)) + ")")
	if len(d.Cures) > 0 {
		text.WriteString(". Cure: " + md(d.Cures[0].Short))
	}
	return text.String()
}

// inFile is a place told from within a file: the line alone if it is this file's.
func inFile(p place.Place, file string) string {
	if p.File == file && p.Line > 0 {
		return fmt.Sprintf("line %d", p.Line)
	}
	return p.String()
}

func subjects(names []string) string {
	safe := make([]string, len(names))
	for i, name := range names {
		safe[i] = md(name)
	}
	return strings.Join(safe, ", ")
}

func askedFor(q *review.Query) string {
	text := ""
	if q.Unit != "" {
		text = ", such as " + code(q.Unit)
	}
	if n := len(q.Waiting); n > 0 {
		return text + ": " + plural(n, "requirement waits", "requirements wait") + " for it"
	}
	return text
}

// basisText is how a verdict of "complies" is qualified.
func basisText(b working.Basis) string {
	if b == working.Declared {
		return "as declared"
	}
	return b.String()
}
