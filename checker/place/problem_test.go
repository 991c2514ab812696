package place_test

import (
	"errors"
	"fmt"
	"slices"
	"testing"

	"boardproof/checker/place"
	"boardproof/checker/units"
)

func TestSentence(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		name    string
		problem place.Problem
		want    string
	}{
		{"all parts", place.Problem{Kind: place.NoUnit, Got: `"65"`, Want: "a current with its unit", Hint: `write "65 kA"`},
			`found "65", expected a current with its unit; write "65 kA"`},
		{"no hint", place.Problem{Kind: place.WrongShape, Got: "a list", Want: "a mapping"}, "found a list, expected a mapping"},
		{"no expectation", place.Problem{Kind: place.UnknownKey, Got: "the unknown key " + place.Quote("voltge"), Hint: `write "voltage"`},
			`found the unknown key "voltge"; write "voltage"`},
		{"nothing found", place.Problem{Kind: place.MissingKey, Want: "the key voltage"}, "expected the key voltage"},
		{"hint only", place.Problem{Kind: place.Alias, Hint: "write the value in full"}, "write the value in full"},
		{"kind only", place.Problem{Kind: place.TooDeep}, "too deep"},
		{"empty", place.Problem{}, "a fault without description"},
		{"raw text is made harmless", place.Problem{Got: "a\x1b[2J\nb", Want: "x\u202e"}, `found a\x1b[2J\nb, expected x\u202e`},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			if got := row.problem.Sentence(); got != row.want {
				t.Errorf("\n got %s\nwant %s", got, row.want)
			}
		})
	}
}

// TestFaultsOfUnitsBecomeProblems holds the two packages together: same kinds, same sentence.
func TestFaultsOfUnitsBecomeProblems(t *testing.T) {
	t.Parallel()
	for _, k := range units.FaultKinds() {
		if !slices.Contains(place.Kinds(), place.Kind(k)) {
			t.Errorf("the fault kind %q is no kind of problem", k)
		}
	}
	for _, text := range []string{"", "65", "65 KA", "12 mm", "6,5 kA", "1,600 kA", "65 \x1b kA\u202e", "NaN"} {
		_, err := units.Parse[units.Ampere](text)
		var f *units.Fault
		if !errors.As(err, &f) {
			t.Fatalf("%q gave %v", text, err)
		}
		p := place.Problem{Kind: place.Kind(f.Kind), Got: f.Got, Want: f.Want, Hint: f.Hint}
		if p.Sentence() != f.Error() {
			t.Errorf("problem: %s\nfault:   %s", p.Sentence(), f.Error())
		}
	}
}

func TestKindsAreDistinct(t *testing.T) {
	t.Parallel()
	seen := map[place.Kind]bool{}
	for _, k := range place.Kinds() {
		if seen[k] || k == "" {
			t.Errorf("kind %q stands twice or is empty", k)
		}
		seen[k] = true
	}
}

func TestProblems(t *testing.T) {
	t.Parallel()
	first := place.Problem{Place: place.Place{File: "a.yaml", Line: 2}, Kind: place.NoUnit, Got: `"65"`}
	second := place.Problem{Place: place.Place{File: "a.yaml", Line: 10}, Kind: place.NoUnit, Got: `"65"`}
	related := second
	related.Related = []place.Place{{File: "a.yaml", Line: 1}}
	otherPath := second
	otherPath.Path = "site.altitude"
	otherKind := second
	otherKind.Kind = place.WrongUnit

	var ps place.Problems
	if ps.Err() != nil || ps.Len() != 0 || len(ps.All()) != 0 || ps.Error() != "no problem" {
		t.Error("the zero value holds a problem")
	}
	var none *place.Problems
	if none.Err() != nil || none.Len() != 0 || none.All() != nil {
		t.Error("a nil pointer holds a problem")
	}

	ps.Add(second)
	if got := fmt.Sprint(ps.Err()); got != `a.yaml:10: found "65"` {
		t.Errorf("one: %s", got)
	}
	ps.Add(first, second)
	if got := fmt.Sprint(ps.Err()); got != `a.yaml:2: found "65" (and 1 more problem)` {
		t.Errorf("two: %s", got)
	}
	ps.Add(related, otherPath, otherKind, first)
	if got := fmt.Sprint(ps.Err()); got != `a.yaml:2: found "65" (and 4 more problems)` {
		t.Errorf("five: %s", got)
	}
	if ps.Len() != 5 {
		t.Errorf("%d problems, want 5: what differs in path, kind or related places is not the same", ps.Len())
	}
	var again *place.Problems
	if !errors.As(fmt.Errorf("reading: %w", ps.Err()), &again) || again.Len() != 5 {
		t.Error("the problems cannot be recovered from the error")
	}
	all := ps.All()
	all[0].Got = "changed"
	if ps.All()[0].Got == "changed" {
		t.Error("All hands out the inside")
	}
}
