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
	p.line("# Review of %s", strings.Join(title(r), ", "))
	p.line("\n%s\\", strings.Join(origin(r), ", "))
	p.line("**%s** %s\n", verdictLead(r), judgement(r))
	p.atAGlance(r)
	for i, item := range worst(r) {
		if i == 0 {
			p.line("")
		}
		p.line("%d. %s", i+1, item)
	}
	if len(r.Queries) > 0 {
		p.line("\n- Ask first for %s", askedFor(r.Queries[0]))
	}
}

// The first screen has 24 lines of 80 columns; head, lines of defence and first query
// leave ten for the three worst departures.
const (
	screenColumns  = 80
	departureLines = 10
	queryColumns   = 76
)

// worst is the summary of the three worst departures. Their cures are named as far as
// the first screen has room, the worst first.
func worst(r *review.Review) []string {
	var items []string
	lines := 0
	for _, d := range r.Departures[:min(3, len(r.Departures))] {
		item := fmt.Sprintf("**%s**, %s: %s", md(d.Rule.Title), subjects(d.Subjects()), foundRequired(d))
		items = append(items, item)
		lines += linesOf(item)
	}
	for i, d := range r.Departures[:len(items)] {
		if len(d.Cures) == 0 {
			continue
		}
		whole := items[i] + ". Cure: " + md(d.Cures[0].Short)
		if more := linesOf(whole) - linesOf(items[i]); lines+more <= departureLines {
			items[i], lines = whole, lines+more
			continue
		}
		items[i] += ". Cure: see below"
	}
	return items
}

// linesOf estimates how many lines an item takes on the first screen.
func linesOf(item string) int {
	text := len([]rune(strings.ReplaceAll(item, "*", ""))) + len("1. ")
	return (text + screenColumns - 6) / (screenColumns - 5)
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
	free := 0
	for _, q := range r.Queries {
		if len(q.Waiting) == 0 {
			free++
		}
	}
	add(free, "question about a value stands beside them", "questions about values stand beside them")
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
// (40 %) (line 88)".
func foundRequired(d *review.Departure) string {
	var text strings.Builder
	if c, ok := d.Decisive(); ok {
		text.WriteString("found " + md(c.Found.Text) + ", required " + md(c.Required.Text))
		if c.MarginText != "" {
			text.WriteString(", " + md(c.MarginText))
		}
	}
	text.WriteString(" (" + md(inFile(d.Place, d.Subject.Place.File)) + ")")
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

// askedFor is what a query asks for, with an example if there is room.
func askedFor(q *review.Query) string {
	if example := ", such as " + code(q.Unit); q.Unit != "" && len([]rune(q.What+example)) <= queryColumns-14 {
		return md(q.What) + example
	}
	return md(q.What)
}

// basisText is how a verdict of "complies" is qualified.
func basisText(b working.Basis) string {
	if b == working.Declared {
		return "as declared"
	}
	return b.String()
}
