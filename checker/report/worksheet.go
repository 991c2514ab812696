package report

import (
	"bytes"
	"crypto/sha256"
	"fmt"
	"io"
	"slices"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/working"
)

// sheet numbers the lines of a worksheet: a value that several others rest on is
// printed once and referred to by number.
type sheet struct {
	lines  []*working.Working
	number map[string]int
	owner  map[string]string // the subject a line was first needed for
	keys   map[*working.Working]string
}

// key identifies a line: two workings with one key say the same and rest on the same.
func (s *sheet) key(w *working.Working) string {
	if k, done := s.keys[w]; done {
		return k
	}
	leaf, formula := "", ""
	if w.Leaf != nil {
		leaf = w.Leaf.Path
	}
	if w.Formula != nil {
		formula = w.Formula.ID + w.Formula.Note
	}
	parts := []string{leaf, formula, w.Name, w.Symbol, w.Text(), w.Case, w.Assumption}
	for _, in := range w.Inputs {
		parts = append(parts, s.key(in))
	}
	sum := sha256.Sum256([]byte(strings.Join(parts, "\x00")))
	s.keys[w] = string(sum[:])
	return s.keys[w]
}

func newSheet() *sheet {
	return &sheet{number: map[string]int{}, owner: map[string]string{}, keys: map[*working.Working]string{}}
}

// add numbers w after everything it rests on.
func (s *sheet) add(w *working.Working, owner string) {
	k := s.key(w)
	if _, done := s.number[k]; done {
		return
	}
	for _, in := range w.Inputs {
		s.add(in, owner)
	}
	s.lines = append(s.lines, w)
	s.number[k] = len(s.lines)
	s.owner[k] = owner
}

// Worksheet writes every quantity of a board: symbol, value, equation with the
// numbers put in, inputs with their places, source and range of validity; then, for
// each subject, the terms that rules read, with what is missing where there is no
// value.
func Worksheet(w io.Writer, b *facts.Board) error {
	var out bytes.Buffer
	s := newSheet()
	for _, subject := range b.Subjects {
		for _, f := range subject.Facts() {
			if f.How != nil {
				s.add(f.How, subject.ID)
			}
		}
	}
	fmt.Fprintf(&out, "Worksheet of %s\n\nValues and formulas. A number in brackets refers to a line above it.\n", visible(b.ID))
	for i, line := range s.lines {
		fmt.Fprintf(&out, "\n[%d] %s\n", i+1, s.describe(line))
	}
	for _, subject := range b.Subjects {
		fmt.Fprintf(&out, "\n%s: %s\n", strings.TrimSuffix(string(subject.Kind), "s"), visible(subject.ID))
		for _, f := range subject.Facts() {
			fmt.Fprintf(&out, "  %-36s %s\n", f.Term.ID, s.factText(f))
		}
	}
	return writeVisible(w, out.String())
}

// writeVisible writes lines in which whatever came from a file can be seen.
func writeVisible(w io.Writer, text string) error {
	lines := strings.Split(text, "\n")
	for i, line := range lines {
		lines[i] = place.Visible(line)
	}
	_, err := io.WriteString(w, strings.Join(lines, "\n"))
	return err
}

func (s *sheet) factText(f *facts.Fact) string {
	switch {
	case f.Known:
		return fmt.Sprintf("%s [%d]", visible(f.Text()), s.number[s.key(f.How)])
	case f.Outside != nil:
		return "no value: " + f.Outside.Reason
	}
	return "not known; missing: " + missing(f.Lacks)
}

func missing(lacks working.Lacks) string {
	texts := make([]string, 0, len(lacks))
	for _, l := range lacks {
		texts = append(texts, lackText(l))
	}
	return visible(strings.Join(texts, "; "))
}

func lackText(l working.Lack) string {
	if len(l.OneOf) == 0 {
		return l.What
	}
	texts := make([]string, len(l.OneOf))
	for i, one := range l.OneOf {
		texts[i] = lackText(one)
	}
	return "one of: " + strings.Join(texts, ", ")
}

