package review_test

import (
	"bytes"
	"context"
	"encoding/json"
	"math"
	"regexp"
	"slices"
	"strings"
	"testing"

	"boardproof/checker/facts"
	"boardproof/checker/report"
	"boardproof/checker/review"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
	"boardproof/checker/units"
)

// judgedBoards are the demonstration, the complete board, and boards with all kinds of
// things missing.
func judgedBoards(t *testing.T) []*spec.Board {
	t.Helper()
	boards := []*spec.Board{
		mustReadText(t, complete), mustReadText(t, "board: bare\n"),
		// Beyond the range of a formula, and a fault that nothing is certain to clear.
		mustReadText(t, strings.Replace(complete, "duration: 1 s", "duration: {value: 5 s, confirmed: yes}", 1)),
		mustReadText(t, strings.Replace(complete, "pickup: 8 kA", "pickup: 30 kA", 1)),
	}
	for _, name := range demonstration {
		b := mustRead(t, nil, name)
		boards = append(boards, b)
		for i, v := range withoutLeaves(b) {
			if i%9 == 0 {
				boards = append(boards, v.board)
			}
		}
	}
	return boards
}

// TestEveryFindingCanBeActedUpon is the fourth invariant: every finding has a place, a rule
// and a reference, and what departs or complies by a number shows both numbers with units.
func TestEveryFindingCanBeActedUpon(t *testing.T) {
	t.Parallel()
	number := regexp.MustCompile(`^(at (least|most) )?-?[0-9][0-9.]* ?[^0-9 ]`)
	for _, r := range reviewsOf(t, judgedBoards(t)...) {
		for _, f := range r.Findings {
			name := r.Board.File() + " " + f.Rule.ID + " " + f.Subject.ID
			if f.Place.IsZero() || f.Place.File == "" || f.Place.Line == 0 {
				t.Errorf("%s (%v) has no place", name, f.Outcome)
			}
			if f.Rule.ID == "" || f.Rule.Title == "" || len(f.Rule.References) == 0 {
				t.Errorf("%s has no rule or no reference", name)
			}
			if f.Outcome != rules.Departs && f.Outcome != rules.Complies {
				continue
			}
			if len(f.Compared) == 0 {
				t.Errorf("%s (%v) shows no comparison", name, f.Outcome)
			}
			for _, c := range f.Compared {
				for side, s := range map[string]review.Side{"found": c.Found, "required": c.Required} {
					switch {
					case s.Text == "" || s.Label == "":
						t.Errorf("%s (%v): the %s side has no text or no label: %+v", name, f.Outcome, side, s)
					case s.Fact != nil && s.Fact.Term.Value == facts.Number && !number.MatchString(s.Text):
						t.Errorf("%s (%v): the %s side %q is no number with its unit", name, f.Outcome, side, s.Text)
					}
				}
				if c.Found.Fact != nil && c.Required.Fact != nil && c.Found.Fact.Term.Value == facts.Number && c.MarginText == "" {
					t.Errorf("%s (%v) shows no margin", name, f.Outcome)
				}
				if f.Outcome == rules.Departs && !c.Equality && c.Margin > 0 {
					t.Errorf("%s departs with a margin to spare: %s", name, c.MarginText)
				}
			}
		}
	}
}

// TestEveryQuestionIsAskedOnce holds queries and findings together: what waits is asked,
// and nothing is asked twice.
func TestEveryQuestionIsAskedOnce(t *testing.T) {
	t.Parallel()
	for _, r := range reviewsOf(t, judgedBoards(t)...) {
		asked := map[string]bool{}
		var waiting []*review.Finding
		for _, q := range r.Queries {
			if asked[q.Key()] {
				t.Errorf("%s: %s is asked twice", r.Board.File(), q.Key())
			}
			asked[q.Key()] = true
			if q.What == "" || q.Place.IsZero() {
				t.Errorf("%s: a question without words or place: %+v", r.Board.File(), q.Lack)
			}
			waiting = append(waiting, q.Waiting...)
		}
		for _, f := range r.Findings {
			if (f.Outcome == rules.Clarify) != slices.Contains(waiting, f) {
				t.Errorf("%s: %s %s is %v, and waiting for an answer: %v", r.Board.File(), f.Rule.ID, f.Subject.ID, f.Outcome, slices.Contains(waiting, f))
			}
		}
	}
}

// printed is a review in every format that a test can compare.
func printed(t *testing.T, pack *rules.Pack, boards ...*spec.Board) []string {
	t.Helper()
	reviews, err := review.Make(context.Background(), pack, boards, review.Options{On: on, Cures: true})
	if err != nil {
		t.Fatal(err)
	}
	var all []string
	for _, r := range reviews {
		var out bytes.Buffer
		for _, err := range []error{report.Markdown(&out, r), report.JSON(&out, []*review.Review{r}), report.Worksheet(&out, r.Facts), report.WorksheetJSON(&out, r.Facts, report.Chosen{})} {
			if err != nil {
				t.Fatal(err)
			}
		}
		all = append(all, out.String())
	}
	return all
}

