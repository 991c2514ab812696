package report

import (
	"bytes"
	"fmt"
	"io"
	"maps"
	"slices"
	"strings"
	"text/tabwriter"

	"boardproof/checker/facts"
	"boardproof/checker/rules"
)

// Rules writes the library as a list: one line for each rule.
func Rules(w io.Writer, pack *rules.Pack) error {
	var out bytes.Buffer
	table := tabwriter.NewWriter(&out, 0, 8, 2, ' ', 0)
	for _, r := range pack.Rules() {
		fmt.Fprintf(table, "%s\t%s\t%s\t%s\n", r.ID, r.Line, r.Grade, r.Title)
	}
	if err := table.Flush(); err != nil {
		return err
	}
	fmt.Fprintf(&out, "\n%s; library %s\n", plural(len(pack.Rules()), "rule", "rules"), pack.Digest())
	_, err := w.Write(out.Bytes())
	return err
}

// Rule explains one rule: what it asks for and why, what it rests on, what it reads,
// and how each of its verdicts is proven.
func Rule(w io.Writer, r *rules.Rule) error {
	var out bytes.Buffer
	fmt.Fprintf(&out, "%s  %s\n\n%s\n\n", r.ID, r.Title, wrap(r.Description, 78))
	row := func(name, text string) {
		if text != "" {
			fmt.Fprintf(&out, "%-12s %s\n", name, text)
		}
	}
	row("line", r.Line)
	row("grade", r.Grade)
	row("practice", r.Practice)
	row("speaks of", string(r.Kind))
	for _, ref := range r.References {
		row("rests on", ref.String())
	}
	row("shown by", r.Proof)
	for _, need := range r.Needs {
		row("reads", needText(need))
	}
	lastBody := -1
	for _, c := range r.Comparisons {
		lead := "  and"
		if c.Body != lastBody {
			lead, lastBody = c.Set.String(), c.Body
		}
		row(lead, c.String())
	}
	row("otherwise", "to be clarified")
	for _, reason := range sortedKeys(r.Reasons) {
		row("exempt when", r.Reasons[reason])
	}
	for _, lever := range r.Cure {
		row("cured by", lever.Direction+" "+lever.Term.Label)
	}
	row("file", fmt.Sprintf("%s:%d", r.File, r.Row))
	_, err := w.Write(out.Bytes())
	return err
}

func needText(t *facts.Term) string {
	text := t.ID + ": " + t.Label
	if t.Symbol != "" {
		text += " " + t.Symbol
	}
	switch {
	case t.Value == facts.Number && t.Dimension.Base != "":
		text += ", in " + t.Dimension.Base
	case t.Value != facts.Number:
		text += ", one of " + strings.Join(t.Words, ", ")
	}
	return text
}

// wrap folds text at blanks.
func wrap(text string, width int) string {
	var out strings.Builder
	column := 0
	for _, word := range strings.Fields(text) {
		if column > 0 && column+1+len([]rune(word)) > width {
			out.WriteString("\n")
			column = 0
		}
		if column > 0 {
			out.WriteString(" ")
			column++
		}
		out.WriteString(word)
		column += len([]rune(word))
	}
	return out.String()
}

func sortedKeys[V any](m map[string]V) []string {
	return slices.Sorted(maps.Keys(m))
}
