package report_test

import (
	"encoding/json"
	"fmt"
	"io"
	"strings"
	"testing"

	"github.com/charmbracelet/x/ansi"

	"boardproof/checker/place"
	"boardproof/checker/report"
	"boardproof/checker/review"
	"boardproof/checker/working"
)

// controls are texts that the reader of board files refuses. A report is the second
// wall: it cleans them even if they come by another way.
var controls = []hostile{
	{"colour", "\x1b[31mred\x1b[0m"},
	{"title of the window", "\x1b]0;pwned\x07"},
	{"link of the terminal", "\x1b]8;;https://example.invalid\x1b\\x\x1b]8;;\x1b\\"},
	{"device control", "\x1bPx\x1b\\ \x1b_x\x1b\\ \x1b^x\x1b\\"},
	{"eight-bit controls", "\u009b31mred\u009d0;x\u009c\u0085x"},
	{"nought, bell, backspace, delete", "a\x00b\x07c\x08d\x7fe"},
	{"return", "harmless\rdeparts: none"},
	{"lines", "x\n# heading\n\n| a | b |\n|---|---|\n```\n"},
	{"tabs", "a\tb\t\tc\v\f"},
	{"separators of lines", "a\u2028b\u2029c"},
	{"right-to-left override", "a\u202eb\u202c"},
	{"embeddings and isolates", "\u202aa\u202b\u202d\u2066b\u2067\u2068\u2069\u200e\u200f"},
	{"no text at all", "a\xff\xfeb"},
}

// spoil puts a text into everything of a review that could have come from a file or
// from a name in one.
func spoil(r *review.Review, text string) {
	dirty := func(s *string) {
		if *s != "" {
			*s += " " + text
		}
	}
	dirtyPlace := func(p *place.Place) {
		if p.File != "" {
			p.File += text
		}
	}
	dirty(&r.Board.Title.Value)
	dirty(&r.Board.Revision.Value)
	dirty(&r.Board.OfferedBy.Value)
	dirty(&r.Board.Roles.PreparedBy.Value)
	dirty(&r.Board.Roles.CheckedBy.Value)
	for i := range r.Board.Documents.Entries {
		d := &r.Board.Documents.Entries[i]
		dirty(&d.Name)
		dirty(&d.Value.Title.Value)
		dirty(&d.Value.Number.Value)
		dirty(&d.Value.Revision.Value)
	}
	dirty(&r.Facts.ID)
	for i := range r.Facts.States {
		dirty(&r.Facts.States[i].Name)
		dirty(&r.Facts.States[i].ExcludedBy)
		dirtyPlace(&r.Facts.States[i].Place)
	}
	spoilWorking := spoilerOf(dirty, dirtyPlace)
	for _, s := range r.Facts.Subjects {
		dirty(&s.ID)
		dirtyPlace(&s.Place)
		for _, f := range s.Facts() {
			dirty(&f.Word)
			f.How.Walk(spoilWorking)
			f.Lacks = spoilLacks(f.Lacks, dirty, dirtyPlace)
			if f.Outside != nil {
				dirty(&f.Outside.Reason)
			}
		}
	}
	for _, f := range r.Findings {
		dirty(&f.State)
		dirty(&f.Why)
		dirtyPlace(&f.Place)
		for i := range f.Compared {
			c := &f.Compared[i]
			dirty(&c.Found.Text)
			dirty(&c.Required.Text)
			dirty(&c.MarginText)
			dirtyPlace(&c.Found.Place)
			dirtyPlace(&c.Required.Place)
		}
	}
	for _, d := range r.Departures {
		for i := range d.Others {
			dirty(&d.Others[i])
		}
		for i := range d.Cures {
			dirty(&d.Cures[i].Short)
			dirty(&d.Cures[i].Long)
		}
		dirty(&d.NoCure)
	}
	for _, q := range r.Queries {
		q.Lack = spoilLacks(working.Lacks{q.Lack}, dirty, dirtyPlace)[0]
	}
	for i := range r.Quantities {
		for k := range r.Quantities[i].Subjects {
			dirty(&r.Quantities[i].Subjects[k])
		}
	}
	for i := range r.Assumptions {
		dirty(&r.Assumptions[i].Name)
		dirty(&r.Assumptions[i].Value)
		dirty(&r.Assumptions[i].Why)
	}
}

