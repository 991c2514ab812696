package report

import (
	"bytes"
	"encoding/json"
	"fmt"
	"io"
	"strings"
	"unicode"
	"unicode/utf16"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/review"
)

// JSONFormat is the version of the documented JSON format; it changes when a key
// does.
const JSONFormat = "boardproof/review/1"

// The document is described in DEVELOPERS.md. Numbers are in SI units.
type jsonDocument struct {
	Format string      `json:"format"`
	On     string      `json:"on"`
	Rules  jsonLibrary `json:"library"`
	Boards []jsonBoard `json:"boards"`
}

type jsonLibrary struct {
	Rules  int    `json:"rules"`
	SHA256 string `json:"sha256"`
}

type jsonBoard struct {
	Board     string        `json:"board"`
	Title     string        `json:"title,omitempty"`
	Revision  string        `json:"revision,omitempty"`
	OfferedBy string        `json:"offered_by,omitempty"`
	Stage     string        `json:"stage,omitempty"`
	Shown     bool          `json:"nothing_open"`
	Counts    jsonCounts    `json:"counts"`
	Verdicts  []jsonVerdict `json:"verdicts"`
	Queries   []jsonQuery   `json:"queries"`
	Files     []jsonFile    `json:"files"`
}

type jsonCounts struct {
	Complies int `json:"complies"`
	Departs  int `json:"departs"`
	Clarify  int `json:"clarify"`
	Exempt   int `json:"exempt"`
	Unjudged int `json:"unjudged"`
}

type jsonVerdict struct {
	Rule     string           `json:"rule"`
	Title    string           `json:"title"`
	Line     string           `json:"line"`
	Kind     string           `json:"kind"`
	Subject  string           `json:"subject"`
	Verdict  string           `json:"verdict"`
	Grade    string           `json:"grade"`
	Basis    string           `json:"basis,omitempty"`
	Why      string           `json:"why,omitempty"`
	State    string           `json:"supply_state,omitempty"`
	Compared []jsonComparison `json:"compared,omitempty"`
	Observed *jsonValue       `json:"observed,omitempty"`
	Limit    *jsonValue       `json:"limit,omitempty"`
	Place    *jsonPlace       `json:"place,omitempty"`
	Cures    []string         `json:"cures,omitempty"`
}

type jsonComparison struct {
	Observed *jsonValue `json:"observed"`
	Limit    *jsonValue `json:"limit"`
	Margin   string     `json:"margin,omitempty"`
}

type jsonValue struct {
	Term  string   `json:"term,omitempty"`
	Value *float64 `json:"value,omitempty"`
	Word  string   `json:"word,omitempty"`
	Unit  string   `json:"unit,omitempty"`
	Text  string   `json:"text,omitempty"`
}

type jsonPlace struct {
	File   string `json:"file"`
	Line   int    `json:"line,omitempty"`
	Column int    `json:"column,omitempty"`
}

type jsonQuery struct {
	What    string     `json:"what"`
	Path    string     `json:"path,omitempty"`
	Example string     `json:"example,omitempty"`
	Because string     `json:"because,omitempty"`
	Grade   string     `json:"grade,omitempty"`
	Place   *jsonPlace `json:"place,omitempty"`
	Waiting []jsonWait `json:"waiting"`
}

type jsonWait struct {
	Rule     string   `json:"rule"`
	Subjects []string `json:"subjects"`
}

type jsonFile struct {
	Name   string `json:"name"`
	SHA256 string `json:"sha256"`
}

// JSON writes reviews as one document.
func JSON(w io.Writer, reviews []*review.Review) error {
	doc := jsonDocument{Format: JSONFormat, Boards: []jsonBoard{}}
	for _, r := range reviews {
		doc.On = r.On.Format("2006-01-02")
		doc.Rules = jsonLibrary{Rules: len(r.Pack.Rules()), SHA256: r.Pack.Digest()}
		doc.Boards = append(doc.Boards, boardOf(r))
	}
	return encode(w, doc)
}