// TestSameFilesSameBytes is the fifth invariant: neither the order of the boards nor the
// number of workers nor a second run changes a byte.
func TestSameFilesSameBytes(t *testing.T) {
	t.Parallel()
	read := func() []*spec.Board {
		return []*spec.Board{mustRead(t, nil, demonstration[0]), mustRead(t, nil, demonstration[1]), mustReadText(t, complete), mustReadText(t, "board: bare\n")}
	}
	want := printed(t, ownPack(t), read()...)
	for _, c := range []struct {
		name    string
		options rules.Options
		reverse bool
	}{
		{"again", rules.Options{}, false},
		{"one worker", rules.Options{Workers: 1}, false},
		{"two workers", rules.Options{Workers: 2}, false},
		{"seven workers, boards apart", rules.Options{Workers: 7, Batch: 1}, false},
		{"other order", rules.Options{Workers: 2}, true},
		{"other order, pairs", rules.Options{Workers: 3, Batch: 2}, true},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			pack, problems := rules.LoadOwn(facts.Terms(), c.options)
			if problems.Len() > 0 {
				t.Fatal(problems.All())
			}
			boards := read()
			if c.reverse {
				slices.Reverse(boards)
			}
			got := printed(t, pack, boards...)
			if c.reverse {
				slices.Reverse(got)
			}
			for i := range want {
				if got[i] != want[i] {
					t.Errorf("%s differs: %s", boards[i].File(), firstDifference(want[i], got[i]))
				}
			}
		})
	}
}

func firstDifference(a, b string) string {
	left, right := strings.Split(a, "\n"), strings.Split(b, "\n")
	for i := range min(len(left), len(right)) {
		if left[i] != right[i] {
			return left[i] + " | " + right[i]
		}
	}
	return "one is longer"
}

// TestOneNumberEverywhere is the ninth invariant: what a rule compared, what the worksheet
// shows and what the report prints are the same number.
func TestOneNumberEverywhere(t *testing.T) {
	t.Parallel()
	for _, r := range reviewsOf(t, mustRead(t, nil, demonstration[0]), mustRead(t, nil, demonstration[1]), mustReadText(t, complete)) {
		sheet := worksheetOf(t, r.Facts)
		var page bytes.Buffer
		if err := report.Markdown(&page, r); err != nil {
			t.Fatal(err)
		}
		text := strings.ReplaceAll(page.String(), `\`, "")
		compared := 0
		for _, f := range r.Findings {
			input := f.Subject.Input("here")
			for _, c := range f.Compared {
				for _, side := range []review.Side{c.Found, c.Required} {
					if side.Fact == nil || !side.Fact.Known {
						continue
					}
					term := side.Fact.Term
					if side.Text != "" && (f.Outcome == rules.Departs || f.Outcome == rules.Complies) && !strings.Contains(text, side.Text) {
						t.Errorf("%s %s: %q is not in the report", f.Rule.ID, f.Subject.ID, side.Text)
					}
					if printed := numberIn(side.Text); term.Value == facts.Number && side.Text != "" && !printsAs(t, f.Subject, side.Fact, printed) {
						t.Errorf("%s of %s is %v and printed %q", term.ID, f.Subject.ID, side.Fact.Number, side.Text)
					}
					if term.Kind == facts.Limits {
						continue
					}
					compared++
					line, ok := sheet[f.Subject.ID+" "+term.ID]
					judged := dig(input, strings.Split(term.ID, "."))
					switch {
					case !ok:
						t.Errorf("%s of %s is not in the worksheet", term.ID, f.Subject.ID)
					case term.Value == facts.Number && (line.Value == nil || *line.Value != side.Fact.Number || judged != side.Fact.Number):
						t.Errorf("%s of %s: worksheet %v, rule %v, finding %v", term.ID, f.Subject.ID, line.Value, judged, side.Fact.Number)
					case term.Value != facts.Number && line.Word != side.Fact.Word:
						t.Errorf("%s of %s: worksheet %q, finding %q", term.ID, f.Subject.ID, line.Word, side.Fact.Word)
					}
				}
			}
		}
		for _, q := range r.Quantities {
			if q.Fact.Known && !strings.Contains(text, q.Fact.Text()) {
				t.Errorf("the key quantity %s %s is not in the report", q.Fact.Term.ID, q.Fact.Text())
			}
		}
		if compared < 15 {
			t.Errorf("%s: only %d numbers compared", r.Board.File(), compared)
		}
	}
}

// numberIn is the quantity at the beginning of a text: "65 kA" of "65 kA for 1 s".
func numberIn(text string) string {
	before, _, _ := strings.Cut(text, " for ")
	return before
}

// printsAs reads a printed quantity back and compares it with the fact, a Joule integral as
// the current that brings it in the rated time of the bars.
func printsAs(t *testing.T, s *facts.Subject, f *facts.Fact, printed string) bool {
	t.Helper()
	want, dimension := f.Number, f.Term.Dimension
	if rated := s.Fact("withstand.duration"); f.Term.As != nil && rated != nil && rated.Known {
		want, dimension = math.Sqrt(f.Number/rated.Number), units.Ampere(0).Dimension()
	}
	got, err := dimension.Parse(printed)
	if err != nil {
		t.Errorf("%q cannot be read back: %v", printed, err)
	}
	return math.Abs(got-want) <= 0.01*math.Abs(want)
}

type worksheetLine struct {
	Subject, Term, Word string
	Value               *float64
}

func worksheetOf(t *testing.T, b *facts.Board) map[string]worksheetLine {
	t.Helper()
	var out bytes.Buffer
	if err := report.WorksheetJSON(&out, b, report.Chosen{}); err != nil {
		t.Fatal(err)
	}
	var doc struct{ Quantities []worksheetLine }
	if err := json.Unmarshal(out.Bytes(), &doc); err != nil {
		t.Fatal(err)
	}
	lines := map[string]worksheetLine{}
	for _, q := range doc.Quantities {
		if q.Term != "" {
			lines[q.Subject+" "+q.Term] = q
		}
	}
	return lines
}

func dig(v any, path []string) any {
	for _, step := range path {
		m, ok := v.(map[string]any)
		if !ok {
			return nil
		}
		v = m[step]
	}
	return v
}
