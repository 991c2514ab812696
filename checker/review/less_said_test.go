package review_test

import (
	"fmt"
	"os"
	"path"
	"reflect"
	"slices"
	"testing"

	"boardproof/checker/facts"
	"boardproof/checker/review"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
	"boardproof/checker/units"
)

// The tests of this file hold the first two invariants of the design: less said never
// acquits, and what departs stays so or becomes a question.

// variant is a board of which something was taken away.
type variant struct {
	what  string
	board *spec.Board
}

// withoutLeaves takes away every leaf of a board in turn; what then is a problem of the
// file is not judged and so left out.
func withoutLeaves(b *spec.Board) []variant {
	var list []variant
	for _, l := range said(b) {
		if l.State == spec.Doubted {
			continue // taken away already
		}
		less, problems := b.With(l.Path, "")
		if problems.Len() == 0 {
			list = append(list, variant{"without " + l.Path, less})
		}
	}
	return list
}

// checkLess holds variants against the board they were made from.
func checkLess(t *testing.T, b *spec.Board, variants []variant) {
	t.Helper()
	boards := []*spec.Board{b}
	for _, v := range variants {
		boards = append(boards, v.board)
	}
	reviews := reviewsOf(t, boards...)
	whole := reviews[0]
	for i, v := range variants {
		for _, fault := range acquitted(whole, reviews[i+1]) {
			t.Errorf("%s: %s", v.what, fault)
		}
	}
}

// acquitted says what became better in a review of less.
func acquitted(whole, less *review.Review) []string {
	var list []string
	before, after := outcomes(whole), outcomes(less)
	for key, now := range after {
		was, judged := before[key]
		switch {
		case (now == rules.Complies || now == rules.Exempt) && (!judged || was != now):
			list = append(list, fmt.Sprintf("%s was %v and is now %v", key, was, now))
		case was == rules.Departs && judged && now != rules.Departs && now != rules.Clarify:
			list = append(list, fmt.Sprintf("%s departed and is now %v", key, now))
		case now == rules.Unjudged:
			list = append(list, key+" can no longer be judged")
		}
	}
	if less.Open(review.AnyQuery) == 0 && whole.Open(review.AnyQuery) > 0 {
		list = append(list, fmt.Sprintf("nothing is open any more, %d were", whole.Open(review.AnyQuery)))
	}
	list = append(list, nearerToAcquittal(whole.Pack, whole.Facts, less.Facts)...)
	slices.Sort(list)
	return slices.Compact(list)
}

func TestNoLeafLessAcquits(t *testing.T) {
	t.Parallel()
	for _, name := range demonstration {
		t.Run(path.Base(name), func(t *testing.T) {
			t.Parallel()
			b := mustRead(t, nil, name)
			variants := withoutLeaves(b)
			if len(variants) < 250 {
				t.Fatalf("only %d leaves could be taken away", len(variants))
			}
			checkLess(t, b, variants)
		})
	}
}

func TestNoTextLessAcquits(t *testing.T) {
	t.Parallel()
	for _, name := range demonstration {
		for _, edited := range []string{name, path.Join(path.Dir(name), "basis.yaml")} {
			t.Run(path.Base(name)+" "+path.Base(edited), func(t *testing.T) {
				t.Parallel()
				checkCuts(t, name, edited, 40)
			})
		}
	}
}

// checkCuts takes everything out of the text of a file in turn. A cut that makes the file
// say something else instead, because a basis or a copied entry stands behind it, replaces
// and does not take away.
func checkCuts(t *testing.T, name, edited string, least int) {
	t.Helper()
	text, err := os.ReadFile(path.Join(root, edited))
	if err != nil {
		t.Fatal(err)
	}
	b := mustRead(t, nil, name)
	var variants []variant
	for _, c := range cutsOf(string(text)) {
		less, problems := files{edited: c.text}.board(name)
		if problems.Len() > 0 || !c.item && len(saysMore(less, b)) > 0 {
			continue
		}
		variants = append(variants, variant{"without " + c.what, less})
	}
	if len(variants) < least {
		t.Fatalf("only %d cuts could be judged", len(variants))
	}
	checkLess(t, b, variants)
}

// TestDoubtfulValuesAcquitNothing writes every quantity a thousand times too large and too
// small, as with a wrong prefix. What is then doubted must be as if it had not been said.
func TestDoubtfulValuesAcquitNothing(t *testing.T) {
	t.Parallel()
	for _, name := range demonstration {
		t.Run(path.Base(name), func(t *testing.T) {
			t.Parallel()
			b := mustRead(t, nil, name)
			var variants []variant
			for _, l := range said(b) {
				if l.Leaf == nil || l.Leaf.Kind != spec.KindQuantity || !l.value.IsValid() || l.value.Kind() != reflect.Float64 {
					continue
				}
				d, ok := units.DimensionNamed(l.Leaf.Dimension)
				if !ok {
					t.Fatalf("%s has no dimension", l.Path)
				}
				for _, factor := range []float64{1000, 0.001} {
					text := d.Format(l.value.Float() * factor)
					wrong, problems := b.With(l.Path, text)
					if problems.Len() == 0 && isDoubted(wrong, l.Path) {
						variants = append(variants, variant{l.Path + ": " + text, wrong})
					}
				}
			}
			if len(variants) < 50 {
				t.Fatalf("only %d values were doubted", len(variants))
			}
			checkLess(t, b, variants)
		})
	}
}

func isDoubted(b *spec.Board, path string) bool {
	return slices.ContainsFunc(b.Doubts, func(d spec.Doubt) bool { return d.Path == path })
}

// TestBoundsNeverCross holds the two bounds of every worst-of in order, in the
// demonstration and in all that remains of it with one leaf less.
func TestBoundsNeverCross(t *testing.T) {
	t.Parallel()
	for _, name := range demonstration {
		b := mustRead(t, nil, name)
		for _, v := range append(withoutLeaves(b), variant{"as it is", b}) {
			for _, text := range crossed(facts.Of(v.board)) {
				t.Errorf("%s %s: %s", name, v.what, text)
			}
		}
	}
}
