package review_test

import (
	"fmt"
	"os"
	"path"
	"path/filepath"
	"slices"
	"strings"
	"testing"

	"boardproof/checker/facts"
	"boardproof/checker/review"
	"boardproof/checker/rules"
)

// mark introduces what a review has to find in a line of a board file:
//
//	peak_withstand: 63 kA  # review here: WTH-02 departs, WTH-03 clarify
const mark = "# review here: "

// marked lists the board files that say where a review has to point.
func marked(t *testing.T) []string {
	t.Helper()
	names, err := filepath.Glob(path.Join(root, "testdata/boards/*.yaml"))
	if err != nil || len(names) == 0 {
		t.Fatalf("no marked boards: %v", err)
	}
	for i, name := range names {
		names[i] = strings.TrimPrefix(filepath.ToSlash(name), root+"/")
	}
	return names
}

// marks are the findings wanted in a file: "WTH-02 departs" by line.
func marks(t *testing.T, name string) map[int][]string {
	t.Helper()
	text, err := os.ReadFile(path.Join(root, name))
	if err != nil {
		t.Fatal(err)
	}
	wanted := map[int][]string{}
	for i, line := range strings.Split(string(text), "\n") {
		if _, list, ok := strings.Cut(line, mark); ok {
			wanted[i+1] = strings.Split(strings.TrimSpace(list), ", ")
		}
	}
	return wanted
}

// TestMarkedBoards holds every mark against the findings of its line, and wants no
// departure that is not marked: a file without marks departs from nothing.
func TestMarkedBoards(t *testing.T) {
	t.Parallel()
	for _, name := range marked(t) {
		t.Run(path.Base(name), func(t *testing.T) {
			t.Parallel()
			wanted := marks(t, name)
			found := map[int][]string{}
			for _, f := range reviewsOf(t, mustRead(t, nil, name))[0].Findings {
				said := f.Rule.ID + " " + f.Outcome.String()
				line := f.Place.Line
				if f.Place.File != name {
					line = 0
				}
				found[line] = append(found[line], said)
				if f.Outcome == rules.Departs && !slices.Contains(wanted[line], said) {
					t.Errorf("%s of %s at %v is not marked", said, f.Subject.ID, f.Place)
				}
			}
			for line, list := range wanted {
				for _, want := range list {
					if !slices.Contains(found[line], want) {
						t.Errorf("%s:%d: no %s; there is %q", name, line, want, found[line])
					}
				}
			}
		})
	}
}

// boardsOfTheTests are reviews of all board files of the repository.
func boardsOfTheTests(t *testing.T) []*review.Review {
	t.Helper()
	reviews := reviewsOf(t, mustRead(t, nil, demonstration[0]), mustRead(t, nil, demonstration[1]))
	for _, name := range marked(t) {
		reviews = append(reviews, reviewsOf(t, mustRead(t, nil, name))...)
	}
	return reviews
}

// TestEveryRuleReachesEveryVerdictFromAFile is the tenth invariant: what a rule can prove,
// and that it proves nothing, comes about from the text of a board and not only from facts
// made by hand.
func TestEveryRuleReachesEveryVerdictFromAFile(t *testing.T) {
	t.Parallel()
	reached := map[string]bool{}
	for _, r := range boardsOfTheTests(t) {
		for _, f := range r.Findings {
			reached[fmt.Sprint(f.Rule.ID, " ", f.Outcome)] = true
		}
	}
	for _, rule := range ownPack(t).Rules() {
		for _, outcome := range append(rule.Proves(), rules.Clarify) {
			if !reached[fmt.Sprint(rule.ID, " ", outcome)] {
				t.Errorf("no board file makes %s end in %v; add one to testdata/boards with a line marked %q", rule.ID, outcome, mark+rule.ID+" "+outcome.String())
			}
		}
	}
}

// TestEveryTermIsSetAndRead wants every term known on some board, and read by a rule, used
// as a lever, listed among the key figures, or asked by the program itself.
func TestEveryTermIsSetAndRead(t *testing.T) {
	t.Parallel()
	pack := ownPack(t)
	set, read := map[*facts.Term]bool{}, map[*facts.Term]bool{}
	for _, r := range boardsOfTheTests(t) {
		for _, s := range r.Facts.Subjects {
			for _, f := range s.Facts() {
				set[f.Term] = set[f.Term] || f.Known
			}
		}
	}
	for _, rule := range pack.Rules() {
		for _, term := range rule.Needs {
			read[term] = true
		}
		for _, lever := range rule.Cure {
			read[lever.Term] = true
		}
	}
	for _, term := range facts.Terms().Terms() {
		if !set[term] {
			t.Errorf("no board file makes %s %s known", term.Kind, term.ID)
		}
		if !read[term] && !isKey(term) && term.ID != "practice" { // practice: whether a rule belongs to the board
			t.Errorf("no rule reads %s %s, and it is no key figure", term.Kind, term.ID)
		}
	}
}

// isKey tells whether a term or the other bound of its worst-of is a key figure.
func isKey(term *facts.Term) bool {
	if id, ok := strings.CutSuffix(term.ID, ".at_least"); ok {
		other, found := facts.Terms().Lookup(term.Kind, id+".at_most")
		return term.Key || found && other.Key
	}
	return term.Key
}