// encode leaves <, > and & as they are: the file is JSON, not a part of a page.
// Characters that a terminal would obey or a reader could not see are escaped.
func encode(w io.Writer, doc any) error {
	var out bytes.Buffer
	enc := json.NewEncoder(&out)
	enc.SetEscapeHTML(false)
	enc.SetIndent("", "  ")
	if err := enc.Encode(doc); err != nil {
		return err
	}
	var text strings.Builder
	for _, r := range out.String() {
		if r >= 0x7f && r < 0xa0 || unicode.Is(unicode.Cf, r) {
			for _, unit := range utf16.Encode([]rune{r}) {
				fmt.Fprintf(&text, `\u%04x`, unit)
			}
			continue
		}
		text.WriteRune(r)
	}
	_, err := io.WriteString(w, text.String())
	return err
}

func boardOf(r *review.Review) jsonBoard {
	c := r.Counts
	b := jsonBoard{
		Board: r.Facts.ID, Title: r.Board.Title.Value, Revision: r.Board.Revision.Value,
		OfferedBy: r.Board.OfferedBy.Value, Stage: r.Board.Stage.Value.Text(),
		Shown:    r.Open(review.AnyQuery) == 0,
		Counts:   jsonCounts{c.Complies, c.Departs, c.Clarify, c.Exempt, c.Unjudged},
		Verdicts: []jsonVerdict{}, Queries: []jsonQuery{}, Files: []jsonFile{},
	}
	cures := map[string][]string{}
	for _, d := range r.Departures {
		for _, cure := range d.Cures {
			for _, s := range d.Subjects() {
				cures[d.Rule.ID+"\x00"+s] = append(cures[d.Rule.ID+"\x00"+s], cure.Long)
			}
		}
	}
	for _, f := range r.Findings {
		v := jsonVerdict{
			Rule: f.Rule.ID, Title: f.Rule.Title, Line: f.Rule.Line, Kind: string(f.Subject.Kind), Subject: f.Subject.ID,
			Verdict: f.Outcome.String(), Grade: f.Rule.Grade, Why: f.Why, State: f.State,
			Place: placeOf(f.Place), Cures: cures[f.Rule.ID+"\x00"+f.Subject.ID],
		}
		if f.Outcome.String() == "complies" {
			v.Basis = f.Basis.String()
		}
		for _, c := range f.Compared {
			v.Compared = append(v.Compared, jsonComparison{valueOf(c.Found), valueOf(c.Required), c.MarginText})
		}
		if len(v.Compared) > 0 {
			v.Observed, v.Limit = v.Compared[0].Observed, v.Compared[0].Limit
		}
		b.Verdicts = append(b.Verdicts, v)
	}
	for _, q := range r.Queries {
		jq := jsonQuery{What: q.What, Path: q.Path, Example: q.Unit, Because: q.Because, Grade: q.Grade(), Place: placeOf(q.Place), Waiting: []jsonWait{}}
		for _, w := range q.Rules() {
			jq.Waiting = append(jq.Waiting, jsonWait{w.Rule.ID, w.Subjects})
		}
		b.Queries = append(b.Queries, jq)
	}
	for _, f := range r.Board.Files() {
		b.Files = append(b.Files, jsonFile(f))
	}
	return b
}

func placeOf(p place.Place) *jsonPlace {
	if p.IsZero() {
		return nil
	}
	return &jsonPlace{p.File, p.Line, p.Column}
}

func valueOf(s review.Side) *jsonValue {
	v := &jsonValue{Text: s.Text}
	switch f := s.Fact; {
	case f == nil:
		v.Word = s.Text
	case !f.Known:
		v.Term = f.Term.ID
	case f.Term.Value == facts.Number:
		number := f.Number
		v.Term, v.Value, v.Unit = f.Term.ID, &number, f.Term.Dimension.Base
	default:
		v.Term, v.Word = f.Term.ID, f.Word
	}
	return v
}
