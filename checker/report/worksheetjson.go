package report

import (
	"io"
	"slices"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/working"
)

// WorksheetFormat is the version of the documented JSON format of a worksheet.
const WorksheetFormat = "boardproof/worksheet/1"

type jsonWorksheet struct {
	Format     string         `json:"format"`
	Board      string         `json:"board"`
	Quantities []jsonQuantity `json:"quantities"`
}

// jsonQuantity is a term of a subject, or a value below one. Lines are referred to by
// their number, counted from 1.
type jsonQuantity struct {
	Number     int         `json:"number,omitempty"`
	Kind       string      `json:"kind,omitempty"`
	Subject    string      `json:"subject"`
	Term       string      `json:"term,omitempty"`
	Symbol     string      `json:"symbol,omitempty"`
	Name       string      `json:"name"`
	Value      *float64    `json:"value,omitempty"`
	Word       string      `json:"word,omitempty"`
	Unit       string      `json:"unit,omitempty"`
	State      string      `json:"supply_state,omitempty"`
	Equation   string      `json:"equation,omitempty"`
	WithValues string      `json:"with_numbers,omitempty"`
	Source     string      `json:"source,omitempty"`
	Range      []string    `json:"range,omitempty"`
	Inputs     []jsonInput `json:"inputs,omitempty"`
	Path       string      `json:"path,omitempty"`
	Place      *jsonPlace  `json:"place,omitempty"`
	Document   string      `json:"document,omitempty"`
	Basis      string      `json:"basis,omitempty"`
	Assumption string      `json:"assumption,omitempty"`
	Missing    []string    `json:"missing,omitempty"`
	Outside    string      `json:"outside,omitempty"`
}

type jsonInput struct {
	Number int        `json:"number"`
	Symbol string     `json:"symbol"`
	Value  *float64   `json:"value,omitempty"`
	Word   string     `json:"word,omitempty"`
	Unit   string     `json:"unit,omitempty"`
	Place  *jsonPlace `json:"place,omitempty"`
}

// Chosen is the part of a worksheet that was asked for; all of it if there is no
// subject.
type Chosen struct {
	Subject *facts.Subject
	Terms   []string
}

func (c Chosen) has(s *facts.Subject, f *facts.Fact) bool {
	return c.Subject == nil || c.Subject == s && slices.Contains(c.Terms, f.Term.ID)
}

// WorksheetJSON writes the worksheet as JSON: every line in the order of the text
// worksheet, then every term with its line, or with what it is missing.
func WorksheetJSON(w io.Writer, b *facts.Board, chosen Chosen) error {
	s := newSheet()
	for _, subject := range b.Subjects {
		for _, f := range subject.Facts() {
			if f.How != nil && chosen.has(subject, f) {
				s.add(f.How, subject.ID)
			}
		}
	}
	doc := jsonWorksheet{Format: WorksheetFormat, Board: b.ID, Quantities: []jsonQuantity{}}
	for _, line := range s.lines {
		doc.Quantities = append(doc.Quantities, s.quantity(line))
	}
	for _, subject := range b.Subjects {
		for _, f := range subject.Facts() {
			if chosen.has(subject, f) {
				doc.Quantities = append(doc.Quantities, s.term(subject, f))
			}
		}
	}
	return encode(w, doc)
}

func (s *sheet) quantity(w *working.Working) jsonQuantity {
	k := s.key(w)
	q := jsonQuantity{Number: s.number[k], Subject: s.owner[k], Symbol: w.Symbol, Name: w.Name, State: w.Case, Assumption: w.Assumption, Source: w.Source.String()}
	q.Value, q.Word, q.Unit = amount(w)
	if f := w.Formula; f != nil {
		q.Equation, q.WithValues, q.Source = f.Plain(), f.With(w.Inputs), f.Source.String()
		for _, interval := range f.Range {
			q.Range = append(q.Range, interval.String())
		}
	}
	if l := w.Leaf; l != nil {
		q.Path, q.Place, q.Document = l.Path, placeOf(l.Place), l.From
		if l.Claim {
			q.Basis = l.Basis.String()
		}
	}
	for _, in := range w.Inputs {
		input := jsonInput{Number: s.number[s.key(in)], Symbol: in.Symbol}
		input.Value, input.Word, input.Unit = amount(in)
		if in.Leaf != nil {
			input.Place = placeOf(in.Leaf.Place)
		}
		q.Inputs = append(q.Inputs, input)
	}
	return q
}

// amount is the value in SI with its unit, or the word.
func amount(w *working.Working) (value *float64, word, unit string) {
	if w.Dimension == nil {
		return nil, w.Word, ""
	}
	number := w.Number
	return &number, "", w.Dimension.Base
}

func (s *sheet) term(subject *facts.Subject, f *facts.Fact) jsonQuantity {
	q := jsonQuantity{Kind: string(subject.Kind), Subject: subject.ID, Term: f.Term.ID, Symbol: f.Term.Symbol, Name: f.Term.Label}
	switch {
	case f.Known:
		line := s.quantity(f.How)
		line.Kind, line.Subject, line.Term, line.Name = q.Kind, q.Subject, q.Term, q.Name
		return line
	case f.Outside != nil:
		q.Outside = f.Outside.Reason
	default:
		for _, l := range f.Lacks {
			q.Missing = append(q.Missing, strings.TrimSpace(lackText(l)))
		}
	}
	return q
}
