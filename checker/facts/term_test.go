package facts_test

import (
	"errors"
	"slices"
	"strings"
	"testing"

	"boardproof/checker/facts"
)

func TestVocabularyIsInOrder(t *testing.T) {
	t.Parallel()
	v := facts.Terms()
	lists := map[string][]string{}
	for _, term := range v.Terms() {
		name := string(term.Kind) + "." + term.ID
		if got, ok := v.Lookup(term.Kind, term.ID); !ok || got != term {
			t.Errorf("%s is not found", name)
		}
		if term.Label == "" || term.ID != strings.ToLower(term.ID) || strings.Contains(term.ID, " ") {
			t.Errorf("%s: label %q", name, term.Label)
		}
		if (term.Value == facts.Number) != (term.Dimension != nil) || (term.Value == facts.Number) != (len(term.Words) == 0) {
			t.Errorf("%s has neither or both of dimension and words", name)
		}
		if term.Value != facts.Number {
			if term.ListID == "" {
				t.Errorf("%s has words without a list", name)
			}
			if same, ok := lists[term.ListID]; ok && !slices.Equal(same, term.Words) {
				t.Errorf("%s: two lists go by the name %s", name, term.ListID)
			}
			lists[term.ListID] = term.Words
		}
		if bound, ok := strings.CutSuffix(term.ID, ".at_least"); ok {
			if _, ok := v.Lookup(term.Kind, bound+".at_most"); !ok {
				t.Errorf("%s has no upper bound beside it", name)
			}
		}
	}
}

func TestTermsInEachOthersWay(t *testing.T) {
	t.Parallel()
	term := func(id string) *facts.Term { return &facts.Term{Kind: facts.Boards, ID: id} }
	for _, c := range []struct {
		ids  []string
		good bool
	}{
		{[]string{"a.b", "a.c", "ab"}, true}, {[]string{"a", "a"}, false}, {[]string{"a", "a.b"}, false}, {[]string{"a.b.c", "a.b"}, false}, {nil, true},
	} {
		var terms []*facts.Term
		for _, id := range c.ids {
			terms = append(terms, term(id))
		}
		var clash *facts.TermError
		if _, err := facts.NewVocabulary(terms...); (err == nil) != c.good || !c.good && (!errors.As(err, &clash) || clash.First == "") {
			t.Errorf("%v: %v", c.ids, err)
		}
	}
}

func TestInputShowsWhatIsKnown(t *testing.T) {
	t.Parallel()
	b := facts.Of(readText(t, twoSupplies+"work: {with_doors_open_under_voltage: yes}\n"))
	board, bars := b.Of(facts.Boards)[0].Input("x"), b.Of(facts.Busbars)[0].Input("main A")
	door := board["door_open"].(map[string]any)["contact_protection"].(map[string]any)
	if board["id"] != "x" || door["word"] != "IPXXB" || door["rank"] != 2 || board["work"].(map[string]any)["under_voltage"] != "yes" {
		t.Errorf("the board is %v", board)
	}
	if _, there := board["insulation"].(map[string]any)["rated_voltage"]; there {
		t.Error("an insulation voltage that nobody stated is there")
	}
	if got := bars["withstand"].(map[string]any)["peak"]; got != 52.5e3 {
		t.Errorf("the peak is %v", got)
	}
}

func TestJouleIntegralsAreShownAsCurrents(t *testing.T) {
	t.Parallel()
	b := facts.Of(readText(t, strings.Replace(twoSupplies, "duration: 1 s", "duration: 500 ms", 1)))
	s := b.Of(facts.Busbars)[0]
	shown := s.Fact("withstand.joule_integral").Show(s)
	if !near(shown.Number, 25e3, 1e-3) || shown.Suffix != " for 500 ms" {
		t.Errorf("shown as %v%s", shown.Number, shown.Suffix)
	}
	// 30 kA for 280 ms bring as much as 30·√(280/500) kA for 500 ms.
	shown = s.Fact("fault.joule_integral.at_most").Show(s)
	if !near(shown.Number, 22449.94, 0.1) {
		t.Errorf("the fault is shown as %v", shown.Number)
	}
	without := facts.Of(with(t, readText(t, twoSupplies), "busbars.main A.short_time_withstand.duration", ""))
	s = without.Of(facts.Busbars)[0]
	if shown := s.Fact("fault.joule_integral.at_most").Show(s); shown.Suffix != "" || !near(shown.Number, 252e6, 1) {
		t.Errorf("without a duration it is shown as %v %s%s", shown.Number, shown.Dimension.Base, shown.Suffix)
	}
}
