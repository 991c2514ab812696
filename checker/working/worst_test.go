package working_test

import (
	"fmt"
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/units"
	"boardproof/checker/working"
)

type cases = []working.Case[units.Ratio]

func TestLargestAndSmallest(t *testing.T) {
	t.Parallel()
	three := cases{{"low", ratio(1, "a")}, {"high", ratio(3, "b")}, {"middle", ratio(2, "c")}}
	open := lacking("count").Missing()
	for _, c := range []struct {
		name                       string
		cases                      cases
		open                       working.Lacks
		largest, smallest          string // at least … at most, as in "3…3"
		governs, governsTheLeast   string
		missing, missingOfTheLeast string
	}{
		{"closed and known", three, nil, "3…3", "1…1", "high", "low", "", ""},
		{"open", three, open, "3…", "…1", "high", "low", "count", "count"},
		{"one unknown", append(cases{{"x", lacking("y", "x")}}, three...), nil, "3…", "…1", "high", "low", "x,y", "x,y"},
		{"unknown and open", append(cases{{"x", lacking("x")}}, three...), open, "3…", "…1", "high", "low", "count,x", "count,x"},
		{"one outside", append(cases{{"x", outside()}}, three...), nil, "3…", "…1", "high", "low", "", ""},
		{"all unknown", cases{{"x", lacking("x")}}, nil, "…", "…", "", "", "x", "x"},
		{"all outside", cases{{"x", outside()}}, nil, "…", "…", "", "", "", ""},
		{"no case", nil, nil, "…", "…", "", "", "~a supply state in which this point is live", "~a supply state in which this point is live"},
		{"no case and open", nil, open, "…", "…", "", "", "count", "count"},
		{"two alike, the first governs", cases{{"first", ratio(2, "a")}, {"second", ratio(2, "b")}}, nil, "2…2", "2…2", "first", "first", "", ""},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			w := working.Largest("m", "largest", c.cases, c.open)
			if got := text(w.AtLeast) + "…" + text(w.AtMost); got != c.largest || w.Governing != c.governs {
				t.Errorf("largest %s by %q, want %s by %q", got, w.Governing, c.largest, c.governs)
			}
			if got := keys(w.AtMost.Missing()); !w.AtMost.Known() && w.AtMost.Beyond() == nil && got != c.missing {
				t.Errorf("at most lacks %q, want %q", got, c.missing)
			}
			s := working.Smallest("m", "smallest", c.cases, c.open)
			if got := text(s.AtLeast) + "…" + text(s.AtMost); got != c.smallest || s.Governing != c.governsTheLeast {
				t.Errorf("smallest %s by %q, want %s by %q", got, s.Governing, c.smallest, c.governsTheLeast)
			}
			if got := keys(s.AtLeast.Missing()); !s.AtLeast.Known() && s.AtLeast.Beyond() == nil && got != c.missingOfTheLeast {
				t.Errorf("at least lacks %q, want %q", got, c.missingOfTheLeast)
			}
		})
	}
}

func text(r working.Result[units.Ratio]) string {
	if v, ok := r.Value(); ok {
		return fmt.Sprint(float64(v))
	}
	return ""
}

func TestTheProofNamesWhatClosesIt(t *testing.T) {
	t.Parallel()
	count := &working.Working{Symbol: "count", Leaf: &working.Leaf{Path: "counted", Claim: true, Basis: working.Declared}}
	tested := working.Stated(units.Ratio(1), "a", "a", &working.Leaf{Path: "a", Claim: true, Basis: working.Tested})
	w := working.Largest("m", "largest", cases{{"only", tested}}, nil, count)
	if got := w.AtMost.How().Basis(); got != working.Declared {
		t.Errorf("a proof closed by a declaration rests on: %v", got)
	}
	if got := w.AtLeast.How().Basis(); got != working.Tested {
		t.Errorf("what is known rests on: %v", got)
	}
	if in := w.AtMost.How().Inputs; len(in) != 2 || in[0].Case != "only" || in[1] != count || w.AtMost.How().Case != "only" {
		t.Errorf("inputs of the proof: %v", in)
	}
	if tested.How().Case != "" {
		t.Error("the case was written into the operand itself")
	}
}

func drawCases(t *rapid.T) cases {
	var list cases
	for i := range rapid.IntRange(1, 6).Draw(t, "cases") {
		c := working.Case[units.Ratio]{Name: fmt.Sprint("case ", i)}
		switch rapid.IntRange(0, 5).Draw(t, "kind") {
		case 0:
			c.Result = lacking(fmt.Sprint("leaf ", i))
		case 1:
			c.Result = outside()
		default:
			c.Result = ratio(rapid.Float64Range(-1e6, 1e6).Draw(t, "value"), "v")
		}
		list = append(list, c)
	}
	return list
}

func TestBoundsHoldEveryKnownCase(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		list := drawCases(t)
		open := working.Lacks(nil)
		if rapid.Bool().Draw(t, "open") {
			open = lacking("count").Missing()
		}
		large, small := working.Largest("m", "largest", list, open), working.Smallest("m", "smallest", list, open)
		all := len(open) == 0
		for _, c := range list {
			v, ok := c.Result.Value()
			all = all && ok
			if !ok {
				continue
			}
			if least, ok := large.AtLeast.Value(); !ok || least < v {
				t.Fatalf("the largest is at least %v, %s is %v", least, c.Name, v)
			}
			if most, ok := small.AtMost.Value(); !ok || most > v {
				t.Fatalf("the smallest is at most %v, %s is %v", most, c.Name, v)
			}
		}
		for _, proven := range []working.Result[units.Ratio]{large.AtMost, small.AtLeast} {
			if proven.Known() != all {
				t.Fatalf("proven: %v, all known and closed: %v", proven.Known(), all)
			}
		}
		if all && (large.AtLeast.V() > large.AtMost.V() || small.AtLeast.V() > small.AtMost.V()) {
			t.Fatal("a lower bound lies above the upper one")
		}
	})
}

func TestAnUnknownCaseTakesAwayTheProofOnly(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		list := drawCases(t)
		more := append(list[:len(list):len(list)], working.Case[units.Ratio]{Name: "one more", Result: lacking("new")})
		before, after := working.Largest("m", "largest", list, nil), working.Largest("m", "largest", more, nil)
		if after.AtMost.Known() {
			t.Fatal("at most is known with an unknown case")
		}
		if before.AtLeast.Known() != after.AtLeast.Known() || before.AtLeast.V() != after.AtLeast.V() || before.Governing != after.Governing {
			t.Fatalf("at least changed from %v to %v", before.AtLeast.V(), after.AtLeast.V())
		}
		small, less := working.Smallest("m", "smallest", list, nil), working.Smallest("m", "smallest", more, nil)
		if less.AtLeast.Known() || small.AtMost.V() != less.AtMost.V() {
			t.Fatalf("the smallest: at least known %v, at most %v became %v", less.AtLeast.Known(), small.AtMost.V(), less.AtMost.V())
		}
	})
}
