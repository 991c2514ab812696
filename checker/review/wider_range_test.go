package review_test

import (
	"fmt"
	"strings"
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/review"
	"boardproof/checker/rules"
)

// relaxed says which withstand verdict became better in a review of a wider fault range.
func relaxed(narrow, wide *review.Review) []string {
	var list []string
	before, after := outcomes(narrow), outcomes(wide)
	for key, now := range after {
		if !strings.HasPrefix(key, "WTH-") {
			continue
		}
		switch was := before[key]; {
		case was == rules.Departs && now == rules.Complies, was != rules.Complies && now == rules.Complies, was == rules.Departs && now != rules.Departs:
			list = append(list, fmt.Sprintf("%s was %v and is now %v", key, was, now))
		}
	}
	return append(list, nearerToAcquittal(narrow.Pack, narrow.Facts, wide.Facts)...)
}

// TestAWiderFaultRangeRelaxesNothing is the third invariant. A range is widened by a larger
// largest level, a smaller smallest one, and by the tolerance of an impedance that was
// measured before.
func TestAWiderFaultRangeRelaxesNothing(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		draw := func(label string, low, high int) int { return rapid.IntRange(low, high).Draw(t, label) }
		// The ratings lie among the faults that can come out, so that verdicts change.
		text := strings.NewReplacer(
			"{current: 65 kA, duration: 1 s}", fmt.Sprintf("{current: %d kA, duration: 1 s}", draw("Icw", 8, 40)),
			"peak_withstand: 143 kA", fmt.Sprintf("peak_withstand: %d kA", draw("Ipk", 30, 100)),
			"{value: 6 %}", fmt.Sprintf("{value: %d %%, measured: FAT-1}", draw("uk", 4, 8)),
			"pickup: 8 kA", fmt.Sprintf("pickup: %d kA", draw("Isd", 4, 16)),
		).Replace(complete)
		high, low := draw("largest level", 60, 500), draw("smallest level", 20, 60)
		text = strings.NewReplacer("fault_level_max: 100 MVA", fmt.Sprintf("fault_level_max: %d MVA", high),
			"fault_level_min: 50 MVA", fmt.Sprintf("fault_level_min: %d MVA", low)).Replace(text)
		wider := text
		for _, widen := range []struct{ label, from, to string }{
			{"larger level", fmt.Sprintf("fault_level_max: %d MVA", high), fmt.Sprintf("fault_level_max: %d MVA", high+draw("above", 0, 1000))},
			{"smaller level", fmt.Sprintf("fault_level_min: %d MVA", low), fmt.Sprintf("fault_level_min: %d MVA", low-draw("below", 0, 14))},
			{"with tolerance", ", measured: FAT-1", ""},
		} {
			if rapid.Bool().Draw(t, widen.label) {
				wider = strings.ReplaceAll(wider, widen.from, widen.to)
			}
		}
		reviews := reviewsOf(t, mustReadText(t, text), mustReadText(t, wider))
		if faults := relaxed(reviews[0], reviews[1]); len(faults) > 0 {
			t.Fatalf("%q\n%s\nwider:\n%s", faults, text, wider)
		}
	})
}

// TestARangeUpsideDownIsNotANarrowOne states a smallest fault level above the largest.
func TestARangeUpsideDownIsNotANarrowOne(t *testing.T) {
	t.Parallel()
	upside := strings.Replace(complete, "fault_level_min: 50 MVA", "fault_level_min: 2000 MVA", 1)
	b, problems := files{"board.yaml": upside}.board("board.yaml")
	if problems.Len() > 0 {
		return // refused
	}
	for key, outcome := range outcomes(reviewsOf(t, b)[0]) {
		if strings.HasPrefix(key, "WTH-01 ") && outcome == rules.Complies {
			t.Errorf("%s complies over a fault range from 2000 MVA to 100 MVA", key)
		}
	}
}