// describe is a line in words: value, name, case; equation and numbers; source.
func (s *sheet) describe(w *working.Working) string {
	var text strings.Builder
	fmt.Fprintf(&text, "%s = %s   %s", visible(w.Symbol), visible(w.Text()), visible(w.Name))
	if w.Case != "" {
		fmt.Fprintf(&text, "; %s", visible(w.Case))
	}
	for _, detail := range details(w) {
		text.WriteString("\n      " + detail)
	}
	if len(w.Inputs) > 0 {
		refs := make([]string, len(w.Inputs))
		for i, in := range w.Inputs {
			refs[i] = fmt.Sprintf("%s [%d]", visible(in.Symbol), s.number[s.key(in)])
		}
		text.WriteString("\n      from " + strings.Join(refs, ", "))
	}
	return text.String()
}

// details are the lines that say how a value came about.
func details(w *working.Working) []string {
	var list []string
	switch {
	case w.Leaf != nil:
		where := "stated at " + w.Leaf.Place.String()
		for _, via := range w.Leaf.Via {
			where += ", by way of " + via.String()
		}
		if w.Leaf.From != "" {
			where += ", from document " + visible(w.Leaf.From)
		}
		if w.Leaf.Claim {
			where += "; " + w.Leaf.Basis.String()
		}
		list = append(list, visible(w.Leaf.Path), where)
	case w.Formula != nil:
		list = append(list, w.Formula.Plain())
		if with := w.Formula.With(w.Inputs); with != strings.TrimPrefix(w.Formula.Plain(), w.Formula.Symbol+" = ") {
			list = append(list, w.Symbol+" = "+visible(with))
		}
		if source := w.Formula.Source.String(); source != "" {
			list = append(list, "source: "+source)
		}
		for _, interval := range w.Formula.Range {
			list = append(list, "valid for "+interval.String())
		}
		if w.Formula.Note != "" {
			list = append(list, "note: "+w.Formula.Note)
		}
	}
	if w.Assumption != "" {
		list = append(list, "assumed: "+w.Assumption)
	}
	if source := w.Source.String(); source != "" {
		list = append(list, "source: "+source)
	}
	for i := range list {
		list[i] = visible(list[i])
	}
	return list
}

// Chain writes the working behind one value as a tree, down to the lines of the
// files. What stands twice in the tree is drawn once.
func Chain(w io.Writer, subject *facts.Subject, f *facts.Fact) error {
	var out bytes.Buffer
	fmt.Fprintf(&out, "%s, %s (%s)\n", visible(subject.ID), f.Term.Label, f.Term.ID)
	if !f.Known {
		fmt.Fprintf(&out, "%s\n", newSheet().factText(f))
	} else {
		newSheet().draw(&out, f.How, "", "", map[string]bool{})
	}
	return writeVisible(w, out.String())
}

func (s *sheet) draw(out *bytes.Buffer, w *working.Working, lead, below string, drawn map[string]bool) {
	fmt.Fprintf(out, "%s%s = %s  %s", lead, visible(w.Symbol), visible(w.Text()), visible(w.Name))
	if w.Case != "" {
		fmt.Fprintf(out, "; %s", visible(w.Case))
	}
	k := s.key(w)
	if drawn[k] {
		out.WriteString(" (drawn above)\n")
		return
	}
	drawn[k] = true
	out.WriteString("\n")
	inner := below
	if len(w.Inputs) > 0 {
		inner += "│ "
	} else {
		inner += "  "
	}
	for _, detail := range details(w) {
		fmt.Fprintf(out, "%s  %s\n", inner, detail)
	}
	inputs := slices.Clone(w.Inputs)
	for i, in := range inputs {
		if i == len(inputs)-1 {
			s.draw(out, in, below+"└─ ", below+"   ", drawn)
		} else {
			s.draw(out, in, below+"├─ ", below+"│  ", drawn)
		}
	}
}