// spoilerOf spoils each line of a working once; formulas are shared by all boards and
// are copied before.
func spoilerOf(dirty func(*string), dirtyPlace func(*place.Place)) func(*working.Working) {
	done := map[*working.Working]bool{}
	return func(w *working.Working) {
		if done[w] {
			return
		}
		done[w] = true
		for _, s := range []*string{&w.Symbol, &w.Name, &w.Case, &w.Word, &w.Assumption} {
			dirty(s)
		}
		if w.Leaf != nil {
			leaf := *w.Leaf
			dirty(&leaf.Path)
			dirty(&leaf.Title)
			dirty(&leaf.From)
			dirtyPlace(&leaf.Place)
			w.Leaf = &leaf
		}
		if w.Formula != nil {
			formula := *w.Formula
			dirty(&formula.Symbol)
			dirty(&formula.Equation)
			dirty(&formula.Note)
			w.Formula = &formula
		}
	}
}

func spoilLacks(lacks working.Lacks, dirty func(*string), dirtyPlace func(*place.Place)) working.Lacks {
	out := make(working.Lacks, len(lacks))
	for i, l := range lacks {
		dirty(&l.Path)
		dirty(&l.What)
		dirty(&l.Unit)
		dirty(&l.Because)
		dirtyPlace(&l.Place)
		l.OneOf = spoilLacks(l.OneOf, dirty, dirtyPlace)
		out[i] = l
	}
	return out
}

// TestControlCharacters: whatever a review holds, what is printed cannot move a
// cursor, turn a line round, or build a page in another way.
func TestControlCharacters(t *testing.T) {
	t.Parallel()
	as := arrangements[1]
	spoiled := func(t *testing.T, text string) *review.Review {
		r := reviewOf(t, "board.yaml", boardWith(t, tame, as), false)
		spoil(r, text)
		return r
	}
	plain := spoiled(t, tame)
	plainPage := markdownOf(t, plain)
	wantBuild := build(plainPage)
	wantLines := strings.Count(set(t, func(w io.Writer) error { return report.Worksheet(w, plain.Facts) }), "\n")
	for _, c := range controls {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			r := spoiled(t, c.text)
			page := markdownOf(t, r)
			if difference := different(build(page), wantBuild); difference != "" {
				t.Errorf("the report is built in another way: %s", difference)
			}
			checkVisible(t, page)
			checkVisible(t, set(t, func(w io.Writer) error { return report.Terminal(w, r, 80, false) }))
			coloured := set(t, func(w io.Writer) error { return report.Terminal(w, r, 80, true) })
			checkVisible(t, ansi.Strip(coloured))
			for _, sequence := range []string{"\x1b]", "\x1bP", "\x1b_", "\x1b^", "\u009b"} {
				if strings.Contains(coloured, sequence) {
					t.Errorf("with colour the report has the sequence %q", sequence)
				}
			}
			sheet := set(t, func(w io.Writer) error { return report.Worksheet(w, r.Facts) })
			checkVisible(t, sheet)
			if n := strings.Count(sheet, "\n"); n != wantLines {
				t.Errorf("the worksheet has %d lines instead of %d", n, wantLines)
			}
			for _, s := range r.Facts.Subjects {
				for _, f := range s.Facts() {
					if f.Known && strings.HasPrefix(f.Term.ID, "fault.peak") {
						checkVisible(t, set(t, func(w io.Writer) error { return report.Chain(w, s, f) }))
					}
				}
			}
			for name, write := range map[string]func(io.Writer) error{
				"review":    func(w io.Writer) error { return report.JSON(w, []*review.Review{r}) },
				"worksheet": func(w io.Writer) error { return report.WorksheetJSON(w, r.Facts, report.Chosen{}) },
			} {
				var doc any
				if text := set(t, write); json.Unmarshal([]byte(text), &doc) != nil || strings.ContainsAny(text, "\x00\x07\x08\x0b\x0c\r\x1b\x7f\u009b") {
					t.Errorf("the %s as JSON is not read, or has control characters", name)
				}
			}
		})
	}
}

// TestSpoilReachesTheReport: the test above would see nothing if nothing were spoiled.
func TestSpoilReachesTheReport(t *testing.T) {
	t.Parallel()
	r := reviewOf(t, "board.yaml", boardWith(t, tame, arrangements[0]), false)
	spoil(r, "SPOILED")
	for name, write := range map[string]func(io.Writer) error{
		"markdown":       func(w io.Writer) error { return report.Markdown(w, r) },
		"worksheet":      func(w io.Writer) error { return report.Worksheet(w, r.Facts) },
		"JSON":           func(w io.Writer) error { return report.JSON(w, []*review.Review{r}) },
		"worksheet JSON": func(w io.Writer) error { return report.WorksheetJSON(w, r.Facts, report.Chosen{}) },
	} {
		if n := strings.Count(set(t, write), "SPOILED"); n < 50 {
			t.Errorf("%s: a spoiled text is seen %s", name, fmt.Sprintf("%d times, expected at least 50", n))
		}
	}
}
