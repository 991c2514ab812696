package report

import (
	"bytes"
	"fmt"
	"io"
	"regexp"
	"strings"

	"boardproof/checker/review"
)

// blankLines is more than one blank line in a row.
var blankLines = regexp.MustCompile("\n{3,}")

// page collects markdown; writing to it cannot fail.
type page struct{ bytes.Buffer }

func (p *page) line(format string, args ...any) { fmt.Fprintf(p, format+"\n", args...) }

func (p *page) heading(level int, format string, args ...any) {
	p.line("\n%s %s\n", strings.Repeat("#", level), fmt.Sprintf(format, args...))
}

// Markdown writes the review in the format of record. Its first lines are the
// summary that fits one screen.
func Markdown(w io.Writer, r *review.Review) error {
	p := &page{}
	p.summary(r)
	p.unjudged(r)
	p.departures(r)
	p.queries(r)
	p.complies(r)
	p.exempt(r)
	p.quantities(r)
	p.states(r)
	p.list("Assumptions and defaults used", assumptionLines(r))
	p.list("What was not looked at", r.NotLookedAt)
	p.list("Cautions", r.Cautions)
	p.documents(r)
	p.digests(r)
	p.signOff(r)
	_, err := w.Write(blankLines.ReplaceAll(p.Bytes(), []byte("\n\n")))
	return err
}

// list writes a section of bullet points; nothing if there are none.
func (p *page) list(title string, items []string) {
	if len(items) == 0 {
		return
	}
	p.heading(2, "%s", title)
	for _, item := range items {
		p.line("- %s", item)
	}
}

func assumptionLines(r *review.Review) []string {
	lines := make([]string, 0, len(r.Assumptions))
	for _, a := range r.Assumptions {
		line := fmt.Sprintf("%s = %s: %s", md(a.Name), md(a.Value), md(a.Why))
		if source := a.Source.String(); source != "" {
			line += " [" + md(source) + "]"
		}
		lines = append(lines, line)
	}
	return lines
}

// plural is "1 requirement departs" or "2 requirements depart".
func plural(n int, one, many string) string {
	if n == 1 {
		return "1 " + one
	}
	return fmt.Sprintf("%d %s", n, many)
}
