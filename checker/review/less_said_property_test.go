package review_test

import (
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/facts"
	"boardproof/checker/spec"
)

// stride picks which part of all that can be taken out of a generated board is tried.
const stride = 5

// TestGeneratedBoardsWithLessAcquitNothing takes leaves, keys, entries and items out of
// boards made up at random.
func TestGeneratedBoardsWithLessAcquitNothing(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		text := generateBoard(t, strong)
		b := mustReadText(t, text)
		first := rapid.IntRange(0, stride-1).Draw(t, "first")
		var variants []variant
		for i, l := range said(b) {
			if i%stride != first {
				continue
			}
			if less, problems := b.With(l.Path, ""); problems.Len() == 0 {
				variants = append(variants, variant{"without " + l.Path, less})
			}
		}
		for i, c := range cutsOf(text) {
			if i%stride != first {
				continue
			}
			less, problems := files{"board.yaml": c.text}.board("board.yaml")
			if problems.Len() == 0 && (c.item || len(saysMore(less, b)) == 0) {
				variants = append(variants, variant{"without " + c.what, less})
			}
		}
		boards := []*spec.Board{b}
		for _, v := range variants {
			boards = append(boards, v.board)
		}
		reviews := reviewsOf(t, boards...)
		for i, v := range variants {
			if faults := acquitted(reviews[0], reviews[i+1]); len(faults) > 0 {
				t.Fatalf("%s: %q\n%s", v.what, faults, text)
			}
		}
	})
}

func TestGeneratedBoundsNeverCross(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		text := generateBoard(t, strong)
		if faults := crossed(facts.Of(mustReadText(t, text))); len(faults) > 0 {
			t.Fatalf("%q\n%s", faults, text)
		}
	})
}
