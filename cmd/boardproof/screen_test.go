package main

import (
	"context"
	"fmt"
	"regexp"
	"strings"
	"testing"
	"time"
	"unicode"

	"github.com/charmbracelet/x/ansi"

	"boardproof/checker/review"
	"boardproof/checker/spec"
)

// screenLines and screenColumns are the screen on which the summary has to fit.
const (
	screenLines   = 24
	screenColumns = 80
)

// departing is the submission of the demonstration that departs and is asked.
const departing = "specs/brackwater/tenderer-d.yaml"

var bareWord = regexp.MustCompile(`(?i)\bpass(es|ed)?\b`)

func terminalReport(t *testing.T, status int, file string) []string {
	t.Helper()
	return strings.Split(output(t, status, "review", "--format", "terminal", "--color", "never", "--on", onDate, file), "\n")
}

// squeeze takes all blanks and line ends out, so that it does not matter where a
// line was folded.
func squeeze(text string) string {
	return strings.Map(func(r rune) rune {
		if unicode.IsSpace(r) {
			return -1
		}
		return r
	}, text)
}

// TestFirstScreen: who and what, the judgement, the lines of defence, the worst three
// departures with their numbers, place and cure, and the first query are on the
// first screen. What they are comes from the review, not from this test.
func TestFirstScreen(t *testing.T) {
	atRoot(t)
	screen := squeeze(strings.Join(terminalReport(t, statusOpen, departing)[:screenLines], "\n"))
	r := reviewOf(t, departing)
	if len(r.Departures) < 3 || len(r.Queries) == 0 {
		t.Fatalf("%s has %d departures and %d queries, the screen is tried with 3 and 1", departing, len(r.Departures), len(r.Queries))
	}
	expect := func(what, text string) {
		t.Helper()
		if text == "" || !strings.Contains(screen, squeeze(text)) {
			t.Errorf("the first %d lines do not say %s, %q", screenLines, what, text)
		}
	}
	expect("which board", r.Facts.ID)
	expect("which revision", "revision "+r.Board.Revision.Value)
	expect("who offered it", "Offered by "+r.Board.OfferedBy.Value)
	expect("the date", onDate)
	expect("the judgement", "Not shown to be safe as submitted")
	expect("how much was judged", fmt.Sprintf("of %d requirements", len(r.Findings)))
	expect("how much departs", fmt.Sprintf("%d depart", r.Counts.Departs))
	expect("how much is not proven", fmt.Sprintf("%d are not proven", r.Counts.Clarify))
	expect("how much complies", fmt.Sprintf("%d compl", r.Counts.Complies))
	for i, name := range []string{"prevention", "limitation", "regulation"} {
		expect("the line of defence", fmt.Sprintf("%d %s", i+1, name))
	}
	for i, d := range r.Departures[:3] {
		c, ok := d.Decisive()
		if !ok {
			t.Fatalf("departure %d compares nothing", i+1)
		}
		expect("the departure", d.Rule.Title)
		expect("its subject", d.Subject.ID)
		expect("what was found", "found "+c.Found.Text)
		expect("what is required", "required "+c.Required.Text)
		if c.MarginText != "" {
			expect("the margin", c.MarginText)
		}
		expect("the place", fmt.Sprintf("line %d", d.Place.Line))
		if len(d.Cures) > 0 {
			expect("the cure", d.Cures[0].Short)
		}
	}
	expect("the first query", r.Queries[0].What)
}

func reviewOf(t testing.TB, file string) *review.Review {
	t.Helper()
	pack, err := loadLibrary()
	if err != nil {
		t.Fatal(err)
	}
	board, _, problems := spec.Read(file, spec.Options{})
	if problems.Len() > 0 {
		t.Fatalf("%s: %v", file, problems.All()[0])
	}
	on, err := time.Parse(time.DateOnly, onDate)
	if err != nil {
		t.Fatal(err)
	}
	reviews, err := review.Make(context.Background(), pack, []*spec.Board{board}, review.Options{On: on, Cures: true})
	if err != nil {
		t.Fatal(err)
	}
	return reviews[0]
}

// TestNoLineIsWider: nothing on a terminal of 80 columns is folded by the terminal.
func TestNoLineIsWider(t *testing.T) {
	atRoot(t)
	for file, status := range map[string]int{departing: statusOpen, "specs/brackwater/tenderer-a.yaml": statusNothingOpen} {
		for i, line := range terminalReport(t, status, file) {
			if width := ansi.StringWidth(line); width > screenColumns {
				t.Errorf("%s: line %d has %d columns: %s", file, i+1, width, line)
			}
		}
	}
}
